package flowshy.medium;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Which medium is wanted, at which state. Nothing is taken as default here: a reader that applies the usual values says so.
 *
 * @param name the medium, one of the names or aliases of {@link Media#entries()}; free for a table or given properties
 * @param temperature [K]
 * @param pressure [Pa]
 * @param parameters humidity, mass fraction, salinity or grade, in the SI units of {@link MediumParameter}
 * @param second a second gas, if the medium is a mixture of two
 * @param table a table of the user, in place of a known medium
 * @param given properties of the user, in place of a known medium
 */
public record MediumQuery(
        String name,
        double temperature,
        double pressure,
        Map<MediumParameter, Double> parameters,
        Optional<SecondGas> second,
        Optional<MediumTable> table,
        Optional<GivenProperties> given) {
    /** Room temperature [K], 20 °C. */
    public static final double USUAL_TEMPERATURE = 293.15;

    /** Standard atmosphere [Pa]. */
    public static final double USUAL_PRESSURE = 101325.0;

    /** Relative humidity of air that nobody measured [-]; common practice, no source. */
    public static final double USUAL_HUMIDITY = 0.5;

    /** @throws IllegalArgumentException if the state is not positive and finite, or both a table and properties are given */
    public MediumQuery {
        if (!(temperature > 0.0 && pressure > 0.0 && Double.isFinite(temperature) && Double.isFinite(pressure))) {
            throw new IllegalArgumentException(
                    name + ": temperature " + temperature + " K and pressure " + pressure + " Pa must be positive");
        }
        if (table.isPresent() && given.isPresent()) {
            throw new IllegalArgumentException(name + ": either a table or given properties");
        }
        EnumMap<MediumParameter, Double> copy = new EnumMap<>(MediumParameter.class);
        copy.putAll(parameters);
        parameters = Collections.unmodifiableMap(copy);
    }

    /**
     * A second gas in a mixture of two.
     *
     * @param name of the gas
     * @param share its mole fraction, 0 to 1 [-]
     */
    public record SecondGas(String name, double share) {}

    /**
     * A medium known by its numbers.
     *
     * @param density ρ [kg/m³]
     * @param viscosity μ [Pa·s]
     * @param soundSpeed c [m/s], absent if not known
     */
    public record GivenProperties(double density, double viscosity, OptionalDouble soundSpeed) {}

    /**
     * A known medium without further parameters.
     *
     * @param name one of the names or aliases of {@link Media#entries()}
     * @param temperature [K]
     * @param pressure [Pa]
     * @return the query
     */
    public static MediumQuery of(String name, double temperature, double pressure) {
        return new MediumQuery(
                name, temperature, pressure, Map.of(), Optional.empty(), Optional.empty(), Optional.empty());
    }

    /**
     * The medium of a table of the user.
     *
     * @param table the table
     * @param temperature [K]
     * @param pressure [Pa]
     * @return the query
     */
    public static MediumQuery of(MediumTable table, double temperature, double pressure) {
        return new MediumQuery(
                table.medium(),
                temperature,
                pressure,
                Map.of(),
                Optional.empty(),
                Optional.of(table),
                Optional.empty());
    }

    /**
     * A medium given by its numbers, which are kept at every state.
     *
     * @param name as reports shall call it
     * @param given its properties
     * @param temperature [K], for the noise
     * @param pressure [Pa]
     * @return the query
     */
    public static MediumQuery of(String name, GivenProperties given, double temperature, double pressure) {
        return new MediumQuery(
                name, temperature, pressure, Map.of(), Optional.empty(), Optional.empty(), Optional.of(given));
    }

    /**
     * The same with a further parameter.
     *
     * @param parameter which
     * @param value in its SI unit
     * @return a new query
     */
    public MediumQuery with(MediumParameter parameter, double value) {
        EnumMap<MediumParameter, Double> more = new EnumMap<>(MediumParameter.class);
        more.putAll(parameters);
        more.put(parameter, value);
        return new MediumQuery(name, temperature, pressure, more, second, table, given);
    }

    /**
     * The same gas with a share of another in it.
     *
     * @param gas name of the second gas
     * @param share its mole fraction [-]
     * @return a new query
     */
    public MediumQuery with(String gas, double share) {
        return new MediumQuery(
                name, temperature, pressure, parameters, Optional.of(new SecondGas(gas, share)), table, given);
    }

    /**
     * The same medium at another state.
     *
     * @param otherTemperature [K]
     * @param otherPressure [Pa]
     * @return a new query
     */
    public MediumQuery at(double otherTemperature, double otherPressure) {
        return new MediumQuery(name, otherTemperature, otherPressure, parameters, second, table, given);
    }

    /**
     * The value of a parameter.
     *
     * @param parameter which
     * @return in its SI unit, empty if not stated
     */
    public OptionalDouble value(MediumParameter parameter) {
        Double value = parameters.get(parameter);
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }
}
