package flowshy.stream.wall;

import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/** Darcy friction factor f = 8 τ_w/(ρU²) of turbulent flow in a smooth pipe; U the mean speed, Re on the (hydraulic) diameter. */
public enum PipeFriction {
    /** 1/√f = 2 lg(Re √f) − 0.8 (Prandtl 1935, Nikuradse’s constants, textbook law; below 4e3 only inside a blend, the flow comes and goes there) */
    PRANDTL(2.3e3, 3.4e7) {
        @Override
        double law(double re) {
            return prandtl(re);
        }
    },
    /** f = 0.3164 Re^(−1/4) (Blasius 1913; textbook law) */
    BLASIUS(4.0e3, 1.0e5) {
        @Override
        double law(double re) {
            return 0.3164 * FastMath.pow(re, -0.25);
        }
    };

    private final double lowest;
    private final double highest;

    PipeFriction(double lowest, double highest) {
        this.lowest = lowest;
        this.highest = highest;
    }

    abstract double law(double re);

    /**
     * Where the law holds.
     *
     * @return range of Re
     */
    public Range range() {
        return new Range("Re", lowest, highest);
    }

    /**
     * Friction factor.
     *
     * @param reynolds Re = UD/ν [-]
     * @return f [-], Darcy's (four times Fanning's)
     * @throws IllegalArgumentException if Re is outside the range
     */
    public double factor(double reynolds) {
        if (!range().contains(reynolds)) {
            throw new IllegalArgumentException("pipe friction holds for " + range() + ", not at " + reynolds);
        }
        return law(reynolds);
    }

    /** With y = 1/√f: y = 2 lg(Re/y) − 0.8, a strong contraction; 40 rounds are far past rounding. */
    private static double prandtl(double reynolds) {
        double y = 8.0;
        for (int i = 0; i < 40; i++) {
            y = 2.0 * FastMath.log10(reynolds / y) - 0.8;
        }
        return 1.0 / (y * y);
    }
}
