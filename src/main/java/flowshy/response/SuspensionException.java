package flowshy.response;

/** What was stated of a suspension contradicts itself or the physics; the user can mend it. */
public final class SuspensionException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final String key;

    /**
     * A contradiction.
     *
     * @param key key of the study under {@code suspension} that is at fault, e.g. {@code quality}
     * @param message what was found, why it cannot be, what to do
     */
    public SuspensionException(String key, String message) {
        super(message);
        this.key = key;
    }

    /**
     * The key at fault.
     *
     * @return key under {@code suspension}
     */
    public String key() {
        return key;
    }
}
