package flowshy.math;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * The ratio K₁(z)/K₀(z) on the ray arg z = 45°, z = √i x, where every steady oscillation of a viscous medium needs it;
 * {@link BesselK} gives the same a hundred times slower.
 *
 * <p>Works with g = z K₁/K₀, which obeys x g′ = g² − i x² (from K₀′ = −K₁, K₁′ = −K₀ − K₁/z; own derivation) and changes
 * slowly on a logarithmic scale. Below x = 1/128 the ascending series; from there to 32 Taylor polynomials, sixteen an octave,
 * their coefficients marched from that equation once, when the class loads (inwards, the direction in which errors die out);
 * above 32 the asymptotic series. Real and imaginary part of g each within 1e-14 of arbitrary precision
 * from 1e-8 to 1e6 (measured 7e-16). Loading takes about 3 ms.
 */
public final class DiagonalBesselRatio {
    private static final double DIAGONAL = FastMath.sqrt(0.5);

    private static final double TABLE_FROM = 1.0 / 128.0;
    private static final double TABLE_TO = 32.0;

    /** Sign, exponent and the first four bits of the mantissa number the intervals. */
    private static final int INDEX_SHIFT = 48;

    private static final int FIRST = (int) (Double.doubleToRawLongBits(TABLE_FROM) >>> INDEX_SHIFT);
    private static final int INTERVALS = (int) (Double.doubleToRawLongBits(TABLE_TO) >>> INDEX_SHIFT) - FIRST;

    /** Half an interval is at most 1/33 of its centre: 11 terms leave 33^-11. */
    private static final int TERMS = 11;

    /** From centre to centre is at most 1/16.5: 16 terms leave 3e-20. */
    private static final int MARCH_TERMS = 16;

    /** Terms of z K₁/K₀ = z + 1/2 + Σ c_n z^{1-n}; at x = 32 the term n = 20 is about 1e-17. */
    private static final int ASYMPTOTIC_TERMS = 20;

    private static final double[] ASYMPTOTIC = asymptoticCoefficients();

    /** Coefficients of interval j at j TERMS, in powers of (x − centre)/centre. */
    private static final double[] REAL = new double[INTERVALS * TERMS];

    private static final double[] IMAGINARY = new double[INTERVALS * TERMS];

    static {
        march();
    }

    private DiagonalBesselRatio() {}

    /**
     * Ratio K₁(z)/K₀(z) at z = √i x.
     *
     * @param x modulus of the argument, positive and finite
     * @return the ratio [-]
     * @throws IllegalArgumentException if x is not positive and finite
     */
    public static Complex ratio(double x) {
        Complex g = timesArgument(x);
        double scale = DIAGONAL / x;
        return new Complex(scale * (g.getReal() + g.getImaginary()), scale * (g.getImaginary() - g.getReal()));
    }

    /**
     * Ratio times its argument, g = z K₁(z)/K₀(z) at z = √i x.
     *
     * @param x modulus of the argument, positive and finite
     * @return g [-], both parts positive; −1/(ln(z/2) + γ) for small x, z + 1/2 for large
     * @throws IllegalArgumentException if x is not positive and finite
     */
    public static Complex timesArgument(double x) {
        if (x >= TABLE_FROM && x < TABLE_TO) {
            return table(x);
        }
        if (!(x > 0.0) || Double.isInfinite(x)) {
            throw new IllegalArgumentException("x must be positive and finite, was " + x);
        }
        return x < TABLE_FROM ? series(x) : asymptotic(x);
    }

    private static Complex table(double x) {
        int interval = (int) (Double.doubleToRawLongBits(x) >>> INDEX_SHIFT) - FIRST;
        double centre = centre(interval);
        double s = (x - centre) / centre;
        return new Complex(polynomial(REAL, interval * TERMS, s), polynomial(IMAGINARY, interval * TERMS, s));
    }

    /** Even and odd powers apart: two short chains run side by side. */
    private static double polynomial(double[] c, int at, double s) {
        double square = s * s;
        double even =
                ((((c[at + 10] * square + c[at + 8]) * square + c[at + 6]) * square + c[at + 4]) * square + c[at + 2])
                                * square
                        + c[at];
        double odd =
                (((c[at + 9] * square + c[at + 7]) * square + c[at + 5]) * square + c[at + 3]) * square + c[at + 1];
        return even + s * odd;
    }

    private static double centre(int interval) {
        return Double.longBitsToDouble(((long) (interval + FIRST) << INDEX_SHIFT) | (1L << (INDEX_SHIFT - 1)));
    }

    private static void march() {
        double[] real = new double[MARCH_TERMS];
        double[] imaginary = new double[MARCH_TERMS];
        double x = TABLE_TO;
        Complex start = asymptotic(x);
        for (int interval = INTERVALS; interval >= 0; interval--) {
            real[0] = start.getReal();
            imaginary[0] = start.getImaginary();
            expand(x, real, imaginary);
            if (interval < INTERVALS) {
                System.arraycopy(real, 0, REAL, interval * TERMS, TERMS);
                System.arraycopy(imaginary, 0, IMAGINARY, interval * TERMS, TERMS);
            }
            if (interval > 0) {
                double next = centre(interval - 1);
                double s = (next - x) / x;
                start = new Complex(horner(real, s), horner(imaginary, s));
                x = next;
            }
        }
    }

