package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import flowshy.medium.OutOfTableException.Why;
import flowshy.medium.PropertySource.Reading;
import java.io.IOException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Liquids against printed values and against the formulas behind their tables. */
class LiquidsValidationTest {
    private static final int ROWS = 234;

    private static Medium at(String name, double celsius) {
        return Media.at(MediumQuery.of(name, celsius + 273.15, 101325.0));
    }

    private static Medium oil(String name, double grade, double celsius) {
        return Media.at(MediumQuery.of(name, celsius + 273.15, 101325.0).with(MediumParameter.GRADE, grade * 1e-6));
    }

    /**
     * Half-way between the rows the splines stay within 0.02 % of densities and sound speeds and 0.3 % of viscosities (mercury: 0.001 %): below
     * every stated uncertainty. Media that are formulas themselves follow them to eight digits. The formulas are evaluated outside this program.
     */
    @Test
    void interpolatesBelowTheStatedUncertainty() throws IOException {
        for (String[] row : Reference.words("liquid-reference.csv", ROWS)) {
            MediumQuery query = MediumQuery.of(row[0], Double.parseDouble(row[2]) + 273.15, 101325.0);
            if (row[0].endsWith("oil")) {
                query = query.with(MediumParameter.GRADE, Double.parseDouble(row[1]) * 1e-6);
            } else if (row[0].equals("sea water")) {
                query = query.with(MediumParameter.SALINITY, Double.parseDouble(row[1]));
            } else if (!row[1].isEmpty()) {
                query = query.with(MediumParameter.MASS_FRACTION, Double.parseDouble(row[1]));
            }
            Medium liquid = Media.at(query);
            String state = String.join(" ", row);
            boolean formula = row[0].equals("sea water") || row[0].equals("glycerol-water");
            double fine = formula ? 1e-5 : row[0].equals("mercury") ? 1e-3 : 0.02;
            double viscous = formula ? 1e-5 : 0.3;
            if (!row[3].isEmpty()) {
                assertThat(liquid.density()).as(state).isCloseTo(Double.parseDouble(row[3]), withinPercentage(fine));
            }
            assertThat(liquid.viscosity()).as(state).isCloseTo(Double.parseDouble(row[4]), withinPercentage(viscous));
            if (!row[5].isEmpty()) {
                assertThat(liquid.soundSpeed().orElseThrow())
                        .as(state)
                        .isCloseTo(Double.parseDouble(row[5]), withinPercentage(fine));
            }
        }
    }

    /**
     * CRC Handbook, viscosity of liquids [mPa·s] (from memory). Tolerance: the uncertainty that each medium states, plus 1 % for the table.
     */
    @ParameterizedTest
    @CsvSource({
        "ethanol, 0, 1.786",
        "ethanol, 25, 1.074",
        "ethanol, 50, 0.694",
        "ethanol, 75, 0.476",
        "methanol, 0, 0.793",
        "methanol, 25, 0.544",
        "2-propanol, 0, 4.619",
        "2-propanol, 25, 2.038",
        "2-propanol, 50, 1.028",
        "2-propanol, 75, 0.576",
        "ethylene glycol, 25, 16.1",
        "ethylene glycol, 50, 6.554",
        "ethylene glycol, 75, 3.340",
        "ethylene glycol, 100, 1.975",
        "mercury, 25, 1.526",
        "mercury, 50, 1.402",
        "mercury, 75, 1.312",
        "mercury, 100, 1.245",
        "water, 25, 0.890",
        "water, 75, 0.378"
    })
    void viscosityAgreesWithTheHandbook(String name, double celsius, double printed) {
        Medium liquid = at(name, celsius);
        double stated = liquid.sources().stream()
                .filter(source -> source.property().equals("viscosity"))
                .findFirst()
                .orElseThrow()
                .uncertainty()
                .orElseThrow();
        assertThat(1e3 * liquid.viscosity()).isCloseTo(printed, withinPercentage(100.0 * stated + 1.0));
    }

