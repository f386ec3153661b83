package flowshy.verdict.design;

import flowshy.verdict.BandsQuestion;
import java.util.function.DoubleFunction;

/**
 * One dimension or property of a device that can come out otherwise.
 *
 * @param name path of its key, or words
 * @param value as it stands, SI or a factor; positive
 * @param degrees whether it is a temperature, whose change is told per kelvin instead of per cent
 * @param law the question with another value; throws {@link NoDesignException} where that makes no device
 */
public record Knob(String name, double value, boolean degrees, DoubleFunction<BandsQuestion> law) {
    /** @throws IllegalArgumentException if the value is not positive */
    public Knob {
        if (!(value > 0.0)) {
            throw new IllegalArgumentException(name + " must be positive to be changed by a share, was " + value);
        }
    }
}
