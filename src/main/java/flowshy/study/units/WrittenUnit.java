package flowshy.study.units;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The unit in which somebody wrote a number, to show others in the same.
 *
 * @param symbol as written, empty for a pure number
 * @param zero SI value of nothing in that unit: 273.15 K for degC, else 0
 * @param one SI value of one
 */
public record WrittenUnit(String symbol, double zero, double one) {
    private static final Pattern NUMBER = Pattern.compile("\\s*[-+\u2212]?[0-9.]+(?:[eE][-+]?[0-9]+)?\\s*");

    /** Units read already: a map names the numbers of every place that makes no device. */
    private static final Map<Sort, WrittenUnit> KNOWN = new ConcurrentHashMap<>();

    private static final int MOST = 1000;

    private record Sort(String symbol, Dimension dimension) {}

    /**
     * The unit of a text.
     *
     * @param written number and unit, readable as that dimension
     * @param dimension what it measures
     * @return its unit
     * @throws QuantityException if the text has no such unit
     */
    public static WrittenUnit of(String written, Dimension dimension) {
        Matcher number = NUMBER.matcher(written);
        String symbol = number.lookingAt() ? written.substring(number.end()).strip() : "";
        Sort sort = new Sort(symbol, dimension);
        WrittenUnit known = KNOWN.get(sort);
        if (known != null) {
            return known;
        }
        WrittenUnit unit = new WrittenUnit(symbol, read("0 ", symbol, dimension), read("1 ", symbol, dimension));
        if (KNOWN.size() < MOST) {
            KNOWN.put(sort, unit);
        }
        return unit;
    }

    private static double read(String number, String symbol, Dimension dimension) {
        String text = (number + symbol).strip();
        return dimension.swings()
                ? Quantity.readAmplitude(text, dimension).value()
                : Quantity.read(text, dimension).value();
    }

    /**
     * A value in this unit.
     *
     * @param value in SI
     * @return the number before the symbol
     */
    public double show(double value) {
        return (value - zero) / (one - zero);
    }

    /**
     * A value as it would be written in this unit.
     *
     * @param value in SI
     * @return six significant digits and the symbol
     */
    public String written(double value) {
        return (Digits.six(show(value)) + " " + symbol).strip();
    }
}
