package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Groups of one kind under names that the user gives. The fields get the paths {@code surroundings.fan tone.speed} and so on; in the
 * list of keys the name is {@value #NAME}.
 *
 * @param each the group of a name
 */
public record GroupMap(Group each) implements Value {
    /** Stands for a name in the list of keys. */
    static final String NAME = "NAME";

    private static final int MOST = 50;
    private static final int LONGEST = 40;
    /** What parts the words of a path, or a path from its value. */
    private static final String PARTING = ".[]=";

    @Override
    public String kind() {
        return "under names of your own, each a " + each.name();
    }

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> schema = GroupSchema.map("type", "object");
        schema.put("propertyNames", GroupSchema.map("pattern", pattern()));
        schema.put("additionalProperties", each.schema());
        schema.put("minProperties", 1);
        schema.put("maxProperties", MOST);
        return schema;
    }

    @Override
    public Optional<Value> below(String name) {
        return Optional.of(each);
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (!(node instanceof Node.Mapping mapping)) {
            reading.unfit(node, path, "names of your own are wanted here, each with a " + each.name() + " behind it");
            return;
        }
        int count = mapping.entries().size();
        if (count < 1 || count > MOST) {
            reading.problem(mapping.position(), path, count + " names", "one to " + MOST + " are read");
            return;
        }
        reading.place(path, mapping.position());
        List<String> names = new ArrayList<>();
        for (Node.Entry entry : mapping.entries()) {
            String name = entry.key().strip();
            Optional<String> fault = names.contains(name) ? Optional.of("a repeated name") : fault(name);
            if (fault.isPresent()) {
                reading.problem(
                        Problem.of(entry.position(), path, fault.get() + ": " + Printable.of(entry.key()), accepted()));
            } else {
                names.add(name);
                each.read(reading, entry.value(), path + "." + name);
            }
        }
    }

    /** What a name may be. */
    static String accepted() {
        return "a name has up to " + LONGEST + " characters, none of " + String.join(" ", PARTING.split(""));
    }

    /** The pattern of a name, for editors. */
    static String pattern() {
        return "^[^.\\[\\]=]{1," + LONGEST + "}$";
    }

    /** What is wrong with a name that the user gave; empty if it may stand in a path. */
    static Optional<String> fault(String name) {
        if (name.isEmpty()) {
            return Optional.of("an empty name");
        }
        if (name.codePointCount(0, name.length()) > LONGEST) {
            return Optional.of("a name too long");
        }
        if (name.codePoints().anyMatch(Printable::isControl)) {
            return Optional.of("a control character in a name");
        }
        return name.chars().anyMatch(c -> PARTING.indexOf(c) >= 0)
                ? Optional.of("a name that no path can hold")
                : Optional.empty();
    }
}
