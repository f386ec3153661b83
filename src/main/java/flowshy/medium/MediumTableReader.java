package flowshy.medium;

import flowshy.math.Range;
import flowshy.medium.TableColumn.Heading;
import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Reads a property table: header lines, one line of column headings with units, rows of numbers parted by commas. Split by
 * hand: the rows hold plain numbers only, and every fault needs its column, which the CSV library does not tell.
 */
final class MediumTableReader {
    private final TableText text;
    private final TableHeaderReader headerReader;
    private final List<Optional<Heading>> headings = new ArrayList<>();
    private final List<TableRow> rows = new ArrayList<>();
    private int headingLine;

    MediumTableReader(String file) {
        this.text = new TableText(file);
        this.headerReader = new TableHeaderReader(text);
    }

    MediumTable read(InputStream in) throws IOException {
        int number = 0;
        for (String line : text.lines(in)) {
            number++;
            if (line.startsWith("#") && headingLine == 0) {
                headerReader.take(number, line);
            } else if (line.startsWith("#")) {
                text.problem(number, 1, "a header line below the column headings", "all header lines above them");
            } else if (!line.isBlank() && headingLine == 0) {
                headingLine = number;
                headings(line);
            } else if (!line.isBlank()) {
                row(number, line);
            }
        }
        Optional<TableHeader> header = headerReader.header();
        header.ifPresent(this::check);
        text.judge();
        return new MediumTable(text.file(), header.orElseThrow(), rows);
    }

    /** Reads the header lines only, for lists; the rows are not looked at. */
    TableHeader readHeader(InputStream in) throws IOException {
        int number = 0;
        for (String line : text.lines(in)) {
            number++;
            if (line.startsWith("#")) {
                headerReader.take(number, line);
            } else if (!line.isBlank()) {
                break;
            }
        }
        Optional<TableHeader> header = headerReader.header();
        text.judge();
        return header.orElseThrow();
    }

    private void headings(String line) {
        int column = 1;
        for (String cell : line.split(",", -1)) {
            String word = cell.strip();
            Optional<Heading> heading = TableColumn.heading(word);
            if (heading.isEmpty()) {
                text.problem(
                        headingLine,
                        column,
                        "the column " + TableHeaderReader.quote(word),
                        String.join(", ", TableColumn.allHeadings()));
            } else if (has(heading.get().column())) {
                text.problem(
                        headingLine, column, "the column '" + word + "' for the second time", "each property once");
            }
            headings.add(heading);
            column += cell.length() + 1;
        }
        for (TableColumn needed : List.of(TableColumn.TEMPERATURE, TableColumn.DENSITY, TableColumn.VISCOSITY)) {
            if (!has(needed)) {
                text.problem(headingLine, 1, "no column " + needed.property(), String.join(" or ", needed.headings()));
            }
        }
    }

    private boolean has(TableColumn column) {
        return headings.stream().anyMatch(h -> h.isPresent() && h.get().column() == column);
    }

    private void row(int number, String line) {
        String[] cells = line.split(",", -1);
        if (cells.length != headings.size()) {
            text.problem(
                    number,
                    1,
                    cells.length + " values in " + TableHeaderReader.quote(line),
                    headings.size() + " values parted by commas, decimals with a point");
            return;
        }
        Map<TableColumn, Double> values = new EnumMap<>(TableColumn.class);
        int column = 1;
        for (int i = 0; i < cells.length; i++) {
            if (headings.get(i).isPresent()) {
                value(number, column, cells[i], headings.get(i).get(), values);
            }
            column += cells[i].length() + 1;
        }
        if (values.keySet().containsAll(List.of(TableColumn.TEMPERATURE, TableColumn.DENSITY, TableColumn.VISCOSITY))) {
            rising(number, values);
            rows.add(new TableRow(
                    optional(values, TableColumn.GRADE),
                    values.get(TableColumn.TEMPERATURE),
                    values.get(TableColumn.DENSITY),
                    values.get(TableColumn.VISCOSITY),
                    optional(values, TableColumn.SOUND_SPEED),
                    optional(values, TableColumn.SECOND_VIRIAL),
                    optional(values, TableColumn.SATURATION_PRESSURE)));
        }
    }

