package flowshy.study.units;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers as short text, the same on every machine. */
final class Digits {
    private static final MathContext SIX = new MathContext(6);

    private Digits() {}

    /** Six significant digits without trailing zeros; powers of ten below 1e-4 and from 1e6. */
    static String six(double value) {
        BigDecimal rounded = new BigDecimal(value).round(SIX).stripTrailingZeros();
        int power = rounded.precision() - rounded.scale() - 1;
        if (rounded.signum() == 0 || (power >= -4 && power < 6)) {
            return rounded.toPlainString();
        }
        return rounded.scaleByPowerOfTen(-power).toPlainString() + "e" + power;
    }
}
