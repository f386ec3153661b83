package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.math.Positive;
import flowshy.medium.Medium;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.UnfitMediumException;
import flowshy.stream.turbulence.TurbulenceSpectrum;
import flowshy.stream.wall.PlateFlow;
import flowshy.stream.wall.PlateFriction;
import java.util.List;
import java.util.Optional;

/**
 * A stream over the surface that the hair stands on: mean speed, turbulence, length scale, and the fetch from the edge of the surface
 * to the hair.
 */
public final class Stream extends CarriedFlow {
    private final String name;
    private final double direction;
    private final double speed;
    private final Medium medium;

    /**
     * A stream in a medium.
     *
     * @param name the user's name for it
     * @param direction φ [rad]
     * @param speed mean speed U [m/s]
     * @param turbulence rms of the component along over the mean speed [-]
     * @param lengthScale longitudinal integral scale L [m]
     * @param fetch x [m]
     * @param medium what streams
     * @throws IllegalArgumentException if the speed is not positive and finite
     */
    public Stream(
            String name,
            double direction,
            double speed,
            Stated turbulence,
            Stated lengthScale,
            Stated fetch,
            Medium medium) {
        this(name, direction, speed, List.of(turbulence, lengthScale, fetch), medium);
    }

    private Stream(String name, double direction, double speed, List<Stated> numbers, Medium medium) {
        super(name, direction, layer(speed, numbers, medium), Optional.of(carried(speed, numbers, medium)), numbers);
        this.name = name;
        this.direction = direction;
        this.speed = speed;
        this.medium = medium;
    }

    private static Layer layer(double speed, List<Stated> numbers, Medium medium) {
        Positive.check("mean speed [m/s]", speed);
        double turbulence = numbers.get(0).value();
        double fetch = numbers.get(2).value();
        return new PlateLayer(PlateFlow.of(speed, fetch, turbulence, medium.kinematicViscosity()));
    }

    private static Turbulence carried(double speed, List<Stated> numbers, Medium medium) {
        double deviation = numbers.get(0).value() * speed;
        return new ModelTurbulence(
                new TurbulenceSpectrum(deviation, numbers.get(1).value(), speed, medium.kinematicViscosity()), speed);
    }

    @Override
    public SourceKind kind() {
        return SourceKind.STREAM;
    }

    @Override
    public Source in(Medium other) {
        reaches(name, speed, numbers().get(2), other);
        return new Stream(name, direction, speed, numbers(), other);
    }

    /** The wall law must reach as far as the fetch. */
    static void reaches(String name, double speed, Stated fetch, Medium other) {
        double reynolds = speed * fetch.value() / other.kinematicViscosity();
        if (!(reynolds < PlateFriction.LOGARITHMIC.range().high())) {
            throw new UnfitMediumException(
                    say("%s: a Reynolds number of %.3g on the fetch, where the wall law ends", name, reynolds));
        }
    }

    @Override
    CarriedFlow with(List<Stated> changed) {
        return new Stream(name, direction, speed, changed, medium);
    }
}
