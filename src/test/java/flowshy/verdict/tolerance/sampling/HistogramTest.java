package flowshy.verdict.tolerance.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;

class HistogramTest {
    private static double[] values(int count) {
        Random random = new Random(11);
        double[] values = new double[count];
        for (int i = 0; i < count; i++) {
            values[i] = 30.0 + 4.0 * random.nextGaussian();
        }
        return values;
    }

    @Test
    void percentilesLieWithinABinOfThoseOfTheSortedValues() {
        double[] values = values(20_000);
        Histogram histogram = new Histogram(30.0, 0.01);
        Arrays.stream(values).forEach(histogram::add);
        Arrays.sort(values);
        for (double p : new double[] {0.01, 0.025, 0.5, 0.84, 0.999}) {
            double sorted = values[(int) Math.ceil(p * values.length) - 1];
            assertThat(histogram.quantile(p)).isCloseTo(sorted, within(histogram.width()));
        }
        assertThat(histogram.quantile(0.0)).isEqualTo(values[0]);
        assertThat(histogram.quantile(1.0)).isEqualTo(values[values.length - 1]);
    }

    /** Also where bins had to be merged on the way: the far value comes first, last or in the middle. */
    @Test
    void theOrderOfTheValuesDoesNotMatter() {
        double[] values = values(3_000);
        values[0] = -900.0;
        values[1] = 1e9;
        double[] turned = new double[values.length];
        for (int i = 0; i < values.length; i++) {
            turned[i] = values[(i * 1237 + 500) % values.length];
        }
        Histogram one = new Histogram(30.0, 0.01);
        Histogram other = new Histogram(30.0, 0.01);
        Arrays.stream(values).forEach(one::add);
        Arrays.stream(turned).forEach(other::add);
        assertThat(one.width()).isEqualTo(other.width()).isGreaterThan(1000.0);
        assertThat(one.total()).isEqualTo(3_000);
        for (double p = 0.0; p <= 1.0; p += 0.01) {
            assertThat(one.quantile(p)).isEqualTo(other.quantile(p));
        }
    }

    @Test
    void twoTogetherCountAsOneOfAllValues() {
        double[] values = values(4_000);
        values[7] = 500.0;
        Histogram all = new Histogram(30.0, 0.01);
        Histogram low = new Histogram(30.0, 0.01);
        Histogram high = new Histogram(30.0, 0.01);
        for (double value : values) {
            all.add(value);
            (value < 30.0 ? low : high).add(value);
        }
        Histogram sum = new Histogram(30.0, 0.01);
        sum.add(low);
        sum.add(high);
        assertThat(sum.width()).isEqualTo(all.width()).isGreaterThan(0.1);
        for (double p = 0.0; p <= 1.0; p += 0.01) {
            assertThat(sum.quantile(p)).isEqualTo(all.quantile(p));
        }
    }

    @Test
    void nothingCountedGivesNoPercentile() {
        assertThat(new Histogram(0.0, 1.0).quantile(0.5)).isNaN();
    }

    @Test
    void oneValueIsEveryPercentile() {
        Histogram histogram = new Histogram(12.5, 1e-11);
        for (int i = 0; i < 10; i++) {
            histogram.add(12.5);
        }
        assertThat(histogram.quantile(0.025)).isEqualTo(12.5);
        assertThat(histogram.quantile(0.975)).isEqualTo(12.5);
    }
}
