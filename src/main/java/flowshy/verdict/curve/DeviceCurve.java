package flowshy.verdict.curve;

import flowshy.response.Response;
import flowshy.verdict.Band;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.DeviceFacts.Swing;
import flowshy.verdict.ReadingBand;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.hipparchus.util.FastMath;

/**
 * A device over its band in fine steps, closer about the resonance; every edge of a band and every extreme is a point.
 *
 * @param points rising in frequency, both ends of the band included
 */
public record DeviceCurve(List<CurvePoint> points) {
    private static final double POINTS_A_DECADE = 80.0;
    private static final int LEAST_POINTS = 60;

    /** Steps about a resonance, in half widths, to each side. */
    private static final int RESONANCE_STEPS = 16;

    /** Quality above which the even steps miss a peak's shape. */
    private static final double SHARP = 3.0;

    /** Frequencies nearer than this, relative, count as one. */
    private static final double SAME = 1e-9;

    /** Copies the list. */
    public DeviceCurve {
        points = List.copyOf(points);
    }

    /**
     * The curve of an answer.
     *
     * @param answer of a device over its band
     * @return the curve
     */
    public static DeviceCurve of(BandsAnswer answer) {
        Response response = new Response(answer.device());
        List<CurvePoint> points = new ArrayList<>();
        for (double frequency : frequencies(answer)) {
            points.add(new CurvePoint(response.at(frequency), TorqueParts.at(response, frequency)));
        }
        return new DeviceCurve(points);
    }

    private static List<Double> frequencies(BandsAnswer answer) {
        Band band = answer.band();
        int count = (int) FastMath.ceil(POINTS_A_DECADE * FastMath.log10(band.to() / band.from()));
        TreeSet<Double> all = new TreeSet<>(band.even(FastMath.max(LEAST_POINTS, count) + 1));
        answer.bands().stream().skip(1).map(ReadingBand::from).forEach(all::add);
        answer.least().ifPresent(extreme -> all.add(extreme.frequency()));
        answer.largest().ifPresent(extreme -> all.add(extreme.frequency()));
        answer.facts().medium().ifPresent(swing -> all.addAll(about(swing)));
        List<Double> apart = new ArrayList<>();
        for (double frequency : all.subSet(band.from(), true, band.to(), true)) {
            if (apart.isEmpty() || frequency > apart.get(apart.size() - 1) * (1.0 + SAME)) {
                apart.add(frequency);
            }
        }
        if (apart.get(apart.size() - 1) < band.to()) { // the end itself, not what lies just below
            apart.set(apart.size() - 1, band.to());
        }
        return apart;
    }

    private static List<Double> about(Swing swing) {
        List<Double> frequencies = new ArrayList<>(List.of(swing.resonance()));
        double quality = swing.decay().quality();
        for (int n = 1; quality > SHARP && n <= RESONANCE_STEPS; n++) {
            // half a width of the peak is the resonance over twice the quality
            double aside = 0.3 * n * swing.resonance() / (2.0 * quality);
            frequencies.add(swing.resonance() - aside);
            frequencies.add(swing.resonance() + aside);
        }
        frequencies.removeIf(frequency -> !(frequency > 0.0));
        return frequencies;
    }
}
