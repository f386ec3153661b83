package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.medium.Medium;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FootGapValidationTest {
    /**
     * Side that moves along itself past a wall at right angles: Taylor's scraper (1962), own evaluation for 90°: shear
     * 4π/(π²−4) μV/z on the side, V = Ωa cos φ. So the torque grows by 4π²/(π²−4) μa³ for each factor e by which the gap shrinks.
     */
    @ParameterizedTest
    @CsvSource({"1, 0.5, 0.01", "1, 4, 0.01", "2, 4, 0.01", "5, 10, 0.02"})
    void growsAsTheLogarithmOfTheGap(double slenderness, double delta, double tolerance) {
        double wide = turning(slenderness, delta, 0.02).getReal();
        double narrow = turning(slenderness, delta, 0.01).getReal();
        double slope = 4.0 * FastMath.PI * FastMath.PI / (FastMath.PI * FastMath.PI - 4.0);
        assertThat((wide - narrow) / FastMath.log(2.0)).isCloseTo(slope, within(tolerance * slope));
    }

    /** How much a factor of ten in the gap matters, as the documentation says: posts much, slender hairs not. */
    @ParameterizedTest
    @CsvSource({"1, 0.10, 0.16", "10, 3e-4, 1e-3"})
    void mattersForBluntPosts(double slenderness, double least, double most) {
        double wide = turning(slenderness, 4.0, 0.1).norm();
        double narrow = turning(slenderness, 4.0, 0.01).norm();
        assertThat(narrow / wide - 1.0).isBetween(least, most);
    }

    private static Complex turning(double slenderness, double delta, double gap) {
        Medium medium = Medium.of("unit", 1.0, 1.0);
        Cylinder post = new Cylinder(2.0 * slenderness, 1.0);
        return new FiniteHair(post, medium, 0.0, gap)
                .at(2.0 / (delta * delta))
                .rocking()
                .torque();
    }
}
