package flowshy.torque;

import flowshy.cylinder.ConfinedCylinder;
import flowshy.cylinder.OscillatingCylinder;
import flowshy.medium.Medium;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;

/**
 * Law for the fluid that the hair's own turning moves: in open fluid, or between hair and the wall of a cavity.
 *
 * @param cavityRadius b [m], absent in open fluid
 * @param medium around the hair
 */
record Confinement(OptionalDouble cavityRadius, Medium medium) {
    /**
     * Hydrodynamic function of a strip at a real frequency.
     *
     * @param radius a, below the cavity's [m]
     * @param omega [rad/s]
     * @param open the function in open fluid, known already
     * @return Γ, or Γ_b
     */
    Complex function(double radius, double omega, Complex open) {
        return cavityRadius.isPresent()
                ? new ConfinedCylinder(radius, cavityRadius.getAsDouble(), medium).hydrodynamicFunction(omega)
                : open;
    }

    /**
     * Hydrodynamic function of a strip at a complex frequency.
     *
     * @param radius a [m]
     * @param s complex frequency [1/s]
     * @return Γ, or Γ_b
     */
    Complex function(double radius, Complex s) {
        return cavityRadius.isPresent()
                ? new ConfinedCylinder(radius, cavityRadius.getAsDouble(), medium).hydrodynamicFunction(s)
                : new OscillatingCylinder(radius, medium).hydrodynamicFunction(s);
    }
}
