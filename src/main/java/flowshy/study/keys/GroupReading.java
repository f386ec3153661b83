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
 * Reads one group: unknown keys first, then every known key in the order of the table, then the rules between keys. Starting values
 * that the group takes by a word stand beside what is written, each read as a default.
 */
final class GroupReading {
    private final Group group;
    private final Reading reading;
    private final Node.Mapping mapping;
    /** Keys that are not written but come from a set of starting values. */
    private final Map<String, Presence> started;

    private final String path;
    private final String word;
    private final List<Key> keys;
    private final List<Rule> rules;

    GroupReading(Group group, Reading reading, Node.Mapping mapping, String path) {
        this.group = group;
        this.reading = reading;
        this.started = started(group, mapping);
        this.mapping = with(group, mapping, started);
        this.path = path;
        this.word = group.selector().map(this::selected).orElse("");
        this.keys = group.keys(word);
        List<String> known = Group.built(keys);
        this.rules = group.rules().stream()
                .map(rule -> rule.within(known))
                .filter(rule -> !rule.ways().isEmpty())
                .toList();
    }

    void read() {
        reading.place(path, mapping.position());
        if (startsWrongly() || lacksItsWord()) {
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
        rules.forEach(rule -> rule.check(reading, mapping, path));
    }

    /** What a named set gives to keys that are not written, nor pushed out by one that is. */
    private static Map<String, Presence> started(Group group, Node.Mapping written) {
        if (group.starts().isEmpty()) {
            return Map.of();
        }
        Starts starts = group.starts().get();
        String word = said(group, written, starts.key()).orElse("");
        if (!starts.sets().containsKey(word)) {
            return Map.of();
        }
        Map<String, Presence> set = new LinkedHashMap<>(starts.sets().get(word));
        for (Selector selector : group.selector().stream().toList()) {
            String decider = selector.key().name();
            Optional<String> said = said(group, written, decider);
            if (said.isPresent() && !said.get().equals(set.get(decider).value())) {
                return Map.of();
            }
        }
        for (Node.Entry entry : written.entries()) {
            set.remove(entry.key());
            group.rules().forEach(rule -> rule.rivals(entry.key()).forEach(set::remove));
        }
        return set;
    }

    private static Node.Mapping with(Group group, Node.Mapping written, Map<String, Presence> started) {
        Node.Mapping all = written;
        for (Map.Entry<String, Presence> start : started.entrySet()) {
            Position at = written.entry(group.starts().orElseThrow().key())
                    .orElseThrow()
                    .value()
                    .position();
            Node.Scalar value = new Node.Scalar(start.getValue().value(), at);
            all = all.with(new Node.Entry(start.getKey(), at, value));
        }
        return all;
    }

    /** A set of starting values that is not known, or belongs to another deciding word than the written one. */
    private boolean startsWrongly() {
        if (group.starts().isEmpty()
                || mapping.entry(group.starts().get().key()).isEmpty()) {
            return false;
        }
        Starts starts = group.starts().get();
        Node.Entry entry = mapping.entry(starts.key()).get();
        String set = said(starts.key()).orElse("");
        if (!starts.sets().containsKey(set)) {
            key(starts.key()).orElseThrow().value().read(reading, entry.value(), below(starts.key()));
            return true;
        }
        String decider = group.selector().orElseThrow().key().name();
        String word = starts.of(set, decider).orElseThrow().value();
        if (!said(decider).filter(word::equals).isPresent()) {
            reading.problem(
                    entry.value().position(),
                    below(starts.key()),
                    set + " beside " + decider + ": "
                            + Printable.of(said(decider).orElse("")),
                    set + " is of " + decider + ": " + word);
            return true;
        }
        return false;
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
        } else if (started.containsKey(key.name())) {
            reading.take(at, key, entry.position(), started.get(key.name()));
        } else {
            key.value().read(reading, entry.value(), at);
        }
    }

    private void absent(Key key) {
        boolean idle = rules.stream().anyMatch(rule -> rule.excludes(key.name(), mapping))
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
            case OPTIONAL, ONE_OF, IF_NEEDED -> {}
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
