package flowshy.response;

/** How the hair stands in the field of gravity. */
public enum Attitude {
    /** tip up: the weight of the hair, less its buoyancy, works against the suspension */
    UPRIGHT("upright", -1.0),
    /** tip down: the weight helps the suspension */
    HANGING("hanging", 1.0),
    /** axis level: no gravity stiffness, but a static tilt */
    HORIZONTAL("horizontal", 0.0);

    private final String word;
    private final double sign;

    Attitude(String word, double sign) {
        this.word = word;
        this.sign = sign;
    }

    /**
     * The word a study uses.
     *
     * @return upright, hanging or horizontal
     */
    public String word() {
        return word;
    }

    /**
     * Sign of the gravity stiffness (ρ_h − ρ) g P[1].
     *
     * @return −1, +1 or 0
     */
    public double sign() {
        return sign;
    }
}
