package flowshy.verdict;

/** What a device reads in a band. */
public enum Reads {
    /** motion of its base, by at least the margin */
    MOTION("motion"),
    /** both, neither by the margin */
    MIXED("mixed"),
    /** flow, by at least the margin */
    FLOW("flow"),
    /** neither: the hair is as dense as the fluid that is carried along */
    NOTHING("nothing"),
    /** a model has ended */
    UNDECIDED("undecided");

    private final String word;

    Reads(String word) {
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
