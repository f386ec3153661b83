package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.medium.Medium;
import flowshy.torque.TorqueModel;
import flowshy.torque.Torques;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class StripForcesTest {
    private static final Medium WATER = Medium.of("water", 998.2, 1.0016e-3);

    /** The factors refer to the strip theory that they will multiply: T = iω times that per acceleration, −iω times the inertia. */
    @ParameterizedTest
    @ValueSource(doubles = {10.0, 1e3, 1e5})
    void areTheStripsOfTheTorqueModels(double omega) {
        List<Profile> profiles = List.of(
                new Cylinder(800e-6, 40e-6),
                new Taper(800e-6, 40e-6, 10e-6),
                new Club(900e-6, 20e-6, 400e-6, 100e-6, 60e-6, Club.End.ROUND));
        for (Profile profile : profiles) {
            Torques model = TorqueModel.of(new Hair(profile, 1200.0, OptionalDouble.empty()), WATER, 3e-6)
                    .at(omega);
            Complex[] own = new StripForces(WATER, 3e-6, omega).torques(profile);
            Complex rate = new Complex(0.0, omega);
            assertThat(own[0].divide(model.flow().multiply(rate)).subtract(1.0).norm())
                    .isCloseTo(0.0, within(1e-7));
            assertThat(own[1].divide(model.fluidInertia().multiply(rate).negate())
                            .subtract(1.0)
                            .norm())
                    .isCloseTo(0.0, within(1e-7));
        }
    }
}
