package flowshy.verdict;

import static flowshy.math.Figures.say;

import flowshy.response.Device;
import flowshy.verdict.BandsAnswer.Extreme;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** Turns bands and extremes into the verdict and its sentence. */
final class Judgement {
    private static final String NO_FLOW = "no flow reaches the hair under a sealed cover: the rejection has no bound";
    private static final String NOTHING = "the hair is as dense as the fluid carried with it: it reads nothing";
    private static final String NO_SURROUNDINGS =
            "needs surroundings; without them the largest flow speed that keeps it is given point by point";

    private Judgement() {}

    static Verdict of(
            Acceptance acceptance, List<ReadingBand> bands, Optional<Extreme> least, Extreme any, Device device) {
        Reads first = bands.get(0).reads();
        List<Limit> limits = new ArrayList<>();
        acceptance.rejection().ifPresent(margin -> limits.add(rejection(margin, first, least)));
        acceptance
                .error()
                .ifPresent(error -> limits.add(new Limit(
                        "error",
                        "m/s2",
                        error,
                        device.cover().closed() ? OptionalDouble.of(0.0) : OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        device.cover().closed() ? Decision.MEETS : Decision.NOT_ASKED,
                        device.cover().closed() ? "no flow enters a sealed cover" : NO_SURROUNDINGS)));
        Decision decision = Verdict.worst(limits);
        return new Verdict(decision, limits, sentence(decision, bands, least, acceptance, first));
    }

    private static Limit rejection(double margin, Reads first, Optional<Extreme> least) {
        if (first == Reads.NOTHING) {
            return new Limit(
                    "rejection", "dB", margin, OptionalDouble.empty(), OptionalDouble.empty(), Decision.FAILS, NOTHING);
        }
        if (least.isEmpty()) {
            return new Limit(
                    "rejection",
                    "dB",
                    margin,
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    first == Reads.UNDECIDED ? Decision.UNDECIDED : Decision.MEETS,
                    NO_FLOW);
        }
        Decision decision = least.get().rejection() >= margin ? Decision.MEETS : Decision.FAILS;
        return new Limit(
                "rejection",
                "dB",
                margin,
                OptionalDouble.of(least.get().rejection()),
                OptionalDouble.of(least.get().frequency()),
                first == Reads.UNDECIDED ? Decision.UNDECIDED : decision,
                first == Reads.UNDECIDED ? "a model has ended; see the caveats" : "");
    }

    private static String sentence(
            Decision decision, List<ReadingBand> bands, Optional<Extreme> least, Acceptance acceptance, Reads first) {
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
        String scope = first == Reads.NOTHING
                ? ""
                : " Decided at equal accelerations of base and fluid only: no surroundings are given.";
        return subject + found + judged + scope;
    }
}
