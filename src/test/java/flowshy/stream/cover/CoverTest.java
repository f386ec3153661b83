package flowshy.stream.cover;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Caveat;
import flowshy.math.LogTable;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import flowshy.stream.StokesLayer;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

/** What each cover makes of the flow outside, and what it says about itself. */
class CoverTest {
    private static final Medium AIR = new Medium(
            "air of the test",
            Phase.GAS,
            293.15,
            101325.0,
            1.2,
            1.82e-5,
            OptionalDouble.of(343.0),
            OptionalDouble.empty(),
            List.of(),
            List.of());
    private static final double OMEGA = 2.0 * FastMath.PI * 60.0;

    private static MeasuredCover measured(List<Double> levels, Optional<LogTable> phase) {
        return new MeasuredCover("a.csv", new LogTable(List.of(15.0, 60.0, 240.0), levels), phase);
    }

    @Test
    void aMeasuredCoverScalesByItsLevelAndTurnsByItsPhase() {
        LogTable phase = new LogTable(List.of(15.0, 240.0), List.of(0.0, 120.0));
        Complex turned = measured(List.of(0.0, 20.0, 40.0), Optional.of(phase)).factor(OMEGA, AIR);
        assertThat(turned.norm()).isCloseTo(0.1, within(1e-15));
        assertThat(FastMath.toDegrees(turned.getArgument())).isCloseTo(60.0, within(1e-12));
        // 30 Hz, half way between 15 and 60 Hz on a logarithmic scale: half the level
        Complex plain = measured(List.of(0.0, 20.0, 40.0), Optional.empty()).factor(0.5 * OMEGA, AIR);
        assertThat(plain.getReal()).isCloseTo(FastMath.pow(10.0, -0.5), within(1e-15));
        assertThat(plain.getImaginary()).isZero();
        // a cover may amplify where it resonates
        assertThat(measured(List.of(0.0, -6.0, 0.0), Optional.empty())
                        .factor(OMEGA, AIR)
                        .getReal())
                .isCloseTo(FastMath.pow(10.0, 0.3), within(1e-14));
    }

    @Test
    void noAttenuationIsExactlyOpen() {
        Cover none = measured(List.of(0.0, 0.0, 0.0), Optional.empty());
        for (double frequency : new double[] {15.0, 37.0, 240.0}) {
            assertThat(none.factor(2.0 * FastMath.PI * frequency, AIR)).isEqualTo(Complex.ONE);
        }
        assertThat(none.profile(AIR)).isEqualTo(Covers.OPEN.profile(AIR));
        assertThat(none.cavityRadius()).isEmpty();
        assertThat(none.closed()).isFalse();
    }

    @Test
    void nothingIsExtrapolatedFromAMeasurement() {
        Cover cover = measured(List.of(0.0, 20.0, 40.0), Optional.empty());
        for (double frequency : new double[] {14.9, 241.0}) {
            assertThatThrownBy(() -> cover.factor(2.0 * FastMath.PI * frequency, AIR))
                    .isInstanceOf(UnmeasuredFrequencyException.class)
                    .hasMessageContaining("a.csv covers 15.00 Hz to 240.0 Hz")
                    .hasMessageContaining("was asked for");
        }
    }

    @Test
    void anUnknownPhaseIsToldAsAWeakness() {
        LogTable phase = new LogTable(List.of(15.0, 240.0), List.of(0.0, 120.0));
        assertThat(measured(List.of(0.0, 20.0, 40.0), Optional.empty()).assumptions(AIR))
                .singleElement()
                .satisfies(caveat -> assertThat(caveat.weight()).isEqualTo(Caveat.Weight.WEAK))
                .satisfies(caveat -> assertThat(caveat.text()).contains("phase is not stated, 0 deg"));
        assertThat(measured(List.of(0.0, 20.0, 40.0), Optional.of(phase)).assumptions(AIR))
                .singleElement()
                .satisfies(caveat -> assertThat(caveat.weight()).isEqualTo(Caveat.Weight.NOTE));
    }

