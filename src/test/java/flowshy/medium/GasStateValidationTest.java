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
        double z = new Virial(-1.2e-4, 0.0, 0.0).compressibility(300.0, 5e5);
        assertThat(z).isCloseTo(1.0 - 1.2e-4 * 5e5 / (z * rt), within(1e-15));
        double thin = new Virial(1e-6, 0.0, 0.0).compressibility(300.0, 1e3);
        assertThat(thin - 1.0).isCloseTo(1e-6 * 1e3 / rt, withinPercentage(1e-3));
    }

    /**
     * Hard spheres have a B that does not depend on temperature; then ρ = p M/(RT + Bp) at this order, and c² = γ (∂p/∂ρ) at constant T grows
     * by (1 + Bp/(RT))², so β = 2B for every γ.
     */
    @Test
    void hardSpheresHaveTwiceTheirVolumeAsAcousticCoefficient() {
        Virial spheres = new Virial(5e-5, 0.0, 0.0);
        double rt = 8.31446261815324 * 250.0;
        assertThat(spheres.acousticFactor(5.0 / 3.0, 250.0, 1e5) - 1.0)
                .isCloseTo(2.0 * 5e-5 * 1e5 / rt, withinPercentage(1e-9));
    }

    /** γ of the perfect gas: 5/3 for single atoms; 1.3997 for nitrogen at 20 °C, whose vibration is still frozen (c_p = 29.12 J/(mol·K), from memory). */
    @ParameterizedTest
    @CsvSource({"argon, 1.66667, 0.06", "helium, 1.66667, 0.06", "nitrogen, 1.39965, 0.06"})
    void perfectGammaIsThatOfTheMolecules(String gas, double expected, double percent) {
        PureGas law = new PureGas(MediumShelf.find(gas).orElseThrow());
        double gamma = law.perfectGamma(293.15).orElseThrow();
        assertThat(gamma).isCloseTo(expected, withinPercentage(percent));
        assertThat(GasState.gamma(GasState.heatCapacity(gamma))).isCloseTo(gamma, withinPercentage(1e-12));
    }

    /** Slopes of the fitted coefficient against central differences of its own values, step 0.01 K and 1 K. */
    @Test
    void virialSlopesAreThoseOfTheCurve() {
        TableCurves curves =
                new TableCurves(MediumShelf.find("carbon-dioxide").orElseThrow().rows());
        double t = 300.0;
        double rise = curves.virial(t + 0.01).value() - curves.virial(t - 0.01).value();
        double bend = curves.virial(t + 1.0).value()
                - 2.0 * curves.virial(t).value()
                + curves.virial(t - 1.0).value();
        assertThat(curves.virial(t).slope()).isCloseTo(t * rise / 0.02, withinPercentage(1e-4));
        assertThat(curves.virial(t).bend()).isCloseTo(t * t * bend, withinPercentage(1e-2));
    }

    /** The fitted coefficient stays within the rounding of its column, here four digits. */
    @ParameterizedTest
    @CsvSource({"nitrogen, 6e-9", "carbon-dioxide, 8e-8", "sulfur-hexafluoride, 8e-8", "dry-air, 6e-9", "helium, 6e-9"})
    void virialCurveFollowsItsColumn(String file, double rounding) {
        MediumTable table = MediumShelf.find(file).orElseThrow();
        TableCurves curves = new TableCurves(table.rows());
        assertThat(table.rows()).hasSizeGreaterThan(40);
        for (TableRow row : table.rows()) {
            assertThat(curves.virial(row.temperature()).value())
                    .isCloseTo(row.secondVirial().orElseThrow(), within(rounding));
        }
    }
}
