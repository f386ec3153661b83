package flowshy.report.html.section;

import flowshy.report.html.Html;
import flowshy.verdict.Decision;
import flowshy.verdict.Limit;
import flowshy.verdict.Verdict;
import flowshy.verdict.lid.LidAnswer;
import java.util.Comparator;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The decision first: one sentence and one picture, then what it rests on. */
final class DecisionSection implements ReportSection {
    /** Figures have a point but no blank after it. */
    private static final Pattern FIRST_SENTENCE = Pattern.compile("(.+?[.])\\s+(?=\\p{Lu})(.*)", Pattern.DOTALL);

    private static final List<Decision> WORST_FIRST =
            List.of(Decision.FAILS, Decision.UNDECIDED, Decision.MEETS, Decision.NOT_ASKED);

    @Override
    public String id() {
        return "decision";
    }

    @Override
    public String heading() {
        return "Decision";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        Verdict verdict = report.answer().verdict();
        List<Limit> judged = verdict.limits().stream()
                .filter(limit -> limit.decision() != Decision.NOT_ASKED)
                .sorted(Comparator.comparingInt(limit -> WORST_FIRST.indexOf(limit.decision())))
                .toList();
        Matcher first = FIRST_SENTENCE.matcher(verdict.sentence());
        html.tag("p").with("class", "lead").holds(() -> {
            words.badge(verdict.decision());
            html.text(" ");
            if (judged.isEmpty()) {
                words.sentence(first.matches() ? first.group(1) : verdict.sentence());
            } else {
                limits(html, words, judged);
            }
        });
        words.charts(id());
        words.paragraph(verdict.sentence());
        report.lid().filter(lid -> !report.study().candidates().isEmpty()).ifPresent(lid -> lid(html, words, lid));
        if (report.answer().caveats().stream().anyMatch(report::touches)) {
            html.tag("h3", "What the decision rests on");
            words.caveats(report::touches);
        }
    }

    /** One sentence, the worst limit first. */
    private static void limits(Html html, Words words, List<Limit> judged) {
        String between = "";
        for (Limit limit : judged) {
            html.text(between + limit.name());
            limit.found()
                    .ifPresentOrElse(
                            found -> {
                                html.text(" ");
                                words.amount(found, limit.unit(), 4);
                            },
                            () -> html.text(" without a figure"));
            limit.at().ifPresent(at -> {
                html.text(" at ");
                words.amount(at, "Hz", 4);
            });
            html.text(", required ");
            words.amount(limit.required(), limit.unit(), 4);
            between = "; ";
        }
        html.text(".");
    }

    private static void lid(Html html, Words words, LidAnswer lid) {
        html.tag("p").holds(() -> {
            html.text("Candidates for a cover: ");
            words.badge(lid.verdict().decision());
            html.text(" ");
            words.sentence(lid.verdict().sentence());
        });
    }
}
