package flowshy.verdict.error;

import static flowshy.math.Figures.say;

import flowshy.cylinder.Shedding;
import flowshy.cylinder.excursion.CombinedResistance;
import flowshy.cylinder.excursion.Regime;
import flowshy.hair.Moments;
import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.math.ThirdOctave;
import flowshy.response.Device;
import flowshy.response.Oscillator;
import flowshy.response.Response;
import flowshy.stream.Source;
import flowshy.stream.Stated;
import flowshy.stream.cover.Exposure;
import flowshy.stream.surroundings.CarriedFlow;
import flowshy.verdict.Band;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.hipparchus.util.FastMath;

/**
 * What do the surroundings do to the reading?
 *
 * @param device the device where it stands
 * @param band band of use
 * @param margin between motion and flow [dB]
 * @param motion what is to be read
 * @param sources the flows, uncorrelated with each other; one or more
 */
public record SurroundingsQuestion(Device device, Band band, double margin, Motion motion, List<Source> sources) {
    private static final double TWO_PI = 2.0 * FastMath.PI;

    /** Shedding within this factor of the resonance may lock on to it (common practice, no source). */
    private static final double LOCK_IN = 1.25;

    /** Copies the list. */
    public SurroundingsQuestion {
        sources = List.copyOf(sources);
    }

    /**
     * The error budget.
     *
     * @return sources, sums, bands on the spectra
     */
    public ErrorBudget answer() {
        return answer(true);
    }

    /**
     * The error budget without half and twice of every assumed number, which take most of the time and no part in a verdict.
     *
     * @return sources without assumed numbers, sums, bands on the spectra
     */
    public ErrorBudget asTaken() {
        return answer(false);
    }

    private ErrorBudget answer(boolean varied) {
        FlowLoad load = new FlowLoad(device, sources);
        Response response = new Response(device);
        Spectrum spectrum = new Spectrum(response, load, band);
        double[] squares = new double[sources.size()];
        double all = 0.0;
        for (int i = 0; i < squares.length; i++) {
            squares[i] = spectrum.meanSquare(i, band.from(), band.to());
            all += squares[i];
        }
        double torque = load.steadyTorque();
        double moment = (device.hair().density() - device.around().density())
                * Moments.of(device.hair().profile(), device.pivotDepth()).first();
        double offset = torque / FastMath.abs(moment);
        List<SourceError> errors = new ArrayList<>();
        for (int i = 0; i < squares.length; i++) {
            errors.add(source(i, load, spectrum, squares[i], all, offset, varied));
        }
        double rms = FastMath.sqrt(all);
        Optional<Oscillator> swing = response.oscillator().filter(Oscillator::stands);
        OptionalDouble noise = swing.isPresent()
                ? OptionalDouble.of(FastMath.sqrt(spectrum.noiseMeanSquare(band.from(), band.to())))
                : OptionalDouble.empty();
        double readable = FastMath.hypot(rms, noise.orElse(0.0));
        List<ErrorBudget.ThirdOctaveLevel> levels = levels(spectrum);
        return new ErrorBudget(
                errors,
                rms,
                offset,
                share(FastMath.abs(offset)),
                swing.isPresent() ? OptionalDouble.of(torque / swing.get().stiffness()) : OptionalDouble.empty(),
                noise,
                readable,
                motion.fullScale().isPresent()
                        ? OptionalDouble.of(
                                20.0 * FastMath.log10(motion.fullScale().getAsDouble() / readable))
                        : OptionalDouble.empty(),
                deflection(offset, readable),
                points(spectrum),
                levels,
                bands(levels),
                caveats(load));
    }

    /**
     * Thermal and readout noise over a band where no flow acts.
     *
     * @param response of a device whose suspension holds the hair
     * @param band band of use
     * @return as acceleration [m/s² rms]
     */
    public static double noise(Response response, Band band) {
        Spectrum spectrum = new Spectrum(response, new FlowLoad(response.device(), List.of()), band);
        return FastMath.sqrt(spectrum.noiseMeanSquare(band.from(), band.to()));
    }

    private SourceError source(
            int index, FlowLoad load, Spectrum spectrum, double square, double all, double offset, boolean varied) {
        Source source = sources.get(index);
        Exposure exposure = load.exposures().get(index);
        OptionalDouble worst = worst(index, spectrum);
        FlowLoad.Place place = load.place(exposure, TWO_PI * worst.orElse(FastMath.sqrt(band.from() * band.to())));
        return new SourceError(
                source.name(),
                source.kind().word(),
                FastMath.sqrt(square),
                offset * shareOfMean(source),
                all > 0.0 ? square / all : 0.0,
                worst,
                place.height(),
                place.regime(),
                source instanceof CarriedFlow carried && carried.cutOff().isPresent()
                        ? OptionalDouble.of(carried.cutOff().get())
                        : OptionalDouble.empty(),
                varied
                        ? source.assumed().stream()
                                .map(number -> assumed(index, number))
                                .toList()
                        : List.of());
    }

