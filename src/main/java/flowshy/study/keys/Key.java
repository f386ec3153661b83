package flowshy.study.keys;

import java.util.Optional;

/**
 * A key of the study.
 *
 * @param name the word
 * @param value what may stand behind it
 * @param presence what happens if it is not there
 * @param condition beside which other word it has a meaning, if it depends on one
 * @param meaning one line
 * @param instead empty for a key that is read; else the key is known but not built yet, and this says what works instead
 */
public record Key(
        String name,
        Value value,
        Presence presence,
        Optional<Condition> condition,
        String meaning,
        Optional<String> instead) {
    static Key required(String name, Value value, String meaning) {
        return new Key(name, value, Presence.REQUIRED, Optional.empty(), meaning, Optional.empty());
    }

    static Key optional(String name, Value value, String meaning) {
        return new Key(name, value, Presence.OPTIONAL, Optional.empty(), meaning, Optional.empty());
    }

    static Key of(String name, Value value, Presence presence, String meaning) {
        return new Key(name, value, presence, Optional.empty(), meaning, Optional.empty());
    }

    static Key later(String name, String meaning, String instead) {
        return new Key(name, Text.LINE, Presence.OPTIONAL, Optional.empty(), meaning, Optional.of(instead));
    }

    Key when(Condition needed) {
        return new Key(name, value, presence, Optional.of(needed), meaning, instead);
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
