package flowshy.medium;

import org.hipparchus.util.FastMath;

/**
 * Published formulas of moist air with 400 ppm of carbon dioxide. Pressures in Pa, T in K, t = T − 273.15 in °C, x_v the mole
 * fraction of water vapour.
 */
final class HumidAirLaws {
    /** Molar mass of water [kg/mol], as CIPM-2007 has it. */
    static final double WATER_MOLAR_MASS = 18.01528e-3;

    /** Molar mass of dry air with 400 ppm of carbon dioxide [kg/mol], CIPM-2007. */
    static final double DRY_MOLAR_MASS = 28.96546e-3;

    /** Molar gas constant that belongs to CIPM-2007 [J/(mol·K)]. */
    private static final double CIPM_GAS_CONSTANT = 8.314472;

    private static final double ICE_POINT = 273.15;
    private static final double CARBON_DIOXIDE = 4e-4;

    private HumidAirLaws() {}

    /** Saturation vapour pressure over liquid water [Pa], CIPM-2007 eq A1.1 (Davis 1992). */
    static double saturationPressure(double temperature) {
        return FastMath.exp(1.2378847e-5 * temperature * temperature
                - 1.9121316e-2 * temperature
                + 33.93711047
                - 6.3431645e3 / temperature);
    }

    /** Mole fraction of water vapour at a relative humidity 0 to 1, with the enhancement factor of CIPM-2007. */
    static double vapourFraction(double humidity, double temperature, double pressure) {
        double t = temperature - ICE_POINT;
        double enhancement = 1.00062 + 3.14e-8 * pressure + 5.6e-7 * t * t;
        return humidity * enhancement * saturationPressure(temperature) / pressure;
    }

    /**
     * Density ρ = pM_a/(ZRT) [1 − x_v (1 − M_v/M_a)] [kg/m³], CIPM-2007: Picard, Davis, Gläser &amp; Fujii 2008, Metrologia 45:149.
     * Stated for 15 to 27 °C and 600 to 1100 hPa.
     */
    static double density(double vapour, double temperature, double pressure) {
        double t = temperature - ICE_POINT;
        double q = pressure / temperature;
        double z = 1.0
                - q
                        * (1.58123e-6
                                - 2.9331e-8 * t
                                + 1.1043e-10 * t * t
                                + (5.707e-6 - 2.051e-8 * t) * vapour
                                + (1.9898e-4 - 2.376e-6 * t) * vapour * vapour)
                + q * q * (1.83e-11 - 0.765e-8 * vapour * vapour);
        double molarMass = DRY_MOLAR_MASS * (1.0 - vapour * (1.0 - WATER_MOLAR_MASS / DRY_MOLAR_MASS));
        return pressure * molarMass / (z * CIPM_GAS_CONSTANT * temperature);
    }

    /** Sound speed at zero frequency [m/s], Cramer 1993, J. Acoust. Soc. Am. 93:2510, eq 15; 0 to 30 °C, 75 to 102 kPa, x_v to 0.06. */
    static double soundSpeed(double vapour, double temperature, double pressure) {
        double t = temperature - ICE_POINT;
        double xc = CARBON_DIOXIDE;
        return 331.5024
                + 0.603055 * t
                - 0.000528 * t * t
                + (51.471935 + 0.1495874 * t - 0.000782 * t * t) * vapour
                + (-1.82e-7 + 3.73e-8 * t - 2.93e-10 * t * t) * pressure
                + (-85.20931 - 0.228525 * t + 5.91e-5 * t * t) * xc
                - 2.835149 * vapour * vapour
                - 2.15e-13 * pressure * pressure
                + 29.179762 * xc * xc
                + 0.000486 * vapour * pressure * xc;
    }

    /** Viscosity of thin water vapour [Pa·s], IAPWS R12-08 eq 11, T̄ = T / 647.096 K. */
    static double vapourViscosity(double temperature) {
        double t = temperature / 647.096;
        double sum = 1.67752 + 2.20462 / t + 0.6366564 / (t * t) - 0.241605 / (t * t * t);
        return 1e-6 * 100.0 * FastMath.sqrt(t) / sum;
    }
}
