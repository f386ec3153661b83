package flowshy.medium;

import org.hipparchus.util.FastMath;

/** Published formulas of sea water at atmospheric pressure; s practical salinity (PSS-78), t in °C of ITS-90. */
final class SeaWaterLaws {
    /** One degree of ITS-90 in degrees of IPTS-68, as the oceanographic tables convert. */
    private static final double T68 = 1.00024;

    /** Salt in kg/kg of one unit of practical salinity, 35.16504 g/kg over 35 (TEOS-10). */
    private static final double SALT = 35.16504e-3 / 35.0;

    private SeaWaterLaws() {}

    /** Density [kg/m³] at one atmosphere, EOS-80: UNESCO Techn. Pap. Mar. Sci. 44 (1983) eqs 13 and 14; 0 to 40 °C, s to 42. */
    static double density(double s, double celsius) {
        double t = celsius * T68;
        double water = 999.842594
                + t * (6.793952e-2 + t * (-9.095290e-3 + t * (1.001685e-4 + t * (-1.120083e-6 + t * 6.536332e-9))));
        double a = 8.24493e-1 + t * (-4.0899e-3 + t * (7.6438e-5 + t * (-8.2467e-7 + t * 5.3875e-9)));
        double b = -5.72466e-3 + t * (1.0227e-4 - t * 1.6546e-6);
        return water + a * s + b * s * FastMath.sqrt(s) + 4.8314e-4 * s * s;
    }

    /** Sound speed [m/s] at one atmosphere, Chen &amp; Millero 1977 in ITS-90 by Wong &amp; Zhu 1995; 0 to 40 °C, s to 40. */
    static double soundSpeed(double s, double t) {
        double water =
                1402.388 + t * (5.03830 + t * (-5.81090e-2 + t * (3.3432e-4 + t * (-1.47797e-6 + t * 3.1419e-9))));
        double a = 1.389 + t * (-1.262e-2 + t * (7.166e-5 + t * (2.008e-6 - t * 3.21e-8)));
        double b = -1.922e-2 - 4.42e-5 * t;
        return water + a * s + b * s * FastMath.sqrt(s) + 1.727e-3 * s * s;
    }

    /**
     * Dynamic viscosity [Pa·s], Sharqawy, Lienhard &amp; Zubair 2010, Desalin. Water Treat. 16:354, eqs 22 and 23; 0 to 180 °C, salt to 0.15 kg/kg.
     */
    static double viscosity(double s, double t) {
        double salt = s * SALT;
        double shifted = t + 64.993;
        double water = 4.2844e-5 + 1.0 / (0.157 * shifted * shifted - 91.296);
        double a = 1.541 + 1.998e-2 * t - 9.52e-5 * t * t;
        double b = 7.974 - 7.561e-2 * t + 4.724e-4 * t * t;
        return water * (1.0 + a * salt + b * salt * salt);
    }

    /** Vapour pressure over that of pure water, 1 − 0.000537 s (Raoult's law with the ions of sea salt, from memory). */
    static double vapourRatio(double s) {
        return 1.0 - 5.37e-4 * s;
    }
}
