package flowshy.verdict;

/** How a limit, or a whole study, comes out. */
public enum Decision {
    /** every limit is met */
    MEETS("meets"),
    /** a limit is not met */
    FAILS("fails"),
    /** a limit rests on a value whose model has ended */
    UNDECIDED("undecided"),
    /** no limit was stated, or what it needs was not */
    NOT_ASKED("not-asked");

    private final String word;

    Decision(String word) {
        this.word = word;
    }

    /**
     * The word printed.
     *
     * @return one lower-case word
     */
    public String word() {
        return word;
    }

    /**
     * How bad it is.
     *
     * @return 0 not asked, 1 meets, 2 undecided, 3 fails
     */
    public int severity() {
        return switch (this) {
            case NOT_ASKED -> 0;
            case MEETS -> 1;
            case UNDECIDED -> 2;
            case FAILS -> 3;
        };
    }

    /**
     * The worse of two.
     *
     * @param other another
     * @return this or the other
     */
    public Decision worse(Decision other) {
        return other.severity() > severity() ? other : this;
    }
}
