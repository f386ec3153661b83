package flowshy.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import picocli.CommandLine;

/**
 * One command as a user runs it.
 *
 * @param code exit code
 * @param out what went to standard output
 * @param err what went to standard error
 */
public record Run(int code, String out, String err) {
    /** Runs a command line. */
    public static Run of(String... words) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        CommandLine line = Main.commandLine(words);
        line.setOut(new PrintWriter(out, true));
        line.setErr(new PrintWriter(err, true));
        int code = line.execute(words);
        return new Run(code, out.toString(), err.toString());
    }
}
