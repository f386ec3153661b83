package flowshy.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.response.SuspensionStatement.Damping;
import flowshy.response.SuspensionStatement.Dashpot;
import flowshy.response.SuspensionStatement.Quality;
import flowshy.response.SuspensionStatement.Resonance;
import flowshy.response.SuspensionStatement.RingDown;
import flowshy.response.SuspensionStatement.Spring;
import flowshy.response.SuspensionStatement.Stiffness;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

/** What a device would be measured to do, given back as a statement, must give the suspension it was made of. */
class SuspensionSolverTest {
    private static final Medium AIR = Medium.of("air", 1.2, 1.82e-5);
    private static final Medium WATER = Medium.of("water", 998.2, 1.0016e-3);
    private static final Hair CLUB = Devices.hair(new Club(9e-4, 2e-5, 4e-4, 1e-4, 6e-5, End.ROUND), 1180.0);
    private static final double PLATE = 6e-17;
    private static final double DEPTH = 2e-6;

    private static List<Optional<Medium>> surroundings() {
        return List.of(Optional.empty(), Optional.of(AIR), Optional.of(WATER));
    }

    private static List<Stiffness> stiffnesses(Hair hair, Suspension truth) {
        List<Stiffness> all = new ArrayList<>(List.of(new Spring(truth.stiffness())));
        for (Optional<Medium> in : surroundings()) {
            all.add(new Resonance(new Oscillator(hair, truth, in).resonance() / (2.0 * FastMath.PI), in));
        }
        return all;
    }

    private static List<Damping> dampings(Hair hair, Suspension truth) {
        List<Damping> all = new ArrayList<>();
        for (Optional<Medium> in : surroundings()) {
            Oscillator device = new Oscillator(hair, truth, in);
            double omega = device.resonance();
            all.add(new Dashpot(device.totalDamping(omega, device.fluidInertia(omega)), in));
            Decay decay = device.decay();
            all.add(new Quality(decay.quality(), in));
            Complex s = decay.root().orElseThrow();
            all.add(new RingDown(OptionalDouble.empty(), -1.0 / s.getReal(), in));
        }
        return all;
    }

    private static Suspension solve(Hair hair, Optional<Stiffness> stiffness, Damping damping, Attitude attitude) {
        return new SuspensionSolver(
                        hair,
                        new SuspensionStatement(stiffness, damping, PLATE, DEPTH, attitude, OptionalDouble.of(1e-9)))
                .solve();
    }

    @Test
    void everyPairOfStatementsGivesTheSuspensionBack() {
        int solved = 0;
        for (Hair hair : List.of(Devices.ROD, CLUB)) {
            for (Attitude attitude : Attitude.values()) {
                Suspension truth = Devices.suspension(6e-9, 7e-13, PLATE, DEPTH, attitude);
                for (Stiffness stiffness : stiffnesses(hair, truth)) {
                    for (Damping damping : dampings(hair, truth)) {
                        Suspension found = solve(hair, Optional.of(stiffness), damping, attitude);
                        String pair = stiffness + " with " + damping;
                        assertThat(found.stiffness() / truth.stiffness())
                                .as(pair)
                                .isCloseTo(1.0, within(1e-10));
                        assertThat(found.damping() / truth.damping()).as(pair).isCloseTo(1.0, within(1e-10));
                        assertThat(found.plateInertia()).isEqualTo(PLATE);
                        assertThat(found.pivotDepth()).isEqualTo(DEPTH);
                        assertThat(found.attitude()).isEqualTo(attitude);
                        assertThat(found.readoutNoise()).hasValue(1e-9);
                        solved++;
                    }
                }
            }
        }
        assertThat(solved).isEqualTo(2 * 3 * 4 * 9);
    }

