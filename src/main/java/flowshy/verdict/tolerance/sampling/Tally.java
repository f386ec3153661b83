package flowshy.verdict.tolerance.sampling;

import org.hipparchus.util.FastMath;

/** Sums and counts of one output, replicate by replicate. */
final class Tally {
    /** A bin's share of the spread that the first trials show. */
    private static final double FINE = 1.0 / 512.0;

    /** A bin's share of the value itself where the first trials show no spread. */
    private static final double FINEST = 1e-12;

    private final double centre;
    private final double[] sums;
    private final double[] squares;
    private final Histogram[] histograms;
    private final double width;
    private long missing;

    /**
     * Empty.
     *
     * @param replicates how many
     * @param first values of the first trials, which set the bins
     */
    Tally(int replicates, double[] first) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (double value : first) {
            if (Double.isFinite(value)) {
                least = FastMath.min(least, value);
                most = FastMath.max(most, value);
            }
        }
        boolean any = least <= most;
        centre = any ? 0.5 * (least + most) : 0.0;
        double spread = any ? most - least : 0.0;
        width = spread > 0.0 ? spread * FINE : FINEST * (centre == 0.0 ? 1.0 : FastMath.abs(centre));
        sums = new double[replicates];
        squares = new double[replicates];
        histograms = new Histogram[replicates];
        for (int r = 0; r < replicates; r++) {
            histograms[r] = new Histogram(centre, width);
        }
    }

    void add(int replicate, double value) {
        if (!Double.isFinite(value)) {
            missing++;
            return;
        }
        double off = value - centre;
        sums[replicate] += off;
        squares[replicate] += off * off;
        histograms[replicate].add(value);
    }

    Output output() {
        int replicates = sums.length;
        double[] means = new double[replicates];
        double[] deviations = new double[replicates];
        Histogram all = new Histogram(centre, width);
        double sum = 0.0;
        double square = 0.0;
        for (int r = 0; r < replicates; r++) {
            long count = histograms[r].total();
            means[r] = centre + sums[r] / count;
            deviations[r] = deviation(sums[r], squares[r], count);
            sum += sums[r];
            square += squares[r];
            all.add(histograms[r]);
        }
        return new Output(
                Interval.between(means),
                Interval.about(deviation(sum, square, all.total()), deviations),
                all,
                java.util.List.of(histograms),
                missing);
    }

    private static double deviation(double sum, double squares, long count) {
        return FastMath.sqrt(FastMath.max(0.0, squares - sum * sum / count) / (count - 1));
    }
}
