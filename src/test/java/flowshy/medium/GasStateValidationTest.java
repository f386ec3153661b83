package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The shared laws of gases against worked examples and limits. */
class GasStateValidationTest {
    /**
     * Bird, Stewart &amp; Lightfoot, Transport Phenomena, example on a mixture of carbon dioxide, oxygen and nitrogen: the interaction
     * factors printed to three decimals (from memory). Viscosities in 1e-7 g/(cm·s).
     */
    @ParameterizedTest
    @CsvSource({
        "1462, 44.010, 2031, 32.000, 0.730",
        "1462, 44.010, 1754, 28.016, 0.727",
        "2031, 32.000, 1462, 44.010, 1.394",
        "2031, 32.000, 1754, 28.016, 1.006",
        "1754, 28.016, 1462, 44.010, 1.370",
        "1754, 28.016, 2031, 32.000, 0.993"
    })
    void interactionFactorsAreThoseOfTheTextbook(double mu, double m, double otherMu, double otherM, double printed) {
        assertThat(GasState.interaction(mu, m, otherMu, otherM)).isCloseTo(printed, within(0.0006));
    }

    /** Two gases of one kind are that gas, at every share. */
    @Test
    void aGasMixedWithItselfStaysItself() {
        for (double share : new double[] {0.0, 0.2, 0.7, 1.0}) {
            assertThat(GasState.wilke(share, 1.8e-5, 0.028, 1.8e-5, 0.028)).isCloseTo(1.8e-5, withinPercentage(1e-12));
        }
    }

    /**
     * A light gas can make a mixture more viscous than both: helium in argon near 20 °C. Measured maxima lie at a few per cent above argon (Iwasaki &amp;
     * Kestin 1963, from memory); the rule must show the hump.
     */
    @Test
    void heliumInArgonShowsTheHump() {
        double argon = 22.3e-6;
        double mixed = GasState.wilke(0.5, 19.6e-6, 4.0026e-3, argon, 39.948e-3);
        assertThat(mixed).isBetween(argon, 1.06 * argon);
    }

    /** Z solves its own quadratic, and tends to 1 + Bp/(RT) for small departures. */
    @Test
    void compressibilitySolvesTheGasLaw() {
        double rt = 8.31446261815324 * 300.0;
        double b = -1.2e-4;
        double z = GasState.compressibility(b, 300.0, 5e5);
        assertThat(z).isCloseTo(1.0 + b * 5e5 / (z * rt), within(1e-15));
        assertThat(GasState.compressibility(1e-6, 300.0, 1e3) - 1.0).isCloseTo(1e-6 * 1e3 / rt, withinPercentage(1e-3));
    }

    /** Argon and nitrogen as perfect gases: c_p/R = 5/2 and 7/2, to what the real gases depart at one atmosphere. */
    @ParameterizedTest
    @CsvSource({"argon, 39.948e-3, 2.5, 0.4", "helium, 4.0026e-3, 2.5, 0.4", "nitrogen, 28.0135e-3, 3.5, 0.5"})
    void heatCapacityOfTheTablesIsThatOfTheirMolecules(String gas, double molarMass, double expected, double percent) {
        double c = Media.at(MediumQuery.of(gas, 293.15, 101325.0)).soundSpeed().orElseThrow();
        double heat = GasState.heatCapacity(c, 293.15, molarMass);
        assertThat(heat).isCloseTo(expected, withinPercentage(percent));
        assertThat(GasState.soundSpeed(heat, 293.15, molarMass)).isCloseTo(c, withinPercentage(1e-12));
    }
}
