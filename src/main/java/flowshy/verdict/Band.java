package flowshy.verdict;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Band of frequencies.
 *
 * @param from lower end [Hz], positive
 * @param to upper end [Hz], above the lower
 */
public record Band(double from, double to) {
    /** @throws IllegalArgumentException if the ends are not positive, finite and in order */
    public Band {
        if (!(from > 0.0 && from < to) || Double.isInfinite(to)) {
            throw new IllegalArgumentException("a band runs from a positive frequency up, not " + from + " to " + to);
        }
    }

    /**
     * Frequencies evenly spaced on a logarithmic scale.
     *
     * @param count two or more
     * @return frequencies [Hz], rising, both ends included
     */
    public List<Double> even(int count) {
        List<Double> frequencies = new ArrayList<>(count);
        for (int i = 0; i < count - 1; i++) {
            frequencies.add(from * FastMath.pow(to / from, (double) i / (count - 1)));
        }
        frequencies.add(to);
        return frequencies;
    }

    /**
     * The middle on a logarithmic scale.
     *
     * @return √(from · to) [Hz]
     */
    public double middle() {
        return FastMath.sqrt(from * to);
    }
}
