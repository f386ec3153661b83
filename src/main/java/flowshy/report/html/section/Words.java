package flowshy.report.html.section;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.report.Cell;
import flowshy.report.Column;
import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.html.Amount;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.report.html.Typography;
import flowshy.verdict.Decision;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.function.Predicate;

/** Turns of phrase that several sections share. */
final class Words {
    private static final int DIGITS = 4;

    private final Html html;
    private final StudyReport report;
    private final Typography typography;

    Words(Html html, StudyReport report) {
        this.html = html;
        this.report = report;
        this.typography = report.typography();
    }

    /** A paragraph of ours. */
    void paragraph(String sentence) {
        html.tag("p").holds(() -> sentence(sentence));
    }

    /** A sentence of ours in what is open. */
    void sentence(String sentence) {
        typography.sentence(html, sentence);
    }

    /** Caveats about some subjects, beside the numbers they touch. */
    void caveats(Set<Subject> subjects) {
        caveats(caveat -> subjects.contains(caveat.about()));
    }

    /** Caveats of a kind, as a list; nothing if there are none. */
    void caveats(Predicate<Caveat> kind) {
        List<Caveat> found = report.answer().caveats().stream().filter(kind).toList();
        if (found.isEmpty()) {
            return;
        }
        html.tag("ul")
                .with("class", "caveats")
                .holds(() -> found.forEach(caveat -> html.tag("li")
                        .with(
                                "class",
                                caveat.weight().name().toLowerCase(Locale.ROOT).replace('_', '-'))
                        .holds(() -> {
                            html.tag("strong", caveat.weight().words());
                            html.text(" ");
                            sentence(caveat.text());
                        })));
    }

    /** A decision as a sign and a word. */
    void badge(Decision decision) {
        html.tag("span").with("class", "badge " + decision.word()).holds(sign(decision) + "\u00A0" + spoken(decision));
    }

    private static String sign(Decision decision) {
        return switch (decision) {
            case MEETS -> "✓";
            case FAILS -> "✗";
            case UNDECIDED -> "?";
            case NOT_ASKED -> "–";
        };
    }

    private static String spoken(Decision decision) {
        return decision.word().replace('-', ' ');
    }

    /** A table of two columns: what, and how much. */
    void facts(String label, Runnable rows) {
        Tables.scrolled(
                html,
                label,
                () -> html.tag("table").with("class", "facts").holds(() -> {
                    html.tag("caption", label);
                    html.tag("tbody").holds(rows);
                }));
    }

    /** A row of such a table. */
    void fact(String what, Runnable value) {
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").holds(what);
            html.tag("td").holds(value);
        });
    }

    /** A row whose value is one amount. */
    void fact(String what, double value, String unit, int digits) {
        fact(what, () -> amount(value, unit, digits));
    }

    /** A row whose value is a text of ours. */
    void fact(String what, String value) {
        fact(what, () -> sentence(value));
    }

    /** An amount in what is open. */
    void amount(double value, String unit, int digits) {
        html.amount(new Amount(value, unit, digits));
    }

    /** A line of cells; the first heads the row. */
    void head(String... cells) {
        html.tag("thead")
                .holds(() -> html.tag("tr").holds(() -> {
                    for (String cell : cells) {
                        html.tag("th").with("scope", "col").holds(cell);
                    }
                }));
    }

    /** Every chart that belongs to a section, each with its description and, folded away, the numbers behind it. */
    void charts(String section) {
        report.charts().stream()
                .filter(chart -> FurtherChartsSection.home(chart).equals(section))
                .forEach(this::chart);
    }

    private void chart(Chart chart) {
        html.tag("figure").with("id", "chart-" + chart.name()).holds(() -> {
            html.drawing(chart.svg(chart.name()));
            html.tag("figcaption").holds(() -> {
                html.tag("strong", chart.title());
                html.text(". ");
                sentence(chart.description());
            });
        });
        html.tag("details").holds(() -> {
            html.tag("summary", "The numbers behind this chart");
            numbers(chart.title(), chart.table());
        });
    }

    private void numbers(String caption, ChartTable table) {
        List<Column<ChartTable.Row>> columns = new ArrayList<>();
        for (int c = 0; c < table.heads().size(); c++) {
            int at = c;
            ChartTable.Head head = table.heads().get(c);
            columns.add(new Column<>(
                    head.words(),
                    head.words(),
                    head.unit(),
                    DIGITS,
                    row -> Cell.of(row.values().get(at), "no value there")));
        }
        Tables<ChartTable.Row> numbers = Tables.of(html, caption, columns, table.rows());
        (table.labelled() ? numbers.named("curve", (page, row) -> page.user(row.label())) : numbers).write();
    }
}
