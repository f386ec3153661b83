package flowshy.study.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.common.FlowStyle;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;

/**
 * Changes single values in the text of a study and leaves every other character as it stands: comments, order, blanks. The text must be one
 * that {@link StudyText} accepts. What was changed is to be read again by the caller; this class knows no keys.
 */
public final class StudyEdit {
    private static final String BEFORE = "before the fit: ";
    private static final Pattern COMMENT = Pattern.compile("[ \\t]+#[ \\t]*(?!" + BEFORE + ")");

    private String text;

    /**
     * An edit of a text.
     *
     * @param text of a study
     */
    public StudyEdit(String text) {
        this.text = text;
    }

    /**
     * The text as it stands now.
     *
     * @return with the changes made so far
     */
    public String text() {
        return text;
    }

    /**
     * Sets a value, where the key stands or behind its last sibling.
     *
     * @param path words of the key, from the top
     * @param value as a study would write it
     * @return false if there is no group to put it in
     */
    public boolean set(List<String> path, String value) {
        Optional<MappingNode> group = group(path.subList(0, path.size() - 1));
        if (group.isEmpty()) {
            return false;
        }
        String name = path.get(path.size() - 1);
        Optional<NodeTuple> entry = entry(group.get(), name);
        if (entry.isPresent()) {
            replace(start(entry.get().getValueNode()), end(entry.get().getValueNode()), value);
        } else {
            append(group.get(), name + ": " + value);
        }
        return true;
    }

    /**
     * Puts one entry in the place of the first that is there of some, and leaves out the others.
     *
     * @param path words of the group
     * @param names of the entries that it stands for
     * @param entry key and value
     * @return false if there is no such group
     */
    public boolean replace(List<String> path, List<String> names, String entry) {
        Optional<MappingNode> group = group(path);
        if (group.isEmpty()) {
            return false;
        }
        Optional<NodeTuple> old = group.get().getValue().stream()
                .filter(tuple -> names.contains(name(tuple)))
                .findFirst();
        if (old.isPresent()) {
            replace(start(old.get().getKeyNode()), end(old.get().getValueNode()), entry);
        } else {
            append(group.get(), entry);
        }
        return true;
    }

    /**
     * Puts comments above the line in which a key stands, as far in as that line is.
     *
     * @param path words of the key
     * @param comments one a line, without the mark
     */
    public void comment(List<String> path, List<String> comments) {
        Optional<NodeTuple> entry =
                group(path.subList(0, path.size() - 1)).flatMap(group -> entry(group, path.get(path.size() - 1)));
        int at = entry.map(tuple -> start(tuple.getKeyNode())).orElse(0);
        int line = text.lastIndexOf('\n', at - 1) + 1;
        int indent = line;
        while (indent < text.length() && text.charAt(indent) == ' ') {
            indent++;
        }
        String blanks = text.substring(line, indent);
        StringBuilder above = new StringBuilder();
        comments.forEach(
                comment -> above.append(blanks).append("# ").append(comment).append('\n'));
        text = text.substring(0, line) + above + text.substring(line);
    }

    /**
     * The value of a key as written.
     *
     * @param path words of the key, from the top
     * @return empty if there is none, or it is no single value
     */
    public Optional<String> written(List<String> path) {
        return group(path.subList(0, path.size() - 1))
                .flatMap(group -> entry(group, path.get(path.size() - 1)))
                .map(NodeTuple::getValueNode)
                .filter(ScalarNode.class::isInstance)
                .map(node -> ((ScalarNode) node).getValue());
    }

    private void append(MappingNode group, String entry) {
        if (group.getFlowStyle() == FlowStyle.FLOW) {
            int at = end(group) - 1;
            replace(at, at, (group.getValue().isEmpty() ? "" : ", ") + entry);
        } else {
            NodeTuple last = group.getValue().get(group.getValue().size() - 1);
            int column = last.getKeyNode().getStartMark().orElseThrow().getColumn();
            int at = text.indexOf('\n', end(last.getValueNode()));
            at = at < 0 ? text.length() : at;
            replace(at, at, "\n" + " ".repeat(column) + entry);
        }
    }

    /** A comment behind the value was about the old one, and says so from now on. */
    private void replace(int from, int to, String with) {
        String rest = text.substring(to);
        Matcher comment = COMMENT.matcher(rest);
        if (from < to && comment.lookingAt()) {
            rest = rest.substring(0, comment.end()) + BEFORE + rest.substring(comment.end());
        }
        text = text.substring(0, from) + with + rest;
    }

    private Optional<MappingNode> group(List<String> path) {
        Optional<Node> node = new Compose(LoadSettings.builder().build()).composeString(text);
        for (String word : path) {
            node = node.filter(MappingNode.class::isInstance)
                    .flatMap(group -> entry((MappingNode) group, word))
                    .map(NodeTuple::getValueNode);
        }
        return node.filter(MappingNode.class::isInstance).map(MappingNode.class::cast);
    }

    private static Optional<NodeTuple> entry(MappingNode group, String name) {
        return group.getValue().stream()
                .filter(tuple -> name(tuple).equals(name))
                .findFirst();
    }

    private static String name(NodeTuple tuple) {
        return tuple.getKeyNode() instanceof ScalarNode key ? key.getValue().strip() : "";
    }

    private int start(Node node) {
        return place(node.getStartMark().orElseThrow());
    }

    /** Where a node ends; a group in block style ends with its last value, not where the next token starts. */
    private int end(Node node) {
        if (node instanceof MappingNode group
                && group.getFlowStyle() != FlowStyle.FLOW
                && !group.getValue().isEmpty()) {
            List<NodeTuple> entries = new ArrayList<>(group.getValue());
            return end(entries.get(entries.size() - 1).getValueNode());
        }
        return place(node.getEndMark().orElseThrow());
    }

    /** Marks count code points. */
    private int place(Mark mark) {
        return text.offsetByCodePoints(0, mark.getIndex());
    }
}
