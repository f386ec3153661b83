package flowshy.study.units;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * A unit as an exact fraction of its SI unit: value in SI = value · numerator / denominator.
 *
 * @param numerator exact unless a root was taken
 * @param denominator exact unless a root was taken
 * @param exponents over the base units
 */
record Unit(BigDecimal numerator, BigDecimal denominator, Exponents exponents) {
    /** Digits kept before the one rounding to double; doubles need 17. */
    static final MathContext DIGITS = new MathContext(50);

    /** The unit of a pure number. */
    static final Unit ONE = new Unit(BigDecimal.ONE, BigDecimal.ONE, Exponents.NONE);

    /** This unit times another one to a power counted in halves. */
    Unit times(Unit other, int halves) {
        BigDecimal top = power(other.numerator, Math.abs(halves));
        BigDecimal bottom = power(other.denominator, Math.abs(halves));
        Exponents together = exponents.times(other.exponents, halves);
        return halves > 0
                ? new Unit(numerator.multiply(top), denominator.multiply(bottom), together)
                : new Unit(numerator.multiply(bottom), denominator.multiply(top), together);
    }

    /** This unit with a factor before it. */
    Unit scaled(BigDecimal factor) {
        return new Unit(numerator.multiply(factor), denominator, exponents);
    }

    private static BigDecimal power(BigDecimal base, int halves) {
        BigDecimal whole = base.pow(halves / 2);
        return halves % 2 == 0 ? whole : whole.multiply(base.sqrt(DIGITS));
    }
}
