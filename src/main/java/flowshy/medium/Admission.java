package flowshy.medium;

import flowshy.math.Range;
import flowshy.medium.OutOfTableException.Why;
import java.util.OptionalDouble;

/** Lets a query pass only if its state and parameters lie where the medium is known. */
final class Admission {
    private static final double ROUNDING = 1e-14;

    private Admission() {}

    /** Whether each parameter that the medium needs is there and inside its range, and no other. */
    static void parameters(TableHeader header, MediumQuery query) {
        for (AcceptedParameter accepted : header.parameters()) {
            MediumParameter parameter = accepted.parameter();
            OptionalDouble value = query.value(parameter);
            if (value.isEmpty()) {
                throw new UnfitParameterException(
                        parameter,
                        true,
                        header.medium() + " needs its " + parameter.key() + ", " + say(accepted.range(), parameter));
            }
            if (!inside(accepted.range(), value.getAsDouble())) {
                throw new OutOfTableException(
                        parameter,
                        Why.OUTSIDE,
                        header.medium() + " covers a " + parameter.key() + " of " + say(accepted.range(), parameter)
                                + "; " + say(value.getAsDouble(), parameter) + " was asked for.");
            }
        }
        for (MediumParameter stated : query.parameters().keySet()) {
            if (header.parameters().stream().noneMatch(a -> a.parameter() == stated)) {
                throw new UnfitParameterException(
                        stated, false, header.medium() + " takes no " + stated.key() + "; leave it out.");
            }
        }
    }

    /** Whether temperature and pressure lie in the ranges of the header. */
    static void state(TableHeader header, MediumQuery query) {
        double temperature = query.temperature();
        if (header.freezing().isPresent() && temperature < header.freezing().getAsDouble() * (1.0 - ROUNDING)) {
            throw new OutOfTableException(
                    MediumParameter.TEMPERATURE,
                    Why.FREEZES,
                    header.medium() + " freezes at "
                            + Phrases.celsius(header.freezing().getAsDouble()) + "; " + Phrases.celsius(temperature)
                            + " was asked for. Choose a temperature above.");
        }
        Range range = header.temperatures();
        if (!inside(range, temperature)) {
            throw new OutOfTableException(
                    MediumParameter.TEMPERATURE,
                    Why.OUTSIDE,
                    header.medium() + " covers " + Phrases.celsius(range.low()) + " to " + Phrases.celsius(range.high())
                            + "; "
                            + Phrases.celsius(temperature)
                            + " was asked for. Choose a temperature inside, or add rows with their source.");
        }
        Range pressures = header.pressures();
        if (!inside(pressures, query.pressure())) {
            throw new OutOfTableException(
                    MediumParameter.PRESSURE,
                    Why.OUTSIDE,
                    header.medium() + " covers " + Phrases.pressure(pressures.low()) + " to "
                            + Phrases.pressure(pressures.high()) + "; " + Phrases.pressure(query.pressure())
                            + " was asked for. Choose a pressure inside.");
        }
    }

    /** The ends count as inside also after a conversion that lost the last bit, as 273.15 − 60 does; zero and negative ends are exact. */
    private static boolean inside(Range range, double value) {
        return value >= range.low() * (1.0 - ROUNDING) && value <= range.high() * (1.0 + ROUNDING);
    }

    private static String say(Range range, MediumParameter parameter) {
        return say(range.low(), parameter) + " to " + say(range.high(), parameter);
    }

    private static String say(double value, MediumParameter parameter) {
        return switch (parameter) {
            case HUMIDITY, MASS_FRACTION -> Phrases.percent(value);
            case GRADE -> Phrases.number(1e6 * value, 3) + " mm2/s";
            default -> Phrases.number(value, 3);
        };
    }
}
