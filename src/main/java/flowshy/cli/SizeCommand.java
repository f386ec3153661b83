package flowshy.cli;

import flowshy.report.JsonPage;
import flowshy.report.SizeReport;
import flowshy.report.chart.Chart;
import flowshy.study.SizeWords;
import flowshy.study.StudyReader;
import flowshy.study.StudySizing;
import flowshy.verdict.map.GridRun;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.concurrent.ForkJoinPool;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.DoubleConsumer;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** Some numbers of a study chosen for it. */
@Command(
        name = "size",
        mixinStandardHelpOptions = true,
        description =
                "Chooses numbers of the study so that a figure is least or largest and every limit under accept is kept.",
        footer = {
            "",
            "Example: flowshy size study.yaml --vary hair.diameter --within 'hair.diameter=20 um..200 um' --to minimize mass"
        })
final class SizeCommand implements Callable<Integer> {
    private static final String MINIMIZE = "minimize";
    private static final String MAXIMIZE = "maximize";
    private static final long PATIENCE_NS = 100_000_000L;

    @Mixin
    private StudyOptions studies;

    @Option(
            names = "--vary",
            required = true,
            split = ",",
            paramLabel = "KEY",
            description = "numbers that may be chosen, separated by commas, e.g. hair.diameter,hair.length")
    private List<String> vary;

    @Option(
            names = "--within",
            paramLabel = "KEY=A..B",
            description =
                    "range of one of them, e.g. 'hair.diameter=20 um..200 um'; may be repeated; a fifth to five times"
                            + " the study's number if not given")
    private List<String> within = new ArrayList<>();

    @Option(
            names = "--to",
            required = true,
            arity = "2",
            paramLabel = "WORD",
            description =
                    "minimize or maximize, and a figure: mass, resonance, motion-octaves, …; a wrong name lists all")
    private List<String> to;

    @Option(
            names = "--at",
            paramLabel = "FREQUENCY",
            converter = QuantityConverters.Frequency.class,
            description = "frequency of figures that belong to one; the study's own if not given")
    private Double at;

    @Option(names = "--seed", paramLabel = "N", description = "of the search; one seed, one answer", defaultValue = "1")
    private long seed;

    @Option(names = "--write", paramLabel = "FILE.yaml", description = "write the sized study here")
    private Path write;

    @Mixin
    private RunOptions run;

    @Mixin
    private OutputOptions output;

    @Mixin
    private ChartOptions charts;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        if (to.size() != 2 || !List.of(MINIMIZE, MAXIMIZE).contains(to.get(0))) {
            throw new ParameterException(
                    spec.commandLine(), "--to takes minimize or maximize and a figure, e.g. --to minimize mass");
        }
        if (write != null && (studies.files().size() > 1 || studies.set())) {
            throw new ParameterException(
                    spec.commandLine(),
                    "--write goes with one study and without --set: it changes the file's own numbers");
        }
        SizeWords words = new SizeWords(
                vary,
                within,
                to.get(0).equals(MAXIMIZE),
                to.get(1),
                at == null ? OptionalDouble.empty() : OptionalDouble.of(at),
                seed);
        JsonPage json = new JsonPage();
        List<String> texts = new ArrayList<>();
        List<Runnable> objects = new ArrayList<>();
        List<String> tables = new ArrayList<>();
        int code = studies.eachOpened(spec.commandLine(), output.json(), reader -> {
            StudySizing sizing = sized(reader, words);
            texts.add(SizeReport.text(sizing));
            List<Chart> drawn = charts.asked() ? SizeReport.charts(sizing) : List.of();
            charts.add(drawn);
            objects.add(() -> SizeReport.write(json, sizing, drawn));
            if (output.csv()) {
                tables.add(SizeReport.csv(sizing));
            }
            if (write != null && sizing.keeps()) {
                OutputOptions.write(write, rewritten(reader, sizing));
            }
            return sizing.keeps() ? 0 : Failures.LIMIT;
        });
        charts.write();
        studies.send(spec.commandLine(), output, json, texts, objects, tables);
        return code;
    }

    /** On as many threads as asked for: what runs in parallel stays in the pool that began it. */
    private StudySizing sized(StudyReader reader, SizeWords words) {
        GridRun.Progress line = run.progress(spec.commandLine());
        ForkJoinPool pool = new ForkJoinPool(run.threads());
        try {
            return pool.submit(() -> StudySizing.of(reader, words, shares(line)))
                    .join();
        } finally {
            pool.shutdownNow();
            line.end();
        }
    }

    /** Tells a line of progress, now and then, how much is done and how long the rest will take at that rate. */
    private static DoubleConsumer shares(GridRun.Progress line) {
        long start = System.nanoTime();
        AtomicLong last = new AtomicLong(start);
        return share -> {
            long now = System.nanoTime();
            long before = last.get();
            if (now - before >= PATIENCE_NS && last.compareAndSet(before, now)) {
                line.at(share, 1e-9 * (now - start) * (1.0 - share) / share);
            }
        };
    }

    private static String rewritten(StudyReader reader, StudySizing sizing) {
        Map<String, String> numbers = new LinkedHashMap<>();
        for (int i = 0; i < sizing.numbers().size(); i++) {
            numbers.put(sizing.numbers().get(i).path(), sizing.written(i));
        }
        return reader.rewritten(numbers);
    }
}
