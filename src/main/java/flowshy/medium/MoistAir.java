package flowshy.medium;

import flowshy.math.Caveat;
import flowshy.math.Range;
import flowshy.medium.OutOfTableException.Why;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Air at a relative humidity. Density by CIPM-2007, viscosity of dry air and water vapour mixed by Wilke 1950, sound speed by Cramer
 * 1993; outside the range of Cramer's formula the molar heat capacities of dry air and vapour are added. Outside the range of CIPM-2007
 * the same equation is used and flagged. Humidity 0 is dry air by its table.
 */
final class MoistAir implements MediumLaw {
    static final Range CIPM_TEMPERATURE = new Range("temperature [K]", 288.15, 300.15);
    static final Range CIPM_PRESSURE = new Range("pressure [Pa]", 6e4, 1.1e5);
    static final Range CRAMER_TEMPERATURE = new Range("temperature [K]", 273.15, 303.15);
    static final Range CRAMER_PRESSURE = new Range("pressure [Pa]", 7.5e4, 1.02e5);
    static final double CRAMER_VAPOUR = 0.06;

    /** More vapour than this is wet steam rather than air. */
    static final double LARGEST_VAPOUR = 0.5;

    /** Heat capacity of water vapour over R, 33.6 J/(mol·K) near room temperature (from memory). */
    private static final double VAPOUR_HEAT_CAPACITY = 4.04;

    private static final double MIXTURE_SOUND = 0.003;

    private final TableHeader header;
    private final PureGas dry;

    MoistAir(TableHeader header, PureGas dry) {
        this.header = header;
        this.dry = dry;
    }

    @Override
    public TableHeader header() {
        return header;
    }

    @Override
    public Medium at(MediumQuery query) {
        Admission.state(header, query);
        double temperature = query.temperature();
        double pressure = query.pressure();
        double humidity = query.value(MediumParameter.HUMIDITY).orElseThrow();
        Medium dryAir = dry.at(query);
        if (humidity == 0.0) {
            return renamed(dryAir);
        }
        double vapour = HumidAirLaws.vapourFraction(humidity, temperature, pressure);
        if (!(vapour <= LARGEST_VAPOUR)) {
            throw new OutOfTableException(
                    MediumParameter.HUMIDITY,
                    Why.OUTSIDE,
                    "air with a humidity of " + Phrases.percent(humidity) + " at " + Phrases.celsius(temperature)
                            + " and "
                            + Phrases.pressure(pressure) + " would be more than " + Phrases.percent(LARGEST_VAPOUR)
                            + " water vapour. Choose a lower humidity (0 % is dry air) or temperature.");
        }
        double molarMass = (1.0 - vapour) * HumidAirLaws.DRY_MOLAR_MASS + vapour * HumidAirLaws.WATER_MOLAR_MASS;
        double viscosity = GasState.wilke(
                vapour,
                HumidAirLaws.vapourViscosity(temperature),
                HumidAirLaws.WATER_MOLAR_MASS,
                dryAir.viscosity(),
                dry.molarMass());
        boolean cramer = CRAMER_TEMPERATURE.contains(temperature)
                && CRAMER_PRESSURE.contains(pressure)
                && vapour <= CRAMER_VAPOUR;
        return new Medium(
                "air, " + Phrases.percent(humidity) + " humidity",
                Phase.GAS,
                temperature,
                pressure,
                HumidAirLaws.density(vapour, temperature, pressure),
                viscosity,
                OptionalDouble.of(
                        cramer
                                ? HumidAirLaws.soundSpeed(vapour, temperature, pressure)
                                : mixedSoundSpeed(temperature, pressure, vapour, molarMass)),
                GasState.meanFreePath(viscosity, temperature, pressure, molarMass),
                sources(temperature, pressure, vapour, cramer),
                caveats(temperature, pressure, vapour));
    }

    private double mixedSoundSpeed(double temperature, double pressure, double vapour, double molarMass) {
        double air = GasState.heatCapacity(dry.perfectGamma(temperature).orElseThrow());
        double mixed = (1.0 - vapour) * air + vapour * VAPOUR_HEAT_CAPACITY;
        return dry.virial(temperature).soundSpeed(GasState.gamma(mixed), temperature, pressure, molarMass);
    }

    private static boolean cipm(double temperature, double pressure) {
        return CIPM_TEMPERATURE.contains(temperature) && CIPM_PRESSURE.contains(pressure);
    }

    /**
     * What the density loses outside the stated range, by comparison with second virial coefficients of air, steam and the unlike pair up to
     * 120 °C and 0.9 MPa (in the tests): a part of dry air that grows with the pressure, a part of x_v², whose term changes sign at
     * 84 °C, and a part of x_v p.
     */
    private static double stretched(double pressure, double vapour) {
        double megapascal = 1e-6 * pressure;
        return 2e-4 + 2e-3 * megapascal + 0.03 * vapour * vapour + 0.05 * vapour * megapascal;
    }

    private List<PropertySource> sources(double temperature, double pressure, double vapour, boolean cramer) {
        List<PropertySource> sources = new ArrayList<>();
        PropertySource density = header.source("density");
        sources.add(cipm(temperature, pressure) ? density : density.widened(stretched(pressure, vapour)));
        sources.add(header.source("viscosity"));
        sources.add(
                cramer
                        ? header.source("sound speed")
                        : new PropertySource(
                                "sound speed",
                                "mixture of dry air by its table and vapour with c_p = 4.04 R (from memory)",
                                PropertySource.Reading.OWN,
                                OptionalDouble.of(MIXTURE_SOUND)));
        return sources;
    }

    private static List<Caveat> caveats(double temperature, double pressure, double vapour) {
        if (cipm(temperature, pressure)) {
            return List.of();
        }
        return List.of(new Caveat(
                Caveat.Subject.MEDIUM,
                Caveat.Weight.WEAK,
                "Density of moist air: CIPM-2007 is stated for 15 °C to 27 °C and 60 kPa to 110 kPa and is stretched to "
                        + Phrases.celsius(temperature) + " and " + Phrases.pressure(pressure) + ", within about "
                        + Phrases.percent(stretched(pressure, vapour)) + "."));
    }

    private static Medium renamed(Medium dryAir) {
        return new Medium(
                "air, dry",
                dryAir.phase(),
                dryAir.temperature(),
                dryAir.pressure(),
                dryAir.density(),
                dryAir.viscosity(),
                dryAir.soundSpeed(),
                dryAir.meanFreePath(),
                dryAir.sources(),
                dryAir.caveats());
    }
}
