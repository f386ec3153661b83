package flowshy.study.keys;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** JSON Schema of a group: its keys, required ones, alternatives by a deciding word, and the single word it may be. */
final class GroupSchema {
    private GroupSchema() {}

    static Map<String, Object> of(Group group) {
        Map<String, Object> object = group.selector().isEmpty() ? object(group, "") : alternatives(group);
        if (group.shorthand().isEmpty()) {
            return object;
        }
        Key single = group.key(group.shorthand().get()).orElseThrow();
        return map("anyOf", List.of(single.value().schema(), object));
    }

    private static Map<String, Object> alternatives(Group group) {
        List<Object> all = new ArrayList<>();
        for (String word : group.selector().orElseThrow().keys().keySet()) {
            all.add(object(group, word));
        }
        return map("oneOf", all);
    }

    private static Map<String, Object> object(Group group, String word) {
        Map<String, Object> properties = new LinkedHashMap<>();
        List<String> required = new ArrayList<>();
        for (Key key : group.keys(word)) {
            if (key.built()) {
                properties.put(key.name(), property(key));
                if (key.presence().kind() == Presence.Kind.REQUIRED) {
                    required.add(key.name());
                }
            }
        }
        group.selector().ifPresent(selector -> {
            properties.put(selector.key().name(), map("const", word));
            if (selector.usual().filter(word::equals).isEmpty()
                    && !required.contains(selector.key().name())) {
                required.add(selector.key().name());
            }
        });
        Map<String, Object> schema = map("type", "object");
        schema.put("properties", properties);
        if (!required.isEmpty()) {
            schema.put("required", required);
        }
        schema.put("additionalProperties", false);
        List<Object> rules = new ArrayList<>();
        List<String> known = Group.built(group.keys(word));
        group.rules().forEach(rule -> rules.addAll(rule.schema(known)));
        if (!rules.isEmpty()) {
            schema.put("allOf", rules);
        }
        return schema;
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
