package flowshy.verdict.fit;

import static flowshy.math.Figures.say;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.distribution.continuous.TDistribution;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.special.Gamma;
import org.hipparchus.util.FastMath;

/** How sure fitted numbers are, and how well they explain what was measured. */
final class FitStatistics {
    private static final double CONFIDENCE = 0.95;
    private static final double ERROR = 0.05;

    /** Beyond this the data tell a combination of two numbers much better than either (common practice). */
    private static final double STRONG_CORRELATION = 0.95;

    private static final int FEW = 5;

    private final List<Freed> free;
    private final double[] values;
    private final double[] shares;
    private final RealMatrix cofactor;
    private final Robustness robustness;
    private final boolean stated;
    private final int freedom;
    private final List<Residual> residuals;
    private final List<Residual> outliers;
    private final double factor;

    /**
     * Statistics of a fit.
     *
     * @param free the free numbers
     * @param values the best ones
     * @param search that found them
     * @param numbers where each residual comes from
     * @param cofactor (JᵀJ)⁻¹ of the residuals over their uncertainties
     * @param robustness how residuals far out counted
     */
    FitStatistics(
            List<Freed> free,
            double[] values,
            FitSearch search,
            List<FitModel.Datum> numbers,
            RealMatrix cofactor,
            Robustness robustness) {
        this.free = List.copyOf(free);
        this.values = values.clone();
        this.shares = search.shares(values);
        this.cofactor = cofactor;
        this.robustness = robustness;
        this.stated = numbers.stream().allMatch(FitModel.Datum::stated);
        this.freedom = numbers.size() - free.size();
        this.residuals = new ArrayList<>();
        for (int i = 0; i < shares.length; i++) {
            FitModel.Datum number = numbers.get(i);
            residuals.add(new Residual(number.name(), number.frequency(), number.part(), shares[i], search.weight(i)));
        }
        this.outliers = residuals.stream()
                .filter(residual -> !(FastMath.abs(residual.share()) <= farthest()))
                .toList();
        this.factor = factor();
    }

    int freedom() {
        return freedom;
    }

    List<Residual> residuals() {
        return List.copyOf(residuals);
    }

    List<Residual> outliers() {
        return outliers;
    }

    /** What a true model hardly leaves anywhere, for so many residuals. */
    private double farthest() {
        double each = 1.0 - FastMath.pow(1.0 - ERROR, 1.0 / shares.length);
        return new NormalDistribution().inverseCumulativeProbability(1.0 - 0.5 * each)
                * FastMath.max(1.0, FitSearch.deviation(shares));
    }

    OptionalDouble chiSquare() {
        return stated ? OptionalDouble.of(LeastSquares.square(shares)) : OptionalDouble.empty();
    }

    OptionalDouble chance() {
        return stated ? chance(LeastSquares.square(shares), freedom) : OptionalDouble.empty();
    }

    FitAnswer.Core core() {
        double square = residuals.stream()
                .filter(residual -> !outliers.contains(residual))
                .mapToDouble(residual -> residual.share() * residual.share())
                .sum();
        int left = freedom - outliers.size();
        return new FitAnswer.Core(
                left,
                stated ? OptionalDouble.of(square) : OptionalDouble.empty(),
                stated ? chance(square, left) : OptionalDouble.empty());
    }

    private static OptionalDouble chance(double square, int freedom) {
        return freedom > 0
                ? OptionalDouble.of(Gamma.regularizedGammaQ(0.5 * freedom, 0.5 * square))
                : OptionalDouble.empty();
    }

    /** What the cofactor is multiplied with to be the covariance: stated uncertainties count unless the scatter speaks against them. */
    private double factor() {
        double least = 1.0 / robustness.efficiency();
        if (!stated) {
            return spread();
        }
        OptionalDouble chance = core().chance();
        return chance.isPresent() && chance.getAsDouble() < ERROR ? FastMath.max(least, spread()) : least;
    }