    private void value(int number, int column, String cell, Heading heading, Map<TableColumn, Double> values) {
        String word = cell.strip();
        int start = column + cell.length() - cell.stripLeading().length();
        if (word.isEmpty() && heading.column() == TableColumn.SATURATION_PRESSURE) {
            return; // above the critical temperature nothing condenses
        }
        Optional<BigDecimal> decimal = HeaderUnits.decimal(word);
        if (decimal.isEmpty()) {
            text.problem(number, start, TableHeaderReader.quote(word), "a plain number, as in 1.2041 or 1.82e-5");
            return;
        }
        double si = heading.toSi(decimal.get());
        if (heading.column() != TableColumn.SECOND_VIRIAL && !(si > 0.0)) {
            text.problem(
                    number,
                    start,
                    TableHeaderReader.quote(word),
                    "a positive " + heading.column().property());
            return;
        }
        values.put(heading.column(), si);
    }

    private void rising(int number, Map<TableColumn, Double> values) {
        if (rows.isEmpty()) {
            return;
        }
        TableRow last = rows.get(rows.size() - 1);
        double grade = values.getOrDefault(TableColumn.GRADE, 0.0);
        double lastGrade = last.grade().orElse(0.0);
        if (grade < lastGrade) {
            text.problem(number, 1, "a grade that falls", "grades in rising order, the rows of one together");
        } else if (grade == lastGrade && !(values.get(TableColumn.TEMPERATURE) > last.temperature())) {
            text.problem(number, 1, "a temperature that does not rise", "rows by rising temperature, each once");
        }
    }

    private void check(TableHeader header) {
        if (header.law().isPresent()) {
            if (headingLine > 0) {
                text.problem(headingLine, 1, "rows beside a law", "either rows or '# law: …'");
            }
            return;
        }
        if (rows.size() < MediumTable.FEWEST_ROWS) {
            text.problem(
                    Math.max(1, headingLine), 1, rows.size() + " good rows", "at least " + MediumTable.FEWEST_ROWS);
            return;
        }
        checkGrades(header);
        Range asked = header.temperatures();
        double first = Double.NEGATIVE_INFINITY;
        double last = Double.POSITIVE_INFINITY;
        for (int i = 0; i < rows.size(); i++) {
            if (i == 0 || !rows.get(i).grade().equals(rows.get(i - 1).grade())) {
                first = Math.max(first, rows.get(i).temperature());
            }
            if (i == rows.size() - 1
                    || !rows.get(i).grade().equals(rows.get(i + 1).grade())) {
                last = Math.min(last, rows.get(i).temperature());
            }
        }
        if (!(asked.low() >= first && asked.high() <= last)) {
            text.problem(
                    headerReader.lineOf("temperatures"),
                    1,
                    "temperatures beyond the rows",
                    "a range within the rows, " + Phrases.celsius(first) + " to " + Phrases.celsius(last));
        }
        for (TableColumn column : TableColumn.values()) {
            boolean told = headerReader.has(column.property());
            if (column.isProperty() && has(column) && !told) {
                text.problem(
                        headingLine,
                        1,
                        "no source of " + column.property(),
                        "a header line '# " + column.property() + ": source | how it was read | uncertainty'");
            } else if (told && !has(column)) {
                text.problem(
                        headerReader.lineOf(column.property()),
                        1,
                        "a source of " + column.property() + " without its column",
                        String.join(" or ", column.headings()));
            }
        }
    }

    private void checkGrades(TableHeader header) {
        boolean named = headerReader.has(MediumParameter.GRADE.key());
        if (named != has(TableColumn.GRADE)) {
            text.problem(
                    headingLine,
                    1,
                    named ? "no column grade" : "a column grade without its range in the header",
                    named
                            ? String.join(" or ", TableColumn.GRADE.headings())
                            : "a header line '# grade: 10 mm2/s to 100 mm2/s'");
        } else if (named && header.phase() != Phase.LIQUID) {
            text.problem(headerReader.lineOf("phase"), 1, "grades of a gas", "grades of a liquid");
        }
    }

    private static OptionalDouble optional(Map<TableColumn, Double> values, TableColumn column) {
        Double value = values.get(column);
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }
}
