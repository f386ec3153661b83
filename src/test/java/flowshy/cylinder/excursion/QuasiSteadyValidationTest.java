package flowshy.cylinder.excursion;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.SteadyDrag;
import flowshy.medium.Medium;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.special.Erf;
import org.hipparchus.special.Gamma;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Averages against closed forms for power laws of the velocity, done by hand; then with the drag law itself. */
class QuasiSteadyValidationTest {
    /** ν = 1, d = 1: Re is the velocity. */
    private static final SteadyDrag CYLINDER = new SteadyDrag(0.5, Medium.of("unit", 1.0, 1.0));

    private static DoubleUnaryOperator power(double exponent) {
        return v -> FastMath.copySign(FastMath.pow(FastMath.abs(v), exponent), v);
    }

    /** E|u|^{n-1} n of a normal velocity: n 2^{(n-1)/2} Γ(n/2)/√π σ^{n-1}; for the square law √(8/π) σ. */
    @ParameterizedTest
    @ValueSource(doubles = {1.0, 1.2, 1.5, 2.0})
    void averagesPowersOfANormalVelocity(double exponent) {
        QuasiSteady average = QuasiSteady.of(power(exponent), new OperatingPoint(0.0, 3.0, Fluctuation.RANDOM));
        double moment = FastMath.pow(3.0, exponent - 1.0)
                * FastMath.pow(2.0, 0.5 * (exponent - 1.0))
                * Gamma.gamma(0.5 * exponent)
                / FastMath.sqrt(FastMath.PI);
        assertThat(average.along() / (exponent * moment)).isCloseTo(1.0, within(1e-8));
        assertThat(average.across() / moment).isCloseTo(1.0, within(1e-6));
        assertThat(average.offset()).isCloseTo(0.0, within(1e-9));
    }

    /** Square law about a mean: E[f'] = 2E|v|, E[f/v] = E|v|, E[f] = (Ū²+σ²) erf(m/√2) + σ²m√(2/π) e^{-m²/2}, m = Ū/σ. */
    @ParameterizedTest
    @CsvSource({"0.5, 1.0", "-2.0, 1.0", "10.0, 1.0", "1.0, 0.01"})
    void averagesTheSquareLawAboutAMean(double mean, double deviation) {
        QuasiSteady average = QuasiSteady.of(power(2.0), new OperatingPoint(mean, deviation, Fluctuation.RANDOM));
        double m = mean / deviation;
        double bell = FastMath.sqrt(2.0 / FastMath.PI) * FastMath.exp(-0.5 * m * m);
        double error = Erf.erf(m / FastMath.sqrt(2.0));
        double absolute = deviation * bell + mean * error;
        double square = (mean * mean + deviation * deviation) * error + deviation * deviation * m * bell;
        assertThat(average.along() / (2.0 * absolute)).isCloseTo(1.0, within(1e-8));
        assertThat(average.across() / absolute).isCloseTo(1.0, within(1e-8));
        assertThat(average.offset() / square).isCloseTo(1.0, within(1e-8));
    }

    /** A tone: (2/π) ∫₀^π cos^{n+1} û^{n-1} = 2 Γ(n/2+1)/(√π Γ((n+3)/2)) û^{n-1}; 8û/(3π) for the square law. */
    @ParameterizedTest
    @ValueSource(doubles = {1.0, 1.3, 2.0})
    void averagesPowersOfATone(double exponent) {
        OperatingPoint point = new OperatingPoint(0.0, 2.0, Fluctuation.SINUSOIDAL);
        QuasiSteady average = QuasiSteady.of(power(exponent), point);
        double expected = 2.0
                * Gamma.gamma(0.5 * exponent + 1.0)
                / (FastMath.sqrt(FastMath.PI) * Gamma.gamma(0.5 * (exponent + 3.0)))
                * FastMath.pow(2.0 * FastMath.sqrt(2.0), exponent - 1.0);
        assertThat(average.along() / expected).isCloseTo(1.0, within(1e-8));
        assertThat(average.offset()).isCloseTo(0.0, within(1e-9));
        if (exponent == 2.0) {
            assertThat(expected).isCloseTo(8.0 / (3.0 * FastMath.PI) * point.amplitude(), within(1e-12));
        }
    }

