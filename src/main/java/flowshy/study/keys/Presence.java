package flowshy.study.keys;

import java.util.List;

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
        /** an error unless another key stands in its place; {@code value} names them all */
        ONE_OF,
        /** a group whose keys all have their own default */
        IMPLIED
    }

    static final Presence REQUIRED = new Presence(Kind.REQUIRED, "", "");
    static final Presence OPTIONAL = new Presence(Kind.OPTIONAL, "", "");
    static final Presence IMPLIED = new Presence(Kind.IMPLIED, "", "");

    /** The default in a few words. */
    String words() {
        return switch (kind) {
            case REQUIRED -> "required";
            case OPTIONAL -> "optional";
            case ONE_OF -> "one of " + value;
            case IMPLIED -> "by its keys";
            case LIKE -> "as " + value;
            case IF_NEEDED -> value + " if needed";
            case DEFAULT, LEFT_OUT -> value;
        };
    }

    static Presence taken(String value, String why) {
        return new Presence(Kind.DEFAULT, value, why);
    }

    static Presence like(String path, String otherwise) {
        return new Presence(Kind.LIKE, path, otherwise);
    }

    static Presence ifNeeded(String value, String why) {
        return new Presence(Kind.IF_NEEDED, value, why);
    }

    static Presence oneOf(List<String> keys) {
        return new Presence(Kind.ONE_OF, String.join(", ", keys), "");
    }

    static Presence leftOut(String value, String why) {
        return new Presence(Kind.LEFT_OUT, value, why);
    }
}
