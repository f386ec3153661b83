package flowshy.stream.cover;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Own estimate; no published value exists, so the momentum balance itself, its limits by hand and a difference quotient are the check. */
class RoofThroughFlowValidationTest {
    private static final double NU = 1.516e-5;

    @Test
    void balancesStagnationPressureAndFriction() {
        RoofThroughFlow roof = new RoofThroughFlow(0.6e-3, 4e-3, NU);
        for (double stream : new double[] {0.01, 0.3, 2.0, 15.0}) {
            double through = roof.speed(stream);
            double friction = 12.0 * NU * through * 4e-3 / (0.6e-3 * 0.6e-3);
            assertThat(friction)
                    .isCloseTo(0.5 * (stream * stream - through * through), within(1e-12 * stream * stream));
        }
    }

    /** Slow stream: U_g → U²H²/(24νℓ); fast stream: U_g → U. */
    @Test
    void hasBothLimits() {
        RoofThroughFlow roof = new RoofThroughFlow(0.3e-3, 6e-3, NU);
        double slow = 1e-4;
        assertThat(roof.speed(slow)).isCloseTo(slow * slow * 9e-8 / (24.0 * NU * 6e-3), within(1e-10 * slow));
        assertThat(roof.speed(1e5)).isCloseTo(1e5, within(50.0));
    }

    @Test
    void gainIsTheSlopeOfTheSpeed() {
        RoofThroughFlow roof = new RoofThroughFlow(0.6e-3, 4e-3, NU);
        double step = 1e-5;
        double slope = (roof.speed(0.8 + step) - roof.speed(0.8 - step)) / (2.0 * step);
        assertThat(roof.gain(0.8)).isCloseTo(slope, within(1e-9));
        assertThat(roof.gain(0.0)).isZero();
    }

    @Test
    void parabolaCarriesTheMeanAndTheEntryDecides() {
        RoofThroughFlow roof = new RoofThroughFlow(0.6e-3, 4e-3, NU);
        double mean = 0.0;
        for (int i = 0; i < 1000; i++) {
            mean += roof.parabola((i + 0.5) * 0.6e-6) / 1000.0;
        }
        assertThat(mean).isCloseTo(1.0, within(1e-6));
        assertThat(roof.developed(0.1)).isTrue();
        assertThat(roof.developed(20.0)).isFalse();
    }
}
