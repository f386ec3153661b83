package flowshy.verdict.map;

import flowshy.math.Figures;
import org.hipparchus.util.FastMath;

/**
 * One side of a grid: values of a number of the study, evenly spaced or evenly in their logarithm.
 *
 * @param key path of the number, e.g. {@code hair.diameter}, or {@code frequency}
 * @param from first value, in SI
 * @param to last value, above the first
 * @param count how many values, two or more, both ends among them
 * @param logarithmic evenly spaced in the logarithm
 */
public record Axis(String key, double from, double to, int count, boolean logarithmic) {
    /** @throws IllegalArgumentException if the ends are not finite and in order, or a logarithm has no sense there */
    public Axis {
        if (!(from < to) || Double.isInfinite(from) || Double.isInfinite(to)) {
            throw new IllegalArgumentException(key + ": from " + from + " to " + to + " is upside down");
        }
        if (count < 2 || (logarithmic && !(from > 0.0))) {
            throw new IllegalArgumentException(key + ": " + count + " values from " + from + " cannot be spaced so");
        }
    }

    /**
     * A value of the grid. It is rounded to the digits that a table prints, so that whoever types the printed value asks about the same
     * device to the last bit.
     *
     * @param index from zero
     * @return in SI
     */
    public double value(int index) {
        return Double.parseDouble(Figures.full(at(index)));
    }

    /**
     * The value at a place between grid lines.
     *
     * @param place zero at the first value, {@code count − 1} at the last
     * @return in SI
     */
    public double at(double place) {
        double share = place / (count - 1);
        if (Double.compare(share, 1.0) == 0) {
            return to;
        }
        return logarithmic ? from * FastMath.exp(share * FastMath.log(to / from)) : from + (to - from) * share;
    }

    /**
     * The place of a value between grid lines, the inverse of {@link #at}.
     *
     * @param value in SI
     * @return zero at the first value, {@code count − 1} at the last, outside where the value lies outside; NaN where it has no logarithm
     */
    public double place(double value) {
        double share =
                logarithmic ? FastMath.log(value / from) / FastMath.log(to / from) : (value - from) / (to - from);
        return share * (count - 1);
    }
}