    /** Factor on the standard uncertainties because the residuals scatter more than stated; 1 where they do not. */
    double enlarged() {
        return stated ? FastMath.sqrt(factor * robustness.efficiency()) : 1.0;
    }

    double covariance(int i, int j) {
        return factor * cofactor.getEntry(i, j);
    }

    /**
     * The factor by the scatter: for least squares χ²/ν; for an M-estimator K² [Σψ²/(n−p)]/[Σψ′/n]² with K = 1 + (p/n) var ψ′/(mean ψ′)²
     * (Huber 1973, Ann. Statist. 1:799; in this form from memory, its coverage is tested).
     */
    private double spread() {
        if (robustness == Robustness.NONE) {
            return LeastSquares.square(shares) / freedom;
        }
        double unit = FastMath.max(1.0, FitSearch.deviation(shares));
        double pulls = 0.0;
        double slopes = 0.0;
        double squares = 0.0;
        for (double share : shares) {
            double residual = share / unit;
            double pull = residual * robustness.weight(residual);
            double slope = robustness.slope(residual);
            pulls += pull * pull;
            slopes += slope;
            squares += slope * slope;
        }
        int count = shares.length;
        double mean = slopes / count;
        double variance = squares / count - mean * mean;
        double correction = 1.0 + (double) free.size() / count * variance / (mean * mean);
        return correction * correction * unit * unit * (pulls / freedom) / (mean * mean);
    }

    List<Estimate> estimates() {
        double t = new TDistribution(freedom).inverseCumulativeProbability(0.5 + 0.5 * CONFIDENCE);
        List<Estimate> estimates = new ArrayList<>();
        for (int i = 0; i < values.length; i++) {
            Freed freed = free.get(i);
            double uncertainty = FastMath.sqrt(covariance(i, i));
            boolean bound = values[i] - freed.least() <= 1e-3 * uncertainty || values[i] >= freed.most();
            double reach = t * uncertainty;
            estimates.add(new Estimate(freed, values[i], uncertainty, values[i] - reach, values[i] + reach, bound));
        }
        return estimates;
    }

    List<List<Double>> correlations() {
        List<List<Double>> rows = new ArrayList<>();
        for (int i = 0; i < values.length; i++) {
            List<Double> row = new ArrayList<>();
            for (int j = 0; j < values.length; j++) {
                row.add(
                        i == j
                                ? 1.0
                                : cofactor.getEntry(i, j)
                                        / FastMath.sqrt(cofactor.getEntry(i, i) * cofactor.getEntry(j, j)));
            }
            rows.add(row);
        }
        return rows;
    }

    List<String> warnings() {
        List<String> warnings = new ArrayList<>();
        for (Estimate estimate : estimates()) {
            if (estimate.bound()) {
                warnings.add(say(
                        "%s stands at its bound of %.4g %s: the data would have it beyond; its interval means little.",
                        estimate.freed().key(),
                        estimate.value(),
                        estimate.freed().unit()));
            }
        }
        List<List<Double>> correlations = correlations();
        for (int i = 0; i < values.length; i++) {
            for (int j = i + 1; j < values.length; j++) {
                double correlation = correlations.get(i).get(j);
                if (FastMath.abs(correlation) > STRONG_CORRELATION) {
                    warnings.add(String.format(
                            Locale.ROOT,
                            "%s and %s are correlated by %.4f: the data tell a combination of the two much better than either;"
                                    + " state one of them, or measure what tells them apart.",
                            free.get(i).key(),
                            free.get(j).key(),
                            correlation));
                }
            }
        }
        if (enlarged() > 1.0) {
            warnings.add(say(
                    "The residuals scatter more than the stated uncertainties explain; all standard uncertainties are enlarged by %.3g"
                            + " (Birge 1932). Either the uncertainties are stated too small, or the model lacks something.",
                    enlarged()));
        }
        if (freedom < FEW) {
            warnings.add(say("Only %s degrees of freedom are left: intervals and tests are coarse.", freedom));
        }
        return warnings;
    }
}
