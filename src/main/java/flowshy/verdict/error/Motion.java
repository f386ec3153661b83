package flowshy.verdict.error;

import flowshy.math.Density;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The motion that is to be read.
 *
 * @param smallest smallest acceleration to be read [m/s² rms], absent if not stated
 * @param fullScale largest acceleration [m/s² rms], absent if not stated
 * @param spectrum density of the motion [(m/s²)²/Hz] by frequency, empty if not stated
 */
public record Motion(OptionalDouble smallest, OptionalDouble fullScale, Optional<Density> spectrum) {
    /** Nothing stated. */
    public static final Motion NONE = new Motion(OptionalDouble.empty(), OptionalDouble.empty(), Optional.empty());
}