    /** Taylor coefficients in s = (x − x₀)/x₀ from (1 + s) dg/ds = g² − i x₀² (1 + s)²; the first one is given. */
    private static void expand(double centre, double[] real, double[] imaginary) {
        double[] drive = {centre * centre, 2.0 * centre * centre, centre * centre};
        for (int n = 0; n + 1 < MARCH_TERMS; n++) {
            double squareReal = 0.0;
            double squareImaginary = 0.0;
            for (int j = 0; j <= n; j++) {
                squareReal += real[j] * real[n - j] - imaginary[j] * imaginary[n - j];
                squareImaginary += real[j] * imaginary[n - j] + imaginary[j] * real[n - j];
            }
            double driven = n < drive.length ? drive[n] : 0.0;
            real[n + 1] = (squareReal - n * real[n]) / (n + 1);
            imaginary[n + 1] = (squareImaginary - driven - n * imaginary[n]) / (n + 1);
        }
    }

    private static double horner(double[] coefficients, double s) {
        double sum = 0.0;
        for (int n = coefficients.length - 1; n >= 0; n--) {
            sum = sum * s + coefficients[n];
        }
        return sum;
    }

    /** K₀ = Σ q^k/k!² (H_k − L), z K₁ = Σ q^k/k!² (1 + 2k(L − H_k)), q = z²/4 = iy, L = ln(x/2) + γ + iπ/4. */
    private static Complex series(double x) {
        double y = 0.25 * x * x;
        double y2 = y * y;
        double log = FastMath.log(0.5 * x) + BesselK.EULER_GAMMA;
        double quarter = 0.25 * FastMath.PI;
        // I₀ = even + i odd, z I₀′ likewise, and the same sums with harmonic numbers; y ≤ 2e-5, so k = 3 is the last
        double even = 1.0 - y2 / 4.0;
        double odd = y * (1.0 - y2 / 36.0);
        double slopeEven = -y2;
        double slopeOdd = y * (2.0 - y2 / 6.0);
        double harmonicEven = -y2 * (3.0 / 8.0);
        double harmonicOdd = y * (1.0 - y2 * (11.0 / 216.0));
        double harmonicSlopeEven = -y2 * 1.5;
        double harmonicSlopeOdd = y * (2.0 - y2 * (11.0 / 36.0));
        double k0Real = harmonicEven - (log * even - quarter * odd);
        double k0Imaginary = harmonicOdd - (log * odd + quarter * even);
        double zk1Real = even + (log * slopeEven - quarter * slopeOdd) - harmonicSlopeEven;
        double zk1Imaginary = odd + (log * slopeOdd + quarter * slopeEven) - harmonicSlopeOdd;
        double norm = k0Real * k0Real + k0Imaginary * k0Imaginary;
        return new Complex(
                (zk1Real * k0Real + zk1Imaginary * k0Imaginary) / norm,
                (zk1Imaginary * k0Real - zk1Real * k0Imaginary) / norm);
    }

    /** The powers of z = √i x fall on eight rays, so four real polynomials in 1/z⁴ = −1/x⁴ are enough. */
    private static Complex asymptotic(double x) {
        double w = 1.0 / x;
        double w4 = -(w * w) * (w * w);
        double straight = 0.0;
        double eighth = 0.0;
        double quarter = 0.0;
        double back = 0.0;
        for (int n = ASYMPTOTIC_TERMS - 4; n >= 0; n -= 4) {
            straight = straight * w4 + ASYMPTOTIC[n];
            eighth = eighth * w4 + ASYMPTOTIC[n + 1];
            quarter = quarter * w4 + ASYMPTOTIC[n + 2];
            back = back * w4 + ASYMPTOTIC[n + 3];
        }
        // z^{1-n} for n = 0, 1, 2, 3: x√i, 1, w/√i, w²/i
        double forward = DIAGONAL * (x * straight);
        double backward = DIAGONAL * (w * quarter);
        return new Complex(forward + eighth + backward, forward - backward - w * w * back);
    }

    /** K₁/K₀ = Σ c_n z^{-n}; with r′ = r² − r/z − 1: 2 c_n = (1 − (n−1)) c_{n-1} − Σ_{j=1}^{n-1} c_j c_{n-j}. */
    private static double[] asymptoticCoefficients() {
        double[] c = new double[ASYMPTOTIC_TERMS];
        c[0] = 1.0;
        for (int n = 1; n < c.length; n++) {
            double sum = (2.0 - n) * c[n - 1];
            for (int j = 1; j < n; j++) {
                sum -= c[j] * c[n - j];
            }
            c[n] = 0.5 * sum;
        }
        return c;
    }
}
