package flowshy.torque.finite;

import java.util.Arrays;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

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

    private final List<Ring> outline;
    private final RingTransform[] all;
    private final FootSlot slot;
    private final double[] through = new double[Twin.SIZE];
    private final double[] seen = new double[RingTransform.DENSITIES * Twin.SIZE];
    private final double[] product = new double[Twin.SIZE];
    private final TestTwins test = new TestTwins();
    private final RadialFactors radial = new RadialFactors();
    private final WallWave wall;

    /** Rings that still act at the wavenumbers of the panel, from the foot to the tip, and the way up to each. */
    private int active;

    private final int[] index;
    private final RingTransform[] rings;
    private final double[] gap;
    private final double[] between;

    private LayerSystem(List<Ring> rings, FootSlot slot) {
        this.outline = rings;
        this.all = rings.stream().map(RingTransform::new).toArray(RingTransform[]::new);
        this.size = RingTransform.SURFACE * rings.size();
        this.re = new double[size][size];
        this.im = new double[size][size];
        this.columnRe = new double[COLUMNS][size];
        this.columnIm = new double[COLUMNS][size];
        this.slot = slot;
        this.wall = new WallWave(rings.size());
        this.index = new int[rings.size()];
        this.rings = new RingTransform[rings.size()];
        this.gap = new double[rings.size()];
        this.between = new double[Twin.SIZE * rings.size()];
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
            system.choose(panel, cutoffs, reached);
            for (int n = 0; n < panel.size(); n++) {
                system.add(panel.wave(n, beta));
            }
        }
        for (int i = 0; i < cutoffs.length; i++) {
            system.addTail(i, RingTail.of(rings.get(i), reached[i], beta));
            if (i > 0) {
                double from = FastMath.min(reached[i - 1], reached[i]);
                system.addJoint(i, RingTail.joint(rings.get(i), rings.get(i - 1), from));
            }
        }
        return system;
    }

    private void choose(WavePanels panel, double[] cutoffs, double[] reached) {
        active = 0;
        double top = 0.0;
        for (int i = 0; i < cutoffs.length; i++) {
            if (cutoffs[i] > panel.from()) {
                reached[i] = panel.to();
                index[active] = i;
                rings[active] = all[i];
                gap[active] = outline.get(i).bottom() - top;
                top = outline.get(i).top();
                active++;
            }
        }
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
        Couplings couplings = new Couplings(wave);
        for (int i = 0; i < active; i++) {
            rings[i].at(wave, radial);
            wave.pass(gap[i], between, Twin.SIZE * i);
        }
        for (int i = 0; i < active; i++) {
            within(i, couplings);
            below(i, wave, couplings);
        }
        volumes(wave, couplings);
        wall.set(wave, rings, between, active);
        wall.addPairs(couplings, index, re, im);
        wall.addVolumes(couplings, index, columnRe, columnIm);
        wall.addFoot(wave, slot, index, columnRe, columnIm);
    }

    private void within(int i, Couplings couplings) {
        RingTransform ring = rings[i];
        for (int c = 0; c < RingTransform.SURFACE; c++) {
            for (int d = 0; d < RingTransform.DENSITIES; d++) {
                int at = (c * RingTransform.DENSITIES + d) * Twin.SIZE;
                couple(couplings, i, c, d, 0, ring.level, at);
                if (!ring.single()) {
                    // of surface densities, c below d is d above c
                    int turned = (d * RingTransform.DENSITIES + c) * Twin.SIZE;
                    couple(couplings, i, c, d, 1, ring.above, at);
                    if (d < RingTransform.SURFACE) {
                        couple(couplings, i, c, d, -1, ring.above, turned);
                    } else {
                        couple(couplings, i, c, d, -1, ring.below, at);
                    }
                }
            }
        }
    }

    /** Ring i as test of every ring below it; the matrix is symmetric. */
    private void below(int i, Wave wave, Couplings couplings) {
        test.set(couplings, rings[i].up, wave);
        Twin.one(through, 0);
        int row = RingTransform.SURFACE * index[i];
        for (int j = i - 1; j >= 0; j--) {
            if (gap[j + 1] > 0.0) {
                Twin.multiply(through, 0, between, Twin.SIZE * (j + 1), through, 0, wave.dRe, wave.dIm);
            }
            for (int d = 0; d < RingTransform.SURFACE; d++) {
                Twin.multiply(through, 0, rings[j].down, d * Twin.SIZE, seen, 0, wave.dRe, wave.dIm);
                test.add(d, seen, re, im, row, RingTransform.SURFACE * index[j] + d);
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
        for (int i = 0; i < active; i++) {
            cross(i, wave);
            pass(i, 1, wave, couplings);
        }
        Arrays.fill(seen, 0.0);
        for (int i = active - 1; i >= 0; i--) {
            pass(i, -1, wave, couplings);
            cross(i, wave);
        }
    }

    /** The waves of the volumes through the gap under ring i. */
    private void cross(int i, Wave wave) {
        for (int d = RingTransform.SURFACE; gap[i] > 0.0 && d < RingTransform.DENSITIES; d++) {
            Twin.multiply(seen, d * Twin.SIZE, between, Twin.SIZE * i, seen, d * Twin.SIZE, wave.dRe, wave.dIm);
        }
    }

    private void pass(int i, int side, Wave wave, Couplings couplings) {
        double[] met = side > 0 ? rings[i].up : rings[i].down;
        double[] source = side > 0 ? rings[i].down : rings[i].up;
        for (int d = RingTransform.SURFACE; d < RingTransform.DENSITIES; d++) {
            int at = d * Twin.SIZE;
            for (int c = 0; c < RingTransform.SURFACE; c++) {
                Twin.multiply(met, c * Twin.SIZE, seen, at, product, 0, wave.dRe, wave.dIm);
                couple(couplings, i, c, d, side, product, 0);
            }
            Twin.multiply(seen, at, rings[i].pass, 0, seen, at, wave.dRe, wave.dIm);
            Twin.addScaled(1.0, source, at, seen, at);
        }
    }

    private void couple(Couplings k, int i, int c, int d, int side, double[] twin, int at) {
        int source = RingTransform.kind(d);
        int kind = Couplings.kind(c, source);
        int sign = Couplings.sign(c, source, side);
        double real =
                sign * (k.valueRe[kind] * twin[at] + k.slopeRe[kind] * twin[at + 1] - k.slopeIm[kind] * twin[at + 2]);
        double imaginary =
                sign * (k.valueIm[kind] * twin[at] + k.slopeRe[kind] * twin[at + 2] + k.slopeIm[kind] * twin[at + 1]);
        int row = RingTransform.SURFACE * index[i] + c;
        if (d < RingTransform.SURFACE) {
            re[row][row - c + d] += real;
            im[row][row - c + d] += imaginary;
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

    private void addJoint(int i, double[][] tail) {
        int at = RingTransform.SURFACE * i;
        for (int c = 0; c < RingTransform.SURFACE; c++) {
            for (int d = 0; d < RingTransform.SURFACE; d++) {
                re[at + c][at - RingTransform.SURFACE + d] += tail[c][d];
            }
        }
    }
}
