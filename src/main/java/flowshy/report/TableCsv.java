package flowshy.report;

import de.siegmar.fastcsv.writer.CsvWriter;
import de.siegmar.fastcsv.writer.LineDelimiter;
import flowshy.math.Figures;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.measured.Compared;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;

/** Tables as CSV: one head line with units in the names, full digits, an empty field where there is no number. */
public final class TableCsv {
    private TableCsv() {}

    /**
     * The response table.
     *
     * @param answer with the points to be written
     * @return text, lines end with a line feed
     */
    public static String points(BandsAnswer answer) {
        return of(answer.points(), PointTable.all(answer.acceptance()));
    }

    /**
     * What was measured, beside the model, point by point.
     *
     * @param measured as compared
     * @return text; empty if there is nothing
     */
    public static String measured(List<Compared> measured) {
        return MeasuredReport.csv(measured);
    }

    /**
     * A table of numbers.
     *
     * @param rows in order
     * @param columns in order
     * @param <T> what a row is made of
     * @return text
     */
    static <T> String of(List<T> rows, List<Column<T>> columns) {
        return ofTexts(
                columns.stream().map(Column::name).toList(),
                rows.stream()
                        .map(row -> columns.stream()
                                .map(column -> column.cell().apply(row))
                                .map(cell -> cell.value().isPresent()
                                        ? Figures.full(cell.value().getAsDouble())
                                        : "")
                                .toList())
                        .toList());
    }

    /**
     * A table of texts.
     *
     * @param head names of the columns
     * @param rows one field a column
     * @return text
     */
    static String ofTexts(List<String> head, List<List<String>> rows) {
        StringWriter text = new StringWriter();
        try (CsvWriter csv = CsvWriter.builder().lineDelimiter(LineDelimiter.LF).build(text)) {
            csv.writeRecord(head);
            rows.forEach(csv::writeRecord);
        } catch (IOException e) { // a StringWriter never fails; the signature says it could
            throw new UncheckedIOException(e);
        }
        return text.toString();
    }
}
