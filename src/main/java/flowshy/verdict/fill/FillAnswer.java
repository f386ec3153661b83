package flowshy.verdict.fill;

import flowshy.verdict.Decision;
import java.util.List;

/**
 * The fill decision.
 *
 * @param rows every fill under every cover; what fits first, then what misses a limit, then what is excluded, each by falling rejection
 * @param decision meets if one of them meets every limit; undecided if none does and one may; not-asked without a limit that can be judged
 * @param sentence the same in words
 */
public record FillAnswer(List<FillRow> rows, Decision decision, String sentence) {
    /** Copies the list. */
    public FillAnswer {
        rows = List.copyOf(rows);
    }
}
