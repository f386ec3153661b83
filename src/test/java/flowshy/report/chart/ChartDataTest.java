package flowshy.report.chart;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.cli.Json;
import flowshy.report.BandsJson;
import flowshy.report.JsonPage;
import flowshy.report.LidReport;
import flowshy.report.Why;
import flowshy.report.chart.device.BandsCharts;
import flowshy.report.chart.device.SensitivityChart;
import flowshy.report.chart.paper.Datasets;
import flowshy.report.chart.several.CoverCharts;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.design.Sensitivities;
import flowshy.verdict.lid.LidAnswer;
import flowshy.verdict.lid.LidQuestion;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What the charting library draws is what the JSON says, point for point. */
class ChartDataTest {
    /** Numbers of the JSON have twelve digits. */
    private static final double DIGITS = 1e-11;

    @ParameterizedTest
    @ValueSource(strings = {"workbench-air", "water-tank", "fan-tray", "weather-mast", "helium-can", "machine-hall"})
    void seriesOfBandsAreThoseOfTheJson(String example) {
        Study study = StudyReader.read(Path.of("examples/" + example + "/study.yaml"), List.of());
        BandsAnswer answer = study.question().answer();
        List<Chart> charts = BandsCharts.of(study, answer);
        JsonPage page = new JsonPage();
        BandsJson.write(page, study, answer, new Why(List.of(), Sensitivities.NONE), List.of(), List.of(), charts);
        Map<String, Object> json = Json.object(Json.parse(page.finish()));
        List<Map<String, Object>> points = Json.objects(json.get("points"));
        assertThat(points).isNotEmpty();
        int drawn = 0;
        for (Chart chart : charts) {
            drawn += compared(chart, json, points);
        }
        // a sealed device has no curve of rejection or of flow
        assertThat(drawn).isGreaterThanOrEqualTo(example.equals("helium-can") ? 8 : 14);
    }

    /** Bars and the table behind them, the strongest first, against the field of the answer. */
    @ParameterizedTest
    @ValueSource(strings = {"workbench-air", "water-tank", "weather-mast", "vacuum-package"})
    void barsOfSensitivitiesAreThoseOfTheJson(String example) {
        StudyReader reader = StudyReader.open(Path.of("examples/" + example + "/study.yaml"), List.of());
        Study study = reader.study();
        BandsAnswer answer = study.question().answer();
        Sensitivities slopes = reader.sensitivities(study, answer);
        List<Chart> charts = SensitivityChart.of(study.title(), slopes);
        assertThat(charts).hasSize(1);
        JsonPage page = new JsonPage();
        BandsJson.write(page, study, answer, new Why(List.of(), slopes), List.of(), List.of(), charts);
        Map<String, Object> json = Json.object(Json.parse(page.finish()));
        List<Datasets.Drawn> bars = Datasets.bars(((DrawnChart) charts.get(0)).picture());
        List<Map<String, Object>> rows = rows(json, "sensitivities");
        List<Map<String, Object>> all = Json.objects(json.get("sensitivities"));
        assertThat(bars).hasSameSizeAs(rows).hasSizeGreaterThanOrEqualTo(2 * 5);
        for (int i = 0; i < bars.size(); i++) {
            Map<String, Object> number = all.get(i / 2);
            Map<String, Object> slope = Json.objects(number.get("slopes")).get(i % 2);
            boolean degrees = slope.containsKey("rejection_db_per_k");
            double change = (double) slope.get(degrees ? "rejection_db_per_k" : "rejection_db_per_percent");
            assertThat(bars.get(i).label()).isEqualTo(number.get("number") + (degrees ? ", per K" : ""));
            assertThat(bars.get(i).scale()).isEqualTo(i % 2);
            assertThat(near(bars.get(i).value(), change)).isTrue();
            assertThat(rows.get(i).get("label")).isEqualTo(bars.get(i).label());
            assertThat(rows.get(i).get("frequency_hz")).isEqualTo(slope.get("frequency_hz"));
            assertThat(rows.get(i).get("change_db")).isEqualTo(change);
            assertThat(rows.get(i).get("error_db")).isEqualTo(slope.get("error_db"));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"fan-tray", "weather-mast"})
    void seriesOfLidAreThoseOfTheJson(String example) {
        Study study = StudyReader.read(Path.of("examples/" + example + "/study.yaml"), List.of());
        LidQuestion question = new LidQuestion(study.question(), study.reference(), study.candidates());
        LidAnswer answer = question.answer();
        List<Chart> charts = CoverCharts.of(study, answer);
        JsonPage page = new JsonPage();
        LidReport.write(page, study, question, answer, charts);
        Map<String, Object> json = Json.object(Json.parse(page.finish()));
        int drawn = 0;
        for (Chart chart : charts) {
            drawn += compared(
                    chart, json, Json.objects(Json.object(json.get("required")).get("rejection")));
        }
        assertThat(drawn).isEqualTo(4);
        List<Map<String, Object>> covers = Json.objects(json.get("covers"));
        List<Map<String, Object>> rows = rows(json, "covers");
        assertThat(rows).hasSameSizeAs(covers).isNotEmpty();
        for (int i = 0; i < rows.size(); i++) {
            assertThat(rows.get(i).get("least_rejection_db"))
                    .isEqualTo(covers.get(i).get("least_rejection_db"));
            assertThat(rows.get(i).get("error_rms_m_s2"))
                    .isEqualTo(covers.get(i).get("error_rms_m_s2"));
        }
    }

