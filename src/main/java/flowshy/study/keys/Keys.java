package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Problems;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** The table of the keys of a study. A new key is one entry here; reader, list, schema and suggestions follow. */
public final class Keys {
    static final Group STUDY = Group.of("study", top());

    private static final Pattern PLACE_IN_LIST = Pattern.compile("\\[\\d+]");

    private Keys() {}

    /** Most studies are read without the list of keys: it is made when it is asked for. */
    private static final class Listed {
        static final List<KeyRow> ROWS = rows(STUDY, "");
    }

    /** Where each path stands in that list; every answer needs these. */
    private static final class Places {
        static final Map<String, Integer> BY_PATH = new LinkedHashMap<>();

        static {
            walk(STUDY, "", path -> BY_PATH.putIfAbsent(path, BY_PATH.size()));
        }
    }

    /**
     * Every key with its place, in the order of the table.
     *
     * @return one row a path
     */
    public static List<KeyRow> rows() {
        return Listed.ROWS;
    }

    /**
     * The row of a path.
     *
     * @param path of a key; a group that stands for one of its keys may be named instead of that key
     * @return the row of the key itself, empty if there is none
     */
    public static Optional<KeyRow> row(String path) {
        Optional<KeyRow> row =
                rows().stream().filter(r -> r.path().equals(path)).findFirst();
        if (row.isPresent()
                && row.get().value() instanceof Group group
                && group.shorthand().isPresent()) {
            return row(path + "." + group.shorthand().get());
        }
        return row;
    }

    /**
     * What it means when a key is not written.
     *
     * @param path of a key, also below an entry of a list or a name that the user gave
     * @return empty if there is no such key
     */
    public static Optional<Presence> presence(String path) {
        Optional<Value> value = Optional.of(STUDY);
        Optional<Presence> presence = Optional.empty();
        for (String word : words(path)) {
            presence = value.filter(Group.class::isInstance)
                    .flatMap(group -> ((Group) group).key(word))
                    .map(Key::presence);
            value = value.flatMap(v -> v.below(word));
        }
        return presence;
    }

    /**
     * What a number behind a key may be.
     *
     * @param path of a key, also below an entry of a list or a name that the user gave; a group that stands for one of its keys may be
     *     named instead of that key
     * @return path of the key itself and the bounds, empty if no number is wanted there
     */
    public static Optional<Map.Entry<String, Measure>> measure(String path) {
        Optional<Value> value = Optional.of(STUDY);
        for (String word : words(path)) {
            value = value.flatMap(v -> v.below(word));
        }
        if (value.isPresent() && value.get() instanceof Measure measure) {
            return Optional.of(Map.entry(path, measure));
        }
        return value.filter(Group.class::isInstance)
                .flatMap(group -> ((Group) group).shorthand())
                .flatMap(key -> measure(path + "." + key));
    }

    /**
     * Where a key stands in the list of keys; all that is below one list, or below the names that a user gave, stands at one place.
     *
     * @param path of a key
     * @return from zero, rising in the order of the list
     */
    public static int place(String path) {
        String at = PLACE_IN_LIST.matcher(path).replaceAll("");
        while (!at.isEmpty()) {
            Integer place = Places.BY_PATH.get(at);
            if (place != null) {
                return place;
            }
            at = at.substring(0, Math.max(0, at.lastIndexOf('.')));
        }
        return Places.BY_PATH.size();
    }

    private static List<String> words(String path) {
        return List.of(PLACE_IN_LIST.matcher(path).replaceAll("").split("\\."));
    }

    /** Every path in the order of the list: a group's deciding word, the keys that go with it, the keys of all its words. */
    private static void walk(Group group, String above, Consumer<String> paths) {
        for (Selector selector : group.selector().stream().toList()) {
            walk(selector.key(), above, paths);
            for (List<Key> keys : selector.keys().values()) {
                keys.forEach(key -> walk(key, above, paths));
            }
        }
        group.keys().forEach(key -> walk(key, above, paths));
    }

    private static void walk(Key key, String above, Consumer<String> paths) {
        String path = above.isEmpty() ? key.name() : above + "." + key.name();
        paths.accept(path);
        if (key.value() instanceof Group inner) {
            walk(inner, path, paths);
        } else if (key.value() instanceof GroupMap map) {
            walk(map.each(), path + "." + GroupMap.NAME, paths);
        }
    }

    /**
     * Reads a tree by the table.
     *
     * @param root the study's keys
     * @param problems takes what is wrong
     * @return the values that could be read; complete if there was no problem
     */
    public static Form read(Node.Mapping root, Problems problems) {
        Reading reading = new Reading(problems);
        STUDY.read(reading, root, "");
        return reading.form();
    }

