package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Devices side by side, as a user asks for them. */
class CompareCommandTest {
    private static final String LIFT = "examples/lift-machinery/study.yaml";

    private static List<Map<String, Object>> devices(String... words) {
        return Json.objects(answer(words).get("devices"));
    }

    private static Map<String, Object> answer(String... words) {
        return Json.object(Json.parse(Run.of(words).out()));
    }

    private static Map<String, Object> figures(Map<String, Object> device) {
        return Json.object(device.get("figures"));
    }

    /** Every figure that {@code bands} prints as well has the same digits there. */
    @ParameterizedTest
    @ValueSource(
            strings = {"lift-machinery", "workbench-air", "water-tank", "fan-tray", "vacuum-package", "helium-can"})
    void figuresAreThoseOfTheMainAnswer(String example) {
        String study = "examples/" + example + "/study.yaml";
        Map<String, Object> device = devices("compare", study, "--json").get(0);
        Map<String, Object> figures = figures(device);
        double reference = (double) device.get("reference_hz");
        Map<String, Object> bands = answer("bands", study, "--json", "--frequencies", reference + " Hz");
        Map<String, Object> facts = Json.object(bands.get("device"));
        for (String name : List.of(
                "mass_kg",
                "inertia_kg_m2",
                "inertial_torque_n_m_per_m_s2",
                "length_m",
                "resonance_hz",
                "quality",
                "bending_frequency_hz")) {
            assertThat(figures.get(name)).as(name).isEqualTo(facts.get(name));
        }
        assertThat(figures.get("footprint_m")).isEqualTo(facts.get("largest_diameter_m"));
        Map<String, Object> point = Json.objects(bands.get("points")).get(0);
        // the frequency itself went through twelve digits
        near(figures.get("rejection_db"), point.get("rejection_db"));
        near(figures.get("sensitivity_rad_per_m_s2"), point.get("motion_rad_per_m_s2"));
        near(figures.get("equivalent_m_s2_per_m_s"), point.get("equivalent_m_s2_per_m_s"));
        if (bands.containsKey("least_rejection")) {
            Map<String, Object> least = Json.object(bands.get("least_rejection"));
            assertThat(figures.get("least_rejection_db")).isEqualTo(least.get("rejection_db"));
            assertThat(figures.get("least_rejection_db_at_hz")).isEqualTo(least.get("frequency_hz"));
        } else {
            assertThat(figures.get("least_rejection_db")).isNull();
        }
        if (bands.containsKey("error")) {
            Map<String, Object> error = Json.object(bands.get("error"));
            assertThat(figures.get("error_m_s2")).isEqualTo(error.get("rms_m_s2"));
            assertThat(figures.get("noise_rms_m_s2")).isEqualTo(error.get("noise_rms_m_s2"));
        }
        assertThat(Json.object(device.get("verdict"))).isEqualTo(Json.object(bands.get("verdict")));
    }

    private static void near(Object found, Object wanted) {
        if (wanted == null) {
            assertThat(found).isNull();
        } else {
            assertThat((double) found).isCloseTo((double) wanted, within(1e-11 * Math.abs((double) wanted)));
        }
    }

    /** Each variant is the study with its keys set, where the suspension is not measured on another hair by that. */
    @Test
    void aVariantIsTheStudyWithItsKeysSet() {
        List<Map<String, Object>> devices = devices("compare", LIFT, "--json");
        assertThat(devices)
                .extracting(device -> device.get("name"))
                .containsExactly(LIFT, "club", "silicon post", "low roof", "helium can", "in argon", "stiffer hinge");
        Map<String, Object> argon = answer("bands", LIFT, "--json", "--set", "medium.name=argon");
        assertThat(figures(devices.get(5)).get("least_rejection_db"))
                .isEqualTo(Json.object(argon.get("least_rejection")).get("rejection_db"));
        assertThat(figures(devices.get(5)).get("error_m_s2"))
                .isEqualTo(Json.object(argon.get("error")).get("rms_m_s2"));
        Map<String, Object> stiffer = answer("bands", LIFT, "--json", "--set", "suspension.resonance=690 Hz");
        assertThat(figures(devices.get(6)).get("resonance_hz"))
                .isEqualTo(Json.object(stiffer.get("device")).get("resonance_hz"));
        for (int i = 0; i < 6; i++) {
            assertThat(devices.get(i).get("stiffness_n_m_per_rad"))
                    .isEqualTo(devices.get(0).get("stiffness_n_m_per_rad"));
        }
    }

