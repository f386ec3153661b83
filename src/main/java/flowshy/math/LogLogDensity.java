package flowshy.math;

import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * A one-sided density given at points, straight between them on doubly logarithmic paper, zero outside. Where one end of a piece is
 * zero that piece is straight on plain paper.
 *
 * <p>Area of a piece with slope b = ln(G₂/G₁)/ln(f₂/f₁): G₁f₁/(b+1) [(f₂/f₁)^(b+1) − 1], for b = −1 G₁f₁ ln(f₂/f₁): the segment rule
 * of random vibration (NAVMAT P-9492).
 *
 * @param points two or more, frequency rising
 */
public record LogLogDensity(List<Point> points) implements Density {
    /**
     * One point.
     *
     * @param frequency f &gt; 0 [Hz]
     * @param density G, zero or more, square of the unit of the signal per Hz
     */
    public record Point(double frequency, double density) {
        /** @throws IllegalArgumentException if the frequency is not positive or the density negative or not finite */
        public Point {
            Positive.check("frequency [Hz]", frequency);
            if (!(density >= 0.0) || Double.isInfinite(density)) {
                throw new IllegalArgumentException("density must be zero or more and finite, was " + density);
            }
        }
    }

    /** @throws IllegalArgumentException if there are fewer than two points or the frequency does not rise */
    public LogLogDensity {
        points = List.copyOf(points);
        if (points.size() < 2) {
            throw new IllegalArgumentException("a density needs two points or more");
        }
        for (int i = 1; i < points.size(); i++) {
            if (!(points.get(i).frequency() > points.get(i - 1).frequency())) {
                throw new IllegalArgumentException("frequency of point " + (i + 1) + " does not rise");
            }
        }
    }

    /**
     * Lowest frequency of the points.
     *
     * @return [Hz]
     */
    public double lowest() {
        return points.get(0).frequency();
    }

    /**
     * Highest frequency of the points.
     *
     * @return [Hz]
     */
    public double highest() {
        return points.get(points.size() - 1).frequency();
    }

    /**
     * Density at a frequency.
     *
     * @param frequency f [Hz]
     * @return G; zero below the first and above the last point
     */
    @Override
    public double at(double frequency) {
        if (!(frequency >= lowest()) || frequency > highest()) {
            return 0.0;
        }
        int low = 0;
        int high = points.size() - 1;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (points.get(middle).frequency() <= frequency) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return between(points.get(low), points.get(high), frequency);
    }

    @Override
    public double meanSquare(double from, double to) {
        double sum = 0.0;
        for (int i = 1; i < points.size(); i++) {
            Point left = points.get(i - 1);
            Point right = points.get(i);
            double low = FastMath.max(from, left.frequency());
            double high = FastMath.min(to, right.frequency());
            if (low < high) {
                sum += area(low, between(left, right, low), high, between(left, right, high));
            }
        }
        return sum;
    }

    /**
     * Mean square of all.
     *
     * @return square of the unit of the signal
     */
    @Override
    public double meanSquare() {
        return meanSquare(lowest(), highest());
    }

    @Override
    public List<Double> edges() {
        return points.stream().map(Point::frequency).toList();
    }

    /**
     * The same curve with every density multiplied.
     *
     * @param factor positive
     * @return e.g. from g²/Hz to (m/s²)²/Hz
     */
    public LogLogDensity times(double factor) {
        Positive.check("factor", factor);
        return new LogLogDensity(points.stream()
                .map(p -> new Point(p.frequency(), p.density() * factor))
                .toList());
    }

    private static double between(Point left, Point right, double frequency) {
        double g1 = left.density();
        double g2 = right.density();
        if (g1 == 0.0 || g2 == 0.0) {
            double share = (frequency - left.frequency()) / (right.frequency() - left.frequency());
            return g1 + share * (g2 - g1);
        }
        double share = FastMath.log(frequency / left.frequency()) / FastMath.log(right.frequency() / left.frequency());
        return g1 * FastMath.pow(g2 / g1, share);
    }

    private static double area(double f1, double g1, double f2, double g2) {
        if (g1 == 0.0 || g2 == 0.0) {
            return 0.5 * (g1 + g2) * (f2 - f1);
        }
        double width = FastMath.log(f2 / f1);
        double rise = FastMath.log(g2 / g1) + width; // (b + 1) ln(f₂/f₁)
        // (e^x − 1)/x, which is 1 at x = 0: the case b = −1 needs no branch of its own but at x = 0 itself
        double mean = rise == 0.0 ? 1.0 : FastMath.expm1(rise) / rise;
        return g1 * f1 * width * mean;
    }
}
