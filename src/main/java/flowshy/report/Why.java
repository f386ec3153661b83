package flowshy.report;

import flowshy.verdict.Levers;
import flowshy.verdict.design.Sensitivity;
import java.util.List;

/**
 * What explains an answer.
 *
 * @param levers of edges and failed limits; left out if empty
 * @param slopes what each dimension and property does to the rejection, the strongest first; left out if empty
 */
public record Why(List<Levers> levers, List<Sensitivity> slopes) {
    /** Copies the lists. */
    public Why {
        levers = List.copyOf(levers);
        slopes = List.copyOf(slopes);
    }
}
