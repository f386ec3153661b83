package flowshy.stream.turbulence;

import flowshy.math.Positive;
import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/**
 * One-sided spectrum of isotropic turbulence with its viscous end, carried past at the mean speed.
 *
 * <p>E(κ) ∝ κ⁴/(κ²+κ_e²)^(17/6) exp(−5.2{[(κη)⁴+0.4⁴]^¼ − 0.4}), κ_e = 0.7468/L, ε = 0.712 σ³/L, η = (ν³/ε)^¼;
 * E₁₁(κ₁) = ∫_{κ₁}^∞ E/κ (1 − κ₁²/κ²) dκ along, E₂₂(κ₁) = ½∫_{κ₁}^∞ E/κ (1 + κ₁²/κ²) dκ across, both rescaled to the
 * variance; S(f) = (2π/U) E(2πf/U). Source: Pope 2000, Turbulent Flows, eqs 6.213 to 6.217 and 6.246 to 6.248 (from memory); the
 * factor 0.712 makes the Kolmogorov constant 1.5. Without viscosity it is {@link VonKarmanSpectrum}. Turbulence is taken as frozen
 * while it is carried past (Taylor 1938).
 */
public final class TurbulenceSpectrum {
    /** Where an isotropic spectrum with these constants is meant; below, the turbulence hardly has an inertial range and ε is an estimate. */
    public static final Range REYNOLDS = new Range("σL/ν", 50.0, 1.0e9);

    private static final double TWO_PI = 2.0 * FastMath.PI;

    /** κ_e L = √(4π²/C), C of the von Kármán form. */
    private static final double ENERGY_WAVENUMBER = TWO_PI / FastMath.sqrt(VonKarmanSpectrum.C);

    /** ε = 0.712 σ³/L. */
    private static final double DISSIPATION = 0.712;

    private final double deviation;
    private final double lengthScale;
    private final double speed;
    private final double kinematicViscosity;
    private final EnergySpectrum shape;

    /**
     * The spectrum of one stream.
     *
     * @param deviation σ, rms of one velocity component [m/s]
     * @param lengthScale L, longitudinal integral scale [m]
     * @param speed U [m/s]
     * @param kinematicViscosity ν [m²/s]
     * @throws IllegalArgumentException if a value is not positive and finite
     */
    public TurbulenceSpectrum(double deviation, double lengthScale, double speed, double kinematicViscosity) {
        Positive.check("deviation [m/s]", deviation);
        Positive.check("length scale [m]", lengthScale);
        Positive.check("speed [m/s]", speed);
        Positive.check("kinematic viscosity [m2/s]", kinematicViscosity);
        this.deviation = deviation;
        this.lengthScale = lengthScale;
        this.speed = speed;
        this.kinematicViscosity = kinematicViscosity;
        this.shape = new EnergySpectrum(energyWavenumber() * kolmogorovLength());
    }

    /**
     * Density of the fluctuation along the stream.
     *
     * @param frequency f [Hz], zero or more
     * @return S_u [(m/s)²/Hz]
     */
    public double along(double frequency) {
        return level() * shape.along(wavenumber(frequency));
    }

    /**
     * Density of the fluctuation across the stream.
     *
     * @param frequency f [Hz], zero or more
     * @return S_v [(m/s)²/Hz]
     */
    public double across(double frequency) {
        return level() * shape.across(wavenumber(frequency));
    }

    /**
     * Rms of one velocity component.
     *
     * @return σ [m/s]
     */
    public double deviation() {
        return deviation;
    }

    /**
     * Longitudinal integral scale.
     *
     * @return L [m]
     */
    public double lengthScale() {
        return lengthScale;
    }

    /**
     * Reynolds number of the large eddies.
     *
     * @return σL/ν [-]
     */
    public double reynolds() {
        return deviation * lengthScale / kinematicViscosity;
    }

    /**
     * Dissipation.
     *
     * @return ε = 0.712 σ³/L [m²/s³]
     */
    public double dissipation() {
        return DISSIPATION * deviation * deviation * deviation / lengthScale;
    }

    /**
     * Size of the smallest eddies.
     *
     * @return η = (ν³/ε)^¼ [m]
     */
    public double kolmogorovLength() {
        return FastMath.pow(FastMath.pow(kinematicViscosity, 3) / dissipation(), 0.25);
    }

    /**
     * Frequency above which viscosity has taken more than half of what the form without viscosity gives.
     *
     * @return where S_u is half of von Kármán's of equal σ, L, U [Hz]
     */
    public double cutOff() {
        VonKarmanSpectrum inviscid = new VonKarmanSpectrum(deviation, lengthScale, speed);
        double low = FastMath.log(0.01 * energyWavenumber() * speed / TWO_PI);
        double high = FastMath.log(20.0 / kolmogorovLength() * speed / TWO_PI);
        for (int i = 0; i < 60; i++) {
            double middle = 0.5 * (low + high);
            double frequency = FastMath.exp(middle);
            if (along(frequency) > 0.5 * inviscid.along(frequency)) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return FastMath.exp(0.5 * (low + high));
    }

    private double energyWavenumber() {
        return ENERGY_WAVENUMBER / lengthScale;
    }

    private double wavenumber(double frequency) {
        return TWO_PI * frequency / (speed * energyWavenumber());
    }

    /** The two one-dimensional spectra integrate to ⅔ ∫E dκ over κ₁ > 0. */
    private double level() {
        return deviation * deviation * 1.5 / shape.energy() * TWO_PI / (speed * energyWavenumber());
    }
}
