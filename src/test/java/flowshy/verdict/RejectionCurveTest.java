package flowshy.verdict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.verdict.RejectionCurve.Sample;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Curves whose crossings and turning points are known by hand. */
class RejectionCurveTest {
    private static final Band BAND = new Band(10.0, 1e5);

    private static double decades(double frequency, double from) {
        return FastMath.log10(frequency / from);
    }

    /** 20 lg(f/100 Hz) is +20 dB at 1 kHz, −20 dB at 10 Hz, and −7.3 dB at 100 · 10^(−7.3/20). */
    @Test
    void findsTheCrossingsOfAStraightLine() {
        RejectionCurve curve = new RejectionCurve(f -> 20.0 * decades(f, 100.0), BAND);
        assertThat(curve.crossings(20.0)).hasSize(1);
        assertThat(curve.crossings(20.0).get(0) / 1000.0).isCloseTo(1.0, within(1e-9));
        assertThat(curve.crossings(-7.3).get(0) / (100.0 * FastMath.pow(10.0, -7.3 / 20.0)))
                .isCloseTo(1.0, within(1e-9));
        assertThat(curve.crossings(70.0)).isEmpty();
        assertThat(curve.least().frequency()).isEqualTo(10.0);
        assertThat(curve.largest().frequency()).isEqualTo(1e5);
    }

    /** First-order high pass, −10 lg(1 + (f₀/f)²): −3.0103 dB at f₀, −20 dB at f₀/√99. */
    @Test
    void findsTheCrossingsOfAHighPass() {
        RejectionCurve curve = new RejectionCurve(f -> -10.0 * FastMath.log10(1.0 + 731.0 * 731.0 / (f * f)), BAND);
        assertThat(curve.crossings(-10.0 * FastMath.log10(2.0)).get(0) / 731.0).isCloseTo(1.0, within(1e-9));
        assertThat(curve.crossings(-20.0).get(0) / (731.0 / FastMath.sqrt(99.0)))
                .isCloseTo(1.0, within(1e-9));
    }

    /** Parabola in decades: 5 + 8 x² about 470 Hz; it crosses 7 dB half a decade away on both sides. */
    @Test
    void findsATurningPointAndTheCrossingsOnBothSides() {
        RejectionCurve curve = new RejectionCurve(f -> 5.0 + 8.0 * FastMath.pow(decades(f, 470.0), 2), BAND);
        assertThat(curve.least().rejection()).isCloseTo(5.0, within(1e-12));
        assertThat(curve.least().frequency() / 470.0).isCloseTo(1.0, within(1e-6));
        List<Double> crossings = curve.crossings(7.0);
        assertThat(crossings).hasSize(2);
        assertThat(crossings.get(0) / (470.0 / FastMath.sqrt(10.0))).isCloseTo(1.0, within(1e-9));
        assertThat(crossings.get(1) / (470.0 * FastMath.sqrt(10.0))).isCloseTo(1.0, within(1e-9));
        assertThat(curve.largest().rejection())
                .isCloseTo(5.0 + 8.0 * FastMath.pow(decades(1e5, 470.0), 2), within(1e-12));
    }

    /** A dip a fifth of a step wide whose samples stay above the level: both of its crossings are found. */
    @Test
    void findsANarrowDipBetweenTheSamples() {
        double at = 1000.0 * FastMath.pow(10.0, 0.0043);
        double width = 0.002;
        DoubleUnaryOperator dip = f -> 30.0 - 20.0 / (1.0 + FastMath.pow(decades(f, at) / width, 2));
        RejectionCurve curve = new RejectionCurve(dip, BAND);
        List<Sample> low = curve.samples().stream()
                .filter(sample -> sample.rejection() < 20.0)
                .toList();
        assertThat(low).hasSize(1);
        assertThat(curve.least().rejection()).isCloseTo(10.0, within(1e-9));
        assertThat(curve.least().frequency() / at).isCloseTo(1.0, within(1e-6));
        List<Double> crossings = curve.crossings(20.0);
        assertThat(crossings).hasSize(2);
        assertThat(crossings.get(0) / (at * FastMath.pow(10.0, -width))).isCloseTo(1.0, within(1e-9));
        assertThat(crossings.get(1) / (at * FastMath.pow(10.0, width))).isCloseTo(1.0, within(1e-9));
    }

    /** A turning point within the first or last step would not show in the step's two ends. */
    @Test
    void findsATurningPointWithinTheFirstAndTheLastStep() {
        for (double at : new double[] {10.04, 1e5 / 1.004}) {
            RejectionCurve curve = new RejectionCurve(f -> 3e4 * FastMath.pow(decades(f, at), 2), BAND);
            assertThat(curve.least().rejection()).as("%s Hz", at).isCloseTo(0.0, within(1e-12));
            assertThat(curve.crossings(0.01)).as("%s Hz", at).hasSize(2);
        }
    }

    /** Two samples of one height: the top lies between them. */
    @Test
    void findsATopBetweenTwoEqualSamples() {
        Band band = new Band(1.0, 10.0);
        double top = FastMath.pow(10.0, 0.505);
        RejectionCurve curve =
                new RejectionCurve(f -> 4.0 - FastMath.rint(1e9 * FastMath.abs(decades(f, top))) / 1e9, band);
        assertThat(curve.largest().rejection()).isCloseTo(4.0, within(1e-7));
        assertThat(curve.largest().frequency() / top).isCloseTo(1.0, within(1e-6));
    }

    /** A curve that only touches a level does not cross it; one that rests on it and goes on does, once. */
    @Test
    void tellsTouchingFromCrossing() {
        DoubleUnaryOperator touching =
                f -> FastMath.abs(f - 300.0) < 50.0 ? 20.0 : 20.0 + FastMath.abs(decades(f, 300.0));
        assertThat(new RejectionCurve(touching, BAND).crossings(20.0)).isEmpty();
        DoubleUnaryOperator resting =
                f -> f < 300.0 ? 20.0 - decades(300.0, f) : f < 400.0 ? 20.0 : 20.0 + decades(f, 400.0);
        List<Double> crossings = new RejectionCurve(resting, BAND).crossings(20.0);
        assertThat(crossings).hasSize(1);
        assertThat(crossings.get(0)).isBetween(299.0, 401.0);
        // beginning on the level is no crossing
        assertThat(new RejectionCurve(f -> decades(f, 10.0), BAND).crossings(0.0))
                .isEmpty();
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.0000001, 1.1, 2.0, 1e7})
    void samplesBandsOfAnyWidth(double ratio) {
        Band band = new Band(50.0, 50.0 * ratio);
        RejectionCurve curve = new RejectionCurve(f -> 20.0 * decades(f, 50.0), band);
        assertThat(curve.samples().size()).isGreaterThanOrEqualTo(41);
        assertThat(curve.samples().get(0).frequency()).isEqualTo(50.0);
        assertThat(curve.samples().get(curve.samples().size() - 1).frequency()).isEqualTo(band.to());
        assertThat(curve.samples().stream().map(Sample::frequency).toList()).isSorted();
        double middle = 10.0 * FastMath.log10(ratio);
        assertThat(curve.crossings(middle).get(0) / (50.0 * FastMath.sqrt(ratio)))
                .isCloseTo(1.0, within(1e-8));
    }
}
