package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Maps as a user asks for them, against the answer of bands at the same place. */
class MapCommandTest {
    private static final String CYLINDER = "examples/workbench-air/study.yaml";
    private static final String CLUB = "examples/weather-mast/study.yaml";
    private static final String DIAMETER = "hair.diameter=40 um..160 um";
    private static final String LENGTH = "hair.length=0.2 mm..1.2 mm";

    @TempDir
    Path folder;

    private static Run map(String study, String across, String down, String... more) {
        List<String> words = new ArrayList<>(
                List.of("map", study, "--across", across, "--down", down, "--set", "finite-length=off"));
        words.addAll(List.of(more));
        return Run.of(words.toArray(String[]::new));
    }

    /** Lines of a CSV of the map, the head left out. */
    private static List<String[]> rows(Run run) {
        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isZero();
        List<String> lines = run.out().lines().toList();
        return lines.subList(1, lines.size()).stream()
                .map(line -> line.split(",", 5))
                .toList();
    }

    private static Map<String, Object> bands(String study, String... more) {
        List<String> words = new ArrayList<>(List.of("bands", study, "--json", "--set", "finite-length=off"));
        words.addAll(List.of(more));
        return Json.object(Json.parse(Run.of(words.toArray(String[]::new)).out()));
    }

    /** The very digits: a map's place and the study with these numbers are one device. */
    @Test
    void theLeastRejectionOfAPlaceIsThatOfBands() {
        List<String[]> rows = rows(map(CYLINDER, DIAMETER, LENGTH, "--steps", "4,3", "--csv"));
        assertThat(rows).hasSize(12);
        for (String[] row : rows) {
            Map<String, Object> answer =
                    bands(CYLINDER, "--set", "hair.diameter=" + row[0] + " m", "--set", "hair.length=" + row[1] + " m");
            Object found = Json.objects(Json.object(answer.get("verdict")).get("limits"))
                    .get(0)
                    .get("found");
            assertThat(Double.parseDouble(row[2])).isEqualTo(found);
            assertThat(row[3]).isEqualTo("off");
            assertThat(row[4]).isEmpty();
        }
    }

    @Test
    void theRejectionAtAFrequencyIsThatOfBandsAlsoOnTheWholeHair() {
        for (String model : List.of("off", "on")) {
            Run run = map(
                    CYLINDER,
                    DIAMETER,
                    "hair.density=1 g/cm3..2 g/cm3",
                    "--steps",
                    "2",
                    "--csv",
                    "--at",
                    "80 Hz",
                    "--set",
                    "finite-length=" + model);
            List<String[]> rows = rows(run);
            assertThat(rows).hasSize(4);
            for (String[] row : rows) {
                Map<String, Object> answer = bands(
                        CYLINDER,
                        "--frequencies",
                        "80 Hz",
                        "--set",
                        "hair.diameter=" + row[0] + " m",
                        "--set",
                        "hair.density=" + row[1] + " kg/m3",
                        "--set",
                        "finite-length=" + model);
                assertThat(Double.parseDouble(row[2]))
                        .isEqualTo(Json.objects(answer.get("points")).get(0).get("rejection_db"));
                assertThat(row[3]).isEqualTo(model);
            }
        }
    }

    @Test
    void theFrequencyMayBeEitherSide() {
        String across = "frequency=20 Hz..2 kHz";
        String down = "hair.stalk-diameter=30 um..60 um";
        List<String[]> lines = rows(map(CLUB, across, down, "--log", "across", "--steps", "5,3", "--csv"));
        List<String[]> columns = rows(map(CLUB, down, across, "--log", "down", "--steps", "3,5", "--csv"));
        assertThat(lines).hasSize(15);
        for (String[] row : lines) {
            assertThat(columns)
                    .anyMatch(other -> other[1].equals(row[0]) && other[0].equals(row[1]) && other[2].equals(row[2]));
            Map<String, Object> answer =
                    bands(CLUB, "--frequencies", row[0] + " Hz", "--set", "hair.stalk-diameter=" + row[1] + " m");
            assertThat(Double.parseDouble(row[2]))
                    .isEqualTo(Json.objects(answer.get("points")).get(0).get("rejection_db"));
        }
    }

    @Test
    void theNumberOfThreadsChangesNoByte() {
        String[] words = {"--csv", "--of", "error", "--steps", "5,4"};
        String one = map("examples/fan-tray/study.yaml", DIAMETER, LENGTH, with(words, "--threads", "1"))
                .out();
        String three = map("examples/fan-tray/study.yaml", DIAMETER, LENGTH, with(words, "--threads", "3"))
                .out();
        assertThat(one.lines()).hasSize(21);
        assertThat(three).isEqualTo(one);
    }

