package flowshy.torque.finite;

import java.util.Arrays;
import java.util.List;
import org.hipparchus.complex.Complex;

/**
 * Galerkin matrix of the ring layer over a no-slip wall, and the velocities that displaced fluid and a moving foot give, each
 * averaged over the rings with the layer's own densities. Viscosity 1; unknown 3 i + c is density c of ring i.
 */
final class LayerSystem {
    /** Columns: velocity from volume forces z e_x, e_x, −x e_z, then from the foot sliding along x and tilting about y. */
    static final int COLUMNS = 5;

    static final int FOOT_SLIDES = 3;
    static final int FOOT_TILTS = 4;

    /** A wave that has fallen below this is dropped. */
    private static final double FADED = 1e-12;

    private final int size;
    private final double[][] re;
    private final double[][] im;
    private final double[][] columnRe;
    private final double[][] columnIm;

    private final RingTransform[] rings;
    private final boolean[] active;
    private final FootSlot slot;
    private final double lowest;
    private final double[] through = new double[Twin.SIZE];
    private final double[] seen = new double[RingTransform.DENSITIES * Twin.SIZE];
    private final double[] product = new double[Twin.SIZE];
    private final WallWave wall;

    private LayerSystem(List<Ring> rings, FootSlot slot) {
        this.rings = rings.stream().map(RingTransform::new).toArray(RingTransform[]::new);
        this.size = RingTransform.SURFACE * rings.size();
        this.re = new double[size][size];
        this.im = new double[size][size];
        this.columnRe = new double[COLUMNS][size];
        this.columnIm = new double[COLUMNS][size];
        this.active = new boolean[rings.size()];
        this.slot = slot;
        this.lowest = rings.get(0).bottom();
        this.wall = new WallWave(rings.size());
    }

    /**
     * The system of a body.
     *
     * @param rings from the foot to the tip
     * @param slot the moving part of the wall
     * @param beta ω/ν in units of the rings
     */
    static LayerSystem of(List<Ring> rings, FootSlot slot, double beta) {
        LayerSystem system = new LayerSystem(rings, slot);
        double[] cutoffs = new double[rings.size()];
        for (int i = 0; i < cutoffs.length; i++) {
            cutoffs[i] = RingTail.cutoff(rings.get(i), beta);
        }
        double[] reached = new double[rings.size()];
        for (WavePanels panel : WavePanels.over(rings, cutoffs)) {
            for (int i = 0; i < cutoffs.length; i++) {
                system.active[i] = cutoffs[i] > panel.from();
                reached[i] = system.active[i] ? panel.to() : reached[i];
            }
            for (int n = 0; n < panel.size(); n++) {
                system.add(panel.wave(n, beta));
            }
        }
        for (int i = 0; i < cutoffs.length; i++) {
            system.addTail(i, RingTail.of(rings.get(i), reached[i], beta));
        }
        return system;
    }

    int size() {
        return size;
    }

    SymmetricFactors factors() {
        return new SymmetricFactors(re, im);
    }

    Complex[] column(int column) {
        Complex[] values = new Complex[size];
        for (int i = 0; i < size; i++) {
            values[i] = new Complex(columnRe[column][i], columnIm[column][i]);
        }
        return values;
    }

    private void add(Wave wave) {
        RadialFactors transform = new RadialFactors();
        Couplings couplings = new Couplings(wave);
        for (int i = 0; i < rings.length; i++) {
            if (active[i]) {
                rings[i].at(wave, transform);
            } else {
                rings[i].passOnly(wave);
            }
        }
        for (int i = 0; i < rings.length; i++) {
            if (active[i]) {
                within(i, couplings);
                below(i, wave, couplings);
            }
        }
        volumes(wave, couplings);
        wall.set(wave, rings, active, lowest);
        wall.addPairs(couplings, active, re, im);
        wall.addVolumes(couplings, active, columnRe, columnIm);
        wall.addFoot(wave, slot, active, columnRe, columnIm);
    }

