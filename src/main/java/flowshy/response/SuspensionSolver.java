package flowshy.response;

import static flowshy.math.Figures.say;

import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.response.SuspensionStatement.Dashpot;
import flowshy.response.SuspensionStatement.Quality;
import flowshy.response.SuspensionStatement.Resonance;
import flowshy.response.SuspensionStatement.RingDown;
import flowshy.response.SuspensionStatement.Spring;
import flowshy.response.SuspensionStatement.Stiffness;
import flowshy.stream.cover.Cover;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Solves what was measured for the suspension alone: stiffness, and the damping that the fluid on the hair and under the plate does not
 * explain. Done once, on the base study; every variant then holds both.
 *
 * <p>A complex frequency s fixes R and S by two linear equations: with W = s²(J + J_plate + J_fluid(s)) + s R_film + S_g,
 * R = −Im W / Im s and S = −Re W − R Re s. Own derivation from the equation of motion; checked by solving back.
 */
public final class SuspensionSolver {
    private static final double ACCURACY = 1e-13;

    /** A damping of zero is met up to this share of a strong one. */
    private static final double ROUNDING = 1e-9;

    /** A swing in a medium is looked for from here times the resonance down, in steps of this ratio, to a twentieth. */
    private static final double ABOVE = 1.5;

    private static final double STEP = 1.01;
    private static final double BELOW = 20.0;

    private final Hair hair;
    private final SuspensionStatement statement;

    /**
     * A solver for one base study.
     *
     * @param hair the hair that was measured
     * @param statement what is known
     */
    public SuspensionSolver(Hair hair, SuspensionStatement statement) {
        this.hair = hair;
        this.statement = statement;
    }

    /**
     * The suspension that agrees with the statement.
     *
     * @return stiffness, structural damping and the rest
     * @throws SuspensionException if no suspension does
     */
    public Suspension solve() {
        if (statement.stiffness().isEmpty()) {
            return fromSwing((RingDown) statement.damping());
        }
        double stiffness = stiffness(statement.stiffness().get());
        double damping;
        if (statement.damping() instanceof Dashpot dashpot) {
            damping = fromDashpot(stiffness, dashpot);
        } else if (statement.damping() instanceof Quality quality) {
            damping = fromQuality(stiffness, quality);
        } else {
            damping = fromDecay(stiffness, (RingDown) statement.damping());
        }
        return suspension(stiffness, damping);
    }

    private double stiffness(Stiffness stated) {
        if (stated instanceof Spring spring) {
            return spring.value();
        }
        Resonance resonance = (Resonance) stated;
        double omega = 2.0 * FastMath.PI * resonance.frequency();
        Oscillator trial = oscillator(1.0, 0.0, resonance.in(), resonance.under());
        double stiffness =
                omega * omega * (trial.inertia() + trial.fluidInertia(omega).getReal()) - trial.gravityStiffness();
        if (!(stiffness > 0.0)) {
            throw new SuspensionException(
                    "resonance",
                    say(
                            "a hanging hair swings faster than %.4g Hz by gravity alone; state a higher resonance",
                            resonance.frequency()));
        }
        return stiffness;
    }

    private double fromDashpot(double stiffness, Dashpot dashpot) {
        if (dashpot.in().isEmpty()) {
            return dashpot.value();
        }
        Oscillator device = standing(stiffness, dashpot.in(), dashpot.under());
        double omega = device.resonance();
        double fluid = device.totalDamping(omega, device.fluidInertia(omega));
        return left(
                "damping",
                dashpot.value() - fluid,
                dashpot.value(),
                say(
                        "%.4g N.m.s/rad in %s is less than the fluid %s alone gives (%.4g N.m.s/rad at %.4g Hz)",
                        dashpot.value(), name(dashpot.in()), where(), fluid, omega / (2.0 * FastMath.PI)));
    }

    private double fromQuality(double stiffness, Quality quality) {
        Oscillator device = standing(stiffness, quality.in(), quality.under());
        double omega = device.resonance();
        double target = quality.value();
        double fluidDamping = device.totalDamping(omega, device.fluidInertia(omega));
        Decay fluidOnly = device.decay();
        String tooHigh = say(
                "a quality factor of %.4g in %s is above what the fluid %s alone allows (%.4g)",
                target, name(quality.in()), where(), fluidOnly.quality());
        if (target <= Oscillator.LEAST_ROOT_QUALITY) { // the definition of an overdamped device, see Oscillator.decay
            double whole = device.stiffness() / (omega * target);
            return creeping(stiffness, quality, left("quality", whole - fluidDamping, whole, tooHigh));
        }
        double tilt = 1.0 / (2.0 * target);
        Complex ray = new Complex(-tilt, FastMath.sqrt(1.0 - tilt * tilt));
        double size = matching(device, part -> ray.multiply(part), stiffness, omega);
        double damping = damping(device, ray.multiply(size));
        return left("quality", damping, device.stiffness() / (omega * target), tooHigh);
    }

