package flowshy.verdict.lid;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.math.LogTable;
import flowshy.medium.Medium;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.MeasuredCover;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** The attenuation asked of a cover, put back as one that was measured so. */
class RequiredAttenuationTest {
    private static final Medium AIR = Medium.of("air of the test", 1.2, 1.82e-5);
    private static final Medium OIL = Medium.of("oil of the test", 850.0, 0.02);

    private static Device device(Profile profile, double density, Medium medium) {
        Hair hair = new Hair(profile, density, OptionalDouble.empty());
        return new Device(hair, Optional.empty(), medium, Covers.OPEN, medium);
    }

    private static Device under(Device device, double attenuation, double frequency) {
        LogTable table = new LogTable(List.of(0.5 * frequency, 2.0 * frequency), List.of(attenuation, attenuation));
        MeasuredCover cover = new MeasuredCover("put back", table, Optional.empty());
        return new Device(device.hair(), device.suspension(), device.outside(), cover, device.around());
    }

    @Test
    void putBackItGivesTheMargin() {
        int asked = 0;
        for (Profile profile : List.of(new Cylinder(8e-4, 4e-5), new Taper(6e-4, 5e-5, 1e-5))) {
            for (Medium medium : List.of(AIR, OIL)) {
                for (double density : new double[] {700.0, 1190.0, 7900.0}) {
                    Device device = device(profile, density, medium);
                    for (double margin : new double[] {0.5, 14.0, 20.0, 60.0, 120.0}) {
                        for (double frequency : new double[] {3.0, 110.0, 4000.0}) {
                            double bare = new Response(device).rejection(frequency);
                            double attenuation = RequiredAttenuation.at(device, margin, frequency)
                                    .attenuation();
                            double covered = new Response(under(device, attenuation, frequency)).rejection(frequency);
                            if (attenuation > 0.0) {
                                assertThat(covered).isCloseTo(margin, within(1e-9));
                                asked++;
                            } else {
                                assertThat(bare).isGreaterThanOrEqualTo(margin);
                            }
                            // more attenuation than asked never undoes it
                            double more =
                                    new Response(under(device, attenuation + 3.0, frequency)).rejection(frequency);
                            assertThat(more).isGreaterThan(margin);
                        }
                    }
                }
            }
        }
        assertThat(asked).isGreaterThan(100);
    }

    @Test
    void ofABareDeviceAloneItsOwnCoverIsTakenOff() {
        Device device = device(new Cylinder(8e-4, 4e-5), 1190.0, AIR);
        Device roofed = under(device, 30.0, 110.0);
        assertThat(RequiredAttenuation.at(roofed, 40.0, 110.0)).isEqualTo(RequiredAttenuation.at(device, 40.0, 110.0));
    }

    /** As dense as the fluid carried along the hair has no motion to read, however little flow reaches it. */
    @Test
    void noAttenuationIsEnoughWhereNothingIsLeftToRead() {
        RequiredAttenuation required =
                RequiredAttenuation.at(device(new Cylinder(8e-4, 4e-5), 850.0, OIL), 20.0, 110.0);
        assertThat(required.attenuation()).isEqualTo(Double.POSITIVE_INFINITY);
    }
}
