package flowshy.stream.wall;

import org.hipparchus.util.FastMath;

/**
 * The Blasius function: f‴ + ½ f f″ = 0, f(0) = f′(0) = 0, f′(∞) = 1.
 *
 * <p>Integrated once with f″(0) = 1 and scaled afterwards (Töpfer 1912: if g solves the equation, so does α g(αη); from memory), so
 * no constant is put in. Between the grid points f′ and f″ are cubics through the values and the slopes that the equation gives;
 * their error is below 1e-10.
 */
final class Blasius {
    /** Above this η the layer differs from the stream by less than 1e-15. */
    static final double END = 12.0;

    private static final double STEP = 0.01;
    private static final int POINTS = (int) FastMath.round(END / STEP) + 1;
    private static final double[] F = new double[POINTS];
    private static final double[] SLOPE = new double[POINTS];
    private static final double[] CURVATURE = new double[POINTS];

    static {
        double[] unscaled = {0.0, 0.0, 1.0};
        for (int i = 0; i < 4000; i++) {
            step(unscaled, 0.005); // to 20: with f″(0) = 1 the layer ends near 7
        }
        double alpha = 1.0 / FastMath.sqrt(unscaled[1]);
        double[] y = {0.0, 0.0, alpha * alpha * alpha};
        for (int i = 0; i < POINTS; i++) {
            F[i] = y[0];
            SLOPE[i] = y[1];
            CURVATURE[i] = y[2];
            step(y, STEP);
        }
    }

    private Blasius() {}

    /** f″(0). */
    static double wallCurvature() {
        return CURVATURE[0];
    }

    /** f(η). */
    static double f(double eta) {
        if (eta >= END) {
            return F[POINTS - 1] + eta - END;
        }
        int i = cell(eta);
        return hermite(eta, i, F[i], F[i + 1], SLOPE[i], SLOPE[i + 1]);
    }

    /** f′(η), the velocity as a share of the stream. */
    static double slope(double eta) {
        if (eta >= END) {
            return 1.0;
        }
        int i = cell(eta);
        return hermite(eta, i, SLOPE[i], SLOPE[i + 1], CURVATURE[i], CURVATURE[i + 1]);
    }

    /** f″(η). */
    static double curvature(double eta) {
        if (eta >= END) {
            return 0.0;
        }
        int i = cell(eta);
        return hermite(
                eta, i, CURVATURE[i], CURVATURE[i + 1], -0.5 * F[i] * CURVATURE[i], -0.5 * F[i + 1] * CURVATURE[i + 1]);
    }

    private static int cell(double eta) {
        return FastMath.min((int) (eta / STEP), POINTS - 2);
    }

    private static double hermite(double eta, int i, double left, double right, double leftSlope, double rightSlope) {
        return Hermite.between(eta / STEP - i, STEP, left, right, leftSlope, rightSlope);
    }

    /** One step of the classical Runge–Kutta rule for (f, f′, f″), in place. */
    private static void step(double[] y, double h) {
        double[] k = new double[12];
        double[] at = y.clone();
        double[] reach = {0.5 * h, 0.5 * h, h, 0.0};
        for (int s = 0; s < 4; s++) {
            k[3 * s] = at[1];
            k[3 * s + 1] = at[2];
            k[3 * s + 2] = -0.5 * at[0] * at[2];
            for (int j = 0; j < 3; j++) {
                at[j] = y[j] + reach[s] * k[3 * s + j];
            }
        }
        for (int j = 0; j < 3; j++) {
            y[j] += h / 6.0 * (k[j] + 2.0 * k[3 + j] + 2.0 * k[6 + j] + k[9 + j]);
        }
    }
}
