package flowshy.cli;

import flowshy.verdict.map.GridRun;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** Words of commands that take their time. */
final class RunOptions {
    private static final int MOST_THREADS = 256;

    @Option(
            names = "--threads",
            paramLabel = "N",
            description = "how many threads work; all of the machine's if not given. The answer does not depend on it")
    private Integer threads;

    @Spec(Spec.Target.MIXEE)
    private CommandSpec command;

    /**
     * How many threads.
     *
     * @return one or more
     */
    int threads() {
        if (threads == null) {
            return Runtime.getRuntime().availableProcessors();
        }
        if (threads < 1 || threads > MOST_THREADS) {
            throw new ParameterException(
                    command.commandLine(), "--threads takes a whole number from 1 to " + MOST_THREADS);
        }
        return threads;
    }

    /**
     * Where a long run tells how far it is.
     *
     * @param line the command, for its error writer
     * @return one line that is written over on a terminal, else a line every tenth of the way
     */
    GridRun.Progress progress(CommandLine line) {
        return new ProgressLine(line.getErr(), CommandLine.Help.Ansi.AUTO.enabled());
    }
}
