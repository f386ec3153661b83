package flowshy.response;

import flowshy.stream.Cover;
import org.hipparchus.util.FastMath;

/**
 * Where a device's sensitivity to motion is stated.
 *
 * @param frequency [Hz]
 * @param cover that stands over the device while it is calibrated
 */
public record Calibration(double frequency, Cover cover) {
    /** @throws IllegalArgumentException if the frequency is not positive and finite */
    public Calibration {
        if (!(frequency > 0.0) || Double.isInfinite(frequency)) {
            throw new IllegalArgumentException("calibration frequency must be positive, was " + frequency + " Hz");
        }
    }

    /**
     * The device as it stands when calibrated: in the outside medium, or closed with its own fill.
     *
     * @param device in use
     * @return in calibration
     */
    public Device calibrated(Device device) {
        boolean open = cover == Cover.OPEN;
        return new Device(
                device.hair(), device.suspension(), device.outside(), cover, open ? device.outside() : device.around());
    }

    /**
     * Sensitivity in use over sensitivity in calibration, at the calibration frequency; needs no suspension only where both
     * stand in one medium.
     *
     * @param device in use
     * @return ratio of the magnitudes of θ/A [-], or of the torques if no suspension is stated
     */
    public double change(Device device) {
        ResponsePoint use = new Response(device).at(frequency);
        ResponsePoint bench = new Response(calibrated(device)).at(frequency);
        if (use.motion().isPresent() && bench.motion().isPresent()) {
            return use.motion().get().norm() / bench.motion().get().norm();
        }
        return use.motionTorque().norm() / bench.motionTorque().norm();
    }

    /**
     * The same change as a level.
     *
     * @param device in use
     * @return 20 lg of the ratio [dB]
     */
    public double changeLevel(Device device) {
        return 20.0 * FastMath.log10(change(device));
    }
}
