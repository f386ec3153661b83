package flowshy.torque;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.medium.Medium;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

class StripFactorsTest {
    private static final double FREQUENCY = 80.0;

    /** a and ν so that Wo = 1: Γ by Stokes's table at m = 0.5 is 3.968 − 4.567 i (printed 1851), the rest by hand. */
    private static final double RADIUS = FastMath.sqrt(1.5e-5 / (2.0 * FastMath.PI * FREQUENCY));

    private static final OscillatingCylinder STRIP =
            new OscillatingCylinder(RADIUS, Medium.of("air", 1.2, 1.2 * 1.5e-5));

    @Test
    void namesEveryFactorOfAStripInTheFreeStream() {
        StripFactors factors = StripFactors.of(STRIP, OptionalDouble.empty(), FREQUENCY);
        double displaced = 1.2 * FastMath.PI * RADIUS * RADIUS;
        double omega = 2.0 * FastMath.PI * FREQUENCY;
        assertThat(factors.frequency()).isEqualTo(FREQUENCY);
        assertThat(factors.radius()).isEqualTo(RADIUS);
        assertThat(factors.womersley()).isCloseTo(1.0, within(1e-14));
        assertThat(factors.layer() / (FastMath.sqrt(2.0) * RADIUS)).isCloseTo(1.0, within(1e-14));
        assertThat(factors.gamma().getReal()).isCloseTo(3.968, within(5e-4));
        assertThat(factors.gamma().getImaginary()).isCloseTo(-4.567, within(5e-4));
        assertThat(factors.addedMass() / (displaced * 3.968)).isCloseTo(1.0, within(2e-4));
        assertThat(factors.damping() / (omega * displaced * 4.567)).isCloseTo(1.0, within(2e-4));
        assertThat(factors.share()).isEqualTo(Complex.ONE);
        // f = −iω m Γ: damping −, added mass −
        assertThat(factors.forceMoving().getReal()).isCloseTo(-factors.damping(), within(1e-18));
        assertThat(factors.forceMoving().getImaginary() / (-omega * factors.addedMass()))
                .isCloseTo(1.0, within(1e-14));
        // f = iω m (1 + Γ)
        assertThat(factors.forceStanding().getReal()).isCloseTo(factors.damping(), within(1e-18));
        assertThat(factors.forceStanding().getImaginary() / (omega * (factors.addedMass() + displaced)))
                .isCloseTo(1.0, within(1e-14));
    }

    /** At z = δ the layer lets through 0.85895 at 21.124° lead. */
    @Test
    void slowsTheStreamNearTheWall() {
        double height = FastMath.sqrt(2.0) * RADIUS;
        StripFactors factors = StripFactors.of(STRIP, OptionalDouble.of(height), FREQUENCY);
        assertThat(factors.share().norm()).isCloseTo(0.85895463, within(5e-8));
        assertThat(FastMath.toDegrees(factors.share().getArgument())).isCloseTo(21.124236, within(5e-6));
        double displaced = 2.0 * FastMath.PI * FREQUENCY * 1.2 * FastMath.PI * RADIUS * RADIUS;
        Complex expected = factors.gamma().multiply(factors.share()).add(1.0).multiply(new Complex(0.0, displaced));
        assertThat(factors.forceStanding().subtract(expected).norm() / expected.norm())
                .isCloseTo(0.0, within(1e-14));
        assertThat(factors.forceMoving())
                .isEqualTo(StripFactors.of(STRIP, OptionalDouble.empty(), FREQUENCY)
                        .forceMoving());
    }
}
