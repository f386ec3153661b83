package flowshy.verdict.fill;

import static flowshy.math.Figures.say;

import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.OutOfTableException;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.stream.Source;
import flowshy.stream.UnfitMediumException;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.VentedCover;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.DeviceFacts.Swing;
import flowshy.verdict.Reads;
import flowshy.verdict.Verdict;
import flowshy.verdict.envelope.Envelope;
import flowshy.verdict.envelope.EnvelopeAnswer;
import flowshy.verdict.envelope.Shortfalls;
import flowshy.verdict.error.Motion;
import flowshy.verdict.error.StreamTooFastException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/**
 * The fill decision: one device, every fill, bare and sealed, judged by every limit, amid every flow and in every state that the study states.
 * Stiffness and structural damping are held from the study.
 *
 * @param base the study's question
 * @param fills candidates, at the study's state
 * @param covers each fluid is tried under each; a cover that is not closed lets the fluid's own flow in
 */
public record FillQuestion(BandsQuestion base, List<Fill> fills, List<Cover> covers) {
    /** Copies the list. */
    public FillQuestion {
        fills = List.copyOf(fills);
        covers = List.copyOf(covers);
    }

    /**
     * The question for the bare and the sealed device, at equal accelerations.
     *
     * @param device of the study
     * @param band band of use
     * @param acceptance limits asked
     * @param reference frequency at which sensitivity and noise are compared [Hz]
     * @param fills candidates
     */
    public FillQuestion(Device device, Band band, Acceptance acceptance, double reference, List<Fill> fills) {
        this(
                new BandsQuestion(device, band, acceptance, Motion.NONE, List.of(), reference),
                fills,
                List.of(Covers.OPEN, Covers.SEALED));
    }

    /**
     * Every fill under every cover, and whether one does.
     *
     * @return fluids that fit first, by falling rejection, equal ones by rising noise
     */
    public FillAnswer answer() {
        ResponsePoint point = new Response(base.device()).at(base.reference());
        List<Fill> all = fills;
        List<FillRow> rows = IntStream.range(0, all.size() * covers.size())
                .parallel()
                .mapToObj(i -> row(all.get(i / covers.size()), covers.get(i % covers.size()), point))
                .collect(Collectors.toCollection(ArrayList::new));
        rows.sort(Comparator.comparing((FillRow row) -> !row.excluded().isEmpty())
                .thenComparing(row -> row.medium().isEmpty())
                .thenComparing(row -> !row.misses().isEmpty())
                .thenComparing(row -> Double.isNaN(row.rejection()) ? 1.0 : 0.0)
                .thenComparing(row -> -row.rejection())
                .thenComparing(row -> row.thermalNoise().orElse(1.0 / row.sensitivity())));
        return decided(rows);
    }

    private FillAnswer decided(List<FillRow> rows) {
        boolean asked = rows.stream()
                .flatMap(row -> row.judged().stream())
                .anyMatch(judged -> judged.verdict().decision() != Decision.NOT_ASKED);
        if (!asked) {
            return new FillAnswer(rows, Decision.NOT_ASKED, "No limit that can be judged is stated.");
        }
        String everywhere = base.envelope().isPresent() ? " in every state" : "";
        List<FillRow> fit = rows.stream().filter(FillRow::fit).toList();
        if (!fit.isEmpty()) {
            return new FillAnswer(
                    rows,
                    Decision.MEETS,
                    say(
                            "%s of %s meet every limit%s. The first: %s.",
                            fit.size(), rows.size(), everywhere, fit.get(0).words()));
        }
        boolean open = rows.stream().anyMatch(row -> row.decision() == Decision.UNDECIDED);
        return new FillAnswer(
                rows,
                open ? Decision.UNDECIDED : Decision.FAILS,
                "No fill meets every limit" + everywhere + "."
                        + rows.stream()
                                .filter(row -> row.excluded().isEmpty())
                                .findFirst()
                                .map(row ->
                                        " The first is " + row.words() + ": " + String.join("; ", row.misses()) + ".")
                                .orElse(""));
    }

