package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import java.util.List;
import java.util.Optional;

/** Reads one group: unknown keys first, then every known key in the order of the table, then the rules between keys. */
final class GroupReading {
    private final Group group;
    private final Reading reading;
    private final Node.Mapping mapping;
    private final String path;
    private final String word;
    private final List<Key> keys;

    GroupReading(Group group, Reading reading, Node.Mapping mapping, String path) {
        this.group = group;
        this.reading = reading;
        this.mapping = mapping;
        this.path = path;
        this.word = group.selector().map(this::selected).orElse("");
        this.keys = group.keys(word);
    }

    void read() {
        reading.place(path, mapping.position());
        if (lacksItsWord()) {
            return;
        }
        if (group.selector().isEmpty() || group.selector().get().keys().containsKey(word)) {
            // else the deciding word itself is wrong and told so; which keys go with it is not known
            mapping.entries().stream().filter(e -> key(e.key()).isEmpty()).forEach(this::refuse);
        }
        for (Key key : keys) {
            Optional<Node.Entry> entry = mapping.entry(key.name());
            if (entry.isPresent()) {
                present(key, entry.get());
            } else {
                absent(key);
            }
        }
        List<String> known = Group.built(keys);
        group.rules().stream().filter(rule -> rule.concerns(known)).forEach(rule -> rule.check(reading, mapping, path));
    }

    private String selected(Selector selector) {
        return said(selector.key().name())
                .filter(w -> !w.isEmpty())
                .or(selector::usual)
                .orElse("");
    }

    /** The usual word is not taken where a key of another word is written: that would be a guess against the text. */
    private boolean lacksItsWord() {
        if (group.selector().isEmpty()) {
            return false;
        }
        Selector selector = group.selector().get();
        if (mapping.entry(selector.key().name()).isPresent()) {
            return false;
        }
        for (Node.Entry entry : mapping.entries()) {
            List<String> words = selector.wordsOf(entry.key());
            if (!words.isEmpty() && key(entry.key()).isEmpty()) {
                String accepted =
                        entry.key() + " belongs to " + selector.key().name() + ": " + String.join(" or ", words);
                reading.problem(mapping.position(), below(selector.key().name()), "missing", accepted);
                return true;
            }
        }
        return false;
    }

    private Optional<Key> key(String name) {
        return keys.stream().filter(k -> k.name().equals(name)).findFirst();
    }

    private String below(String name) {
        return path.isEmpty() ? name : path + "." + name;
    }

    private void refuse(Node.Entry entry) {
        List<String> words = group.selector().map(s -> s.wordsOf(entry.key())).orElse(List.of());
        List<String> known = Group.built(keys);
        if (words.isEmpty()) {
            reading.unknown(entry, below(entry.key()), known);
            return;
        }
        String decider = group.selector().orElseThrow().key().name();
        String found = "belongs to " + decider + ": " + String.join(" or ", words) + ", not to " + Printable.of(word);
        String accepted = "known here: " + String.join(", ", known);
        reading.problem(Problem.of(entry.position(), below(entry.key()), found, accepted));
    }

    private void present(Key key, Node.Entry entry) {
        String at = below(key.name());
        Optional<Condition> broken = key.condition()
                .filter(c -> c.refuses() && !c.holds(said(c.sibling()).orElse("")));
        if (!key.built()) {
            String instead = key.instead().orElseThrow();
            reading.problem(entry.position(), at, "known, but not built yet in this version", instead);
        } else if (broken.isPresent()) {
            reading.problem(
                    entry.position(), at, "not wanted here", broken.get().words());
        } else {
            key.value().read(reading, entry.value(), at);
        }
    }

    private void absent(Key key) {
        boolean idle = group.rules().stream().anyMatch(rule -> rule.excludes(key.name(), mapping))
                || key.condition()
                        .filter(c -> !c.holds(said(c.sibling()).orElse("")))
                        .isPresent();
        if (idle || !key.built()) {
            return;
        }
        String at = below(key.name());
        switch (key.presence().kind()) {
            case REQUIRED ->
                reading.missing(
                        mapping.position(),
                        at,
                        key.meaning() + ": " + key.value().kind());
            case DEFAULT -> reading.take(at, key, mapping.position());
            case LEFT_OUT -> reading.leftOut(at, key.presence());
            case IMPLIED -> key.value().read(reading, new Node.Mapping(List.of(), mapping.position()), at);
            case LIKE -> reading.takeLike(at, key, mapping.position());
            case OPTIONAL, IF_NEEDED -> {}
        }
    }

    /** The word that a key of this group, or of a group below, has or takes by default. */
    private Optional<String> said(String relative) {
        return said(group, mapping, relative);
    }

    private static Optional<String> said(Group group, Node.Mapping mapping, String relative) {
        int dot = relative.indexOf('.');
        String first = dot < 0 ? relative : relative.substring(0, dot);
        Optional<Key> key = group.key(first);
        Optional<Node> node = mapping.entry(first).map(Node.Entry::value);
        if (node.isEmpty()) {
            return key.map(k -> k.presence().value()).filter(v -> !v.isEmpty());
        }
        if (dot < 0) {
            return node.filter(n -> n instanceof Node.Scalar)
                    .map(n -> ((Node.Scalar) n).text().strip());
        }
        if (key.isPresent() && key.get().value() instanceof Group inner) {
            return inner.mapping(node.get()).flatMap(m -> said(inner, m, relative.substring(dot + 1)));
        }
        return Optional.empty();
    }
}
