package flowshy.report;

import flowshy.math.Figures;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;

/** Plain text of 80 columns: headings, labelled lines, wrapped paragraphs, tables. */
final class TextPage {
    private static final int WIDTH = 80;
    private static final int LABEL = 26;

    private final StringBuilder text = new StringBuilder();

    /**
     * A section's head, with an empty line before it and a rule under it.
     *
     * @param words printed as they stand
     */
    void heading(String words) {
        line("");
        line(words);
        line("-".repeat(words.codePointCount(0, words.length())));
    }

    /**
     * A line as it stands.
     *
     * @param line printed without change
     */
    void line(String line) {
        text.append(line).append('\n');
    }

    /**
     * A label and its value, the value wrapped under itself.
     *
     * @param label at most 23 characters, longer ones take a line of their own
     * @param value wrapped
     */
    void row(String label, String value) {
        if (label.length() > LABEL - 3) {
            line("  " + label);
            wrap(" ".repeat(LABEL), " ".repeat(LABEL), value);
        } else {
            wrap("  " + label + " ".repeat(LABEL - 2 - label.length()), " ".repeat(LABEL), value);
        }
    }

    /**
     * Wrapped text.
     *
     * @param words a sentence or more
     */
    void paragraph(String words) {
        wrap("  ", "  ", words);
    }

    /**
     * Wrapped text behind a mark.
     *
     * @param mark printed once, e.g. {@code [weak]}
     * @param words a sentence or more
     */
    void note(String mark, String words) {
        wrap("  ", "    ", mark + " " + words);
    }

    /**
     * A table, columns set right.
     *
     * @param columns in order
     * @param rows in order
     * @param marked rows to be marked with a star
     * @param <T> what a row is made of
     */
    <T> void table(List<Column<T>> columns, List<T> rows, Predicate<T> marked) {
        List<List<String>> lines = new ArrayList<>(head(columns));
        rows.forEach(row -> lines.add(cells(columns, row)));
        int[] widths = widths(lines);
        for (int r = 0; r < lines.size(); r++) {
            boolean star = r >= 2 && marked.test(rows.get(r - 2));
            line(tableLine(lines.get(r), widths) + (star ? " *" : ""));
        }
    }

    /**
     * A table whose rows have names, set left; a name too long for the page stands on a line of its own.
     *
     * @param title head of the names
     * @param names one a row
     * @param columns in order
     * @param rows in order
     * @param <T> what a row is made of
     */
    <T> void namedTable(String title, List<String> names, List<Column<T>> columns, List<T> rows) {
        List<List<String>> lines = new ArrayList<>(head(columns));
        rows.forEach(row -> lines.add(cells(columns, row)));
        int[] widths = widths(lines);
        int left = Math.max(
                12,
                WIDTH
                        - 3
                        - java.util.Arrays.stream(widths)
                                .map(width -> width + 1)
                                .sum());
        for (int r = 0; r < lines.size(); r++) {
            if (r == 1 && lines.get(r).stream().allMatch(String::isEmpty)) {
                continue; // pure numbers all over
            }
            String name = r == 0 ? title : r == 1 ? "" : names.get(r - 2);
            if (name.length() > left) {
                wrap("  ", "    ", name);
                name = "";
            }
            line(("  " + name + " ".repeat(left - name.length()) + tableLine(lines.get(r), widths)).stripTrailing());
        }
    }

    private static <T> List<List<String>> head(List<Column<T>> columns) {
        return List.of(
                columns.stream().map(Column::label).toList(),
                columns.stream().map(Column::unit).toList());
    }

    private static <T> List<String> cells(List<Column<T>> columns, T row) {
        List<String> cells = new ArrayList<>();
        for (Column<T> column : columns) {
            Cell cell = column.cell().apply(row);
            cells.add(cell.value().isPresent() ? Figures.of(cell.value().getAsDouble(), column.digits()) : "-");
        }
        return cells;
    }

    private static int[] widths(List<List<String>> lines) {
        int[] widths = new int[lines.get(0).size()];
        for (List<String> line : lines) {
            for (int c = 0; c < widths.length; c++) {
                widths[c] = Math.max(widths[c], line.get(c).length());
            }
        }
        return widths;
    }

    @Override
    public String toString() {
        return text.toString();
    }

    private static String tableLine(List<String> cells, int[] widths) {
        StringBuilder line = new StringBuilder(" ");
        for (int c = 0; c < widths.length; c++) {
            line.append(' ')
                    .append(" ".repeat(widths[c] - cells.get(c).length()))
                    .append(cells.get(c));
        }
        return line.toString().stripTrailing();
    }

    private void wrap(String first, String further, String words) {
        StringBuilder line = new StringBuilder(first);
        boolean empty = true;
        for (String word : words.strip().split("\\s+", -1)) {
            if (!empty && line.codePointCount(0, line.length()) + 1 + word.length() > WIDTH) {
                line(line.toString().stripTrailing());
                line = new StringBuilder(further);
                empty = true;
            }
            line.append(empty ? "" : " ").append(word);
            empty = false;
        }
        line(line.toString().stripTrailing());
    }
}
