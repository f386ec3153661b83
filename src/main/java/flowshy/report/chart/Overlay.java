package flowshy.report.chart;

import java.util.List;

/**
 * Measured points drawn over a model's curve.
 *
 * @param name as the user calls it
 * @param of what was measured
 * @param points in the order of frequency
 */
public record Overlay(String name, Of of, List<Point> points) {
    /** What was measured. */
    public enum Of {
        /** rejection [dB] */
        REJECTION,
        /** size of the response to motion [rad per m/s²] */
        MOTION,
        /** size of the response to flow [rad per m/s²] */
        FLOW,
        /** phase of the response to motion [deg] */
        MOTION_PHASE,
        /** phase of the response to flow [deg] */
        FLOW_PHASE
    }

    /**
     * One point.
     *
     * @param frequency [Hz]
     * @param value in the unit of what was measured
     * @param low lower end of its uncertainty, the value itself where none is known
     * @param high upper end
     */
    public record Point(double frequency, double value, double low, double high) {}

    /** Copies the list. */
    public Overlay {
        points = List.copyOf(points);
    }

    /**
     * Points as a panel takes them.
     *
     * @return frequency, value, lower and upper end of each
     */
    public List<List<Double>> rows() {
        return points.stream()
                .map(point -> List.of(point.frequency(), point.value(), point.low(), point.high()))
                .toList();
    }
}
