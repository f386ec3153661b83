package flowshy.verdict.fill;

import flowshy.medium.Medium;
import flowshy.stream.cover.Cover;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A device in one fill under one cover.
 *
 * @param fill name of the fill
 * @param cover open: the device stands bare in the fluid; sealed: the fluid is carried along
 * @param medium the fluid at the state, empty if it is refused there
 * @param rejection least rejection over the band [dB]; +∞ where no flow enters, NaN where nothing is read
 * @param at where it is least [Hz]; NaN where it belongs to no frequency
 * @param resonance [Hz], absent without a suspension that holds the hair
 * @param quality Q [-], likewise
 * @param sensitivity θ/A at the reference frequency over that of the study's device there [-]; of the torques without a suspension
 * @param thermalNoise at the reference frequency [m/s²/√Hz], absent without a suspension
 * @param excluded what speaks against the fluid, empty if nothing does
 * @param fromMemory whether density or viscosity is recalled from memory
 */
public record FillRow(
        String fill,
        Cover cover,
        Optional<Medium> medium,
        double rejection,
        double at,
        OptionalDouble resonance,
        OptionalDouble quality,
        double sensitivity,
        OptionalDouble thermalNoise,
        List<String> excluded,
        boolean fromMemory) {
    /** Copies the list. */
    public FillRow {
        excluded = List.copyOf(excluded);
    }
}
