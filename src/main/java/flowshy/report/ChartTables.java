package flowshy.report;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.chart.ChartTable.Head;
import java.util.ArrayList;
import java.util.List;

/** The tables behind charts as CSV and JSON, so that picture and numbers come from one place. */
public final class ChartTables {
    private static final String NONE = "there is no such number here";

    private ChartTables() {}

    /**
     * A table as CSV.
     *
     * @param table behind a chart
     * @return text; the first column holds labels if there are any
     */
    public static String csv(ChartTable table) {
        boolean labelled = table.labelled();
        List<String> head = new ArrayList<>(labelled ? List.of("label") : List.of());
        table.heads().stream().map(Head::name).forEach(head::add);
        List<List<String>> rows = new ArrayList<>();
        for (ChartTable.Row row : table.rows()) {
            List<String> fields = new ArrayList<>(labelled ? List.of(row.label()) : List.of());
            for (double value : row.values()) {
                fields.add(Double.isFinite(value) ? Figures.full(value) : "");
            }
            rows.add(fields);
        }
        return TableCsv.ofTexts(head, rows);
    }

    /**
     * Writes the field {@code charts}, with every number that is drawn.
     *
     * @param json with an open object
     * @param charts in order; nothing is written if there are none
     */
    static void write(JsonPage json, List<Chart> charts) {
        if (charts.isEmpty()) {
            return;
        }
        json.array("charts", charts, chart -> {
            json.text("name", chart.name());
            json.text("title", chart.title());
            json.text("description", chart.description());
            boolean labelled = chart.table().labelled();
            json.array("rows", chart.table().rows(), row -> {
                if (labelled) {
                    json.text("label", row.label());
                }
                for (int i = 0; i < row.values().size(); i++) {
                    json.cell(
                            chart.table().heads().get(i).name(),
                            Cell.of(row.values().get(i), NONE));
                }
            });
        });
    }
}
