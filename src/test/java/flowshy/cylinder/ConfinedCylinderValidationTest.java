package flowshy.cylinder;

import static flowshy.math.ReferenceTable.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.BesselI;
import flowshy.math.BesselK;
import flowshy.math.ReferenceTable;
import flowshy.medium.Medium;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.hipparchus.complex.ComplexField;
import org.hipparchus.linear.Array2DRowFieldMatrix;
import org.hipparchus.linear.ArrayFieldVector;
import org.hipparchus.linear.FieldLUDecomposition;
import org.hipparchus.linear.FieldMatrix;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ConfinedCylinderValidationTest {
    private static final Medium UNIT = Medium.of("unit", 1.0, 1.0);

    private static Complex gamma(double ratio, double wo) {
        return new ConfinedCylinder(1.0, ratio, UNIT).hydrodynamicFunction(wo * wo);
    }

    @Test
    void agreesWithArbitraryPrecisionInBothParts() {
        ReferenceTable table = ReferenceTable.of(getClass(), "confined-cylinder.csv");
        assertThat(table.rows()).hasSize(130);
        for (Map<String, String> row : table.rows()) {
            Complex value = gamma(number(row, "ratio"), number(row, "womersley"));
            assertThat(value.getReal() / number(row, "gamma_re")).as("%s", row).isCloseTo(1.0, within(2e-12));
            assertThat(value.getImaginary() / number(row, "gamma_im"))
                    .as("%s", row)
                    .isCloseTo(1.0, within(2e-12));
        }
    }

    /** Where the closed form takes over from the series, |λ|(β−1) = 2, the two agree. */
    @ParameterizedTest
    @ValueSource(doubles = {1.001, 1.01, 1.1, 1.5, 2.0, 4.0, 30.0, 1000.0, 1e4})
    void hasNoStepWhereTheMethodChanges(double ratio) {
        double wo = 2.0 / (ratio - 1.0);
        Complex below = gamma(ratio, wo * (1.0 - 1e-13));
        Complex above = gamma(ratio, wo * (1.0 + 1e-13));
        assertThat(above.getReal() / below.getReal()).isCloseTo(1.0, within(1e-10));
        assertThat(above.getImaginary() / below.getImaginary()).isCloseTo(1.0, within(1e-10));
    }

    /** Without viscosity the added mass is (β²+1)/(β²−1), a textbook result of potential flow. */
    @ParameterizedTest
    @ValueSource(doubles = {1.1, 2.0, 10.0})
    void tendsToPotentialFlow(double ratio) {
        double square = ratio * ratio;
        double potential = (square + 1.0) / (square - 1.0);
        // the layers on both walls add a share of the order δ over the gap
        assertThat(gamma(ratio, 1e7).getReal() / potential).isCloseTo(1.0, within(1e-5));
    }

    /** Steady limit, solved by hand from the biharmonic equation: f = 4πμV/[ln β − (β²−1)/(β²+1)]. */
    @ParameterizedTest
    @ValueSource(doubles = {1.05, 1.5, 5.0, 100.0})
    void tendsToTheSteadyResistance(double ratio) {
        double square = ratio * ratio;
        double resistance = 4.0 * FastMath.PI / (FastMath.log(ratio) - (square - 1.0) / (square + 1.0));
        Complex force = new ConfinedCylinder(1.0, ratio, UNIT).forcePerVelocity(1e-10);
        assertThat(-force.getReal() / resistance).isCloseTo(1.0, within(1e-6));
    }

    /** Lubrication: 12πμV/(β−1)³ at leading order; the next is of the order β − 1. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-2, 1e-3})
    void tendsToLubricationInANarrowGap(double gap) {
        Complex force = new ConfinedCylinder(1.0, 1.0 + gap, UNIT).forcePerVelocity(1e-6);
        double lubrication = 12.0 * FastMath.PI / (gap * gap * gap);
        assertThat(-force.getReal() / lubrication).isCloseTo(1.0, within(2.0 * gap));
    }

    /**
     * An enclosure far beyond the layer leaves the unbounded cylinder and the image of its dipole (1 + Γ)/2 in the wall, which
     * adds (1 + Γ)²/(2β²) (own, first order in β^-2; the wall's layer is the rest, of the order δ/b).
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.1, 1.0, 10.0})
    void tendsToTheUnboundedCylinder(double wo) {
        double ratio = 1e4;
        Complex unbounded = HydrodynamicFunction.of(wo);
        Complex image = unbounded.add(1.0).multiply(unbounded.add(1.0)).divide(2.0 * ratio * ratio);
        Complex difference = gamma(ratio, wo).subtract(unbounded);
        assertThat(difference.subtract(image).norm() / image.norm()).isCloseTo(0.0, within(1e-3 / wo));
    }

    /** Two values computed before this code (own, printed to eight digits). */
    @ParameterizedTest
    @CsvSource({"5, 3.2831579, -6.2680488", "50, 3.9685257, -4.5759342"})
    void agreesWithEarlierValues(double ratio, double real, double imaginary) {
        assertThat(gamma(ratio, 1.0).getReal()).isCloseTo(real, within(5.1e-8));
        assertThat(gamma(ratio, 1.0).getImaginary()).isCloseTo(imaginary, within(5.1e-8));
    }

    /** For complex growth rates: the four conditions solved as they stand by Gaussian elimination. */
    @ParameterizedTest
    @CsvSource({"1.5, 3.0, 0", "1.5, 6.0, 60", "3, 0.8, 84", "3, 2.0, 30", "10, 0.1, 70", "10, 1.0, -80"})
    void agreesWithTheSolvedSystemForComplexGrowthRates(double ratio, double modulus, double degrees) {
        double angle = FastMath.toRadians(degrees);
        Complex lambda = new Complex(modulus * FastMath.cos(angle), modulus * FastMath.sin(angle));
        Complex value = new ConfinedCylinder(1.0, ratio, UNIT).hydrodynamicFunction(lambda.multiply(lambda));
        Complex expected = solved(lambda, ratio);
        assertThat(value.subtract(expected).norm() / expected.norm()).isCloseTo(0.0, within(1e-9));
    }

    @ParameterizedTest
    @CsvSource({"1.3, 1e-3", "1.3, 20", "50, 1e-5", "50, 3"})
    void agreesOnTheImaginaryAxisOfTheGrowthRate(double ratio, double wo) {
        ConfinedCylinder cylinder = new ConfinedCylinder(2.0, 2.0 * ratio, Medium.of("test", 1.5, 3.0));
        // ν = 2, a = 2: Wo² = 2 ω
        double omega = 0.5 * wo * wo;
        assertThat(cylinder.womersley(omega)).isCloseTo(wo, within(1e-14 * wo));
        Complex steady = cylinder.hydrodynamicFunction(omega);
        Complex general = cylinder.hydrodynamicFunction(new Complex(0.0, omega));
        assertThat(general.subtract(steady).norm() / steady.norm()).isCloseTo(0.0, within(1e-13));
        double rate = omega * 1.5 * FastMath.PI * 4.0;
        Complex force = cylinder.forcePerVelocity(omega);
        assertThat(force.getReal()).isCloseTo(steady.getImaginary() * rate, within(1e-13 * force.norm()));
        assertThat(force.getImaginary()).isCloseTo(-steady.getReal() * rate, within(1e-13 * force.norm()));
    }

    /** A nearer wall resists more and adds more mass, and the medium takes power out at every frequency. */
    @Test
    void growsAsTheEnclosureCloses() {
        for (double wo : new double[] {1e-4, 0.1, 1.0, 10.0, 1000.0}) {
            Complex before = HydrodynamicFunction.of(wo);
            for (double ratio : new double[] {100.0, 20.0, 5.0, 2.0, 1.3, 1.05}) {
                Complex now = gamma(ratio, wo);
                assertThat(-now.getImaginary()).isGreaterThan(-before.getImaginary() * (1.0 - 1e-3));
                assertThat(now.getReal()).isGreaterThan(1.0);
                before = now;
            }
        }
    }

    @Test
    void refusesWhatIsNoGapOrFrequency() {
        assertThatThrownBy(() -> new ConfinedCylinder(1.0, 1.0, UNIT)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new ConfinedCylinder(Double.NaN, 1.0, UNIT))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new ConfinedCylinder(1.0, Double.POSITIVE_INFINITY, UNIT))
                .isInstanceOf(IllegalArgumentException.class);
        ConfinedCylinder cylinder = new ConfinedCylinder(1.0, 2.0, UNIT);
        assertThatThrownBy(() -> cylinder.hydrodynamicFunction(0.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> cylinder.hydrodynamicFunction(Double.NaN))
                .isInstanceOf(IllegalArgumentException.class);
        Complex modes = new Complex(-2.0, 0.0);
        assertThatThrownBy(() -> cylinder.hydrodynamicFunction(modes)).isInstanceOf(IllegalArgumentException.class);
    }

    private static Complex solved(Complex z, double q) {
        Complex[][] rows = new Complex[4][];
        rows[0] = row(z, 1.0, false);
        rows[1] = row(z, 1.0, true);
        rows[2] = row(z, q, false);
        rows[3] = row(z, q, true);
        FieldMatrix<Complex> system = new Array2DRowFieldMatrix<>(ComplexField.getInstance(), rows);
        ArrayFieldVector<Complex> right = new ArrayFieldVector<>(
                ComplexField.getInstance(), new Complex[] {Complex.ONE, Complex.ONE, Complex.ZERO, Complex.ZERO});
        Complex a = new FieldLUDecomposition<>(system).getSolver().solve(right).getEntry(0);
        return a.multiply(2.0).subtract(1.0);
    }

    /** ψ or ψ′ of 1/r, r, K₁(zr), I₁(zr) at r. */
    private static Complex[] row(Complex z, double r, boolean slope) {
        Complex x = z.multiply(r);
        Complex up = x.exp();
        Complex k1 = BesselK.scaledK1(x).divide(up);
        Complex i1 = BesselI.of(x).i1().multiply(up);
        if (!slope) {
            return new Complex[] {new Complex(1.0 / r), new Complex(r), k1, i1};
        }
        Complex k0 = BesselK.scaledK0(x).divide(up);
        Complex i0 = BesselI.of(x).i0().multiply(up);
        return new Complex[] {
            new Complex(-1.0 / (r * r)),
            Complex.ONE,
            k0.add(k1.divide(x)).multiply(z).negate(),
            i0.subtract(i1.divide(x)).multiply(z)
        };
    }
}
