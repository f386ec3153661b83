package flowshy.study.units;

import java.util.Optional;

/** A text is not a number with a unit of the wanted dimension. */
public final class QuantityException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final String found;
    private final String accepted;
    /** Empty for none: an exception holds plain, serializable parts only. */
    private final String nearest;

    /**
     * A refusal.
     *
     * @param found what was found, plain words without control characters
     * @param accepted what would be right
     * @param nearest unit that was most likely meant, if any
     */
    public QuantityException(String found, String accepted, Optional<String> nearest) {
        super(found + "; " + accepted
                + nearest.map(word -> "; did you mean " + word + "?").orElse(""));
        this.found = found;
        this.accepted = accepted;
        this.nearest = nearest.orElse("");
    }

    /**
     * What was found.
     *
     * @return text without control characters
     */
    public String found() {
        return found;
    }

    /**
     * What would be right.
     *
     * @return a few plain words
     */
    public String accepted() {
        return accepted;
    }

    /**
     * The unit that was most likely meant.
     *
     * @return a unit of the wanted dimension, or any known unit, or nothing
     */
    public Optional<String> nearest() {
        return Optional.of(nearest).filter(word -> !word.isEmpty());
    }
}
