package flowshy.verdict.tolerance.sampling;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** An interval of 95 % must hold the true value in 93 to 97 of 100 repeats; 600 seeds, each repeat a whole run of its own. */
@Tag("long")
class CoverageValidationTest {
    private static final int REPEATS = 600;
    private static final NormalDistribution NORMAL = new NormalDistribution();

    /** A smooth sum whose every figure is known: N(3, 1.1²) of three parts; the event is to lie above the mean plus one deviation. */
    private static final double DEVIATION = 1.1;

    private static Draw sum(double[] u) {
        double value = 3.0
                + DEVIATION
                        * (0.6 * NORMAL.inverseCumulativeProbability(u[0])
                                + 0.64 * NORMAL.inverseCumulativeProbability(u[1])
                                + 0.48 * NORMAL.inverseCumulativeProbability(u[2]));
        return new Draw(new double[] {value}, new boolean[] {value > 3.0 + DEVIATION});
    }

    private static boolean holds(Interval interval, double truth) {
        return interval.low() <= truth && truth <= interval.high();
    }

    @Test
    void meanDeviationPercentilesAndProbability() {
        double[] truth = {3.0, DEVIATION, 3.0 - 1.959964 * DEVIATION, 3.0, 3.0 + 1.281552 * DEVIATION, 0.158655};
        int[] held = new int[truth.length];
        for (int seed = 0; seed < REPEATS; seed++) {
            Sample sample = new Sampling(3, CoverageValidationTest::sum, seed).run(4096, found -> false, Progress.NONE);
            Output output = sample.outputs().get(0);
            Interval[] intervals = {
                output.mean(),
                output.deviation(),
                output.quantile(0.025),
                output.quantile(0.5),
                output.quantile(0.9),
                sample.events().get(0)
            };
            for (int k = 0; k < truth.length; k++) {
                held[k] += holds(intervals[k], truth[k]) ? 1 : 0;
            }
        }
        for (int count : held) {
            assertThat(count / (double) REPEATS)
                    .as("of %s", Arrays.toString(held))
                    .isBetween(0.93, 0.97);
        }
    }

    @Test
    void sobolIndices() {
        double[] known = EffectsValidationTest.known();
        int[] held = new int[known.length];
        for (int seed = 0; seed < REPEATS; seed++) {
            List<Effect> effects = new Effects(3, EffectsValidationTest::ishigami, seed)
                    .run(1 << 12, new double[] {3.5}, Progress.NONE)
                    .get(0);
            for (int i = 0; i < 3; i++) {
                held[i] += holds(effects.get(i).first(), known[i]) ? 1 : 0;
                held[i + 3] += holds(effects.get(i).total(), known[i + 3]) ? 1 : 0;
            }
        }
        for (int count : held) {
            assertThat(count / (double) REPEATS)
                    .as("of %s", Arrays.toString(held))
                    .isBetween(0.93, 0.97);
        }
    }

    /** A rare event: the exact bounds may only be too wide. */
    @Test
    void rareEventsAreHeldAtLeastAsOften() {
        double truth = 1e-3;
        double cut = cut(truth);
        Trial rare = u -> new Draw(new double[0], new boolean[] {u[0] * u[1] < cut});
        int held = 0;
        for (int seed = 0; seed < REPEATS; seed++) {
            held += holds(
                            new Sampling(2, rare, seed)
                                    .run(2048, found -> false, Progress.NONE)
                                    .events()
                                    .get(0),
                            truth)
                    ? 1
                    : 0;
        }
        assertThat(held / (double) REPEATS).isGreaterThanOrEqualTo(0.95);
    }

    /** P(u v below c) = c (1 − ln c); solved by repetition. */
    private static double cut(double probability) {
        double c = probability / 10.0;
        for (int i = 0; i < 60; i++) {
            c = probability / (1.0 - Math.log(c));
        }
        return c;
    }
}
