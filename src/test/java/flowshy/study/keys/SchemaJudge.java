package flowshy.study.keys;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import flowshy.study.text.Node;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;

/** Judges data by a JSON Schema, for the keywords that ours uses; an unknown keyword is an error, never passed over. */
final class SchemaJudge {
    private final Map<String, Object> root;

    SchemaJudge(String schema) {
        this.root = map(json(schema));
    }

    Map<String, Object> root() {
        return root;
    }

    boolean accepts(Node node) {
        return accepts(root, data(node));
    }

    Map<String, Object> resolved(Map<String, Object> schema) {
        if (!schema.containsKey("$ref")) {
            return schema;
        }
        String name = schema.get("$ref").toString().replace("#/$defs/", "");
        return map(map(root.get("$defs")).get(name));
    }

    private boolean accepts(Map<String, Object> schema, Object value) {
        for (Map.Entry<String, Object> keyword : schema.entrySet()) {
            if (!holds(keyword.getKey(), keyword.getValue(), schema, value)) {
                return false;
            }
        }
        return true;
    }

    private boolean holds(String keyword, Object wanted, Map<String, Object> schema, Object value) {
        return switch (keyword) {
            case "$schema", "title", "description", "examples", "$defs" -> true;
            case "$ref" -> accepts(resolved(schema), value);
            case "type" -> types(wanted).stream().anyMatch(type -> type.equals(type(value)));
            case "const" -> wanted.equals(value);
            case "enum" -> list(wanted).contains(value);
            case "pattern" ->
                !(value instanceof String text)
                        || Pattern.compile(wanted.toString()).matcher(text).find();
            case "anyOf" -> count(wanted, value) >= 1;
            case "oneOf" -> count(wanted, value) == 1;
            case "allOf" -> count(wanted, value) == list(wanted).size();
            case "not" -> !accepts(map(wanted), value);
            case "items" -> !(value instanceof List<?> items) || items.stream().allMatch(i -> accepts(map(wanted), i));
            case "prefixItems" -> !(value instanceof List<?> items) || prefix(list(wanted), items);
            case "minItems" -> !(value instanceof List<?> items) || items.size() >= (Integer) wanted;
            case "maxItems" -> !(value instanceof List<?> items) || items.size() <= (Integer) wanted;
            default -> !(value instanceof Map<?, ?>) || object(keyword, wanted, schema, map(value));
        };
    }

    private boolean object(String keyword, Object wanted, Map<String, Object> schema, Map<String, Object> value) {
        return switch (keyword) {
            case "properties" ->
                value.entrySet().stream()
                        .allMatch(e -> !map(wanted).containsKey(e.getKey())
                                || accepts(map(map(wanted).get(e.getKey())), e.getValue()));
            case "required" -> value.keySet().containsAll(list(wanted));
            case "additionalProperties" ->
                value.entrySet().stream()
                        .filter(e -> !map(schema.getOrDefault("properties", Map.of()))
                                .containsKey(e.getKey()))
                        .allMatch(e -> !wanted.equals(false) && accepts(map(wanted), e.getValue()));
            case "propertyNames" -> value.keySet().stream().allMatch(name -> accepts(map(wanted), name));
            case "minProperties" -> value.size() >= (Integer) wanted;
            case "maxProperties" -> value.size() <= (Integer) wanted;
            case "dependentRequired" ->
                map(wanted).entrySet().stream()
                        .allMatch(e ->
                                !value.containsKey(e.getKey()) || value.keySet().containsAll(list(e.getValue())));
            case "dependentSchemas" ->
                map(wanted).entrySet().stream()
                        .allMatch(e -> !value.containsKey(e.getKey()) || accepts(map(e.getValue()), value));
            default -> throw new IllegalStateException("keyword " + keyword + " is not known to this judge");
        };
    }

    private long count(Object schemas, Object value) {
        return list(schemas).stream().filter(s -> accepts(map(s), value)).count();
    }

    private boolean prefix(List<Object> wanted, List<?> items) {
        for (int i = 0; i < Math.min(wanted.size(), items.size()); i++) {
            if (!accepts(map(wanted.get(i)), items.get(i))) {
                return false;
            }
        }
        return true;
    }

    private static List<Object> types(Object wanted) {
        return wanted instanceof List<?> ? list(wanted) : List.of(wanted);
    }

    private static String type(Object value) {
        return value instanceof Map<?, ?> ? "object" : value instanceof List<?> ? "array" : "string";
    }

    private static Object data(Node node) {
        if (node instanceof Node.Mapping mapping) {
            Map<String, Object> map = new LinkedHashMap<>();
            mapping.entries().forEach(e -> map.put(e.key(), data(e.value())));
            return map;
        }
        if (node instanceof Node.Sequence list) {
            return list.items().stream().map(SchemaJudge::data).toList();
        }
        return ((Node.Scalar) node).text();
    }

    @SuppressWarnings("unchecked") // JSON objects have text keys
    static Map<String, Object> map(Object value) {
        return (Map<String, Object>) value;
    }

    @SuppressWarnings("unchecked") // any list is a list of objects
    static List<Object> list(Object value) {
        return (List<Object>) value;
    }

    private static Object json(String text) {
        try (JsonParser parser = new JsonFactory().createParser(text)) {
            parser.nextToken();
            return value(parser);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private static Object value(JsonParser parser) throws IOException {
        return switch (parser.currentToken()) {
            case START_OBJECT -> {
                Map<String, Object> map = new LinkedHashMap<>();
                while (parser.nextToken() != JsonToken.END_OBJECT) {
                    String name = parser.currentName();
                    parser.nextToken();
                    if (map.put(name, value(parser)) != null) {
                        throw new IllegalStateException("repeated name " + name);
                    }
                }
                yield map;
            }
            case START_ARRAY -> {
                List<Object> list = new ArrayList<>();
                while (parser.nextToken() != JsonToken.END_ARRAY) {
                    list.add(value(parser));
                }
                yield list;
            }
            case VALUE_NUMBER_INT -> parser.getIntValue();
            case VALUE_FALSE -> false;
            default -> parser.getText();
        };
    }
}
