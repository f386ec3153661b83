package flowshy.stream.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** How the two layers are put together; each has its own validation. */
class PlateFlowTest {
    private static final double AIR = 1.51e-5;

    @Test
    void slowDraughtIsBlasius() {
        PlateFlow flow = PlateFlow.of(0.3, 0.02, 0.4, AIR);
        assertThat(flow.intermittency()).isZero();
        assertThat(flow.speedAt(8e-4)).isEqualTo(new BlasiusLayer(0.3, 0.02, AIR).speedAt(8e-4));
        assertThat(flow.thickness())
                .isCloseTo(4.91 * 0.02 / Math.sqrt(0.3 * 0.02 / AIR), Percentage.withPercentage(0.01));
    }

    /** 10 m/s after half a metre at 5 %: Re_x = 3.3e5; the layer is turbulent, thickness 0.37 x Re_x^(−1/5) = 14.6 mm. */
    @Test
    void longFetchIsTurbulent() {
        PlateFlow flow = PlateFlow.of(10.0, 0.5, 0.05, AIR);
        assertThat(flow.intermittency()).isCloseTo(1.0, within(1e-9));
        assertThat(flow.wall().frictionVelocity())
                .isCloseTo(
                        10.0 * Math.sqrt(0.5 * 0.455 / Math.pow(Math.log(0.06 * 10.0 * 0.5 / AIR), 2)), within(1e-9));
        assertThat(flow.speedAt(6e-4)).isCloseTo(flow.wall().speedAt(6e-4), within(1e-9));
        assertThat(flow.thickness()).isCloseTo(0.0145608, within(2e-6));
        assertThat(flow.speedAt(1.0)).isEqualTo(10.0);
    }

    /** Along the fetch, through transition: rising shear, no step above what the step of the fetch explains. */
    @Test
    void noStepThroughTransition() {
        Transition transition = new Transition(0.03);
        double start = transition.reynolds() * AIR / 10.0;
        double before = PlateFlow.of(10.0, start * (1.0 - 1e-9), 0.03, AIR).speedAt(5e-4);
        double behind = PlateFlow.of(10.0, start * (1.0 + 1e-9), 0.03, AIR).speedAt(5e-4);
        assertThat(behind).isCloseTo(before, Percentage.withPercentage(1e-7));
        double between = PlateFlow.of(10.0, 1.4 * start, 0.03, AIR).intermittency();
        assertThat(between).isBetween(0.2, 0.95);
    }
}
