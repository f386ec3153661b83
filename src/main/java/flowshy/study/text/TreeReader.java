package flowshy.study.text;

import java.util.ArrayList;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.events.AliasEvent;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.MappingStartEvent;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;

/**
 * Builds our own tree from the events of the YAML parser.
 *
 * <p>Not by the library's composer: it takes repeated keys, expands aliases and recurses without a floor.
 */
final class TreeReader {
    /** The deepest study that means anything has about six levels. */
    private static final int DEEPEST = 16;

    private final Iterator<Event> events;
    private final Function<Mark, Position> place;
    private final Position start;
    private final Problems problems;

    private TreeReader(String text, Position start, Function<Mark, Position> place, Problems problems) {
        this.events =
                new Parse(LoadSettings.builder().build()).parseString(text).iterator();
        this.start = start;
        this.place = place;
        this.problems = problems;
    }

    /** The tree of a file; what is wrong with it goes to the problems. */
    static Node file(String name, String text, Problems problems) {
        return new TreeReader(
                        text,
                        new Position(name, 1, 1),
                        mark -> new Position(name, mark.getLine() + 1, mark.getColumn() + 1),
                        problems)
                .document();
    }

    /** The tree of a value that was given elsewhere; every part of it has the same place. */
    static Node value(Position position, String text, Problems problems) {
        return new TreeReader(text, position, mark -> position, problems).document();
    }

    private Node document() {
        Node root = new Node.Scalar("", start);
        boolean read = false;
        try {
            while (events.hasNext()) {
                Event event = events.next();
                if (event.getEventId() == Event.ID.DocumentStart && read) {
                    problems.add(position(event), "", "a second document", "one file holds one study");
                    return root;
                }
                if (event instanceof NodeEvent node) {
                    root = node(node, "", 1);
                    read = true;
                }
            }
        } catch (MarkedYamlEngineException e) {
            problems.add(syntax(e));
            return new Node.Refused(start);
        }
        return root;
    }

    private Node node(NodeEvent event, String path, int depth) {
        Position at = position(event);
        if (event instanceof AliasEvent) {
            problems.add(at, path, "an alias (*)", "write the value out; aliases and anchors are not read");
            return new Node.Refused(at);
        }
        event.getAnchor().ifPresent(anchor -> problems.add(at, path, "an anchor (&)", "leave it out"));
        if (event instanceof ScalarEvent scalar) {
            refuseTag(scalar.getTag(), at, path);
            return new Node.Scalar(scalar.getValue(), at);
        }
        CollectionStartEvent collection = (CollectionStartEvent) event;
        refuseTag(collection.getTag(), at, path);
        if (depth > DEEPEST) {
            problems.add(at, path, "nested deeper than " + DEEPEST + " levels", "no study needs that");
            problems.throwIfAny();
        }
        return event instanceof MappingStartEvent ? mapping(at, path, depth) : sequence(at, path, depth);
    }

    private void refuseTag(Optional<String> tag, Position at, String path) {
        tag.ifPresent(t -> problems.add(at, path, "a tag (" + Printable.of(t) + ")", "leave it out"));
    }

    private Node mapping(Position at, String path, int depth) {
        Map<String, Node.Entry> entries = new LinkedHashMap<>();
        for (Event event = events.next(); event instanceof NodeEvent key; event = events.next()) {
            Node name = node(key, path, depth + 1);
            String text = name instanceof Node.Scalar scalar ? scalar.text() : "";
            String below = path.isEmpty() ? text : path + "." + text;
            Node value = node((NodeEvent) events.next(), below, depth + 1);
            if (!(name instanceof Node.Scalar)) {
                problems.add(name.position(), path, "a key that is no plain word", "a key is one word");
            } else if (entries.containsKey(text)) {
                Position first = entries.get(text).position();
                problems.add(name.position(), below, "repeated key", "first given at " + first + "; keep one");
            } else {
                entries.put(text, new Node.Entry(text, name.position(), value));
            }
        }
        return new Node.Mapping(List.copyOf(entries.values()), at);
    }

    private Node sequence(Position at, String path, int depth) {
        List<Node> items = new ArrayList<>();
        for (Event event = events.next(); event instanceof NodeEvent item; event = events.next()) {
            items.add(node(item, path + "[" + items.size() + "]", depth + 1));
        }
        return new Node.Sequence(items, at);
    }

    private Position position(Event event) {
        return event.getStartMark().map(place).orElse(start);
    }

    private Problem syntax(MarkedYamlEngineException e) {
        Position at = e.getProblemMark().or(e::getContextMark).map(place).orElse(start);
        String cause = e.getProblem() == null ? "" : Printable.of(e.getProblem());
        String help = "check indentation, brackets and quotes";
        if (cause.contains("TAB")) {
            return Problem.of(at, "", "a tab where a value or key should start", "indent by blanks");
        }
        if (cause.contains("mapping values are not allowed")) {
            help = "put quotes around a value that holds a colon; keys of one group start in the same column";
        } else if (cause.contains("block end")) {
            help = "keys of one group start in the same column";
        }
        return Problem.of(at, "", "not readable as YAML: " + cause, help);
    }
}
