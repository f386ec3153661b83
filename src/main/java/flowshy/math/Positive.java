package flowshy.math;

/** Refuses what is no positive finite number. */
public final class Positive {
    private Positive() {}

    /**
     * Checks one value.
     *
     * @param what its name and unit, for the message
     * @param value the value
     * @throws IllegalArgumentException if the value is not positive and finite
     */
    public static void check(String what, double value) {
        if (!(value > 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + " must be positive and finite, was " + value);
        }
    }
}
