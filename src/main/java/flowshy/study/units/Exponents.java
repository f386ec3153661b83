package flowshy.study.units;

import java.util.Objects;

/**
 * Exponents of a unit over the base units, each counted in halves so that √Hz has one.
 *
 * <p>Radian, cycle (the "once" in hertz) and decibel are kept apart although they have no dimension: an angle, a frequency
 * and a level must not pass for each other. The volt counts as a base unit: it is what a readout gives, nothing is computed from it.
 *
 * @param metre of length
 * @param kilogram of mass
 * @param second of time
 * @param kelvin of temperature
 * @param radian of plane angle
 * @param cycle of whole periods
 * @param decibel of level
 * @param volt of what a readout gives
 */
record Exponents(int metre, int kilogram, int second, int kelvin, int radian, int cycle, int decibel, int volt) {
    static final Exponents NONE = new Exponents(0, 0, 0, 0, 0, 0, 0, 0);

    /** Whole exponents of the mechanical base units. */
    static Exponents of(int metre, int kilogram, int second) {
        return new Exponents(2 * metre, 2 * kilogram, 2 * second, 0, 0, 0, 0, 0);
    }

    /** This unit times another one to a power counted in halves. */
    Exponents times(Exponents other, int halves) {
        return new Exponents(
                sum(metre, other.metre, halves),
                sum(kilogram, other.kilogram, halves),
                sum(second, other.second, halves),
                sum(kelvin, other.kelvin, halves),
                sum(radian, other.radian, halves),
                sum(cycle, other.cycle, halves),
                sum(decibel, other.decibel, halves),
                sum(volt, other.volt, halves));
    }

    /** The same with other exponents of radian and cycle, in whole steps. */
    Exponents with(int radians, int cycles) {
        return new Exponents(metre, kilogram, second, kelvin, 2 * radians, 2 * cycles, decibel, volt);
    }

    /** The same with another exponent of the volt, in whole steps. */
    Exponents volts(int volts) {
        return new Exponents(metre, kilogram, second, kelvin, radian, cycle, decibel, 2 * volts);
    }

    /** Whether all but radian and cycle agree. */
    boolean sameKind(Exponents other) {
        return metre == other.metre
                && kilogram == other.kilogram
                && second == other.second
                && kelvin == other.kelvin
                && decibel == other.decibel
                && volt == other.volt;
    }

    /** The equality of a record, written out: the generated one takes 50 ms to be linked, and every study compares units. */
    @Override
    public boolean equals(Object other) {
        return other instanceof Exponents same && sameKind(same) && radian == same.radian && cycle == same.cycle;
    }

    @Override
    public int hashCode() {
        return Objects.hash(metre, kilogram, second, kelvin, radian, cycle, decibel, volt);
    }

    private static int sum(int own, int other, int halves) {
        return Math.addExact(own, Math.multiplyExact(other, halves) / 2);
    }
}
