package flowshy.cylinder;

import flowshy.math.BesselK;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * The two limits of Stokes's hydrodynamic function Γ that hair models use, to be set beside the exact one. Time factor
 * e^{+iωt}, λ = √i Wo, no slip.
 */
public enum LimitingForm {
    /**
     * Thin hair, Wo ≪ 1: Γ = −4/(λ² L), L = ln(λ/2) + γ_E, the logarithmic drag 4πμ/(−L). Relative error 6e-4 at Wo = 0.02,
     * 4 % at 0.2, 31 % at 0.6. Source: hair models of the 1980s and 90s (from memory); equal to Stokes 1851 to leading order.
     */
    THIN_HAIR("logarithmic drag of a thin hair") {
        @Override
        Complex at(Complex lambda) {
            Complex log = lambda.multiply(0.5).log().add(BesselK.EULER_GAMMA);
            return lambda.multiply(lambda).multiply(log).reciprocal().multiply(-4.0);
        }
    },

    /**
     * Thin boundary layer, Wo ≫ 1: Γ = 1 + 4/λ + 2/λ² − 1/(2λ³) + 1/(2λ⁴). Relative error 0.4 % at Wo = 2, 3e-4 at 4, 2e-7 at
     * 20. Source: Stokes 1851, eq. (111) (seen).
     */
    THIN_LAYER("boundary-layer series") {
        @Override
        Complex at(Complex lambda) {
            Complex w = lambda.reciprocal();
            Complex tail = w.multiply(0.5).subtract(0.5).multiply(w).add(2.0);
            return tail.multiply(w).add(4.0).multiply(w).add(1.0);
        }
    };

    private final String words;

    LimitingForm(String words) {
        this.words = words;
    }

    abstract Complex at(Complex lambda);

    /**
     * What a listing calls it.
     *
     * @return a few plain words
     */
    public String words() {
        return words;
    }

    /**
     * Γ in this limit.
     *
     * @param womersley Wo, positive and finite
     * @return Γ [-]
     * @throws IllegalArgumentException if Wo is not positive and finite
     */
    public Complex hydrodynamicFunction(double womersley) {
        if (!(womersley > 0.0) || Double.isInfinite(womersley)) {
            throw new IllegalArgumentException("Wo must be positive and finite, was " + womersley);
        }
        double part = womersley * FastMath.sqrt(0.5);
        return at(new Complex(part, part));
    }

    /**
     * Error of this limit against the exact Γ.
     *
     * @param womersley Wo, positive and finite
     * @return |Γ_limit − Γ|/|Γ| [-]
     * @throws IllegalArgumentException if Wo is not positive and finite
     */
    public double relativeError(double womersley) {
        Complex exact = HydrodynamicFunction.of(womersley);
        return hydrodynamicFunction(womersley).subtract(exact).norm() / exact.norm();
    }
}
