package flowshy.cylinder;

import static flowshy.math.ReferenceTable.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.ReferenceTable;
import java.util.Map;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DragCoefficientValidationTest {
    /** The solution's own error, 0.1 %, and that of the quartic, 0.13 %; between 0.1 and 0.3 Kaplun's law leaves. */
    @Test
    void agreesWithTheTwoDimensionalSolution() {
        ReferenceTable table = ReferenceTable.of(getClass(), "steady-drag-reference.csv");
        assertThat(table.rows()).hasSize(21);
        for (Map<String, String> row : table.rows()) {
            double re = number(row, "reynolds");
            assertThat(DragCoefficient.of(re) / number(row, "drag_coefficient"))
                    .as("Re = %s", re)
                    .isCloseTo(1.0, within(re < 0.1 ? 3e-4 : 1.5e-3));
        }
    }

    /**
     * Published steady solutions: Dennis &amp; Chang 1970 (from memory; their outer boundary is nearer, which lifts the slow
     * ones), Fornberg 1985 (second hand), Tritton 1959 measured (second hand, "about").
     */
    @ParameterizedTest
    @CsvSource({
        "5, 4.116, 0.05",
        "7, 3.421, 0.04",
        "10, 2.846, 0.035",
        "20, 2.045, 0.02",
        "40, 1.522, 0.015",
        "40, 1.498, 0.01",
        "20, 2.05, 0.03",
        "40, 1.54, 0.03"
    })
    void agreesWithPublishedSolutions(double re, double printed, double tolerance) {
        assertThat(DragCoefficient.of(re) / printed).isCloseTo(1.0, within(tolerance));
    }

    /** Binned means of digitised handbook points (seen); they scatter by 5 to 8 % above Re = 10. */
    @ParameterizedTest
    @CsvSource({
        "73, 1.345",
        "126, 1.349",
        "209, 1.298",
        "438, 1.122",
        "1320, 0.961",
        "2460, 0.919",
        "4580, 0.975",
        "8170, 1.061",
        "13800, 1.097",
        "44000, 1.144"
    })
    void agreesWithMeasuredDrag(double re, double measured) {
        assertThat(DragCoefficient.of(re) / measured).isCloseTo(1.0, within(0.08));
    }

    /** Sucker and Brauer's formula evaluated apart with 40 digits, and Cheng 2013 (seen), another fit to measured drag. */
    @ParameterizedTest
    @CsvSource({
        "1000, 0.96326365, 0.98424383",
        "2000, 0.90593902, 0.91013517",
        "10000, 1.094521, 1.0878765",
        "100000, 1.1754533, 1.2107239"
    })
    void agreesWithPublishedFits(double re, double suckerBrauer, double cheng) {
        assertThat(DragCoefficient.of(re)).isCloseTo(suckerBrauer, within(6e-8 * suckerBrauer));
        assertThat(DragCoefficient.of(re) / cheng).isCloseTo(1.0, within(0.035));
    }

    /** Kaplun's law evaluated apart with 40 digits; the limit of creeping flow is the logarithmic law of Lamb. */
    @ParameterizedTest
    @CsvSource({"0.001, 2789.9381", "0.01, 372.81989", "0.1, 55.651758"})
    void isKaplunsLawInSlowFlow(double re, double kaplun) {
        assertThat(DragCoefficient.of(re) / kaplun).isCloseTo(1.0, within(2e-8));
    }

    @Test
    void tendsToLambsLaw() {
        double re = 1e-30;
        double lamb = 8.0 * FastMath.PI / (re * FastMath.log(7.4060 / re));
        // Kaplun's next term is 0.87 ε², ε = 1/ln(7.4/Re)
        assertThat(DragCoefficient.of(re) / lamb).isCloseTo(1.0, within(2e-4));
    }

    /** The quartic evaluated apart. */
    @ParameterizedTest
    @CsvSource({"0.5, 16.613879", "1, 10.333605", "5, 3.9346911", "20, 2.0078125", "40, 1.5069552"})
    void isTheQuarticBetween(double re, double fit) {
        assertThat(DragCoefficient.of(re) / fit).isCloseTo(1.0, within(3e-8));
    }

    /** The smooth steps in ln C_d over ln Re, evaluated apart with 30 digits. */
    @ParameterizedTest
    @CsvSource({
        "0.13, 45.29793242",
        "0.2, 32.54835369",
        "0.25, 27.52724837",
        "60, 1.346616152",
        "80, 1.321889149",
        "120, 1.355578607"
    })
    void stepsSmoothlyFromLawToLaw(double re, double expected) {
        assertThat(DragCoefficient.of(re) / expected).isCloseTo(1.0, within(1e-9));
    }

    /** Slope against a central difference, in every law and both joints. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-8, 0.05, 0.12, 0.2, 0.28, 1.0, 30.0, 50.0, 90.0, 150.0, 500.0, 3000.0, 1e5})
    void hasTheSlopeOfItsValues(double re) {
        double step = 1e-5;
        double difference = (FastMath.log(DragCoefficient.of(re * FastMath.exp(step)))
                        - FastMath.log(DragCoefficient.of(re * FastMath.exp(-step))))
                / (2.0 * step);
        assertThat(DragCoefficient.slope(re)).isCloseTo(difference, within(1e-8));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.1, 0.3, 40.0, 160.0})
    void joinsWithoutStepOrKink(double joint) {
        double above = joint * (1.0 + 1e-12);
        double below = joint * (1.0 - 1e-12);
        assertThat(DragCoefficient.of(above) / DragCoefficient.of(below)).isCloseTo(1.0, within(1e-11));
        assertThat(DragCoefficient.slope(above)).isCloseTo(DragCoefficient.slope(below), within(1e-10));
    }

    /** C_d Re rises, and so does the force, at every speed. */
    @Test
    void dragsMoreTheFasterTheStream() {
        double before = 0.0;
        int points = 0;
        for (double re = 1e-9; re < 1e5; re *= 1.02) {
            double now = re * DragCoefficient.of(re);
            assertThat(now).as("Re = %s", re).isGreaterThan(before);
            assertThat(DragCoefficient.slope(re)).isGreaterThan(-1.0);
            before = now;
            points++;
        }
        assertThat(points).isGreaterThan(1500);
    }

    @Test
    void saysHowSureItIs() {
        assertThat(DragCoefficient.uncertainty(1.0)).isEqualTo(0.10);
        assertThat(DragCoefficient.uncertainty(1000.0)).isEqualTo(0.05);
        assertThat(DragCoefficient.uncertainty(9e4)).isEqualTo(0.08);
        assertThatThrownBy(() -> DragCoefficient.uncertainty(1.1e5)).isInstanceOf(IllegalArgumentException.class);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -1.0, 2.1e5, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesWhatItDoesNotCover(double re) {
        assertThatThrownBy(() -> DragCoefficient.of(re)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> DragCoefficient.slope(re)).isInstanceOf(IllegalArgumentException.class);
    }
}
