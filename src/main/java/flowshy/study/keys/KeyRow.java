package flowshy.study.keys;

import java.util.List;
import java.util.Optional;

/**
 * One line of the list of keys.
 *
 * @param path from the top of the study
 * @param value what may stand there
 * @param defaultWords what happens if it does not, e.g. {@code 20 degC}, {@code required}, {@code optional}; by deciding word where they differ
 * @param words the deciding words of its group under which it is known, e.g. {@code shape: club}; empty if it always is
 * @param condition beside which other word it has a meaning
 * @param meaning one line
 * @param instead empty for a key that is read; else it is known but not built yet, and this says what works instead
 */
public record KeyRow(
        String path,
        Value value,
        String defaultWords,
        List<String> words,
        Optional<Condition> condition,
        String meaning,
        Optional<String> instead) {
    /** Copies the words. */
    public KeyRow {
        words = List.copyOf(words);
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
