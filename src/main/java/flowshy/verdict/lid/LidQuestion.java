package flowshy.verdict.lid;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.medium.Phase;
import flowshy.response.Calibration;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.stream.cover.VentedCover;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.Limit;
import flowshy.verdict.ThirdOctaves;
import flowshy.verdict.Verdict;
import flowshy.verdict.envelope.Envelope;
import flowshy.verdict.envelope.EnvelopeAnswer;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import flowshy.verdict.envelope.Shortfalls;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.hipparchus.util.FastMath;

/**
 * Does the device need a lid?
 *
 * @param base the study's question; its own cover is taken off for the bare figures
 * @param reference frequency at which sensitivities are compared [Hz]
 * @param candidates covers in order of preference; empty: open, roofed, vented, sealed of a usual size
 */
public record LidQuestion(BandsQuestion base, double reference, List<Candidate> candidates) {
    /** Calibrations that differ by more are worth a warning: common practice, no source. */
    private static final double CALIBRATION_CHANGE = 0.01;

    private static final double NEARLY_EQUAL_DENSITY = 0.1;

    /** Takes usual covers where none is stated. */
    public LidQuestion {
        candidates = candidates.isEmpty() ? usual(base.device()) : List.copyOf(candidates);
    }

    /**
     * The question at equal accelerations, without surroundings.
     *
     * @param device of the study
     * @param band band of use
     * @param acceptance limits asked
     * @param reference [Hz]
     * @param candidates covers in order of preference, may be empty
     */
    public LidQuestion(Device device, Band band, Acceptance acceptance, double reference, List<Candidate> candidates) {
        this(new BandsQuestion(device, band, acceptance), reference, candidates);
    }

    /**
     * The limits asked.
     *
     * @return as in the base question
     */
    public Acceptance acceptance() {
        return base.acceptance();
    }

    /**
     * Covers of a usual size for a hair (common practice, no source): a roof at 1.5 times its length, 6 lengths long; a lid with four
     * holes of a quarter length over a cavity of 4 by 4 by 2 lengths; a sealed cavity 4 lengths wide and 2 high.
     *
     * @param device gives hair and medium
     * @return open, roofed, vented if the sound speed is known, sealed
     */
    public static List<Candidate> usual(Device device) {
        double length = device.hair().profile().length();
        List<Candidate> covers = new ArrayList<>();
        covers.add(new Candidate(Covers.OPEN, device.outside()));
        covers.add(new Candidate(new RoofedCover(1.5 * length, 6.0 * length), device.outside()));
        if (device.outside().soundSpeed().isPresent()) {
            double volume = 32.0 * length * length * length;
            covers.add(new Candidate(
                    new VentedCover(4, 0.25 * length, 0.5 * length, false, volume, 8.0 * length * length),
                    device.outside()));
        }
        covers.add(
                new Candidate(new SealedCover(Optional.of(new Cavity(4.0 * length, 2.0 * length))), device.outside()));
        return covers;
    }

    /**
     * Every candidate, side by side, and the decision.
     *
     * @return the answer
     */
    public LidAnswer answer() {
        Device bareDevice = base.device().bare();
        Candidate none = new Candidate(Covers.OPEN, base.device().outside());
        BandsAnswer bare = base.about(bareDevice).answer();
        Optional<EnvelopeAnswer> bareStates = states(none).map(Envelope::answer);
        List<RequiredAttenuation> required = required(base);
        List<CoverRow> rows = candidates.stream()
                .map(candidate -> candidate.equals(none)
                        ? row(candidate, bareDevice, bare, bareStates)
                        : row(
                                candidate,
                                bareDevice,
                                base.about(candidate.over(base.device())).answer(),
                                states(candidate).map(Envelope::answer)))
                .toList();
        Optional<CoverRow> chosen = asked(bare)
                ? rows.stream().filter(row -> row.misses().isEmpty()).findFirst()
                : Optional.empty();
        boolean remedy = asked(bare) && chosen.isEmpty();
        return new LidAnswer(
                bare,
                required,
                errorAttenuation(bare),
                bareStates.map(found -> overStates(bare, required, found, none)),
                reference,
                rows,
                chosen,
                remedy ? remedies(nearest(rows)) : List.of(),
                verdict(bare, rows, chosen));
    }

    private Optional<Envelope> states(Candidate candidate) {
        return base.envelope().map(all -> all.under(candidate));
    }

