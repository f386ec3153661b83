package flowshy.stream.cover;

import flowshy.stream.StokesLayer;
import flowshy.stream.WallShare;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Oscillating flow between two plane walls, as a share of the free stream that the same pressure gradient would drive.
 *
 * <p>s(z) = 1 − cosh(k(z − H/2))/cosh(kH/2), k = (1+i)/δ, time factor e^{+iωt}. Source: Womersley 1955 in its plane form,
 * textbook. Evaluated as (1 − e^{−kz})(1 − e^{−k(H−z)})/(1 + e^{−kH}), the same function without cancellation or overflow. The
 * walls are wide, plane and still, the sides open.
 *
 * @param gap H [m]
 * @param kinematicViscosity ν [m²/s]
 */
public record ChannelLayer(double gap, double kinematicViscosity) implements WallShare {
    /** @throws IllegalArgumentException if a parameter is not positive */
    public ChannelLayer {
        if (!(gap > 0.0) || !(kinematicViscosity > 0.0)) {
            throw new IllegalArgumentException(
                    "gap " + gap + " m and kinematic viscosity " + kinematicViscosity + " m2/s must be positive");
        }
    }

    @Override
    public Complex share(double height, double omega) {
        double delta = FastMath.sqrt(2.0 * kinematicViscosity / omega);
        double y = gap / delta;
        double fall = FastMath.exp(-y);
        Complex below = new Complex(1.0 + fall * FastMath.cos(y), -fall * FastMath.sin(y));
        return StokesLayer.share(height / delta)
                .multiply(StokesLayer.share((gap - height) / delta))
                .divide(below);
    }
}
