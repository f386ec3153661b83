package flowshy.hair;

/** Checks shared by the shapes. */
final class Dimensions {
    private Dimensions() {}

    static void positive(String what, double value) {
        if (!(value > 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + " must be positive and finite, was " + value + " m");
        }
    }

    static void notNegative(String what, double value) {
        if (!(value >= 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + " must be zero or more and finite, was " + value + " m");
        }
    }

    static void slender(double length, double largestRadius) {
        if (!(2.0 * largestRadius <= length)) {
            throw new IllegalArgumentException(
                    "a hair is at least as long as wide; length " + length + " m, radius " + largestRadius + " m");
        }
    }
}
