package flowshy.verdict.tolerance.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.util.CombinatoricsUtils;
import org.junit.jupiter.api.Test;

class IntervalValidationTest {
    /** With no hit the upper bound solves (1 − p)ⁿ = 0.025; by hand. */
    @Test
    void neverOrAlwaysHasAClosedForm() {
        double bound = 1.0 - Math.pow(0.025, 1.0 / 40.0);
        Interval never = Interval.clopperPearson(0, 40);
        assertThat(never.estimate()).isEqualTo(0.0);
        assertThat(never.low()).isEqualTo(0.0);
        assertThat(never.high()).isCloseTo(bound, within(1e-12));
        Interval always = Interval.clopperPearson(40, 40);
        assertThat(always.low()).isCloseTo(1.0 - bound, within(1e-12));
        assertThat(always.high()).isEqualTo(1.0);
    }

    /** What the bounds are defined by: binomial tails of 2.5 %, summed term by term. */
    @Test
    void boundsLeaveTwoAndAHalfPerCentOnEitherSide() {
        Interval interval = Interval.clopperPearson(3, 25);
        assertThat(tail(25, 3, interval.low())).isCloseTo(0.025, within(1e-9));
        assertThat(1.0 - tail(25, 4, interval.high())).isCloseTo(0.025, within(1e-9));
    }

    private static double tail(int n, int from, double p) {
        double sum = 0.0;
        for (int k = from; k <= n; k++) {
            sum += CombinatoricsUtils.binomialCoefficientDouble(n, k) * Math.pow(p, k) * Math.pow(1.0 - p, n - k);
        }
        return sum;
    }

    /** Student's t of 15 degrees of freedom, 97.5 %: 2.131 in the tables of any handbook (from memory). */
    @Test
    void betweenReplicatesIsStudentsInterval() {
        double[] replicates = new double[16];
        for (int i = 0; i < 16; i++) {
            replicates[i] = 5.0 + (i % 2 == 0 ? 1.0 : -1.0);
        }
        Interval interval = Interval.between(replicates);
        double spread = Math.sqrt(16.0 / 15.0) / 4.0;
        assertThat(interval.estimate()).isEqualTo(5.0);
        assertThat(interval.half() / spread).isCloseTo(2.131, within(0.0005));
    }

    @Test
    void fewHitsAreJudgedExactlyManyBetweenReplicates() {
        long[] hits = new long[16];
        assertThat(Interval.probability(hits, 256).high())
                .isCloseTo(1.0 - Math.pow(0.025, 1.0 / 4096.0), within(1e-12));
        java.util.Arrays.fill(hits, 128);
        assertThat(Interval.probability(hits, 256).half()).isEqualTo(0.0);
        hits[3] = 0;
        assertThat(Interval.probability(hits, 256).half()).isGreaterThan(0.01);
    }
}
