package flowshy.verdict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Taper;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.stream.cover.Covers;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

class DeviceFactsTest {
    private static final Band BAND = new Band(20.0, 2000.0);

    /** The rod of 760 × 84 µm and 1190 kg/m³ by hand. */
    @Test
    void figuresOfARod() {
        DeviceFacts facts =
                DeviceFacts.of(Devices.held(Devices.HELD, OptionalDouble.of(3e9), Devices.AIR, Covers.OPEN), BAND);
        double mass = 1190.0 * FastMath.PI * 4.2e-5 * 4.2e-5 * 7.6e-4;
        close(facts.mass(), mass, 1e-13);
        close(facts.inertia(), mass * (7.6e-4 * 7.6e-4 / 3.0 + 4.2e-5 * 4.2e-5 / 4.0), 1e-13);
        close(facts.inertialTorque(), mass * 3.8e-4, 1e-13);
        close(facts.slenderness(), 760.0 / 84.0, 1e-13);
        double low = 2.0 * FastMath.PI * 20.0 * 1.2 / 1.82e-5;
        close(facts.womersley().least(), 4.2e-5 * FastMath.sqrt(low), 1e-12);
        close(facts.womersley().largest(), 4.2e-5 * FastMath.sqrt(100.0 * low), 1e-12);
        close(facts.layer().largest(), FastMath.sqrt(2.0 / low), 1e-12);
        close(facts.layer().least(), FastMath.sqrt(0.02 / low), 1e-12);
        assertThat(facts.knudsen()).isZero();
        close(facts.gravityStiffness(), -(1190.0 - 1.2) / 1190.0 * mass * 3.8e-4 * 9.80665, 1e-12);
        assertThat(facts.staticTilt()).isZero();
        double vacuum = FastMath.sqrt((4e-9 - mass * 3.8e-4 * 9.80665) / facts.inertia()) / (2.0 * FastMath.PI);
        close(facts.vacuum().orElseThrow().resonance(), vacuum, 1e-12);
        assertThat(facts.medium().orElseThrow().resonance()).isLessThan(vacuum);
        assertThat(facts.medium().orElseThrow().decay().quality())
                .isLessThan(facts.vacuum().orElseThrow().decay().quality());
        close(
                facts.bendingStiffness().orElseThrow(),
                3e9 * FastMath.PI * FastMath.pow(4.2e-5, 4) / 4.0 / (0.9 * 7.6e-4),
                1e-12);
    }

    /**
     * Uniform beam in a fluid: the fluid's mass lowers the frequency by √(1 + ρ Re Γ/ρ_h), Γ at that frequency (added mass of a
     * strip, as for the hair's turning).
     */
    @Test
    void bendingFrequencyCarriesTheFluidsMass() {
        for (var medium : new flowshy.medium.Medium[] {Devices.AIR, Devices.WATER}) {
            DeviceFacts facts =
                    DeviceFacts.of(Devices.held(Devices.HELD, OptionalDouble.of(3e9), medium, Covers.OPEN), BAND);
            double found = facts.bendingFrequency().orElseThrow();
            double vacuum = 1.8751040687
                    * 1.8751040687
                    * FastMath.sqrt(3e9 * 4.2e-5 * 4.2e-5 / (4.0 * 1190.0))
                    / (7.6e-4 * 7.6e-4 * 2.0 * FastMath.PI);
            double added = new OscillatingCylinder(4.2e-5, medium)
                    .hydrodynamicFunction(2.0 * FastMath.PI * found)
                    .getReal();
            close(found, vacuum / FastMath.sqrt(1.0 + medium.density() * added / 1190.0), 2e-7);
        }
    }

    @Test
    void leavesOutWhatIsNotKnown() {
        DeviceFacts bare = DeviceFacts.of(Devices.bare(new Taper(7e-4, 4e-5, 1e-5), 1190.0, Devices.AIR), BAND);
        assertThat(bare.vacuum()).isEmpty();
        assertThat(bare.medium()).isEmpty();
        assertThat(bare.gravityStiffness()).isZero();
        assertThat(bare.bendingFrequency()).isEmpty();
        assertThat(bare.bendingStiffness()).isEmpty();
        // the thin tip sets the least Womersley number, the thick base the largest
        close(bare.womersley().largest() / bare.womersley().least(), 40.0, 1e-12);
        Device falling = Devices.held(
                Devices.suspension(1e-12, Attitude.UPRIGHT), OptionalDouble.empty(), Devices.AIR, Covers.OPEN);
        assertThat(DeviceFacts.of(falling, BAND).medium()).isEmpty();
        assertThat(DeviceFacts.of(falling, BAND).gravityStiffness()).isNegative();
        Device thin = Devices.bare(new Taper(7e-4, 4e-5, 1e-5), 1190.0, Devices.gas(1e-6));
        close(DeviceFacts.of(thin, BAND).knudsen(), 0.1, 1e-12);
    }

    private static void close(double value, double expected, double tolerance) {
        assertThat(value / expected).isCloseTo(1.0, within(tolerance));
    }
}
