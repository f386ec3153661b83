package flowshy.study.keys;

/**
 * What it means when a key is not written.
 *
 * @param kind how it is treated
 * @param value what is taken in its place, as a study would write it; empty if nothing is
 * @param why where that comes from, or what is left out
 */
public record Presence(Kind kind, String value, String why) {
    /** How a missing key is treated. */
    public enum Kind {
        /** an error */
        REQUIRED,
        /** a value is taken and said so */
        DEFAULT,
        /** the value of another key is taken and said so; {@code value} is that key's path, {@code why} what is taken without it */
        LIKE,
        /** a value is taken and said so, but only if what is studied needs it: the study's reader decides */
        IF_NEEDED,
        /** something is left out and said so */
        LEFT_OUT,
        /** nothing follows */
        OPTIONAL,
        /** a group whose keys all have their own default */
        IMPLIED
    }

    static final Presence REQUIRED = new Presence(Kind.REQUIRED, "", "");
    static final Presence OPTIONAL = new Presence(Kind.OPTIONAL, "", "");
    static final Presence IMPLIED = new Presence(Kind.IMPLIED, "", "");

    static Presence taken(String value, String why) {
        return new Presence(Kind.DEFAULT, value, why);
    }

    static Presence like(String path, String otherwise) {
        return new Presence(Kind.LIKE, path, otherwise);
    }

    static Presence ifNeeded(String value, String why) {
        return new Presence(Kind.IF_NEEDED, value, why);
    }

    static Presence leftOut(String value, String why) {
        return new Presence(Kind.LEFT_OUT, value, why);
    }
}
