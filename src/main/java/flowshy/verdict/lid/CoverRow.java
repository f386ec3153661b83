package flowshy.verdict.lid;

import flowshy.response.Calibration;
import flowshy.response.ResponsePoint;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Verdict;
import flowshy.verdict.envelope.EnvelopeAnswer;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import java.util.List;
import java.util.Optional;

/**
 * A device under one cover.
 *
 * @param candidate the cover
 * @param answer bands, facts and verdict of the device under it, at the study's own state
 * @param envelope the same over the states that the device must bear, empty if none are stated
 * @param verdict of the device under it: with an envelope each limit at its worst
 * @param reference response at the reference frequency under it
 * @param change sensitivity under the cover against the bare device at the reference frequency
 * @param misses limits that are not met, each in words with its figure, with an envelope also with its state; empty if every limit is met
 * @param warnings what the packaging engineer must know of this cover
 */
public record CoverRow(
        Candidate candidate,
        BandsAnswer answer,
        Optional<EnvelopeAnswer> envelope,
        Verdict verdict,
        ResponsePoint reference,
        Calibration.Figures change,
        List<String> misses,
        List<String> warnings) {
    /** Copies the lists. */
    public CoverRow {
        misses = List.copyOf(misses);
        warnings = List.copyOf(warnings);
    }

    /**
     * Least rejection of all states, the study's own among them.
     *
     * @return figure and state, absent without an envelope and where no flow enters
     */
    public Optional<AtState> lowest() {
        return envelope.flatMap(found -> found.lowest(answer));
    }

    /**
     * Largest error by flow of all states, the study's own among them.
     *
     * @return figure and state, absent without an envelope or surroundings
     */
    public Optional<AtState> largestError() {
        return envelope.flatMap(found -> found.error(answer));
    }
}
