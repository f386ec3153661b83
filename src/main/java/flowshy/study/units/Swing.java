package flowshy.study.units;

/** How the strength of something that swings was stated. */
public enum Swing {
    /** the quantity does not swing, or the key does not ask for it */
    NONE(""),
    /** an amplitude without a word: taken as rms */
    ASSUMED_RMS("taken as rms"),
    /** root mean square, said so */
    RMS("rms"),
    /** peak of a sine, said so; divided by √2 to rms */
    PEAK("peak");

    private final String words;

    Swing(String words) {
        this.words = words;
    }

    /**
     * The words a report prints behind the unit.
     *
     * @return empty for {@link #NONE}
     */
    public String words() {
        return words;
    }
}
