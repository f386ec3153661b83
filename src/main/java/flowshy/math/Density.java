package flowshy.math;

import java.util.List;

/** A one-sided density over frequency, known between two frequencies and zero outside. */
public sealed interface Density permits LogLogDensity, StepDensity {
    /**
     * Density at a frequency.
     *
     * @param frequency f [Hz]
     * @return square of the unit of the signal per Hz
     */
    double at(double frequency);

    /**
     * Mean square of all.
     *
     * @return square of the unit of the signal
     */
    double meanSquare();

    /**
     * Frequencies at its ends and at its steps or corners.
     *
     * @return rising [Hz], two or more
     */
    List<Double> edges();
}
