package flowshy.verdict.fit;

/** A fit that cannot be made, in words for the user: what is missing or why it fails, and what to do. */
public final class FitException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * A fit that cannot be made.
     *
     * @param message what was found and what would do
     */
    public FitException(String message) {
        super(message);
    }
}
