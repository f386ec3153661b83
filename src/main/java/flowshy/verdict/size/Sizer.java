package flowshy.verdict.size;

import flowshy.verdict.size.Sized.End;
import flowshy.verdict.size.Sized.VariableSlopes;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.DoubleConsumer;
import java.util.stream.IntStream;
import org.hipparchus.util.FastMath;

/**
 * Solves a sizing: first what keeps every limit, then the best of that.
 *
 * @param seed of everything drawn at random: one seed, one answer
 * @param progress told now and then, by any thread, how much is done: a share, 0 to 1, guessed
 */
public record Sizer(long seed, DoubleConsumer progress) {
    /** A limit binds if it is kept by less than this, in its scale. */
    private static final double BINDS = 1e-5;

    /** Change of a limit, in its scale, that shows its price; and of a variable, as a share of its value. */
    private static final double LIMIT_STEP = 0.01;

    private static final double VARIABLE_STEP = 1e-3;

    /** First step of a search that starts at the optimum of a problem hardly different, in shares of the ranges. */
    private static final double NEAR = 0.02;

    /**
     * A sizer that tells nobody how far it is.
     *
     * @param seed of everything drawn at random
     */
    public Sizer(long seed) {
        this(seed, share -> {});
    }

    /**
     * Solves a problem.
     *
     * @param problem what is asked
     * @param known choices to start from beside the own sample, each inside the ranges; may be empty
     * @return the answer
     */
    public Sized solve(SizingProblem problem, List<List<Double>> known) {
        Course course = new Course(problem.variables().size(), progress);
        SizingProblem counted = counted(problem, course);
        Candidate best = best(counted, known);
        course.next();
        course.next();
        return answer(counted, problem, best, course);
    }

    /**
     * Solves a problem whose own trials are an estimate, so that a full model keeps the limits.
     *
     * @param estimate what is asked
     * @param full trials by the full model, thread-safe
     * @param known as before
     * @return the answer by the full model
     */
    public Agreement solve(SizingProblem estimate, SizingProblem.Trials full, List<List<Double>> known) {
        Course course = new Course(estimate.variables().size(), progress);
        SizingProblem counted = counted(estimate, course);
        CorrectedSearch search = new CorrectedSearch(this, counted, full);
        Candidate first = best(counted, known);
        if (!first.trial().there()) {
            return new Agreement(answer(counted, estimate, first, course), estimate, List.of(), false, 0);
        }
        course.next();
        CorrectedSearch.Ended ended = search.from(first);
        Candidate best = ended.place();
        course.next();
        SizingProblem corrected = best.trial().there() ? search.correctedAt(best) : counted;
        return new Agreement(
                answer(corrected, search.solved(), best, course),
                corrected,
                search.rounds(),
                ended.settled(),
                search.solutions());
    }

    /** Counts what is tried, and keeps it: searches and slopes come back to the same places. */
    private static SizingProblem counted(SizingProblem problem, Course course) {
        Map<List<Double>, Trial> kept = new ConcurrentHashMap<>();
        return problem.by(values -> {
            Optional<Trial> before = Optional.ofNullable(kept.get(values));
            if (before.isPresent()) {
                return before.get();
            }
            Trial trial = problem.trials().at(values);
            if (kept.putIfAbsent(List.copyOf(values), trial) == null) {
                course.step();
            }
            return trial;
        });
    }

    /** The best choice of the whole ranges. */
    Candidate best(SizingProblem problem, List<List<Double>> known) {
        List<Candidate> starts = known.stream().map(problem::at).toList();
        Candidate best = problem.variables().size() == 1
                ? new OneVariable(problem).best()
                : new SeveralVariables(problem, seed).best(starts);
        for (Candidate start : starts) {
            best = Candidate.better(best, start);
        }
        return best;
    }

    /** The best choice that a local search from a place finds, never worse than that. */
    Candidate near(SizingProblem problem, List<Double> from) {
        Candidate start = problem.at(from);
        return problem.variables().size() == 1
                ? Candidate.better(start, new OneVariable(problem).bestOfFew())
                : new SeveralVariables(problem, seed).near(start);
    }

