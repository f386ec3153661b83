package flowshy.response;

import flowshy.stream.cover.Cover;
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
        boolean inside = cover.closed();
        return new Device(
                device.hair(),
                device.suspension(),
                device.outside(),
                cover,
                inside ? device.around() : device.outside());
    }

    /**
     * Sensitivity on the bench, and what becomes of it in use.
     *
     * @param device in use
     * @return the figures
     */
    public Figures figures(Device device) {
        return figures(device, calibrated(device));
    }

    /**
     * Sensitivity of one device, and of another against it, at the calibration frequency.
     *
     * @param used the device in use
     * @param standard the device it is compared with
     * @return the figures
     */
    public Figures figures(Device used, Device standard) {
        ResponsePoint use = new Response(used).at(frequency);
        ResponsePoint bench = new Response(standard).at(frequency);
        if (use.motion().isPresent() && bench.motion().isPresent()) {
            double sensitivity = bench.motion().get().norm();
            return new Figures(sensitivity, true, use.motion().get().norm() / sensitivity);
        }
        double torque = bench.motionTorque().norm();
        return new Figures(torque, false, use.motionTorque().norm() / torque);
    }

    /**
     * Sensitivity at the calibration frequency.
     *
     * @param sensitivity on the bench, angle [rad per m/s²] or torque [N·m per m/s²]
     * @param angle true for an angle, false for a torque, where no suspension is stated that holds the hair
     * @param change sensitivity in use over that on the bench [-]
     */
    public record Figures(double sensitivity, boolean angle, double change) {
        /**
         * The change in per cent.
         *
         * @return 100 (change − 1) [%]
         */
        public double percent() {
            return 100.0 * (change - 1.0);
        }

        /**
         * The change as a level.
         *
         * @return 20 lg of the change [dB]
         */
        public double level() {
            return 20.0 * FastMath.log10(change);
        }
    }
}
