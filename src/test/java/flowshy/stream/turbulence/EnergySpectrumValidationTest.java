package flowshy.stream.turbulence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.stream.ReferenceRows;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Against quadrature at 40 digits (energy_spectrum.py). */
class EnergySpectrumValidationTest {
    /** Relative 1e-9 above the deep viscous end; there (k r > 5) the panels still hold 1e-7 of a number that no longer matters. */
    @Test
    void oneDimensionalSpectraEqualTheQuadrature() {
        List<Map<String, Double>> rows =
                ReferenceRows.read(EnergySpectrumValidationTest.class, "energy-spectrum.csv", 18);
        for (Map<String, Double> row : rows) {
            double r = row.get("r");
            double k1 = row.get("k1");
            EnergySpectrum spectrum = new EnergySpectrum(r);
            double scale = 1.5 / spectrum.energy();
            double tolerance = k1 * r > 5.0 ? 1e-7 : 1e-9;
            assertThat(scale * spectrum.along(k1) / row.get("along"))
                    .as("%s", row)
                    .isCloseTo(1.0, within(tolerance));
            assertThat(scale * spectrum.across(k1) / row.get("across"))
                    .as("%s", row)
                    .isCloseTo(1.0, within(tolerance));
        }
    }

    /** No step where one panel passes to the next, nor at either end of the panels. */
    @Test
    void goesOnSmoothlyOverTheEdges() {
        EnergySpectrum spectrum = new EnergySpectrum(0.02);
        int compared = 0;
        for (double k = 1e-5; k * 0.02 < 25.0; k *= 1.01) {
            double here = Math.log(spectrum.along(k));
            double next = Math.log(spectrum.along(1.01 * k));
            double middle = Math.log(spectrum.along(Math.sqrt(1.01) * k));
            assertThat(middle - 0.5 * (here + next)).as("k = %s", k).isBetween(-1e-6, 2e-2 * Math.max(1e-3, k * 0.02));
            assertThat(next).isLessThanOrEqualTo(here);
            compared++;
        }
        assertThat(compared).isGreaterThan(1800);
    }
}