    /** A tone that never turns the stream: square law, E[f u]/σ² = 2Ū, E|v| = Ū, E[f] = Ū² + σ². */
    @Test
    void averagesATimidTone() {
        QuasiSteady average = QuasiSteady.of(power(2.0), new OperatingPoint(3.0, 1.0, Fluctuation.SINUSOIDAL));
        assertThat(average.along()).isCloseTo(6.0, within(1e-9));
        assertThat(average.across()).isCloseTo(3.0, within(1e-9));
        assertThat(average.offset()).isCloseTo(10.0, within(1e-9));
    }

    /** With the drag law E[f u]/σ² is E[f'], the mean slope, by trapezoidal rule here: Stein's lemma. */
    @ParameterizedTest
    @CsvSource({"0.0, 0.02", "0.0, 1.0", "1.0, 0.4", "30.0, 12.0", "200.0, 100.0"})
    void isTheMeanSlopeInRandomFlow(double mean, double deviation) {
        QuasiSteady average = QuasiSteady.of(CYLINDER, new OperatingPoint(mean, deviation, Fluctuation.RANDOM));
        double slope = 0.0;
        double resistance = 0.0;
        double force = 0.0;
        double step = 1e-3;
        for (int i = -8000; i <= 8000; i++) {
            double t = (i + 0.5) * step;
            double v = mean + deviation * t;
            double weight = step * FastMath.exp(-0.5 * t * t) / FastMath.sqrt(2.0 * FastMath.PI);
            slope += weight * CYLINDER.slope(v);
            resistance += weight * CYLINDER.resistance(v);
            force += weight * CYLINDER.force(v);
        }
        assertThat(average.along() / slope).isCloseTo(1.0, within(1e-4));
        assertThat(average.across() / resistance).isCloseTo(1.0, within(1e-4));
        assertThat(average.offset()).isCloseTo(force, within(1e-5 * slope * deviation));
    }

    /** Where drag falls with Re the factor 8/(3π) of the square law is 7 to 15 % low (found before this code: 8 to 15 %). */
    @ParameterizedTest
    @ValueSource(doubles = {0.1, 1.0, 10.0})
    void exceedsTheFactorOfTheSquareLaw(double amplitude) {
        QuasiSteady average = QuasiSteady.of(
                CYLINDER, new OperatingPoint(0.0, amplitude / FastMath.sqrt(2.0), Fluctuation.SINUSOIDAL));
        double square = 8.0 / (3.0 * FastMath.PI) * CYLINDER.resistance(amplitude);
        assertThat(square / average.along()).isBetween(0.85, 0.93);
    }

    /** A faint fluctuation sees slope, resistance and force of the mean; the two ways of computing it meet. */
    @ParameterizedTest
    @EnumSource(Fluctuation.class)
    void tendsToTheSlopeUnderAMeanStream(Fluctuation fluctuation) {
        double mean = 3.0;
        QuasiSteady faint = QuasiSteady.of(CYLINDER, new OperatingPoint(mean, 2e-5, fluctuation));
        QuasiSteady still = QuasiSteady.of(CYLINDER, new OperatingPoint(mean, 1e-5, fluctuation));
        assertThat(still.along()).isEqualTo(CYLINDER.slope(mean));
        assertThat(still.across()).isEqualTo(CYLINDER.resistance(mean));
        assertThat(still.offset()).isEqualTo(CYLINDER.force(mean));
        assertThat(faint.along() / still.along()).isCloseTo(1.0, within(1e-8));
        assertThat(faint.across() / still.across()).isCloseTo(1.0, within(1e-8));
        assertThat(faint.offset() / still.offset()).isCloseTo(1.0, within(1e-8));
    }

    @Test
    void isNothingAtRestAndRefusesWhatTheDragLawDoesNotCover() {
        assertThat(QuasiSteady.of(CYLINDER, OperatingPoint.REST)).isEqualTo(new QuasiSteady(0.0, 0.0, 0.0));
        OperatingPoint storm = new OperatingPoint(0.0, 5e4, Fluctuation.RANDOM);
        assertThatThrownBy(() -> QuasiSteady.of(CYLINDER, storm)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new OperatingPoint(Double.NaN, 0.0, Fluctuation.RANDOM))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new OperatingPoint(0.0, -1.0, Fluctuation.RANDOM))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new OperatingPoint(0.0, Double.NaN, Fluctuation.RANDOM))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
