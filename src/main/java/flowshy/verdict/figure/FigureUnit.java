package flowshy.verdict.figure;

/** Unit of a named quantity: SI for programs, and the one that is printed for people. */
public enum FigureUnit {
    /** mass */
    MASS("kg", "kg"),
    /** volume */
    VOLUME("m3", "m3"),
    /** length, printed in micrometres */
    LENGTH("m", "m", "um", 1e6),
    /** moment of inertia */
    INERTIA("kg.m2", "kg_m2"),
    /** torque per acceleration */
    TORQUE_PER_ACCELERATION("N.m/(m/s2)", "n_m_per_m_s2"),
    /** torsional stiffness */
    STIFFNESS("N.m/rad", "n_m_per_rad"),
    /** frequency */
    FREQUENCY("Hz", "hz"),
    /** level */
    LEVEL("dB", "db"),
    /** angle per acceleration */
    ANGLE_PER_ACCELERATION("rad/(m/s2)", "rad_per_m_s2"),
    /** angle per flow speed */
    ANGLE_PER_SPEED("rad/(m/s)", "rad_per_m_s"),
    /** amplitude density of an acceleration */
    ACCELERATION_NOISE("m/s2/rtHz", "m_s2_per_rthz"),
    /** acceleration */
    ACCELERATION("m/s2", "m_s2"),
    /** acceleration per flow speed */
    ACCELERATION_PER_SPEED("m/s2/(m/s)", "m_s2_per_m_s"),
    /** speed */
    SPEED("m/s", "m_s"),
    /** angle, printed in milliradians */
    ANGLE("rad", "rad", "mrad", 1e3),
    /** pure number */
    NUMBER("", "");

    private final String si;
    private final String suffix;
    private final String shown;
    private final double factor;

    FigureUnit(String si, String suffix) {
        this(si, suffix, si, 1.0);
    }

    FigureUnit(String si, String suffix, String shown, double factor) {
        this.si = si;
        this.suffix = suffix;
        this.shown = shown;
        this.factor = factor;
    }

    /**
     * SI unit.
     *
     * @return as a study would write it, empty for a pure number
     */
    public String si() {
        return si;
    }

    /**
     * End of a name for programs.
     *
     * @return e.g. {@code kg_m2}, empty for a pure number
     */
    public String suffix() {
        return suffix;
    }

    /**
     * Unit that people read.
     *
     * @return e.g. {@code um}, empty for a pure number
     */
    public String shown() {
        return shown;
    }

    /**
     * A value in the unit that people read.
     *
     * @param value in SI
     * @return in {@link #shown}
     */
    public double show(double value) {
        return factor * value;
    }
}
