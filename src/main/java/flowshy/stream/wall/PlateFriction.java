package flowshy.stream.wall;

import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/** Local friction coefficient c_f = τ_w/(½ρU²) of the turbulent layer over a smooth plate, turbulent from the leading edge on. */
public enum PlateFriction {
    /** c_f = 0.455/ln²(0.06 Re_x) (White, Viscous Fluid Flow, from memory); within about 2 % of data over the whole range */
    LOGARITHMIC(1.0e4, 1.0e9) {
        @Override
        double law(double re) {
            return 0.455 / square(FastMath.log(0.06 * re));
        }
    },
    /** c_f = 0.027 Re_x^(−1/7) (Prandtl's one-seventh power, White's constant, from memory); low below 5e5 */
    POWER(1.0e5, 1.0e8) {
        @Override
        double law(double re) {
            return 0.027 * FastMath.pow(re, -1.0 / 7.0);
        }
    };

    private final double lowest;
    private final double highest;

    PlateFriction(double lowest, double highest) {
        this.lowest = lowest;
        this.highest = highest;
    }

    abstract double law(double re);

    /**
     * Where the law holds.
     *
     * @return range of Re_x
     */
    public Range range() {
        return new Range("Re_x", lowest, highest);
    }

    /**
     * Friction coefficient.
     *
     * @param reynolds Re_x = Ux/ν [-]
     * @return c_f [-]
     * @throws IllegalArgumentException if Re_x is outside the range
     */
    public double coefficient(double reynolds) {
        if (!range().contains(reynolds)) {
            throw new IllegalArgumentException("plate friction holds for " + range() + ", not at " + reynolds);
        }
        return law(reynolds);
    }

    /**
     * Friction velocity u_τ = U √(c_f/2).
     *
     * @param speed U [m/s]
     * @param reynolds Re_x [-]
     * @return u_τ [m/s]
     */
    public double frictionVelocity(double speed, double reynolds) {
        return speed * FastMath.sqrt(0.5 * coefficient(reynolds));
    }

    private static double square(double x) {
        return x * x;
    }
}
