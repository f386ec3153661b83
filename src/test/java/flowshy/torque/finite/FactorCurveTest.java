package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.medium.Medium;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

class FactorCurveTest {
    private static final Medium AIR = Medium.of("air", 1.204, 1.825e-5);
    private static final Medium WATER = Medium.of("water", 998.2, 1.0016e-3);

    @Test
    void holdsBetweenItsPoints() {
        hold(new FiniteHair(new Cylinder(800e-6, 40e-6), WATER, 0.0));
        hold(new FiniteHair(new Club(900e-6, 20e-6, 400e-6, 100e-6, 60e-6, Club.End.ROUND), AIR, 0.0));
    }

    private static void hold(FiniteHair hair) {
        FactorCurve curve = new FactorCurve(hair, 30.0, 3e4);
        int points = 0;
        for (double omega = 37.0; omega < 3e4; omega *= 3.7) {
            FiniteFactors exact = hair.at(omega).factors();
            FiniteFactors found = curve.at(omega);
            assertThat(found.stream().subtract(exact.stream()).norm()).isLessThan(1e-3);
            assertThat(found.rocking().subtract(exact.rocking()).norm()).isLessThan(1e-3);
            assertThat(found.streamError()).isFinite().isBetween(1e-6, 0.01);
            points++;
        }
        assertThat(points).isGreaterThan(4);
    }

    /** In the liquid at high frequency the layer is too thin for the solver; the factors stay, and say from where. */
    @Test
    void holdsItsLastValueWhereTheLayerIsTooThin() {
        FiniteHair hair = new FiniteHair(new Cylinder(800e-6, 40e-6), WATER, 0.0);
        FactorCurve curve = new FactorCurve(hair, 1e4, 1e8);
        assertThat(curve.heldAbove()).isCloseTo(hair.highestFrequency(), within(1.0));
        assertThat(curve.at(1e8)).isEqualTo(curve.at(curve.heldAbove()));
        assertThat(FastMath.abs(curve.at(1e8).stream().getImaginary())).isLessThan(0.01);
        FactorCurve reached = new FactorCurve(hair, 1e3, 1e4);
        assertThat(reached.heldAbove()).isEqualTo(1e4);
    }

    @Test
    void refusesFrequenciesOutside() {
        FactorCurve curve = new FactorCurve(new FiniteHair(new Cylinder(800e-6, 40e-6), AIR, 0.0), 100.0, 200.0);
        assertThatThrownBy(() -> curve.at(250.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> curve.at(Double.NaN)).isInstanceOf(IllegalArgumentException.class);
        FiniteHair hair = new FiniteHair(new Cylinder(800e-6, 40e-6), AIR, 0.0);
        assertThatThrownBy(() -> new FactorCurve(hair, 200.0, 100.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new FactorCurve(hair, 0.0, 100.0)).isInstanceOf(IllegalArgumentException.class);
    }
}
