package flowshy.study.keys;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A word of a group that decides which further keys it has.
 *
 * @param key the deciding key, one of {@link Words}
 * @param keys the further keys of each word that is read
 */
record Selector(Key key, Map<String, List<Key>> keys) {
    /** The words under which a key is known. */
    List<String> wordsOf(String name) {
        List<String> words = new ArrayList<>();
        keys.forEach((word, list) -> {
            if (list.stream().anyMatch(k -> k.name().equals(name))) {
                words.add(word);
            }
        });
        return words;
    }

    /** The further keys of a word, none for a word that is not known. */
    List<Key> of(String word) {
        return keys.getOrDefault(word, List.of());
    }

    /** The word taken when none is written. */
    Optional<String> usual() {
        return Optional.of(key.presence().value()).filter(word -> !word.isEmpty());
    }
}
