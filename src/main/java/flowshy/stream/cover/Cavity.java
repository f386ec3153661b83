package flowshy.stream.cover;

/**
 * Cylindrical cavity with the hair on its axis.
 *
 * @param diameter [m]
 * @param height from the wall to the lid [m]
 */
public record Cavity(double diameter, double height) {
    /** @throws IllegalArgumentException if a dimension is not positive and finite */
    public Cavity {
        if (!(diameter > 0.0 && height > 0.0) || Double.isInfinite(diameter) || Double.isInfinite(height)) {
            throw new IllegalArgumentException(
                    "diameter " + diameter + " m and height " + height + " m of a cavity must be positive");
        }
    }
}
