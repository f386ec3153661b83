package flowshy.verdict.measured;

import java.util.OptionalDouble;

/**
 * One measured frequency beside the model.
 *
 * @param frequency [Hz]
 * @param measured amplitude as measured, in the unit of its reading or a ratio
 * @param predicted the same by the model, behind the readout
 * @param measuredPhase [rad], absent if not measured
 * @param predictedPhase [rad], absent for a rejection
 * @param level measured over predicted [dB]
 * @param phase measured less predicted, within half a turn [rad], absent if not measured
 * @param uncertainty standard uncertainty of the measured level [dB], absent if not stated
 * @param phaseUncertainty standard uncertainty of the measured phase [rad], absent if not known
 * @param modelUncertainty standard uncertainty of the predicted level [dB]
 * @param modelPhaseUncertainty standard uncertainty of the predicted phase [rad]
 */
public record Deviation(
        double frequency,
        double measured,
        double predicted,
        OptionalDouble measuredPhase,
        OptionalDouble predictedPhase,
        double level,
        OptionalDouble phase,
        OptionalDouble uncertainty,
        OptionalDouble phaseUncertainty,
        double modelUncertainty,
        double modelPhaseUncertainty) {}
