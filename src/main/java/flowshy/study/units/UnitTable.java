package flowshy.study.units;

import java.math.BigDecimal;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * The closed table of unit symbols and prefixes.
 *
 * <p>Factors are those of the SI brochure (9th edition, 2019) and NIST SP 811 (2008), app. B, exact by definition except
 * psi, which follows exactly from the pound and the inch, and mmHg (conventional, 133.322387415 Pa). All from memory.
 */
final class UnitTable {
    /** π to 50 digits (OEIS A000796). */
    private static final BigDecimal PI = new BigDecimal("3.1415926535897932384626433832795028841971693993751");

    /** Standard gravity (3rd CGPM 1901) [m/s²]. */
    private static final String GRAVITY = "9.80665";

    private static final Map<String, Integer> PREFIXES = new LinkedHashMap<>();
    private static final Map<String, Integer> LONG_PREFIXES = new LinkedHashMap<>();
    /** Symbols that take prefixes. */
    private static final Map<String, Unit> SYMBOLS = new LinkedHashMap<>();
    /** Spelled-out names that take spelled-out prefixes and a plural s. */
    private static final Map<String, Unit> NAMES = new LinkedHashMap<>();
    /** Taken only exactly so. */
    private static final Map<String, Unit> FIXED = new LinkedHashMap<>();

    private static final Unit GRAM = unit("1", "1000", Exponents.of(0, 1, 0));
    private static final Unit FREE_FALL = unit(GRAVITY, "1", Exponents.of(1, 0, -2));

    static {
        prefixes();
        symbols();
        names();
        fixed();
    }

    private UnitTable() {}

    /** The unit of one symbol, prefix included; {@code g}, {@code mg} … are of gravity where an acceleration is wanted. */
    static Optional<Unit> find(String symbol, boolean gravity) {
        if (FIXED.containsKey(symbol)) {
            return Optional.of(FIXED.get(symbol));
        }
        Optional<Unit> found = prefixed(symbol, PREFIXES, SYMBOLS, gravity);
        if (found.isEmpty()) {
            found = prefixed(symbol, LONG_PREFIXES, NAMES, false);
        }
        if (found.isEmpty() && symbol.endsWith("s")) {
            found = prefixed(symbol.substring(0, symbol.length() - 1), LONG_PREFIXES, NAMES, false);
        }
        return found;
    }

    /** Every symbol without prefix, to find a near one. */
    static List<String> symbolsKnown() {
        return Stream.of(SYMBOLS, NAMES, FIXED)
                .flatMap(m -> m.keySet().stream())
                .toList();
    }

    private static Optional<Unit> prefixed(
            String symbol, Map<String, Integer> prefixes, Map<String, Unit> table, boolean gravity) {
        Optional<Unit> bare = bare(symbol, table, gravity);
        if (bare.isPresent()) {
            return bare;
        }
        for (Map.Entry<String, Integer> prefix : prefixes.entrySet()) {
            if (symbol.startsWith(prefix.getKey())) {
                boolean small = prefix.getValue() < 0;
                Optional<Unit> rest = bare(symbol.substring(prefix.getKey().length()), table, gravity && small);
                if (rest.isPresent()) {
                    return rest.map(u -> u.scaled(BigDecimal.ONE.scaleByPowerOfTen(prefix.getValue())));
                }
            }
        }
        return Optional.empty();
    }

    private static Optional<Unit> bare(String symbol, Map<String, Unit> table, boolean gravity) {
        return gravity && symbol.equals("g") ? Optional.of(FREE_FALL) : Optional.ofNullable(table.get(symbol));
    }

    private static void prefixes() {
        String[] marks = {"f", "p", "n", "u", "\u00B5", "\u03BC", "m", "c", "d", "h", "k", "M", "G", "T"};
        int[] powers = {-15, -12, -9, -6, -6, -6, -3, -2, -1, 2, 3, 6, 9, 12};
        for (int i = 0; i < marks.length; i++) {
            PREFIXES.put(marks[i], powers[i]);
        }
        String[] words = {"femto", "pico", "nano", "micro", "milli", "centi", "deci", "hecto", "kilo", "mega", "giga"};
        int[] wordPowers = {-15, -12, -9, -6, -3, -2, -1, 2, 3, 6, 9};
        for (int i = 0; i < words.length; i++) {
            LONG_PREFIXES.put(words[i], wordPowers[i]);
        }
    }

    private static void symbols() {
        SYMBOLS.put("m", unit("1", "1", Exponents.of(1, 0, 0)));
        SYMBOLS.put("g", GRAM);
        SYMBOLS.put("s", unit("1", "1", Exponents.of(0, 0, 1)));
        SYMBOLS.put("K", unit("1", "1", Dimension.TEMPERATURE_STEP));
        SYMBOLS.put("rad", unit("1", "1", Dimension.ANGLE));
        SYMBOLS.put("Hz", unit("1", "1", Dimension.FREQUENCY));
        SYMBOLS.put("N", unit("1", "1", Exponents.of(1, 1, -2)));
        SYMBOLS.put("J", unit("1", "1", Exponents.of(2, 1, -2)));
        SYMBOLS.put("Pa", unit("1", "1", Dimension.PRESSURE));
        SYMBOLS.put("bar", unit("1e5", "1", Dimension.PRESSURE));
        SYMBOLS.put("Torr", unit("101325", "760", Dimension.PRESSURE));
        SYMBOLS.put("L", unit("1", "1000", Dimension.VOLUME));
        SYMBOLS.put("l", unit("1", "1000", Dimension.VOLUME));
        SYMBOLS.put("P", unit("1", "10", Dimension.VISCOSITY));
        SYMBOLS.put("St", unit("1", "10000", Dimension.KINEMATIC_VISCOSITY));
        SYMBOLS.put("dyn", unit("1", "100000", Exponents.of(1, 1, -2)));
        SYMBOLS.put("Gal", unit("1", "100", Dimension.ACCELERATION));
        SYMBOLS.put("gn", FREE_FALL);
        SYMBOLS.put("V", unit("1", "1", Exponents.NONE.volts(1)));
    }

