package flowshy.cylinder;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Caveat;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class OscillatingCylinderTest {
    private static Medium gas(OptionalDouble meanFreePath) {
        return new Medium(
                "test gas",
                Phase.GAS,
                /* temperature= */ 293.15,
                /* pressure= */ 101325.0,
                /* density= */ 1.2,
                /* viscosity= */ 1.8e-5,
                OptionalDouble.empty(),
                meanFreePath,
                List.of(),
                List.of());
    }

    /** The medium never feeds the motion: damping and added mass are positive at every frequency, with slip and without. */
    @Test
    void takesPowerOutAtEveryFrequency() {
        int points = 0;
        for (double knudsen : new double[] {0.0, 0.01, 0.1}) {
            for (double wo = 1e-6; wo < 1e4; wo *= 1.1) {
                Complex excess = HydrodynamicFunction.excess(wo, knudsen);
                assertThat(excess.getReal()).isPositive().isFinite();
                assertThat(excess.getImaginary()).isNegative().isFinite();
                points++;
            }
        }
        assertThat(points).isGreaterThan(700);
        OscillatingCylinder hair = new OscillatingCylinder(4e-5, gas(OptionalDouble.empty()));
        assertThat(hair.forcePerVelocity(500.0).getReal()).isNegative();
        assertThat(hair.forcePerVelocity(500.0).getImaginary()).isNegative();
    }

    @Test
    void scalesWithRadiusDensityAndFrequency() {
        OscillatingCylinder hair = new OscillatingCylinder(4e-5, Medium.of("test", 2.0, 3.0e-5));
        double omega = 700.0;
        double wo = 4e-5 * FastMath.sqrt(omega * 2.0 / 3.0e-5);
        assertThat(hair.womersley(omega)).isCloseTo(wo, within(1e-15 * wo));
        Complex gamma = HydrodynamicFunction.of(wo);
        double displaced = 2.0 * FastMath.PI * 4e-5 * 4e-5;
        Complex force = hair.forcePerVelocity(omega);
        assertThat(force.getReal()).isCloseTo(omega * displaced * gamma.getImaginary(), within(1e-18));
        assertThat(force.getImaginary()).isCloseTo(-omega * displaced * gamma.getReal(), within(1e-18));
    }

    /** Still base in moving fluid and moving hair in still fluid differ by the fluid that is not displaced. */
    @ParameterizedTest
    @ValueSource(doubles = {1.0, 300.0, 1e5})
    void feelsTheFreeStreamAsItsOwnMotionPlusDisplacedFluid(double omega) {
        OscillatingCylinder hair = new OscillatingCylinder(4e-5, gas(OptionalDouble.of(6.5e-8)));
        Complex sum = hair.streamForcePerVelocity(omega, Complex.ONE).add(hair.forcePerVelocity(omega));
        double displaced = omega * 1.2 * FastMath.PI * 4e-5 * 4e-5;
        assertThat(sum.getReal()).isCloseTo(0.0, within(1e-12 * displaced));
        assertThat(sum.getImaginary()).isCloseTo(displaced, within(1e-12 * displaced));
        // at the wall, u = 0, the pressure gradient is left
        assertThat(hair.streamForcePerVelocity(omega, Complex.ZERO).getImaginary())
                .isCloseTo(displaced, within(1e-12 * displaced));
    }

    @Test
    void mirrorsConjugateGrowthRates() {
        OscillatingCylinder hair = new OscillatingCylinder(4e-5, gas(OptionalDouble.of(6.5e-8)));
        Complex above = hair.hydrodynamicFunction(new Complex(-300.0, 500.0));
        assertThat(hair.hydrodynamicFunction(new Complex(-300.0, -500.0))).isEqualTo(above.conjugate());
    }

    @Test
    void countsSlipOnlyWhereAMeanFreePathIsKnown() {
        OscillatingCylinder plain = new OscillatingCylinder(1e-6, gas(OptionalDouble.empty()));
        OscillatingCylinder slipping = new OscillatingCylinder(1e-6, gas(OptionalDouble.of(6.5e-8)));
        assertThat(plain.knudsen()).isZero();
        assertThat(slipping.knudsen()).isCloseTo(0.065, within(1e-15));
        assertThat(plain.hydrodynamicFunction(100.0)).isEqualTo(HydrodynamicFunction.of(plain.womersley(100.0)));
        assertThat(slipping.hydrodynamicFunction(100.0).norm())
                .isLessThan(0.999 * plain.hydrodynamicFunction(100.0).norm());
    }

    @ParameterizedTest
    @CsvSource({"0.11, OUT_OF_RANGE", "0.09, NOTE", "0.011, NOTE"})
    void saysHowFarRarefactionGoes(double knudsen, Caveat.Weight weight) {
        List<Caveat> caveats = new OscillatingCylinder(1e-6, gas(OptionalDouble.of(knudsen * 1e-6))).caveats();
        assertThat(caveats).hasSize(1);
        assertThat(caveats.get(0).weight()).isEqualTo(weight);
        assertThat(caveats.get(0).text())
                .contains("mean free path")
                .endsWith(".")
                .doesNotContain("%%");
    }

    @Test
    void saysNothingWhereSlipDoesNotMatterAndThatItIsLeftOutWhereUnknown() {
        assertThat(new OscillatingCylinder(1e-5, gas(OptionalDouble.of(6.5e-8))).caveats())
                .isEmpty();
        assertThat(new OscillatingCylinder(1e-5, Medium.of("oil", 900.0, 0.1)).caveats())
                .isEmpty();
        List<Caveat> unknown = new OscillatingCylinder(1e-5, gas(OptionalDouble.empty())).caveats();
        assertThat(unknown).hasSize(1);
        assertThat(unknown.get(0).text()).contains("test gas is not known");
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -1.0, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesWhatIsNotPositive(double bad) {
        Medium medium = gas(OptionalDouble.empty());
        assertThatThrownBy(() -> new OscillatingCylinder(bad, medium)).isInstanceOf(IllegalArgumentException.class);
        OscillatingCylinder hair = new OscillatingCylinder(1e-5, medium);
        assertThatThrownBy(() -> hair.hydrodynamicFunction(bad)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> hair.forcePerVelocity(bad)).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void refusesTheCutAndNegativeSlip() {
        OscillatingCylinder hair = new OscillatingCylinder(1e-5, gas(OptionalDouble.empty()));
        Complex onTheCut = new Complex(-3.0, 0.0);
        assertThatThrownBy(() -> hair.hydrodynamicFunction(onTheCut)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> HydrodynamicFunction.of(1.0, -0.1)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> HydrodynamicFunction.of(1.0, Double.NaN)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> HydrodynamicFunction.of(Complex.ONE, -0.1))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
