package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Something about other numbers of the study, under the path of each: {@code {hair.diameter: …}}, or the same in nested groups. What stands
 * behind a path is kept as text under that path; what it means, whoever knows the whole study says.
 *
 * @param entry what stands behind a path
 */
public record ByKey(Entry entry) implements Value {
    private static final int MOST = 100;

    /** What stands behind a path. */
    enum Entry {
        /** a spread: {@code {sd: 3 %}} or {@code {within: 5 um}}, with {@code keys} under a name of one's own; or a word */
        SPREAD("under paths of numbers, or names of your own with keys: sd, or within, of each") {
            @Override
            boolean ends(Node node, String path) {
                return !(node instanceof Node.Mapping mapping)
                        || Keys.measure(path).isPresent()
                        || mapping.entries().isEmpty()
                        || mapping.entries().stream().anyMatch(e -> SPREAD_KEYS.contains(e.key()));
            }

            @Override
            void read(Reading reading, Node node, String path) {
                // a word of the study's own, such as drag-law: off; a number has points in its path
                if (node instanceof Node.Scalar && path.indexOf('.') == path.lastIndexOf('.')) {
                    Text.LINE.read(reading, node, path);
                } else if (node instanceof Node.Mapping mapping) {
                    mapping.entries().forEach(entry -> readKey(reading, entry, path + "." + entry.key()));
                } else {
                    reading.unfit(
                            node,
                            path,
                            "say which it is: {sd: 3 %}, a standard deviation, or {within: 3 %}, evenly spread that far to both sides");
                }
            }

            private void readKey(Reading reading, Node.Entry entry, String path) {
                if (!SPREAD_KEYS.contains(entry.key())) {
                    reading.unknown(entry, path, SPREAD_KEYS);
                } else if (entry.key().equals(SPREAD_KEYS.get(2))) {
                    LIST.read(reading, entry.value(), path);
                } else {
                    Text.LINE.read(reading, entry.value(), path);
                }
            }
        },
        /** values: a list, or a range in words */
        VALUES("under paths of numbers: a list of values, or a range such as -20 degC..60 degC") {
            @Override
            boolean ends(Node node, String path) {
                return !(node instanceof Node.Mapping) || Keys.measure(path).isPresent();
            }

            @Override
            void read(Reading reading, Node node, String path) {
                if (node instanceof Node.Sequence) {
                    LIST.read(reading, node, path);
                } else if (node instanceof Node.Scalar) {
                    Text.LINE.read(reading, node, path);
                } else {
                    reading.unfit(node, path, "a list of values is wanted here, or a range such as -20 degC..60 degC");
                }
            }
        };

        private final String kind;

        Entry(String kind) {
            this.kind = kind;
        }

        /** Whether this is what belongs to the path, not a group of longer paths. */
        abstract boolean ends(Node node, String path);

        abstract void read(Reading reading, Node node, String path);
    }

    private static final List<String> SPREAD_KEYS = List.of("sd", "within", "keys");
    private static final TextList LIST = new TextList(Text.LINE, "[hair.base-diameter, hair.tip-diameter]");

    @Override
    public String kind() {
        return entry.kind;
    }

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> schema = GroupSchema.map("type", "object");
        schema.put("minProperties", 1);
        schema.put("maxProperties", MOST);
        return schema;
    }

    @Override
    public Optional<Value> below(String name) {
        return Optional.of(this);
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (!(node instanceof Node.Mapping mapping)) {
            reading.unfit(node, path, "paths of numbers are wanted here, " + kind());
            return;
        }
        reading.place(path, mapping.position());
        Map<String, Found> found = new LinkedHashMap<>();
        gather(mapping, "", found);
        if (found.isEmpty() || found.size() > MOST) {
            reading.problem(mapping.position(), path, found.size() + " entries", "one to " + MOST + " are read");
            return;
        }
        found.forEach((name, one) -> {
            String at = path + "." + name;
            if (name.isBlank() || name.codePoints().anyMatch(Printable::isControl) || name.indexOf('=') >= 0) {
                reading.problem(Problem.of(one.position(), path, "no name: " + Printable.of(name), kind()));
            } else {
                reading.place(at, one.position());
                entry.read(reading, one.node(), at);
            }
        });
    }

    private record Found(Node node, Position position) {}

    /** A setting of the command line stands last, nested; it takes the place of the same path in the file. */
    private void gather(Node.Mapping mapping, String above, Map<String, Found> found) {
        for (Node.Entry one : mapping.entries()) {
            String name = above.isEmpty()
                    ? one.key().strip()
                    : above + "." + one.key().strip();
            if (entry.ends(one.value(), name)) {
                found.put(name, new Found(one.value(), one.position()));
            } else {
                gather((Node.Mapping) one.value(), name, found);
            }
        }
    }
}
