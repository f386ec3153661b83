package flowshy.verdict.size;

import java.util.List;

/**
 * A place at which an estimate was compared with the full model.
 *
 * @param values one a variable, in SI
 * @param expected what the estimate, as corrected so far, gives there
 * @param solved what the full model gives there
 */
public record Round(List<Double> values, Trial expected, Trial solved) {
    /** Copies the list. */
    public Round {
        values = List.copyOf(values);
    }
}
