package flowshy.hair;

import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Hair whose diameter changes evenly from base to tip.
 *
 * @param length L [m]
 * @param baseRadius radius at the wall [m], positive
 * @param tipRadius radius at the tip [m], zero for a point
 */
public record Taper(double length, double baseRadius, double tipRadius) implements Profile {
    /** @throws IllegalArgumentException if a dimension is out of its range or the hair is wider than long */
    public Taper {
        Dimensions.positive("length", length);
        Dimensions.positive("base radius", baseRadius);
        Dimensions.notNegative("tip radius", tipRadius);
        Dimensions.slender(length, FastMath.max(baseRadius, tipRadius));
    }

    @Override
    public String shape() {
        return "taper";
    }

    @Override
    public double radius(double z) {
        return baseRadius + (tipRadius - baseRadius) * (z / length);
    }

    @Override
    public List<Double> breaks() {
        return List.of(0.0, length);
    }

    @Override
    public Profile thickened(double factor) {
        return new Taper(length, baseRadius * factor, tipRadius * factor);
    }

    @Override
    public Profile lengthened(double factor) {
        return new Taper(length * factor, baseRadius, tipRadius);
    }

    @Override
    public double largestRadius() {
        return FastMath.max(baseRadius, tipRadius);
    }

    @Override
    public double smallestRadius() {
        return tipRadius > 0.0 ? FastMath.min(baseRadius, tipRadius) : baseRadius;
    }
}
