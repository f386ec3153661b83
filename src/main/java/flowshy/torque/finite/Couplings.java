package flowshy.torque.finite;

import org.hipparchus.complex.Complex;

/**
 * Velocity kernels of one wave between two densities: e_x even, second harmonic, axial, as factors of value and slope of a
 * {@link Twin}, times the weight of the wave. Viscosity 1.
 *
 * <p>A point force over a no-slip wall, time factor e^{+iωt}, in the plane of the wavenumber (L), across it (T) and along z,
 * by own elimination of the pressure (published for the steady case: Blake 1971, its limit here). With Z = z − z′,
 * s = 1/(2(q+κ)): LL = s Δ[x e^{−x|Z|}], TT = e^{−q|Z|}/(2q), zz = −κ² s Δ[e^{−x|Z|}/x], Lz = iκ s sgn Z Δ[e^{−x|Z|}]. What the
 * wall adds, with e = e^{−qz} and D = Δ[e^{−xz}]: LL: −s(e e′ + κ(De′ + eD′) + κ(q+κ)DD′), TT: −e e′/(2q),
 * zz: −κ s(e e′/q − De′ − eD′ + (q+κ)DD′), Lz: iκ s(eD′ − De′ + (q+κ)DD′). Densities e_x and second harmonic enter L as J₀ and
 * −J₂, T as J₀ and J₂, the axial one z as −i J₁.
 */
final class Couplings {
    static final int LIKE = 0;
    static final int UNLIKE = 1;
    static final int AXIAL = 2;
    static final int CROSS = 3;
    static final int KINDS = 4;

    /** Which kernel joins test density c and source density t. */
    private static final int[][] KIND = {{LIKE, UNLIKE, CROSS}, {UNLIKE, LIKE, CROSS}, {CROSS, CROSS, AXIAL}};

    /** Sign of the cross kernel for a test above its source. */
    private static final int[][] TURN = {{1, 1, 1}, {1, 1, -1}, {-1, 1, 1}};

    final double[] valueRe = new double[KINDS];
    final double[] valueIm = new double[KINDS];
    final double[] slopeRe = new double[KINDS];
    final double[] slopeIm = new double[KINDS];
    /** Wall: factor of S S′ a kind. */
    final double[] wallRe = new double[KINDS];

    final double[] wallIm = new double[KINDS];
    /** Wall: −s κ (q+κ) and −s κ. */
    final double farRe;

    final double farIm;
    final double nearRe;
    final double nearIm;

    Couplings(Wave wave) {
        Complex q = wave.q();
        Complex d = new Complex(wave.dRe, wave.dIm);
        double kappa = wave.kappa;
        Complex s = q.add(kappa).multiply(2.0).reciprocal().multiply(wave.weight);
        Complex across = q.multiply(2.0).reciprocal().multiply(wave.weight);
        set(LIKE, s.add(across), s.multiply(q).add(across.multiply(d)));
        set(UNLIKE, across.subtract(s), across.multiply(d).subtract(s.multiply(q)));
        set(AXIAL, s.multiply(kappa).divide(q), s.multiply(-kappa * kappa).divide(q));
        set(CROSS, Complex.ZERO, s.multiply(kappa));
        setWall(LIKE, s.add(across).negate());
        setWall(UNLIKE, across.subtract(s));
        setWall(AXIAL, s.multiply(-kappa).divide(q));
        farRe = -0.5 * kappa * wave.weight;
        farIm = 0.0;
        nearRe = -kappa * s.getReal();
        nearIm = -kappa * s.getImaginary();
    }

    static int kind(int test, int source) {
        return KIND[test][source];
    }

    /** Sign of the coupling for a test above (+1) or below (−1) its source, 0 where they overlap and the cross term cancels. */
    static int sign(int test, int source, int side) {
        return KIND[test][source] == CROSS ? side * TURN[test][source] : 1;
    }

    private void set(int kind, Complex value, Complex slope) {
        valueRe[kind] = value.getReal();
        valueIm[kind] = value.getImaginary();
        slopeRe[kind] = slope.getReal();
        slopeIm[kind] = slope.getImaginary();
    }

    private void setWall(int kind, Complex factor) {
        wallRe[kind] = factor.getReal();
        wallIm[kind] = factor.getImaginary();
    }
}
