package flowshy.verdict;

import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.verdict.BandsAnswer.Extreme;
import flowshy.verdict.RejectionCurve.Sample;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.function.BooleanSupplier;
import org.hipparchus.util.FastMath;

/** What a device reads over its band: interval by interval, and where the rejection is least and largest. */
public final class BandReading {
    /** Hair and fluid count as equally dense within the density's own uncertainty, or this where none is stated. */
    private static final double EQUAL_DENSITY = 1e-6;

    private final Response response;
    private final Band band;
    private final double margin;
    private final BooleanSupplier ended;
    private final Optional<RejectionCurve> curve;

    /**
     * Follows the rejection over a band.
     *
     * @param response of the device
     * @param band band of use
     * @param margin between motion and flow [dB]
     * @param ended whether a model that the rejection rests on has ended; asked only where it decides
     */
    public BandReading(Response response, Band band, double margin, BooleanSupplier ended) {
        this.response = response;
        this.band = band;
        this.margin = margin;
        this.ended = ended;
        this.curve = response.device().cover().closed()
                ? Optional.empty()
                : Optional.of(new RejectionCurve(response::rejection, band));
    }

    /**
     * Least rejection in the band.
     *
     * @return empty under a closed cover, where no flow reaches the hair
     */
    public Optional<Extreme> least() {
        return curve.map(followed -> extreme(followed.least()));
    }

    /**
     * Largest rejection in the band.
     *
     * @return empty under a closed cover
     */
    public Optional<Extreme> largest() {
        return curve.map(followed -> extreme(followed.largest()));
    }

    /**
     * Whether the device reads neither motion nor flow.
     *
     * @param device a device
     * @return true for a closed one whose hair is as dense as its fill, within the uncertainty of that density
     */
    public static boolean readsNothing(Device device) {
        if (!device.cover().closed()) {
            return false;
        }
        double fluid = device.around().density();
        double tolerance = fluid
                * FastMath.max(
                        EQUAL_DENSITY, device.around().uncertainty("density").orElse(0.0));
        return FastMath.abs(device.hair().density() - fluid) <= tolerance;
    }

    /**
     * What is read, interval by interval.
     *
     * @return rising in frequency, over the whole band
     */
    public List<ReadingBand> bands() {
        if (readsNothing(response.device())) {
            return whole(Reads.NOTHING, Double.NaN, Double.NaN);
        }
        if (curve.isEmpty()) {
            return whole(
                    ended.getAsBoolean() ? Reads.UNDECIDED : Reads.MOTION,
                    Double.POSITIVE_INFINITY,
                    Double.POSITIVE_INFINITY);
        }
        return ended.getAsBoolean()
                ? whole(Reads.UNDECIDED, response.rejection(band.from()), response.rejection(band.to()))
                : split(curve.get());
    }

    private List<ReadingBand> whole(Reads reads, double from, double to) {
        return List.of(new ReadingBand(band.from(), band.to(), reads, from, to));
    }

    private List<ReadingBand> split(RejectionCurve followed) {
        TreeSet<Double> edges = new TreeSet<>(List.of(band.from(), band.to()));
        edges.addAll(followed.crossings(margin));
        edges.addAll(followed.crossings(-margin));
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
        if (rejection >= margin) {
            return Reads.MOTION;
        }
        return rejection <= -margin ? Reads.FLOW : Reads.MIXED;
    }

    private static Extreme extreme(Sample sample) {
        return new Extreme(sample.frequency(), sample.rejection());
    }
}
