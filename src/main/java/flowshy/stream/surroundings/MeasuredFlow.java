package flowshy.stream.surroundings;

import flowshy.math.Caveat;
import flowshy.math.Density;
import flowshy.math.Range;
import flowshy.medium.Medium;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.record.MeasuredSpectrum;
import flowshy.stream.record.Signal;
import flowshy.stream.sound.SoundWave;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** A measured oscillation without a mean: velocity as it is, sound pressure turned into velocity. */
final class MeasuredFlow extends DrivenFlow {
    private final SourceKind kind;
    private final MeasuredSpectrum spectrum;
    private final Optional<Density> density;
    private final Optional<SoundWave> wave;

    /**
     * @param density the spectrum's, no finer than the response needs
     * @param wave turns pressure into velocity; empty for a velocity
     */
    MeasuredFlow(
            String name,
            SourceKind kind,
            double direction,
            MeasuredSpectrum spectrum,
            Optional<Density> density,
            Optional<SoundWave> wave,
            Medium medium) {
        super(name, direction, medium);
        this.kind = kind;
        this.spectrum = spectrum;
        this.density = density;
        this.wave = wave;
        if ((spectrum.signal() == Signal.PRESSURE) != wave.isPresent()) {
            throw new IllegalArgumentException(name + ": a wave belongs to a sound pressure, and to nothing else");
        }
    }

    private double perSignal(double frequency) {
        return wave.map(w -> w.velocityPerPressure(frequency)).orElse(1.0);
    }

    @Override
    public SourceKind kind() {
        return kind;
    }

    @Override
    public double density(double frequency) {
        double factor = perSignal(frequency);
        return density.map(d -> d.at(frequency)).orElse(0.0) * factor * factor;
    }

    @Override
    public List<Line> lines() {
        return spectrum.lines().stream()
                .map(line -> new Line(line.frequency(), line.deviation() * perSignal(line.frequency())))
                .toList();
    }

    @Override
    public Range support() {
        String what = "frequency [Hz]";
        if (density.isPresent()) {
            List<Double> edges = density.get().edges();
            return new Range(what, edges.get(0), edges.get(edges.size() - 1));
        }
        List<Line> lines = spectrum.lines();
        return new Range(
                what,
                0.5 * lines.get(0).frequency(),
                2.0 * lines.get(lines.size() - 1).frequency());
    }

    @Override
    public List<Double> breaks() {
        return density.map(Density::edges).orElse(List.of());
    }

    @Override
    public Source in(Medium other) {
        return new MeasuredFlow(
                name(),
                kind,
                direction(),
                spectrum,
                density,
                wave.map(known -> Sound.wave(name(), known, other)),
                other);
    }

    @Override
    double deviation() {
        return FastMath.sqrt(spectrum.meanSquare()) * perSignal(support().low());
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        List<Caveat> caveats = new ArrayList<>(super.caveats(hairLength));
        if (density.isPresent()) {
            caveats.addAll(MeasuredTurbulence.caveats(density.get(), spectrum.notes()));
        } else {
            spectrum.notes().forEach(note -> caveats.add(new Caveat(Caveat.Subject.ERROR, Caveat.Weight.NOTE, note)));
        }
        return caveats;
    }
}
