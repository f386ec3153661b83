package flowshy.study.keys;

import flowshy.study.text.Node;
import java.util.Map;
import java.util.Optional;

/** What may stand behind a key; each kind reads itself and describes itself. */
public sealed interface Value
        permits Measure, Words, WordOr, Text, TextList, Points, Group, GroupList, GroupMap, Overrides, ByKey {
    /**
     * Its kind in a few words, for the list of keys.
     *
     * @return e.g. {@code length, 1 um to 1 m}
     */
    String kind();

    /**
     * Its JSON Schema (draft 2020-12).
     *
     * @return keywords with their values, ordered
     */
    Map<String, Object> schema();

    /**
     * What may stand behind a key or name one step below.
     *
     * @param name the key, or a name that the user gave
     * @return empty where nothing of that name may stand
     */
    default Optional<Value> below(String name) {
        return Optional.empty();
    }

    /**
     * Reads what was written; fields and problems go to the reading.
     *
     * @param reading collects
     * @param node what stands behind the key
     * @param path of the key
     */
    void read(Reading reading, Node node, String path);
}
