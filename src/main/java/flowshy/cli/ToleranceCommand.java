package flowshy.cli;

import flowshy.report.JsonPage;
import flowshy.report.ToleranceReport;
import flowshy.report.chart.Chart;
import flowshy.report.chart.several.ToleranceCharts;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import flowshy.verdict.Decision;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.tolerance.Effort;
import flowshy.verdict.tolerance.Precision;
import flowshy.verdict.tolerance.ToleranceAnswer;
import flowshy.verdict.tolerance.ToleranceQuestion;
import flowshy.verdict.tolerance.sampling.Progress;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ForkJoinPool;
import picocli.CommandLine.Command;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import picocli.CommandLine.TypeConversionException;

/** How sure the verdict is. */
@Command(
        name = "tolerance",
        mixinStandardHelpOptions = true,
        description =
                "How sure is the verdict? Chance of every limit, spread of the rejection, and which tolerance matters most.",
        footer = {"", "Example: flowshy tolerance study.yaml --set \"tolerances.hair.diameter={sd: 3 %%}\" --seed 7"})
final class ToleranceCommand implements Callable<Integer> {
    @Mixin
    private StudyOptions studies;

    @Mixin
    private OutputOptions output;

    @Mixin
    private ChartOptions charts;

    @Mixin
    private RunOptions run;

    @Option(
            names = "--samples",
            paramLabel = "N",
            description = "devices tried, at most; 16384 if neither this nor --precision is given")
    private Integer samples;

    @Option(
            names = "--precision",
            paramLabel = "LIST",
            split = ",",
            converter = PrecisionConverter.class,
            description =
                    "stop when the 95 %% intervals are this narrow to each side: of every percentile, \"0.05 dB\", of every"
                            + " chance, \"0.5 %%\", or both")
    private List<Precision> precisions = new ArrayList<>();

    @Option(
            names = "--seed",
            paramLabel = "N",
            defaultValue = "1",
            description = "of the random numbers; the same seed gives the same digits (default: ${DEFAULT-VALUE})")
    private long seed;

    @Option(
            names = "--of",
            paramLabel = "LIST",
            split = ",",
            converter = FigureConverter.class,
            description = "further quantities whose spread is wanted, e.g. resonance,quality")
    private List<Figure> figures = new ArrayList<>();

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        Effort effort = effort();
        JsonPage json = new JsonPage();
        List<String> texts = new ArrayList<>();
        List<Runnable> objects = new ArrayList<>();
        List<String> tables = new ArrayList<>();
        int code = studies.each(spec.commandLine(), output.json(), study -> {
            ToleranceAnswer answer = answer(new ToleranceQuestion(study.tolerances(), figures), effort);
            texts.add(ToleranceReport.text(study, answer));
            List<Chart> drawn = charts.asked() ? ToleranceCharts.of(study, answer) : List.of();
            charts.add(drawn);
            objects.add(() -> ToleranceReport.write(json, study, answer, drawn));
            if (output.csv()) {
                tables.add(ToleranceReport.csv(answer));
            }
            return answer.decision() == Decision.FAILS || answer.decision() == Decision.UNDECIDED ? Failures.LIMIT : 0;
        });
        charts.write();
        studies.send(spec.commandLine(), output, json, texts, objects, tables);
        return code;
    }

    /** On as many threads as are wanted; the library's parallel loops work in the pool that calls them. */
    private ToleranceAnswer answer(ToleranceQuestion question, Effort effort) {
        ForkJoinPool pool = new ForkJoinPool(run.threads());
        try {
            return pool.submit(() -> question.answer(effort, progress())).get();
        } catch (ExecutionException e) {
            throw e.getCause() instanceof RuntimeException ours ? ours : new IllegalStateException(e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("interrupted", e);
        } finally {
            pool.shutdownNow();
        }
    }

    /** A run has two or three parts; each counts anew from nothing to all. */
    private Progress progress() {
        var line = run.progress(spec.commandLine());
        long start = System.nanoTime();
        return (done, most) -> {
            double share = (double) done / most;
            line.at(share, 1e-9 * (System.nanoTime() - start) * (1.0 - share) / share);
        };
    }

    private Effort effort() {
        OptionalDouble level =
                precisions.stream().flatMapToDouble(p -> p.level().stream()).min();
        OptionalDouble share =
                precisions.stream().flatMapToDouble(p -> p.share().stream()).min();
        int usual = precisions.isEmpty() ? Effort.USUAL : Effort.USUAL_MOST;
        int wanted = samples == null ? usual : samples;
        if (wanted < Effort.LEAST || wanted > Effort.MOST) {
            throw new ParameterException(
                    spec.commandLine(), "--samples takes a whole number from " + Effort.LEAST + " to " + Effort.MOST);
        }
        return new Effort(wanted, new Precision(level, share), seed);
    }

    /** {@code 0.05 dB} or {@code 0.5 %}. */
    static final class PrecisionConverter implements ITypeConverter<Precision> {
        @Override
        public Precision convert(String text) {
            boolean share = text.strip().endsWith("%");
            try {
                double value = Quantity.read(text, share ? Dimension.SHARE : Dimension.LEVEL)
                        .value();
                if (value > 0.0) {
                    return share
                            ? new Precision(OptionalDouble.empty(), OptionalDouble.of(value))
                            : new Precision(OptionalDouble.of(value), OptionalDouble.empty());
                }
            } catch (QuantityException e) {
                throw new TypeConversionException(
                        e.getMessage() + "; half a width of percentiles in dB, or of chances in %");
            }
            throw new TypeConversionException("'" + text.strip() + "'; more than zero is wanted, in dB or in %");
        }
    }

    /** A name of the table of quantities. */
    static final class FigureConverter implements ITypeConverter<Figure> {
        @Override
        public Figure convert(String text) {
            return Figure.named(text.strip())
                    .orElseThrow(() -> new TypeConversionException(
                            "'" + text.strip() + "' is no quantity; known are " + String.join(", ", Figure.names())));
        }
    }
}
