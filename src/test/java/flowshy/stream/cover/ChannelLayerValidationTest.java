package flowshy.stream.cover;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.stream.StokesLayer;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Plane channel driven by an oscillating gradient. With half height h, mean over the steady mean G h²/(3μ) is
 * (3/(i Wo²)) (1 − tanh(kh)/(kh)), Wo = h √(ω/ν); digits from check values made at 40 digits, not by this project's Java code.
 */
class ChannelLayerValidationTest {
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(60);

    @ParameterizedTest
    @CsvSource({
        "0.5, 0.994920, -5.710",
        "1, 0.926985, -21.760",
        "2, 0.526817, -57.157",
        "5, 0.104411, -80.669",
        "10, 0.0279593, -85.649"
    })
    void meanFlowAgreesWithTheExactChannel(double womersley, double size, double phase) {
        double omega = womersley * womersley; // h = 1, ν = 1
        ChannelLayer channel = new ChannelLayer(2.0, 1.0);
        Complex mean = Complex.ZERO;
        for (int i = 0; i < RULE.getNumberOfPoints(); i++) {
            mean = mean.add(channel.share(1.0 + RULE.getPoint(i), omega).multiply(0.5 * RULE.getWeight(i)));
        }
        Complex overSteady = mean.multiply(3.0).divide(new Complex(0.0, omega));
        assertThat(overSteady.norm()).isCloseTo(size, within(0.6e-6 + 0.6e-6 * size));
        assertThat(Math.toDegrees(overSteady.getArgument())).isCloseTo(phase, within(0.6e-3));
    }

    /** ω → 0 by hand: s → (iω/2ν) z (H − z). */
    @Test
    void tendsToTheSteadyParabola() {
        ChannelLayer channel = new ChannelLayer(1e-3, 1.5e-5);
        double omega = 1e-4;
        Complex share = channel.share(0.3e-3, omega);
        double parabola = omega / (2.0 * 1.5e-5) * 0.3e-3 * 0.7e-3;
        assertThat(share.getImaginary()).isCloseTo(parabola, within(1e-6 * parabola));
        assertThat(share.getReal()).isPositive().isLessThan(1e-4 * parabola);
    }

    /** A roof far above the layer is no roof. */
    @Test
    void tendsToTheLayerOverOneWall() {
        double omega = 600.0;
        Complex open = new StokesLayer(1.5e-5).share(0.4e-3, omega);
        Complex roofed = new ChannelLayer(20e-3, 1.5e-5).share(0.4e-3, omega);
        assertThat(roofed.subtract(open).norm()).isLessThan(1e-12);
    }

    @Test
    void vanishesAtBothWallsAndIsSymmetric() {
        ChannelLayer channel = new ChannelLayer(1e-3, 1.5e-5);
        assertThat(channel.share(0.0, 300.0)).isEqualTo(Complex.ZERO);
        assertThat(channel.share(1e-3, 300.0)).isEqualTo(Complex.ZERO);
        Complex lower = channel.share(0.2e-3, 300.0);
        assertThat(lower.subtract(channel.share(0.8e-3, 300.0)).norm()).isLessThan(1e-13 * lower.norm());
    }
}
