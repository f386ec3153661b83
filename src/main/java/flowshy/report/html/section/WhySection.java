package flowshy.report.html.section;

import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.verdict.Levers;
import flowshy.verdict.Levers.Lever;

/** What would move an edge of a band or mend a limit that fails. */
final class WhySection implements ReportSection {
    @Override
    public String id() {
        return "why";
    }

    @Override
    public String heading() {
        return "What would move it";
    }

    @Override
    public boolean asked(StudyReport report) {
        return !report.why().isEmpty();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        report.why().forEach(levers -> {
            html.tag("h3").holds(() -> {
                words.amount(levers.rejection(), "dB", 4);
                html.text(" at ");
                words.amount(levers.frequency(), "Hz", 5);
            });
            words.facts("Torques per acceleration", () -> {
                words.fact("inertia, hair less fluid carried", levers.inertial(), "N.m per m/s2", 4);
                words.fact("flow: viscous drag", levers.drag(), "N.m per m/s2", 4);
                words.fact("flow: added mass", levers.addedMass(), "N.m per m/s2", 4);
                words.fact("flow: pressure gradient", levers.gradient(), "N.m per m/s2", 4);
                words.fact("dominates", levers.dominant());
            });
            changes(html, words, levers);
        });
    }

    private static void changes(Html html, Words words, Levers levers) {
        String caption = "Changes and what they do to the rejection there";
        Tables.scrolled(
                html,
                caption,
                () -> html.tag("table").with("class", "figures").holds(() -> {
                    html.tag("caption", caption);
                    words.head("change", "rejection", "the old rejection then lies at");
                    html.tag("tbody").holds(() -> levers.levers().forEach(lever -> row(html, words, lever)));
                }));
    }

    private static void row(Html html, Words words, Lever lever) {
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").with("class", "name").holds(() -> words.sentence(lever.what()));
            html.tag("td").holds(() -> {
                html.text(lever.gain() >= 0.0 ? "+" : "");
                words.amount(lever.gain(), "dB", 3);
            });
            html.tag("td")
                    .holds(() -> lever.edge()
                            .ifPresentOrElse(
                                    edge -> words.amount(edge, "Hz", 4),
                                    () -> html.text("nowhere within a factor of eight")));
        });
    }
}