    /** Scaled devices, rebuilt as a study of their own and worked out by the main command. */
    @ParameterizedTest
    @CsvSource({"mass, mass_kg", "inertia, inertia_kg_m2", "torque, inertial_torque_n_m_per_m_s2"})
    void equalQuantitiesAreEqualWhenTheStudyIsReadAnew(String quantity, String column) {
        List<Map<String, Object>> devices = devices("compare", LIFT, "--json", "--equal", quantity);
        double target = (double) figures(devices.get(0)).get(column);
        Map<String, Object> post = devices.get(2);
        double ratio = (double) Json.object(post.get("scaled")).get("ratio");
        assertThat(ratio).isLessThan(0.8);
        Map<String, Object> anew = answer(
                "bands",
                LIFT,
                "--json",
                "--set",
                "hair.density=2.33 g/cm3",
                "--set",
                "hair.diameter=" + 88.0 * ratio + " um");
        assertThat((double) Json.object(anew.get("device")).get(column)).isCloseTo(target, within(1e-9 * target));
        assertThat((double) figures(post).get(column)).isCloseTo(target, within(1e-9 * target));
        assertThat((double) figures(post).get("least_rejection_db"))
                .isCloseTo((double) Json.object(anew.get("least_rejection")).get("rejection_db"), within(1e-9));
    }

    @Test
    void scalesByOneNumberAndSaysWhereThereIsNone() {
        List<Map<String, Object>> devices =
                devices("compare", LIFT, "--json", "--equal", "torque", "--by", "hair.head-diameter");
        assertThat(Json.object(devices.get(1).get("scaled")).get("change"))
                .isEqualTo("hair.head-diameter from 118.00 um to 102.97 um");
        assertThat(devices.get(2).get("no_solution")).isEqualTo("hair.head-diameter: the study does not state it");
    }

