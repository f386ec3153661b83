package flowshy.stream;

/** What kind of surrounding flow a source is. */
public enum SourceKind {
    /** a stream over the wall: draught, wind, the air of a fan */
    STREAM("stream"),
    /** the flow in a duct, with the hair on its wall */
    DUCT("duct"),
    /** an oscillation of one frequency */
    TONE("tone"),
    /** sound over a band */
    SOUND("sound"),
    /** a measured spectrum */
    SPECTRUM("spectrum"),
    /** a measured time record */
    RECORD("record");

    private final String word;

    SourceKind(String word) {
        this.word = word;
    }

    /**
     * The word a study uses.
     *
     * @return stream, duct, tone, sound, spectrum or record
     */
    public String word() {
        return word;
    }
}
