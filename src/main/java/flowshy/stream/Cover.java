package flowshy.stream;

/** What stands between the flow outside and the hair. */
public enum Cover {
    /** nothing: the base shakes in fluid that stays still far away, and outside flow reaches the hair over the wall */
    OPEN("open"),
    /** a full, closed cavity: the fluid is carried along with the base, no flow enters */
    SEALED("sealed");

    private final String word;

    Cover(String word) {
        this.word = word;
    }

    /**
     * The word a study uses.
     *
     * @return open or sealed
     */
    public String word() {
        return word;
    }
}
