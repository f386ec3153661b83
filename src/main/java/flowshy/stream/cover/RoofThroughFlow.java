package flowshy.stream.cover;

import org.hipparchus.util.FastMath;

/**
 * Mean flow that a stream drives through the gap under an open-sided roof.
 *
 * <p>½ρ(U² − U_g²) = 12 μ U_g ℓ/H²: the stagnation pressure that the stream loses is spent on the friction of plane Poiseuille flow.
 * Own estimate; entry losses and the blockage by the roof's edge are left out, so it errs on the side of more flow.
 *
 * @param gap H [m]
 * @param length ℓ along the stream [m]
 * @param kinematicViscosity ν [m²/s]
 */
public record RoofThroughFlow(double gap, double length, double kinematicViscosity) {
    /** Share of the entry length, 0.05 Re_H H, above which the profile counts as developed (textbook, from memory). */
    private static final double ENTRY = 0.05;

    /** @throws IllegalArgumentException if a parameter is not positive */
    public RoofThroughFlow {
        if (!(gap > 0.0) || !(length > 0.0) || !(kinematicViscosity > 0.0)) {
            throw new IllegalArgumentException("gap " + gap + " m, length " + length + " m and kinematic viscosity "
                    + kinematicViscosity + " m2/s must be positive");
        }
    }

    /**
     * Mean speed in the gap.
     *
     * @param stream speed U of the stream outside, zero or more [m/s]
     * @return U_g [m/s], never above U
     */
    public double speed(double stream) {
        double friction = friction();
        // U² / (b + √(b² + U²)) keeps its digits where friction dominates, √(b² + U²) − b does not
        return stream * stream / (friction + FastMath.hypot(friction, stream));
    }

    /**
     * Gain of a slow fluctuation, dU_g/dU.
     *
     * @param stream mean speed U outside [m/s]
     * @return gain [-], 0 to 1
     */
    public double gain(double stream) {
        return stream == 0.0 ? 0.0 : stream / FastMath.hypot(friction(), stream);
    }

    /**
     * Velocity at a height in developed flow over the mean speed in the gap.
     *
     * @param height z, 0 ≤ z ≤ H [m]
     * @return 6 (z/H)(1 − z/H) [-]
     */
    public double parabola(double height) {
        double share = height / gap;
        return 6.0 * share * (1.0 - share);
    }

    /**
     * Whether the flow is developed in the middle of the roof.
     *
     * @param stream speed U outside [m/s]
     * @return true if the entry length is below half the roof's length
     */
    public boolean developed(double stream) {
        return ENTRY * speed(stream) * gap * gap / kinematicViscosity < 0.5 * length;
    }

    private double friction() {
        return 12.0 * kinematicViscosity * length / (gap * gap);
    }
}