    /** CRC Handbook densities [kg/m³] (from memory); mercury: Bettin &amp; Fehlauer 2004 as quoted by another source (second hand). */
    @ParameterizedTest
    @CsvSource({
        "ethanol, 25, 785.1, 0.05",
        "methanol, 25, 786.4, 0.05",
        "2-propanol, 25, 781.2, 0.15",
        "ethylene glycol, 20, 1113.5, 0.1",
        "mercury, 20, 13545.859, 0.0002",
        "perfluorohexane, 25, 1678, 0.4",
        "fluoroketone, 25, 1603, 0.3",
        "olive oil, 20, 911, 0.7"
    })
    void densityAgreesWithTheHandbook(String name, double celsius, double printed, double percent) {
        assertThat(at(name, celsius).density()).isCloseTo(printed, withinPercentage(percent));
    }

    /** Sound speeds at 25 °C of a handbook table (seen): ethanol 1144, methanol 1103, ethylene glycol 1660, mercury 1450 m/s. */
    @ParameterizedTest
    @CsvSource({"ethanol, 1144", "methanol, 1103", "ethylene glycol, 1660", "mercury, 1450"})
    void soundSpeedAgreesWithTheHandbook(String name, double printed) {
        assertThat(at(name, 25.0).soundSpeed().orElseThrow()).isCloseTo(printed, withinPercentage(0.35));
    }

    /** Normal boiling points [°C] of the handbooks (from memory): refused 1.5 K above, or at the end of the table, taken 1.5 K below. */
    @ParameterizedTest
    @CsvSource({"ethanol, 78.3", "methanol, 64.6", "2-propanol, 82.3", "fluoroketone, 49.0", "perfluorohexane, 57.1"})
    void boilsWhereTheHandbookSays(String name, double celsius) {
        MediumTable table = MediumShelf.find(MediumShelf.stem(name)).orElseThrow();
        TableCurves curves = new TableCurves(table.rows());
        double last = table.header().temperatures().high();
        // the tables end a few kelvin below the boiling point; the slope of the last rows leads on to it
        double p = curves.saturationPressure(last).orElseThrow();
        double q = curves.saturationPressure(last - 5.0).orElseThrow();
        double slope = Math.log(p / q) / (1.0 / (last - 5.0) - 1.0 / last);
        double boiling = 1.0 / (1.0 / last - Math.log(101325.0 / p) / slope);
        assertThat(boiling - 273.15).isCloseTo(celsius, within(1.0));
    }

    /** At a tenth of an atmosphere ethanol boils near 29 °C, methanol near 15 °C (Antoine equations of handbooks, from memory). */
    @ParameterizedTest
    @CsvSource({"ethanol, 29.1", "methanol, 15.6"})
    void boilsUnderLowPressure(String name, double celsius) {
        MediumQuery below = MediumQuery.of(name, celsius + 273.15 - 1.5, 10132.5);
        MediumQuery above = MediumQuery.of(name, celsius + 273.15 + 1.5, 10132.5);
        assertThat(Media.at(below).density()).isPositive();
        assertThatThrownBy(() -> Media.at(above)).isInstanceOfSatisfying(OutOfTableException.class, e -> {
            assertThat(e.why()).isEqualTo(Why.BOILS);
            assertThat(e.parameter()).isEqualTo(MediumParameter.PRESSURE);
        });
    }

    /** Olive oil 182.9 mPa·s at 5 °C (second hand). */
    @Test
    void oliveOilIsThickInTheCold() {
        assertThat(1e3 * at("olive oil", 5.0).viscosity()).isCloseTo(182.9, withinPercentage(10.0));
    }