    private List<RequiredAttenuation> required(BandsQuestion question) {
        return ThirdOctaves.in(base.band()).stream()
                .map(frequency ->
                        RequiredAttenuation.at(question.device(), acceptance().margin(), frequency))
                .toList();
    }

    /** The largest attenuation asked by any state, frequency by frequency; the study's own state counts too. */
    private LidAnswer.OverStates overStates(
            BandsAnswer bare, List<RequiredAttenuation> own, EnvelopeAnswer bareStates, Candidate none) {
        List<AtState> worst = own.stream()
                .map(point -> new AtState(
                        point.attenuation(), OptionalDouble.of(point.frequency()), EnvelopeAnswer.OWN, true))
                .collect(Collectors.toCollection(ArrayList::new));
        for (Envelope.Asked state : states(none).orElseThrow().asked()) {
            List<RequiredAttenuation> there = required(state.question());
            for (int i = 0; i < worst.size(); i++) {
                if (there.get(i).attenuation() > worst.get(i).value()) {
                    worst.set(
                            i,
                            new AtState(
                                    there.get(i).attenuation(),
                                    OptionalDouble.of(there.get(i).frequency()),
                                    state.words(),
                                    state.corner()));
                }
            }
        }
        Optional<AtState> error = errorLimit(bare)
                .flatMap(limit -> bareStates
                        .error(bare)
                        .map(most -> new AtState(
                                attenuation(most.value(), limit),
                                OptionalDouble.empty(),
                                most.state(),
                                most.corner())));
        return new LidAnswer.OverStates(bareStates, worst, error);
    }

    /** 20 lg of the bare error over its limit; the flow's torque is taken as proportional to the flow, as at the bare operating point. */
    private static OptionalDouble errorAttenuation(BandsAnswer bare) {
        Optional<Double> level = errorLimit(bare)
                .map(limit -> attenuation(bare.error().orElseThrow().rms(), limit));
        return level.isPresent() ? OptionalDouble.of(level.get()) : OptionalDouble.empty();
    }

    private static Optional<Double> errorLimit(BandsAnswer bare) {
        return bare.verdict().limits().stream()
                .filter(limit -> limit.name().equals("error")
                        && limit.found().isPresent()
                        && bare.error().isPresent())
                .map(Limit::required)
                .findFirst();
    }

    private static double attenuation(double error, double limit) {
        return FastMath.max(0.0, 20.0 * FastMath.log10(error / limit));
    }

    private static boolean asked(BandsAnswer bare) {
        return bare.verdict().limits().stream().anyMatch(limit -> limit.decision() != Decision.NOT_ASKED);
    }

    private List<String> remedies(CoverRow nearest) {
        int lost = nearest.envelope().map(found -> found.impossible().size()).orElse(0);
        if (lost > 0) {
            return List.of("a cover or fill that bears every state, or an envelope without the " + lost
                    + " that cannot be worked out");
        }
        List<BandsQuestion> states =
                new ArrayList<>(List.of(base.about(nearest.candidate().over(base.device()))));
        states(nearest.candidate()).ifPresent(all -> all.asked().forEach(state -> states.add(state.question())));
        return new Remedies(states).list();
    }

    private CoverRow row(
            Candidate candidate, Device bareDevice, BandsAnswer answer, Optional<EnvelopeAnswer> envelope) {
        Device covered = answer.device();
        Calibration.Figures change = new Calibration(reference, Covers.OPEN).figures(covered, bareDevice);
        Shortfalls shortfalls = Shortfalls.of(answer, envelope);
        return new CoverRow(
                candidate,
                answer,
                envelope,
                shortfalls.verdict(),
                new Response(covered).at(reference),
                change,
                shortfalls.misses(),
                warnings(candidate, answer, change));
    }

