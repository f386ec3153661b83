package flowshy.stream.turbulence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Against values of the printed form (70.8 and 283.2), its peak, its integral. */
class VonKarmanSpectrumValidationTest {
    /** σ = L = U = 1: frequency is n and n times the density is fS/σ². */
    private static final VonKarmanSpectrum UNIT = new VonKarmanSpectrum(1.0, 1.0, 1.0);

    @Test
    void constantIsThePrintedOne() {
        assertThat(VonKarmanSpectrum.C).isCloseTo(70.8, within(0.05));
        assertThat(VonKarmanSpectrum.C).isCloseTo(70.780128, within(0.5e-6));
    }

    /** The printed form rounds C to 70.8, which is up to 2.4e-4 at the high end. */
    @Test
    void alongAtTheValuesOfThePrintedForm() {
        double[][] printed = {{0.01, 0.0397655}, {0.1, 0.2560472}, {1.0, 0.1135768}, {10.0, 0.0247541}};
        for (double[] row : printed) {
            assertThat(row[0] * UNIT.along(row[0])).isCloseTo(row[1], Percentage.withPercentage(0.03));
        }
        assertThat(0.14556 * UNIT.along(0.14556)).isCloseTo(0.27131, Percentage.withPercentage(0.03));
    }

    /** 4n(1 + 755.2n²)/(1 + 283.2n²)^(11/6) on the across scale, which is half the along scale. */
    @Test
    void acrossIsThePrintedFormOnHalfTheScale() {
        for (double n : new double[] {0.005, 0.05, 0.5, 5.0}) {
            double printed = 4.0 * n * (1.0 + 755.2 * n * n) / Math.pow(1.0 + 283.2 * n * n, 11.0 / 6.0);
            assertThat(2.0 * n * UNIT.across(2.0 * n)).isCloseTo(printed, Percentage.withPercentage(0.05));
        }
    }

    /** Isotropy: S_v = ½(S_u − f dS_u/df), by central differences. */
    @Test
    void acrossFollowsFromAlongByIsotropy() {
        for (double f : new double[] {0.02, 0.3, 4.0}) {
            double h = 1e-5 * f;
            double slope = (UNIT.along(f + h) - UNIT.along(f - h)) / (2.0 * h);
            assertThat(UNIT.across(f)).isCloseTo(0.5 * (UNIT.along(f) - f * slope), Percentage.withPercentage(1e-6));
        }
    }

    /** Trapezoids in ln f from 1e-9 to 1e12; the rest beyond is of order f^(−2/3). */
    @Test
    void integralsAreTheVariance() {
        VonKarmanSpectrum spectrum = new VonKarmanSpectrum(0.12, 0.07, 0.4);
        double along = 0.0;
        double across = 0.0;
        double step = 0.01;
        for (double x = Math.log(1e-9); x < Math.log(1e12); x += step) {
            double f = Math.exp(x);
            along += spectrum.along(f) * f * step;
            across += spectrum.across(f) * f * step;
        }
        assertThat(along).isCloseTo(0.0144, Percentage.withPercentage(0.001));
        assertThat(across).isCloseTo(0.0144, Percentage.withPercentage(0.001));
    }

    @Test
    void refusesWhatIsNoStream() {
        assertThatThrownBy(() -> new VonKarmanSpectrum(0.1, 0.0, 1.0)).hasMessageContaining("length scale");
    }
}
