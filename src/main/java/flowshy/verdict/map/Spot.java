package flowshy.verdict.map;

/**
 * What is found at one place of a grid.
 *
 * @param value finite, or NaN where there is none
 * @param reason why there is none, or why it counts little: a short clause; empty where a number stands by itself
 */
public record Spot(double value, String reason) {
    /** @throws IllegalArgumentException if the number is infinite, or missing without a reason */
    public Spot {
        if (Double.isInfinite(value) || (Double.isNaN(value) && reason.isEmpty())) {
            throw new IllegalArgumentException("a number or a reason, not " + value + " and '" + reason + "'");
        }
    }

    /**
     * A place with a number.
     *
     * @param value finite
     * @return the spot
     */
    public static Spot of(double value) {
        return new Spot(value, "");
    }

    /**
     * A place without one.
     *
     * @param reason why, a short clause
     * @return the spot
     */
    public static Spot none(String reason) {
        return new Spot(Double.NaN, reason);
    }

    /**
     * Whether there is a number.
     *
     * @return false where there is a reason instead
     */
    public boolean there() {
        return !Double.isNaN(value);
    }
}
