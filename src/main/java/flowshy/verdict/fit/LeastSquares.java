package flowshy.verdict.fit;

import java.util.Arrays;
import java.util.function.UnaryOperator;
import org.hipparchus.exception.MathRuntimeException;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.QRDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.hipparchus.linear.SingularValueDecomposition;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LeastSquaresBuilder;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LevenbergMarquardtOptimizer;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.Pair;

/**
 * Non-linear least squares: the Levenberg–Marquardt method of the library (Moré 1978) to the neighbourhood of the minimum, then
 * Gauss–Newton steps until they are rounding. Derivatives are central differences of sixth order.
 *
 * <p>Parameters count in units of their scale, so that none is large or small.
 */
final class LeastSquares {
    /** Step of a difference over the parameter; truncation falls with its sixth power, rounding grows as it shrinks. */
    private static final double STEP = 1e-4;

    /** Weights of f(x ± h), f(x ± 2h), f(x ± 3h) in the sixth-order central difference (Fornberg 1988, table 1). */
    private static final double[] WEIGHTS = {3.0 / 4.0, -3.0 / 20.0, 1.0 / 60.0};

    private static final int MOST_EVALUATIONS = 5000;

    /** Bounds of the first step, in units of the start (Moré 1978, sec. 6, recommends 0.1 to 100). */
    private static final double[] FIRST_STEPS = {100.0, 1.0};

    private static final int MOST_STEPS = 50;

    /** A Gauss–Newton step below this share of the scale changes nothing that is printed. */
    private static final double SMALL_STEP = 1e-14;

    /** Beyond this ratio of singular values (columns of equal length) the data do not tell the parameters apart. */
    private static final double LARGEST_CONDITION = 1e8;

    private final UnaryOperator<double[]> residuals;
    private final double[] scale;
    private final double[] least;

    /**
     * A problem.
     *
     * @param residuals residuals by parameters, as many at every call
     * @param scale typical size of each parameter, positive
     * @param least lower bound of each parameter, −∞ for none
     */
    LeastSquares(UnaryOperator<double[]> residuals, double[] scale, double[] least) {
        this.residuals = residuals;
        this.scale = scale.clone();
        this.least = least.clone();
    }

    /**
     * The minimum reached from a start.
     *
     * @param start one value a parameter
     * @return the parameters there
     * @throws FitException if the search ends nowhere
     */
    double[] minimum(double[] start) {
        double[] scaled = new double[start.length];
        for (int i = 0; i < start.length; i++) {
            scaled[i] = start[i] / scale[i];
        }
        return plain(polished(marquardt(scaled)));
    }

    /**
     * The minimum near a point, by Gauss–Newton steps alone: for a problem that has changed a little.
     *
     * @param point one value a parameter
     * @return the parameters there, or the point itself where no step leads down
     */
    double[] nearby(double[] point) {
        double[] scaled = new double[point.length];
        for (int i = 0; i < point.length; i++) {
            scaled[i] = point[i] / scale[i];
        }
        return plain(polished(scaled));
    }

    /** The best end of a bold and a careful search: a first step too long may land where nothing changes any more. */
    private double[] marquardt(double[] start) {
        double[] best = null;
        String why = "";
        for (double bound : FIRST_STEPS) {
            try {
                double[] found = marquardt(start, bound);
                double cost = square(at(found));
                if (Double.isFinite(cost) && (best == null || cost < square(at(best)))) {
                    best = found;
                }
            } catch (MathRuntimeException e) {
                why = e.getMessage();
            }
        }
        if (best == null) {
            throw new FitException("the search for the best fit ended nowhere (" + why
                    + "); start nearer to the truth: state better values in the study, or free fewer keys");
        }
        return best;
    }

    private double[] marquardt(double[] start, double firstStep) {
        return new LevenbergMarquardtOptimizer()
                .withInitialStepBoundFactor(firstStep)
                .withCostRelativeTolerance(1e-15)
                .withParameterRelativeTolerance(1e-15)
                .withOrthoTolerance(1e-15)
                .optimize(new LeastSquaresBuilder()
                        .model(this::model)
                        .parameterValidator(this::inside)
                        .target(new double[at(start).length])
                        .start(start)
                        .maxIterations(MOST_EVALUATIONS)
                        .maxEvaluations(MOST_EVALUATIONS)
                        .build())
                .getPoint()
                .toArray();
    }

    private RealVector inside(RealVector point) {
        RealVector moved = point.copy();
        for (int i = 0; i < least.length; i++) {
            moved.setEntry(i, FastMath.max(least[i] / scale[i], point.getEntry(i)));
        }
        return moved;
    }

    private Pair<RealVector, RealMatrix> model(RealVector point) {
        return new Pair<>(
                new ArrayRealVector(at(point.toArray()), false),
                new Array2DRowRealMatrix(slopes(point.toArray()), false));
    }

