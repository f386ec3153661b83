package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Position;
import flowshy.study.text.Setting;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Lays changes over a study before it is read, so that they are checked like the text of the file.
 *
 * <p>A change pushes out what it contradicts: {@code suspension.stiffness} the resonance, another {@code hair.shape} the
 * keys that only the old shape has, another {@code medium.name} what only the old medium has, such as its humidity.
 */
public final class Overlay {
    private Overlay() {}

    /**
     * The study with one value set.
     *
     * @param root the study
     * @param setting path and value
     * @return the changed study
     */
    public static Node.Mapping set(Node.Mapping root, Setting setting) {
        return set(Optional.of(Keys.STUDY), root, setting.path(), setting.value(), setting.position());
    }

    /**
     * The study with a part of another one laid over it: groups are merged, anything else is replaced. What the part itself says never
     * pushes out what it also says: the reader then tells that the two do not go together.
     *
     * @param root the study
     * @param over keys to override, of any depth
     * @return the changed study
     */
    public static Node.Mapping merge(Node.Mapping root, Node.Mapping over) {
        return merge(Optional.of(Keys.STUDY), root, over);
    }

    private static Node.Mapping set(
            Optional<Value> kind, Node.Mapping mapping, List<String> path, Node value, Position position) {
        String name = path.get(0);
        Node below = value;
        if (path.size() > 1) {
            Optional<Value> inner = inner(kind, name);
            Node.Mapping old = mapping.entry(name)
                    .flatMap(e -> opened(inner, e.value()))
                    .orElse(new Node.Mapping(List.of(), position));
            List<String> rest = path.subList(1, path.size());
            below = inner.isPresent()
                    ? set(inner, old, rest, value, position)
                    : new Node.Mapping(List.of(entry(rest, value, position)), position);
        }
        return put(kind, mapping, new Node.Entry(name, position, below), List.of());
    }

    /** Under a key that is not a group nothing can be set; the reader refuses what stands there then. */
    private static Node.Entry entry(List<String> path, Node value, Position position) {
        Node below = path.size() == 1
                ? value
                : new Node.Mapping(List.of(entry(path.subList(1, path.size()), value, position)), position);
        return new Node.Entry(path.get(0), position, below);
    }

    private static Node.Mapping merge(Optional<Value> kind, Node.Mapping base, Node.Mapping over) {
        Node.Mapping merged = new Node.Mapping(base.entries(), over.position());
        List<String> said = over.entries().stream().map(Node.Entry::key).toList();
        for (Node.Entry entry : over.entries()) {
            Optional<Value> inner = inner(kind, entry.key());
            Optional<Node.Mapping> old = merged.entry(entry.key()).flatMap(e -> opened(inner, e.value()));
            Node value = entry.value() instanceof Node.Mapping part && old.isPresent()
                    ? merge(inner, old.get(), part)
                    : entry.value();
            merged = put(kind, merged, new Node.Entry(entry.key(), entry.position(), value), said);
        }
        return merged;
    }

    /** What keys may stand below, for a group or for names with groups. */
    private static Optional<Value> inner(Optional<Value> kind, String name) {
        return kind.flatMap(k -> k.below(name))
                .filter(v ->
                        v instanceof Group || v instanceof GroupMap || v instanceof Overrides || v instanceof ByKey);
    }

    /** A group that is written as a single word or as a list is opened into its keys first. */
    private static Optional<Node.Mapping> opened(Optional<Value> kind, Node node) {
        if (node instanceof Node.Mapping mapping) {
            return Optional.of(mapping);
        }
        return kind.filter(Group.class::isInstance).flatMap(k -> ((Group) k).mapping(node));
    }

    private static Node.Mapping put(Optional<Value> kind, Node.Mapping mapping, Node.Entry entry, List<String> stay) {
        List<String> gone = new ArrayList<>();
        if (kind.isPresent() && kind.get() instanceof Group group) {
            group.rules().forEach(rule -> gone.addAll(rule.rivals(entry.key())));
            group.selector().ifPresent(selector -> gone.addAll(strangers(selector, entry)));
            if (group.shorthand().filter(entry.key()::equals).isPresent() && !sameWord(mapping, entry)) {
                gone.addAll(group.ofTheWord());
            }
        }
        gone.removeAll(stay);
        return mapping.without(gone).with(entry);
    }

    private static boolean sameWord(Node.Mapping mapping, Node.Entry entry) {
        return mapping.entry(entry.key())
                .filter(old -> old.value() instanceof Node.Scalar before
                        && entry.value() instanceof Node.Scalar now
                        && before.text().strip().equals(now.text().strip()))
                .isPresent();
    }

    /** Keys that do not go with the new deciding word. */
    private static List<String> strangers(Selector selector, Node.Entry entry) {
        if (!entry.key().equals(selector.key().name()) || !(entry.value() instanceof Node.Scalar word)) {
            return List.of();
        }
        List<String> stay =
                selector.of(word.text().strip()).stream().map(Key::name).toList();
        return selector.keys().values().stream()
                .flatMap(List::stream)
                .map(Key::name)
                .filter(name -> !stay.contains(name))
                .distinct()
                .toList();
    }
}
