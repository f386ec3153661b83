package flowshy.verdict.figure;

import flowshy.response.Decay;
import flowshy.response.ResponsePoint;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.error.SurroundingsQuestion;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** Quantities of a device on its suspension. */
final class Swinging {
    private static final String NO_SUSPENSION = "no suspension is stated";
    private static final String FALLS = "the suspension does not hold the hair upright";
    private static final String NO_DAMPING = "no damping";
    private static final String NO_MOTION = "no motion is read, so no noise can be given as one";

    /** Even on a logarithmic scale. */
    private static final int POINTS = 201;

    private Swinging() {}

    /** Why nothing swings. */
    static Found still(Evaluated device) {
        return device.device().suspension().isEmpty() ? Found.notStated(NO_SUSPENSION) : Found.hasNone(FALLS);
    }

    static Found resonance(Evaluated device) {
        return device.resonance().isPresent() ? Found.of(device.resonance().getAsDouble()) : still(device);
    }

    static Found quality(Evaluated device) {
        Optional<Double> quality = device.decay().map(Decay::quality);
        if (quality.isEmpty()) {
            return still(device);
        }
        return Double.isInfinite(quality.get()) ? Found.unbounded(NO_DAMPING) : Found.of(quality.get());
    }

    static Found sensitivity(Evaluated device) {
        return device.point()
                .motion()
                .map(angle -> Found.at(angle.norm(), device.frequency()))
                .orElseGet(() -> still(device));
    }

    static Found flowSensitivity(Evaluated device) {
        double omega = 2.0 * FastMath.PI * device.frequency();
        return device.point()
                .flow()
                .map(angle -> Found.at(omega * angle.norm(), device.frequency()))
                .orElseGet(() -> still(device));
    }

    static Found noise(Evaluated device) {
        if (device.oscillator().isEmpty()) {
            return still(device);
        }
        double noise = noise(device.point());
        return Double.isFinite(noise) ? Found.at(noise, device.frequency()) : Found.hasNone(NO_MOTION);
    }

    private static double noise(ResponsePoint point) {
        return FastMath.hypot(
                point.thermalNoise().orElseThrow(), point.readoutNoise().orElse(0.0));
    }

    /** The noise rises away from its trough below the resonance: mostly it is largest at an end, which is among the points. */
    static Found worstNoise(Evaluated device) {
        if (device.oscillator().isEmpty()) {
            return still(device);
        }
        double worst = Double.NEGATIVE_INFINITY;
        double at = Double.NaN;
        for (double frequency : device.question().band().even(POINTS)) {
            double noise = noise(device.response().at(frequency));
            if (noise > worst) {
                worst = noise;
                at = frequency;
            }
        }
        return Double.isFinite(worst) ? Found.at(worst, at) : Found.hasNone(NO_MOTION);
    }

    static Found noiseRms(Evaluated device) {
        if (device.oscillator().isEmpty()) {
            return still(device);
        }
        double noise = device.error()
                .map(ErrorBudget::noise)
                .map(rms -> rms.orElse(Double.NaN))
                .orElseGet(() -> SurroundingsQuestion.noise(
                        device.response(), device.question().band()));
        return Double.isFinite(noise) ? Found.of(noise) : Found.hasNone(NO_MOTION);
    }
}
