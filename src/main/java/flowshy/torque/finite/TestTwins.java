package flowshy.torque.finite;

/**
 * A ring as test of the rings below it at one wave: each coupling as two complex factors, of value and slope of the {@link Twin} in
 * which a source arrives. With x the test's own twin, value v and slope w of {@link Couplings}: v x y + w Δ(xy) is
 * (v x + w Δx) y + w (x + (q − κ) Δx) Δy.
 */
final class TestTwins {
    private static final int SURFACE = RingTransform.SURFACE;

    /** At 4 (3 d + c): factor of the value, then of the slope. */
    private final double[] factors = new double[4 * SURFACE * SURFACE];

    void set(Couplings k, double[] up, Wave wave) {
        for (int c = 0; c < SURFACE; c++) {
            double x = up[c * Twin.SIZE];
            double xRe = up[c * Twin.SIZE + 1];
            double xIm = up[c * Twin.SIZE + 2];
            double atQRe = x + wave.dRe * xRe - wave.dIm * xIm;
            double atQIm = wave.dRe * xIm + wave.dIm * xRe;
            for (int d = 0; d < SURFACE; d++) {
                int kind = Couplings.kind(c, d);
                double sign = Couplings.sign(c, d, 1);
                double wRe = sign * k.slopeRe[kind];
                double wIm = sign * k.slopeIm[kind];
                int at = 4 * (SURFACE * d + c);
                factors[at] = sign * k.valueRe[kind] * x + wRe * xRe - wIm * xIm;
                factors[at + 1] = sign * k.valueIm[kind] * x + wRe * xIm + wIm * xRe;
                factors[at + 2] = wRe * atQRe - wIm * atQIm;
                factors[at + 3] = wRe * atQIm + wIm * atQRe;
            }
        }
    }

    /** Source density d, arriving as the twin y, into column {@code column} of the test's three rows. */
    void add(int d, double[] y, double[][] re, double[][] im, int row, int column) {
        double value = y[0];
        double slopeRe = y[1];
        double slopeIm = y[2];
        for (int c = 0; c < SURFACE; c++) {
            int at = 4 * (SURFACE * d + c);
            re[row + c][column] += factors[at] * value + factors[at + 2] * slopeRe - factors[at + 3] * slopeIm;
            im[row + c][column] += factors[at + 1] * value + factors[at + 2] * slopeIm + factors[at + 3] * slopeRe;
        }
    }
}
