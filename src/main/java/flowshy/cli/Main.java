package flowshy.cli;

import flowshy.report.Version;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** Starts the command line: words in, one command, its exit code out. */
@Command(
        name = "flowshy",
        mixinStandardHelpOptions = true,
        versionProvider = Main.BuildVersion.class,
        description = "In which bands does a hair-type inertial sensor read motion, and in which does it read flow?",
        synopsisSubcommandLabel = "COMMAND",
        footer = {
            "",
            "Example: flowshy bands study.yaml",
            "Exit codes: 0 done; 2 wrong input or usage; 3 done, but a stated limit is not met or undecided."
        })
public final class Main implements Runnable {
    /** In the order of the help; {@link #command} makes each. */
    private static final List<String> COMMANDS = List.of(
            "bands",
            "lid",
            "fill",
            "compare",
            "map",
            "size",
            "tolerance",
            "fit",
            "cylinder",
            "media",
            "surroundings",
            "check",
            "start",
            "report");

    @Spec
    private CommandSpec spec;

    private Main() {}

    /**
     * Runs one command and leaves with its exit code.
     *
     * @param args the words of the command line
     */
    public static void main(String[] args) {
        System.exit(commandLine(args).execute(args));
    }

    /**
     * The command line, as {@code main} runs it and tests run it. Only the command that is named is made, all of them if none is: their
     * options are found by reflection, which takes longer than most answers.
     *
     * @param words of the command line
     * @return ready to execute
     */
    public static CommandLine commandLine(String... words) {
        CommandLine line = new CommandLine(new Main());
        boolean named = words.length > 0 && COMMANDS.contains(words[0]);
        for (String name : named ? List.of(words[0]) : COMMANDS) {
            line.addSubcommand(name, command(name));
        }
        line.setOut(writer(FileDescriptor.out));
        line.setErr(writer(FileDescriptor.err));
        line.setCaseInsensitiveEnumValuesAllowed(true);
        line.setExecutionExceptionHandler(Failures::handle);
        line.setParameterExceptionHandler(Failures::usage);
        return line;
    }

    private static Callable<Integer> command(String name) {
        return switch (name) {
            case "bands" -> new BandsCommand();
            case "lid" -> new LidCommand();
            case "fill" -> new FillCommand();
            case "compare" -> new CompareCommand();
            case "map" -> new MapCommand();
            case "size" -> new SizeCommand();
            case "tolerance" -> new ToleranceCommand();
            case "cylinder" -> new CylinderCommand();
            case "media" -> new MediaCommand();
            case "surroundings" -> new SurroundingsCommand();
            case "check" -> new CheckCommand();
            case "start" -> new StartCommand();
            case "report" -> new ReportCommand();
            case "fit" -> new FitCommand();
            default -> throw new IllegalArgumentException("no command " + name);
        };
    }

    /** UTF-8 whatever the machine's own encoding, so that one answer is the same bytes everywhere. */
    private static PrintWriter writer(FileDescriptor descriptor) {
        return new PrintWriter(new FileOutputStream(descriptor), true, StandardCharsets.UTF_8);
    }

    @Override
    public void run() {
        throw new ParameterException(spec.commandLine(), "a command is missing");
    }

    /** Version for {@code --version}. */
    static final class BuildVersion implements IVersionProvider {
        @Override
        public String[] getVersion() {
            return new String[] {"flowshy " + Version.number()};
        }
    }
}
