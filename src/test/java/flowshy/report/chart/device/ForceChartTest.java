package flowshy.report.chart.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cli.Json;
import flowshy.cli.Run;
import flowshy.report.chart.Chart;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Datasets;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.verdict.force.ForceAlong;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What is drawn of the force along a hair is what the JSON says, slice for slice: a step has a point at each end of its slice. */
class ForceChartTest {
    private static final List<String> COLUMNS = List.of(
            "stream_force_per_length_n_per_m_per_m_s",
            "strip_stream_force_per_length_n_per_m_per_m_s",
            "rocking_force_per_length_n_per_m_per_rad_s",
            "strip_rocking_force_per_length_n_per_m_per_rad_s");

    @ParameterizedTest
    @ValueSource(strings = {"workbench-air", "weather-mast", "nitrogen-stream"})
    void drawsWhatTheJsonSays(String example) {
        Study study = StudyReader.read(Path.of("examples/" + example + "/study.yaml"), List.of());
        List<Chart> charts = ForceChart.of(
                study.title(), List.of(ForceAlong.of(study.device(), 10.0), ForceAlong.of(study.device(), 60.0)));
        Map<String, Object> json =
                Json.object(Json.parse(Run.of("bands", study.origin().file(), "--json", "--force-at", "10 Hz, 60 Hz")
                        .out()));
        List<Map<String, Object>> forces = Json.objects(json.get("force"));
        assertThat(charts).hasSameSizeAs(forces).hasSize(2);
        for (int k = 0; k < 2; k++) {
            List<Map<String, Object>> slices = Json.objects(forces.get(k).get("slices")).stream()
                    .filter(slice -> (Double) slice.get("to_m") > (Double) slice.get("from_m"))
                    .toList();
            List<Datasets.Series> series = Datasets.of(((DrawnChart) charts.get(k)).picture());
            assertThat(series).hasSize(4);
            for (int c = 0; c < 4; c++) {
                compare(series.get(c), slices, COLUMNS.get(c), c < 2 ? 1e3 : 1e6);
            }
        }
    }

    private static void compare(Datasets.Series drawn, List<Map<String, Object>> slices, String column, double scale) {
        assertThat(slices).hasSizeGreaterThan(10);
        assertThat(drawn.x()).hasSize(2 * slices.size());
        for (int i = 0; i < slices.size(); i++) {
            double value = scale * (Double) slices.get(i).get(column);
            for (int end = 0; end < 2; end++) {
                double height = 1e6 * (Double) slices.get(i).get(end == 0 ? "from_m" : "to_m");
                assertThat(drawn.x().get(2 * i + end)).isCloseTo(height, within(1e-11 * height));
                assertThat(drawn.y().get(2 * i + end)).isCloseTo(value, within(1e-11 * value));
            }
        }
    }
}
