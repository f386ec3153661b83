package flowshy.medium;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** Numbers with units as header lines of property tables write them. */
enum HeaderUnits {
    TEMPERATURE("-60 degC", "degC 1 273.15, K 1"),
    PRESSURE("101325 Pa", "Pa 1, hPa 1e2, kPa 1e3, bar 1e5, MPa 1e6"),
    MOLAR_MASS("0.028 kg/mol", "kg/mol 1, g/mol 1e-3"),
    SHARE("0.1 %", "% 1e-2, 1"),
    GRADE("100 mm2/s", "mm2/s 1e-6, m2/s 1"),
    NUMBER("35", "1");

    private static final Pattern NUMBER_FORM = Pattern.compile("[-+]?(\\d+\\.?\\d*|\\.\\d+)([eE][-+]?\\d{1,3})?");
    private static final int LONGEST_NUMBER = 40;
    private static final double LARGEST = 1e30;

    private final String example;
    private final String units;

    HeaderUnits(String example, String units) {
        this.example = example;
        this.units = units;
    }

    /** How to write one, for messages. */
    String accepted() {
        String names = new UnitList(units)
                .units().stream()
                        .map(UnitList.Unit::name)
                        .filter(name -> !name.isEmpty())
                        .collect(Collectors.joining(", "));
        return "a number with unit, as in '" + example + "'" + (names.isEmpty() ? "" : " (units: " + names + ")");
    }

    /** The value in SI, rounded once; empty if the text is no number of this kind. */
    OptionalDouble parse(String text) {
        String[] parts = text.strip().split("\\s+", 2);
        Optional<UnitList.Unit> unit = new UnitList(units).find(parts.length > 1 ? parts[1] : "");
        Optional<BigDecimal> number = decimal(parts[0]);
        return unit.isEmpty() || number.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(unit.get().toSi(number.get()));
    }

    /** A plain decimal number of sane size; the size is looked at first, so that 1e999999999 costs nothing. */
    static Optional<BigDecimal> decimal(String text) {
        if (text.length() > LONGEST_NUMBER || !NUMBER_FORM.matcher(text).matches()) {
            return Optional.empty();
        }
        return Math.abs(Double.parseDouble(text)) < LARGEST ? Optional.of(new BigDecimal(text)) : Optional.empty();
    }
}
