package flowshy.cylinder;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.BesselK;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * First-order slip against the flow itself. No published unsteady form was found, so the reference is the boundary system,
 * solved here: ψ = f(r) sin θ, f = A/r + C K₁(λr) in units of radius and velocity, u_r = f/r cos θ, u_θ = −f′ sin θ.
 */
class SlipValidationTest {
    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.2, 1.0, 2.0, 10.0, 300.0})
    void agreesWithTheSolvedBoundarySystem(double wo) {
        for (double slip : new double[] {0.0, 1e-3, 0.01, 0.05, 0.1, 0.5}) {
            Complex expected = solved(diagonal(wo), slip);
            Complex gamma = HydrodynamicFunction.of(wo, slip);
            assertThat(gamma.subtract(expected).norm() / expected.norm())
                    .as("Wo = %s, l = %s", wo, slip)
                    .isCloseTo(0.0, within(1e-12));
        }
    }

    /** Off the imaginary axis of the growth rate, as far as an overdamped oscillation goes. */
    @ParameterizedTest
    @CsvSource({"0.5, 0.0", "0.5, 20.0", "2.0, 70.0", "2.0, 84.0", "9.0, -60.0"})
    void agreesForComplexGrowthRates(double modulus, double degrees) {
        double angle = FastMath.toRadians(degrees);
        Complex lambda = new Complex(modulus * FastMath.cos(angle), modulus * FastMath.sin(angle));
        for (double slip : new double[] {0.0, 0.03, 0.1}) {
            Complex expected = solved(lambda, slip);
            assertThat(HydrodynamicFunction.of(lambda, slip).subtract(expected).norm() / expected.norm())
                    .isCloseTo(0.0, within(1e-12));
        }
    }

    /** What slip does at first order, against the difference of two solved systems. */
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.5, 2.0, 20.0})
    void startsWithTheSlopeOfTheSolvedSystem(double wo) {
        double small = 1e-6;
        Complex slope = HydrodynamicFunction.of(wo, small)
                .subtract(HydrodynamicFunction.of(wo))
                .divide(small);
        Complex expected = solved(diagonal(wo), 2e-4)
                .subtract(solved(diagonal(wo), 1e-4).multiply(4.0))
                .add(solved(diagonal(wo), 0.0).multiply(3.0))
                .divide(-2e-4);
        assertThat(slope.subtract(expected).norm() / expected.norm()).isCloseTo(0.0, within(1e-4));
    }

    /** k and k' of check values computed before this code (own derivation, printed to six digits). */
    @ParameterizedTest
    @CsvSource({
        "0.1, 0.01, 19.5224, 48.4329",
        "0.1, 0.05, 18.8982, 47.7270",
        "0.1, 0.1, 18.2675, 46.9944",
        "1.0, 0.01, 2.38770, 1.86105",
        "1.0, 0.05, 2.21777, 1.80176",
        "1.0, 0.1, 2.06515, 1.73264"
    })
    void agreesWithEarlierValues(double m, double slip, double addedMass, double damping) {
        Complex gamma = HydrodynamicFunction.of(2.0 * m, slip);
        assertThat(gamma.getReal()).isCloseTo(addedMass, within(6e-6 * addedMass));
        assertThat(-gamma.getImaginary()).isCloseTo(damping, within(6e-6 * damping));
    }

    /** A thin hair's drag 4πμV/(−L) becomes 4πμV/(−L + l/(1+2l)), the steady form with slip (Oseen matching, own). */
    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.05, 0.1})
    void tendsToSteadySlipDragForThinHairs(double slip) {
        double wo = 1e-5;
        Complex resistance = new Complex(-FastMath.log(0.5 * wo) - BesselK.EULER_GAMMA, -0.25 * FastMath.PI)
                .add(slip / (1.0 + 2.0 * slip));
        Complex expected = new Complex(0.0, -4.0 / (wo * wo)).divide(resistance);
        Complex excess = HydrodynamicFunction.excess(wo, slip);
        assertThat(excess.subtract(expected).norm() / expected.norm()).isCloseTo(0.0, within(1e-8));
    }

    /** Perfect slip leaves the shear-free surface: f″ − f′ + f = 0 at r = 1. */
    @Test
    void tendsToAShearFreeSurface() {
        Complex gamma = HydrodynamicFunction.of(2.0, 1e12);
        Complex expected = solved(diagonal(2.0), 1e12);
        assertThat(gamma.subtract(expected).norm() / expected.norm()).isCloseTo(0.0, within(1e-9));
        assertThat(gamma.norm()).isLessThan(HydrodynamicFunction.of(2.0).norm());
    }

    private static Complex diagonal(double wo) {
        return new Complex(wo * FastMath.sqrt(0.5), wo * FastMath.sqrt(0.5));
    }

    /**
     * Solves f = 1 and 1 − f′ = −l (f″ − f′ + f) at r = 1 for A and C by Cramer's rule, then integrates the stress over the
     * surface: F = π [−λ² A + 2(f′ − f) + f″ − f′ + f], the terms being pressure, normal and shear stress; Γ = −F/(πλ²).
     */
    private static Complex solved(Complex lambda, double slip) {
        Complex k = BesselK.scaledK1(lambda);
        // K₁′ = −K₀ − K₁/λ and K₁″ = (1 + 2/λ²) K₁ + K₀/λ, times powers of λ
        Complex kSlope = BesselK.scaledK0(lambda).multiply(lambda).add(k).negate();
        Complex kCurve = lambda.multiply(lambda)
                .add(2.0)
                .multiply(k)
                .add(BesselK.scaledK0(lambda).multiply(lambda));
        // columns A (f, f′, f″ = 1, −1, 2) and C (k, kSlope, kCurve); second row f′ − l (f″ − f′ + f) = 1
        Complex rowA = new Complex(-1.0 - 4.0 * slip);
        Complex rowC = kSlope.subtract(kCurve.subtract(kSlope).add(k).multiply(slip));
        Complex determinant = rowC.subtract(k.multiply(rowA));
        Complex a = rowC.subtract(k).divide(determinant);
        Complex c = Complex.ONE.subtract(rowA).divide(determinant);
        Complex f = a.add(c.multiply(k));
        Complex slope = c.multiply(kSlope).subtract(a);
        Complex curve = a.multiply(2.0).add(c.multiply(kCurve));
        Complex square = lambda.multiply(lambda);
        return square.multiply(a)
                .subtract(slope.subtract(f).multiply(2.0))
                .subtract(curve.subtract(slope).add(f))
                .divide(square);
    }
}
