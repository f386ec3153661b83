package flowshy.verdict.curve;

import flowshy.hair.Moments;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.torque.Torques;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * What turns a hair at one frequency, each part as size [N·m per m/s²]. Those of the flow carry the cover's factor φ, the share of the
 * outer flow that enters.
 *
 * @param inertial torque of the hair's own inertia, less that of the fluid carried along, |ρ_h − ρ| P[1]
 * @param gradient torque of the pressure gradient that drives the flow, |φ| ρ P[1]
 * @param addedMass torque of the flow past the hair in phase with its acceleration, |φ| ρ |Re P[Γs]|
 * @param damping torque of the flow past the hair in phase with its velocity, |φ| ρ |Im P[Γs]|
 * @param motion all of a moving base's torque
 * @param flow all of a moving fluid's torque
 */
public record TorqueParts(
        double inertial, double gradient, double addedMass, double damping, double motion, double flow) {
    /**
     * Takes the torques at a frequency apart.
     *
     * @param response of the device
     * @param frequency [Hz]
     * @return the parts
     */
    public static TorqueParts at(Response response, double frequency) {
        Device device = response.device();
        Torques torques = response.torques(frequency);
        Complex factor = device.cover().factor(torques.omega(), device.around());
        double share = factor.norm();
        double gradient = device.around().density()
                * Moments.of(device.hair().profile(), device.pivotDepth()).first();
        Complex past = torques.flow().subtract(gradient);
        return new TorqueParts(
                FastMath.abs(torques.carried()),
                share * gradient,
                share * FastMath.abs(past.getReal()),
                share * FastMath.abs(past.getImaginary()),
                torques.motion(factor).norm(),
                torques.flow(factor).norm());
    }
}
