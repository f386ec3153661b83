package flowshy.stream;

/** A source of flow that no law covers in another medium; says why in words. Fills by the dozen are tried, so there is no stack trace. */
public final class UnfitMediumException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * A refusal.
     *
     * @param reason which source, and what its law lacks there
     */
    public UnfitMediumException(String reason) {
        super(reason, null, false, false);
    }
}