    @Test
    void studiesAreComparedLikeVariants() {
        Run run = Run.of("compare", "examples/workbench-air/study.yaml", "examples/machine-hall/study.yaml");
        assertThat(run.err()).isEmpty();
        assertThat(run.out())
                .contains("A examples/workbench-air/study.yaml - ", "B examples/machine-hall/study.yaml - ");
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "--equal inertia",
                "--equal resonance --by suspension.stiffness",
                "--hold resonance",
                "--equal least-rejection",
                "--set variants.club.hair.head-diameter=120um"
            })
    void fitsEightyColumnsWithoutTrailingBlanks(String options) {
        String words = "compare " + LIFT + " " + options;
        Run run = Run.of(words.strip().split(" "));
        assertThat(run.err()).isEmpty();
        assertThat(run.out().lines())
                .hasSizeGreaterThan(40)
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80))
                .allSatisfy(line -> assertThat(line).isEqualTo(line.stripTrailing()));
        assertThat(run.out()).doesNotContain("null", "NaN", "Optional");
    }

    @Test
    void theTableOfProgramsHasALineADevice() {
        List<String> lines = Run.of("compare", LIFT, "--csv").out().lines().toList();
        assertThat(lines).hasSize(8);
        assertThat(lines.get(0)).startsWith("device,stated,changed,ratio,decision,no_solution,mass_kg,");
        assertThat(lines.get(5)).startsWith("helium can,");
    }

    @Test
    void leavesWithThreeWhereADeviceMissesALimit() {
        assertThat(Run.of("compare", LIFT).code()).isEqualTo(3);
        assertThat(Run.of("compare", LIFT, "--set", "accept={rejection: 5 dB}").code())
                .isZero();
    }

    @Test
    void wrongWordsAreToldInPlain() {
        assertThat(Run.of("compare", LIFT, "--equal", "massy").err())
                .contains("'massy' is no named quantity; known are torque, mass,");
        assertThat(Run.of("compare", LIFT, "--by", "hair.density").err()).contains("--by goes with --equal");
        Run typo = Run.of("compare", LIFT, "--equal", "mass", "--by", "hair.densty");
        assertThat(typo.code()).isEqualTo(2);
        assertThat(typo.err()).contains("--by hair.densty: unknown key").contains("did you mean hair.density?");
        Run none = Run.of("compare", "no such file.yaml", LIFT);
        assertThat(none.code()).isEqualTo(2);
        assertThat(none.out()).isEmpty();
    }

    /** A limit on any named quantity stands in the main answer, in its sense, and decides with the others. */
    @Test
    void limitsOnOtherQuantitiesAreToldOneByOne() {
        Run run = Run.of("bands", LIFT);
        assertThat(run.code()).isEqualTo(3);
        assertThat(run.out())
                .contains("  resonance               meets: required at least 470.0 Hz, found 518.7 Hz")
                .contains("  bending-ratio           meets: required at least 10.00, found 56.72")
                .contains("  noise                   meets: required at most 1.177e-04 m/s2/rtHz");
        Map<String, Object> verdict =
                Json.object(answer("bands", LIFT, "--json").get("verdict"));
        Map<String, Object> resonance = Json.objects(verdict.get("limits")).get(2);
        assertThat(resonance.get("limit")).isEqualTo("resonance");
        assertThat(resonance.get("sense")).isEqualTo("at-least");
        assertThat((double) resonance.get("required")).isEqualTo(470.0);
        assertThat(resonance.get("decision")).isEqualTo("meets");
    }

    /** Each slope against the rejection of the study with that number half a per cent up and down. */
    @ParameterizedTest
    @CsvSource({
        "hair.diameter, 88, um",
        "hair.length, 780, um",
        "hair.density, 1.37, g/cm3",
        "medium.pressure, 99.2, kPa"
    })
    void whatToTightenFirstIsWhatHappens(String key, double value, String unit) {
        Map<String, Object> answer = answer("bands", LIFT, "--json");
        Map<String, Object> found = Json.objects(answer.get("sensitivities")).stream()
                .filter(one -> one.get("number").equals(key))
                .findFirst()
                .orElseThrow();
        Map<String, Object> slope = Json.objects(found.get("slopes")).get(1);
        assertThat((double) slope.get("frequency_hz")).isEqualTo(90.0);
        double up = rejection(key + "=" + 1.005 * value + " " + unit);
        double down = rejection(key + "=" + value / 1.005 + " " + unit);
        double wanted = (up - down) * Math.log(1.01) / (2.0 * Math.log(1.005));
        assertThat((double) slope.get("rejection_db_per_percent"))
                .isCloseTo(wanted, within(2e-5 * Math.abs(wanted) + 5e-7));
    }

    private static double rejection(String setting) {
        Map<String, Object> answer = answer("bands", LIFT, "--json", "--frequencies", "90 Hz", "--set", setting);
        return (double) Json.objects(answer.get("points")).get(0).get("rejection_db");
    }

    @Test
    void slopesStandUnderWhyAndAlwaysInTheJson() {
        assertThat(Run.of("bands", LIFT).out()).doesNotContain("What to tighten first");
        assertThat(Run.of("bands", LIFT, "--why").out()).contains("What to tighten first", "hair.diameter  ");
        assertThat(Json.objects(
                        answer("bands", LIFT, "--json", "--set", "cover=sealed").get("sensitivities")))
                .isEmpty();
    }

    /** What is drawn is what is told: least rejections of the curves are not below those of the figures. */
    @Test
    void theChartDrawsEveryDeviceThatHasACurve(@TempDir Path folder) throws IOException {
        Map<String, Object> answer = answer("compare", LIFT, "--json", "--chart", folder.toString());
        assertThat(Files.exists(folder.resolve("compare-rejection.svg"))).isTrue();
        assertThat(Files.size(folder.resolve("compare-rejection.png"))).isGreaterThan(10_000);
        List<String> table = Files.readAllLines(folder.resolve("compare-rejection.csv"));
        assertThat(table.get(0)).contains("frequency_hz,rejection_db");
        for (Map<String, Object> device : Json.objects(answer.get("devices"))) {
            String name = device.get("name").equals(LIFT) ? "as it stands" : (String) device.get("name");
            Object least = figures(device).get("least_rejection_db");
            List<Double> drawn = table.stream()
                    .filter(line -> line.startsWith(name + ","))
                    .map(line -> line.substring(line.lastIndexOf(',') + 1))
                    .filter(text -> !text.isEmpty())
                    .map(Double::valueOf)
                    .toList();
            if (least == null) {
                assertThat(drawn).isEmpty();
            } else {
                assertThat(drawn).hasSizeGreaterThan(20);
                assertThat(drawn.stream().mapToDouble(Double::doubleValue).min().orElseThrow())
                        .isCloseTo((double) least, within(1e-6));
            }
        }
    }

    @Test
    void theReportHasASectionOfVariants(@TempDir Path folder) throws IOException {
        Path page = folder.resolve("lift.html");
        assertThat(Run.of("report", LIFT, "--out", page.toString()).code()).isEqualTo(3);
        String text = Files.readString(page);
        assertThat(text).contains("id=\"variants\"", "silicon post", "helium can", "chart-compare-rejection");
    }
}
