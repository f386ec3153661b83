package flowshy.hair;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club.End;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

class CantileverValidationTest {
    private static final double LENGTH = 8.2e-4;
    private static final double RADIUS = 3.4e-5;
    private static final double MODULUS = 3.1e9;
    private static final double DENSITY = 1190.0;

    /** √(E I₀ / (ρ A₀ L⁴)) / 2π: unit of the coefficients. */
    private static final double UNIT =
            FastMath.sqrt(MODULUS * RADIUS * RADIUS / (4.0 * DENSITY)) / (LENGTH * LENGTH * 2.0 * FastMath.PI);

    /** Mass per length of the hair alone. */
    private static double ownMass(double radius) {
        return DENSITY * FastMath.PI * radius * radius;
    }

    /** First root of cos x cosh x = −1, 1.8751040687 (handbook digits). */
    @Test
    void uniformBeam() {
        double found =
                new Cantilever(new Cylinder(LENGTH, RADIUS), MODULUS).firstFrequency(CantileverValidationTest::ownMass);
        assertThat(found / (1.8751040687 * 1.8751040687 * UNIT)).isCloseTo(1.0, within(1e-6 / 8.0));
    }

    /**
     * Full cone: ω = 8.719 √(EI₀/ρA₀L⁴) (handbook, from memory). Independently: w = J₂(x)/x², I₂(x)/x² solve the equation of the
     * cone, clamped at the base they give J₂ I₃ + I₂ J₃ = 0 at x = 5.90568, and the coefficient is x²/4 (own derivation).
     */
    @Test
    void fullCone() {
        double x = firstZero();
        assertThat(x * x / 4.0).isCloseTo(8.719, within(5e-4));
        double found = new Cantilever(new Taper(LENGTH, RADIUS, 0.0), MODULUS)
                .firstFrequency(CantileverValidationTest::ownMass);
        assertThat(found / (x * x / 4.0 * UNIT)).isCloseTo(1.0, within(2e-6));
    }

    /** A stiff head on a massless stalk: two degrees of freedom, solved by hand; the head bends (1.5/20)⁴ as much. */
    @Test
    void heavyHeadOnALightStalk() {
        double thin = 1.5e-6;
        double thick = 2e-5;
        double stalk = 4e-4;
        double head = 1.6e-4;
        double load = 2.3e-6;
        Club club = new Club(stalk + head, thin, stalk, 0.0, thick, End.FLAT);
        double found = new Cantilever(club, MODULUS).firstFrequency(a -> a > thin ? load : 0.0);
        double bending = MODULUS * FastMath.PI * FastMath.pow(thin, 4) / 4.0;
        double k11 = 12.0 * bending / FastMath.pow(stalk, 3);
        double k12 = -6.0 * bending / (stalk * stalk);
        double k22 = 4.0 * bending / stalk;
        double m11 = load * head;
        double m12 = m11 * head / 2.0;
        double m22 = m11 * head * head / 3.0;
        // det(K − λM) = 0
        double a = m11 * m22 - m12 * m12;
        double b = -(k11 * m22 + k22 * m11 - 2.0 * k12 * m12);
        double c = k11 * k22 - k12 * k12;
        double least = 2.0 * c / (-b + FastMath.sqrt(b * b - 4.0 * a * c));
        assertThat(found / (FastMath.sqrt(least) / (2.0 * FastMath.PI))).isCloseTo(1.0, within(1e-4));
    }

    /** Cubic elements: the error of a frequency falls with the fourth power of their length, from above. */
    @Test
    void convergesWithTheFourthPower() {
        Cylinder beam = new Cylinder(LENGTH, RADIUS);
        double exact = 1.8751040687119611 * 1.8751040687119611 * UNIT;
        double two = new Cantilever(beam, MODULUS, 2).firstFrequency(CantileverValidationTest::ownMass) / exact - 1.0;
        double four = new Cantilever(beam, MODULUS, 4).firstFrequency(CantileverValidationTest::ownMass) / exact - 1.0;
        double eight = new Cantilever(beam, MODULUS, 8).firstFrequency(CantileverValidationTest::ownMass) / exact - 1.0;
        assertThat(two).isBetween(1e-5, 1e-3);
        assertThat(two / four).isBetween(14.0, 17.0);
        assertThat(four / eight).isBetween(15.0, 17.0);
        Taper taper = new Taper(LENGTH, RADIUS, 0.3 * RADIUS);
        double usual = new Cantilever(taper, MODULUS).firstFrequency(CantileverValidationTest::ownMass);
        double fine = new Cantilever(taper, MODULUS, 80).firstFrequency(CantileverValidationTest::ownMass);
        assertThat(usual / fine).isCloseTo(1.0, within(1e-7));
    }

