package flowshy.study.keys;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Maps, lists, words, counts and flags as JSON text, indented by two blanks. */
final class JsonText {
    private JsonText() {}

    static String of(Object value) {
        StringBuilder out = new StringBuilder();
        write(out, value, "\n");
        return out.append('\n').toString();
    }

    private static void write(StringBuilder out, Object value, String line) {
        if (value instanceof Map<?, ?> map) {
            List<Object[]> entries = new ArrayList<>();
            map.forEach((key, inner) -> entries.add(new Object[] {key, inner}));
            String separator = "{";
            for (Object[] entry : entries) {
                out.append(separator).append(line).append("  ");
                quote(out, entry[0].toString());
                out.append(": ");
                write(out, entry[1], line + "  ");
                separator = ",";
            }
            out.append(entries.isEmpty() ? "{}" : line + "}");
        } else if (value instanceof List<?> list) {
            String separator = "[";
            for (Object item : list) {
                out.append(separator);
                separator = ", ";
                write(out, item, line + "  ");
            }
            out.append(list.isEmpty() ? "[]" : "]");
        } else if (value instanceof Boolean || value instanceof Integer) {
            out.append(value);
        } else {
            quote(out, value.toString());
        }
    }

    private static void quote(StringBuilder out, String text) {
        out.append('"');
        text.codePoints().forEach(c -> {
            if (c == '"' || c == '\\') {
                out.append('\\').appendCodePoint(c);
            } else if (c < 0x20) {
                out.append(String.format("\\u%04x", c));
            } else {
                out.appendCodePoint(c);
            }
        });
        out.append('"');
    }
}
