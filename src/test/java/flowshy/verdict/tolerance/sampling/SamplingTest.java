package flowshy.verdict.tolerance.sampling;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ForkJoinPool;
import org.junit.jupiter.api.Test;

class SamplingTest {
    private static final Trial TRIAL = u -> new Draw(
            new double[] {Math.exp(u[0]) + u[1], u[0] > 0.5 ? Double.NaN : u[1]}, new boolean[] {u[0] + u[1] > 1.2});

    private static List<Double> digits(long seed, int threads, int trials) throws Exception {
        ForkJoinPool pool = new ForkJoinPool(threads);
        try {
            Sample sample = pool.submit(() -> new Sampling(2, TRIAL, seed).run(trials, found -> false, Progress.NONE))
                    .get();
            List<List<Effect>> effects = pool.submit(
                            () -> new Effects(2, TRIAL, seed).run(1000, new double[] {2.0, 0.5}, Progress.NONE))
                    .get();
            List<Double> digits = new ArrayList<>();
            for (Output output : sample.outputs()) {
                digits.add(output.mean().estimate());
                digits.add(output.deviation().high());
                digits.add(output.quantile(0.1).low());
                digits.add(output.quantile(0.9).estimate());
            }
            digits.add(sample.events().get(0).low());
            effects.get(0).forEach(effect -> digits.add(effect.total().high()));
            return digits;
        } finally {
            pool.shutdown();
        }
    }

    @Test
    void theNumberOfThreadsChangesNoDigit() throws Exception {
        List<Double> one = digits(5, 1, 20_000);
        assertThat(one).hasSize(11).allSatisfy(value -> assertThat(value).isFinite());
        assertThat(digits(5, 4, 20_000)).isEqualTo(one);
        assertThat(digits(6, 4, 20_000)).isNotEqualTo(one);
    }

    @Test
    void roundsUpToPowersOfTwoByFewPerCent() {
        for (int wanted : new int[] {16, 17, 100, 1000, 4096, 100_000, 999_999}) {
            int trials = Sampling.replicates(wanted) * Sampling.size(wanted);
            assertThat(Sampling.replicates(wanted)).isBetween(16, 32);
            assertThat(trials).isBetween(wanted, wanted + wanted / 16 + 1);
            assertThat(Integer.bitCount(Sampling.size(wanted))).isEqualTo(1);
        }
    }

    @Test
    void endsAtTheFirstLookThatIsEnough() {
        List<Integer> looks = new ArrayList<>();
        Sample sample = new Sampling(2, TRIAL, 1)
                .run(
                        1 << 16,
                        found -> {
                            looks.add(found.trials());
                            return found.outputs().get(0).mean().half() < 2e-5;
                        },
                        Progress.NONE);
        assertThat(looks).startsWith(4096, 8192).hasSizeLessThan(5);
        assertThat(sample.trials()).isEqualTo(looks.get(looks.size() - 1)).isLessThan(1 << 16);
        // the points of a run that went on are those of one that did not look
        Sample whole = new Sampling(2, TRIAL, 1).run(sample.trials(), found -> false, Progress.NONE);
        assertThat(whole.outputs().get(0).mean().estimate())
                .isCloseTo(sample.outputs().get(0).mean().estimate(), org.assertj.core.api.Assertions.within(1e-14));
    }

    @Test
    void valuesThatAreMissingAreCountedApart() {
        Output output = new Sampling(2, TRIAL, 1)
                .run(4096, found -> false, Progress.NONE)
                .outputs()
                .get(1);
        assertThat(output.missing()).isEqualTo(2048);
        assertThat(output.counted()).isEqualTo(2048);
        assertThat(output.quantile(0.5).estimate()).isBetween(0.49, 0.51);
    }

    @Test
    void tellsItsProgress() {
        List<Long> told = new ArrayList<>();
        new Sampling(2, TRIAL, 1).run(10_000, found -> false, (done, most) -> {
            told.add(done);
            assertThat(most).isEqualTo(10_240);
        });
        assertThat(told).isSorted().endsWith(10_240L);
    }
}
