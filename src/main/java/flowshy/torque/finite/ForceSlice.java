package flowshy.torque.finite;

import org.hipparchus.complex.Complex;

/**
 * Force along x on the surface between two heights, as the solver and as strip theory have it. The slices of a hair add up to
 * the whole force. On a flat tip both heights are the length.
 *
 * @param bottom lower height [m]
 * @param top upper height, equal to the lower on a flat face [m]
 * @param stream force per unit velocity of the free stream [N per m/s]
 * @param rocking force per unit angular velocity [N per rad/s]
 * @param stripStream the first by strip theory
 * @param stripRocking the second by strip theory
 */
public record ForceSlice(
        double bottom, double top, Complex stream, Complex rocking, Complex stripStream, Complex stripRocking) {
    /**
     * Extent along the hair.
     *
     * @return [m], zero on a flat face, where a force per length would be infinite
     */
    public double length() {
        return top - bottom;
    }
}
