package flowshy.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Against another implementation of least squares (free_swing.py beside the data), and against swings that are known. */
class FreeSwingFitValidationTest {
    private static List<String[]> rows(String file) throws IOException {
        try (InputStream in = FreeSwingFitValidationTest.class.getResourceAsStream(file)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .skip(1)
                    .map(line -> line.split(",", -1))
                    .toList();
        }
    }

    private static double number(List<String[]> rows, String record, int column) {
        return rows.stream()
                .filter(row -> row[0].equals(record))
                .mapToDouble(row -> Double.parseDouble(row[column]))
                .findFirst()
                .orElseThrow();
    }

    /** Both minimise the same sum of squares, so they agree far below the uncertainty; 1e-6 is the flatness of the minimum. */
    @ParameterizedTest
    @ValueSource(strings = {"long", "short", "damped", "sparse"})
    void agreesWithMinpack(String record) throws IOException {
        List<String[]> samples = rows("free-swing-records.csv").stream()
                .filter(row -> row[0].equals(record))
                .toList();
        List<String[]> answers = rows("free-swing-answers.csv");
        assertThat(samples).hasSizeGreaterThanOrEqualTo(60);
        assertThat(answers).hasSize(4);
        FreeSwing swing = FreeSwingFit.of(
                samples.stream().map(row -> Double.valueOf(row[1])).toList(),
                samples.stream().map(row -> Double.valueOf(row[2])).toList());
        assertThat(swing.frequency()).isCloseTo(number(answers, record, 1), Percentage.withPercentage(1e-4));
        assertThat(swing.decayTime()).isCloseTo(number(answers, record, 2), Percentage.withPercentage(1e-4));
        assertThat(swing.frequencyUncertainty()).isCloseTo(number(answers, record, 3), Percentage.withPercentage(0.1));
        assertThat(swing.decayUncertainty()).isCloseTo(number(answers, record, 4), Percentage.withPercentage(0.1));
    }

    private static FreeSwing fit(int count, double span, DoubleUnaryOperator signal) {
        List<Double> times = new ArrayList<>();
        List<Double> values = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double t = 5.0 + span * i / (count - 1);
            times.add(t);
            values.add(signal.applyAsDouble(t - 5.0));
        }
        return FreeSwingFit.of(times, values);
    }

    /** Without noise the swing is known; what is left is rounding. */
    @ParameterizedTest
    @ValueSource(doubles = {0.6, 1.0, 3.0, 30.0, 400.0})
    void findsAKnownSwingAtAnyQuality(double quality) {
        double decay = quality / (Math.PI * 150.0);
        FreeSwing swing = fit(
                3000,
                Math.min(8.0 * decay, 0.5),
                t -> 7e-6 + 3e-6 * Math.exp(-t / decay) * Math.sin(2.0 * Math.PI * 150.0 * t + 0.7));
        assertThat(swing.frequency()).isCloseTo(150.0, within(1e-6));
        assertThat(swing.decayTime()).isCloseTo(decay, Percentage.withPercentage(1e-6));
    }

    /** The stated uncertainties are those of the scatter over many records: 300 of them, so within about 3 × 4 %. */
    @Test
    void statedUncertaintyIsTheScatterOfManyRecords() {
        Random random = new Random(4L);
        double sum = 0.0;
        double square = 0.0;
        double stated = 0.0;
        int records = 300;
        for (int i = 0; i < records; i++) {
            FreeSwing swing = fit(
                    150,
                    0.05,
                    t -> Math.exp(-t / 0.015) * Math.cos(2.0 * Math.PI * 120.0 * t) + 0.03 * random.nextGaussian());
            sum += swing.decayTime();
            square += swing.decayTime() * swing.decayTime();
            stated += swing.decayUncertainty();
        }
        double mean = sum / records;
        double scatter = Math.sqrt((square - records * mean * mean) / (records - 1));
        assertThat(stated / records).isCloseTo(scatter, Percentage.withPercentage(12.0));
        assertThat(mean).isCloseTo(0.015, within(4.0 * scatter / Math.sqrt(records)));
    }

    @Test
    void refusesWhatIsNoFreeSwing() {
        Random random = new Random(5L);
        assertThatThrownBy(() -> fit(8, 1.0, Math::cos)).hasMessageContaining("8 samples are too few");
        assertThatThrownBy(() -> fit(100, 1.0, t -> 4.0)).hasMessageContaining("does not change");
        assertThatThrownBy(() -> fit(500, 1.0, t -> random.nextGaussian())).isInstanceOf(SuspensionException.class);
        assertThatThrownBy(() -> fit(500, 1.0, t -> Math.exp(t) * Math.cos(60.0 * t)))
                .hasMessageContaining("does not die out");
        assertThatThrownBy(() ->
                        fit(500, 1.0, t -> Math.cos(60.0 * t) * Math.exp(-t / 30.0) + 0.05 * random.nextGaussian()))
                .hasMessageContaining("a longer or quieter record is needed");
        assertThatThrownBy(() -> fit(500, 1.0, t -> Math.exp(-t / 0.1))).isInstanceOf(SuspensionException.class);
        assertThatThrownBy(() -> fit(500, 1.0, t -> Math.exp(-t / 0.1) + 0.01 * random.nextGaussian()))
                .isInstanceOf(SuspensionException.class);
        assertThatThrownBy(() -> fit(500, 0.6, t -> Math.exp(-t / 0.3) * Math.cos(2.0 * Math.PI * t)))
                .hasMessageContaining("0.60 of one period");
        assertThatThrownBy(() -> fit(500, 1.0, t -> 3.0 * t)).isInstanceOf(SuspensionException.class);
        assertThatThrownBy(() -> fit(500, 1.0, t -> t < 0.6 ? 0.0 : Math.cos(200.0 * t) * Math.exp((0.6 - t) / 0.1)))
                .hasMessageContaining("cut what lies before the release");
    }
}
