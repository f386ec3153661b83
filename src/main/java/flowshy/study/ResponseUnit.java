package flowshy.study;

import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.Reading;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.hipparchus.util.FastMath;

/**
 * The unit of a column of amplitudes: an angle or a voltage per acceleration or speed, or decibels above one of them.
 *
 * @param reading angle or voltage, per acceleration or speed
 * @param dimension of the linear unit; a pure number for a ratio
 * @param factor the linear unit in SI
 * @param level whether the numbers are decibels above that unit
 */
record ResponseUnit(Reading reading, Dimension dimension, double factor, boolean level) {
    static final String ACCEPTED =
            "rad/(m/s2), mrad/g, V/(m/s2), mV/g and the like, per speed rad/(m/s), V/(m/s), or dB re one of them";

    /** {@code dB re 1 V/(m/s2)}. */
    private static final Pattern ABOVE = Pattern.compile("dB\\s+re\\.?:?\\s*([0-9.eE+-]+\\s+)?(\\S.*)");

    private static final List<Dimension> RESPONSES = List.of(
            Dimension.ANGLE_PER_ACCELERATION,
            Dimension.ANGLE_PER_SPEED,
            Dimension.VOLTAGE_PER_ACCELERATION,
            Dimension.VOLTAGE_PER_SPEED);

    /** The unit in a heading; empty if it is none of a response. */
    static Optional<ResponseUnit> of(String text, Measurand of) {
        if (of == Measurand.REJECTION) {
            return switch (text) {
                case "dB" -> Optional.of(new ResponseUnit(Reading.RATIO, Dimension.NUMBER, 1.0, true));
                case "", "1", "-" -> Optional.of(new ResponseUnit(Reading.RATIO, Dimension.NUMBER, 1.0, false));
                default -> Optional.empty();
            };
        }
        Matcher above = ABOVE.matcher(text);
        if (above.matches()) {
            String count = above.group(1) == null ? "1" : above.group(1).strip();
            return linear(count, above.group(2)).map(u -> new ResponseUnit(u.reading, u.dimension, u.factor, true));
        }
        return linear("1", text);
    }

    private static Optional<ResponseUnit> linear(String count, String symbol) {
        for (Dimension dimension : RESPONSES) {
            Optional<Double> factor = factor(count, symbol, dimension);
            if (factor.isPresent() && factor.get() > 0.0) {
                boolean volts =
                        dimension == Dimension.VOLTAGE_PER_ACCELERATION || dimension == Dimension.VOLTAGE_PER_SPEED;
                boolean speed = dimension == Dimension.ANGLE_PER_SPEED || dimension == Dimension.VOLTAGE_PER_SPEED;
                return Optional.of(new ResponseUnit(new Reading(volts, speed), dimension, factor.get(), false));
            }
        }
        return Optional.empty();
    }

    private static Optional<Double> factor(String count, String symbol, Dimension dimension) {
        try {
            return Optional.of(Quantity.read(count + " " + symbol, dimension).value());
        } catch (QuantityException e) {
            return Optional.empty();
        }
    }

    /** An amplitude in SI. */
    double amplitude(double number) {
        return level ? factor * FastMath.pow(10.0, number / 20.0) : factor * number;
    }

    /** What makes a standard uncertainty in some unit a share of its amplitude; empty if that unit does not fit. */
    Optional<Share> share(String unit) {
        if (unit.equals("dB")) {
            return Optional.of((number, amplitude) -> number * FastMath.log(10.0) / 20.0);
        }
        Optional<Double> relative = factor("1", unit, Dimension.SHARE);
        if (relative.isPresent()) {
            return Optional.of((number, amplitude) -> number * relative.get());
        }
        Optional<Double> absolute = dimension == Dimension.NUMBER
                ? Optional.of(1.0).filter(one -> unit.isEmpty() || unit.equals("1"))
                : factor("1", unit, dimension);
        return absolute.map(factor -> (number, amplitude) -> number * factor / amplitude);
    }

    /** From a number of a column, and the amplitude [SI] beside it, to a share. */
    interface Share {
        double of(double number, double amplitude);
    }
}
