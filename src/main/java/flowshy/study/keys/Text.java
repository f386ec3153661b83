package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Printable;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Free text of one line.
 *
 * @param kind what it is, for the list of keys
 * @param longest most characters
 */
public record Text(String kind, int longest) implements Value {
    /** A line of a title or a form. */
    static final Text LINE = new Text("text", 200);

    /** Name of a file, beside the study unless it is absolute. */
    static final Text FILE = new Text("file name", 500);

    /** Name of a medium; which there are, the medium tables say. */
    static final Text MEDIUM = new Text("name of a medium", 100);

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", List.of("string", "number"));
        return schema;
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (!(node instanceof Node.Scalar scalar) || scalar.text().isBlank()) {
            reading.unfit(node, path, kind + " is wanted here");
        } else if (scalar.text().codePoints().anyMatch(Printable::isControl)) {
            reading.problem(scalar.position(), path, "control character in the text", "one line of plain text");
        } else if (scalar.text().length() > longest) {
            reading.problem(scalar.position(), path, scalar.text().length() + " characters", "at most " + longest);
        } else {
            reading.field(path, scalar, Optional.empty());
        }
    }
}
