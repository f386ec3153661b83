package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import flowshy.medium.MediumQuery.GivenProperties;
import flowshy.medium.OutOfTableException.Why;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** What may be asked of the media, what is refused, and what every property keeps to. */
class MediaTest {
    private static List<MediumEntry> entries() {
        return Media.entries();
    }

    private static MediumQuery plain(MediumEntry entry, double temperature, double pressure) {
        MediumQuery query = MediumQuery.of(entry.name(), temperature, pressure);
        for (AcceptedParameter accepted : entry.parameters()) {
            query = query.with(accepted.parameter(), middle(accepted));
        }
        return query;
    }

    private static double middle(AcceptedParameter accepted) {
        return accepted.parameter() == MediumParameter.GRADE
                ? Math.sqrt(accepted.range().low() * accepted.range().high())
                : 0.5 * (accepted.range().low() + accepted.range().high());
    }

    @Test
    void listsTheMediaOfTheCore() {
        assertThat(entries())
                .extracting(MediumEntry::name)
                .contains(
                        "air",
                        "dry air",
                        "nitrogen",
                        "oxygen",
                        "argon",
                        "helium",
                        "hydrogen",
                        "carbon dioxide",
                        "sulfur hexafluoride",
                        "water")
                .isSorted()
                .doesNotHaveDuplicates();
    }

    @Test
    void everyFileCarriesTheNameOfItsMedium() {
        assertThat(entries()).hasSizeGreaterThan(9).allSatisfy(entry -> {
            assertThat(MediumShelf.find(MediumShelf.stem(entry.name()))).isPresent();
            assertThat(entry.about()).isNotBlank();
            assertThat(entry.sources()).extracting(PropertySource::property).contains("density", "viscosity");
            assertThat(entry.sources())
                    .allSatisfy(source -> assertThat(source.source()).isNotBlank());
        });
    }

    /** Positive, finite and without kinks over the whole range: third differences of the logarithms stay small against the steps. */
    @ParameterizedTest
    @MethodSource("entries")
    void propertiesArePositiveAndSmoothOverTheWholeRange(MediumEntry entry) {
        int points = 200;
        double low = entry.temperatures().low();
        double step = (entry.temperatures().high() - low) / points;
        double[] density = new double[points + 1];
        double[] viscosity = new double[points + 1];
        int count = 0;
        for (int i = 0; i <= points; i++) {
            Medium medium;
            try {
                medium = Media.at(plain(
                        entry, Math.min(low + i * step, entry.temperatures().high()), 101325.0));
            } catch (OutOfTableException e) {
                assertThat(e.why() == Why.BOILS || e.parameter() == MediumParameter.HUMIDITY)
                        .as(e.getMessage())
                        .isTrue();
                break;
            }
            density[i] = Math.log(medium.density());
            viscosity[i] = Math.log(medium.viscosity());
            assertThat(density[i]).isFinite();
            assertThat(viscosity[i]).isFinite();
            count++;
        }
        assertThat(count).isGreaterThan(points / 2);
        for (int i = 2; i < count; i++) {
            double bendDensity = density[i] - 2.0 * density[i - 1] + density[i - 2];
            double bendViscosity = viscosity[i] - 2.0 * viscosity[i - 1] + viscosity[i - 2];
            assertThat(bendDensity).as("density, point %s", i).isCloseTo(0.0, within(2e-3));
            assertThat(bendViscosity).as("viscosity, point %s", i).isCloseTo(0.0, within(8e-3));
            assertThat(density[i]).as("density falls, point %s", i).isLessThan(density[i - 1] + 5e-5);
        }
    }

    @ParameterizedTest
    @MethodSource("entries")
    void everyPropertyHasItsSource(MediumEntry entry) {
        double middle = 0.5
                * (entry.temperatures().low() + Math.min(entry.temperatures().high(), 330.0));
        Medium medium = Media.at(plain(entry, middle, 101325.0));
        assertThat(medium.sources()).extracting(PropertySource::property).contains("density", "viscosity");
        if (medium.soundSpeed().isPresent()) {
            assertThat(medium.sources()).extracting(PropertySource::property).contains("sound speed");
            assertThat(medium.soundSpeed().getAsDouble()).isBetween(50.0, 2500.0);
        }
        assertThat(medium.meanFreePath().isPresent()).isEqualTo(medium.phase() == Phase.GAS);
    }

