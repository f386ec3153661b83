package flowshy.torque.finite;

import flowshy.hair.Profile;
import flowshy.medium.Medium;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Factors of the whole hair on strip theory at any frequency, solved where they are needed: nodes four a decade, between them cubic
 * Hermite curves in ln ω with central slopes. The solver's curve between such nodes holds to 0.1 %. Above the frequency where the layer
 * is thinner than the solver takes, the factors stay as they are there.
 */
public final class LengthFactors {
    private static final double PER_DECADE = 4.0;

    /** A study asks for a handful of hairs and media; a sweep must not fill the memory. */
    private static final int KEPT = 64;

    private static final Map<Key, LengthFactors> KNOWN = new LinkedHashMap<>(16, 0.75F, true) {
        private static final long serialVersionUID = 1L;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Key, LengthFactors> eldest) {
            return size() > KEPT;
        }
    };

    private record Key(Profile profile, double density, double viscosity, double pivotDepth) {}

    private final FiniteHair hair;
    private final Map<Integer, FiniteFactors> nodes = new ConcurrentHashMap<>();

    private LengthFactors(FiniteHair hair) {
        this.hair = hair;
    }

    /**
     * The factors of a hair; those asked for lately are kept.
     *
     * @param profile its shape
     * @param medium what it stands in
     * @param pivotDepth h [m]
     * @return factors, not solved yet
     */
    public static LengthFactors of(Profile profile, Medium medium, double pivotDepth) {
        Key key = new Key(profile, medium.density(), medium.viscosity(), pivotDepth);
        synchronized (KNOWN) {
            return KNOWN.computeIfAbsent(key, k -> new LengthFactors(new FiniteHair(profile, medium, pivotDepth)));
        }
    }

    /**
     * Factors at a frequency.
     *
     * @param omega angular frequency, positive [rad/s]
     * @return factors and the larger of the solver's errors at the two nodes beside
     */
    public FiniteFactors at(double omega) {
        double place = PER_DECADE * FastMath.log10(FastMath.min(omega, hair.highestFrequency()));
        int below = (int) FastMath.floor(place);
        double t = place - below;
        FiniteFactors before = node(below - 1);
        FiniteFactors left = node(below);
        FiniteFactors right = node(below + 1);
        FiniteFactors after = node(below + 2);
        return new FiniteFactors(
                between(before.stream(), left.stream(), right.stream(), after.stream(), t),
                between(before.rocking(), left.rocking(), right.rocking(), after.rocking(), t),
                FastMath.max(left.streamError(), right.streamError()),
                FastMath.max(left.rockingError(), right.rockingError()));
    }

    /**
     * Angular frequency above which the factors stay as they are.
     *
     * @return [rad/s]
     */
    public double heldAbove() {
        return hair.highestFrequency();
    }

    private FiniteFactors node(int index) {
        return nodes.computeIfAbsent(index, k -> {
            double omega = FastMath.min(FastMath.pow(10.0, k / PER_DECADE), hair.highestFrequency());
            return hair.at(omega).factors();
        });
    }

    private static Complex between(Complex before, Complex left, Complex right, Complex after, double t) {
        return new Complex(
                between(before.getReal(), left.getReal(), right.getReal(), after.getReal(), t),
                between(before.getImaginary(), left.getImaginary(), right.getImaginary(), after.getImaginary(), t));
    }

    /** Cubic Hermite curve with slopes (right − before)/2 and (after − left)/2. */
    private static double between(double before, double left, double right, double after, double t) {
        double m0 = 0.5 * (right - before);
        double m1 = 0.5 * (after - left);
        double t2 = t * t;
        double t3 = t2 * t;
        return (2.0 * t3 - 3.0 * t2 + 1.0) * left
                + (t3 - 2.0 * t2 + t) * m0
                + (3.0 * t2 - 2.0 * t3) * right
                + (t3 - t2) * m1;
    }
}
