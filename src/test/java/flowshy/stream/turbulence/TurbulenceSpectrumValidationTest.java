package flowshy.stream.turbulence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.time.Duration;
import java.util.function.DoubleUnaryOperator;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Test;

/** Variance, the form without viscosity, the constants of the inertial and viscous ranges, isotropy. */
class TurbulenceSpectrumValidationTest {
    /** a draught in a room: 0.2 m/s, 40 %, 100 mm, air */
    private static final TurbulenceSpectrum DRAUGHT = new TurbulenceSpectrum(0.08, 0.1, 0.2, 1.51e-5);

    @Test
    void integralsAreTheVariance() {
        assertThat(integral(DRAUGHT::along)).isCloseTo(0.0064, Percentage.withPercentage(0.001));
        assertThat(integral(DRAUGHT::across)).isCloseTo(0.0064, Percentage.withPercentage(0.001));
    }

    private static double integral(DoubleUnaryOperator density) {
        double sum = 0.0;
        double step = 0.01;
        for (double x = Math.log(1e-8); x < Math.log(1e5); x += step) {
            double f = Math.exp(x);
            sum += density.applyAsDouble(f) * f * step;
        }
        return sum;
    }

    /** Viscosity a million times less: von Kármán's form, from low frequency far into the −5/3 range. */
    @Test
    void tendsToVonKarmanWithoutViscosity() {
        TurbulenceSpectrum thin = new TurbulenceSpectrum(0.08, 0.1, 0.2, 1.51e-11);
        VonKarmanSpectrum inviscid = new VonKarmanSpectrum(0.08, 0.1, 0.2);
        for (double f : new double[] {1e-3, 0.1, 0.3, 1.0, 10.0, 100.0}) {
            assertThat(thin.along(f)).isCloseTo(inviscid.along(f), Percentage.withPercentage(0.05));
            assertThat(thin.across(f)).isCloseTo(inviscid.across(f), Percentage.withPercentage(0.05));
        }
    }

    /** S_v = ½(S_u − f dS_u/df) holds for every isotropic spectrum. */
    @Test
    void acrossFollowsFromAlongByIsotropy() {
        for (double f : new double[] {0.05, 0.5, 5.0, 20.0}) {
            double h = 1e-5 * f;
            double slope = (DRAUGHT.along(f + h) - DRAUGHT.along(f - h)) / (2.0 * h);
            assertThat(DRAUGHT.across(f))
                    .isCloseTo(0.5 * (DRAUGHT.along(f) - f * slope), Percentage.withPercentage(1e-4));
        }
    }

    /** In the inertial range E₁₁ = (18/55) C ε^⅔ κ₁^(−5/3) with Kolmogorov's constant C = 1.5 (measured, Sreenivasan 1995, from memory). */
    @Test
    void kolmogorovConstantIsOneAndAHalf() {
        TurbulenceSpectrum wind = new TurbulenceSpectrum(1.0, 1000.0, 10.0, 1.5e-5);
        double f = 20.0; // κ₁L = 1.3e4, κ₁η = 0.009
        double wavenumber = 2.0 * Math.PI * f / 10.0;
        double oneDimensional = wind.along(f) * 10.0 / (2.0 * Math.PI);
        double constant = oneDimensional
                * 55.0
                / 18.0
                * Math.pow(wavenumber, 5.0 / 3.0)
                * Math.pow(wind.dissipation(), -2.0 / 3.0);
        assertThat(constant).isCloseTo(1.5, within(0.02));
    }

    /** ε = 15 ν ∫κ₁² E₁₁ dκ₁ for isotropic turbulence: the viscous end spends what the large eddies feed, to a few per cent. */
    @Test
    void viscousEndSpendsTheDissipation() {
        TurbulenceSpectrum wind = new TurbulenceSpectrum(1.0, 1.0, 10.0, 1.5e-6);
        double sum = 0.0;
        double step = 0.01;
        for (double x = Math.log(1e-3); x < Math.log(1e7); x += step) {
            double f = Math.exp(x);
            double wavenumber = 2.0 * Math.PI * f / 10.0;
            sum += wavenumber * wavenumber * wind.along(f) * f * step;
        }
        assertThat(15.0 * 1.5e-6 * sum).isCloseTo(wind.dissipation(), Percentage.withPercentage(3.0));
    }

    /** The cut-off is where half is left; for the draught it lies near κ₁η = 0.2, at 100 Hz viscosity takes more than three orders of magnitude. */
    @Test
    void cutOffLeavesHalf() {
        VonKarmanSpectrum inviscid = new VonKarmanSpectrum(0.08, 0.1, 0.2);
        double cutOff = DRAUGHT.cutOff();
        assertThat(DRAUGHT.along(cutOff)).isCloseTo(0.5 * inviscid.along(cutOff), Percentage.withPercentage(1e-6));
        assertThat(2.0 * Math.PI * cutOff / 0.2 * DRAUGHT.kolmogorovLength()).isBetween(0.1, 0.3);
        assertThat(DRAUGHT.along(100.0)).isLessThan(1e-3 * inviscid.along(100.0));
    }

    /** ε = 0.712 · 0.08³/0.1 = 3.6454e-3 m²/s³, η = (1.51e-5³/ε)^¼ = 0.9858 mm, by hand. */
    @Test
    void scalesByHand() {
        assertThat(DRAUGHT.dissipation()).isCloseTo(3.64544e-3, within(1e-8));
        assertThat(DRAUGHT.kolmogorovLength()).isCloseTo(0.9858e-3, within(0.5e-7));
        assertThat(DRAUGHT.reynolds()).isCloseTo(529.8, within(0.01));
        assertThat(TurbulenceSpectrum.REYNOLDS.contains(DRAUGHT.reynolds())).isTrue();
    }

    /** Doubling rms and speed at equal Reynolds number moves the spectrum by the two scales alone. */
    @Test
    void dependsOnOneParameterOnly() {
        TurbulenceSpectrum twice = new TurbulenceSpectrum(0.16, 0.1, 0.4, 3.02e-5);
        assertThat(twice.along(6.0)).isCloseTo(2.0 * DRAUGHT.along(3.0), Percentage.withPercentage(1e-9));
    }

    @Test
    void twoHundredPointsAreQuick() {
        Assertions.assertTimeout(Duration.ofSeconds(5), () -> {
            double sum = 0.0;
            for (int run = 0; run < 100; run++) {
                TurbulenceSpectrum spectrum = new TurbulenceSpectrum(0.08 + 1e-4 * run, 0.1, 0.2, 1.51e-5);
                for (int i = 0; i < 200; i++) {
                    sum += spectrum.along(Math.pow(10.0, 0.02 * i));
                }
            }
            assertThat(sum).isFinite();
        });
    }

    @Test
    void refusesWhatIsNoStream() {
        assertThatThrownBy(() -> new TurbulenceSpectrum(0.0, 0.1, 1.0, 1.5e-5)).hasMessageContaining("deviation");
        assertThatThrownBy(() -> new TurbulenceSpectrum(0.1, 0.1, 1.0, Double.NaN))
                .hasMessageContaining("viscosity");
    }
}
