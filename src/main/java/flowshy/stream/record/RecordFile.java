package flowshy.stream.record;

import static flowshy.math.Figures.say;

import flowshy.math.Density;
import flowshy.math.LogLogDensity;
import flowshy.math.StepDensity;
import flowshy.stream.Line;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** Reads a measured file as its declaration says. */
public final class RecordFile {
    private final RecordRows rows;
    private final Declaration declaration;
    private final List<String> notes = new ArrayList<>();

    private RecordFile(RecordRows rows, Declaration declaration) {
        this.rows = rows;
        this.declaration = declaration;
    }

    /**
     * Reads a file.
     *
     * @param name of the file as the user knows it, for messages
     * @param text its text
     * @param declaration what its columns hold
     * @return the signal in SI
     * @throws RecordException with every fault and its place
     * @throws DeclarationException if a wanted resolution does not fit the record
     */
    public static MeasuredSpectrum read(String name, String text, Declaration declaration) {
        RecordFile file = new RecordFile(new RecordRows(name, text, declaration), declaration);
        return declaration.quantity().overFrequency() ? file.overFrequency() : file.overTime();
    }

    private double si(int row) {
        return declaration.unit().si(rows.value(row), declaration.quantity());
    }

    private MeasuredSpectrum overFrequency() {
        List<Integer> taken = taken();
        rows.judge();
        Quantity quantity = declaration.quantity();
        Optional<Density> density = switch (quantity) {
            case BAND_LEVELS -> Optional.of(bands(taken));
            case RMS_LINES -> Optional.empty();
            default -> Optional.of(curve(taken));
        };
        List<Line> lines = quantity == Quantity.RMS_LINES ? lines(taken) : List.of();
        rows.judge();
        MeasuredSpectrum spectrum =
                new MeasuredSpectrum(declaration.unit().signal(), density, lines, 0.0, Optional.empty(), notes);
        if (!(spectrum.meanSquare() > 0.0)) {
            rows.valueProblem(0, "nothing but zeros", "a signal that fluctuates");
            rows.judge();
        }
        return spectrum;
    }

