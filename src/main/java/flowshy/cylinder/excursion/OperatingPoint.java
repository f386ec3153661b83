package flowshy.cylinder.excursion;

import org.hipparchus.util.FastMath;

/**
 * What the medium does at one strip, all sources together: the velocities relative to the hair about which every source is
 * linearised. Found once per strip; no frequency belongs to it.
 *
 * @param mean Ū, velocity of the mean stream [m/s], of either sign
 * @param deviation σ, rms of all fluctuation [m/s], zero or more
 * @param fluctuation random, or a single tone
 */
public record OperatingPoint(double mean, double deviation, Fluctuation fluctuation) {
    /** Nothing moves: the linear law holds. */
    public static final OperatingPoint REST = new OperatingPoint(0.0, 0.0, Fluctuation.RANDOM);

    /** @throws IllegalArgumentException if the mean is not finite or the deviation is not finite and zero or more */
    public OperatingPoint {
        if (!Double.isFinite(mean)) {
            throw new IllegalArgumentException("mean velocity [m/s] must be finite, was " + mean);
        }
        if (!(deviation >= 0.0) || Double.isInfinite(deviation)) {
            throw new IllegalArgumentException("deviation [m/s] must be finite and zero or more, was " + deviation);
        }
    }

    /**
     * Amplitude of the fluctuation, û = √2 σ.
     *
     * @return û [m/s]
     */
    public double amplitude() {
        return FastMath.sqrt(2.0) * deviation;
    }

    /**
     * The velocity that carries the medium along, max(|Ū|, û).
     *
     * @return [m/s]
     */
    public double carrying() {
        return FastMath.max(FastMath.abs(mean), amplitude());
    }
}