    @ParameterizedTest
    @CsvSource({
        "N2, nitrogen",
        "Carbon Dioxide, carbon dioxide",
        "SULPHUR_HEXAFLUORIDE, sulfur hexafluoride",
        "He, helium"
    })
    void takesOtherSpellings(String written, String name) {
        assertThat(Media.at(MediumQuery.of(written, 293.15, 101325.0)))
                .isEqualTo(Media.at(MediumQuery.of(name, 293.15, 101325.0)));
    }

    @Test
    void namesTheNearestMediaForAnUnknownOne() {
        assertThatThrownBy(() -> Media.at(MediumQuery.of("nitrogn", 293.15, 101325.0)))
                .isInstanceOfSatisfying(UnknownMediumException.class, e -> {
                    assertThat(e.nearest()).hasSize(3).startsWith("nitrogen");
                    assertThat(e.parameter()).isEqualTo(MediumParameter.NAME);
                });
        assertThatThrownBy(() -> Media.at(MediumQuery.of("../media-tables/air", 293.15, 101325.0)))
                .isInstanceOf(UnknownMediumException.class);
    }

    @Test
    void pointsAtTheTemperatureOutsideTheTable() {
        assertThatThrownBy(
                        () -> Media.at(MediumQuery.of("air", 473.15, 101325.0).with(MediumParameter.HUMIDITY, 0.5)))
                .isInstanceOfSatisfying(OutOfTableException.class, e -> {
                    assertThat(e.parameter()).isEqualTo(MediumParameter.TEMPERATURE);
                    assertThat(e.why()).isEqualTo(Why.OUTSIDE);
                })
                .hasMessage(
                        "air covers -60 °C to 150 °C; 200 °C was asked for. Choose a temperature inside, or add rows with"
                                + " their source.");
    }

    @Test
    void pointsAtThePressureAndTheHumidity() {
        assertThatThrownBy(() -> Media.at(MediumQuery.of("nitrogen", 293.15, 2e6)))
                .isInstanceOfSatisfying(
                        OutOfTableException.class,
                        e -> assertThat(e.parameter()).isEqualTo(MediumParameter.PRESSURE))
                .hasMessageContaining("1 Pa to 1000 kPa");
        assertThatThrownBy(
                        () -> Media.at(MediumQuery.of("air", 293.15, 101325.0).with(MediumParameter.HUMIDITY, 1.2)))
                .isInstanceOfSatisfying(
                        OutOfTableException.class,
                        e -> assertThat(e.parameter()).isEqualTo(MediumParameter.HUMIDITY));
        assertThatThrownBy(
                        () -> Media.at(MediumQuery.of("air", 393.15, 101325.0).with(MediumParameter.HUMIDITY, 0.9)))
                .isInstanceOfSatisfying(
                        OutOfTableException.class,
                        e -> assertThat(e.parameter()).isEqualTo(MediumParameter.HUMIDITY))
                .hasMessageContaining("more than 50 % water vapour");
    }

    @Test
    void refusesAMissingAndASuperfluousParameter() {
        assertThatThrownBy(() -> Media.at(MediumQuery.of("air", 293.15, 101325.0)))
                .isInstanceOfSatisfying(UnfitParameterException.class, e -> {
                    assertThat(e.parameter()).isEqualTo(MediumParameter.HUMIDITY);
                    assertThat(e.missing()).isTrue();
                });
        assertThatThrownBy(() ->
                        Media.at(MediumQuery.of("helium", 293.15, 101325.0).with(MediumParameter.HUMIDITY, 0.5)))
                .isInstanceOfSatisfying(UnfitParameterException.class, e -> {
                    assertThat(e.parameter()).isEqualTo(MediumParameter.HUMIDITY);
                    assertThat(e.missing()).isFalse();
                });
    }

