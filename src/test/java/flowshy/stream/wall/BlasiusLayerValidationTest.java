package flowshy.stream.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Against the digits that textbooks print (Blasius 1908, Howarth 1938). */
class BlasiusLayerValidationTest {
    /** U = ν = x = 1, so z is η and Re_x is 1. */
    private static final BlasiusLayer UNIT = new BlasiusLayer(1.0, 1.0, 1.0);

    @Test
    void wallShearIsThePrintedConstant() {
        assertThat(Blasius.wallCurvature()).isCloseTo(0.33206, within(0.5e-5));
        assertThat(Blasius.wallCurvature()).isCloseTo(0.332057336215, within(1e-11)); // Boyd 1999, from memory
        assertThat(UNIT.frictionCoefficient()).isCloseTo(0.6641, within(0.5e-4));
    }

    @Test
    void thicknessesAreThePrintedOnes() {
        assertThat(UNIT.thickness()).isCloseTo(4.91, within(0.005));
        assertThat(UNIT.displacementThickness()).isCloseTo(1.7208, within(0.5e-4));
        assertThat(UNIT.momentumThickness()).isCloseTo(0.6641, within(0.5e-4));
        assertThat(UNIT.displacementThickness() / UNIT.momentumThickness()).isCloseTo(2.591, within(0.5e-3));
    }

    /** Howarth's table of f′, in the digits of our own check list (40-digit integration, not made with this code). */
    @Test
    void profileFollowsTheTable() {
        double[] table = {0.329780, 0.629766, 0.846044, 0.955518, 0.991542};
        for (int i = 0; i < table.length; i++) {
            assertThat(UNIT.speedAt(i + 1.0)).isCloseTo(table[i], within(0.6e-6));
        }
    }

    /** The equation itself, between grid points, by central differences of the interpolated curvature. */
    @Test
    void equationHoldsBetweenTheGridPoints() {
        for (double eta = 0.0137; eta < 8.0; eta += 0.3171) {
            double h = 1e-3;
            double third = (Blasius.curvature(eta + h) - Blasius.curvature(eta - h)) / (2.0 * h);
            assertThat(third + 0.5 * Blasius.f(eta) * Blasius.curvature(eta)).isCloseTo(0.0, within(2e-7));
        }
    }

    /** Twice the fetch: √2 times the thickness. Four times the speed: half. */
    @Test
    void scalesAsTheLawSays() {
        BlasiusLayer layer = new BlasiusLayer(0.4, 0.02, 1.5e-5);
        assertThat(layer.thickness()).isCloseTo(4.90999 * 0.02 / Math.sqrt(layer.reynolds()), within(1e-8));
        assertThat(new BlasiusLayer(0.4, 0.04, 1.5e-5).thickness())
                .isCloseTo(Math.sqrt(2.0) * layer.thickness(), within(1e-12));
        assertThat(new BlasiusLayer(1.6, 0.02, 1.5e-5).thickness()).isCloseTo(0.5 * layer.thickness(), within(1e-12));
        assertThat(layer.speedAt(1.0)).isEqualTo(0.4);
        assertThat(layer.speedAt(0.0)).isZero();
    }

    @Test
    void refusesWhatIsNoLayer() {
        assertThatThrownBy(() -> new BlasiusLayer(0.0, 0.02, 1.5e-5))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("speed");
        assertThatThrownBy(() -> new BlasiusLayer(1.0, Double.NaN, 1.5e-5)).hasMessageContaining("fetch");
    }
}
