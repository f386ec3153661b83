package flowshy.stream.record;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.StepDensity;
import flowshy.stream.ReferenceRows;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Against scipy's implementation on a made-up record, and against mean squares that are known beforehand. */
class WelchValidationTest {
    @Test
    void densityEqualsThatOfAnotherTool() {
        MeasuredSpectrum record = RecordFileTest.anemometer();
        List<Map<String, Double>> rows = ReferenceRows.read(WelchValidationTest.class, "welch-density.csv", 128);
        assertThat(record.averaging())
                .hasValueSatisfying(a -> assertThat(a.segment()).isEqualTo(256));
        for (Map<String, Double> row : rows.subList(0, 127)) { // at half the rate the last line fills half a step only
            assertThat(record.density().orElseThrow().at(row.get("frequency_hz")))
                    .as("%s", row)
                    .isCloseTo(row.get("density"), Percentage.withPercentage(1e-7));
        }
    }

    /** A sine on a line of the transform: Hann spreads it over three lines, the sum is A²/2. */
    @Test
    void sineHoldsHalfItsSquare() {
        double[] samples = new double[4096];
        for (int n = 0; n < samples.length; n++) {
            samples[n] = 7.0 + 0.3 * Math.sin(2.0 * Math.PI * 50.0 * n / 512.0 + 0.4);
        }
        Welch welch = new Welch(samples, 512.0, 512);
        assertThat(welch.meanSquare()).isCloseTo(0.045, Percentage.withPercentage(1e-9));
        assertThat(welch.density().at(50.0)).isCloseTo(0.045 / 1.5, Percentage.withPercentage(1e-9)); // 1.5 lines wide
        assertThat(Welch.mean(samples)).isCloseTo(7.0, within(1e-12));
    }

    /** Parseval, on the density that the error budget integrates: Σ G Δf but for the line at zero. */
    @Test
    void densityIntegratesToTheLines() {
        double[] samples = new double[300];
        for (int n = 0; n < samples.length; n++) {
            samples[n] = Math.sin(0.8 * n) + 0.2 * Math.cos(Math.PI * n) + 1e-3 * (n % 17);
        }
        Welch welch = new Welch(samples, 10.0, 64);
        assertThat(welch.density().meanSquare()).isCloseTo(welch.meanSquare(), Percentage.withPercentage(1e-3));
        assertThat(welch.density().meanSquare()).isCloseTo(0.5 + 0.04, Percentage.withPercentage(2.0));
    }

    /** White noise of a seeded generator: the integral is the variance but for the random error of the ends; the level is 2σ²/f_s. */
    @Test
    void integralIsTheVariance() {
        Random random = new Random(20260101L);
        double[] samples = new double[1 << 16];
        double square = 0.0;
        for (int n = 0; n < samples.length; n++) {
            samples[n] = 0.5 + 0.2 * random.nextGaussian();
            square += (samples[n] - 0.5) * (samples[n] - 0.5) / samples.length;
        }
        Welch welch = new Welch(samples, 1000.0, 256);
        assertThat(welch.averaging().averages()).isEqualTo(511);
        assertThat(welch.meanSquare()).isCloseTo(square, Percentage.withPercentage(0.3));
        assertThat(meanLevel(welch, 100.0, 400.0)).isCloseTo(2.0 * 0.04 / 1000.0, Percentage.withPercentage(2.0));
    }

    private static double meanLevel(Welch welch, double from, double to) {
        StepDensity density = welch.density();
        double sum = 0.0;
        int n = 1000;
        for (int i = 0; i < n; i++) {
            sum += density.at(from + (i + 0.5) * (to - from) / n) / n;
        }
        return sum;
    }

    /** The stated random error against the scatter over the lines of that noise. */
    @Test
    void randomErrorIsTheScatterOfTheLines() {
        Random random = new Random(7L);
        double[] samples = new double[1 << 17];
        for (int n = 0; n < samples.length; n++) {
            samples[n] = random.nextGaussian();
        }
        Welch welch = new Welch(samples, 1.0, 2048);
        double sum = 0.0;
        int count = 0;
        StepDensity lines = welch.density();
        for (int k = 10; k < 1000; k++) {
            double share = lines.at(k / 2048.0) / 2.0 - 1.0; // level 2σ²/f_s = 2
            sum += share * share;
            count++;
        }
        assertThat(Math.sqrt(sum / count)).isCloseTo(welch.averaging().randomError(), Percentage.withPercentage(10.0));
        assertThat(new Averaging(1.0, 100, 16, 19).randomError()).isCloseTo(Math.sqrt(1.0 / 18.0), within(1e-12));
    }

    @Test
    void usualSegmentLeavesEightAveragesOrMore() {
        for (int samples : new int[] {64, 100, 1000, 1500, 65536, 1_000_000}) {
            int segment = Welch.usualSegment(samples);
            int averages = (samples - segment) / (segment / 2) + 1;
            assertThat(Integer.bitCount(segment)).isEqualTo(1);
            assertThat(averages).as("%d samples", samples).isBetween(7, 18);
        }
    }
}
