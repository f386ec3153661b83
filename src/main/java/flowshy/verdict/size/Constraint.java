package flowshy.verdict.size;

/**
 * A limit that must be kept.
 *
 * @param name what is limited, e.g. {@code least-rejection}
 * @param least whether the figure must be at least the limit; at most, if not
 * @param limit in the figure's unit
 * @param scale what counts as far from the limit, positive, in the figure's unit: shortfalls of several limits are weighed by it
 */
public record Constraint(String name, boolean least, double limit, double scale) {
    /** @throws IllegalArgumentException if a number is not finite or the scale not positive */
    public Constraint {
        if (!Double.isFinite(limit) || !(scale > 0.0) || Double.isInfinite(scale)) {
            throw new IllegalArgumentException(name + ": no limit of " + limit + " on a scale of " + scale);
        }
    }

    /**
     * How far a figure falls short.
     *
     * @param found the figure, may be infinite
     * @return in units of the scale; zero at the limit, negative where it is kept
     */
    public double shortfall(double found) {
        return (least ? limit - found : found - limit) / scale;
    }

    /**
     * The same with another limit.
     *
     * @param other in the figure's unit
     * @return name, sense and scale kept
     */
    Constraint at(double other) {
        return new Constraint(name, least, other, scale);
    }
}