    @Test
    void waterFreezesAndBoils() {
        assertThatThrownBy(() -> Media.at(MediumQuery.of("water", 272.0, 101325.0)))
                .isInstanceOfSatisfying(OutOfTableException.class, e -> {
                    assertThat(e.why()).isEqualTo(Why.FREEZES);
                    assertThat(e.parameter()).isEqualTo(MediumParameter.TEMPERATURE);
                })
                .hasMessageContaining("water freezes at 0 °C; -1.15 °C was asked for");
        assertThatThrownBy(() -> Media.at(MediumQuery.of("water", 393.15, 101325.0)))
                .isInstanceOfSatisfying(OutOfTableException.class, e -> {
                    assertThat(e.why()).isEqualTo(Why.BOILS);
                    assertThat(e.parameter()).isEqualTo(MediumParameter.TEMPERATURE);
                })
                .hasMessageContaining("water boils at 99.97 °C under 101.325 kPa; 120 °C");
        assertThatThrownBy(() -> Media.at(MediumQuery.of("water", 293.15, 2000.0)))
                .isInstanceOfSatisfying(OutOfTableException.class, e -> {
                    assertThat(e.why()).isEqualTo(Why.BOILS);
                    assertThat(e.parameter()).isEqualTo(MediumParameter.PRESSURE);
                });
        assertThatThrownBy(() -> Media.at(MediumQuery.of("water", 293.15, 100.0)))
                .isInstanceOfSatisfying(OutOfTableException.class, e -> {
                    assertThat(e.why()).isEqualTo(Why.BOILS);
                    assertThat(e.parameter()).isEqualTo(MediumParameter.PRESSURE);
                });
    }

    /** Both ends of the table are inside it, whatever the rounding of 273.15. */
    @ParameterizedTest
    @CsvSource({"dry air, -60, 150", "nitrogen, -60, 150", "sulfur hexafluoride, -50, 150", "water, 0, 99.9"})
    void endsOfTheTableAreInside(String name, double low, double high) {
        for (double celsius : new double[] {low, high}) {
            assertThat(Media.at(MediumQuery.of(name, celsius + 273.15, 101325.0))
                            .density())
                    .isPositive();
        }
    }

    /** 10 bar, by hand from the row at 20 °C: Z = ½ + √(¼ + B p/(RT)), B = −5.66e-6 of nitrogen is small: ρ close to 9.87 times that at 1 atm. */
    @Test
    void gasScalesByTheVirialGasLaw() {
        double atm = Media.at(MediumQuery.of("argon", 293.15, 101325.0)).density();
        double ten = Media.at(MediumQuery.of("argon", 293.15, 1e6)).density();
        double rt = 8.314462618 * 293.15;
        double b = -1.659e-5;
        double z1 = 0.5 + Math.sqrt(0.25 + b * 101325.0 / rt);
        double z10 = 0.5 + Math.sqrt(0.25 + b * 1e6 / rt);
        assertThat(ten / atm).isCloseTo(1e6 / 101325.0 * z1 / z10, withinPercentage(1e-4));
        assertThat(ten / atm).isGreaterThan(1e6 / 101325.0);
    }

    /** CO₂ at −30 °C boils at 1.43 MPa and at −40 °C at 1.0 MPa, SF₆ at −30 °C at 0.49 MPa (handbooks, from memory). */
    @ParameterizedTest
    @CsvSource({
        "carbon dioxide, -45, 7e5, 9e5",
        "carbon dioxide, -60, 3.9e5, 4.3e5",
        "sulfur hexafluoride, -30, 4.6e5, 5.1e5",
        "sulfur hexafluoride, 0, 1e6, 0"
    })
    void gasesCondenseUnderPressureInTheCold(String gas, double celsius, double stays, double condenses) {
        double temperature = celsius + 273.15;
        assertThat(Media.at(MediumQuery.of(gas, temperature, stays)).density()).isPositive();
        if (condenses > 0.0) {
            assertThatThrownBy(() -> Media.at(MediumQuery.of(gas, temperature, condenses)))
                    .isInstanceOfSatisfying(OutOfTableException.class, e -> {
                        assertThat(e.why()).isEqualTo(Why.CONDENSES);
                        assertThat(e.parameter()).isEqualTo(MediumParameter.PRESSURE);
                    });
        }
    }

