package flowshy.cylinder;

import flowshy.math.BesselI;
import flowshy.math.BesselK;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Hydrodynamic function Γ_b of a cylinder (radius 1) that oscillates across the axis of a still coaxial enclosure (radius β).
 *
 * <p>Stream function ψ = A/r + B r + C K₁(λr) + D I₁(λr) with ψ(1) = ψ′(1) = 1, ψ(β) = ψ′(β) = 0; Γ_b = 2A − 1. Source: Stokes
 * 1851; Chen, Wambsganss &amp; Jendrzejczyk 1976, J. Appl. Mech. 43:325 (from memory). No slip. The solved form, with cross
 * products X_mn of orders m at λ and n at λβ (own derivation):
 *
 * <p>A = β²λ² X₂₂ / (4 + λ²(β²−1) X₀₀ − 2λβ X₀₁ − 2λ X₁₀).
 *
 * <p>Where the gap is thin against the boundary layer the denominator loses all digits; there the stream function is built
 * from r and two solutions that start at the surface without value and slope, by Taylor series in r.
 */
final class ConfinedHydrodynamicFunction {
    /** Gap over boundary layer, |λ|(β−1), above which the cross products lose no more than two digits. */
    private static final double CLOSED_FORM_FROM = 2.0;

    /** Longest step over the radius where it starts; the series converges up to 1, so that 32 terms leave 5e-20. */
    private static final double STEP = 0.25;

    private static final int TERMS = 32;

    private ConfinedHydrodynamicFunction() {}

    /**
     * Γ_b for any growth rate s, with λ² = a² s/ν.
     *
     * @param square λ², finite, not 0 and not on the negative real axis
     * @param ratio β = b/a &gt; 1
     * @return Γ_b [-]
     */
    static Complex of(Complex square, double ratio) {
        Complex lambda = square.sqrt();
        return lambda.norm() * (ratio - 1.0) < CLOSED_FORM_FROM
                ? thinGap(square, ratio)
                : closedForm(lambda, square, ratio);
    }

    /** I carries e^{-λ} or e^{-λβ}, K the inverse; all products then share e^{λ(β−1)}. */
    private static Complex closedForm(Complex lambda, Complex square, double ratio) {
        Complex outer = lambda.multiply(ratio);
        BesselK k = BesselK.of(lambda);
        BesselI i = BesselI.of(lambda);
        BesselK outerK = BesselK.of(outer);
        BesselI outerI = BesselI.of(outer);
        Complex k2 = k.k0().add(k.k1().multiply(2.0).divide(lambda));
        Complex i2 = i.i0().subtract(i.i1().multiply(2.0).divide(lambda));
        Complex outerK2 = outerK.k0().add(outerK.k1().multiply(2.0).divide(outer));
        Complex outerI2 = outerI.i0().subtract(outerI.i1().multiply(2.0).divide(outer));
        Complex decay = lambda.multiply(1.0 - ratio).exp();
        Complex back = decay.multiply(decay);

        Complex x00 =
                k.k0().multiply(outerI.i0()).subtract(back.multiply(i.i0()).multiply(outerK.k0()));
        Complex x01 = k.k0().multiply(outerI.i1()).add(back.multiply(i.i0()).multiply(outerK.k1()));
        Complex x10 = k.k1().multiply(outerI.i0()).add(back.multiply(i.i1()).multiply(outerK.k0()));
        Complex x22 = k2.multiply(outerI2).subtract(back.multiply(i2).multiply(outerK2));
        Complex above = square.multiply(ratio * ratio).multiply(x22);
        // (β − 1)(β + 1) keeps the digits of a narrow gap
        Complex below = decay.multiply(4.0)
                .add(square.multiply((ratio - 1.0) * (ratio + 1.0)).multiply(x00))
                .subtract(outer.multiply(2.0).multiply(x01))
                .subtract(lambda.multiply(2.0).multiply(x10));
        return above.divide(below).multiply(2.0).subtract(1.0);
    }

