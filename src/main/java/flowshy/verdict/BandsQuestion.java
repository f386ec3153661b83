package flowshy.verdict;

import flowshy.math.Caveat;
import flowshy.medium.PropertySource;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.stream.Source;
import flowshy.verdict.BandsAnswer.Extreme;
import flowshy.verdict.RejectionCurve.Sample;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.error.Motion;
import flowshy.verdict.error.SurroundingsQuestion;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeSet;
import org.hipparchus.util.FastMath;

/**
 * The main question about a device.
 *
 * @param device hair, suspension, medium, cover
 * @param band band of use
 * @param acceptance limits asked
 * @param motion what is to be read
 * @param sources flows that are there; empty: the verdict holds at equal accelerations only
 */
public record BandsQuestion(Device device, Band band, Acceptance acceptance, Motion motion, List<Source> sources) {
    /** Hair and fluid count as equally dense within the density's own uncertainty, or this where none is stated. */
    private static final double EQUAL_DENSITY = 1e-6;

    /** Copies the list. */
    public BandsQuestion {
        sources = List.copyOf(sources);
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
     * The same question about another device.
     *
     * @param other the device
     * @return band, limits, motion and sources kept
     */
    public BandsQuestion about(Device other) {
        return new BandsQuestion(other, band, acceptance, motion, sources);
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
        Response response = new Response(device);
        DeviceFacts facts = DeviceFacts.of(device, band);
        List<Caveat> caveats = Assumptions.of(device, band, facts);
        List<ResponsePoint> points = frequencies.stream().map(response::at).toList();
        boolean ended = caveats.stream()
                .anyMatch(caveat ->
                        caveat.weight() == Caveat.Weight.OUT_OF_RANGE && caveat.about() == Caveat.Subject.REJECTION);
        Optional<ErrorBudget> error = sources.isEmpty()
                ? Optional.empty()
                : Optional.of(new SurroundingsQuestion(device, band, acceptance.margin(), motion, sources).answer());
        List<Caveat> all = new ArrayList<>(caveats);
        error.ifPresent(budget -> all.addAll(budget.caveats()));
        Findings findings = new Findings(facts, points, all, error);
        if (readsNothing()) {
            return whole(findings, Reads.NOTHING, Double.NaN);
        }
        if (device.cover().closed()) {
            return whole(findings, ended ? Reads.UNDECIDED : Reads.MOTION, Double.POSITIVE_INFINITY);
        }
        RejectionCurve curve = new RejectionCurve(response::rejection, band);
        List<ReadingBand> bands = ended
                ? List.of(new ReadingBand(
                        band.from(),
                        band.to(),
                        Reads.UNDECIDED,
                        response.rejection(band.from()),
                        response.rejection(band.to())))
                : split(curve, response);
        return answer(findings, bands, Optional.of(extreme(curve.least())), Optional.of(extreme(curve.largest())));
    }

    /** What was found before the bands are known. */
    private record Findings(
            DeviceFacts facts, List<ResponsePoint> points, List<Caveat> caveats, Optional<ErrorBudget> error) {}

    private BandsAnswer answer(
            Findings findings, List<ReadingBand> bands, Optional<Extreme> least, Optional<Extreme> largest) {
        Verdict verdict = new Judgement(acceptance, motion, device, findings.error()).of(bands, least);
        return new BandsAnswer(
                device,
                band,
                acceptance,
                findings.facts(),
                bands,
                least,
                largest,
                findings.points(),
                findings.error(),
                findings.caveats(),
                verdict);
    }

    /** A sealed device whose hair is as dense as its fill feels neither motion nor flow. */
    private boolean readsNothing() {
        double fluid = device.around().density();
        OptionalDouble stated = device.around().sources().stream()
                .filter(source -> source.property().equals("density"))
                .map(PropertySource::uncertainty)
                .flatMapToDouble(OptionalDouble::stream)
                .max();
        double tolerance = fluid * FastMath.max(EQUAL_DENSITY, stated.orElse(0.0));
        return device.cover().closed() && FastMath.abs(device.hair().density() - fluid) <= tolerance;
    }

    private BandsAnswer whole(Findings findings, Reads reads, double rejection) {
        List<ReadingBand> bands = List.of(new ReadingBand(band.from(), band.to(), reads, rejection, rejection));
        return answer(findings, bands, Optional.empty(), Optional.empty());
    }

    private List<ReadingBand> split(RejectionCurve curve, Response response) {
        TreeSet<Double> edges = new TreeSet<>(List.of(band.from(), band.to()));
        edges.addAll(curve.crossings(acceptance.margin()));
        edges.addAll(curve.crossings(-acceptance.margin()));
        List<Double> ordered = new ArrayList<>(edges);
        List<ReadingBand> bands = new ArrayList<>();
        for (int i = 1; i < ordered.size(); i++) {
            double from = ordered.get(i - 1);
            double to = ordered.get(i);
            Reads reads = reads(response.rejection(FastMath.sqrt(from * to)));
            ReadingBand last = bands.isEmpty() ? null : bands.get(bands.size() - 1);
            if (last != null && last.reads() == reads) { // touched the level without crossing it
                bands.set(
                        bands.size() - 1,
                        new ReadingBand(last.from(), to, reads, last.rejectionFrom(), response.rejection(to)));
            } else {
                bands.add(new ReadingBand(from, to, reads, response.rejection(from), response.rejection(to)));
            }
        }
        return bands;
    }

    private Reads reads(double rejection) {
        if (rejection >= acceptance.margin()) {
            return Reads.MOTION;
        }
        return rejection <= -acceptance.margin() ? Reads.FLOW : Reads.MIXED;
    }

    private static Extreme extreme(Sample sample) {
        return new Extreme(sample.frequency(), sample.rejection());
    }
}