    private static List<Key> top() {
        return List.of(
                Key.optional("title", Text.LINE, "what the study is called"),
                Key.required("hair", HairKeys.group(), "the hair"),
                Key.of(
                        "suspension",
                        SuspensionKeys.group(),
                        Presence.leftOut("none", "torques are given, movements are not"),
                        "what the hair turns on"),
                Key.required("medium", MediumKeys.outside(), "gas or liquid around the device"),
                Key.of(
                        "cover",
                        CoverKeys.group(),
                        Presence.taken("open", "a bare device"),
                        "what stands over the hair"),
                Key.of(
                        "candidates",
                        new GroupList(CoverKeys.group()),
                        Presence.OPTIONAL,
                        "covers to choose from, in order of preference; for the command lid"),
                Key.of("band", band(), Presence.IMPLIED, "band of use"),
                Key.optional("motion", MotionKeys.group(), "the motion that is to be read"),
                Key.optional(
                        "surroundings", SurroundingsKeys.map(), "streams, tones and sound around, each under a name"),
                Key.of("accept", AcceptKeys.group(), Presence.IMPLIED, "limits that the device must meet"),
                Key.optional("calibration", calibration(), "where the sensitivity is stated"),
                Key.optional(
                        "tolerances", new ByKey(ByKey.Entry.SPREAD), "spread of any number; for the command tolerance"),
                Key.optional(
                        "envelope",
                        new ByKey(ByKey.Entry.VALUES),
                        "states the device must bear; the worst one decides"),
                Key.optional(
                        "variants",
                        new Overrides(),
                        "devices to be compared with this one: the keys that differ, laid over the study; for the command compare"),
                Key.optional(
                        "measurements",
                        MeasurementKeys.map(),
                        "measured responses beside the model, each under a name"),
                Key.of(
                        "finite-length",
                        Words.of("off", "estimate", "auto", "on"),
                        Presence.taken("auto", "the whole hair with its tip on its wall, solved to one per cent"),
                        "correction for tip and wall: off is strip theory, estimate its repair in closed form (within 10 %,"
                                + " microseconds), auto the whole hair solved to one per cent, on the same on finer meshes"
                                + " and twice the frequencies"),
                Key.optional(
                        "hold",
                        Words.of("stiffness", "resonance"),
                        "what of the suspension stays when another hair takes the place of the one measured; stiffness unless"
                                + " written"),
                Key.optional("document", document(), "entries of the title block"));
    }

    private static Group band() {
        return Group.of(
                "band",
                List.of(
                        Key.of(
                                "from",
                                SuspensionKeys.FREQUENCY,
                                Presence.taken("1 Hz", "wide enough for most uses"),
                                "lower end"),
                        Key.of(
                                "to",
                                SuspensionKeys.FREQUENCY,
                                Presence.taken("10 kHz", "wide enough for most uses"),
                                "upper end")));
    }

    private static Group calibration() {
        return Group.of(
                "calibration",
                List.of(
                        Key.required("frequency", SuspensionKeys.FREQUENCY, "frequency of calibration"),
                        Key.of(
                                "cover",
                                Words.of("open", "roofed", "vented", "sealed", "measured"),
                                Presence.like("cover.kind", "open"),
                                "cover during calibration: none, the study's own, or a closed cavity")));
    }

    private static Group document() {
        return Group.of(
                "document",
                List.of(
                        Key.optional("project", Text.LINE, "project"),
                        Key.optional("part", Text.LINE, "part or drawing number"),
                        Key.optional("revision", Text.LINE, "revision"),
                        Key.optional("prepared-by", Text.LINE, "who prepared it"),
                        Key.optional("checked-by", Text.LINE, "who checked it"),
                        Key.optional("approved-by", Text.LINE, "who approved it"),
                        Key.optional("remarks", Text.LINE, "remarks")));
    }

    private static List<KeyRow> rows(Group group, String above) {
        Map<String, KeyRow> rows = new LinkedHashMap<>();
        group.selector().ifPresent(selector -> {
            add(
                    rows,
                    selector.key(),
                    above,
                    List.of(),
                    selector.key().presence().words());
            selector.keys()
                    .values()
                    .forEach(keys -> keys.forEach(
                            key -> add(rows, key, above, words(selector, key.name()), absent(group, key.name()))));
        });
        group.keys().forEach(key -> add(rows, key, above, List.of(), absent(group, "", key)));
        return List.copyOf(rows.values());
    }

    private static List<String> words(Selector selector, String name) {
        return selector.wordsOf(name).stream()
                .map(word -> selector.key().name() + ": " + word)
                .toList();
    }

    /** What happens without a key, by deciding word where that makes a difference. */
    private static String absent(Group group, String name) {
        Selector selector = group.selector().orElseThrow();
        Map<String, List<String>> all = new LinkedHashMap<>();
        for (String word : selector.wordsOf(name)) {
            Key key = selector.of(word).stream()
                    .filter(k -> k.name().equals(name))
                    .findFirst()
                    .orElseThrow();
            all.computeIfAbsent(absent(group, word, key), text -> new ArrayList<>())
                    .add(word);
        }
        return all.size() == 1
                ? all.keySet().iterator().next()
                : all.entrySet().stream()
                        .map(entry -> String.join(", ", entry.getValue()) + ": " + entry.getKey())
                        .collect(Collectors.joining("; "));
    }

    /** A key that leads one of several ways is told with the others, for one of them must be there. */
    private static String absent(Group group, String word, Key key) {
        List<String> known = Group.built(group.keys(word));
        return group.rules().stream()
                .map(rule -> rule.within(known))
                .filter(rule -> rule.need() == Rule.Need.ALWAYS && rule.leads().contains(key.name()))
                .findFirst()
                .map(rule -> Presence.oneOf(rule.leads()))
                .orElse(key.presence())
                .words();
    }

    private static void add(Map<String, KeyRow> rows, Key key, String above, List<String> words, String absent) {
        String path = above.isEmpty() ? key.name() : above + "." + key.name();
        rows.putIfAbsent(
                path, new KeyRow(path, key.value(), absent, words, key.condition(), key.meaning(), key.instead()));
        if (key.value() instanceof Group inner) {
            rows(inner, path).forEach(row -> rows.putIfAbsent(row.path(), row));
        } else if (key.value() instanceof GroupMap map) {
            rows(map.each(), path + "." + GroupMap.NAME).forEach(row -> rows.putIfAbsent(row.path(), row));
        }
    }
}
