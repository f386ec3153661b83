package flowshy.hair;

import java.util.OptionalDouble;

/**
 * A solid hair of one material.
 *
 * @param profile its shape
 * @param density ρ_h [kg/m³]
 * @param youngsModulus E [Pa], absent if not stated; needed only for bending
 * @param lengthModel how the medium's forces see its length
 * @param footGap gap between the foot and the wall around it that the turning leaves [m]; absent: the usual share of the radius
 */
public record Hair(
        Profile profile,
        double density,
        OptionalDouble youngsModulus,
        LengthModel lengthModel,
        OptionalDouble footGap) {
    /** @throws IllegalArgumentException if density, modulus or gap is not positive and finite */
    public Hair {
        if (!(density > 0.0) || Double.isInfinite(density)) {
            throw new IllegalArgumentException("hair density must be positive and finite, was " + density + " kg/m3");
        }
        youngsModulus.ifPresent(modulus -> {
            if (!(modulus > 0.0) || Double.isInfinite(modulus)) {
                throw new IllegalArgumentException("Young's modulus must be positive and finite, was " + modulus);
            }
        });
        footGap.ifPresent(gap -> {
            if (!(gap > 0.0) || Double.isInfinite(gap)) {
                throw new IllegalArgumentException("foot gap must be positive and finite, was " + gap + " m");
            }
        });
    }

    /**
     * A hair with the usual gap at its foot.
     *
     * @param profile its shape
     * @param density ρ_h [kg/m³]
     * @param youngsModulus E [Pa], absent if not stated
     * @param lengthModel how the medium's forces see its length
     */
    public Hair(Profile profile, double density, OptionalDouble youngsModulus, LengthModel lengthModel) {
        this(profile, density, youngsModulus, lengthModel, OptionalDouble.empty());
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
     * @param model strip theory, repaired or corrected
     * @return a hair
     */
    public Hair seenAs(LengthModel model) {
        return new Hair(profile, density, youngsModulus, model, footGap);
    }

    /**
     * The same hair of another density.
     *
     * @param other [kg/m³]
     * @return a hair
     */
    public Hair ofDensity(double other) {
        return new Hair(profile, other, youngsModulus, lengthModel, footGap);
    }

    /**
     * The same material in another shape.
     *
     * @param other the shape
     * @return a hair of this density and modulus
     */
    public Hair reshaped(Profile other) {
        return new Hair(other, density, youngsModulus, lengthModel, footGap);
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
