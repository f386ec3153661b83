package flowshy.verdict.fit;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.verdict.measured.Agreement;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredResponse;
import java.util.List;
import java.util.concurrent.atomic.AtomicIntegerArray;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Intervals of 95 % hold the truth in 93 to 97 % of 500 seeded repeats, whichever way the fit is made. */
@Tag("long")
class FitCoverageValidationTest {
    private static final int REPEATS = 500;
    private static final double[] TRUTH = {Bench.STIFFNESS, Bench.DAMPING, Bench.GAIN};

    /** Shares of repeats whose interval holds the truth, one a free number; then that of fits called a poor one at 5 %. */
    private static double[] coverage(boolean stated, Robustness robustness, double noise, long first) {
        AtomicIntegerArray held = new AtomicIntegerArray(TRUTH.length + 2);
        LongStream.range(first, first + REPEATS)
                .parallel()
                .forEach(seed -> count(held, stated, robustness, noise, seed));
        return IntStream.range(0, TRUTH.length + 2)
                .mapToDouble(i -> (double) held.get(i) / REPEATS)
                .toArray();
    }

    private static void count(AtomicIntegerArray held, boolean stated, Robustness robustness, double noise, long seed) {
        List<MeasuredResponse> runs = List.of(
                Bench.run("shaker", Measurand.MOTION, true, noise, stated, 2 * seed),
                Bench.run("tube", Measurand.FLOW, true, noise, stated, 2 * seed + 1));
        FitAnswer answer = new FitQuestion(
                        Bench.density(),
                        Bench.stated(),
                        Bench.BAND,
                        List.of(Bench.FREE_STIFFNESS, Bench.FREE_DAMPING),
                        runs,
                        List.of(),
                        robustness)
                .answer();
        assertThat(answer.estimates()).hasSize(TRUTH.length);
        for (int i = 0; i < TRUTH.length; i++) {
            Estimate estimate = answer.estimates().get(i);
            held.addAndGet(i, TRUTH[i] >= estimate.low() && TRUTH[i] <= estimate.high() ? 1 : 0);
        }
        held.addAndGet(TRUTH.length, answer.chance().orElse(1.0) < 0.05 ? 1 : 0);
        boolean differs =
                answer.after().stream().anyMatch(one -> one.agreement().outcome() == Agreement.Outcome.DIFFER);
        held.addAndGet(TRUTH.length + 1, differs ? 1 : 0);
    }

    private static void holds(double[] coverage) {
        for (int i = 0; i < TRUTH.length; i++) {
            assertThat(coverage[i]).as("interval %d", i).isBetween(0.93, 0.97);
        }
    }

    @Test
    void withStatedUncertainties() {
        double[] coverage = coverage(true, Robustness.NONE, 0.02, 10_000);
        holds(coverage);
        assertThat(coverage[TRUTH.length]).as("true models called poor").isBetween(0.02, 0.08);
        assertThat(coverage[TRUTH.length + 1])
                .as("true models that differ somewhere")
                .isBetween(0.02, 0.16);
    }

    @Test
    void withUncertaintiesFromTheScatter() {
        holds(coverage(false, Robustness.NONE, 0.03, 20_000));
    }

    @Test
    void withHubersEstimator() {
        holds(coverage(true, Robustness.HUBER, 0.02, 30_000));
        holds(coverage(false, Robustness.HUBER, 0.02, 40_000));
    }

    @Test
    void withTukeysEstimator() {
        holds(coverage(true, Robustness.TUKEY, 0.02, 50_000));
    }
}