    /**
     * Between S/(ωR) and the quality of the root lies a gap in a liquid: as damping falls, the device begins to swing with a
     * quality of 0.55 where S/(ωR) is still 0.3.
     */
    private double creeping(double stiffness, Quality quality, double damping) {
        Decay back =
                oscillator(stiffness, damping, quality.in(), quality.under()).decay();
        if (FastMath.abs(back.quality() - quality.value()) > 1e-6 * quality.value()) {
            throw new SuspensionException(
                    "quality",
                    say(
                            "no device has a quality factor of %.4g in %s: with the damping S/(ωQ) it swings, and its quality factor is"
                                    + " %.4g; below 0.55 state a damping or a ring-down",
                            quality.value(), name(quality.in()), back.quality()));
        }
        return damping;
    }

    private double fromDecay(double stiffness, RingDown ring) {
        Oscillator device = standing(stiffness, ring.in(), ring.under());
        double omega = device.resonance();
        double rate = 1.0 / ring.decayTime();
        if (!(rate < omega)) {
            throw new SuspensionException(
                    "ring-down",
                    say(
                            "a swing at %.4g Hz that dies out in %.4g s is no swing; state a damping or a quality factor",
                            omega / (2.0 * FastMath.PI), ring.decayTime()));
        }
        double swing = matching(device, part -> new Complex(-rate, part), stiffness, omega);
        return explained(device, new Complex(-rate, swing), ring);
    }

    private Suspension fromSwing(RingDown ring) {
        Complex s = new Complex(
                -1.0 / ring.decayTime(), 2.0 * FastMath.PI * ring.frequency().orElseThrow());
        Oscillator device = oscillator(1.0, 0.0, ring.in(), ring.under());
        double damping = explained(device, s, ring);
        double stiffness = -device.structure(s).getReal() - damping * s.getReal();
        if (!(stiffness > 0.0)) {
            throw new SuspensionException(
                    "ring-down", "the swing would need a negative stiffness; check its frequency");
        }
        return suspension(stiffness, damping);
    }

    private double explained(Oscillator device, Complex s, RingDown ring) {
        double damping = damping(device, s);
        return left(
                "ring-down",
                damping,
                2.0 * device.inertia() / ring.decayTime(),
                say(
                        "a swing in %s that lasts %.4g s outlasts what the fluid %s alone allows",
                        name(ring.in()), ring.decayTime(), where()));
    }

    /**
     * Where the frequency s(p) belongs to the known stiffness, looked for from above the resonance downwards. In a liquid two
     * dampings may give one decay; the weaker that is not negative is taken, as it is met first.
     */
    private double matching(Oscillator device, DoubleFunction<Complex> path, double stiffness, double omega) {
        DoubleUnaryOperator mismatch = p -> {
            Complex s = path.apply(p);
            // as a share of the stiffness: the solver also stops at an absolute function value of 1e-15
            return (-device.structure(s).getReal() - damping(device, s) * s.getReal()) / stiffness - 1.0;
        };
        double high = ABOVE * omega;
        double atHigh = mismatch.applyAsDouble(high);
        double outlasting = Double.NaN;
        while (high > omega / BELOW) {
            double low = high / STEP;
            double atLow = mismatch.applyAsDouble(low);
            if (atLow * atHigh <= 0.0) {
                double p = new BracketingNthOrderBrentSolver(ACCURACY, ACCURACY * omega, 5)
                        .solve(200, mismatch::applyAsDouble, low, high);
                if (damping(device, path.apply(p)) >= -ROUNDING * stiffness / omega) {
                    return p;
                }
                outlasting = p;
            }
            high = low;
            atHigh = atLow;
        }
        if (Double.isNaN(outlasting)) {
            throw new SuspensionException(
                    statement.damping() instanceof Quality ? "quality" : "ring-down",
                    say(
                            "no swing between %.4g Hz and %.4g Hz agrees with stiffness and damping as stated",
                            high / (2.0 * FastMath.PI), ABOVE * omega / (2.0 * FastMath.PI)));
        }
        return outlasting;
    }

    private static double damping(Oscillator device, Complex s) {
        return -device.structure(s).getImaginary() / s.getImaginary();
    }

    /** A damping of zero up to rounding is zero; a negative one is refused. */
    private static double left(String key, double damping, double whole, String why) {
        if (damping < -ROUNDING * whole) {
            throw new SuspensionException(
                    key, why + "; check the value, what surrounded the device, and the plate inertia");
        }
        return FastMath.max(0.0, damping);
    }

    private Oscillator standing(double stiffness, Optional<Medium> in, Cover under) {
        Oscillator device = oscillator(stiffness, 0.0, in, under);
        if (!device.stands()) {
            throw new SuspensionException(
                    statement.stiffness().orElseThrow() instanceof Spring ? "stiffness" : "resonance",
                    say(
                            "the upright hair falls over: its weight takes %.4g N.m/rad of %.4g N.m/rad",
                            -device.gravityStiffness(), stiffness));
        }
        return device;
    }

    private Oscillator oscillator(double stiffness, double damping, Optional<Medium> in, Cover under) {
        return new Oscillator(hair, suspension(stiffness, damping), in, under);
    }

    private Suspension suspension(double stiffness, double damping) {
        return new Suspension(
                stiffness,
                damping,
                statement.plateInertia(),
                statement.pivotDepth(),
                statement.attitude(),
                statement.readoutNoise(),
                statement.film());
    }

    private String where() {
        return statement.film().isPresent() ? "on the hair and under the plate" : "on the hair";
    }

    private static String name(Optional<Medium> in) {
        return in.map(Medium::name).orElse("vacuum");
    }
}
