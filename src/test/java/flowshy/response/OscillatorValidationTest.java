package flowshy.response;

import static flowshy.math.ReferenceTable.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Moments;
import flowshy.math.ReferenceTable;
import flowshy.medium.Medium;
import flowshy.stream.cover.Covers;
import flowshy.torque.TorqueModel;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class OscillatorValidationTest {
    private static Oscillator of(Device device) {
        return new Response(device).oscillator().orElseThrow();
    }

    /** Roots found apart by the secant method on the same equation with integrals of 22 digits. */
    @Test
    void swingsAsArbitraryPrecisionSays() {
        ReferenceTable table = ReferenceTable.of(getClass(), "swings.csv");
        assertThat(table.rows()).hasSize(4);
        for (Map<String, String> row : table.rows()) {
            Oscillator oscillator = of(Devices.named(row.get("device")));
            double omega = oscillator.resonance();
            assertThat(omega / (2.0 * FastMath.PI) / number(row, "resonance_hz"))
                    .as("%s", row)
                    .isCloseTo(1.0, within(1e-9));
            assertThat(oscillator.denominator(omega).getReal() / oscillator.stiffness())
                    .as("%s", row)
                    .isCloseTo(0.0, within(1e-12));
            double total = oscillator.totalDamping(omega, oscillator.fluidInertia(omega));
            assertThat(oscillator.stiffness() / (omega * total) / number(row, "coarse_quality"))
                    .as("%s", row)
                    .isCloseTo(1.0, within(1e-9));
            Decay decay = oscillator.decay();
            assertThat(decay.overdamped()).isFalse();
            assertThat(decay.quality() / number(row, "quality")).as("%s", row).isCloseTo(1.0, within(1e-8));
            Complex root = new Complex(number(row, "root_re"), number(row, "root_im"));
            assertThat(decay.root().orElseThrow().subtract(root).norm() / root.norm())
                    .as("%s", row)
                    .isCloseTo(0.0, within(1e-9));
        }
    }

    /** Handbook: f₀ = √(S/J)/2π, Q = √(JS)/R in vacuum, and the swing decays with R/2J. */
    @ParameterizedTest
    @ValueSource(doubles = {0.6, 1.0, 3.0, 50.0, 4000.0})
    void vacuum(double quality) {
        double inertia = Devices.ROD.inertia(3e-6) + 5e-17;
        double stiffness = 4e-9;
        double damping = FastMath.sqrt(inertia * stiffness) / quality;
        Suspension suspension = Devices.suspension(stiffness, damping, 5e-17, 3e-6, Attitude.HORIZONTAL);
        Oscillator oscillator = new Oscillator(Devices.ROD, suspension, Optional.empty());
        double natural = FastMath.sqrt(stiffness / inertia);
        assertThat(oscillator.resonance() / natural).isCloseTo(1.0, within(1e-14));
        Decay decay = oscillator.decay();
        assertThat(decay.quality() / quality).isCloseTo(1.0, within(1e-11));
        Complex root = decay.root().orElseThrow();
        assertThat(-root.getReal() / (0.5 * damping / inertia)).isCloseTo(1.0, within(1e-11));
        assertThat(root.getImaginary() / (natural * FastMath.sqrt(1.0 - 0.25 / (quality * quality))))
                .isCloseTo(1.0, within(1e-12));
        assertThat(oscillator.inertia()).isEqualTo(inertia);
    }

    @Test
    void withoutAnyDampingItSwingsForEver() {
        Suspension suspension = Devices.suspension(4e-9, 0.0, 0.0, 0.0, Attitude.UPRIGHT);
        Decay decay = new Oscillator(Devices.ROD, suspension, Optional.empty()).decay();
        assertThat(decay.quality()).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(decay.overdamped()).isFalse();
        assertThat(decay.root()).isEmpty();
    }

    /** Vacuum, R = √(JS)/0.3: creeps, and says so with Q = S/(ωR) = 0.3. */
    @Test
    void creepsWhereTheDampingIsHigh() {
        double stiffness = 4e-9;
        double damping = FastMath.sqrt(Devices.ROD.inertia(0.0) * stiffness) / 0.3;
        Suspension suspension = Devices.suspension(stiffness, damping, 0.0, 0.0, Attitude.HORIZONTAL);
        Decay decay = new Oscillator(Devices.ROD, suspension, Optional.empty()).decay();
        assertThat(decay.overdamped()).isTrue();
        assertThat(decay.quality()).isCloseTo(0.3, within(1e-12));
        assertThat(decay.root()).isEmpty();
    }

    /** A hair in thick oil creeps: Q is S/(ωR) at the frequency where Re D vanishes. */
    @Test
    void creepsInThickOil() {
        Medium oil = Medium.of("oil", 970.0, 0.97);
        Oscillator oscillator = of(Devices.device(
                Devices.ROD, Devices.suspension(4e-9, 0.0, 0.0, 0.0, Attitude.UPRIGHT), oil, Covers.OPEN));
        Decay decay = oscillator.decay();
        assertThat(decay.overdamped()).isTrue();
        double omega = oscillator.resonance();
        double expected = oscillator.stiffness() / oscillator.denominator(omega).getImaginary();
        assertThat(decay.quality() / expected).isCloseTo(1.0, within(1e-12));
        assertThat(decay.quality()).isLessThan(0.2);
    }

    /**
     * Where S/(ωR) lies below a half a liquid may still let the hair swing, because its drag lags: the root decides, as long as
     * its quality is above 0.55; below, S/(ωR) is told.
     */
    @Test
    void swingsWhereTheRootSaysSoAndNotTheDampingAtTheResonance() {
        Medium water = Medium.of("water", 998.2, 1.0016e-3);
        int swings = 0;
        int creeps = 0;
        for (double stiffness = 1e-13; stiffness < 1e-10; stiffness *= 1.2) {
            Oscillator oscillator = of(Devices.device(
                    Devices.ROD,
                    Devices.suspension(stiffness, 0.0, 0.0, 0.0, Attitude.HORIZONTAL),
                    water,
                    Covers.OPEN));
            double omega = oscillator.resonance();
            double coarse =
                    oscillator.stiffness() / oscillator.denominator(omega).getImaginary();
            Decay decay = oscillator.decay();
            if (decay.overdamped()) {
                assertThat(decay.quality()).isCloseTo(coarse, within(1e-12)).isLessThan(0.35);
                creeps++;
            } else {
                assertThat(decay.quality()).isGreaterThan(0.55);
                assertThat(coarse).isBetween(0.3, 1.0);
                swings += coarse < 0.5 ? 1 : 0;
            }
        }
        assertThat(swings).isGreaterThan(5);
        assertThat(creeps).isGreaterThan(5);
    }

    /** The root put into s²(J + J_plate + J_fluid(s)) + sR + S + S_g, with each part taken from its own package. */
    @ParameterizedTest
    @ValueSource(strings = {"cylinder in air", "taper in water", "club in helium", "cylinder in water slow"})
    void theRootSatisfiesTheEquationOfMotion(String name) {
        Device device = Devices.named(name);
        Suspension held = device.suspension().orElseThrow();
        Complex s = of(device).decay().root().orElseThrow();
        Moments moments = Moments.of(device.hair().profile(), held.pivotDepth());
        double difference = device.hair().density() - device.around().density();
        double gravity = held.attitude().sign() * difference * 9.80665 * moments.first();
        Complex turning = TorqueModel.of(device.hair(), device.around(), held.pivotDepth())
                .fluidInertia(s)
                .add(device.hair().density() * moments.second() + held.plateInertia());
        Complex rest =
                s.multiply(s).multiply(turning).add(s.multiply(held.damping())).add(held.stiffness() + gravity);
        assertThat(rest.norm() / held.stiffness()).isCloseTo(0.0, within(1e-11));
        assertThat(s.getImaginary()).isPositive();
        assertThat(s.getReal()).isNegative();
    }

    /** Hanging slender rod and no spring: √(3g/2L), the compound pendulum of any handbook. */
    @Test
    void hangingRodIsAPendulum() {
        double length = 5e-3;
        Hair hair = Devices.hair(new Cylinder(length, 1e-5), 2000.0);
        Suspension suspension = Devices.suspension(1e-25, 0.0, 0.0, 0.0, Attitude.HANGING);
        Oscillator oscillator = new Oscillator(hair, suspension, Optional.empty());
        double expected = FastMath.sqrt(3.0 * Oscillator.STANDARD_GRAVITY / (2.0 * length));
        // the section's own inertia: 3 (a/L)²/8 of it
        assertThat(oscillator.resonance() / expected).isCloseTo(1.0, within(2e-6));
    }

    /** S_g = −(ρ_h − ρ) g A L²/2 upright, the opposite hanging, none horizontal; a light hair in a liquid is held up. */
    @Test
    void gravityWorksAgainstTheUprightHairLessItsBuoyancy() {
        double half = 0.5 * 7.6e-4 * 7.6e-4 * FastMath.PI * 4.2e-5 * 4.2e-5 * 9.80665;
        Medium water = Medium.of("water", 998.2, 1.0016e-3);
        Hair light = Devices.hair(new Cylinder(7.6e-4, 4.2e-5), 400.0);
        close(gravity(Devices.ROD, Attitude.UPRIGHT, Optional.empty()), -1190.0 * half);
        close(gravity(Devices.ROD, Attitude.HANGING, Optional.empty()), 1190.0 * half);
        close(gravity(Devices.ROD, Attitude.UPRIGHT, Optional.of(water)), -(1190.0 - 998.2) * half);
        close(gravity(light, Attitude.UPRIGHT, Optional.of(water)), (998.2 - 400.0) * half);
        assertThat(gravity(Devices.ROD, Attitude.HORIZONTAL, Optional.of(water)))
                .isZero();
        Suspension level = Devices.suspension(4e-9, 0.0, 0.0, 0.0, Attitude.HORIZONTAL);
        close(new Oscillator(Devices.ROD, level, Optional.of(water)).staticTilt(), (1190.0 - 998.2) * half / 4e-9);
        Suspension upright = Devices.suspension(4e-9, 0.0, 0.0, 0.0, Attitude.UPRIGHT);
        assertThat(new Oscillator(Devices.ROD, upright, Optional.of(water)).staticTilt())
                .isZero();
    }

    private static double gravity(Hair hair, Attitude attitude, Optional<Medium> in) {
        return new Oscillator(hair, Devices.suspension(4e-9, 0.0, 0.0, 0.0, attitude), in).gravityStiffness();
    }

    private static void close(double value, double expected) {
        assertThat(value / expected).isCloseTo(1.0, within(1e-13));
    }

    @Test
    void aHairThatFallsOverHasNoResonance() {
        Suspension soft = Devices.suspension(1e-12, 0.0, 0.0, 0.0, Attitude.UPRIGHT);
        Oscillator falling = new Oscillator(Devices.ROD, soft, Optional.empty());
        assertThat(falling.stands()).isFalse();
        assertThat(falling.stiffness()).isNegative();
        assertThatThrownBy(falling::resonance)
                .isInstanceOf(IllegalStateException.class)
                .hasMessageContaining("no resonance");
        Suspension hanging = Devices.suspension(1e-12, 0.0, 0.0, 0.0, Attitude.HANGING);
        assertThat(new Oscillator(Devices.ROD, hanging, Optional.empty()).stands())
                .isTrue();
    }

    /** A medium adds mass and damping, never takes them away. */
    @Test
    void everyMediumLowersTheResonance() {
        int compared = 0;
        for (Medium medium : new Medium[] {
            Medium.of("air", 1.2, 1.82e-5), Medium.of("water", 998.2, 1.0016e-3), Medium.of("oil", 970.0, 0.97)
        }) {
            for (double stiffness = 1e-11; stiffness < 2e-7; stiffness *= 10.0) {
                Suspension suspension = Devices.suspension(stiffness, 1e-13, 0.0, 0.0, Attitude.HORIZONTAL);
                Oscillator vacuum = new Oscillator(Devices.ROD, suspension, Optional.empty());
                Oscillator there = new Oscillator(Devices.ROD, suspension, Optional.of(medium));
                assertThat(there.resonance()).isPositive().isLessThan(vacuum.resonance());
                assertThat(there.decay().quality()).isLessThan(vacuum.decay().quality());
                compared++;
            }
        }
        assertThat(compared).isEqualTo(15);
    }
}
