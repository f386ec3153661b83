package flowshy.verdict.envelope;

import flowshy.verdict.Decision;
import flowshy.verdict.Limit;
import flowshy.verdict.figure.Sense;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The verdict over all states of an envelope.
 *
 * @param sides what moves
 * @param states how many states were judged
 * @param corners how many of them are corners
 * @param limits each limit at its worst
 * @param least least rejection over all states [dB], absent where no flow enters
 * @param most the best state's least rejection [dB], absent likewise
 * @param impossible states that cannot be worked out: they leave the verdict undecided at best
 * @param decision the worst of all states
 * @param sentence the same in words, the worst state named
 */
public record EnvelopeAnswer(
        List<Side> sides,
        int states,
        int corners,
        List<Worst> limits,
        OptionalDouble least,
        OptionalDouble most,
        List<Impossible> impossible,
        Decision decision,
        String sentence) {
    /** Copies the lists. */
    public EnvelopeAnswer {
        sides = List.copyOf(sides);
        limits = List.copyOf(limits);
        impossible = List.copyOf(impossible);
    }

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
