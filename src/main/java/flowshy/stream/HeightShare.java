package flowshy.stream;

import org.hipparchus.complex.Complex;

/** Fluctuation at a height over that of the free stream, at one frequency. Time factor e^{+iωt}. */
@FunctionalInterface
public interface HeightShare {
    /**
     * The share at a height.
     *
     * @param height z above the wall [m], zero or more
     * @return s [-]
     */
    Complex at(double height);
}
