package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Moist air against printed values. */
class MoistAirValidationTest {
    private static Medium air(double celsius, double pressure, double humidity) {
        return Media.at(MediumQuery.of("air", 273.15 + celsius, pressure).with(MediumParameter.HUMIDITY, humidity));
    }

    /**
     * IEC 61094-2:2009 table F.1, made with CIPM-2007 and Cramer 1993 (second hand, quoted in the tests of an open acoustics library). Tolerance:
     * half the last printed digit.
     */
    @ParameterizedTest
    @CsvSource({"23, 101325, 0.50, 1.1860848, 345.86652", "20, 80000, 0.65, 0.9441589, 344.38267"})
    void agreesWithTheWorkedValuesOfTheMicrophoneStandard(
            double celsius, double pressure, double humidity, double density, double soundSpeed) {
        Medium air = air(celsius, pressure, humidity);
        // The standard rounds 1 - Mv/Ma = 0.378043 to 0.3780: 4.3e-5 of the vapour fraction, 0.016 at most here.
        assertThat(air.density()).isCloseTo(density, within(0.5e-7 + 4.3e-5 * 0.016 * density));
        assertThat(air.soundSpeed().orElseThrow()).isCloseTo(soundSpeed, within(0.5e-5));
        assertThat(air.caveats()).isEmpty();
    }

    /** The same table prints 18.26566 and 18.11295 μPa·s by a formula of its own; the mixing rule here states 1.5 %. */
    @ParameterizedTest
    @CsvSource({"23, 101325, 0.50, 1.826566e-5", "20, 80000, 0.65, 1.811295e-5"})
    void viscosityAgreesWithTheMicrophoneStandard(double celsius, double pressure, double humidity, double viscosity) {
        assertThat(air(celsius, pressure, humidity).viscosity()).isCloseTo(viscosity, withinPercentage(0.5));
    }

    /** ASHRAE RP-1485 virial equation as printed in the manual of an open psychrometry library (seen): 1.1971436 at 20 °C, 70 %; molar mass 6.5e-5 lower. */
    @Test
    void densityAgreesWithAnotherEquationOfState() {
        assertThat(air(20.0, 101325.0, 0.7).density()).isCloseTo(1.1971436 * (1.0 + 6.5e-5), withinPercentage(2e-3));
    }

    /** OIML R 111 eq E.3-1, (0.34848 p − 0.009 h e^(0.061 t)) / (273.15 + t), p in hPa, h in % (from memory); states 2e-4. */
    @ParameterizedTest
    @CsvSource({"20, 101325, 0.5", "25, 95000, 0.3", "16, 100000, 0.8"})
    void densityAgreesWithTheSimplifiedFormulaOfLegalMetrology(double celsius, double pressure, double humidity) {
        double simple = (0.34848 * pressure / 100.0 - 0.009 * 100.0 * humidity * Math.exp(0.061 * celsius))
                / (273.15 + celsius);
        assertThat(air(celsius, pressure, humidity).density()).isCloseTo(simple, withinPercentage(0.02));
    }

    /** Saturation pressure over water: steam tables 2339.3 Pa at 20 °C and 101.42 kPa at 100 °C; 19.05 Pa at −40 °C over supercooled water (from memory). */
    @ParameterizedTest
    @CsvSource({"20, 2339.3, 0.02", "100, 101420, 0.1", "-40, 19.05, 1"})
    void saturationPressureHoldsFarBeyondTheStatedRange(double celsius, double pressure, double percent) {
        assertThat(HumidAirLaws.saturationPressure(celsius + 273.15)).isCloseTo(pressure, withinPercentage(percent));
    }

    /**
     * Viscosity of thin vapour: IAPWS R12-08 table 4 prints 32.619287 and 44.217245 μPa·s at 1 kg/m³ (from memory), where the density costs
     * 0.05 %; evaluated with 30 digits by iapws_water.py near room temperature.
     */
    @ParameterizedTest
    @CsvSource({
        "873.15, 32.619287e-6, 0.06",
        "1173.15, 44.217245e-6, 0.06",
        "273.15, 8.94773819072e-6, 1e-9",
        "293.15, 9.5504794795e-6, 1e-9",
        "373.15, 1.23370306896e-5, 1e-9"
    })
    void vapourViscosityAgreesWithTheRelease(double temperature, double viscosity, double percent) {
        assertThat(HumidAirLaws.vapourViscosity(temperature)).isCloseTo(viscosity, withinPercentage(percent));
    }

    /** Dry air by CIPM-2007 and by the equation of state behind the table: different work, 2e-5 stated for the one and 1e-3 for the other. */
    @ParameterizedTest
    @CsvSource({"15, 60000", "20, 101325", "27, 110000"})
    void dryAirOfTheTableAgreesWithTheMoistEquationWithoutMoisture(double celsius, double pressure) {
        double moist = HumidAirLaws.density(0.0, 273.15 + celsius, pressure);
        assertThat(air(celsius, pressure, 0.0).density()).isCloseTo(moist, withinPercentage(0.01));
    }

    /**
     * Beyond 27 °C against the gas law with the second virial coefficients of dry air (table), of steam (Haar, Gallagher &amp; Kell 1984,
     * −39.13, −27.81 and −20.83 cm³/g at 60, 90 and 120 °C, second hand) and of the unlike pair (Harvey &amp; Huang 2007, about −21, −16 and
     * −12 cm³/mol, from memory). The difference stays inside what the caveat states.
     */
    @ParameterizedTest
    @CsvSource({
        "60, 101325, 0.5, -39.13, -21",
        "60, 500000, 0.9, -39.13, -21",
        "90, 101325, 0.5, -27.81, -16",
        "90, 300000, 0.9, -27.81, -16",
        "120, 101325, 0.2, -20.83, -12",
        "120, 900000, 0.9, -20.83, -12"
    })
    void stretchedDensityStaysInsideWhatIsStated(
            double celsius, double pressure, double humidity, double steam, double pair) {
        double temperature = 273.15 + celsius;
        Medium moist = air(celsius, pressure, humidity);
        double x = HumidAirLaws.vapourFraction(humidity, temperature, pressure);
        double dry = new PureGas(MediumShelf.find("dry-air").orElseThrow())
                .virial(temperature)
                .value();
        double b = (1 - x) * (1 - x) * dry + 2 * x * (1 - x) * pair * 1e-6 + x * x * steam * 18.01528e-6;
        double rt = 8.314462618 * temperature;
        double molarMass = (1 - x) * 28.96546e-3 + x * 18.01528e-3;
        double z = 0.5 + Math.sqrt(0.25 + b * pressure / rt);
        double stated = moist.sources().get(0).uncertainty().orElseThrow();
        assertThat(stated).isLessThan(0.02);
        assertThat(moist.density() * z * rt / (pressure * molarMass)).isCloseTo(1.0, within(stated));
        assertThat(moist.caveats()).hasSize(1);
    }

    /** Where Cramer's formula ends the perfect mixture takes over; both agree there within the stated 0.3 %. */
    @ParameterizedTest
    @CsvSource({"0", "10", "20", "30"})
    void bothSoundSpeedsAgreeWhereTheyMeet(double celsius) {
        double inside = air(celsius, 101325.0, 1.0).soundSpeed().orElseThrow();
        double outside = air(celsius, 103000.0, 1.0).soundSpeed().orElseThrow();
        assertThat(outside).isCloseTo(inside, withinPercentage(0.1));
    }
}
