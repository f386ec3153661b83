package flowshy.verdict.error;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.cylinder.excursion.CombinedResistance;
import flowshy.cylinder.excursion.Fluctuation;
import flowshy.cylinder.excursion.OperatingPoint;
import flowshy.cylinder.excursion.Regime;
import flowshy.response.Device;
import flowshy.stream.Source;
import flowshy.verdict.Band;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * One strip of a hair over a band: how its force law's regime moves with frequency.
 *
 * @param height of the strip above the wall [m]
 * @param radius of the hair there [m]
 * @param speed max(|Ū|, û) there, which carries the fluid along [m/s]
 * @param points rising in frequency
 */
public record RegimePath(double height, double radius, double speed, List<Point> points) {
    /** Shares of the length at which a hair in its surroundings is shown: near the wall the flow is slow, near the tip fast. */
    private static final double[] SHARES = {0.2, 0.5, 0.95};

    /** Speeds shown where no surroundings are stated, peak values [m/s]: a still room, a draught, a breeze. */
    private static final double[] SPEEDS = {1e-3, 1e-2, 1e-1};

    private static final int STEPS = 41;

    /**
     * One frequency.
     *
     * @param frequency [Hz]
     * @param regime there
     */
    public record Point(double frequency, Regime regime) {
        /**
         * Excursion of the fluid over the diameter: the Keulegan–Carpenter number of the speed that carries it, 2π (speed/ω)/d. Without
         * a mean stream this is KC itself.
         *
         * @return [-]
         */
        public double excursion() {
            // X is the excursion over max(a, δ), and δ/a = √2/Wo
            return FastMath.PI * regime.excursionRatio() * FastMath.max(1.0, FastMath.sqrt(2.0) / regime.womersley());
        }
    }

    /** Copies the list. */
    public RegimePath {
        points = List.copyOf(points);
    }

    /**
     * Where a hair lives.
     *
     * @param device with its cover
     * @param band over which it is followed
     * @param sources what flows; empty: the hair's thickest part at three given speeds
     * @return one path a strip or speed
     * @throws StreamTooFastException if a stream is faster than the drag law reaches
     */
    public static List<RegimePath> of(Device device, Band band, List<Source> sources) {
        List<RegimePath> paths = new ArrayList<>();
        double length = device.hair().profile().length();
        if (sources.isEmpty()) {
            double radius = device.hair().profile().largestRadius();
            for (double speed : SPEEDS) {
                OperatingPoint point = new OperatingPoint(0.0, speed / FastMath.sqrt(2.0), Fluctuation.SINUSOIDAL);
                paths.add(path(length, new OscillatingCylinder(radius, device.around()), point, band));
            }
            return paths;
        }
        FlowLoad load = new FlowLoad(device, sources);
        for (double share : SHARES) {
            double height = share * length;
            double radius = device.hair().profile().radius(height);
            OperatingPoint point = load.pointAt(height);
            if (radius > 0.0 && point.carrying() > 0.0) {
                paths.add(path(height, new OscillatingCylinder(radius, device.around()), point, band));
            }
        }
        return paths;
    }

    private static RegimePath path(double height, OscillatingCylinder strip, OperatingPoint point, Band band) {
        CombinedResistance law = CombinedResistance.at(strip, point);
        List<Point> points = new ArrayList<>();
        for (double frequency : band.even(STEPS)) {
            points.add(new Point(frequency, law.regime(2.0 * FastMath.PI * frequency)));
        }
        return new RegimePath(height, strip.radius(), point.carrying(), points);
    }
}
