package flowshy.cli;

import flowshy.medium.MediumException;
import flowshy.report.ProblemsJson;
import flowshy.stream.cover.UnmeasuredFrequencyException;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.study.units.QuantityException;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/** What the command line says when something went wrong, and with which exit code it leaves. */
final class Failures {
    /** Wrong input or usage. */
    static final int WRONG_INPUT = 2;

    /** Done, but a stated limit is not met or undecided. */
    static final int LIMIT = 3;

    private static final int OUR_FAULT = 1;

    private Failures() {}

    /**
     * A failure while a command ran: one the user can mend gives its message, any other its stack trace.
     *
     * @param failure what was thrown
     * @param line the command
     * @param parsed its words
     * @return exit code
     */
    static int handle(Exception failure, CommandLine line, ParseResult parsed) {
        boolean json = parsed.originalArgs().contains("--json");
        if (failure instanceof StudyException study) {
            problems(line, study.problems(), json);
            return WRONG_INPUT;
        }
        if (failure instanceof MediumException
                || failure instanceof QuantityException
                || failure instanceof UnmeasuredFrequencyException
                || failure instanceof UserException) {
            message(line, failure.getMessage(), json);
            return WRONG_INPUT;
        }
        StringWriter trace = new StringWriter();
        failure.printStackTrace(new PrintWriter(trace, true));
        line.getErr().print(trace);
        line.getErr().flush();
        return OUR_FAULT;
    }

    /**
     * Words that do not fit the command.
     *
     * @param failure what was wrong
     * @param args all words
     * @return exit code
     */
    static int usage(ParameterException failure, String[] args) {
        CommandLine line = failure.getCommandLine();
        if (List.of(args).contains("--json")) {
            message(line, failure.getMessage(), true);
            return WRONG_INPUT;
        }
        PrintWriter err = line.getErr();
        err.println("flowshy: " + failure.getMessage().replaceFirst("^Error: ", ""));
        if (!UnmatchedArgumentException.printSuggestions(failure, err)) {
            err.println("Try: " + line.getCommandSpec().qualifiedName() + " --help");
        }
        err.flush();
        return WRONG_INPUT;
    }

    /**
     * Prints what is wrong with a study.
     *
     * @param line the command
     * @param problems in the order found
     * @param json as JSON
     */
    static void problems(CommandLine line, List<Problem> problems, boolean json) {
        if (json) {
            line.getErr().print(ProblemsJson.of(problems));
        } else {
            problems.forEach(problem -> line.getErr().println(problem.text()));
            line.getErr().println(problems.size() == 1 ? "1 problem" : problems.size() + " problems");
        }
        line.getErr().flush();
    }

    /**
     * Why a file could not be written, in plain words.
     *
     * @param target the file
     * @param failure what was thrown
     * @return the whole message
     */
    static String notWritten(Path target, IOException failure) {
        Path folder = target.toAbsolutePath().getParent();
        String why;
        if (failure instanceof AccessDeniedException) {
            why = "writing there is not allowed";
        } else if (folder != null && !Files.isDirectory(folder)) {
            why = "there is no folder " + folder;
        } else if (Files.isDirectory(target)) {
            why = "it is a folder";
        } else {
            why = failure.getMessage();
        }
        return "cannot write " + target + ": " + why + "; nothing was left behind";
    }

    private static void message(CommandLine line, String text, boolean json) {
        if (json) {
            line.getErr().print(ProblemsJson.of(text));
        } else {
            line.getErr().println("flowshy: " + text);
        }
        line.getErr().flush();
    }
}
