package flowshy.stream.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.stream.ReferenceRows;
import java.util.List;
import java.util.Map;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Against a direct simulation of channel flow, evaluations of Spalding's curve made elsewhere, and its two limits. */
class TurbulentWallValidationTest {
    private static final List<Map<String, Double>> CHANNEL =
            ReferenceRows.read(TurbulentWallValidationTest.class, "channel-flow.csv", 10);
    /** u_τ = ν = 1: heights and velocities are in wall units. */
    private static final TurbulentWall UNIT = new TurbulentWall(1.0, 1.0);

    /** Spalding's curve lies within 6.5 % of the simulation, lowest near z⁺ = 26. */
    @Test
    void meanFollowsTheSimulation() {
        for (Map<String, Double> row : CHANNEL) {
            assertThat(UNIT.speedAt(row.get("z_plus")))
                    .as("%s", row)
                    .isCloseTo(row.get("u_plus"), Percentage.withPercentage(6.5));
        }
    }

    /** The estimate of the fluctuation: 8 % low in the sublayer and at the peak, up to 25 % high elsewhere. */
    @Test
    void fluctuationFollowsTheSimulationAsAnEstimate() {
        for (Map<String, Double> row : CHANNEL) {
            double ratio = UNIT.fluctuationAt(row.get("z_plus")) / row.get("rms_plus");
            assertThat(ratio).as("%s", row).isBetween(0.92, 1.25);
        }
        for (Map<String, Double> row : CHANNEL) {
            double ratio = UNIT.acrossFluctuationAt(row.get("z_plus")) / row.get("across_rms_plus");
            assertThat(ratio).as("%s", row).isBetween(0.75, 1.4);
        }
        assertThat(UNIT.acrossFluctuationAt(2.0)).isCloseTo(0.4, within(1e-15));
        assertThat(UNIT.acrossFluctuationAt(15.0)).isCloseTo(1.4, within(1e-15));
        assertThat(UNIT.fluctuationAt(2.0)).isCloseTo(0.8, within(1e-15));
        assertThat(UNIT.fluctuationAt(15.0)).isCloseTo(2.7, within(1e-15));
    }

    /** κ = 0.41, B = 5.0; bisection of Spalding's equation outside this project, printed digits. */
    @Test
    void spaldingAtFourHeights() {
        assertThat(TurbulentWall.speedInWallUnits(1.0)).isCloseTo(0.99983521, within(0.5e-8));
        assertThat(TurbulentWall.speedInWallUnits(5.0)).isCloseTo(4.865648, within(0.5e-6));
        assertThat(TurbulentWall.speedInWallUnits(30.0)).isCloseTo(12.633801, within(0.5e-6));
        assertThat(TurbulentWall.speedInWallUnits(100.0)).isCloseTo(16.077101, within(0.5e-6));
    }

    /** z⁺ → 0: u⁺ = z⁺ less a term of order z⁺⁴; z⁺ → ∞: ln(z⁺)/0.41 + 5.0. */
    @Test
    void limitsAreTheSublayerAndTheLogarithm() {
        double z = 0.1;
        double tail = Math.exp(-0.41 * 5.0) * Math.pow(0.41 * z, 4) / 24.0;
        assertThat(TurbulentWall.speedInWallUnits(z)).isCloseTo(z - tail, within(tail * 0.02));
        assertThat(TurbulentWall.speedInWallUnits(0.0)).isZero();
        assertThat(TurbulentWall.speedInWallUnits(1e6)).isCloseTo(Math.log(1e6) / 0.41 + 5.0, within(0.005));
    }

    @Test
    void unitsOfTheWall() {
        TurbulentWall wall = new TurbulentWall(0.25, 1.5e-5);
        assertThat(wall.wallUnits(6e-4)).isCloseTo(10.0, within(1e-12));
        assertThat(wall.speedAt(6e-4)).isCloseTo(0.25 * TurbulentWall.speedInWallUnits(10.0), within(1e-12));
        assertThat(wall.fluctuationAt(6e-5)).isCloseTo(0.25 * 0.4, within(1e-12));
        assertThatThrownBy(() -> TurbulentWall.speedInWallUnits(Double.NaN))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new TurbulentWall(-1.0, 1.5e-5)).isInstanceOf(IllegalArgumentException.class);
    }
}
