package flowshy.study;

import flowshy.study.keys.Keys;
import flowshy.study.keys.Overrides;
import flowshy.study.text.Node;
import flowshy.study.text.Position;
import flowshy.study.text.Problem;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** What one variant says: a part of a study, with its places, so that what is wrong with the whole is told inside it. */
final class Part {
    private static final String GROUP = "variants.";

    /** Ways in which a suspension is measured: one of them in a variant, and the suspension is solved anew. */
    private static final List<String> MEASURED = List.of("stiffness", "resonance", "damping", "quality", "ring-down");

    private final Node.Entry entry;
    private final Set<Position> places = new HashSet<>();
    private final List<String> changes = new ArrayList<>();

    Part(Node.Entry entry) {
        this.entry = entry;
        places.add(entry.position());
        collect(entry.value(), "");
    }

    private void collect(Node node, String path) {
        places.add(node.position());
        if (node instanceof Node.Mapping mapping) {
            for (Node.Entry inner : mapping.entries()) {
                places.add(inner.position());
                collect(inner.value(), path.isEmpty() ? inner.key() : path + "." + inner.key());
            }
        } else if (node instanceof Node.Sequence list) {
            list.items().forEach(item -> places.addAll(new Part(new Node.Entry("", item.position(), item)).places));
            changes.add(path + ": a list of " + list.items().size());
        } else if (node instanceof Node.Scalar scalar) {
            changes.add(path + ": " + scalar.text().strip());
        }
    }

    String name() {
        return entry.key().strip();
    }

    /** Every value written, with its key. */
    List<String> changes() {
        return List.copyOf(changes);
    }

    Node.Mapping over() {
        return ((Node.Mapping) entry.value()).without(Overrides.NOT_HERE);
    }

    boolean says(Position position) {
        return places.contains(position);
    }

    /** The path of a key as the file sees it. */
    String path(String key) {
        return GROUP + name() + (key.isEmpty() ? "" : "." + key);
    }

    /** Whether the suspension is measured anew. */
    boolean measuresAnew() {
        return over().entry("suspension")
                .map(Node.Entry::value)
                .filter(value -> value instanceof Node.Mapping group
                        && group.entries().stream().anyMatch(key -> MEASURED.contains(key.key())))
                .isPresent();
    }

    /** A problem of the varied study as a problem of this part: with its path, and at a place inside it. */
    Problem inside(Problem problem) {
        Position at = says(problem.position()) ? problem.position() : nearest(problem.path());
        return new Problem(
                at,
                path(problem.path()),
                problem.found(),
                problem.accepted(),
                problem.nearest().map(near -> Keys.presence(near).isPresent() ? path(near) : near));
    }

    /** Where the deepest group stands that the part says on the way to a key. */
    private Position nearest(String key) {
        Position at = entry.position();
        Node node = entry.value();
        for (String word : key.split("\\.", -1)) {
            Optional<Node.Entry> inner = node instanceof Node.Mapping mapping ? mapping.entry(word) : Optional.empty();
            if (inner.isEmpty()) {
                break;
            }
            at = inner.get().position();
            node = inner.get().value();
        }
        return at;
    }
}
