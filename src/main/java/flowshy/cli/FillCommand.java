package flowshy.cli;

import flowshy.report.FillReport;
import flowshy.report.JsonPage;
import flowshy.report.chart.Chart;
import flowshy.report.chart.several.FillChart;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.study.Study;
import flowshy.verdict.Decision;
import flowshy.verdict.fill.Fill;
import flowshy.verdict.fill.FillAnswer;
import flowshy.verdict.fill.FillQuestion;
import flowshy.verdict.lid.Candidate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** The fill decision. */
@Command(
        name = "fill",
        mixinStandardHelpOptions = true,
        description =
                "The study's device in every fill at the same state, bare and sealed: rejection, resonance, Q, noise, which limits"
                        + " each misses, amid the surroundings and over the envelope, and what speaks against a fluid.",
        footer = {"", "Example: flowshy fill study.yaml --only \"helium, silicone oil\""})
final class FillCommand implements Callable<Integer> {
    @Mixin
    private StudyOptions studies;

    @Option(
            names = "--only",
            paramLabel = "LIST",
            split = ",",
            description = "fills to be compared, by name or beginning of a name, e.g. \"helium, silicone oil\"")
    private List<String> only = new ArrayList<>();

    @Mixin
    private OutputOptions output;

    @Mixin
    private ChartOptions charts;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        JsonPage json = new JsonPage();
        List<String> texts = new ArrayList<>();
        List<Runnable> objects = new ArrayList<>();
        List<String> tables = new ArrayList<>();
        int code = studies.each(spec.commandLine(), output.json(), study -> {
            FillQuestion question = question(study);
            FillAnswer answer = question.answer();
            texts.add(FillReport.text(study, question, answer));
            List<Chart> drawn = charts.asked() ? FillChart.of(study, study.acceptance(), answer.rows()) : List.of();
            charts.add(drawn);
            objects.add(() -> FillReport.write(json, study, question, answer, drawn));
            if (output.csv()) {
                tables.add(FillReport.csv(answer.rows()));
            }
            Decision decision = answer.decision();
            return decision == Decision.FAILS || decision == Decision.UNDECIDED ? Failures.LIMIT : 0;
        });
        charts.write();
        studies.send(spec.commandLine(), output, json, texts, objects, tables);
        return code;
    }

    private FillQuestion question(Study study) {
        List<Fill> fills = Fill.known(
                study.device().outside().temperature(), study.device().outside().pressure());
        if (!only.isEmpty()) {
            fills = chosen(fills);
        }
        List<Cover> covers =
                study.candidates().stream().map(Candidate::cover).distinct().toList();
        return new FillQuestion(
                study.question(), fills, covers.isEmpty() ? List.of(Covers.OPEN, Covers.SEALED) : covers);
    }

    private List<Fill> chosen(List<Fill> known) {
        List<Fill> chosen = new ArrayList<>();
        for (String word : only) {
            String wanted = word.strip().toLowerCase(Locale.ROOT);
            List<Fill> fitting = known.stream()
                    .filter(fill -> fill.name().toLowerCase(Locale.ROOT).startsWith(wanted))
                    .toList();
            if (wanted.isEmpty() || fitting.isEmpty()) {
                throw new UserException("--only '" + word.strip() + "': no fill begins so; known are "
                        + String.join(", ", known.stream().map(Fill::name).toList()));
            }
            chosen.addAll(fitting);
        }
        return chosen.stream().distinct().toList();
    }
}
