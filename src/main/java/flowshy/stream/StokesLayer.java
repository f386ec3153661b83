package flowshy.stream;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.SinCos;

/**
 * Oscillating flow along a plane wall, as a share of the free stream.
 *
 * <p>s(z) = 1 − e^{−kz}, k = (1+i)/δ, δ = √(2ν/ω), time factor e^{+iωt}. Source: Stokes 1851, second problem, textbook form. The
 * wall is endless, plane and still; amplitudes keep the layer laminar (Re_δ below about 500, from memory).
 *
 * @param kinematicViscosity ν [m²/s]
 */
public record StokesLayer(double kinematicViscosity) implements WallShare {
    /** Above this height in units of δ the rest, e^{-40}, is a hundredth of a rounding error. */
    private static final double FREE = 40.0;

    /** Below this |x| the closed forms of the moment lose digits to cancellation and the series has converged in 20 terms. */
    private static final double SERIES_BELOW = 1.0;

    private static final int TERMS = 20;

    /** @throws IllegalArgumentException if the viscosity is not positive */
    public StokesLayer {
        if (!(kinematicViscosity > 0.0)) {
            throw new IllegalArgumentException("kinematic viscosity must be positive, was " + kinematicViscosity);
        }
    }

    /**
     * Layer thickness δ = √(2ν/ω).
     *
     * @param omega angular frequency [rad/s]
     * @return δ [m]
     */
    public double thickness(double omega) {
        return FastMath.sqrt(2.0 * kinematicViscosity / omega);
    }

    @Override
    public Complex share(double height, double omega) {
        return share(height / thickness(omega));
    }

    /**
     * The same by the height in units of the layer, without cancellation near the wall.
     *
     * @param y z/δ [-]
     * @return s [-]
     */
    public static Complex share(double y) {
        if (y > FREE) {
            return Complex.ONE;
        }
        // 1 − e^{−y} cos y = −expm1(−y) + 2 e^{−y} sin²(y/2)
        double rise = y < 1.0 ? -FastMath.expm1(-y) : 1.0 - FastMath.exp(-y);
        double fall = 1.0 - rise;
        SinCos half = FastMath.sinCos(0.5 * y);
        double sine = fall * 2.0 * half.sin();
        return new Complex(rise + sine * half.sin(), sine * half.cos());
    }

    /**
     * Moment of the share along a hair, ∫₀ᴸ s (z + h) dz.
     *
     * <p>With x = kL: L² M₁ + hL M₀, M₀ = 1 − (1 − e^{−x})/x, M₁ = ½ − (1 − (1+x)e^{−x})/x², own integration.
     *
     * @param length L [m]
     * @param pivotDepth h, depth of the pivot below the wall [m]
     * @param delta thickness δ of the layer [m]
     * @return the moment [m²]
     */
    public static Complex lever(double length, double pivotDepth, double delta) {
        double y = length / delta;
        double square = length * length;
        double step = length * pivotDepth;
        if (y * FastMath.sqrt(2.0) < SERIES_BELOW) {
            return series(y, square, step);
        }
        Complex x = new Complex(y, y);
        double fall = FastMath.exp(-y);
        SinCos turn = FastMath.sinCos(y);
        Complex e = new Complex(fall * turn.cos(), -fall * turn.sin());
        Complex once = new Complex(1.0 - e.getReal(), -e.getImaginary()).divide(x);
        // (1 − (1+x)e)/x² = (once − e)/x
        Complex twice = once.subtract(e).divide(x);
        return new Complex(
                square * (0.5 - twice.getReal()) + step * (1.0 - once.getReal()),
                -square * twice.getImaginary() - step * once.getImaginary());
    }

    /** M₁ = −Σ_{k≥1} (k+1)/(k+2)! (−x)^k and M₀ = −Σ_{k≥1} (−x)^k/(k+1)!, each times its weight. */
    private static Complex series(double y, double square, double step) {
        double real = 1.0;
        double imaginary = 0.0;
        double sumReal = 0.0;
        double sumImaginary = 0.0;
        for (int k = 1; k <= TERMS; k++) {
            double next = -y * (real - imaginary) / (k + 1);
            imaginary = -y * (real + imaginary) / (k + 1);
            real = next;
            double weight = square * (k + 1) / (k + 2) + step;
            sumReal -= real * weight;
            sumImaginary -= imaginary * weight;
        }
        return new Complex(sumReal, sumImaginary);
    }
}
