package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.List;

/** Keys of the suspension: the ways of stating stiffness and damping, each with what surrounded the hair. */
final class SuspensionKeys {
    static final Measure FREQUENCY = Measure.of(Dimension.FREQUENCY, "1 mHz", "10 MHz");

    private SuspensionKeys() {}

    static Group group() {
        List<Key> keys = List.of(
                Key.optional(
                        "stiffness",
                        Measure.of(Dimension.STIFFNESS, "1e-20 N.m/rad", "1e6 N.m/rad"),
                        "torsional stiffness"),
                Key.optional(
                        "resonance",
                        measured("resonance", Key.required("frequency", FREQUENCY, "frequency of the 90 degree turn")),
                        "resonance that gives the stiffness"),
                Key.of(
                        "damping",
                        measured(
                                "damping",
                                Key.required(
                                        "value",
                                        Measure.of(Dimension.DAMPING, "0 N.m.s/rad", "1e6 N.m.s/rad"),
                                        "torsional damping")),
                        Presence.taken("0 N.m.s/rad", "no damping but that of the medium"),
                        "damping"),
                Key.optional(
                        "quality",
                        measured(
                                "quality",
                                Key.required("value", Measure.of(Dimension.NUMBER, "0.01", "1e8"), "quality factor")),
                        "quality factor that gives the damping"),
                Key.optional("ring-down", ringDown(), "free swing that gives the damping"),
                Key.of(
                        "plate-inertia",
                        Measure.of(Dimension.INERTIA, "0 kg.m2", "1 kg.m2"),
                        Presence.taken("0 kg.m2", "the hair alone turns"),
                        "moment of inertia of what turns with the hair"),
                Key.of(
                        "pivot-depth",
                        Measure.of(Dimension.LENGTH, "0 m", "100 mm"),
                        Presence.taken("0 um", "the axis lies in the surface"),
                        "depth of the pivot axis below the surface"),
                Key.of(
                        "attitude",
                        Words.of("upright", "hanging", "horizontal"),
                        Presence.taken("upright", "the usual way to stand"),
                        "how the hair stands in gravity"),
                Key.of(
                        "readout-noise",
                        Measure.of(Dimension.ANGLE_NOISE, "0 rad/rtHz", "1 rad/rtHz"),
                        Presence.leftOut("none", "only thermal noise is counted"),
                        "noise of the readout as an angle"),
                Key.optional(
                        "film", film(), "film of the medium under the tilting plate, if its damping counts apart"));
        return Group.of(
                "suspension",
                keys,
                Rule.atMostOne("stiffness", "resonance"),
                Rule.atMostOne("damping", "quality", "ring-down"));
    }

    private static Group measured(String name, Key value) {
        return Group.of(name, List.of(value, in(), cover())).shortFor(value.name());
    }

    private static Group ringDown() {
        return Group.of(
                "ring-down",
                List.of(
                        Key.optional("file", Text.FILE, "record with columns time and signal, units in its header"),
                        Key.optional(
                                "decay-time",
                                Measure.of(Dimension.TIME, "1 ns", "1e6 s"),
                                "time in which the swing falls to 1/e"),
                        Key.optional("frequency", FREQUENCY, "frequency of the decaying swing"),
                        in(),
                        cover()),
                Rule.exactlyOne("file", "decay-time frequency"));
    }

    private static Group film() {
        Measure side = Measure.of(Dimension.LENGTH, "100 nm", "100 mm");
        return Group.of(
                "film",
                List.of(
                        Key.required("length", side, "side of the plate across the tilt axis"),
                        Key.required("width", side, "side of the plate along the tilt axis"),
                        Key.required(
                                "gap",
                                Measure.of(Dimension.LENGTH, "1 nm", "10 mm"),
                                "height of the gap under the level plate")));
    }

    private static Key in() {
        return Key.of(
                "in",
                MediumKeys.measuredIn(),
                Presence.taken("vacuum", "a value without a medium is the suspension's own"),
                "medium in which it was measured, or vacuum");
    }

    private static Key cover() {
        return Key.of(
                        "cover",
                        CoverKeys.measuredUnder(),
                        Presence.taken("open", "measurements are usually made without a lid"),
                        "cover under which it was measured")
                .when(Condition.asksUnless("in.name", "vacuum"));
    }
}