    /** Counts the series of a chart, each of which must be two columns of its table or of the points of the answer. */
    private static int compared(Chart chart, Map<String, Object> json, List<Map<String, Object>> points) {
        int drawn = 0;
        for (Datasets.Series series : Datasets.of(((DrawnChart) chart).picture())) {
            if (series.name().isEmpty() && chart.name().equals("regime")) {
                continue; // edges between the laws, and the first point of a path once more
            }
            List<Map<String, Object>> rows = series.name().isEmpty() ? points : rows(json, chart.name());
            if (series.x().isEmpty()) {
                assertThat(json.toString()).contains("cover=sealed");
                continue;
            }
            assertThat(found(series, rows))
                    .as(
                            "%s of %s: %d points",
                            series.name(), chart.name(), series.x().size())
                    .isTrue();
            drawn++;
        }
        return drawn;
    }

    private static List<Map<String, Object>> rows(Map<String, Object> json, String name) {
        return Json.objects(json.get("charts")).stream()
                .filter(chart -> chart.get("name").equals(name))
                .map(chart -> Json.objects(chart.get("rows")))
                .findFirst()
                .orElseThrow();
    }

    private static boolean found(Datasets.Series series, List<Map<String, Object>> rows) {
        Map<String, List<Double>> columns = new LinkedHashMap<>();
        boolean labelled = rows.get(0).containsKey("label");
        for (Map<String, Object> row : rows) {
            if (!labelled || row.get("label").equals(series.name())) {
                row.forEach((key, value) -> {
                    if (value == null || value instanceof Double) {
                        columns.computeIfAbsent(key, k -> new ArrayList<>())
                                .add(value == null ? Double.NaN : (Double) value);
                    }
                });
            }
        }
        for (List<Double> x : columns.values()) {
            for (List<Double> y : columns.values()) {
                if (x != y
                        && (same(series, x, y, 1.0) || same(series, x, y, 1e6))) { // heights are drawn in micrometres
                    return true;
                }
            }
        }
        return false;
    }

    /** Every point that has a number on its axis, which a zero has not on a logarithmic one. */
    private static boolean same(Datasets.Series series, List<Double> x, List<Double> y, double scale) {
        int next = 0;
        for (int i = 0; i < x.size(); i++) {
            if (!Double.isFinite(y.get(i))) {
                continue;
            }
            if (next < series.x().size()
                    && near(series.x().get(next), x.get(i))
                    && near(series.y().get(next), scale * y.get(i))) {
                next++;
            } else if (y.get(i) != 0.0) {
                return false;
            }
        }
        return next == series.x().size();
    }

    private static boolean near(double drawn, double written) {
        return Math.abs(drawn - written) <= DIGITS * Math.abs(written);
    }
}
