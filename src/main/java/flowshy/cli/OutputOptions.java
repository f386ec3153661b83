package flowshy.cli;

import flowshy.report.WholeFile;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Stack;
import picocli.CommandLine;
import picocli.CommandLine.IParameterConsumer;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;

/** Where an answer goes: terminal text by default, JSON or CSV on request. */
final class OutputOptions {
    /** A dash stands for standard output. */
    private static final String OUT = "-";

    @Option(
            names = "--json",
            arity = "0..1",
            paramLabel = "FILE.json",
            parameterConsumer = JsonFile.class,
            description = "answer as JSON, to a file if one is named")
    private String json;

    @Option(
            names = "--csv",
            arity = "0..1",
            paramLabel = "FILE.csv",
            parameterConsumer = CsvFile.class,
            description = "table as CSV, to a file if one is named")
    private String csv;

    /**
     * Whether JSON was asked for.
     *
     * @return true if so
     */
    boolean json() {
        return json != null;
    }

    /**
     * Whether CSV was asked for.
     *
     * @return true if so
     */
    boolean csv() {
        return csv != null;
    }

    /**
     * Sends every form that was asked for to its place; what goes to standard output must be one form only.
     *
     * @param line the command, for its writer
     * @param text for people, printed unless JSON or CSV goes to standard output
     * @param jsonText empty if not asked for
     * @param csvText empty if not asked for
     */
    void send(CommandLine line, String text, Optional<String> jsonText, Optional<String> csvText) {
        if (OUT.equals(json) && OUT.equals(csv)) {
            throw new UserException("--json and --csv both go to standard output; name a file for one: --csv FILE.csv");
        }
        jsonText.ifPresent(body -> send(line, json, body));
        csvText.ifPresent(body -> send(line, csv, body));
        if (!OUT.equals(json) && !OUT.equals(csv)) {
            line.getOut().print(text);
        }
        line.getOut().flush();
    }

    private static void send(CommandLine line, String target, String body) {
        if (OUT.equals(target)) {
            line.getOut().print(body);
            return;
        }
        write(Path.of(target), body);
    }

    /**
     * Writes a file whole.
     *
     * @param target the file
     * @param body its text
     * @throws UserException if it cannot be written
     */
    static void write(Path target, String body) {
        try {
            WholeFile.write(target, body);
        } catch (IOException e) {
            throw new UserException(Failures.notWritten(target, e));
        }
    }

    /** Takes the next word only if it names a file of the right kind: {@code --json study.yaml} must not write over the study. */
    private abstract static class FileWord implements IParameterConsumer {
        private final String ending;

        FileWord(String ending) {
            this.ending = ending;
        }

        @Override
        public void consumeParameters(Stack<String> words, ArgSpec option, CommandSpec command) {
            boolean named = !words.isEmpty()
                    && (words.peek().endsWith(ending) || words.peek().equals(OUT));
            option.setValue(named ? words.pop() : OUT);
        }
    }

    /** {@code FILE.json}. */
    static final class JsonFile extends FileWord {
        JsonFile() {
            super(".json");
        }
    }

    /** {@code FILE.csv}. */
    static final class CsvFile extends FileWord {
        CsvFile() {
            super(".csv");
        }
    }
}
