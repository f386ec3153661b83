package flowshy.cli;

import flowshy.report.JsonPage;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.study.text.Position;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.verdict.error.StreamTooFastException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToIntFunction;
import picocli.CommandLine;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;

/** Words shared by the commands that work on studies. */
final class StudyOptions {
    @Parameters(arity = "0..*", paramLabel = "STUDY", description = "study file, YAML; several give one answer each")
    private List<Path> studies = new ArrayList<>();

    @Option(
            names = "--set",
            paramLabel = "KEY=VALUE",
            description = "overlay a key of the study, e.g. --set 'hair.diameter=90 um'; may be repeated")
    private List<String> settings = new ArrayList<>();

    /**
     * The studies named.
     *
     * @return their files, in order
     */
    List<Path> files() {
        return List.copyOf(studies);
    }

    /**
     * Whether keys are overlaid.
     *
     * @return true if so
     */
    boolean set() {
        return !settings.isEmpty();
    }

    /**
     * Reads every study and works on it; the problems of one do not stop the others.
     *
     * @param line the command, for its error writer
     * @param json whether problems are printed as JSON
     * @param work done on each study, gives an exit code
     * @return the worst exit code: wrong input before a limit before success
     */
    int each(CommandLine line, boolean json, ToIntFunction<Study> work) {
        return each(line, json, StudyReader::study, work);
    }

    /** The same where more than the study itself is to be read and checked. */
    <T> int each(CommandLine line, boolean json, Function<StudyReader, T> reading, ToIntFunction<T> work) {
        return eachOpened(line, json, reader -> work.applyAsInt(reading.apply(reader)));
    }

    /**
     * The same for work that walks through changed values of a study.
     *
     * @param line the command, for its error writer
     * @param json whether problems are printed as JSON
     * @param work done with the reader of each study, gives an exit code
     * @return the worst exit code
     */
    int eachOpened(CommandLine line, boolean json, ToIntFunction<StudyReader> work) {
        named(line);
        int worst = 0;
        List<Problem> problems = new ArrayList<>();
        for (Path study : studies) {
            int code;
            try {
                code = work.applyAsInt(StudyReader.open(study, settings));
            } catch (StudyException e) {
                problems.addAll(e.problems());
                code = Failures.WRONG_INPUT;
            } catch (StreamTooFastException e) {
                problems.add(Problem.of(Position.label(study.toString()), "surroundings", e.getMessage(), ""));
                code = Failures.WRONG_INPUT;
            }
            worst = code == Failures.WRONG_INPUT || worst == Failures.WRONG_INPUT
                    ? Failures.WRONG_INPUT
                    : Math.max(worst, code);
        }
        if (!problems.isEmpty()) {
            Failures.problems(line, problems, json);
        }
        return worst;
    }

    /**
     * Reads every study for one answer about all of them.
     *
     * @param line the command, for its error writer
     * @param json whether problems are printed as JSON
     * @param reading takes from a reader what is needed
     * @param <T> what that is
     * @return one a study; empty if any had a problem, which is printed then
     */
    <T> Optional<List<T>> all(CommandLine line, boolean json, Function<StudyReader, T> reading) {
        named(line);
        List<T> read = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        for (Path study : studies) {
            try {
                read.add(reading.apply(StudyReader.open(study, settings)));
            } catch (StudyException e) {
                problems.addAll(e.problems());
            }
        }
        if (!problems.isEmpty()) {
            Failures.problems(line, problems, json);
            return Optional.empty();
        }
        return Optional.of(read);
    }

    private void named(CommandLine line) {
        if (studies.isEmpty()) {
            throw new ParameterException(
                    line, "a STUDY is missing: name a study file, or write one with the command start");
        }
    }

    /**
     * Sends the answers on: one JSON object for one study, an array for several.
     *
     * @param line the command, for its writer
     * @param output where to
     * @param json the page the objects write on
     * @param texts one a study that could be read
     * @param objects writes one object each, same order
     * @param tables CSV, one a study; empty if not asked for
     */
    void send(
            CommandLine line,
            OutputOptions output,
            JsonPage json,
            List<String> texts,
            List<Runnable> objects,
            List<String> tables) {
        if (texts.isEmpty()) {
            return;
        }
        if (output.json() && studies.size() > 1) {
            json.array(objects);
        } else if (output.json()) {
            objects.get(0).run();
        }
        output.send(
                line,
                String.join("\n", texts),
                output.json() ? Optional.of(json.finish()) : Optional.empty(),
                output.csv() ? Optional.of(String.join("\n", tables)) : Optional.empty());
    }

    /**
     * Sends one answer about all studies on.
     *
     * @param line the command, for its writer
     * @param output where to
     * @param json the page the object writes on
     * @param text for people
     * @param object writes the answer as an object
     * @param table as CSV
     */
    void send(CommandLine line, OutputOptions output, JsonPage json, String text, Runnable object, String table) {
        if (output.json()) {
            object.run();
        }
        output.send(
                line,
                text,
                output.json() ? Optional.of(json.finish()) : Optional.empty(),
                output.csv() ? Optional.of(table) : Optional.empty());
    }
}
