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
}
