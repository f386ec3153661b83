package flowshy.cli;

import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.MediumParameter;
import flowshy.medium.MediumQuery;
import flowshy.medium.UnfitParameterException;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Option;

/** The state of a medium on the command line. */
final class MediumOptions {
    @Option(
            names = "--temperature",
            converter = QuantityConverters.Temperature.class,
            description = "e.g. \"22 degC\"; taken as 20 degC")
    private Double temperature = MediumQuery.USUAL_TEMPERATURE;

    @Option(
            names = "--pressure",
            converter = QuantityConverters.Pressure.class,
            description = "e.g. \"98 kPa\"; taken as 101.325 kPa")
    private Double pressure = MediumQuery.USUAL_PRESSURE;

    @Option(
            names = "--humidity",
            converter = QuantityConverters.Share.class,
            description = "relative humidity of air, e.g. \"45 %%\"; taken as 50 %%")
    private Double humidity;

    @Option(
            names = "--mass-fraction",
            converter = QuantityConverters.Share.class,
            description = "of the named substance in water, e.g. \"60 %%\"")
    private Double massFraction;

    @Option(
            names = "--salinity",
            converter = QuantityConverters.Salinity.class,
            description = "practical salinity of sea water, a pure number, e.g. 35")
    private Double salinity;

    @Option(
            names = "--grade",
            converter = QuantityConverters.Grade.class,
            description = "nominal viscosity of an oil, e.g. \"100 cSt\"")
    private Double grade;

    @ArgGroup(exclusive = false)
    private SecondGas second;

    /** A second gas and its share belong together. */
    static final class SecondGas {
        @Option(names = "--second", required = true, paramLabel = "NAME", description = "a second gas mixed in")
        private String name;

        @Option(
                names = "--share",
                required = true,
                converter = QuantityConverters.Share.class,
                description = "mole fraction of the second gas, e.g. \"20 %%\"")
        private Double share;
    }

    /**
     * The medium at the state of the options; the usual humidity is taken for humid air.
     *
     * @param name a known medium
     * @return its properties
     */
    Medium medium(String name) {
        MediumQuery query = MediumQuery.of(name, temperature, pressure);
        query = with(query, MediumParameter.HUMIDITY, humidity);
        query = with(query, MediumParameter.MASS_FRACTION, massFraction);
        query = with(query, MediumParameter.SALINITY, salinity);
        query = with(query, MediumParameter.GRADE, grade);
        if (second != null) {
            query = query.with(second.name, second.share);
        }
        try {
            return Media.at(query);
        } catch (UnfitParameterException e) {
            if (e.missing() && e.parameter() == MediumParameter.HUMIDITY) {
                return Media.at(query.with(MediumParameter.HUMIDITY, MediumQuery.USUAL_HUMIDITY));
            }
            throw e;
        }
    }

    private static MediumQuery with(MediumQuery query, MediumParameter parameter, Double value) {
        return value == null ? query : query.with(parameter, value);
    }
}
