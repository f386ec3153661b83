package flowshy.report;

import java.math.BigDecimal;
import java.math.MathContext;
import org.hipparchus.util.FastMath;

/** The one place where numbers become text: fixed significant digits, point as decimal sign, the same on every JVM. */
final class Figures {
    /** Digits of numbers that a program reads. */
    static final int FULL = 12;

    private Figures() {}

    /**
     * A number for people: plain between 0.001 and a million, with an exponent outside.
     *
     * @param value finite
     * @param digits significant digits
     * @return text such as {@code 0.0123} or {@code 1.23e-09}
     */
    static String of(double value, int digits) {
        if (value == 0.0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits));
        double size = FastMath.abs(rounded.doubleValue());
        if (size >= 1e-3 && size < 1e6) {
            // keeps the zeros that the digits promise: 20.00, but not 20000.
            int decimals = digits - (rounded.precision() - rounded.scale());
            return rounded.setScale(FastMath.max(0, decimals), java.math.RoundingMode.HALF_EVEN)
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
    static String full(double value) {
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
