package flowshy.hair;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.CholeskyDecomposition;
import org.hipparchus.linear.DecompositionSolver;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.hipparchus.util.FastMath;

/**
 * First bending frequency of a hair clamped at the wall, Euler–Bernoulli beam.
 *
 * <p>Cubic Hermite elements, consistent mass, smallest eigenvalue by inverse iteration; error falls with the fourth power of
 * the element length. Check: uniform beam, f = (1.8751041)²/(2π L²) √(EI/m) (handbook value of the first root of
 * cos x cosh x = -1).
 */
public final class Cantilever {
    private static final int ELEMENTS = 48;

    /** Each step gains at least one digit: the second eigenvalue lies at five times the first or higher. */
    private static final int ITERATIONS = 60;

    private static final double ACCURACY = 1e-13;

    /** Exact to degree 9: on a straight taper the stiffness needs 6, the mass 8. */
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(5);

    private Cantilever() {}

    /**
     * First natural frequency.
     *
     * @param profile shape, gives I = πa⁴/4
     * @param youngsModulus E [Pa]
     * @param massPerLength mass that moves with the hair, by radius [kg/m]
     * @return frequency [Hz]
     */
    public static double firstFrequency(Profile profile, double youngsModulus, DoubleUnaryOperator massPerLength) {
        return firstFrequency(profile, youngsModulus, massPerLength, ELEMENTS);
    }

    /** The same with a chosen number of elements, to see how it converges. */
    static double firstFrequency(
            Profile profile, double youngsModulus, DoubleUnaryOperator massPerLength, int elements) {
        List<Double> nodes = nodes(profile, elements);
        int free = 2 * (nodes.size() - 1);
        RealMatrix stiffness = new Array2DRowRealMatrix(free, free);
        RealMatrix mass = new Array2DRowRealMatrix(free, free);
        for (int e = 1; e < nodes.size(); e++) {
            double from = nodes.get(e - 1);
            double span = nodes.get(e) - from;
            List<Double> pieces = within(profile, from, nodes.get(e));
            for (int piece = 1; piece < pieces.size(); piece++) {
                double width = pieces.get(piece) - pieces.get(piece - 1);
                for (int q = 0; q < RULE.getNumberOfPoints(); q++) {
                    double z = pieces.get(piece - 1) + 0.5 * (1.0 + RULE.getPoint(q)) * width;
                    double weight = 0.5 * width * RULE.getWeight(q);
                    double radius = profile.radius(z);
                    double bending = youngsModulus * FastMath.PI * FastMath.pow(radius, 4) / 4.0;
                    addProducts(stiffness, e, curvature((z - from) / span, span), weight * bending);
                    double moving = massPerLength.applyAsDouble(radius);
                    addProducts(mass, e, deflection((z - from) / span, span), weight * moving);
                }
            }
        }
        return FastMath.sqrt(smallestEigenvalue(stiffness, mass)) / (2.0 * FastMath.PI);
    }

    /**
     * Bending stiffness of the hair against a turn at its foot by a force at the tip, in the sense of EI/L.
     *
     * @param profile shape
     * @param youngsModulus E [Pa]
     * @return 1 / ∫ dz/(EI) over the lower nine tenths [N·m/rad]; EI/(0.9 L) for a cylinder. The tip carries no moment, and a
     *     pointed one would make the integral infinite.
     */
    public static double stiffness(Profile profile, double youngsModulus) {
        double compliance = 0.0;
        double top = 0.9 * profile.length();
        List<Double> breaks = new ArrayList<>();
        profile.breaks().stream().filter(z -> z < top).forEach(breaks::add);
        breaks.add(top);
        for (Strip strip : Strip.along(profile, breaks, 16)) {
            compliance += strip.weight() / (youngsModulus * FastMath.PI * FastMath.pow(strip.radius(), 4) / 4.0);
        }
        return 1.0 / compliance;
    }

