package flowshy.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.medium.Medium;
import flowshy.stream.cover.Covers;
import java.util.Optional;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CalibrationTest {
    private static final Medium AIR = Medium.of("air", 1.2, 1.82e-5);
    private static final Medium HELIUM = Medium.of("helium", 0.1663, 1.962e-5);
    private static final Suspension HELD = Devices.suspension(6e-9, 7e-13, 0.0, 0.0, Attitude.HORIZONTAL);

    /** Calibrated bare in air, used in a can of helium: other torque, other medium around the hair, same suspension. */
    @Test
    void comparesTheCanWithTheBareDevice() {
        Device can = new Device(Devices.ROD, Optional.of(HELD), AIR, Covers.SEALED, HELIUM);
        Calibration bare = new Calibration(80.0, Covers.OPEN);
        Device bench = bare.calibrated(can);
        assertThat(bench.cover()).isEqualTo(Covers.OPEN);
        assertThat(bench.around()).isEqualTo(AIR);
        Calibration.Figures figures = bare.figures(can);
        double use = new Response(can).at(80.0).motion().orElseThrow().norm();
        double before = new Response(Devices.device(Devices.ROD, HELD, AIR, Covers.OPEN))
                .at(80.0)
                .motion()
                .orElseThrow()
                .norm();
        assertThat(figures.angle()).isTrue();
        assertThat(figures.sensitivity()).isEqualTo(before);
        assertThat(figures.change()).isCloseTo(use / before, within(1e-15));
        assertThat(figures.level()).isCloseTo(20.0 * FastMath.log10(use / before), within(1e-13));
        assertThat(figures.percent()).isCloseTo(100.0 * (use / before - 1.0), within(1e-12));
    }

    /** Well below the resonance of a heavy hair in a thin gas both covers read ρ_h P[1]/S, to a part in a thousand or so. */
    @Test
    void hardlyChangesInAGasFarBelowTheResonance() {
        Device open = Devices.device(Devices.ROD, HELD, HELIUM, Covers.OPEN);
        Calibration.Figures figures = new Calibration(30.0, Covers.SEALED).figures(open);
        double still = 0.5 * 7.6e-4 * Devices.ROD.mass() / 6e-9;
        assertThat(figures.sensitivity() / still).isCloseTo(1.0, within(0.02));
        assertThat(figures.change()).isBetween(1.0, 1.05);
        assertThat(new Calibration(30.0, Covers.OPEN).figures(open).change()).isEqualTo(1.0);
    }

    @Test
    void comparesTorquesWithoutASuspension() {
        Device open = new Device(Devices.ROD, Optional.empty(), AIR, Covers.OPEN, AIR);
        Calibration.Figures figures = new Calibration(80.0, Covers.SEALED).figures(open);
        ResponsePoint use = new Response(open).at(80.0);
        double carried = (1190.0 - 1.2) * FastMath.PI * 4.2e-5 * 4.2e-5 * 0.5 * 7.6e-4 * 7.6e-4;
        assertThat(figures.angle()).isFalse();
        assertThat(figures.sensitivity() / carried).isCloseTo(1.0, within(1e-13));
        assertThat(figures.change()).isCloseTo(use.motionTorque().norm() / carried, within(1e-13));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -1.0, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesAFrequencyThatIsNone(double bad) {
        assertThatThrownBy(() -> new Calibration(bad, Covers.OPEN)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Devices.suspension(bad, 0.0, 0.0, 0.0, Attitude.UPRIGHT))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
