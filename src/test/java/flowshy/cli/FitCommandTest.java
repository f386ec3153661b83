package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The fit as a user runs it. The data of the example were made apart from the program, by make-measured.py. */
class FitCommandTest {
    private static final String EXAMPLE = "examples/measured-pickup/";
    private static final String STUDY = EXAMPLE + "study.yaml";
    private static final String SMALL = """
            hair: {length: 720 um, diameter: 92 um, density: 1.18 g/cm3}
            suspension: {resonance: {frequency: 430 Hz, in: vacuum}, quality: {value: 6, in: vacuum}}
            medium: {name: air, temperature: 21 degC, pressure: 99.2 kPa, humidity: 35 %}
            band: {from: 25 Hz, to: 630 Hz}
            finite-length: off
            """;

    @TempDir
    private Path folder;

    private String file(String name, String text) throws IOException {
        return Files.writeString(folder.resolve(name), text).toString();
    }

    private static Map<String, Object> json(Run run) {
        assertThat(run.err()).isEmpty();
        return Json.object(Json.parse(run.out()));
    }

    private static double figure(Map<String, Object> answer, String list, String name, String key, String field) {
        return Json.objects(answer.get(list)).stream()
                .filter(one -> one.get(name).equals(key))
                .map(one -> (double) one.get(field))
                .findFirst()
                .orElseThrow();
    }

    /** What make-measured.py put in: resonance 464 Hz and quality 4.2 in vacuum, gain 2.6 V/rad, one reading gone wrong. */
    @Test
    void findsTheDeviceOfTheExample() {
        Map<String, Object> answer = json(Run.of("fit", STUDY, "--json"));
        assertThat(figure(answer, "derived", "figure", "vacuum_resonance_hz", "value"))
                .isCloseTo(464.0, within(0.9));
        assertThat(figure(answer, "derived", "figure", "vacuum_quality", "value"))
                .isCloseTo(4.2, within(0.07));
        assertThat(figure(answer, "estimates", "key", "gain", "value")).isCloseTo(2.6, within(0.017));
        assertThat(figure(answer, "derived", "figure", "vacuum_resonance_hz", "before"))
                .isCloseTo(430.0, within(1e-6));
        assertThat(Json.objects(answer.get("outliers"))).singleElement().satisfies(outlier -> {
            assertThat(outlier).containsEntry("name", "flow tube").containsEntry("part", "level");
            assertThat((double) outlier.get("frequency_hz")).isCloseTo(199.526, within(1e-3));
        });
        assertThat(Json.objects(answer.get("residuals"))).hasSize(2 * (31 + 28));
        assertThat(Json.objects(answer.get("after")))
                .extracting(one -> one.get("of"))
                .containsExactly("motion", "flow", "rejection");
        assertThat(answer).containsEntry("model_and_measurement", "differ");
        assertThat(Json.objects(answer.get("without_outliers")))
                .hasSize(3)
                .extracting(one -> one.get("agreement"))
                .containsOnly("agree");
        assertThat((double) answer.get("p_without_outliers")).isBetween(0.01, 0.99);
    }

    @Test
    void textFitsAPageAndTellsEverything() throws IOException {
        Run run = Run.of("fit", STUDY);
        assertThat(run.code()).isZero();
        assertThat(run.out() + "exit code " + run.code() + "\n")
                .isEqualTo(Files.readString(Path.of(EXAMPLE + "expected-fit.txt")));
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
        assertThat(run.out())
                .contains("Huber's M-estimator (1964)", "outliers", "correlations", "shaker over flow tube");
    }

    @Test
    void csvHoldsNumbersResidualsAndPoints() {
        List<String> lines = Run.of("fit", STUDY, "--csv").out().lines().toList();
        assertThat(lines.get(0)).isEqualTo("key,unit,start,value,standard_uncertainty,from,to");
        assertThat(lines.get(1)).startsWith("suspension.stiffness,N.m/rad,7.16");
        assertThat(lines).contains("measurement,part,frequency_hz,residual,weight");
        assertThat(lines.stream().filter(line -> line.startsWith("shaker,motion,")))
                .hasSize(31);
    }

