package flowshy.medium;

import flowshy.math.Caveat;
import flowshy.medium.OutOfTableException.Why;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/**
 * A gas by its table. The density of the table is scaled to other pressures by ρ = ρ₀ (p/p₀) (Z₀/Z), Z from the second virial
 * coefficient, the sound speed by the second acoustic virial coefficient; the viscosity is that of the table at every pressure.
 * What that costs is stated in the header of the table and widens the uncertainty.
 */
final class PureGas implements MediumLaw {
    /** Beyond this departure from the perfect gas the law cut after the second coefficient is no longer used. */
    static final double LARGEST_DEPARTURE = 0.2;

    private static final double DEPARTURE_PRESSURE = 1e6;

    private final TableHeader header;
    private final TableCurves curves;

    PureGas(MediumTable table) {
        this.header = table.header();
        this.curves = new TableCurves(table.rows());
    }

    @Override
    public TableHeader header() {
        return header;
    }

    double molarMass() {
        return header.molarMass().orElseThrow();
    }

    @Override
    public Medium at(MediumQuery query) {
        return at(query, query.pressure());
    }

    /** The gas at a state, where only a part of the pressure is its own and can condense it [Pa]. */
    Medium at(MediumQuery query, double partialPressure) {
        Admission.state(header, query);
        double temperature = query.temperature();
        double pressure = query.pressure();
        refuseCondensation(temperature, partialPressure);
        double viscosity = curves.viscosity(temperature);
        return new Medium(
                header.medium(),
                Phase.GAS,
                temperature,
                pressure,
                density(temperature, pressure),
                viscosity,
                soundSpeed(temperature, pressure),
                GasState.meanFreePath(viscosity, temperature, pressure, molarMass()),
                sources(pressure),
                caveats(pressure));
    }

    Virial virial(double temperature) {
        return curves.virial(temperature);
    }

    /** Heat capacity ratio of the gas as a perfect one, empty where the table has no sound speed. */
    OptionalDouble perfectGamma(double temperature) {
        OptionalDouble anchor = curves.soundSpeed(temperature);
        return anchor.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(virial(temperature)
                        .perfectGamma(anchor.getAsDouble(), temperature, header.tablePressure(), molarMass()));
    }

    private OptionalDouble soundSpeed(double temperature, double pressure) {
        OptionalDouble gamma = perfectGamma(temperature);
        return gamma.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(
                        virial(temperature).soundSpeed(gamma.getAsDouble(), temperature, pressure, molarMass()));
    }

    private double density(double temperature, double pressure) {
        Virial virial = virial(temperature);
        double anchor = header.tablePressure();
        if (!(FastMath.abs(virial.departure(temperature, pressure)) <= LARGEST_DEPARTURE)) {
            throw new OutOfTableException(
                    MediumParameter.PRESSURE,
                    Why.OUTSIDE,
                    header.medium() + " at " + Phrases.celsius(temperature) + " and " + Phrases.pressure(pressure)
                            + " is too dense for its gas law, which ends where it departs by "
                            + Phrases.percent(LARGEST_DEPARTURE) + " from the perfect gas. Choose a lower pressure.");
        }
        return curves.density(temperature)
                * (pressure / anchor)
                * (virial.compressibility(temperature, anchor) / virial.compressibility(temperature, pressure));
    }

    private void refuseCondensation(double temperature, double pressure) {
        OptionalDouble saturation = curves.saturationPressure(temperature);
        if (saturation.isPresent() && !(pressure < saturation.getAsDouble())) {
            MediumParameter fault = saturation.getAsDouble() < MediumQuery.USUAL_PRESSURE
                    ? MediumParameter.TEMPERATURE
                    : MediumParameter.PRESSURE;
            throw new OutOfTableException(
                    fault,
                    Why.CONDENSES,
                    header.medium() + " condenses above " + Phrases.pressure(saturation.getAsDouble()) + " at "
                            + Phrases.celsius(temperature) + "; " + Phrases.pressure(pressure)
                            + " was asked for. Choose a lower pressure or a higher temperature.");
        }
    }

    private List<PropertySource> sources(double pressure) {
        if (header.departures().isEmpty()) {
            return header.sources();
        }
        TableHeader.Departures departures = header.departures().get();
        double square = FastMath.abs(pressure * pressure - header.tablePressure() * header.tablePressure())
                / (DEPARTURE_PRESSURE * DEPARTURE_PRESSURE);
        double linear = FastMath.abs(pressure - header.tablePressure()) / DEPARTURE_PRESSURE;
        List<PropertySource> sources = new ArrayList<>();
        for (PropertySource source : header.sources()) {
            sources.add(
                    switch (source.property()) {
                        case "density" -> source.widened(departures.density() * square);
                        case "viscosity" -> source.widened(departures.viscosity() * linear);
                        case "sound speed" -> source.widened(departures.soundSpeed() * square);
                        default -> source;
                    });
        }
        return sources;
    }

    private List<Caveat> caveats(double pressure) {
        boolean far = FastMath.abs(FastMath.log(pressure / header.tablePressure())) > FastMath.log(2.0);
        if (!far || header.departures().isPresent()) {
            return List.of();
        }
        return List.of(new Caveat(
                Caveat.Subject.MEDIUM,
                Caveat.Weight.WEAK,
                header.medium() + ": the table does not say what its density, viscosity and sound speed lose away from "
                        + Phrases.pressure(header.tablePressure()) + "; the viscosity is taken as the same at "
                        + Phrases.pressure(pressure) + "."));
    }
}