    private static String[] with(String[] words, String... more) {
        List<String> all = new ArrayList<>(Arrays.asList(words));
        all.addAll(List.of(more));
        return all.toArray(String[]::new);
    }

    @Test
    void chartCsvAndJsonHoldTheSameNumbers() throws IOException {
        Path charts = folder.resolve("charts");
        Run csv = map(CYLINDER, DIAMETER, LENGTH, "--steps", "7,5", "--csv", "--chart", charts.toString());
        List<String[]> rows = rows(csv);
        List<String> behind = Files.readAllLines(charts.resolve("map.csv"));
        assertThat(behind).hasSize(36);
        for (int k = 0; k < rows.size(); k++) {
            String[] row = rows.get(k);
            assertThat(behind.get(k + 1)).isEqualTo("finite-length off," + row[0] + "," + row[1] + "," + row[2]);
        }
        Map<String, Object> json = Json.object(Json.parse(
                map(CYLINDER, DIAMETER, LENGTH, "--steps", "7,5", "--json").out()));
        List<Map<String, Object>> lines = Json.objects(json.get("rows"));
        assertThat(json).containsEntry("finite_length", "off");
        for (int j = 0; j < 5; j++) {
            List<?> values = (List<?>) lines.get(j).get("least_rejection_db");
            for (int i = 0; i < 7; i++) {
                assertThat(values.get(i)).isEqualTo(Double.parseDouble(rows.get(7 * j + i)[2]));
            }
        }
        List<Map<String, Object>> contours = Json.objects(json.get("contours"));
        assertThat(contours)
                .anyMatch(contour -> contour.get("level").equals(20.0)
                        && contour.get("decisive").equals(true)
                        && !Json.objects(contour.get("lines")).isEmpty());
        assertThat(ImageIO.read(new ByteArrayInputStream(Files.readAllBytes(charts.resolve("map.png")))))
                .isNotNull();
        assertThat(Files.readString(charts.resolve("map.svg"))).contains("<title", "20 dB: the margin");
    }

    @Test
    void whatMakesNoDeviceIsMarkedWithItsReason() throws IOException {
        String across = "hair.stalk-length=300 um..880 um";
        String down = "hair.head-diameter=80 um..200 um";
        Path charts = folder.resolve("charts");
        Run run = map(CLUB, across, down, "--steps", "9,5", "--chart", charts.toString());
        assertThat(run.out())
                .contains("|++O", "//")
                .contains("no number")
                .contains("longer")
                .contains("(O)");
        List<String[]> rows = rows(map(CLUB, across, down, "--steps", "9,5", "--csv"));
        assertThat(rows).anySatisfy(row -> {
            assertThat(row[2]).isEmpty();
            assertThat(row[4]).contains("hair.stalk-length", "longer than the hair's 900 um");
        });
        assertThat(rows).anySatisfy(row -> assertThat(row[4]).isEmpty());
        assertThat(Files.readString(charts.resolve("map.svg"))).contains("no number: hair.stalk-length");
        Map<String, Object> json = Json.object(
                Json.parse(map(CLUB, across, down, "--steps", "9,5", "--json").out()));
        Map<String, Object> row = Json.objects(json.get("rows")).get(0);
        List<?> values = (List<?>) row.get("least_rejection_db");
        Map<String, Object> reason =
                Json.objects(row.get("least_rejection_db_reason")).get(0);
        int index = ((Double) reason.get("index")).intValue();
        assertThat(values.get(index)).isNull();
        assertThat(values.get(0)).isNotNull();
    }

    /** Thicker than long at many places, each with figures of its own: one reason, in the units of the study. */
    @Test
    void oneReasonInManyFiguresIsToldOnce() throws IOException {
        Path charts = folder.resolve("charts");
        Run run = map(
                CYLINDER,
                "hair.diameter=100 um..900 um",
                LENGTH,
                "--steps",
                "17,11",
                "--of",
                "mass",
                "--chart",
                charts.toString());
        String told = run.out().replaceAll("\\s+", " ");
        assertThat(told)
                .contains("such as hair.diameter: 250 um wide and 200 um long; a hair is at least as long as wide")
                .containsOnlyOnce("um wide and")
                .doesNotContain("other reasons");
        assertThat(Files.readString(charts.resolve("map.svg")))
                .contains("no number: such as hair.diameter: 250 um wide")
                .doesNotContain("300 um wide");
    }

