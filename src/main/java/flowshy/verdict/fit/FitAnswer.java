package flowshy.verdict.fit;

import flowshy.response.Device;
import flowshy.verdict.measured.Compared;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A device fitted to what was measured on it.
 *
 * @param estimates the free numbers, in the order asked, gains last
 * @param correlations between them, one row an estimate
 * @param residuals one a measured number
 * @param outliers those among them that a true model would hardly leave (5 % for all together, Šidák 1967)
 * @param robustness how residuals far out counted
 * @param freedom degrees of freedom
 * @param chiSquare sum of squared shares, where every uncertainty is stated
 * @param chance that a true model leaves as much or more, likewise [-]
 * @param core the same two without the outliers; equal where there are none
 * @param enlarged factor on the standard uncertainties because residuals scatter more than stated (Birge 1932); 1 where they do not
 * @param scatters standard uncertainty found from the scatter, for measurements that state none
 * @param derived figures that follow
 * @param device the fitted device
 * @param before what was measured beside the model as it stood
 * @param after the same beside the fitted device, then the rejection that motion and flow give together
 * @param withoutOutliers the same without the frequencies at which an outlier stands
 * @param warnings sentences that must stand beside the numbers
 */
public record FitAnswer(
        List<Estimate> estimates,
        List<List<Double>> correlations,
        List<Residual> residuals,
        List<Residual> outliers,
        Robustness robustness,
        int freedom,
        OptionalDouble chiSquare,
        OptionalDouble chance,
        Core core,
        double enlarged,
        List<Scatter> scatters,
        List<Derived> derived,
        Device device,
        List<Compared> before,
        List<Compared> after,
        List<Compared> withoutOutliers,
        List<String> warnings) {
    /** Copies the lists. */
    public FitAnswer {
        estimates = List.copyOf(estimates);
        correlations = correlations.stream().map(List::copyOf).toList();
        residuals = List.copyOf(residuals);
        outliers = List.copyOf(outliers);
        scatters = List.copyOf(scatters);
        derived = List.copyOf(derived);
        before = List.copyOf(before);
        after = List.copyOf(after);
        withoutOutliers = List.copyOf(withoutOutliers);
        warnings = List.copyOf(warnings);
    }

    /**
     * Goodness of fit without the outliers.
     *
     * @param freedom degrees of freedom
     * @param chiSquare sum of squared shares, absent where not every uncertainty is stated
     * @param chance that a true model leaves as much or more [-]
     */
    public record Core(int freedom, OptionalDouble chiSquare, OptionalDouble chance) {}

    /**
     * Uncertainty of a measurement that states none, from its scatter about the fit.
     *
     * @param name of the measurement
     * @param share standard uncertainty over the amplitude, and of the phase in radians [-]
     */
    public record Scatter(String name, double share) {}
}
