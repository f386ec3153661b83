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

/** Commands as a user runs them: exit codes, where text goes, what wrong words are told. */
class CommandLineTest {
    private static final String AIR = "examples/workbench-air/study.yaml";
    private static final String WATER = "examples/water-tank/study.yaml";

    @TempDir
    Path folder;

    @ParameterizedTest
    @ValueSource(strings = {"bands", "lid", "fill", "cylinder", "media", "check", "start"})
    void everyCommandHasHelpWithAnExample(String command) {
        Run run = Run.of(command, "--help");
        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("Usage: flowshy " + command).contains("Example");
        assertThat(run.err()).isEmpty();
    }

    @Test
    void aMissingOrUnknownCommandIsUsage() {
        assertThat(Run.of().code()).isEqualTo(2);
        Run run = Run.of("band", AIR);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("bands").doesNotContain("Exception");
        assertThat(run.out()).isEmpty();
    }

    @Test
    void exitCodeTellsTheVerdict() {
        assertThat(Run.of("bands", AIR).code()).isZero();
        assertThat(Run.of("bands", WATER).code()).isEqualTo(3);
        assertThat(Run.of("bands", WATER, AIR).code()).isEqualTo(3);
        assertThat(Run.of("bands", WATER, AIR, "missing.yaml").code()).isEqualTo(2);
    }

    @Test
    void severalStudiesGiveOneArray() {
        Run run = Run.of("bands", AIR, WATER, "--json");
        List<Map<String, Object>> answers = Json.objects(Json.parse(run.out()));
        assertThat(answers).hasSize(2);
        assertThat(Json.object(answers.get(0).get("verdict"))).containsEntry("decision", "meets");
        assertThat(Json.object(answers.get(1).get("verdict"))).containsEntry("decision", "fails");
    }

    @Test
    void jsonBeforeTheStudyDoesNotSwallowIt() {
        Run run = Run.of("bands", "--json", AIR);
        assertThat(run.code()).isZero();
        assertThat(Json.object(Json.parse(run.out())))
                .containsKeys("study", "taken_as", "medium", "device", "bands", "points", "caveats", "verdict");
    }

    @Test
    void frequenciesAreEvaluatedInTheirOrder() {
        Run run = Run.of("bands", AIR, "--json", "--frequencies", "320 Hz, 0.08 kHz");
        List<Map<String, Object>> points =
                Json.objects(Json.object(Json.parse(run.out())).get("points"));
        assertThat(points).extracting(point -> point.get("frequency_hz")).containsExactly(320.0, 80.0);
        Run wrong = Run.of("bands", AIR, "--frequencies", "80 Hz, 320 um");
        assertThat(wrong.code()).isEqualTo(2);
        assertThat(wrong.err()).contains("320 um").contains("frequency");
    }

    @Test
    void settingsAreRecordedAndCheckedLikeTheFile() {
        Run run = Run.of("bands", AIR, "--json", "--set", "hair.diameter=80 um");
        Map<String, Object> answer = Json.object(Json.parse(run.out()));
        assertThat(Json.object(answer.get("study")).get("set")).isEqualTo(List.of("hair.diameter=80 um"));
        assertThat((double) Json.object(answer.get("device")).get("largest_diameter_m"))
                .isEqualTo(80e-6);
        Run wrong = Run.of("bands", AIR, "--set", "hair.diameter=80 kg");
        assertThat(wrong.code()).isEqualTo(2);
        assertThat(wrong.err()).contains("--set hair.diameter").contains("80 kg");
    }

    @Test
    void problemsComeAsJsonOnStandardError() throws IOException {
        Path study = folder.resolve("wrong.yaml");
        Files.writeString(
                study, "hair: {shape: cylinder, length: 500 um, diametre: 60 um, density: 1 g/cm3}\nmedium: air\n");
        Run run = Run.of("bands", study.toString(), "--json");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        List<Map<String, Object>> problems =
                Json.objects(Json.object(Json.parse(run.err())).get("problems"));
        assertThat(problems)
                .anySatisfy(problem -> assertThat(problem)
                        .containsEntry("line", 1.0)
                        .containsEntry("key", "hair.diametre")
                        .containsEntry("nearest", "hair.diameter"));
    }

