package flowshy.study.keys;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * Sets of starting values that a group may take by one word; any key that is written overrides its own.
 *
 * @param key the key that names the set, one of {@link Words}
 * @param sets what the keys of the group are by each word, as taken when they are not written
 */
record Starts(String key, Map<String, Map<String, Presence>> sets) {
    Starts {
        Map<String, Map<String, Presence>> copies = new LinkedHashMap<>();
        sets.forEach((word, set) -> copies.put(word, new LinkedHashMap<>(set)));
        sets = copies;
    }

    /** What a set says of a key. */
    Optional<Presence> of(String word, String wanted) {
        return Optional.ofNullable(sets.getOrDefault(word, Map.of()).get(wanted));
    }
}
