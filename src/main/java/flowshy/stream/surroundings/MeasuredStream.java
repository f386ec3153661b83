package flowshy.stream.surroundings;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.medium.Medium;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.wall.PlateFlow;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** A stream whose fluctuation was measured. */
final class MeasuredStream extends CarriedFlow {
    /** Below this sine the fluctuation across adds less than a hundredth. */
    private static final double ALONG = 0.1;

    private final String name;
    private final SourceKind kind;
    private final double direction;
    private final double speed;
    private final MeasuredTurbulence turbulence;
    private final Medium medium;

    MeasuredStream(
            String name,
            SourceKind kind,
            double direction,
            double speed,
            MeasuredTurbulence turbulence,
            Stated fetch,
            Medium medium) {
        super(name, direction, layer(speed, turbulence, fetch, medium), Optional.of(turbulence), List.of(fetch));
        this.name = name;
        this.kind = kind;
        this.direction = direction;
        this.speed = speed;
        this.turbulence = turbulence;
        this.medium = medium;
    }

    private static Layer layer(double speed, MeasuredTurbulence turbulence, Stated fetch, Medium medium) {
        return new PlateLayer(
                PlateFlow.of(speed, fetch.value(), turbulence.deviation() / speed, medium.kinematicViscosity()));
    }

    @Override
    public SourceKind kind() {
        return kind;
    }

    @Override
    public Source in(Medium other) {
        Stated fetch = numbers().get(0);
        Stream.reaches(name, speed, fetch, other);
        return new MeasuredStream(name, kind, direction, speed, turbulence, fetch, other);
    }

    @Override
    CarriedFlow with(List<Stated> changed) {
        return new MeasuredStream(name, kind, direction, speed, turbulence, changed.get(0), medium);
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        List<Caveat> caveats = new ArrayList<>(super.caveats(hairLength));
        if (FastMath.abs(FastMath.sin(direction)) > ALONG) {
            caveats.add(new Caveat(
                    Subject.ERROR,
                    Weight.WEAK,
                    "The fluctuation across the stream was not measured; it is taken equal to that along."));
        }
        return caveats;
    }
}
