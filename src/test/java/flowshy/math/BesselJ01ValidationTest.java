package flowshy.math;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.hipparchus.special.BesselJ;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BesselJ01ValidationTest {
    private final double[] pair = new double[2];

    /** Arbitrary precision, 40 digits; the script stands beside the table. */
    @Test
    void agreesWithArbitraryPrecision() {
        ReferenceTable table = ReferenceTable.of(BesselJ01ValidationTest.class, "bessel-j.csv");
        assertThat(table.rows()).hasSize(40);
        for (Map<String, String> row : table.rows()) {
            double x = ReferenceTable.number(row, "x");
            BesselJ01.at(x, pair);
            assertThat(pair[0]).as("J0(%s)", x).isCloseTo(ReferenceTable.number(row, "j0"), within(2e-15));
            assertThat(pair[1]).as("J1(%s)", x).isCloseTo(ReferenceTable.number(row, "j1"), within(2e-15));
        }
    }

    /** Another routine between the rows and at the seams of the intervals; its own error grows to about 1e-14. */
    @Test
    void agreesWithTheLibraryEverywhere() {
        int points = 0;
        for (double x = 1e-3; x < 300.0; x += 0.0317) {
            BesselJ01.at(x, pair);
            assertThat(pair[0]).as("J0(%s)", x).isCloseTo(BesselJ.value(0.0, x), within(2e-14));
            assertThat(pair[1]).as("J1(%s)", x).isCloseTo(BesselJ.value(1.0, x), within(2e-14));
            points++;
        }
        assertThat(points).isGreaterThan(9000);
    }

    /** The small argument keeps its digits: J₁ ≈ x/2. */
    @Test
    void firstOrderKeepsItsDigitsNearZero() {
        BesselJ01.at(1e-3, pair);
        assertThat(pair[1] / 4.999999375000026e-4).isCloseTo(1.0, within(1e-12));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1e-9, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesWhatIsNegativeOrNotFinite(double x) {
        assertThatThrownBy(() -> BesselJ01.at(x, pair)).isInstanceOf(IllegalArgumentException.class);
    }
}
