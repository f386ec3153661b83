package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Keys of the hair, shape by shape. */
final class HairKeys {
    private static final Measure LENGTH = Measure.of(Dimension.LENGTH, "100 nm", "1 m");
    private static final Measure DIAMETER = Measure.of(Dimension.LENGTH, "10 nm", "1 m");
    private static final Measure TIP = DIAMETER.orZero();
    private static final Measure PART = Measure.of(Dimension.LENGTH, "0 m", "1 m");

    private HairKeys() {}

    static Group group() {
        Key shape = Key.of(
                "shape",
                Words.of("cylinder", "taper", "club", "profile"),
                Presence.taken("cylinder", "one diameter is the plain case"),
                "form of the hair");
        Key length = Key.required("length", LENGTH, "total length from wall to tip");
        Map<String, List<Key>> shapes = new LinkedHashMap<>();
        shapes.put("cylinder", List.of(length, Key.required("diameter", DIAMETER, "diameter of the cylinder")));
        shapes.put(
                "taper",
                List.of(
                        length,
                        Key.required("base-diameter", DIAMETER, "diameter at the wall"),
                        Key.required("tip-diameter", TIP, "diameter at the tip, zero for a point")));
        shapes.put(
                "club",
                List.of(
                        length,
                        Key.required("stalk-diameter", DIAMETER, "diameter of the stalk"),
                        Key.required("stalk-length", LENGTH, "length of the stalk from the wall"),
                        Key.of(
                                "shoulder-length",
                                PART,
                                Presence.taken("0 um", "a step"),
                                "length over which the stalk widens to the head"),
                        Key.required("head-diameter", DIAMETER, "diameter of the head"),
                        Key.of(
                                "end",
                                Words.of("flat", "round"),
                                Presence.taken("flat", "cut straight"),
                                "end of the head")));
        shapes.put(
                "profile",
                List.of(
                        Key.optional("file", Text.FILE, "table with columns z and diameter, units in its header"),
                        Key.optional(
                                "points",
                                new Points(
                                        Key.required("z", PART, "height above the wall"),
                                        Key.required("diameter", TIP, "diameter there")),
                                "the same as a list of pairs")));
        List<Key> common = List.of(
                Key.required(
                        "density", Measure.of(Dimension.DENSITY, "1 kg/m3", "30 g/cm3"), "density of its material"),
                Key.of(
                        "youngs-modulus",
                        Measure.of(Dimension.ELASTIC_MODULUS, "1 kPa", "2000 GPa"),
                        Presence.leftOut("none", "bending is not checked"),
                        "elastic modulus of its material"),
                Key.of(
                        "foot-gap",
                        DIAMETER,
                        Presence.leftOut(
                                "a tenth of the foot's radius", "an own choice, matters for blunt posts alone"),
                        "gap between the foot and the wall around it, which the turning leaves"));
        // file and points shut each other out, and their absence is told where the profile is built
        return Group.of("hair", common, Rule.atMostOne("file", "points")).selectedBy(shape, shapes);
    }
}
