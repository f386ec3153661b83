package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.withinPercentage;

import flowshy.math.Caveat;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A closed can over temperature. */
class SealedFillTest {
    private static MediumQuery room(String gas) {
        return MediumQuery.of(gas, 293.15, 101325.0);
    }

    @ParameterizedTest
    @CsvSource({"nitrogen, -40", "nitrogen, 85", "sulfur hexafluoride, -40", "sulfur hexafluoride, 120", "helium, 150"})
    void aGasKeepsItsDensity(String gas, double celsius) {
        Medium filled = Media.at(room(gas));
        Medium later = new SealedFill(room(gas)).at(celsius + 273.15);
        assertThat(later.density()).isCloseTo(filled.density(), withinPercentage(1e-9));
        assertThat(later.temperature()).isEqualTo(celsius + 273.15);
    }

    /** Helium is nearly perfect: the pressure follows Gay-Lussac's law, T/T₀ = 423.15/293.15, within the virial term of 5e-4. */
    @Test
    void thePressureFollowsGayLussac() {
        Medium hot = new SealedFill(room("helium")).at(423.15);
        assertThat(hot.pressure()).isCloseTo(101325.0 * 423.15 / 293.15, withinPercentage(0.01));
    }

    /** The viscosity is that of the table at the new temperature, the mean free path follows the viscosity at constant density. */
    @Test
    void theMeanFreePathHardlyChanges() {
        Medium cold = Media.at(room("nitrogen"));
        Medium hot = new SealedFill(room("nitrogen")).at(373.15);
        assertThat(hot.viscosity()).isGreaterThan(1.15 * cold.viscosity());
        double expected = hot.viscosity() / cold.viscosity() * Math.sqrt(293.15 / 373.15);
        assertThat(hot.meanFreePath().orElseThrow() / cold.meanFreePath().orElseThrow())
                .isCloseTo(expected, withinPercentage(0.1));
    }

    @Test
    void aMixtureKeepsItsShareAndDensity() {
        MediumQuery mixture = room("nitrogen").with("helium", 0.2);
        Medium later = new SealedFill(mixture).at(253.15);
        assertThat(later.density()).isCloseTo(Media.at(mixture).density(), withinPercentage(1e-9));
        assertThat(later.name()).contains("20 % helium");
    }

    /**
     * 30 % at 20 °C is 702 Pa of vapour; in a closed can it falls with T to 654 Pa at 0 °C, more than the 611 Pa that can stay, and to
     * 661 Pa at 3 °C, less than 758 Pa.
     */
    @Test
    void moistAirCondensesBelowItsDewPoint() {
        MediumQuery air = room("air").with(MediumParameter.HUMIDITY, 0.3);
        Medium above = new SealedFill(air).at(273.15 + 3.0);
        Medium below = new SealedFill(air).at(273.15);
        assertThat(above.caveats()).noneMatch(caveat -> caveat.text().contains("condenses"));
        assertThat(below.caveats())
                .anyMatch(caveat -> caveat.text().contains("condenses") && caveat.weight() == Caveat.Weight.WEAK);
        assertThat(above.density()).isCloseTo(Media.at(air).density(), withinPercentage(1e-9));
        assertThat(below.density()).isLessThan(Media.at(air).density());
        assertThat(below.density()).isCloseTo(Media.at(air).density(), withinPercentage(0.1));
    }

    /** At 60 °C the same vapour is a humidity of about 4 %: 0.3 · 2339/19950 · 333.15/293.15 = 0.040. */
    @Test
    void moistAirDriesWhenHeated() {
        MediumQuery air = room("air").with(MediumParameter.HUMIDITY, 0.3);
        Medium hot = new SealedFill(air).at(333.15);
        assertThat(hot.density()).isCloseTo(Media.at(air).density(), withinPercentage(1e-9));
        assertThat(hot.name()).startsWith("air, 3.99");
    }

    @Test
    void aLiquidKeepsItsPressureAndAClosedGasCanStillCondense() {
        assertThat(new SealedFill(room("water")).at(323.15))
                .isEqualTo(Media.at(room("water").at(323.15, 101325.0)));
        assertThatThrownBy(() -> new SealedFill(MediumQuery.of("carbon dioxide", 293.15, 9.5e5)).at(223.15))
                .isInstanceOf(OutOfTableException.class);
    }
}
