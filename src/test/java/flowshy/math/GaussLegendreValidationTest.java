package flowshy.math;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class GaussLegendreValidationTest {
    /** Two and three points by hand: ±1/√3 with 1, and 0, ±√(3/5) with 8/9 and 5/9. */
    @Test
    void twoAndThreePointsByHand() {
        GaussLegendre two = GaussLegendre.of(2);
        assertThat(two.point(0)).isCloseTo(-FastMath.sqrt(1.0 / 3.0), within(1e-16));
        assertThat(two.weight(1)).isCloseTo(1.0, within(1e-15));
        GaussLegendre three = GaussLegendre.of(3);
        assertThat(three.point(1)).isZero();
        assertThat(three.point(2)).isCloseTo(FastMath.sqrt(0.6), within(1e-16));
        assertThat(three.weight(1)).isCloseTo(8.0 / 9.0, within(1e-15));
        assertThat(three.weight(0)).isCloseTo(5.0 / 9.0, within(1e-15));
        assertThat(GaussLegendre.of(1).weight(0)).isCloseTo(2.0, within(1e-15));
    }

    /** Another implementation, by another method. */
    @ParameterizedTest
    @ValueSource(ints = {4, 5, 8, 14, 24, 48, 96})
    void agreesWithTheLibrary(int size) {
        GaussLegendre rule = GaussLegendre.of(size);
        GaussIntegrator library = new GaussIntegratorFactory().legendre(size);
        assertThat(rule.size()).isEqualTo(library.getNumberOfPoints());
        for (int i = 0; i < size; i++) {
            assertThat(rule.point(i)).isCloseTo(library.getPoint(i), within(3e-16));
            assertThat(rule.weight(i) / library.getWeight(i)).isCloseTo(1.0, within(2e-13));
        }
    }

    /** ∫ x^k is 2/(k + 1) or 0 up to k = 2n − 1, and no longer at 2n. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 5, 8, 14, 24, 60})
    void isExactToDegreeTwoNLessOne(int size) {
        GaussLegendre rule = GaussLegendre.of(size);
        for (int k = 0; k < 2 * size; k++) {
            assertThat(power(rule, k)).as("x^%d", k).isCloseTo(k % 2 == 0 ? 2.0 / (k + 1) : 0.0, within(2e-15));
        }
        if (size <= 14) {
            assertThat(power(rule, 2 * size)).isLessThan(2.0 / (2 * size + 1) * (1.0 - 1e-9));
        }
    }

    private static double power(GaussLegendre rule, int k) {
        double sum = 0.0;
        for (int i = 0; i < rule.size(); i++) {
            sum += rule.weight(i) * FastMath.pow(rule.point(i), k);
        }
        return sum;
    }

    @Test
    void makesARuleOnceAndRefusesSizesThatAreNone() {
        assertThat(GaussLegendre.of(17)).isSameAs(GaussLegendre.of(17));
        assertThatThrownBy(() -> GaussLegendre.of(0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> GaussLegendre.of(1001)).isInstanceOf(IllegalArgumentException.class);
    }
}
