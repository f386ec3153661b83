package flowshy.verdict;

import java.util.List;

/**
 * The decision of a study.
 *
 * @param decision fails if one limit fails, else undecided if one is, else meets if one is met, else not-asked
 * @param limits limit by limit
 * @param sentence the decision in words
 */
public record Verdict(Decision decision, List<Limit> limits, String sentence) {
    /** Copies the list. */
    public Verdict {
        limits = List.copyOf(limits);
    }

    /**
     * The decision that a list of limits amounts to.
     *
     * @param limits limit by limit
     * @return the worst of them
     */
    static Decision worst(List<Limit> limits) {
        for (Decision decision : new Decision[] {Decision.FAILS, Decision.UNDECIDED, Decision.MEETS}) {
            if (limits.stream().anyMatch(limit -> limit.decision() == decision)) {
                return decision;
            }
        }
        return Decision.NOT_ASKED;
    }
}
