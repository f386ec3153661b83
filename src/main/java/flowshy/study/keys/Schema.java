package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * The key table as JSON Schema (draft 2020-12), for editors that check while one types. The reader stays the judge: what a
 * unit means, and which words go together, it alone knows.
 */
public final class Schema {
    private static final String NUMBER = "[+-\u2212]?(\\d+(\\.\\d*)?|\\.\\d+)([eE][+-]?\\d+)?";

    private Schema() {}

    /**
     * The schema.
     *
     * @return JSON text ending in a line end
     */
    public static String text() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("$schema", "https://json-schema.org/draft/2020-12/schema");
        schema.put("title", "Flowshy study");
        schema.putAll(Keys.STUDY.schema());
        schema.put("$defs", definitions());
        return JsonText.of(schema);
    }

    private static Map<String, Object> definitions() {
        Map<String, Object> all = new LinkedHashMap<>();
        for (Dimension dimension : Dimension.values()) {
            all.put(name(dimension), dimension == Dimension.NUMBER ? pure() : withUnit(dimension));
        }
        return all;
    }

    private static Map<String, Object> withUnit(Dimension dimension) {
        Map<String, Object> schema = GroupSchema.map("type", "string");
        schema.put("pattern", "^\\s*" + NUMBER + "\\s*[^\\s\\d.,].*$");
        schema.put("examples", dimension.units().stream().map(u -> "1 " + u).toList());
        return schema;
    }

    private static Map<String, Object> pure() {
        Map<String, Object> schema = GroupSchema.map("type", List.of("number", "string"));
        schema.put("pattern", "^\\s*" + NUMBER + "\\s*$");
        return schema;
    }

    static String name(Dimension dimension) {
        return dimension.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
