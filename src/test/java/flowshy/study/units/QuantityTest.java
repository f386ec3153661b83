package flowshy.study.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Spellings, and the exact double that each must give: the literal of the same value in SI, rounded once by the compiler. */
class QuantityTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "LENGTH | 80 um | 80e-6",
                "LENGTH | 80um | 80e-6",
                "LENGTH | 80 \u00B5m | 80e-6",
                "LENGTH | 80 \u03BCm | 80e-6",
                "LENGTH | 80\u00A0\u00B5m | 80e-6",
                "LENGTH | 80 micron | 80e-6",
                "LENGTH | 80 microns | 80e-6",
                "LENGTH | 80 micrometres | 80e-6",
                "LENGTH | 80 micrometer | 80e-6",
                "LENGTH | 0.3 mm | 0.3e-3",
                "LENGTH | .3 mm | 0.3e-3",
                "LENGTH | 3. mm | 3e-3",
                "LENGTH | 3e2 nm | 3e-7",
                "LENGTH | 2 in | 50.8e-3",
                "LENGTH | 2 inches | 50.8e-3",
                "LENGTH | 3 mil | 76.2e-6",
                "LENGTH | 3 thou | 76.2e-6",
                "LENGTH | 1 ft | 0.3048",
                "LENGTH | 7 cm | 0.07",
                "VOLUME | 3 mL | 3e-6",
                "VOLUME | 3 ml | 3e-6",
                "VOLUME | 3 cc | 3e-6",
                "VOLUME | 3 mm3 | 3e-9",
                "VOLUME | 3 mm^3 | 3e-9",
                "VOLUME | 3 mm³ | 3e-9",
                "VOLUME | 3 uL | 3e-9",
                "MASS | 5 mg | 5e-6",
                "MASS | 5 ug | 5e-9",
                "MASS | 5 g | 5e-3",
                "TIME | 5 ms | 5e-3",
                "TIME | 2 min | 120",
                "TIME | 2 h | 7200",
                "FREQUENCY | 1.5 kHz | 1500",
                "FREQUENCY | 10 mHz | 0.01",
                "FREQUENCY | 3000 rpm | 50",
                "FREQUENCY | 5 hertz | 5",
                "ANGLE | 2 mrad | 2e-3",
                "ANGLE | 180 deg | 3.141592653589793",
                "ANGLE | 180° | 3.141592653589793",
                "TEMPERATURE | 22 degC | 295.15",
                "TEMPERATURE | 22 °C | 295.15",
                "TEMPERATURE | 22 deg C | 295.15",
                "TEMPERATURE | 22 C | 295.15",
                "TEMPERATURE | 22 ℃ | 295.15",
                "TEMPERATURE | -40 degC | 233.15",
                "TEMPERATURE | \u221240 degF | 233.15",
                "TEMPERATURE | 300 K | 300",
                "TEMPERATURE_STEP | 3 degC | 3",
                "TEMPERATURE_STEP | 9 degF | 5",
                "PRESSURE | 98 kPa | 98000",
                "PRESSURE | 980 hPa | 98000",
                "PRESSURE | 1 atm | 101325",
                "PRESSURE | 2 bar | 2e5",
                "PRESSURE | 20 mbar | 2000",
                "PRESSURE | 760 Torr | 101325",
                "PRESSURE | 0.1 MPa | 1e5",
                "PRESSURE | 2 N/m2 | 2",
                "PRESSURE | 760 torr | 101325",
                "PRESSURE | 2 mmHg | 266.64477483",
                "PRESSURE | 10 dyn/cm2 | 1",
                "PRESSURE | 2 pascals | 2",
                "MASS | 2 t | 2000",
                "MASS | 2 kilograms | 2",
                "TIME | 2 minutes | 120",
                "TIME | 2 hours | 7200",
                "TIME | 2 sec | 2",
                "TIME | 2 hr | 7200",
                "SPEED | 100 mph | 44.704",
                "SPEED | 36 kph | 10",
                "SPEED | 2 feet/min | 0.01016",
                "ANGLE | 180 degrees | 3.141592653589793",
                "ANGLE | 10800 arcmin | 3.141592653589793",
                "ANGLE | 648000 arcsec | 3.141592653589793",
                "ANGLE | 2 radians | 2",
                "ACCELERATION | 2 Gal | 0.02",
                "KINEMATIC_VISCOSITY | 2 St | 2e-4",
                "KINEMATIC_VISCOSITY | 2 centistokes | 2e-6",
                "VISCOSITY | 2 poise | 0.2",
                "STIFFNESS | 2 J/rad | 2",
                "STIFFNESS | 2 newton metre/radian | 2",
                "VOLUME | 2 litres | 2e-3",
                "VOLUME | 2 liter | 2e-3",
                "TEMPERATURE | 300 kelvin | 300",
                "TEMPERATURE | 22 celsius | 295.15",
                "TEMPERATURE | 22 Celsius | 295.15",
                "TEMPERATURE | 5 °F | 258.15",
                "TEMPERATURE | 5 ℉ | 258.15",
                "TEMPERATURE | 5 F | 258.15",
                "SHARE | 2 ‰ | 2e-3",
                "MASS | 2 grams | 2e-3",
                "LENGTH | 2 inch | 50.8e-3",
                "ELASTIC_MODULUS | 3.5 GPa | 3.5e9",
                "ELASTIC_MODULUS | 3 N/mm2 | 3e6",
                "DENSITY | 1.21 g/cm3 | 1210",
                "DENSITY | 1.21 g/cm^3 | 1210",
                "DENSITY | 1.21 g cm-3 | 1210",
                "DENSITY | 1.21 g·cm⁻³ | 1210",
                "DENSITY | 1.21 g/cc | 1210",
                "DENSITY | 1.21 g/mL | 1210",
                "DENSITY | 1210 kg/m3 | 1210",
                "DENSITY | 1210 kg/m**3 | 1210",
                "DENSITY | 1.21 kg/L | 1210",
                "VISCOSITY | 1 mPa.s | 1e-3",
                "VISCOSITY | 1 mPa·s | 1e-3",
                "VISCOSITY | 1 mPa⋅s | 1e-3",
                "VISCOSITY | 1 mPa*s | 1e-3",
                "VISCOSITY | 1 mPa-s | 1e-3",
                "VISCOSITY | 1 mPa s | 1e-3",
                "VISCOSITY | 18.2 uPa.s | 18.2e-6",
                "VISCOSITY | 1 cP | 1e-3",
                "VISCOSITY | 1 centipoise | 1e-3",
                "VISCOSITY | 2 kg/(m.s) | 2",
                "VISCOSITY | 2 kg/m/s | 2",
                "VISCOSITY | 2 N.s/m2 | 2",
                "KINEMATIC_VISCOSITY | 10 cSt | 1e-5",
                "KINEMATIC_VISCOSITY | 10 mm2/s | 1e-5",
                "KINEMATIC_VISCOSITY | 10 mm²/s | 1e-5",
                "SPEED | 5 mm/s | 5e-3",
                "SPEED | 36 km/h | 10",
                "SPEED | 5 m s-1 | 5",
                "SPEED | 5 m.s^-1 | 5",
                "ACCELERATION | 0.1 m/s2 | 0.1",
                "ACCELERATION | 0.1 m/s^2 | 0.1",
                "ACCELERATION | 0.1 m/s² | 0.1",
                "ACCELERATION | 0.1 m/s/s | 0.1",
                "ACCELERATION | 0.1 m s^-2 | 0.1",
                "ACCELERATION | 2 g | 19.6133",
                "ACCELERATION | 2 mg | 19.6133e-3",
                "ACCELERATION | 2 gn | 19.6133",
                "ACCELERATION | 2 ug | 19.6133e-6",
                "VOLUME_FLOW | 6 L/min | 1e-4",
                "VOLUME_FLOW | 6 l/min | 1e-4",
                "VOLUME_FLOW | 36 m3/h | 0.01",
                "STIFFNESS | 2 N.m/rad | 2",
                "STIFFNESS | 2 uN.m/rad | 2e-6",
                "STIFFNESS | 2 µN·m/rad | 2e-6",
                "STIFFNESS | 2 nN m/rad | 2e-9",
                "STIFFNESS | 2 N.m | 2",
                "STIFFNESS | 2 uN.mm/rad | 2e-9",
                "DAMPING | 2 N.m.s/rad | 2",
                "DAMPING | 2 pN.m.s/rad | 2e-12",
                "DAMPING | 2 N.m/(rad/s) | 2",
                "INERTIA | 2e-17 kg.m2 | 2e-17",
                "INERTIA | 2 g.mm2 | 2e-9",
                "INERTIA | 2 kg·m² | 2",
                "ANGLE_NOISE | 2e-9 rad/rtHz | 2e-9",
                "ANGLE_NOISE | 2 nrad/√Hz | 2e-9",
                "ANGLE_NOISE | 2 nrad/sqrt(Hz) | 2e-9",
                "ANGLE_NOISE | 2 nrad/Hz^0.5 | 2e-9",
                "ANGLE_NOISE | 2 nrad/Hz^(1/2) | 2e-9",
                "ACCELERATION_DENSITY | 0.04 g2/Hz | 3.8468153689",
                "ACCELERATION_DENSITY | 2 (m/s2)2/Hz | 2",
                "ACCELERATION_DENSITY | 2 (m/s²)²/Hz | 2",
                "ACCELERATION_DENSITY | 2 (mm/s^2)^2/Hz | 2e-6",
                "ACCELERATION_DENSITY | 2 m2/s3 | 2",
                "LEVEL | -14 dB | -14",
                "SHARE | 45 % | 0.45",
                "SHARE | 45% | 0.45",
                "SHARE | 45 % RH | 0.45",
                "SHARE | 45 %RH | 0.45",
                "SHARE | 400 ppm | 4e-4",
                "NUMBER | 5 | 5",
                "NUMBER | 1.2e-3 | 1.2e-3",
            })
    void readsWhatPeopleWriteAndRoundsOnce(Dimension dimension, String text, double si) {
        assertThat(Quantity.read(text, dimension).value()).isEqualTo(si);
        assertThat(Quantity.read(text, dimension).written()).isEqualTo(text);
    }

    @ParameterizedTest
    @EnumSource(Dimension.class)
    void everyProposedUnitAndEverySiUnitIsAccepted(Dimension dimension) {
        for (String unit : dimension.units()) {
            double value = Quantity.read("300 " + unit, dimension).value();
            assertThat(value).isFinite().isPositive();
        }
        assertThat(dimension.units().isEmpty()).isEqualTo(dimension == Dimension.NUMBER);
        if (!dimension.siUnit().equals("1")) {
            assertThat(Quantity.read("7 " + dimension.siUnit(), dimension).value())
                    .isEqualTo(7.0);
        }
    }

    /** NIST SP 811 (2008), app. B.8: 1 psi = 6.894 757 E+03 Pa (from memory); half the last digit. */
    @Test
    void psiIsThePublishedPressure() {
        assertThat(Quantity.read("1 psi", Dimension.PRESSURE).value()).isCloseTo(6894.757, within(0.0005));
    }

    @Test
    void everySymbolOfTheTableBelongsToADimensionThatReadsIt() {
        assertThat(UnitTable.symbolsKnown()).hasSizeGreaterThan(60).doesNotHaveDuplicates();
        for (String symbol : UnitTable.symbolsKnown()) {
            assertThat(Arrays.stream(Dimension.values()).filter(d -> reads("2 " + symbol, d)))
                    .as(symbol)
                    .isNotEmpty();
        }
    }

    private static boolean reads(String text, Dimension dimension) {
        try {
            return Quantity.read(text, dimension).value() > 0.0;
        } catch (QuantityException e) {
            return false;
        }
    }

    @Test
    void amplitudesAreRmsUnlessTheySayPeak() {
        Quantity bare = Quantity.readAmplitude("0.1 m/s2", Dimension.ACCELERATION);
        Quantity rms = Quantity.readAmplitude("0.1 m/s^2 rms", Dimension.ACCELERATION);
        Quantity peak = Quantity.readAmplitude("0.1 m/s2 peak", Dimension.ACCELERATION);
        Quantity bracketed = Quantity.readAmplitude("4 mm/s (pk)", Dimension.SPEED);
        assertThat(bare.value()).isEqualTo(0.1);
        assertThat(bare.swing()).isEqualTo(Swing.ASSUMED_RMS);
        assertThat(rms.value()).isEqualTo(0.1);
        assertThat(rms.swing()).isEqualTo(Swing.RMS);
        assertThat(peak.value()).isCloseTo(0.07071067811865475, within(1e-17));
        assertThat(peak.swing()).isEqualTo(Swing.PEAK);
        assertThat(peak.si()).isEqualTo("0.0707107 m/s2 rms");
        assertThat(bracketed.value()).isCloseTo(0.004 / Math.sqrt(2.0), within(1e-18));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "LENGTH | 80 | 80 has no unit; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil; did you mean 80 um?",
                "LENGTH | 80 Hz | 80 Hz is a frequency; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "LENGTH | 80 Um | 80 Um: unknown unit Um; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil; did you mean um?",
                "LENGTH | 0,3 mm | 0,3 mm has a comma; write a point for decimals and nothing between thousands; did you mean 0.3 mm?",
                "LENGTH | 1,000 um | 1,000 um has a comma; write a point for decimals and nothing between thousands",
                "LENGTH | '' | nothing; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "LENGTH | thick | thick is not a number; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "LENGTH | NaN um | NaN um is not a finite number; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "LENGTH | -inf um | -inf um is not a finite number; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "LENGTH | 1e999 m | 1e999 m is beyond what can be computed; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "LENGTH | 1e-999 m | 1e-999 m is beyond what can be computed; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "FREQUENCY | 80 rad/s | 80 rad/s is a rate per second, not a frequency in cycles (1 Hz is 2π rad/s); a frequency is wanted here, with its unit: Hz, kHz, mHz, MHz, rpm",
                "FREQUENCY | 80 1/s | 80 1/s is a rate per second, not a frequency in cycles (1 Hz is 2π rad/s); a frequency is wanted here, with its unit: Hz, kHz, mHz, MHz, rpm",
                "FREQUENCY | 80 hz | 80 hz: unknown unit hz; a frequency is wanted here, with its unit: Hz, kHz, mHz, MHz, rpm; did you mean Hz?",
                "SHARE | 0.45 | 0.45 has no unit; a share is wanted here, with its unit: %, ppm; did you mean 45 %?",
                "SHARE | 2 rad | 2 rad is an angle; a share is wanted here, with its unit: %, ppm",
                "ANGLE | 45 % | 45 % is a share; an angle is wanted here, with its unit: deg, rad, mrad, urad",
                "LEVEL | 20 | 20 has no unit; a level is wanted here, with its unit: dB; did you mean 20 dB?",
                "NUMBER | 5 % | 5 % has a unit; a pure number is wanted here, without a unit",
                "VISCOSITY | 2 kg/m.s | 2 kg/m.s: unit kg/m.s is ambiguous after the stroke; a dynamic viscosity is wanted here, with its unit: mPa.s, Pa.s, uPa.s, cP; did you mean kg/(m.s)?",
                "MASS | 2 m/s2 | 2 m/s2 is an acceleration; a mass is wanted here, with its unit: ug, mg, g, kg, ng",
                "ACCELERATION | 2 kg | 2 kg is a mass; an acceleration is wanted here, with its unit: m/s2, mm/s2, g, mg, ug",
            })
    void saysWhatWasFoundAndWhatIsAccepted(Dimension dimension, String text, String message) {
        assertThatThrownBy(() -> Quantity.read(text, dimension))
                .isInstanceOf(QuantityException.class)
                .hasMessage(message);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "80 100 um",
                "80 000 um",
                "80 u m",
                "1_000 um",
                "0x50 um",
                "80 um 2",
                "80 um^",
                "80 um^10",
                "80 um^-",
                "80 (um",
                "80 um)",
                "80 /um",
                "80 um/",
                "80 ((((((um))))))",
                "5*10^-6 m",
                "1/2 in",
                "80 um ± 1 um",
                "80 um..90 um",
                "80 um rms",
                "+-80 um",
                "80 umm",
                "٨٠ um",
                "80 \uD83D",
                "80 um\u0000",
                "1e99999 um",
                "80 um peak",
            })
    void refusesRatherThanGuesses(String text) {
        assertThatThrownBy(() -> Quantity.read(text, Dimension.LENGTH)).isInstanceOf(QuantityException.class);
    }

    @Test
    void refusesPeakToPeakWithTheWayOut() {
        assertThatThrownBy(() -> Quantity.readAmplitude("2 m/s2 p-p", Dimension.ACCELERATION))
                .isInstanceOf(QuantityException.class)
                .hasMessageContaining("halve a peak-to-peak value");
        assertThatThrownBy(() -> Quantity.read("2 m/s rms", Dimension.SPEED))
                .isInstanceOf(QuantityException.class)
                .hasMessageContaining("rms or peak is not asked for here");
    }

    @Test
    void gIsAMassOrGravityAsTheKeyAsks() {
        assertThat(Quantity.read("3 mg", Dimension.MASS).value()).isEqualTo(3e-6);
        assertThat(Quantity.read("3 mg", Dimension.ACCELERATION).value()).isEqualTo(0.02941995);
        assertThat(Quantity.read("3 mg", Dimension.ACCELERATION).si()).isEqualTo("0.02942 m/s2");
    }

    @Test
    void longTextIsCutBeforeItIsRepeated() {
        assertThatThrownBy(() -> Quantity.read("9".repeat(5000), Dimension.LENGTH))
                .isInstanceOf(QuantityException.class)
                .satisfies(e -> assertThat(e.getMessage()).hasSizeLessThan(250));
    }

    @ParameterizedTest
    @CsvSource({
        "80e-6, 8e-5",
        "0.3, 0.3",
        "123456789, 1.23457e8",
        "0, 0",
        "295.15, 295.15",
        "-0.0001, -0.0001",
        "999999.7, 1e6"
    })
    void printsSixDigits(double value, String text) {
        assertThat(Digits.six(value)).isEqualTo(text);
    }

    /** Another value is written as the first was. */
    @Test
    void anotherValueKeepsTheUnit() {
        assertThat(Quantity.read("80 um", Dimension.LENGTH).at(2.106667e-4).written())
                .isEqualTo("210.667 um");
        assertThat(Quantity.read("-20 degC", Dimension.TEMPERATURE).at(313.15).written())
                .isEqualTo("40 degC");
        assertThat(Quantity.read("3.5", Dimension.NUMBER).at(0.25).written()).isEqualTo("0.25");
        Quantity peak = Quantity.readAmplitude("2 mm/s peak", Dimension.SPEED).at(0.003 / Math.sqrt(2.0));
        assertThat(peak.written()).isEqualTo("3 mm/s peak");
        assertThat(Quantity.readAmplitude(peak.written(), Dimension.SPEED).value())
                .isCloseTo(peak.value(), within(1e-12));
    }
}
