package flowshy.stream.surroundings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Caveat;
import flowshy.math.StepDensity;
import flowshy.math.ThirdOctave;
import flowshy.medium.Medium;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.StokesLayer;
import flowshy.stream.sound.SoundLevel;
import flowshy.stream.sound.SoundWave;
import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Tones and sound, down to worked examples of acoustics. */
class OscillationTest {
    private static final Medium AIR = Medium.of("air", 1.20458, 1.8206e-5);
    private static final SoundWave PLANE = SoundWave.plane(1.20458, 343.34);

    /** 94 dB over a band: 2.42365 mm/s rms of the particle, equal in each whole third-octave. */
    @Test
    void ninetyFourDecibelsAreTwoAndAHalfMillimetresASecond() {
        Sound hall = new Sound("hall", 0.0, Sound.over(SoundLevel.IN_GAS, 94.0, 100.0, 2000.0), PLANE, AIR);
        assertThat(Math.sqrt(integral(hall, 100.0, 2000.0))).isCloseTo(2.42365e-3, Percentage.withPercentage(0.01));
        double first = integral(hall, new ThirdOctave(-8).low(), new ThirdOctave(-8).high());
        double other = integral(hall, new ThirdOctave(1).low(), new ThirdOctave(1).high());
        assertThat(other).isCloseTo(first, Percentage.withPercentage(0.01));
        assertThat(first).isCloseTo(Math.pow(2.42365e-3, 2) * 0.1 / Math.log10(20.0), Percentage.withPercentage(0.02));
        assertThat(hall.density(99.0)).isZero();
        assertThat(hall.support().low()).isEqualTo(100.0);
        assertThat(hall.breaks()).containsExactly(100.0, 2000.0);
        assertThat(hall.driven()).isTrue();
        assertThat(hall.acrossDensity(500.0)).isZero();
        assertThat(hall.meanSpeedAt(1e-3)).isZero();
        assertThat(hall.meanSpeed()).isZero();
    }

    private static double integral(Source source, double from, double to) {
        int n = 4000;
        double step = Math.log(to / from) / n;
        double sum = 0.0;
        for (int i = 0; i < n; i++) {
            double f = from * Math.exp((i + 0.5) * step);
            sum += source.density(f) * f * step;
        }
        return sum;
    }

    @Test
    void bandLevelsKeepTheirOwn() {
        ThirdOctave low = new ThirdOctave(-9);
        ThirdOctave high = new ThirdOctave(-8);
        StepDensity bands = new StepDensity(
                List.of(
                        Sound.band(SoundLevel.IN_GAS, 80.0, low.low(), low.high()),
                        Sound.band(SoundLevel.IN_GAS, 100.0, high.low(), high.high())),
                StepDensity.Inside.PINK);
        Sound sound = new Sound("bands", 0.0, bands, PLANE, AIR);
        assertThat(10.0 * Math.log10(integral(sound, high.low(), high.high()) / integral(sound, low.low(), low.high())))
                .isCloseTo(20.0, within(0.01));
        assertThat(sound.breaks()).hasSize(3);
    }

    /** A source 10 cm away at 100 Hz: kr = 0.183, 5.555 times the plane wave's velocity. */
    @Test
    void nearSourceMovesMore() {
        StepDensity pressure = Sound.over(SoundLevel.IN_GAS, 94.0, 90.0, 110.0);
        Sound near = new Sound("buzzer", 0.0, pressure, new SoundWave(1.20458, 343.34, 0.1), AIR);
        Sound far = new Sound("buzzer", 0.0, pressure, PLANE, AIR);
        double kr = 2.0 * Math.PI * 100.0 / 343.34 * 0.1;
        assertThat(near.density(100.0) / far.density(100.0))
                .isCloseTo(1.0 + 1.0 / (kr * kr), Percentage.withPercentage(1e-9));
        assertThat(near.caveats(1e-3))
                .extracting(Caveat::text)
                .anySatisfy(t -> assertThat(t).contains("0.100 m away"));
        assertThat(far.caveats(1e-3))
                .extracting(Caveat::text)
                .anySatisfy(t -> assertThat(t).contains("plane wave"));
    }

    @Test
    void toneIsOneLineInTheStokesLayer() {
        Tone fan = new Tone("fan", 0.5, 150.0, 4e-3, AIR);
        assertThat(fan.lines()).containsExactly(new Line(150.0, 4e-3));
        assertThat(fan.direction()).isEqualTo(0.5);
        assertThat(fan.density(150.0)).isZero();
        double omega = 2.0 * Math.PI * 150.0;
        assertThat(fan.share(omega).at(3e-4)).isEqualTo(new StokesLayer(AIR.kinematicViscosity()).share(3e-4, omega));
        assertThat(fan.acrossShare(omega).at(3e-4)).isEqualTo(fan.share(omega).at(3e-4));
        assertThat(fan.support().contains(150.0)).isTrue();
        assertThat(fan.caveats(1e-3)).isEmpty();
        assertThat(fan.assumed()).isEmpty();
        assertThatThrownBy(() -> fan.varied("frequency", 2.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Tone("none", 0.0, 150.0, 0.0, AIR)).hasMessageContaining("rms");
    }

    /** 20 m/s rms at 10 Hz in air: û δ/ν = 28.3 · 6.94e-4/1.51e-5 = 1298. */
    @Test
    void fastOscillationLosesItsLaminarLayer() {
        assertThat(new Tone("blast", 0.0, 10.0, 20.0, AIR).caveats(1e-3))
                .extracting(Caveat::text)
                .anySatisfy(t -> assertThat(t).contains("1300 at 10.00 Hz"));
    }
}
