package flowshy.study;

import flowshy.study.ColumnFile.Layout;
import flowshy.study.keys.Form;
import flowshy.study.text.Nearest;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.text.TextFile;
import flowshy.study.units.Dimension;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredResponse;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** From the keys of measured responses to their points. */
final class MeasurementBuilder {
    private static final String GROUP = "measurements";
    private static final List<String> COLUMNS = List.of(
            "frequency", "amplitude", "motion", "flow", "rejection", "phase", "uncertainty", "phase-uncertainty");

    private final Form form;
    private final Problems problems;
    private final FilesRead files;
    private final List<Form.Taken> taken = new ArrayList<>();

    MeasurementBuilder(Form form, Problems problems, FilesRead files) {
        this.form = form;
        this.problems = problems;
        this.files = files;
    }

    /** What was taken in place of written keys. */
    List<Form.Taken> taken() {
        return List.copyOf(taken);
    }

    /** The responses, in the order written; those with a problem are left out. */
    List<MeasuredResponse> build() {
        List<MeasuredResponse> responses = new ArrayList<>();
        for (String name : form.names(GROUP)) {
            String path = GROUP + "." + name;
            if (!problems.touches(path)) {
                response(name, path).ifPresent(responses::add);
            }
        }
        return responses;
    }

    private Optional<MeasuredResponse> response(String name, String path) {
        Measurand of = Measurand.of(form.word(path + ".of").orElseThrow()).orElseThrow();
        if (of != Measurand.REJECTION && !form.has("suspension")) {
            return refuse(
                    path + ".of",
                    "a response to " + of.word() + " of a device without a suspension",
                    "state suspension, or lay a rejection beside the model");
        }
        int before = problems.count();
        Optional<Layout> layout = layout(path);
        if (problems.count() > before) {
            return Optional.empty();
        }
        try {
            TextFile file = files.text(form, path + ".file");
            return new ResponseReader(path + ".file", form.position(path + ".file"), problems, file)
                    .read(layout, Optional.of(of))
                    .flatMap(content -> gained(name, path, content));
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
            return Optional.empty();
        }
    }

    private Optional<MeasuredResponse> gained(String name, String path, ResponseReader.Content content) {
        String key = path + ".gain";
        boolean volts = content.reading().volts();
        boolean ratio = content.of() == Measurand.REJECTION;
        if (ratio && form.has(key)) {
            return refuse(key, "a gain of a rejection", "no gain: it cancels in the ratio");
        }
        if (form.has(key) && form.field(key).orElseThrow().quantity().isPresent()) {
            boolean perRadian =
                    form.field(key).orElseThrow().quantity().orElseThrow().dimension() == Dimension.READOUT_GAIN;
            if (perRadian != volts) {
                return refuse(
                        key,
                        form.word(key).orElseThrow() + " for "
                                + content.reading().unit(),
                        volts ? "V/rad for a reading in volts, or free" : "a pure number for an angle, or free");
            }
            double gain = form.si(key);
            if (gain == 0.0) {
                return refuse(key, "a gain of zero", "not zero, or free");
            }
            return Optional.of(response(name, content, OptionalDouble.of(gain)));
        }
        if (!form.has(key) && !ratio) {
            taken.add(
                    volts
                            ? new Form.Taken(
                                    key, "free", "no gain is stated: one common factor, and the sense, is taken out")
                            : new Form.Taken(key, "1", "read as an angle"));
        }
        boolean free = form.has(key) || volts;
        return Optional.of(response(name, content, free ? OptionalDouble.empty() : OptionalDouble.of(1.0)));
    }

    private static MeasuredResponse response(String name, ResponseReader.Content content, OptionalDouble gain) {
        return new MeasuredResponse(name, content.of(), content.reading(), gain, content.points());
    }

    /** Columns as declared; empty where the file's header says them, or with a problem. */
    private Optional<Layout> layout(String path) {
        if (!form.has(path + ".columns")) {
            return Optional.empty();
        }
        List<String> columns = words(path + ".columns");
        List<String> units = words(path + ".units");
        if (columns.size() != units.size()) {
            return refuse(
                    path + ".units",
                    units.size() + " units for " + columns.size() + " columns",
                    "one a column, '-' for one that is passed over");
        }
        int before = problems.count();
        for (int i = 0; i < columns.size(); i++) {
            String column = columns.get(i);
            String key = path + ".columns[" + i + "]";
            if (!column.equals("-") && !COLUMNS.contains(column)) {
                problems.add(new Problem(
                        form.position(key),
                        key,
                        "unknown column " + column,
                        "known here: " + String.join(", ", COLUMNS) + ", -",
                        Nearest.among(column, COLUMNS)));
            } else if (!column.equals("-") && columns.indexOf(column) < i) {
                refuse(key, "column " + column + " again", "each once");
            }
        }
        boolean known = problems.count() == before;
        if (known && !columns.contains("frequency")) {
            refuse(path + ".columns", "no column frequency", "frequency and amplitude must be there");
        }
        if (known
                && columns.stream()
                        .noneMatch(c -> c.equals("amplitude") || Measurand.of(c).isPresent())) {
            refuse(path + ".columns", "no column amplitude", "frequency and amplitude must be there");
        }
        double skip = form.siIfAny(path + ".skip").orElse(0.0);
        if (skip != Math.rint(skip)) {
            refuse(path + ".skip", "a share of a line", "a whole number");
        }
        return Optional.of(new Layout(
                columns, units.stream().map(u -> u.equals("-") ? "" : u).toList(), (int) skip));
    }

    private List<String> words(String path) {
        List<String> words = new ArrayList<>();
        for (int i = 0; form.has(path + "[" + i + "]"); i++) {
            words.add(form.word(path + "[" + i + "]").orElseThrow());
        }
        return words;
    }

    private <T> Optional<T> refuse(String key, String found, String accepted) {
        problems.add(form.position(key), key, found, accepted);
        return Optional.empty();
    }
}
