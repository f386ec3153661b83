package flowshy.hair;

import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Hair of measured radius; between the measured heights the radius runs straight.
 *
 * @param heights z [m], rising from 0 to the length
 * @param radii a [m], one a height, same order; positive, the last may be zero
 */
public record MeasuredProfile(List<Double> heights, List<Double> radii) implements Profile {
    /** @throws IllegalArgumentException if the lists do not match, do not rise from 0, or a radius is out of range */
    public MeasuredProfile {
        heights = List.copyOf(heights);
        radii = List.copyOf(radii);
        int last = heights.size() - 1;
        if (heights.size() != radii.size() || last < 1) {
            throw new IllegalArgumentException("a profile needs two heights or more and a radius for each");
        }
        if (heights.get(0) != 0.0) {
            throw new IllegalArgumentException("a profile begins at height 0, not at " + heights.get(0) + " m");
        }
        for (int i = 0; i <= last; i++) {
            if (i > 0 && !(heights.get(i) > heights.get(i - 1))) {
                throw new IllegalArgumentException("height " + (i + 1) + " of a profile does not rise");
            }
            if (i == last) {
                Dimensions.notNegative("tip radius", radii.get(i));
            } else {
                Dimensions.positive("radius " + (i + 1), radii.get(i));
            }
        }
        Dimensions.positive("length", heights.get(last));
        Dimensions.slender(
                heights.get(last),
                radii.stream().mapToDouble(Double::doubleValue).max().orElseThrow());
    }

    @Override
    public String shape() {
        return "profile";
    }

    @Override
    public double length() {
        return heights.get(heights.size() - 1);
    }

    @Override
    public double radius(double z) {
        int low = 0;
        int high = heights.size() - 1;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (heights.get(middle) <= z) {
                low = middle;
            } else {
                high = middle;
            }
        }
        double share = (z - heights.get(low)) / (heights.get(high) - heights.get(low));
        return radii.get(low) + share * (radii.get(high) - radii.get(low));
    }

    @Override
    public List<Double> breaks() {
        return heights;
    }

    @Override
    public Profile thickened(double factor) {
        return new MeasuredProfile(heights, times(radii, factor));
    }

    @Override
    public Profile lengthened(double factor) {
        return new MeasuredProfile(times(heights, factor), radii);
    }

    @Override
    public double largestRadius() {
        return radii.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
    }

    @Override
    public double smallestRadius() {
        double least = Double.POSITIVE_INFINITY;
        for (double radius : radii) {
            least = radius > 0.0 ? FastMath.min(least, radius) : least;
        }
        return least;
    }

    private static List<Double> times(List<Double> values, double factor) {
        return values.stream().map(value -> value * factor).toList();
    }
}
