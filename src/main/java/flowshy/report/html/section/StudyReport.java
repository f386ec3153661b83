package flowshy.report.html.section;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.report.chart.Chart;
import flowshy.report.chart.device.BandsCharts;
import flowshy.report.chart.device.FitCharts;
import flowshy.report.chart.device.MeasuredOverlays;
import flowshy.report.chart.device.SensitivityChart;
import flowshy.report.chart.several.CompareCharts;
import flowshy.report.chart.several.CoverCharts;
import flowshy.report.chart.several.ToleranceCharts;
import flowshy.report.html.Typography;
import flowshy.stream.Source;
import flowshy.stream.cover.Covers;
import flowshy.study.Family;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.study.Variant;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Decision;
import flowshy.verdict.Levers;
import flowshy.verdict.Limit;
import flowshy.verdict.compare.CompareQuestion;
import flowshy.verdict.compare.ComparedDevice;
import flowshy.verdict.compare.Contender;
import flowshy.verdict.design.Sensitivities;
import flowshy.verdict.fit.FitAnswer;
import flowshy.verdict.lid.Candidate;
import flowshy.verdict.lid.LidAnswer;
import flowshy.verdict.lid.LidQuestion;
import flowshy.verdict.measured.BesideModel;
import flowshy.verdict.measured.Compared;
import flowshy.verdict.tolerance.Effort;
import flowshy.verdict.tolerance.Precision;
import flowshy.verdict.tolerance.ToleranceAnswer;
import flowshy.verdict.tolerance.ToleranceQuestion;
import flowshy.verdict.tolerance.sampling.Progress;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * What the report tells: a study and everything found about it.
 *
 * @param study what was asked
 * @param answer bands, points, error and verdict of its device
 * @param lid covers side by side, where the study names candidates or a cover
 * @param spread how sure the verdict is, where the study states tolerances
 * @param why what would move edges of bands and failed limits, empty where there is none
 * @param slopes what each dimension and property does to the rejection; none where that was not asked
 * @param measured what was measured, beside the model of the device told of; empty if nothing was
 * @param fit how that device was fitted, empty if it is the study's own
 * @param variants the study and its variants side by side, empty where it names none
 * @param charts a picture of every result, in the order of the report
 */
public record StudyReport(
        Study study,
        BandsAnswer answer,
        Optional<LidAnswer> lid,
        Optional<ToleranceAnswer> spread,
        List<Levers> why,
        Sensitivities slopes,
        List<Compared> measured,
        Optional<FitAnswer> fit,
        List<ComparedDevice> variants,
        List<Chart> charts) {
    /** Devices of a tolerance run in a report; the command tolerance tries more. */
    private static final int DEVICES = 4096;

    /** A weakness here weakens the rejection, and so the bands. */
    private static final Set<Subject> ALWAYS =
            EnumSet.of(Subject.MEDIUM, Subject.HAIR, Subject.REJECTION, Subject.COVER);

    /** Copies the lists. */
    public StudyReport {
        why = List.copyOf(why);
        measured = List.copyOf(measured);
        variants = List.copyOf(variants);
        charts = List.copyOf(charts);
    }

    /**
     * Answers every question of a study.
     *
     * @param reader of the study and its variants
     * @return what the report tells
     * @throws flowshy.study.text.StudyException with every problem of the study
     */
    public static StudyReport of(StudyReader reader) {
        Family family = reader.family(Optional.empty());
        Study study = family.study();
        BandsAnswer answer = study.question().answer();
        Sensitivities slopes = reader.sensitivities(study, answer);
        List<Compared> measured = BesideModel.of(study.device(), study.measurements());
        Optional<LidAnswer> lid = lid(study);
        Optional<ToleranceAnswer> spread = spread(study);
        List<ComparedDevice> variants = variants(family);
        List<Chart> charts = new ArrayList<>(BandsCharts.of(study, answer, MeasuredOverlays.of(measured)));
        charts.addAll(SensitivityChart.of(study.title(), slopes));
        lid.ifPresent(covers -> charts.addAll(CoverCharts.of(study, covers)));
        spread.ifPresent(found -> charts.addAll(ToleranceCharts.of(study, found)));
        charts.addAll(CompareCharts.of(study.title(), variants));
        return new StudyReport(
                study, answer, lid, spread, Levers.of(answer), slopes, measured, Optional.empty(), variants, charts);
    }

    private static List<ComparedDevice> variants(Family family) {
        List<Contender> contenders =
                family.all().stream().map(Variant::contender).toList();
        return contenders.size() == 1 ? List.of() : new CompareQuestion(contenders, Optional.empty()).answer();
    }

    private static Optional<ToleranceAnswer> spread(Study study) {
        return study.tolerances().stated().isEmpty()
                ? Optional.empty()
                : Optional.of(new ToleranceQuestion(study.tolerances(), List.of())
                        .answer(new Effort(DEVICES, Precision.ANY, 1), Progress.NONE));
    }

    /**
     * Tells of the device that was fitted to measurements, in place of the study's own.
     *
     * @param study what is asked
     * @param fit the fitted device
     * @param answer its bands
     * @return what the report tells
     */
    public static StudyReport fitted(Study study, FitAnswer fit, BandsAnswer answer) {
        return new StudyReport(
                study,
                answer,
                Optional.empty(),
                Optional.empty(),
                Levers.of(answer),
                Sensitivities.NONE,
                fit.after(),
                Optional.of(fit),
                List.of(),
                FitCharts.of(study, answer, fit));
    }

    private static Optional<LidAnswer> lid(Study study) {
        List<Candidate> candidates = new ArrayList<>(study.candidates());
        if (candidates.isEmpty() && !study.device().cover().equals(Covers.OPEN)) {
            candidates.add(new Candidate(study.device().cover(), study.device().around()));
        }
        return candidates.isEmpty()
                ? Optional.empty()
                : Optional.of(new LidQuestion(study.question(), study.reference(), candidates).answer());
    }

    /**
     * How the device of the study comes out.
     *
     * @return the decision under the cover that the study states
     */
    public Decision decision() {
        return answer.verdict().decision();
    }

    /**
     * What a page is called.
     *
     * @return the study's title, or its file where it has none
     */
    public String title() {
        return study.title().isEmpty() ? study.origin().file() : study.title();
    }

    /**
     * Sentences of ours may repeat these words of the user: names of sources and of files.
     *
     * @return typography that leaves them as they are
     */
    public Typography typography() {
        List<String> words = new ArrayList<>();
        study.surroundings().stream().map(Source::name).forEach(words::add);
        measured.stream().map(one -> one.measured().name()).forEach(words::add);
        study.origin().filesRead().stream().map(Study.FileRead::file).forEach(words::add);
        return new Typography(words);
    }

    /**
     * Whether the decision rests on what a caveat weakens.
     *
     * @param caveat one of the answer
     * @return true for a model that has ended, and for a weakness of the rejection or, where an error limit was judged, of the error
     */
    public boolean touches(Caveat caveat) {
        return caveat.weight() == Weight.OUT_OF_RANGE
                || (caveat.weight() == Weight.WEAK && (ALWAYS.contains(caveat.about()) || errorJudged()));
    }

    private boolean errorJudged() {
        return answer.verdict().limits().stream().anyMatch(limit -> limit.name().equals("error") && judged(limit));
    }

    private static boolean judged(Limit limit) {
        return limit.decision() != Decision.NOT_ASKED;
    }
}
