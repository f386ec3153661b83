package flowshy.torque.finite;

import java.util.List;
import org.hipparchus.complex.Complex;

/**
 * Forces of the medium on a finite hair on its wall at one frequency, linear theory, time factor e^{+iωt}.
 *
 * <p>All act on the wetted surface; the foot is dry. The pressure alone that carries a free stream of acceleration A has there
 * the moment ρA (∫ πa² (z+h) dz − πa₀⁴/4), a₀ the radius at the wall: with it, and not with the displaced fluid's moment alone,
 * a shaken wall and a stream add up exactly. The last term is 0.12 % of the first at length over diameter 10, 12 % at 1.
 *
 * @param omega angular frequency [rad/s]
 * @param stream hair and wall fixed in an oscillating stream along the wall, per unit velocity of the free stream
 * @param rocking hair turning about the pivot in still medium, per unit angular velocity; real part negative (damping)
 * @param streamFactor torque of the stream over that of strip theory without slip [-]
 * @param rockingFactor torque of rocking over that of strip theory without slip [-]
 * @param slices force along the hair, from the wall to the tip
 */
public record FiniteTorques(
        double omega,
        FluidLoad stream,
        FluidLoad rocking,
        Complex streamFactor,
        Complex rockingFactor,
        List<ForceSlice> slices) {
    /** Copies the slices. */
    public FiniteTorques {
        slices = List.copyOf(slices);
    }

    /**
     * The two factors with their errors.
     *
     * @return factors on strip theory
     */
    public FiniteFactors factors() {
        return new FiniteFactors(streamFactor, rockingFactor, stream.torqueError(), rocking.torqueError());
    }
}
