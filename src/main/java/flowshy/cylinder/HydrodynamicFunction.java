package flowshy.cylinder;

import flowshy.math.BesselK;
import flowshy.math.DiagonalBesselRatio;
import org.hipparchus.complex.Complex;

/**
 * Hydrodynamic function Γ of a long circular cylinder that oscillates across its axis: the force per unit length is
 * −iωρπa² Γ times its velocity.
 *
 * <p>Γ = 1 + 4 K₁(λ)/(λ K₀(λ)), λ = a√(iω/ν), time factor e^{+iωt}; Re Γ is the added-mass coefficient, −Im Γ the damping.
 * Source: Stokes 1851, Trans. Camb. Phil. Soc. 9 (his table and series seen); in Bessel form Rosenhead (ed.), Laminar
 * Boundary Layers, 1963, ch. VII (from memory). Linear theory: small excursion, endless cylinder, no wall near.
 *
 * <p>With first-order slip, slip length over radius l: Γ = 1 + 4 K₁ (1+2l) / (λ K₀ + l (λ² K₁ + 2λ K₀)). Own derivation from
 * the shear stress at the surface, slip = l a τ/μ; no published form was found. With l = Kn this is Maxwell's slip at full
 * accommodation; kinetic theory gives a slip length up to 15 % longer.
 */
public final class HydrodynamicFunction {
    private HydrodynamicFunction() {}

    /**
     * Γ of steady oscillation without slip.
     *
     * @param womersley Wo = a√(ω/ν), positive and finite; tested from 1e-8 to 1e6
     * @return Γ [-]
     * @throws IllegalArgumentException if Wo is not positive and finite
     */
    public static Complex of(double womersley) {
        return of(womersley, 0.0);
    }

    /**
     * Γ of steady oscillation with slip.
     *
     * @param womersley Wo = a√(ω/ν), positive and finite
     * @param slip slip length over radius l ≥ 0 [-]; the law is of first order in it, to be used below 0.1
     * @return Γ [-]
     * @throws IllegalArgumentException if Wo is not positive and finite or l is negative
     */
    public static Complex of(double womersley, double slip) {
        Complex excess = excess(womersley, slip);
        return new Complex(1.0 + excess.getReal(), excess.getImaginary());
    }

    /**
     * Γ − 1 with slip, free of cancellation where the boundary layer is thin.
     *
     * @param womersley Wo = a√(ω/ν), positive and finite
     * @param slip slip length over radius l ≥ 0 [-]
     * @return Γ − 1 [-], each part to 1e-13 relative for 1e-8 ≤ Wo ≤ 1e6
     * @throws IllegalArgumentException if Wo is not positive and finite or l is negative
     */
    public static Complex excess(double womersley, double slip) {
        Complex g = DiagonalBesselRatio.timesArgument(womersley);
        double real = g.getReal();
        double imaginary = g.getImaginary();
        double scale = 4.0 / (womersley * womersley);
        if (slip > 0.0) {
            // g becomes (1 + 2l) g / (1 + l (g + 2))
            double below = 1.0 + slip * (real + 2.0);
            double belowImaginary = slip * imaginary;
            scale *= (1.0 + 2.0 * slip) / (below * below + belowImaginary * belowImaginary);
            double turned = real * below + imaginary * belowImaginary;
            imaginary = imaginary * below - real * belowImaginary;
            real = turned;
        } else if (slip != 0.0) {
            throw negative(slip);
        }
        // 4 g/λ² with λ² = i Wo²
        return new Complex(scale * imaginary, -scale * real);
    }

    /**
     * Γ for any complex growth rate s, with λ = a√(s/ν) the root in the right half plane; cut along the negative real s axis.
     *
     * @param lambda λ, Re λ ≥ 0, not 0, finite
     * @param slip slip length over radius l ≥ 0 [-]
     * @return Γ [-]
     * @throws IllegalArgumentException outside the closed right half plane, at 0, or if l is negative
     */
    public static Complex of(Complex lambda, double slip) {
        if (!(slip >= 0.0)) {
            throw negative(slip);
        }
        Complex g = lambda.multiply(BesselK.ratio(lambda));
        Complex slipped =
                g.multiply(1.0 + 2.0 * slip).divide(g.add(2.0).multiply(slip).add(1.0));
        return slipped.multiply(4.0).divide(lambda.multiply(lambda)).add(1.0);
    }

    private static IllegalArgumentException negative(double slip) {
        return new IllegalArgumentException("slip length over radius must not be negative, was " + slip);
    }
}
