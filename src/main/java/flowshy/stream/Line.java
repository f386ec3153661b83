package flowshy.stream;

import flowshy.math.Positive;

/**
 * One sinusoid of a source.
 *
 * @param frequency [Hz]
 * @param deviation rms; in a source the velocity of the free stream [m/s], in a measured file its signal in SI
 */
public record Line(double frequency, double deviation) {
    /** @throws IllegalArgumentException if a value is not positive and finite */
    public Line {
        Positive.check("frequency of a line [Hz]", frequency);
        Positive.check("rms of a line", deviation);
    }
}
