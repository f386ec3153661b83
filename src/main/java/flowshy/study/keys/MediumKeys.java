package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.List;

/** Keys of a gas or liquid, wherever one may be stated. */
final class MediumKeys {
    private static final Measure TEMPERATURE = Measure.of(Dimension.TEMPERATURE, "1 K", "3000 K");
    private static final Measure PRESSURE = Measure.of(Dimension.PRESSURE, "1 mPa", "1 GPa");
    private static final String ROOM = "room temperature, common practice";
    private static final String ATMOSPHERE = "standard atmosphere";

    private MediumKeys() {}

    /** Where the device is used. */
    static Group outside() {
        return group("medium", Presence.taken("20 degC", ROOM), Presence.taken("101.325 kPa", ATMOSPHERE));
    }

    /** What a cover encloses: closed at the state outside unless said otherwise. */
    static Group fill() {
        return group(
                "fill",
                Presence.like("medium.temperature", "20 degC"),
                Presence.like("medium.pressure", "101.325 kPa"));
    }

    /** In what something was measured; vacuum is allowed. */
    static Group measuredIn() {
        return group(
                "surrounding of a measurement",
                Presence.taken("20 degC", ROOM),
                Presence.taken("101.325 kPa", ATMOSPHERE));
    }

    private static Group group(String name, Presence temperature, Presence pressure) {
        Condition notVacuum = Condition.unless("name", "vacuum");
        List<Key> keys = List.of(
                Key.optional("name", Text.MEDIUM, "gas or liquid by its name, see the command media"),
                Key.of("temperature", TEMPERATURE, temperature, "its temperature")
                        .when(notVacuum),
                Key.of("pressure", PRESSURE, pressure, "its absolute pressure").when(notVacuum),
                Key.of(
                                "humidity",
                                Measure.of(Dimension.SHARE, "0 %", "100 %"),
                                Presence.ifNeeded("50 %", "of air that nobody measured, common practice"),
                                "relative humidity of air")
                        .when(notVacuum),
                Key.optional(
                        "mass-fraction",
                        Measure.of(Dimension.SHARE, "0 %", "100 %"),
                        "mass of the named substance in its mixture with water"),
                Key.optional("salinity", Measure.of(Dimension.NUMBER, "0", "1000"), "practical salinity of sea water"),
                Key.optional(
                        "grade",
                        Measure.of(Dimension.KINEMATIC_VISCOSITY, "0.1 cSt", "1e6 cSt"),
                        "nominal viscosity that names an oil"),
                Key.optional("second", Text.MEDIUM, "a second gas mixed in"),
                Key.optional("share", Measure.of(Dimension.SHARE, "0 %", "100 %"), "mole fraction of the second gas"),
                Key.optional(
                        "file",
                        Text.FILE,
                        "table of your own beside the study, in the form of the shipped media tables"),
                Key.optional(
                        "density",
                        Measure.of(Dimension.DENSITY, "1e-9 kg/m3", "30 g/cm3"),
                        "density of a medium without a table"),
                Key.optional(
                        "viscosity",
                        Measure.of(Dimension.VISCOSITY, "1e-8 Pa.s", "1e5 Pa.s"),
                        "dynamic viscosity of a medium without a table"),
                Key.optional(
                        "kinematic-viscosity",
                        Measure.of(Dimension.KINEMATIC_VISCOSITY, "1e-9 m2/s", "1e4 m2/s"),
                        "kinematic viscosity of a medium without a table"),
                Key.optional(
                        "sound-speed",
                        Measure.of(Dimension.SPEED, "1 m/s", "20000 m/s"),
                        "sound speed of a medium without a table"));
        return Group.of(
                        name,
                        keys,
                        Rule.exactlyOne(
                                "name humidity mass-fraction salinity grade second share",
                                "file",
                                "density viscosity kinematic-viscosity sound-speed"),
                        Rule.atMostOne("second share"),
                        Rule.oneBeside("second", "share"),
                        Rule.oneBeside("density", "viscosity", "kinematic-viscosity"))
                .shortFor("name")
                .withKeysOfTheWord("humidity", "mass-fraction", "salinity", "grade", "second", "share");
    }
}
