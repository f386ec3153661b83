package flowshy.math;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.StepDensity.Band;
import flowshy.math.StepDensity.Inside;
import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** What equal energy in equal ratios means: no published number, the definition itself. */
class StepDensityTest {
    @Test
    void everyThirdOctaveOfOneBandHoldsTheSame() {
        StepDensity pink = new StepDensity(List.of(new Band(100.0, 2000.0, 3.0)), Inside.PINK);
        double width = Math.log(2000.0 / 100.0);
        for (double low : new double[] {100.0, 300.0, 1500.0}) {
            double sum = 0.0;
            double step = 1e-4;
            for (double x = 0.5 * step; x < Math.log(1.25); x += step) {
                double f = low * Math.exp(x);
                sum += pink.at(f) * f * step;
            }
            assertThat(sum).isCloseTo(3.0 * Math.log(1.25) / width, Percentage.withPercentage(0.1));
        }
        assertThat(pink.at(99.9)).isZero();
        assertThat(pink.at(2000.0)).isGreaterThan(0.0);
        assertThat(pink.at(2000.1)).isZero();
    }

    @Test
    void bandsKeepTheirOwn() {
        StepDensity two = new StepDensity(List.of(new Band(10.0, 20.0, 1.0), new Band(40.0, 80.0, 4.0)), Inside.PINK);
        assertThat(two.at(15.0)).isCloseTo(1.0 / (15.0 * Math.log(2.0)), within(1e-15));
        assertThat(two.at(30.0)).isZero();
        assertThat(two.at(60.0)).isCloseTo(4.0 / (60.0 * Math.log(2.0)), within(1e-15));
        assertThat(two.at(9.0)).isZero();
        assertThat(two.meanSquare()).isEqualTo(5.0);
        assertThat(two.edges()).containsExactly(10.0, 20.0, 40.0, 80.0);
    }

    @Test
    void flatBandsAreFlat() {
        StepDensity flat = new StepDensity(
                List.of(new Band(10.0, 20.0, 1.0), new Band(20.0, 25.0, 4.0), new Band(50.0, 60.0, 0.0)), Inside.FLAT);
        assertThat(flat.at(10.0)).isCloseTo(0.1, within(1e-16));
        assertThat(flat.at(19.9)).isCloseTo(0.1, within(1e-16));
        assertThat(flat.at(20.0)).isCloseTo(0.8, within(1e-15));
        assertThat(flat.at(25.0)).isZero();
        assertThat(flat.at(55.0)).isZero();
        assertThat(flat.at(Double.NaN)).isZero();
    }

    @Test
    void refusesOverlapAndUpsideDown() {
        Band low = new Band(10.0, 20.0, 1.0);
        Band over = new Band(19.0, 30.0, 1.0);
        assertThatThrownBy(() -> new StepDensity(List.of(low, over), Inside.PINK))
                .hasMessageContaining("band 2");
        assertThatThrownBy(() -> new Band(20.0, 10.0, 1.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Band(10.0, 20.0, Double.NaN)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new StepDensity(List.of(), Inside.FLAT)).isInstanceOf(IllegalArgumentException.class);
    }
}
