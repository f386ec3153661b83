package flowshy.medium;

/** A state lies where the table or law of a medium ends; nothing is extrapolated. */
public final class OutOfTableException extends MediumException {
    private static final long serialVersionUID = 1L;

    /** Why a state is refused. */
    public enum Why {
        /** the table or law does not reach so far */
        OUTSIDE,
        /** the liquid would boil */
        BOILS,
        /** the liquid would freeze */
        FREEZES,
        /** the gas would condense */
        CONDENSES
    }

    private final Why why;

    /**
     * States what is refused.
     *
     * @param parameter the statement at fault
     * @param why the reason
     * @param message what was asked for, what is covered, what to do
     */
    public OutOfTableException(MediumParameter parameter, Why why, String message) {
        super(parameter, message);
        this.why = why;
    }

    /**
     * The reason.
     *
     * @return why the state is refused
     */
    public Why why() {
        return why;
    }
}
