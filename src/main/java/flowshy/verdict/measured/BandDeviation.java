package flowshy.verdict.measured;

import java.util.OptionalDouble;

/**
 * The points of one third-octave beside the model.
 *
 * @param middle nominal mid-band frequency [Hz]
 * @param from lower edge [Hz]
 * @param to upper edge [Hz]
 * @param points how many
 * @param level mean of measured over predicted, weighted by the uncertainties [dB]
 * @param allowed what the uncertainties of measurement and model together explain of it [dB], absent if none is stated
 * @param phase mean phase difference [rad], absent if not measured
 * @param allowedPhase what the uncertainties explain of it [rad], absent likewise
 */
public record BandDeviation(
        double middle,
        double from,
        double to,
        int points,
        double level,
        OptionalDouble allowed,
        OptionalDouble phase,
        OptionalDouble allowedPhase) {
    /**
     * Whether measurement and model agree here, as far as uncertainties are stated.
     *
     * @return false if level or phase is off by more than they explain
     */
    public boolean agrees() {
        return !beyond(OptionalDouble.of(level), allowed) && !beyond(phase, allowedPhase);
    }

    private static boolean beyond(OptionalDouble found, OptionalDouble allowed) {
        return found.isPresent() && allowed.isPresent() && !(Math.abs(found.getAsDouble()) <= allowed.getAsDouble());
    }
}
