package flowshy.report.html.section;

import flowshy.report.Column;
import flowshy.report.LidReport;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.verdict.lid.CoverRow;
import flowshy.verdict.lid.LidAnswer;
import java.util.List;

/** Covers side by side, where the study names candidates or a cover. */
final class LidSection implements ReportSection {
    @Override
    public String id() {
        return "covers";
    }

    @Override
    public String heading() {
        return "Covers and lid";
    }

    @Override
    public boolean asked(StudyReport report) {
        return report.lid().isPresent();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        LidAnswer answer = report.lid().orElseThrow();
        boolean choice = !report.study().candidates().isEmpty();
        if (choice) {
            html.tag("p").holds(() -> {
                words.badge(answer.verdict().decision());
                html.text(" ");
                words.sentence(answer.verdict().sentence());
            });
        }
        if (choice && !answer.remedies().isEmpty()) {
            html.tag("p", "What would make the nearest candidate do:");
            html.tag("ul")
                    .holds(() ->
                            answer.remedies().forEach(remedy -> html.tag("li").holds(() -> words.sentence(remedy))));
        }
        html.tag("p").holds(() -> {
            html.text("Bare, without a cover: ");
            words.sentence(LidReport.bare(answer));
        });
        html.tag("p").holds(() -> {
            html.text("Sensitivity is set against the bare device and noise is thermal, both at ");
            words.amount(answer.reference(), "Hz", 4);
            html.text(". Error and offset are those of the surroundings.");
            if (answer.worst().isPresent()) {
                html.text(" Worst: of all states of the envelope; the other figures hold at the study's own state. ");
                words.sentence(LidReport.FILLED);
            }
        });
        words.charts(id());
        Tables.of(html, "Covers side by side", columns(answer), answer.covers())
                .named("cover", LidSection::name)
                .write();
        html.tag("dl").holds(() -> answer.covers().forEach(row -> remarks(html, words, row)));
        required(html, words, answer);
    }

    private static List<Column<CoverRow>> columns(LidAnswer answer) {
        return LidReport.columns(answer).stream()
                .filter(column -> answer.covers().stream()
                        .anyMatch(row -> column.cell().apply(row).value().isPresent()))
                .toList();
    }

    private static void name(Html html, CoverRow row) {
        html.user(row.candidate().cover().words());
        html.text(", in ");
        html.user(row.candidate().around().name());
    }

    private static void remarks(Html html, Words words, CoverRow row) {
        html.tag("dt").holds(() -> {
            words.badge(row.verdict().decision());
            html.text(" ");
            name(html, row);
        });
        html.tag("dd")
                .holds(() -> html.tag("ul").holds(() -> {
                    if (row.misses().isEmpty()) {
                        html.tag("li", "Meets every limit that can be judged.");
                    }
                    row.misses().forEach(miss -> html.tag("li").holds(() -> words.sentence(miss)));
                    if (row.envelope().isPresent()) {
                        html.tag("li")
                                .holds(() ->
                                        words.sentence(LidReport.overStates(row).strip()));
                    }
                    row.warnings()
                            .forEach(warning -> html.tag("li").holds(() -> {
                                html.tag("strong", "warning");
                                html.text(" ");
                                words.sentence(warning);
                            }));
                }));
    }

    private static void required(Html html, Words words, LidAnswer answer) {
        html.tag("h3", "Attenuation a cover must give");
        answer.requiredError()
                .ifPresent(level -> html.tag("p").holds(() -> {
                    html.text("For the error limit: ");
                    words.amount(level, "dB", 4);
                    html.text(" over the band, at the operating point of the bare hair.");
                    answer.worst().flatMap(LidAnswer.OverStates::error).ifPresent(most -> {
                        html.text(" At its worst ");
                        words.amount(most.value(), "dB", 4);
                        html.text(", at ");
                        words.sentence(most.words() + ".");
                    });
                }));
        Tables.of(html, "For the margin of rejection", LidReport.required(answer), LidReport.points(answer))
                .write();
        answer.worst().ifPresent(over -> words.paragraph(LidReport.worstAt(over)));
    }
}
