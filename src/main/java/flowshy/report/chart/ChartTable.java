package flowshy.report.chart;

import java.util.ArrayList;
import java.util.List;

/**
 * The numbers behind a picture.
 *
 * @param heads one a column
 * @param rows each as long as the heads
 */
public record ChartTable(List<Head> heads, List<Row> rows) {
    /**
     * Head of a column of numbers.
     *
     * @param name for programs, ends in its unit, e.g. {@code frequency_hz}
     * @param words for people
     * @param unit for people, empty for pure numbers
     */
    public record Head(String name, String words, String unit) {}

    /**
     * One row.
     *
     * @param label what the row belongs to, e.g. the name of a curve; empty where the table needs none
     * @param values one a column; NaN where there is no number
     */
    public record Row(String label, List<Double> values) {
        /** Copies the list. */
        public Row {
            values = List.copyOf(values);
        }
    }

    /** @throws IllegalArgumentException if a row is not as long as the heads */
    public ChartTable {
        heads = List.copyOf(heads);
        rows = List.copyOf(rows);
        for (Row row : rows) {
            if (row.values().size() != heads.size()) {
                throw new IllegalArgumentException(
                        row.values().size() + " values under " + heads.size() + " heads: " + row.label());
            }
        }
    }

    /**
     * One column.
     *
     * @param name as in its head
     * @return its numbers, one a row
     * @throws IllegalArgumentException if there is no such column
     */
    public List<Double> column(String name) {
        for (int i = 0; i < heads.size(); i++) {
            if (heads.get(i).name().equals(name)) {
                List<Double> numbers = new ArrayList<>();
                for (Row row : rows) {
                    numbers.add(row.values().get(i));
                }
                return numbers;
            }
        }
        throw new IllegalArgumentException("no column " + name);
    }

    /**
     * Whether rows carry labels.
     *
     * @return true if one does
     */
    public boolean labelled() {
        return rows.stream().anyMatch(row -> !row.label().isEmpty());
    }
}
