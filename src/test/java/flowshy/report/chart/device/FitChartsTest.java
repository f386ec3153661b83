package flowshy.report.chart.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cli.Json;
import flowshy.cli.Run;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Datasets;
import flowshy.study.FreeKeys;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.verdict.fit.FitAnswer;
import flowshy.verdict.fit.FitQuestion;
import flowshy.verdict.fit.Robustness;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** What is drawn of what a fit leaves is what the JSON says, measurement by measurement, sizes over phases. */
public class FitChartsTest {
    private static final String STUDY = "examples/measured-pickup/study.yaml";

    public static Study study() {
        return StudyReader.read(Path.of(STUDY), List.of());
    }

    public static FitAnswer answer() {
        StudyReader reader = StudyReader.open(Path.of(STUDY), List.of());
        Study study = reader.study();
        FreeKeys keys = FreeKeys.of(reader, List.of(FreeKeys.STIFFNESS, FreeKeys.DAMPING));
        return new FitQuestion(
                        keys.space().still(),
                        study.device(),
                        study.band(),
                        keys.free(),
                        study.measurements(),
                        List.of(),
                        Robustness.HUBER)
                .answer();
    }

    @Test
    void drawsWhatTheJsonSays() {
        List<Datasets.Series> series = Datasets.of(((DrawnChart) FitCharts.residuals(study(), answer())).picture());
        Map<String, Object> json =
                Json.object(Json.parse(Run.of("fit", STUDY, "--json").out()));
        List<Map<String, Object>> all = Json.objects(json.get("residuals"));
        List<Object> names =
                all.stream().map(residual -> residual.get("name")).distinct().toList();
        assertThat(names).hasSize(2);
        assertThat(series).hasSize(4);
        int drawn = 0;
        for (int s = 0; s < 4; s++) {
            String part = s < 2 ? "level" : "phase";
            Object name = names.get(s % 2);
            List<Map<String, Object>> own = all.stream()
                    .filter(residual -> residual.get("part").equals(part)
                            && residual.get("name").equals(name))
                    .toList();
            assertThat(series.get(s).name()).isEqualTo(s < 2 ? name : "");
            assertThat(series.get(s).x()).hasSameSizeAs(own).isNotEmpty();
            for (int i = 0; i < own.size(); i++) {
                double frequency = (Double) own.get(i).get("frequency_hz");
                double residual = (Double) own.get(i).get("residual");
                assertThat(series.get(s).x().get(i)).isCloseTo(frequency, within(1e-11 * frequency));
                assertThat(series.get(s).y().get(i)).isCloseTo(residual, within(1e-11 * Math.abs(residual)));
                drawn++;
            }
        }
        assertThat(drawn).isEqualTo(all.size()).isGreaterThan(100);
    }
}
