package flowshy.study;

import static flowshy.math.Figures.say;

import flowshy.stream.record.Declaration;
import flowshy.stream.record.DeclarationException;
import flowshy.stream.record.MeasuredSpectrum;
import flowshy.stream.record.Quantity;
import flowshy.stream.record.RecordException;
import flowshy.stream.record.RecordFile;
import flowshy.study.keys.Form;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.text.TextFile;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A measured file beside the study, read as the keys of its group declare it. */
final class MeasuredReader {
    private final Form form;
    private final Problems problems;
    private final FilesRead files;

    MeasuredReader(Form form, Problems problems, FilesRead files) {
        this.form = form;
        this.problems = problems;
        this.files = files;
    }

    /**
     * The signal of a file.
     *
     * @param path of the group
     * @param quantity in what form the file holds it
     * @return the signal; empty if there is a problem, told at its key or at the line of the file
     */
    Optional<MeasuredSpectrum> read(String path, Quantity quantity) {
        double skip = form.siIfAny(path + ".skip").orElse(0.0);
        if (skip != Math.rint(skip)) {
            problems.add(form.position(path + ".skip"), path + ".skip", "a share of a line", "a whole number");
            return Optional.empty();
        }
        try {
            Declaration declaration = Declaration.of(
                    columns(path),
                    quantity.word(),
                    form.word(path + ".unit").orElseThrow(),
                    (int) skip,
                    form.siIfAny(path + ".rate"),
                    form.siIfAny(path + ".resolution"));
            TextFile file = files.text(form, path + ".file");
            return Optional.of(RecordFile.read(Printable.of(file.name()), file.text(), declaration));
        } catch (DeclarationException e) {
            String key = path + "." + e.key();
            problems.add(form.position(key), key, Printable.of(e.found()), e.accepted());
        } catch (RecordException e) {
            e.problems()
                    .forEach(fault -> problems.add(
                            new Position(fault.file(), fault.line(), fault.column()),
                            path + ".file",
                            fault.found(),
                            fault.accepted()));
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
        }
        return Optional.empty();
    }

    /** How a record became a density, in place of a written resolution. */
    static Optional<Form.Taken> averaged(String path, MeasuredSpectrum spectrum) {
        return spectrum.averaging()
                .map(averaging -> new Form.Taken(
                        path + ".resolution",
                        say("%.4g Hz", averaging.resolution()),
                        "Welch's method: " + averaging.words()
                                + say(", random error of a line %.2g %%", 100.0 * averaging.randomError())));
    }

    private List<String> columns(String path) {
        List<String> columns = new ArrayList<>();
        for (int i = 0; form.has(path + ".columns[" + i + "]"); i++) {
            columns.add(form.word(path + ".columns[" + i + "]").orElseThrow());
        }
        return columns;
    }
}
