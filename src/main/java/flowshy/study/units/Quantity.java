package flowshy.study.units;

import flowshy.study.text.Nearest;
import flowshy.study.text.Printable;
import java.math.BigDecimal;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A number with its unit: in SI inside, and as it was written.
 *
 * @param value in the SI unit of the dimension, rms where it swings; decibels stay decibels
 * @param dimension what it measures
 * @param written the text it came from, blanks at the ends removed
 * @param swing how the strength of an amplitude was stated
 */
public record Quantity(double value, Dimension dimension, String written, Swing swing) {
    private static final Pattern NUMBER =
            Pattern.compile("([+-]?(?:\\d{1,40}(?:\\.\\d{0,40})?|\\.\\d{1,40})(?:[eE][+-]?\\d{1,4})?)");
    private static final Pattern DECIMAL_COMMA = Pattern.compile("[+-]?\\d+,\\d.*");
    private static final Pattern NOT_A_NUMBER = Pattern.compile("(?i)[+-]?\\.?(nan|inf|infinity|∞).*");
    private static final Pattern STRENGTH = Pattern.compile("(.*?)[ (]+(rms|RMS|peak|pk)\\)?");
    private static final Pattern PEAK_TO_PEAK = Pattern.compile("(?i).*(peak-to-peak|pk-pk|p-p|pp|vpp)");
    private static final BigDecimal ROOT_TWO = new BigDecimal(2).sqrt(Unit.DIGITS);
    /** Longer is no number of this world. */
    private static final int LONGEST = 100;

    /**
     * Reads a number with its unit.
     *
     * @param text e.g. {@code 80 um}
     * @param wanted what it must measure
     * @return the quantity
     * @throws QuantityException if there is no finite number, no unit, an unknown unit or one of another dimension
     */
    public static Quantity read(String text, Dimension wanted) {
        return read(text, wanted, false);
    }

    /**
     * Reads the strength of something that swings: {@code rms} or {@code peak} may follow the unit, nothing means rms.
     *
     * @param text e.g. {@code 0.1 m/s2 peak}
     * @param wanted what it must measure, an acceleration or a speed
     * @return the quantity, rms
     * @throws QuantityException as for {@link #read}
     */
    public static Quantity readAmplitude(String text, Dimension wanted) {
        return read(text, wanted, true);
    }

    private static Quantity read(String text, Dimension wanted, boolean amplitude) {
        String written = text.strip();
        String line = written.replaceAll("[\\h]+", " ").replace('\u2212', '-');
        Matcher number = NUMBER.matcher(line);
        if (!number.lookingAt()
                || line.length() > LONGEST
                || DECIMAL_COMMA.matcher(line).matches()) {
            throw noNumber(line, wanted);
        }
        BigDecimal count = new BigDecimal(number.group());
        String rest = line.substring(number.end()).strip();
        Swing swing = Swing.NONE;
        if (amplitude) {
            swing = Swing.ASSUMED_RMS;
            Matcher strength = STRENGTH.matcher(rest);
            if (strength.matches()) {
                rest = strength.group(1).strip();
                swing = strength.group(2).equalsIgnoreCase("rms") ? Swing.RMS : Swing.PEAK;
            }
        }
        BigDecimal value = inSi(count, rest, wanted, line);
        if (swing == Swing.PEAK) {
            value = value.divide(ROOT_TWO, Unit.DIGITS);
        }
        double rounded = value.doubleValue();
        if (Double.isInfinite(rounded) || (rounded == 0.0 && value.signum() != 0)) {
            throw fault(Printable.of(line) + " is beyond what can be computed", proposal(wanted), Optional.empty());
        }
        return new Quantity(rounded, wanted, written, swing);
    }

    private static BigDecimal inSi(BigDecimal count, String symbol, Dimension wanted, String line) {
        if (symbol.isEmpty()) {
            if (wanted == Dimension.NUMBER) {
                return count;
            }
            throw fault(Printable.of(line) + " has no unit", proposal(wanted), Optional.of(withUnit(count, wanted)));
        }
        if (wanted == Dimension.NUMBER) {
            throw fault(
                    Printable.of(line) + " has a unit",
                    "a pure number is wanted here, without a unit",
                    Optional.empty());
        }
        Unit unit = unit(symbol, wanted, line);
        if (!wanted.accepts(unit.exponents())) {
            throw fault(Printable.of(line) + " is " + kind(unit.exponents()), proposal(wanted), Optional.empty());
        }
        BigDecimal shifted = wanted == Dimension.TEMPERATURE
                ? UnitTable.zero(symbol.replace(" ", "")).map(count::add).orElse(count)
                : count;
        return shifted.multiply(unit.numerator()).divide(unit.denominator(), Unit.DIGITS);
    }

