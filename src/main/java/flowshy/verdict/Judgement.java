package flowshy.verdict;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.medium.PropertySource;
import flowshy.verdict.BandsAnswer.Extreme;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.error.Motion;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import flowshy.verdict.figure.Sense;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** Turns bands and extremes into the verdict and its sentence. */
final class Judgement {
    private static final String NO_FLOW = "no flow reaches the hair under a sealed cover: the rejection has no bound";
    private static final String NOTHING = "the hair is as dense as the fluid carried with it: it reads nothing";
    private static final String ENDED = "a model has ended; see the caveats";
    private static final String NO_SURROUNDINGS =
            "needs surroundings; without them the largest flow speed that keeps it is given point by point";

    private final Acceptance acceptance;
    private final Motion motion;
    private final Evaluated device;
    private final Optional<ErrorBudget> budget;
    private final List<Caveat> caveats;

    Judgement(Evaluated device, List<Caveat> caveats) {
        this.acceptance = device.question().acceptance();
        this.motion = device.question().motion();
        this.device = device;
        this.budget = device.error();
        this.caveats = caveats;
    }

    Verdict of(List<ReadingBand> bands, Optional<Extreme> least) {
        Reads first = bands.get(0).reads();
        List<Limit> limits = new ArrayList<>();
        acceptance.rejection().ifPresent(margin -> limits.add(rejection(margin, first, least)));
        error(first).ifPresent(limits::add);
        acceptance.others().forEach(limit -> limits.add(other(limit)));
        Decision decision = Verdict.worst(limits);
        return new Verdict(decision, limits, sentence(decision, bands, least, first));
    }

    /** A limit on any other quantity: it fails on a device that has no such quantity, and stays open where the study lacks what it needs. */
    private Limit other(FigureLimit limit) {
        Figure figure = limit.figure();
        Found found = figure.of(device);
        Decision decision = switch (found.state()) {
            case NUMBER, UNBOUNDED ->
                limit.sense().keeps(found.value(), limit.value()) ? Decision.MEETS : Decision.FAILS;
            case NOT_STATED -> Decision.NOT_ASKED;
            case HAS_NONE -> Decision.FAILS;
            case ENDED -> Decision.UNDECIDED;
        };
        boolean ended = Assumptions.ended(caveats, figure.subject()) && found.state() == Found.State.NUMBER;
        return new Limit(
                figure.word(),
                figure.unit().si(),
                limit.sense(),
                limit.value(),
                found.number(),
                found.at(),
                ended ? Decision.UNDECIDED : decision,
                ended ? ENDED : found.reason());
    }

    /** The error limit: as stated, or with surroundings the smallest motion to be read. */
    private Optional<Limit> error(Reads first) {
        boolean taken = acceptance.error().isEmpty();
        OptionalDouble limit = taken && budget.isPresent() ? motion.smallest() : acceptance.error();
        if (limit.isEmpty()) {
            return Optional.empty();
        }
        double required = limit.getAsDouble();
        if (first == Reads.NOTHING) {
            return Optional.of(new Limit(
                    "error",
                    "m/s2",
                    Sense.AT_MOST,
                    required,
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    Decision.FAILS,
                    NOTHING));
        }
        if (budget.isEmpty()) {
            boolean closed = device.device().cover().closed();
            return Optional.of(new Limit(
                    "error",
                    "m/s2",
                    Sense.AT_MOST,
                    required,
                    closed ? OptionalDouble.of(0.0) : OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    closed ? Decision.MEETS : Decision.NOT_ASKED,
                    closed ? "no flow enters a sealed cover" : NO_SURROUNDINGS));
        }
        double found = budget.get().rms();
        boolean ended =
                budget.get().caveats().stream().anyMatch(caveat -> caveat.weight() == Caveat.Weight.OUT_OF_RANGE);
        Decision decision = found <= required ? Decision.MEETS : Decision.FAILS;
        return Optional.of(new Limit(
                "error",
                "m/s2",
                Sense.AT_MOST,
                required,
                OptionalDouble.of(found),
                OptionalDouble.empty(),
                ended ? Decision.UNDECIDED : decision,
                (taken ? "required is taken as motion.smallest; " : "") + "flow error over the band of use, rms"));
    }

    private static Limit rejection(double margin, Reads first, Optional<Extreme> least) {
        if (first == Reads.NOTHING) {
            return new Limit(
                    "rejection",
                    "dB",
                    Sense.AT_LEAST,
                    margin,
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    Decision.FAILS,
                    NOTHING);
        }
        if (least.isEmpty()) {
            return new Limit(
                    "rejection",
                    "dB",
                    Sense.AT_LEAST,
                    margin,
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    first == Reads.UNDECIDED ? Decision.UNDECIDED : Decision.MEETS,
                    first == Reads.UNDECIDED ? ENDED : NO_FLOW);
        }
        Decision decision = least.get().rejection() >= margin ? Decision.MEETS : Decision.FAILS;
        return new Limit(
                "rejection",
                "dB",
                Sense.AT_LEAST,
                margin,
                OptionalDouble.of(least.get().rejection()),
                OptionalDouble.of(least.get().frequency()),
                first == Reads.UNDECIDED ? Decision.UNDECIDED : decision,
                first == Reads.UNDECIDED ? ENDED : "");
    }

    private String sentence(Decision decision, List<ReadingBand> bands, Optional<Extreme> least, Reads first) {
        String reading = bands.stream()
                .map(band -> say("%s from %.4g Hz to %.4g Hz", band.reads().word(), band.from(), band.to()))
                .collect(Collectors.joining(", "));
        String subject = switch (first) {
            case NOTHING -> "The device reads nothing: " + NOTHING + ".";
            case UNDECIDED -> "Undecided: a model has ended, see the caveats.";
            default -> "Reads " + reading + ", at a margin of " + say("%.4g dB.", acceptance.margin());
        };
        String found = least.map(extreme ->
                        say(" Least rejection %.4g dB at %.4g Hz.", extreme.rejection(), extreme.frequency()))
                .orElse(first == Reads.MOTION ? " No flow enters: the rejection has no bound." : "");
        String judged = switch (decision) {
            case MEETS -> " Every limit that can be judged is met.";
            case FAILS -> " A limit is not met.";
            case UNDECIDED -> " A limit is undecided.";
            case NOT_ASKED -> " No limit was judged.";
        };
        return subject + found + judged + (first == Reads.NOTHING ? "" : scope()) + memory();
    }

    /** Density and viscosity decide; a verdict that rests on a recalled one says so. */
    private String memory() {
        List<String> recalled = device.device().around().recalled().stream()
                .filter(source ->
                        source.property().equals("density") || source.property().equals("viscosity"))
                .map(PropertySource::property)
                .toList();
        return recalled.isEmpty()
                ? ""
                : " It rests on a " + String.join(" and a ", recalled) + " recalled from memory.";
    }

    private String scope() {
        return budget.map(found -> say(" The surroundings add %.3g m/s2 rms over the band", found.rms())
                        + (found.offset() == 0.0 ? "." : say(" and an offset of %.3g m/s2.", found.offset())))
                .orElse(" Decided at equal accelerations of base and fluid only: no surroundings are given.");
    }
}
