package flowshy.torque.finite;

import org.hipparchus.util.FastMath;

/** What the wall adds at one wave: every ring seen from the wall, then pair by pair; and the wall's own motion at the foot. */
final class WallWave {
    /** Rings whose waves have fallen below this at the wall no longer feel it. */
    private static final double FADED = 1e-12;

    private static final int SURFACE = RingTransform.SURFACE;
    private static final int DENSITIES = RingTransform.DENSITIES;

    /** Sign of L against its Bessel function, and of D in R: even e_x, second harmonic, axial. */
    private static final int[] SIGN_S = {1, -1, 1};

    private static final int[] SIGN_R = {1, -1, -1};

    private int count;
    private final double[] size;
    /** S = ± e and R = ± D of {@link Couplings}, complex, at 2 (6 i + d). */
    private final double[] s;

    private final double[] r;
    /** Value at κ, needed beside the foot. */
    private final double[] value;

    private final double[] base = new double[Twin.SIZE];
    private final double[] twin = new double[Twin.SIZE];
    private final double[] transforms = new double[2];
    /** Of one test density: factor of R′, then of S′ a kind. */
    private final double[] factorR = new double[2];

    private final double[] factorS = new double[2 * Couplings.KINDS];

    WallWave(int rings) {
        size = new double[rings];
        s = new double[2 * DENSITIES * rings];
        r = new double[2 * DENSITIES * rings];
        value = new double[DENSITIES * rings];
    }

    /** The first rings of a list, with the way up to each from the one before, or from the wall. */
    void set(Wave wave, RingTransform[] rings, double[] between, int active) {
        count = active;
        Twin.one(base, 0);
        for (int i = 0; i < count; i++) {
            Twin.multiply(base, 0, between, Twin.SIZE * i, base, 0, wave.dRe, wave.dIm);
            size[i] = FastMath.abs(base[0]);
            for (int d = 0; d < DENSITIES; d++) {
                Twin.multiply(base, 0, rings[i].up, d * Twin.SIZE, twin, 0, wave.dRe, wave.dIm);
                int kind = RingTransform.kind(d);
                int at = 2 * (DENSITIES * i + d);
                value[DENSITIES * i + d] = twin[0];
                s[at] = SIGN_S[kind] * (twin[0] + wave.dRe * twin[1] - wave.dIm * twin[2]);
                s[at + 1] = SIGN_S[kind] * (wave.dRe * twin[2] + wave.dIm * twin[1]);
                r[at] = SIGN_R[kind] * twin[1];
                r[at + 1] = SIGN_R[kind] * twin[2];
            }
            Twin.multiply(base, 0, rings[i].pass, 0, base, 0, wave.dRe, wave.dIm);
        }
    }

    void addPairs(Couplings k, int[] index, double[][] re, double[][] im) {
        for (int i = 0; i < count; i++) {
            for (int c = 0; c < SURFACE; c++) {
                test(k, 2 * (DENSITIES * i + c));
                int row = SURFACE * index[i] + c;
                // the waves fall from the wall up, so the first pair that has faded is the last to look at
                for (int j = 0; j <= i && size[i] * size[j] > FADED; j++) {
                    for (int d = 0; d < SURFACE; d++) {
                        int other = 2 * (DENSITIES * j + d);
                        int column = SURFACE * index[j] + d;
                        int kind = 2 * Couplings.kind(c, d);
                        re[row][column] += real(kind, s, r, other);
                        im[row][column] += imaginary(kind, s, r, other);
                    }
                }
            }
        }
    }

    /** All volumes together: the wall's part has the same form for every height, so their sums over the kinds are enough. */
    void addVolumes(Couplings k, int[] index, double[][] re, double[][] im) {
        double[] totalS = new double[2];
        double[] totalR = new double[2];
        for (int d = SURFACE; d < DENSITIES; d++) {
            totalS[0] = 0.0;
            totalS[1] = 0.0;
            totalR[0] = 0.0;
            totalR[1] = 0.0;
            for (int j = 0; j < count; j++) {
                int at = 2 * (DENSITIES * j + d);
                totalS[0] += s[at];
                totalS[1] += s[at + 1];
                totalR[0] += r[at];
                totalR[1] += r[at + 1];
            }
            for (int i = 0; i < count; i++) {
                for (int c = 0; c < SURFACE; c++) {
                    test(k, 2 * (DENSITIES * i + c));
                    int kind = 2 * Couplings.kind(c, RingTransform.kind(d));
                    re[d - SURFACE][SURFACE * index[i] + c] += real(kind, totalS, totalR, 0);
                    im[d - SURFACE][SURFACE * index[i] + c] += imaginary(kind, totalS, totalR, 0);
                }
            }
        }
    }

