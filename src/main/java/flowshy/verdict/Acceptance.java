package flowshy.verdict;

import java.util.List;
import java.util.OptionalDouble;

/**
 * What a study asks of the device.
 *
 * @param rejection least rejection over the band [dB], absent if not asked
 * @param error largest error by flow [m/s² rms], absent if not asked
 * @param others limits on other named quantities, in the order of their table
 */
public record Acceptance(OptionalDouble rejection, OptionalDouble error, List<FigureLimit> others) {
    /** Margin between motion and flow where none is asked: ten to one, common practice, no source. */
    public static final double DEFAULT_MARGIN = 20.0;

    /** Nothing asked. */
    public static final Acceptance NONE = new Acceptance(OptionalDouble.empty(), OptionalDouble.empty());

    /** Copies the list. */
    public Acceptance {
        others = List.copyOf(others);
    }

    /**
     * Limits on rejection and error alone.
     *
     * @param rejection least rejection over the band [dB], absent if not asked
     * @param error largest error by flow [m/s² rms], absent if not asked
     */
    public Acceptance(OptionalDouble rejection, OptionalDouble error) {
        this(rejection, error, List.of());
    }

    /**
     * Margin that separates the bands.
     *
     * @return the rejection asked, or 20 dB
     */
    public double margin() {
        return rejection.orElse(DEFAULT_MARGIN);
    }
}
