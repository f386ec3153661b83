package flowshy.stream.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Against the textbook transition of quiet streams, the correlation worked by hand, and what the intermittency is defined by. */
class TransitionValidationTest {
    /** Quiet tunnels show transition between Re_x = 2.8e6 and 3.9e6 (Schubauer and Skramstad 1947, turbulence 0.03 to 0.1 %, from memory). */
    @Test
    void quietStreamTurnsWhereTheTunnelsSay() {
        assertThat(new Transition(0.0003).reynolds()).isBetween(2.8e6, 3.9e6);
        assertThat(new Transition(0.001).reynolds()).isBetween(2.3e6, 2.8e6);
    }

    /** The correlation at Tu = 1 % and 3 %: 163 + e^5.91 = 531.7, 163 + e^3.91 = 212.9, by hand. */
    @Test
    void correlationByHand() {
        assertThat(new Transition(0.01).momentumReynolds()).isCloseTo(531.7, within(0.05));
        assertThat(new Transition(0.03).momentumReynolds()).isCloseTo(212.9, within(0.05));
        assertThat(new Transition(0.03).reynolds()).isCloseTo(1.0280e5, within(50.0)); // (212.899/0.664)²
    }

    /** A very turbulent stream cannot turn the layer before Re_θ = 163. */
    @Test
    void floorIsTheLeastReynoldsNumber() {
        assertThat(new Transition(0.35).momentumReynolds()).isCloseTo(163.0, within(1e-6));
        assertThat(Transition.TURBULENCE.contains(0.35)).isFalse();
        assertThat(Transition.TURBULENCE.contains(0.05)).isTrue();
    }

    /** λ is by definition the way from γ = ¼ to ¾ and Re_λ = 5 Re_t^0.8; the constant 0.412 gives it to its three digits. */
    @Test
    void intermittencyGrowsOverTheStatedLength() {
        Transition transition = new Transition(0.02);
        double quarter = at(transition, 0.25);
        double threeQuarters = at(transition, 0.75);
        assertThat((threeQuarters - quarter) / (5.0 * Math.pow(transition.reynolds(), 0.8)))
                .isCloseTo(1.0, within(0.002));
        assertThat(transition.intermittency(transition.reynolds() + 5.0 * Math.pow(transition.reynolds(), 0.8)))
                .isCloseTo(0.33767572, within(1e-7)); // 1 − e^−0.412
        assertThat(transition.intermittency(transition.reynolds())).isZero();
        assertThat(transition.intermittency(0.0)).isZero();
        assertThat(transition.intermittency(20.0 * transition.reynolds())).isCloseTo(1.0, within(1e-12));
    }

    private static double at(Transition transition, double share) {
        double low = transition.reynolds();
        double high = 100.0 * low;
        for (int i = 0; i < 200; i++) {
            double middle = 0.5 * (low + high);
            if (transition.intermittency(middle) < share) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    @Test
    void refusesAStreamWithoutTurbulence() {
        assertThatThrownBy(() -> new Transition(0.0)).isInstanceOf(IllegalArgumentException.class);
    }
}
