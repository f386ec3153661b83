package flowshy.stream.turbulence;

/** Refuses what is no positive finite number. */
final class Positive {
    private Positive() {}

    static void check(String what, double value) {
        if (!(value > 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + " must be positive and finite, was " + value);
        }
    }
}
