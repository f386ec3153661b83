package flowshy.report.html.section;

import flowshy.report.Cautions;
import flowshy.report.html.Html;

/** What must not be read into the figures. */
final class CautionsSection implements ReportSection {
    @Override
    public String id() {
        return "cautions";
    }

    @Override
    public String heading() {
        return "Cautions";
    }

    @Override
    public void write(Html html, StudyReport report) {
        html.tag("p").with("class", "caution").holds(Cautions.SHORT);
    }
}