    private Sized answer(SizingProblem counted, SizingProblem problem, Candidate best, Course course) {
        boolean fits = best.keepsAll();
        List<Integer> binding = new ArrayList<>();
        for (int c = 0; c < best.shortfalls().size(); c++) {
            if (best.shortfalls().get(c) > -BINDS) {
                binding.add(c);
            }
        }
        List<End> ends = new ArrayList<>();
        for (int i = 0; i < best.values().size(); i++) {
            double share = problem.variables().get(i).share(best.values().get(i));
            ends.add(share < 1e-6 ? End.FROM : share > 1.0 - 1e-6 ? End.TO : End.INSIDE);
        }
        List<Slope> prices = fits ? prices(counted, best) : List.of();
        List<VariableSlopes> slopes = best.trial().there() ? slopes(counted, best) : List.of();
        return new Sized(
                problem,
                fits,
                best.values(),
                best.trial(),
                best.shortfalls(),
                binding,
                ends,
                edges(counted, best),
                prices,
                slopes,
                course.tried());
    }

    private List<Slope> prices(SizingProblem problem, Candidate best) {
        return IntStream.range(0, problem.constraints().size())
                .mapToObj(c -> {
                    Constraint constraint = problem.constraints().get(c);
                    return Slope.of(
                                    change -> optimum(
                                            problem.withLimit(c, constraint.limit() + change * constraint.scale()),
                                            best,
                                            c),
                                    LIMIT_STEP,
                                    true,
                                    true)
                            .per(constraint.scale());
                })
                .toList();
    }

    /** The objective at the optimum of a problem with one limit moved a little; NaN if nothing fits. */
    private double optimum(SizingProblem moved, Candidate best, int constraint) {
        Candidate start = moved.at(best.values());
        if (best.shortfalls().get(constraint) < -2.0 * LIMIT_STEP) { // the limit is far away: moved, it changes nothing
            return start.trial().objective();
        }
        Candidate found = moved.variables().size() == 1
                ? new OneVariable(moved).bestNear(start)
                : new AugmentedLagrangian(moved, size(best), 1e3).from(start, NEAR, AugmentedLagrangian.MANY);
        return found.keepsAll() ? found.trial().objective() : Double.NaN;
    }

    private static double size(Candidate best) {
        return best.cost() == 0.0 ? 1.0 : FastMath.abs(best.cost());
    }

    private static List<VariableSlopes> slopes(SizingProblem problem, Candidate best) {
        List<VariableSlopes> slopes = new ArrayList<>();
        for (int i = 0; i < best.values().size(); i++) {
            int variable = i;
            List<Slope> found = IntStream.range(0, best.shortfalls().size())
                    .mapToObj(c -> slope(problem, best, variable, c))
                    .toList();
            slopes.add(new VariableSlopes(slope(problem, best, variable, -1), found));
        }
        return slopes;
    }

    /** Whether a step of a variable's slope leads to where there is no device. */
    private static List<String> edges(SizingProblem problem, Candidate best) {
        List<String> edges = new ArrayList<>();
        for (int i = 0; i < best.values().size(); i++) {
            String edge = "";
            for (double change : new double[] {-step(problem, best, i), step(problem, best, i)}) {
                Variable range = problem.variables().get(i);
                double moved = best.values().get(i) + change;
                if (best.trial().there() && edge.isEmpty() && moved >= range.from() && moved <= range.to()) {
                    edge = problem.trials().at(moved(best, i, change)).reason();
                }
            }
            edges.add(edge);
        }
        return edges;
    }

    private static double step(SizingProblem problem, Candidate best, int variable) {
        Variable range = problem.variables().get(variable);
        double value = best.values().get(variable);
        return VARIABLE_STEP * (value == 0.0 ? range.to() - range.from() : FastMath.abs(value));
    }

    private static List<Double> moved(Candidate best, int variable, double change) {
        List<Double> moved = new ArrayList<>(best.values());
        moved.set(variable, best.values().get(variable) + change);
        return moved;
    }

    /** Slope of a limited figure, or of the objective (−1), along one variable; steps end at the ends of its range. */
    private static Slope slope(SizingProblem problem, Candidate best, int variable, int constraint) {
        Variable range = problem.variables().get(variable);
        double value = best.values().get(variable);
        double step = step(problem, best, variable);
        return Slope.of(
                change -> {
                    Trial trial = problem.trials().at(moved(best, variable, change));
                    return !trial.there()
                            ? Double.NaN
                            : constraint < 0 ? trial.objective() : trial.found().get(constraint);
                },
                step,
                value - step >= range.from(),
                value + step <= range.to());
    }
}
