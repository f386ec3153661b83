package flowshy.verdict.size;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.hipparchus.exception.MathIllegalStateException;
import org.hipparchus.optim.InitialGuess;
import org.hipparchus.optim.MaxEval;
import org.hipparchus.optim.SimpleBounds;
import org.hipparchus.optim.SimpleValueChecker;
import org.hipparchus.optim.nonlinear.scalar.GoalType;
import org.hipparchus.optim.nonlinear.scalar.ObjectiveFunction;
import org.hipparchus.optim.nonlinear.scalar.noderiv.BOBYQAOptimizer;
import org.hipparchus.optim.nonlinear.scalar.noderiv.CMAESOptimizer;
import org.hipparchus.random.MersenneTwister;
import org.hipparchus.random.SobolSequenceGenerator;
import org.hipparchus.util.FastMath;

/**
 * Search over several numbers: a Sobol sequence over the ranges, its best places and what an evolution strategy (CMA-ES, Hansen &amp;
 * Ostermeier 2001) finds from them as starts, from each a local search with limits. If no place keeps every limit, the violation is
 * made least first. Starts run at the same time and are compared in their own order, so the answer depends on the seed alone.
 */
final class SeveralVariables {
    private static final int PLACES_A_VARIABLE = 128;
    private static final int STARTS = 8;

    /** Starts keep this distance, in shares of the ranges: the best places of a sample crowd round one of them. */
    private static final double APART = 0.08;

    private static final double FIRST_STEP = 0.1;
    private static final double LEAST_SCALE = 1e-6;

    /** Weight of violated limits for the evolution strategy, which knows no prices. */
    private static final double PENALTY = 1e3;

    /** A choice near a good one that makes no device counts as so many times the objective. */
    private static final double WALL = 1e3;

    private final SizingProblem problem;
    private final long seed;
    private final int n;

    SeveralVariables(SizingProblem problem, long seed) {
        this.problem = problem;
        this.seed = seed;
        this.n = problem.variables().size();
    }

    /**
     * The best choice found.
     *
     * @param known choices to start from beside the sample, may be empty
     * @return keeps every limit if any such choice was found
     */
    Candidate best(List<Candidate> known) {
        List<Candidate> sample = new ArrayList<>(known);
        List<double[]> places = places();
        sample.addAll(places.stream().parallel().map(problem::at).toList());
        sample.sort(Candidate.BETTER_FIRST);
        Candidate best = sample.get(0);
        if (!best.trial().there()) {
            return best;
        }
        double scale = scale(sample);
        List<Candidate> starts = new ArrayList<>(apart(sample));
        if (!best.keepsAll()) {
            starts = feasible(starts);
            best = starts.get(0);
            if (!best.keepsAll()) {
                return best;
            }
        }
        starts.add(0, evolved(best, scale));
        // near an optimum the objective changes by shares of itself, which may be nothing against its spread over the
        // ranges
        double near = FastMath.min(scale, FastMath.max(FastMath.abs(best.cost()), LEAST_SCALE * scale));
        double wall = wall(sample, near);
        List<Candidate> from = starts;
        List<Candidate> ends = IntStream.range(0, from.size())
                .parallel()
                .mapToObj(i -> new AugmentedLagrangian(problem, near, wall)
                        .from(from.get(i), FIRST_STEP, AugmentedLagrangian.FEW))
                .toList();
        for (Candidate end : ends) {
            best = Candidate.better(best, end);
        }
        return new AugmentedLagrangian(problem, near, wall).from(best, 0.1 * FIRST_STEP, AugmentedLagrangian.MANY);
    }

    /**
     * The best choice near one.
     *
     * @param start makes a device
     * @return never worse than that
     */
    Candidate near(Candidate start) {
        Candidate kept = start.keepsAll() ? start : leastViolation(start);
        if (!kept.keepsAll()) {
            return kept;
        }
        double scale = kept.cost() == 0.0 ? 1.0 : FastMath.abs(kept.cost());
        return new AugmentedLagrangian(problem, scale, WALL).from(kept, FIRST_STEP, AugmentedLagrangian.MANY);
    }

    /** A Sobol sequence, turned about by the seed (Cranley &amp; Patterson 1976); its first point, all zeros, is left out. */
    private List<double[]> places() {
        MersenneTwister random = new MersenneTwister(seed);
        double[] turn = new double[n];
        Arrays.setAll(turn, i -> random.nextDouble());
        SobolSequenceGenerator sequence = new SobolSequenceGenerator(n);
        sequence.skipTo(1);
        List<double[]> places = new ArrayList<>();
        for (int k = 0; k < PLACES_A_VARIABLE * n; k++) {
            double[] place = sequence.nextVector();
            for (int i = 0; i < n; i++) {
                place[i] = (place[i] + turn[i]) % 1.0;
            }
            places.add(place);
        }
        return places;
    }

