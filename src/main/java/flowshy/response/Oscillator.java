package flowshy.response;

import flowshy.hair.Hair;
import flowshy.hair.Moments;
import flowshy.medium.Medium;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.torque.TorqueModel;
import java.util.Optional;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Hair on its suspension as an oscillator: D = S + S_g + iω(R + R_film) − ω²(J + J_plate + J_fluid), θ/A = T/D.
 *
 * <p>S_g = ∓(ρ_h − ρ) g P[1] for an upright (−) or hanging (+) hair; R_film is that of the film under the plate in the medium around,
 * zero in vacuum. Time factor e^{+iωt}.
 */
public final class Oscillator {
    /** Standard gravity [m/s²], exact by definition (CGPM 1901). */
    public static final double STANDARD_GRAVITY = 9.80665;

    /** Least quality factor for which the complex root is used; below, Γ's branch cut draws the root to 0.5. */
    static final double LEAST_ROOT_QUALITY = 0.55;

    /**
     * Below this S/(ωR) no root has that quality. In a liquid, whose drag lags, the two differ: 0.31 stands against 0.55 in the
     * worst cases seen.
     */
    private static final double LEAST_COARSE_QUALITY = 0.2;

    private static final int NEWTON_STEPS = 60;
    private static final double RELATIVE_ACCURACY = 1e-13;

    private final Suspension suspension;
    private final Optional<TorqueModel> fluid;
    private final double inertia;
    private final double filmDamping;
    private final double gravityStiffness;
    private final double weightMoment;

    /**
     * The oscillator of a hair on a suspension.
     *
     * @param hair the hair
     * @param suspension what it stands on
     * @param medium what surrounds it, empty for vacuum
     */
    public Oscillator(Hair hair, Suspension suspension, Optional<Medium> medium) {
        this(hair, suspension, medium, Covers.OPEN);
    }

    /**
     * The oscillator under a cover, whose wall may confine the fluid that the turning moves.
     *
     * @param hair the hair
     * @param suspension what it stands on
     * @param medium what surrounds it, empty for vacuum
     * @param cover what stands over it
     */
    public Oscillator(Hair hair, Suspension suspension, Optional<Medium> medium, Cover cover) {
        this.suspension = suspension;
        this.fluid = medium.map(around -> TorqueModel.of(hair, around, suspension.pivotDepth(), cover));
        this.filmDamping = suspension.filmDamping(medium);
        Moments moments = Moments.of(hair.profile(), suspension.pivotDepth());
        this.inertia = hair.density() * moments.second() + suspension.plateInertia();
        this.weightMoment =
                (hair.density() - medium.map(Medium::density).orElse(0.0)) * STANDARD_GRAVITY * moments.first();
        this.gravityStiffness = suspension.attitude().sign() * weightMoment;
    }

    /**
     * Stiffness that gravity adds.
     *
     * @return S_g [N·m/rad], negative for an upright hair
     */
    public double gravityStiffness() {
        return gravityStiffness;
    }

    /**
     * Static tilt of a horizontal hair under its own weight, less buoyancy.
     *
     * @return angle [rad], zero for the other attitudes
     */
    public double staticTilt() {
        return suspension.attitude() == Attitude.HORIZONTAL ? weightMoment / suspension.stiffness() : 0.0;
    }

    /**
     * Whether the suspension holds the hair at all.
     *
     * @return false if S + S_g is not positive: the hair falls over
     */
    public boolean stands() {
        return stiffness() > 0.0;
    }

    /**
     * Stiffness with gravity.
     *
     * @return S + S_g [N·m/rad]
     */
    public double stiffness() {
        return suspension.stiffness() + gravityStiffness;
    }

    /**
     * Moment of inertia of the solid parts.
     *
     * @return J + J_plate [kg·m²]
     */
    public double inertia() {
        return inertia;
    }

    /**
     * Inertia of the fluid at a real frequency.
     *
     * @param omega [rad/s]
     * @return J_fluid [kg·m²], zero in vacuum
     */
    public Complex fluidInertia(double omega) {
        return fluid.map(model -> model.at(omega).fluidInertia()).orElse(Complex.ZERO);
    }

    /**
     * Denominator of the response.
     *
     * @param omega [rad/s]
     * @return S + S_g + iω(R + R_film) − ω²(J + J_plate + J_fluid) [N·m/rad]
     */
    public Complex denominator(double omega) {
        return denominator(omega, fluidInertia(omega));
    }

