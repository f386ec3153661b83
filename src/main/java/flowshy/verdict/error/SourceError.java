package flowshy.verdict.error;

import flowshy.cylinder.excursion.Regime;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What one source adds to the reading over the band of use.
 *
 * @param name the user's name for it
 * @param kind its kind
 * @param rms equivalent acceleration over the band [m/s² rms]
 * @param offset equivalent acceleration of its mean stream [m/s²], with sign; its share of the common offset
 * @param share share of the sum of squares of all sources [-]
 * @param worstBand mid-band frequency of the third-octave where most of it arises [Hz]; absent if it adds nothing
 * @param height where its torque arises there [m above the wall]
 * @param regime of that strip there
 * @param cutOff frequency above which viscosity has ended the stream's spectrum [Hz], absent for other kinds
 * @param assumed what half and twice of each assumed number make of the rms
 */
public record SourceError(
        String name,
        String kind,
        double rms,
        double offset,
        double share,
        OptionalDouble worstBand,
        double height,
        Regime regime,
        OptionalDouble cutOff,
        List<Assumed> assumed) {
    /**
     * An assumed number and what it decides.
     *
     * @param key name in a study
     * @param value SI
     * @param source where it comes from
     * @param half rms with half the value [m/s²]
     * @param twice rms with twice the value [m/s²]
     */
    public record Assumed(String key, double value, String source, double half, double twice) {}

    /** Copies the list. */
    public SourceError {
        assumed = List.copyOf(assumed);
    }
}
