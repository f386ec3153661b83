package flowshy.verdict.size;

import java.util.Comparator;
import java.util.List;

/**
 * A choice that was tried.
 *
 * @param values one a variable, in SI
 * @param trial what it gives
 * @param cost the objective, its sign such that less is better; NaN where there is no device
 * @param shortfalls one a constraint, in units of its scale; empty where there is no device
 */
record Candidate(List<Double> values, Trial trial, double cost, List<Double> shortfalls) {
    /**
     * Better first: what keeps every limit before what does not; of the former the least cost, of the latter the least violation; what makes
     * no device last (Deb 2000, Comput. Methods Appl. Mech. Eng. 186:311, section 3).
     */
    static final Comparator<Candidate> BETTER_FIRST =
            Comparator.comparingDouble(Candidate::violation).thenComparingDouble(Candidate::cost);

    /** Copies the lists. */
    Candidate {
        values = List.copyOf(values);
        shortfalls = List.copyOf(shortfalls);
    }

    /** Sum of the squared shortfalls [-]; zero where every limit is kept, infinite where there is no device. */
    double violation() {
        if (!trial.there()) {
            return Double.POSITIVE_INFINITY;
        }
        double sum = 0.0;
        for (double shortfall : shortfalls) {
            if (shortfall > 0.0) {
                sum += shortfall * shortfall;
            }
        }
        return sum;
    }

    boolean keepsAll() {
        return violation() == 0.0;
    }

    static Candidate better(Candidate one, Candidate other) {
        return BETTER_FIRST.compare(other, one) < 0 ? other : one;
    }
}
