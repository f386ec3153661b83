package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.ReferenceTable;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;

class WaveTest {
    /** Values and divided differences by arbitrary precision, from equal to widely different κ and q. */
    @Test
    void layersAgreeWithArbitraryPrecision() {
        ReferenceTable table = ReferenceTable.of(WaveTest.class, "wave-layers.csv");
        assertThat(table.rows()).hasSize(48);
        for (Map<String, String> row : table.rows()) {
            double kappa = ReferenceTable.number(row, "kappa");
            double height = ReferenceTable.number(row, "h");
            Wave wave = new Wave(kappa, 1.0, ReferenceTable.number(row, "beta"));
            double[] thick = new double[Twin.SIZE];
            double[] pass = new double[Twin.SIZE];
            double[] self = new double[Twin.SIZE];
            wave.layer(height, thick, 0, pass, 0);
            wave.self(height, thick, 0, self, 0);
            hold(thick, row, "e");
            hold(pass, row, "p");
            hold(self, row, "s");
        }
    }

    /** Value and slope each to a relative 1e-12; e^{−κh} below 1e-19 counts as nothing. */
    private static void hold(double[] twin, Map<String, String> row, String name) {
        double value = ReferenceTable.number(row, name);
        Complex slope = new Complex(
                ReferenceTable.number(row, "d" + name + "_re"), ReferenceTable.number(row, "d" + name + "_im"));
        assertThat(twin[0]).as("%s %s", name, row).isCloseTo(value, within(1e-12 * value + 1e-19));
        assertThat(slope.subtract(new Complex(twin[1], twin[2])).norm())
                .as("Δ%s %s", name, row)
                .isCloseTo(0.0, within(1e-12 * slope.norm() + 1e-18));
    }

    /** q² = κ² + iβ, and q − κ without cancellation. */
    @Test
    void rootAndItsDifference() {
        Wave wave = new Wave(1e5, 1.0, 1e-3);
        Complex q = wave.q();
        assertThat(q.multiply(q).getImaginary()).isCloseTo(1e-3, within(1e-15));
        assertThat(wave.dIm).isCloseTo(0.5e-8, within(1e-20));
    }
}