    /** Far above the layer a roof changes nothing; close by, the flow stands still at wall and roof. */
    @Test
    void aRoofShapesTheFlowAndLeavesItsGradient() {
        StokesLayer open = new StokesLayer(AIR.kinematicViscosity());
        Cover far = new RoofedCover(100.0 * open.thickness(OMEGA), 1.0);
        Cover near = new RoofedCover(1.3e-3, 6e-3);
        for (double height : new double[] {1e-5, 2e-4, 7e-4}) {
            Complex under = far.profile(AIR).share(height, OMEGA);
            assertThat(under.subtract(open.share(height, OMEGA)).norm()).isLessThan(1e-15);
        }
        assertThat(near.profile(AIR).share(0.0, OMEGA).norm()).isLessThan(1e-16);
        assertThat(near.profile(AIR).share(1.3e-3, OMEGA).norm()).isLessThan(1e-16);
        // a gap far below the layer is filled by the parabola iω z(H − z)/(2ν) of slow flow
        double creeping = OMEGA * 1e-5 * 1e-5 / (2.0 * AIR.kinematicViscosity());
        assertThat(new RoofedCover(2e-5, 6e-3).profile(AIR).share(1e-5, OMEGA).norm() / creeping)
                .isCloseTo(1.0, within(1e-3));
        assertThat(near.factor(OMEGA, AIR)).isEqualTo(Complex.ONE);
        assertThat(near.closed()).isFalse();
        assertThat(near.cavityRadius()).isEmpty();
        assertThat(new RoofedCover(1.3e-3, 6e-3).throughFlow(AIR).gap()).isEqualTo(1.3e-3);
        assertThat(near.words()).isEqualTo("roofed, gap 1.300 mm, length 6.000 mm");
    }

    @Test
    void aSealedCavityLetsNothingInAndConfinesOnlyIfItsSizeIsKnown() {
        Cover sized = new SealedCover(Optional.of(new Cavity(2.4e-3, 1.5e-3)));
        for (Cover cover : List.of(Covers.SEALED, sized)) {
            assertThat(cover.factor(OMEGA, AIR)).isEqualTo(Complex.ZERO);
            assertThat(cover.closed()).isTrue();
        }
        assertThat(sized.cavityRadius()).hasValue(1.2e-3);
        assertThat(Covers.SEALED.cavityRadius()).isEmpty();
        assertThat(Covers.SEALED.assumptions(AIR))
                .singleElement()
                .satisfies(caveat -> assertThat(caveat.weight()).isEqualTo(Caveat.Weight.WEAK))
                .satisfies(caveat -> assertThat(caveat.text()).contains("walls count as far"));
        assertThat(sized.assumptions(AIR))
                .singleElement()
                .satisfies(caveat -> assertThat(caveat.weight()).isEqualTo(Caveat.Weight.NOTE));
    }

    /** Holes on one side: a short cavity breathes by little; both sides: wide open holes let the whole gradient through. */
    @Test
    void ventsPassAShareOfTheFlow() {
        Cover breathing = new VentedCover(4, 2e-4, 1e-4, false, 3e-9, 2e-6);
        // slow against the resonance the whole cavity follows the pressure: Q = iωC p, so φ = iω(V/A)/c
        double slow = 2.0 * FastMath.PI * 5.0;
        Complex expected = new Complex(0.0, slow * (3e-9 / 2e-6) / 343.0);
        assertThat(breathing.factor(slow, AIR).subtract(expected).norm() / expected.norm())
                .isLessThan(1e-4);
        Cover wide = new VentedCover(1, 1.5e-3, 1e-6, true, 3e-7, 1.77e-6);
        assertThat(wide.factor(2.0 * FastMath.PI * 3000.0, AIR).norm()).isBetween(0.9, 1.0);
        assertThat(breathing.cavityRadius().orElseThrow()).isCloseTo(FastMath.sqrt(2e-6 / FastMath.PI), within(1e-18));
    }

    @Test
    void dimensionsThatAreNoneAreRefused() {
        for (double bad : new double[] {0.0, -1e-3, Double.NaN}) {
            assertThatThrownBy(() -> new RoofedCover(bad, 1e-3)).isInstanceOf(IllegalArgumentException.class);
            assertThatThrownBy(() -> new RoofedCover(1e-3, bad)).isInstanceOf(IllegalArgumentException.class);
            assertThatThrownBy(() -> new Cavity(bad, 1e-3)).isInstanceOf(IllegalArgumentException.class);
            assertThatThrownBy(() -> new Cavity(1e-3, bad)).isInstanceOf(IllegalArgumentException.class);
            assertThatThrownBy(() -> new VentedCover(1, bad, 1e-4, true, 1e-9, 1e-6))
                    .isInstanceOf(IllegalArgumentException.class);
            assertThatThrownBy(() -> new VentedCover(1, 1e-4, 1e-4, true, 1e-9, bad))
                    .isInstanceOf(IllegalArgumentException.class);
        }
        assertThatThrownBy(() -> new VentedCover(0, 1e-4, 1e-4, true, 1e-9, 1e-6))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
