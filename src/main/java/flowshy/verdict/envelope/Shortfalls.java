package flowshy.verdict.envelope;

import static flowshy.math.Figures.say;

import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Decision;
import flowshy.verdict.Limit;
import flowshy.verdict.Verdict;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * What a device misses: each limit that is not met or undecided, in words with its figure, and with an envelope with the state where it is
 * worst.
 *
 * @param verdict with an envelope each limit at its worst
 * @param misses in words, empty if every limit is met
 */
public record Shortfalls(Verdict verdict, List<String> misses) {
    /** How a miss begins that tells of states without an answer. */
    public static final String IMPOSSIBLE = "cannot be worked out";

    /** Copies the list. */
    public Shortfalls {
        misses = List.copyOf(misses);
    }

    /**
     * Of a device at its own state and in every state that it must bear.
     *
     * @param own answer at the study's own state
     * @param envelope what was found over the envelope, empty if none is stated
     * @return verdict and misses
     */
    public static Shortfalls of(BandsAnswer own, Optional<EnvelopeAnswer> envelope) {
        Verdict verdict =
                envelope.map(found -> Envelope.together(own.verdict(), found)).orElse(own.verdict());
        List<String> misses = new ArrayList<>();
        List<Limit> limits = verdict.limits();
        for (int i = 0; i < limits.size(); i++) {
            Limit limit = limits.get(i);
            boolean figure = limit.found().isPresent();
            if (limit.decision() == Decision.FAILS && figure) {
                double by = FastMath.abs(limit.required() - limit.found().getAsDouble());
                String missed = say("%s misses by %.3g %s", limit.name(), by, limit.unit())
                        .strip();
                boolean here = limit.equals(own.verdict().limits().get(i));
                misses.add(missed
                        + envelope.map(found -> " at " + (here ? EnvelopeAnswer.OWN : found.stateOf(limit)))
                                .orElse(""));
            } else if (limit.decision() == Decision.FAILS) {
                misses.add(limit.name() + ": " + limit.reason());
            } else if (limit.decision() == Decision.UNDECIDED) {
                misses.add(limit.name() + " is undecided: " + limit.reason());
            }
        }
        envelope.map(EnvelopeAnswer::impossible).filter(none -> !none.isEmpty()).ifPresent(none -> {
            EnvelopeAnswer.Impossible first = none.get(0);
            String more = none.size() == 1 ? "" : say(" (and in %s more states)", none.size() - 1);
            misses.add(IMPOSSIBLE + " at " + first.state() + more + ": " + first.reason());
        });
        return new Shortfalls(verdict, misses);
    }
}
