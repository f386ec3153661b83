package flowshy.stream.record;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a user says about the columns of a file.
 *
 * @param roles one a column, in the order of the file
 * @param quantity in what form the values are
 * @param unit of the values
 * @param skip lines at the top that hold no numbers
 * @param rate samples per second of a record without a column of times [Hz]
 * @param resolution wanted distance of the lines of Welch's density [Hz]; empty for the default
 */
public record Declaration(
        List<Role> roles,
        Quantity quantity,
        RecordUnit unit,
        int skip,
        OptionalDouble rate,
        OptionalDouble resolution) {
    /**
     * What a column holds.
     *
     * @param name as the user wrote it
     * @param kind frequency, time, value or passed over
     * @param factor its unit in SI; for values 1, their unit is the declaration's
     */
    public record Role(String name, Kind kind, double factor) {
        /** What a column is for. */
        public enum Kind {
            /** frequency */
            FREQUENCY,
            /** time */
            TIME,
            /** the measured values */
            VALUE,
            /** not read */
            PASSED_OVER
        }
    }

    private static final String COLUMNS_FORM =
            "one name a column: f for the frequency or t for the time, any name for the values, - for a column to pass over";

    /** @throws IllegalArgumentException if lines to skip are negative */
    public Declaration {
        roles = List.copyOf(roles);
        if (skip < 0) {
            throw new IllegalArgumentException("lines to skip cannot be " + skip);
        }
    }

    /**
     * A declaration in a user's words.
     *
     * @param columns e.g. {@code f, S} or {@code t [ms], -, u}
     * @param quantity e.g. {@code density}
     * @param unit e.g. {@code (m/s)2/Hz}
     * @param skip lines at the top that hold no numbers
     * @param rate samples per second [Hz], for a record without times
     * @param resolution wanted distance of the lines of Welch's density [Hz]
     * @return what was said
     * @throws DeclarationException if it cannot be used or could mean two things
     */
    public static Declaration of(
            List<String> columns,
            String quantity,
            String unit,
            int skip,
            OptionalDouble rate,
            OptionalDouble resolution) {
        Quantity form = Quantity.of(quantity)
                .orElseThrow(() -> new DeclarationException("quantity", "'" + quantity + "'", Quantity.words()));
        List<Role> roles = columns.stream().map(Declaration::role).toList();
        Role.Kind axis = form.overFrequency() ? Role.Kind.FREQUENCY : Role.Kind.TIME;
        once(roles, Role.Kind.VALUE, "values");
        if (roles.stream().anyMatch(r -> r.kind() != axis && isAxis(r.kind()))) {
            throw new DeclarationException(
                    "columns",
                    "'" + String.join(", ", columns) + "' for " + form.word(),
                    form.overFrequency() ? "a column f, not t" : "a column t, not f");
        }
        boolean byRate = !form.overFrequency() && rate.isPresent();
        if (byRate && roles.stream().anyMatch(r -> r.kind() == axis)) {
            throw new DeclarationException("rate", "a rate and a column of times", "one of the two");
        }
        if (!byRate) {
            once(roles, axis, form.overFrequency() ? "frequencies (f)" : "times (t), or a rate");
        }
        if (form.overFrequency() && (rate.isPresent() || resolution.isPresent())) {
            throw new DeclarationException(
                    rate.isPresent() ? "rate" : "resolution", "given for " + form.word(), "only for a time record");
        }
        positive("rate", rate);
        positive("resolution", resolution);
        if (skip < 0) {
            throw new DeclarationException("skip", String.valueOf(skip), "a number of lines, 0 or more");
        }
        return new Declaration(roles, form, RecordUnit.of(unit, form), skip, rate, resolution);
    }

    private static boolean isAxis(Role.Kind kind) {
        return kind == Role.Kind.FREQUENCY || kind == Role.Kind.TIME;
    }

    private static void once(List<Role> roles, Role.Kind kind, String what) {
        long count = roles.stream().filter(r -> r.kind() == kind).count();
        if (count != 1) {
            throw new DeclarationException("columns", count + " columns of " + what + ", one is needed", COLUMNS_FORM);
        }
    }

    private static void positive(String key, OptionalDouble value) {
        if (value.isPresent() && (!(value.getAsDouble() > 0.0) || Double.isInfinite(value.getAsDouble()))) {
            throw new DeclarationException(key, String.valueOf(value.getAsDouble()), "a positive frequency");
        }
    }

    private static Role role(String column) {
        String text = column.strip();
        int bracket = text.indexOf('[');
        String name = (bracket < 0 ? text : text.substring(0, bracket)).strip();
        Optional<String> unit = bracket >= 0 && text.endsWith("]")
                ? Optional.of(text.substring(bracket + 1, text.length() - 1).strip())
                : Optional.empty();
        Role.Kind kind = switch (name.toLowerCase(Locale.ROOT)) {
            case "f", "frequency" -> Role.Kind.FREQUENCY;
            case "t", "time" -> Role.Kind.TIME;
            case "-" -> Role.Kind.PASSED_OVER;
            default -> Role.Kind.VALUE;
        };
        if (name.isEmpty() || (bracket >= 0 && unit.isEmpty()) || (unit.isPresent() && !isAxis(kind))) {
            throw new DeclarationException(
                    "columns",
                    "'" + text + "'",
                    COLUMNS_FORM + "; a unit in brackets only behind f and t, that of the values stands under unit");
        }
        return new Role(name, kind, unit.map(u -> axisFactor(u, kind, text)).orElse(1.0));
    }

    private static double axisFactor(String unit, Role.Kind kind, String text) {
        boolean frequency = kind == Role.Kind.FREQUENCY;
        return switch ((frequency ? "f " : "t ") + unit) {
            case "f Hz", "t s" -> 1.0;
            case "f kHz" -> 1e3;
            case "t ms" -> 1e-3;
            case "t us" -> 1e-6;
            default ->
                throw new DeclarationException(
                        "columns", "'" + text + "'", frequency ? "f [Hz], f [kHz]" : "t [s], t [ms], t [us]");
        };
    }
}
