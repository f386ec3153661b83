package flowshy.math;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.SinCos;

/**
 * Modified Bessel functions I₀ and I₁ of a complex argument in the right half plane, times e^{-z}.
 *
 * <p>Ascending series (Abramowitz &amp; Stegun 9.6.10) up to |z| = 2; trapezoidal rule on I_ν(z) = (1/π) ∫₀^π e^{z cos t} cos νt dt
 * (9.6.19), which for a periodic integrand errs by I_64 only, up to |z| = 20; both exponentials of Hankel's series (9.7.1 and
 * 9.7.2) beyond (equation numbers from memory). Relative error tested below 1e-14 for 1e-7 ≤ |z| ≤ 1e8, |arg z| ≤ 90°, next to
 * the zeros on the imaginary axis relative to 1/√|z|.
 *
 * @param i0 e^{-z} I₀(z) [-]
 * @param i1 e^{-z} I₁(z) [-]
 */
public record BesselI(Complex i0, Complex i1) {
    private static final double SERIES_BELOW = 2.0;

    /** Where the smallest term of the asymptotic series, about e^{-2|z|}, is below rounding. */
    private static final double ASYMPTOTIC_FROM = 20.0;

    /** Points on half the period; (|z|/2)^64/64! is below 1e-25. */
    private static final int HALF_PERIOD = 32;

    private static final double SMALLEST_TERM = 1e-18;

    /**
     * Both functions, scaled by e^{-z}.
     *
     * @param z argument, Re z ≥ 0, finite
     * @return the pair
     * @throws IllegalArgumentException outside the closed right half plane
     */
    public static BesselI of(Complex z) {
        if (!(z.getReal() >= 0.0) || z.isInfinite() || z.isNaN()) {
            throw new IllegalArgumentException("I0 and I1 need a finite z with Re z >= 0, was " + z);
        }
        double modulus = z.norm();
        if (modulus <= SERIES_BELOW) {
            Complex scale = z.negate().exp();
            return new BesselI(
                    series(z, 0).multiply(scale),
                    series(z, 1).multiply(z.multiply(0.5)).multiply(scale));
        }
        return modulus < ASYMPTOTIC_FROM ? quadrature(z) : new BesselI(asymptotic(z, 0), asymptotic(z, 1));
    }

    /** I_ν/(z/2)^ν = Σ (z²/4)^k / (k! (k+ν)!). */
    private static Complex series(Complex z, int order) {
        Complex q = z.multiply(z).multiply(0.25);
        Complex term = Complex.ONE;
        Complex sum = Complex.ONE;
        for (int k = 1; term.norm() > SMALLEST_TERM; k++) {
            term = term.multiply(q).divide((double) k * (k + order));
            sum = sum.add(term);
        }
        return sum;
    }

    private static BesselI quadrature(Complex z) {
        double real0 = 0.0;
        double imaginary0 = 0.0;
        double real1 = 0.0;
        double imaginary1 = 0.0;
        for (int j = 0; j <= HALF_PERIOD; j++) {
            // cos t − 1 without cancellation near t = 0
            double half = FastMath.sin(0.5 * FastMath.PI * j / HALF_PERIOD);
            double fall = -2.0 * half * half;
            double weight = j == 0 || j == HALF_PERIOD ? 0.5 : 1.0;
            double size = weight * FastMath.exp(z.getReal() * fall);
            SinCos phase = FastMath.sinCos(z.getImaginary() * fall);
            real0 += size * phase.cos();
            imaginary0 += size * phase.sin();
            real1 += (1.0 + fall) * size * phase.cos();
            imaginary1 += (1.0 + fall) * size * phase.sin();
        }
        return new BesselI(
                new Complex(real0 / HALF_PERIOD, imaginary0 / HALF_PERIOD),
                new Complex(real1 / HALF_PERIOD, imaginary1 / HALF_PERIOD));
    }

    /** e^{-z} I_ν = (2πz)^{-1/2} [Σ (−1)^k a_k z^{-k} ± i e^{±iνπ} e^{-2z} Σ a_k z^{-k}], upper sign above the real axis. */
    private static Complex asymptotic(Complex z, int order) {
        Complex inverse = z.reciprocal();
        Complex term = Complex.ONE;
        Complex rising = Complex.ONE;
        Complex falling = Complex.ONE;
        for (int k = 1; term.norm() > SMALLEST_TERM && k <= 2.0 * ASYMPTOTIC_FROM; k++) {
            double odd = 2.0 * k - 1.0;
            term = term.multiply(inverse).multiply((4.0 * order * order - odd * odd) / (8.0 * k));
            rising = k % 2 == 0 ? rising.add(term) : rising.subtract(term);
            falling = falling.add(term);
        }
        double side = (z.getImaginary() < 0.0 ? -1.0 : 1.0) * (order == 0 ? 1.0 : -1.0);
        Complex turned = falling.multiply(z.multiply(-2.0).exp()).multiply(new Complex(0.0, side));
        return rising.add(turned).multiply(inverse.multiply(0.5 / FastMath.PI).sqrt());
    }
}
