package flowshy.verdict;

import flowshy.math.Caveat;
import flowshy.response.Device;
import flowshy.response.ResponsePoint;
import flowshy.verdict.envelope.EnvelopeAnswer;
import flowshy.verdict.error.ErrorBudget;
import java.util.List;
import java.util.Optional;

/**
 * Answer to the main question: in which bands does this device read motion, and in which flow?
 *
 * @param device the device asked about
 * @param band the band of use
 * @param acceptance the limits asked
 * @param facts figures of the device
 * @param bands what it reads, interval by interval, over the whole band
 * @param least least rejection in the band, empty where no flow reaches the hair or it reads nothing
 * @param largest largest rejection in the band, likewise
 * @param points the response at the frequencies asked, same order
 * @param error what the surroundings do, empty if none are given
 * @param caveats what must stand beside the numbers
 * @param envelope the verdict over the states that the device must bear, empty if none are stated
 * @param verdict limit by limit, with an envelope each at its worst
 */
public record BandsAnswer(
        Device device,
        Band band,
        Acceptance acceptance,
        DeviceFacts facts,
        List<ReadingBand> bands,
        Optional<Extreme> least,
        Optional<Extreme> largest,
        List<ResponsePoint> points,
        Optional<ErrorBudget> error,
        List<Caveat> caveats,
        Optional<EnvelopeAnswer> envelope,
        Verdict verdict) {
    /**
     * An extreme of the rejection.
     *
     * @param frequency [Hz]
     * @param rejection [dB]
     */
    public record Extreme(double frequency, double rejection) {}

    /** Copies the lists. */
    public BandsAnswer {
        bands = List.copyOf(bands);
        points = List.copyOf(points);
        caveats = List.copyOf(caveats);
    }
}
