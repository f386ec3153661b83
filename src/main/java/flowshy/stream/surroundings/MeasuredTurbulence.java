package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.math.Density;
import flowshy.math.Range;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * Turbulence as it was measured.
 *
 * @param density of the velocity along, no finer than the response needs
 * @param notes sentences of the reader
 */
record MeasuredTurbulence(Density density, List<String> notes) implements Turbulence {
    @Override
    public double along(double frequency) {
        return density.at(frequency);
    }

    /** One probe does not tell across from along. */
    @Override
    public double across(double frequency) {
        return density.at(frequency);
    }

    @Override
    public double deviation() {
        return FastMath.sqrt(density.meanSquare());
    }

    @Override
    public Range support() {
        List<Double> edges = density.edges();
        return new Range("frequency [Hz]", edges.get(0), edges.get(edges.size() - 1));
    }

    @Override
    public List<Double> breaks() {
        return density.edges();
    }

    @Override
    public Optional<Double> cutOff() {
        return Optional.empty();
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        return caveats(density, notes);
    }

    /** What holds for every measured density. */
    static List<Caveat> caveats(Density density, List<String> notes) {
        List<Double> edges = density.edges();
        List<Caveat> caveats = new ArrayList<>();
        caveats.add(new Caveat(
                Subject.ERROR,
                Weight.NOTE,
                say(
                        "Measured from %.4g Hz to %.4g Hz; outside it counts as nothing.",
                        edges.get(0), edges.get(edges.size() - 1))));
        notes.forEach(note -> caveats.add(new Caveat(Subject.ERROR, Weight.NOTE, note)));
        return caveats;
    }
}
