package flowshy.verdict.size;

import java.util.List;

/**
 * The answer to a sizing.
 *
 * @param problem what was asked
 * @param fits whether every limit is kept; if not, the values are those that come nearest
 * @param values one a variable, in SI
 * @param trial objective and limited figures there; without a device if no place tried makes one
 * @param shortfalls one a constraint, in units of its scale, zero or less where it is kept; empty without a device
 * @param binding the constraints that bind: moved, they would move the optimum; indices, rising
 * @param ends which variables stand at an end of their range, one a variable
 * @param edges why there is no device just beside each value, one a variable; empty where there is one
 * @param prices change of the objective per change of each limit, one a constraint; empty unless everything fits
 * @param slopes what a change of each variable alone does, one a variable; empty without a device
 * @param trials how many choices were tried
 */
public record Sized(
        SizingProblem problem,
        boolean fits,
        List<Double> values,
        Trial trial,
        List<Double> shortfalls,
        List<Integer> binding,
        List<End> ends,
        List<String> edges,
        List<Slope> prices,
        List<VariableSlopes> slopes,
        int trials) {
    /** Copies the lists. */
    public Sized {
        values = List.copyOf(values);
        shortfalls = List.copyOf(shortfalls);
        binding = List.copyOf(binding);
        ends = List.copyOf(ends);
        edges = List.copyOf(edges);
        prices = List.copyOf(prices);
        slopes = List.copyOf(slopes);
    }

    /** Where in its range a value stands. */
    public enum End {
        /** at the least value */
        FROM,
        /** between the ends */
        INSIDE,
        /** at the largest value */
        TO
    }

    /**
     * What a change of one variable alone does.
     *
     * @param objective change of the objective per change of the variable, in SI
     * @param found change of each limited figure per change of the variable, same order as the constraints
     */
    public record VariableSlopes(Slope objective, List<Slope> found) {
        /** Copies the list. */
        public VariableSlopes {
            found = List.copyOf(found);
        }
    }
}
