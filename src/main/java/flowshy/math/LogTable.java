package flowshy.math;

import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Values by frequency, straight between points over the logarithm of frequency; nothing is extrapolated.
 *
 * @param frequencies [Hz], positive and rising, two or more
 * @param values one a frequency, same order
 */
public record LogTable(List<Double> frequencies, List<Double> values) {
    /** Rounding allowed at the ends [-]. */
    private static final double EDGE = 1e-9;

    /** @throws IllegalArgumentException if the lists do not match or the frequencies do not rise from above zero */
    public LogTable {
        frequencies = List.copyOf(frequencies);
        values = List.copyOf(values);
        if (frequencies.size() != values.size() || frequencies.size() < 2) {
            throw new IllegalArgumentException("a table needs two frequencies or more and a value for each");
        }
        for (int i = 0; i < frequencies.size(); i++) {
            double before = i == 0 ? 0.0 : frequencies.get(i - 1);
            if (!(frequencies.get(i) > before) || !Double.isFinite(values.get(i))) {
                throw new IllegalArgumentException("row " + (i + 1) + ": frequencies rise and values are finite");
            }
        }
    }

    /**
     * Frequencies covered.
     *
     * @return range [Hz]
     */
    public Range range() {
        return new Range("frequency [Hz]", frequencies.get(0), frequencies.get(frequencies.size() - 1));
    }

    /**
     * Whether a frequency is covered.
     *
     * @param frequency [Hz]
     * @return true if it lies in the range, to 1e-9 relative
     */
    public boolean covers(double frequency) {
        Range range = range();
        return frequency >= range.low() * (1.0 - EDGE) && frequency <= range.high() * (1.0 + EDGE);
    }

    /**
     * Value at a frequency.
     *
     * @param frequency within the range, to 1e-9 relative [Hz]
     * @return straight between the neighbours over ln f
     * @throws IllegalArgumentException outside the range
     */
    public double at(double frequency) {
        if (!covers(frequency)) {
            throw new IllegalArgumentException("frequency " + frequency + " Hz is outside " + range());
        }
        int high = 1;
        while (high < frequencies.size() - 1 && frequencies.get(high) < frequency) {
            high++;
        }
        double from = FastMath.log(frequencies.get(high - 1));
        double share = (FastMath.log(frequency) - from) / (FastMath.log(frequencies.get(high)) - from);
        double clamped = FastMath.max(0.0, FastMath.min(1.0, share)); // rounding at the ends only
        return values.get(high - 1) + clamped * (values.get(high) - values.get(high - 1));
    }
}
