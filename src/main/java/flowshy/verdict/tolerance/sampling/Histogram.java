package flowshy.verdict.tolerance.sampling;

import org.hipparchus.util.FastMath;

/**
 * Counts of equal bins about a centre, from which percentiles are read. The bins grow to the sides as values come; when there would be
 * more than {@value #MOST} the bins are merged in pairs: uniform collapse as in Epicoco, Melle, Cafaro, Pulimeno and Morleo 2020, IEEE
 * Access 8:147604. Memory is so bounded whatever the number of values, and the counts depend on which values came, never on their order. In
 * decibels equal bins are the logarithmic bins of Masson, Rim and Lee 2019, Proc. VLDB 12:2195.
 *
 * <p>A percentile is read by linear interpolation within its bin; it lies within a bin's width of that of the values.
 */
final class Histogram {
    /** Bins at most, an even number. */
    static final int MOST = 4096;

    private static final int FIRST = 64;

    private final double centre;
    private double width;
    /** Index of the first bin of the array; bin i reaches from centre + i·width to the next. */
    private int first;

    private int[] counts;
    private long total;
    private double least = Double.POSITIVE_INFINITY;
    private double most = Double.NEGATIVE_INFINITY;

    /**
     * Empty.
     *
     * @param centre where bins begin
     * @param width of a bin, positive
     */
    Histogram(double centre, double width) {
        this.centre = centre;
        this.width = width;
        this.first = -FIRST / 2;
        this.counts = new int[FIRST];
    }

    /**
     * Counts a value.
     *
     * @param value finite
     */
    void add(double value) {
        double place = FastMath.floor((value - centre) / width);
        while (place < -MOST / 2 || place >= MOST / 2) {
            merge();
            place = FastMath.floor((value - centre) / width);
        }
        int bin = (int) place;
        reach(bin);
        counts[bin - first]++;
        total++;
        least = FastMath.min(least, value);
        most = FastMath.max(most, value);
    }

    /**
     * Counts what another histogram of the same centre and first width has counted.
     *
     * @param other added
     */
    void add(Histogram other) {
        while (width < other.width) {
            merge();
        }
        int merges = (int) FastMath.round(FastMath.log(2.0, width / other.width));
        for (int i = 0; i < other.counts.length; i++) {
            if (other.counts[i] > 0) {
                int bin = (other.first + i) >> merges;
                reach(bin);
                counts[bin - first] += other.counts[i];
            }
        }
        total += other.total;
        least = FastMath.min(least, other.least);
        most = FastMath.max(most, other.most);
    }

    /** Makes room for a bin, and a little more on that side. */
    private void reach(int bin) {
        int last = first + counts.length - 1;
        int room = counts.length / 2;
        if (bin < first) {
            move(FastMath.max(-MOST / 2, bin - room), last);
        } else if (bin > last) {
            move(first, FastMath.min(MOST / 2 - 1, bin + room));
        }
    }

    private void move(int from, int to) {
        int[] moved = new int[to - from + 1];
        System.arraycopy(counts, 0, moved, first - from, counts.length);
        counts = moved;
        first = from;
    }

    private void merge() {
        int low = Math.floorDiv(first, 2);
        int high = Math.floorDiv(first + counts.length - 1, 2);
        int[] merged = new int[high - low + 1];
        for (int i = 0; i < counts.length; i++) {
            merged[Math.floorDiv(first + i, 2) - low] += counts[i];
        }
        counts = merged;
        first = low;
        width *= 2.0;
    }

    /**
     * How many values came.
     *
     * @return the count
     */
    long total() {
        return total;
    }

    /**
     * Width of a bin, and so the bound of a percentile's error.
     *
     * @return as given, or a power of two times that
     */
    double width() {
        return width;
    }

    /**
     * A percentile.
     *
     * @param probability between 0 and 1
     * @return the value below which that share lies; NaN if nothing was counted
     */
    double quantile(double probability) {
        double wanted = probability * total;
        long before = 0;
        for (int i = 0; i < counts.length; i++) {
            if (counts[i] > 0 && before + counts[i] >= wanted) {
                double low = FastMath.max(least, centre + (first + i) * width);
                double high = FastMath.min(most, centre + (first + i + 1) * width);
                return low + (high - low) * (wanted - before) / counts[i];
            }
            before += counts[i];
        }
        return total == 0 ? Double.NaN : most;
    }
}