    /**
     * The same where the fluid's inertia is known already.
     *
     * @param omega [rad/s]
     * @param fluidInertia J_fluid at that frequency [kg·m²]
     * @return the denominator [N·m/rad]
     */
    public Complex denominator(double omega, Complex fluidInertia) {
        return new Complex(stiffness(), omega * (suspension.damping() + filmDamping))
                .subtract(fluidInertia.add(inertia).multiply(omega * omega));
    }

    /**
     * Damping of suspension, film and fluid on the hair together.
     *
     * @param omega [rad/s]
     * @param fluidInertia J_fluid at that frequency [kg·m²]
     * @return R + R_film − ω Im J_fluid [N·m·s/rad]
     */
    public double totalDamping(double omega, Complex fluidInertia) {
        return suspension.damping() + filmDamping - omega * fluidInertia.getImaginary();
    }

    /**
     * Resonance: the real frequency at which the real part of the denominator vanishes and the response turns through 90°.
     *
     * @return angular frequency [rad/s]
     * @throws IllegalStateException if the hair falls over
     */
    public double resonance() {
        if (!stands()) {
            throw new IllegalStateException("stiffness with gravity is " + stiffness() + " N m/rad: no resonance");
        }
        double high = FastMath.sqrt(stiffness() / inertia);
        if (fluid.isEmpty()) {
            return high;
        }
        double low = high;
        while (denominator(low).getReal() <= 0.0) { // the fluid only adds inertia: the root lies below
            low *= 0.5;
        }
        if (!(low < high)) { // the fluid adds nothing that counts
            return high;
        }
        BracketingNthOrderBrentSolver solver =
                new BracketingNthOrderBrentSolver(RELATIVE_ACCURACY, RELATIVE_ACCURACY * low, 5);
        // as a share of the stiffness: the solver also stops at an absolute function value of 1e-15
        return solver.solve(
                200, omega -> denominator(omega).getReal() / stiffness(), low, FastMath.min(high, 2.0 * low));
    }

    /**
     * How the free swing dies out.
     *
     * @return quality factor and, if it swings at all, the complex frequency
     */
    public Decay decay() {
        double omega = resonance();
        double total = totalDamping(omega, fluidInertia(omega));
        double coarse = stiffness() / (omega * total);
        if (coarse > LEAST_COARSE_QUALITY) {
            Optional<Complex> root = root(omega, coarse);
            if (root.isPresent()) {
                double quality = -root.get().norm() / (2.0 * root.get().getReal());
                if (quality > LEAST_ROOT_QUALITY) {
                    return new Decay(quality, root);
                }
            }
        }
        return new Decay(coarse, Optional.empty());
    }

    /** Newton's method on s²(J + J_fluid(s)) + R s + S = 0, derivative by a small complex step. */
    private Optional<Complex> root(double omega, double quality) {
        if (Double.isInfinite(quality)) {
            return Optional.empty();
        }
        double real = -omega / (2.0 * quality);
        Complex s = new Complex(real, FastMath.sqrt(FastMath.max(0.05 * omega * omega, omega * omega - real * real)));
        for (int i = 0; i < NEWTON_STEPS; i++) {
            Complex value = balance(s);
            Complex step = s.multiply(1e-6);
            Complex slope =
                    balance(s.add(step)).subtract(balance(s.subtract(step))).divide(step.multiply(2.0));
            Complex change = value.divide(slope);
            s = s.subtract(change);
            if (!(s.getImaginary() > 0.0) || !(s.getReal() < 0.0)) {
                return Optional.empty();
            }
            if (change.norm() < 1e-13 * s.norm()) {
                return Optional.of(s);
            }
        }
        return Optional.empty();
    }

    private Complex balance(Complex s) {
        return structure(s).add(s.multiply(suspension.damping())).add(suspension.stiffness());
    }

    /**
     * All of the equation of motion but the suspension itself, at a complex frequency.
     *
     * @param s complex frequency, imaginary part positive [1/s]
     * @return s²(J + J_plate + J_fluid(s)) + s R_film + S_g [N·m/rad]
     */
    public Complex structure(Complex s) {
        Complex turning =
                fluid.map(model -> model.fluidInertia(s)).orElse(Complex.ZERO).add(inertia);
        return s.multiply(s).multiply(turning).add(s.multiply(filmDamping)).add(gravityStiffness);
    }
}
