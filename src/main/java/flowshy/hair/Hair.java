package flowshy.hair;

import java.util.OptionalDouble;

/**
 * A solid hair of one material.
 *
 * @param profile its shape
 * @param density ρ_h [kg/m³]
 * @param youngsModulus E [Pa], absent if not stated; needed only for bending
 */
public record Hair(Profile profile, double density, OptionalDouble youngsModulus) {
    /** @throws IllegalArgumentException if density or modulus is not positive and finite */
    public Hair {
        if (!(density > 0.0) || Double.isInfinite(density)) {
            throw new IllegalArgumentException("hair density must be positive and finite, was " + density + " kg/m3");
        }
        youngsModulus.ifPresent(modulus -> {
            if (!(modulus > 0.0) || Double.isInfinite(modulus)) {
                throw new IllegalArgumentException("Young's modulus must be positive and finite, was " + modulus);
            }
        });
    }

    /**
     * The same material in another shape.
     *
     * @param other the shape
     * @return a hair of this density and modulus
     */
    public Hair reshaped(Profile other) {
        return new Hair(other, density, youngsModulus);
    }

    /**
     * Mass of the hair.
     *
     * @return [kg]
     */
    public double mass() {
        return density * Moments.of(profile, 0.0).volume();
    }

    /**
     * Moment of inertia about the pivot axis.
     *
     * @param pivotDepth h, depth of the axis below the wall [m]
     * @return ρ_h ∫ (πa²ℓ² + πa⁴/4) dz [kg·m²], ℓ = z + h
     */
    public double inertia(double pivotDepth) {
        return density * Moments.of(profile, pivotDepth).second();
    }
}
