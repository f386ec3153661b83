package flowshy.verdict.measured;

import static flowshy.math.Figures.say;

import flowshy.math.ThirdOctave;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.util.FastMath;

/**
 * A measured response beside the model.
 *
 * @param measured as measured
 * @param gain of the readout as stated or taken out [V/rad, rad/rad, 1 for a ratio]; negative where it turns the sense round
 * @param freed whether that gain was taken out as one common factor
 * @param points one a frequency for which there is a prediction, rising
 * @param coverage factor by which standard uncertainties are expanded, so that a true model is called wrong somewhere in one case of twenty
 * @param bands the same by third-octaves, rising
 */
public record Compared(
        MeasuredResponse measured,
        double gain,
        boolean freed,
        List<Deviation> points,
        double coverage,
        List<BandDeviation> bands) {
    /** Chance that a true model is called wrong in any third-octave; the usual five per cent. */
    private static final double ERROR = 0.05;

    /** Copies the lists. */
    public Compared {
        points = List.copyOf(points);
        bands = List.copyOf(bands);
    }

    /** Sorts the points into third-octaves; the coverage factor allows for the number of comparisons (Šidák 1967). */
    static Compared of(MeasuredResponse measured, double gain, boolean freed, List<Deviation> points) {
        Map<ThirdOctave, List<Deviation>> sorted = new LinkedHashMap<>();
        points.forEach(
                point -> sorted.computeIfAbsent(ThirdOctave.holding(point.frequency()), band -> new ArrayList<>())
                        .add(point));
        boolean phased = points.stream().anyMatch(point -> point.phase().isPresent());
        int comparisons = FastMath.max(1, sorted.size()) * (phased ? 2 : 1);
        double each = 1.0 - FastMath.pow(1.0 - ERROR, 1.0 / comparisons);
        double coverage = new NormalDistribution().inverseCumulativeProbability(1.0 - 0.5 * each);
        List<BandDeviation> bands = new ArrayList<>();
        sorted.forEach((band, within) -> bands.add(band(band, within, coverage)));
        return new Compared(measured, gain, freed, points, coverage, bands);
    }

    private static BandDeviation band(ThirdOctave band, List<Deviation> points, double coverage) {
        Mean level =
                Mean.of(points, p -> OptionalDouble.of(p.level()), Deviation::uncertainty, Deviation::modelUncertainty);
        Mean phase = Mean.of(points, Deviation::phase, Deviation::phaseUncertainty, Deviation::modelPhaseUncertainty);
        return new BandDeviation(
                band.nominal(),
                band.low(),
                band.high(),
                points.size(),
                level.value.orElseThrow(),
                times(level.uncertainty, coverage),
                phase.value,
                times(phase.uncertainty, coverage));
    }

    private static OptionalDouble times(OptionalDouble value, double factor) {
        return value.isPresent() ? OptionalDouble.of(factor * value.getAsDouble()) : value;
    }

    /** A weighted mean: measured values scatter apart from each other, the model is off all of one kind. */
    private record Mean(OptionalDouble value, OptionalDouble uncertainty) {
        static Mean of(
                List<Deviation> points,
                Function<Deviation, OptionalDouble> found,
                Function<Deviation, OptionalDouble> scatter,
                Function<Deviation, Double> model) {
            boolean certain = points.stream().allMatch(p -> scatter.apply(p).isPresent());
            double weights = 0.0;
            double sum = 0.0;
            double common = 0.0;
            for (Deviation point : points) {
                if (found.apply(point).isEmpty()) {
                    return new Mean(OptionalDouble.empty(), OptionalDouble.empty());
                }
                double spread = certain ? scatter.apply(point).getAsDouble() : 1.0;
                double weight = 1.0 / (spread * spread);
                weights += weight;
                sum += weight * found.apply(point).getAsDouble();
                common += weight * model.apply(point);
            }
            return new Mean(
                    OptionalDouble.of(sum / weights),
                    certain
                            ? OptionalDouble.of(FastMath.hypot(1.0 / FastMath.sqrt(weights), common / weights))
                            : OptionalDouble.empty());
        }
    }

    /**
     * Root mean square of the level differences.
     *
     * @return [dB]; zero if nothing could be compared
     */
    public double rms() {
        return rms(points.stream().mapToDouble(Deviation::level).toArray());
    }

    /**
     * Root mean square of the phase differences.
     *
     * @return [rad], absent if not measured
     */
    public OptionalDouble rmsPhase() {
        double[] phases =
                points.stream().flatMapToDouble(point -> point.phase().stream()).toArray();
        return phases.length == 0 ? OptionalDouble.empty() : OptionalDouble.of(rms(phases));
    }

    private static double rms(double[] values) {
        double sum = 0.0;
        for (double value : values) {
            sum += value * value;
        }
        return values.length == 0 ? 0.0 : FastMath.sqrt(sum / values.length);
    }

    /**
     * Whether measurement and model agree within their uncertainties, and where they do not.
     *
     * @return one sentence
     */
    public Agreement agreement() {
        if (points.isEmpty()) {
            return new Agreement(
                    Agreement.Outcome.UNKNOWN, "The model predicts nothing that could be compared.", List.of());
        }
        if (bands.stream().anyMatch(band -> band.allowed().isEmpty())) {
            return new Agreement(
                    Agreement.Outcome.UNKNOWN,
                    "No uncertainty is stated: whether measurement and model agree cannot be said.",
                    List.of());
        }
        List<BandDeviation> off = bands.stream().filter(band -> !band.agrees()).toList();
        if (off.isEmpty()) {
            return new Agreement(
                    Agreement.Outcome.AGREE,
                    say(
                            "Measurement and model agree within their uncertainties in every third-octave (coverage factor %.3g).",
                            coverage),
                    List.of());
        }
        List<Agreement.Interval> where = new ArrayList<>();
        for (BandDeviation band : off) {
            int last = where.size() - 1;
            if (last >= 0 && Math.abs(where.get(last).to() / band.from() - 1.0) < 1e-9) {
                where.set(last, new Agreement.Interval(where.get(last).from(), band.to()));
            } else {
                where.add(new Agreement.Interval(band.from(), band.to()));
            }
        }
        String places = String.join(
                ", ",
                where.stream()
                        .map(w -> say("%.4g Hz to %.4g Hz", w.from(), w.to()))
                        .toList());
        return new Agreement(
                Agreement.Outcome.DIFFER,
                say(
                        "Measurement and model differ by more than their uncertainties explain in %s of %s third-octaves: %s"
                                + " (coverage factor %.3g).",
                        off.size(), bands.size(), places, coverage),
                where);
    }
}
