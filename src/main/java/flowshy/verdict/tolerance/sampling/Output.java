package flowshy.verdict.tolerance.sampling;

import java.util.List;

/** What a sample says about one output. */
public final class Output {
    private final Interval mean;
    private final Interval deviation;
    private final Histogram all;
    private final List<Histogram> replicates;
    private final long missing;

    Output(Interval mean, Interval deviation, Histogram all, List<Histogram> replicates, long missing) {
        this.mean = mean;
        this.deviation = deviation;
        this.all = all;
        this.replicates = List.copyOf(replicates);
        this.missing = missing;
    }

    /**
     * Mean value.
     *
     * @return with its interval
     */
    public Interval mean() {
        return mean;
    }

    /**
     * Standard deviation.
     *
     * @return with its interval
     */
    public Interval deviation() {
        return deviation;
    }

    /**
     * A percentile.
     *
     * @param probability between 0 and 1
     * @return of all trials together, with the interval between replicates
     */
    public Interval quantile(double probability) {
        return Interval.about(
                all.quantile(probability),
                replicates.stream().mapToDouble(r -> r.quantile(probability)).toArray());
    }

    /**
     * Least value met.
     *
     * @return NaN if no trial gave a value
     */
    public double least() {
        return all.quantile(0.0);
    }

    /**
     * Largest value met.
     *
     * @return NaN if no trial gave a value
     */
    public double most() {
        return all.quantile(1.0);
    }

    /**
     * Trials that gave a finite value.
     *
     * @return the count
     */
    public long counted() {
        return all.total();
    }

    /**
     * Trials that gave none.
     *
     * @return the count
     */
    public long missing() {
        return missing;
    }

    /**
     * Bound of the error that counting in bins adds to a percentile.
     *
     * @return width of a bin
     */
    public double resolution() {
        return all.width();
    }
}
