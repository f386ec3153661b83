package flowshy.torque.finite;

import java.util.Arrays;
import java.util.List;

/**
 * One ring at one wave: its densities as seen from its lower and its upper end, and their action within the ring. Densities
 * are the three of the surface, then those of the displaced fluid: z e_x, e_x and −x e_z.
 */
final class RingTransform {
    /** Three of the surface and three of the volume. */
    static final int DENSITIES = 6;

    static final int SURFACE = 3;

    /** Which kind of density each is: 0 even e_x, 1 second harmonic, 2 axial. */
    private static final int[] KIND = {0, 1, 2, 0, 0, 2};

    final double[] up = new double[DENSITIES * Twin.SIZE];
    final double[] down = new double[DENSITIES * Twin.SIZE];
    final double[] pass = new double[Twin.SIZE];
    /** Test c above source d within the ring, at (6 c + d); below, of the volumes alone; and both on one piece. */
    final double[] above = new double[SURFACE * DENSITIES * Twin.SIZE];

    final double[] below = new double[SURFACE * DENSITIES * Twin.SIZE];
    final double[] level = new double[SURFACE * DENSITIES * Twin.SIZE];

    private final List<RingPiece> pieces;
    private final double height;
    private final double[] factors = new double[RadialFactors.COUNT];
    private final double[] radial;
    private final double[] thick;
    private final double[] passes;
    private final double[] scratch = new double[Twin.SIZE];

    RingTransform(Ring ring) {
        pieces = ring.pieces();
        height = ring.top() - ring.bottom();
        radial = new double[pieces.size() * DENSITIES];
        thick = new double[pieces.size() * Twin.SIZE];
        passes = new double[pieces.size() * Twin.SIZE];
    }

    static int kind(int density) {
        return KIND[density];
    }

    /** The way through a ring that acts no more at this wavenumber. */
    void passOnly(Wave wave) {
        wave.layer(height, scratch, 0, pass, 0);
    }

    void at(Wave wave, RadialFactors transform) {
        Arrays.fill(level, 0.0);
        for (int s = 0; s < pieces.size(); s++) {
            piece(wave, transform, s);
        }
        if (pieces.size() == 1) {
            System.arraycopy(passes, 0, pass, 0, Twin.SIZE);
            Arrays.fill(up, 0.0);
            for (int d = 0; d < DENSITIES; d++) {
                Twin.addScaled(radial[d], thick, 0, up, d * Twin.SIZE);
            }
            System.arraycopy(up, 0, down, 0, up.length);
            return;
        }
        passOnly(wave);
        Arrays.fill(above, 0.0);
        Arrays.fill(below, 0.0);
        Arrays.fill(up, 0.0);
        Arrays.fill(down, 0.0);
        for (int s = 0; s < pieces.size(); s++) {
            sweep(s, down, above, 0, wave);
        }
        for (int s = pieces.size() - 1; s >= 0; s--) {
            sweep(s, up, below, SURFACE, wave);
        }
    }

    boolean single() {
        return pieces.size() == 1;
    }

    private void piece(Wave wave, RadialFactors transform, int s) {
        RingPiece piece = pieces.get(s);
        transform.of(piece, wave.kappa, factors);
        int r = s * DENSITIES;
        System.arraycopy(factors, 0, radial, r, SURFACE);
        radial[r + 3] = factors[3] * piece.middle();
        radial[r + 4] = factors[3];
        radial[r + 5] = -factors[4];
        int at = s * Twin.SIZE;
        if (piece.upright()) {
            wave.layer(piece.thickness(), thick, at, passes, at);
            wave.self(piece.thickness(), thick, at, scratch, 0);
        } else {
            wave.pass(piece.thickness(), passes, at);
            wave.pass(0.5 * piece.thickness(), thick, at);
            Twin.one(scratch, 0);
        }
        for (int c = 0; c < SURFACE; c++) {
            for (int d = 0; d < DENSITIES; d++) {
                Twin.addScaled(radial[r + c] * radial[r + d], scratch, 0, level, (c * DENSITIES + d) * Twin.SIZE);
            }
        }
    }

    /** One piece meets what came through the pieces before it, density {@code from} and on, then joins it. */
    private void sweep(int s, double[] sum, double[] block, int from, Wave wave) {
        int r = s * DENSITIES;
        int at = s * Twin.SIZE;
        for (int d = 0; d < DENSITIES; d++) {
            int o = d * Twin.SIZE;
            if (d >= from) {
                Twin.multiply(thick, at, sum, o, scratch, 0, wave.dRe, wave.dIm);
                for (int c = 0; c < SURFACE; c++) {
                    Twin.addScaled(radial[r + c], scratch, 0, block, (c * DENSITIES + d) * Twin.SIZE);
                }
            }
            Twin.multiply(passes, at, sum, o, sum, o, wave.dRe, wave.dIm);
            Twin.addScaled(radial[r + d], thick, at, sum, o);
        }
    }
}
