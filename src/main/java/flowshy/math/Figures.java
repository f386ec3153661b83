package flowshy.math;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.hipparchus.util.FastMath;

/** The one place where numbers become text: fixed significant digits, point as decimal sign, the same on every JVM. */
public final class Figures {
    /** Digits of numbers that a program reads. */
    public static final int FULL = 12;

    private static final Pattern MARK = Pattern.compile("%(?:\\.(\\d)g|s|%)");

    private static final Pattern FIGURE = Pattern.compile("-?[0-9][0-9.e+-]*");

    private Figures() {}

    /**
     * A number for people: plain between 0.001 and a million, with an exponent outside.
     *
     * @param value any
     * @param digits significant digits
     * @return text such as {@code 0.0123} or {@code 1.23e-09}; {@code infinite} or {@code undefined} where there is no number
     */
    public static String of(double value, int digits) {
        if (!Double.isFinite(value)) {
            return Double.isNaN(value) ? "undefined" : "infinite";
        }
        if (value == 0.0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits));
        double size = FastMath.abs(rounded.doubleValue());
        if (size >= 1e-3 && size < 1e6) {
            // keeps the zeros that the digits promise: 20.00, but not 20000.
            int decimals = digits - (rounded.precision() - rounded.scale());
            return rounded.setScale(FastMath.max(0, decimals), RoundingMode.HALF_EVEN)
                    .toPlainString();
        }
        return exponential(rounded, digits);
    }

    /**
     * A number for programs.
     *
     * @param value finite
     * @return up to twelve significant digits, no trailing zeros
     */
    public static String full(double value) {
        if (value == 0.0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(FULL)).stripTrailingZeros();
        double size = FastMath.abs(rounded.doubleValue());
        if (size >= 1e-3 && size < 1e9) {
            return rounded.toPlainString();
        }
        return exponential(rounded, rounded.precision());
    }

    /**
     * A sentence with figures in it.
     *
     * @param text with {@code %.3g} for a number of three digits, {@code %s} for a text and {@code %%} for a per cent sign
     * @param values one for each mark but {@code %%}, in order
     * @return the sentence
     * @throws IllegalArgumentException if marks and values do not match in number
     */
    public static String say(String text, Object... values) {
        Matcher mark = MARK.matcher(text);
        StringBuilder sentence = new StringBuilder();
        int next = 0;
        while (mark.find()) {
            String figure;
            if (mark.group().equals("%%")) {
                figure = "%";
            } else if (next == values.length) {
                throw new IllegalArgumentException("too few values for: " + text);
            } else if (mark.group(1) != null) {
                figure = of(((Number) values[next++]).doubleValue(), Integer.parseInt(mark.group(1)));
            } else {
                figure = String.valueOf(values[next++]);
            }
            mark.appendReplacement(sentence, Matcher.quoteReplacement(figure));
        }
        if (next != values.length) {
            throw new IllegalArgumentException("too many values for: " + text);
        }
        return mark.appendTail(sentence).toString();
    }

    /**
     * A sentence without its figures, so that those that differ in nothing else can be told as one.
     *
     * @param sentence any
     * @return with a mark in place of each number
     */
    public static String blanked(String sentence) {
        return FIGURE.matcher(sentence).replaceAll("#");
    }

    private static String exponential(BigDecimal value, int digits) {
        String figures = value.unscaledValue().abs().toString();
        StringBuilder text = new StringBuilder(figures);
        while (text.length() < digits) {
            text.append('0');
        }
        int exponent = value.precision() - value.scale() - 1;
        if (digits > 1) {
            text.insert(1, '.');
        }
        text.append(exponent < 0 ? "e-" : "e+");
        text.append(FastMath.abs(exponent) < 10 ? "0" : "").append(FastMath.abs(exponent));
        return (value.signum() < 0 ? "-" : "") + text;
    }
}
