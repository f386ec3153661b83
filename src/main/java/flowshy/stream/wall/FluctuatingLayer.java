package flowshy.stream.wall;

import flowshy.stream.StokesLayer;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Small oscillation of a stream, seen inside the steady laminar layer over a plate, as a share of the oscillation outside.
 *
 * <p>Along the stream s = F′ with F‴ + ½fF″ + ½f″F + iξ(1−F′) = ξ(f′∂F′/∂ξ − f″∂F/∂ξ); across it (parallel to the wall)
 * s = G with G″ + ½fG′ + iξ(1−G) = ξf′∂G/∂ξ; f is the Blasius function, η = z √(U/(νx)), ξ = ωx/U, time factor e^{+iωt}. Source:
 * Lighthill 1954 (linearised layer equations, from memory); across by the independence principle. Limits: ξ → 0 gives
 * f′ + ½ηf″ and f′, ξ → ∞ the Stokes layer.
 *
 * <p>Both equations allow the power series s = Σ (iξ)ⁿ wₙ(η) with real wₙ, which converges for every ξ; it replaces marching
 * downstream and leaves no step in ξ. Up to ξ = {@value #SERIES_END} its sum holds about 1e-6 (the terms cancel, more so as ξ
 * grows). Above, the distance from the Stokes layer is carried on at equal z/δ and made smaller by (5/ξ)^1.5, the order
 * of the first correction near the wall; at ξ = 10 that is within 0.015 of the marched solution.
 */
public enum FluctuatingLayer {
    /** fluctuation along the stream */
    ALONG {
        @Override
        double first(double eta) {
            return Blasius.slope(eta) + 0.5 * eta * Blasius.curvature(eta);
        }

        @Override
        double streamTerm(int n, double eta) {
            return (n + 0.5) * Blasius.curvature(eta);
        }
    },
    /** fluctuation across the stream, along the wall */
    ACROSS {
        @Override
        double first(double eta) {
            return Blasius.slope(eta);
        }

        @Override
        double streamTerm(int n, double eta) {
            return 0.0;
        }
    };

    /** ξ up to which the series is summed. */
    public static final double SERIES_END = 5.0;

    /** Above this η the share is 1. */
    private static final double ETA_END = 10.0;

    /** Chebyshev points less one; with 56 the sums at ξ = 3 differ from those with 80 by 1e-8. */
    private static final int ORDER = 56;
    /** The last term at ξ = 5 is below 1e-9. */
    private static final int TERMS = 110;

    private static final double STEP = 0.05;
    private static final int POINTS = (int) FastMath.round(ETA_END / STEP) + 1;

    /** Made when first asked for. */
    private static final class TableAlong {
        static final double[][][] TABLE = ALONG.solve();
    }

    /** Made when first asked for. */
    private static final class TableAcross {
        static final double[][][] TABLE = ACROSS.solve();
    }

    /** w₀(η): the answer to a slow change of the stream. */
    abstract double first(double eta);

    /** What multiplies the stream function Wₙ = ∫wₙ in the equation of order n. */
    abstract double streamTerm(int n, double eta);

    /**
     * Velocity inside the layer over that outside.
     *
     * @param eta z √(U/(νx)) [-], zero or more
     * @param xi ωx/U [-], zero or more
     * @return s [-]
     */
    public Complex share(double eta, double xi) {
        if (xi <= SERIES_END) {
            return sum(eta, xi);
        }
        double scaled = eta * FastMath.sqrt(xi / SERIES_END);
        Complex stokes = StokesLayer.share(eta * FastMath.sqrt(0.5 * xi));
        return stokes.add(sum(scaled, SERIES_END).subtract(stokes).multiply(FastMath.pow(SERIES_END / xi, 1.5)));
    }

    private Complex sum(double eta, double xi) {
        if (eta >= ETA_END) {
            return Complex.ONE;
        }
        double[][][] table = this == ALONG ? TableAlong.TABLE : TableAcross.TABLE;
        int i = FastMath.min((int) (eta / STEP), POINTS - 2);
        double t = eta / STEP - i;
        double real = 0.0;
        double imaginary = 0.0;
        int terms = FastMath.min(TERMS, 30 + (int) (16.0 * xi));
        double[][] left = table[i];
        double[][] right = table[i + 1];
        for (int n = terms - 1; n >= 0; n--) {
            double w = Hermite.between(t, STEP, left[0][n], right[0][n], left[1][n], right[1][n]);
            double next = w - xi * imaginary; // Horner: s = wₙ + iξ s
            imaginary = xi * real;
            real = next;
        }
        return new Complex(real, imaginary);
    }

    /** Values [0] and slopes [1] of all wₙ at the points of a uniform grid: [point][value or slope][n]. */
    private double[][][] solve() {
        double[] eta = new double[ORDER + 1];
        for (int j = 0; j <= ORDER; j++) {
            eta[j] = 0.5 * ETA_END * (1.0 - FastMath.cos(FastMath.PI * j / ORDER));
        }
        Collocation grid = new Collocation(eta);
        double[][] first = grid.derivative();
        double[][] second = grid.secondDerivative();
        double[][] integral = grid.integral();

        double[][] w = new double[TERMS][ORDER + 1];
        for (int j = 0; j <= ORDER; j++) {
            w[0][j] = first(eta[j]);
        }
        for (int n = 1; n < TERMS; n++) {
            double[][] left = new double[ORDER + 1][ORDER + 1];
            double[][] right = new double[ORDER + 1][1];
            for (int j = 1; j < ORDER; j++) {
                double f = Blasius.f(eta[j]);
                double stream = streamTerm(n, eta[j]);
                for (int k = 0; k <= ORDER; k++) {
                    left[j][k] = second[j][k] + 0.5 * f * first[j][k] + stream * integral[j][k];
                }
                left[j][j] -= n * Blasius.slope(eta[j]);
                right[j][0] = w[n - 1][j] - (n == 1 ? 1.0 : 0.0);
            }
            left[0][0] = 1.0;
            left[ORDER][ORDER] = 1.0;
            Collocation.solve(left, right);
            for (int j = 0; j <= ORDER; j++) {
                w[n][j] = right[j][0];
            }
            w[n][0] = 0.0; // rounding of the solver, which the sum would multiply
            w[n][ORDER] = 0.0;
        }
        double[][] slopes = new double[TERMS][ORDER + 1];
        for (int n = 0; n < TERMS; n++) {
            for (int j = 0; j <= ORDER; j++) {
                slopes[n][j] = dot(first[j], w[n]);
            }
        }
        double[][][] table = new double[POINTS][2][TERMS];
        for (int i = 0; i < POINTS; i++) {
            double[] weights = grid.weightsAt(i * STEP);
            for (int n = 0; n < TERMS; n++) {
                table[i][0][n] = dot(weights, w[n]);
                table[i][1][n] = dot(weights, slopes[n]);
            }
        }
        return table;
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0.0;
        for (int j = 0; j < a.length; j++) {
            sum += a[j] * b[j];
        }
        return sum;
    }
}
