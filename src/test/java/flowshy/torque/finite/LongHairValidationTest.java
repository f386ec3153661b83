package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.HydrodynamicFunction;
import flowshy.hair.Cylinder;
import flowshy.medium.Medium;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Far from both ends, at a distance of many layers, a long hair is an endless cylinder. Radius, density and viscosity 1. */
class LongHairValidationTest {
    private static final Medium UNIT = Medium.of("unit", 1.0, 1.0);

    /** Force of the stream per length on the middle fifth against iωρπa² (1 + Γ), of rocking against −iωρπa² Γ z. */
    @ParameterizedTest
    @CsvSource({"0.05, 1e-3", "0.2, 1e-3", "1, 1.5e-3", "2, 2e-3", "5, 4e-3"})
    void middleOfALongHairFollowsTheEndlessCylinder(double delta, double tolerance) {
        double omega = 2.0 / (delta * delta);
        Complex gamma = HydrodynamicFunction.of(FastMath.sqrt(omega));
        Complex stream = gamma.add(1.0).multiply(new Complex(0.0, omega * FastMath.PI));
        Complex rocking = gamma.multiply(new Complex(0.0, -omega * FastMath.PI));
        List<ForceSlice> middle = new FiniteHair(new Cylinder(100.0, 1.0), UNIT, 0.0)
                .at(omega).slices().stream()
                        .filter(slice -> slice.bottom() > 40.0 && slice.top() < 60.0)
                        .toList();
        assertThat(middle).isNotEmpty();
        for (ForceSlice slice : middle) {
            double height = 0.5 * (slice.bottom() + slice.top());
            Complex perLength = slice.stream().divide(slice.length());
            assertThat(perLength.subtract(stream).norm() / stream.norm()).isCloseTo(0.0, within(tolerance));
            Complex perArm = slice.rocking().divide(slice.length() * height);
            assertThat(perArm.subtract(rocking).norm() / rocking.norm()).isCloseTo(0.0, within(4.0 * tolerance));
        }
    }

    /** The shape of the distribution: a spike at the tip, the upper half a little below strip theory, a force at the foot. */
    @Test
    void forceAlongTheHairDiffersFromStripsAsStated() {
        FiniteTorques torques = new FiniteHair(new Cylinder(20.0, 1.0), UNIT, 0.0).at(2.0 / 9.0);
        List<ForceSlice> side =
                torques.slices().stream().filter(slice -> slice.length() > 0.0).toList();
        assertThat(side.size()).isGreaterThan(15);
        ForceSlice last = side.get(side.size() - 1);
        assertThat(last.stream().norm() / last.stripStream().norm()).isGreaterThan(1.5);
        ForceSlice foot = side.get(0);
        assertThat(foot.stream().norm() / foot.length())
                .isGreaterThan(0.1 * last.stripStream().norm() / last.length());
        long upper = side.stream()
                .filter(slice -> slice.bottom() > 10.0 && slice.top() < 16.0)
                .peek(slice -> assertThat(
                                slice.stream().norm() / slice.stripStream().norm())
                        .isBetween(0.85, 1.1))
                .count();
        assertThat(upper).isPositive();
    }
}
