package flowshy.math;

import java.util.Locale;

/**
 * Closed interval in which a law or table holds.
 *
 * @param name what is bounded, with its usual mark and unit, e.g. {@code Wo} or {@code temperature [K]}
 * @param low lower end, included
 * @param high upper end, included, above {@code low}
 */
public record Range(String name, double low, double high) {
    /** @throws IllegalArgumentException if the ends are not ordered numbers */
    public Range {
        if (!(low < high)) {
            throw new IllegalArgumentException(name + ": range from " + low + " to " + high + " is upside down");
        }
    }

    /**
     * Whether a value lies inside; false for NaN.
     *
     * @param value the value in the unit of the range
     * @return true inside, ends included
     */
    public boolean contains(double value) {
        return value >= low && value <= high;
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%s %.6g to %.6g", name, low, high);
    }
}
