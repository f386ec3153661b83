package flowshy.verdict.tolerance.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.ToDoubleFunction;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.distribution.continuous.TDistribution;
import org.junit.jupiter.api.Test;

/**
 * Worked examples of JCGM 101:2008 clause 9 (Propagation of distributions using a Monte Carlo method) and of JCGM 100:2008 (GUM) annex H.1. How
 * the numbers were read stands beside each. Half the last printed digit is the tolerance unless said otherwise.
 */
class PropagationValidationTest {
    private static final NormalDistribution NORMAL = new NormalDistribution();

    private static double normal(double mean, double sd, double u) {
        return mean + sd * NORMAL.inverseCumulativeProbability(u);
    }

    private static double uniform(double low, double high, double u) {
        return low + (high - low) * u;
    }

    private static double student(double mean, double scale, int degrees, double u) {
        return mean + scale * new TDistribution(degrees).inverseCumulativeProbability(u);
    }

    /** Arc sine between −half and +half. */
    private static double arcSine(double half, double u) {
        return half * Math.sin(Math.PI * (u - 0.5));
    }

    /** Rectangle from low to high whose ends are each uncertain by d: JCGM 101, 6.4.3, by two uniform numbers. */
    private static double trapezoid(double low, double high, double d, double u, double v) {
        double from = low - d + 2.0 * d * u;
        double to = low + high - from;
        return from + (to - from) * v;
    }

    private static Output run(int inputs, int trials, ToDoubleFunction<double[]> model) {
        Trial trial = u -> new Draw(new double[] {model.applyAsDouble(u)}, new boolean[0]);
        return new Sampling(inputs, trial, 20080101L)
                .run(trials, so -> false, Progress.NONE)
                .outputs()
                .get(0);
    }

    private static Output sumOfRectangles(double last) {
        double r = Math.sqrt(3.0);
        return run(
                4,
                1 << 20,
                u -> uniform(-r, r, u[0]) + uniform(-r, r, u[1]) + uniform(-r, r, u[2]) + last * uniform(-r, r, u[3]));
    }

    /** 9.2.2, table 2 (from memory): 0.00, 2.00, ±3.92. By hand: N(0, 2), 2 · 1.959964. */
    @Test
    void sumOfFourNormals() {
        Output sum =
                run(4, 1 << 20, u -> normal(0, 1, u[0]) + normal(0, 1, u[1]) + normal(0, 1, u[2]) + normal(0, 1, u[3]));
        assertThat(sum.mean().estimate()).isCloseTo(0.0, within(0.0005));
        assertThat(sum.deviation().estimate()).isCloseTo(2.0, within(0.001));
        assertThat(sum.quantile(0.025).estimate()).isCloseTo(-3.919928, within(0.005));
        assertThat(sum.quantile(0.975).estimate()).isCloseTo(3.919928, within(0.005));
    }

    /** 9.2.3, table 3 (from memory): 0.00, 2.00, ±3.88. By hand: the tail of four rectangles is (2 − t)⁴/24, so 2√3 · 1.119888 = 3.87941. */
    @Test
    void sumOfFourRectangles() {
        Output sum = sumOfRectangles(1.0);
        double exact = 2.0 * Math.sqrt(3.0) * (2.0 - Math.pow(24.0 * 0.025, 0.25));
        assertThat(exact).isCloseTo(3.88, within(0.005));
        assertThat(sum.mean().estimate()).isCloseTo(0.0, within(0.0005));
        assertThat(sum.deviation().estimate()).isCloseTo(2.0, within(0.001));
        assertThat(sum.quantile(0.025).estimate()).isCloseTo(-exact, within(0.004));
        assertThat(sum.quantile(0.975).estimate()).isCloseTo(exact, within(0.004));
    }

    /** 9.2.4, table 4 (from memory): 0.0, 10.1, ±17.0. By hand: √103 = 10.1489. */
    @Test
    void sumOfThreeRectanglesAndAWideOne() {
        Output sum = sumOfRectangles(10.0);
        assertThat(sum.mean().estimate()).isCloseTo(0.0, within(0.005));
        assertThat(sum.deviation().estimate()).isCloseTo(Math.sqrt(103.0), within(0.005));
        assertThat(sum.quantile(0.025).estimate()).isCloseTo(-17.0, within(0.05));
        assertThat(sum.quantile(0.975).estimate()).isCloseTo(17.0, within(0.05));
    }

    /**
     * 9.3, table 5 (from memory): 1.2340 mg, u 0.0754 mg, shortest interval 1.0834 to 1.3825 mg. The density of air reaches evenly about that of
     * the definition, so the distribution is symmetric to 1e-4 but for the second order; the interval of equal tails differs by less than its
     * Monte Carlo spread there, a few 1e-4 mg.
     */
    @Test
    void calibrationOfAMass() {
        Output deviation = run(5, 1 << 18, u -> {
            double reference = normal(100_000.000, 0.050, u[0]);
            double difference = normal(1.234, 0.020, u[1]);
            double air = uniform(1.10, 1.30, u[2]);
            double weight = uniform(7_000.0, 9_000.0, u[3]);
            double standard = uniform(7_950.0, 8_050.0, u[4]);
            return (reference + difference) * (1.0 + (air - 1.2) * (1.0 / weight - 1.0 / standard)) - 100_000.0;
        });
        assertThat(deviation.mean().estimate()).isCloseTo(1.2340, within(0.0001));
        assertThat(deviation.deviation().estimate()).isCloseTo(0.0754, within(0.0001));
        assertThat(deviation.quantile(0.025).estimate()).isCloseTo(1.0834, within(0.0015));
        assertThat(deviation.quantile(0.975).estimate()).isCloseTo(1.3825, within(0.0015));
    }

