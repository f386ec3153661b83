package flowshy.medium;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** Values in the words of messages: degrees Celsius, kilopascal, per cent. */
final class Phrases {
    private static final double ICE_POINT = 273.15;

    private Phrases() {}

    /** A temperature [K] in °C, two decimals at most. */
    static String celsius(double temperature) {
        return number(temperature - ICE_POINT, 2) + " °C";
    }

    /** A pressure [Pa] in the unit that suits its size. */
    static String pressure(double pressure) {
        return pressure < 1e3 ? number(pressure, 3) + " Pa" : number(1e-3 * pressure, 3) + " kPa";
    }

    /** A share [-] in per cent. */
    static String percent(double share) {
        return number(100.0 * share, 3) + " %";
    }

    /** A number with at most so many decimals and no trailing zeros. Without a format string, which costs a command its first tenth. */
    static String number(double value, int decimals) {
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }
}
