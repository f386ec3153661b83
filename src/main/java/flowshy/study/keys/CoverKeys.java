package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Keys of a cover, wherever one may be stated. */
final class CoverKeys {
    private static final Measure SIZE = Measure.of(Dimension.LENGTH, "1 um", "1 m");

    private CoverKeys() {}

    /** What stood over the hair while something was measured: only the wall of a closed cavity changes the damping. */
    static Group measuredUnder() {
        Key kind = Key.required("kind", Words.of("open", "sealed"), "nothing, or a closed cavity");
        Map<String, List<Key>> kinds = new LinkedHashMap<>();
        kinds.put("open", List.of());
        kinds.put("sealed", size());
        return Group.of("cover of a measurement", List.of(), together())
                .selectedBy(kind, kinds)
                .shortFor("kind");
    }

    private static List<Key> size() {
        return List.of(
                Key.optional("diameter", SIZE, "inner diameter of the cavity, with height"),
                Key.optional("height", SIZE, "inner height of the cavity, with diameter"));
    }

    private static Rule[] together() {
        return new Rule[] {Rule.oneBeside("diameter", "height"), Rule.oneBeside("height", "diameter")};
    }

    static Group group() {
        Key kind = Key.required(
                "kind",
                Words.of("open", "roofed", "vented", "sealed", "measured"),
                "none, a roof, a lid with holes, a closed cavity, a measured one");
        Map<String, List<Key>> kinds = new LinkedHashMap<>();
        kinds.put("open", List.of());
        kinds.put(
                "roofed",
                List.of(
                        Key.required("gap", SIZE, "height of the roof above the wall"),
                        Key.required("length", SIZE, "length of the roof along the flow")));
        kinds.put(
                "vented",
                List.of(
                        Key.required(
                                "holes", Measure.of(Dimension.NUMBER, "1", "100000"), "number of holes on one side"),
                        Key.required("hole-diameter", SIZE, "diameter of a hole"),
                        Key.required("hole-depth", SIZE, "depth of a hole, the thickness of the lid"),
                        Key.of(
                                "sides",
                                Words.of("one", "through"),
                                Presence.taken("one", "a lid with holes on one side"),
                                "one: holes on one side; through: as many on the opposite side"),
                        Key.required(
                                "cavity-volume",
                                Measure.of(Dimension.VOLUME, "1e-6 mm3", "1 m3"),
                                "volume of the cavity under the lid"),
                        Key.required(
                                "cavity-section",
                                Measure.of(Dimension.AREA, "1e-6 mm2", "1 m2"),
                                "section of the cavity across the flow at the hair")));
        kinds.put(
                "sealed",
                List.of(
                        Key.of(
                                "fill",
                                MediumKeys.fill(),
                                Presence.leftOut("as medium", "the cavity holds what is outside"),
                                "gas or liquid in the cavity"),
                        size().get(0),
                        size().get(1)));
        kinds.put(
                "measured",
                List.of(Key.required(
                        "file",
                        Text.FILE,
                        "table with columns frequency and attenuation, and phase if it was measured")));
        return Group.of("cover", List.of(), together()).selectedBy(kind, kinds).shortFor("kind");
    }
}
