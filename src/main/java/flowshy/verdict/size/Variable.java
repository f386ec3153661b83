package flowshy.verdict.size;

import org.hipparchus.util.FastMath;

/**
 * A number that may be chosen.
 *
 * @param name path of the number, e.g. {@code hair.diameter}
 * @param from least value, in SI
 * @param to largest value, above the least
 * @param logarithmic whether it is searched evenly in its logarithm
 */
public record Variable(String name, double from, double to, boolean logarithmic) {
    /** @throws IllegalArgumentException if the ends are not finite and in order, or a logarithm has no sense there */
    public Variable {
        if (!(from < to) || Double.isInfinite(from) || Double.isInfinite(to) || (logarithmic && !(from > 0.0))) {
            throw new IllegalArgumentException(name + ": no range from " + from + " to " + to);
        }
    }

    /**
     * The value at a share of the range.
     *
     * @param share 0 to 1
     * @return in SI, the ends exactly at 0 and 1
     */
    double at(double share) {
        if (share <= 0.0 || share >= 1.0) {
            return share <= 0.0 ? from : to;
        }
        double value = logarithmic ? from * FastMath.exp(share * FastMath.log(to / from)) : from + (to - from) * share;
        return FastMath.min(FastMath.max(value, from), to);
    }

    /**
     * The share of the range at which a value lies.
     *
     * @param value in SI
     * @return 0 to 1, a value outside at the nearer end
     */
    double share(double value) {
        if (value <= from || value >= to) {
            return value <= from ? 0.0 : 1.0;
        }
        double share =
                logarithmic ? FastMath.log(value / from) / FastMath.log(to / from) : (value - from) / (to - from);
        return FastMath.min(FastMath.max(share, 0.0), 1.0);
    }

    /**
     * The part of the range near a value.
     *
     * @param value in SI, inside the range
     * @param reach how far it goes to both sides, as a share of the range
     * @return cut at the ends of this range
     */
    Variable near(double value, double reach) {
        double share = share(value);
        return new Variable(name, at(share - reach), at(share + reach), logarithmic);
    }
}
