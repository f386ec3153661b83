package flowshy.math;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Comma-separated reference values beside a test: comment lines start with #, the first other line names the columns.
 *
 * @param name the resource
 * @param rows one map a row, column name to text; never empty
 */
public record ReferenceTable(String name, List<Map<String, String>> rows) {
    /** @throws IllegalArgumentException if there are no rows, so that no loop over them can pass for nothing */
    public ReferenceTable {
        rows = List.copyOf(rows);
        if (rows.isEmpty()) {
            throw new IllegalArgumentException(name + " has no rows");
        }
    }

    /**
     * Reads a resource that stands in the package of a test.
     *
     * @param beside the test class
     * @param name name of the resource
     * @return its rows
     */
    public static ReferenceTable of(Class<?> beside, String name) {
        try (InputStream in = beside.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalArgumentException(name + " is not beside " + beside);
            }
            List<String> lines = new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#") && !line.isBlank())
                    .toList();
            String[] columns = lines.get(0).split(",", -1);
            return new ReferenceTable(
                    name,
                    lines.stream().skip(1).map(line -> row(name, columns, line)).toList());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * One number.
     *
     * @param row a row of this table
     * @param column name of a column
     * @return the number
     */
    public static double number(Map<String, String> row, String column) {
        String text = row.get(column);
        if (text == null) {
            throw new IllegalArgumentException("no column " + column + " among " + row.keySet());
        }
        return Double.parseDouble(text);
    }

    private static Map<String, String> row(String name, String[] columns, String line) {
        String[] cells = line.split(",", -1);
        if (cells.length != columns.length) {
            throw new IllegalArgumentException(name + ": " + cells.length + " cells in: " + line);
        }
        Map<String, String> row = new LinkedHashMap<>();
        for (int i = 0; i < cells.length; i++) {
            row.put(columns[i], cells[i]);
        }
        return row;
    }
}
