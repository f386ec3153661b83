package flowshy.stream.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.stream.ReferenceRows;
import flowshy.stream.StokesLayer;
import java.util.List;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;

/** Against a finite-difference march (marched_layer.py), printed values, and both limits. */
class FluctuatingLayerValidationTest {
    private static final List<Map<String, Double>> MARCHED =
            ReferenceRows.read(FluctuatingLayerValidationTest.class, "marched-layer.csv", 54);

    /** The march is good to 1e-7; the series loses digits as its terms cancel, hence more room at ξ = 5. */
    @Test
    void seriesEqualsTheMarchedSolution() {
        int compared = 0;
        for (Map<String, Double> row : MARCHED) {
            double xi = row.get("xi");
            if (xi <= FluctuatingLayer.SERIES_END) {
                compare(FluctuatingLayer.ALONG, row, "along", xi < 4.0 ? 3e-7 : 5e-6);
                compare(FluctuatingLayer.ACROSS, row, "across", xi < 4.0 ? 3e-7 : 5e-6);
                compared++;
            }
        }
        assertThat(compared).isEqualTo(48);
    }

    @Test
    void continuationStaysWithinItsStatedDistance() {
        int compared = 0;
        for (Map<String, Double> row : MARCHED) {
            if (row.get("xi") > FluctuatingLayer.SERIES_END) {
                compare(FluctuatingLayer.ALONG, row, "along", 0.015);
                compare(FluctuatingLayer.ACROSS, row, "across", 0.015);
                compared++;
            }
        }
        assertThat(compared).isEqualTo(6);
    }

    private static void compare(FluctuatingLayer layer, Map<String, Double> row, String name, double tolerance) {
        Complex share = layer.share(row.get("eta"), row.get("xi"));
        assertThat(share.getReal()).as("%s %s", name, row).isCloseTo(row.get(name + "_re"), within(tolerance));
        assertThat(share.getImaginary()).as("%s %s", name, row).isCloseTo(row.get(name + "_im"), within(tolerance));
    }

    /** Design values at η = 0.6, an independent march: amplitude to three digits, phase to a degree. */
    @Test
    void valuesOfTheDesignPage() {
        double[][] page = {{0.1, 0.302, 7}, {0.3, 0.335, 17}, {0.6, 0.411, 25}, {1.0, 0.498, 26}, {3.0, 0.708, 25}};
        for (double[] row : page) {
            Complex share = FluctuatingLayer.ALONG.share(0.6, row[0]);
            assertThat(share.norm()).isCloseTo(row[1], within(0.6e-3));
            assertThat(Math.toDegrees(share.getArgument())).isCloseTo(row[2], within(0.6));
        }
    }

    /** A slow change: the layer of the changed speed, so d(U f′(η))/dU = f′ + ½ηf″ along, and f′ across. */
    @Test
    void slowLimitIsTheDerivativeOfTheSteadyLayer() {
        double h = 1e-4;
        for (double z : new double[] {0.1, 0.7, 1.9, 3.3, 6.0}) {
            double derivative =
                    (new BlasiusLayer(1.0 + h, 1.0, 1.0).speedAt(z) - new BlasiusLayer(1.0 - h, 1.0, 1.0).speedAt(z))
                            / (2.0 * h);
            Complex along = FluctuatingLayer.ALONG.share(z, 0.0);
            assertThat(along.getReal()).isCloseTo(derivative, within(1e-6));
            assertThat(along.getImaginary()).isZero();
            assertThat(FluctuatingLayer.ACROSS.share(z, 0.0).getReal())
                    .isCloseTo(new BlasiusLayer(1.0, 1.0, 1.0).speedAt(z), within(1e-6));
        }
    }

    /** First correction near the wall is of order ξ^−1.5: at ξ = 1000 the Stokes layer to 1e-3. */
    @Test
    void fastLimitIsTheStokesLayer() {
        double xi = 1000.0;
        for (double y : new double[] {0.1, 0.5, 1.0, 2.0}) {
            double eta = y * Math.sqrt(2.0 / xi);
            Complex stokes = StokesLayer.share(y);
            for (FluctuatingLayer layer : FluctuatingLayer.values()) {
                assertThat(layer.share(eta, xi).subtract(stokes).norm()).isLessThan(1e-3);
            }
        }
    }

    @Test
    void noStepWhereTheSeriesEnds() {
        double end = FluctuatingLayer.SERIES_END;
        for (FluctuatingLayer layer : FluctuatingLayer.values()) {
            for (double eta : new double[] {0.05, 0.6, 2.0, 4.0}) {
                Complex below = layer.share(eta, end);
                Complex above = layer.share(eta, Math.nextUp(end));
                assertThat(above.subtract(below).norm()).isLessThan(1e-12);
            }
        }
    }

    @Test
    void restsAtTheWallAndFollowsOutside() {
        for (FluctuatingLayer layer : FluctuatingLayer.values()) {
            for (double xi : new double[] {0.0, 0.4, 3.0, 8.0}) {
                assertThat(layer.share(0.0, xi).norm()).isLessThan(1e-9);
                assertThat(layer.share(15.0, xi).subtract(Complex.ONE).norm()).isLessThan(1e-12);
            }
        }
    }
}
