package flowshy.torque.finite;

import org.hipparchus.util.FastMath;

/**
 * Part of a ring small enough to be taken as upright (all at its middle radius) or as flat (all at its middle height). The
 * force density on it is one number a direction; {@link #stretch} makes its area the true one.
 *
 * @param from lower end
 * @param width growth of the radius, of either sign
 * @param thickness growth of the height, zero or more
 */
record RingPiece(MeridianPoint from, double width, double thickness) {
    static RingPiece between(MeridianPoint from, MeridianPoint to) {
        return new RingPiece(from, to.radius() - from.radius(), to.height() - from.height());
    }

    boolean upright() {
        return FastMath.abs(width) <= thickness;
    }

    /** Along the surface. */
    double length() {
        return FastMath.hypot(width, thickness);
    }

    /** Angle against the axis, positive where the body grows wider upward. */
    double lean() {
        return FastMath.atan2(width, thickness);
    }

    /** Length along the surface over extent along z (upright) or r (flat). */
    double stretch() {
        return length() / (upright() ? thickness : FastMath.abs(width));
    }

    double radius() {
        return from.radius() + 0.5 * width;
    }

    double inner() {
        return upright() ? radius() : FastMath.min(from.radius(), from.radius() + width);
    }

    double outer() {
        return upright() ? radius() : FastMath.max(from.radius(), from.radius() + width);
    }

    double middle() {
        return from.height() + 0.5 * thickness;
    }

    double area() {
        return 2.0 * FastMath.PI * radius() * length();
    }

    /**
     * ∫ x cos φ dS, weighted as the axial density is: evenly on an upright piece, in proportion to r on a flat one, where it
     * must fall to zero at the axis.
     */
    double axialArm() {
        if (upright()) {
            return FastMath.PI * radius() * radius() * length();
        }
        double in = inner() * inner();
        double out = outer() * outer();
        return FastMath.PI * (out - in) * (out + in) / (4.0 * radius()) * stretch();
    }

    /** Volume of the body inside. */
    double volume() {
        return FastMath.PI * radius() * radius() * thickness;
    }
}
