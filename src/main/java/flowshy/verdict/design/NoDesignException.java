package flowshy.verdict.design;

/** Values that make no device; says why in words. A walk through many designs meets many of these, so there is no stack trace. */
public final class NoDesignException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * A refusal.
     *
     * @param reason what does not go together, one clause
     */
    public NoDesignException(String reason) {
        super(reason, null, false, false);
    }
}
