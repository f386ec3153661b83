package flowshy.hair;

/** How the medium's forces see the length of a hair. */
public enum LengthModel {
    /** strip by strip, each as part of an endless cylinder */
    STRIPS("off", "strip theory"),
    /** strip theory with a repair in closed form: an estimate, microseconds a point */
    ESTIMATE("estimate", "strip theory with a repair for finite length, an estimate"),
    /** strip theory times factors of a solution for the whole hair on its wall, as coarse as one per cent allows */
    AUTO("auto", "the whole hair solved, to one per cent"),
    /** the same on fine meshes and twice as many frequencies */
    FINITE("on", "the whole hair solved, to a few tenths of a per cent");

    private final String word;
    private final String words;

    LengthModel(String word, String words) {
        this.word = word;
        this.words = words;
    }

    /**
     * The model of a study's word.
     *
     * @param word off, estimate, auto or on
     * @return the model
     * @throws IllegalArgumentException for any other word
     */
    public static LengthModel of(String word) {
        for (LengthModel model : values()) {
            if (model.word.equals(word)) {
                return model;
            }
        }
        throw new IllegalArgumentException("no model of length is called " + word);
    }

    /**
     * The word a study uses.
     *
     * @return off, estimate, auto or on
     */
    public String word() {
        return word;
    }

    /**
     * What it is.
     *
     * @return a few words for a report
     */
    public String words() {
        return words;
    }

    /**
     * The model for a walk through many shapes: a solution of tens of milliseconds a shape, taken by default, gives way to the estimate;
     * what was asked for by name stays.
     *
     * @return the estimate in place of auto, else this
     */
    public LengthModel overShapes() {
        return this == AUTO ? ESTIMATE : this;
    }
}
