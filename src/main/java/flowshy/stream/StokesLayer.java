package flowshy.stream;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.SinCos;

/**
 * Oscillating flow along a plane wall, as a share of the free stream.
 *
 * <p>s(z) = 1 − e^{−kz}, k = (1+i)/δ, δ = √(2ν/ω), time factor e^{+iωt}. Source: Stokes 1851, second problem, textbook form. The
 * wall is endless, plane and still; amplitudes keep the layer laminar (Re_δ below about 500, from memory).
 *
 * @param kinematicViscosity ν [m²/s]
 */
public record StokesLayer(double kinematicViscosity) implements WallShare {
    /** Above this height in units of δ the rest, e^{-40}, is a hundredth of a rounding error. */
    private static final double FREE = 40.0;

    /** @throws IllegalArgumentException if the viscosity is not positive */
    public StokesLayer {
        if (!(kinematicViscosity > 0.0)) {
            throw new IllegalArgumentException("kinematic viscosity must be positive, was " + kinematicViscosity);
        }
    }

    /**
     * Layer thickness δ = √(2ν/ω).
     *
     * @param omega angular frequency [rad/s]
     * @return δ [m]
     */
    public double thickness(double omega) {
        return FastMath.sqrt(2.0 * kinematicViscosity / omega);
    }

    @Override
    public Complex share(double height, double omega) {
        return share(height / thickness(omega));
    }

    /**
     * The same by the height in units of the layer, without cancellation near the wall.
     *
     * @param y z/δ [-]
     * @return s [-]
     */
    public static Complex share(double y) {
        if (y > FREE) {
            return Complex.ONE;
        }
        // 1 − e^{−y} cos y = −expm1(−y) + 2 e^{−y} sin²(y/2)
        double rise = -FastMath.expm1(-y);
        double fall = 1.0 - rise;
        SinCos half = FastMath.sinCos(0.5 * y);
        double sine = fall * 2.0 * half.sin();
        return new Complex(rise + sine * half.sin(), sine * half.cos());
    }
}