    @Test
    void aSwingWithItsFrequencyGivesBoth() {
        int solved = 0;
        for (Hair hair : List.of(Devices.ROD, CLUB)) {
            for (Attitude attitude : Attitude.values()) {
                Suspension truth = Devices.suspension(6e-9, 7e-13, PLATE, DEPTH, attitude);
                for (Optional<Medium> in : surroundings()) {
                    Complex s = new Oscillator(hair, truth, in).decay().root().orElseThrow();
                    OptionalDouble frequency = OptionalDouble.of(s.getImaginary() / (2.0 * FastMath.PI));
                    RingDown swing = new RingDown(frequency, -1.0 / s.getReal(), in);
                    Suspension found = solve(hair, Optional.empty(), swing, attitude);
                    assertThat(found.stiffness() / truth.stiffness())
                            .as("%s", swing)
                            .isCloseTo(1.0, within(1e-10));
                    assertThat(found.damping() / truth.damping())
                            .as("%s", swing)
                            .isCloseTo(1.0, within(1e-10));
                    solved++;
                }
            }
        }
        assertThat(solved).isEqualTo(18);
    }

    /** Vacuum, by hand: S = J ω², R = JωQ⁻¹ and 2J/τ. */
    @Test
    void vacuumByHand() {
        double inertia = Devices.ROD.inertia(DEPTH) + PLATE;
        double omega = 2.0 * FastMath.PI * 300.0;
        Stiffness resonance = new Resonance(300.0, Optional.empty());
        Attitude level = Attitude.HORIZONTAL;
        Suspension byQuality = solve(Devices.ROD, Optional.of(resonance), new Quality(12.0, Optional.empty()), level);
        assertThat(byQuality.stiffness() / (inertia * omega * omega)).isCloseTo(1.0, within(1e-13));
        assertThat(byQuality.damping() / (inertia * omega / 12.0)).isCloseTo(1.0, within(1e-11));
        Damping ring = new RingDown(OptionalDouble.empty(), 0.02, Optional.empty());
        Suspension byDecay = solve(Devices.ROD, Optional.of(resonance), ring, level);
        assertThat(byDecay.damping() / (2.0 * inertia / 0.02)).isCloseTo(1.0, within(1e-11));
        Damping swing = new RingDown(OptionalDouble.of(300.0), 0.02, Optional.empty());
        Suspension both = solve(Devices.ROD, Optional.empty(), swing, level);
        assertThat(both.damping() / (2.0 * inertia / 0.02)).isCloseTo(1.0, within(1e-12));
        assertThat(both.stiffness() / (inertia * (omega * omega + 2500.0))).isCloseTo(1.0, within(1e-12));
    }

    /** Overdamped devices: Q = S/(ωR) comes back where no root of a higher quality stands in the way. */
    @Test
    void aDeviceThatCreepsGivesItsDampingBack() {
        Suspension truth = Devices.suspension(6e-9, 6e-11, PLATE, DEPTH, Attitude.UPRIGHT);
        int solved = 0;
        for (Optional<Medium> in : surroundings()) {
            Decay decay = new Oscillator(Devices.ROD, truth, in).decay();
            assertThat(decay.overdamped()).isTrue();
            Suspension found = solve(
                    Devices.ROD, Optional.of(new Spring(6e-9)), new Quality(decay.quality(), in), Attitude.UPRIGHT);
            assertThat(found.damping() / 6e-11).isCloseTo(1.0, within(1e-10));
            solved++;
        }
        assertThat(solved).isEqualTo(3);
    }

    /** In water a soft device begins to swing at S/(ωR) = 0.32, with a quality of 0.55: nothing has 0.45. */
    @Test
    void refusesAQualityInTheGapBetweenCreepingAndSwinging() {
        refused("quality", Optional.of(new Spring(4e-11)), new Quality(0.45, Optional.of(WATER)), Attitude.HORIZONTAL)
                .hasMessageContaining("no device has a quality factor of 0.45")
                .hasMessageContaining("state a damping");
    }

    /** A softer device that swings slowly against its resonance: |s| is 0.4 of it. */
    @Test
    void findsASwingFarBelowTheResonance() {
        Suspension truth = Devices.suspension(8e-12, 1e-15, PLATE, DEPTH, Attitude.HORIZONTAL);
        Oscillator device = new Oscillator(Devices.ROD, truth, Optional.of(WATER));
        Complex s = device.decay().root().orElseThrow();
        assertThat(s.norm()).isLessThan(0.6 * device.resonance());
        Suspension found = solve(
                Devices.ROD,
                Optional.of(new Spring(8e-12)),
                new RingDown(OptionalDouble.empty(), -1.0 / s.getReal(), Optional.of(WATER)),
                Attitude.HORIZONTAL);
        // the fluid gives a thousand times the damping that is sought
        assertThat(found.damping() / 1e-15).isCloseTo(1.0, within(1e-6));
    }

