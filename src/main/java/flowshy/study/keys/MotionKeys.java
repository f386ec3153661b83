package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.ArrayList;
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
        List<Key> keys = new ArrayList<>();
        keys.add(Key.optional("points", points, "break points, straight between them on log-log paper"));
        keys.add(Key.optional(
                "file",
                Text.FILE,
                "table with columns frequency and density, units in its header; or any columns of numbers, declared by the"
                        + " keys below"));
        keys.addAll(RecordKeys.declaration("density", "amplitude density", "band levels", "time record"));
        return Group.of(
                        "motion spectrum",
                        keys,
                        Rule.exactlyOne("points", "file columns quantity unit skip rate resolution"),
                        Rule.oneBeside("columns", "quantity"),
                        Rule.oneBeside("columns", "unit"),
                        Rule.oneBeside("quantity", "columns"),
                        Rule.oneBeside("unit", "columns"),
                        Rule.oneBeside("skip", "columns"),
                        Rule.oneBeside("rate", "columns"),
                        Rule.oneBeside("resolution", "columns"))
                .shortFor("file")
                .listFor("points");
    }
}
