package flowshy.torque.finite;

import flowshy.cylinder.HydrodynamicFunction;
import flowshy.hair.Cylinder;
import flowshy.hair.Profile;
import flowshy.hair.Strip;
import flowshy.math.BesselQuotient;
import flowshy.math.Range;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import flowshy.torque.strips.StripMesh;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.SinCos;

/**
 * Strip theory with a cheap repair for finite length: hundreds of times quicker than {@link FiniteHair}, and an estimate.
 *
 * <p>Γ = 1 + 4 K₁(λ)/(λ K₀(a k_e)), λ = ak, k = √(iω/ν), k_e = [k^{3/2} + (2/L)^{3/2}]^{2/3}: the flow that an endless cylinder
 * would drag ends at about half the length. At the tip the medium slips round the end, which takes away the pressure force on
 * half a radius: −½ a_t · iωρπa_t² u, u the velocity of the medium past the tip. Own fit, no source.
 * a_t is the radius that stands as far below the tip as itself: that of a flat or round end, zero at a point.
 *
 * <p>Complex error of the torques against {@link FiniteHair}, tabulated beside its test: in the usual range (L/d from 3.5, δ/L from
 * 0.02 to 1) cylinders 4 % (stream) and 9 % (rocking), of L/d ≥ 10 3 % and 5 %; tapers 6 % and 5 %; clubs 7 % and 10 %. In the wide
 * range, down to L/d = 2 and for δ/L from 0.005 to 100, 10 % and 16 %.
 */
public final class RepairedStrips implements LengthFactors {
    /** Length over largest diameter for which the errors were found. */
    public static final Range SLENDERNESS = new Range("L/d", 2.0, 200.0);

    /** δ/L for which the errors were found. */
    public static final Range LAYER_SHARE = new Range("δ/L", 0.005, 100.0);

    /** Largest error of the stream's torque in those ranges [-]. */
    public static final double STREAM_ERROR = 0.10;

    /** Largest error of the torque of rocking in those ranges [-]. */
    public static final double ROCKING_ERROR = 0.16;

    /** The usual part of these ranges. */
    private static final Range USUAL_SLENDERNESS = new Range("L/d", 3.5, 200.0);

    private static final Range USUAL_LAYER_SHARE = new Range("δ/L", 0.02, 1.0);

    private static final double USUAL_STREAM_ERROR = 0.07;

    private static final double USUAL_ROCKING_ERROR = 0.105;

    private static final double POWER = 1.5;

    /** Of k^{3/2}. */
    private static final SinCos TURNED = FastMath.sinCos(0.25 * FastMath.PI * POWER);

    private static final double REACH = 2.0;

    private static final double TIP = 0.5;

    private static final int HALVINGS = 50;

    private final Profile profile;
    private final Medium medium;
    private final double pivotDepth;
    private final StokesLayer layer;
    /** Not needed for a cylinder, whose integrals are known. */
    private final Optional<StripMesh> mesh;

    /**
     * The repair of a hair.
     *
     * @param profile shape of the hair
     * @param medium what it stands in; its slip is left out
     * @param pivotDepth h, depth of the pivot below the wall [m]
     */
    public RepairedStrips(Profile profile, Medium medium, double pivotDepth) {
        this.profile = profile;
        this.medium = medium;
        this.pivotDepth = pivotDepth;
        this.layer = new StokesLayer(medium.kinematicViscosity());
        this.mesh = profile instanceof Cylinder ? Optional.empty() : Optional.of(new StripMesh(profile, 1));
    }

