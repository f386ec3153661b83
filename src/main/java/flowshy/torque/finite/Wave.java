package flowshy.torque.finite;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.SinCos;

/**
 * One wavenumber κ of the Hankel integral over the wall's plane, with q = √(κ² + k²), k² = iβ, and the integrals of e^{−xz}
 * over a thickness as {@link Twin twins} of x = κ and x = q.
 */
final class Wave {
    /** Below this |qh| the series are used: their terms fall faster than 1/n!. */
    private static final double SMALL = 1.0;

    /** Number of terms that leaves 1e-17 for |qh| up to 1/16, 1/4 and 1. */
    private static final int[] TERMS = {9, 13, 19};

    /** (−1)ⁿ/(n+1)! of (1 − e^{−y})/y, and 2(−1)ⁿ/(n+2)! of 2(y − 1 + e^{−y})/y². */
    private static final double[] LAYER = coefficients(1);

    private static final double[] SELF = coefficients(2);

    /** e^{−y} beyond this is nothing beside 1. */
    private static final double OPAQUE = 45.0;

    final double kappa;
    /** π κ dκ. */
    final double weight;

    final double qRe;
    final double qIm;
    /** q − κ, free of cancellation. */
    final double dRe;

    final double dIm;

    Wave(double kappa, double step, double beta) {
        this.kappa = kappa;
        this.weight = FastMath.PI * kappa * step;
        double k2 = kappa * kappa;
        this.qRe = FastMath.sqrt(0.5 * (FastMath.sqrt(k2 * k2 + beta * beta) + k2));
        this.qIm = 0.5 * beta / qRe;
        // iβ/(q + κ)
        double sum = qRe + kappa;
        double norm = sum * sum + qIm * qIm;
        this.dRe = beta * qIm / norm;
        this.dIm = beta * sum / norm;
    }

    Complex q() {
        return new Complex(qRe, qIm);
    }

    /** E = ∫₀ʰ e^{−xz} dz to {@code thick}, e^{−xh} to {@code pass}; 1 and 1 where h = 0. */
    void layer(double h, double[] thick, int t, double[] pass, int p) {
        if (h == 0.0) {
            Twin.one(thick, t);
            Twin.one(pass, p);
        } else if (small(h)) {
            series(LAYER, h, h, thick, t);
            // e^{−xh} = 1 − x E, and Δ(xE) = E(κ) + q ΔE
            pass[p] = 1.0 - kappa * thick[t];
            pass[p + 1] = -(thick[t] + qRe * thick[t + 1] - qIm * thick[t + 2]);
            pass[p + 2] = -(qRe * thick[t + 2] + qIm * thick[t + 1]);
        } else {
            fall(h, pass, p);
            thick[t] = (1.0 - pass[p]) / kappa;
            overQ(-pass[p + 1] - thick[t], -pass[p + 2], thick, t);
        }
    }

    /** S = ∫∫ e^{−x|z−z′|} dz dz′ over one thickness, 2 (h − E)/x. */
    void self(double h, double[] thick, int t, double[] out, int o) {
        if (small(h)) {
            series(SELF, h, h * h, out, o);
        } else {
            out[o] = 2.0 * (h - thick[t]) / kappa;
            overQ(-2.0 * thick[t + 1] - out[o], -2.0 * thick[t + 2], out, o);
        }
    }

    /** e^{−xz} alone. */
    void pass(double z, double[] out, int o) {
        if (z == 0.0) {
            Twin.one(out, o);
        } else if (small(z)) {
            layer(z, new double[Twin.SIZE], 0, out, o);
        } else {
            fall(z, out, o);
        }
    }

    private boolean small(double h) {
        return (qRe * qRe + qIm * qIm) * h * h < SMALL * SMALL;
    }

    /** e^{−xh}; Δ = −h e^{−κh} (1 − e^{−w})/w, w = (q − κ)h. */
    private void fall(double h, double[] pass, int p) {
        double y = kappa * h;
        if (y > OPAQUE) {
            pass[p] = 0.0;
            pass[p + 1] = 0.0;
            pass[p + 2] = 0.0;
            return;
        }
        double e = FastMath.exp(-y);
        double re = dRe * h;
        double im = dIm * h;
        double norm = re * re + im * im;
        pass[p] = e;
        if (norm < 1e-4) {
            // 1 − w/2 + w²/6 − w³/24 + w⁴/120
            double hr = 1.0 / 120.0 * re - 1.0 / 24.0;
            double hi = 1.0 / 120.0 * im;
            double gr = hr * re - hi * im + 1.0 / 6.0;
            double gi = hr * im + hi * re;
            hr = gr * re - gi * im - 0.5;
            hi = gr * im + gi * re;
            pass[p + 1] = -h * e * (hr * re - hi * im + 1.0);
            pass[p + 2] = -h * e * (hr * im + hi * re);
            return;
        }
        SinCos turn = FastMath.sinCos(im);
        double more = FastMath.exp(-re);
        double upRe = 1.0 - more * turn.cos();
        double upIm = more * turn.sin();
        pass[p + 1] = -h * e * (upRe * re + upIm * im) / norm;
        pass[p + 2] = -h * e * (upIm * re - upRe * im) / norm;
    }

    /** Slope of a twin as (re + i im)/q. */
    private void overQ(double re, double im, double[] out, int o) {
        double norm = qRe * qRe + qIm * qIm;
        out[o + 1] = (re * qRe + im * qIm) / norm;
        out[o + 2] = (im * qRe - re * qIm) / norm;
    }

    /** scale Σ c_n (xh)ⁿ by Horner's rule in twins: the slope of r · xh is h r + qh Δr. */
    private void series(double[] c, double h, double scale, double[] out, int o) {
        double y = kappa * h;
        double re = qRe * h;
        double im = qIm * h;
        double square = re * re + im * im;
        int terms = square < 1.0 / 256.0 ? TERMS[0] : square < 1.0 / 16.0 ? TERMS[1] : TERMS[2];
        double value = c[terms - 1];
        double slopeRe = 0.0;
        double slopeIm = 0.0;
        for (int n = terms - 2; n >= 0; n--) {
            double next = h * value + re * slopeRe - im * slopeIm;
            slopeIm = re * slopeIm + im * slopeRe;
            slopeRe = next;
            value = value * y + c[n];
        }
        out[o] = scale * value;
        out[o + 1] = scale * slopeRe;
        out[o + 2] = scale * slopeIm;
    }

    private static double[] coefficients(int ahead) {
        double[] c = new double[TERMS[TERMS.length - 1]];
        c[0] = 1.0;
        for (int n = 1; n < c.length; n++) {
            c[n] = -c[n - 1] / (n + ahead);
        }
        return c;
    }
}
