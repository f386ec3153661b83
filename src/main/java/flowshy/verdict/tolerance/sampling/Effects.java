package flowshy.verdict.tolerance.sampling;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.hipparchus.random.SobolSequenceGenerator;

/**
 * Sobol indices of independent inputs, by the pick-freeze design: two points A and B and, for each input i, A with that coordinate of B.
 *
 * <p>First order: V_i = mean of f(B) [f(A_B^i) − f(A)], Saltelli, Annoni, Azzini, Campolongo, Ratto and Tarantola 2010, Comput. Phys. Commun.
 * 181:259, table 2 (b), f counted from its mean. Total: V_Ti = ½ mean of [f(A) − f(A_B^i)]², Jansen 1999, Comput. Phys. Commun. 117:35. Both
 * over the variance of f at A and B. A and B are the halves of a point of a Sobol sequence of twice the dimension; intervals come from
 * replicates of it.
 */
public final class Effects {
    /**
     * Independent replicates. Products of deviations are far from a normal law: with 16 replicates of twice the points, intervals of a total
     * index of the Ishigami function held in 91 of 100 repeats.
     */
    private static final int REPLICATES = 32;

    private static final int WAVE = 64;
    /** Replicates of this design get other random numbers than those of the plain sample. */
    private static final long OTHER = 0x5DEECE66DL;

    private final int inputs;
    private final Trial trial;
    private final long seed;

    /**
     * Indices of a trial.
     *
     * @param inputs number of independent inputs, one or more
     * @param trial what is tried
     * @param seed of the randomisation
     */
    public Effects(int inputs, Trial trial, long seed) {
        this.inputs = inputs;
        this.trial = trial;
        this.seed = seed ^ OTHER;
    }

    private static int size(int base) {
        return Integer.highestOneBit(Math.max(1, base / REPLICATES));
    }

    /**
     * Trials that a number of base points takes.
     *
     * @param base points wanted
     * @return trials that are run
     */
    public long trials(int base) {
        return (long) REPLICATES * size(base) * (inputs + 2);
    }

    /**
     * Runs.
     *
     * @param base points wanted, rounded down to 32 replicates of 2^m points
     * @param centres about the mean of each output
     * @param progress is told
     * @return by output and input; NaN where an output does not vary
     */
    public List<List<Effect>> run(int base, double[] centres, Progress progress) {
        int size = size(base);
        SobolSequenceGenerator sequence = new SobolSequenceGenerator(2 * inputs);
        double[][][] first = new double[centres.length][inputs][REPLICATES];
        double[][] variance = new double[centres.length][REPLICATES];
        double[][][] total = new double[centres.length][inputs][REPLICATES];
        for (int r = 0; r < REPLICATES; r++) {
            Sums[] sums = sums(centres);
            ScrambledSobol points = new ScrambledSobol(sequence, 2 * inputs, seed, r);
            for (int from = 0; from < size; from += WAVE) {
                double[][] at = points.points(from, Math.min(WAVE, size - from));
                double[][][] values = new double[at.length][][];
                IntStream.range(0, at.length).parallel().forEach(i -> values[i] = frozen(at[i]));
                for (double[][] one : values) {
                    for (int k = 0; k < sums.length; k++) {
                        sums[k].add(one, k);
                    }
                }
                progress.at(
                        ((long) r * size + from + at.length) * (inputs + 2), (long) REPLICATES * size * (inputs + 2));
            }
            for (int k = 0; k < sums.length; k++) {
                variance[k][r] = sums[k].variance();
                for (int i = 0; i < inputs; i++) {
                    first[k][i][r] = sums[k].first(i);
                    total[k][i][r] = sums[k].total(i);
                }
            }
        }
        List<List<Effect>> effects = new ArrayList<>();
        for (int k = 0; k < centres.length; k++) {
            List<Effect> ofOne = new ArrayList<>();
            for (int i = 0; i < inputs; i++) {
                ofOne.add(
                        new Effect(Interval.ratio(first[k][i], variance[k]), Interval.ratio(total[k][i], variance[k])));
            }
            effects.add(ofOne);
        }
        return effects;
    }

    private Sums[] sums(double[] centres) {
        return Arrays.stream(centres)
                .mapToObj(centre -> new Sums(inputs, centre))
                .toArray(Sums[]::new);
    }

    /** Values at A, B and at A with one coordinate of B after the other. */
    private double[][] frozen(double[] point) {
        double[] a = Arrays.copyOf(point, inputs);
        double[] b = Arrays.copyOfRange(point, inputs, 2 * inputs);
        double[][] values = new double[inputs + 2][];
        values[0] = trial.at(a).values();
        values[1] = trial.at(b).values();
        for (int i = 0; i < inputs; i++) {
            double[] mixed = a.clone();
            mixed[i] = b[i];
            values[i + 2] = trial.at(mixed).values();
        }
        return values;
    }

    /** Sums of one output over one replicate. */
    private static final class Sums {
        private final double centre;
        private final double[] first;
        private final double[] total;
        private double sum;
        private double squares;
        private int count;

        Sums(int inputs, double centre) {
            this.centre = centre;
            this.first = new double[inputs];
            this.total = new double[inputs];
        }

        /** A point of which one value is missing is left out whole. */
        void add(double[][] values, int k) {
            for (double[] one : values) {
                if (!Double.isFinite(one[k])) {
                    return;
                }
            }
            double a = values[0][k] - centre;
            double b = values[1][k] - centre;
            sum += a + b;
            squares += a * a + b * b;
            count++;
            for (int i = 0; i < first.length; i++) {
                double step = values[i + 2][k] - values[0][k];
                first[i] += b * step;
                total[i] += 0.5 * step * step;
            }
        }

        /** Over all points, not all but one: the mean of evenly spread points lies so near the true one that nothing is lost by it. */
        double variance() {
            return (squares - sum * sum / (2.0 * count)) / (2.0 * count);
        }

        double first(int input) {
            return first[input] / count;
        }

        double total(int input) {
            return total[input] / count;
        }
    }
}
