package flowshy.report.html;

import flowshy.report.Cell;
import flowshy.report.Column;
import flowshy.report.html.Amount.Scale;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.BiConsumer;
import java.util.function.Predicate;
import java.util.regex.Pattern;

/**
 * Tables from the same columns that terminal, CSV and JSON use: wide ones scroll in a box of their own, what is missing has its reason
 * under the table.
 *
 * @param <T> what a row is made of
 */
public final class Tables<T> {
    private static final Pattern UNIT_OF_NAME = Pattern.compile(
            "_(?:hz|db|deg|rad_per_m_s2|m_s2_per_m_s|m_s2_per_rthz|m_s2|m_s|percent|kg_m3|pa_s|m|rad)$");

    /** So many rows stand on one sheet of paper; a longer table may go on on the next. */
    private static final int SHORT = 12;

    private final Html html;
    private final String caption;
    private final List<Column<T>> columns;
    private final List<T> rows;
    private String title = "";
    private BiConsumer<Html, T> name = (page, row) -> {};
    private Predicate<T> marked = row -> false;

    private Tables(Html html, String caption, List<Column<T>> columns, List<T> rows) {
        this.html = html;
        this.caption = caption;
        this.columns = List.copyOf(columns);
        this.rows = List.copyOf(rows);
    }

    /**
     * A table of numbers.
     *
     * @param html where to write
     * @param caption what it shows, a few words
     * @param columns in order
     * @param rows in order
     * @param <T> what a row is made of
     * @return to be named, marked and written
     */
    public static <T> Tables<T> of(Html html, String caption, List<Column<T>> columns, List<T> rows) {
        return new Tables<>(html, caption, columns, rows);
    }

    /**
     * Gives the rows names.
     *
     * @param head over the names
     * @param writer writes the name of a row
     * @return this
     */
    public Tables<T> named(String head, BiConsumer<Html, T> writer) {
        title = head;
        name = writer;
        return this;
    }

    /**
     * Marks rows, such as those outside the band of use.
     *
     * @param rowsMarked which
     * @return this
     */
    public Tables<T> marked(Predicate<T> rowsMarked) {
        marked = rowsMarked;
        return this;
    }

    /** Writes the table and, under it, the reasons of what is missing. */
    public void write() {
        List<Scale> scales = columns.stream().map(this::scale).toList();
        scrolled(
                html,
                caption,
                () -> html.tag("table")
                        .with("class", rows.size() <= SHORT ? "figures short" : "figures")
                        .holds(() -> {
                            html.tag("caption", caption);
                            html.tag("thead").holds(() -> html.tag("tr").holds(() -> head(scales)));
                            html.tag("tbody")
                                    .holds(() -> rows.forEach(row -> {
                                        Html.Tag line = html.tag("tr");
                                        (marked.test(row) ? line.with("class", "outside") : line)
                                                .holds(() -> cells(row, scales));
                                    }));
                        }));
        missing();
    }

    /**
     * A box that scrolls by itself when what it holds is wider than the page.
     *
     * @param html where to write
     * @param label said by a reader that cannot see it
     * @param inside writes the table
     */
    public static void scrolled(Html html, String label, Runnable inside) {
        html.tag("div")
                .with("class", "wide")
                .with("role", "region")
                .with("aria-label", label)
                .with("tabindex", "0")
                .holds(inside);
    }

    private void head(List<Scale> scales) {
        if (!title.isEmpty()) {
            html.tag("th").with("scope", "col").with("class", "name").holds(title);
        }
        for (int c = 0; c < columns.size(); c++) {
            Column<T> column = columns.get(c);
            String unit = scales.get(c).prefix() + Typography.unit(column.unit());
            html.tag("th").with("scope", "col").holds(() -> {
                html.text(words(column));
                if (!unit.isEmpty()) {
                    html.text(" ");
                    html.tag("span").with("class", "unit").holds(unit);
                }
            });
        }
    }

    /** The column's name for programs, without its unit, is the whole word that the terminal cuts short. */
    private static String words(Column<?> column) {
        return UNIT_OF_NAME
                .matcher(column.name())
                .replaceFirst("")
                .replace('_', ' ')
                .replace("womersley", "Womersley number");
    }

    private void cells(T row, List<Scale> scales) {
        if (!title.isEmpty()) {
            html.tag("th").with("scope", "row").with("class", "name").holds(() -> name.accept(html, row));
        }
        for (int c = 0; c < columns.size(); c++) {
            Column<T> column = columns.get(c);
            Cell cell = column.cell().apply(row);
            Scale scale = scales.get(c);
            html.tag("td").holds(() -> {
                if (cell.value().isEmpty()) {
                    html.text("–");
                    return;
                }
                double value = cell.value().getAsDouble();
                html.tag("data")
                        .with("value", new Amount(value, column.unit(), column.digits()).machine())
                        .holds(scale.text(value, column.digits()));
            });
        }
    }

    private void missing() {
        for (Column<T> column : columns) {
            Set<String> reasons = new TreeSet<>();
            rows.forEach(row -> {
                Cell cell = column.cell().apply(row);
                if (cell.value().isEmpty()) {
                    reasons.add(cell.reason());
                }
            });
            if (!reasons.isEmpty()) {
                html.tag("p")
                        .with("class", "missing")
                        .holds("– under “" + words(column) + "”: " + String.join("; ", reasons) + ".");
            }
        }
    }

    private Scale scale(Column<T> column) {
        List<Double> values = new ArrayList<>();
        rows.forEach(row -> column.cell().apply(row).value().ifPresent(values::add));
        return Scale.of(column.unit(), values);
    }
}
