package flowshy.study.keys;

import flowshy.study.text.Node;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * A list whose entries are groups of one kind. The fields get the paths {@code …[0].kind}, {@code …[1].kind} and so on.
 *
 * @param each the group of an entry
 */
public record GroupList(Group each) implements Value {
    private static final int MOST = 50;

    @Override
    public String kind() {
        return "list, each a " + each.name() + ": " + each.kind();
    }

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "array");
        schema.put("items", each.schema());
        schema.put("minItems", 1);
        schema.put("maxItems", MOST);
        return schema;
    }

    @Override
    public Optional<Value> below(String name) {
        return each.below(name);
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (!(node instanceof Node.Sequence list)) {
            reading.unfit(node, path, "a list is wanted here, such as [open, sealed]");
            return;
        }
        int count = list.items().size();
        if (count < 1 || count > MOST) {
            reading.problem(list.position(), path, count + " entries", "one to " + MOST + " are read");
            return;
        }
        reading.place(path, list.position());
        for (int i = 0; i < count; i++) {
            each.read(reading, list.items().get(i), path + "[" + i + "]");
        }
    }
}