    @Override
    public FiniteFactors at(double omega) {
        double delta = medium.stokesLayer(omega);
        Complex k = new Complex(1.0 / delta, 1.0 / delta);
        Repaired law = new Repaired(k, new BesselQuotient(k, near(delta)));
        Moments strips = new Moments();
        Moments repaired = new Moments();
        if (profile instanceof Cylinder cylinder) {
            Complex lever = StokesLayer.lever(cylinder.length(), pivotDepth, delta);
            add(cylinder, lever, HydrodynamicFunction.of(waveNumber(delta) * cylinder.radius()), strips);
            add(cylinder, lever, law.gamma(cylinder.radius()), repaired);
        } else {
            add(delta, law, strips, repaired);
        }
        double arm = profile.length() + pivotDepth;
        double tip = tipRadius();
        double end = TIP * tip * tip * tip * arm;
        Complex stream = repaired.stream()
                .subtract(StokesLayer.share(profile.length() / delta).multiply(end));
        Complex rocking = repaired.rocking().add(-end * arm);
        double slenderness = profile.length() / (2.0 * profile.largestRadius());
        double layer = delta / profile.length();
        boolean usual = USUAL_SLENDERNESS.contains(slenderness) && USUAL_LAYER_SHARE.contains(layer);
        boolean known = SLENDERNESS.contains(slenderness) && LAYER_SHARE.contains(layer);
        return new FiniteFactors(
                stream.divide(strips.stream()),
                rocking.divide(strips.rocking()),
                usual ? USUAL_STREAM_ERROR : known ? STREAM_ERROR : Double.POSITIVE_INFINITY,
                usual ? USUAL_ROCKING_ERROR : known ? ROCKING_ERROR : Double.POSITIVE_INFINITY);
    }

    /** ∫ a² (1 + Γ s) ℓ dz and ∫ a² Γ ℓ² dz. In parts: the library's product guards against infinities and takes longer than all the rest. */
    private static final class Moments {
        private double stream;
        private double streamImaginary;
        private double rocking;
        private double rockingImaginary;

        void add(Complex gamma, double moment, double arm, Complex share) {
            double real = gamma.getReal();
            double imaginary = gamma.getImaginary();
            stream += moment * (1.0 + real * share.getReal() - imaginary * share.getImaginary());
            streamImaginary += moment * (real * share.getImaginary() + imaginary * share.getReal());
            rocking += moment * arm * real;
            rockingImaginary += moment * arm * imaginary;
        }

        Complex stream() {
            return new Complex(stream, streamImaginary);
        }

        Complex rocking() {
            return new Complex(rocking, rockingImaginary);
        }
    }

    /** k_e. The argument of k is 45°, that of its power is known without a logarithm. */
    private Complex near(double delta) {
        double power = power(waveNumber(delta));
        double real = power * TURNED.cos() + power(REACH / profile.length());
        double imaginary = power * TURNED.sin();
        double modulus = FastMath.cbrt(real * real + imaginary * imaginary);
        SinCos turn = FastMath.sinCos(FastMath.atan2(imaginary, real) / POWER);
        return new Complex(modulus * turn.cos(), modulus * turn.sin());
    }

    /** To the power of 3/2. */
    private static double power(double x) {
        return x * FastMath.sqrt(x);
    }

    /** √(ω/ν). */
    private static double waveNumber(double delta) {
        return FastMath.sqrt(2.0) / delta;
    }

    private void add(Cylinder cylinder, Complex lever, Complex gamma, Moments moments) {
        double square = cylinder.radius() * cylinder.radius();
        double length = cylinder.length();
        double top = length + pivotDepth;
        double lift = length * (0.5 * length + pivotDepth);
        double second = (top * top * top - pivotDepth * pivotDepth * pivotDepth) / 3.0;
        moments.add(gamma, square * lift, second / lift, lever.divide(lift));
    }

    private void add(double delta, Repaired law, Moments strips, Moments repaired) {
        double radius = Double.NaN;
        Complex plain = Complex.ZERO;
        Complex better = Complex.ZERO;
        for (Strip strip : mesh.orElseThrow().strips(delta, layer)) {
            if (strip.radius() != radius) { // a straight part needs its law once
                radius = strip.radius();
                plain = HydrodynamicFunction.of(waveNumber(delta) * radius);
                better = law.gamma(radius);
            }
            double arm = strip.height() + pivotDepth;
            double moment = radius * radius * strip.weight() * arm;
            Complex share = StokesLayer.share(strip.height() / delta);
            strips.add(plain, moment, arm, share);
            repaired.add(better, moment, arm, share);
        }
    }

    /** Γ with the reach of the flow. */
    private record Repaired(Complex k, BesselQuotient quotient) {
        Complex gamma(double radius) {
            Complex ratio = quotient.at(radius);
            // 4/λ, λ = ak = a|k|(1 + i)/√2
            double half = 2.0 / (radius * k.getReal());
            return new Complex(
                    1.0 + half * (ratio.getReal() + ratio.getImaginary()),
                    half * (ratio.getImaginary() - ratio.getReal()));
        }
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
