package flowshy.medium;

import java.util.List;
import org.apache.commons.math3.stat.regression.OLSMultipleLinearRegression;

/**
 * Second virial coefficient of a table over temperature: a polynomial in 300 K / T fitted to its column, so that its slopes are
 * smooth although the rows are rounded. Potentials of gases give such series; degree 4 leaves the rounding of the rows.
 */
final class VirialCurve {
    private static final double SCALE = 300.0;
    private static final int DEGREE = 4;

    private final double[] coefficients;

    private VirialCurve(double[] coefficients) {
        this.coefficients = coefficients;
    }

    /** A curve that is zero everywhere. */
    static VirialCurve none() {
        return new VirialCurve(new double[] {0.0});
    }

    /** The curve through rows that all have the coefficient. */
    static VirialCurve through(List<TableRow> rows) {
        int degree = Math.min(DEGREE, rows.size() - 2);
        double[][] powers = new double[rows.size()][degree];
        double[] values = new double[rows.size()];
        for (int i = 0; i < rows.size(); i++) {
            double x = SCALE / rows.get(i).temperature();
            double power = 1.0;
            for (int k = 0; k < degree; k++) {
                power *= x;
                powers[i][k] = power;
            }
            values[i] = rows.get(i).secondVirial().orElseThrow();
        }
        OLSMultipleLinearRegression fit = new OLSMultipleLinearRegression();
        fit.newSampleData(values, powers);
        return new VirialCurve(fit.estimateRegressionParameters());
    }

    /** B with its slopes at a temperature [K]: of x^k, T d/dT gives −k and T² d²/dT² gives k(k+1). */
    Virial at(double temperature) {
        double x = SCALE / temperature;
        double power = 1.0;
        double value = 0.0;
        double slope = 0.0;
        double bend = 0.0;
        for (int k = 0; k < coefficients.length; k++) {
            value += coefficients[k] * power;
            slope -= k * coefficients[k] * power;
            bend += k * (k + 1.0) * coefficients[k] * power;
            power *= x;
        }
        return new Virial(value, slope, bend);
    }
}
