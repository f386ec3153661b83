package flowshy.study.keys;

import java.util.List;
import java.util.Optional;

/**
 * One line of the list of keys.
 *
 * @param path from the top of the study
 * @param value what may stand there
 * @param presence what happens if it does not
 * @param words the deciding words of its group under which it is known, e.g. {@code shape: club}; empty if it always is
 * @param condition beside which other word it has a meaning
 * @param meaning one line
 * @param instead empty for a key that is read; else it is known but not built yet, and this says what works instead
 */
public record KeyRow(
        String path,
        Value value,
        Presence presence,
        List<String> words,
        Optional<Condition> condition,
        String meaning,
        Optional<String> instead) {
    /** Copies the words. */
    public KeyRow {
        words = List.copyOf(words);
    }

    /**
     * The default in a few words.
     *
     * @return e.g. {@code 20 degC}, {@code required}, {@code optional}
     */
    public String defaultWords() {
        return switch (presence.kind()) {
            case REQUIRED -> "required";
            case OPTIONAL -> "optional";
            case IMPLIED -> "by its keys";
            case LIKE -> "as " + presence.value();
            case IF_NEEDED -> presence.value() + " if needed";
            case DEFAULT, LEFT_OUT -> presence.value();
        };
    }

    /**
     * Whether this version reads it.
     *
     * @return false for a key that is only known
     */
    public boolean built() {
        return instead.isEmpty();
    }
}
