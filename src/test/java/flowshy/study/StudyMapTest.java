package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.map.GridRun;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What a map knows of each figure: whether it belongs to a frequency, and whether the surroundings have a part in it. */
class StudyMapTest {
    private static final Path SURROUNDED = Path.of("examples", "fan-tray", "study.yaml");

    private static StudyReader reader() {
        return StudyReader.open(
                SURROUNDED,
                List.of(
                        "finite-length=off",
                        "hair.youngs-modulus=70 GPa",
                        "cover={kind: roofed, gap: 3 mm, length: 6 mm}",
                        "calibration.cover=roofed"));
    }

    /** A map of two by two round a study that has every figure. */
    @ParameterizedTest
    @EnumSource(Figure.class)
    void everyFigureOfAMapIsThatOfTheStudy(Figure figure) {
        StudyReader reader = reader();
        MapWords words = new MapWords(
                "hair.diameter=1 um..1 mm",
                "hair.length=100 um..2 mm",
                Optional.of(figure.word()),
                OptionalDouble.empty(),
                List.of(2, 2),
                List.of(false, false));
        StudyMap map = StudyMap.of(reader, words, new GridRun(1, GridRun.Progress.NONE));
        Study study = reader.study();
        double value = figure.of(new Evaluated(study.question())).number().orElse(Double.NaN);
        assertThat(value).isFinite();
        assertThat(map.own().orElseThrow().value()).isEqualTo(value);
        double elsewhere = figure.of(new Evaluated(study.question(), 1.7 * study.reference()))
                .number()
                .orElse(Double.NaN);
        assertThat(map.frequency().isPresent()).isEqualTo(Double.compare(elsewhere, value) != 0);
    }
}
