package flowshy.report.chart.paper;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers on axes and in notes: plain where that is short, powers of ten else; a true minus sign. */
public final class TickText {
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final String MINUS = "−";

    /** Thin space that no line is broken at. */
    private static final String GROUP = "\u2009";

    private TickText() {}

    /**
     * A rounded number.
     *
     * @param value finite
     * @param digits significant digits at most; zeros at the end are left out
     * @return e.g. {@code 0.02}, {@code 12 500}, {@code 3.2·10⁻⁹}
     */
    public static String of(double value, int digits) {
        if (value == 0.0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value)
                .round(new MathContext(digits, RoundingMode.HALF_EVEN))
                .stripTrailingZeros();
        int exponent = rounded.precision() - rounded.scale() - 1;
        String sign = rounded.signum() < 0 ? MINUS : "";
        if (exponent >= -3 && exponent <= 5) {
            return sign + grouped(rounded.abs().toPlainString());
        }
        String mantissa = rounded.abs().movePointLeft(exponent).toPlainString();
        return sign + (mantissa.equals("1") ? "" : mantissa + "·") + power(exponent);
    }

    /**
     * A frequency.
     *
     * @param frequency [Hz]
     * @param digits significant digits at most
     * @return with Hz or kHz
     */
    public static String hertz(double frequency, int digits) {
        return frequency >= 1e4 ? of(1e-3 * frequency, digits) + " kHz" : of(frequency, digits) + " Hz";
    }

    /**
     * A power of ten.
     *
     * @param exponent whole
     * @return e.g. {@code 10⁻⁶}
     */
    static String power(int exponent) {
        StringBuilder text = new StringBuilder("10");
        if (exponent < 0) {
            text.append('⁻');
        }
        for (char digit : Integer.toString(Math.abs(exponent)).toCharArray()) {
            text.append(RAISED.charAt(digit - '0'));
        }
        return text.toString();
    }

    private static String grouped(String plain) {
        int point = plain.indexOf('.');
        int whole = point < 0 ? plain.length() : point;
        if (whole <= 4) {
            return plain;
        }
        return plain.substring(0, whole - 3) + GROUP + plain.substring(whole - 3);
    }
}
