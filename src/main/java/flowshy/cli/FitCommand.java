package flowshy.cli;

import flowshy.report.FitReport;
import flowshy.report.JsonPage;
import flowshy.report.chart.Chart;
import flowshy.report.chart.device.FitCharts;
import flowshy.report.html.section.ReportPage;
import flowshy.report.html.section.StudyReport;
import flowshy.study.FittedStudy;
import flowshy.study.FreeKeys;
import flowshy.study.MeasuredFiles;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Decision;
import flowshy.verdict.Verdict;
import flowshy.verdict.fit.FitAnswer;
import flowshy.verdict.fit.FitException;
import flowshy.verdict.fit.FitQuestion;
import flowshy.verdict.fit.Robustness;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredResponse;
import java.nio.file.Path;
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
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The device that explains what was measured on it. */
@Command(
        name = "fit",
        mixinStandardHelpOptions = true,
        description = {
            "Finds stiffness, damping, gain or any number of a study from frequency responses and free swings that were measured on the"
                    + " device, says how sure they are, and whether model and measurement then agree.",
            "A file has columns frequency, motion (or flow, or rejection) and, if measured, phase, uncertainty (one standard deviation)"
                    + " and phase-uncertainty, units in its header; or time and signal of a free swing. Without files the measurements"
                    + " of the study are taken."
        },
        footer = {
            "",
            "Example: flowshy fit study.yaml shaker.csv tunnel.csv --free suspension.stiffness,suspension.damping --write fitted.yaml"
        })
final class FitCommand implements Callable<Integer> {
    @Parameters(index = "0", arity = "1", paramLabel = "STUDY", description = "study file, YAML")
    private Path file;

    @Parameters(index = "1..*", arity = "0..*", paramLabel = "MEASURED.csv", description = "measured files")
    private List<Path> measured = new ArrayList<>();

    @Option(
            names = "--set",
            paramLabel = "KEY=VALUE",
            description = "overlay a key of the study, e.g. --set 'hair.diameter=90 um'; may be repeated")
    private List<String> settings = new ArrayList<>();

    @Option(
            names = "--free",
            paramLabel = "KEY,…",
            split = ",",
            defaultValue = FreeKeys.STIFFNESS + "," + FreeKeys.DAMPING,
            description =
                    "numbers that may change (default: ${DEFAULT-VALUE}); a gain that is not known is always free")
    private List<String> free = new ArrayList<>();

    @Option(
            names = "--of",
            paramLabel = "WORD",
            description = "what was measured, motion, flow or rejection, in files whose column is called amplitude")
    private String of;

    @Option(
            names = "--gain",
            paramLabel = "GAIN",
            description = "gain of the readout of files in volts, e.g. '2.6 V/rad'")
    private String gain;

    @Option(
            names = "--robust",
            paramLabel = "WORD",
            defaultValue = "huber",
            description = "how residuals far out count: huber, tukey or none (default: ${DEFAULT-VALUE})")
    private String robust;

    @Option(names = "--write", paramLabel = "FILE.yaml", description = "write the fitted study to a new file")
    private Path target;

    @Mixin
    private ReportFiles pages;

    @Mixin
    private ChartOptions charts;

    @Mixin
    private OutputOptions output;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        if (pages.asked()) {
            pages.check(spec.commandLine(), List.of(file));
        }
        StudyReader reader = StudyReader.open(file, settings);
        Study study = reader.study();
        FreeKeys keys = FreeKeys.of(reader, free);
        MeasuredFiles files = MeasuredFiles.read(measured, measurand(), gain());
        FitAnswer answer = answer(study, keys, files);
        BandsAnswer bands = study.question().about(answer.device()).answer();
        Verdict verdict = bands.verdict();
        Optional<FittedStudy> fitted =
                target == null ? Optional.empty() : Optional.of(FittedStudy.of(reader, answer, target));
        fitted.ifPresent(written -> OutputOptions.write(target, written.text()));
        Optional<String> written = fitted.map(any -> target.toString());
        List<Chart> drawn = charts.asked() ? FitCharts.of(study, bands, answer) : List.of();
        charts.add(drawn);
        charts.write();
        if (pages.asked()) {
            pages.write(study.origin().file(), ReportPage.of(StudyReport.fitted(study, answer, bands)));
        }
        JsonPage json = new JsonPage();
        FitReport.write(json, study, files.read(), answer, verdict, written, drawn);
        output.send(
                spec.commandLine(),
                FitReport.text(study, files.read(), answer, verdict, written),
                output.json() ? Optional.of(json.finish()) : Optional.empty(),
                output.csv() ? Optional.of(FitReport.csv(answer)) : Optional.empty());
        return verdict.decision() == Decision.FAILS || verdict.decision() == Decision.UNDECIDED ? Failures.LIMIT : 0;
    }

    private FitAnswer answer(Study study, FreeKeys keys, MeasuredFiles files) {
        List<MeasuredResponse> responses = measured.isEmpty() ? study.measurements() : files.responses();
        if (responses.isEmpty() && files.swings().isEmpty()) {
            throw new ParameterException(
                    spec.commandLine(), "nothing measured: name files, or state measurements in the study");
        }
        try {
            return new FitQuestion(
                            keys.space().still(),
                            study.device(),
                            study.band(),
                            keys.free(),
                            responses,
                            files.swings(),
                            robustness())
                    .answer();
        } catch (FitException e) {
            throw new UserException(e.getMessage());
        }
    }

    private Optional<Measurand> measurand() {
        if (of == null) {
            return Optional.empty();
        }
        return Optional.of(Measurand.of(of)
                .orElseThrow(() -> new ParameterException(
                        spec.commandLine(), "--of '" + of + "': motion, flow or rejection is wanted here")));
    }

    private OptionalDouble gain() {
        if (gain == null) {
            return OptionalDouble.empty();
        }
        double value = Quantity.read(gain, Dimension.READOUT_GAIN).value();
        if (value == 0.0) {
            throw new ParameterException(spec.commandLine(), "--gain '" + gain + "': a gain is not zero");
        }
        return OptionalDouble.of(value);
    }

    private Robustness robustness() {
        return Robustness.of(robust)
                .orElseThrow(() -> new ParameterException(
                        spec.commandLine(), "--robust '" + robust + "': huber, tukey or none is wanted here"));
    }
}
