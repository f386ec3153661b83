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

class BesselIValidationTest {
    @Test
    void agreesWithArbitraryPrecisionInTheHalfPlane() {
        ReferenceTable table = ReferenceTable.of(getClass(), "bessel-i.csv");
        assertThat(table.rows()).hasSize(144);
        for (Map<String, String> row : table.rows()) {
            Complex z = new Complex(number(row, "re"), number(row, "im"));
            BesselI pair = BesselI.of(z);
            close(pair.i0(), row, "i0", z);
            close(pair.i1(), row, "i1", z);
        }
    }

    /** I₀ K₁ + I₁ K₀ = 1/z, each from its own routine. */
    @ParameterizedTest
    @CsvSource({"0.001, 0.001", "1.0, 1.0", "0.1, 3.0", "2.0, 10.0", "15.0, 1.0", "40.0, -90.0"})
    void keepsTheWronskian(double re, double im) {
        Complex z = new Complex(re, im);
        BesselI i = BesselI.of(z);
        BesselK k = BesselK.of(z);
        Complex one = i.i0().multiply(k.k1()).add(i.i1().multiply(k.k0())).multiply(z);
        assertThat(one.subtract(1.0).norm()).isCloseTo(0.0, within(1e-14));
    }

    @Test
    void startsAtOneAndHalfTheArgument() {
        assertThat(BesselI.of(Complex.ZERO).i0()).isEqualTo(Complex.ONE);
        assertThat(BesselI.of(Complex.ZERO).i1()).isEqualTo(Complex.ZERO);
    }

    @ParameterizedTest
    @CsvSource({"-1e-9, 1.0", "NaN, 1.0", "1.0, NaN", "Infinity, 0.0"})
    void refusesWhatIsNotInTheHalfPlane(double re, double im) {
        Complex z = new Complex(re, im);
        assertThatThrownBy(() -> BesselI.of(z)).isInstanceOf(IllegalArgumentException.class);
    }

    private static void close(Complex value, Map<String, String> row, String column, Complex z) {
        Complex expected = new Complex(number(row, column + "_re"), number(row, column + "_im"));
        assertThat(value.subtract(expected).norm() / expected.norm())
                .as("%s at %s", column, z)
                .isCloseTo(0.0, within(1e-14));
    }
}
