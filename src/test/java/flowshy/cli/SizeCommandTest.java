package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.study.StudyReader;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.analysis.solvers.BisectionSolver;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Sizings as a user asks for them, against bisection on the study read anew for every number. */
class SizeCommandTest {
    private static final String STUDY = "examples/workbench-air/study.yaml";
    private static final String STRIPS = "finite-length=off";

    @TempDir
    Path folder;

    private static Run size(String study, String... more) {
        List<String> words = new ArrayList<>(List.of("size", study, "--set", STRIPS));
        words.addAll(List.of(more));
        return Run.of(words.toArray(String[]::new));
    }

    private static Map<String, Object> answer(Run run) {
        return Json.object(Json.parse(run.out()));
    }

    /** The figure of the study with other numbers, nothing of the sizing's own machinery in between. */
    private static double figure(Figure figure, String... settings) {
        List<String> all = new ArrayList<>(List.of(STRIPS));
        all.addAll(List.of(settings));
        return figure.of(new Evaluated(StudyReader.read(Path.of(STUDY), all).question()))
                .number()
                .orElseThrow();
    }

    private static double diameter(double margin, String... settings) {
        List<String> all = new ArrayList<>(List.of(settings));
        all.add("");
        return new BisectionSolver(1e-11, 1e-15)
                .solve(
                        200,
                        x -> {
                            all.set(all.size() - 1, "hair.diameter=" + x + " m");
                            return figure(Figure.LEAST_REJECTION, all.toArray(String[]::new)) - margin;
                        },
                        1e-5,
                        2e-4);
    }

    @Test
    void theThinnestHairIsThatOfBisection() {
        double expected = diameter(20.0);
        Map<String, Object> answer =
                answer(size(STUDY, "--vary", "hair.diameter", "--to", "minimize", "mass", "--json"));
        Map<String, Object> number = Json.objects(answer.get("numbers")).get(0);
        double found = (double) number.get("hair_diameter_m");
        assertThat(answer).containsEntry("fits", true);
        assertThat(found).isCloseTo(expected, within(1e-5 * expected)).isGreaterThanOrEqualTo(expected);
        Map<String, Object> limit = Json.objects(answer.get("limits")).get(0);
        assertThat(limit).containsEntry("binds", true).containsEntry("keeps", true);
        // m ∝ d², so the price of a decibel is 2 m/d dd/dR, here by two more bisections
        double mass = (double) answer.get("mass_kg");
        double price = 2.0 * mass / found * (diameter(20.1) - diameter(19.9)) / 0.2;
        assertThat((double) limit.get("mass_kg_per_limit")).isCloseTo(price, within(1e-3 * price));
        // and a number of the other end: the slope of the mass along the diameter
        assertThat((double) number.get("mass_kg_per_hair_diameter_m"))
                .isCloseTo(2.0 * mass / found, within(1e-4 * mass / found));
    }

    /** The device before and after, each as bands finds it; the sized one comes down to the margin. */
    @Test
    void drawsTheDeviceBeforeAndAfter() {
        Map<String, Object> answer = answer(size(
                STUDY, "--vary", "hair.diameter", "--to", "minimize", "mass", "--json", "--chart", folder.toString()));
        Map<String, Object> chart = Json.objects(answer.get("charts")).get(0);
        assertThat(chart).containsEntry("name", "size-rejection");
        assertThat(folder.resolve("size-rejection.svg")).isNotEmptyFile();
        double diameter = (double) Json.objects(answer.get("numbers")).get(0).get("hair_diameter_m");
        Map<String, List<Map<String, Object>>> drawn = new LinkedHashMap<>();
        Json.objects(chart.get("rows"))
                .forEach(row -> drawn.computeIfAbsent((String) row.get("label"), label -> new ArrayList<>())
                        .add(row));
        assertThat(drawn).hasSize(2);
        List<String> settings = List.of("hair.diameter=105 um", "hair.diameter=" + diameter + " m");
        int device = 0;
        for (List<Map<String, Object>> rows : drawn.values()) {
            double least = rows.stream()
                    .filter(row -> (double) row.get("frequency_hz") >= 25.0)
                    .filter(row -> (double) row.get("frequency_hz") <= 500.0)
                    .mapToDouble(row -> (double) row.get("rejection_db"))
                    .min()
                    .orElseThrow();
            assertThat(least).isCloseTo(figure(Figure.LEAST_REJECTION, settings.get(device)), within(1e-9));
            device++;
        }
        assertThat(drawn.keySet()).first().isEqualTo("as it stands");
        assertThat(drawn.keySet())
                .last()
                .asString()
                .startsWith("hair.diameter ")
                .endsWith(" µm");
    }

    /** What bands itself finds, under a limit it is sure to state. */
    private static double byBands(String study, String key, double value, String... settings) {
        List<String> words = new ArrayList<>(List.of("bands", study, "--json", "--set", key + "=" + value + " m"));
        for (String setting : settings) {
            words.addAll(List.of("--set", setting));
        }
        Map<String, Object> verdict =
                Json.object(answer(Run.of(words.toArray(String[]::new))).get("verdict"));
        Map<String, Object> limit = Json.objects(verdict.get("limits")).get(0);
        assertThat(limit).containsEntry("limit", "rejection");
        return (double) limit.get("found");
    }

