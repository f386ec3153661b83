package flowshy.hair;

import java.util.List;

/**
 * Hair of one diameter.
 *
 * @param length L [m]
 * @param radius a [m], 2 a at most L
 */
public record Cylinder(double length, double radius) implements Profile {
    /** @throws IllegalArgumentException if a dimension is not positive or the hair is wider than long */
    public Cylinder {
        Dimensions.positive("length", length);
        Dimensions.positive("radius", radius);
        Dimensions.slender(length, radius);
    }

    @Override
    public String shape() {
        return "cylinder";
    }

    @Override
    public double radius(double z) {
        return radius;
    }

    @Override
    public List<Double> breaks() {
        return List.of(0.0, length);
    }

    @Override
    public Profile thickened(double factor) {
        return new Cylinder(length, radius * factor);
    }

    @Override
    public Profile lengthened(double factor) {
        return new Cylinder(length * factor, radius);
    }

    @Override
    public double largestRadius() {
        return radius;
    }

    @Override
    public double smallestRadius() {
        return radius;
    }
}
