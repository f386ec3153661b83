package flowshy.report.chart;

import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Ends of an axis.
 *
 * @param from lower
 * @param to upper
 */
public record Bounds(double from, double to) {
    /** Ends on whole steps that hold every number, with room over the largest. */
    public static Bounds even(List<List<Double>> numbers, double step) {
        double least = Double.POSITIVE_INFINITY;
        double largest = Double.NEGATIVE_INFINITY;
        for (List<Double> column : numbers) {
            for (double number : column) {
                if (Double.isFinite(number)) {
                    least = FastMath.min(least, number);
                    largest = FastMath.max(largest, number);
                }
            }
        }
        if (!(least <= largest)) {
            return new Bounds(-step, step);
        }
        double from = step * FastMath.floor(least / step);
        double to = step * FastMath.ceil(largest / step);
        return new Bounds(from, to > from ? to : from + step);
    }

    /** Ends that hold every positive number, at 1, 2 or 5 times a power of ten, no more than so many decades below the largest. */
    public static Bounds decades(List<List<Double>> numbers, double most) {
        double least = Double.POSITIVE_INFINITY;
        double largest = 0.0;
        for (List<Double> column : numbers) {
            for (double number : column) {
                if (Double.isFinite(number) && number > 0.0) {
                    least = FastMath.min(least, number);
                    largest = FastMath.max(largest, number);
                }
            }
        }
        if (!(largest > 0.0)) {
            return new Bounds(0.1, 10.0);
        }
        least = FastMath.max(least, largest * FastMath.pow(10.0, -most));
        double from = round(0.9 * least, false);
        double to = round(1.1 * largest, true);
        return new Bounds(from, to);
    }

    /** Frequency axis a little wider than a band, so that its ends can be seen. */
    public static Bounds about(double from, double to) {
        double aside = FastMath.pow(to / from, 0.04);
        return new Bounds(from / aside, to * aside);
    }

    /** The same, wide enough for what was measured beyond the band. */
    public static Bounds about(double from, double to, List<Overlay> overlays) {
        double low = from;
        double high = to;
        for (Overlay overlay : overlays) {
            for (Overlay.Point point : overlay.points()) {
                low = FastMath.min(low, point.frequency());
                high = FastMath.max(high, point.frequency());
            }
        }
        return about(low, high);
    }

    /**
     * A round number.
     *
     * @param value positive
     * @param up whether the next above is wanted, else the next below
     * @return 1, 2 or 5 times a power of ten
     */
    public static double round(double value, boolean up) {
        double decade = FastMath.pow(10.0, FastMath.floor(FastMath.log10(value)));
        double[] steps = up ? new double[] {1.0, 2.0, 5.0, 10.0} : new double[] {5.0, 2.0, 1.0};
        for (double step : steps) {
            if (up ? step * decade >= value : step * decade <= value) {
                return step * decade;
            }
        }
        return value;
    }
}
