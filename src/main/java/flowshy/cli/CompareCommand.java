package flowshy.cli;

import flowshy.report.CompareJson;
import flowshy.report.CompareText;
import flowshy.report.JsonPage;
import flowshy.report.chart.Chart;
import flowshy.report.chart.several.CompareCharts;
import flowshy.response.Hold;
import flowshy.study.Family;
import flowshy.study.Variant;
import flowshy.verdict.Decision;
import flowshy.verdict.compare.CompareQuestion;
import flowshy.verdict.compare.ComparedDevice;
import flowshy.verdict.compare.Contender;
import flowshy.verdict.figure.Figure;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import picocli.CommandLine.TypeConversionException;

/** Devices side by side. */
@Command(
        name = "compare",
        mixinStandardHelpOptions = true,
        description =
                "The variants of a study beside it, or several studies beside the first: as they are, or scaled until one"
                        + " quantity is equal.",
        footer = {
            "",
            "Example: flowshy compare study.yaml --equal inertia",
            "         flowshy compare study.yaml other.yaml --equal resonance --by suspension.stiffness",
            "Exit code 3 where limits are stated and no device meets them all."
        })
final class CompareCommand implements Callable<Integer> {
    @Mixin
    private StudyOptions studies;

    @Option(
            names = "--equal",
            paramLabel = "QUANTITY",
            converter = Quantity.class,
            description =
                    "scale every other device until this equals the first one's: mass, volume, inertia, torque, resonance,"
                            + " footprint, or another named quantity")
    private Figure equal;

    @Option(
            names = "--by",
            paramLabel = "KEY",
            description =
                    "with --equal: the number that is changed, e.g. hair.head-diameter; all diameters of the hair unless said")
    private String by;

    @Option(
            names = "--hold",
            paramLabel = "stiffness|resonance",
            description =
                    "what of the suspension stays as measured on the base; else as the study says, else the stiffness")
    private Hold hold;

    @Mixin
    private OutputOptions output;

    @Mixin
    private ChartOptions charts;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        if (by != null && equal == null) {
            throw new ParameterException(spec.commandLine(), "--by goes with --equal QUANTITY");
        }
        Optional<List<Family>> read =
                studies.all(spec.commandLine(), output.json(), reader -> reader.family(Optional.ofNullable(hold)));
        if (read.isEmpty()) {
            return Failures.WRONG_INPUT;
        }
        List<Contender> contenders = read.get().stream()
                .flatMap(family -> family.all().stream())
                .map(this::contender)
                .toList();
        CompareQuestion question = new CompareQuestion(contenders, Optional.ofNullable(equal));
        List<ComparedDevice> devices = question.answer();
        List<Chart> drawn =
                charts.asked() ? CompareCharts.of(read.get().get(0).study().title(), devices) : List.of();
        charts.add(drawn);
        charts.write();
        JsonPage json = new JsonPage();
        studies.send(
                spec.commandLine(),
                output,
                json,
                CompareText.of(read.get(), question, devices),
                () -> CompareJson.write(json, read.get(), question, devices, drawn),
                CompareJson.csv(devices));
        Decision decision = CompareQuestion.decision(devices);
        return decision == Decision.FAILS || decision == Decision.UNDECIDED ? Failures.LIMIT : 0;
    }

    private Contender contender(Variant variant) {
        return by == null ? variant.contender() : variant.contender("--by", by);
    }

    /** A named quantity; torque is short for the inertial torque. */
    static final class Quantity implements ITypeConverter<Figure> {
        @Override
        public Figure convert(String text) {
            String word = text.strip().equals("torque") ? Figure.INERTIAL_TORQUE.word() : text.strip();
            return Figure.named(word)
                    .orElseThrow(() -> new TypeConversionException("'" + text.strip()
                            + "' is no named quantity; known are torque, " + String.join(", ", Figure.names())));
        }
    }
}
