package flowshy.torque.finite;

import org.hipparchus.analysis.interpolation.SplineInterpolator;
import org.hipparchus.analysis.polynomials.PolynomialSplineFunction;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Factors on strip theory over a range of frequencies, from few solutions: cubic splines in ln ω through real and imaginary
 * parts, four solutions a decade. Between them the curve holds to 0.1 % (tested for a cylinder and a club in air and water).
 *
 * <p>Above the frequency at which the layer is as thin as {@link FiniteHair#LAYER_SHARE} allows, the factors stay as they are
 * there. They would go on towards those of a medium without viscosity, by the change from δ/a = 0.1 to 0.05 once more (own
 * extrapolation): stream 0.2 % and rocking 1.2 % at length over diameter 10, 1.2 % and 7 % at 2, 3 % and 19 % at 1.
 */
public final class FactorCurve {
    private static final double PER_DECADE = 4.0;

    /** A natural spline through fewer points bends too little. */
    private static final int FEWEST = 5;

    private final double lowest;
    private final double highest;
    private final double heldAbove;
    private final double streamError;
    private final double rockingError;
    private final PolynomialSplineFunction[] parts;

    /**
     * Solves at the grid's frequencies; a few tenths of a second a decade.
     *
     * @param hair the hair
     * @param lowest lowest angular frequency wanted, positive [rad/s]
     * @param highest highest, above the lowest [rad/s]
     * @throws IllegalArgumentException if the range is empty or not positive
     */
    public FactorCurve(FiniteHair hair, double lowest, double highest) {
        if (!(lowest > 0.0) || !(highest > lowest) || Double.isInfinite(highest)) {
            throw new IllegalArgumentException("no range of angular frequency from " + lowest + " to " + highest);
        }
        double end = FastMath.min(highest, hair.highestFrequency());
        double start = FastMath.min(lowest, 0.1 * end);
        this.lowest = start;
        this.highest = highest;
        this.heldAbove = end;
        int points = (int) FastMath.max(FEWEST, FastMath.ceil(PER_DECADE * FastMath.log10(end / start)) + 1.0);
        double[] x = new double[points];
        double[][] y = new double[4][points];
        double stream = 0.0;
        double rocking = 0.0;
        for (int i = 0; i < points; i++) {
            double omega = i == points - 1 ? end : start * FastMath.pow(end / start, i / (points - 1.0));
            x[i] = FastMath.log(omega);
            FiniteFactors at = hair.at(omega).factors();
            y[0][i] = at.stream().getReal();
            y[1][i] = at.stream().getImaginary();
            y[2][i] = at.rocking().getReal();
            y[3][i] = at.rocking().getImaginary();
            stream = FastMath.max(stream, at.streamError());
            rocking = FastMath.max(rocking, at.rockingError());
        }
        this.streamError = stream;
        this.rockingError = rocking;
        this.parts = new PolynomialSplineFunction[y.length];
        for (int p = 0; p < y.length; p++) {
            parts[p] = new SplineInterpolator().interpolate(x, y[p]);
        }
    }

    /**
     * Angular frequency above which the factors stay as they are.
     *
     * @return [rad/s]; the highest asked for where the solver reaches it
     */
    public double heldAbove() {
        return heldAbove;
    }

    /**
     * Factors at a frequency.
     *
     * @param omega angular frequency within the range asked for [rad/s]
     * @return factors; the errors are the largest of the solver over the grid
     * @throws IllegalArgumentException outside the range
     */
    public FiniteFactors at(double omega) {
        if (!(omega >= lowest * (1.0 - 1e-12)) || !(omega <= highest * (1.0 + 1e-12))) {
            throw new IllegalArgumentException(
                    "the factors reach from " + lowest + " to " + highest + " rad/s, not to " + omega);
        }
        double[] knots = parts[0].getKnots();
        double x = FastMath.min(FastMath.max(FastMath.log(omega), knots[0]), knots[knots.length - 1]);
        return new FiniteFactors(
                new Complex(parts[0].value(x), parts[1].value(x)),
                new Complex(parts[2].value(x), parts[3].value(x)),
                streamError,
                rockingError);
    }
}
