package flowshy.stream;

import org.hipparchus.complex.Complex;

/** Oscillating flow near a wall, as a share of the free stream that drives it. Time factor e^{+iωt}. */
public interface WallShare {
    /**
     * Velocity at a height over that of the free stream.
     *
     * @param height z above the wall [m], zero or more
     * @param omega angular frequency [rad/s]
     * @return s(z) [-]
     */
    Complex share(double height, double omega);
}
