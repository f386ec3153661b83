package flowshy.stream.turbulence;

import org.hipparchus.util.FastMath;

/**
 * Shape of the energy spectrum over the wavenumber, in units of κ_e: E ∝ k⁴/(k²+1)^(17/6) exp(−5.2{[(kr)⁴+0.4⁴]^¼ − 0.4}),
 * k = κ/κ_e, r = κ_e η (Pope 2000, eqs 6.246 to 6.248, with von Kármán's low end), and its integrals from k₁ upwards.
 *
 * <p>Panels with eight Gauss points: at most 0.4 wide in ln k below kr = 1 and 0.4 wide in kr above, to kr = 20, where the exponential is
 * 1e-44. Sums over whole panels are kept, so one value costs one panel.
 */
final class EnergySpectrum {
    private static final double LOWEST =
            1e-3; // of the smaller of 1 and 1/r; the part below changes the integrals by 1e-12
    private static final double HIGHEST = 20.0; // in kr
    private static final double WIDTH = 0.4;

    /** Abscissas and weights of the eight-point Gauss–Legendre rule on −1 to 1 (tabulated digits), the positive half. */
    private static final double[] ABSCISSA = {
        0.18343464249564980, 0.525532409916329, 0.7966664774136267, 0.9602898564975362
    };

    private static final double[] WEIGHT = {
        0.362683783378362, 0.31370664587788727, 0.22238103445337448, 0.10122853629037626
    };

    private final double r;
    private final double[] edges;
    /** ∫E/k dk and ∫E/k³ dk from each edge to the end. */
    private final double[] inverse;

    private final double[] inverseCube;
    private final double energy;

    EnergySpectrum(double r) {
        this.r = r;
        double lowest = LOWEST * FastMath.min(1.0, 1.0 / r);
        int logarithmic = (int) FastMath.ceil(FastMath.log(1.0 / (r * lowest)) / WIDTH);
        int linear = (int) FastMath.ceil((HIGHEST - 1.0) / WIDTH);
        edges = new double[logarithmic + linear + 1];
        for (int i = 0; i <= logarithmic; i++) {
            edges[i] = lowest * FastMath.pow(1.0 / (r * lowest), (double) i / logarithmic);
        }
        for (int i = 1; i <= linear; i++) {
            edges[logarithmic + i] = (1.0 + (HIGHEST - 1.0) * i / linear) / r;
        }
        int last = edges.length - 1;
        inverse = new double[edges.length];
        inverseCube = new double[edges.length];
        double[] beyond = tail(edges[last]);
        inverse[last] = beyond[1];
        inverseCube[last] = beyond[2];
        double sum = beyond[0];
        for (int i = last - 1; i >= 0; i--) {
            double[] panel = panel(edges[i], edges[i + 1]);
            sum += panel[0];
            inverse[i] = inverse[i + 1] + panel[1];
            inverseCube[i] = inverseCube[i + 1] + panel[2];
        }
        energy = sum;
    }

    /** ∫E dk. */
    double energy() {
        return energy;
    }

    /** E at a wavenumber. */
    double at(double k) {
        double square = k * k;
        double sum = 1.0 + square;
        // (1 + k²)^(−17/6) without a general power, which would take most of the time
        double rise = square * square * FastMath.sqrt(FastMath.cbrt(sum)) / (sum * sum * sum);
        double x = k * r;
        double fourth = x * x * x * x;
        return rise * FastMath.exp(-5.2 * (FastMath.sqrt(FastMath.sqrt(fourth + 0.0256)) - 0.4));
    }

    /** ∫ from k₁ of E/k (1 − k₁²/k²) dk: the one-dimensional spectrum along, times the normalisation. */
    double along(double k1) {
        double[] above = above(k1);
        return above[0] - k1 * k1 * above[1];
    }

    /** ½ ∫ from k₁ of E/k (1 + k₁²/k²) dk: the one-dimensional spectrum across, times the normalisation. */
    double across(double k1) {
        double[] above = above(k1);
        return 0.5 * (above[0] + k1 * k1 * above[1]);
    }

    private double[] above(double k1) {
        int last = edges.length - 1;
        if (k1 >= edges[last]) {
            double[] beyond = tail(k1);
            return new double[] {beyond[1], beyond[2]};
        }
        int next = 0;
        int high = last;
        while (next < high) {
            int middle = (next + high) >>> 1;
            if (edges[middle] >= k1) {
                high = middle;
            } else {
                next = middle + 1;
            }
        }
        if (next == 0) {
            return new double[] {inverse[0], inverseCube[0]};
        }
        double[] part = panel(k1, edges[next]);
        return new double[] {part[1] + inverse[next], part[2] + inverseCube[next]};
    }

    /** The three integrals from k upwards by plain panels until nothing is added. */
    private double[] tail(double k) {
        double[] sum = new double[3];
        double low = k;
        double step = WIDTH / r;
        for (int i = 0; i < 200; i++) {
            double[] panel = panel(low, low + step);
            for (int j = 0; j < 3; j++) {
                sum[j] += panel[j];
            }
            if (panel[0] <= 1e-17 * sum[0]) {
                break;
            }
            low += step;
        }
        return sum;
    }

    /** ∫E dk, ∫E/k dk and ∫E/k³ dk over one panel, in ln k. */
    private double[] panel(double low, double high) {
        double middle = 0.5 * FastMath.log(low * high);
        double half = 0.5 * FastMath.log(high / low);
        double[] sum = new double[3];
        for (int j = 0; j < ABSCISSA.length; j++) {
            for (int side = -1; side <= 1; side += 2) {
                double k = FastMath.exp(middle + side * half * ABSCISSA[j]);
                double share = WEIGHT[j] * half * at(k);
                sum[0] += share * k;
                sum[1] += share;
                sum[2] += share / (k * k);
            }
        }
        return sum;
    }
}
