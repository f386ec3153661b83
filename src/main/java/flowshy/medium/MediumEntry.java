package flowshy.medium;

import flowshy.math.Range;
import java.util.List;

/**
 * A known medium, for lists.
 *
 * @param name the name
 * @param aliases other names
 * @param about one sentence
 * @param phase gas or liquid
 * @param temperatures covered [K]
 * @param pressures covered [Pa]
 * @param parameters needed beside temperature and pressure
 * @param mixable whether a second gas may be named
 * @param sources one entry a property, at the pressure of the table
 */
public record MediumEntry(
        String name,
        List<String> aliases,
        String about,
        Phase phase,
        Range temperatures,
        Range pressures,
        List<AcceptedParameter> parameters,
        boolean mixable,
        List<PropertySource> sources) {
    /** Copies the lists. */
    public MediumEntry {
        aliases = List.copyOf(aliases);
        parameters = List.copyOf(parameters);
        sources = List.copyOf(sources);
    }

    static MediumEntry of(TableHeader header) {
        return new MediumEntry(
                header.medium(),
                header.aliases(),
                header.about(),
                header.phase(),
                header.temperatures(),
                header.pressures(),
                header.parameters(),
                header.phase() == Phase.GAS && header.law().isEmpty(),
                header.sources());
    }
}