    private FillRow row(Fill fill, Cover cover, ResponsePoint point) {
        Medium medium;
        try {
            medium = Media.at(fill.query());
        } catch (OutOfTableException e) {
            return refused(fill, cover, why(e));
        }
        if (cover instanceof VentedCover && medium.soundSpeed().isEmpty()) {
            return refused(
                    fill, cover, "sound speed not known: a vented cover breathes by the compliance of its cavity");
        }
        Device device = base.device();
        Device filled = new Device(device.hair(), device.suspension(), medium, cover, medium);
        BandsQuestion question = base.about(filled);
        Optional<Envelope> states = base.envelope().map(all -> all.filled(fill.query(), cover));
        String lost = "";
        try {
            question = question.amid(sources(cover, medium));
        } catch (UnfitMediumException e) {
            lost = e.getMessage();
            question = question.amid(List.of());
            states = states.map(Envelope::still);
        }
        BandsAnswer answer;
        try {
            answer = question.judged();
        } catch (StreamTooFastException e) {
            lost = e.getMessage();
            states = states.map(Envelope::still);
            answer = question.amid(List.of()).judged();
        }
        Optional<EnvelopeAnswer> envelope = states.map(all -> all.answer(this::against));
        Shortfalls shortfalls = Shortfalls.of(answer, envelope);
        List<String> misses = new ArrayList<>(shortfalls.misses());
        List<String> excluded = against(answer, envelope, misses);
        Verdict verdict = shortfalls.verdict();
        if (!lost.isEmpty() && errorAsked()) {
            misses.add("error is undecided: " + lost);
            verdict = new Verdict(verdict.decision().worse(Decision.UNDECIDED), verdict.limits(), verdict.sentence());
        }
        Optional<Swing> swing = answer.facts().medium();
        ResponsePoint there = answer.points().get(0);
        return new FillRow(
                fill.name(),
                cover,
                Optional.of(medium),
                answer.least()
                        .map(BandsAnswer.Extreme::rejection)
                        .orElse(reads(answer) == Reads.NOTHING ? Double.NaN : Double.POSITIVE_INFINITY),
                answer.least().map(BandsAnswer.Extreme::frequency).orElse(Double.NaN),
                swing.isPresent() ? OptionalDouble.of(swing.get().resonance()) : OptionalDouble.empty(),
                swing.isPresent() ? OptionalDouble.of(swing.get().decay().quality()) : OptionalDouble.empty(),
                sensitivity(there, point),
                there.thermalNoise(),
                excluded,
                recalled(medium),
                Optional.of(new FillRow.Judged(answer, envelope, verdict, misses)));
    }

    /** Under a closed cover nothing of the flow outside arrives, whatever it is. */
    private List<Source> sources(Cover cover, Medium medium) {
        return cover.closed()
                ? base.sources()
                : base.sources().stream().map(source -> source.in(medium)).toList();
    }

    private boolean errorAsked() {
        return base.acceptance().error().isPresent() || base.motion().smallest().isPresent();
    }

    private static Reads reads(BandsAnswer answer) {
        return answer.bands().get(0).reads();
    }

    private static boolean recalled(Medium medium) {
        return medium.recalled().stream()
                .anyMatch(source ->
                        source.property().equals("density") || source.property().equals("viscosity"));
    }

    /** What speaks against a device beside its limits. */
    private List<String> against(BandsAnswer answer) {
        List<String> against = new ArrayList<>();
        Optional<Swing> swing = answer.facts().medium();
        if (reads(answer) == Reads.NOTHING) {
            against.add("reads nothing: hair and fluid are of one density");
        }
        if (reads(answer) == Reads.UNDECIDED) {
            against.add("undecided: a model has ended");
        }
        if (answer.device().suspension().isPresent() && swing.isEmpty()) {
            against.add("the suspension does not hold the hair upright");
        }
        if (swing.isPresent() && swing.get().decay().overdamped()) {
            against.add("overdamped");
        }
        return against;
    }

    /** At the study's own state, and what comes with the others; a state that the fluid does not bear is no limit missed. */
    private List<String> against(BandsAnswer answer, Optional<EnvelopeAnswer> envelope, List<String> misses) {
        List<String> against = new ArrayList<>(against(answer));
        envelope.ifPresent(found -> {
            found.against().stream()
                    .filter(other -> !against.contains(other.reason()))
                    .forEach(other -> against.add(other.reason() + " at " + other.state()));
            found.impossible().stream().findFirst().ifPresent(none -> {
                misses.removeIf(miss -> miss.startsWith(Shortfalls.IMPOSSIBLE));
                against.add("does not bear " + none.state() + ": "
                        + (none.reason().endsWith(".")
                                ? none.reason().substring(0, none.reason().length() - 1)
                                : none.reason()));
            });
        });
        return against;
    }

    private static double sensitivity(ResponsePoint point, ResponsePoint base) {
        if (point.motion().isPresent() && base.motion().isPresent()) {
            return point.motion().get().norm() / base.motion().get().norm();
        }
        return point.motionTorque().norm() / base.motionTorque().norm();
    }

    private static String why(OutOfTableException e) {
        String why = switch (e.why()) {
            case BOILS -> "boils";
            case FREEZES -> "freezes";
            case CONDENSES -> "condenses";
            case OUTSIDE -> "outside the range of its data";
        };
        return why + ": " + e.getMessage();
    }

    private static FillRow refused(Fill fill, Cover cover, String why) {
        return new FillRow(
                fill.name(),
                cover,
                Optional.empty(),
                Double.NaN,
                Double.NaN,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Double.NaN,
                OptionalDouble.empty(),
                List.of(why),
                false,
                Optional.empty());
    }
}
