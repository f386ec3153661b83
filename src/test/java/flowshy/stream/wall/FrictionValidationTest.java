package flowshy.stream.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.stream.ReferenceRows;
import java.util.Map;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Against measured pipes (Stanton and Pannell 1914) and textbook tables. */
class FrictionValidationTest {
    @Test
    void pipesAsMeasured() {
        for (Map<String, Double> row : ReferenceRows.read(FrictionValidationTest.class, "pipe-friction.csv", 14)) {
            double reynolds = row.get("reynolds");
            double measured = 8.0 * row.get("coefficient");
            assertThat(PipeFriction.PRANDTL.factor(reynolds))
                    .as("%s", row)
                    .isCloseTo(measured, Percentage.withPercentage(3.5));
            if (PipeFriction.BLASIUS.range().contains(reynolds)) {
                assertThat(PipeFriction.BLASIUS.factor(reynolds))
                        .as("%s", row)
                        .isCloseTo(measured, Percentage.withPercentage(3.5));
            }
        }
    }

    /** Textbook table of Prandtl's law (from memory: 0.0309, 0.0180, 0.0116), digits of a solution made elsewhere. */
    @Test
    void prandtlToTheTable() {
        assertThat(PipeFriction.PRANDTL.factor(1e4)).isCloseTo(0.030889096, within(0.5e-9));
        assertThat(PipeFriction.PRANDTL.factor(1e5)).isCloseTo(0.017992594, within(0.5e-9));
        assertThat(PipeFriction.PRANDTL.factor(1e6)).isCloseTo(0.011646541, within(0.5e-9));
    }

    @Test
    void blasiusToTheTable() {
        assertThat(PipeFriction.BLASIUS.factor(1e4)).isCloseTo(0.03164, within(0.5e-5));
        assertThat(PipeFriction.BLASIUS.factor(1e5)).isCloseTo(0.01779, within(0.5e-5));
    }

    /** Values from the page of check values; the two laws within 15 % of each other where both hold. */
    @Test
    void platesToTheTable() {
        assertThat(PlateFriction.POWER.coefficient(1e5)).isCloseTo(5.21e-3, within(0.5e-5));
        assertThat(PlateFriction.LOGARITHMIC.coefficient(1e5)).isCloseTo(6.01e-3, within(0.5e-5));
        for (double reynolds : new double[] {1e5, 1e6, 1e7}) {
            assertThat(PlateFriction.POWER.coefficient(reynolds))
                    .isCloseTo(PlateFriction.LOGARITHMIC.coefficient(reynolds), Percentage.withPercentage(15.0));
        }
    }

    /** u_τ = U √(c_f/2): at c_f = 6.01e-3 a stream of 10 m/s has 0.548 m/s. */
    @Test
    void frictionVelocityOfAPlate() {
        assertThat(PlateFriction.LOGARITHMIC.frictionVelocity(10.0, 1e5)).isCloseTo(0.548, within(0.5e-3));
    }

    @Test
    void refusesOutsideTheRange() {
        assertThatThrownBy(() -> PipeFriction.BLASIUS.factor(2e5)).hasMessageContaining("4000.00 to 100000");
        assertThatThrownBy(() -> PipeFriction.PRANDTL.factor(100.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> PlateFriction.POWER.coefficient(Double.NaN))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
