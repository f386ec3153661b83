package flowshy.verdict.figure;

/** Which way a quantity is good. */
public enum Sense {
    /** more is better: a limit is a least value */
    AT_LEAST("at-least"),
    /** less is better: a limit is a largest value */
    AT_MOST("at-most"),
    /** neither by itself */
    NONE("none");

    private final String word;

    Sense(String word) {
        this.word = word;
    }

    /**
     * The word a study uses.
     *
     * @return at-least, at-most or none
     */
    public String word() {
        return word;
    }

    /**
     * The word as it stands before a number.
     *
     * @return at least, at most or none
     */
    public String words() {
        return word.replace('-', ' ');
    }

    /**
     * Whether a value keeps a limit of this sense.
     *
     * @param value found
     * @param limit asked
     * @return true if so; false for a value that is not a number
     * @throws IllegalStateException for {@link #NONE}, which sets no limit
     */
    public boolean keeps(double value, double limit) {
        return switch (this) {
            case AT_LEAST -> value >= limit;
            case AT_MOST -> value <= limit;
            case NONE -> throw new IllegalStateException("a limit needs a sense");
        };
    }
}