    @Test
    void whereNoPlaceHasANumberNoShareOfThemIsTold() {
        Run run = map(CYLINDER, "hair.diameter=20 um..60 um", LENGTH, "--steps", "5,3", "--set", "cover=sealed");
        assertThat(run.code()).isZero();
        assertThat(run.out())
                .contains("[100 %] no flow reaches the hair under a sealed cover")
                .doesNotContain("undefined", "places with a number");
    }

    /** A limit from above is told as one, and both sides of it make all places. */
    @Test
    void aLargestValueIsToldAsAtMost() {
        Matcher below = limited("at-most", "at most");
        Matcher above = limited("at-least", "at least");
        assertThat(below.find()).isTrue();
        assertThat(above.find()).isTrue();
        assertThat(Double.parseDouble(below.group(1)) + Double.parseDouble(above.group(1)))
                .isCloseTo(100.0, within(0.1));
    }

    private static Matcher limited(String sense, String words) {
        Run run = map(
                CYLINDER,
                DIAMETER,
                LENGTH,
                "--steps",
                "9,5",
                "--of",
                "resonance",
                "--set",
                "accept.resonance={" + sense + ": 600 Hz}");
        return Pattern.compile(words + " 600.0 Hz\\s+([0-9.]+) %").matcher(run.out());
    }

    /** In a vacuum chamber's thin gas the slip law ends for the thinner hairs: their numbers stand, marked. */
    @Test
    void aNumberBeyondTheEndOfAModelIsMarked() {
        Run run = map(
                CYLINDER, "hair.diameter=4 um..160 um", "medium.pressure=2 kPa..100 kPa", "--steps", "9,5", "--log");
        assertThat(run.out()).contains("??").contains("a model has ended");
    }

    @Test
    void pagesFitEightyColumns() {
        for (String figure : List.of("least-rejection", "noise", "motion-octaves", "resonance", "mass")) {
            Run run = map(CYLINDER, DIAMETER, LENGTH, "--of", figure, "--steps", "61,3");
            assertThat(run.code()).isZero();
            assertThat(run.out().lines())
                    .isNotEmpty()
                    .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
        }
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "hair.diametr=40 um..160 um | hair.length=1 mm..2 mm | | did you mean hair.diameter?",
                "hair.diameter=160 um..40 um | hair.length=1 mm..2 mm | | a range from 160 um to 40 um is upside down",
                "hair.diameter=0.1 mm..100 um | hair.length=1 mm..2 mm | | a range from 0.1 mm to 100 um is empty",
                "frequency=2 kHz..20 Hz | hair.length=1 mm..2 mm | | a range from 2 kHz to 20 Hz is upside down",
                "hair.diameter=40 Hz..160 Hz | hair.length=1 mm..2 mm | | a length is wanted here",
                "frequency=20 um..2 kHz | hair.length=1 mm..2 mm | | a frequency is wanted here",
                "hair.diameter=40..160 um | hair.length=1 mm..2 mm | | has no unit",
                "hair.diameter=40 um | hair.length=1 mm..2 mm | | is no KEY=A..B",
                "frequency=40 Hz | hair.length=1 mm..2 mm | | is no KEY=A..B",
                "hair.shape=1..2 | hair.length=1 mm..2 mm | | not a number",
                "hair.diameter=1 um..2 um | hair.diameter=1 mm..2 mm | | two different numbers",
                "hair.diameter=1 um..2 km | hair.length=1 mm..2 mm | | is wanted here",
                "hair.diameter=40 um..160 um | hair.length=1 mm..2 mm | --of weight | one of mass",
                "hair.diameter=40 um..160 um | hair.length=1 mm..2 mm | --of nois | did you mean noise?",
                "hair.diameter=40 um..160 um | hair.length=1 mm..2 mm | --of mass --at 80Hz | belongs to no single frequency",
                "frequency=20 Hz..2 kHz | hair.length=1 mm..2 mm | --of mass | belongs to no single frequency",
                "frequency=20 Hz..2 kHz | hair.length=1 mm..2 mm | --at 80Hz | leave out one of them",
                "suspension.pivot-depth=0 um..5 um | hair.length=1 mm..2 mm | --log | begins above zero",
                "hair.diameter=40 um..160 um | hair.length=1 mm..2 mm | --steps 1 | from 2 to",
                "hair.diameter=40 um..160 um | hair.length=1 mm..2 mm | --steps 3,4,5 | one or two whole numbers",
                "hair.diameter=40 um..160 um | hair.length=1 mm..2 mm | --threads 0 | from 1 to"
            })
    void wrongWordsAreToldPlainly(String across, String down, String more, String told) {
        Run run = map(CYLINDER, across, down, more == null ? new String[0] : more.split(" "));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(told).doesNotContain("\tat ");
    }
}
