package flowshy.report.html.section;

import flowshy.report.EnvelopeReport;
import flowshy.report.html.Html;
import flowshy.verdict.envelope.EnvelopeAnswer;

/** Every limit at the worst of the states that the device must bear. */
final class EnvelopeSection implements ReportSection {
    @Override
    public String id() {
        return "envelope";
    }

    @Override
    public String heading() {
        return "Envelope";
    }

    @Override
    public boolean asked(StudyReport report) {
        return report.answer().envelope().isPresent();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        EnvelopeAnswer states = report.answer().envelope().orElseThrow();
        html.tag("p").holds(() -> words.badge(states.decision()));
        words.paragraph(states.sentence());
        words.facts(
                "What moves", () -> states.sides().forEach(side -> words.fact(side.key(), EnvelopeReport.moves(side))));
        words.facts(
                "Each limit at its worst",
                () -> states.limits().forEach(worst -> words.fact(worst.limit().name(), EnvelopeReport.words(worst))));
        words.paragraph(EnvelopeReport.how(states));
    }
}
