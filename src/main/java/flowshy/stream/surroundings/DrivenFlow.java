package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.medium.Medium;
import flowshy.stream.HeightShare;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.Stated;
import flowshy.stream.StokesLayer;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** A flow without a mean that a pressure gradient drives along the wall: tone, sound, a measured oscillation. */
abstract class DrivenFlow implements Source {
    /** Above this û δ/ν the layer over the wall may turn turbulent; 400 to 550 in experiments (from memory). */
    private static final double LAMINAR = 500.0;

    private static final double TWO_PI = 2.0 * FastMath.PI;

    private final String name;
    private final double direction;
    private final Medium medium;

    DrivenFlow(String name, double direction, Medium medium) {
        this.name = name;
        this.direction = direction;
        this.medium = medium;
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public double direction() {
        return direction;
    }

    @Override
    public double meanSpeed() {
        return 0.0;
    }

    @Override
    public double meanSpeedAt(double height) {
        return 0.0;
    }

    @Override
    public double acrossDensity(double frequency) {
        return 0.0;
    }

    @Override
    public HeightShare share(double omega) {
        StokesLayer layer = new StokesLayer(medium.kinematicViscosity());
        return height -> layer.share(height, omega);
    }

    @Override
    public HeightShare acrossShare(double omega) {
        return share(omega);
    }

    @Override
    public boolean driven() {
        return true;
    }

    @Override
    public List<Stated> assumed() {
        return List.of();
    }

    @Override
    public Source varied(String key, double factor) {
        throw new IllegalArgumentException(name + ": " + key + " is no assumed number of this source");
    }

    /** Rms of the free stream [m/s]. */
    abstract double deviation();

    @Override
    public List<Caveat> caveats(double hairLength) {
        List<Caveat> caveats = new ArrayList<>();
        double slowest = lines().stream()
                .mapToDouble(Line::frequency)
                .min()
                .orElse(support().low());
        double layer = new StokesLayer(medium.kinematicViscosity()).thickness(TWO_PI * slowest);
        double reynolds = FastMath.sqrt(2.0) * deviation() * layer / medium.kinematicViscosity();
        if (reynolds > LAMINAR) {
            caveats.add(new Caveat(
                    Subject.ERROR,
                    Weight.WEAK,
                    say(
                            "The oscillating layer has a Reynolds number of %.3g at %.4g Hz; above about %.3g it turns turbulent"
                                    + " and is no longer the one reckoned with.",
                            reynolds, slowest, LAMINAR)));
        }
        return caveats;
    }
}
