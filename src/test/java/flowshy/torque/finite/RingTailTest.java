package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.GaussLegendre;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The closed tails against the waves that they stand for, summed one by one up to six times the cut-off. */
class RingTailTest {
    private static final int SURFACE = RingTransform.SURFACE;
    private static final GaussLegendre RULE = GaussLegendre.of(16);

    /** Cut-off in units of one over the ring's length; the tail's next term is smaller than the ends' by one over this. */
    private static final double CUT = 20.0;

    private static final double FAR = 6.0;
    private static final double LENGTH = 0.05;

    private static Ring ring(double radius, double height, double width, double thickness) {
        int pieces = width == 0.0 || thickness == 0.0 ? 1 : 120;
        List<MeridianPoint> points = new ArrayList<>();
        for (int n = 0; n <= pieces; n++) {
            points.add(new MeridianPoint(radius + width * n / pieces, height + thickness * n / pieces));
        }
        return Ring.through(points);
    }

    /**
     * Upright, flat and leaning rings on themselves, in units of v = r/(4K²): the tail is some 80 of them for an upright ring, 3 for a
     * flat one, where the next term still turns with the width; the stairs of a leaning one leave half a per cent.
     */
    @ParameterizedTest
    @CsvSource({"0, 1, 0.12", "-1, 0, 0.3", "1, 0, 0.3", "0.6, 0.8, 0.6", "-0.8, 0.6, 0.6"})
    void ringOnItself(double sine, double cosine, double tolerance) {
        Ring ring = ring(1.0, 3.0, LENGTH * sine, LENGTH * cosine);
        double from = CUT / LENGTH;
        double[][] summed = new double[SURFACE][SURFACE];
        forEachWave(from, FAR * from, wave -> {
            RingTransform transform = new RingTransform(ring);
            transform.at(wave, new RadialFactors());
            Couplings k = new Couplings(wave);
            for (int c = 0; c < SURFACE; c++) {
                for (int d = 0; d < SURFACE; d++) {
                    summed[c][d] += couple(k, c, d, 0, transform.level, (c * RingTransform.DENSITIES + d) * Twin.SIZE);
                    if (!transform.single()) {
                        summed[c][d] +=
                                couple(k, c, d, 1, transform.above, (c * RingTransform.DENSITIES + d) * Twin.SIZE);
                        summed[c][d] +=
                                couple(k, c, d, -1, transform.above, (d * RingTransform.DENSITIES + c) * Twin.SIZE);
                    }
                }
            }
        });
        hold(summed, difference(RingTail.of(ring, from, 0.0), RingTail.of(ring, FAR * from, 0.0)), from, tolerance);
    }

    /** Two rings that meet: straight on, at a flat tip's edge, at a shoulder, at a slight bend. */
    @ParameterizedTest
    @CsvSource({"0, 1, 0, 1", "-1, 0, 0, 1", "1, 0, 0, 1", "0, 1, 1, 0", "-0.6, 0.8, 0, 1", "-1, 0, 0.6, 0.8"})
    void ringOnTheOneBelow(double upperSine, double upperCosine, double lowerSine, double lowerCosine) {
        Ring lower = ring(1.0 - LENGTH * lowerSine, 3.0, LENGTH * lowerSine, LENGTH * lowerCosine);
        Ring upper = ring(1.0, 3.0 + LENGTH * lowerCosine, LENGTH * upperSine, LENGTH * upperCosine);
        double from = CUT / LENGTH;
        double[][] summed = new double[SURFACE][SURFACE];
        forEachWave(from, FAR * from, wave -> {
            RingTransform above = new RingTransform(upper);
            above.at(wave, new RadialFactors());
            RingTransform below = new RingTransform(lower);
            below.at(wave, new RadialFactors());
            Couplings k = new Couplings(wave);
            double[] twin = new double[Twin.SIZE];
            for (int c = 0; c < SURFACE; c++) {
                for (int d = 0; d < SURFACE; d++) {
                    Twin.multiply(above.up, c * Twin.SIZE, below.down, d * Twin.SIZE, twin, 0, wave.dRe, wave.dIm);
                    summed[c][d] += couple(k, c, d, 1, twin, 0);
                }
            }
        });
        double[][] tail = RingTail.joint(upper, lower, from);
        double[][] rest = RingTail.joint(upper, lower, FAR * from);
        for (int c = 0; c < SURFACE; c++) {
            for (int d = 0; d < SURFACE; d++) {
                tail[c][d] -= rest[c][d];
            }
        }
        hold(summed, tail, from, 0.12);
    }

    private static void hold(double[][] summed, double[][] tail, double from, double tolerance) {
        double size = 1.0 / (4.0 * from * from);
        for (int c = 0; c < SURFACE; c++) {
            for (int d = 0; d < SURFACE; d++) {
                assertThat((tail[c][d] - summed[c][d]) / size).as("%d %d", c, d).isCloseTo(0.0, within(tolerance));
            }
        }
    }

    private interface WaveSum {
        void add(Wave wave);
    }

    private static void forEachWave(double from, double to, WaveSum sum) {
        double step = 2.0; // twelve points a turn of the product of two Bessel functions at radius 1
        for (double low = from; low < to; low += step) {
            for (int n = 0; n < RULE.size(); n++) {
                sum.add(new Wave(low + 0.5 * step * (1.0 + RULE.point(n)), 0.5 * step * RULE.weight(n), 0.0));
            }
        }
    }

    private static double couple(Couplings k, int c, int d, int side, double[] twin, int at) {
        int kind = Couplings.kind(c, d);
        return Couplings.sign(c, d, side) * (k.valueRe[kind] * twin[at] + k.slopeRe[kind] * twin[at + 1]);
    }

    private static double[][] difference(Complex[][] near, Complex[][] far) {
        double[][] real = new double[SURFACE][SURFACE];
        for (int c = 0; c < SURFACE; c++) {
            for (int d = 0; d < SURFACE; d++) {
                real[c][d] = near[c][d].getReal() - far[c][d].getReal();
            }
        }
        return real;
    }
}
