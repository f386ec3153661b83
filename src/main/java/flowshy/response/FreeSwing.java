package flowshy.response;

/**
 * Free swing a(t) ∝ e^{−t/τ} cos(2πft + φ) found in a record.
 *
 * @param frequency f [Hz]
 * @param decayTime τ [s]
 * @param frequencyUncertainty standard uncertainty of f, if the rest is white noise [Hz]
 * @param decayUncertainty standard uncertainty of τ, likewise [s]
 * @param rest rms of what the swing leaves unexplained, over the rms of the record about its mean [-]
 */
public record FreeSwing(
        double frequency, double decayTime, double frequencyUncertainty, double decayUncertainty, double rest) {}