    /** Levenberg–Marquardt stops where the cost no longer falls; the parameters are then good to the root of rounding only. */
    private double[] polished(double[] start) {
        double[] best = start;
        double cost = square(at(best));
        double before = Double.POSITIVE_INFINITY;
        for (int i = 0; i < MOST_STEPS; i++) {
            double[] step = step(best);
            double[] moved = inside(new ArrayRealVector(best).add(new ArrayRealVector(step, false)))
                    .toArray();
            double there = square(at(moved));
            double length = Arrays.stream(step).map(FastMath::abs).max().orElse(0.0);
            if (!(there <= cost * (1.0 + 1e-9)) || !(length < before)) {
                return best;
            }
            best = moved;
            cost = there;
            before = length;
            if (length < SMALL_STEP) {
                return best;
            }
        }
        return best;
    }

    private double[] step(double[] point) {
        RealMatrix slopes = new Array2DRowRealMatrix(slopes(point), false);
        double[] lengths = lengths(slopes);
        try {
            RealVector step = new QRDecomposition(even(slopes, lengths))
                    .getSolver()
                    .solve(new ArrayRealVector(at(point), false).mapMultiply(-1.0));
            for (int i = 0; i < lengths.length; i++) {
                step.setEntry(i, step.getEntry(i) / lengths[i]);
            }
            return step.toArray();
        } catch (MathRuntimeException e) { // told apart below, where the covariance is asked for
            return new double[point.length];
        }
    }

    /**
     * How well the parameters are told apart at a point.
     *
     * @param point parameters
     * @return (JᵀJ)⁻¹, in the parameters' own units
     * @throws DegenerateException if the data do not tell them apart
     */
    RealMatrix cofactor(double[] point) {
        double[] scaled = new double[point.length];
        for (int i = 0; i < point.length; i++) {
            scaled[i] = point[i] / scale[i];
        }
        RealMatrix slopes = new Array2DRowRealMatrix(slopes(scaled), false);
        double[] lengths = lengths(slopes);
        for (int i = 0; i < lengths.length; i++) {
            if (!(lengths[i] > 0.0)) {
                double[] alone = new double[lengths.length];
                alone[i] = 1.0;
                throw new DegenerateException(alone);
            }
        }
        SingularValueDecomposition parts = new SingularValueDecomposition(even(slopes, lengths));
        double[] values = parts.getSingularValues();
        int last = values.length - 1;
        if (!(values[last] * LARGEST_CONDITION > values[0])) {
            throw new DegenerateException(parts.getV().getColumn(last));
        }
        RealMatrix sides = parts.getV();
        RealMatrix sum = MatrixUtils.createRealMatrix(point.length, point.length);
        for (int i = 0; i < point.length; i++) {
            for (int j = 0; j < point.length; j++) {
                double entry = 0.0;
                for (int k = 0; k < values.length; k++) {
                    entry += sides.getEntry(i, k) * sides.getEntry(j, k) / (values[k] * values[k]);
                }
                sum.setEntry(i, j, entry * scale[i] * scale[j] / (lengths[i] * lengths[j]));
            }
        }
        return sum;
    }

    /** Derivatives of the residuals by scaled parameters, one row a residual. */
    private double[][] slopes(double[] point) {
        double[][] slopes = new double[at(point).length][point.length];
        for (int i = 0; i < point.length; i++) {
            double step = STEP * FastMath.max(FastMath.abs(point[i]), 1e-3);
            // at a bound the slope is taken just inside of it
            double inward = FastMath.max(0.0, least[i] / scale[i] + WEIGHTS.length * step - point[i]);
            for (int k = 0; k < WEIGHTS.length; k++) {
                double[] above = at(shifted(point, i, inward + (k + 1) * step));
                double[] below = at(shifted(point, i, inward - (k + 1) * step));
                for (int r = 0; r < slopes.length; r++) {
                    slopes[r][i] += WEIGHTS[k] * (above[r] - below[r]) / step;
                }
            }
        }
        return slopes;
    }

    private static double[] shifted(double[] point, int index, double by) {
        double[] moved = point.clone();
        moved[index] += by;
        return moved;
    }

    private double[] at(double[] scaled) {
        return residuals.apply(plain(scaled));
    }

    private double[] plain(double[] scaled) {
        double[] plain = new double[scaled.length];
        for (int i = 0; i < scaled.length; i++) {
            plain[i] = scaled[i] * scale[i];
        }
        return plain;
    }

    private static double[] lengths(RealMatrix slopes) {
        double[] lengths = new double[slopes.getColumnDimension()];
        for (int i = 0; i < lengths.length; i++) {
            lengths[i] = slopes.getColumnVector(i).getNorm();
        }
        return lengths;
    }

    private static RealMatrix even(RealMatrix slopes, double[] lengths) {
        RealMatrix even = slopes.copy();
        for (int i = 0; i < lengths.length; i++) {
            if (lengths[i] > 0.0) {
                even.setColumnVector(i, slopes.getColumnVector(i).mapDivide(lengths[i]));
            }
        }
        return even;
    }

    /**
     * Sum of squares.
     *
     * @param values any
     * @return Σ v²
     */
    static double square(double[] values) {
        double sum = 0.0;
        for (double value : values) {
            sum += value * value;
        }
        return sum;
    }
}
