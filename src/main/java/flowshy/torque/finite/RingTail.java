package flowshy.torque.finite;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * A ring's force on itself from the wavenumbers above its cut-off, where it is a straight strip: products of Bessel functions
 * have the mean ±1/(πκr), and a force along the surface, round the ring or up it, gives ∫ r dz ∫ dκ/(κ² + k²). The part of a
 * force across the surface, and the ends of the strip, fall off faster by a power and are left out.
 */
final class RingTail {
    /** Cut-off in units of |k| and of one over the radius. */
    private static final double LAYERS = 8.0;

    private static final double RADII = 20.0;

    /** Terms of atan(t)/t, |t| ≤ 1/6. */
    private static final int TERMS = 6;

    /** Even e_x, second harmonic and axial by their parts along r, φ and z. */
    private static final double[][] PARTS = {{1.0, -1.0, 0.0}, {1.0, 1.0, 0.0}, {0.0, 0.0, 1.0}};

    private RingTail() {}

    static double cutoff(Ring ring, double beta) {
        return FastMath.max(ring.cutoff(), FastMath.max(layerCutoff(beta), RADII / ring.meanRadius()));
    }

    /** Cut-off that the layer alone asks. */
    static double layerCutoff(double beta) {
        return LAYERS * FastMath.sqrt(beta);
    }

    /** 3 × 3 among the densities of the ring, from the wavenumber on. */
    static Complex[][] of(Ring ring, double from, double beta) {
        double[][] along = new double[3][3];
        for (RingPiece piece : ring.pieces()) {
            double sine = piece.width() / piece.length();
            double cosine = piece.thickness() / piece.length();
            double share = piece.radius() * piece.thickness();
            along[0][0] += share * sine * sine;
            along[0][2] += share * sine * cosine;
            along[1][1] += share;
            along[2][2] += share * cosine * cosine;
        }
        along[2][0] = along[0][2];
        Complex rest = rest(from, beta);
        Complex[][] tail = new Complex[3][3];
        for (int c = 0; c < 3; c++) {
            for (int d = 0; d < 3; d++) {
                double sum = 0.0;
                for (int m = 0; m < 3; m++) {
                    for (int n = 0; n < 3; n++) {
                        sum += PARTS[c][m] * along[m][n] * PARTS[d][n];
                    }
                }
                tail[c][d] = rest.multiply(sum);
            }
        }
        return tail;
    }

    /** ∫_K^∞ dκ/(κ² + k²) = atan(k/K)/k. */
    private static Complex rest(double from, double beta) {
        Complex square = new Complex(0.0, -beta / (from * from));
        Complex sum = Complex.ZERO;
        for (int n = TERMS; n >= 0; n--) {
            sum = sum.multiply(square).add(1.0 / (2 * n + 1));
        }
        return sum.divide(from);
    }
}
