package flowshy.response;

import flowshy.medium.Medium;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Torsional suspension of a hair, free of what the medium adds.
 *
 * @param stiffness S [N·m/rad], positive
 * @param damping R, what the medium on the hair and in the film does not explain [N·m·s/rad], zero or more
 * @param plateInertia J_plate, moment of inertia of all that turns with the hair [kg·m²], zero or more
 * @param pivotDepth h, depth of the pivot axis below the wall [m], zero or more
 * @param attitude how the hair stands in gravity
 * @param readoutNoise angle noise of the readout [rad/√Hz], absent if not stated
 * @param film film of the medium under the plate, empty if there is none or its damping counts as the suspension's own
 */
public record Suspension(
        double stiffness,
        double damping,
        double plateInertia,
        double pivotDepth,
        Attitude attitude,
        OptionalDouble readoutNoise,
        Optional<TiltingPlateFilm> film) {
    /** @throws IllegalArgumentException if a number is out of its range */
    public Suspension {
        if (!(stiffness > 0.0) || Double.isInfinite(stiffness)) {
            throw new IllegalArgumentException("stiffness must be positive and finite, was " + stiffness + " N m/rad");
        }
        notNegative("damping [N m s/rad]", damping);
        notNegative("plate inertia [kg m2]", plateInertia);
        notNegative("pivot depth [m]", pivotDepth);
    }

    /**
     * A suspension without a film.
     *
     * @param stiffness S [N·m/rad]
     * @param damping R [N·m·s/rad]
     * @param plateInertia J_plate [kg·m²]
     * @param pivotDepth h [m]
     * @param attitude how the hair stands in gravity
     * @param readoutNoise angle noise of the readout [rad/√Hz]
     */
    public Suspension(
            double stiffness,
            double damping,
            double plateInertia,
            double pivotDepth,
            Attitude attitude,
            OptionalDouble readoutNoise) {
        this(stiffness, damping, plateInertia, pivotDepth, attitude, readoutNoise, Optional.empty());
    }

    /**
     * Damping of the film under the plate.
     *
     * @param medium what fills the gap, empty for vacuum
     * @return [N·m·s/rad], zero without a film and in vacuum
     */
    public double filmDamping(Optional<Medium> medium) {
        return film.isPresent() && medium.isPresent() ? film.get().damping(medium.get()) : 0.0;
    }

    private static void notNegative(String what, double value) {
        if (!(value >= 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + " must be zero or more and finite, was " + value);
        }
    }
}
