package flowshy.medium;

import flowshy.math.Caveat;
import flowshy.medium.TableHeader.Departures;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/**
 * A liquid away from the pressure of its table. The density follows ρ = ρ₀ [1 + (p − p₀)/(ρ₀c²)], the adiabatic compressibility,
 * where the sound speed is known; viscosity and sound speed stay. What that costs is stated in the header and widens the
 * uncertainty in proportion to the distance in pressure.
 */
final class LiquidState {
    private static final double DEPARTURE_PRESSURE = 1e6;

    private LiquidState() {}

    /**
     * @param density at the pressure of the header [kg/m³]
     * @param soundSpeed [m/s], empty if not known
     */
    static Medium of(
            TableHeader header,
            String name,
            MediumQuery query,
            double density,
            double viscosity,
            OptionalDouble soundSpeed,
            List<Caveat> caveats) {
        double excess = query.pressure() - header.tablePressure();
        double compressed = soundSpeed.isPresent()
                ? density + excess / (soundSpeed.getAsDouble() * soundSpeed.getAsDouble())
                : density;
        return new Medium(
                name,
                Phase.LIQUID,
                query.temperature(),
                query.pressure(),
                compressed,
                viscosity,
                soundSpeed,
                OptionalDouble.empty(),
                sources(header, FastMath.abs(excess) / DEPARTURE_PRESSURE),
                caveats);
    }

    private static List<PropertySource> sources(TableHeader header, double distance) {
        if (header.departures().isEmpty()) {
            return header.sources();
        }
        Departures departures = header.departures().get();
        List<PropertySource> sources = new ArrayList<>();
        for (PropertySource source : header.sources()) {
            sources.add(
                    switch (source.property()) {
                        case "density" -> source.widened(departures.density() * distance);
                        case "viscosity" -> source.widened(departures.viscosity() * distance);
                        case "sound speed" -> source.widened(departures.soundSpeed() * distance);
                        default -> source;
                    });
        }
        return sources;
    }
}