    /** Rows that count, rising in frequency; a first row at zero frequency is left out and told. */
    private List<Integer> taken() {
        List<Integer> taken = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            double frequency = rows.axis(i);
            if (i == 0 && frequency == 0.0) {
                notes.add("The row at 0 Hz was left out.");
                continue;
            }
            if (!(frequency > 0.0)) {
                rows.axisProblem(i, "a frequency not above zero", "frequencies above zero, rising");
            } else if (!taken.isEmpty() && !(frequency > rows.axis(taken.get(taken.size() - 1)))) {
                rows.axisProblem(i, "a frequency that does not rise", "each frequency above the one before");
            } else {
                if (!declaration.unit().level() && rows.value(i) < 0.0) {
                    rows.valueProblem(
                            i,
                            "a negative number",
                            "zero or more for " + declaration.quantity().word());
                }
                taken.add(i);
            }
        }
        int fewest = declaration.quantity() == Quantity.RMS_LINES ? 1 : 2;
        if (taken.size() < fewest) {
            rows.valueProblem(rows.size() - 1, taken.size() + " rows", fewest + " or more above 0 Hz");
        }
        return taken;
    }

    private LogLogDensity curve(List<Integer> taken) {
        return new LogLogDensity(taken.stream()
                .map(i -> new LogLogDensity.Point(rows.axis(i), si(i)))
                .toList());
    }

    /** Rows of zero are no lines. */
    private List<Line> lines(List<Integer> taken) {
        notes.add("Each row was taken as one sinusoid of this rms; lines of one broad spectrum belong under density.");
        return taken.stream()
                .filter(i -> si(i) > 0.0)
                .map(i -> new Line(rows.axis(i), si(i)))
                .toList();
    }

    private Density bands(List<Integer> taken) {
        Optional<BandSet> set = BandSet.of(rows.axis(taken.get(0)), rows.axis(taken.get(1)));
        if (set.isEmpty()) {
            rows.axisProblem(
                    taken.get(1),
                    say("a step of %.4g in frequency", rows.axis(taken.get(1)) / rows.axis(taken.get(0))),
                    "mid-band frequencies of third-octaves (1.26) or octaves (2)");
            rows.judge();
        }
        BandSet bandSet = set.orElseThrow();
        notes.add("Band levels were taken as " + bandSet.word()
                + "s, equal mean square in equal ratios of frequency inside each.");
        List<StepDensity.Band> bands = new ArrayList<>();
        int last = Integer.MIN_VALUE;
        for (int i : taken) {
            Optional<Integer> index = bandSet.index(rows.axis(i));
            if (index.isEmpty() || index.get() <= last) {
                rows.axisProblem(
                        i,
                        say("%.6g Hz", rows.axis(i)),
                        "the mid-band frequency of the next or a later " + bandSet.word());
            } else {
                last = index.get();
                double rms = si(i);
                bands.add(new StepDensity.Band(bandSet.low(last), bandSet.high(last), rms * rms));
            }
        }
        rows.judge();
        return new StepDensity(bands, StepDensity.Inside.PINK);
    }

    private MeasuredSpectrum overTime() {
        int count = rows.size();
        if (count < Welch.FEWEST_SAMPLES) {
            rows.valueProblem(count - 1, count + " samples", Welch.FEWEST_SAMPLES + " or more");
            rows.judge();
        }
        double rate = rate();
        double[] samples = new double[count];
        for (int i = 0; i < count; i++) {
            samples[i] = si(i);
        }
        Welch welch = new Welch(samples, rate, segment(count, rate));
        StepDensity curve = welch.density();
        if (!(curve.meanSquare() > 0.0)) {
            rows.valueProblem(0, "a record that does not change", "a signal that fluctuates");
            rows.judge();
        }
        notes.add(say(
                "The density is Welch's: %s, lines %.3g Hz apart, each known to %.2g %%.",
                welch.averaging().words(),
                welch.averaging().resolution(),
                100.0 * welch.averaging().randomError()));
        return new MeasuredSpectrum(
                declaration.unit().signal(),
                Optional.of(curve),
                List.of(),
                Welch.mean(samples),
                Optional.of(welch.averaging()),
                notes);
    }

    private int segment(int samples, double rate) {
        if (declaration.resolution().isEmpty()) {
            return Welch.usualSegment(samples);
        }
        double wanted = declaration.resolution().getAsDouble();
        int segment = 16;
        while (rate / segment > wanted * (1.0 + 1e-9) && segment <= samples) {
            segment *= 2;
        }
        if (segment > samples) {
            throw new DeclarationException(
                    "resolution",
                    say("%.4g Hz", wanted),
                    say(
                            "%.4g Hz or more for %s samples at %.6g Hz",
                            rate / Integer.highestOneBit(samples), samples, rate));
        }
        return segment;
    }

    /** Samples per second: as declared, or from the times, which must keep their step to a tenth. */
    private double rate() {
        if (declaration.rate().isPresent()) {
            return declaration.rate().getAsDouble();
        }
        int last = rows.size() - 1;
        double step = (rows.axis(last) - rows.axis(0)) / last;
        if (!(step > 0.0)) {
            rows.axisProblem(last, "a time not after the first", "times that rise by equal steps");
            rows.judge();
        }
        for (int i = 1; i <= last; i++) {
            double here = rows.axis(i) - rows.axis(i - 1);
            if (!(FastMath.abs(here - step) <= 0.1 * step)) {
                rows.axisProblem(
                        i,
                        say("a step of %.6g s", here),
                        say("equal steps, here %.6g s on average, kept to a tenth", step));
                rows.judge();
            }
        }
        return 1.0 / step;
    }
}
