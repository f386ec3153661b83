package flowshy.torque;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.medium.Medium;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.stream.cover.VentedCover;
import flowshy.torque.finite.FiniteFactors;
import flowshy.torque.finite.FiniteHair;
import flowshy.torque.finite.LengthFactors;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** The whole hair in place of strips: the finite-element reference through the public model, the identity, and the curve between nodes. */
class FactoredTorquesTest {
    private static final Medium AIR = Medium.of("air", 1.204, 1.825e-5);
    private static final Hair HAIR = new Hair(new Cylinder(8e-4, 4e-5), 1200.0, OptionalDouble.empty());

    /** 800 × 80 um in air at 80 Hz: 3.929771e-11 + 1.973925e-11 i N·m per m/s (finite elements, see finite-length-reference). */
    @Test
    void agreesWithTheFiniteElementSolution() {
        double omega = 2.0 * Math.PI * 80.0;
        Torques torques =
                TorqueModel.of(HAIR.seenAs(LengthModel.FINITE), AIR, 0.0).at(omega);
        Complex perSpeed = torques.flow().multiply(new Complex(0.0, omega));
        Complex reference = new Complex(3.929771e-11, 1.973925e-11);
        assertThat(perSpeed.subtract(reference).norm() / reference.norm()).isCloseTo(0.0, within(0.005));
        Torques strips = TorqueModel.of(HAIR, AIR, 0.0).at(omega);
        assertThat(strips.flow().norm() / torques.flow().norm()).isCloseTo(0.945, within(0.01));
    }

    /** The study's default against the same: amplitude to 1 %, phase to 0.5°, cylinder and club, both torques. */
    @ParameterizedTest
    @CsvSource({
        "cylinder, 30, 2.997537e-11, 1.575073e-11",
        "cylinder, 80, 3.929771e-11, 1.973925e-11",
        "cylinder, 320, 5.492167e-11, 3.531043e-11",
        "cylinder, 3000, 1.083518e-10, 1.466368e-10",
        "club, 30, 4.221733e-11, 2.155774e-11",
        "club, 80, 5.425670e-11, 2.759920e-11",
        "club, 1000, 1.041991e-10, 1.118082e-10"
    })
    void theDefaultAgreesWithTheFiniteElementSolution(String shape, double frequency, double re, double im) {
        Profile profile =
                shape.equals("club") ? new Club(900e-6, 20e-6, 400e-6, 100e-6, 60e-6, Club.End.ROUND) : HAIR.profile();
        Hair hair = new Hair(profile, 1200.0, OptionalDouble.empty(), LengthModel.AUTO);
        double omega = 2.0 * Math.PI * frequency;
        Complex ratio = TorqueModel.of(hair, AIR, 0.0)
                .at(omega)
                .flow()
                .multiply(new Complex(0.0, omega))
                .divide(new Complex(re, im));
        assertThat(ratio.norm()).isCloseTo(1.0, within(0.01));
        assertThat(Math.toDegrees(ratio.getArgument())).isCloseTo(0.0, within(0.5));
    }

    /** T_open = T_carried − T_flow under every model of the length, for every shape, bare, under a roof and behind holes. */
    @ParameterizedTest
    @EnumSource(LengthModel.class)
    void keepsTheIdentityOfMotionAndFlow(LengthModel lengthModel) {
        List<Profile> profiles = List.of(
                HAIR.profile(),
                new Taper(7e-4, 4e-5, 0.0),
                new Club(9e-4, 2e-5, 4e-4, 1e-4, 6e-5, Club.End.ROUND),
                new Cylinder(3e-4, 1e-4));
        List<Cover> covers =
                List.of(Covers.OPEN, new RoofedCover(1.2e-3, 5e-3), new VentedCover(3, 1.5e-4, 3e-4, true, 6e-9, 3e-6));
        int checked = 0;
        for (Profile profile : profiles) {
            for (Cover cover : covers) {
                Hair hair = new Hair(profile, 1200.0, OptionalDouble.empty(), lengthModel);
                TorqueModel model = TorqueModel.of(hair, AIR, 2e-6, cover);
                for (double frequency : new double[] {3.0, 133.0, 4000.0}) {
                    Torques torques = model.at(2.0 * Math.PI * frequency);
                    Complex rest = torques.open().add(torques.flow()).subtract(torques.carried());
                    assertThat(rest.norm() / torques.open().norm()).isCloseTo(0.0, within(1e-12));
                    assertThat(torques.flow().norm()).isFinite().isPositive();
                    checked++;
                }
            }
        }
        assertThat(checked).isEqualTo(36);
    }

