package flowshy.torque;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.medium.Medium;
import flowshy.torque.finite.FiniteFactors;
import flowshy.torque.finite.FiniteHair;
import flowshy.torque.finite.LengthFactors;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;

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

    @Test
    void keepsTheIdentityOfMotionAndFlow() {
        TorqueModel model = TorqueModel.of(HAIR.seenAs(LengthModel.FINITE), AIR, 2e-6);
        for (double frequency : new double[] {20.0, 133.0, 900.0}) {
            Torques torques = model.at(2.0 * Math.PI * frequency);
            Complex rest = torques.open().add(torques.flow()).subtract(torques.carried());
            assertThat(rest.norm() / torques.open().norm()).isCloseTo(0.0, within(1e-13));
        }
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
