package flowshy.cylinder;

import flowshy.math.Caveat;
import flowshy.math.Figures;
import flowshy.math.Positive;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Long circular cylinder that oscillates across its axis in a medium at rest, or stands in an oscillating one.
 *
 * <p>Time factor e^{+iωt}. Linear theory: holds for KC ≪ 1, length ≫ diameter, no wall near. In a gas whose mean free path is
 * known, with slip of first order ({@link HydrodynamicFunction}).
 *
 * @param radius a [m]
 * @param medium the medium around it
 */
public record OscillatingCylinder(double radius, Medium medium) {
    /** Below this Knudsen number slip changes the force by less than 0.5 %, and is not worth a word. */
    private static final double SLIP_TO_MENTION = 0.01;

    /** Knudsen number at which first-order slip ends (common practice, no source). */
    public static final double SLIP_END = 0.1;

    /** @throws IllegalArgumentException if the radius is not positive and finite */
    public OscillatingCylinder {
        Positive.check("radius [m]", radius);
    }

    /**
     * Womersley number Wo = a √(ω/ν), on the radius.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return Wo [-]
     */
    public double womersley(double omega) {
        return radius * FastMath.sqrt(omega * medium.density() / medium.viscosity());
    }

    /**
     * Knudsen number, mean free path over radius.
     *
     * @return Kn [-]; 0 if the medium has no mean free path
     */
    public double knudsen() {
        return medium.meanFreePath().orElse(0.0) / radius;
    }

    /**
     * Hydrodynamic function Γ; Re Γ is the added-mass coefficient, −Im Γ the damping, both positive.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return Γ [-]
     * @throws IllegalArgumentException if ω is not positive and finite
     */
    public Complex hydrodynamicFunction(double omega) {
        return HydrodynamicFunction.of(womersley(omega), knudsen());
    }

    /**
     * Hydrodynamic function Γ for motion as e^{st}; equal to that at ω where s = iω.
     *
     * @param s growth rate [1/s], finite, not on the negative real axis, where Γ has its cut, and not 0
     * @return Γ [-]
     * @throws IllegalArgumentException if s is 0, not finite or a negative real number
     */
    public Complex hydrodynamicFunction(Complex s) {
        if (s.getImaginary() == 0.0 && !(s.getReal() > 0.0)) {
            throw new IllegalArgumentException("s must not be 0 or on the cut along the negative real axis, was " + s);
        }
        return HydrodynamicFunction.of(
                s.divide(medium.kinematicViscosity()).sqrt().multiply(radius), knudsen());
    }

    /**
     * Force of the medium on the moving cylinder, per unit length and per unit velocity of the cylinder.
     *
     * <p>F′/V = −iω ρ π a² Γ.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return F′/V [N·s/m²]; real part negative (damping), imaginary part −ω times the added mass per length
     * @throws IllegalArgumentException if ω is not positive and finite
     */
    public Complex forcePerVelocity(double omega) {
        return timesDisplacedMassRate(hydrodynamicFunction(omega).negate(), omega);
    }

    /**
     * Force of the moving medium on the fixed cylinder, per unit length and per unit velocity of the free stream.
     *
     * <p>F′/U = iω ρ π a² (1 + Γ u). The 1 is the pressure gradient that drives the free stream; it is the same at every
     * height, while the local velocity u falls to zero at the wall.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @param u undisturbed velocity at the cylinder over that of the free stream [-]
     * @return F′/U [N·s/m²]
     * @throws IllegalArgumentException if ω is not positive and finite
     */
    public Complex streamForcePerVelocity(double omega, Complex u) {
        return timesDisplacedMassRate(hydrodynamicFunction(omega).multiply(u).add(1.0), omega);
    }

    /**
     * What must stand beside the numbers of this cylinder.
     *
     * @return at most one caveat, about the rarefaction of the medium
     */
    public List<Caveat> caveats() {
        double kn = knudsen();
        if (kn > SLIP_END) {
            return List.of(caveat(
                    Caveat.Weight.OUT_OF_RANGE,
                    "The mean free path is %.2g of the hair's radius; the slip law ends at 0.1."));
        }
        if (kn > SLIP_TO_MENTION) {
            return List.of(caveat(
                    Caveat.Weight.NOTE,
                    "The mean free path is %.2g of the hair's radius: slip of first order is included, full"
                            + " accommodation; kinetic theory gives a slip length up to 15 %% longer."));
        }
        if (medium.phase() == Phase.GAS && medium.meanFreePath().isEmpty()) {
            return List.of(new Caveat(
                    Caveat.Subject.REJECTION,
                    Caveat.Weight.NOTE,
                    "The mean free path of " + medium.name() + " is not known; slip at the hair is left out."));
        }
        return List.of();
    }

    private Caveat caveat(Caveat.Weight weight, String text) {
        return new Caveat(Caveat.Subject.REJECTION, weight, Figures.say(text, knudsen()));
    }

    /** Times iω ρ π a². */
    private Complex timesDisplacedMassRate(Complex factor, double omega) {
        double rate = omega * medium.density() * FastMath.PI * radius * radius;
        return new Complex(-factor.getImaginary() * rate, factor.getReal() * rate);
    }
}