    /** The search goes by an estimate, the answer is that of bands: against bisection of what bands prints, the whole hair solved. */
    @Tag("long")
    @ParameterizedTest
    @CsvSource({
        "workbench-air, hair.diameter, hair_diameter_m, 20, 7.5e-5, 7.8e-5, finite-length=auto",
        "vacuum-package, hair.base-diameter, hair_base_diameter_m, 24, 1.0e-4, 1.04e-4, finite-length=auto",
        "helium-can, hair.head-diameter, hair_head_diameter_m, 21, 2.84e-4, 2.92e-4, cover=open"
    })
    void theWholeHairMeetsItsLimitAsByBisectionOfBands(
            String example, String key, String column, double margin, double low, double high, String setting) {
        String study = "examples/" + example + "/study.yaml";
        String limit = "accept.rejection=" + margin + " dB";
        double expected = new BisectionSolver(1e-6, 1e-12)
                .solve(60, x -> byBands(study, key, x, limit, setting) - margin, low, high);
        Map<String, Object> answer = answer(Run.of(
                "size", study, "--vary", key, "--to", "minimize", "mass", "--json", "--set", limit, "--set", setting));
        assertThat(answer)
                .containsEntry("fits", true)
                .containsEntry("keeps", true)
                .containsEntry("settled", true)
                .containsEntry("finite_length", "auto")
                .containsEntry("searched_by", "estimate");
        double found = (double) Json.objects(answer.get("numbers")).get(0).get(column);
        assertThat(found).isCloseTo(expected, within(1e-5 * expected));
        assertThat(byBands(study, key, found, limit, setting)).isGreaterThanOrEqualTo(margin);
        Map<String, Object> kept = Json.objects(answer.get("limits")).get(0);
        assertThat(kept).containsEntry("binds", true).containsEntry("keeps", true);
        assertThat((double) kept.get("found")).isCloseTo(margin, within(1e-3));
        // the estimate alone would have stopped elsewhere
        List<Map<String, Object>> rounds = Json.objects(answer.get("rounds"));
        assertThat(rounds).hasSizeBetween(2, 6);
        assertThat((double) rounds.get(0).get(column)).isNotCloseTo(expected, within(1e-3 * expected));
    }

    /** Two numbers: at the density found no thinner hair meets the limit by bands, at others none is lighter. */
    @Tag("long")
    @Test
    void theWholeHairIsSizedInTwoNumbers() {
        String density = "hair.density=1 g/cm3..8 g/cm3";
        Map<String, Object> answer = answer(Run.of(
                "size",
                STUDY,
                "--vary",
                "hair.diameter,hair.density",
                "--within",
                density,
                "--within",
                "hair.diameter=20 um..200 um",
                "--to",
                "minimize",
                "mass",
                "--json"));
        assertThat(answer).containsEntry("keeps", true).containsEntry("settled", true);
        double mass = (double) answer.get("mass_kg");
        double thin = (double) Json.objects(answer.get("numbers")).get(0).get("hair_diameter_m");
        double found = (double) Json.objects(answer.get("numbers")).get(1).get("hair_density_kg_m3");
        double alone = thinnest(found);
        assertThat(thin).isCloseTo(alone, within(1e-4 * alone));
        double volume = mass / (found * thin * thin);
        for (double other : List.of(1000.0, 0.97 * found, Math.min(8000.0, 1.03 * found))) {
            double diameter = thinnest(other);
            assertThat(mass).isLessThanOrEqualTo(volume * other * diameter * diameter * (1.0 + 1e-5));
        }
    }

    private static double thinnest(double density) {
        return new BisectionSolver(1e-5, 1e-12)
                .solve(
                        60,
                        x -> byBands(STUDY, "hair.diameter", x, "hair.density=" + density + " kg/m3") - 20.0,
                        2e-5,
                        1e-4);
    }

