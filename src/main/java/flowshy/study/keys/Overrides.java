package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Parts of a study under names that the user gives, each to be laid over the study. Only the names are read here: what a part says can
 * be judged only together with the study under it.
 */
public record Overrides() implements Value {
    private static final int MOST = 50;

    /** Keys that concern the study as a whole. */
    public static final List<String> NOT_HERE = List.of("variants");

    @Override
    public String kind() {
        return "under names of your own, each any part of a study";
    }

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> schema = GroupSchema.map("type", "object");
        schema.put("propertyNames", GroupSchema.map("pattern", GroupMap.pattern()));
        schema.put("additionalProperties", GroupSchema.map("type", "object"));
        schema.put("minProperties", 1);
        schema.put("maxProperties", MOST);
        return schema;
    }

    @Override
    public Optional<Value> below(String name) {
        return Optional.of(Keys.STUDY);
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (!(node instanceof Node.Mapping mapping)) {
            reading.unfit(node, path, "names of your own are wanted here, each with the keys that differ behind it");
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
            Optional<String> fault = names.contains(name) ? Optional.of("a repeated name") : GroupMap.fault(name);
            if (fault.isPresent()) {
                reading.problem(Problem.of(
                        entry.position(), path, fault.get() + ": " + Printable.of(entry.key()), GroupMap.accepted()));
            } else {
                names.add(name);
                part(reading, entry, path + "." + name);
            }
        }
    }

    private static void part(Reading reading, Node.Entry entry, String path) {
        if (!(entry.value() instanceof Node.Mapping part) || part.entries().isEmpty()) {
            reading.unfit(
                    entry.value(), path, "the keys that differ are wanted here, such as hair: {density: 2.2 g/cm3}");
            return;
        }
        reading.place(path, entry.position());
        for (Node.Entry key : part.entries()) {
            if (NOT_HERE.contains(key.key())) {
                reading.problem(
                        key.position(),
                        path + "." + key.key(),
                        "not wanted here",
                        "it belongs to the study as a whole");
            }
        }
    }
}
