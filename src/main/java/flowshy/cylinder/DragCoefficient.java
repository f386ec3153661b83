package flowshy.cylinder;

import flowshy.math.BesselK;
import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/**
 * Drag coefficient of a long circular cylinder across a steady stream, C_d = f/(½ρ d u²), Re on the diameter.
 *
 * <p>Three laws, joined by smooth steps in ln C_d over ln Re, so that C_d and its slope are continuous and the drag rises with
 * speed everywhere:
 * <ul>
 *   <li>Re below 0.1: Kaplun 1957, C_d = 8π/Re (ε − 0.8669 ε³), ε = 1/(½ − γ − ln(Re/8)) (from memory; within 0.1 % of the
 *       solution below for Re ≤ 0.1);
 *   <li>0.3 to 40: a quartic in ln Re through our own steady two-dimensional Navier-Stokes solution, within 0.15 %;
 *   <li>above 160: Sucker &amp; Brauer 1975, C_d = 1.18 + 6.8 Re^-0.89 + 1.96 Re^-0.5 − 0.0004 Re/(1 + 3.64e-7 Re²) (coefficients
 *       seen in public code, credited there to a textbook).
 * </ul>
 * Measured drag scatters about it by 10 % below Re = 40 and 5 to 8 % above ({@link #uncertainty}); it lies up to 10 % above the
 * two-dimensional solution for 0.3 &lt; Re &lt; 13. The free end of a short cylinder matters more than this.
 */
public final class DragCoefficient {
    /** Where the law may be used: from creeping flow to the end of the subcritical range. */
    public static final Range REYNOLDS = new Range("Re", 0.0, 1e5);

    /** End of Sucker and Brauer's own range; evaluated up to here so that the tails of a gusty stream can be averaged. */
    private static final double EVALUATED_TO = 2e5;

    private static final double SLOW_END = 0.1;
    private static final double FIT_BEGIN = 0.3;
    private static final double FIT_END = 40.0;
    private static final double FAST_BEGIN = 160.0;

    private static final double KAPLUN = 0.8669;

    private static final double[] QUARTIC = {2.33540123, -0.660909996, 0.0361051436, 0.00162837272, -0.000325889371};

    private DragCoefficient() {}

    /**
     * The drag coefficient.
     *
     * @param reynolds Re = u d/ν, above 0, at most 2e5; stated for {@link #REYNOLDS}
     * @return C_d [-]
     * @throws IllegalArgumentException if Re is not above 0 and at most 2e5
     */
    public static double of(double reynolds) {
        return FastMath.exp(logarithm(reynolds).value);
    }

    /**
     * Logarithmic slope d ln C_d / d ln Re, above −1: the drag rises with speed.
     *
     * @param reynolds Re = u d/ν, above 0, at most 2e5
     * @return slope [-]
     * @throws IllegalArgumentException if Re is not above 0 and at most 2e5
     */
    public static double slope(double reynolds) {
        return logarithm(reynolds).slope;
    }

    /**
     * How far measured drag of long cylinders scatters about the law: handbook points about its binned means.
     *
     * @param reynolds Re in {@link #REYNOLDS}
     * @return relative standard uncertainty [-]
     * @throws IllegalArgumentException if Re lies outside the range
     */
    public static double uncertainty(double reynolds) {
        if (!REYNOLDS.contains(reynolds)) {
            throw new IllegalArgumentException("drag is stated for " + REYNOLDS + ", was " + reynolds);
        }
        if (reynolds <= FIT_END) {
            return 0.10;
        }
        return reynolds <= 3e4 ? 0.05 : 0.08;
    }

    /** ln C_d and its slope over ln Re. */
    record Logarithm(double value, double slope) {
        /** Smooth step from this law to the next as x = ln Re goes from one end to the other. */
        Logarithm blended(Logarithm next, double x, double from, double to) {
            double width = FastMath.log(to / from);
            double t = (x - FastMath.log(from)) / width;
            double weight = t * t * (3.0 - 2.0 * t);
            double weightSlope = 6.0 * t * (1.0 - t) / width;
            double step = next.value - value;
            return new Logarithm(value + weight * step, slope + weight * (next.slope - slope) + weightSlope * step);
        }
    }

    static Logarithm logarithm(double reynolds) {
        if (!(reynolds > 0.0 && reynolds <= EVALUATED_TO)) {
            throw new IllegalArgumentException("Re must be above 0 and at most " + EVALUATED_TO + ", was " + reynolds);
        }
        double x = FastMath.log(reynolds);
        if (reynolds <= SLOW_END) {
            return kaplun(x);
        }
        if (reynolds < FIT_BEGIN) {
            return kaplun(x).blended(quartic(x), x, SLOW_END, FIT_BEGIN);
        }
        if (reynolds <= FIT_END) {
            return quartic(x);
        }
        if (reynolds < FAST_BEGIN) {
            return quartic(x).blended(suckerBrauer(reynolds), x, FIT_END, FAST_BEGIN);
        }
        return suckerBrauer(reynolds);
    }

    private static Logarithm kaplun(double x) {
        double epsilon = 1.0 / (0.5 - BesselK.EULER_GAMMA - x + FastMath.log(8.0));
        double correction = KAPLUN * epsilon * epsilon;
        // dε/dx = ε²
        return new Logarithm(
                FastMath.log(8.0 * FastMath.PI * epsilon * (1.0 - correction)) - x,
                -1.0 + epsilon * (1.0 - 3.0 * correction) / (1.0 - correction));
    }

    private static Logarithm quartic(double x) {
        double value = 0.0;
        double slope = 0.0;
        for (int n = QUARTIC.length - 1; n >= 0; n--) {
            slope = slope * x + value;
            value = value * x + QUARTIC[n];
        }
        return new Logarithm(value, slope);
    }

    private static Logarithm suckerBrauer(double reynolds) {
        double slow = 6.8 * FastMath.pow(reynolds, -0.89);
        double middle = 1.96 / FastMath.sqrt(reynolds);
        double below = 1.0 + 3.64e-7 * reynolds * reynolds;
        double dip = -0.0004 * reynolds / below;
        double value = 1.18 + slow + middle + dip;
        double slope = -0.89 * slow - 0.5 * middle + dip * (2.0 / below - 1.0);
        return new Logarithm(FastMath.log(value), slope / value);
    }
}
