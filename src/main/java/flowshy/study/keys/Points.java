package flowshy.study.keys;

import flowshy.study.text.Node;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A list of pairs, each in brackets. The fields get the paths {@code …[0].z}, {@code …[0].diameter} and so on.
 *
 * @param first the first of a pair; its name ends the path
 * @param second the second of a pair
 */
public record Points(Key first, Key second) implements Value {
    private static final int MOST = 1000;

    @Override
    public String kind() {
        return "list of pairs [" + first.name() + ", " + second.name() + "]";
    }

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> pair = new LinkedHashMap<>();
        pair.put("type", "array");
        pair.put("prefixItems", List.of(first.value().schema(), second.value().schema()));
        pair.put("minItems", 2);
        pair.put("maxItems", 2);
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "array");
        schema.put("items", pair);
        schema.put("minItems", 2);
        schema.put("maxItems", MOST);
        return schema;
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (!(node instanceof Node.Sequence list)) {
            reading.unfit(node, path, "a list of pairs is wanted here, such as [0 um, 90 um]");
            return;
        }
        int count = list.items().size();
        if (count < 2 || count > MOST) {
            reading.problem(list.position(), path, count + " pairs", "two to " + MOST + " are read");
            return;
        }
        reading.place(path, list.position());
        for (int i = 0; i < count; i++) {
            String at = path + "[" + i + "]";
            if (list.items().get(i) instanceof Node.Sequence pair
                    && pair.items().size() == 2) {
                first.value().read(reading, pair.items().get(0), at + "." + first.name());
                second.value().read(reading, pair.items().get(1), at + "." + second.name());
            } else {
                Node item = list.items().get(i);
                reading.unfit(item, at, "a pair [" + first.name() + ", " + second.name() + "] is wanted here");
            }
        }
    }
}