    private static Output comparisonLoss(double x) {
        return run(2, 1 << 18, u -> {
            double first = normal(x, 0.005, u[0]);
            double second = normal(0.0, 0.005, u[1]);
            return 1e6 * (first * first + second * second);
        });
    }

    /**
     * 9.4.2, table 6 (from memory), in 1e-6: x 0: 50, u 50, 0 to 150; x 0.010: 150, u 112, 0 to 367; x 0.050: 2551, u 502. By hand: mean
     * x² + 2u², variance 4u²x² + 4u⁴; at x = 0 an exponential distribution, whose shortest interval ends at −50 ln 0.05 = 149.8.
     */
    @Test
    void comparisonLossOfAMicrowavePowerMeter() {
        Output none = comparisonLoss(0.0);
        assertThat(none.mean().estimate()).isCloseTo(50.0, within(0.05));
        assertThat(none.deviation().estimate()).isCloseTo(50.0, within(0.1));
        assertThat(none.quantile(0.95).estimate()).isCloseTo(-50.0 * Math.log(0.05), within(0.5));
        Output small = comparisonLoss(0.010);
        assertThat(small.mean().estimate()).isCloseTo(150.0, within(0.05));
        assertThat(small.deviation().estimate()).isCloseTo(Math.sqrt(12_500.0), within(0.2));
        assertThat(small.quantile(0.95).estimate()).isCloseTo(367.0, within(1.0));
        Output large = comparisonLoss(0.050);
        assertThat(large.mean().estimate()).isCloseTo(2550.0, within(0.5)).isCloseTo(2551.0, within(1.5));
        assertThat(large.deviation().estimate())
                .isCloseTo(Math.sqrt(252_500.0), within(0.5))
                .isCloseTo(502.0, within(0.6));
    }

    /**
     * 9.5.4 (second hand: numbers quoted in a paper of 2022 on digital certificates that carries out this example with 10⁶ trials): 838 nm, u 36
     * nm, 99 % from 745 to 932 nm. Inputs by table 10 (seen in public example code of the same gauge, distributions from memory).
     */
    @Test
    void gaugeBlockOfTheSupplement() {
        double nominal = 50e6;
        Output deviation = run(11, 1 << 16, u -> {
            double standard = student(50_000_623.0, 25.0, 18, u[0]);
            double difference = student(215.0, 6.0, 24, u[1]);
            double random = student(0.0, 4.0, 5, u[2]);
            double systematic = student(0.0, 7.0, 8, u[3]);
            double expansion = uniform(9.5e-6, 13.5e-6, u[4]);
            double temperature = normal(-0.1, 0.2, u[5]) + arcSine(0.5, u[6]);
            double expansionDifference = trapezoid(-1.0e-6, 1.0e-6, 0.1e-6, u[7], u[8]);
            double temperatureDifference = trapezoid(-0.050, 0.050, 0.025, u[9], u[10]);
            return standard
                    + difference
                    + random
                    + systematic
                    - standard * (expansionDifference * temperature + expansion * temperatureDifference)
                    - nominal;
        });
        assertThat(deviation.mean().estimate()).isCloseTo(838.0, within(0.5));
        assertThat(deviation.deviation().estimate()).isCloseTo(36.0, within(0.5));
        assertThat(deviation.quantile(0.005).estimate()).isCloseTo(745.0, within(1.5));
        assertThat(deviation.quantile(0.995).estimate()).isCloseTo(932.0, within(1.5));
    }

    /**
     * GUM H.1 (inputs seen in public example code of a national institute; results from memory): 50.000 838 mm, u 32 nm to first order (H.1.4),
     * 34 nm with the terms of second order (H.1.7). Normal distributions but where the text says otherwise.
     */
    @Test
    void gaugeBlockOfTheGuide() {
        double[] sensitivity = {25.0, 5.8, 3.9, 6.7, 50e6 * 11.5e-6 * 0.050 / Math.sqrt(3.0)};
        double first = 0.0;
        for (double part : sensitivity) {
            first += part * part;
        }
        // difference of expansion at the mean temperature of −0.1 °C
        double atMean = 50e6 * 0.1 * 1e-6 / Math.sqrt(3.0);
        assertThat(Math.sqrt(first + atMean * atMean)).isCloseTo(32.0, within(0.5));
        Output length = run(9, 1 << 18, u -> {
            double standard = normal(50_000_623.0, 25.0, u[0]);
            double difference = normal(215.0, 5.8, u[1]) + normal(0.0, 3.9, u[2]) + normal(0.0, 6.7, u[3]);
            double expansion = uniform(9.5e-6, 13.5e-6, u[4]);
            double temperature = normal(-0.1, 0.2, u[5]) + arcSine(0.5, u[6]);
            double expansionDifference = uniform(-1e-6, 1e-6, u[7]);
            double temperatureDifference = uniform(-0.050, 0.050, u[8]);
            return standard
                    + difference
                    - standard * (expansionDifference * temperature + expansion * temperatureDifference)
                    - 50e6;
        });
        assertThat(length.mean().estimate()).isCloseTo(838.0, within(0.5));
        assertThat(length.deviation().estimate()).isCloseTo(34.0, within(0.5));
    }
}