    /** The same taper measured at 3 or 900 points is the same beam, and takes no longer than the elements it needs. */
    @Test
    void countsAMeasuredProfileAsTheBodyItDescribes() {
        double exact = new Cantilever(new Taper(LENGTH, RADIUS, 0.3 * RADIUS), MODULUS)
                .firstFrequency(CantileverValidationTest::ownMass);
        for (int pieces : new int[] {2, 23, 899}) {
            List<Double> heights = new ArrayList<>();
            List<Double> radii = new ArrayList<>();
            for (int i = 0; i <= pieces; i++) {
                double share = (double) i / pieces;
                heights.add(LENGTH * share);
                radii.add(RADIUS * (1.0 - 0.7 * share));
            }
            double found = new Cantilever(new MeasuredProfile(heights, radii), MODULUS)
                    .firstFrequency(CantileverValidationTest::ownMass);
            assertThat(found / exact).as("%d pieces", pieces).isCloseTo(1.0, within(1e-7));
        }
    }

    /** Frequency ∝ √E, and ∝ d/L². */
    @Test
    void scales() {
        double found = new Cantilever(new Taper(LENGTH, RADIUS, 0.0), MODULUS)
                .firstFrequency(CantileverValidationTest::ownMass);
        double stiffer = new Cantilever(new Taper(LENGTH, RADIUS, 0.0), 4.0 * MODULUS)
                .firstFrequency(CantileverValidationTest::ownMass);
        double longer = new Cantilever(new Taper(2.0 * LENGTH, RADIUS, 0.0), MODULUS)
                .firstFrequency(CantileverValidationTest::ownMass);
        double thicker = new Cantilever(new Taper(LENGTH, 1.5 * RADIUS, 0.0), MODULUS)
                .firstFrequency(CantileverValidationTest::ownMass);
        assertThat(stiffer / found).isCloseTo(2.0, within(1e-8));
        assertThat(longer / found).isCloseTo(0.25, within(1e-8));
        assertThat(thicker / found).isCloseTo(1.5, within(1e-8));
    }

    /** ∫ dz/(EI): of a cylinder 0.9 L/EI; of a frustum by hand, ∫ a⁻⁴ dz = (a₁⁻³ − a₀⁻³)/(3 · slope). */
    @Test
    void stiffnessAgainstATurnAtTheFoot() {
        double cylinder = Cantilever.stiffness(new Cylinder(LENGTH, RADIUS), MODULUS);
        double bending = MODULUS * FastMath.PI * FastMath.pow(RADIUS, 4) / 4.0;
        assertThat(cylinder / (bending / (0.9 * LENGTH))).isCloseTo(1.0, within(1e-13));
        double cone = Cantilever.stiffness(new Taper(LENGTH, RADIUS, 0.0), MODULUS);
        // radius at 0.9 L is a tenth: ∫ = L (10³ − 1)/(3 a⁴)
        assertThat(cone / (bending / (LENGTH * 333.0))).isCloseTo(1.0, within(1e-4));
    }

    /** By the power series of J and I, bisected; the left side falls through zero between 5 and 6.5. */
    private static double firstZero() {
        double low = 5.0;
        double high = 6.5;
        for (int i = 0; i < 60; i++) {
            double middle = 0.5 * (low + high);
            double value =
                    series(2, middle, -1.0) * series(3, middle, 1.0) + series(2, middle, 1.0) * series(3, middle, -1.0);
            if (value > 0.0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return 0.5 * (low + high);
    }

    /** J_n (sign −1) or I_n (sign +1): Σ sign^k (x/2)^(2k+n) / (k! (k+n)!). */
    private static double series(int order, double x, double sign) {
        double term = 1.0;
        for (int k = 1; k <= order; k++) {
            term *= 0.5 * x / k;
        }
        double sum = term;
        for (int k = 1; k < 60; k++) {
            term *= sign * 0.25 * x * x / (k * (k + order));
            sum += term;
        }
        return sum;
    }
}
