package flowshy.verdict.fit;

/**
 * A number that a fit may change.
 *
 * @param key path in the study, or {@code gain}
 * @param kind what it acts on
 * @param unit of its values, SI
 * @param start where the search begins
 * @param least lower bound
 * @param most upper bound
 */
public record Freed(String key, Kind kind, String unit, double start, double least, double most) {
    /** What a free number acts on. */
    public enum Kind {
        /** stiffness of the suspension, as it is held */
        STIFFNESS,
        /** structural damping of the suspension, as it is held */
        DAMPING,
        /** a number of the study that a design space varies */
        STUDY,
        /** gain of the readout of all voltages whose gain is not known */
        VOLTS,
        /** scale of all angles whose scale is not known */
        ANGLES
    }
}
