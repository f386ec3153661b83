package flowshy.cli;

import flowshy.report.JsonPage;
import flowshy.report.LidReport;
import flowshy.report.chart.Chart;
import flowshy.report.chart.several.CoverCharts;
import flowshy.verdict.Decision;
import flowshy.verdict.lid.LidAnswer;
import flowshy.verdict.lid.LidQuestion;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The lid decision. */
@Command(
        name = "lid",
        mixinStandardHelpOptions = true,
        description = "Does the device need a lid, how good must it be, and what does it do to the device?",
        footer = {"", "Example: flowshy lid study.yaml --set \"candidates=[open, sealed]\""})
final class LidCommand implements Callable<Integer> {
    @Mixin
    private StudyOptions studies;

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
            LidQuestion question = new LidQuestion(study.question(), study.reference(), study.candidates());
            LidAnswer answer = question.answer();
            texts.add(LidReport.text(study, question, answer));
            List<Chart> drawn = charts.asked() ? CoverCharts.of(study, answer) : List.of();
            charts.add(drawn);
            objects.add(() -> LidReport.write(json, study, question, answer, drawn));
            if (output.csv()) {
                tables.add(LidReport.csv(answer));
            }
            Decision decision = answer.verdict().decision();
            return decision == Decision.FAILS || decision == Decision.UNDECIDED ? Failures.LIMIT : 0;
        });
        charts.write();
        studies.send(spec.commandLine(), output, json, texts, objects, tables);
        return code;
    }
}
