package flowshy.cli;

import flowshy.report.CheckReport;
import flowshy.report.JsonPage;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.study.keys.Keys;
import flowshy.study.keys.Schema;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** Reads a study and says what it understood. */
@Command(
        name = "check",
        mixinStandardHelpOptions = true,
        description = "Read a study and say what was understood, as written and in SI.",
        footer = {"", "Example: flowshy check study.yaml", "         flowshy check --keys"})
final class CheckCommand implements Callable<Integer> {
    @Mixin
    private StudyOptions studies;

    @Option(names = "--keys", description = "print every key of a study with kind, default and meaning")
    private boolean keys;

    @Option(names = "--schema", description = "print the JSON Schema of a study, for editors")
    private boolean schema;

    @Mixin
    private OutputOptions output;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        if (keys || schema) {
            spec.commandLine().getOut().print(schema ? Schema.text() : CheckReport.keys(Keys.rows()));
            spec.commandLine().getOut().flush();
            return 0;
        }
        JsonPage json = new JsonPage();
        List<String> texts = new ArrayList<>();
        List<Runnable> objects = new ArrayList<>();
        List<String> tables = new ArrayList<>();
        int code = studies.each(spec.commandLine(), output.json(), CheckCommand::whole, study -> {
            texts.add(CheckReport.text(study));
            objects.add(() -> CheckReport.write(json, study));
            if (output.csv()) {
                tables.add(CheckReport.csv(study));
            }
            return 0;
        });
        studies.send(spec.commandLine(), output, json, texts, objects, tables);
        return code;
    }

    /** A study is right only if its variants are. */
    private static Study whole(StudyReader reader) {
        return reader.family(Optional.empty()).study();
    }
}
