package flowshy.stream.surroundings;

import flowshy.math.Density;
import flowshy.math.Positive;
import flowshy.medium.Medium;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.record.MeasuredSpectrum;
import flowshy.stream.record.Signal;
import flowshy.stream.sound.SoundWave;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * Measured surroundings made into a source.
 *
 * <p>With a mean speed it is a stream that carries its fluctuation past, over the layer of that stream; without one it is an
 * oscillation that a pressure gradient drives. A velocity record whose mean exceeds a third of its rms has its mean speed in it.
 * Finely divided densities are gathered to {@value #BANDS_PER_DECADE} bands a decade, each with its own mean square.
 */
public final class Measured {
    /** A band is 2.9 % wide: narrower than a resonance of quality 17, and as narrow as an error budget can tell apart. */
    static final int BANDS_PER_DECADE = 80;

    private static final double STREAM = 1.0 / 3.0;

    private Measured() {}

    /**
     * Mean speed that a record holds.
     *
     * @param spectrum what the file says
     * @return size of the mean [m/s], if it is a velocity and the mean exceeds a third of the rms
     */
    public static Optional<Double> meanSpeed(MeasuredSpectrum spectrum) {
        double mean = FastMath.abs(spectrum.mean());
        boolean stream = spectrum.signal() == Signal.VELOCITY && mean > STREAM * FastMath.sqrt(spectrum.meanSquare());
        return stream ? Optional.of(mean) : Optional.empty();
    }

    /**
     * A stream whose fluctuation was measured.
     *
     * @param name the user's name for it
     * @param kind spectrum or record
     * @param direction φ [rad]
     * @param speed mean speed [m/s]
     * @param spectrum density of the velocity
     * @param fetch x [m]
     * @param medium what streams
     * @return the source
     * @throws IllegalArgumentException if the spectrum is no density of a velocity or the speed is not positive
     */
    public static Source stream(
            String name,
            SourceKind kind,
            double direction,
            double speed,
            MeasuredSpectrum spectrum,
            Stated fetch,
            Medium medium) {
        Positive.check("mean speed [m/s]", speed);
        if (spectrum.signal() != Signal.VELOCITY || spectrum.density().isEmpty()) {
            throw new IllegalArgumentException(
                    name + ": a stream carries a density of velocity, not lines or another signal");
        }
        MeasuredTurbulence turbulence = new MeasuredTurbulence(coarse(spectrum).orElseThrow(), spectrum.notes());
        return new MeasuredStream(name, kind, direction, speed, turbulence, fetch, medium);
    }

    /**
     * A measured oscillation of the velocity.
     *
     * @param name the user's name for it
     * @param kind spectrum or record
     * @param direction φ [rad]
     * @param spectrum density or lines of a velocity
     * @param medium what oscillates
     * @return the source
     * @throws IllegalArgumentException if the signal is no velocity
     */
    public static Source oscillation(
            String name, SourceKind kind, double direction, MeasuredSpectrum spectrum, Medium medium) {
        if (spectrum.signal() != Signal.VELOCITY) {
            throw new IllegalArgumentException(name + ": the signal is no velocity");
        }
        return new MeasuredFlow(name, kind, direction, spectrum, coarse(spectrum), Optional.empty(), medium);
    }

    /**
     * Measured sound.
     *
     * @param name the user's name for it
     * @param kind spectrum or record
     * @param direction φ [rad]
     * @param spectrum density or lines of a sound pressure
     * @param wave velocity that goes with the pressure
     * @param medium what carries it
     * @return the source
     * @throws IllegalArgumentException if the signal is no pressure
     */
    public static Source sound(
            String name, SourceKind kind, double direction, MeasuredSpectrum spectrum, SoundWave wave, Medium medium) {
        return new MeasuredFlow(name, kind, direction, spectrum, coarse(spectrum), Optional.of(wave), medium);
    }

    private static Optional<Density> coarse(MeasuredSpectrum spectrum) {
        return spectrum.density().map(density -> density.coarse(BANDS_PER_DECADE));
    }
}
