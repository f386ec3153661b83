package flowshy.report.html.section;

import flowshy.report.ToleranceReport;
import flowshy.report.html.Html;
import flowshy.verdict.tolerance.ToleranceAnswer;

/** How sure the verdict is. */
final class ToleranceSection implements ReportSection {
    @Override
    public String id() {
        return "tolerance";
    }

    @Override
    public String heading() {
        return "Tolerances";
    }

    @Override
    public boolean asked(StudyReport report) {
        return report.spread().isPresent();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        ToleranceAnswer spread = report.spread().orElseThrow();
        words.paragraph(spread.sentence());
        words.charts(id());
        words.facts(
                "Chance of each limit",
                () -> spread.limits().forEach(chance -> words.fact(chance.name(), ToleranceReport.chance(chance))));
        words.facts(
                "What is uncertain",
                () -> spread.inputs().forEach(input -> words.fact(input.name(), ToleranceReport.size(input))));
        spread.left().forEach(words::paragraph);
        words.facts(
                "Share in the variance of the least rejection",
                () -> spread.figures()
                        .get(0)
                        .effects()
                        .forEach(one -> words.fact(one.input(), ToleranceReport.effect(one))));
        words.paragraph(ToleranceReport.how(spread));
    }
}
