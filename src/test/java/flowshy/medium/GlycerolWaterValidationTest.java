package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Glycerol with water against printed tables and its pure parts. */
class GlycerolWaterValidationTest {
    private static Medium at(double massFraction, double celsius) {
        return Media.at(MediumQuery.of("glycerol", celsius + 273.15, 101325.0)
                .with(MediumParameter.MASS_FRACTION, massFraction));
    }

    /** Segur &amp; Oberstar 1951, Ind. Eng. Chem. 43:2117, mPa·s (printed digits from memory); Cheng's formula states up to 5 %. */
    @ParameterizedTest
    @CsvSource({"0.2, 20, 1.76", "0.5, 20, 6.00", "0.6, 20, 10.8", "0.8, 20, 60.1", "1.0, 20, 1410", "0.5, 25, 5.04"})
    void viscosityAgreesWithThePrintedTable(double massFraction, double celsius, double printed) {
        assertThat(1e3 * at(massFraction, celsius).viscosity()).isCloseTo(printed, withinPercentage(5.0));
    }

    /** Densities at 20 °C of the glycerol handbooks, kg/m³ (from memory); the formula states 0.2 %. */
    @ParameterizedTest
    @CsvSource({"0.2, 1046.9", "0.5, 1126.3", "0.8, 1208.5", "1.0, 1261.1"})
    void densityAgreesWithThePrintedTable(double massFraction, double printed) {
        assertThat(at(massFraction, 20.0).density()).isCloseTo(printed, withinPercentage(0.05));
    }

    /** Without glycerol it is water: Cheng's water within 1 %, Volk and Kähler's water within 0.05 % of the release. */
    @ParameterizedTest
    @CsvSource({"5", "20", "40", "80"})
    void withoutGlycerolItIsWater(double celsius) {
        Medium water = Media.at(MediumQuery.of("water", celsius + 273.15, 101325.0));
        assertThat(at(0.0, celsius).density()).isCloseTo(water.density(), withinPercentage(0.1));
        assertThat(at(0.0, celsius).viscosity()).isCloseTo(water.viscosity(), withinPercentage(2.0));
        assertThat(at(0.0, celsius).soundSpeed().orElseThrow())
                .isCloseTo(water.soundSpeed().orElseThrow(), withinPercentage(1e-9));
    }

    /** Glycerol at 25 °C carries sound at 1904 and at 1920 m/s in two tables (seen). */
    @Test
    void glycerolCarriesSoundAsTheTablesSay() {
        assertThat(at(1.0, 25.0).soundSpeed().orElseThrow()).isBetween(1904.0 - 1e-9, 1920.0);
    }

    @Test
    void flagsTheStretchedDensityAndTheCrystals() {
        assertThat(at(0.5, 20.0).caveats()).isEmpty();
        assertThat(at(0.5, 60.0).caveats()).hasSize(1);
        assertThat(at(0.95, 16.0).caveats()).hasSize(1);
    }

    @Test
    void boilsWithItsWater() {
        assertThatThrownBy(() -> Media.at(
                        MediumQuery.of("glycerol-water", 363.15, 5e4).with(MediumParameter.MASS_FRACTION, 0.2)))
                .isInstanceOfSatisfying(
                        OutOfTableException.class, e -> assertThat(e.why()).isEqualTo(OutOfTableException.Why.BOILS));
        assertThat(Media.at(MediumQuery.of("glycerol-water", 363.15, 5e4).with(MediumParameter.MASS_FRACTION, 0.9))
                        .density())
                .isPositive();
    }
}
