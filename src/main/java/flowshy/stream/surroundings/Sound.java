package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.math.Range;
import flowshy.math.StepDensity;
import flowshy.medium.Medium;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.UnfitMediumException;
import flowshy.stream.sound.SoundLevel;
import flowshy.stream.sound.SoundWave;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** Sound over a band, as a plane wave or from a near source, along the wall. */
public final class Sound extends DrivenFlow {
    private final StepDensity pressure;
    private final SoundWave wave;

    /**
     * Sound whose pressure is known by bands.
     *
     * @param name the user's name for it
     * @param direction φ [rad]
     * @param pressure density of the sound pressure [Pa²/Hz]
     * @param wave velocity that goes with the pressure
     * @param medium what carries it
     */
    public Sound(String name, double direction, StepDensity pressure, SoundWave wave, Medium medium) {
        super(name, direction, medium);
        this.pressure = pressure;
        this.wave = wave;
    }

    /**
     * Pressure density of one level over a band, the same energy in each third-octave.
     *
     * @param reference of the level
     * @param level of the whole band [dB]
     * @param from lower end [Hz]
     * @param to upper end [Hz]
     * @return density [Pa²/Hz]
     * @throws IllegalArgumentException if the ends do not rise from above zero
     */
    public static StepDensity over(SoundLevel reference, double level, double from, double to) {
        return new StepDensity(List.of(band(reference, level, from, to)), StepDensity.Inside.PINK);
    }

    /**
     * One band of a pressure density.
     *
     * @param reference of the level
     * @param level of the band [dB]
     * @param low lower edge [Hz]
     * @param high upper edge [Hz]
     * @return band with its mean square [Pa²]
     * @throws IllegalArgumentException if the edges do not rise from above zero
     */
    public static StepDensity.Band band(SoundLevel reference, double level, double low, double high) {
        double rms = reference.pressure(level);
        return new StepDensity.Band(low, high, rms * rms);
    }

    @Override
    public SourceKind kind() {
        return SourceKind.SOUND;
    }

    @Override
    public double density(double frequency) {
        double perPressure = wave.velocityPerPressure(frequency);
        return pressure.at(frequency) * perPressure * perPressure;
    }

    @Override
    public List<Line> lines() {
        return List.of();
    }

    @Override
    public Range support() {
        List<Double> edges = pressure.edges();
        return new Range("frequency [Hz]", edges.get(0), edges.get(edges.size() - 1));
    }

    @Override
    public List<Double> breaks() {
        return pressure.edges();
    }

    @Override
    public Source in(Medium other) {
        return new Sound(name(), direction(), pressure, wave(name(), wave, other), other);
    }

    /** The wave of the same source in another medium. */
    static SoundWave wave(String name, SoundWave wave, Medium other) {
        if (other.soundSpeed().isEmpty()) {
            throw new UnfitMediumException(name + ": the sound speed of " + other.name() + " is not known");
        }
        return new SoundWave(other.density(), other.soundSpeed().getAsDouble(), wave.distance());
    }

    /** Of the plane wave, or as large as the near source makes the lowest frequency. */
    @Override
    double deviation() {
        return FastMath.sqrt(pressure.meanSquare())
                * wave.velocityPerPressure(support().low());
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        List<Caveat> caveats = new ArrayList<>(super.caveats(hairLength));
        String wavefront = Double.isInfinite(wave.distance())
                ? "Sound is taken as a plane wave along the wall"
                : say("Sound is taken from a small source %.3g m away, along the wall", wave.distance());
        caveats.add(new Caveat(
                Subject.ERROR,
                Weight.NOTE,
                wavefront + "; between reflecting walls the velocity may be anything from none to twice as much."));
        return caveats;
    }
}
