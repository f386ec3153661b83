package flowshy.cli;

import flowshy.report.FileReport;
import flowshy.report.JsonPage;
import flowshy.report.html.section.ReportPage;
import flowshy.report.html.section.StudyReport;
import flowshy.study.Study;
import flowshy.verdict.Decision;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The report that one signs. */
@Command(
        name = "report",
        mixinStandardHelpOptions = true,
        description = "Write the whole study as one self-contained page to read, print and sign.",
        footer = {"", "Example: flowshy report study.yaml --out report.html --pdf report.pdf"})
final class ReportCommand implements Callable<Integer> {
    @Mixin
    private StudyOptions studies;

    @Mixin
    private ReportFiles files;

    @Mixin
    private OutputOptions output;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        files.check(spec.commandLine(), studies.files());
        JsonPage json = new JsonPage();
        List<String> texts = new ArrayList<>();
        List<Runnable> objects = new ArrayList<>();
        List<String> tables = new ArrayList<>();
        int code = studies.eachOpened(spec.commandLine(), output.json(), reader -> {
            StudyReport report = StudyReport.of(reader);
            Study study = report.study();
            List<FileReport.Written> written = files.write(study.origin().file(), ReportPage.of(report));
            texts.add(FileReport.text(study, report.answer().verdict(), written));
            objects.add(() -> FileReport.write(json, study, report.answer().verdict(), written));
            tables.add(FileReport.csv(written));
            Decision decision = report.decision();
            return decision == Decision.FAILS || decision == Decision.UNDECIDED ? Failures.LIMIT : 0;
        });
        studies.send(spec.commandLine(), output, json, texts, objects, tables);
        return code;
    }
}
