package flowshy.verdict.fit;

import flowshy.verdict.fit.FitModel.Datum;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.hipparchus.util.FastMath;

/** The search for the best numbers: a start, the scatter of what states no uncertainty, then the weights of residuals far out. */
final class FitSearch {
    /** Trial stiffnesses over the stated one: a search that starts beyond the resonance may run away from it. */
    private static final double[] TRIALS = {0.25, 0.35, 0.5, 0.7, 0.85, 1.18, 1.4, 2.0, 2.8, 4.0};

    private static final int MOST_ROUNDS = 50;
    private static final int SCATTER_ROUNDS = 4;

    /** Weights that change by less are settled. */
    private static final double SETTLED = 1e-6;

    /** Median absolute deviation to standard deviation on normal errors, 1/Φ⁻¹(3/4). */
    private static final double MEDIAN_TO_DEVIATION = 1.482602218505602;

    /** Mean square of normal errors drawn in to ±1.345, 2Φ(k) − 1 − 2kφ(k) + 2k²(1 − Φ(k)). */
    private static final double DRAWN_IN = 0.7101645482690486;

    private static final int SCALE_ROUNDS = 30;

    private final FitModel model;
    private final List<Freed> free;
    private final List<Datum> numbers;
    private final double[] scale;
    private final Robustness robustness;
    private final double[] least;
    private final double[] deviations;
    private final double[] weights;

    /**
     * A search.
     *
     * @param model what is left by free numbers
     * @param free those numbers
     * @param scale typical size of each
     * @param robustness how residuals far out count
     */
    FitSearch(FitModel model, List<Freed> free, double[] scale, Robustness robustness) {
        this.model = model;
        this.free = List.copyOf(free);
        this.numbers = model.numbers();
        this.scale = scale.clone();
        this.robustness = robustness;
        this.least = free.stream().mapToDouble(Freed::least).toArray();
        this.deviations = numbers.stream().mapToDouble(Datum::deviation).toArray();
        this.weights = new double[numbers.size()];
        Arrays.fill(weights, 1.0);
    }

    /** The best numbers. */
    double[] best() {
        return robust(scattered(first()));
    }

    /** What they leave, each over its standard uncertainty. */
    double[] shares(double[] values) {
        double[] shares = model.residuals(values);
        for (int i = 0; i < shares.length; i++) {
            shares[i] /= deviations[i];
        }
        return shares;
    }

    /** With which each counted. */
    double weight(int index) {
        return weights[index];
    }

    /** Standard uncertainty of each, stated or found from the scatter. */
    double deviation(int index) {
        return deviations[index];
    }

    /** The problem with every residual in full, whose slopes tell how sure the numbers are. */
    LeastSquares plain() {
        return new LeastSquares(this::shares, scale, least);
    }

    /** From the stated numbers, and from the stiffness that fits best among some others; the better end counts. */
    private double[] first() {
        double[] start = free.stream().mapToDouble(Freed::start).toArray();
        List<double[]> starts = new ArrayList<>(List.of(start));
        double[] other = null;
        for (double trial : TRIALS) {
            double[] from = start.clone();
            for (int i = 0; i < from.length; i++) {
                boolean scaled = free.get(i).kind() == Freed.Kind.STIFFNESS
                        || free.get(i).kind() == Freed.Kind.VOLTS
                        || free.get(i).kind()
                                == Freed.Kind.ANGLES; // far below the resonance only gain over stiffness shows
                from[i] *= scaled ? trial : 1.0;
            }
            if (other == null || cost(from) < cost(other)) {
                other = from;
            }
        }
        if (free.stream().anyMatch(freed -> freed.kind() == Freed.Kind.STIFFNESS)) {
            starts.add(other);
        }
        double[] best = null;
        FitException why = new FitException("the search for the best fit has no start");
        for (double[] from : starts) {
            try {
                double[] found = weighted().minimum(from);
                if (best == null || cost(found) < cost(best) * (1.0 - 1e-9)) {
                    best = found;
                }
            } catch (FitException e) {
                why = e;
            }
        }
        if (best == null) {
            throw why;
        }
        return best;
    }

    private double cost(double[] values) {
        return LeastSquares.square(weightedShares(values));
    }

    private LeastSquares weighted() {
        return new LeastSquares(this::weightedShares, scale, least);
    }

    private double[] weightedShares(double[] values) {
        double[] shares = shares(values);
        for (int i = 0; i < shares.length; i++) {
            shares[i] *= FastMath.sqrt(weights[i]);
        }
        return shares;
    }

    /** Measurements without uncertainties get the one that their scatter about the fit shows; a few rounds settle it. */
    private double[] scattered(double[] values) {
        List<Integer> unstated = numbers.stream()
                .filter(number -> !number.stated())
                .map(Datum::source)
                .distinct()
                .toList();
        double[] best = values;
        for (int round = 0; round < SCATTER_ROUNDS && !unstated.isEmpty(); round++) {
            double[] rest = model.residuals(best);
            for (int source : unstated) {
                double deviation = scatter(rest, source);
                for (int i = 0; i < deviations.length; i++) {
                    if (numbers.get(i).source() == source) {
                        deviations[i] = deviation;
                    }
                }
            }
            best = weighted().nearby(best);
        }
        return best;
    }

    private double scatter(double[] rest, int source) {
        double[] own = new double[rest.length];
        int count = 0;
        for (int i = 0; i < rest.length; i++) {
            if (numbers.get(i).source() == source) {
                own[count++] = rest[i];
            }
        }
        own = Arrays.copyOf(own, count);
        double taken = (double) free.size() * count / numbers.size(); // its part of the freedom that the fit takes
        double left = FastMath.max(1.0, count - taken);
        double rms = FastMath.sqrt(LeastSquares.square(own) / left);
        double found = robustness == Robustness.NONE ? rms : resistant(own) * FastMath.sqrt(count / left);
        return FastMath.max(found > 0.0 ? found : rms, 1e-12);
    }

    /** Huber's proposal 2 (1964): the rms of residuals drawn in to 1.345 of it, over what that is on normal errors; from the median. */
    private static double resistant(double[] values) {
        double scale = deviation(values);
        for (int round = 0; round < SCALE_ROUNDS && scale > 0.0; round++) {
            double sum = 0.0;
            for (double value : values) {
                double pull = value / scale * Robustness.HUBER.weight(value / scale);
                sum += pull * pull;
            }
            scale *= FastMath.sqrt(sum / values.length / DRAWN_IN);
        }
        return scale;
    }

    /** Iteratively reweighted; the scale of the residuals is their median deviation, but no less than what is stated. */
    private double[] robust(double[] values) {
        double[] best = values;
        for (int round = 0; round < MOST_ROUNDS && robustness != Robustness.NONE; round++) {
            double[] shares = shares(best);
            double unit = FastMath.max(1.0, deviation(shares));
            double change = 0.0;
            for (int i = 0; i < shares.length; i++) {
                double weight = robustness.weight(shares[i] / unit);
                change = FastMath.max(change, FastMath.abs(weight - weights[i]));
                weights[i] = weight;
            }
            if (change < SETTLED) {
                return best;
            }
            best = weighted().nearby(best);
        }
        return best;
    }

    /** Standard deviation of normal residuals by their median size. */
    static double deviation(double[] values) {
        double[] sizes = Arrays.stream(values).map(FastMath::abs).sorted().toArray();
        int middle = sizes.length / 2;
        double median = sizes.length % 2 == 1 ? sizes[middle] : 0.5 * (sizes[middle - 1] + sizes[middle]);
        return MEDIAN_TO_DEVIATION * median;
    }
}
