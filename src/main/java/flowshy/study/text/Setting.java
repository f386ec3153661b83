package flowshy.study.text;

import java.util.List;

/**
 * One change of a study from outside its file: {@code hair.diameter=90 um}, {@code cover={kind: sealed}}.
 *
 * @param path the key's words, from the top
 * @param value the new value
 * @param position what to print as its place
 */
public record Setting(List<String> path, Node value, Position position) {
    private static final int DEEPEST = 16;

    /** Copies the path. */
    public Setting {
        path = List.copyOf(path);
    }

    /**
     * Reads a setting of the command line.
     *
     * @param option the option's name, e.g. {@code --set}
     * @param text key path, equals sign, value; a value in braces, brackets or quotes is read as YAML
     * @return the setting
     * @throws StudyException if there is no key or no value, or the value is not readable
     */
    public static Setting read(String option, String text) {
        int equals = text.indexOf('=');
        String key = equals < 0 ? text.strip() : text.substring(0, equals).strip();
        Position position = Position.label(option + " " + Printable.of(key));
        if (equals < 0 || key.isEmpty()) {
            throw new StudyException(Problem.of(position, "", "no KEY=VALUE", "for example hair.diameter=90 um"));
        }
        Problems problems = new Problems();
        List<String> path = List.of(key.split("\\.", -1));
        if (path.size() > DEEPEST) {
            problems.add(position, "", "a key of " + path.size() + " words", "no key lies so deep");
        }
        for (int i = 0; i < text.length(); i++) {
            if (Character.isISOControl(text.charAt(i))) {
                problems.add(position, "", "control character in the value", "plain text only");
                break;
            }
        }
        problems.throwIfAny();
        Node value = value(text.substring(equals + 1).strip(), position, problems);
        problems.throwIfAny();
        return new Setting(path, value, position);
    }

    private static Node value(String text, Position position, Problems problems) {
        boolean yaml = text.startsWith("{") || text.startsWith("[") || text.startsWith("'") || text.startsWith("\"");
        return yaml ? TreeReader.value(position, text, problems) : new Node.Scalar(text, position);
    }
}
