package flowshy.cylinder.excursion;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.cylinder.SteadyDrag;
import flowshy.math.Caveat;
import flowshy.medium.Medium;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class CombinedResistanceTest {
    private static final OscillatingCylinder HAIR = new OscillatingCylinder(40e-6, Medium.of("gas", 1.2, 1.8e-5));

    private static CombinedResistance at(double mean, double deviation) {
        return CombinedResistance.at(HAIR, new OperatingPoint(mean, deviation, Fluctuation.RANDOM));
    }

    /** Angular frequency at which the point has an excursion ratio; the wider of radius and layer counts. */
    private static double omegaAt(CombinedResistance law, double x) {
        double layer = HAIR.medium().stokesLayer(1.0);
        double omega = FastMath.pow(law.point().carrying() / (x * layer), 2.0);
        return HAIR.medium().stokesLayer(omega) > HAIR.radius()
                ? omega
                : law.point().carrying() / (x * HAIR.radius());
    }

    @Test
    void isTheLinearLawForSmallExcursions() {
        CombinedResistance law = at(0.0, 0.01);
        double omega = 2.0 * omegaAt(law, 0.3);
        assertThat(law.weight(omega)).isZero();
        assertThat(law.hydrodynamicFunction(omega)).isEqualTo(HAIR.hydrodynamicFunction(omega));
        assertThat(law.acrossHydrodynamicFunction(omega)).isEqualTo(HAIR.hydrodynamicFunction(omega));
        assertThat(law.resistance(omega) / -HAIR.forcePerVelocity(omega).getReal())
                .isCloseTo(1.0, within(1e-14));
        assertThat(law.regime(omega).kind()).isEqualTo(Regime.Kind.LINEAR);
        assertThat(law.caveats(omega)).isEmpty();
        assertThat(at(0.0, 0.0).regime(omega).excursionRatio()).isZero();
    }

    /** Far out, drag is steady drag and added mass that of potential flow: 1 + Γ has the real part 2. */
    @Test
    void isSteadyDragForLargeExcursions() {
        CombinedResistance law = at(2.0, 0.3);
        double omega = 0.5 * omegaAt(law, 3.0);
        assertThat(law.weight(omega)).isEqualTo(1.0);
        assertThat(law.hydrodynamicFunction(omega).getReal()).isEqualTo(1.0);
        assertThat(law.resistance(omega) / law.quasiSteady().along()).isCloseTo(1.0, within(1e-14));
        assertThat(law.regime(omega).kind()).isEqualTo(Regime.Kind.QUASI_STEADY);
        assertThat(law.caveats(omega)).extracting(Caveat::weight).containsExactly(Caveat.Weight.WEAK);
        // along the stream the slope of the drag, across it drag over speed, which is less
        double rate = omega * 1.2 * FastMath.PI * 40e-6 * 40e-6;
        double across = -law.acrossHydrodynamicFunction(omega).getImaginary() * rate;
        assertThat(across / law.quasiSteady().across()).isCloseTo(1.0, within(1e-14));
        assertThat(across)
                .isBetween(
                        0.55 * law.quasiSteady().along(),
                        0.9 * law.quasiSteady().along());
        assertThat(law.quasiSteady().offset())
                .isCloseTo(
                        new SteadyDrag(40e-6, HAIR.medium()).force(2.0),
                        within(0.05 * law.quasiSteady().offset()));
    }

    /** Half way in ln X the step is one half: X = √(0.3 · 3). Resistance and reactance follow by hand. */
    @Test
    void isHalfOfEachInTheMiddle() {
        CombinedResistance law = at(1.0, 0.1);
        double omega = omegaAt(law, FastMath.sqrt(0.9));
        assertThat(law.regime(omega).kind()).isEqualTo(Regime.Kind.MIXED);
        assertThat(law.weight(omega)).isCloseTo(0.5, within(1e-12));
        Complex gamma = HAIR.hydrodynamicFunction(omega);
        double rate = omega * 1.2 * FastMath.PI * 40e-6 * 40e-6;
        double linear = -gamma.getImaginary() * rate;
        double steady = FastMath.max(linear, law.quasiSteady().along());
        assertThat(law.resistance(omega)).isCloseTo(0.5 * (linear + steady), within(1e-11 * linear));
        double reactance = rate * (1.0 + law.hydrodynamicFunction(omega).getReal());
        double expected = rate * (0.5 * (1.0 + gamma.getReal()) + 0.5 * 2.0);
        assertThat(reactance / expected).isCloseTo(1.0, within(1e-11));
        assertThat(law.caveats(omega).get(0).text()).contains("0.95").doesNotContain("%");
    }

    /** Weights at a quarter and three quarters of the way: 5/32 and 27/32. */
    @ParameterizedTest
    @CsvSource({"0.25, 0.15625", "0.75, 0.84375"})
    void stepsSmoothly(double way, double weight) {
        CombinedResistance law = at(1.0, 0.1);
        assertThat(law.weight(omegaAt(law, 0.3 * FastMath.pow(10.0, way)))).isCloseTo(weight, within(1e-12));
    }

    /** No step at either end, in both parts, and the resistance is never below the linear one. */
    @ParameterizedTest
    @ValueSource(doubles = {0.3, 3.0})
    void isContinuous(double x) {
        for (double mean : new double[] {0.0, 0.2, 3.0}) {
            CombinedResistance law = at(mean, 0.1);
            double omega = omegaAt(law, x);
            Complex below = law.hydrodynamicFunction(omega * (1.0 - 1e-9));
            Complex above = law.hydrodynamicFunction(omega * (1.0 + 1e-9));
            assertThat(above.getReal() / below.getReal()).isCloseTo(1.0, within(1e-8));
            assertThat(above.getImaginary() / below.getImaginary()).isCloseTo(1.0, within(1e-8));
        }
    }

    @Test
    void neverResistsLessThanTheLinearLaw() {
        int points = 0;
        for (double mean = 1e-4; mean < 20.0; mean *= 3.0) {
            CombinedResistance law = at(mean, 0.3 * mean);
            for (double omega = 0.1; omega < 1e5; omega *= 2.0) {
                double linear = -HAIR.forcePerVelocity(omega).getReal();
                assertThat(law.resistance(omega)).isGreaterThanOrEqualTo(linear * (1.0 - 1e-14));
                points++;
            }
        }
        assertThat(points).isGreaterThan(200);
    }

    /** β = 2 Wo²/π, KC = 2π(û/ω)/d and X follow their definitions. */
    @Test
    void givesTheNumbersOfTheRegime() {
        double omega = 2.0 * FastMath.PI * 100.0;
        Regime regime = at(0.05, 0.2).regime(omega);
        double nu = 1.8e-5 / 1.2;
        double amplitude = 0.2 * FastMath.sqrt(2.0);
        assertThat(regime.reynolds()).isCloseTo(amplitude * 80e-6 / nu, within(1e-12));
        assertThat(regime.stokesBeta()).isCloseTo(100.0 * 80e-6 * 80e-6 / nu, within(1e-12));
        assertThat(regime.keuleganCarpenter()).isCloseTo(amplitude / (100.0 * 80e-6), within(1e-10));
        assertThat(regime.excursionRatio())
                .isCloseTo(amplitude / omega / FastMath.sqrt(2.0 * nu / omega), within(1e-12));
        // a thick hair against a thin layer: the radius counts
        OscillatingCylinder thick = new OscillatingCylinder(1e-2, HAIR.medium());
        Regime wide = CombinedResistance.at(thick, new OperatingPoint(0.0, 1.0, Fluctuation.RANDOM))
                .regime(omega);
        assertThat(wide.excursionRatio()).isCloseTo(FastMath.sqrt(2.0) / omega / 1e-2, within(1e-12));
    }

    /** Hall's threshold as evaluated before this code; at β = 200 a tone of KC = 1.7 lies above 1.620. */
    @ParameterizedTest
    @CsvSource({"10, 3.6237768", "70, 2.139", "200, 1.620", "1035, 1.0555", "10000, 0.5896449"})
    void knowsHallsThreshold(double beta, double kc) {
        double wo = FastMath.sqrt(0.5 * FastMath.PI * beta);
        Regime above = new Regime(1.0, wo, 1.01 * kc, 0.1, Regime.Kind.LINEAR);
        Regime below = new Regime(1.0, wo, 0.99 * kc, 0.1, Regime.Kind.LINEAR);
        assertThat(above.hallThreshold()).isCloseTo(kc, within(kc > 3.0 || kc < 0.6 ? 6e-8 : 6e-4));
        assertThat(above.unstable()).isEqualTo(beta > 52.0);
        assertThat(below.unstable()).isFalse();
    }

    @Test
    void saysWhenTheAttachedFlowBreaksUp() {
        // a = 1, ν = 1: β = 2ω/π = 200, KC = πû/ω = 1.7
        OscillatingCylinder unit = new OscillatingCylinder(1.0, Medium.of("unit", 1.0, 1.0));
        double omega = 100.0 * FastMath.PI;
        OperatingPoint tone = new OperatingPoint(0.0, 1.7 * 100.0 / FastMath.sqrt(2.0), Fluctuation.SINUSOIDAL);
        List<Caveat> caveats = CombinedResistance.at(unit, tone).caveats(omega);
        assertThat(caveats)
                .extracting(Caveat::text)
                .anySatisfy(text -> assertThat(text).contains("Keulegan-Carpenter number 1.7"));
    }

    @Test
    void saysWhereItEnds() {
        OscillatingCylinder rod = new OscillatingCylinder(0.5, Medium.of("unit", 1.0, 1.0));
        CombinedResistance fast = CombinedResistance.at(rod, new OperatingPoint(1.2e5, 1.0, Fluctuation.RANDOM));
        assertThat(fast.regime(1.0).kind()).isEqualTo(Regime.Kind.OUT_OF_RANGE);
        assertThat(fast.caveats(1.0)).extracting(Caveat::weight).contains(Caveat.Weight.OUT_OF_RANGE);
        OperatingPoint storm = new OperatingPoint(3e5, 1.0, Fluctuation.RANDOM);
        assertThatThrownBy(() -> CombinedResistance.at(rod, storm)).isInstanceOf(IllegalArgumentException.class);
        assertThat(Regime.Kind.OUT_OF_RANGE.words()).isEqualTo("out of range");
    }
}
