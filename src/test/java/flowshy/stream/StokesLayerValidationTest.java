package flowshy.stream;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Stokes's second problem, textbook form; the digits are evaluated apart with 40 digits. */
class StokesLayerValidationTest {
    @ParameterizedTest
    @CsvSource({
        "0.5, 0.55074312, 31.869678",
        "1, 0.85895463, 21.124236",
        "2, 1.0634634, 6.6449407",
        "3, 1.0493123, 0.38364208"
    })
    void magnitudeAndPhaseLead(double y, double magnitude, double degrees) {
        Complex share = StokesLayer.share(y);
        assertThat(share.norm()).isCloseTo(magnitude, within(5e-8));
        assertThat(FastMath.toDegrees(share.getArgument())).isCloseTo(degrees, within(5e-7));
    }

    /** The overshoot: 1.06943 at y = 2.2841, and nowhere more. */
    @Test
    void overshoot() {
        assertThat(StokesLayer.share(2.2841).norm()).isCloseTo(1.06943, within(5e-6));
        double most = 0.0;
        for (int i = 0; i <= 4000; i++) {
            most = FastMath.max(most, StokesLayer.share(0.005 * i).norm());
        }
        assertThat(most).isCloseTo(1.06943, within(5e-6));
    }

    /** Air of 20 °C, ν = 1.5114e-5 m²/s: 2.193 mm at 1 Hz, 69.36 µm at 1 kHz. */
    @ParameterizedTest
    @CsvSource({"1, 2.193e-3, 5e-7", "10, 6.936e-4, 5e-8", "100, 2.193e-4, 5e-8", "1000, 6.936e-5, 5e-9"})
    void thicknessInAir(double frequency, double thickness, double lastDigit) {
        StokesLayer air = new StokesLayer(18.206e-6 / 1.20458);
        assertThat(air.thickness(2.0 * FastMath.PI * frequency)).isCloseTo(thickness, within(lastDigit));
    }

    /** Near the wall s → (1+i) z/δ without loss of digits: two terms of the series, the rest is y³/3. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-14, 1e-8, 1e-4})
    void keepsItsDigitsAtTheWall(double y) {
        Complex share = StokesLayer.share(y);
        assertThat(share.getReal() / y).isCloseTo(1.0, within(1e-15 + y * y));
        assertThat(share.getImaginary() / (y - y * y)).isCloseTo(1.0, within(1e-15 + y * y));
    }

    @Test
    void isTheFreeStreamFarAboveAndNothingAtTheWall() {
        assertThat(StokesLayer.share(0.0)).isEqualTo(Complex.ZERO);
        assertThat(StokesLayer.share(45.0).subtract(Complex.ONE).norm()).isLessThan(1e-19);
        assertThat(StokesLayer.share(5000.0).subtract(Complex.ONE).norm()).isZero();
        assertThat(new StokesLayer(2e-6).share(3e-4, 500.0))
                .isEqualTo(StokesLayer.share(3e-4 / FastMath.sqrt(2.0 * 2e-6 / 500.0)));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -1e-6, Double.NaN})
    void refusesAViscosityThatIsNone(double bad) {
        assertThatThrownBy(() -> new StokesLayer(bad)).isInstanceOf(IllegalArgumentException.class);
    }
}
