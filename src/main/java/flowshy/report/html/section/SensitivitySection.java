package flowshy.report.html.section;

import flowshy.report.SensitivityReport;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;

/** What each dimension and property does to the rejection. */
final class SensitivitySection implements ReportSection {
    @Override
    public String id() {
        return "sensitivities";
    }

    @Override
    public String heading() {
        return "What to tighten first";
    }

    @Override
    public boolean asked(StudyReport report) {
        return !report.slopes().numbers().isEmpty();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        words.paragraph(SensitivityReport.WHAT + " " + SensitivityReport.places(report.slopes()));
        words.charts(id());
        Tables.of(
                        html,
                        "Change of the rejection, the strongest first",
                        SensitivityReport.columns(report.slopes()),
                        report.slopes().numbers())
                .named("number", (page, one) -> page.text(SensitivityReport.name(one)))
                .write();
        words.paragraph(SensitivityReport.how(report.slopes()));
    }
}
