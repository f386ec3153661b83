package flowshy.verdict.size;

import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/**
 * A derivative by differences, checked against that of half the step.
 *
 * @param value change of the one per change of the other, in SI; absent where neither side can be tried
 * @param remark what limits it: a side that could not be tried, a bend; empty if nothing does
 */
public record Slope(OptionalDouble value, String remark) {
    /** Differences of a step and of half of it that agree to this count as one. */
    private static final double AGREEMENT = 0.05;

    /** A derivative taken as zero counts against this share of the function over its argument. */
    private static final double NOTHING = 1e-9;

    /** What is differenced; NaN where there is nothing. */
    @FunctionalInterface
    interface Function {
        double at(double change);
    }

    /**
     * The slope at no change.
     *
     * @param function of the change
     * @param step a change, positive
     * @param below a smaller argument may be tried
     * @param above a larger argument may be tried
     * @return the slope, from both sides where they can be tried
     */
    static Slope of(Function function, double step, boolean below, boolean above) {
        double here = function.at(0.0);
        double high = above ? (function.at(step) - here) / step : Double.NaN;
        double halfHigh = above ? (function.at(0.5 * step) - here) / (0.5 * step) : Double.NaN;
        double low = below ? (here - function.at(-step)) / step : Double.NaN;
        double halfLow = below ? (here - function.at(-0.5 * step)) / (0.5 * step) : Double.NaN;
        double floor = NOTHING * FastMath.abs(here) / step;
        boolean up = Double.isFinite(high) && Double.isFinite(halfHigh);
        boolean down = Double.isFinite(low) && Double.isFinite(halfLow);
        if (up && down) {
            double whole = 0.5 * (high + low);
            double half = 0.5 * (halfHigh + halfLow);
            boolean bend = apart(halfHigh, halfLow, 5.0, floor);
            return new Slope(
                    OptionalDouble.of(half),
                    bend ? "it bends here" : apart(whole, half, 1.0, floor) ? "uneven over the step tried" : "");
        }
        if (up || down) {
            double whole = up ? high : low;
            double half = up ? halfHigh : halfLow;
            // one-sided differences are out by the curvature times the step: half the step, half the error, so the two
            // are extrapolated
            return new Slope(
                    OptionalDouble.of(2.0 * half - whole),
                    (up ? "upward" : "downward") + " only"
                            + (apart(whole, half, 5.0, floor) ? ", uneven over the step tried" : ""));
        }
        return new Slope(OptionalDouble.empty(), "neither side can be tried");
    }

    /** The same with the argument measured in other units. */
    Slope per(double unit) {
        return new Slope(value.isPresent() ? OptionalDouble.of(value.getAsDouble() / unit) : value, remark);
    }

    private static boolean apart(double one, double other, double leniency, double floor) {
        double size = FastMath.max(FastMath.abs(one), FastMath.abs(other));
        return FastMath.abs(one - other) > leniency * AGREEMENT * size + floor;
    }
}
