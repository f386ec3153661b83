package flowshy.verdict.lid;

import flowshy.response.Calibration;
import flowshy.response.ResponsePoint;
import flowshy.verdict.BandsAnswer;
import java.util.List;

/**
 * A device under one cover.
 *
 * @param candidate the cover
 * @param answer bands, facts and verdict of the device under it
 * @param reference response at the reference frequency under it
 * @param change sensitivity under the cover against the bare device at the reference frequency
 * @param misses limits that are not met, each in words with its figure; empty if every limit is met
 * @param warnings what the packaging engineer must know of this cover
 */
public record CoverRow(
        Candidate candidate,
        BandsAnswer answer,
        ResponsePoint reference,
        Calibration.Figures change,
        List<String> misses,
        List<String> warnings) {
    /** Copies the lists. */
    public CoverRow {
        misses = List.copyOf(misses);
        warnings = List.copyOf(warnings);
    }
}