    /** A solution is of the hair, not of its fluid: the same layer in air and in water has the same factors, from one grid. */
    @Test
    void fluidsShareOneGrid() {
        Medium water = Medium.of("water", 998.0, 1.0e-3);
        Hair hair = HAIR.seenAs(LengthModel.AUTO);
        double omega = 400.0;
        double same = omega * water.kinematicViscosity() / AIR.kinematicViscosity();
        FiniteFactors air = LengthFactors.of(hair, AIR, 0.0).orElseThrow().at(omega);
        FiniteFactors wet = LengthFactors.of(hair, water, 0.0).orElseThrow().at(same);
        assertThat(wet.stream().subtract(air.stream()).norm()).isCloseTo(0.0, within(1e-12));
        assertThat(wet.rocking().subtract(air.rocking()).norm()).isCloseTo(0.0, within(1e-12));
    }

    /** A wider gap at the foot takes torque from the turning hair and leaves the stream's alone. */
    @Test
    void theGapAtTheFootReachesTheSolution() {
        Cylinder post = new Cylinder(3e-4, 1e-4);
        Hair narrow = new Hair(post, 1200.0, OptionalDouble.empty(), LengthModel.AUTO, OptionalDouble.of(2e-6));
        Hair wide = new Hair(post, 1200.0, OptionalDouble.empty(), LengthModel.AUTO, OptionalDouble.of(2e-5));
        Torques close = TorqueModel.of(narrow, AIR, 0.0).at(500.0);
        Torques open = TorqueModel.of(wide, AIR, 0.0).at(500.0);
        assertThat(close.fluidInertia().norm() / open.fluidInertia().norm()).isBetween(1.03, 1.3);
        assertThat(close.flow().divide(open.flow()).subtract(1.0).norm()).isCloseTo(0.0, within(2e-3));
    }

    /** In a closed cavity nothing is corrected: no stream reaches the hair, and its turning is the cavity's. */
    @Test
    void aCavityKeepsItsOwnTurning() {
        Cover sealed = new SealedCover(Optional.of(new Cavity(2e-3, 2e-3)));
        Hair hair = HAIR.seenAs(LengthModel.AUTO);
        assertThat(TorqueModel.of(hair, AIR, 0.0, sealed).at(500.0).fluidInertia())
                .isEqualTo(TorqueModel.of(HAIR, AIR, 0.0, sealed).at(500.0).fluidInertia());
        assertThat(TorqueModel.of(hair, AIR, 0.0, sealed).streamFactor(500.0)).isEmpty();
        assertThat(TorqueModel.of(hair, AIR, 0.0).streamFactor(500.0)).isPresent();
        assertThat(TorqueModel.of(HAIR, AIR, 0.0).streamFactor(500.0)).isEmpty();
    }

    @Test
    void theCurveBetweenNodesIsTheSolution() {
        LengthFactors factors =
                LengthFactors.of(HAIR.seenAs(LengthModel.FINITE), AIR, 0.0).orElseThrow();
        FiniteHair hair = new FiniteHair(HAIR.profile(), AIR, 0.0);
        for (double frequency : new double[] {31.0, 170.0, 760.0}) {
            double omega = 2.0 * Math.PI * frequency;
            FiniteFactors curve = factors.at(omega);
            FiniteFactors solved = hair.at(omega).factors();
            assertThat(curve.stream().subtract(solved.stream()).norm()).isCloseTo(0.0, within(2e-3));
            assertThat(curve.rocking().subtract(solved.rocking()).norm()).isCloseTo(0.0, within(2e-3));
        }
    }
}
