package flowshy.medium;

/** A parameter is missing that the medium needs, or is given though the medium has none such. */
public final class UnfitParameterException extends MediumException {
    private static final long serialVersionUID = 1L;

    private final boolean missing;

    /**
     * States what does not fit.
     *
     * @param parameter the statement at fault
     * @param missing true if it is missing, false if it is too much
     * @param message what the medium takes
     */
    public UnfitParameterException(MediumParameter parameter, boolean missing, String message) {
        super(parameter, message);
        this.missing = missing;
    }

    /**
     * Which way it does not fit.
     *
     * @return true if the parameter is missing, false if it is too much
     */
    public boolean missing() {
        return missing;
    }
}