    @Test
    void answersGoToFilesWhole() throws IOException {
        Path json = folder.resolve("answer.json");
        Path csv = folder.resolve("answer.csv");
        Run run = Run.of("bands", AIR, "--json", json.toString(), "--csv", csv.toString());
        assertThat(run.code()).isZero();
        assertThat(run.out()).startsWith("Flowshy ");
        assertThat(Json.object(Json.parse(Files.readString(json)))).containsKey("verdict");
        List<String> lines = Files.readAllLines(csv);
        assertThat(lines).hasSize(402);
        assertThat(lines.get(0)).startsWith("frequency_hz,rejection_db,finite_length_db,motion_rad_per_m_s2");
        Run blocked = Run.of(
                "bands", AIR, "--json", folder.resolve("none/answer.json").toString());
        assertThat(blocked.code()).isEqualTo(2);
        assertThat(blocked.err()).contains("cannot write").doesNotContain("\tat ");
    }

    @Test
    void csvAndJsonAgreeOnEveryFigure() {
        Run json = Run.of("bands", AIR, "--json", "--frequencies", "100 Hz");
        Run csv = Run.of("bands", AIR, "--csv", "--frequencies", "100 Hz");
        String[] lines = csv.out().split("\n", -1);
        String[] names = lines[0].split(",", -1);
        String[] fields = lines[1].split(",", -1);
        Map<String, Object> point =
                Json.objects(Json.object(Json.parse(json.out())).get("points")).get(0);
        int compared = 0;
        for (int i = 0; i < names.length; i++) {
            if (!fields[i].isEmpty()) {
                assertThat(Double.parseDouble(fields[i])).isEqualTo(point.get(names[i]));
                compared++;
            }
        }
        assertThat(compared).isGreaterThan(8);
    }

    @Test
    void theSmallestStudyPrintsItsDefaults() throws IOException {
        Path study = folder.resolve("small.yaml");
        Files.writeString(
                study, "hair: {shape: cylinder, length: 500 um, diameter: 60 um, density: 1.2 g/cm3}\nmedium: air\n");
        Run run = Run.of("bands", study.toString());
        assertThat(run.code()).isZero();
        assertThat(run.out())
                .contains("Decision: not-asked")
                .contains("20 degC", "101.325 kPa", "50 %", "1 Hz", "10 kHz", "20 dB")
                .contains("suspension              not stated: torques and bands")
                .doesNotContain("rad/(m/s2)");
        Map<String, Object> answer = Json.object(
                Json.parse(Run.of("bands", study.toString(), "--json").out()));
        Map<String, Object> point = Json.objects(answer.get("points")).get(0);
        assertThat(point).containsEntry("motion_rad_per_m_s2", null).containsKey("motion_rad_per_m_s2_reason");
        assertThat(Json.objects(answer.get("points"))).hasSize(41);
    }

    @Test
    void aHairAsDenseAsItsSealedFillReadsNothing() {
        Run run = Run.of(
                "bands",
                WATER,
                "--json",
                "--set",
                "cover=sealed",
                "--set",
                "hair.density=998.6 kg/m3",
                "--set",
                "suspension.resonance={frequency: 220 Hz, in: vacuum}",
                "--set",
                "suspension.quality={value: 1.4, in: vacuum}");
        Map<String, Object> answer = Json.object(Json.parse(run.out()));
        assertThat(Json.objects(answer.get("bands")))
                .singleElement()
                .satisfies(band -> assertThat(band).containsEntry("reads", "nothing"));
        assertThat(run.code()).isEqualTo(3);
    }

    @Test
    void cylinderFactorsMultiplyOut() {
        Run run = Run.of("cylinder", AIR, "--at", "400 um", "--frequencies", "80 Hz", "--limits", "--json");
        Map<String, Object> strip =
                Json.objects(Json.object(Json.parse(run.out())).get("points")).get(0);
        double rho = (double) Json.object(
                        Json.object(Json.parse(Run.of("bands", AIR, "--json").out()))
                                .get("medium"))
                .get("density_kg_m3");
        double displaced = rho * Math.PI * 52.5e-6 * 52.5e-6;
        double omega = 2.0 * Math.PI * 80.0;
        assertThat((double) strip.get("added_mass_kg_m"))
                .isCloseTo(displaced * (double) strip.get("gamma_real"), within(1e-18));
        assertThat((double) strip.get("damping_n_s_m2"))
                .isCloseTo(-omega * displaced * (double) strip.get("gamma_imaginary"), within(1e-14));
        assertThat((double) strip.get("thin_hair_relative_error")).isBetween(0.01, 0.3);
        assertThat(Run.of("cylinder", AIR, "--frequencies", "80 Hz").code()).isEqualTo(2);
        assertThat(Run.of("cylinder", AIR, "--at", "2 mm", "--frequencies", "80 Hz")
                        .err())
                .contains("beyond the hair");
        assertThat(Run.of("cylinder", "--diameter", "80 um", "--medium", "air", "--frequencies", "80 Hz")
                        .code())
                .isZero();
    }

