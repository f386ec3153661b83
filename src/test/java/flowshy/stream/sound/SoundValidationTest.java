package flowshy.stream.sound;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.medium.Phase;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Worked examples of acoustics: 94 dB in air is 1 Pa and 2.42 mm/s. */
class SoundValidationTest {
    private static final SoundWave AIR = SoundWave.plane(1.20458, 343.34); // 20 °C, dry
    private static final SoundWave WATER = SoundWave.plane(998.207, 1482.34); // six digits, so 3e-6 of the velocity

    @Test
    void ninetyFourDecibelsInAir() {
        double pressure = SoundLevel.IN_GAS.pressure(94.0);
        assertThat(pressure).isCloseTo(1.00237, within(0.5e-5));
        assertThat(pressure * AIR.velocityPerPressure(1000.0)).isCloseTo(2.42365e-3, within(0.5e-8));
        assertThat(SoundLevel.IN_GAS.pressure(120.0) * AIR.velocityPerPressure(50.0))
                .isCloseTo(48.3582e-3, within(0.5e-7));
        assertThat(SoundLevel.IN_GAS.level(1.0)).isCloseTo(93.9794, within(0.5e-4)); // 1 Pa, the calibrator's 94 dB
    }

    @Test
    void waterHasItsOwnReference() {
        assertThat(SoundLevel.IN_LIQUID.pressure(120.0)).isCloseTo(1.0, within(1e-12));
        assertThat(SoundLevel.IN_LIQUID.pressure(120.0) * WATER.velocityPerPressure(100.0))
                .isCloseTo(6.75819e-7, within(3e-12));
        assertThat(SoundLevel.IN_LIQUID.pressure(180.0) * WATER.velocityPerPressure(100.0))
                .isCloseTo(6.75819e-4, within(3e-9));
        assertThat(SoundLevel.IN_LIQUID.level(1.0) - SoundLevel.IN_GAS.level(1.0))
                .isCloseTo(26.02, within(0.005));
        assertThat(SoundLevel.usualIn(Phase.GAS, 6.1)).isEqualTo(SoundLevel.IN_GAS);
        assertThat(SoundLevel.usualIn(Phase.LIQUID, 600.0)).isEqualTo(SoundLevel.IN_LIQUID);
        assertThat(SoundLevel.usualIn(Phase.UNSTATED, 998.0)).isEqualTo(SoundLevel.IN_LIQUID);
        assertThat(SoundLevel.usualIn(Phase.UNSTATED, 1.2)).isEqualTo(SoundLevel.IN_GAS);
        assertThat(SoundLevel.IN_GAS).hasToString("dB re 20 uPa");
    }

    /** kr = 1 gives √2; close in, a velocity 1/(kr) above the plane wave's; far away none. */
    @Test
    void nearSource() {
        double distance = 0.25;
        double frequency = 343.34 / (2.0 * Math.PI * distance);
        SoundWave near = new SoundWave(1.20458, 343.34, distance);
        double plane = AIR.velocityPerPressure(frequency);
        assertThat(near.velocityPerPressure(frequency))
                .isCloseTo(Math.sqrt(2.0) * plane, Percentage.withPercentage(1e-10));
        assertThat(near.velocityPerPressure(0.01 * frequency))
                .isCloseTo(100.005 * plane, Percentage.withPercentage(1e-5));
        assertThat(near.velocityPerPressure(1e4 * frequency)).isCloseTo(plane, Percentage.withPercentage(1e-5));
    }

    @Test
    void refusesWhatIsNoWave() {
        assertThatThrownBy(() -> SoundWave.plane(1.2, 0.0)).hasMessageContaining("sound speed");
        assertThatThrownBy(() -> new SoundWave(1.2, 343.0, Double.NaN)).hasMessageContaining("distance");
    }
}
