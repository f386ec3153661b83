package flowshy.cylinder;

import static flowshy.math.ReferenceTable.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.ReferenceTable;
import flowshy.medium.Medium;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class SheddingValidationTest {
    /** The measured vortices were oblique, 2.8 % slower on average; 4 % covers it. */
    @Test
    void agreesWithMeasuredFrequencies() {
        ReferenceTable table = ReferenceTable.of(getClass(), "strouhal-1989.csv");
        assertThat(table.rows()).hasSize(7);
        for (Map<String, String> row : table.rows()) {
            double re = number(row, "reynolds");
            assertThat(Shedding.strouhal(re) / number(row, "strouhal"))
                    .as("Re = %s", re)
                    .isCloseTo(1.0, within(0.04));
        }
    }

    /** Another fit to parallel shedding: Williamson 1988, −3.3265/Re + 0.1816 + 1.6e-4 Re; prints 0.1643 and 0.1834. */
    @ParameterizedTest
    @CsvSource({
        "50, 0.12307, 0.01",
        "60, 0.13575833, 0.009",
        "100, 0.1643, 0.004",
        "150, 0.1834, 0.004",
        "178, 0.1914, 0.005"
    })
    void agreesWithAnotherFitToParallelShedding(double re, double williamson, double tolerance) {
        assertThat(Shedding.strouhal(re) / williamson).isCloseTo(1.0, within(tolerance));
    }

    /** Roshko 1954, NACA TR 1191: 0.212 (1 − 21.2/Re) from 50 to 150, 0.212 (1 − 12.7/Re) from 300 to 2000. */
    @ParameterizedTest
    @CsvSource({"60, 21.2", "100, 21.2", "150, 21.2", "300, 12.7", "500, 12.7", "1000, 12.7", "2000, 12.7"})
    void agreesWithRoshko(double re, double constant) {
        assertThat(Shedding.strouhal(re) / (0.212 * (1.0 - constant / re))).isCloseTo(1.0, within(0.025));
    }

    /** The fit evaluated apart, with 30 digits. */
    @ParameterizedTest
    @CsvSource({
        "50, 0.12194404",
        "80, 0.1526164",
        "120, 0.17386309",
        "180, 0.19121093",
        "500, 0.20601366",
        "1000, 0.21177965",
        "2000, 0.21152213",
        "4500, 0.20901476",
        "6000, 0.20603157",
        "50000, 0.18744899"
    })
    void isTheFitOfParallelShedding(double re, double expected) {
        assertThat(Shedding.strouhal(re)).isCloseTo(expected, within(6e-9));
    }

    /** Fey et al. fitted piece by piece; the joints differ by less than 0.2 %. */
    @ParameterizedTest
    @ValueSource(doubles = {180.0, 360.0, 1300.0, 5000.0})
    void joinsItsPieces(double joint) {
        assertThat(Shedding.strouhal(joint * 1.0000001) / Shedding.strouhal(joint))
                .isCloseTo(1.0, within(0.002));
    }

    /** The line in 1/√Re through the values at 180 and 360, evaluated apart. */
    @Test
    void bridgesTheTransitionOfTheWake() {
        assertThat(Shedding.strouhal(250.0)).isCloseTo(0.19704886, within(2e-6));
    }

    /** About 0.2 throughout the irregular range, common practice. */
    @ParameterizedTest
    @ValueSource(doubles = {300.0, 1e3, 1e4, 1e5})
    void isAboutAFifthInFastStreams(double re) {
        assertThat(Shedding.strouhal(re)).isCloseTo(0.2, within(0.017));
    }

    @Test
    void startsAtItsOnsetAndGivesAFrequency() {
        // ν = 1.5e-5, d = 1e-4: Re = 100 at 15 m/s
        Shedding hair = new Shedding(5e-5, Medium.of("gas", 1.2, 1.8e-5));
        assertThat(hair.sheds(7.0)).isFalse();
        assertThat(hair.sheds(-7.1)).isTrue();
        assertThat(hair.sheds(15.0)).isTrue();
        assertThat(hair.frequency(-15.0)).isCloseTo(0.16484 * 15.0 / 1e-4, within(0.01));
        assertThatThrownBy(() -> hair.frequency(6.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Shedding.strouhal(Double.NaN)).isInstanceOf(IllegalArgumentException.class);
        Medium medium = hair.medium();
        assertThatThrownBy(() -> new Shedding(-1.0, medium)).isInstanceOf(IllegalArgumentException.class);
    }
}
