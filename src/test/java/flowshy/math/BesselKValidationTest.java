package flowshy.math;

import static flowshy.math.ReferenceTable.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

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
            Complex z = new Complex(number(row, "re"), number(row, "im"));
            close(BesselK.scaledK0(z), row, "k0", z);
            close(BesselK.scaledK1(z), row, "k1", z);
            close(BesselK.ratio(z), row, "ratio", z);
        }
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
        Complex expected = new Complex(number(row, column + "_re"), number(row, column + "_im"));
        assertThat(value.subtract(expected).norm() / expected.norm())
                .as("%s at %s", column, z)
                .isCloseTo(0.0, within(TOLERANCE));
    }
}
