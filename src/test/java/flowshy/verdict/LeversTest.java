package flowshy.verdict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.torque.TorqueModel;
import flowshy.torque.Torques;
import flowshy.verdict.Levers.Lever;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

class LeversTest {
    private static final double FREQUENCY = 80.0;

    private static double rejection(Profile profile, double density, Medium medium) {
        return new Response(Devices.bare(profile, density, medium)).rejection(FREQUENCY);
    }

    /** Each lever is the same change made by hand on a hair of its own. */
    @Test
    void leversAreTheChangesMadeByHand() {
        for (Medium medium : List.of(Devices.AIR, Devices.WATER)) {
            Levers levers = Levers.at(Devices.bare(Devices.ROD, 1190.0, medium), FREQUENCY);
            double usual = rejection(Devices.ROD, 1190.0, medium);
            assertThat(levers.rejection()).isEqualTo(usual);
            assertThat(levers.levers().stream().map(Lever::what))
                    .containsExactly("all diameters +10 %", "all lengths +10 %", "hair density +10 %");
            assertThat(levers.levers().get(0).gain())
                    .isCloseTo(rejection(new Cylinder(7.6e-4, 4.62e-5), 1190.0, medium) - usual, within(1e-11));
            assertThat(levers.levers().get(1).gain())
                    .isCloseTo(rejection(new Cylinder(8.36e-4, 4.2e-5), 1190.0, medium) - usual, within(1e-11));
            assertThat(levers.levers().get(2).gain())
                    .isCloseTo(rejection(Devices.ROD, 1309.0, medium) - usual, within(1e-11));
        }
    }

    /** More density moves the open torque by −0.1 ρ_h P[1] and leaves the flow's; that is the whole gain. */
    @Test
    void moreDensityAddsToTheOpenTorqueAlone() {
        Device device = Devices.bare(Devices.ROD, 1190.0, Devices.WATER);
        Torques torques = TorqueModel.of(device.hair(), Devices.WATER, 0.0).at(2.0 * FastMath.PI * FREQUENCY);
        double solid = 1190.0 * FastMath.PI * 4.2e-5 * 4.2e-5 * 7.6e-4 * 7.6e-4 / 2.0;
        Complex heavier = torques.open().subtract(0.1 * solid);
        double gain = 20.0 * FastMath.log10(heavier.norm() / torques.open().norm());
        assertThat(Levers.at(device, FREQUENCY).levers().get(2).gain()).isCloseTo(gain, within(1e-10));
    }

    /** At the new edge the changed device has the old rejection. */
    @Test
    void theEdgeIsWhereTheOldRejectionReturns() {
        Device device = Devices.bare(Devices.ROD, 1190.0, Devices.AIR);
        Levers levers = Levers.at(device, FREQUENCY);
        double edge = levers.levers().get(2).edge().orElseThrow();
        assertThat(edge).isBetween(FREQUENCY / 8.0, FREQUENCY);
        Response heavier = new Response(Devices.bare(Devices.ROD, 1309.0, Devices.AIR));
        assertThat(heavier.rejection(edge)).isCloseTo(levers.rejection(), within(1e-7));
        // where the rejection no longer changes with frequency there is no such edge
        Device high = Devices.bare(Devices.ROD, 1190.0, Devices.WATER);
        assertThat(Levers.at(high, 1e9).levers().get(2).edge()).isEmpty();
    }

    /** The parts are those of the flow torque, and the largest of them is named. */
    @Test
    void partsAddUpToTheTorques() {
        for (Medium medium : List.of(Devices.AIR, Devices.WATER)) {
            for (double frequency : new double[] {5.0, 300.0, 1e7}) {
                Device device = Devices.bare(Devices.ROD, 1190.0, medium);
                Torques torques = TorqueModel.of(device.hair(), medium, 0.0).at(2.0 * FastMath.PI * frequency);
                Levers levers = Levers.at(device, frequency);
                double inPhase = levers.gradient() + levers.addedMass();
                assertThat(FastMath.hypot(inPhase, levers.drag())
                                / torques.flow().norm())
                        .isCloseTo(1.0, within(1e-12));
                assertThat(levers.inertial()).isEqualTo(FastMath.abs(torques.carried()));
                double largest = FastMath.max(levers.drag(), FastMath.max(levers.addedMass(), levers.gradient()));
                String expected = largest == levers.drag()
                        ? "viscous drag"
                        : largest == levers.addedMass() ? "added mass" : "the pressure gradient";
                assertThat(levers.dominant()).isEqualTo(expected);
            }
        }
        assertThat(Levers.at(Devices.bare(Devices.ROD, 1190.0, Devices.AIR), 20.0)
                        .dominant())
                .isEqualTo("viscous drag");
        assertThat(Levers.at(Devices.bare(Devices.ROD, 1190.0, Devices.WATER), 1e7)
                        .dominant())
                .isEqualTo("added mass");
    }

    /** A hair that has no room to become thicker is made thinner instead. */
    @Test
    void makesAHairThinnerThatCannotBecomeThicker() {
        Club full = new Club(9e-4, 2e-5, 7e-4, 1.4e-4, 6e-5, End.ROUND);
        Cylinder stout = new Cylinder(1e-4, 4.8e-5);
        for (Profile profile : List.of(full, stout)) {
            Levers levers = Levers.at(Devices.bare(profile, 1190.0, Devices.AIR), FREQUENCY);
            assertThat(levers.levers().get(0).what()).isEqualTo("all diameters -10 %");
            double thinner = rejection(profile.thickened(0.9), 1190.0, Devices.AIR);
            assertThat(levers.levers().get(0).gain()).isCloseTo(thinner - levers.rejection(), within(1e-11));
        }
    }

    @Test
    void explainsEveryEdgeAndEveryFailedLimit() {
        Device device = Devices.bare(Devices.ROD, 1190.0, Devices.AIR);
        Acceptance asked = new Acceptance(OptionalDouble.of(30.0), OptionalDouble.empty());
        BandsAnswer answer = new BandsQuestion(device, new Band(5.0, 5000.0), asked).answer();
        assertThat(answer.bands()).hasSize(2);
        assertThat(answer.verdict().decision()).isEqualTo(Decision.FAILS);
        List<Levers> all = Levers.of(answer);
        assertThat(all.stream().map(Levers::frequency))
                .containsExactly(5.0, answer.bands().get(1).from());
        BandsAnswer met = new BandsQuestion(device, new Band(1000.0, 5000.0), asked).answer();
        assertThat(met.verdict().decision()).isEqualTo(Decision.MEETS);
        assertThat(Levers.of(met)).isEmpty();
        BandsAnswer sealed = new BandsQuestion(
                        Devices.sealed(Devices.ROD, 1190.0, Devices.AIR), new Band(5.0, 5000.0), asked)
                .answer();
        assertThat(Levers.of(sealed)).isEmpty();
    }

    @Test
    void keepsTheModulusOfTheHair() {
        Hair hair = new Hair(Devices.ROD, 1190.0, OptionalDouble.of(3e9));
        assertThat(hair.reshaped(Devices.ROD.thickened(1.1)).youngsModulus()).hasValue(3e9);
    }
}
