package flowshy.stream;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Oscillating flow along a plane wall, as a share of the free stream.
 *
 * <p>s(z) = 1 − e^{−kz}, k = (1+i)/δ, δ = √(2ν/ω), time factor e^{+iωt}. Source: Stokes 1851, second problem, textbook form. The
 * wall is endless, plane and still; amplitudes keep the layer laminar (Re_δ below about 500, from memory).
 *
 * @param kinematicViscosity ν [m²/s]
 */
public record StokesLayer(double kinematicViscosity) {
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

    /**
     * Velocity at a height over that of the free stream.
     *
     * @param height z [m], zero or more
     * @param omega angular frequency [rad/s]
     * @return s(z) [-]
     */
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
        double fall = FastMath.exp(-y);
        double half = FastMath.sin(0.5 * y);
        // 1 − e^{−y} cos y = −expm1(−y) + 2 e^{−y} sin²(y/2)
        return new Complex(-FastMath.expm1(-y) + 2.0 * fall * half * half, fall * FastMath.sin(y));
    }
}
