package flowshy.math;

import static flowshy.math.ReferenceTable.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BesselKValidationTest {
    /** The aim of 1e-14 relative to the modulus; measured below 3e-15. */
    private static final double TOLERANCE = 1e-14;

    @Test
    void agreesWithArbitraryPrecisionInTheHalfPlane() {
        ReferenceTable table = ReferenceTable.of(getClass(), "bessel-k.csv");
        assertThat(table.rows()).hasSize(216);
        for (Map<String, String> row : table.rows()) {
            Complex z = argument(row);
            close(BesselK.scaledK0(z), row, "k0", z);
            close(BesselK.scaledK1(z), row, "k1", z);
            close(BesselK.ratio(z), row, "ratio", z);
        }
    }

    /** K₁ at one place over K₀ at the next, from the same table: series by series, and across the three routes. */
    @Test
    void quotientOfTwoPlacesIsThatOfTheTable() {
        List<Map<String, String>> rows =
                ReferenceTable.of(getClass(), "bessel-k.csv").rows();
        int series = 0;
        for (int i = 0; i < rows.size(); i++) {
            for (int j : new int[] {i, (i + 1) % rows.size(), (i + 9) % rows.size()}) {
                Complex above = argument(rows.get(i));
                Complex below = argument(rows.get(j));
                Complex shift = below.subtract(above);
                if (shift.norm() > 100.0) { // its exponential loses digits, on either side
                    continue;
                }
                Complex expected = value(rows.get(i), "k1")
                        .divide(value(rows.get(j), "k0"))
                        .multiply(shift.exp());
                for (double length : new double[] {1.0, 3e-4}) {
                    Complex found = new BesselQuotient(above.divide(length), below.divide(length)).at(length);
                    assertThat(found.subtract(expected).norm() / expected.norm())
                            .as("K1 at %s over K0 at %s", above, below)
                            .isCloseTo(0.0, within(2.0 * TOLERANCE));
                }
                series += above.norm() < 1.5 && below.norm() < 1.5 ? 1 : 0;
            }
        }
        assertThat(series).isGreaterThan(100);
    }

    /** Conjugate arguments give conjugate values, to the last bit. */
    @ParameterizedTest
    @CsvSource({"0.3, 0.4", "2.0, 5.0", "0.0, 7.0", "30.0, 90.0"})
    void isRealOnTheRealAxisByReflection(double re, double im) {
        Complex above = BesselK.ratio(new Complex(re, im));
        Complex below = BesselK.ratio(new Complex(re, -im));
        assertThat(below.getReal()).isEqualTo(above.getReal());
        assertThat(below.getImaginary()).isEqualTo(-above.getImaginary());
    }

    @ParameterizedTest
    @CsvSource({"0.0, 0.0", "-1e-9, 1.0", "NaN, 1.0", "1.0, NaN", "Infinity, 0.0"})
    void refusesWhatIsNotInTheHalfPlane(double re, double im) {
        Complex z = new Complex(re, im);
        assertThatThrownBy(() -> BesselK.ratio(z)).isInstanceOf(IllegalArgumentException.class);
    }

    private static void close(Complex value, Map<String, String> row, String column, Complex z) {
        Complex expected = value(row, column);
        assertThat(value.subtract(expected).norm() / expected.norm())
                .as("%s at %s", column, z)
                .isCloseTo(0.0, within(TOLERANCE));
    }

    private static Complex argument(Map<String, String> row) {
        return new Complex(number(row, "re"), number(row, "im"));
    }

    private static Complex value(Map<String, String> row, String column) {
        return new Complex(number(row, column + "_re"), number(row, column + "_im"));
    }
}
