package flowshy.verdict.compare;

import flowshy.verdict.BandsQuestion;
import java.util.List;
import java.util.Optional;

/**
 * A device that takes part in a comparison.
 *
 * @param name what the user calls it
 * @param changes what differs from its base, key by key
 * @param question about it, empty where it has no solution
 * @param scaling how it can be made equal to the first, empty where it cannot
 * @param reason why there is no question or no scaling, empty if there are both
 */
public record Contender(
        String name, List<String> changes, Optional<BandsQuestion> question, Optional<Scaling> scaling, String reason) {
    /** Copies the list. */
    public Contender {
        changes = List.copyOf(changes);
    }
}
