package flowshy.report;

import static flowshy.math.Figures.say;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.study.Study;
import flowshy.verdict.Verdict;
import flowshy.verdict.fit.Derived;
import flowshy.verdict.fit.Estimate;
import flowshy.verdict.fit.FitAnswer;
import flowshy.verdict.fit.Residual;
import flowshy.verdict.measured.Agreement;
import flowshy.verdict.measured.Compared;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** The answer of {@code fit}: text, JSON and CSV from one set of figures. */
public final class FitReport {
    /** Correlations below this are not printed, the JSON has all. */
    private static final double SMALL_CORRELATION = 0.3;

    private static final String NOT_STATED = "not every uncertainty is stated";

    private FitReport() {}

    /**
     * What is told of each fitted number.
     *
     * @return columns in the order printed
     */
    public static List<Column<Estimate>> estimates() {
        return List.of(
                new Column<>("start", "was", "", 5, e -> Cell.of(e.freed().start(), "")),
                new Column<>("value", "fitted", "", 5, e -> Cell.of(e.value(), "")),
                new Column<>("standard_uncertainty", "u", "", 2, e -> Cell.of(e.uncertainty(), "")),
                new Column<>("from", "from", "95 %", 5, e -> Cell.of(e.low(), "")),
                new Column<>("to", "to", "95 %", 5, e -> Cell.of(e.high(), "")));
    }

    private static List<Column<Residual>> residuals() {
        return List.of(
                new Column<>("frequency_hz", "freq.", "Hz", 5, r -> Cell.of(r.frequency(), "")),
                new Column<>("residual", "off by", "u", 3, r -> Cell.of(r.share(), "")),
                new Column<>("weight", "weight", "", 2, r -> Cell.of(r.weight(), "")));
    }

