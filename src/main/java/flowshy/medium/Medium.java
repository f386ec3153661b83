package flowshy.medium;

import flowshy.math.Caveat;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A gas or liquid at one state.
 *
 * @param name its name, with composition where it matters
 * @param phase gas, liquid or unstated
 * @param temperature [K]
 * @param pressure [Pa]
 * @param density ρ [kg/m³]
 * @param viscosity dynamic viscosity μ [Pa·s]
 * @param soundSpeed c [m/s], absent if not known
 * @param meanFreePath of a gas [m], absent for liquids and where the molar mass is not known
 * @param sources one entry a property
 * @param caveats what must stand beside the properties
 */
public record Medium(
        String name,
        Phase phase,
        double temperature,
        double pressure,
        double density,
        double viscosity,
        OptionalDouble soundSpeed,
        OptionalDouble meanFreePath,
        List<PropertySource> sources,
        List<Caveat> caveats) {
    /** @throws IllegalArgumentException if a property is not a positive finite number */
    public Medium {
        positive(name, "temperature [K]", temperature);
        positive(name, "pressure [Pa]", pressure);
        positive(name, "density [kg/m3]", density);
        positive(name, "viscosity [Pa s]", viscosity);
        sources = List.copyOf(sources);
        caveats = List.copyOf(caveats);
    }

    /**
     * The same medium with other density and viscosity; name, state, sources and caveats are kept.
     *
     * @param densityFactor on the density, positive [-]
     * @param viscosityFactor on the viscosity, positive [-]
     * @return the changed medium
     */
    public Medium scaled(double densityFactor, double viscosityFactor) {
        return new Medium(
                name,
                phase,
                temperature,
                pressure,
                density * densityFactor,
                viscosity * viscosityFactor,
                soundSpeed,
                meanFreePath,
                sources,
                caveats);
    }

    /**
     * A medium known by two numbers only, at 20 °C and one atmosphere for the noise.
     *
     * @param name its name
     * @param density ρ [kg/m³]
     * @param viscosity μ [Pa·s]
     * @return the medium, without sound speed and mean free path
     */
    public static Medium of(String name, double density, double viscosity) {
        return new Medium(
                name,
                Phase.UNSTATED,
                293.15,
                101325.0,
                density,
                viscosity,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                List.of(),
                List.of());
    }

    /**
     * The properties that rest on a value from memory, so that a verdict can say so.
     *
     * @return those of density, viscosity and sound speed, of a mixture also of its parts
     */
    public List<PropertySource> recalled() {
        return sources.stream()
                .filter(source -> source.reading() == PropertySource.Reading.MEMORY)
                .toList();
    }

    /**
     * How well a property is known, by its sources.
     *
     * @param property name as the sources have it, e.g. {@code density}
     * @return the largest relative uncertainty that a source states for it [-], absent if none does
     */
    public OptionalDouble uncertainty(String property) {
        return sources.stream()
                .filter(source -> source.property().equals(property))
                .map(PropertySource::uncertainty)
                .flatMapToDouble(OptionalDouble::stream)
                .max();
    }

    /**
     * Kinematic viscosity ν = μ/ρ.
     *
     * @return ν [m²/s]
     */
    public double kinematicViscosity() {
        return viscosity / density;
    }

    /**
     * Stokes layer thickness δ = √(2ν/ω).
     *
     * @param omega angular frequency [rad/s]
     * @return δ [m]
     */
    public double stokesLayer(double omega) {
        return Math.sqrt(2.0 * kinematicViscosity() / omega);
    }

    private static void positive(String name, String what, double value) {
        if (!(value > 0.0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + ": " + what + " must be positive and finite, was " + value);
        }
    }
}
