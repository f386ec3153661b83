package flowshy.study.keys;

import flowshy.study.text.Node;
import java.util.Map;

/** What may stand behind a key; each kind reads itself and describes itself. */
public sealed interface Value permits Measure, Words, Text, Points, Group, GroupList {
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
     * Reads what was written; fields and problems go to the reading.
     *
     * @param reading collects
     * @param node what stands behind the key
     * @param path of the key
     */
    void read(Reading reading, Node node, String path);
}
