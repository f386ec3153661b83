package flowshy.torque.finite;

import java.util.List;
import org.hipparchus.complex.Complex;

/**
 * Forces of the medium on a finite hair on its wall at one frequency, linear theory, time factor e^{+iωt}.
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