    @Test
    void mediaListsAndPrintsWithSources() {
        Run list = Run.of("media");
        assertThat(list.code()).isZero();
        assertThat(list.out())
                .contains("air", "nitrogen", "oxygen", "argon", "helium", "hydrogen", "carbon dioxide")
                .contains("sulfur hexafluoride", "water");
        Run one = Run.of("media", "air", "--temperature", "22 degC", "--humidity", "45 %");
        assertThat(one.out())
                .contains("density", "viscosity", "kinematic viscosity", "sound speed", "mean free path", "CIPM-2007");
        Run unknown = Run.of("media", "heliun");
        assertThat(unknown.code()).isEqualTo(2);
        assertThat(unknown.err()).contains("helium");
        assertThat(Run.of("media", "water", "--temperature", "120 degC").code()).isEqualTo(2);
    }

    @ParameterizedTest
    @ValueSource(strings = {"cylinder", "taper", "club", "profile"})
    void whatStartWritesPassesCheckAndBands(String shape) {
        for (String cover : List.of("open", "sealed")) {
            Path study = folder.resolve(shape + "-" + cover + ".yaml");
            assertThat(Run.of("start", "--shape", shape, "--cover", cover, study.toString())
                            .code())
                    .isZero();
            Run check = Run.of("check", study.toString());
            assertThat(check.code()).as(check.err()).isZero();
            Run bands = Run.of("bands", study.toString());
            assertThat(bands.code()).as(bands.err()).isIn(0, 3);
        }
    }

    @Test
    void startNeverWritesOver() throws IOException {
        Path study = folder.resolve("mine.yaml");
        Files.writeString(study, "precious");
        Run run = Run.of("start", study.toString());
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("exists");
        assertThat(study).hasContent("precious");
        assertThat(Run.of("start", "--shape", "cone").code()).isEqualTo(2);
    }

    @Test
    void checkSaysWhatItUnderstood() {
        Run run = Run.of("check", AIR);
        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("105 um").contains("0.000105 m");
        assertThat(Run.of("check", "--keys").out())
                .contains("hair.diameter", "suspension.quality", "cover", "tolerances", "envelope", "variants")
                .doesNotContain("not built yet");
        assertThat(Json.object(Json.parse(Run.of("check", "--schema").out()))).containsKey("properties");
        assertThat(Run.of("check").code()).isEqualTo(2);
    }

    /** The package of the example as it is pumped out: the rejection grows until the slip law ends, and the answer says so. */
    @Test
    void rejectionGrowsAsThePressureFallsUntilTheModelEnds() {
        double before = 0.0;
        for (String pressure : List.of("100 kPa", "40 kPa", "15 kPa", "6 kPa")) {
            Run run = Run.of(
                    "bands", "examples/vacuum-package/study.yaml", "--json", "--set", "medium.pressure=" + pressure);
            Map<String, Object> least =
                    Json.object(Json.object(Json.parse(run.out())).get("least_rejection"));
            double rejection = (double) least.get("rejection_db");
            assertThat(rejection).isGreaterThan(before + 2.0);
            before = rejection;
        }
        Run ended = Run.of("bands", "examples/vacuum-package/study.yaml", "--json", "--set", "medium.pressure=1 kPa");
        Map<String, Object> answer = Json.object(Json.parse(ended.out()));
        assertThat(Json.objects(answer.get("bands")))
                .singleElement()
                .satisfies(band -> assertThat(band).containsEntry("reads", "undecided"));
        assertThat(ended.code()).isEqualTo(3);
        assertThat(ended.out()).contains("the slip law ends at 0.1");
    }