    /** Size of the objective over the sample: what lies between its quarters, or its own size. */
    private static double scale(List<Candidate> sample) {
        double[] costs = sample.stream()
                .filter(candidate -> candidate.trial().there())
                .mapToDouble(Candidate::cost)
                .sorted()
                .toArray();
        double spread = costs[3 * (costs.length - 1) / 4] - costs[(costs.length - 1) / 4];
        double size = FastMath.max(FastMath.abs(costs[0]), FastMath.abs(costs[costs.length - 1]));
        return spread > 0.0 ? spread : size > 0.0 ? size : 1.0;
    }

    /** Above everything that the sample holds. */
    private double wall(List<Candidate> sample, double scale) {
        double highest = sample.stream()
                .filter(candidate -> candidate.trial().there())
                .mapToDouble(candidate -> candidate.cost() / scale + 10.0 * candidate.violation())
                .max()
                .orElseThrow();
        return highest + 1.0 + FastMath.abs(highest);
    }

    private List<Candidate> apart(List<Candidate> sorted) {
        List<Candidate> starts = new ArrayList<>();
        for (Candidate candidate : sorted) {
            if (starts.size() == STARTS || !candidate.trial().there()) {
                break;
            }
            double[] place = problem.shares(candidate.values());
            boolean far = starts.stream().allMatch(other -> distance(place, problem.shares(other.values())) >= APART);
            if (far) {
                starts.add(candidate);
            }
        }
        return starts;
    }

    private static double distance(double[] one, double[] other) {
        double largest = 0.0;
        for (int i = 0; i < one.length; i++) {
            largest = FastMath.max(largest, FastMath.abs(one[i] - other[i]));
        }
        return largest;
    }

    /** The same starts, each brought as near to the limits as it goes; better first. */
    private List<Candidate> feasible(List<Candidate> starts) {
        return new ArrayList<>(IntStream.range(0, starts.size())
                .parallel()
                .mapToObj(i -> leastViolation(starts.get(i)))
                .sorted(Candidate.BETTER_FIRST)
                .toList());
    }

    private Candidate leastViolation(Candidate start) {
        Candidate[] best = {start};
        double far = 4.0 * start.violation() + 1.0;
        double[] place = problem.shares(start.values());
        for (double radius = FIRST_STEP; radius > 1e-4 && !best[0].keepsAll(); radius *= 0.1) {
            try {
                new BOBYQAOptimizer(2 * n + 1, radius, 1e-6 * radius)
                        .optimize(
                                new MaxEval(150 * n),
                                new ObjectiveFunction(shares -> {
                                    Candidate candidate = problem.at(shares);
                                    best[0] = Candidate.better(best[0], candidate);
                                    return FastMath.min(candidate.violation(), far);
                                }),
                                GoalType.MINIMIZE,
                                new InitialGuess(place),
                                ranges());
            } catch (MathIllegalStateException e) {
                place = problem.shares(
                        best[0].values()); // out of trials, or the model gave out: go on with smaller steps
            }
            place = problem.shares(best[0].values());
        }
        return best[0];
    }

    private SimpleBounds ranges() {
        double[] high = new double[n];
        Arrays.fill(high, 1.0);
        return new SimpleBounds(new double[n], high);
    }

    /** The evolution strategy from one start; it leaves side minima that a local search stays in. */
    private Candidate evolved(Candidate start, double scale) {
        Candidate[] best = {start};
        double[] sigma = new double[n];
        Arrays.fill(sigma, 0.25);
        int population = 4 + (int) (3.0 * FastMath.log(n)) + 4;
        double far = FastMath.abs(start.cost() / scale) + PENALTY;
        try {
            new CMAESOptimizer(
                            400,
                            Double.NEGATIVE_INFINITY,
                            true,
                            0,
                            0,
                            new MersenneTwister(seed),
                            false,
                            new SimpleValueChecker(1e-7, 1e-9))
                    .optimize(
                            new MaxEval(600 * n),
                            new ObjectiveFunction(shares -> {
                                Candidate candidate = problem.at(shares);
                                best[0] = Candidate.better(best[0], candidate);
                                return candidate.trial().there()
                                        ? candidate.cost() / scale + PENALTY * FastMath.sqrt(candidate.violation())
                                        : far;
                            }),
                            GoalType.MINIMIZE,
                            new InitialGuess(problem.shares(start.values())),
                            ranges(),
                            new CMAESOptimizer.Sigma(sigma),
                            new CMAESOptimizer.PopulationSize(population));
        } catch (MathIllegalStateException e) {
            return best[0]; // out of trials: the best so far is a start like any other
        }
        return best[0];
    }
}
