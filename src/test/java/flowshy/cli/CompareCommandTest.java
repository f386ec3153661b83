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

    @TempDir
    Path folder;

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
        // a roof changes no torque: there is nothing to be scaled, so no number is needed
        assertThat(devices.get(3)).doesNotContainKey("no_solution").containsKey("verdict");
        assertThat(Json.object(devices.get(3).get("scaled")).get("ratio")).isEqualTo(1.0);
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

    private String study(String... lines) throws IOException {
        Path file = folder.resolve("own.yaml");
        Files.writeString(file, """
                hair: {shape: cylinder, length: 710 um, diameter: 92 um, density: 1.21 g/cm3}
                suspension: {resonance: {frequency: 380 Hz, in: vacuum}, quality: {value: 6, in: vacuum}}
                medium: air
                finite-length: off
                band: {from: 20 Hz, to: 300 Hz}
                """ + String.join("\n", lines) + "\n");
        return file.toString();
    }

    private static String decision(Map<String, Object> device) {
        return (String) Json.object(device.get("verdict")).get("decision");
    }

    /** A comparison is asked to find a device that does it: 22.4 dB as it stands, 27.9 dB at 140 um, 18.9 dB at 70 um. */
    @ParameterizedTest
    @CsvSource({"rejection: 19 dB, 0", "rejection: 25 dB, 0", "rejection: 30 dB, 3", ", 0"})
    void leavesWithThreeWhereNoDeviceMeetsEveryLimit(String limit, int code) throws IOException {
        String study = study(
                limit == null ? "" : "accept: {" + limit + "}",
                "variants: {thick: {hair: {diameter: 140 um}}, thin: {hair: {diameter: 70 um}}}");
        assertThat(Run.of("compare", study).code()).isEqualTo(code);
        assertThat(answer("compare", study, "--json").get("decision"))
                .isEqualTo(code == 3 ? "fails" : limit == null ? "not-asked" : "meets");
    }

    /** Scaled until it is the first one, a device is judged at every state that the first one is judged at. */
    @ParameterizedTest
    @ValueSource(strings = {"--equal mass", "--equal mass --by hair.diameter", "--equal torque --by hair.density"})
    void whatIsMadeEqualBearsTheSameStates(String words) throws IOException {
        String study = study(
                "accept: {rejection: 22.4 dB}",
                "envelope: {medium.temperature: [-20 degC, 80 degC]}",
                "variants: {alike: {hair: {foot-gap: 1 um}}, thick: {hair: {diameter: 140 um}}}");
        String bare = Files.readString(Path.of(study)).replaceAll("envelope: .*", "");
        List<Map<String, Object>> scaled = devices(("compare " + study + " --json " + words).split(" "));
        assertThat(scaled).hasSize(3);
        Map<String, Object> first = Json.object(scaled.get(0).get("verdict"));
        for (Map<String, Object> device : scaled.subList(0, 2)) {
            assertThat(Json.object(device.get("verdict")).get("sentence")).isEqualTo(first.get("sentence"));
            assertThat(decision(device)).isEqualTo("fails");
        }
        if (!words.contains("density")) {
            assertThat(Json.object(scaled.get(2).get("verdict")).get("sentence"))
                    .isEqualTo(first.get("sentence"));
        }
        Files.writeString(Path.of(study), bare);
        assertThat(decision(devices("compare", study, "--json").get(0))).isEqualTo("meets");
    }

    /** What is measured in a variant is measured on the base's hair, before and after it is scaled. */
    @Test
    void aMeasuredNumberThatIsScaledStandsInTheVariantAsTheAnswerSays() throws IOException {
        String variants = "variants: {club: {hair: {shape: club, stalk-diameter: 50 um, stalk-length: 500 um,"
                + " head-diameter: 130 um}, suspension: {resonance: {frequency: F Hz, in: vacuum}}}}";
        String study = study(variants.replace("F", "380"));
        Map<String, Object> before = devices("compare", study, "--json").get(1);
        List<Map<String, Object>> equal =
                devices("compare", study, "--json", "--equal", "resonance", "--by", "suspension.resonance.frequency");
        Map<String, Object> scaled = Json.object(equal.get(1).get("scaled"));
        assertThat((double) scaled.get("before_resonance_hz"))
                .isCloseTo((double) figures(before).get("resonance_hz"), within(1e-9));
        double wanted = (double) figures(equal.get(0)).get("resonance_hz");
        assertThat(Math.abs((double) scaled.get("before_resonance_hz") - wanted))
                .isGreaterThan(20.0);
        study(variants.replace("F", String.valueOf(380.0 * (double) scaled.get("ratio"))));
        assertThat((double) figures(devices("compare", study, "--json").get(1)).get("resonance_hz"))
                .isCloseTo(wanted, within(1e-6));
    }

    /** The springs of the base carry the club below 330 Hz in every state; measured on the club they would swing it at 378 Hz. */
    @Test
    void statesOfAVariantAreMeasuredOnTheBase() throws IOException {
        String study = study(
                "accept: {resonance: {at-most: 330 Hz}}",
                "envelope: {suspension.resonance.frequency: [380 Hz, 380.001 Hz]}",
                "variants: {club: {hair: {shape: club, stalk-diameter: 50 um, stalk-length: 500 um, head-diameter: 130 um}}}");
        List<Map<String, Object>> devices = devices("compare", study, "--json");
        assertThat(decision(devices.get(0))).isEqualTo("fails");
        assertThat(decision(devices.get(1))).isEqualTo("meets");
        assertThat((double) figures(devices.get(1)).get("resonance_hz")).isBetween(310.0, 330.0);
    }

    /** The same flow at the same frequency, whatever band or calibration each study has. */
    @Test
    void figuresAtAFrequencyAreThoseAtTheFrequencyOfTheFirst() throws IOException {
        String study = study("variants: {wide: {band: {from: 5 Hz, to: 3 kHz}}}");
        List<Map<String, Object>> devices = devices("compare", study, "--json");
        for (String figure : List.of("rejection_db", "sensitivity_rad_per_m_s2", "equivalent_m_s2_per_m_s")) {
            assertThat(figures(devices.get(1)).get(figure))
                    .isEqualTo(figures(devices.get(0)).get(figure));
        }
        assertThat(figures(devices.get(1)).get("rejection_db_at_hz")).isEqualTo(77.4596669241);
        String text = Run.of("compare", study).out().replaceAll("\\s+", " ");
        assertThat(text)
                .contains("equivalent at 77.46 Hz, that of A; the limits of B are judged at its own.")
                .contains("Bands of use differ: A 20.00 to 300.0 Hz; B 5.000 to 3000 Hz;");
    }

    @Test
    void whatIsHeldIsToldDeviceByDevice() throws IOException {
        String study = study(
                "variants: {tuned: {hold: resonance, hair: {diameter: 120 um}}, dense: {hair: {density: 2 g/cm3}}}");
        assertThat(Run.of("compare", study).out().replaceAll("\\s+", " "))
                .contains("own hair: stiffness (A, C), resonance (B), and the structural damping.");
        assertThat(Run.of("compare", study, "--hold", "resonance").out().replaceAll("\\s+", " "))
                .contains("own hair: resonance, and the structural damping.");
    }

    @Test
    void aNumberWithoutEffectIsNamed() throws IOException {
        String study = study("variants: {thick: {hair: {diameter: 140 um}}}");
        Run run = Run.of("compare", study, "--equal", "mass", "--by", "medium.temperature");
        assertThat(run.out().replaceAll("\\s+", " "))
                .contains("No solution: medium.temperature does not change its mass, which is 1.322e-08 kg;");
    }

    @Test
    void aStudyWithoutVariantsIsToldToStandAlone() throws IOException {
        assertThat(Run.of("compare", study()).out().replaceAll("\\s+", " "))
                .contains("equivalent at 77.46 Hz. Nothing stands beside it:");
        assertThat(Run.of("compare", LIFT).out()).doesNotContain("Nothing stands beside it");
    }

    /** Told where it stands, once, and not again for each variant. */
    @Test
    void aMistypedSettingIsToldOnce() {
        Run run = Run.of("compare", LIFT, "--set", "hair.diametre=90 um");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).startsWith("--set hair.diametre: unknown key").endsWith("1 problem\n");
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
