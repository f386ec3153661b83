package flowshy.study;

import static flowshy.math.Figures.say;

import flowshy.math.LogTable;
import flowshy.math.Range;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.MeasuredCover;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.units.Dimension;
import flowshy.verdict.Band;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The measured attenuation of a cover: a file of columns frequency, attenuation and, if it was measured, phase. */
final class AttenuationReader {
    private static final int MOST_ROWS = 10_000;

    /** A cover may amplify where it resonates, but not without bound [dB]. */
    private static final double LEAST = -60.0;

    private static final double MOST = 300.0;

    private static final double DEGREES = 180.0 / Math.PI;

    private final Form form;
    private final Problems problems;
    private final FilesRead files;

    AttenuationReader(Form form, Problems problems, FilesRead files) {
        this.form = form;
        this.problems = problems;
        this.files = files;
    }

    /** The cover of a group; empty if its file has a problem. */
    Optional<Cover> read(String path, Optional<Band> band) {
        String key = path + ".file";
        String name = form.word(key).orElseThrow();
        List<ColumnFile.Column> columns = new ArrayList<>(List.of(
                new ColumnFile.Column("frequency", Optional.of(Dimension.FREQUENCY)),
                new ColumnFile.Column("attenuation", Optional.of(Dimension.LEVEL))));
        try {
            boolean phased = files.heads(form, key, "phase");
            if (phased) {
                columns.add(new ColumnFile.Column("phase", Optional.of(Dimension.ANGLE)));
            }
            ColumnFile table = files.table(form, key, columns, MOST_ROWS);
            return rowsFit(key, table) && enough(key, name, table, band)
                    ? Optional.of(new MeasuredCover(
                            name,
                            column(table, 1, 1.0),
                            phased ? Optional.of(column(table, 2, DEGREES)) : Optional.empty()))
                    : Optional.empty();
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
            return Optional.empty();
        }
    }

    private boolean rowsFit(String key, ColumnFile table) {
        int before = problems.count();
        double below = 0.0;
        for (int i = 0; i < table.rows().size(); i++) {
            double frequency = table.rows().get(i).get(0);
            double level = table.rows().get(i).get(1);
            if (!(frequency > below)) {
                problems.add(
                        table.position(i, 0),
                        key,
                        say("%.4g Hz does not rise", frequency),
                        "rows by rising frequency, above zero");
            }
            if (!(level >= LEAST && level <= MOST)) {
                problems.add(table.position(i, 1), key, say("%.4g dB", level), say("%.3g dB to %.3g dB", LEAST, MOST));
            }
            below = frequency;
        }
        return problems.count() == before;
    }

    private boolean enough(String key, String name, ColumnFile table, Optional<Band> band) {
        if (table.rows().size() < 2) {
            problems.add(table.position(0, 0), key, "one row only", "two frequencies or more");
            return false;
        }
        LogTable attenuation = column(table, 1, 1.0);
        boolean used = band.isEmpty()
                || (attenuation.covers(band.get().from())
                        && attenuation.covers(band.get().to()));
        boolean calibrated = !form.has("calibration.frequency") || attenuation.covers(form.si("calibration.frequency"));
        if (!used || !calibrated) {
            Range measured = attenuation.range();
            problems.add(
                    form.position(key),
                    key,
                    say("%s covers %.4g Hz to %.4g Hz", name, measured.low(), measured.high()),
                    (used ? "calibration.frequency" : "the whole band of use") + " inside it: nothing is extrapolated");
            return false;
        }
        return true;
    }

    private static LogTable column(ColumnFile table, int column, double factor) {
        return new LogTable(
                table.rows().stream().map(row -> row.get(0)).toList(),
                table.rows().stream().map(row -> row.get(column) * factor).toList());
    }
}
