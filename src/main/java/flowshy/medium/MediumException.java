package flowshy.medium;

/** A medium cannot be given as asked; the user can mend it. */
public abstract sealed class MediumException extends RuntimeException
        permits MediumTableException, OutOfTableException, UnfitParameterException, UnknownMediumException {
    private static final long serialVersionUID = 1L;

    private final MediumParameter parameter;

    MediumException(MediumParameter parameter, String message) {
        super(message);
        this.parameter = parameter;
    }

    /**
     * Which statement is at fault, so that a reader can point at its key.
     *
     * @return the parameter
     */
    public MediumParameter parameter() {
        return parameter;
    }
}
