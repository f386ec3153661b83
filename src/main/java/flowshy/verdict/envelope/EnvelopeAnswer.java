package flowshy.verdict.envelope;

import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Decision;
import flowshy.verdict.Limit;
import flowshy.verdict.figure.Sense;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/**
 * The verdict over all states of an envelope.
 *
 * @param sides what moves
 * @param states how many states were judged
 * @param corners how many of them are corners
 * @param limits each limit at its worst
 * @param lowest least rejection over all states [dB], absent where no flow enters
 * @param most the best state's least rejection [dB], absent likewise
 * @param error largest error by flow over all states [m/s² rms], absent without surroundings
 * @param against what else speaks against the device in a state, each reason once; empty if nothing was asked
 * @param impossible states that cannot be worked out: they leave the verdict undecided at best
 * @param decision the worst of all states
 * @param sentence the same in words, the worst state named
 */
public record EnvelopeAnswer(
        List<Side> sides,
        int states,
        int corners,
        List<Worst> limits,
        Optional<AtState> lowest,
        OptionalDouble most,
        Optional<AtState> error,
        List<Against> against,
        List<Impossible> impossible,
        Decision decision,
        String sentence) {
    /** How the study's own state is called among the others. */
    public static final String OWN = "the study's own state";

    private static final String INSIDE = " (inside, not at a corner)";

    /** Copies the lists. */
    public EnvelopeAnswer {
        sides = List.copyOf(sides);
        limits = List.copyOf(limits);
        against = List.copyOf(against);
        impossible = List.copyOf(impossible);
    }

    /**
     * Least rejection over all states.
     *
     * @return [dB], absent where no flow enters
     */
    public OptionalDouble least() {
        return lowest.isPresent() ? OptionalDouble.of(lowest.get().value()) : OptionalDouble.empty();
    }

    /**
     * Least rejection over all states and the study's own.
     *
     * @param own answer at the study's own state
     * @return the least, absent where no flow enters
     */
    public Optional<AtState> lowest(BandsAnswer own) {
        Optional<AtState> here = own.least()
                .map(least -> new AtState(least.rejection(), OptionalDouble.of(least.frequency()), OWN, true));
        return Stream.concat(here.stream(), lowest.stream()).min(Comparator.comparingDouble(AtState::value));
    }

    /**
     * Largest error by flow over all states and the study's own.
     *
     * @param own answer at the study's own state
     * @return the largest, absent without surroundings
     */
    public Optional<AtState> error(BandsAnswer own) {
        Optional<AtState> here = own.error()
                .filter(budget -> Double.isFinite(budget.rms()))
                .map(budget -> new AtState(budget.rms(), OptionalDouble.empty(), OWN, true));
        return Stream.concat(here.stream(), error.stream()).max(Comparator.comparingDouble(AtState::value));
    }

    /** The state in which a limit is at its worst, in words. */
    String stateOf(Limit limit) {
        return limits.stream()
                .filter(worst -> worst.limit().name().equals(limit.name())
                        && worst.limit().sense() == limit.sense())
                .map(worst -> worst.state() + (worst.corner() ? "" : INSIDE))
                .findFirst()
                .orElseThrow();
    }

    /**
     * A figure at its worst.
     *
     * @param value in SI, a rejection in dB
     * @param frequency where it was found [Hz], absent where it belongs to none
     * @param state the numbers of that state
     * @param corner whether it is a corner of the envelope
     */
    public record AtState(double value, OptionalDouble frequency, String state, boolean corner) {
        /**
         * The state in words.
         *
         * @return its numbers, and whether it lies inside
         */
        public String words() {
            return state + (corner ? "" : INSIDE);
        }
    }

    /**
     * What speaks against a device beside its limits.
     *
     * @param reason in words
     * @param state the first where it does
     * @param states how many there are
     */
    public record Against(String reason, String state, int states) {}

    /**
     * A state without an answer.
     *
     * @param state its numbers
     * @param reason why
     */
    public record Impossible(String state, String reason) {}

    /**
     * A limit at its worst.
     *
     * @param limit what was found there
     * @param state the numbers of that state
     * @param corner whether it is a corner of the envelope
     */
    public record Worst(Limit limit, String state, boolean corner) {
        /** How far inside the limit it is, negative beyond; infinite without a number. */
        double margin() {
            if (limit.found().isEmpty()) {
                return Double.POSITIVE_INFINITY;
            }
            double inside = limit.found().getAsDouble() - limit.required();
            return limit.sense() == Sense.AT_MOST ? -inside : inside;
        }

        /** Whether it is worse than another. */
        boolean beyond(Worst other) {
            int here = limit.decision().severity();
            int there = other.limit.decision().severity();
            return here > there || (here == there && margin() < other.margin());
        }

        /** The limit with its state. */
        Limit named() {
            String reason = limit.reason().isEmpty() ? "" : "; " + limit.reason();
            return new Limit(
                    limit.name(),
                    limit.unit(),
                    limit.sense(),
                    limit.required(),
                    limit.found(),
                    limit.at(),
                    limit.decision(),
                    "at " + state + reason);
        }
    }
}
