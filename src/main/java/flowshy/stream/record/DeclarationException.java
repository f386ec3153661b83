package flowshy.stream.record;

/** What was said about a measured file cannot be used. The user can mend it. */
public final class DeclarationException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final String key;
    private final String found;
    private final String accepted;

    /**
     * One fault.
     *
     * @param key columns, quantity, unit, skip, rate or resolution
     * @param found what was said
     * @param accepted what may be said
     */
    public DeclarationException(String key, String found, String accepted) {
        super(key + ": found " + found + "; accepted: " + accepted);
        this.key = key;
        this.found = found;
        this.accepted = accepted;
    }

    /**
     * Which statement.
     *
     * @return columns, quantity, unit, skip, rate or resolution
     */
    public String key() {
        return key;
    }

    /**
     * What was said.
     *
     * @return in quotes, with the reason where there is one
     */
    public String found() {
        return found;
    }

    /**
     * What may be said.
     *
     * @return a list or a sentence
     */
    public String accepted() {
        return accepted;
    }
}
