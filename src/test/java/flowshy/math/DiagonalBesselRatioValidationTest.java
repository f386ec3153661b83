package flowshy.math;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Arbitrary-precision rows for the same function stand in {@code flowshy.cylinder}, with the cylinder's force. */
class DiagonalBesselRatioValidationTest {
    private static final Complex RAY = new Complex(FastMath.sqrt(0.5), FastMath.sqrt(0.5));

    /** A second method: the general routine (quadrature and series) against the marched polynomials, both parts. */
    @Test
    void agreesWithTheGeneralRoutineEverywhereOnTheRay() {
        int points = 0;
        for (double x = 1e-6; x < 1e4; x *= 1.0137) {
            Complex ratio = DiagonalBesselRatio.ratio(x);
            Complex general = BesselK.ratio(RAY.multiply(x));
            assertThat(ratio.subtract(general).norm() / general.norm())
                    .as("x = %s", x)
                    .isCloseTo(0.0, within(5e-15));
            points++;
        }
        assertThat(points).isGreaterThan(1000);
    }

    /** No step where one method hands over to the next: neighbours differ by the slope only. */
    @ParameterizedTest
    @ValueSource(doubles = {0.0078125, 0.125, 0.1328125, 1.0, 2.0, 17.0, 32.0})
    void hasNoStepsAtItsSeams(double seam) {
        Complex below = DiagonalBesselRatio.timesArgument(FastMath.nextDown(seam));
        Complex above = DiagonalBesselRatio.timesArgument(seam);
        assertThat(above.getReal() / below.getReal()).isCloseTo(1.0, within(5e-15));
        assertThat(above.getImaginary() / below.getImaginary()).isCloseTo(1.0, within(5e-15));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -1.0, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesWhatIsNotPositiveAndFinite(double x) {
        assertThatThrownBy(() -> DiagonalBesselRatio.timesArgument(x)).isInstanceOf(IllegalArgumentException.class);
    }
}