    private static void names() {
        for (String name : List.of("metre", "meter")) {
            NAMES.put(name, SYMBOLS.get("m"));
        }
        for (String name : List.of("litre", "liter")) {
            NAMES.put(name, SYMBOLS.get("L"));
        }
        NAMES.put("gram", GRAM);
        NAMES.put("second", SYMBOLS.get("s"));
        NAMES.put("hertz", SYMBOLS.get("Hz"));
        NAMES.put("radian", SYMBOLS.get("rad"));
        NAMES.put("newton", SYMBOLS.get("N"));
        NAMES.put("pascal", SYMBOLS.get("Pa"));
        NAMES.put("kelvin", SYMBOLS.get("K"));
        NAMES.put("volt", SYMBOLS.get("V"));
        NAMES.put("poise", SYMBOLS.get("P"));
        NAMES.put("stokes", SYMBOLS.get("St"));
        NAMES.put("degree", degree("1"));
        NAMES.put("micron", unit("1e-6", "1", Exponents.of(1, 0, 0)));
        NAMES.put("minute", unit("60", "1", Exponents.of(0, 0, 1)));
        NAMES.put("hour", unit("3600", "1", Exponents.of(0, 0, 1)));
    }

    private static void fixed() {
        FIXED.put("in", inch("1"));
        FIXED.put("inch", inch("1"));
        FIXED.put("inches", inch("1"));
        FIXED.put("mil", inch("1e-3"));
        FIXED.put("thou", inch("1e-3"));
        FIXED.put("ft", inch("12"));
        FIXED.put("feet", inch("12"));
        FIXED.put("sec", SYMBOLS.get("s"));
        FIXED.put("min", NAMES.get("minute"));
        FIXED.put("h", NAMES.get("hour"));
        FIXED.put("hr", NAMES.get("hour"));
        FIXED.put("cc", unit("1e-6", "1", Dimension.VOLUME));
        FIXED.put("t", unit("1000", "1", Exponents.of(0, 1, 0)));
        FIXED.put("atm", unit("101325", "1", Dimension.PRESSURE));
        FIXED.put("mmHg", unit("133.322387415", "1", Dimension.PRESSURE));
        FIXED.put("torr", SYMBOLS.get("Torr"));
        FIXED.put("psi", unit("4.4482216152605", "0.00064516", Dimension.PRESSURE));
        FIXED.put("kph", unit("1000", "3600", Dimension.SPEED));
        FIXED.put("mph", unit("1609.344", "3600", Dimension.SPEED));
        FIXED.put("rpm", unit("1", "60", Dimension.FREQUENCY));
        FIXED.put("deg", degree("1"));
        FIXED.put("°", degree("1"));
        FIXED.put("arcmin", degree("60"));
        FIXED.put("arcsec", degree("3600"));
        FIXED.put("dB", unit("1", "1", Dimension.LEVEL));
        FIXED.put("%", unit("1", "100", Exponents.NONE));
        FIXED.put("%RH", unit("1", "100", Exponents.NONE));
        FIXED.put("ppm", unit("1", "1e6", Exponents.NONE));
        FIXED.put("‰", unit("1", "1000", Exponents.NONE));
        for (String celsius : List.of("degC", "°C", "\u2103", "C", "celsius", "Celsius")) {
            FIXED.put(celsius, unit("1", "1", Dimension.TEMPERATURE_STEP));
        }
        for (String fahrenheit : List.of("degF", "°F", "\u2109", "F")) {
            FIXED.put(fahrenheit, unit("5", "9", Dimension.TEMPERATURE_STEP));
        }
    }

    /** Where the scale of a temperature starts, in its own degrees below its zero; empty for the kelvin. */
    static Optional<BigDecimal> zero(String symbol) {
        return switch (symbol) {
            case "degC", "°C", "\u2103", "C", "celsius", "Celsius" -> Optional.of(new BigDecimal("273.15"));
            case "degF", "°F", "\u2109", "F" -> Optional.of(new BigDecimal("459.67"));
            default -> Optional.empty();
        };
    }

    private static Unit inch(String count) {
        return unit("0.0254", "1", Exponents.of(1, 0, 0)).scaled(new BigDecimal(count));
    }

    private static Unit degree(String parts) {
        return new Unit(PI, new BigDecimal(parts).multiply(new BigDecimal(180)), Exponents.NONE.with(1, 0));
    }

    private static Unit unit(String top, String bottom, Dimension dimension) {
        return unit(top, bottom, dimension.exponents());
    }

    private static Unit unit(String top, String bottom, Exponents exponents) {
        return new Unit(new BigDecimal(top), new BigDecimal(bottom), exponents);
    }
}
