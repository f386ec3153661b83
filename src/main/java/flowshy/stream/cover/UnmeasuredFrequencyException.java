package flowshy.stream.cover;

import static flowshy.math.Figures.say;

import flowshy.math.Range;

/** A measured attenuation was asked for at a frequency at which it was not measured. */
public final class UnmeasuredFrequencyException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * Says what was measured and what was asked for.
     *
     * @param file of the attenuation
     * @param measured frequencies covered [Hz]
     * @param frequency asked for [Hz]
     */
    public UnmeasuredFrequencyException(String file, Range measured, double frequency) {
        super(say(
                "%s covers %.4g Hz to %.4g Hz; %.4g Hz was asked for. Ask inside, or measure more; nothing is extrapolated.",
                file, measured.low(), measured.high(), frequency));
    }
}
