package flowshy.stream.wall;

import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.LUDecomposition;

/**
 * Polynomial collocation on given points: matrices that differentiate, integrate and interpolate values at the points.
 *
 * <p>Barycentric form (Berrut and Trefethen 2004, from memory). Meant for Chebyshev points; the first point is where integrals begin.
 */
final class Collocation {
    private final double[] points;
    private final double[] weights;

    Collocation(double[] points) {
        this.points = points.clone();
        int last = points.length - 1;
        weights = new double[points.length];
        for (int j = 0; j <= last; j++) {
            weights[j] = (j % 2 == 0 ? 1.0 : -1.0) * (j == 0 || j == last ? 0.5 : 1.0); // Chebyshev extreme points
        }
    }

    double[][] derivative() {
        int size = points.length;
        double[][] d = new double[size][size];
        for (int j = 0; j < size; j++) {
            double sum = 0.0;
            for (int k = 0; k < size; k++) {
                if (k != j) {
                    d[j][k] = weights[k] / weights[j] / (points[j] - points[k]);
                    sum += d[j][k];
                }
            }
            d[j][j] = -sum; // rows sum to zero: a constant has no slope
        }
        return d;
    }

    double[][] secondDerivative() {
        Array2DRowRealMatrix d = new Array2DRowRealMatrix(derivative(), false);
        return d.multiply(d).getData();
    }

    /** Integral from the first point: the inverse of the derivative without its first row and column. */
    double[][] integral() {
        int last = points.length - 1;
        double[][] inner = new Array2DRowRealMatrix(derivative(), false)
                .getSubMatrix(1, last, 1, last)
                .getData();
        double[][] inverse = new LUDecomposition(new Array2DRowRealMatrix(inner, false))
                .getSolver()
                .getInverse()
                .getData();
        double[][] integral = new double[last + 1][last + 1];
        for (int j = 1; j <= last; j++) {
            System.arraycopy(inverse[j - 1], 0, integral[j], 1, last);
        }
        return integral;
    }

    /** Weights w such that Σ wⱼ gⱼ is the interpolating polynomial at a place. */
    double[] weightsAt(double place) {
        double[] at = new double[points.length];
        double sum = 0.0;
        for (int j = 0; j < points.length; j++) {
            double distance = place - points[j];
            if (distance == 0.0) {
                double[] unit = new double[points.length];
                unit[j] = 1.0;
                return unit;
            }
            at[j] = weights[j] / distance;
            sum += at[j];
        }
        for (int j = 0; j < points.length; j++) {
            at[j] /= sum;
        }
        return at;
    }
}