    /**
     * The printed answer.
     *
     * @param study what was asked
     * @param measured files that were named apart from the study
     * @param answer what was found
     * @param verdict of the fitted device
     * @param written the file that the fitted study was written to, if it was
     * @return text with a line end after every line
     */
    public static String text(
            Study study, List<Study.FileRead> measured, FitAnswer answer, Verdict verdict, Optional<String> written) {
        TextPage page = new TextPage();
        page.line("Flowshy " + Version.number() + "   fit   " + study.origin().file());
        if (!study.title().isEmpty()) {
            page.line(study.title());
        }
        study.origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.heading("Model and measurement " + headline(answer));
        answer.after()
                .forEach(one -> page.row(one.measured().name(), one.agreement().sentence()));
        if (!answer.outliers().isEmpty()) {
            boolean agree = answer.withoutOutliers().stream()
                    .allMatch(one -> one.agreement().outcome() == Agreement.Outcome.AGREE);
            page.row(
                    "without outliers",
                    agree
                            ? "Model and measurement agree everywhere once the "
                                    + answer.outliers().size() + " outlying numbers listed below are left out."
                            : "They do not agree everywhere even without the outliers listed below.");
        }
        page.row("fitted device", verdict.decision().word() + ": " + verdict.sentence());
        page.heading("Fitted numbers, " + answer.freedom() + " degrees of freedom");
        page.namedTable(
                "",
                answer.estimates().stream()
                        .map(e -> e.freed().key() + " [" + e.freed().unit() + "]")
                        .toList(),
                estimates(),
                answer.estimates());
        for (Derived derived : answer.derived()) {
            page.row(derived.name(), derived(derived));
        }
        goodness(page, answer);
        correlations(page, answer);
        answer.warnings().forEach(warning -> page.note("[weak]", warning));
        MeasuredReport.print(page, "Measured beside the fitted device", answer.after(), fitted(answer));
        page.row("before the fit", before(answer));
        measured.forEach(file -> page.row("read", file.file() + ", SHA-256 " + file.sha256()));
        written.ifPresent(file -> page.row("written", file + ": the fitted study, read again and found the same"));
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    /** Names of the responses whose gain was fitted. */
    private static List<String> fitted(FitAnswer answer) {
        return answer.before().stream()
                .filter(Compared::freed)
                .map(one -> one.measured().name())
                .toList();
    }

    private static String headline(FitAnswer answer) {
        if (answer.after().stream().anyMatch(one -> one.agreement().outcome() == Agreement.Outcome.DIFFER)) {
            return "differ";
        }
        return answer.after().stream().allMatch(one -> one.agreement().outcome() == Agreement.Outcome.AGREE)
                ? "agree"
                : "cannot be judged";
    }

    private static String derived(Derived derived) {
        String unit = derived.unit().isEmpty() ? "" : " " + derived.unit();
        return Figures.of(derived.value(), 5) + unit + " (u " + Figures.of(derived.uncertainty(), 2) + unit
                + (Double.isFinite(derived.before()) ? "; was " + Figures.of(derived.before(), 5) + unit : "") + ")";
    }

    private static void goodness(TextPage page, FitAnswer answer) {
        page.row("estimator", answer.robustness().words());
        if (answer.chiSquare().isPresent()) {
            page.row(
                    "goodness of fit",
                    say(
                            "chi-square %.4g for %s degrees of freedom, p = %.2g",
                            answer.chiSquare().getAsDouble(),
                            answer.freedom(),
                            answer.chance().orElse(Double.NaN)));
        } else {
            page.row("goodness of fit", "not judged: " + NOT_STATED);
        }
        answer.scatters()
                .forEach(scatter -> page.row(
                        scatter.name(),
                        say(
                                "states no uncertainty; its scatter about the fit is %.3g %% (%.3g dB)",
                                100.0 * scatter.share(), 20.0 * scatter.share() / FastMath.log(10.0))));
        if (!answer.outliers().isEmpty()) {
            page.row(
                    "outliers",
                    answer.outliers().size() + ", which a true model would hardly leave"
                            + (answer.core().chiSquare().isPresent()
                                    ? say(
                                            "; without them chi-square %.4g for %s, p = %.2g",
                                            answer.core().chiSquare().getAsDouble(),
                                            answer.core().freedom(),
                                            answer.core().chance().orElse(Double.NaN))
                                    : ""));
            for (Residual outlier : answer.outliers()) {
                page.row(
                        "",
                        say(
                                "%s, %s at %.5g Hz: off by %.3g u, weight %.2g",
                                outlier.name(),
                                outlier.part().word(),
                                outlier.frequency(),
                                outlier.share(),
                                outlier.weight()));
            }
        }
    }

    private static void correlations(TextPage page, FitAnswer answer) {
        List<String> pairs = new ArrayList<>();
        for (int i = 0; i < answer.estimates().size(); i++) {
            for (int j = i + 1; j < answer.estimates().size(); j++) {
                double correlation = answer.correlations().get(i).get(j);
                if (FastMath.abs(correlation) >= SMALL_CORRELATION) {
                    pairs.add(say(
                            "%s with %s %.2g",
                            answer.estimates().get(i).freed().key(),
                            answer.estimates().get(j).freed().key(),
                            correlation));
                }
            }
        }
        page.row(
                "correlations",
                pairs.isEmpty() ? "none above " + Figures.of(SMALL_CORRELATION, 1) : String.join("; ", pairs));
    }

    private static String before(FitAnswer answer) {
        List<String> all = new ArrayList<>();
        for (int i = 0; i < answer.before().size(); i++) {
            all.add(say(
                    "%s off by %.3g dB rms, now %.3g",
                    answer.before().get(i).measured().name(),
                    answer.before().get(i).rms(),
                    answer.after().get(i).rms()));
        }
        return all.isEmpty() ? "no response was measured" : String.join("; ", all);
    }

    /**
     * Writes one answer.
     *
     * @param json where to write
     * @param study what was asked
     * @param measured files that were named apart from the study
     * @param answer what was found
     * @param verdict of the fitted device
     * @param written the file that the fitted study was written to, if it was
     * @param charts whose numbers go along, left out if empty
     */
    public static void write(
            JsonPage json,
            Study study,
            List<Study.FileRead> measured,
            FitAnswer answer,
            Verdict verdict,
            Optional<String> written,
            List<Chart> charts) {
        json.object(() -> {
            StudyJson.write(json, study);
            json.array("measured_files", measured, file -> {
                json.text("file", file.file());
                json.text("sha256", file.sha256());
            });
            json.text("model_and_measurement", headline(answer));
            json.array("estimates", answer.estimates(), estimate -> {
                json.text("key", estimate.freed().key());
                json.text("unit", estimate.freed().unit());
                estimates()
                        .forEach(
                                column -> json.cell(column.name(), column.cell().apply(estimate)));
                json.bool("at_bound", estimate.bound());
            });
            json.number("confidence", 0.95);
            json.array("correlations", pairs(answer), pair -> {
                json.text("key", pair.first());
                json.text("with", pair.second());
                json.number("correlation", pair.correlation());
            });
            json.array("derived", answer.derived(), derived -> {
                json.text("figure", derived.key());
                json.cell("before", Cell.of(derived.before(), "the study as it stood has none"));
                json.number("value", derived.value());
                json.number("standard_uncertainty", derived.uncertainty());
            });
            json.text("estimator", answer.robustness().word());
            json.whole("degrees_of_freedom", answer.freedom());
            json.cell("chi_square", Cell.of(answer.chiSquare(), NOT_STATED));
            json.cell("p", Cell.of(answer.chance(), NOT_STATED));
            json.cell("chi_square_without_outliers", Cell.of(answer.core().chiSquare(), NOT_STATED));
            json.cell("p_without_outliers", Cell.of(answer.core().chance(), NOT_STATED));
            json.number("uncertainties_enlarged_by", answer.enlarged());
            json.array("scatter", answer.scatters(), scatter -> {
                json.text("name", scatter.name());
                json.number("standard_uncertainty_percent", 100.0 * scatter.share());
            });
            json.array("outliers", answer.outliers(), residual -> residual(json, residual));
            json.array("residuals", answer.residuals(), residual -> residual(json, residual));
            MeasuredReport.write(json, "before", answer.before());
            MeasuredReport.write(json, "after", answer.after());
            if (!answer.outliers().isEmpty()) {
                json.array("without_outliers", answer.withoutOutliers(), one -> {
                    json.text("name", one.measured().name());
                    json.text("agreement", one.agreement().outcome().word());
                    json.text("sentence", one.agreement().sentence());
                });
            }
            json.texts("warnings", answer.warnings());
            json.object("verdict", () -> {
                json.text("decision", verdict.decision().word());
                json.text("sentence", verdict.sentence());
            });
            written.ifPresent(file -> json.text("written", file));
            if (!charts.isEmpty()) {
                ChartTables.write(json, charts);
            }
        });
    }

    private static void residual(JsonPage json, Residual residual) {
        json.text("name", residual.name());
        json.text("part", residual.part().word());
        residuals().forEach(column -> json.cell(column.name(), column.cell().apply(residual)));
    }

    private record Pair(String first, String second, double correlation) {}

    private static List<Pair> pairs(FitAnswer answer) {
        List<Pair> pairs = new ArrayList<>();
        for (int i = 0; i < answer.estimates().size(); i++) {
            for (int j = i + 1; j < answer.estimates().size(); j++) {
                pairs.add(new Pair(
                        answer.estimates().get(i).freed().key(),
                        answer.estimates().get(j).freed().key(),
                        answer.correlations().get(i).get(j)));
            }
        }
        return pairs;
    }

    /**
     * Tables of the fitted numbers, of the residuals, and of the points beside the fitted device.
     *
     * @param answer what was found
     * @return text, the tables parted by an empty line
     */
    public static String csv(FitAnswer answer) {
        List<String> head = new ArrayList<>(List.of("key", "unit"));
        estimates().forEach(column -> head.add(column.name()));
        List<List<String>> rows = answer.estimates().stream()
                .map(e -> row(List.of(e.freed().key(), e.freed().unit()), estimates(), e))
                .toList();
        List<String> second = new ArrayList<>(List.of("measurement", "part"));
        residuals().forEach(column -> second.add(column.name()));
        List<List<String>> left = answer.residuals().stream()
                .map(r -> row(List.of(r.name(), r.part().word()), residuals(), r))
                .toList();
        String points = MeasuredReport.csv(answer.after());
        return TableCsv.ofTexts(head, rows) + "\n" + TableCsv.ofTexts(second, left)
                + (points.isEmpty() ? "" : "\n" + points);
    }

    private static <T> List<String> row(List<String> names, List<Column<T>> columns, T of) {
        List<String> row = new ArrayList<>(names);
        for (Column<T> column : columns) {
            Cell cell = column.cell().apply(of);
            row.add(cell.value().isPresent() ? Figures.full(cell.value().getAsDouble()) : "");
        }
        return row;
    }
}
