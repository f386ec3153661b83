package flowshy.torque.finite;

import org.hipparchus.complex.Complex;

/**
 * Torques on a finite hair over those of strip theory without slip, at one frequency. Slip, where it counts, stays in the strips
 * that the factors multiply.
 *
 * @param stream factor of the torque of a stream along the wall, still hair and wall [-]
 * @param rocking factor of the torque on the turning hair, and so of the fluid's inertia and damping [-]
 * @param streamError error of the first, relative [-]
 * @param rockingError error of the second, relative [-]
 */
public record FiniteFactors(Complex stream, Complex rocking, double streamError, double rockingError) {}
