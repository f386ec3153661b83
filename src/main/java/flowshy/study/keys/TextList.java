package flowshy.study.keys;

import flowshy.study.text.Node;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * A list of short texts. The fields get the paths {@code …[0]}, {@code …[1]} and so on.
 *
 * @param item what each is
 * @param example for messages, in brackets
 */
public record TextList(Text item, String example) implements Value {
    private static final int MOST = 50;

    @Override
    public String kind() {
        return "list such as " + example;
    }

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "array");
        schema.put("items", item.schema());
        schema.put("minItems", 1);
        schema.put("maxItems", MOST);
        return schema;
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (!(node instanceof Node.Sequence list)) {
            reading.unfit(node, path, "a list is wanted here, such as " + example);
            return;
        }
        int count = list.items().size();
        if (count < 1 || count > MOST) {
            reading.problem(list.position(), path, count + " entries", "one to " + MOST + " are read");
            return;
        }
        reading.place(path, list.position());
        for (int i = 0; i < count; i++) {
            item.read(reading, list.items().get(i), path + "[" + i + "]");
        }
    }
}