    /**
     * ψ = r + p φ_a + q φ_b with r²φ″ + rφ′ − φ = r²(w + λ²φ), w_a = (r − 1/r)/2, w_b = 1/r, and φ = φ′ = 0 at r = 1. The
     * vorticity at the surface then gives A = (p − 2q)/(2λ²), free of cancellation for narrow and for wide gaps.
     */
    private static Complex thinGap(Complex square, double ratio) {
        int steps = (int) FastMath.ceil(FastMath.log(ratio) / FastMath.log(1.0 + STEP));
        Solution a = Solution.AT_SURFACE;
        Solution b = Solution.AT_SURFACE;
        double r = 1.0;
        for (int i = 1; i <= steps; i++) {
            double next = i == steps ? ratio : FastMath.pow(ratio, (double) i / steps);
            a = a.marched(square, r, next, 0.5, -0.5);
            b = b.marched(square, r, next, 0.0, 1.0);
            r = next;
        }
        Complex wronskian = a.value.multiply(b.slope).subtract(b.value.multiply(a.slope));
        Complex p = b.value.subtract(b.slope.multiply(ratio)).divide(wronskian);
        Complex q = a.slope.multiply(ratio).subtract(a.value).divide(wronskian);
        return p.subtract(q.multiply(2.0)).divide(square).subtract(1.0);
    }

    /** Value and slope of a solution at one radius. */
    private record Solution(Complex value, Complex slope) {
        static final Solution AT_SURFACE = new Solution(Complex.ZERO, Complex.ZERO);

        /**
         * From one radius to the next, for w = rise r + fall/r: with s = (r − r₀)/r₀ and φ = Σ c_n sⁿ, (n+1)(n+2) c_{n+2} =
         * −(n+1)(2n+1) c_{n+1} − (n²−1) c_n + r₀²λ²(c_n + 2c_{n-1} + c_{n-2}) + [sⁿ](rise r₀³(1+s)³ + fall r₀(1+s)).
         */
        Solution marched(Complex square, double from, double to, double rise, double fall) {
            double up = rise * from * from * from;
            double down = fall * from;
            double[] drive = {up + down, 3.0 * up + down, 3.0 * up, up};
            double pullReal = square.getReal() * from * from;
            double pullImaginary = square.getImaginary() * from * from;
            double[] real = new double[TERMS];
            double[] imaginary = new double[TERMS];
            real[0] = value.getReal();
            imaginary[0] = value.getImaginary();
            real[1] = slope.getReal() * from;
            imaginary[1] = slope.getImaginary() * from;
            for (int n = 0; n + 2 < TERMS; n++) {
                double pulledReal = binomial(real, n);
                double pulledImaginary = binomial(imaginary, n);
                double scale = 1.0 / ((n + 1.0) * (n + 2.0));
                double next = (n + 1.0) * (2.0 * n + 1.0);
                double same = (double) n * n - 1.0;
                real[n + 2] = scale
                        * ((n < drive.length ? drive[n] : 0.0)
                                + (pullReal * pulledReal - pullImaginary * pulledImaginary)
                                - next * real[n + 1]
                                - same * real[n]);
                imaginary[n + 2] = scale
                        * ((pullReal * pulledImaginary + pullImaginary * pulledReal)
                                - next * imaginary[n + 1]
                                - same * imaginary[n]);
            }
            double s = (to - from) / from;
            return new Solution(
                    new Complex(value(real, s), value(imaginary, s)),
                    new Complex(slope(real, s) / from, slope(imaginary, s) / from));
        }

        private static double binomial(double[] c, int n) {
            return c[n] + (n > 0 ? 2.0 * c[n - 1] : 0.0) + (n > 1 ? c[n - 2] : 0.0);
        }

        private static double value(double[] c, double s) {
            double sum = 0.0;
            for (int n = c.length - 1; n >= 0; n--) {
                sum = sum * s + c[n];
            }
            return sum;
        }

        private static double slope(double[] c, double s) {
            double sum = 0.0;
            for (int n = c.length - 1; n > 0; n--) {
                sum = sum * s + n * c[n];
            }
            return sum;
        }
    }
}
