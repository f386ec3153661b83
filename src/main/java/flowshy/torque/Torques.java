package flowshy.torque;

import org.hipparchus.complex.Complex;

/**
 * Torques about the pivot at one frequency, strip theory. Time factor e^{+iωt}; per unit acceleration [N·m per m/s²].
 *
 * <p>The three integrals {@code flow}, {@code open} and {@code carried} are evaluated apart; open = carried − flow is an
 * identity that the tests hold them to.
 *
 * @param omega angular frequency [rad/s]
 * @param flow still base, moving fluid: ρ P[1 + Γ s]
 * @param open shaken base, fluid still far away: −P[ρ_h + ρ Γ s]
 * @param carried shaken base, fluid carried along: −(ρ_h − ρ) P[1]
 * @param fluidInertia inertia and damping of the fluid on the hair's own turning: ρ ∫ πa² Γ ℓ² dz [kg·m²]
 */
public record Torques(double omega, Complex flow, Complex open, double carried, Complex fluidInertia) {
    /**
     * Torque of a shaking base under a cover that lets a share of the flow in.
     *
     * @param factor φ, free stream under the cover over that outside: 1 open, 0 sealed [-]
     * @return carried + φ (open − carried), torque per unit acceleration of the base [N·m per m/s²]
     */
    public Complex motion(Complex factor) {
        return factor.equals(Complex.ONE)
                ? open
                : open.subtract(carried).multiply(factor).add(carried);
    }

    /**
     * Torque of a moving fluid outside such a cover.
     *
     * @param factor φ [-]
     * @return φ times the flow's torque, per unit acceleration of the fluid outside [N·m per m/s²]
     */
    public Complex flow(Complex factor) {
        return flow.multiply(factor);
    }
}
