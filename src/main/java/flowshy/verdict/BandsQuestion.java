package flowshy.verdict;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.stream.Source;
import flowshy.verdict.envelope.Envelope;
import flowshy.verdict.envelope.EnvelopeAnswer;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.error.Motion;
import flowshy.verdict.error.SurroundingsQuestion;
import flowshy.verdict.figure.Evaluated;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The main question about a device.
 *
 * @param device hair, suspension, medium, cover
 * @param band band of use
 * @param acceptance limits asked
 * @param motion what is to be read
 * @param sources flows that are there; empty: the verdict holds at equal accelerations only
 * @param reference frequency at which what depends on it is compared and limited [Hz]
 * @param envelope states that the device must bear, which the verdict of an answer counts; empty if none are stated
 */
public record BandsQuestion(
        Device device,
        Band band,
        Acceptance acceptance,
        Motion motion,
        List<Source> sources,
        double reference,
        Optional<Envelope> envelope) {
    /** Copies the list. */
    public BandsQuestion {
        sources = List.copyOf(sources);
    }

    /**
     * The question at one state.
     *
     * @param device hair, suspension, medium, cover
     * @param band band of use
     * @param acceptance limits asked
     * @param motion what is to be read
     * @param sources flows that are there
     * @param reference frequency of comparison [Hz]
     */
    public BandsQuestion(
            Device device, Band band, Acceptance acceptance, Motion motion, List<Source> sources, double reference) {
        this(device, band, acceptance, motion, sources, reference, Optional.empty());
    }

    /**
     * The question with the middle of the band, on a logarithmic scale, as the frequency of comparison.
     *
     * @param device hair, suspension, medium, cover
     * @param band band of use
     * @param acceptance limits asked
     * @param motion what is to be read
     * @param sources flows that are there
     */
    public BandsQuestion(Device device, Band band, Acceptance acceptance, Motion motion, List<Source> sources) {
        this(device, band, acceptance, motion, sources, band.middle());
    }

    /**
     * The question at equal accelerations of base and fluid, without surroundings.
     *
     * @param device hair, suspension, medium, cover
     * @param band band of use
     * @param acceptance limits asked
     */
    public BandsQuestion(Device device, Band band, Acceptance acceptance) {
        this(device, band, acceptance, Motion.NONE, List.of());
    }

    /**
     * The same question of a device that must bear other states.
     *
     * @param states that the verdict of an answer counts
     * @return the rest kept
     */
    public BandsQuestion within(Envelope states) {
        return new BandsQuestion(device, band, acceptance, motion, sources, reference, Optional.of(states));
    }

    /**
     * The same question about another device.
     *
     * @param other the device
     * @return band, limits, motion and sources kept, at this one state
     */
    public BandsQuestion about(Device other) {
        return new BandsQuestion(other, band, acceptance, motion, sources, reference);
    }

    /**
     * The same question amid other flows.
     *
     * @param flows that are there; empty: the verdict holds at equal accelerations only
     * @return device, band, limits and motion kept, at this one state
     */
    public BandsQuestion amid(List<Source> flows) {
        return new BandsQuestion(device, band, acceptance, motion, flows, reference);
    }

    /**
     * Answers at third-octave frequencies.
     *
     * @return bands, points and verdict
     */
    public BandsAnswer answer() {
        return answer(ThirdOctaves.in(band));
    }

    /**
     * Answers at chosen frequencies.
     *
     * @param frequencies at which points are evaluated [Hz], any order
     * @return bands, points and verdict
     */
    public BandsAnswer answer(List<Double> frequencies) {
        return answer(frequencies, error());
    }

    /**
     * What a verdict needs and no more: at the frequency of comparison alone, assumed numbers of sources as they are taken.
     *
     * @return the same verdict
     */
    public BandsAnswer judged() {
        return answer(List.of(reference), errorAsTaken());
    }

    private BandsAnswer answer(List<Double> frequencies, Optional<ErrorBudget> error) {
        Response response = new Response(device);
        response.expect(band.from(), band.to());
        DeviceFacts facts = DeviceFacts.of(device, band);
        List<Caveat> caveats = new ArrayList<>(Assumptions.of(device, band, facts));
        List<ResponsePoint> points = frequencies.stream().map(response::at).toList();
        boolean ended = Assumptions.ended(caveats, Subject.REJECTION);
        BandReading reading = new BandReading(response, band, acceptance.margin(), () -> ended);
        error.ifPresent(budget -> caveats.addAll(budget.caveats()));
        List<ReadingBand> bands = reading.bands();
        Evaluated known = new Evaluated(this, response, reading, error);
        Verdict own = new Judgement(known, caveats).of(bands, reading.least());
        Optional<EnvelopeAnswer> states = envelope.map(Envelope::answer);
        Verdict verdict = states.map(found -> Envelope.together(own, found)).orElse(own);
        return new BandsAnswer(
                device,
                band,
                acceptance,
                facts,
                bands,
                reading.least(),
                reading.largest(),
                points,
                error,
                caveats,
                states,
                verdict);
    }

    /**
     * What the device reads over its band, without the rest of an answer.
     *
     * @param response of this question's device
     * @return bands and extremes, found when asked for
     */
    public BandReading reading(Response response) {
        return new BandReading(response, band, acceptance.margin(), () -> Assumptions.rejectionEnds(device, band));
    }

    /**
     * Whether a model has ended that the rejection of this device rests on.
     *
     * @return true if a caveat of an answer would say so
     */
    public boolean rejectionEnds() {
        return Assumptions.rejectionEnds(device, band);
    }

    /**
     * What the surroundings do.
     *
     * @return their error over the band, empty where none are given
     */
    public Optional<ErrorBudget> error() {
        return budget().map(SurroundingsQuestion::answer);
    }

    /**
     * The same sooner: it does not tell what half and twice of the sources' assumed numbers would do.
     *
     * @return their error over the band, empty where none are given
     */
    public Optional<ErrorBudget> errorAsTaken() {
        return budget().map(SurroundingsQuestion::asTaken);
    }

    private Optional<SurroundingsQuestion> budget() {
        return sources.isEmpty()
                ? Optional.empty()
                : Optional.of(new SurroundingsQuestion(device, band, acceptance.margin(), motion, sources));
    }
}
