package flowshy.cli;

import flowshy.study.Starter;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** A commented study to begin with. */
@Command(
        name = "start",
        mixinStandardHelpOptions = true,
        description = "Write a commented study to begin with, to standard output or a new file.",
        footer = {"", "Example: flowshy start --shape club --cover sealed study.yaml"})
final class StartCommand implements Callable<Integer> {
    @Parameters(arity = "0..1", paramLabel = "FILE", description = "new file; one that exists is never written over")
    private Path file;

    @Option(names = "--shape", defaultValue = "cylinder", description = "cylinder, taper, club or profile")
    private String shape;

    @Option(names = "--cover", defaultValue = "open", description = "open or sealed")
    private String cover;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        String text = Starter.study(shape, cover);
        if (file == null) {
            spec.commandLine().getOut().print(text);
            spec.commandLine().getOut().flush();
            return 0;
        }
        try {
            Files.write(file, text.getBytes(StandardCharsets.UTF_8), StandardOpenOption.CREATE_NEW);
        } catch (FileAlreadyExistsException e) {
            throw new UserException(file + " exists and is not written over; name a new file");
        } catch (IOException e) {
            throw new UserException(Failures.notWritten(file, e));
        }
        spec.commandLine().getOut().println("wrote " + file + "; next: flowshy bands " + file);
        return 0;
    }
}
