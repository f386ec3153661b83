package flowshy.stream.turbulence;

import flowshy.math.Positive;
import org.hipparchus.special.Gamma;
import org.hipparchus.util.FastMath;

/**
 * One-sided spectrum of isotropic turbulence without viscosity, carried past at the mean speed.
 *
 * <p>Along: f S/σ² = 4n/(1 + C n²)^(5/6); across: f S/σ² = 2n (1 + 8C n²/3)/(1 + C n²)^(11/6); n = fL/U,
 * C = 4π (Γ(1/3)/Γ(5/6))² = 70.78 (printed as 70.8). Source: von Kármán 1948; form of ESDU 85020. With the across scale L/2 the second
 * is the printed 4n(1 + 755.2n²)/(1 + 283.2n²)^(11/6). At high frequency it overstates a slow stream by orders of magnitude:
 * {@link TurbulenceSpectrum} has the viscous end.
 *
 * @param deviation σ, rms of one velocity component [m/s]
 * @param lengthScale L, longitudinal integral scale [m]
 * @param speed U, mean speed that carries the turbulence past [m/s]
 */
public record VonKarmanSpectrum(double deviation, double lengthScale, double speed) {
    /** C = 4π (Γ(1/3)/Γ(5/6))². */
    static final double C = 4.0 * FastMath.PI * FastMath.pow(Gamma.gamma(1.0 / 3.0) / Gamma.gamma(5.0 / 6.0), 2);

    /** @throws IllegalArgumentException if a value is not positive and finite */
    public VonKarmanSpectrum {
        Positive.check("deviation [m/s]", deviation);
        Positive.check("length scale [m]", lengthScale);
        Positive.check("speed [m/s]", speed);
    }

    /**
     * Density of the fluctuation along the stream.
     *
     * @param frequency f [Hz], zero or more
     * @return S_u [(m/s)²/Hz]
     */
    public double along(double frequency) {
        double n = frequency * lengthScale / speed;
        return level() * 4.0 * FastMath.pow(1.0 + C * n * n, -5.0 / 6.0);
    }

    /**
     * Density of the fluctuation across the stream.
     *
     * @param frequency f [Hz], zero or more
     * @return S_v [(m/s)²/Hz]
     */
    public double across(double frequency) {
        double n = frequency * lengthScale / speed;
        double square = C * n * n;
        return level() * 2.0 * (1.0 + 8.0 / 3.0 * square) * FastMath.pow(1.0 + square, -11.0 / 6.0);
    }

    private double level() {
        return deviation * deviation * lengthScale / speed;
    }
}