    @Test
    void writesTheFittedStudyAndLeavesTheRestAsItStood() throws IOException {
        String text = """
                # my device
                title: "\u2696 serial 4" # a scale
                hair: {length: 720 um, diameter: 92 um, density: 1.18 g/cm3}
                suspension: {resonance: {frequency: 430 Hz, in: vacuum}, quality: {value: 6, in: vacuum}, attitude: upright}  # batch 3
                medium:
                  name: air
                  temperature: 21 degC   # room
                  pressure: 99.2 kPa
                  humidity: 35 %
                band: {from: 25 Hz, to: 630 Hz}
                finite-length: off
                """;
        String study = file("s.yaml", text);
        Path target = folder.resolve("fitted.yaml");
        Run run =
                Run.of("fit", study, EXAMPLE + "shaker.csv", "--of", "motion", "--write", target.toString(), "--json");
        Map<String, Object> answer = json(run);
        assertThat(answer.get("written")).isEqualTo(target.toString());
        String written = Files.readString(target);
        assertThat(written)
                .contains("# my device\n", "title: \"\u2696 serial 4\" # a scale\n", "temperature: 21 degC   # room\n")
                .contains("attitude: upright}  # batch 3")
                .contains("# suspension.stiffness fitted: standard uncertainty ")
                .doesNotContain("resonance", "quality");
        Map<String, Object> device =
                Json.object(json(Run.of("bands", target.toString(), "--json")).get("device"));
        assertThat((double) device.get("stiffness_n_m_per_rad"))
                .isCloseTo(figure(answer, "estimates", "key", "suspension.stiffness", "value"), within(1e-7 * 8.3e-9));
        assertThat((double) device.get("vacuum_resonance_hz")).isCloseTo(464.0, within(1.5));
    }

    @Test
    void writesAnyFreeNumberInTheUnitOfTheUser() throws IOException {
        String study = file("s.yaml", SMALL.replace("92 um", "0.0905 mm"));
        String angles = angles(1.0);
        Path target = folder.resolve("fitted.yaml");
        Run run = Run.of("fit", study, file("m.csv", angles), "--free", "hair.diameter", "--write", target.toString());
        assertThat(run.err()).isEmpty();
        assertThat(Files.readString(target))
                .containsPattern("diameter: 0\\.09[0-9]+ mm")
                .contains("# hair.diameter fitted:");
        Run into = Run.of("fit", study, file("m.csv", angles), "--write", study);
        assertThat(into.code()).isEqualTo(2);
        assertThat(into.err()).contains("the study itself; name a new file");
        Run set = Run.of(
                "fit", study, file("m.csv", angles), "--set", "hair.density=1.2 g/cm3", "--write", target.toString());
        assertThat(set.err()).isEmpty();
        assertThat(Files.readString(target)).contains("density: 1.2 g/cm3");
    }

    /** The shaker's angles as bands predicts them, times a factor. */
    private static String angles(double factor) {
        Map<String, Object> answer = json(Run.of("bands", STUDY, "--json"));
        StringBuilder table = new StringBuilder("frequency [Hz],motion [rad/(m/s2)],phase [deg],uncertainty [%]\n");
        for (Map<String, Object> point : Json.objects(answer.get("points"))) {
            table.append(String.format(
                    Locale.ROOT,
                    "%.6f,%.9e,%.6f,1%n",
                    (double) point.get("frequency_hz"),
                    factor * (double) point.get("motion_rad_per_m_s2"),
                    (double) point.get("motion_phase_deg")));
        }
        return table.toString();
    }

