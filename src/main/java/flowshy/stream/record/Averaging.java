package flowshy.stream.record;

import org.hipparchus.util.FastMath;

/**
 * How Welch's method made a density.
 *
 * @param rate samples per second [Hz]
 * @param samples length of the record
 * @param segment samples in a segment, a power of two
 * @param averages number of segments, each half over the next
 */
public record Averaging(double rate, int samples, int segment, int averages) {
    /**
     * Distance of the lines.
     *
     * @return Δf [Hz]
     */
    public double resolution() {
        return rate / segment;
    }

    /**
     * Random relative error of one line.
     *
     * @return standard deviation over value [-], √(19/18 / averages) for Hann's window and half overlap (Welch 1967)
     */
    public double randomError() {
        return FastMath.sqrt(19.0 / 18.0 / averages);
    }

    /**
     * In words.
     *
     * @return e.g. {@code Hann window, 50 % overlap, 31 averages}
     */
    public String words() {
        return "Hann window, 50 % overlap, " + averages + (averages == 1 ? " segment" : " averages") + " of " + segment
                + " samples";
    }
}
