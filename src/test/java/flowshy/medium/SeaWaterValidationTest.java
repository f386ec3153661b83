package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Sea water against printed check values and against another equation of state. */
class SeaWaterValidationTest {
    /** TEOS-10: 35 g/kg are a practical salinity of 35 · 35 / 35.16504. */
    private static final double OF_35_GRAM = 35.0 * 35.0 / 35.16504;

    private static Medium at(double salinity, double celsius) {
        return Media.at(
                MediumQuery.of("sea water", celsius + 273.15, 101325.0).with(MediumParameter.SALINITY, salinity));
    }

    /**
     * Check values of UNESCO Techn. Pap. Mar. Sci. 44 (1983), in IPTS-68 temperatures (from memory). Tolerance: half the last digit.
     */
    @ParameterizedTest
    @CsvSource({"0, 5, 999.96675", "0, 25, 997.04796", "35, 5, 1027.67547", "35, 25, 1023.34306"})
    void densityAgreesWithTheUnescoCheckValues(double salinity, double ipts68, double printed) {
        assertThat(SeaWaterLaws.density(salinity, ipts68 / 1.00024)).isCloseTo(printed, withinPercentage(6e-7));
    }

    /** TEOS-10 evaluated with the oceanographers' own library at 35 g/kg and one atmosphere: density to six digits, sound speed to 0.1 m/s. */
    @ParameterizedTest
    @CsvSource({
        "0, 1027.97, 1448.8",
        "5, 1027.55, 1470.4",
        "10, 1026.83, 1489.6",
        "15, 1025.85, 1506.5",
        "20, 1024.64, 1521.3",
        "25, 1023.22, 1534.2",
        "30, 1021.60, 1545.3",
        "35, 1019.81, 1554.9",
        "40, 1017.85, 1563.2"
    })
    void agreesWithTeos10(double celsius, double density, double soundSpeed) {
        Medium sea = at(OF_35_GRAM, celsius);
        assertThat(sea.density()).isCloseTo(density, withinPercentage(0.002));
        assertThat(sea.soundSpeed().orElseThrow()).isCloseTo(soundSpeed, withinPercentage(0.03));
    }

    /** ITTC 7.5-02-01-03 (2011), sea water of 35.165 g/kg at 15 °C: 1.1892e-6 m²/s (from memory); Sharqawy states 1.5 %. */
    @Test
    void kinematicViscosityAgreesWithTheTowingTanks() {
        assertThat(at(35.0, 15.0).kinematicViscosity()).isCloseTo(1.1892e-6, withinPercentage(0.5));
    }

    /** Without salt it is water: Sharqawy's water within 0.1 % of the release, EOS-80 within 5e-6, Chen and Millero within 0.05 m/s. */
    @ParameterizedTest
    @CsvSource({"2", "20", "39"})
    void withoutSaltItIsWater(double celsius) {
        Medium water = Media.at(MediumQuery.of("water", celsius + 273.15, 101325.0));
        Medium sea = at(0.0, celsius);
        assertThat(sea.density()).isCloseTo(water.density(), withinPercentage(5e-4));
        assertThat(sea.viscosity()).isCloseTo(water.viscosity(), withinPercentage(0.1));
        assertThat(sea.soundSpeed().orElseThrow()).isCloseTo(water.soundSpeed().orElseThrow(), withinPercentage(5e-3));
    }

    /** 20 °C, 35 g/kg: 1.07663 mPa·s by the published equation, worked by hand. */
    @Test
    void viscosityFollowsThePublishedEquation() {
        assertThat(at(OF_35_GRAM, 20.0).viscosity()).isCloseTo(1.07663e-3, withinPercentage(1e-3));
    }
}
