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

    /** A further sample beside each end, in steps: it shows a turning point that the first or last step would hide. */
    private static final double END = 0.02;

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
        List<Sample> grid = new ArrayList<>(steps + 3);
        for (int i = 0; i <= steps; i++) {
            if (i == steps) {
                grid.add(sample(band.to() * FastMath.exp(-END * span / steps)));
            }
            grid.add(sample(i == steps ? band.to() : band.from() * FastMath.exp(span * i / steps)));
            if (i == 0) {
                grid.add(sample(band.from() * FastMath.exp(END * span / steps)));
            }
        }
        List<Sample> all = new ArrayList<>(grid);
        all.addAll(turningPoints(grid));
        all.sort(Comparator.comparingDouble(Sample::frequency));
        this.samples = List.copyOf(all);
    }

    /** Between a rise and the next fall, or the reverse; equal neighbours between them belong to both. */
    private List<Sample> turningPoints(List<Sample> grid) {
        List<Sample> found = new ArrayList<>();
        double before = 0.0;
        int start = 0;
        for (int i = 1; i < grid.size(); i++) {
            double change = grid.get(i).rejection() - grid.get(i - 1).rejection();
            if (change != 0.0) {
                if (change * before < 0.0) {
                    found.add(turningPoint(grid.get(start), grid.get(i - 1), grid.get(i), before > 0.0));
                }
                before = change;
                start = i - 1;
            }
        }
        return found;
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
        int last = -1; // the last sample that is not on the level itself
        for (int i = 0; i < samples.size(); i++) {
            double here = samples.get(i).rejection() - level;
            if (here == 0.0) {
                continue;
            }
            if (last >= 0 && here * (samples.get(last).rejection() - level) < 0.0) {
                found.add(
                        i == last + 1
                                ? crossing(level, samples.get(last), samples.get(i))
                                : samples.get(last + 1).frequency());
            }
            last = i;
        }
        return found;
    }

    private double crossing(double level, Sample before, Sample after) {
        double low = FastMath.log(before.frequency());
        double high = FastMath.log(after.frequency());
        // at the ends the samples themselves: e^{ln f} is f but for rounding, which may lie beyond the crossing
        DoubleUnaryOperator above = x -> x <= low
                ? before.rejection() - level
                : (x >= high ? after.rejection() : rejection.applyAsDouble(FastMath.exp(x))) - level;
        return FastMath.exp(new BracketingNthOrderBrentSolver(ACCURACY, 5).solve(100, above::applyAsDouble, low, high));
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