    @Test
    void refusesMoreQualityThanTheFluidAllows() {
        Suspension free = Devices.suspension(6e-9, 0.0, PLATE, DEPTH, Attitude.UPRIGHT);
        double most =
                new Oscillator(Devices.ROD, free, Optional.of(AIR)).decay().quality();
        refused("quality", Optional.of(new Spring(6e-9)), new Quality(1.01 * most, Optional.of(AIR)), Attitude.UPRIGHT)
                .hasMessageContaining("above what the fluid on the hair alone allows")
                .hasMessageContaining("air");
        // exactly as much as it allows leaves no damping of the suspension's own
        Suspension found = solve(
                Devices.ROD, Optional.of(new Spring(6e-9)), new Quality(most, Optional.of(AIR)), Attitude.UPRIGHT);
        assertThat(found.damping()).isBetween(0.0, 1e-20);
    }

    @Test
    void refusesLessDampingThanTheFluidGives() {
        Oscillator free = new Oscillator(
                Devices.ROD, Devices.suspension(6e-9, 0.0, PLATE, DEPTH, Attitude.UPRIGHT), Optional.of(WATER));
        double omega = free.resonance();
        double least = free.totalDamping(omega, free.fluidInertia(omega));
        refused(
                        "damping",
                        Optional.of(new Spring(6e-9)),
                        new Dashpot(0.99 * least, Optional.of(WATER)),
                        Attitude.UPRIGHT)
                .hasMessageContaining("less than the fluid on the hair alone gives");
        Complex s = free.decay().root().orElseThrow();
        refused(
                        "ring-down",
                        Optional.of(new Spring(6e-9)),
                        new RingDown(OptionalDouble.empty(), -1.02 / s.getReal(), Optional.of(WATER)),
                        Attitude.UPRIGHT)
                .hasMessageContaining("outlasts");
        refused(
                        "ring-down",
                        Optional.empty(),
                        new RingDown(
                                OptionalDouble.of(s.getImaginary() / (2.0 * FastMath.PI)),
                                -1.02 / s.getReal(),
                                Optional.of(WATER)),
                        Attitude.UPRIGHT)
                .hasMessageContaining("outlasts");
    }

    @Test
    void refusesAHairThatFallsOverAndAPendulumThatIsTooFast() {
        refused("stiffness", Optional.of(new Spring(1e-12)), new Quality(5.0, Optional.empty()), Attitude.UPRIGHT)
                .hasMessageContaining("falls over");
        // by its weight alone the hanging rod swings at 20 Hz or so
        refused(
                        "resonance",
                        Optional.of(new Resonance(5.0, Optional.empty())),
                        new Quality(5.0, Optional.empty()),
                        Attitude.HANGING)
                .hasMessageContaining("by gravity alone");
        refused(
                        "ring-down",
                        Optional.of(new Spring(6e-9)),
                        new RingDown(OptionalDouble.empty(), 1e-5, Optional.empty()),
                        Attitude.UPRIGHT)
                .hasMessageContaining("no swing");
        assertThatThrownBy(() -> new SuspensionStatement(
                        Optional.empty(),
                        new Quality(5.0, Optional.empty()),
                        0.0,
                        0.0,
                        Attitude.UPRIGHT,
                        OptionalDouble.empty()))
                .isInstanceOf(IllegalArgumentException.class);
    }

    private static org.assertj.core.api.AbstractThrowableAssert<?, ? extends Throwable> refused(
            String key, Optional<Stiffness> stiffness, Damping damping, Attitude attitude) {
        return assertThatThrownBy(() -> solve(Devices.ROD, stiffness, damping, attitude))
                .isInstanceOfSatisfying(
                        SuspensionException.class,
                        refusal -> assertThat(refusal.key()).isEqualTo(key));
    }
}
