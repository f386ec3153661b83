package flowshy.torque.finite;

import flowshy.hair.Profile;
import flowshy.medium.Medium;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Factors of a whole hair on strip theory for any ω/ν, the only thing they know of the medium: solved on a grid that is even in ln ω
 * and starts at the thinnest layer the solver takes, between its points cubic Hermite curves with central slopes.
 *
 * <p>Points are solved when they are needed, several at once, and kept: one hair in many fluids, under many covers and at many
 * frequencies costs a handful of solutions. A sixteenth of the third difference stands for the error of the curve; it is that
 * within a tenth for every shape tried (a test holds it), 0.3 % of the factor at two points a decade and 0.1 % at four.
 *
 * <p>A point whose two meshes differ by more than {@link #TOO_MUCH} is solved again on the finer two. In a layer thinner than the
 * solver takes, the factors stay, and the change from twice that layer to it, over which they would go on to those of a fluid
 * without viscosity, joins the error.
 */
final class FactorGrid {
    /** Difference of two meshes above which the finer two are taken [-]. */
    static final double TOO_MUCH = 0.01;

    /** A study asks for a handful of hairs; a walk through many shapes must not fill the memory. */
    private static final int KEPT = 256;

    private static final Medium UNIT = Medium.of("unit", 1.0, 1.0);

    private static final Map<Key, FactorGrid> KNOWN = new LinkedHashMap<>(16, 0.75F, true) {
        private static final long serialVersionUID = 1L;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Key, FactorGrid> eldest) {
            return size() > KEPT;
        }
    };

    private record Key(Profile profile, double pivotDepth, double footGap, Accuracy accuracy) {}

    private final FiniteHair hair;
    private final Accuracy accuracy;
    private final Map<Integer, FiniteFactors> points = new ConcurrentHashMap<>();

    FactorGrid(FiniteHair hair, Accuracy accuracy) {
        this.hair = hair;
        this.accuracy = accuracy;
    }

    /**
     * The grid of a hair; those asked for lately are kept.
     *
     * @param profile its shape
     * @param pivotDepth h [m]
     * @param footGap gap at the foot [m]
     * @param accuracy how fine
     * @return the grid, its points not yet solved
     */
    static FactorGrid of(Profile profile, double pivotDepth, double footGap, Accuracy accuracy) {
        Key key = new Key(profile, pivotDepth, footGap, accuracy);
        synchronized (KNOWN) {
            return KNOWN.computeIfAbsent(
                    key, k -> new FactorGrid(new FiniteHair(profile, UNIT, pivotDepth, footGap), accuracy));
        }
    }

    /** ω/ν above which the factors stay [1/m²]. */
    double heldAbove() {
        return hair.highestFrequency();
    }

    /** Torque of a slow stream in a medium of unit viscosity. */
    double creepingTorque(DoubleUnaryOperator velocity) {
        return hair.creepingTorque(velocity);
    }

    /** Solves all points that a range of ω/ν needs, on as many cores as there are. */
    void expect(double lowest, double highest) {
        solve((int) FastMath.floor(place(highest)) - 1, (int) FastMath.floor(place(lowest)) + 2);
    }

    /**
     * Factors.
     *
     * @param rate ω/ν, positive [1/m²]
     * @return factors with their errors: meshes, curve and held value together
     */
    FiniteFactors at(double rate) {
        double place = place(rate);
        int above = (int) FastMath.floor(place);
        double t = place - above;
        solve(above - 1, above + 2);
        FiniteFactors left = point(above);
        FiniteFactors right = point(above + 1);
        FiniteFactors after = point(above + 2);
        Curve stream = new Curve(
                left.stream(),
                right.stream(),
                after.stream(),
                above > 0 ? point(above - 1).stream() : Curve.before(left.stream(), right.stream(), after.stream()));
        Curve rocking = new Curve(
                left.rocking(),
                right.rocking(),
                after.rocking(),
                above > 0
                        ? point(above - 1).rocking()
                        : Curve.before(left.rocking(), right.rocking(), after.rocking()));
        double streamError = FastMath.max(left.streamError(), right.streamError()) + stream.error();
        double rockingError = FastMath.max(left.rockingError(), right.rockingError()) + rocking.error();
        if (rate > heldAbove() * (1.0 + 1e-9)) {
            FiniteFactors thicker = at(0.25 * heldAbove());
            streamError += thicker.stream().subtract(left.stream()).norm();
            rockingError += thicker.rocking().subtract(left.rocking()).norm();
        }
        return new FiniteFactors(stream.at(t), rocking.at(t), streamError, rockingError);
    }

    /**
     * Factors of a solution at this very rate, which is not kept: less work than a grid for a hair that is asked once or twice.
     *
     * @param rate ω/ν, positive [1/m²]
     * @return factors with the errors of their meshes; those of the grid in a layer thinner than the solver takes
     */
    FiniteFactors alone(double rate) {
        return rate > heldAbove() ? at(rate) : solved(rate);
    }

    /** Place on the grid, which counts from the highest frequency down. */
    private double place(double rate) {
        if (!(rate > 0.0) || Double.isInfinite(rate)) {
            throw new IllegalArgumentException("angular frequency over viscosity must be positive, was " + rate);
        }
        return FastMath.max(0.0, accuracy.perDecade() * FastMath.log10(heldAbove() / rate));
    }

    private void solve(int from, int to) {
        int[] missing = IntStream.rangeClosed(FastMath.max(0, from), to)
                .filter(index -> !points.containsKey(index))
                .toArray();
        if (missing.length == 1) {
            point(missing[0]);
        } else if (missing.length > 1) {
            IntStream.of(missing).parallel().forEach(this::point);
        }
    }

    private FiniteFactors point(int index) {
        return points.computeIfAbsent(index, k -> solved(heldAbove() * FastMath.pow(10.0, -k / accuracy.perDecade())));
    }

    private FiniteFactors solved(double rate) {
        FiniteFactors found = hair.at(rate, accuracy).factors();
        return accuracy == Accuracy.FINE || FastMath.max(found.streamError(), found.rockingError()) < TOO_MUCH
                ? found
                : hair.at(rate, Accuracy.FINE).factors();
    }

    /** Cubic Hermite curve from left to right with slopes (right − before)/2 and (after − left)/2. */
    private record Curve(Complex left, Complex right, Complex after, Complex before) {
        /** The point that would lie before the first, on the parabola through the first three. */
        static Complex before(Complex left, Complex right, Complex after) {
            return left.subtract(right).multiply(3.0).add(after);
        }

        Complex at(double t) {
            double t2 = t * t;
            double t3 = t2 * t;
            double start = t3 - 2.0 * t2 + t;
            double end = t3 - t2;
            return left.multiply(2.0 * t3 - 3.0 * t2 + 1.0 - 0.5 * end)
                    .add(right.multiply(3.0 * t2 - 2.0 * t3 + 0.5 * start))
                    .add(before.multiply(-0.5 * start))
                    .add(after.multiply(0.5 * end));
        }

        double error() {
            return after.subtract(before)
                            .add(left.subtract(right).multiply(3.0))
                            .norm()
                    / (16.0 * left.norm());
        }
    }
}
