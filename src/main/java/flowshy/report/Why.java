package flowshy.report;

import flowshy.verdict.Levers;
import flowshy.verdict.design.Sensitivities;
import java.util.List;

/**
 * What explains an answer.
 *
 * @param levers of edges and failed limits; left out if empty
 * @param slopes what each dimension and property does to the rejection; left out if none does anything
 */
public record Why(List<Levers> levers, Sensitivities slopes) {
    /** Copies the list. */
    public Why {
        levers = List.copyOf(levers);
    }
}
