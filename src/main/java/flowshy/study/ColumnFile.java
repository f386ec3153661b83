package flowshy.study;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import flowshy.study.text.Nearest;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.TextFile;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A table of numbers with named columns, each with its unit in the header: {@code z [um], diameter [um]}. Separated by
 * semicolons, tabs or commas, whichever the header uses; lines that start with {@code #} are passed over.
 */
final class ColumnFile {
    private static final Pattern HEADING =
            Pattern.compile("([\\p{L}-]+)\\s*(?:\\[(.*)]|\\((.*)\\)|/\\s*(.*)|_(.*)|\\s(.*))?");

    private final TextFile file;
    private final Problems problems = new Problems();
    private final List<String> lines;
    private final char separator;
    private final List<List<Double>> rows = new ArrayList<>();
    private final List<Integer> lineNumbers = new ArrayList<>();
    private int headerLine;
    private List<Integer> places = List.of();
    private List<String> units = List.of();

    /**
     * A column that is wanted.
     *
     * @param name as the header writes it
     * @param dimension of its numbers; empty if any unit, or none, will do
     */
    record Column(String name, Optional<Dimension> dimension) {}

    /**
     * Columns as a study declares them, in place of a header.
     *
     * @param columns names in the order of the file, {@code -} for one to pass over
     * @param units one a column
     * @param skip lines at the top that hold no numbers
     */
    record Layout(List<String> columns, List<String> units, int skip) {
        /** Copies the lists. */
        Layout {
            columns = List.copyOf(columns);
            units = List.copyOf(units);
        }
    }

    private ColumnFile(TextFile file, int skip) {
        this.file = file;
        this.lines = file.text().lines().toList();
        String header = lines.stream()
                .skip(skip)
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .findFirst()
                .orElse("");
        this.separator = header.indexOf(';') >= 0 ? ';' : header.indexOf('\t') >= 0 ? '\t' : ',';
    }

    /**
     * Reads a table.
     *
     * @param file its text
     * @param wanted columns to read; others are passed over
     * @param most rows at most
     * @return the table
     * @throws flowshy.study.text.StudyException with every problem
     */
    static ColumnFile read(TextFile file, List<Column> wanted, int most) {
        ColumnFile table = new ColumnFile(file, 0);
        table.parse(wanted, most, 0, false);
        table.problems.throwIfAny();
        return table;
    }

    /**
     * Reads a table without a header of its own, or with one that does not count.
     *
     * @param file its text
     * @param wanted columns to read, each of them in the layout
     * @param layout what the columns hold
     * @param most rows at most
     * @return the table
     * @throws flowshy.study.text.StudyException with every problem
     */
    static ColumnFile read(TextFile file, List<Column> wanted, Layout layout, int most) {
        ColumnFile table = new ColumnFile(file, layout.skip());
        table.places = wanted.stream()
                .map(column -> layout.columns().indexOf(column.name()))
                .toList();
        table.units = table.places.stream().map(layout.units()::get).toList();
        for (int i = 0; i < wanted.size(); i++) {
            String unit = table.units.get(i);
            wanted.get(i).dimension().ifPresent(d -> table.checkUnit(unit, d, Position.label(table.name())));
        }
        table.problems.throwIfAny();
        table.parse(wanted, most, layout.skip(), true);
        table.problems.throwIfAny();
        return table;
    }

    /**
     * The columns that the header of a file names, with their units.
     *
     * @param file its text
     * @return unit by name, in the order of the file; empty if there is no header
     */
    static Map<String, String> heads(TextFile file) {
        ColumnFile table = new ColumnFile(file, 0);
        Map<String, String> heads = new LinkedHashMap<>();
        try {
            for (CsvRecord cells : table.reader()) {
                cells.getFields().forEach(cell -> heads.putIfAbsent(part(cell, 1), part(cell, 2)));
                return heads;
            }
        } catch (CsvParseException e) {
            return heads; // told when the table itself is read
        }
        return heads;
    }

    /** Numbers in SI, one list a row, in the order of the wanted columns. */
    List<List<Double>> rows() {
        return rows;
    }

    /** The unit of a wanted column, as written. */
    String unit(int column) {
        return units.get(column);
    }

    /** Where the heading of a wanted column stands; the file itself where it has no header that counts. */
    Position head(int column) {
        return headerLine == 0 ? Position.label(name()) : cell(headerLine, places.get(column));
    }

    /** Where a number stands. */
    Position position(int row, int column) {
        return cell(lineNumbers.get(row), places.get(column));
    }

    private void parse(List<Column> wanted, int most, int skip, boolean declared) {
        boolean headed = declared;
        try {
            for (CsvRecord cells : reader()) {
                int line = (int) cells.getStartingLineNumber();
                if (line <= skip) {
                    continue;
                }
                if (!headed) {
                    headerLine = line;
                    header(cells.getFields(), wanted, line);
                    headed = true;
                    problems.throwIfAny();
                } else if (rows.size() < most) {
                    row(cells.getFields(), wanted, line);
                } else {
                    problems.add(cell(line, 0), "", "more than " + most + " rows", "shorten the table");
                    return;
                }
            }
        } catch (CsvParseException e) {
            problems.add(Position.label(name()), "", "not readable as a table: " + Printable.of(e.getMessage()), "");
        }
        if (rows.isEmpty() && problems.count() == 0) {
            problems.add(
                    Position.label(name()),
                    "",
                    "no rows",
                    declared ? "numbers below the skipped lines" : "a header with units, then numbers");
        }
    }

    private CsvReader<CsvRecord> reader() {
        return CsvReader.builder()
                .fieldSeparator(separator)
                .commentStrategy(CommentStrategy.SKIP)
                .skipEmptyLines(true)
                .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                .ofCsvRecord(file.text());
    }

    private void header(List<String> cells, List<Column> wanted, int line) {
        List<Integer> found = new ArrayList<>();
        List<String> foundUnits = new ArrayList<>();
        List<String> names = cells.stream().map(cell -> part(cell, 1)).toList();
        for (Column column : wanted) {
            int at = names.indexOf(column.name());
            if (at < 0) {
                Optional<String> near = Nearest.among(column.name(), names);
                String accepted = "the header names its columns with units, e.g. " + example(column)
                        + near.map(n -> "; " + n + " looks like it").orElse("");
                problems.add(cell(line, 0), "", "no column " + column.name(), accepted);
                continue;
            }
            String unit = part(cells.get(at), 2);
            column.dimension().ifPresent(d -> checkUnit(unit, d, cell(line, at)));
            found.add(at);
            foundUnits.add(unit);
        }
        places = List.copyOf(found);
        units = List.copyOf(foundUnits);
    }

    private void checkUnit(String unit, Dimension dimension, Position at) {
        try {
            Quantity.read("1 " + unit, dimension);
        } catch (QuantityException e) {
            problems.add(new Problem(at, "", e.found(), e.accepted(), e.nearest()));
        }
    }

    private static String example(Column column) {
        return column.name()
                + column.dimension().map(d -> " [" + d.units().get(0) + "]").orElse("");
    }

    /** Name (1) or unit (2) of a heading. */
    private static String part(String heading, int which) {
        Matcher matcher = HEADING.matcher(heading.strip());
        if (!matcher.matches()) {
            return "";
        }
        if (which == 1) {
            return matcher.group(1);
        }
        for (int i = 2; i <= matcher.groupCount(); i++) {
            if (matcher.group(i) != null) {
                return matcher.group(i).strip();
            }
        }
        return "";
    }

    private void row(List<String> cells, List<Column> wanted, int line) {
        List<Double> numbers = new ArrayList<>();
        for (int i = 0; i < wanted.size(); i++) {
            int at = places.get(i);
            if (at >= cells.size() || cells.get(at).isBlank()) {
                problems.add(cell(line, at), "", "no " + wanted.get(i).name() + " in this row", "one number a column");
                return;
            }
            try {
                Dimension dimension = wanted.get(i).dimension().orElse(Dimension.NUMBER);
                String text = dimension == Dimension.NUMBER ? cells.get(at) : cells.get(at) + " " + units.get(i);
                numbers.add(Quantity.read(text, dimension).value());
            } catch (QuantityException e) {
                problems.add(new Problem(cell(line, at), "", e.found(), e.accepted(), e.nearest()));
                return;
            }
        }
        rows.add(numbers);
        lineNumbers.add(line);
    }

    /** Where a cell starts: behind as many separators as cells stand before it, those in quotes not counted. */
    private Position cell(int line, int index) {
        String text = line <= lines.size() ? lines.get(line - 1) : "";
        int cells = 0;
        boolean quoted = false;
        int at = 0;
        while (at < text.length() && cells < index) {
            char c = text.charAt(at++);
            quoted ^= c == '"';
            cells += c == separator && !quoted ? 1 : 0;
        }
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
        return new Position(name(), line, text.codePointCount(0, at) + 1);
    }

    private String name() {
        return Printable.of(file.name());
    }
}
