package flowshy.medium;

import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/** Laws of dilute gases that every gas of the package shares. */
final class GasState {
    private GasState() {}

    /**
     * Mean free path λ = (μ/p) √(πRT/(2M)) [m], which is Maxwell's μ = ½ ρ c̄ λ with the mean speed c̄ = √(8RT/(πM)).
     */
    static OptionalDouble meanFreePath(double viscosity, double temperature, double pressure, double molarMass) {
        return OptionalDouble.of(viscosity
                / pressure
                * FastMath.sqrt(FastMath.PI * Virial.GAS_CONSTANT * temperature / (2.0 * molarMass)));
    }

    /** Molar heat capacity at constant pressure over R of a perfect gas with this γ: γ/(γ−1). */
    static double heatCapacity(double gamma) {
        return gamma / (gamma - 1.0);
    }

    /** γ of a perfect gas with this molar heat capacity at constant pressure over R: c_p/(c_p − R). */
    static double gamma(double heatCapacity) {
        return heatCapacity / (heatCapacity - 1.0);
    }

    /**
     * Viscosity of a mixture of two gases, Wilke 1950 (J. Chem. Phys. 18:517): μ = Σ x_i μ_i / Σ_j x_j φ_ij,
     * φ_ij = [1 + √(μ_i/μ_j) (M_j/M_i)^¼]² / √(8 (1 + M_i/M_j)); form read second hand.
     */
    static double wilke(
            double share, double viscosity, double molarMass, double otherViscosity, double otherMolarMass) {
        double rest = 1.0 - share;
        double first =
                viscosity * share / (share + rest * interaction(viscosity, molarMass, otherViscosity, otherMolarMass));
        double other = otherViscosity
                * rest
                / (rest + share * interaction(otherViscosity, otherMolarMass, viscosity, molarMass));
        return first + other;
    }

    static double interaction(double mu, double m, double otherMu, double otherM) {
        double root = 1.0 + FastMath.sqrt(mu / otherMu) * FastMath.pow(otherM / m, 0.25);
        return root * root / FastMath.sqrt(8.0 * (1.0 + m / otherM));
    }
}