    @Test
    void readsRingDownRecords() throws IOException {
        String study = file("s.yaml", SMALL);
        StringBuilder record = new StringBuilder("time [ms],signal [mV]\n");
        for (int i = 0; i < 400; i++) {
            double t = 5e-5 * i;
            double x = Math.exp(-t / 3e-3) * Math.cos(2.0 * Math.PI * 450.0 * t) + 1e-3 * Math.sin(7919.0 * i * i);
            record.append(String.format(Locale.ROOT, "%.3f,%.9f%n", 1e3 * t, 20.0 * x));
        }
        String swing = file("swing.csv", record.toString());
        String again = file("again.csv", record.toString());
        Map<String, Object> answer = json(Run.of("fit", study, swing, again, "--json"));
        assertThat(figure(answer, "derived", "figure", "resonance_hz", "value")).isBetween(445.0, 460.0);
        assertThat(Json.objects(answer.get("residuals")))
                .extracting(one -> one.get("part"))
                .containsExactly("swing frequency", "decay time", "swing frequency", "decay time");
        Run one = Run.of("fit", study, swing);
        assertThat(one.code()).isEqualTo(2);
        assertThat(one.err()).contains("2 measured numbers cannot settle 2 free ones");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'' | m.csv: no rows; a header with units, then numbers",
                "'frequency [Hz],motion [V/g]/10,1/20,NaN' | m.csv:3:4: NaN is not a finite number; a pure number is wanted here",
                "'frequency [Hz],motion [V/g]/10,1/20,' | m.csv:3:4: no motion in this row; one number a column",
                "'frequency [Hz],motion [V/g]/10,1' | m.csv:2:1: one row only; two frequencies or more",
                "'frequency [Hz],motion [V/g]/10,1/10,2' | m.csv:3:1: 10.0000 Hz again, as in line 2",
                "'frequency [Hz],motion [V/g]/20,1/10,2' | m.csv:3:1: 10.0000 Hz below 20.0000 Hz in the row before",
                "'frequency [Hz],motion [V/g]/1e-3,10/9e-4,20/8e-4,30' | m.csv:1:1: the frequencies do not rise, but the amplitudes do; are the two columns swapped?",
                "'frequency [Hz],motion [m]/10,1/20,1' | m.csv:1:16: unit m; a response per acceleration or speed is wanted here",
                "'frequency [Hz],amplitude [V/g]/10,1/20,1' | m.csv: it is not said what was measured; call the column motion, flow or rejection in place of amplitude",
                "'time [ms],signal/0,1/1,2' | m.csv: 2 samples are too few for a swing",
            })
    void badDataGetAClearError(String table, String said) throws IOException {
        String study = file("s.yaml", SMALL);
        String measured = file("m.csv", table.replace("/", "\n").replace("V\ng", "V/g"));
        Run run = Run.of("fit", study, measured);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err().replace(folder + "/", "")).contains(said).doesNotContain("\tat ");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--free hair.diametre | --free hair.diametre",
                "--free hair.diameter,hair.diameter | --free hair.diameter: named twice; each key once",
                "--free accept.rejection | nothing that was measured depends on accept.rejection; do not free it",
                "--robust maybe | --robust 'maybe': huber, tukey or none is wanted here",
                "--of lift | --of 'lift': motion, flow or rejection is wanted here",
                "--gain 3 | 3 has no unit",
                "--gain 0 V/rad | a gain is not zero",
                "--write /nowhere/at/all/x.yaml | there is no folder",
            })
    void wrongWordsGetAClearError(String words, String said) throws IOException {
        String study = file("s.yaml", SMALL);
        int blank = words.indexOf(' ');
        Run run =
                Run.of("fit", study, file("m.csv", angles(1.0)), words.substring(0, blank), words.substring(blank + 1));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains(said).doesNotContain("\tat ");
    }

    @Test
    void nothingMeasuredIsTold() throws IOException {
        Run run = Run.of("fit", file("s.yaml", SMALL));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("nothing measured: name files, or state measurements in the study");
        Run bare = Run.of(
                "fit",
                file("b.yaml", "hair: {length: 720 um, diameter: 92 um, density: 1.18 g/cm3}\nmedium: air\n"),
                file("m.csv", angles(1.0)));
        assertThat(bare.err()).contains("the study states no suspension; state one to start from");
    }

    @Test
    void chartsHoldTheResiduals() throws IOException {
        Path charts = folder.resolve("charts");
        Run run = Run.of("fit", STUDY, "--chart", charts.toString());
        assertThat(run.code()).isZero();
        List<String> table = Files.readAllLines(charts.resolve("fit-residuals.csv"));
        assertThat(table).hasSize(1 + 2 * (31 + 28));
        assertThat(charts.resolve("fit-residuals.svg")).isNotEmptyFile();
        assertThat(charts.resolve("rejection.png")).isNotEmptyFile();
    }

    @Test
    void thePageTellsOfTheFittedDevice() throws Exception {
        Path page = folder.resolve("fit.html");
        Run run = Run.of("fit", STUDY, "--out", page.toString());
        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isZero();
        String html = Files.readString(page);
        assertThat(html)
                .contains(
                        "Fitted device",
                        "Measured beside the model",
                        "suspension.stiffness [N.m/rad]",
                        "What the fit leaves")
                .contains("The figures of this page are those of the fitted device");
        Run plain =
                Run.of("report", STUDY, "--out", folder.resolve("plain.html").toString());
        assertThat(plain.err()).isEmpty();
        assertThat(Files.readString(folder.resolve("plain.html")))
                .contains("Measured beside the model", "Nothing is fitted but one common factor")
                .doesNotContain("Fitted device");
    }
}
