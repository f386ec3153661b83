package flowshy.verdict.tolerance.sampling;

import org.hipparchus.distribution.continuous.BetaDistribution;
import org.hipparchus.distribution.continuous.TDistribution;
import org.hipparchus.util.FastMath;

/**
 * An estimate and its interval of 95 % confidence.
 *
 * @param estimate the estimate
 * @param low lower end
 * @param high upper end
 */
public record Interval(double estimate, double low, double high) {
    /** Confidence of every interval. */
    public static final double CONFIDENCE = 0.95;

    private static final double UPPER = 0.5 + 0.5 * CONFIDENCE;

    /** Of a bound, absolute; the library's own 1e-9 would show in a rare event. */
    private static final double ACCURACY = 1e-15;

    /** With fewer of either kind a replicate the share between replicates is too coarse for Student's t. */
    private static final double FEW = 5.0;

    /** One estimate, without spread. */
    static Interval exactly(double value) {
        return new Interval(value, value, value);
    }

    /**
     * From independent replicates of one estimate: mean ± t · s/√R, Student's t with R − 1 degrees of freedom. That the plain t interval
     * serves randomised quasi-Monte Carlo as well as any other: L'Ecuyer, Nakayama, Owen and Tuffin 2023, Winter Simulation Conference.
     *
     * @param replicates two or more
     * @return about their mean
     */
    static Interval between(double[] replicates) {
        double sum = 0.0;
        for (double value : replicates) {
            sum += value;
        }
        return about(sum / replicates.length, replicates);
    }

    /**
     * About an estimate of all points together, as wide as {@link #between}.
     *
     * @param estimate of all points together
     * @param replicates of the same, two or more
     * @return about the estimate
     */
    static Interval about(double estimate, double[] replicates) {
        double mean = 0.0;
        for (double value : replicates) {
            mean += value / replicates.length;
        }
        double squares = 0.0;
        for (double value : replicates) {
            squares += (value - mean) * (value - mean);
        }
        int degrees = replicates.length - 1;
        double half = new TDistribution(degrees).inverseCumulativeProbability(UPPER)
                * FastMath.sqrt(squares / degrees / replicates.length);
        return new Interval(estimate, estimate - half, estimate + half);
    }

    /**
     * Of the ratio of two means, from replicates of both: ratio of the sums, with the spread of numerator − ratio · denominator between
     * replicates (linearised ratio estimator; Cochran 1977, Sampling Techniques, ch. 6, from memory).
     *
     * @param numerators one a replicate
     * @param denominators same order
     * @return NaN where the denominators are zero
     */
    static Interval ratio(double[] numerators, double[] denominators) {
        double above = 0.0;
        double below = 0.0;
        for (int r = 0; r < numerators.length; r++) {
            above += numerators[r];
            below += denominators[r];
        }
        double ratio = above / below;
        double[] rests = new double[numerators.length];
        for (int r = 0; r < rests.length; r++) {
            rests[r] = (numerators[r] - ratio * denominators[r]) * numerators.length / below;
        }
        return about(ratio, rests);
    }

    /**
     * Of a probability, from how often something happened in replicates of equal size. Between replicates where it happened, and failed to
     * happen, five times in each on average; else the exact binomial bounds of Clopper and Pearson 1934, Biometrika 26:404, of all points
     * together as if they were drawn at random, which even spread makes wider than needed.
     *
     * @param hits how often, one number a replicate
     * @param size points a replicate
     * @return between 0 and 1
     */
    static Interval probability(long[] hits, long size) {
        long all = 0;
        double[] shares = new double[hits.length];
        for (int r = 0; r < hits.length; r++) {
            all += hits[r];
            shares[r] = (double) hits[r] / size;
        }
        long points = size * hits.length;
        double few = FEW * hits.length;
        if (all < few || points - all < few) {
            return clopperPearson(all, points);
        }
        Interval between = between(shares);
        return new Interval(between.estimate, FastMath.max(0.0, between.low), FastMath.min(1.0, between.high));
    }

    /**
     * Exact bounds of a binomial probability.
     *
     * @param hits how often it happened
     * @param points out of how many
     * @return bounds of 97.5 % confidence each; both-sided even where nothing or everything happened
     */
    static Interval clopperPearson(long hits, long points) {
        double low = hits == 0
                ? 0.0
                : new BetaDistribution(hits, points - hits + 1.0, ACCURACY).inverseCumulativeProbability(1.0 - UPPER);
        double high = hits == points
                ? 1.0
                : new BetaDistribution(hits + 1.0, points - hits, ACCURACY).inverseCumulativeProbability(UPPER);
        return new Interval((double) hits / points, low, high);
    }

    /**
     * Half its width.
     *
     * @return in the unit of the estimate
     */
    public double half() {
        return 0.5 * (high - low);
    }

    /**
     * The same with another zero and unit.
     *
     * @param factor of the unit, positive
     * @return scaled
     */
    public Interval times(double factor) {
        return new Interval(estimate * factor, low * factor, high * factor);
    }
}
