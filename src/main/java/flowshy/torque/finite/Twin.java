package flowshy.torque.finite;

/**
 * Arithmetic of pairs (f(κ), Δf) with Δf = (f(q) − f(κ))/(q − κ), three numbers in an array: f(κ), Re Δf, Im Δf.
 *
 * <p>The kernels need differences between κ and q = √(κ² + k²). Where k ≪ κ a plain difference loses every digit; a product
 * rule does not: Δ(fg) = f Δg + g Δf + (q − κ) Δf Δg. In the steady limit q = κ the pair is value and derivative.
 */
final class Twin {
    /** Places of one pair in an array. */
    static final int SIZE = 3;

    private Twin() {}

    /** out = x y, with d = q − κ; out may be one of the factors. */
    static void multiply(double[] x, int i, double[] y, int j, double[] out, int o, double dr, double di) {
        double xv = x[i];
        double xr = x[i + 1];
        double xi = x[i + 2];
        double yv = y[j];
        double yr = y[j + 1];
        double yi = y[j + 2];
        double sr = xr * yr - xi * yi;
        double si = xr * yi + xi * yr;
        out[o] = xv * yv;
        out[o + 1] = xv * yr + yv * xr + dr * sr - di * si;
        out[o + 2] = xv * yi + yv * xi + dr * si + di * sr;
    }

    /** out += factor · x. */
    static void addScaled(double factor, double[] x, int i, double[] out, int o) {
        out[o] += factor * x[i];
        out[o + 1] += factor * x[i + 1];
        out[o + 2] += factor * x[i + 2];
    }

    /** out = 1. */
    static void one(double[] out, int o) {
        out[o] = 1.0;
        out[o + 1] = 0.0;
        out[o + 2] = 0.0;
    }
}
