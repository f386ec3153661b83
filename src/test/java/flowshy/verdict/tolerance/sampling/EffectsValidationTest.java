package flowshy.verdict.tolerance.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.junit.jupiter.api.Test;

class EffectsValidationTest {
    private static final double A = 7.0;
    private static final double B = 0.1;

    /**
     * Ishigami and Homma 1990: sin x₁ + 7 sin² x₂ + 0.1 x₃⁴ sin x₁, each x uniform from −π to π. Indices in closed form, as in Saltelli et al.
     * 2008, Global Sensitivity Analysis (by hand from the variances of its parts): first 0.3139, 0.4424, 0; total 0.5576, 0.4424, 0.2437.
     */
    static Draw ishigami(double[] u) {
        double x = Math.PI * (2.0 * u[0] - 1.0);
        double y = Math.PI * (2.0 * u[1] - 1.0);
        double z = Math.PI * (2.0 * u[2] - 1.0);
        double value = Math.sin(x) + A * Math.sin(y) * Math.sin(y) + B * z * z * z * z * Math.sin(x);
        return new Draw(new double[] {value}, new boolean[0]);
    }

    /** First-order indices, then total ones. */
    static double[] known() {
        double pi4 = Math.pow(Math.PI, 4);
        double alone = 0.5 * Math.pow(1.0 + B * pi4 / 5.0, 2);
        double second = A * A / 8.0;
        double together = B * B * pi4 * pi4 * (1.0 / 18.0 - 1.0 / 50.0);
        double all = alone + second + together;
        return new double[] {alone / all, second / all, 0.0, (alone + together) / all, second / all, together / all};
    }

    @Test
    void ishigami() {
        double[] known = known();
        assertThat(known[0]).isCloseTo(0.3139, within(5e-5));
        assertThat(known[1]).isCloseTo(0.4424, within(5e-5));
        assertThat(known[3]).isCloseTo(0.5576, within(5e-5));
        assertThat(known[5]).isCloseTo(0.2437, within(5e-5));
        List<Effect> effects = new Effects(3, EffectsValidationTest::ishigami, 4L)
                .run(1 << 17, new double[] {0.5 * A}, Progress.NONE)
                .get(0);
        for (int i = 0; i < 3; i++) {
            assertThat(effects.get(i).first().estimate()).isCloseTo(known[i], within(0.002));
            assertThat(effects.get(i).total().estimate()).isCloseTo(known[i + 3], within(0.002));
            assertThat(effects.get(i).total().half()).isGreaterThan(0.0).isLessThan(0.004);
        }
    }

    /** A sum: first-order and total index are the share of the variance. By hand: 1, 4, 16 of 21. */
    @Test
    void ofASumFirstAndTotalAreTheShareOfTheVariance() {
        NormalDistribution normal = new NormalDistribution();
        Trial sum = u -> new Draw(
                new double[] {
                    normal.inverseCumulativeProbability(u[0])
                            + 2.0 * normal.inverseCumulativeProbability(u[1])
                            + 4.0 * normal.inverseCumulativeProbability(u[2]),
                    7.0
                },
                new boolean[0]);
        List<List<Effect>> effects = new Effects(3, sum, 9L).run(1 << 14, new double[] {0.0, 7.0}, Progress.NONE);
        double[] shares = {1.0 / 21.0, 4.0 / 21.0, 16.0 / 21.0};
        for (int i = 0; i < 3; i++) {
            assertThat(effects.get(0).get(i).first().estimate()).isCloseTo(shares[i], within(0.003));
            assertThat(effects.get(0).get(i).total().estimate()).isCloseTo(shares[i], within(0.003));
            assertThat(effects.get(1).get(i).first().estimate()).isNaN();
        }
    }

    @Test
    void countsItsTrialsBeforehand() {
        Effects effects = new Effects(3, EffectsValidationTest::ishigami, 4L);
        long[] most = new long[2];
        effects.run(700, new double[] {0.0}, (done, all) -> {
            most[0] = done;
            most[1] = all;
        });
        assertThat(most[0]).isEqualTo(effects.trials(700)).isEqualTo(32 * 16 * 5);
        assertThat(most[1]).isEqualTo(most[0]);
    }
}
