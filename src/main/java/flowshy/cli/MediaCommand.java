package flowshy.cli;

import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.report.MediaReport;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** What is known of the gases and liquids a hair may stand in. */
@Command(
        name = "media",
        mixinStandardHelpOptions = true,
        description = "List the known media, or print one with its properties, source and uncertainty.",
        footer = {"", "Example: flowshy media air --temperature \"22 degC\" --humidity \"45 %%\""})
final class MediaCommand implements Callable<Integer> {
    @Parameters(arity = "0..1", paramLabel = "NAME", description = "medium to be printed; all are listed without")
    private String name;

    @Mixin
    private MediumOptions state;

    @Mixin
    private OutputOptions output;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        if (name == null) {
            var entries = Media.entries();
            output.send(
                    spec.commandLine(),
                    MediaReport.listText(entries),
                    output.json() ? Optional.of(MediaReport.listJson(entries)) : Optional.empty(),
                    output.csv() ? Optional.of(MediaReport.listCsv(entries)) : Optional.empty());
            return 0;
        }
        Medium medium = state.medium(name);
        output.send(
                spec.commandLine(),
                MediaReport.text(medium),
                output.json() ? Optional.of(MediaReport.json(medium)) : Optional.empty(),
                output.csv() ? Optional.of(MediaReport.csv(medium)) : Optional.empty());
        return 0;
    }
}
