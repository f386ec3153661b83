package flowshy.report.chart;

import flowshy.report.chart.ChartTable.Head;
import flowshy.report.chart.ChartTable.Row;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;

/**
 * Table of a chart whose rows are of one kind, column by column; a curve takes its numbers from here, so that picture and table cannot differ.
 *
 * @param <T> what a row is made of
 */
public final class Columns<T> {
    private final List<T> rows;
    private final Map<Head, List<Double>> columns = new LinkedHashMap<>();

    /**
     * A table without columns.
     *
     * @param rows in order
     */
    public Columns(List<T> rows) {
        this.rows = List.copyOf(rows);
    }

    /**
     * Adds a column.
     *
     * @param name for programs, ends in its unit
     * @param words for people
     * @param unit for people, empty for pure numbers
     * @param value of a row
     * @return its numbers, one a row; what is not finite becomes NaN
     */
    public List<Double> add(String name, String words, String unit, ToDoubleFunction<T> value) {
        List<Double> numbers = new ArrayList<>();
        for (T row : rows) {
            double number = value.applyAsDouble(row);
            numbers.add(Double.isFinite(number) ? number : Double.NaN);
        }
        columns.put(new Head(name, words, unit), numbers);
        return numbers;
    }

    /**
     * The table.
     *
     * @return with every column added so far
     */
    public ChartTable table() {
        List<Row> all = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            List<Double> values = new ArrayList<>();
            for (List<Double> column : columns.values()) {
                values.add(column.get(i));
            }
            all.add(new Row("", values));
        }
        return new ChartTable(List.copyOf(columns.keySet()), all);
    }
}
