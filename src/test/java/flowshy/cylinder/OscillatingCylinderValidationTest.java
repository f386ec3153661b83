package flowshy.cylinder;

import static flowshy.math.ReferenceTable.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.BesselK;
import flowshy.math.ReferenceTable;
import flowshy.medium.Medium;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class OscillatingCylinderValidationTest {
    /** a = ν = ρ = 1, so ω is Wo². */
    private static final OscillatingCylinder UNIT = new OscillatingCylinder(1.0, Medium.of("unit", 1.0, 1.0));

    @Test
    void agreesWithArbitraryPrecisionInBothParts() {
        ReferenceTable table = ReferenceTable.of(getClass(), "oscillating-cylinder.csv");
        assertThat(table.rows()).hasSize(286);
        for (Map<String, String> row : table.rows()) {
            double wo = number(row, "womersley");
            Complex excess = HydrodynamicFunction.excess(wo, 0.0);
            assertThat(excess.getReal() / number(row, "excess_re"))
                    .as("Wo = %s", wo)
                    .isCloseTo(1.0, within(1e-13));
            assertThat(excess.getImaginary() / number(row, "excess_im"))
                    .as("Wo = %s", wo)
                    .isCloseTo(1.0, within(1e-13));
            assertThat(HydrodynamicFunction.of(wo)).isEqualTo(excess.add(1.0));
        }
    }

    /** Stokes's own table to 0.75 of its last digit: he computed by hand from series. Four numbers are known to be wrong. */
    @Test
    void agreesWithTheTableOf1851() {
        ReferenceTable table = ReferenceTable.of(getClass(), "stokes-1851.csv");
        assertThat(table.rows()).hasSize(34);
        List<String> off = new ArrayList<>();
        for (Map<String, String> row : table.rows()) {
            double m = number(row, "m");
            Complex gamma = UNIT.hydrodynamicFunction(4.0 * m * m);
            compare(gamma.getReal(), row, "k", off);
            compare(-gamma.getImaginary(), row, "k_prime", off);
        }
        assertThat(off).containsExactly("m=0.6 k", "m=0.6 k_prime", "m=1.1 k_prime", "m=1.3 k");
    }

    /** The misprint of k' at m = 1.1 shows in his own next column, m² k' = 2.021. */
    @Test
    void agreesWithTheColumnThatShowsTheMisprint() {
        double damping = -UNIT.hydrodynamicFunction(4.0 * 1.1 * 1.1).getImaginary();
        assertThat(1.1 * 1.1 * damping).isCloseTo(2.021, within(0.00125));
    }

    private static void compare(double value, Map<String, String> row, String column, List<String> off) {
        BigDecimal printed = new BigDecimal(row.get(column));
        double error = FastMath.abs(value - printed.doubleValue());
        if (error > 0.75 * printed.ulp().doubleValue()) {
            off.add("m=" + row.get("m") + " " + column);
        }
        // wrong or not, no printed number is off by more than 0.6 %
        assertThat(error).isLessThan(0.006 * value);
    }

    /** Stokes series for a thin boundary layer, three terms kept, so the rest is about 1/(2 Wo³). Expanded by hand. */
    @Test
    void tendsToTheSeriesOfAThinBoundaryLayer() {
        double wo = 100.0;
        Complex gamma = UNIT.hydrodynamicFunction(wo * wo);
        double rest = 0.6 / (wo * wo * wo);
        assertThat(gamma.getReal()).isCloseTo(1.0 + 2.0 * FastMath.sqrt(2.0) / wo, within(rest));
        assertThat(-gamma.getImaginary()).isCloseTo(2.0 * FastMath.sqrt(2.0) / wo + 2.0 / (wo * wo), within(rest));
    }

    /** Thin hair: the drag is 4πμV/(−L), L = ln(λ/2) + γ_E; the next term is of the order Wo² ln(1/Wo). */
    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 1e-4, 1e-3})
    void tendsToTheLogarithmicDragOfAThinHair(double wo) {
        Complex minusL = new Complex(-FastMath.log(0.5 * wo) - BesselK.EULER_GAMMA, -0.25 * FastMath.PI);
        Complex drag = minusL.reciprocal().multiply(4.0 * FastMath.PI);
        Complex force = UNIT.forcePerVelocity(wo * wo).negate();
        assertThat(force.subtract(drag).norm() / drag.norm()).isCloseTo(0.0, within(wo * wo * FastMath.log(10.0 / wo)));
    }

    /** Far from the layer nothing is left but the displaced fluid. */
    @Test
    void tendsToThePotentialFlowOfAnInviscidFluid() {
        assertThat(UNIT.hydrodynamicFunction(1e8).getReal()).isCloseTo(1.0, within(3e-4));
        Complex stream = UNIT.streamForcePerVelocity(1e12, Complex.ONE).divide(1e12 * FastMath.PI);
        assertThat(stream.getImaginary()).isCloseTo(2.0, within(3e-6));
    }

    /**
     * Morison coefficients of small oscillation, Cm = 1 + Re Γ and Cd KC = −(3π³/8) Im Γ at β = 2 Wo²/π, against Wang 1968 in
     * the form of Bearman et al. 1985 (from memory); the tolerance is the size of the first dropped term, (πβ)^-2.
     */
    @ParameterizedTest
    @CsvSource({
        "10, 2.7193287, 9.7122653",
        "50, 2.3196618, 4.0010964",
        "100, 2.2258554, 2.7699687",
        "400, 2.1128604, 1.3487564",
        "1000, 2.0713706, 0.84452406",
        "10000, 2.0225678, 0.26387963"
    })
    void givesTheMorisonCoefficientsOfSmallExcursions(double beta, double inertia, double dragTimesKc) {
        Complex gamma = UNIT.hydrodynamicFunction(0.5 * FastMath.PI * beta);
        double cube = FastMath.PI * FastMath.PI * FastMath.PI;
        double dropped = FastMath.pow(FastMath.PI * beta, -2.0);
        assertThat(1.0 + gamma.getReal()).isCloseTo(inertia, within(2.0 * dropped + 6e-8));
        assertThat(-3.0 * cube / 8.0 * gamma.getImaginary()).isCloseTo(dragTimesKc, within(4.0 * dropped + 6e-8));
    }

    /** The growth rate s = iω gives the steady oscillation: general routine against polynomials. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 0.01, 0.5, 1.0, 3.0, 30.0, 1000.0})
    void agreesOnTheImaginaryAxisOfTheGrowthRate(double wo) {
        Complex steady = UNIT.hydrodynamicFunction(wo * wo);
        Complex general = UNIT.hydrodynamicFunction(new Complex(0.0, wo * wo));
        assertThat(general.subtract(steady).norm() / steady.norm()).isCloseTo(0.0, within(1e-14));
    }
}