    /**
     * Foot that slides with unit velocity, U_x = p(r), and that tilts, U_z = −x p(r). A wall moving with U_L, U_z gives
     * u_L = q(U_L + iU_z) D + U_L e^{−κz}, u_z = i[(U_L + iU_z)(qD − e) + U_L e^{−κz}], and across e U_T (own, as the kernels).
     */
    void addFoot(Wave wave, FootSlot slot, int[] index, double[][] re, double[][] im) {
        slot.transforms(wave.kappa, transforms);
        double slide = wave.weight * transforms[0];
        double tilt = wave.weight * transforms[1];
        for (int i = 0; i < count && size[i] > FADED; i++) {
            for (int c = 0; c < SURFACE; c++) {
                int row = SURFACE * index[i] + c;
                int at = 2 * (DENSITIES * i + c);
                // D and e with the plain sign of the Bessel function
                double dRe = SIGN_R[c] * r[at];
                double dIm = SIGN_R[c] * r[at + 1];
                double eRe = SIGN_S[c] * s[at];
                double eIm = SIGN_S[c] * s[at + 1];
                double qdRe = wave.qRe * dRe - wave.qIm * dIm;
                double qdIm = wave.qRe * dIm + wave.qIm * dRe;
                double fall = value[DENSITIES * i + c];
                if (c == 2) {
                    re[LayerSystem.FOOT_SLIDES][row] -= slide * wave.kappa * dRe;
                    im[LayerSystem.FOOT_SLIDES][row] -= slide * wave.kappa * dIm;
                    re[LayerSystem.FOOT_TILTS][row] -= tilt * (eRe - qdRe);
                    im[LayerSystem.FOOT_TILTS][row] -= tilt * (eIm - qdIm);
                } else {
                    re[LayerSystem.FOOT_SLIDES][row] += slide * (SIGN_S[c] * (qdRe + fall) + eRe);
                    im[LayerSystem.FOOT_SLIDES][row] += slide * (SIGN_S[c] * qdIm + eIm);
                    re[LayerSystem.FOOT_TILTS][row] -= tilt * SIGN_S[c] * qdRe;
                    im[LayerSystem.FOOT_TILTS][row] -= tilt * SIGN_S[c] * qdIm;
                }
            }
        }
    }

    /** far R R′ + near (R S′ + S R′) + wall S S′ as factors of R′ and S′. */
    private void test(Couplings k, int at) {
        double sRe = s[at];
        double sIm = s[at + 1];
        double rRe = r[at];
        double rIm = r[at + 1];
        factorR[0] = k.farRe * rRe - k.farIm * rIm + k.nearRe * sRe - k.nearIm * sIm;
        factorR[1] = k.farRe * rIm + k.farIm * rRe + k.nearRe * sIm + k.nearIm * sRe;
        double nearRe = k.nearRe * rRe - k.nearIm * rIm;
        double nearIm = k.nearRe * rIm + k.nearIm * rRe;
        for (int kind = 0; kind < Couplings.KINDS; kind++) {
            factorS[2 * kind] = nearRe + k.wallRe[kind] * sRe - k.wallIm[kind] * sIm;
            factorS[2 * kind + 1] = nearIm + k.wallRe[kind] * sIm + k.wallIm[kind] * sRe;
        }
    }

    private double real(int kind, double[] otherS, double[] otherR, int o) {
        return factorR[0] * otherR[o]
                - factorR[1] * otherR[o + 1]
                + factorS[kind] * otherS[o]
                - factorS[kind + 1] * otherS[o + 1];
    }

    private double imaginary(int kind, double[] otherS, double[] otherR, int o) {
        return factorR[0] * otherR[o + 1]
                + factorR[1] * otherR[o]
                + factorS[kind] * otherS[o + 1]
                + factorS[kind + 1] * otherS[o];
    }
}
