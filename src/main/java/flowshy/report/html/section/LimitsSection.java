package flowshy.report.html.section;

import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.verdict.Limit;
import java.util.List;

/** Limit by limit: required, found, where. */
final class LimitsSection implements ReportSection {
    @Override
    public String id() {
        return "limits";
    }

    @Override
    public String heading() {
        return "Limits";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        List<Limit> limits = report.answer().verdict().limits();
        if (limits.isEmpty()) {
            words.paragraph("The study states no limit: nothing is accepted or refused here.");
            return;
        }
        Tables.scrolled(
                html,
                "Limits",
                () -> html.tag("table").with("class", "texts").holds(() -> {
                    html.tag("caption", "Limits of the study");
                    words.head("limit", "required", "found", "at", "decision", "remark");
                    html.tag("tbody").holds(() -> limits.forEach(limit -> row(html, words, limit)));
                }));
    }

    private static void row(Html html, Words words, Limit limit) {
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").with("class", "name").holds(limit.name());
            html.tag("td").holds(() -> {
                html.text(limit.sense().words() + " ");
                words.amount(limit.required(), limit.unit(), 4);
            });
            html.tag("td")
                    .holds(() -> limit.found()
                            .ifPresentOrElse(
                                    found -> words.amount(found, limit.unit(), 4), () -> html.text("no figure")));
            html.tag("td")
                    .holds(() -> limit.at().ifPresentOrElse(at -> words.amount(at, "Hz", 4), () -> html.text("–")));
            html.tag("td").holds(() -> words.badge(limit.decision()));
            html.tag("td").with("class", "name").holds(() -> words.sentence(limit.reason()));
        });
    }
}
