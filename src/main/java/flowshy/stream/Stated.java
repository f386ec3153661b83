package flowshy.stream;

import flowshy.math.Positive;

/**
 * A number of a source with where it comes from.
 *
 * @param key name in a study, e.g. {@code length-scale}
 * @param value SI, positive
 * @param source publication, {@code common practice, no source}, or {@code given in the study}
 * @param assumed whether it was taken for want of better, so that a result has to say what half and twice of it would change
 */
public record Stated(String key, double value, String source, boolean assumed) {
    /** @throws IllegalArgumentException if the value is not positive and finite or no source is named */
    public Stated {
        Positive.check(key, value);
        if (source.isBlank()) {
            throw new IllegalArgumentException(key + " has no source");
        }
    }

    /**
     * A number that the user states.
     *
     * @param key name in a study
     * @param value SI
     * @return the number, not assumed
     */
    public static Stated given(String key, double value) {
        return new Stated(key, value, "given in the study", false);
    }

    /**
     * A number taken for want of better.
     *
     * @param key name in a study
     * @param value SI
     * @param source where it comes from
     * @return the number, assumed
     */
    public static Stated assumed(String key, double value, String source) {
        return new Stated(key, value, source, true);
    }

    /**
     * The same number made larger or smaller.
     *
     * @param factor positive
     * @return the product, source and status kept
     */
    public Stated times(double factor) {
        return new Stated(key, factor * value, source, assumed);
    }
}
