package flowshy.stream.turbulence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** What a duct and a wall make by themselves, against measured orders and the arithmetic of the stated practice. */
class DefaultTurbulenceValidationTest {
    /** 0.16 · 1e5^(−1/8) = 3.794 %; near the axis of a pipe 0.8 u_τ is measured (Laufer 1954, from memory): 0.8 √(f/8) = 3.8 %. */
    @Test
    void ductAtTheValueOfThePractice() {
        DuctTurbulence duct = new DuctTurbulence(1e5, 0.2);
        assertThat(duct.intensity()).isCloseTo(0.037942, within(1e-6));
        assertThat(duct.intensity()).isCloseTo(0.8 * Math.sqrt(0.0180 / 8.0), Percentage.withPercentage(3.0));
    }

    /** The length that goes with l = 0.07 D: both formulas must give one dissipation. */
    @Test
    void lengthScaleKeepsTheDissipationOfThePractice() {
        DuctTurbulence duct = new DuctTurbulence(2e4, 0.1);
        double deviation = 0.3;
        double practice = Math.pow(0.09, 0.75) * Math.pow(1.5 * deviation * deviation, 1.5) / (0.07 * 0.1);
        TurbulenceSpectrum ours = new TurbulenceSpectrum(deviation, duct.lengthScale(), 5.0, 1.5e-5);
        assertThat(ours.dissipation()).isCloseTo(practice, Percentage.withPercentage(1e-9));
        assertThat(duct.lengthScale()).isCloseTo(0.0165, within(0.0001));
    }

    /** fS of the layer's own turbulence has its peak at f⁺ = 0.01, rms 2.7 u_τ. */
    @Test
    void wallTurbulencePeaksAtTheStreaks() {
        double frictionVelocity = 0.25;
        double viscosity = 1.5e-5;
        TurbulenceSpectrum wall = WallTurbulence.spectrum(frictionVelocity, viscosity);
        double best = 0.0;
        double at = 0.0;
        for (double plus = 1e-3; plus < 0.1; plus *= 1.01) {
            double f = plus * frictionVelocity * frictionVelocity / viscosity;
            double value = f * wall.along(f);
            if (value > best) {
                best = value;
                at = plus;
            }
        }
        assertThat(at).isCloseTo(0.01, Percentage.withPercentage(10.0));
        assertThat(wall.lengthScale() * frictionVelocity / viscosity)
                .isCloseTo(145.56, within(0.05)); // peak at n = 0.14556
        assertThat(wall.deviation()).isCloseTo(0.675, within(1e-12));
        assertThat(wall.kolmogorovLength() * frictionVelocity / viscosity).isBetween(1.5, 2.0);
    }
}