    /** In a mixture only the partial pressure condenses a gas. */
    @Test
    void aGasInAnotherCondensesByItsOwnShareOfThePressure() {
        MediumQuery nitrogen = MediumQuery.of("nitrogen", 228.15, 9e5);
        assertThat(Media.at(nitrogen.with("carbon dioxide", 0.5)).density()).isPositive();
        assertThatThrownBy(() -> Media.at(nitrogen.with("carbon dioxide", 0.99)))
                .isInstanceOf(OutOfTableException.class);
    }

    @Test
    void uncertaintyGrowsAwayFromThePressureOfTheTable() {
        Medium atm = Media.at(MediumQuery.of("nitrogen", 293.15, 101325.0));
        Medium ten = Media.at(MediumQuery.of("nitrogen", 293.15, 1e6));
        for (int i = 0; i < 3; i++) {
            assertThat(ten.sources().get(i).uncertainty().orElseThrow())
                    .isGreaterThan(atm.sources().get(i).uncertainty().orElseThrow());
        }
    }

    @Test
    void moistAirIsFlaggedOutsideTheRangeOfItsEquation() {
        Medium inside = Media.at(MediumQuery.of("air", 293.15, 101325.0).with(MediumParameter.HUMIDITY, 0.5));
        Medium outside = Media.at(MediumQuery.of("air", 323.15, 101325.0).with(MediumParameter.HUMIDITY, 0.5));
        assertThat(inside.caveats()).isEmpty();
        assertThat(outside.caveats()).hasSize(1);
        assertThat(outside.sources().get(0).uncertainty().orElseThrow())
                .isGreaterThan(inside.sources().get(0).uncertainty().orElseThrow());
    }

    /** A little moisture changes nothing suddenly: humidity to 0 tends to dry air within what the two density equations differ by. */
    @Test
    void moistAirTendsToDryAir() {
        Medium dry = Media.at(MediumQuery.of("dry air", 293.15, 101325.0));
        Medium nearly = Media.at(MediumQuery.of("air", 293.15, 101325.0).with(MediumParameter.HUMIDITY, 1e-9));
        assertThat(nearly.density()).isCloseTo(dry.density(), withinPercentage(5e-3));
        assertThat(nearly.viscosity()).isCloseTo(dry.viscosity(), withinPercentage(1e-6));
        assertThat(nearly.soundSpeed().orElseThrow()).isCloseTo(dry.soundSpeed().orElseThrow(), withinPercentage(0.02));
    }

    @Test
    void mixturesReduceToTheirPureGases() {
        MediumQuery nitrogen = MediumQuery.of("nitrogen", 293.15, 101325.0);
        Medium pureNitrogen = Media.at(nitrogen);
        Medium pureHelium = Media.at(MediumQuery.of("helium", 293.15, 101325.0));
        assertThat(Media.at(nitrogen.with("helium", 0.0))).isEqualTo(pureNitrogen);
        assertThat(Media.at(nitrogen.with("helium", 1.0))).isEqualTo(pureHelium);
        Medium almost = Media.at(nitrogen.with("helium", 1e-12));
        assertThat(almost.density()).isCloseTo(pureNitrogen.density(), withinPercentage(1e-9));
        assertThat(almost.viscosity()).isCloseTo(pureNitrogen.viscosity(), withinPercentage(1e-9));
        assertThat(almost.soundSpeed().orElseThrow())
                .isCloseTo(pureNitrogen.soundSpeed().orElseThrow(), withinPercentage(1e-9));
        assertThat(almost.meanFreePath().orElseThrow())
                .isCloseTo(pureNitrogen.meanFreePath().orElseThrow(), withinPercentage(1e-9));
    }

    @Test
    void aMixtureDoesNotCareWhichGasComesFirst() {
        Medium one = Media.at(MediumQuery.of("nitrogen", 293.15, 3e5).with("helium", 0.2));
        Medium other = Media.at(MediumQuery.of("helium", 293.15, 3e5).with("nitrogen", 0.8));
        assertThat(one.density()).isCloseTo(other.density(), withinPercentage(1e-10));
        assertThat(one.viscosity()).isCloseTo(other.viscosity(), withinPercentage(1e-10));
    }

