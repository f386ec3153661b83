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

    private final double[] size;
    /** S = ± e and R = ± D of {@link Couplings}, complex, at 2 (6 i + d). */
    private final double[] s;

    private final double[] r;
    /** Value at κ, needed beside the foot. */
    private final double[] value;

    private final double[] base = new double[Twin.SIZE];
    private final double[] twin = new double[Twin.SIZE];
    private final double[] transforms = new double[2];

    WallWave(int rings) {
        size = new double[rings];
        s = new double[2 * DENSITIES * rings];
        r = new double[2 * DENSITIES * rings];
        value = new double[DENSITIES * rings];
    }

    void set(Wave wave, RingTransform[] rings, boolean[] active, double lowest) {
        wave.pass(lowest, base, 0);
        for (int i = 0; i < rings.length; i++) {
            size[i] = FastMath.abs(base[0]);
            for (int d = 0; active[i] && d < DENSITIES; d++) {
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

    void addPairs(Couplings k, boolean[] active, double[][] re, double[][] im) {
        double[] sum = new double[2];
        for (int i = 0; i < size.length; i++) {
            // the waves fall from the wall up, so the first pair that has faded is the last to look at
            for (int j = 0; active[i] && j <= i && size[i] * size[j] > FADED; j++) {
                for (int c = 0; active[j] && c < SURFACE; c++) {
                    for (int d = 0; d < SURFACE; d++) {
                        int other = 2 * (DENSITIES * j + d);
                        term(k, Couplings.kind(c, d), 2 * (DENSITIES * i + c), s, r, other, sum);
                        re[SURFACE * i + c][SURFACE * j + d] += sum[0];
                        im[SURFACE * i + c][SURFACE * j + d] += sum[1];
                    }
                }
            }
        }
    }

    /** All volumes together: the wall's part has the same form for every height, so their sums over the kinds are enough. */
    void addVolumes(Couplings k, boolean[] active, double[][] re, double[][] im) {
        double[] sum = new double[2];
        for (int d = SURFACE; d < DENSITIES; d++) {
            double[] totalS = new double[2];
            double[] totalR = new double[2];
            for (int j = 0; j < size.length; j++) {
                int at = 2 * (DENSITIES * j + d);
                if (active[j]) {
                    totalS[0] += s[at];
                    totalS[1] += s[at + 1];
                    totalR[0] += r[at];
                    totalR[1] += r[at + 1];
                }
            }
            for (int i = 0; i < size.length; i++) {
                for (int c = 0; active[i] && c < SURFACE; c++) {
                    int kind = Couplings.kind(c, RingTransform.kind(d));
                    term(k, kind, 2 * (DENSITIES * i + c), totalS, totalR, 0, sum);
                    re[d - SURFACE][SURFACE * i + c] += sum[0];
                    im[d - SURFACE][SURFACE * i + c] += sum[1];
                }
            }
        }
    }

    /**
     * Foot that slides with unit velocity, U_x = p(r), and that tilts, U_z = −x p(r). A wall moving with U_L, U_z gives
     * u_L = q(U_L + iU_z) D + U_L e^{−κz}, u_z = i[(U_L + iU_z)(qD − e) + U_L e^{−κz}], and across e U_T (own, as the kernels).
     */
    void addFoot(Wave wave, FootSlot slot, boolean[] active, double[][] re, double[][] im) {
        slot.transforms(wave.kappa, transforms);
        double slide = wave.weight * transforms[0];
        double tilt = wave.weight * transforms[1];
        for (int i = 0; i < size.length; i++) {
            for (int c = 0; active[i] && c < SURFACE; c++) {
                int row = SURFACE * i + c;
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

    /** far R R′ + near (R S′ + S R′) + wall S S′. */
    private void term(Couplings k, int kind, int at, double[] otherS, double[] otherR, int o, double[] out) {
        double sRe = s[at];
        double sIm = s[at + 1];
        double rRe = r[at];
        double rIm = r[at + 1];
        // factor of R′
        double aRe = k.farRe * rRe - k.farIm * rIm + k.nearRe * sRe - k.nearIm * sIm;
        double aIm = k.farRe * rIm + k.farIm * rRe + k.nearRe * sIm + k.nearIm * sRe;
        // factor of S′
        double bRe = k.nearRe * rRe - k.nearIm * rIm + k.wallRe[kind] * sRe - k.wallIm[kind] * sIm;
        double bIm = k.nearRe * rIm + k.nearIm * rRe + k.wallRe[kind] * sIm + k.wallIm[kind] * sRe;
        out[0] = aRe * otherR[o] - aIm * otherR[o + 1] + bRe * otherS[o] - bIm * otherS[o + 1];
        out[1] = aRe * otherR[o + 1] + aIm * otherR[o] + bRe * otherS[o + 1] + bIm * otherS[o];
    }
}
