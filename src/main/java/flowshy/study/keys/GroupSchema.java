package flowshy.study.keys;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** JSON Schema of a group: its keys, required ones, alternatives by a deciding word, and the single word it may be. */
final class GroupSchema {
    private GroupSchema() {}

    static Map<String, Object> of(Group group) {
        Map<String, Object> object = group.selector().isEmpty() ? object(group, "") : alternatives(group);
        List<Object> ways = new ArrayList<>();
        Stream.of(group.shorthand(), group.listing())
                .flatMap(Optional::stream)
                .forEach(key -> ways.add(group.key(key).orElseThrow().value().schema()));
        ways.add(object);
        return ways.size() == 1 ? object : map("anyOf", ways);
    }

    private static Map<String, Object> alternatives(Group group) {
        List<Object> all = new ArrayList<>();
        for (String word : group.selector().orElseThrow().keys().keySet()) {
            all.add(object(group, word));
            List<String> sets = sets(group, word);
            if (!sets.isEmpty()) {
                all.add(started(group, word, sets));
            }
        }
        return map("oneOf", all);
    }

    /** The sets of starting values that go with a deciding word. */
    private static List<String> sets(Group group, String word) {
        String decider = group.selector().orElseThrow().key().name();
        return group.starts().stream()
                .flatMap(starts -> starts.sets().keySet().stream()
                        .filter(set -> starts.of(set, decider)
                                .filter(presence -> presence.value().equals(word))
                                .isPresent()))
                .toList();
    }

    /** A group as it is written without a set of starting values. */
    private static Map<String, Object> object(Group group, String word) {
        List<Key> keys = group.keys(word).stream()
                .filter(Key::built)
                .filter(key -> group.starts().stream().noneMatch(s -> s.key().equals(key.name())))
                .toList();
        List<String> required = keys.stream()
                .filter(key -> key.presence().kind() == Presence.Kind.REQUIRED)
                .map(Key::name)
                .collect(Collectors.toCollection(ArrayList::new));
        group.selector().ifPresent(selector -> {
            if (selector.usual().filter(word::equals).isEmpty()
                    && !required.contains(selector.key().name())) {
                required.add(selector.key().name());
            }
        });
        return object(properties(group, keys, word), required, rules(group, word, true));
    }

    /** The same beside a set of starting values: nothing else need be written. */
    private static Map<String, Object> started(Group group, String word, List<String> sets) {
        String key = group.starts().orElseThrow().key();
        List<Key> keys = group.keys(word).stream().filter(Key::built).toList();
        Map<String, Object> properties = properties(group, keys, word);
        properties.put(key, map("enum", sets));
        return object(properties, List.of(key), rules(group, word, false));
    }

    private static Map<String, Object> properties(Group group, List<Key> keys, String word) {
        Map<String, Object> properties = new LinkedHashMap<>();
        keys.forEach(key -> properties.put(key.name(), property(key)));
        group.selector().ifPresent(selector -> properties.put(selector.key().name(), map("const", word)));
        return properties;
    }

    private static Map<String, Object> object(
            Map<String, Object> properties, List<String> required, List<Object> rules) {
        Map<String, Object> schema = map("type", "object");
        schema.put("properties", properties);
        if (!required.isEmpty()) {
            schema.put("required", required);
        }
        schema.put("additionalProperties", false);
        if (!rules.isEmpty()) {
            schema.put("allOf", rules);
        }
        return schema;
    }

    private static List<Object> rules(Group group, String word, boolean complete) {
        List<String> known = Group.built(group.keys(word));
        return group.rules().stream()
                .flatMap(rule -> rule.within(known).schema(complete).stream())
                .toList();
    }

    private static Map<String, Object> property(Key key) {
        Map<String, Object> schema = new LinkedHashMap<>(key.value().schema());
        String taken = key.presence().value().isEmpty()
                ? ""
                : "; default: " + key.presence().value();
        schema.put("description", key.meaning() + "; " + key.value().kind() + taken);
        return schema;
    }

    static Map<String, Object> map(String key, Object value) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put(key, value);
        return map;
    }
}
