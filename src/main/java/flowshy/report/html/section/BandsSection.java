package flowshy.report.html.section;

import flowshy.math.Caveat.Subject;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.ReadingBand;
import java.util.EnumSet;
import java.util.List;

/** What the device reads in which band. */
final class BandsSection implements ReportSection {
    @Override
    public String id() {
        return "bands";
    }

    @Override
    public String heading() {
        return "Bands";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        BandsAnswer answer = report.answer();
        html.tag("p").holds(() -> {
            html.text(
                    "Rejection is the response to motion of the base over the response to flow, at equal acceleration. The margin is ");
            words.amount(answer.acceptance().margin(), "dB", 4);
            html.text(
                    answer.acceptance().rejection().isPresent() ? ", as the study asks." : ", taken as the usual one.");
        });
        bands(html, words, "Bands over the band of use", answer.bands());
        answer.least().ifPresent(least -> extreme(html, words, "Least rejection: ", least));
        answer.largest().ifPresent(most -> extreme(html, words, "Largest rejection: ", most));
        words.caveats(EnumSet.of(Subject.REJECTION));
    }

    /** Bands as a table, each with the rejection at its ends where there is one. */
    static void bands(Html html, Words words, String caption, List<ReadingBand> bands) {
        boolean levels = bands.stream().anyMatch(band -> Double.isFinite(band.rejectionFrom()));
        Tables.scrolled(
                html,
                caption,
                () -> html.tag("table").with("class", "figures").holds(() -> {
                    html.tag("caption", caption);
                    if (levels) {
                        words.head("reads", "from", "to", "rejection at the lower end", "at the upper end");
                    } else {
                        words.head("reads", "from", "to");
                    }
                    html.tag("tbody")
                            .holds(() -> bands.forEach(band -> html.tag("tr").holds(() -> {
                                html.tag("th")
                                        .with("scope", "row")
                                        .with("class", "name")
                                        .holds(band.reads().word());
                                html.tag("td").holds(() -> words.amount(band.from(), "Hz", 6));
                                html.tag("td").holds(() -> words.amount(band.to(), "Hz", 6));
                                if (levels) {
                                    html.tag("td").holds(() -> level(html, words, band.rejectionFrom()));
                                    html.tag("td").holds(() -> level(html, words, band.rejectionTo()));
                                }
                            })));
                }));
    }

    private static void level(Html html, Words words, double rejection) {
        if (Double.isFinite(rejection)) {
            words.amount(rejection, "dB", 4);
        } else {
            html.text(rejection > 0.0 ? "no bound" : "–");
        }
    }

    private static void extreme(Html html, Words words, String label, BandsAnswer.Extreme extreme) {
        html.tag("p").holds(() -> {
            html.text(label);
            words.amount(extreme.rejection(), "dB", 4);
            html.text(" at ");
            words.amount(extreme.frequency(), "Hz", 5);
            html.text(".");
        });
    }
}
