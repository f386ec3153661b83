package flowshy.verdict.lid;

import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.torque.Torques;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Attenuation a cover must give so that a bare device keeps a margin at a frequency.
 *
 * <p>Under a cover of real factor φ = 1/x the motion torque is T_carried − φ T_flow. |q x − 1| = M with q = T_carried/T_flow and
 * M = 10^{margin/20} gives x = [Re q + √(Re² q + |q|²(M² − 1))]/|q|². Own derivation; checked by putting x back.
 *
 * @param frequency [Hz]
 * @param attenuation 20 lg x, not below zero [dB]; infinite where the fluid carried along leaves no motion to read
 */
public record RequiredAttenuation(double frequency, double attenuation) {
    /**
     * Required attenuation at a frequency.
     *
     * @param device its cover is taken off
     * @param margin [dB]
     * @param frequency [Hz]
     * @return the attenuation, at a phase of zero
     */
    static RequiredAttenuation at(Device device, double margin, double frequency) {
        Torques torques = new Response(device.bare()).torques(frequency);
        Complex q = torques.flow().reciprocal().multiply(torques.carried());
        double squared = q.getReal() * q.getReal() + q.getImaginary() * q.getImaginary();
        if (squared == 0.0) {
            return new RequiredAttenuation(frequency, Double.POSITIVE_INFINITY);
        }
        double level = FastMath.pow(10.0, margin / 20.0);
        double root = FastMath.sqrt(FastMath.max(0.0, q.getReal() * q.getReal() + squared * (level * level - 1.0)));
        double x = (q.getReal() + root) / squared;
        return new RequiredAttenuation(frequency, FastMath.max(0.0, 20.0 * FastMath.log10(x)));
    }
}
