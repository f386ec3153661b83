package flowshy.medium;

import org.hipparchus.util.FastMath;

/**
 * Second virial coefficient of a gas at one temperature, with its slopes, and what follows from it for density and sound.
 *
 * @param value B [m³/mol]
 * @param slope T dB/dT [m³/mol]
 * @param bend T² d²B/dT² [m³/mol]
 */
record Virial(double value, double slope, double bend) {
    /** Molar gas constant R [J/(mol·K)], exact since 2019 (CODATA 2018). */
    static final double GAS_CONSTANT = 8.31446261815324;

    /** Rounds of the fixed point for γ; each gains the factor β p/(RT), below 0.2 here, so twenty reach the last bit. */
    private static final int ROUNDS = 40;

    static final Virial PERFECT = new Virial(0.0, 0.0, 0.0);

    /** Bp/(RT), the first departure from the perfect gas [-]. */
    double departure(double temperature, double pressure) {
        return value * pressure / (GAS_CONSTANT * temperature);
    }

    /**
     * Compressibility factor Z = pM/(ρRT) of the gas law cut after the second virial coefficient: Z = 1 + B n with n = p/(ZRT), so
     * Z = ½ + √(¼ + Bp/(RT)); the root that tends to 1.
     */
    double compressibility(double temperature, double pressure) {
        return 0.5 + FastMath.sqrt(0.25 + departure(temperature, pressure));
    }

    /**
     * c²M/(γRT) of the real gas: 1 + β p/(RT) with the second acoustic virial coefficient β = 2B + 2(γ−1) T B′ + (γ−1)²/γ T² B″, γ
     * that of the perfect gas (textbook form, from memory; checked against the equations of state).
     */
    double acousticFactor(double gamma, double temperature, double pressure) {
        double rest = gamma - 1.0;
        double beta = 2.0 * value + 2.0 * rest * slope + rest * rest / gamma * bend;
        return 1.0 + beta * pressure / (GAS_CONSTANT * temperature);
    }

    /** Heat capacity ratio γ of the perfect gas that has this sound speed [m/s] at the state: c² = γRT/M (1 + β p/(RT)). */
    double perfectGamma(double soundSpeed, double temperature, double pressure, double molarMass) {
        double apparent = soundSpeed * soundSpeed * molarMass / (GAS_CONSTANT * temperature);
        double gamma = apparent;
        for (int i = 0; i < ROUNDS; i++) {
            gamma = apparent / acousticFactor(gamma, temperature, pressure);
        }
        return gamma;
    }

    /** Sound speed [m/s] of the gas with this γ of the perfect gas. */
    double soundSpeed(double gamma, double temperature, double pressure, double molarMass) {
        return FastMath.sqrt(
                gamma * GAS_CONSTANT * temperature / molarMass * acousticFactor(gamma, temperature, pressure));
    }

    /** That of a mixture with a share of another gas, the coefficient of the unlike pair taken as the mean of the two. */
    Virial mixed(Virial other, double share) {
        return new Virial(
                (1.0 - share) * value + share * other.value,
                (1.0 - share) * slope + share * other.slope,
                (1.0 - share) * bend + share * other.bend);
    }
}
