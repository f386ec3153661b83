package flowshy.verdict;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.optim.MaxEval;
import org.hipparchus.optim.nonlinear.scalar.GoalType;
import org.hipparchus.optim.univariate.BrentOptimizer;
import org.hipparchus.optim.univariate.SearchInterval;
import org.hipparchus.optim.univariate.UnivariateObjectiveFunction;
import org.hipparchus.optim.univariate.UnivariatePointValuePair;
import org.hipparchus.util.FastMath;

/**
 * Rejection over a band, sampled evenly in the logarithm of frequency, with every turning point found; crossings of a level
 * are then located to 1e-9 relative.
 */
final class RejectionCurve {
    private static final double POINTS_A_DECADE = 100.0;
    private static final int LEAST_POINTS = 40;
    private static final double ACCURACY = 1e-10;

    /**
     * One sample.
     *
     * @param frequency [Hz]
     * @param rejection [dB]
     */
    record Sample(double frequency, double rejection) {}

    private final DoubleUnaryOperator rejection;
    private final List<Sample> samples;

    /**
     * Samples a curve.
     *
     * @param rejection rejection [dB] by frequency [Hz], finite over the band
     * @param band the band, both ends sampled
     */
    RejectionCurve(DoubleUnaryOperator rejection, Band band) {
        this.rejection = rejection;
        double span = FastMath.log(band.to() / band.from());
        int steps = FastMath.max(LEAST_POINTS, (int) FastMath.ceil(POINTS_A_DECADE * span / FastMath.log(10.0)));
        List<Sample> grid = new ArrayList<>(steps + 1);
        for (int i = 0; i <= steps; i++) {
            double frequency = i == steps ? band.to() : band.from() * FastMath.exp(span * i / steps);
            grid.add(sample(frequency));
        }
        List<Sample> all = new ArrayList<>(grid);
        for (int i = 1; i < steps; i++) {
            double before = grid.get(i).rejection() - grid.get(i - 1).rejection();
            double after = grid.get(i + 1).rejection() - grid.get(i).rejection();
            if (before * after < 0.0) {
                all.add(turningPoint(grid.get(i - 1), grid.get(i), grid.get(i + 1), before > 0.0));
            }
        }
        all.sort(Comparator.comparingDouble(Sample::frequency));
        this.samples = List.copyOf(all);
    }

    /**
     * All samples.
     *
     * @return rising in frequency, turning points included
     */
    List<Sample> samples() {
        return samples;
    }

    /**
     * Least rejection in the band.
     *
     * @return the sample
     */
    Sample least() {
        return samples.stream()
                .min(Comparator.comparingDouble(Sample::rejection))
                .orElseThrow();
    }

    /**
     * Largest rejection in the band.
     *
     * @return the sample
     */
    Sample largest() {
        return samples.stream()
                .max(Comparator.comparingDouble(Sample::rejection))
                .orElseThrow();
    }

    /**
     * Frequencies at which the curve crosses a level.
     *
     * @param level [dB]
     * @return frequencies [Hz], rising, to 1e-9 relative
     */
    List<Double> crossings(double level) {
        List<Double> found = new ArrayList<>();
        for (int i = 1; i < samples.size(); i++) {
            double below = samples.get(i - 1).rejection() - level;
            double above = samples.get(i).rejection() - level;
            if (below * above < 0.0) {
                double low = FastMath.log(samples.get(i - 1).frequency());
                double high = FastMath.log(samples.get(i).frequency());
                double root = new BracketingNthOrderBrentSolver(ACCURACY, 5)
                        .solve(100, x -> rejection.applyAsDouble(FastMath.exp(x)) - level, low, high);
                found.add(FastMath.exp(root));
            }
        }
        return found;
    }

    private Sample turningPoint(Sample before, Sample middle, Sample after, boolean top) {
        UnivariatePointValuePair best = new BrentOptimizer(ACCURACY, ACCURACY)
                .optimize(
                        new MaxEval(200),
                        new UnivariateObjectiveFunction(x -> rejection.applyAsDouble(FastMath.exp(x))),
                        top ? GoalType.MAXIMIZE : GoalType.MINIMIZE,
                        new SearchInterval(
                                FastMath.log(before.frequency()),
                                FastMath.log(after.frequency()),
                                FastMath.log(middle.frequency())));
        return new Sample(FastMath.exp(best.getPoint()), best.getValue());
    }

    private Sample sample(double frequency) {
        return new Sample(frequency, rejection.applyAsDouble(frequency));
    }
}
