package flowshy.verdict.size;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.hipparchus.analysis.solvers.AllowedSolution;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.optim.MaxEval;
import org.hipparchus.optim.nonlinear.scalar.GoalType;
import org.hipparchus.optim.univariate.BrentOptimizer;
import org.hipparchus.optim.univariate.SearchInterval;
import org.hipparchus.optim.univariate.UnivariateObjectiveFunction;
import org.hipparchus.util.FastMath;

/**
 * Search along one number. The range is sampled evenly; between neighbours every limit that is crossed is located (Brent's method, from the
 * side that keeps it), so is the edge of what makes a device, and every dip of the objective and of the violation. The best of all these
 * is the answer: an optimum between two samples is missed only if neither its limit nor its dip shows at the samples.
 */
final class OneVariable {
    private static final int SAMPLES = 129;
    private static final int FEW_SAMPLES = 13;
    private static final double NEAR = 0.03;
    private static final double AT_ONCE = 1e-4;
    private static final double ACCURACY = 1e-13;
    private static final int HALVINGS = 45;

    private final SizingProblem problem;

    OneVariable(SizingProblem problem) {
        this.problem = problem;
    }

    private record Sample(double share, Candidate candidate) {}

    /** The best of the whole range. */
    Candidate best() {
        return best(0.0, 1.0, SAMPLES);
    }

    /** The same of a range in which a dip or two are expected. */
    Candidate bestOfFew() {
        return best(0.0, 1.0, FEW_SAMPLES);
    }

    /** The same for a problem hardly different from one whose optimum is known: it is looked for near that one first. */
    Candidate bestNear(Candidate known) {
        double share = problem.shares(known.values())[0];
        double low = FastMath.max(share - NEAR, 0.0);
        double high = FastMath.min(share + NEAR, 1.0);
        Candidate best = best(low, high, FEW_SAMPLES);
        double found = problem.shares(best.values())[0];
        boolean cut = (found == low && low > 0.0) || (found == high && high < 1.0);
        return best.keepsAll() && !cut ? best : best();
    }

    private Candidate best(double from, double to, int count) {
        List<Sample> samples = new ArrayList<>(IntStream.range(0, count)
                .parallel()
                .mapToObj(i -> sample(from + (to - from) * i / (count - 1)))
                .toList());
        samples.addAll(edges(samples));
        sort(samples);
        samples.addAll(dips(samples, OneVariable::need));
        sort(samples);
        List<Sample> found = new ArrayList<>(samples);
        found.addAll(crossings(samples));
        sort(found);
        found.addAll(dips(found, Candidate::cost));
        return found.stream().map(Sample::candidate).min(Candidate.BETTER_FIRST).orElseThrow();
    }

    /** The violation, no number where there is none: a dip of it is looked for only between places that all violate a limit. */
    private static double need(Candidate candidate) {
        return candidate.keepsAll() ? Double.NaN : FastMath.sqrt(candidate.violation());
    }

    private Sample sample(double share) {
        return new Sample(share, problem.at(share));
    }

    private static void sort(List<Sample> samples) {
        samples.sort(Comparator.comparingDouble(Sample::share));
    }

    /** The last places that make a device, beside places that make none. */
    private List<Sample> edges(List<Sample> samples) {
        List<Sample> edges = new ArrayList<>();
        for (int i = 1; i < samples.size(); i++) {
            Sample in = samples.get(i - 1);
            Sample out = samples.get(i);
            if (in.candidate().trial().there() == out.candidate().trial().there()) {
                continue;
            }
            if (!in.candidate().trial().there()) {
                Sample swapped = in;
                in = out;
                out = swapped;
            }
            for (int k = 0; k < HALVINGS; k++) {
                Sample middle = sample(0.5 * (in.share() + out.share()));
                if (middle.candidate().trial().there()) {
                    in = middle;
                } else {
                    out = middle;
                }
            }
            edges.add(in);
        }
        return edges;
    }

    /** Where a limit is just kept, between a neighbour that keeps it and one that does not. */
    private List<Sample> crossings(List<Sample> samples) {
        List<Sample> found = new ArrayList<>();
        for (int i = 1; i < samples.size(); i++) {
            Sample low = samples.get(i - 1);
            Sample high = samples.get(i);
            if (!low.candidate().trial().there() || !high.candidate().trial().there()) {
                continue;
            }
            for (int c = 0; c < problem.constraints().size(); c++) {
                int constraint = c;
                double before = low.candidate().shortfalls().get(c);
                double after = high.candidate().shortfalls().get(c);
                if (before * after < 0.0) {
                    double share = new BracketingNthOrderBrentSolver(ACCURACY, ACCURACY, 0.0, 5)
                            .solve(
                                    200,
                                    x -> shortfall(x, constraint, before),
                                    low.share(),
                                    high.share(),
                                    AllowedSolution.BELOW_SIDE);
                    found.add(sample(share));
                }
            }
        }
        return found;
    }

    /** Where a place inside makes no device, the limit counts as not kept. */
    private double shortfall(double share, int constraint, double otherwise) {
        Candidate candidate = problem.at(share);
        return candidate.trial().there() ? candidate.shortfalls().get(constraint) : FastMath.abs(otherwise);
    }

    /** Where a measure has a dip between two neighbours of its lowest sample. */
    private List<Sample> dips(List<Sample> samples, ToDoubleFunction<Candidate> measure) {
        List<Sample> found = new ArrayList<>();
        for (int i = 0; i < samples.size(); i++) {
            Sample low = samples.get(FastMath.max(i - 1, 0));
            Sample middle = samples.get(i);
            Sample high = samples.get(FastMath.min(i + 1, samples.size() - 1));
            boolean there = Stream.of(low, middle, high)
                    .allMatch(sample -> sample.candidate().trial().there());
            double here = measure.applyAsDouble(middle.candidate());
            if (!there
                    || !(here <= measure.applyAsDouble(low.candidate()))
                    || !(here <= measure.applyAsDouble(high.candidate()))
                    || low.share() == high.share()
                    || rises(low, middle, high, measure)) {
                continue;
            }
            found.add(sample(new BrentOptimizer(1e-9, 1e-12)
                    .optimize(
                            new MaxEval(300),
                            new UnivariateObjectiveFunction(x -> measureAt(x, measure, here)),
                            GoalType.MINIMIZE,
                            new SearchInterval(low.share(), high.share(), inside(low, middle, high)))
                    .getPoint()));
        }
        return found;
    }

    /** At an end of the range that is lower than its neighbour the dip is that end itself, if the measure rises from there at once. */
    private boolean rises(Sample low, Sample middle, Sample high, ToDoubleFunction<Candidate> measure) {
        if (middle.share() != low.share() && middle.share() != high.share()) {
            return false;
        }
        double inwards = middle.share() == low.share() ? high.share() : low.share();
        Sample beside = sample(middle.share() + AT_ONCE * (inwards - middle.share()));
        return beside.candidate().trial().there()
                && measure.applyAsDouble(beside.candidate()) >= measure.applyAsDouble(middle.candidate());
    }

    private static double inside(Sample low, Sample middle, Sample high) {
        boolean end = middle.share() == low.share() || middle.share() == high.share();
        return end ? 0.5 * (low.share() + high.share()) : middle.share();
    }

    private double measureAt(double share, ToDoubleFunction<Candidate> measure, double start) {
        Candidate candidate = problem.at(share);
        double found = candidate.trial().there() ? measure.applyAsDouble(candidate) : start + FastMath.abs(start) + 1.0;
        return Double.isNaN(found) ? 0.0 : found;
    }
}
