package flowshy.study.keys;

import flowshy.study.text.Nearest;
import flowshy.study.text.Node;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.units.Quantity;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Collects fields, places, defaults and problems while the table reads a tree. */
final class Reading {
    private final Map<String, Field> fields = new LinkedHashMap<>();
    private final Map<String, Position> places = new LinkedHashMap<>();
    private final List<Form.Taken> taken = new ArrayList<>();
    private final List<String> mistyped = new ArrayList<>();
    private final Problems problems;
    /** Above zero while a default is read: it is neither given nor may it list defaults of its own. */
    private int inDefault;

    Reading(Problems problems) {
        this.problems = problems;
    }

    Form form() {
        return new Form(fields, places, taken);
    }

    void field(String path, Node.Scalar node, Optional<Quantity> quantity) {
        String written = quantity.map(Quantity::written).orElse(node.text().strip());
        fields.put(path, new Field(path, written, quantity, node.position(), inDefault == 0));
    }

    void place(String path, Position position) {
        places.put(path, position);
    }

    /** Notes that something is left out. */
    void leftOut(String path, Presence presence) {
        if (inDefault == 0) {
            taken.add(new Form.Taken(path, presence.value(), presence.why()));
        }
    }

    /** Notes a default and reads it as if it stood there. */
    void take(String path, Key key, Position group) {
        take(path, key, group, key.presence());
    }

    /** The same for a value that only some studies take. */
    void take(String path, Key key, Position group, Presence presence) {
        take(path, key, group, presence.value(), presence.why());
    }

    /** Takes what another key has; that key stands earlier in the table. */
    void takeLike(String path, Key key, Position group) {
        Presence presence = key.presence();
        Optional<Field> other = Optional.ofNullable(fields.get(presence.value()));
        if (other.isPresent()) {
            take(path, key, group, other.get().written(), "as " + presence.value());
        } else {
            take(path, key, group, presence.why(), "usual value");
        }
    }

    private void take(String path, Key key, Position group, String value, String why) {
        if (inDefault == 0) {
            taken.add(new Form.Taken(path, value, why));
        }
        inDefault++;
        key.value().read(this, new Node.Scalar(value, group), path);
        inDefault--;
    }

    void problem(Position position, String path, String found, String accepted) {
        problems.add(position, path, found, accepted);
    }

    void problem(Problem problem) {
        problems.add(problem);
    }

    /** A node that is not of the wanted kind; one whose fault is known already is passed over. */
    void unfit(Node node, String path, String wanted) {
        if (node instanceof Node.Scalar scalar) {
            String found = scalar.text().isBlank() ? "nothing stands here" : Printable.of(scalar.text());
            problem(scalar.position(), path, found, wanted);
        } else if (node instanceof Node.Mapping mapping) {
            problem(mapping.position(), path, "a group of keys", wanted);
        } else if (node instanceof Node.Sequence sequence) {
            problem(sequence.position(), path, "a list", wanted);
        }
    }

    void unknown(Node.Entry entry, String path, List<String> siblings) {
        String known = "known here: " + String.join(", ", siblings);
        if (Character.isDigit(entry.key().isEmpty() ? ' ' : entry.key().charAt(0))) {
            known += "; a decimal comma splits a value in two: write a point";
        }
        Optional<String> meant = meant(path, entry.key(), siblings);
        meant.ifPresent(mistyped::add);
        problem(new Problem(entry.position(), path, "unknown key", known, meant));
    }

    /** A key that is not there, unless it was told already that it is mistyped. */
    void missing(Position group, String path, String wanted) {
        if (!mistyped.contains(path)) {
            problem(group, path, "missing", wanted);
        }
    }

    private Optional<String> meant(String path, String key, List<String> siblings) {
        String above = path.substring(0, path.length() - key.length());
        Optional<String> near = Nearest.among(key, siblings).map(word -> above + word);
        return near.or(() -> elsewhere(key));
    }

    /** The same word at another place of the table, else the nearest one. */
    private Optional<String> elsewhere(String key) {
        List<KeyRow> table = Keys.rows();
        List<String> last = table.stream()
                .map(row -> row.path().substring(row.path().lastIndexOf('.') + 1))
                .toList();
        return Nearest.among(key, last)
                .map(word -> table.get(last.indexOf(word)).path());
    }
}
