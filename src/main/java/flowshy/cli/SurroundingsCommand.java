package flowshy.cli;

import flowshy.report.SurroundingsReport;
import flowshy.stream.surroundings.NamedSurrounding;
import flowshy.stream.surroundings.NamedSurroundings;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** Named surroundings that a study may start from. */
@Command(
        name = "surroundings",
        mixinStandardHelpOptions = true,
        description = "List the named surroundings that a study may start from, with their numbers and sources.",
        footer = {"", "Example: flowshy surroundings"})
final class SurroundingsCommand implements Callable<Integer> {
    @Mixin
    private OutputOptions output;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        List<NamedSurrounding> all = NamedSurroundings.all();
        output.send(
                spec.commandLine(),
                SurroundingsReport.text(all),
                output.json() ? Optional.of(SurroundingsReport.json(all)) : Optional.empty(),
                output.csv() ? Optional.of(SurroundingsReport.csv(all)) : Optional.empty());
        return 0;
    }
}
