package flowshy.hair;

import java.util.OptionalDouble;

/**
 * A solid hair of one material.
 *
 * @param profile its shape
 * @param density ρ_h [kg/m³]
 * @param youngsModulus E [Pa], absent if not stated; needed only for bending
 * @param lengthModel how the medium's forces see its length
 */
public record Hair(Profile profile, double density, OptionalDouble youngsModulus, LengthModel lengthModel) {
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
     * A hair seen strip by strip.
     *
     * @param profile its shape
     * @param density ρ_h [kg/m³]
     * @param youngsModulus E [Pa], absent if not stated
     */
    public Hair(Profile profile, double density, OptionalDouble youngsModulus) {
        this(profile, density, youngsModulus, LengthModel.STRIPS);
    }

    /**
     * The same hair under another model of its length.
     *
     * @param model strips, or the whole hair
     * @return a hair
     */
    public Hair seenAs(LengthModel model) {
        return new Hair(profile, density, youngsModulus, model);
    }

    /**
     * The same hair of another density.
     *
     * @param other [kg/m³]
     * @return a hair
     */
    public Hair ofDensity(double other) {
        return new Hair(profile, other, youngsModulus, lengthModel);
    }

    /**
     * The same material in another shape.
     *
     * @param other the shape
     * @return a hair of this density and modulus
     */
    public Hair reshaped(Profile other) {
        return new Hair(other, density, youngsModulus, lengthModel);
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