    @Test
    void theRoundsAreToldAndWhatTheSearchWentBy() {
        Run run = Run.of("size", STUDY, "--vary", "hair.diameter", "--to", "minimize", "mass");
        assertThat(run.code()).isZero();
        assertThat(run.out())
                .contains("auto (the whole hair solved", "searched by the estimate", "round 1", "(expected 20.0000 dB)")
                .contains("Another round would gain nothing that counts");
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    /** At 75.98 um the estimate has 20 dB, the whole hair 19.92 dB: within a range that ends just above nothing fits. */
    @Test
    void whatTheEstimateAloneKeepsIsNotCalledKept() {
        Run run = Run.of(
                "size",
                STUDY,
                "--vary",
                "hair.diameter",
                "--within",
                "hair.diameter=40 um..76.2 um",
                "--to",
                "minimize",
                "mass");
        assertThat(run.code()).isEqualTo(3);
        assertThat(run.out()).contains("nothing in these ranges keeps every limit", "found 19.956 dB: short by");
    }

    /** Least mass at a fixed range of lengths: for the length found, no thinner hair will do; for other lengths, no lighter one. */
    @Test
    void twoNumbersTogetherAreNoWorseThanEachAlone() {
        Map<String, Object> answer = answer(size(
                STUDY,
                "--vary",
                "hair.diameter,hair.density",
                "--within",
                "hair.density=1 g/cm3..8 g/cm3",
                "--within",
                "hair.diameter=10 um..200 um",
                "--to",
                "minimize",
                "mass",
                "--json"));
        assertThat(answer).containsEntry("fits", true);
        double mass = (double) answer.get("mass_kg");
        double best = Double.POSITIVE_INFINITY;
        for (String density : List.of("1", "1.5", "2", "3", "5", "8")) {
            String set = "hair.density=" + density + " g/cm3";
            double thin = diameter(20.0, set);
            best = Math.min(best, figure(Figure.MASS, set, "hair.diameter=" + thin + " m"));
        }
        assertThat(mass).isLessThanOrEqualTo(best * (1.0 + 1e-5));
        Map<String, Object> density = Json.objects(answer.get("numbers")).get(1);
        double thin = diameter(20.0, "hair.density=" + density.get("hair_density_kg_m3") + " kg/m3");
        assertThat((double) Json.objects(answer.get("numbers")).get(0).get("hair_diameter_m"))
                .isCloseTo(thin, within(1e-4 * thin));
    }

    @Test
    void theSizedStudyIsWrittenAndMeetsItsLimits() throws IOException {
        Path own = folder.resolve("own.yaml");
        Files.writeString(own, Files.readString(Path.of(STUDY)) + "finite-length: off\n");
        Path sized = folder.resolve("sized.yaml");
        Run run = Run.of(
                "size",
                own.toString(),
                "--vary",
                "hair.diameter",
                "--to",
                "minimize",
                "mass",
                "--write",
                sized.toString());
        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isZero();
        List<String> before = Files.readAllLines(own);
        List<String> after = Files.readAllLines(sized);
        assertThat(after).hasSameSizeAs(before);
        for (int i = 0; i < before.size(); i++) {
            if (before.get(i).contains("diameter")) {
                assertThat(after.get(i)).matches("  diameter: 6\\d\\.\\d+ um");
            } else {
                assertThat(after.get(i)).isEqualTo(before.get(i));
            }
        }
        assertThat(Run.of("bands", sized.toString()).code()).isZero();
        assertThat(size(STUDY, "--vary", "hair.diameter", "--to", "minimize", "mass", "--write", sized.toString())
                        .err())
                .contains("without --set");
    }

    @Test
    void whatCannotBeKeptIsToldWithHowNearOneGets() {
        Run run = size(
                STUDY, "--vary", "hair.diameter", "--within", "hair.diameter=20 um..50 um", "--to", "minimize", "mass");
        assertThat(run.code()).isEqualTo(3);
        double nearest = figure(Figure.LEAST_REJECTION, "hair.diameter=50 um");
        assertThat(run.out())
                .contains("nothing in these ranges keeps every limit", "50 um", "the upper end of its", "short by")
                .contains(String.format(java.util.Locale.ROOT, "%.3f dB", nearest));
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    @Test
    void oneSeedOneAnswer() {
        String[] words = {
            "--vary", "hair.diameter,hair.length", "--to", "maximize", "sensitivity", "--csv", "--seed", "5"
        };
        Run one = size(STUDY, words);
        assertThat(one.code()).isZero();
        assertThat(one.out()).startsWith("kind,name,unit,value").contains("limit,least-rejection,dB");
        assertThat(size(STUDY, words).out()).isEqualTo(one.out());
    }

    @Test
    void theAnswerDoesNotDependOnTheThreads() {
        String[] words = {"--vary", "hair.diameter,hair.density", "--to", "minimize", "mass", "--threads", "1"};
        Run one = size(STUDY, words);
        words[words.length - 1] = "3";
        assertThat(one.code()).isZero();
        assertThat(size(STUDY, words).out()).isEqualTo(one.out());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "hair.diametr | minimize mass | | did you mean hair.diameter?",
                "hair.shape | minimize mass | | not a number",
                "hair.diameter,hair.diameter | minimize mass | | named twice",
                "hair.diameter | shrink mass | | minimize or maximize",
                "hair.diameter | minimize weight | | one of mass",
                "hair.diameter | minimize error | | no surroundings are given",
                "hair.diameter | minimize mass | --within hair.length=1mm..2mm | not among the numbers of --vary",
                "hair.diameter | minimize mass | --within hair.diameter=2mm..1mm | upside down",
                "hair.diameter | minimize mass | --within hair.diameter=2Hz..3Hz | a length is wanted here",
                "hair.diameter | minimize mass | --within hair.diameter=2um | is no KEY=A..B"
            })
    void wrongWordsAreToldPlainly(String vary, String to, String more, String told) {
        List<String> words = new ArrayList<>(List.of("--vary", vary, "--to"));
        words.addAll(List.of(to.split(" ", -1)));
        if (more != null) {
            words.addAll(List.of(more.split(" ", -1)));
        }
        Run run = size(STUDY, words.toArray(String[]::new));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(told).doesNotContain("\tat ");
    }
}
