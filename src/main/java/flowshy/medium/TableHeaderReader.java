package flowshy.medium;

import flowshy.math.Range;
import flowshy.medium.PropertySource.Reading;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** Reads the header lines of a property table: {@code # key: value}; a line that starts with two hashes is a remark. */
final class TableHeaderReader {
    private static final List<String> KEYS = List.of(
            "medium",
            "also called",
            "about",
            "phase",
            "molar mass",
            "table pressure",
            "pressures",
            "temperatures",
            "freezes",
            "at 1 MPa",
            "law");

    private final TableText text;
    private final Map<String, Line> lines = new LinkedHashMap<>();
    private int lastLine = 1;

    TableHeaderReader(TableText text) {
        this.text = text;
    }

    /** One header line that was understood: where its value starts and what it is. */
    private record Line(int number, int column, String value) {}

    /** Takes one line that starts with a hash. */
    void take(int number, String raw) {
        lastLine = number;
        if (raw.startsWith("##")) {
            return;
        }
        int colon = raw.indexOf(':');
        if (colon < 0) {
            text.problem(number, 1, quote(raw), "'# key: value', or '## ' before a remark");
            return;
        }
        String key = raw.substring(1, colon).strip();
        int start = colon + 1;
        while (start < raw.length() && Character.isWhitespace(raw.charAt(start))) {
            start++;
        }
        if (!known(key)) {
            text.problem(number, raw.indexOf(key, 1) + 1, "the key " + quote(key), knownKeys());
        } else if (lines.containsKey(key)) {
            text.problem(number, raw.indexOf(key, 1) + 1, quote(key) + " for the second time", "each key once");
        } else if (raw.substring(start).isBlank()) {
            text.problem(number, start + 1, "no value for " + quote(key), "a value");
        } else {
            lines.put(key, new Line(number, start + 1, raw.substring(start).strip()));
        }
    }

    /** The header, once every line was taken; empty if a fault was found that leaves nothing to build. */
    Optional<TableHeader> header() {
        Optional<Line> medium = need("medium");
        Optional<Line> about = need("about");
        Optional<Phase> phase = need("phase").flatMap(this::phase);
        OptionalDouble molarMass = number("molar mass", HeaderUnits.MOLAR_MASS, phase.equals(Optional.of(Phase.GAS)));
        OptionalDouble tablePressure = number("table pressure", HeaderUnits.PRESSURE, true);
        OptionalDouble freezing = number("freezes", HeaderUnits.TEMPERATURE, false);
        Optional<Range> pressures = need("pressures").flatMap(l -> range(l, "pressure [Pa]", HeaderUnits.PRESSURE));
        Optional<Range> temperatures =
                need("temperatures").flatMap(l -> range(l, "temperature [K]", HeaderUnits.TEMPERATURE));
        Optional<TableHeader.Departures> departures =
                Optional.ofNullable(lines.get("at 1 MPa")).flatMap(this::departures);
        List<AcceptedParameter> parameters = parameters();
        List<PropertySource> sources = sources();
        if (medium.isEmpty()
                || about.isEmpty()
                || phase.isEmpty()
                || tablePressure.isEmpty()
                || pressures.isEmpty()
                || temperatures.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new TableHeader(
                medium.get().value(),
                aliases(),
                about.get().value(),
                phase.get(),
                molarMass,
                tablePressure.getAsDouble(),
                pressures.get(),
                temperatures.get(),
                freezing,
                departures,
                Optional.ofNullable(lines.get("law")).map(Line::value),
                parameters,
                sources));
    }

    /** Whether a line with this key was taken, sound or not. */
    boolean has(String key) {
        return lines.containsKey(key);
    }

    /** Line in which a key stands, or the last line of the header. */
    int lineOf(String key) {
        Line line = lines.get(key);
        return line == null ? lastLine : line.number();
    }

    private Optional<Line> need(String key) {
        Line line = lines.get(key);
        if (line == null) {
            text.problem(lastLine, 1, "a header without " + quote(key), "a line '# " + key + ": …'");
        }
        return Optional.ofNullable(line);
    }

    private OptionalDouble number(String key, HeaderUnits units, boolean needed) {
        Optional<Line> line = needed ? need(key) : Optional.ofNullable(lines.get(key));
        return line.isEmpty()
                ? OptionalDouble.empty()
                : number(line.get(), line.get().value(), units);
    }

    private OptionalDouble number(Line line, String value, HeaderUnits units) {
        OptionalDouble number = units.parse(value);
        boolean mayBeZero = units == HeaderUnits.NUMBER || units == HeaderUnits.SHARE;
        if (number.isEmpty() || !(number.getAsDouble() > 0.0 || mayBeZero)) {
            int within = Math.max(0, line.value().indexOf(value));
            text.problem(line.number(), line.column() + within, quote(value), units.accepted());
            return OptionalDouble.empty();
        }
        return number;
    }

    private Optional<Range> range(Line line, String name, HeaderUnits units) {
        String[] ends = line.value().split("\\s+to\\s+", -1);
        if (ends.length != 2) {
            text.problem(
                    line.number(),
                    line.column(),
                    quote(line.value()),
                    "two ends joined by 'to', each " + units.accepted());
            return Optional.empty();
        }
        OptionalDouble low = number(line, ends[0], units);
        OptionalDouble high = number(line, ends[1], units);
        if (low.isEmpty() || high.isEmpty()) {
            return Optional.empty();
        }
        if (!(low.getAsDouble() < high.getAsDouble())) {
            text.problem(line.number(), line.column(), quote(line.value()), "the lower end first");
            return Optional.empty();
        }
        return Optional.of(new Range(name, low.getAsDouble(), high.getAsDouble()));
    }

    private Optional<Phase> phase(Line line) {
        if (line.value().equals("gas")) {
            return Optional.of(Phase.GAS);
        }
        if (line.value().equals("liquid")) {
            return Optional.of(Phase.LIQUID);
        }
        text.problem(line.number(), line.column(), quote(line.value()), "gas or liquid");
        return Optional.empty();
    }

    private Optional<TableHeader.Departures> departures(Line line) {
        String[] parts = line.value().split("\\s*,\\s*", -1);
        String form = "'density 0.1 %, viscosity 1 %, sound speed 0.3 %'";
        String[] words = {"density ", "viscosity ", "sound speed "};
        double[] values = new double[words.length];
        for (int i = 0; i < words.length; i++) {
            OptionalDouble value = parts.length == words.length && parts[i].startsWith(words[i])
                    ? HeaderUnits.SHARE.parse(parts[i].substring(words[i].length()))
                    : OptionalDouble.empty();
            if (value.isEmpty() || !(value.getAsDouble() >= 0.0)) {
                text.problem(line.number(), line.column(), quote(line.value()), form);
                return Optional.empty();
            }
            values[i] = value.getAsDouble();
        }
        return Optional.of(new TableHeader.Departures(values[0], values[1], values[2]));
    }

    private List<AcceptedParameter> parameters() {
        List<AcceptedParameter> accepted = new ArrayList<>();
        for (Map.Entry<String, Line> entry : lines.entrySet()) {
            Optional<MediumParameter> parameter = MediumParameter.ofHeader(entry.getKey());
            if (parameter.isPresent()) {
                HeaderUnits units = parameter.get() == MediumParameter.GRADE ? HeaderUnits.GRADE : HeaderUnits.SHARE;
                range(
                                entry.getValue(),
                                parameter.get().key() + " [" + parameter.get().unit() + "]",
                                units)
                        .ifPresent(range -> accepted.add(new AcceptedParameter(parameter.get(), range)));
            }
        }
        return accepted;
    }

    private List<PropertySource> sources() {
        List<PropertySource> sources = new ArrayList<>();
        for (Map.Entry<String, Line> entry : lines.entrySet()) {
            if (TableColumn.ofProperty(entry.getKey()).isPresent()) {
                source(entry.getKey(), entry.getValue()).ifPresent(sources::add);
            }
        }
        return sources;
    }

    private Optional<PropertySource> source(String property, Line line) {
        String[] parts = line.value().split("\\s*\\|\\s*", -1);
        if (parts.length != 3 || parts[0].isEmpty()) {
            text.problem(
                    line.number(),
                    line.column(),
                    quote(line.value()),
                    "'source | how it was read | relative uncertainty'");
            return Optional.empty();
        }
        Optional<Reading> reading = Arrays.stream(Reading.values())
                .filter(r -> r.words().equals(parts[1]))
                .findFirst();
        if (reading.isEmpty()) {
            String words = Arrays.stream(Reading.values()).map(Reading::words).collect(Collectors.joining(", "));
            text.problem(line.number(), line.column() + line.value().indexOf(parts[1]), quote(parts[1]), words);
            return Optional.empty();
        }
        OptionalDouble uncertainty = OptionalDouble.empty();
        if (!parts[2].equals("not stated")) {
            uncertainty = HeaderUnits.SHARE.parse(parts[2]);
            if (uncertainty.isEmpty() || !parts[2].endsWith("%") || !(uncertainty.getAsDouble() > 0.0)) {
                int column = line.column() + line.value().lastIndexOf(parts[2]);
                text.problem(line.number(), column, quote(parts[2]), "a positive number of %, or 'not stated'");
                return Optional.empty();
            }
        }
        return Optional.of(new PropertySource(property, parts[0], reading.get(), uncertainty));
    }

    private List<String> aliases() {
        Line line = lines.get("also called");
        return line == null ? List.of() : List.of(line.value().split("\\s*,\\s*", -1));
    }

    private static boolean known(String key) {
        return KEYS.contains(key)
                || MediumParameter.ofHeader(key).isPresent()
                || TableColumn.ofProperty(key).isPresent();
    }

    private static String knownKeys() {
        List<String> all = new ArrayList<>(KEYS);
        for (TableColumn column : TableColumn.values()) {
            if (column.isProperty()) {
                all.add(column.property());
            }
        }
        return String.join(", ", all);
    }

    static String quote(String found) {
        return "'" + found.replaceAll("\\p{Cntrl}", "?") + "'";
    }
}
