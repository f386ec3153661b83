package flowshy.report;

import java.util.OptionalDouble;

/**
 * One number of a table, or why there is none.
 *
 * @param value finite, or absent
 * @param reason why the value is absent; empty where it is there
 */
public record Cell(OptionalDouble value, String reason) {
    /**
     * A cell for a number that may be infinite or undefined.
     *
     * @param value the number
     * @param reason why it is missing if it is not finite
     * @return the cell
     */
    public static Cell of(double value, String reason) {
        return Double.isFinite(value) ? new Cell(OptionalDouble.of(value), "") : missing(reason);
    }

    /**
     * A cell that may be absent.
     *
     * @param value the number
     * @param reason why it is absent
     * @return the cell
     */
    public static Cell of(OptionalDouble value, String reason) {
        return value.isPresent() ? of(value.getAsDouble(), reason) : missing(reason);
    }

    /**
     * A cell without a number.
     *
     * @param reason why
     * @return the cell
     */
    public static Cell missing(String reason) {
        return new Cell(OptionalDouble.empty(), reason);
    }
}
