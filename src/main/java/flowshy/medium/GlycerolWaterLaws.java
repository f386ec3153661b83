package flowshy.medium;

import org.hipparchus.util.FastMath;

/** Published formulas of glycerol with water; t in °C, w the mass fraction of glycerol. */
final class GlycerolWaterLaws {
    private GlycerolWaterLaws() {}

    /**
     * Dynamic viscosity [Pa·s], Cheng 2008, Ind. Eng. Chem. Res. 47:3285, eqs 6, 9 to 13, 21 and 22; 0 to 100 °C, every w.
     */
    static double viscosity(double w, double t) {
        double water = 1.790e-3 * FastMath.exp((-1230.0 - t) * t / (36100.0 + 360.0 * t));
        double glycerol = 12.1 * FastMath.exp((-1233.0 + t) * t / (9900.0 + 70.0 * t));
        double a = 0.705 - 0.0017 * t;
        double b = (4.9 + 0.036 * t) * FastMath.pow(a, 2.5);
        double alpha = 1.0 - w + a * b * w * (1.0 - w) / (a * w + b * (1.0 - w));
        return FastMath.pow(water, alpha) * FastMath.pow(glycerol, 1.0 - alpha);
    }

    /**
     * Density [kg/m³], Volk &amp; Kähler 2018, Exp. Fluids 59:75: volumes of the two added, divided by the contraction
     * 1 + c (sin(π w^1.31))^0.81.
     */
    static double density(double w, double t) {
        double water = waterDensity(t);
        double glycerol = glycerolDensity(t);
        double c = 1.78e-6 * t * t - 1.82e-4 * t + 1.41e-2;
        double wave = FastMath.max(0.0, FastMath.sin(FastMath.PI * FastMath.pow(w, 1.31)));
        return (1.0 + c * FastMath.pow(wave, 0.81)) / (w / glycerol + (1.0 - w) / water);
    }

    static double waterDensity(double t) {
        return 1000.0 * (1.0 - FastMath.pow(FastMath.abs((t - 3.98) / 615.0), 1.71));
    }

    static double glycerolDensity(double t) {
        return 1273.3 - 0.6121 * t;
    }

    /**
     * Sound speed [m/s], straight in the mass fraction between that of water at the temperature and glycerol with 1904 m/s at 25 °C falling by
     * 2 m/s per kelvin: our own estimate.
     *
     * @param waterSoundSpeed of water at the temperature [m/s]
     */
    static double soundSpeed(double w, double t, double waterSoundSpeed) {
        return (1.0 - w) * waterSoundSpeed + w * (1904.0 - 2.0 * (t - 25.0));
    }

    /** Mole fraction of water. */
    static double waterFraction(double w) {
        double water = (1.0 - w) / 18.01528;
        return water / (water + w / 92.094);
    }
}
