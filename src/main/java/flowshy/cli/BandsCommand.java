package flowshy.cli;

import flowshy.report.BandsJson;
import flowshy.report.BandsText;
import flowshy.report.ForceReport;
import flowshy.report.JsonPage;
import flowshy.report.TableCsv;
import flowshy.report.Why;
import flowshy.report.chart.Chart;
import flowshy.report.chart.device.BandsCharts;
import flowshy.report.chart.device.ForceChart;
import flowshy.report.chart.device.MeasuredOverlays;
import flowshy.report.chart.device.SensitivityChart;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.Levers;
import flowshy.verdict.ThirdOctaves;
import flowshy.verdict.design.Sensitivities;
import flowshy.verdict.force.ForceAlong;
import flowshy.verdict.measured.BesideModel;
import flowshy.verdict.measured.Compared;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** The main job. */
@Command(
        name = "bands",
        mixinStandardHelpOptions = true,
        description = "In which bands does the device of a study read motion, and in which flow?",
        footer = {"", "Example: flowshy bands study.yaml --frequencies \"80 Hz, 320 Hz\" --why"})
final class BandsCommand implements Callable<Integer> {
    /** Points of the fine grid that CSV gets. */
    private static final int FINE = 401;

    @Mixin
    private StudyOptions studies;

    @Mixin
    private OutputOptions output;

    @Mixin
    private ChartOptions charts;

    @Option(
            names = "--frequencies",
            paramLabel = "LIST",
            converter = Frequencies.Converter.class,
            description = "evaluate the response at these frequencies, e.g. \"80 Hz, 320 Hz\"")
    private Frequencies frequencies;

    @Option(
            names = "--force-at",
            paramLabel = "LIST",
            converter = Frequencies.Converter.class,
            description =
                    "force along the hair at these frequencies, the whole hair beside strip theory, e.g. \"80 Hz\"")
    private Frequencies forceAt;

    @Option(
            names = "--why",
            description = "explain edges of bands and failed limits: which torque dominates, what moves it")
    private boolean why;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        List<String> texts = new ArrayList<>();
        List<Runnable> objects = new ArrayList<>();
        List<String> tables = new ArrayList<>();
        JsonPage json = new JsonPage();
        int code = studies.each(spec.commandLine(), output.json(), Asked::by, asked -> {
            Study study = asked.study();
            BandsQuestion question = study.question();
            BandsAnswer answer =
                    question.answer(frequencies == null ? ThirdOctaves.in(study.band()) : frequencies.values());
            List<Levers> levers = why ? Levers.of(answer) : List.of();
            List<Compared> measured = BesideModel.of(study.device(), study.measurements());
            Sensitivities slopes = why || output.json() || charts.asked() ? asked.slopes(answer) : Sensitivities.NONE;
            List<ForceAlong> forces = forceAt == null
                    ? List.of()
                    : forceAt.values().stream()
                            .map(frequency -> ForceAlong.of(study.device(), frequency))
                            .toList();
            texts.add(
                    BandsText.of(study, answer, new Why(levers, why ? slopes : Sensitivities.NONE), measured, forces));
            List<Chart> drawn = new ArrayList<>();
            if (charts.asked()) {
                drawn.addAll(BandsCharts.of(study, answer, MeasuredOverlays.of(measured)));
                drawn.addAll(SensitivityChart.of(study.title(), slopes));
                drawn.addAll(ForceChart.of(study.title(), forces));
            }
            charts.add(drawn);
            objects.add(() -> BandsJson.write(json, study, answer, new Why(levers, slopes), measured, forces, drawn));
            if (output.csv()) {
                tables.add(table(study, question, answer));
                if (!measured.isEmpty()) {
                    tables.add(TableCsv.measured(measured));
                }
                if (!forces.isEmpty()) {
                    tables.add(ForceReport.csv(forces));
                }
            }
            Decision decision = answer.verdict().decision();
            return decision == Decision.FAILS || decision == Decision.UNDECIDED ? Failures.LIMIT : 0;
        });
        charts.write();
        studies.send(spec.commandLine(), output, json, texts, objects, tables);
        return code;
    }

    private String table(Study study, BandsQuestion question, BandsAnswer answer) {
        return TableCsv.points(
                frequencies == null ? question.answer(study.band().even(FINE)) : answer);
    }

    /** A study and its reader, which knows its numbers. */
    private record Asked(StudyReader reader, Study study) {
        static Asked by(StudyReader reader) {
            return new Asked(reader, reader.study());
        }

        Sensitivities slopes(BandsAnswer answer) {
            return reader.sensitivities(study, answer);
        }
    }
}
