package flowshy.study.keys;

import flowshy.math.Figures;
import flowshy.stream.surroundings.NamedSurrounding;
import flowshy.stream.surroundings.NamedSurroundings;
import flowshy.study.units.Dimension;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Keys of the flows around: one group a source, kind by kind, under a name that the user gives. */
final class SurroundingsKeys {
    private static final Measure LENGTH = Measure.of(Dimension.LENGTH, "1 um", "10 km");
    private static final Measure SPEED = Measure.of(Dimension.SPEED, "1 um/s", "300 m/s");
    private static final Measure SHARE = Measure.of(Dimension.SHARE, "0.01 %", "200 %");
    private static final Measure LEVEL = Measure.of(Dimension.LEVEL, "-60 dB", "260 dB");

    private SurroundingsKeys() {}

    static GroupMap map() {
        Key kind = Key.required(
                "kind",
                Words.of("stream", "duct", "tone", "sound", "spectrum", "record"),
                "a stream over the wall, the flow of a duct, an oscillation, sound, a measured spectrum, a time record");
        Map<String, List<Key>> kinds = new LinkedHashMap<>();
        kinds.put("stream", stream());
        kinds.put("duct", duct());
        kinds.put(
                "tone",
                List.of(
                        Key.required("frequency", SuspensionKeys.FREQUENCY, "frequency of the tone"),
                        Key.required(
                                "speed",
                                Measure.amplitude(Dimension.SPEED, "1e-12 m/s", "100 m/s"),
                                "velocity of the fluid far from the wall")));
        kinds.put("sound", sound());
        kinds.put("spectrum", measured(RecordKeys.spectrum()));
        kinds.put("record", measured(RecordKeys.record()));
        Key direction = Key.of(
                "direction",
                Measure.of(Dimension.ANGLE, "-360 deg", "360 deg"),
                Presence.taken("0 deg", "along the sensitive axis, where it counts most"),
                "angle between the flow and the sensitive axis");
        return new GroupMap(Group.of(
                        "source",
                        List.of(like(), direction),
                        Rule.exactlyOne("mean-speed", "volume-flow"),
                        Rule.exactlyOne("diameter", "width height"),
                        Rule.oneBeside("width", "height"),
                        Rule.exactlyOne("level from to", "levels"),
                        Rule.oneBeside("level", "from"),
                        Rule.oneBeside("level", "to"))
                .selectedBy(kind, kinds)
                .startingFrom(starts()));
    }

    private static Key like() {
        String[] names =
                NamedSurroundings.all().stream().map(NamedSurrounding::name).toArray(String[]::new);
        return Key.optional("like", Words.of(names), "starting values under our own names; written keys override them");
    }

    private static List<Key> stream() {
        return List.of(
                Key.required("mean-speed", SPEED, "mean speed far from the wall"),
                usual("turbulence", SHARE, "rms of the fluctuation along, over the mean speed"),
                usual("length-scale", LENGTH, "longitudinal integral scale of the turbulence"),
                usual("fetch", LENGTH, "way of the stream over the surface, from its edge to the hair"));
    }

    private static Key usual(String key, Measure measure, String meaning) {
        var number = NamedSurroundings.ofBareStream(key);
        return Key.of(key, measure, Presence.taken(text(number.value(), measure), number.source()), meaning);
    }

    private static List<Key> duct() {
        Measure size = Measure.of(Dimension.LENGTH, "10 um", "100 m");
        return List.of(
                Key.optional("diameter", size, "inner diameter of a round duct"),
                Key.optional("width", size, "width of the wall that the hair stands on, across the flow"),
                Key.optional("height", size, "from that wall to the opposite one"),
                Key.optional("mean-speed", SPEED, "volume flow over section"),
                Key.optional("volume-flow", Measure.of(Dimension.VOLUME_FLOW, "1e-15 m3/s", "1e6 m3/s"), "volume flow"),
                Key.of(
                        "turbulence",
                        SHARE,
                        Presence.ifNeeded("from size and Reynolds number", ""),
                        "rms of the fluctuation along, over the mean speed"),
                Key.of(
                        "length-scale",
                        LENGTH,
                        Presence.ifNeeded("from size and Reynolds number", ""),
                        "longitudinal integral scale of the turbulence"));
    }

    private static List<Key> sound() {
        return List.of(
                Key.optional("level", LEVEL, "level over the band; re 20 uPa in a gas, 1 uPa in a liquid"),
                Key.optional("from", SuspensionKeys.FREQUENCY, "lower end of the band"),
                Key.optional("to", SuspensionKeys.FREQUENCY, "upper end of the band"),
                Key.optional(
                        "levels",
                        new Points(
                                Key.required("frequency", SuspensionKeys.FREQUENCY, "mid-band frequency"),
                                Key.required("level", LEVEL, "level of that third-octave")),
                        "level of each third-octave by its mid-band frequency"),
                distance());
    }

    private static List<Key> measured(List<Key> file) {
        List<Key> keys = new ArrayList<>(file);
        keys.add(Key.of(
                "mean-speed",
                SPEED,
                Presence.ifNeeded("mean of a record of velocity", ""),
                "mean speed of a stream that carries the fluctuation; without one it is an oscillation"));
        keys.add(Key.of(
                "fetch",
                LENGTH,
                Presence.ifNeeded(
                        text(NamedSurroundings.ofBareStream("fetch").value(), LENGTH),
                        NamedSurroundings.ofBareStream("fetch").source()),
                "way of that stream over the surface, from its edge to the hair"));
        keys.add(distance());
        return keys;
    }

    private static Key distance() {
        return Key.optional("distance", LENGTH, "distance to a small source of sound; without it the wave is plane");
    }

    private static Starts starts() {
        Map<String, Map<String, Presence>> sets = new LinkedHashMap<>();
        for (NamedSurrounding named : NamedSurroundings.all()) {
            Map<String, Presence> set = new LinkedHashMap<>();
            set.put("kind", Presence.taken(named.kind().word(), "as " + named.name()));
            for (NamedSurrounding.StartingValue number : named.numbers()) {
                String value = number.unit().equals("1")
                        ? Figures.full(100.0 * number.stated().value()) + " %"
                        : Figures.full(number.stated().value()) + " " + number.unit();
                set.put(
                        number.stated().key(),
                        Presence.taken(
                                value,
                                "as " + named.name() + ": " + number.stated().source()));
            }
            sets.put(named.name(), set);
        }
        return new Starts("like", sets);
    }

    private static String text(double value, Measure measure) {
        return measure.dimension() == Dimension.SHARE
                ? Figures.full(100.0 * value) + " %"
                : Figures.full(value) + " " + measure.dimension().siUnit();
    }
}
