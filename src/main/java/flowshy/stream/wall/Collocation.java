package flowshy.stream.wall;

import java.util.Arrays;
import org.hipparchus.util.FastMath;

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
        double[][] d = derivative();
        int size = d.length;
        double[][] square = new double[size][size];
        for (int i = 0; i < size; i++) {
            for (int k = 0; k < size; k++) {
                double factor = d[i][k];
                for (int j = 0; j < size; j++) {
                    square[i][j] += factor * d[k][j];
                }
            }
        }
        return square;
    }

    /** Integral from the first point: the inverse of the derivative without its first row and column. */
    double[][] integral() {
        double[][] d = derivative();
        int last = points.length - 1;
        double[][] integral = new double[last + 1][last + 1];
        double[][] inner = new double[last][];
        double[][] unit = new double[last][last];
        for (int i = 0; i < last; i++) {
            inner[i] = Arrays.copyOfRange(d[i + 1], 1, last + 1);
            unit[i][i] = 1.0;
        }
        double[][] inverse = solve(inner, unit);
        for (int i = 0; i < last; i++) {
            System.arraycopy(inverse[i], 0, integral[i + 1], 1, last);
        }
        return integral;
    }

    /**
     * Gaussian elimination with row pivots, in place, for several right-hand sides, one a column. The decompositions of the library do
     * the same but take four times as long before the virtual machine has warmed up, which is when this runs.
     */
    static double[][] solve(double[][] matrix, double[][] right) {
        int size = right.length;
        for (int k = 0; k < size; k++) {
            int pivot = k;
            for (int i = k + 1; i < size; i++) {
                if (FastMath.abs(matrix[i][k]) > FastMath.abs(matrix[pivot][k])) {
                    pivot = i;
                }
            }
            swap(matrix, k, pivot);
            swap(right, k, pivot);
            for (int i = k + 1; i < size; i++) {
                double factor = matrix[i][k] / matrix[k][k];
                subtract(matrix[i], factor, matrix[k], k);
                subtract(right[i], factor, right[k], 0);
            }
        }
        for (int k = size - 1; k >= 0; k--) {
            for (int j = k + 1; j < size; j++) {
                subtract(right[k], matrix[k][j], right[j], 0);
            }
            for (int c = 0; c < right[k].length; c++) {
                right[k][c] /= matrix[k][k];
            }
        }
        return right;
    }

    private static void swap(double[][] rows, int one, int other) {
        double[] row = rows[one];
        rows[one] = rows[other];
        rows[other] = row;
    }

    private static void subtract(double[] row, double factor, double[] other, int from) {
        for (int j = from; j < row.length; j++) {
            row[j] -= factor * other[j];
        }
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
