package flowshy.report.chart.several;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cli.Json;
import flowshy.cli.Run;
import flowshy.report.MapReport;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Datasets;
import flowshy.report.chart.paper.Picture;
import flowshy.study.MapWords;
import flowshy.study.StudyMap;
import flowshy.study.StudyReader;
import flowshy.verdict.map.GridRun;
import java.awt.Color;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What a map draws is what its JSON says: the colour of every place, and every point of every line of equal value. */
public class MapChartTest {
    public static StudyMap map(String study, String across, String down, String figure, boolean log) {
        MapWords words = new MapWords(
                across, down, Optional.of(figure), OptionalDouble.empty(), List.of(13, 9), List.of(log, log));
        return StudyMap.of(
                StudyReader.open(Path.of("examples/" + study + "/study.yaml"), List.of()),
                words,
                new GridRun(2, GridRun.Progress.NONE));
    }

    @ParameterizedTest
    @CsvSource({
        "hoist-chain, hair.diameter=40 um..120 um, hair.length=0.3 mm..1.2 mm, least-rejection, false",
        "hoist-chain, hair.diameter=40 um..120 um, hair.density=1 g/cm3..4 g/cm3, resonance, true",
        "weather-mast, hair.stalk-length=100 um..850 um, hair.head-diameter=50 um..200 um, least-rejection, false"
    })
    void drawsWhatTheJsonSays(String study, String across, String down, String figure, boolean log) {
        StudyMap map = map(study, across, down, figure, log);
        Picture picture = ((DrawnChart) MapReport.chart(map)).picture();
        List<String> words = new ArrayList<>(List.of(
                "map", "examples/" + study + "/study.yaml", "--across", across, "--down", down, "--of", figure));
        words.addAll(List.of("--steps", "13,9", "--json"));
        if (log) {
            words.add("--log");
        }
        Map<String, Object> json =
                Json.object(Json.parse(Run.of(words.toArray(String[]::new)).out()));
        places(map, picture, json);
        lines(map, picture, json);
    }

    /** Each place lies in one block, hatched where there is no number, else of the colour of its step. */
    private static void places(StudyMap map, Picture picture, Map<String, Object> json) {
        List<Datasets.Block> blocks = Datasets.blocks(picture);
        Map<Color, String> scale = Datasets.scale(picture);
        List<?> across = (List<?>) Json.object(json.get("across")).get("values");
        List<?> down = (List<?>) Json.object(json.get("down")).get("values");
        List<Map<String, Object>> rows = Json.objects(json.get("rows"));
        assertThat(across).hasSize(13);
        assertThat(rows).hasSameSizeAs(down).hasSize(9);
        for (int j = 0; j < 9; j++) {
            List<?> values = (List<?>) rows.get(j).get(json.get("column").toString());
            for (int i = 0; i < 13; i++) {
                double x = map.across().unit().show((Double) across.get(i));
                double y = map.down().unit().show((Double) down.get(j));
                List<Datasets.Block> here = blocks.stream()
                        .filter(block ->
                                between(block.left(), x, block.right()) && between(block.low(), y, block.high()))
                        .toList();
                assertThat(here).as("%s, %s", x, y).hasSize(1);
                assertThat(here.get(0).colour())
                        .isEqualTo(Optional.ofNullable((Double) values.get(i)).map(value -> colour(map, value, scale)));
            }
        }
    }

    private static boolean between(double low, double value, double high) {
        double slack = 1e-9 * Math.abs(value);
        return low <= value + slack && value <= high + slack;
    }

    private static Color colour(StudyMap map, double value, Map<Color, String> scale) {
        double shown = map.figure().unit().show(value);
        for (Map.Entry<Color, String> step : scale.entrySet()) {
            if (step.getValue().isEmpty() || shown < number(step.getValue())) {
                return step.getKey();
            }
        }
        throw new AssertionError("the scale has no last step");
    }

    private static double number(String written) {
        return Double.parseDouble(written.replace('−', '-').replace("\u2009", ""));
    }

    private static void lines(StudyMap map, Picture picture, Map<String, Object> json) {
        List<Double> levels = Datasets.scale(picture).values().stream()
                .filter(above -> !above.isEmpty())
                .map(MapChartTest::number)
                .toList();
        List<Datasets.Series> drawn = Datasets.lines(picture);
        assertThat(drawn).isNotEmpty();
        int next = 0;
        for (Map<String, Object> contour : Json.objects(json.get("contours"))) {
            double level = map.figure().unit().show((Double) contour.get("level"));
            if (levels.stream().noneMatch(one -> Math.abs(one - level) <= 1e-9 * Math.abs(level))) {
                continue; // a limit that lies beyond all numbers
            }
            for (Map<String, Object> line : Json.objects(contour.get("lines"))) {
                boolean closed = (Boolean) line.get("closed");
                same(
                        drawn.get(next).x(),
                        (List<?>) line.get("across"),
                        map.across().unit()::show,
                        closed);
                same(drawn.get(next).y(), (List<?>) line.get("down"), map.down().unit()::show, closed);
                next++;
            }
        }
        assertThat(next).isEqualTo(drawn.size());
    }

    private static void same(List<Double> drawn, List<?> written, DoubleUnaryOperator unit, boolean closed) {
        assertThat(drawn).hasSize(written.size() + (closed ? 1 : 0)).hasSizeGreaterThan(1);
        for (int i = 0; i < drawn.size(); i++) {
            double wanted = unit.applyAsDouble((Double) written.get(i % written.size()));
            assertThat(drawn.get(i)).isCloseTo(wanted, within(1e-11 * Math.abs(wanted)));
        }
    }
}
