package flowshy.study;

import flowshy.response.FreeSwing;
import flowshy.response.FreeSwingFit;
import flowshy.response.SuspensionException;
import flowshy.study.ColumnFile.Column;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.text.TextFile;
import flowshy.study.units.Dimension;
import flowshy.verdict.fit.MeasuredSwing;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredResponse;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Measured files that are named apart from a study: frequency responses, told by a column frequency, and records of free swings, told by a
 * column time.
 *
 * @param responses frequency responses, in the order named
 * @param swings free swings, in the order named
 * @param read every file with its digest
 */
public record MeasuredFiles(List<MeasuredResponse> responses, List<MeasuredSwing> swings, List<Study.FileRead> read) {
    private static final int LIMIT = 32 * 1024 * 1024;
    private static final int MOST_SAMPLES = 200_000;

    /** Copies the lists. */
    public MeasuredFiles {
        responses = List.copyOf(responses);
        swings = List.copyOf(swings);
        read = List.copyOf(read);
    }

    /**
     * Reads files.
     *
     * @param files tables with units in their headers
     * @param of what those were of that do not say it in a column's name
     * @param gain of the readout of those in volts [V/rad], absent if it is not known
     * @return what they hold
     * @throws StudyException with every problem of all files
     */
    public static MeasuredFiles read(List<Path> files, Optional<Measurand> of, OptionalDouble gain) {
        Problems problems = new Problems();
        List<MeasuredResponse> responses = new ArrayList<>();
        List<MeasuredSwing> swings = new ArrayList<>();
        List<Study.FileRead> read = new ArrayList<>();
        for (Path path : files) {
            try {
                TextFile file = TextFile.read(path, path.toString(), LIMIT);
                String name = name(path, files);
                read.add(new Study.FileRead(path.toString(), file.sha256()));
                if (ColumnFile.heads(file).containsKey("time")) {
                    swing(file, problems).ifPresent(swing -> swings.add(new MeasuredSwing(name, swing)));
                } else {
                    response(name, file, of, gain, problems).ifPresent(responses::add);
                }
            } catch (StudyException e) {
                e.problems().forEach(problems::add);
            }
        }
        problems.throwIfAny();
        return new MeasuredFiles(responses, swings, read);
    }

    /** The file's own name, unless two folders hold the same. */
    private static String name(Path path, List<Path> files) {
        long alike = files.stream()
                .filter(other -> String.valueOf(other.getFileName()).equals(String.valueOf(path.getFileName())))
                .count();
        return Printable.of(alike > 1 ? path.toString() : String.valueOf(path.getFileName()));
    }

    private static Optional<MeasuredResponse> response(
            String name, TextFile file, Optional<Measurand> of, OptionalDouble gain, Problems problems) {
        Map<String, String> heads = ColumnFile.heads(file);
        Optional<Measurand> stated = heads.containsKey("amplitude") ? of : Optional.empty();
        return new ResponseReader("", Position.label(Printable.of(file.name())), problems, file)
                .read(Optional.empty(), stated)
                .map(content -> new MeasuredResponse(
                        name, content.of(), content.reading(), gain(content, gain), content.points()));
    }

    private static OptionalDouble gain(ResponseReader.Content content, OptionalDouble gain) {
        if (content.of() == Measurand.REJECTION || content.reading().volts()) {
            return content.of() == Measurand.REJECTION ? OptionalDouble.empty() : gain;
        }
        return OptionalDouble.of(1.0);
    }

    private static Optional<FreeSwing> swing(TextFile file, Problems problems) {
        List<Column> wanted =
                List.of(new Column("time", Optional.of(Dimension.TIME)), new Column("signal", Optional.empty()));
        ColumnFile table = ColumnFile.read(file, wanted, MOST_SAMPLES);
        List<Double> times = new ArrayList<>();
        List<Double> signal = new ArrayList<>();
        for (int i = 0; i < table.rows().size(); i++) {
            double time = table.rows().get(i).get(0);
            if (i > 0 && !(time > times.get(i - 1))) {
                problems.add(table.position(i, 0), "", "the time does not rise", "samples in the order of time");
                return Optional.empty();
            }
            times.add(time);
            signal.add(table.rows().get(i).get(1));
        }
        try {
            return Optional.of(FreeSwingFit.of(times, signal));
        } catch (SuspensionException e) {
            problems.add(Problem.of(Position.label(Printable.of(file.name())), "", e.getMessage(), ""));
            return Optional.empty();
        }
    }
}
