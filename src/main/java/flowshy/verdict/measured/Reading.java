package flowshy.verdict.measured;

/**
 * In what a response was read.
 *
 * @param volts whether it was read behind a readout [V], not as an angle [rad]
 * @param perSpeed whether it counts per speed [m/s], not per acceleration [m/s²]
 */
public record Reading(boolean volts, boolean perSpeed) {
    /** A ratio of two responses, which has no unit. */
    public static final Reading RATIO = new Reading(false, false);

    /**
     * The unit of its amplitudes.
     *
     * @return e.g. {@code V/(m/s2)}
     */
    public String unit() {
        return (volts ? "V" : "rad") + (perSpeed ? "/(m/s)" : "/(m/s2)");
    }
}
