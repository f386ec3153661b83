package flowshy.medium;

import flowshy.medium.OutOfTableException.Why;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A liquid by its table. Refused where it boils or freezes. Where the sound speed is known the density follows the pressure
 * by ρ = ρ₀ [1 + (p − p₀)/(ρ₀c²)], the adiabatic compressibility; up to 1 MPa the isothermal one differs by less than 0.1 %
 * of the density for every liquid here.
 */
final class PlainLiquid implements MediumLaw {
    private final TableHeader header;
    private final TableCurves curves;

    PlainLiquid(MediumTable table) {
        this.header = table.header();
        this.curves = new TableCurves(table.rows());
    }

    @Override
    public TableHeader header() {
        return header;
    }

    @Override
    public Medium at(MediumQuery query) {
        refuseBoiling(query.temperature(), query.pressure());
        Admission.state(header, query);
        double temperature = query.temperature();
        OptionalDouble soundSpeed = curves.soundSpeed(temperature);
        double density = curves.density(temperature);
        if (soundSpeed.isPresent()) {
            density +=
                    (query.pressure() - header.tablePressure()) / (soundSpeed.getAsDouble() * soundSpeed.getAsDouble());
        }
        return new Medium(
                header.medium(),
                Phase.LIQUID,
                temperature,
                query.pressure(),
                density,
                curves.viscosity(temperature),
                soundSpeed,
                OptionalDouble.empty(),
                header.sources(),
                List.of());
    }

    private void refuseBoiling(double temperature, double pressure) {
        OptionalDouble boiling = curves.saturationTemperature(pressure);
        OptionalDouble lowest = curves.lowestSaturationPressure();
        String asked = "; " + Phrases.celsius(temperature) + " at " + Phrases.pressure(pressure) + " was asked for.";
        if (boiling.isPresent() && temperature >= boiling.getAsDouble()) {
            OptionalDouble usual = curves.saturationTemperature(MediumQuery.USUAL_PRESSURE);
            boolean hot = usual.isPresent() && temperature >= usual.getAsDouble();
            throw new OutOfTableException(
                    hot ? MediumParameter.TEMPERATURE : MediumParameter.PRESSURE,
                    Why.BOILS,
                    header.medium() + " boils at " + Phrases.celsius(boiling.getAsDouble()) + " under "
                            + Phrases.pressure(pressure) + asked + " Choose a lower temperature or a higher pressure.");
        }
        if (lowest.isPresent()
                && pressure < lowest.getAsDouble()
                && temperature >= header.temperatures().low()) {
            throw new OutOfTableException(
                    MediumParameter.PRESSURE,
                    Why.BOILS,
                    header.medium() + " boils below " + Phrases.pressure(lowest.getAsDouble())
                            + " at every temperature it covers" + asked + " Choose a higher pressure.");
        }
    }
}
