package flowshy.response;

import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Response at one frequency.
 *
 * @param frequency [Hz]
 * @param motionTorque torque per acceleration of the base [N·m per m/s²]
 * @param flowTorque torque per acceleration of the fluid outside [N·m per m/s²]
 * @param motion angle per acceleration of the base [rad per m/s²], empty without a suspension
 * @param flow angle per acceleration of the fluid outside [rad per m/s²], empty without a suspension
 * @param womersley a√(ω/ν) of the thickest part [-]
 * @param finiteLength what tip and wall do to the rejection, less that of strip theory [dB]; absent under strip theory, or where no
 *     flow reaches the hair
 * @param thermalNoise acceleration that equals the thermal torque noise [m/s²/√Hz], absent without a suspension
 * @param readoutNoise acceleration that equals the readout noise [m/s²/√Hz], absent unless stated
 */
public record ResponsePoint(
        double frequency,
        Complex motionTorque,
        Complex flowTorque,
        Optional<Complex> motion,
        Optional<Complex> flow,
        double womersley,
        OptionalDouble finiteLength,
        OptionalDouble thermalNoise,
        OptionalDouble readoutNoise) {
    /**
     * Rejection at equal acceleration.
     *
     * @return 20 lg |motion/flow| [dB]; +∞ where no flow reaches the hair
     */
    public double rejection() {
        return 20.0 * FastMath.log10(motionTorque.norm() / flowTorque.norm());
    }

    /**
     * Acceleration of the base that gives the same reading as a flow of unit velocity amplitude.
     *
     * @return ω |T_flow| / |T_motion| [m/s² per m/s]; zero where no flow reaches the hair
     */
    public double equivalent() {
        return 2.0 * FastMath.PI * frequency * flowTorque.norm() / motionTorque.norm();
    }
}
