package flowshy.stream.turbulence;

import flowshy.math.Positive;
import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/**
 * Turbulence in the core of a developed duct flow, when none is stated.
 *
 * <p>σ/U = 0.16 Re^(−1/8), mixing length l = 0.07 D_h: both common practice of flow simulation, no single source. With the
 * dissipation that goes with that l, ε = 0.09^¾ (1.5σ²)^(3/2)/l, and ours, ε = 0.712 σ³/L, the integral scale is L = 2.36 l = 0.165 D_h (own
 * conversion).
 *
 * @param reynolds Re on mean speed and hydraulic diameter [-]
 * @param hydraulicDiameter D_h [m]
 */
public record DuctTurbulence(double reynolds, double hydraulicDiameter) {
    /** Turbulent duct flow. */
    public static final Range REYNOLDS = new Range("Re", 4.0e3, 1.0e7);

    /** @throws IllegalArgumentException if a value is not positive and finite */
    public DuctTurbulence {
        Positive.check("Reynolds number", reynolds);
        Positive.check("hydraulic diameter [m]", hydraulicDiameter);
    }

    /**
     * Rms over mean speed.
     *
     * @return σ/U [-]
     */
    public double intensity() {
        return 0.16 * FastMath.pow(reynolds, -0.125);
    }

    /**
     * Longitudinal integral scale.
     *
     * @return L [m]
     */
    public double lengthScale() {
        double mixingLength = 0.07 * hydraulicDiameter;
        return 0.712 * mixingLength / (FastMath.pow(0.09, 0.75) * FastMath.pow(1.5, 1.5));
    }
}
