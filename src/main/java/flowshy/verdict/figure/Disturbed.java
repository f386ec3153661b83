package flowshy.verdict.figure;

import flowshy.response.Oscillator;
import flowshy.verdict.error.ErrorBudget;
import java.util.function.ToDoubleFunction;
import org.hipparchus.util.FastMath;

/** Quantities that the surroundings and gravity decide. */
final class Disturbed {
    private static final String NO_SURROUNDINGS = "no surroundings are given";
    private static final String NO_FULL_SCALE = "no full scale of the motion is stated";
    private static final String NOTHING = "nothing of a motion is read";

    private Disturbed() {}

    static Found error(Evaluated device) {
        return budgeted(device, ErrorBudget::rms);
    }

    static Found offset(Evaluated device) {
        return budgeted(device, budget -> FastMath.abs(budget.offset()));
    }

    static Found smallestReadable(Evaluated device) {
        return budgeted(device, ErrorBudget::smallestReadable);
    }

    static Found dynamicRange(Evaluated device) {
        return device.question().motion().fullScale().isEmpty()
                ? Found.notStated(NO_FULL_SCALE)
                : budgeted(device, budget -> budget.dynamicRange().orElseThrow());
    }

    private static Found budgeted(Evaluated device, ToDoubleFunction<ErrorBudget> part) {
        if (device.error().isEmpty()) {
            return Found.notStated(NO_SURROUNDINGS);
        }
        double value = part.applyAsDouble(device.error().get());
        return Double.isFinite(value) ? Found.of(value) : Found.hasNone(NOTHING);
    }

    /** How a stream lies to a slope is not known: their sizes add up. */
    static Found staticTilt(Evaluated device) {
        return device.oscillator()
                .map(swing -> Found.of(gravity(swing)
                        + (device.error().isPresent() ? stream(device.error().get()) : 0.0)))
                .orElseGet(() -> Swinging.still(device));
    }

    static Found gravityTilt(Evaluated device) {
        return device.oscillator().map(swing -> Found.of(gravity(swing))).orElseGet(() -> Swinging.still(device));
    }

    static Found streamTilt(Evaluated device) {
        if (device.oscillator().isEmpty()) {
            return Swinging.still(device);
        }
        return device.error().map(budget -> Found.of(stream(budget))).orElseGet(() -> Found.notStated(NO_SURROUNDINGS));
    }

    private static double gravity(Oscillator swing) {
        return FastMath.abs(swing.staticTilt());
    }

    private static double stream(ErrorBudget budget) {
        return FastMath.abs(budget.staticTilt().orElse(0.0));
    }
}
