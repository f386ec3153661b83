package flowshy.torque.finite;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * What rings do to themselves and to their neighbours at the wavenumbers above their cut-off K, where each is a straight strip that
 * leans by θ against the axis: products of Bessel functions have the mean ±1/(πκr), and the kernels without the wall, integrated
 * over the strips, leave two powers of the wavenumber.
 *
 * <p>The first belongs to the ring's length l: with u = r l cos θ ∫ dκ/(κ² + k²) a unit force has, by its parts along r, φ and z,
 * rr: u sin²θ, φφ: u, zz: u cos²θ, rz: u sin θ cos θ. The second belongs to the ends. Where strips of the leans θ and τ meet at the
 * radius r, their force on each other has, in units of r/(2K²) and with σ = θ + τ, γ = (3θ+τ, θ+3τ): rr: −Σ cos γ/8, φφ: cos σ/2,
 * zz: cos σ/2 + Σ cos γ/8, rz: sin σ/4 + Σ sin γ/8; a strip's end takes the same with θ = τ from its force on itself, so that ends
 * inside an even layer cancel. Own derivation; what is left is smaller by 1/(Kl) once more, or oscillates.
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
        double[][] turning = new double[3][3];
        for (RingPiece piece : ring.pieces()) {
            double sine = piece.width() / piece.length();
            double cosine = piece.thickness() / piece.length();
            double share = piece.radius() * piece.thickness();
            along[0][0] += share * sine * sine;
            along[0][2] += share * sine * cosine;
            along[1][1] += share;
            along[2][2] += share * cosine * cosine;
            double beat = beat(piece, from);
            turning[1][1] += beat;
            turning[2][2] -= beat;
        }
        along[2][0] = along[0][2];
        RingPiece low = ring.lowest();
        RingPiece high = ring.highest();
        double[][] foot = corner(low.lean(), low.lean());
        double[][] head = corner(high.lean(), high.lean());
        double atFoot = low.from().radius() / (2.0 * from * from);
        double atHead = (high.from().radius() + high.width()) / (2.0 * from * from);
        Complex rest = rest(from, beta);
        Complex[][] tail = new Complex[3][3];
        for (int c = 0; c < 3; c++) {
            for (int d = 0; d < 3; d++) {
                double more = between(c, turning, d) - atFoot * between(c, foot, d) - atHead * between(c, head, d);
                tail[c][d] = rest.multiply(between(c, along, d)).add(more);
            }
        }
        return tail;
    }

    /** r l ∫ sin(2κr)/κ² dκ to its first term, the beat in the squares of the Bessel functions, averaged over the piece's radii. */
    private static double beat(RingPiece piece, double from) {
        if (!piece.upright()) {
            return 0.0;
        }
        double spread = from * piece.width();
        double mean = spread == 0.0 ? 1.0 : FastMath.sin(spread) / spread;
        return piece.thickness() * FastMath.cos(2.0 * from * piece.radius()) * mean / (2.0 * from * from);
    }

    /** 3 × 3 among the densities of a ring as test and of the one it stands on, from the wavenumber on. */
    static double[][] joint(Ring upper, Ring lower, double from) {
        RingPiece piece = upper.lowest();
        double[][] corner = corner(piece.lean(), lower.highest().lean());
        double size = piece.from().radius() / (2.0 * from * from);
        double[][] tail = new double[3][3];
        for (int c = 0; c < 3; c++) {
            for (int d = 0; d < 3; d++) {
                tail[c][d] = size * between(c, corner, d);
            }
        }
        return tail;
    }

    /** By the parts r, φ, z, two strips of these leans on each other. */
    private static double[][] corner(double upper, double lower) {
        double sum = upper + lower;
        double cosines = (FastMath.cos(sum + 2.0 * upper) + FastMath.cos(sum + 2.0 * lower)) / 8.0;
        double sines = (FastMath.sin(sum + 2.0 * upper) + FastMath.sin(sum + 2.0 * lower)) / 8.0;
        double half = 0.5 * FastMath.cos(sum);
        double cross = 0.25 * FastMath.sin(sum) + sines;
        return new double[][] {{-cosines, 0.0, cross}, {0.0, half, 0.0}, {cross, 0.0, half + cosines}};
    }

    /** From the parts to the densities. */
    private static double between(int c, double[][] parts, int d) {
        double sum = 0.0;
        for (int m = 0; m < 3; m++) {
            for (int n = 0; n < 3; n++) {
                sum += PARTS[c][m] * parts[m][n] * PARTS[d][n];
            }
        }
        return sum;
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