    private static String kind(Exponents found) {
        String other = found.sameKind(Dimension.FREQUENCY.exponents())
                ? "a rate per second, not a frequency in cycles (1 Hz is 2π rad/s)"
                : "something else";
        return Dimension.of(found)
                .filter(dimension -> dimension != Dimension.ACCELERATION_PER_SPEED) // who writes 1/s means a rate
                .map(Dimension::phrase)
                .orElse(other);
    }

    private static Unit unit(String symbol, Dimension wanted, String line) {
        try {
            return UnitReader.read(symbol, wanted.gravity());
        } catch (UnitReader.UnitFault e) {
            String found = Printable.of(line) + ": " + e.getMessage();
            if (PEAK_TO_PEAK.matcher(symbol).matches()) {
                throw fault(found, "halve a peak-to-peak value and write peak behind its unit", Optional.empty());
            }
            if (STRENGTH.matcher(symbol).matches()) {
                throw fault(found, "rms or peak is not asked for here", Optional.empty());
            }
            boolean unknown = e.getMessage().startsWith("unknown");
            throw fault(found, proposal(wanted), unknown ? near(symbol, e.hint(), wanted) : e.hint());
        }
    }

    /** Units of the wanted dimension first, then every symbol of the table that gives the unit a sense here. */
    private static Optional<String> near(String whole, Optional<String> symbol, Dimension wanted) {
        return Nearest.among(whole, wanted.units())
                .or(() -> symbol.flatMap(s -> Nearest.among(s, UnitTable.symbolsKnown())
                        .filter(near -> fits(whole.replace(s, near), wanted))));
    }

    private static boolean fits(String unit, Dimension wanted) {
        try {
            return wanted.accepts(UnitReader.read(unit, wanted.gravity()).exponents());
        } catch (UnitReader.UnitFault e) {
            return false;
        }
    }

    private static QuantityException noNumber(String line, Dimension wanted) {
        if (DECIMAL_COMMA.matcher(line).matches()) {
            // 1,000 may be one or a thousand: no guess then
            Optional<String> meant = line.matches("[^,]*,\\d{3}\\b.*|.*,.*,.*")
                    ? Optional.empty()
                    : Optional.of(Printable.of(line.replaceFirst(",", ".")));
            return fault(
                    Printable.of(line) + " has a comma",
                    "write a point for decimals and nothing between thousands",
                    meant);
        }
        if (NOT_A_NUMBER.matcher(line).matches()) {
            return fault(Printable.of(line) + " is not a finite number", proposal(wanted), Optional.empty());
        }
        String found = line.isEmpty() ? "nothing" : Printable.of(line) + " is not a number";
        return fault(found, proposal(wanted), Optional.empty());
    }

    /** What is accepted, in words with units and an example. */
    static String proposal(Dimension wanted) {
        if (wanted == Dimension.NUMBER) {
            return "a pure number is wanted here, such as 5 or 1.2e-3";
        }
        return wanted.phrase() + " is wanted here, with its unit: " + String.join(", ", wanted.units());
    }

    /** A bare share up to one is most likely a fraction, not a percentage. */
    private static String withUnit(BigDecimal count, Dimension wanted) {
        boolean fraction = wanted == Dimension.SHARE && count.abs().compareTo(BigDecimal.ONE) <= 0;
        BigDecimal shown = fraction ? count.movePointRight(2).stripTrailingZeros() : count;
        return Printable.of(shown.toPlainString()) + " " + wanted.units().get(0);
    }

    private static QuantityException fault(String found, String accepted, Optional<String> nearest) {
        return new QuantityException(found, accepted, nearest);
    }

    /**
     * The same quantity with another value.
     *
     * @param other in SI
     * @return written in the same unit
     */
    public Quantity at(double other) {
        return new Quantity(other, dimension, WrittenUnit.of(written, dimension).written(other), swing);
    }

    /**
     * The value in SI as a text, six significant digits.
     *
     * @return e.g. {@code 8e-05 m}
     */
    public String si() {
        String unit = dimension.siUnit().equals("1") ? "" : " " + dimension.siUnit();
        return Digits.six(value) + unit + (swing == Swing.NONE ? "" : " rms");
    }
}