    private List<String> warnings(Candidate candidate, BandsAnswer answer, Calibration.Figures change) {
        List<String> warnings = new ArrayList<>();
        double hair = base.device().hair().density();
        double contrast = FastMath.abs(hair - candidate.around().density()) / hair;
        if (candidate.cover().closed() && contrast < NEARLY_EQUAL_DENSITY) {
            warnings.add(say(
                    "the fill is nearly as dense as the hair: %.2g %% of its inertial torque is left",
                    100.0 * contrast));
        }
        if (FastMath.abs(change.change() - 1.0) > CALIBRATION_CHANGE) {
            warnings.add(say(
                    "calibrations with and without this cover differ by %.3g %% at %.4g Hz",
                    change.percent(), reference));
        }
        clearance(candidate.cover()).ifPresent(gap -> {
            double layer = answer.facts().layer().largest();
            if (gap < layer) {
                warnings.add(say(
                        "%.3g um over the tip is less than the Stokes layer of %.3g um at %.4g Hz: the lid's own layer reaches the"
                                + " hair, strip theory sees only part of it",
                        1e6 * gap, 1e6 * layer, base.band().from()));
            }
        });
        if (candidate.cover() instanceof VentedCover vented) {
            vented.resonance(candidate.around()).ifPresent(resonance -> {
                if (resonance >= base.band().from() && resonance <= base.band().to()) {
                    warnings.add(say("the vents resonate within the band, at %.4g Hz", resonance));
                }
            });
        }
        if (candidate.cover().closed()) {
            warnings.add("sound transmitted through the lid is not modelled");
        }
        if (candidate.cover().closed() && candidate.around().phase() == Phase.LIQUID && !warmed()) {
            warnings.add("a liquid fill: check its freezing and boiling points over the whole range of temperature");
        }
        for (Caveat caveat : answer.caveats()) {
            if (caveat.weight() == Caveat.Weight.OUT_OF_RANGE) {
                warnings.add(caveat.text());
            }
        }
        return warnings;
    }

    private OptionalDouble clearance(Cover cover) {
        double length = base.device().hair().profile().length();
        if (cover instanceof RoofedCover roof) {
            return OptionalDouble.of(roof.gap() - length);
        }
        if (cover instanceof SealedCover sealed && sealed.cavity().isPresent()) {
            return OptionalDouble.of(sealed.cavity().get().height() - length);
        }
        return OptionalDouble.empty();
    }

    /** Whether the envelope moves the temperature: then a liquid that freezes or boils is told at its state. */
    private boolean warmed() {
        return base.envelope().stream()
                .flatMap(all -> all.sides().stream())
                .anyMatch(side -> side.key().equals("medium.temperature"));
    }

    /** The candidate that misses fewest limits, and of those the one whose least rejection is highest. */
    private static CoverRow nearest(List<CoverRow> rows) {
        return rows.stream()
                .min(Comparator.comparingInt((CoverRow row) -> row.misses().size())
                        .thenComparingDouble(row -> -least(row)))
                .orElseThrow();
    }

    private static double least(CoverRow row) {
        Optional<Double> here = row.answer().least().map(BandsAnswer.Extreme::rejection);
        return row.lowest().map(AtState::value).or(() -> here).orElse(Double.NEGATIVE_INFINITY);
    }

    private Verdict verdict(BandsAnswer bare, List<CoverRow> rows, Optional<CoverRow> chosen) {
        if (!asked(bare)) {
            return new Verdict(
                    Decision.NOT_ASKED,
                    List.of(),
                    "No limit that can be judged is stated: covers are compared, none is chosen. State accept.rejection, or"
                            + " surroundings and accept.error, to have one chosen.");
        }
        if (chosen.isPresent()) {
            Cover cover = chosen.get().candidate().cover();
            String sentence = cover.equals(Covers.OPEN)
                    ? "No lid is needed: the bare device meets every limit."
                    : "The first candidate that meets every limit is: " + cover.words() + ".";
            return new Verdict(
                    Decision.MEETS,
                    chosen.get().verdict().limits(),
                    sentence
                            + chosen.get()
                                    .envelope()
                                    .map(found -> " " + found.sentence())
                                    .orElse("")
                            + own(rows, chosen));
        }
        CoverRow nearest = nearest(rows);
        boolean undecided = rows.stream().anyMatch(row -> row.verdict().decision() == Decision.UNDECIDED);
        return new Verdict(
                undecided ? Decision.UNDECIDED : Decision.FAILS,
                nearest.verdict().limits(),
                "No candidate meets every limit" + (base.envelope().isPresent() ? " in every state" : "")
                        + ". The nearest is " + nearest.candidate().cover().words() + ": "
                        + String.join("; ", nearest.misses()) + "." + own(rows, chosen));
    }

    /** What would be chosen at the study's own state, where the envelope makes it another. */
    private static String own(List<CoverRow> rows, Optional<CoverRow> chosen) {
        Optional<CoverRow> here = rows.stream()
                .filter(row -> row.answer().verdict().decision() == Decision.MEETS)
                .findFirst();
        return here.isEmpty() || here.equals(chosen)
                ? ""
                : " At the study's own state alone it would be: "
                        + here.get().candidate().cover().words() + ".";
    }
}