    /** Nodes at the breaks and between; of a profile measured more finely than the elements, only every so many breaks. */
    private static List<Double> nodes(Profile profile, int elements) {
        List<Double> nodes = new ArrayList<>(List.of(0.0));
        List<Double> breaks = profile.breaks();
        double least = breaks.size() > elements ? profile.length() / elements : 0.0;
        for (int i = 1; i < breaks.size(); i++) {
            double from = nodes.get(nodes.size() - 1);
            double span = breaks.get(i) - from;
            if (span < least && i < breaks.size() - 1) {
                continue;
            }
            int parts = FastMath.max(1, (int) FastMath.ceil(elements * span / profile.length()));
            for (int k = 1; k <= parts; k++) {
                nodes.add(from + span * k / parts);
            }
        }
        return nodes;
    }

    /** Adds weight × shape_i × shape_j at the places of an element's two nodes; the first node of all is clamped. */
    private static void addProducts(RealMatrix matrix, int element, double[] shape, double weight) {
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j < 4; j++) {
                int row = 2 * (element - 2) + i;
                int column = 2 * (element - 2) + j;
                if (row >= 0 && column >= 0) {
                    matrix.addToEntry(row, column, weight * shape[i] * shape[j]);
                }
            }
        }
    }

    /** The ends of an element and the breaks of the profile between them. */
    private static List<Double> within(Profile profile, double from, double to) {
        List<Double> heights = new ArrayList<>(List.of(from));
        profile.breaks().stream().filter(z -> z > from && z < to).forEach(heights::add);
        heights.add(to);
        return heights;
    }

    private static double[] deflection(double t, double span) {
        double t2 = t * t;
        double t3 = t2 * t;
        return new double[] {1 - 3 * t2 + 2 * t3, span * (t - 2 * t2 + t3), 3 * t2 - 2 * t3, span * (t3 - t2)};
    }

    private static double[] curvature(double t, double span) {
        double s2 = span * span;
        return new double[] {(12 * t - 6) / s2, (6 * t - 4) / span, (6 - 12 * t) / s2, (6 * t - 2) / span};
    }

    private static double smallestEigenvalue(RealMatrix stiffness, RealMatrix mass) {
        // lengths of 1e-4 m make the entries tiny: scale so that Cholesky's absolute thresholds do not bite
        double scale = 1.0 / stiffness.getEntry(0, 0);
        RealVector diagonal = new ArrayRealVector(stiffness.getRowDimension());
        for (int i = 0; i < diagonal.getDimension(); i++) {
            diagonal.setEntry(i, 1.0 / FastMath.sqrt(scale * stiffness.getEntry(i, i)));
        }
        RealMatrix scaled = stiffness.copy();
        RealMatrix inertia = mass.copy();
        for (int i = 0; i < diagonal.getDimension(); i++) {
            for (int j = 0; j <= i; j++) {
                double factor = scale * diagonal.getEntry(i) * diagonal.getEntry(j);
                // both halves from one: Cholesky refuses a matrix that is symmetric only up to rounding
                scaled.setEntry(i, j, factor * stiffness.getEntry(i, j));
                scaled.setEntry(j, i, scaled.getEntry(i, j));
                inertia.setEntry(i, j, factor * mass.getEntry(i, j));
                inertia.setEntry(j, i, inertia.getEntry(i, j));
            }
        }
        DecompositionSolver solver = new CholeskyDecomposition(scaled, 1e-9, 1e-14).getSolver();
        RealVector shape = new ArrayRealVector(diagonal.getDimension(), 1.0);
        double eigenvalue = 0.0;
        for (int i = 0; i < ITERATIONS; i++) {
            RealVector next = solver.solve(inertia.operate(shape));
            double before = eigenvalue;
            eigenvalue = shape.dotProduct(shape) / shape.dotProduct(next);
            if (FastMath.abs(eigenvalue - before) < ACCURACY * eigenvalue) {
                break;
            }
            shape = next.unitVector();
        }
        return eigenvalue;
    }
}
