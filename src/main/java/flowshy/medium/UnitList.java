package flowshy.medium;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Units of one dimension and their way to SI, written as {@code "Pa 1, kPa 1e3"}; a third word is added after the factor
 * ({@code "degC 1 273.15"}), and a lone factor is that of a bare number.
 */
record UnitList(String text) {
    /** Every unit, in the order written. */
    List<Unit> units() {
        List<Unit> units = new ArrayList<>();
        for (String part : text.split(",\\s*", -1)) {
            String[] words = part.split("\\s+", -1);
            if (words.length == 1) {
                units.add(new Unit("", new BigDecimal(words[0]), BigDecimal.ZERO));
            } else {
                BigDecimal offset = words.length > 2 ? new BigDecimal(words[2]) : BigDecimal.ZERO;
                units.add(new Unit(words[0], new BigDecimal(words[1]), offset));
            }
        }
        return units;
    }

    /** The unit of this name. */
    Optional<Unit> find(String name) {
        return units().stream().filter(unit -> unit.name().equals(name)).findFirst();
    }

    /** A unit: SI value is the number times the factor plus the offset. */
    record Unit(String name, BigDecimal factor, BigDecimal offset) {
        /** Rounded once, so that 20 degC in a table and in a study are the same number. */
        double toSi(BigDecimal value) {
            return value.multiply(factor).add(offset).doubleValue();
        }
    }
}
