package flowshy.verdict.error;

import flowshy.cylinder.excursion.OperatingPoint;
import flowshy.response.Device;
import flowshy.stream.Source;
import flowshy.stream.cover.Exposure;
import flowshy.stream.cover.RoofedCover;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * How fast the fluid is along a hair, from the wall to a little above its tip.
 *
 * @param sources names, in the order of the study
 * @param levels rising from the wall
 */
public record FlowOverHair(List<String> sources, List<Level> levels) {
    /** Up to this many lengths. */
    private static final double REACH = 1.25;

    private static final int STEPS = 50;

    /**
     * One height.
     *
     * @param height above the wall [m]
     * @param means mean speed of each source along its own direction [m/s]
     * @param mean of all together [m/s]
     * @param deviation of all fluctuation together [m/s rms]
     */
    public record Level(double height, List<Double> means, double mean, double deviation) {
        /** Copies the list. */
        public Level {
            means = List.copyOf(means);
        }
    }

    /** Copies the lists. */
    public FlowOverHair {
        sources = List.copyOf(sources);
        levels = List.copyOf(levels);
    }

    /**
     * The flow over a hair.
     *
     * @param device with its cover
     * @param sources one or more
     * @return the profile; under a roof it ends at the roof
     * @throws StreamTooFastException if a stream is faster than the drag law reaches
     */
    public static FlowOverHair of(Device device, List<Source> sources) {
        FlowLoad load = new FlowLoad(device, sources);
        double top = REACH * device.hair().profile().length();
        if (device.cover() instanceof RoofedCover roof) {
            top = FastMath.min(top, roof.gap());
        }
        List<Level> levels = new ArrayList<>();
        for (int i = 0; i <= STEPS; i++) {
            // closer to the wall, where it changes
            double share = (double) i / STEPS;
            double height = top * share * share;
            List<Double> means = new ArrayList<>();
            for (Exposure exposure : load.exposures()) {
                means.add(exposure.meanSpeedAt(height));
            }
            OperatingPoint point = load.pointAt(height);
            levels.add(new Level(height, means, point.mean(), point.deviation()));
        }
        return new FlowOverHair(sources.stream().map(Source::name).toList(), levels);
    }
}
