package flowshy.hair;

import org.hipparchus.util.FastMath;

/**
 * Volume of a hair and its moments about a transverse axis; times a density they are mass, first moment and moment of inertia.
 *
 * <p>Handbook solids (cylinder, cone, paraboloid) are the check. The cross-section's own term πa⁴/4 is part of the second moment.
 *
 * @param volume ∫ πa² dz [m³]
 * @param first ∫ πa²ℓ dz [m⁴], ℓ = z + h
 * @param second ∫ (πa²ℓ² + πa⁴/4) dz [m⁵]
 */
public record Moments(double volume, double first, double second) {
    /** Exact for every straight profile and round end; a cosine shoulder converges to rounding. */
    private static final int POINTS_A_SEGMENT = 24;

    /**
     * Moments of a profile.
     *
     * @param profile the shape
     * @param pivotDepth h, depth of the axis below the wall, zero or more [m]
     * @return the moments
     */
    public static Moments of(Profile profile, double pivotDepth) {
        double volume = 0.0;
        double first = 0.0;
        double second = 0.0;
        for (Strip strip : Strip.along(profile, profile.breaks(), POINTS_A_SEGMENT)) {
            double area = FastMath.PI * strip.radius() * strip.radius();
            double lever = strip.height() + pivotDepth;
            volume += strip.weight() * area;
            first += strip.weight() * area * lever;
            second += strip.weight() * area * (lever * lever + 0.25 * strip.radius() * strip.radius());
        }
        return new Moments(volume, first, second);
    }
}
