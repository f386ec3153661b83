package flowshy.medium;

import flowshy.medium.OutOfTableException.Why;
import java.util.OptionalDouble;

/** Refuses a liquid that would boil. */
final class Boiling {
    private Boiling() {}

    /**
     * @param name of the liquid
     * @param query its state
     * @param saturation pressure under which it boils at that temperature [Pa]
     * @param boiling temperature at which it boils under that pressure [K], empty if not known
     * @throws OutOfTableException if the pressure does not exceed the saturation pressure
     */
    static void refuse(String name, MediumQuery query, double saturation, OptionalDouble boiling) {
        if (query.pressure() > saturation) {
            return;
        }
        boolean hot = saturation >= MediumQuery.USUAL_PRESSURE;
        String where = boiling.isPresent()
                ? "boils at " + Phrases.celsius(boiling.getAsDouble()) + " under " + Phrases.pressure(query.pressure())
                : "boils under " + Phrases.pressure(saturation) + " at " + Phrases.celsius(query.temperature());
        throw new OutOfTableException(
                hot ? MediumParameter.TEMPERATURE : MediumParameter.PRESSURE,
                Why.BOILS,
                name + " " + where + "; " + Phrases.celsius(query.temperature()) + " at "
                        + Phrases.pressure(query.pressure())
                        + " was asked for. Choose a lower temperature or a higher pressure.");
    }

    /** The same for a liquid whose saturation pressure stands in its table; does nothing where the table has none. */
    static void refuse(String name, MediumQuery query, TableCurves curves) {
        OptionalDouble boiling = curves.saturationTemperature(query.pressure());
        OptionalDouble saturation = curves.saturationPressure(query.temperature());
        if (saturation.isPresent()) {
            refuse(name, query, saturation.getAsDouble(), boiling);
        } else if (boiling.isPresent() && query.temperature() >= boiling.getAsDouble()) {
            // hotter than every row: the table knows the boiling point but no saturation pressure up there
            refuse(name, query, Double.MAX_VALUE, boiling);
        }
    }
}
