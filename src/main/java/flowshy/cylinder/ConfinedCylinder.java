package flowshy.cylinder;

import flowshy.medium.Medium;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Long circular cylinder that oscillates across the axis of a still coaxial enclosure full of the medium.
 *
 * <p>Time factor e^{+iωt}; linear theory, small excursion against the gap, no slip. Γ_b tends to the unbounded Γ as b ≫ a + δ,
 * to (β²+1)/(β²−1) without viscosity and to a resistance of 12πμ/(β−1)³ in a narrow gap, β = b/a. Tested for 1.01 ≤ β ≤ 1e4
 * and 1e-6 ≤ Wo ≤ 1e4, each part of Γ_b within 1e-9.
 *
 * @param radius a [m]
 * @param enclosureRadius b &gt; a [m]
 * @param medium the medium in the gap
 */
public record ConfinedCylinder(double radius, double enclosureRadius, Medium medium) {
    /** Narrowest enclosure the law is tested for, b/a [-]. */
    public static final double NARROWEST = 1.01;

    /** @throws IllegalArgumentException if the radii are not positive and finite, or the enclosure is not the wider */
    public ConfinedCylinder {
        if (!(radius > 0.0) || !(enclosureRadius > radius) || Double.isInfinite(enclosureRadius)) {
            throw new IllegalArgumentException(
                    "needs 0 < radius < enclosureRadius [m], were " + radius + " and " + enclosureRadius);
        }
    }

    /**
     * Womersley number Wo = a √(ω/ν), on the radius of the cylinder.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return Wo [-]
     */
    public double womersley(double omega) {
        return radius * FastMath.sqrt(omega * medium.density() / medium.viscosity());
    }

    /**
     * Hydrodynamic function Γ_b; Re Γ_b is the added-mass coefficient, −Im Γ_b the damping, both positive.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return Γ_b [-]
     * @throws IllegalArgumentException if ω is not positive and finite
     */
    public Complex hydrodynamicFunction(double omega) {
        if (!(omega > 0.0) || Double.isInfinite(omega)) {
            throw new IllegalArgumentException("omega [rad/s] must be positive and finite, was " + omega);
        }
        double wo = womersley(omega);
        return ConfinedHydrodynamicFunction.of(new Complex(0.0, wo * wo), enclosureRadius / radius);
    }

    /**
     * Hydrodynamic function Γ_b for motion as e^{st}; equal to that at ω where s = iω. No cut: the gap's own modes lie on the
     * negative real axis, which is refused with 0.
     *
     * @param s growth rate [1/s], finite
     * @return Γ_b [-]
     * @throws IllegalArgumentException if s is 0, not finite or a negative real number
     */
    public Complex hydrodynamicFunction(Complex s) {
        if (s.isNaN() || s.isInfinite() || (s.getImaginary() == 0.0 && !(s.getReal() > 0.0))) {
            throw new IllegalArgumentException("s must be finite, not 0 and no negative real number, was " + s);
        }
        return ConfinedHydrodynamicFunction.of(
                s.multiply(radius * radius / medium.kinematicViscosity()), enclosureRadius / radius);
    }

    /**
     * Force of the medium on the moving cylinder, per unit length and per unit velocity of the cylinder.
     *
     * <p>F′/V = −iω ρ π a² Γ_b.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return F′/V [N·s/m²]; real part negative (damping), imaginary part −ω times the added mass per length
     * @throws IllegalArgumentException if ω is not positive and finite
     */
    public Complex forcePerVelocity(double omega) {
        Complex gamma = hydrodynamicFunction(omega);
        double rate = omega * medium.density() * FastMath.PI * radius * radius;
        return new Complex(gamma.getImaginary() * rate, -gamma.getReal() * rate);
    }
}