    @Test
    void aVerdictThatRestsOnAValueFromMemorySaysSo() {
        Run oil = Run.of("bands", WATER, "--set", "medium={name: silicone oil, grade: 10 cSt, temperature: 18 degC}");
        assertThat(oil.out().replaceAll("\\s+", " "))
                .contains("It rests on a density and a viscosity recalled from memory.");
        assertThat(Run.of("bands", WATER).out()).doesNotContain("recalled from memory");
    }

    /** Words between bars: the command line, and what its refusal names. */
    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "media|air|--temperature|-300 degC; a temperature of 1 K to 3000 K",
                "media|air|--pressure|0 Pa; a pressure of 1 mPa to 1 GPa",
                "media|air|--humidity|-5 %; a share of 0 % to 100 %",
                "media|sea water|--salinity|NaN; NaN is not a finite number",
                "media|sea water|--salinity|35 g/kg; a pure number is wanted",
                "media|silicone oil|--grade|0 cSt; of 0.1 cSt to 1e6 cSt",
                "media|nitrogen|--share|10 %; --second",
                "cylinder|--diameter|0 um|--medium|air|--frequencies|80 Hz; a length of 10 nm to 1 m",
                "cylinder|--diameter|1e300 um|--medium|air|--frequencies|80 Hz; a length of 10 nm to 1 m",
                "bands|examples/workbench-air/study.yaml|--frequencies|0 Hz; a frequency of 1 mHz to 10 MHz",
                "bands|examples/workbench-air/study.yaml|--frequencies|1e99 Hz; a frequency of 1 mHz to 10 MHz",
                "bands|examples/workbench-air/study.yaml|--frequencies|; nothing",
                "bands|examples/workbench-air/study.yaml|--set|nonsense; no KEY=VALUE",
                "bands|examples/workbench-air/study.yaml|--set|=; no KEY=VALUE",
                "bands|examples/workbench-air/study.yaml|--set|hair=; a group of keys",
                "bands|examples/workbench-air/study.yaml|--set|a.b.c=3; unknown key",
                "fill|examples/workbench-air/study.yaml|--only|oi, water; no fill begins so",
                "lid|examples/workbench-air/study.yaml|--set|candidates=[]; one to 50",
            })
    void nonsenseIsRefusedInPlainWords(String words, String named) {
        Run run = Run.of(words.split("\\|", -1));
        assertThat(run.code()).as(run.err()).isEqualTo(2);
        assertThat(run.err()).contains(named).doesNotContain("Exception", "\tat ", "double", "java.");
        assertThat(run.out()).isEmpty();
    }

    @Test
    void problemsOfSeveralStudiesAreOneJson() throws IOException {
        Path one = Files.writeString(folder.resolve("one.yaml"), "hair: 3\nmedium: air\n");
        Path two = Files.writeString(folder.resolve("two.yaml"), "medium: air\n");
        Run run = Run.of("bands", one.toString(), AIR, two.toString(), "--json");
        assertThat(run.code()).isEqualTo(2);
        assertThat(Json.objects(Json.object(Json.parse(run.err())).get("problems")))
                .extracting(problem -> problem.get("file"))
                .containsExactly(one.toString(), two.toString());
        assertThat(Json.objects(Json.parse(run.out()))).hasSize(1);
    }

    @Test
    void aFileThatCannotBeWrittenIsToldWithTheReason() throws IOException {
        Path none = folder.resolve("none");
        assertThat(Run.of("bands", AIR, "--csv", none.resolve("a.csv").toString())
                        .err())
                .contains("cannot write")
                .contains("there is no folder " + none);
        assertThat(Run.of("start", none.resolve("a.yaml").toString()).err()).contains("there is no folder " + none);
        Path directory = Files.createDirectory(folder.resolve("d.csv"));
        assertThat(Run.of("bands", AIR, "--csv", directory.toString()).err()).contains("it is a folder");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "check examples/own-oil/study.yaml",
                "check --keys",
                "media",
                "media air",
                "surroundings",
                "cylinder examples/air-duct/study.yaml --at 200um --frequencies 80Hz",
                "--help",
                "fill --help",
                "media --help"
            })
    void everyPageFitsEightyColumns(String words) {
        Run run = Run.of(words.split(" ", -1));
        assertThat(run.code()).as(run.err()).isZero();
        assertThat(run.out().lines())
                .isNotEmpty()
                .allSatisfy(line ->
                        assertThat(line.codePointCount(0, line.length())).isLessThanOrEqualTo(80));
    }
}