    /** Share of the mean stream along the sensitive axis, by which the common offset is split. */
    private double shareOfMean(Source source) {
        double own = source.meanSpeed() * FlowLoad.cosine(source);
        double sum = sources.stream()
                .mapToDouble(other -> other.meanSpeed() * FlowLoad.cosine(other))
                .sum();
        return own == 0.0 ? 0.0 : own / sum;
    }

    private SourceError.Assumed assumed(int index, Stated number) {
        return new SourceError.Assumed(
                number.key(), number.value(), number.source(), varied(index, number, 0.5), varied(index, number, 2.0));
    }

    /** Rms of one source with one of its numbers multiplied, everything else as it is. */
    private double varied(int index, Stated number, double factor) {
        List<Source> changed = new ArrayList<>(sources);
        changed.set(index, sources.get(index).varied(number.key(), factor));
        Spectrum spectrum = new Spectrum(new Response(device), new FlowLoad(device, changed), band);
        return FastMath.sqrt(spectrum.meanSquare(index, band.from(), band.to()));
    }

    private OptionalDouble worst(int index, Spectrum spectrum) {
        double most = 0.0;
        OptionalDouble at = OptionalDouble.empty();
        for (ThirdOctave part : ThirdOctave.covering(band.from(), band.to())) {
            double square = spectrum.meanSquare(
                    index, FastMath.max(part.low(), band.from()), FastMath.min(part.high(), band.to()));
            if (square > most) {
                most = square;
                at = OptionalDouble.of(part.middle());
            }
        }
        return at;
    }

    private OptionalDouble share(double acceleration) {
        return motion.fullScale().isPresent()
                ? OptionalDouble.of(acceleration / motion.fullScale().getAsDouble())
                : OptionalDouble.empty();
    }

    private OptionalDouble deflection(double offset, double readable) {
        double moving = motion.spectrum().isPresent() ? motion.spectrum().get().meanSquare() : 0.0;
        return share(FastMath.abs(offset) + 3.0 * FastMath.sqrt(readable * readable + moving));
    }

    private List<ErrorBudget.DensityPoint> points(Spectrum spectrum) {
        List<ErrorBudget.DensityPoint> points = new ArrayList<>();
        double[] running = spectrum.runningMeanSquares();
        double[] noise = spectrum.runningNoiseMeanSquares();
        for (int i = 0; i < spectrum.grid().size(); i++) {
            List<Double> each = new ArrayList<>();
            for (double density : spectrum.densities(i)) {
                each.add(density);
            }
            points.add(new ErrorBudget.DensityPoint(
                    spectrum.grid().get(i),
                    each,
                    spectrum.noise(i),
                    FastMath.sqrt(running[i]),
                    FastMath.sqrt(noise[i])));
        }
        return points;
    }

    /** Signal: the motion's own spectrum, or a sine of the smallest motion in each third-octave. */
    private List<ErrorBudget.ThirdOctaveLevel> levels(Spectrum spectrum) {
        List<ErrorBudget.ThirdOctaveLevel> levels = new ArrayList<>();
        if (motion.spectrum().isEmpty() && motion.smallest().isEmpty()) {
            return levels;
        }
        for (ThirdOctave part : ThirdOctave.covering(band.from(), band.to())) {
            double from = FastMath.max(part.low(), band.from());
            double to = FastMath.min(part.high(), band.to());
            if (!(from < to)) {
                continue;
            }
            double square = 0.0;
            for (int i = 0; i < sources.size(); i++) {
                square += spectrum.meanSquare(i, from, to);
            }
            double signal = motion.spectrum().isPresent()
                    ? FastMath.sqrt(motion.spectrum().get().meanSquare(from, to))
                    : motion.smallest().getAsDouble();
            levels.add(new ErrorBudget.ThirdOctaveLevel(
                    part.middle(),
                    signal,
                    FastMath.sqrt(square),
                    20.0 * FastMath.log10(signal / FastMath.sqrt(square))));
        }
        return levels;
    }

