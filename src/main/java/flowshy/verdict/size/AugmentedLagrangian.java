package flowshy.verdict.size;

import java.util.Arrays;
import org.hipparchus.exception.MathIllegalStateException;
import org.hipparchus.optim.InitialGuess;
import org.hipparchus.optim.MaxEval;
import org.hipparchus.optim.SimpleBounds;
import org.hipparchus.optim.nonlinear.scalar.GoalType;
import org.hipparchus.optim.nonlinear.scalar.ObjectiveFunction;
import org.hipparchus.optim.nonlinear.scalar.noderiv.BOBYQAOptimizer;
import org.hipparchus.util.FastMath;

/**
 * Local search with limits, in shares of the ranges: L = f + Σ (max(0, λ + ϱ g)² − λ²)/(2ϱ), g ≤ 0 where a limit is kept, minimised within
 * the ranges by quadratic models (BOBYQA, Powell 2009) and repeated with λ ← max(0, λ + ϱ g) (Powell, Hestenes, Rockafellar; Nocedal
 * &amp; Wright 2006, Numerical Optimization, section 17.4). Limits are aimed at with a hair's breadth of {@value #INSIDE} scales to
 * spare, so that the point reached keeps them.
 */
final class AugmentedLagrangian {
    /** Room left to every limit, in its scale; the optimum is that much times the limit's price off. */
    private static final double INSIDE = 1e-8;

    /** Rounds that bring a start close enough to be compared with others, and rounds that leave nothing to be gained. */
    static final int FEW = 6;

    static final int MANY = 25;

    private static final int TRIALS_A_VARIABLE = 100;
    private static final double SETTLED = 1e-9;
    private static final double LARGEST_WEIGHT = 1e7;
    private static final double FINEST = 1e-9;

    private final SizingProblem problem;
    private final double scale;
    private final double wall;
    private Candidate best;
    private double[] lambda;
    private double weight = 10.0;

    /**
     * A search.
     *
     * @param problem two variables or more
     * @param scale of the objective, positive
     * @param wall what a choice that makes no device counts as, in units of the scale: above all else
     */
    AugmentedLagrangian(SizingProblem problem, double scale, double wall) {
        this.problem = problem;
        this.scale = scale;
        this.wall = wall;
        this.lambda = new double[problem.constraints().size()];
    }

    /**
     * Goes from a choice to the best one near it.
     *
     * @param start makes a device
     * @param reach first step, in shares of the ranges
     * @param rounds at most
     * @return never worse than the start
     */
    Candidate from(Candidate start, double reach, int rounds) {
        best = start;
        double[] place = problem.shares(start.values());
        double radius = reach;
        double last = Double.POSITIVE_INFINITY;
        for (int round = 0; round < rounds; round++) {
            double[] before = place;
            place = descend(place, radius);
            double left = raisePrices(place);
            double moved = 0.0;
            for (int i = 0; i < place.length; i++) {
                moved = FastMath.max(moved, FastMath.abs(place[i] - before[i]));
            }
            if (left < SETTLED && moved < SETTLED) {
                break;
            }
            if (left > 0.25 * last && weight < LARGEST_WEIGHT) {
                weight *= 10.0;
            }
            last = left;
            radius = FastMath.max(FastMath.min(0.3 * radius, 3.0 * moved), 1e-5);
        }
        return best;
    }

    /** One round within the ranges: the lowest L met. */
    private double[] descend(double[] start, double radius) {
        int n = start.length;
        double[] low = new double[n];
        double[] high = new double[n];
        Arrays.fill(high, 1.0);
        Lowest lowest = new Lowest(start);
        try {
            new BOBYQAOptimizer(2 * n + 1, radius, FastMath.min(FINEST, 1e-3 * radius))
                    .optimize(
                            new MaxEval(TRIALS_A_VARIABLE * n),
                            new ObjectiveFunction(lowest::at),
                            GoalType.MINIMIZE,
                            new InitialGuess(start),
                            new SimpleBounds(low, high));
        } catch (MathIllegalStateException e) {
            // out of trials, or its model gave out at a kink: what was reached so far counts, the next round goes on
            // from there
            return lowest.place;
        }
        return lowest.place;
    }

    /** Remembers the lowest L of a round. */
    private final class Lowest {
        private double[] place;
        private double value = Double.POSITIVE_INFINITY;

        Lowest(double[] start) {
            place = start.clone();
        }

        double at(double... shares) {
            Candidate candidate = problem.at(shares);
            best = Candidate.better(best, candidate);
            double found = lagrangian(candidate);
            if (found < value) {
                value = found;
                place = shares.clone();
            }
            return found;
        }
    }

    private double lagrangian(Candidate candidate) {
        if (!candidate.trial().there()) {
            return wall;
        }
        double sum = candidate.cost() / scale;
        for (int c = 0; c < lambda.length; c++) {
            double push = FastMath.max(
                    0.0, lambda[c] + weight * (candidate.shortfalls().get(c) + INSIDE));
            sum += (push * push - lambda[c] * lambda[c]) / (2.0 * weight);
        }
        return FastMath.min(sum, wall);
    }

    /** Raises the prices of the limits; returns how far they are from being kept or free. */
    private double raisePrices(double[] place) {
        Candidate candidate = problem.at(place);
        double left = 0.0;
        for (int c = 0; c < lambda.length && candidate.trial().there(); c++) {
            double shortfall = candidate.shortfalls().get(c) + INSIDE;
            left = FastMath.max(left, FastMath.abs(FastMath.max(shortfall, -lambda[c] / weight)));
            lambda[c] = FastMath.max(0.0, lambda[c] + weight * shortfall);
        }
        return left;
    }
}
