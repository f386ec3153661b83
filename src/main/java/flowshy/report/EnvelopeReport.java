package flowshy.report;

import static flowshy.math.Figures.say;

import flowshy.math.Figures;
import flowshy.verdict.envelope.EnvelopeAnswer;
import flowshy.verdict.envelope.EnvelopeAnswer.Worst;
import flowshy.verdict.envelope.Side;
import java.util.List;

/** The verdict over all states of an envelope, for every form of an answer. */
public final class EnvelopeReport {
    private static final String NO_FLOW = "no flow enters in any state";

    private EnvelopeReport() {}

    /**
     * What moves, in words.
     *
     * @param side one number of the envelope
     * @return its values
     */
    public static String moves(Side side) {
        List<String> words = side.words();
        return side.range()
                ? words.get(0) + " to " + words.get(words.size() - 1) + ", " + words.size() + " values evenly between"
                : String.join(", ", words);
    }

    /**
     * How it was judged.
     *
     * @param answer what was found
     * @return sentences
     */
    public static String how(EnvelopeAnswer answer) {
        return say(
                "%s states, %s of them corners: every combination of these values. The worst need not be a corner; between the values"
                        + " nothing is judged. The suspension is held as measured on the study's own state.",
                answer.states(), answer.corners());
    }

    static void print(TextPage page, EnvelopeAnswer answer) {
        page.heading("Envelope: " + answer.decision().word());
        sides(page, answer);
        for (Worst worst : answer.limits()) {
            page.row("worst " + worst.limit().name(), words(worst));
        }
        if (answer.least().isPresent()) {
            page.row(
                    "least rejection",
                    Figures.of(answer.least().getAsDouble(), 4) + " to "
                            + Figures.of(answer.most().orElseThrow(), 4) + " dB over the states");
        }
        answer.impossible().forEach(one -> page.note("[cannot be worked out]", one.state() + ": " + one.reason()));
    }

    /** The states alone, where the answers of several devices follow. */
    static void states(TextPage page, EnvelopeAnswer answer) {
        page.heading("Envelope");
        sides(page, answer);
    }

    private static void sides(TextPage page, EnvelopeAnswer answer) {
        answer.sides().forEach(side -> page.row(side.key(), moves(side)));
        page.paragraph(how(answer));
    }

    /**
     * A limit at its worst, in words.
     *
     * @param worst what was found
     * @return decision, figure and state
     */
    public static String words(Worst worst) {
        String found = worst.limit().found().isPresent()
                ? (Figures.of(worst.limit().found().getAsDouble(), 4) + " "
                                + worst.limit().unit())
                        .strip()
                : "no figure";
        return worst.limit().decision().word() + ": " + found + " at " + worst.state()
                + (worst.corner() ? "" : ", inside the envelope");
    }

    static void write(JsonPage json, EnvelopeAnswer answer) {
        json.object("envelope", () -> {
            json.text("decision", answer.decision().word());
            json.whole("states", answer.states());
            json.whole("corners", answer.corners());
            json.array("sides", answer.sides(), side -> {
                json.text("key", side.key());
                json.bool("range", side.range());
                json.texts("values", side.words());
            });
            json.array("worst", answer.limits(), worst -> {
                json.text("state", worst.state());
                json.bool("corner", worst.corner());
                json.object("limit", () -> LimitJson.write(json, worst.limit()));
            });
            json.cell("least_rejection_db", Cell.of(answer.least(), NO_FLOW));
            answer.lowest().ifPresent(least -> json.text("least_rejection_state", least.state()));
            json.cell("largest_least_rejection_db", Cell.of(answer.most(), NO_FLOW));
            answer.error().ifPresent(most -> {
                json.number("largest_error_rms_m_s2", most.value());
                json.text("largest_error_state", most.state());
            });
            json.array("impossible", answer.impossible(), one -> {
                json.text("state", one.state());
                json.text("reason", one.reason());
            });
            json.text("sentence", answer.sentence());
        });
    }
}