    private List<ReadingBand> bands(List<ErrorBudget.ThirdOctaveLevel> levels) {
        List<ReadingBand> bands = new ArrayList<>();
        for (ErrorBudget.ThirdOctaveLevel level : levels) {
            ThirdOctave part = ThirdOctave.holding(level.middle());
            double from = FastMath.max(part.low(), band.from());
            double to = FastMath.min(part.high(), band.to());
            Reads reads = reads(level.ratio());
            ReadingBand last = bands.isEmpty() ? null : bands.get(bands.size() - 1);
            if (last != null && last.reads() == reads) {
                bands.set(
                        bands.size() - 1, new ReadingBand(last.from(), to, reads, last.rejectionFrom(), level.ratio()));
            } else {
                bands.add(new ReadingBand(from, to, reads, level.ratio(), level.ratio()));
            }
        }
        return bands;
    }

    private Reads reads(double ratio) {
        if (Double.isNaN(ratio)) {
            return Reads.NOTHING;
        }
        if (ratio >= margin) {
            return Reads.MOTION;
        }
        return ratio <= -margin ? Reads.FLOW : Reads.MIXED;
    }

    private List<Caveat> caveats(FlowLoad load) {
        Set<Caveat> caveats = new LinkedHashSet<>();
        double length = device.hair().profile().length();
        for (Exposure exposure : load.exposures()) {
            for (Caveat caveat : exposure.source().caveats(length)) {
                caveats.add(new Caveat(
                        caveat.about(), caveat.weight(), exposure.source().name() + ": " + caveat.text()));
            }
        }
        regimes(load, caveats);
        shedding(load, caveats);
        return new ArrayList<>(caveats);
    }

    private void regimes(FlowLoad load, Set<Caveat> caveats) {
        double low = TWO_PI * band.from();
        double high = TWO_PI * band.to();
        boolean ended = false;
        boolean mixed = false;
        boolean unstable = false;
        double reynolds = 0.0;
        double thin = device.hair().profile().smallestRadius();
        for (CombinedResistance law : load.laws()) {
            if (law.cylinder().radius() < 0.999 * thin) {
                continue; // the last bit of a point or round end, which carries next to nothing
            }
            for (double omega : new double[] {low, high}) {
                Regime regime = law.regime(omega);
                ended |= regime.kind() == Regime.Kind.OUT_OF_RANGE;
                mixed |= regime.kind() != Regime.Kind.LINEAR;
                unstable |= regime.unstable();
                reynolds = FastMath.max(reynolds, regime.reynolds());
            }
        }
        if (ended) {
            caveats.add(new Caveat(
                    Subject.ERROR,
                    Weight.OUT_OF_RANGE,
                    say(
                            "The drag or slip law ends on part of the hair (Re up to %.3g, drag to 1e5; slip to 0.1).",
                            reynolds)));
        }
        if (mixed) {
            caveats.add(new Caveat(
                    Subject.ERROR,
                    Weight.WEAK,
                    say(
                            "The flow carries the fluid far against radius or layer (Re up to %.3g): the force is steady drag or an"
                                    + " interpolation towards it, good to 10 %% below Re 40 and 5 to 8 %% above; end effects exceed this"
                                    + " for a length below 30 diameters.",
                            reynolds)));
        }
        if (unstable) {
            caveats.add(
                    new Caveat(
                            Subject.ERROR,
                            Weight.WEAK,
                            "The excursion lies above the threshold of vortex shedding in oscillating flow: the drag is higher than given."));
        }
    }

    private void shedding(FlowLoad load, Set<Caveat> caveats) {
        double tip = 0.0;
        for (Exposure exposure : load.exposures()) {
            tip = FastMath.max(
                    tip, exposure.meanSpeedAt(0.9 * device.hair().profile().length()));
        }
        Shedding law = new Shedding(device.hair().profile().largestRadius(), device.around());
        if (!(tip > 0.0) || !law.sheds(tip)) {
            return;
        }
        double frequency = law.frequency(tip);
        Optional<Double> resonance =
                new Response(device).oscillator().filter(Oscillator::stands).map(swing -> swing.resonance() / TWO_PI);
        boolean meets =
                resonance.isPresent() && frequency < LOCK_IN * resonance.get() && frequency > resonance.get() / LOCK_IN;
        caveats.add(new Caveat(
                Subject.ERROR,
                meets ? Weight.WEAK : Weight.NOTE,
                say("At %.3g m/s vortices leave the hair at %.4g Hz", tip, frequency)
                        + (meets
                                ? say(
                                        ", near the resonance of %.4g Hz: they may lock on to it and swamp the reading.",
                                        resonance.get())
                                : ", away from the resonance; their force is not in the budget.")));
    }
}
