package flowshy.hair;

/** How the medium's forces see the length of a hair. */
public enum LengthModel {
    /** strip by strip, each as part of an endless cylinder */
    STRIPS("off"),
    /** strip theory times factors of a solution for the whole hair, with its tip, on its wall */
    FINITE("on");

    private final String word;

    LengthModel(String word) {
        this.word = word;
    }

    /**
     * The word a study uses.
     *
     * @return off or on
     */
    public String word() {
        return word;
    }
}
