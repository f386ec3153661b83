package flowshy.medium;

import flowshy.math.Range;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a property table says of itself.
 *
 * @param medium the name
 * @param aliases other names
 * @param about one sentence for lists
 * @param phase gas or liquid
 * @param molarMass [kg/mol], always there for a gas
 * @param tablePressure at which the rows hold [Pa]
 * @param pressures for which the medium may be asked [Pa]
 * @param temperatures for which the medium may be asked [K]
 * @param freezing temperature below which a liquid freezes [K], absent if not known
 * @param departures what the neglect of pressure costs, absent if the header does not say
 * @param law name of the formula that replaces rows, absent for a table with rows
 * @param parameters further parameters the medium needs, each with its range
 * @param sources one entry a property
 */
public record TableHeader(
        String medium,
        List<String> aliases,
        String about,
        Phase phase,
        OptionalDouble molarMass,
        double tablePressure,
        Range pressures,
        Range temperatures,
        OptionalDouble freezing,
        Optional<Departures> departures,
        Optional<String> law,
        List<AcceptedParameter> parameters,
        List<PropertySource> sources) {
    /** Copies the lists. */
    public TableHeader {
        aliases = List.copyOf(aliases);
        parameters = List.copyOf(parameters);
        sources = List.copyOf(sources);
    }

    /**
     * Relative errors at 1 MPa of what is kept simple in the pressure dependence of a gas.
     *
     * @param density of the gas law cut after the second virial coefficient [-]; grows with the square of the pressure
     * @param viscosity of a viscosity without pressure dependence [-]; grows with the pressure
     * @param soundSpeed of a sound speed scaled by the second acoustic virial coefficient [-]; grows with its square
     */
    public record Departures(double density, double viscosity, double soundSpeed) {}

    /**
     * The source of one property.
     *
     * @param property as the header names it
     * @return the source
     * @throws IllegalArgumentException if the header has no such property
     */
    public PropertySource source(String property) {
        for (PropertySource source : sources) {
            if (source.property().equals(property)) {
                return source;
            }
        }
        throw new IllegalArgumentException(medium + ": no source for " + property);
    }
}
