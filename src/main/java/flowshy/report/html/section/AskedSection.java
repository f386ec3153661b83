package flowshy.report.html.section;

import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.report.html.Typography;
import flowshy.study.Study.Understood;

/** What the study asked, as written and in SI. */
final class AskedSection implements ReportSection {
    @Override
    public String id() {
        return "asked";
    }

    @Override
    public String heading() {
        return "What was asked";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        words.paragraph(
                "In which bands does this device read motion, and in which does it read flow? Every value that the study states, and every"
                        + " number that a named surrounding stands for:");
        Tables.scrolled(
                html,
                "Values of the study",
                () -> html.tag("table").with("class", "texts").holds(() -> {
                    html.tag("caption", "Values of the study");
                    words.head("key", "as written", "in SI");
                    html.tag("tbody").holds(() -> report.study().understood().forEach(value -> row(html, value)));
                }));
        if (!report.study().origin().settings().isEmpty()) {
            html.tag("p", "These settings of the command line were laid over the file:");
            html.tag("ul")
                    .holds(() -> report.study()
                            .origin()
                            .settings()
                            .forEach(setting -> html.tag("li")
                                    .holds(() -> html.tag("code").holds(() -> html.user("--set " + setting)))));
        }
    }

    private static void row(Html html, Understood value) {
        boolean same = value.written().equals(value.si());
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").holds(() -> html.user(value.key()));
            html.tag("td").holds(() -> html.user(value.written()));
            html.tag("td").holds(same ? "" : Typography.set(value.si()));
        });
    }
}
