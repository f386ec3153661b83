package flowshy.report.chart.several;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cli.Json;
import flowshy.cli.Run;
import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Datasets;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.tolerance.Effort;
import flowshy.verdict.tolerance.Precision;
import flowshy.verdict.tolerance.ToleranceAnswer;
import flowshy.verdict.tolerance.ToleranceQuestion;
import flowshy.verdict.tolerance.sampling.Progress;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** What is drawn of a tolerance run is what its JSON says: the fan point for point, every bar with its interval. */
public class ToleranceChartsTest {
    private static final String STUDY = "examples/potting-oil/study.yaml";

    public static Study study() {
        return StudyReader.read(Path.of(STUDY), List.of());
    }

    public static ToleranceAnswer answer() {
        return new ToleranceQuestion(study().tolerances(), List.of(Figure.RESONANCE))
                .answer(new Effort(1024, Precision.ANY, 1), Progress.NONE);
    }

    @Test
    void drawsWhatTheJsonSays() {
        List<Chart> charts = ToleranceCharts.of(study(), answer());
        Map<String, Object> json =
                Json.object(Json.parse(Run.of("tolerance", STUDY, "--samples", "1024", "--of", "resonance", "--json")
                        .out()));
        assertThat(charts)
                .extracting(Chart::name)
                .containsExactly("rejection-spread", "variance-least-rejection", "variance-resonance");
        fan(Datasets.of(((DrawnChart) charts.get(0)).picture()), Json.objects(json.get("fan")));
        List<Map<String, Object>> figures = Json.objects(json.get("figures"));
        for (int k = 1; k < 3; k++) {
            String name = charts.get(k).name().substring("variance-".length());
            Map<String, Object> figure = figures.stream()
                    .filter(one -> one.get("figure").equals(name))
                    .findFirst()
                    .orElseThrow();
            bars(Datasets.bars(((DrawnChart) charts.get(k)).picture()), Json.objects(figure.get("effects")));
            table(charts.get(k).table(), Json.objects(figure.get("effects")));
        }
    }

    private static void fan(List<Datasets.Series> drawn, List<Map<String, Object>> fan) {
        List<String> columns = List.of("p2_5_db", "p97_5_db", "p16_db", "p84_db", "p50_db", "nominal_db");
        assertThat(drawn).hasSize(columns.size());
        assertThat(fan).hasSizeGreaterThan(20);
        for (int c = 0; c < columns.size(); c++) {
            assertThat(drawn.get(c).x()).hasSameSizeAs(fan);
            for (int i = 0; i < fan.size(); i++) {
                near(drawn.get(c).x().get(i), fan.get(i).get("frequency_hz"), 1.0);
                near(drawn.get(c).y().get(i), fan.get(i).get(columns.get(c)), 1.0);
            }
        }
    }

    /** Two bars an input, in all and alone, in per cent. */
    private static void bars(List<Datasets.Drawn> drawn, List<Map<String, Object>> effects) {
        assertThat(drawn).hasSize(2 * effects.size()).hasSizeGreaterThanOrEqualTo(2 * 5);
        for (int i = 0; i < drawn.size(); i++) {
            Map<String, Object> effect = effects.get(i / 2);
            String stem = i % 2 == 0 ? "total" : "first_order";
            assertThat(drawn.get(i).label()).isEqualTo(effect.get("input"));
            near(drawn.get(i).value(), effect.get(stem), 100.0);
            near(drawn.get(i).low(), effect.get(stem + "_low"), 100.0);
            near(drawn.get(i).high(), effect.get(stem + "_high"), 100.0);
        }
    }

    private static void table(ChartTable table, List<Map<String, Object>> effects) {
        assertThat(table.rows()).hasSameSizeAs(effects);
        for (ChartTable.Head head : table.heads()) {
            List<Double> column = table.column(head.name());
            for (int i = 0; i < effects.size(); i++) {
                near(column.get(i), effects.get(i).get(head.name()), 1.0);
            }
        }
    }

    private static void near(double drawn, Object written, double scale) {
        double wanted = scale * (Double) written;
        assertThat(drawn).isCloseTo(wanted, within(1e-11 * Math.abs(wanted) + 1e-14));
    }
}
