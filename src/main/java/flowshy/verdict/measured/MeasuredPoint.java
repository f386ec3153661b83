package flowshy.verdict.measured;

import java.util.OptionalDouble;

/**
 * One measured frequency.
 *
 * @param frequency [Hz]
 * @param amplitude in the unit of its reading, or a ratio; positive
 * @param phase of the reading against the excitation, time factor e^{+iωt} [rad], absent if not measured
 * @param uncertainty standard uncertainty of the amplitude over the amplitude [-], absent if not stated
 * @param phaseUncertainty standard uncertainty of the phase [rad], absent if neither is known
 */
public record MeasuredPoint(
        double frequency,
        double amplitude,
        OptionalDouble phase,
        OptionalDouble uncertainty,
        OptionalDouble phaseUncertainty) {
    /** @throws IllegalArgumentException if a number is out of its range */
    public MeasuredPoint {
        positive("frequency [Hz]", frequency);
        positive("amplitude", amplitude);
        uncertainty.ifPresent(value -> positive("uncertainty", value));
        phaseUncertainty.ifPresent(value -> positive("uncertainty of the phase [rad]", value));
    }

    private static void positive(String what, double value) {
        if (!(value > 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + " must be positive and finite, was " + value);
        }
    }
}
