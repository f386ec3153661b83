package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.ReferenceTable;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

/** The kernels, free part and wall's part together, against the boundary-value problem solved apart. */
class CouplingsValidationTest {
    private static final int EVEN = 0;
    private static final int SECOND = 1;
    private static final int AXIAL = 2;

    /** Signs of S and R for the three densities, as the wall's wave has them. */
    private static final int[] SIGN_S = {1, -1, 1};

    private static final int[] SIGN_R = {1, -1, -1};

    @Test
    void pointForceOverTheWall() {
        ReferenceTable table = ReferenceTable.of(CouplingsValidationTest.class, "half-space-kernels.csv");
        assertThat(table.rows()).hasSize(18);
        for (Map<String, String> row : table.rows()) {
            double kappa = ReferenceTable.number(row, "kappa");
            Wave wave = new Wave(kappa, 1.0 / (FastMath.PI * kappa), ReferenceTable.number(row, "beta"));
            double high = ReferenceTable.number(row, "z");
            double low = ReferenceTable.number(row, "source");
            Complex even = kernel(wave, EVEN, EVEN, high, low);
            Complex mixed = kernel(wave, EVEN, SECOND, high, low);
            // densities e_x and second harmonic act as TT ± LL
            double scale = even.norm();
            hold(even.subtract(mixed).multiply(0.5), row, "ll", scale);
            hold(even.add(mixed).multiply(0.5), row, "tt", scale);
            hold(kernel(wave, AXIAL, AXIAL, high, low), row, "zz", scale);
            // the axial density carries −i as a source and +i as a test
            hold(kernel(wave, EVEN, AXIAL, high, low), row, "lz", scale);
            hold(kernel(wave, AXIAL, EVEN, high, low).negate(), row, "zl", scale);
            assertThat(kernel(wave, SECOND, AXIAL, high, low)
                            .add(kernel(wave, EVEN, AXIAL, high, low))
                            .norm())
                    .isCloseTo(0.0, within(1e-15 * scale));
        }
    }

    /** Test density c at the upper height, source density d at the lower. */
    private static Complex kernel(Wave wave, int c, int d, double high, double low) {
        Couplings k = new Couplings(wave);
        int kind = Couplings.kind(c, d);
        double[] between = new double[Twin.SIZE];
        wave.pass(high - low, between, 0);
        Complex direct = new Complex(k.slopeRe[kind], k.slopeIm[kind])
                .multiply(new Complex(between[1], between[2]))
                .add(new Complex(k.valueRe[kind], k.valueIm[kind]).multiply(between[0]))
                .multiply(Couplings.sign(c, d, 1));
        Complex s = s(wave, c, high);
        Complex r = r(wave, c, high);
        Complex sOther = s(wave, d, low);
        Complex rOther = r(wave, d, low);
        Complex near = new Complex(k.nearRe, k.nearIm);
        Complex wall = r.multiply(rOther)
                .multiply(new Complex(k.farRe, k.farIm))
                .add(near.multiply(r.multiply(sOther).add(s.multiply(rOther))))
                .add(new Complex(k.wallRe[kind], k.wallIm[kind]).multiply(s.multiply(sOther)));
        return direct.add(wall);
    }

    private static Complex s(Wave wave, int density, double z) {
        return wave.q().multiply(-z).exp().multiply(SIGN_S[density]);
    }

    private static Complex r(Wave wave, int density, double z) {
        double[] twin = new double[Twin.SIZE];
        wave.pass(z, twin, 0);
        return new Complex(twin[1], twin[2]).multiply(SIGN_R[density]);
    }

    private static void hold(Complex found, Map<String, String> row, String name, double scale) {
        Complex expected =
                new Complex(ReferenceTable.number(row, name + "_re"), ReferenceTable.number(row, name + "_im"));
        assertThat(found.subtract(expected).norm())
                .as("%s %s", name, row)
                .isCloseTo(0.0, within(1e-9 * expected.norm() + 1e-13 * scale));
    }
}