    @Test
    void refusesAShareBeyondOneAndALiquidInAGas() {
        MediumQuery nitrogen = MediumQuery.of("nitrogen", 293.15, 101325.0);
        assertThatThrownBy(() -> Media.at(nitrogen.with("helium", 1.5)))
                .isInstanceOfSatisfying(
                        OutOfTableException.class,
                        e -> assertThat(e.parameter()).isEqualTo(MediumParameter.SHARE));
        assertThatThrownBy(() -> Media.at(nitrogen.with("water", 0.2)))
                .isInstanceOfSatisfying(
                        UnfitParameterException.class,
                        e -> assertThat(e.parameter()).isEqualTo(MediumParameter.SHARE));
    }

    @Test
    void keepsGivenProperties() {
        Medium medium = Media.at(
                MediumQuery.of("test oil", new GivenProperties(870.0, 0.05, OptionalDouble.of(1400.0)), 313.15, 2e5));
        assertThat(medium.density()).isEqualTo(870.0);
        assertThat(medium.viscosity()).isEqualTo(0.05);
        assertThat(medium.soundSpeed()).hasValue(1400.0);
        assertThat(medium.temperature()).isEqualTo(313.15);
        assertThat(medium.meanFreePath()).isEmpty();
        assertThat(medium.sources()).extracting(PropertySource::reading).containsOnly(PropertySource.Reading.GIVEN);
    }

    /** No word means two media. */
    @Test
    void noNameOrAliasIsGivenTwice() {
        List<String> words = new ArrayList<>();
        for (MediumEntry entry : entries()) {
            words.add(MediumShelf.stem(entry.name()));
            entry.aliases().forEach(alias -> words.add(MediumShelf.stem(alias)));
        }
        assertThat(words).hasSizeGreaterThan(40).doesNotHaveDuplicates();
    }

    @Test
    void listsTheLiquids() {
        assertThat(entries())
                .extracting(MediumEntry::name)
                .contains(
                        "ethanol",
                        "methanol",
                        "2-propanol",
                        "ethylene glycol",
                        "glycerol-water",
                        "sea water",
                        "silicone oil",
                        "mineral oil",
                        "mercury",
                        "perfluorohexane",
                        "fluoroketone",
                        "olive oil");
    }

    /**
     * Gases over −50 to 150 °C and 1 Pa to 10 bar: wherever they do not condense the density is near that of a perfect gas and
     * rises with the pressure, the free path falls with it.
     */
    @ParameterizedTest
    @MethodSource("gases")
    void gasesCoverTheWholeRangeOfPressure(MediumEntry gas) {
        double molarMass = MediumShelf.find(MediumShelf.stem(gas.name()))
                .orElseThrow()
                .header()
                .molarMass()
                .orElseThrow();
        int answered = 0;
        for (double celsius = -50.0; celsius <= 150.0; celsius += 12.5) {
            double density = 0.0;
            double path = Double.POSITIVE_INFINITY;
            for (double pressure = 1.0; pressure <= 1e6; pressure *= 10.0) {
                try {
                    Medium medium = Media.at(plain(gas, celsius + 273.15, pressure));
                    double perfect = pressure * molarMass / (8.314462618 * (celsius + 273.15));
                    if (gas.parameters().isEmpty()) {
                        assertThat(medium.density() / perfect).isBetween(0.98, 1.35);
                    }
                    assertThat(medium.density()).isGreaterThan(density);
                    assertThat(medium.meanFreePath().orElseThrow()).isLessThan(path);
                    density = medium.density();
                    path = medium.meanFreePath().orElseThrow();
                    answered++;
                } catch (OutOfTableException e) {
                    assertThat(e.why() == Why.CONDENSES || e.parameter() == MediumParameter.HUMIDITY)
                            .as(e.getMessage())
                            .isTrue();
                }
            }
        }
        assertThat(answered).isGreaterThan(gas.parameters().isEmpty() ? 100 : 40);
    }

    private static List<MediumEntry> gases() {
        return entries().stream().filter(entry -> entry.phase() == Phase.GAS).toList();
    }
}
