package flowshy.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.medium.Medium;
import flowshy.stream.cover.Covers;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

/**
 * How the rejection of a cylinder grows with its diameter, its length and its density, where closed forms say so. With |T_open| =
 * |P[ρ_h + ρ Γ s]| and |T_flow| = ρ |P[1 + Γ s]| (strip theory) each limit is expanded by hand; d ln R / d ln x is the exponent of x in the
 * ratio R itself, not in decibels. No published exponents are known to us: independent derivation.
 */
class RejectionScalingValidationTest {
    private static final double OMEGA = 2.0 * FastMath.PI * 1000.0;

    /** γ, Abramowitz &amp; Stegun 1964, 6.1.3. */
    private static final double EULER = 0.5772156649015329;

    private static final double STEP = 1e-3;

    /** A cylinder by length [m], diameter [m] and density [kg/m³]. */
    private record Rod(double length, double diameter, double density) {
        /** Rejection in a fluid, as a ratio. */
        double ratio(Medium fluid) {
            Device device = new Device(
                    Devices.hair(new Cylinder(length, 0.5 * diameter), density),
                    Optional.empty(),
                    fluid,
                    Covers.OPEN,
                    fluid);
            return FastMath.pow(10.0, new Response(device).rejection(OMEGA / (2.0 * FastMath.PI)) / 20.0);
        }

        private Rod by(double length, double diameter, double density) {
            return new Rod(this.length * length, this.diameter * diameter, this.density * density);
        }

        double ofLength(Medium fluid) {
            return exponent(by(1.0 + STEP, 1.0, 1.0), by(1.0 - STEP, 1.0, 1.0), fluid);
        }

        double ofDiameter(Medium fluid) {
            return exponent(by(1.0, 1.0 + STEP, 1.0), by(1.0, 1.0 - STEP, 1.0), fluid);
        }

        double ofDensity(Medium fluid) {
            return exponent(by(1.0, 1.0, 1.0 + STEP), by(1.0, 1.0, 1.0 - STEP), fluid);
        }

        private static double exponent(Rod more, Rod less, Medium fluid) {
            return FastMath.log(more.ratio(fluid) / less.ratio(fluid)) / FastMath.log((1.0 + STEP) / (1.0 - STEP));
        }
    }

    private static Medium fluid(double density, double kinematicViscosity) {
        return Medium.of("fluid", density, density * kinematicViscosity);
    }

    /** a ≫ δ, L ≫ δ: Γ → 1 and s → 1, so R = (ρ_h + ρ)/(2ρ). What is dropped is δ/a = 1e-4. */
    @Test
    void ofAThickHairOnItsDensityAlone() {
        Medium fluid = fluid(1000.0, 1e-13);
        Rod rod = new Rod(1e-3, 1e-4, 1200.0);
        assertThat(rod.ratio(fluid)).isCloseTo(1.1, within(5e-4));
        assertThat(rod.ofDensity(fluid)).isCloseTo(1200.0 / 2200.0, within(5e-4));
        assertThat(rod.ofDiameter(fluid)).isCloseTo(0.0, within(5e-4));
        assertThat(rod.ofLength(fluid)).isCloseTo(0.0, within(1e-4));
    }

    /**
     * a ≪ δ ≪ L in a gas too thin to move the hair, ρ|Γ| ≪ ρ_h ≪ 1e9 ρ: Γ → 4/(λ² D) with D = -ln(λ/2) - γ, so R = ρ_h |λ² D| / (4ρ). As
     * |λ² D| goes with a: exponent 2 - Re(1/D) in the diameter, 1 in the density, none in the length. What is dropped is (δ/L)² = 5e-5.
     */
    @Test
    void ofAThinLongHairOnItsDragAlone() {
        Medium fluid = fluid(1e-6, 1.5e-5);
        Rod rod = new Rod(1e-2, 2e-7, 1200.0);
        Complex lambda = lambda(rod, 1.5e-5);
        Complex log = lambda.multiply(0.5).log().negate().subtract(EULER);
        double ratio = 1200.0 * lambda.multiply(lambda).multiply(log).norm() / (4.0 * 1e-6);
        assertThat(rod.ratio(fluid) / ratio).isCloseTo(1.0, within(3e-4));
        assertThat(rod.ofDensity(fluid)).isCloseTo(1.0, within(3e-4));
        assertThat(rod.ofDiameter(fluid)).isCloseTo(2.0 - log.reciprocal().getReal(), within(3e-4));
        assertThat(rod.ofLength(fluid)).isCloseTo(0.0, within(3e-4));
    }

    /** a ≪ L ≪ δ in such a gas: s → k z, so P[Γ s] = Γ k π a² L³/3 and R = 3 ρ_h |λ² D| / (8 ρ |k| L): one over the length. */
    @Test
    void ofAThinShortHairOnOneOverItsLength() {
        double viscosity = 1.5e-1;
        Medium fluid = fluid(1e-12, viscosity);
        Rod rod = new Rod(1e-5, 2e-9, 1200.0);
        Complex lambda = lambda(rod, viscosity);
        Complex log = lambda.multiply(0.5).log().negate().subtract(EULER);
        double k = FastMath.sqrt(OMEGA / viscosity);
        double ratio = 3.0 * 1200.0 * lambda.multiply(lambda).multiply(log).norm() / (8.0 * 1e-12 * k * rod.length());
        assertThat(rod.ratio(fluid) / ratio).isCloseTo(1.0, within(2e-3));
        assertThat(rod.ofDensity(fluid)).isCloseTo(1.0, within(1e-3));
        assertThat(rod.ofDiameter(fluid)).isCloseTo(2.0 - log.reciprocal().getReal(), within(1e-3));
        assertThat(rod.ofLength(fluid)).isCloseTo(-1.0, within(2e-3));
    }

    /** The same thin hair in a liquid that carries it along, ρ|Γ| ≫ ρ_h: it reads motion and flow alike, whatever its dimensions. */
    @Test
    void ofAHairCarriedAlongOnNothing() {
        Medium fluid = fluid(1000.0, 1e-6);
        Rod rod = new Rod(1e-2, 2e-8, 1200.0);
        assertThat(rod.ratio(fluid)).isCloseTo(1.0, within(1e-6));
        assertThat(rod.ofDensity(fluid)).isCloseTo(0.0, within(1e-6));
        assertThat(rod.ofDiameter(fluid)).isCloseTo(0.0, within(1e-6));
        assertThat(rod.ofLength(fluid)).isCloseTo(0.0, within(1e-6));
    }

    private static Complex lambda(Rod rod, double kinematicViscosity) {
        return new Complex(0.0, OMEGA / kinematicViscosity).sqrt().multiply(0.5 * rod.diameter());
    }
}
