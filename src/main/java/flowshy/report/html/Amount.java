package flowshy.report.html;

import flowshy.math.Figures;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * A number as print sets it: with an SI prefix where the unit takes one, else plain or times a power of ten.
 *
 * @param value in the unit, finite or not
 * @param unit as the columns write it in ASCII, e.g. {@code N.m/rad}; empty for pure numbers
 * @param digits significant digits
 */
public record Amount(double value, String unit, int digits) {
    private static final String PREFIXES = "pnµm kMG";
    private static final int LOWEST = -12;

    /** Units whose first symbol takes a prefix with its first power. */
    private static final List<String> SCALED = List.of(
            "m",
            "s",
            "Pa",
            "N",
            "N.m",
            "N.m/rad",
            "N.m.s/rad",
            "N.m per m/s2",
            "Pa.s",
            "rad",
            "rad/rtHz",
            "rad/(m/s2)",
            "rad per m/s2",
            "m/s",
            "m/s rms",
            "m/s2",
            "m/s2 rms",
            "m/s2/rtHz",
            "Hz");

    /**
     * The text.
     *
     * @return e.g. {@code 540.0 µm}, {@code 5.507×10⁻¹⁶ kg·m²}
     */
    public String text() {
        if (Double.isFinite(value) && value != 0.0 && unit.equals("kg")) {
            return prefixed(1e3 * value, "g");
        }
        if (Double.isFinite(value) && value != 0.0 && SCALED.contains(unit)) {
            return prefixed(value, unit);
        }
        return figures() + gap() + Typography.unit(unit);
    }

    /**
     * The number alone, in its unit without a prefix.
     *
     * @return e.g. {@code 26.22} or {@code 1.2×10⁻⁵}
     */
    public String figures() {
        return plain(value, digits);
    }

    /**
     * For programs.
     *
     * @return twelve significant digits in the unit, without a prefix; {@code infinite} or {@code undefined} where there is no number
     */
    public String machine() {
        return Double.isFinite(value) ? Figures.full(value) : Figures.of(value, digits);
    }

    private String gap() {
        return unit.isEmpty() || unit.equals("deg") ? "" : "\u00A0";
    }

    private String prefixed(double number, String of) {
        int power = power(number);
        if (power < LOWEST || power >= LOWEST + 3 * PREFIXES.length()) {
            return plain(number, digits) + "\u00A0" + Typography.unit(of);
        }
        return plain(number / FastMath.pow(10.0, power), digits) + "\u00A0" + prefix(power) + Typography.unit(of);
    }

    /** The power of a thousand that leaves one to three digits before the point, rounding counted. */
    private int power(double number) {
        BigDecimal rounded = new BigDecimal(number).round(new MathContext(digits));
        int exponent = rounded.precision() - rounded.scale() - 1;
        return 3 * Math.floorDiv(exponent, 3);
    }

    private static String prefix(int power) {
        char letter = PREFIXES.charAt((power - LOWEST) / 3);
        return letter == ' ' ? "" : String.valueOf(letter);
    }

    /**
     * A number without an E.
     *
     * @param value any
     * @param digits significant digits
     * @return with a true minus sign and, outside 0.001 to a million, a power of ten
     */
    static String plain(double value, int digits) {
        return Typography.number(Figures.of(value, digits));
    }

    /** One scale for a column of a table: a prefix that brings the middle of its values between one and a thousand. */
    record Scale(String prefix, double factor) {
        /** No prefix. */
        static final Scale NONE = new Scale("", 1.0);

        static Scale of(String unit, List<Double> values) {
            List<Double> sizes = values.stream()
                    .map(FastMath::abs)
                    .filter(size -> size > 0.0 && Double.isFinite(size))
                    .sorted()
                    .toList();
            // one kind of frequency on a page: in hertz
            if (sizes.isEmpty() || unit.equals("Hz") || !SCALED.contains(Typography.ascii(unit))) {
                return NONE;
            }
            int exponent = (int) FastMath.floor(FastMath.log10(sizes.get(sizes.size() / 2)));
            int power = FastMath.max(LOWEST, FastMath.min(9, 3 * Math.floorDiv(exponent, 3)));
            return new Scale(Amount.prefix(power), FastMath.pow(10.0, -power));
        }

        /** A value of the column on this scale, half to even, its digits kept. */
        String text(double value, int digits) {
            double scaled = new BigDecimal(value)
                    .multiply(new BigDecimal(factor))
                    .round(new MathContext(17, RoundingMode.HALF_EVEN))
                    .doubleValue();
            return plain(scaled, digits);
        }
    }
}
