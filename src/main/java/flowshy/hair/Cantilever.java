package flowshy.hair;

import flowshy.math.GaussLegendre;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;
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
    private static final int ELEMENTS = 24;

    /** Each step gains at least one digit: the second eigenvalue lies at five times the first or higher. */
    private static final int ITERATIONS = 60;

    private static final double ACCURACY = 1e-13;

    /** Rounds of added mass against frequency, at most; the added mass falls slowly with frequency, so few are needed. */
    private static final int ROUNDS = 8;

    /** A round that changes the frequency by less is the last. */
    private static final double SETTLED = 1e-9;

    /** Exact to degree 9: on a straight taper the stiffness needs 6, the mass 8. */
    private static final GaussLegendre RULE = GaussLegendre.of(5);

    private final List<Point> points = new ArrayList<>();
    private final double[] scaling;
    private final DecompositionSolver stiffness;

    /**
     * A point of an integration rule.
     *
     * @param first place of the element's first deflection in the vector of unknowns; the clamped node has none
     * @param radius a there [m]
     * @param weight of the point [m]
     * @param deflection there by a unit of each of the element's four unknowns
     */
    private record Point(int first, double radius, double weight, List<Double> deflection) {}

    /**
     * A hair as a beam.
     *
     * @param profile shape, gives I = πa⁴/4
     * @param youngsModulus E [Pa]
     */
    public Cantilever(Profile profile, double youngsModulus) {
        this(profile, youngsModulus, ELEMENTS);
    }

    /** The same with a chosen number of elements, to see how it converges. */
    Cantilever(Profile profile, double youngsModulus, int elements) {
        List<Double> nodes = nodes(profile, elements);
        int free = 2 * (nodes.size() - 1);
        RealMatrix matrix = new Array2DRowRealMatrix(free, free);
        for (int e = 1; e < nodes.size(); e++) {
            double from = nodes.get(e - 1);
            double span = nodes.get(e) - from;
            List<Double> pieces = within(profile, from, nodes.get(e));
            for (int piece = 1; piece < pieces.size(); piece++) {
                double width = pieces.get(piece) - pieces.get(piece - 1);
                for (int q = 0; q < RULE.size(); q++) {
                    double z = pieces.get(piece - 1) + 0.5 * (1.0 + RULE.point(q)) * width;
                    double radius = profile.radius(z);
                    double t = (z - from) / span;
                    Point point = new Point(2 * (e - 2), radius, 0.5 * width * RULE.weight(q), deflection(t, span));
                    points.add(point);
                    addProducts(
                            matrix,
                            point.first(),
                            curvature(t, span),
                            point.weight() * youngsModulus * FastMath.PI * FastMath.pow(radius, 4) / 4.0);
                }
            }
        }
        // lengths of 1e-4 m make the entries tiny: scale so that Cholesky's absolute thresholds do not bite
        scaling = new double[free];
        for (int i = 0; i < free; i++) {
            scaling[i] = 1.0 / FastMath.sqrt(matrix.getEntry(i, i));
        }
        stiffness = new CholeskyDecomposition(scaled(matrix), 1e-9, 1e-14).getSolver();
    }

    /**
     * First natural frequency.
     *
     * @param massPerLength mass that moves with the hair, by radius [kg/m]
     * @return frequency [Hz]
     */
    public double firstFrequency(DoubleUnaryOperator massPerLength) {
        return mode(masses(massPerLength), new ArrayRealVector(scaling.length, 1.0))
                .frequency();
    }

    /**
     * First natural frequency where the mass that moves along depends on the frequency, as a fluid's added mass does.
     *
     * @param massPerLength mass that moves with the hair [kg/m], by radius [m] and angular frequency [rad/s]
     * @param without mass of the hair alone, by radius [kg/m]; the frequency is looked for from there
     * @return frequency [Hz]
     */
    public double firstFrequency(DoubleBinaryOperator massPerLength, DoubleUnaryOperator without) {
        Mode mode = mode(masses(without), new ArrayRealVector(scaling.length, 1.0));
        double before = 0.0;
        for (int i = 0; i < ROUNDS && FastMath.abs(mode.frequency() - before) > SETTLED * before; i++) {
            before = mode.frequency();
            double omega = 2.0 * FastMath.PI * before;
            mode = mode(masses(radius -> massPerLength.applyAsDouble(radius, omega)), mode.shape());
        }
        return mode.frequency();
    }

    /**
     * A way of swinging.
     *
     * @param frequency [Hz]
     * @param shape in scaled unknowns, of unit length
     */
    private record Mode(double frequency, RealVector shape) {}

    private Mode mode(double[] masses, RealVector start) {
        RealVector shape = start;
        double eigenvalue = 0.0;
        for (int i = 0; i < ITERATIONS; i++) {
            RealVector next = stiffness.solve(inertia(masses, shape));
            double before = eigenvalue;
            eigenvalue = shape.dotProduct(shape) / shape.dotProduct(next);
            shape = next.unitVector();
            if (FastMath.abs(eigenvalue - before) < ACCURACY * eigenvalue) {
                break;
            }
        }
        return new Mode(FastMath.sqrt(eigenvalue) / (2.0 * FastMath.PI), shape);
    }

    private double[] masses(DoubleUnaryOperator massPerLength) {
        double[] masses = new double[points.size()];
        double radius = Double.NaN;
        double mass = Double.NaN;
        for (int i = 0; i < masses.length; i++) {
            if (points.get(i).radius() != radius) { // a straight part has one mass
                radius = points.get(i).radius();
                mass = massPerLength.applyAsDouble(radius);
            }
            masses[i] = points.get(i).weight() * mass;
        }
        return masses;
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
    private static void addProducts(RealMatrix matrix, int first, List<Double> shape, double weight) {
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j < 4; j++) {
                if (first + i >= 0 && first + j >= 0) {
                    matrix.addToEntry(first + i, first + j, weight * shape.get(i) * shape.get(j));
                }
            }
        }
    }

    /** Consistent mass times a shape, point by point, in scaled unknowns. */
    private RealVector inertia(double[] masses, RealVector shape) {
        RealVector force = new ArrayRealVector(scaling.length);
        for (int p = 0; p < masses.length; p++) {
            Point point = points.get(p);
            double moved = 0.0;
            for (int i = FastMath.max(0, -point.first()); i < 4; i++) {
                int at = point.first() + i;
                moved += point.deflection().get(i) * scaling[at] * shape.getEntry(at);
            }
            for (int i = FastMath.max(0, -point.first()); i < 4; i++) {
                int at = point.first() + i;
                force.addToEntry(at, point.deflection().get(i) * scaling[at] * masses[p] * moved);
            }
        }
        return force;
    }

    /** Ones on the diagonal; both halves from one, as Cholesky refuses a matrix that is symmetric only up to rounding. */
    private RealMatrix scaled(RealMatrix matrix) {
        RealMatrix scaled = new Array2DRowRealMatrix(scaling.length, scaling.length);
        for (int i = 0; i < scaling.length; i++) {
            for (int j = 0; j <= i; j++) {
                scaled.setEntry(i, j, scaling[i] * scaling[j] * matrix.getEntry(i, j));
                scaled.setEntry(j, i, scaled.getEntry(i, j));
            }
        }
        return scaled;
    }

    /** The ends of an element and the breaks of the profile between them. */
    private static List<Double> within(Profile profile, double from, double to) {
        List<Double> heights = new ArrayList<>(List.of(from));
        profile.breaks().stream().filter(z -> z > from && z < to).forEach(heights::add);
        heights.add(to);
        return heights;
    }

    private static List<Double> deflection(double t, double span) {
        double t2 = t * t;
        double t3 = t2 * t;
        return List.of(1 - 3 * t2 + 2 * t3, span * (t - 2 * t2 + t3), 3 * t2 - 2 * t3, span * (t3 - t2));
    }

    private static List<Double> curvature(double t, double span) {
        double s2 = span * span;
        return List.of((12 * t - 6) / s2, (6 * t - 4) / span, (6 - 12 * t) / s2, (6 * t - 2) / span);
    }
}