    /** A grade is its own kinematic viscosity at the temperature of its name, also between the grades of the table. */
    @ParameterizedTest
    @CsvSource({
        "silicone oil, 0.65, 25",
        "silicone oil, 3, 25",
        "silicone oil, 100, 25",
        "silicone oil, 200, 25",
        "silicone oil, 5000, 25",
        "mineral oil, 10, 40",
        "mineral oil, 46, 40",
        "mineral oil, 50, 40",
        "mineral oil, 400, 40"
    })
    void aGradeIsItsViscosityByDefinition(String name, double grade, double celsius) {
        assertThat(1e6 * oil(name, grade, celsius).kinematicViscosity()).isCloseTo(grade, withinPercentage(1e-3));
    }

    /** Viscosity–temperature coefficient of dimethyl oils, 1 − ν(98.9 °C)/ν(37.8 °C): 0.60 in the trade (from memory), here 0.605. */
    @ParameterizedTest
    @CsvSource({"50", "100", "350", "1000", "700"})
    void siliconeOilHasTheCoefficientOfTheTrade(double grade) {
        double hot = oil("silicone oil", grade, 98.9).kinematicViscosity();
        double warm = oil("silicone oil", grade, 37.8).kinematicViscosity();
        assertThat(1.0 - hot / warm).isCloseTo(0.60, withinPercentage(1.5));
    }

    /** Between two grades every property lies between theirs. */
    @Test
    void aGradeBetweenLiesBetween() {
        Medium low = oil("silicone oil", 100.0, 60.0);
        Medium middle = oil("silicone oil", 200.0, 60.0);
        Medium high = oil("silicone oil", 350.0, 60.0);
        assertThat(middle.density()).isBetween(low.density(), high.density());
        assertThat(middle.viscosity()).isBetween(low.viscosity(), high.viscosity());
        assertThat(middle.soundSpeed().orElseThrow())
                .isBetween(low.soundSpeed().orElseThrow(), high.soundSpeed().orElseThrow());
    }

    @Test
    void refusesAGradeBeyondTheFamily() {
        assertThatThrownBy(() -> oil("mineral oil", 5.0, 40.0))
                .isInstanceOfSatisfying(
                        OutOfTableException.class,
                        e -> assertThat(e.parameter()).isEqualTo(MediumParameter.GRADE))
                .hasMessageContaining("10 mm2/s to 460 mm2/s; 5 mm2/s was asked for");
    }

    /** The thinnest silicone oil is a compound that boils at 100.5 °C; under low pressure also a grade a little above it is refused. */
    @Test
    void thinSiliconeOilBoilsUnderLowPressure() {
        MediumQuery thin = MediumQuery.of("silicone oil", 323.15, 5000.0);
        for (double grade : new double[] {0.65e-6, 0.8e-6}) {
            assertThatThrownBy(() -> Media.at(thin.with(MediumParameter.GRADE, grade)))
                    .isInstanceOfSatisfying(
                            OutOfTableException.class, e -> assertThat(e.why()).isEqualTo(Why.BOILS));
        }
        assertThat(Media.at(thin.with(MediumParameter.GRADE, 5e-6)).density()).isPositive();
    }

    @Test
    void saysWhichLiquidsRestOnMemory() {
        assertThat(oil("silicone oil", 100.0, 25.0).recalled())
                .extracting(PropertySource::property)
                .contains("viscosity");
        assertThat(at("fluoroketone", 25.0).recalled())
                .extracting(PropertySource::property)
                .containsExactly("viscosity");
        assertThat(at("water", 25.0).recalled()).isEmpty();
        assertThat(at("ethanol", 25.0).recalled()).isEmpty();
        assertThat(at("mercury", 25.0).sources())
                .extracting(PropertySource::reading)
                .contains(Reading.SECOND_HAND);
    }

    /** Compressibility of water 4.48e-10 per Pa adiabatic at 20 °C: 0.9 MPa more makes it 4.0e-4 denser (steam tables, from memory). */
    @Test
    void aLiquidIsALittleDenserUnderPressure() {
        double rise = Media.at(MediumQuery.of("water", 293.15, 1e6)).density()
                        / Media.at(MediumQuery.of("water", 293.15, 1e5)).density()
                - 1.0;
        assertThat(rise).isCloseTo(4.1e-4, withinPercentage(3.0));
    }
}
