package flowshy.verdict.measured;

import java.util.Arrays;
import java.util.Optional;

/** What of a device was measured by frequency. */
public enum Measurand {
    /** response to motion of the base */
    MOTION("motion"),
    /** response to flow */
    FLOW("flow"),
    /** response to motion over response to flow, at equal acceleration */
    REJECTION("rejection");

    private final String word;

    Measurand(String word) {
        this.word = word;
    }

    /**
     * The word of studies and file heads.
     *
     * @return one word
     */
    public String word() {
        return word;
    }

    /**
     * The measurand of a word.
     *
     * @param word as written
     * @return empty if there is none
     */
    public static Optional<Measurand> of(String word) {
        return Arrays.stream(values()).filter(m -> m.word.equals(word)).findFirst();
    }
}
