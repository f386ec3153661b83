package flowshy.study;

import flowshy.math.Density;
import flowshy.math.LogLogDensity;
import flowshy.stream.record.MeasuredSpectrum;
import flowshy.stream.record.Quantity;
import flowshy.stream.record.Signal;
import flowshy.study.ColumnFile.Column;
import flowshy.study.keys.Form;
import flowshy.study.text.Position;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.units.Dimension;
import flowshy.verdict.error.Motion;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** From the keys of the motion to what is to be read. */
final class MotionBuilder {
    private static final String GROUP = "motion";
    private static final String SPECTRUM = "motion.spectrum";
    private static final int MOST_ROWS = 100_000;

    private final Form form;
    private final Problems problems;
    private final FilesRead files;
    private final List<Form.Taken> taken = new ArrayList<>();

    MotionBuilder(Form form, Problems problems, FilesRead files) {
        this.form = form;
        this.problems = problems;
        this.files = files;
    }

    /** What was computed in place of written keys. */
    List<Form.Taken> taken() {
        return List.copyOf(taken);
    }

    /** The motion; nothing stated if the group is not there or has a problem. */
    Motion build() {
        if (!form.has(GROUP) || problems.touches(GROUP)) {
            return Motion.NONE;
        }
        OptionalDouble smallest = form.siIfAny("motion.smallest");
        OptionalDouble fullScale = form.siIfAny("motion.full-scale");
        if (smallest.isEmpty() && fullScale.isEmpty() && !form.has(SPECTRUM)) {
            refuse(form.position(GROUP), GROUP, "nothing is stated", "one of smallest, full-scale, spectrum or more");
        }
        if (smallest.isPresent() && fullScale.isPresent() && !(smallest.getAsDouble() < fullScale.getAsDouble())) {
            refuse(
                    form.position("motion.full-scale"),
                    "motion.full-scale",
                    "a full scale of " + form.word("motion.full-scale").orElseThrow() + " over a smallest motion of "
                            + form.word("motion.smallest").orElseThrow(),
                    "smallest lies below full-scale");
        }
        return new Motion(smallest, fullScale, form.has(SPECTRUM) ? spectrum() : Optional.empty());
    }

    /** A file of any columns, as its keys declare it. */
    private Optional<Density> declared() {
        Quantity quantity =
                Quantity.of(form.word(SPECTRUM + ".quantity").orElseThrow()).orElseThrow();
        Optional<MeasuredSpectrum> read = new MeasuredReader(form, problems, files).read(SPECTRUM, quantity);
        if (read.isEmpty()) {
            return Optional.empty();
        }
        if (read.get().signal() != Signal.ACCELERATION) {
            refuse(
                    form.position(SPECTRUM + ".unit"),
                    SPECTRUM + ".unit",
                    form.word(SPECTRUM + ".unit").orElseThrow() + " is no unit of an acceleration",
                    "m/s2 or g, in the form that the quantity asks for");
            return Optional.empty();
        }
        MeasuredReader.averaged(SPECTRUM, read.get()).ifPresent(taken::add);
        return read.get().density();
    }

    /** A break point [Hz], [(m/s²)²/Hz], and where its frequency stands. */
    private record Break(double frequency, double density, Position at) {}

    private Optional<Density> spectrum() {
        if (form.has(SPECTRUM + ".columns")) {
            return declared();
        }
        int before = problems.count();
        boolean listed = form.has(SPECTRUM + ".points");
        List<Break> breaks = listed ? points() : rows();
        String path = SPECTRUM + (listed ? ".points" : ".file");
        rising(breaks, path);
        return problems.count() > before ? Optional.empty() : curve(breaks, path);
    }

    private List<Break> points() {
        List<Break> breaks = new ArrayList<>();
        for (int i = 0; form.has(SPECTRUM + ".points[" + i + "].frequency"); i++) {
            String at = SPECTRUM + ".points[" + i + "]";
            breaks.add(
                    new Break(form.si(at + ".frequency"), form.si(at + ".density"), form.position(at + ".frequency")));
        }
        return breaks;
    }

    private List<Break> rows() {
        List<Break> breaks = new ArrayList<>();
        List<Column> wanted = List.of(
                new Column("frequency", Optional.of(Dimension.FREQUENCY)),
                new Column("density", Optional.of(Dimension.ACCELERATION_DENSITY)));
        try {
            ColumnFile table = files.table(form, SPECTRUM + ".file", wanted, MOST_ROWS);
            for (int i = 0; i < table.rows().size(); i++) {
                List<Double> row = table.rows().get(i);
                if (!(row.get(1) >= 0.0)) {
                    refuse(table.position(i, 1), SPECTRUM + ".file", "a negative density", "zero or more");
                }
                breaks.add(new Break(row.get(0), row.get(1), table.position(i, 0)));
            }
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
        }
        return breaks;
    }

    private void rising(List<Break> breaks, String path) {
        double before = 0.0;
        for (Break point : breaks) {
            if (!(point.frequency() > before)) {
                refuse(point.at(), path, "a frequency that does not rise", "break points by rising frequency");
            }
            before = point.frequency();
        }
    }

    private Optional<Density> curve(List<Break> breaks, String path) {
        if (breaks.size() < 2) {
            refuse(form.position(path), path, "one break point", "two or more");
            return Optional.empty();
        }
        if (breaks.stream().noneMatch(point -> point.density() > 0.0)) {
            refuse(form.position(path), path, "a density of zero all over", "a motion that moves");
            return Optional.empty();
        }
        return Optional.of(new LogLogDensity(breaks.stream()
                .map(point -> new LogLogDensity.Point(point.frequency(), point.density()))
                .toList()));
    }

    private void refuse(Position at, String path, String found, String accepted) {
        problems.add(at, path, found, accepted);
    }
}