    private void within(int i, Couplings couplings) {
        RingTransform ring = rings[i];
        for (int c = 0; c < RingTransform.SURFACE; c++) {
            for (int d = 0; d < RingTransform.DENSITIES; d++) {
                int at = (c * RingTransform.DENSITIES + d) * Twin.SIZE;
                couple(couplings, i, c, i, d, 0, ring.level, at);
                if (!ring.single()) {
                    // of surface densities, c below d is d above c
                    int turned = (d * RingTransform.DENSITIES + c) * Twin.SIZE;
                    couple(couplings, i, c, i, d, 1, ring.above, at);
                    if (d < RingTransform.SURFACE) {
                        couple(couplings, i, c, i, d, -1, ring.above, turned);
                    } else {
                        couple(couplings, i, c, i, d, -1, ring.below, at);
                    }
                }
            }
        }
    }

    /** Ring i as test of every ring below it; the matrix is symmetric. */
    private void below(int i, Wave wave, Couplings couplings) {
        Twin.one(through, 0);
        for (int j = i - 1; j >= 0; j--) {
            if (active[j]) {
                for (int d = 0; d < RingTransform.SURFACE; d++) {
                    int at = d * Twin.SIZE;
                    Twin.multiply(through, 0, rings[j].down, at, seen, at, wave.dRe, wave.dIm);
                    for (int c = 0; c < RingTransform.SURFACE; c++) {
                        Twin.multiply(rings[i].up, c * Twin.SIZE, seen, at, product, 0, wave.dRe, wave.dIm);
                        couple(couplings, i, c, j, d, 1, product, 0);
                    }
                }
            }
            Twin.multiply(through, 0, rings[j].pass, 0, through, 0, wave.dRe, wave.dIm);
            if (through[0] < FADED) {
                return;
            }
        }
    }

    /** What the displaced fluid below and above each ring does to it: two sweeps. */
    private void volumes(Wave wave, Couplings couplings) {
        Arrays.fill(seen, 0.0);
        for (int i = 0; i < rings.length; i++) {
            pass(i, 1, wave, couplings);
        }
        Arrays.fill(seen, 0.0);
        for (int i = rings.length - 1; i >= 0; i--) {
            pass(i, -1, wave, couplings);
        }
    }

    private void pass(int i, int side, Wave wave, Couplings couplings) {
        double[] test = side > 0 ? rings[i].up : rings[i].down;
        double[] source = side > 0 ? rings[i].down : rings[i].up;
        for (int d = RingTransform.SURFACE; d < RingTransform.DENSITIES; d++) {
            int at = d * Twin.SIZE;
            for (int c = 0; active[i] && c < RingTransform.SURFACE; c++) {
                Twin.multiply(test, c * Twin.SIZE, seen, at, product, 0, wave.dRe, wave.dIm);
                couple(couplings, i, c, i, d, side, product, 0);
            }
            Twin.multiply(seen, at, rings[i].pass, 0, seen, at, wave.dRe, wave.dIm);
            if (active[i]) {
                Twin.addScaled(1.0, source, at, seen, at);
            }
        }
    }

    private void couple(Couplings k, int i, int c, int j, int d, int side, double[] twin, int at) {
        int source = RingTransform.kind(d);
        int kind = Couplings.kind(c, source);
        int sign = Couplings.sign(c, source, side);
        double real =
                sign * (k.valueRe[kind] * twin[at] + k.slopeRe[kind] * twin[at + 1] - k.slopeIm[kind] * twin[at + 2]);
        double imaginary =
                sign * (k.valueIm[kind] * twin[at] + k.slopeRe[kind] * twin[at + 2] + k.slopeIm[kind] * twin[at + 1]);
        int row = RingTransform.SURFACE * i + c;
        if (d < RingTransform.SURFACE) {
            re[row][RingTransform.SURFACE * j + d] += real;
            im[row][RingTransform.SURFACE * j + d] += imaginary;
        } else {
            columnRe[d - RingTransform.SURFACE][row] += real;
            columnIm[d - RingTransform.SURFACE][row] += imaginary;
        }
    }

    private void addTail(int i, Complex[][] tail) {
        int at = RingTransform.SURFACE * i;
        for (int c = 0; c < RingTransform.SURFACE; c++) {
            for (int d = 0; d < RingTransform.SURFACE; d++) {
                re[at + c][at + d] += tail[c][d].getReal();
                im[at + c][at + d] += tail[c][d].getImaginary();
            }
        }
    }
}
