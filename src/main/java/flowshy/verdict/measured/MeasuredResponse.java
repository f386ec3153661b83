package flowshy.verdict.measured;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A measured frequency response.
 *
 * @param name under which it is reported
 * @param of what was measured
 * @param reading in what; of a rejection {@link Reading#RATIO}
 * @param gain of the readout, negative where it turns the sense round [V/rad, or rad/rad for an angle]; absent if it is not known, and is
 *     then the same for all responses of which it is not
 * @param points rising in frequency, two or more
 */
public record MeasuredResponse(
        String name, Measurand of, Reading reading, OptionalDouble gain, List<MeasuredPoint> points) {
    /** @throws IllegalArgumentException if there are fewer than two points, they do not rise, or the gain is zero */
    public MeasuredResponse {
        points = List.copyOf(points);
        if (points.size() < 2) {
            throw new IllegalArgumentException(name + ": two points or more are needed");
        }
        for (int i = 1; i < points.size(); i++) {
            if (!(points.get(i).frequency() > points.get(i - 1).frequency())) {
                throw new IllegalArgumentException(name + ": frequencies must rise, point " + (i + 1));
            }
        }
        if (gain.isPresent() && (gain.getAsDouble() == 0.0 || !Double.isFinite(gain.getAsDouble()))) {
            throw new IllegalArgumentException(name + ": a gain of " + gain.getAsDouble());
        }
    }

    /**
     * Whether every point has its uncertainty.
     *
     * @return true if so
     */
    public boolean certain() {
        return points.stream().allMatch(point -> point.uncertainty().isPresent());
    }

    /**
     * Whether every point has a phase.
     *
     * @return true if so
     */
    public boolean phased() {
        return points.stream().allMatch(point -> point.phase().isPresent());
    }
}
