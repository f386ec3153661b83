package flowshy.medium;

import flowshy.math.Caveat;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A can that was filled with a gas and closed. At another temperature the gas keeps its density and its composition, so the
 * pressure follows; of moist air, vapour beyond saturation condenses and only the dry air keeps its density. A liquid is taken to
 * keep its pressure, because no closed can holds a liquid without room to expand.
 *
 * @param fill state and composition when the can was closed
 */
public record SealedFill(MediumQuery fill) {
    /** The density is proportional to the pressure within a few per cent, so each round gains two digits or more. */
    private static final int ROUNDS = 60;

    private static final double CLOSE = 1e-13;

    /**
     * The fill at another temperature.
     *
     * @param temperature [K]
     * @return the medium, at the pressure that belongs to the temperature
     * @throws MediumException as {@link Media#at}; the pressure at fault may be the one inside the can
     */
    public Medium at(double temperature) {
        Medium closed = Media.at(fill);
        if (closed.phase() != Phase.GAS) {
            return Media.at(fill.at(temperature, fill.pressure()));
        }
        OptionalDouble humidity = fill.value(MediumParameter.HUMIDITY);
        return humidity.isPresent() && humidity.getAsDouble() > 0.0
                ? moist(closed, humidity.getAsDouble(), temperature)
                : dry(closed, temperature);
    }

    private Medium dry(Medium closed, double temperature) {
        double pressure = fill.pressure() * temperature / fill.temperature();
        for (int i = 0; i < ROUNDS; i++) {
            Medium medium = Media.at(fill.at(temperature, pressure));
            double ratio = closed.density() / medium.density();
            if (Math.abs(ratio - 1.0) < CLOSE) {
                return medium;
            }
            pressure *= ratio;
        }
        throw new IllegalStateException(
                fill.name() + ": no pressure found for " + closed.density() + " kg/m3 at " + temperature + " K");
    }

    private Medium moist(Medium closed, double humidity, double temperature) {
        double vapour = HumidAirLaws.vapourFraction(humidity, fill.temperature(), fill.pressure());
        double dryDensity = closed.density() * dryShare(vapour);
        double pressure = fill.pressure() * temperature / fill.temperature();
        for (int i = 0; i < ROUNDS; i++) {
            double saturated = HumidAirLaws.vapourFraction(1.0, temperature, pressure);
            double left = Math.min(vapour, saturated);
            double inside = Math.min(1.0, left / saturated);
            Medium medium = Media.at(fill.at(temperature, pressure).with(MediumParameter.HUMIDITY, inside));
            double ratio = dryDensity / (medium.density() * dryShare(left));
            if (Math.abs(ratio - 1.0) < CLOSE) {
                return vapour > saturated ? withDew(medium) : medium;
            }
            pressure *= ratio;
        }
        throw new IllegalStateException(
                fill.name() + ": no pressure found for " + dryDensity + " kg/m3 of dry air at " + temperature + " K");
    }

    /** Mass of dry air per mass of moist air. */
    private static double dryShare(double vapour) {
        double air = (1.0 - vapour) * HumidAirLaws.DRY_MOLAR_MASS;
        return air / (air + vapour * HumidAirLaws.WATER_MOLAR_MASS);
    }

    private Medium withDew(Medium medium) {
        List<Caveat> caveats = new ArrayList<>(medium.caveats());
        caveats.add(new Caveat(
                Caveat.Subject.MEDIUM,
                Caveat.Weight.WEAK,
                "Moisture of the air sealed in at " + Phrases.celsius(fill.temperature()) + " condenses at "
                        + Phrases.celsius(medium.temperature()) + "; drops on the hair are not modelled."));
        return new Medium(
                medium.name(),
                medium.phase(),
                medium.temperature(),
                medium.pressure(),
                medium.density(),
                medium.viscosity(),
                medium.soundSpeed(),
                medium.meanFreePath(),
                medium.sources(),
                caveats);
    }
}
