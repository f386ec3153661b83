package flowshy.torque.finite;

import flowshy.hair.Profile;
import flowshy.hair.Strip;
import flowshy.math.BesselK;
import flowshy.math.Range;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Strip theory with a cheap repair for finite length: hundreds of times quicker than {@link FiniteHair}, and an estimate.
 *
 * <p>Γ = 1 + 4 K₁(λ)/(λ K₀(a k_e)), λ = ak, k = √(iω/ν), k_e = [k^{3/2} + (2/L)^{3/2}]^{2/3}: the flow that an endless cylinder
 * would drag ends at about half the length. At the tip the medium slips round the end, which takes away the pressure force on
 * half a radius: −½ a_t · iωρπa_t² u, u the velocity of the medium past the tip. Own fit, no source.
 * a_t is the radius that stands as far below the tip as itself: that of a flat or round end, zero at a point.
 *
 * <p>Largest complex error of the torques against {@link FiniteHair} at δ/L from 0.02 to 1: cylinders of L/d ≥ 10 3 % (stream) and
 * 5 % (rocking), 7.5 3 % and 6 %, 3.5 to 5 4 % and 9 %; clubs of L/d 7.5 and 10 6 % and 9 %; tapers 6 % and 5 %. At L/d = 2 13 %:
 * not to be used.
 *
 * @param profile shape of the hair
 * @param medium what it stands in; its slip is left out
 * @param pivotDepth h, depth of the pivot below the wall [m]
 */
public record RepairedStrips(Profile profile, Medium medium, double pivotDepth) implements LengthFactors {
    /** Length over largest diameter for which the errors were found. */
    public static final Range SLENDERNESS = new Range("L/d", 3.5, 50.0);

    /** δ/L for which the errors were found. */
    public static final Range LAYER_SHARE = new Range("δ/L", 0.02, 1.0);

    /** Largest error of the stream's torque in those ranges [-]. */
    public static final double STREAM_ERROR = 0.06;

    /** Largest error of the torque of rocking in those ranges [-]. */
    public static final double ROCKING_ERROR = 0.09;

    private static final double POWER = 1.5;

    private static final double REACH = 2.0;

    private static final double TIP = 0.5;

    private static final int POINTS = 20;

    private static final int HALVINGS = 50;

    /**
     * Factors on strip theory.
     *
     * @param omega angular frequency, positive [rad/s]
     * @return factors with the errors stated above; outside the two ranges the errors are not known and infinite
     */
    @Override
    public FiniteFactors at(double omega) {
        Complex[] strips = new StripForces(medium, pivotDepth, omega).torques(profile);
        Complex[] repaired = torques(omega);
        double slenderness = profile.length() / (2.0 * profile.largestRadius());
        boolean inside =
                SLENDERNESS.contains(slenderness) && LAYER_SHARE.contains(medium.stokesLayer(omega) / profile.length());
        return new FiniteFactors(
                repaired[0].divide(strips[0]),
                repaired[1].divide(strips[1]),
                inside ? STREAM_ERROR : Double.POSITIVE_INFINITY,
                inside ? ROCKING_ERROR : Double.POSITIVE_INFINITY);
    }

    /** Torques about the pivot: of the stream [N·m per m/s], of rocking [N·m per rad/s]. */
    private Complex[] torques(double omega) {
        double delta = medium.stokesLayer(omega);
        Complex k = new Complex(1.0 / delta, 1.0 / delta);
        Complex near =
                k.pow(POWER).add(FastMath.pow(REACH / profile.length(), POWER)).pow(1.0 / POWER);
        Complex stream = Complex.ZERO;
        Complex rocking = Complex.ZERO;
        double radius = Double.NaN;
        Complex gamma = Complex.ZERO;
        for (Strip strip : Strip.along(profile, StripForces.segments(profile, delta), POINTS)) {
            if (strip.radius() != radius) { // a straight part needs its law once
                radius = strip.radius();
                gamma = gamma(k.multiply(radius), near.multiply(radius));
            }
            double arm = strip.height() + pivotDepth;
            double moment = radius * radius * strip.weight() * arm;
            Complex share = StokesLayer.share(strip.height() / delta);
            stream = stream.add(gamma.multiply(share).add(1.0).multiply(moment));
            rocking = rocking.subtract(gamma.multiply(moment * arm));
        }
        double tip = tipRadius();
        double arm = profile.length() + pivotDepth;
        double end = TIP * tip * tip * tip * arm;
        stream = stream.subtract(StokesLayer.share(profile.length() / delta).multiply(end));
        rocking = rocking.add(end * arm);
        Complex rate = new Complex(0.0, omega * medium.density() * FastMath.PI);
        return new Complex[] {stream.multiply(rate), rocking.multiply(rate)};
    }

    private static Complex gamma(Complex lambda, Complex near) {
        Complex ratio = BesselK.scaledK1(lambda)
                .divide(BesselK.scaledK0(near))
                .multiply(near.subtract(lambda).exp());
        return ratio.multiply(4.0).divide(lambda).add(1.0);
    }

    /** Root of a(L − s) = s, from below where there is none but 0. */
    private double tipRadius() {
        double low = 0.0;
        double high = profile.largestRadius();
        if (profile.radius(profile.length() - high) >= high) {
            return high;
        }
        for (int n = 0; n < HALVINGS; n++) {
            double middle = 0.5 * (low + high);
            if (profile.radius(profile.length() - middle) >= middle) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }
}
