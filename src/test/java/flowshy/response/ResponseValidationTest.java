package flowshy.response;

import static flowshy.math.ReferenceTable.number;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.math.ReferenceTable;
import flowshy.stream.cover.Covers;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ResponseValidationTest {
    /** A shape without strips is exact; strip integrals promise 1e-8 and keep 1e-10. */
    @Test
    void agreesWithArbitraryPrecision() {
        ReferenceTable table = ReferenceTable.of(getClass(), "responses.csv");
        assertThat(table.rows()).hasSize(16);
        for (Map<String, String> row : table.rows()) {
            Device device = Devices.named(row.get("device"));
            ResponsePoint point = new Response(device).at(number(row, "frequency_hz"));
            ResponsePoint sealed = new Response(Devices.sealed(device)).at(number(row, "frequency_hz"));
            near(point.motion().orElseThrow(), row, "motion");
            near(point.flow().orElseThrow(), row, "flow");
            near(sealed.motion().orElseThrow(), row, "sealed");
            assertThat(sealed.flow().orElseThrow().norm()).isZero();
            assertThat(point.thermalNoise().orElseThrow() / number(row, "noise_open"))
                    .as("%s", row)
                    .isCloseTo(1.0, within(1e-9));
            double rejection = 20.0
                    * FastMath.log10(FastMath.hypot(number(row, "motion_re"), number(row, "motion_im"))
                            / FastMath.hypot(number(row, "flow_re"), number(row, "flow_im")));
            assertThat(point.rejection()).as("%s", row).isCloseTo(rejection, within(1e-8));
            assertThat(new Response(device).rejection(number(row, "frequency_hz")))
                    .isEqualTo(point.rejection());
            assertThat(sealed.rejection()).isEqualTo(Double.POSITIVE_INFINITY);
        }
    }

    private static void near(Complex value, Map<String, String> row, String column) {
        Complex expected = new Complex(number(row, column + "_re"), number(row, column + "_im"));
        assertThat(value.subtract(expected).norm() / expected.norm())
                .as("%s of %s", column, row)
                .isCloseTo(0.0, within(1e-9));
    }

    /**
     * Base-excited mass on a spring, any handbook of vibration: relative movement per acceleration over its static value is
     * 1/(1 − r² + 2iζr). A hair in hardly any medium is that.
     */
    @ParameterizedTest
    @CsvSource({
        "0.1, 0.7, 1.00015, 1e-5",
        "0.2, 0.7, 1.0000, 5e-5",
        "0.5, 0.7, 0.97474036, 5e-9",
        "0.2, 0, 1.0416667, 5e-8",
        "0.33333333333333333, 0, 1.125, 1e-9",
        "0.2, 0.05, 1.0414407, 5e-8",
        // undamped limits of the trade: +5 %, +10 % and +3 dB
        "0.21821789, 0, 1.05, 1e-8",
        "0.30151134, 0, 1.1, 1e-8",
        "0.54042041, 0, 1.41253754, 1e-7"
    })
    void followsTheMassOnASpring(double r, double dampingRatio, double magnitude, double lastDigit) {
        double stiffness = 3e-9;
        double inertia = Devices.ROD.inertia(0.0) + 2e-17;
        double natural = FastMath.sqrt(stiffness / inertia);
        double damping = 2.0 * dampingRatio * FastMath.sqrt(stiffness * inertia);
        Suspension suspension = Devices.suspension(stiffness, damping, 2e-17, 0.0, Attitude.HORIZONTAL);
        Device device = Devices.device(Devices.ROD, suspension, Devices.HARDLY_ANY, Covers.OPEN);
        ResponsePoint point = new Response(device).at(r * natural / (2.0 * FastMath.PI));
        double arm = 0.5 * 7.6e-4;
        double still = Devices.ROD.mass() * arm / stiffness;
        assertThat(point.motion().orElseThrow().norm() / still).isCloseTo(magnitude, within(lastDigit));
        // the hair stays behind: against the acceleration below the resonance
        assertThat(point.motion().orElseThrow().getReal()).isNegative();
        double lag = FastMath.atan2(2.0 * dampingRatio * r, 1.0 - r * r);
        double phase = point.motion().orElseThrow().negate().getArgument();
        assertThat(phase).isCloseTo(-lag, within(1e-9));
    }

    /** The torque of thermal noise, √(4 k T R): 1.28716e-16 N·m/√Hz at 300 K and R = 1e-12 N·m·s/rad. */
    @Test
    void thermalNoiseIsThatOfTheDamping() {
        Suspension suspension = Devices.suspension(3e-9, 1e-12, 0.0, 0.0, Attitude.UPRIGHT);
        Device device = Devices.device(Devices.ROD, suspension, Devices.HARDLY_ANY, Covers.OPEN);
        ResponsePoint point = new Response(device).at(100.0);
        double torque =
                point.thermalNoise().orElseThrow() * point.motionTorque().norm();
        assertThat(torque / 1.2871592e-16).isCloseTo(1.0, within(5e-8));
    }

    /**
     * Proof mass: a_n = √(4 k T ω₀/(m Q)), 3.2264e-4 m/s²/√Hz at 300 K, 1 kHz, 1e-9 kg, Q = 1. For a slender hair the turning
     * inertia m L²/3 on the arm L/2 counts as the mass 3m/4.
     */
    @Test
    void thermalNoiseIsThatOfAProofMass() {
        double length = 4e-3;
        double radius = 2e-5;
        double mass = 1e-9 * 4.0 / 3.0;
        Hair hair = Devices.hair(new Cylinder(length, radius), mass / (FastMath.PI * radius * radius * length));
        double natural = 2.0 * FastMath.PI * 1000.0;
        double inertia = hair.inertia(0.0);
        Suspension suspension =
                Devices.suspension(inertia * natural * natural, inertia * natural, 0.0, 0.0, Attitude.HORIZONTAL);
        Device device = Devices.device(hair, suspension, Devices.HARDLY_ANY, Covers.OPEN);
        // the section's own inertia adds 3 (a/L)²/4 to the square
        assertThat(new Response(device).at(37.0).thermalNoise().orElseThrow() / 3.2264296e-4)
                .isCloseTo(1.0, within(1e-5));
    }

    /** Readout noise is an angle: divided by the response it is an acceleration. */
    @Test
    void readoutNoiseIsReferredToAcceleration() {
        Suspension quiet = Devices.suspension(3e-9, 1e-12, 0.0, 0.0, Attitude.UPRIGHT);
        Suspension noisy = new Suspension(3e-9, 1e-12, 0.0, 0.0, Attitude.UPRIGHT, OptionalDouble.of(2e-9));
        Device device = Devices.named("cylinder in air");
        ResponsePoint point =
                new Response(Devices.device(device.hair(), noisy, device.outside(), Covers.OPEN)).at(90.0);
        assertThat(point.readoutNoise().orElseThrow()
                        * point.motion().orElseThrow().norm())
                .isCloseTo(2e-9, within(1e-22));
        assertThat(new Response(Devices.device(device.hair(), quiet, device.outside(), Covers.OPEN))
                        .at(90.0)
                        .readoutNoise())
                .isEmpty();
    }

    /** The response turns through 180° across the resonance (common practice, no source), and through 90° at it. */
    @Test
    void turnsThroughHalfACircleAcrossTheResonance() {
        for (String name : new String[] {"cylinder in air", "taper in water", "club in helium"}) {
            Device device = Devices.named(name);
            Response response = new Response(device);
            Oscillator oscillator = response.oscillator().orElseThrow();
            double resonance = oscillator.resonance() / (2.0 * FastMath.PI);
            double before = phase(response, resonance * 1e-4);
            double at = phase(response, resonance);
            double beyond = phase(response, resonance * 1e5);
            assertThat(before).as(name).isCloseTo(0.0, within(3.0));
            assertThat(at).as(name).isCloseTo(-90.0, within(1e-8));
            assertThat(beyond).as(name).isBetween(-180.0, -175.0);
        }
    }

    /** Phase of the angle against the torque that turns it [°]. */
    private static double phase(Response response, double frequency) {
        ResponsePoint point = response.at(frequency);
        return FastMath.toDegrees(
                point.motion().orElseThrow().divide(point.motionTorque()).getArgument());
    }

    /** Without a suspension the torques are known, the movements are not. */
    @Test
    void knowsOnlyTorquesWithoutASuspension() {
        Device held = Devices.named("cylinder in air");
        Device device = new Device(held.hair(), Optional.empty(), held.outside(), Covers.OPEN, held.around());
        ResponsePoint point = new Response(device).at(60.0);
        assertThat(point.motion()).isEmpty();
        assertThat(point.flow()).isEmpty();
        assertThat(point.thermalNoise()).isEmpty();
        assertThat(point.readoutNoise()).isEmpty();
        // the pivot then lies in the surface, so the rejection differs a little from that of the device
        assertThat(point.rejection()).isCloseTo(new Response(held).at(60.0).rejection(), within(0.05));
        assertThat(new Response(device).device()).isEqualTo(device);
    }

    /** Nor is a movement given of a hair that falls over. */
    @Test
    void givesNoMovementOfAHairThatFallsOver() {
        Device device = Devices.device(
                Devices.ROD,
                Devices.suspension(1e-12, 0.0, 0.0, 0.0, Attitude.UPRIGHT),
                Devices.named("cylinder in air").outside(),
                Covers.OPEN);
        ResponsePoint point = new Response(device).at(60.0);
        assertThat(point.motion()).isEmpty();
        assertThat(point.flow()).isEmpty();
        assertThat(point.motionTorque().norm()).isPositive();
    }

    /** a = ω u |T_flow|/|T_motion|: 30 dB at 80 Hz still read 1 mm/s as 0.016 m/s² (2π 80 · 10^(−30/20) = 15.9 per m/s). */
    @Test
    void flatteringRejectionIsTurnedIntoAnEquivalentAcceleration() {
        ResponsePoint point = new Response(Devices.named("cylinder in air")).at(80.0);
        assertThat(point.equivalent())
                .isCloseTo(
                        2.0 * FastMath.PI * 80.0 * FastMath.pow(10.0, -point.rejection() / 20.0),
                        within(1e-12 * point.equivalent()));
        assertThat(new Response(Devices.sealed(Devices.named("cylinder in air")))
                        .at(80.0)
                        .equivalent())
                .isZero();
    }
}
