package flowshy.math;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.LogLogDensity.Point;
import java.util.ArrayList;
import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Against the worked example of random vibration testing, and integrals done by hand. */
class LogLogDensityValidationTest {
    /** 20 to 80 Hz at +3 dB/octave to 0.04 g²/Hz, flat to 350, −3 dB/octave to 2000 Hz. NAVMAT P-9492 prints 6.0 g rms. */
    private static final LogLogDensity SCREEN = of(20, 0.01, 80, 0.04, 350, 0.04, 2000, 0.04 * 350 / 2000);

    private static LogLogDensity of(double... pairs) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < pairs.length; i += 2) {
            points.add(new Point(pairs[i], pairs[i + 1]));
        }
        return new LogLogDensity(points);
    }

    /** The example to the printed digits and, with slopes of exactly ±1, to those of a hand calculation: 6.0581821. */
    @Test
    void screeningSpectrumHasSixGrams() {
        double grams = Math.sqrt(SCREEN.meanSquare());
        assertThat(grams).isCloseTo(6.0, within(0.1)); // printed to one decimal, 6.0582 with slopes of exactly one
        double byHand = 0.5 * 0.04 / 80 * (80 * 80 - 20 * 20) + 0.04 * 270 + 0.04 * 350 * Math.log(2000.0 / 350.0);
        assertThat(SCREEN.meanSquare()).isCloseTo(byHand, Percentage.withPercentage(1e-10));
        assertThat(grams).isCloseTo(6.0581821, within(0.5e-7));
    }

    @Test
    void flatSpectrum() {
        assertThat(Math.sqrt(of(20, 0.04, 2000, 0.04).meanSquare())).isCloseTo(8.8994382, within(0.5e-7));
    }

    /** Slope −2: ∫ f^−2 from 1 to 4 is 3/4; slope within rounding of −1 does not lose digits. */
    @Test
    void pieces() {
        assertThat(of(1, 1, 4, 1.0 / 16.0).meanSquare()).isCloseTo(0.75, within(1e-14));
        double nearlyPink = of(1, 1, 10, 0.1 * (1 + 1e-13)).meanSquare();
        assertThat(nearlyPink).isCloseTo(Math.log(10.0), within(1e-12));
        assertThat(of(1, 0, 3, 4).meanSquare()).isCloseTo(4.0, within(1e-14)); // a triangle where one end is zero
    }

    @Test
    void readsBetweenThePoints() {
        assertThat(SCREEN.at(40.0)).isCloseTo(0.02, within(1e-15)); // +3 dB/octave
        assertThat(SCREEN.at(700.0)).isCloseTo(0.02, within(1e-15));
        assertThat(SCREEN.at(80.0)).isCloseTo(0.04, within(1e-16));
        assertThat(SCREEN.at(19.9)).isZero();
        assertThat(SCREEN.at(2000.1)).isZero();
        assertThat(of(1, 0, 3, 4).at(2.0)).isCloseTo(2.0, within(1e-15));
        assertThat(SCREEN.lowest()).isEqualTo(20.0);
        assertThat(SCREEN.highest()).isEqualTo(2000.0);
    }

    /** Parts add up to the whole; a part by trapezoids in ln f. */
    @Test
    void partsOfTheRange() {
        double parts = SCREEN.meanSquare(0.0, 55.0) + SCREEN.meanSquare(55.0, 600.0) + SCREEN.meanSquare(600.0, 1e5);
        assertThat(parts).isCloseTo(SCREEN.meanSquare(), Percentage.withPercentage(1e-10));
        double sum = 0.0;
        double step = 1e-4;
        for (double x = Math.log(55.0) + 0.5 * step; x < Math.log(600.0); x += step) {
            sum += SCREEN.at(Math.exp(x)) * Math.exp(x) * step;
        }
        assertThat(SCREEN.meanSquare(55.0, 600.0)).isCloseTo(sum, Percentage.withPercentage(0.01));
    }

    @Test
    void inOtherUnits() {
        assertThat(SCREEN.times(9.80665 * 9.80665).at(100.0)).isCloseTo(3.84681, within(1e-5)); // 0.04 · 96.17 m²/s⁴
    }

    @Test
    void refusesWhatIsNoSpectrum() {
        assertThatThrownBy(() -> of(10, 1)).hasMessageContaining("two points");
        assertThatThrownBy(() -> of(10, 1, 10, 2)).hasMessageContaining("point 2 does not rise");
        assertThatThrownBy(() -> of(0, 1, 10, 2)).hasMessageContaining("frequency");
        assertThatThrownBy(() -> of(1, -1, 10, 2)).hasMessageContaining("density");
        assertThatThrownBy(() -> of(1, Double.NaN, 10, 2)).isInstanceOf(IllegalArgumentException.class);
    }
}
