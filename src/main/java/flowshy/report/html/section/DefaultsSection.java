package flowshy.report.html.section;

import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.report.html.Typography;
import flowshy.study.Study.TakenAs;
import flowshy.verdict.error.SourceError;
import flowshy.verdict.error.SourceError.Assumed;
import java.util.List;

/** Every default taken, and what half and twice of the assumed numbers of the surroundings would change. */
final class DefaultsSection implements ReportSection {
    @Override
    public String id() {
        return "defaults";
    }

    @Override
    public String heading() {
        return "Taken as, for want of a statement";
    }

    @Override
    public boolean asked(StudyReport report) {
        return !report.study().takenAs().isEmpty() || !assuming(report).isEmpty();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        Tables.scrolled(
                html,
                "Defaults",
                () -> html.tag("table").with("class", "texts").holds(() -> {
                    html.tag("caption", "Defaults");
                    words.head("key", "taken as", "because");
                    html.tag("tbody").holds(() -> report.study().takenAs().forEach(taken -> row(html, taken)));
                }));
        List<SourceError> sources = assuming(report);
        if (!sources.isEmpty()) {
            halfAndTwice(html, words, sources);
        }
    }

    private static List<SourceError> assuming(StudyReport report) {
        return report.answer().error().stream()
                .flatMap(budget -> budget.sources().stream())
                .filter(source -> !source.assumed().isEmpty())
                .toList();
    }

    private static void row(Html html, TakenAs taken) {
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").holds(() -> html.user(taken.key()));
            html.tag("td").holds(() -> html.user(Typography.set(taken.value())));
            html.tag("td").holds(() -> html.user(Typography.set(taken.why())));
        });
    }

    private static void halfAndTwice(Html html, Words words, List<SourceError> sources) {
        String caption =
                "Assumed numbers of the surroundings: the error of the source with half and with twice of each";
        Tables.scrolled(
                html,
                caption,
                () -> html.tag("table").with("class", "figures").holds(() -> {
                    html.tag("caption", caption);
                    words.head("source and number", "in SI", "error as taken", "with half of it", "with twice of it");
                    html.tag("tbody")
                            .holds(() -> sources.forEach(
                                    source -> source.assumed().forEach(assumed -> row(html, words, source, assumed))));
                }));
    }

    private static void row(Html html, Words words, SourceError source, Assumed assumed) {
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").with("class", "name").holds(() -> {
                html.user(source.name());
                html.text(": " + assumed.key());
            });
            html.tag("td").holds(() -> words.amount(assumed.value(), "", 3));
            html.tag("td").holds(() -> words.amount(source.rms(), "m/s2 rms", 3));
            html.tag("td").holds(() -> words.amount(assumed.half(), "m/s2 rms", 3));
            html.tag("td").holds(() -> words.amount(assumed.twice(), "m/s2 rms", 3));
        });
    }
}
