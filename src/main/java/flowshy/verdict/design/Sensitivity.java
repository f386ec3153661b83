package flowshy.verdict.design;

import java.util.List;

/**
 * What a small change of one dimension or property does to the rejection.
 *
 * @param name path of its key, or words
 * @param value as it stands, SI or a factor
 * @param degrees whether the slopes are per kelvin, else per cent
 * @param slopes one a frequency, in the order asked
 */
public record Sensitivity(String name, double value, boolean degrees, List<Slope> slopes) {
    /** Copies the list. */
    public Sensitivity {
        slopes = List.copyOf(slopes);
    }

    /**
     * Slope at one frequency.
     *
     * @param frequency [Hz]
     * @param change of the rejection per cent or per kelvin [dB]
     * @param error of that number by the difference taken, estimated [dB]
     */
    public record Slope(double frequency, double change, double error) {}

    /**
     * The largest change at any of the frequencies.
     *
     * @return its size [dB per cent or kelvin]
     */
    public double size() {
        return slopes.stream()
                .mapToDouble(slope -> Math.abs(slope.change()))
                .max()
                .orElse(0.0);
    }
}
