package flowshy.cli;

import flowshy.report.JsonPage;
import flowshy.report.MapReport;
import flowshy.study.MapWords;
import flowshy.study.StudyMap;
import flowshy.verdict.map.GridRun;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** A figure over two numbers. */
@Command(
        name = "map",
        mixinStandardHelpOptions = true,
        description = "A figure of the device over two numbers of the study, or over one and the frequency.",
        footer = {
            "",
            "Example: flowshy map study.yaml --across 'hair.diameter=40 um..120 um' --down 'hair.length=0.3 mm..1.2 mm'"
        })
final class MapCommand implements Callable<Integer> {
    private static final int MOST_STEPS = 4000;

    @Mixin
    private StudyOptions studies;

    @Option(
            names = "--across",
            required = true,
            paramLabel = "KEY=A..B",
            description = "number that runs across, e.g. 'hair.diameter=40 um..120 um' or 'frequency=20 Hz..2 kHz'")
    private String across;

    @Option(names = "--down", required = true, paramLabel = "KEY=A..B", description = "number that runs down, likewise")
    private String down;

    @Option(
            names = "--of",
            paramLabel = "FIGURE",
            description = "what is mapped, e.g. least-rejection, resonance, noise; a wrong name lists all")
    private String figure;

    @Option(
            names = "--at",
            paramLabel = "FREQUENCY",
            converter = QuantityConverters.Frequency.class,
            description = "frequency of a figure that belongs to one, e.g. \"80 Hz\"; the study's calibration or"
                    + " middle of band if not given")
    private Double at;

    @Option(
            names = "--steps",
            paramLabel = "N[,N]",
            split = ",",
            description = "how many values across, and down; 61,41 if not given")
    private List<Integer> steps = new ArrayList<>();

    @Option(
            names = "--log",
            paramLabel = "SIDE",
            arity = "0..1",
            fallbackValue = "BOTH",
            description = "values evenly in their logarithm: across, down, or both if none is named")
    private Sides log;

    @Mixin
    private RunOptions run;

    @Mixin
    private OutputOptions output;

    @Mixin
    private ChartOptions charts;

    @Spec
    private CommandSpec spec;

    /** Sides of a map. */
    enum Sides {
        ACROSS,
        DOWN,
        BOTH
    }

    @Override
    public Integer call() {
        MapWords words = new MapWords(
                across,
                down,
                Optional.ofNullable(figure),
                at == null ? OptionalDouble.empty() : OptionalDouble.of(at),
                counts(),
                List.of(log == Sides.ACROSS || log == Sides.BOTH, log == Sides.DOWN || log == Sides.BOTH));
        JsonPage json = new JsonPage();
        List<String> texts = new ArrayList<>();
        List<Runnable> objects = new ArrayList<>();
        List<String> tables = new ArrayList<>();
        int code = studies.eachOpened(spec.commandLine(), output.json(), reader -> {
            StudyMap map = StudyMap.of(reader, words, new GridRun(run.threads(), run.progress(spec.commandLine())));
            texts.add(MapReport.text(map));
            charts.add(charts.asked() ? List.of(MapReport.chart(map)) : List.of());
            objects.add(() -> MapReport.write(json, map));
            if (output.csv()) {
                tables.add(MapReport.csv(map));
            }
            return 0;
        });
        charts.write();
        studies.send(spec.commandLine(), output, json, texts, objects, tables);
        return code;
    }

    private List<Integer> counts() {
        List<Integer> counts = steps.isEmpty() ? List.of(61, 41) : steps;
        if (counts.size() > 2 || counts.stream().anyMatch(n -> n < 2 || n > MOST_STEPS)) {
            throw new ParameterException(
                    spec.commandLine(), "--steps takes one or two whole numbers from 2 to " + MOST_STEPS);
        }
        return List.of(counts.get(0), counts.get(counts.size() - 1));
    }
}
