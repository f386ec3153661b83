package flowshy.response;

import java.util.OptionalDouble;

/**
 * Torsional suspension of a hair, free of what the medium adds.
 *
 * @param stiffness S [N·m/rad], positive
 * @param damping R, what the medium on the hair does not explain [N·m·s/rad], zero or more
 * @param plateInertia J_plate, moment of inertia of all that turns with the hair [kg·m²], zero or more
 * @param pivotDepth h, depth of the pivot axis below the wall [m], zero or more
 * @param attitude how the hair stands in gravity
 * @param readoutNoise angle noise of the readout [rad/√Hz], absent if not stated
 */
public record Suspension(
        double stiffness,
        double damping,
        double plateInertia,
        double pivotDepth,
        Attitude attitude,
        OptionalDouble readoutNoise) {
    /** @throws IllegalArgumentException if a number is out of its range */
    public Suspension {
        if (!(stiffness > 0.0) || Double.isInfinite(stiffness)) {
            throw new IllegalArgumentException("stiffness must be positive and finite, was " + stiffness + " N m/rad");
        }
        notNegative("damping [N m s/rad]", damping);
        notNegative("plate inertia [kg m2]", plateInertia);
        notNegative("pivot depth [m]", pivotDepth);
    }

    private static void notNegative(String what, double value) {
        if (!(value >= 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + " must be zero or more and finite, was " + value);
        }
    }
}
