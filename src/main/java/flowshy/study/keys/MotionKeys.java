package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.List;

/** Keys of the motion that is to be read. */
final class MotionKeys {
    private static final Measure STRENGTH = Measure.amplitude(Dimension.ACCELERATION, "1e-12 m/s2", "1e9 m/s2");

    private MotionKeys() {}

    static Group group() {
        return Group.of(
                "motion",
                List.of(
                        Key.optional("smallest", STRENGTH, "smallest acceleration to be read"),
                        Key.optional("full-scale", STRENGTH, "largest acceleration to be read"),
                        Key.optional("spectrum", spectrum(), "density of the motion itself")));
    }

    private static Group spectrum() {
        Points points = new Points(
                Key.required("frequency", SuspensionKeys.FREQUENCY, "frequency of a break point"),
                Key.required(
                        "density",
                        Measure.of(Dimension.ACCELERATION_DENSITY, "0 (m/s2)2/Hz", "1e18 (m/s2)2/Hz"),
                        "one-sided density there"));
        return Group.of(
                        "motion spectrum",
                        List.of(
                                Key.optional("points", points, "break points, straight between them on log-log paper"),
                                Key.optional(
                                        "file",
                                        Text.FILE,
                                        "the same as a table with columns frequency and density, units in its header")),
                        Rule.exactlyOne("points", "file"))
                .shortFor("file")
                .listFor("points");
    }
}
