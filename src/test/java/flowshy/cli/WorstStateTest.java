package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code lid} and {@code fill} in every state of an envelope, each figure found again by {@code bands} on a study of that state alone. */
class WorstStateTest {
    private static final String HAIR = """
            hair: {length: 640 um, diameter: 120 um, density: 4.4 g/cm3}
            suspension: {stiffness: 50 nN.m/rad, damping: 2e-12 N.m.s/rad, plate-inertia: 2e-15 kg.m2}
            band: {from: 150 Hz, to: 900 Hz}
            calibration: {frequency: 300 Hz}
            """;
    private static final String OIL = "medium: {name: silicone oil, grade: 5 cSt, temperature: 25 degC}\n";
    private static final String SEALED = "{kind: sealed, fill: {name: helium, temperature: 20 degC, pressure: 1 bar}}";
    private static final String ROOFED = "{kind: roofed, gap: 0.8 mm, length: 4 mm}";
    private static final List<String> TEMPERATURES = List.of("-15 degC", "25 degC", "70 degC");
    private static final String ENVELOPE = "envelope: {medium.temperature: [-15 degC, 25 degC, 70 degC]}\n";

    @TempDir
    private static Path folder;

    private static String study(String... parts) throws IOException {
        return Files.writeString(Files.createTempFile(folder, "study", ".yaml"), String.join("", parts))
                .toString();
    }

    private static Map<String, Object> json(String... words) {
        List<String> all = new ArrayList<>(List.of(words));
        all.add("--json");
        Run run = Run.of(all.toArray(String[]::new));
        assertThat(run.err()).isEmpty();
        Object answer = Json.parse(run.out());
        assertThat(Json.numbers(answer, words[1])).isPositive(); // every null has its reason
        return Json.object(answer);
    }

    private static Map<String, Object> limit(Object limits, String name) {
        return Json.objects(limits).stream()
                .filter(limit -> limit.get("limit").equals(name))
                .findFirst()
                .orElseThrow();
    }

    private static Object bandsLimit(String study, String name, String field, String... sets) {
        List<String> words = new ArrayList<>(List.of("bands", study));
        for (String set : sets) {
            words.addAll(List.of("--set", set));
        }
        Map<String, Object> verdict =
                Json.object(json(words.toArray(String[]::new)).get("verdict"));
        return limit(verdict.get("limits"), name).get(field);
    }

    /** The rejection, the error and a further limit of every candidate, state by state. */
    @Test
    void everyCandidateIsJudgedInEveryState() throws IOException {
        String accept = """
            accept: {rejection: 9 dB, noise: 40 ug/rtHz, error: 0.2 m/s2}
            surroundings: {hum: {kind: tone, frequency: 210 Hz, speed: 0.3 mm/s}}
            """;
        String alone = study(HAIR, OIL, accept);
        String candidates = "candidates: [open, " + ROOFED + ", " + SEALED + "]\n";
        Map<String, Object> answer = json("lid", study(HAIR, OIL, accept, candidates, ENVELOPE));
        List<Map<String, Object>> covers = Json.objects(answer.get("covers"));
        assertThat(covers).hasSize(3);
        for (int i = 0; i < covers.size(); i++) {
            String cover = "cover=" + List.of("open", ROOFED, SEALED).get(i);
            Map<String, Object> envelope = Json.object(covers.get(i).get("envelope"));
            boolean fails = false;
            for (String name : List.of("rejection", "noise", "error")) {
                String worst = "";
                double margin = Double.POSITIVE_INFINITY;
                for (String temperature : TEMPERATURES) {
                    String there = "medium.temperature=" + temperature;
                    fails |= bandsLimit(alone, name, "decision", cover, there).equals("fails");
                    Object found = bandsLimit(alone, name, "found", cover, there);
                    double required = (double) bandsLimit(alone, name, "required", cover, there);
                    if (found instanceof Double value) {
                        double inside = name.equals("rejection") ? value - required : required - value;
                        worst = inside < margin ? temperature : worst;
                        margin = Math.min(margin, inside);
                    }
                }
                Map<String, Object> told = Json.objects(envelope.get("worst")).stream()
                        .filter(one ->
                                Json.object(one.get("limit")).get("limit").equals(name))
                        .findFirst()
                        .orElseThrow();
                Map<String, Object> limit = Json.object(told.get("limit"));
                if (limit.get("found") instanceof Double value) {
                    double inside = name.equals("rejection")
                            ? value - (double) limit.get("required")
                            : (double) limit.get("required") - value;
                    assertThat(inside)
                            .as("%s %s", cover, name)
                            .isCloseTo(margin, within(1e-9 * Math.abs(value) + 1e-12));
                    if (value != 0.0) {
                        assertThat(told.get("state")).isEqualTo("medium.temperature " + worst);
                    }
                } else {
                    assertThat(margin).isInfinite();
                }
            }
            assertThat(covers.get(i).get("decision")).isEqualTo(fails ? "fails" : "meets");
        }
        assertThat(covers.get(0).get("own_decision")).isIn("meets", "fails");
    }

    /** The candidate that is first at the study's own state fails in the cold, and the next one is chosen. */
    @Test
    void theColdChoosesAnotherCover() throws IOException {
        String own = json("bands", study(HAIR, OIL)).get("points").toString();
        assertThat(own).isNotEmpty();
        double bare = least(study(HAIR, OIL), "25 degC");
        double cold = least(study(HAIR, OIL), "-15 degC");
        assertThat(cold).isLessThan(bare - 0.5);
        String accept = "accept: {rejection: " + 0.5 * (bare + cold) + " dB}\ncandidates: [open, " + SEALED + "]\n";
        String study = study(HAIR, OIL, accept, ENVELOPE);
        Run run = Run.of("lid", study);
        assertThat(run.code()).isZero();
        String text = run.out().replaceAll("\\s+", " ");
        assertThat(text)
                .contains("The first candidate that meets every limit is: sealed.")
                .contains("At the study's own state alone it would be: open.")
                .contains(String.format(java.util.Locale.ROOT, "Least rejection of all states %.3f", cold)
                        .substring(0, 34))
                .contains("at medium.temperature -15 degC. At the study's own state: meets.");
        Run without = Run.of("lid", study(HAIR, OIL, accept));
        assertThat(without.out())
                .contains("No lid is needed")
                .doesNotContain("nvelope")
                .doesNotContain("worst");
        assertThat(Run.of("lid", study(HAIR, OIL, accept), "--json").out())
                .doesNotContain("worst")
                .doesNotContain("envelope");
        assertThat(run.out().lines().skip(1))
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    private static double least(String study, String temperature) {
        Map<String, Object> answer = json("bands", study, "--set", "medium.temperature=" + temperature);
        return Json.objects(answer.get("bands")).stream()
                .mapToDouble(
                        band -> Math.min((double) band.get("rejection_from_db"), (double) band.get("rejection_to_db")))
                .min()
                .orElseThrow();
    }

    /** Frequency by frequency the largest of what the states ask one by one; the study's own state is among them. */
    @Test
    void theAttenuationAskedIsThatOfTheWorstState() throws IOException {
        String accept = """
            accept: {rejection: 12 dB, error: 0.02 m/s2}
            candidates: [open]
            surroundings: {hum: {kind: tone, frequency: 210 Hz, speed: 0.3 mm/s}}
            """;
        String alone = study(HAIR, OIL, accept);
        Map<String, Object> answer =
                Json.object(json("lid", study(HAIR, OIL, accept, ENVELOPE)).get("required"));
        List<Map<String, Object>> asked = Json.objects(answer.get("rejection"));
        List<Map<String, Object>> byState = new ArrayList<>();
        for (String temperature : TEMPERATURES) {
            byState.add(Json.object(json("lid", alone, "--set", "medium.temperature=" + temperature)
                    .get("required")));
        }
        int moved = 0;
        for (int i = 0; i < asked.size(); i++) {
            int at = i;
            double most = byState.stream()
                    .mapToDouble(state -> (double)
                            Json.objects(state.get("rejection")).get(at).get("attenuation_db"))
                    .max()
                    .orElseThrow();
            assertThat((double) asked.get(i).get("worst_attenuation_db")).isCloseTo(most, within(1e-9));
            moved += most > (double) asked.get(i).get("attenuation_db") + 0.1 ? 1 : 0;
        }
        assertThat(moved).isGreaterThan(2);
        double error = byState.stream()
                .mapToDouble(state -> (double) state.get("error_db"))
                .max()
                .orElseThrow();
        assertThat((double) answer.get("worst_error_db")).isCloseTo(error, within(1e-9));
        assertThat(answer.get("worst_error_state").toString()).startsWith("medium.temperature");
    }

    /** What is printed keeps every limit in every state; a hundredth less does not. */
    @Test
    void aRemedyKeepsEveryLimitInEveryState() throws IOException {
        String study =
                study(HAIR, OIL, "accept: {rejection: 3 dB}\ncandidates: [open]\nfinite-length: off\n", ENVELOPE);
        Run run = Run.of("lid", study);
        assertThat(run.code()).isEqualTo(3);
        String text = run.out().replaceAll("\\s+", " ");
        assertThat(text)
                .contains("No candidate meets every limit in every state. The nearest is open: rejection misses by ");
        Matcher denser = Pattern.compile(
                        "a hair ([\\d.]+) times as dense \\([\\d.]+ kg/m3\\) keeps every limit in every state")
                .matcher(text);
        assertThat(denser.find()).as(text).isTrue();
        double factor = Double.parseDouble(denser.group(1));
        assertThat(Run.of("lid", study, "--set", "hair.density=" + 4.4 * factor + " g/cm3")
                        .code())
                .isZero();
        assertThat(Run.of("lid", study, "--set", "hair.density=" + 4.4 * (factor - 0.01) + " g/cm3")
                        .code())
                .isEqualTo(3);
        Matcher band = Pattern.compile("a band from ([\\d.]+) Hz to ([\\d.]+) Hz keeps the margin in every state")
                .matcher(text);
        assertThat(band.find()).as(text).isTrue();
        assertThat(Run.of("lid", study, "--set", "band.from=" + band.group(1) + " Hz")
                        .code())
                .isZero();
    }

    /** A candidate whose fill freezes is undecided, and says where; the others are judged as ever. */
    @Test
    void aFillThatFreezesIsToldAtItsState() throws IOException {
        String study = study(
                HAIR,
                "medium: {name: air, temperature: 20 degC}\naccept: {rejection: 60 dB}\n",
                "candidates: [{kind: sealed, fill: {name: water}}, ",
                SEALED,
                "]\nenvelope: {medium.temperature: [20 degC, -15 degC]}\n");
        Map<String, Object> answer = json("lid", study);
        List<Map<String, Object>> covers = Json.objects(answer.get("covers"));
        assertThat(covers.get(0).get("decision")).isEqualTo("undecided");
        assertThat(covers.get(0).get("misses").toString())
                .contains("cannot be worked out at medium.temperature -15 degC: ")
                .contains("water");
        assertThat(covers.get(0).get("warnings").toString()).doesNotContain("freezing");
        assertThat(covers.get(1).get("decision")).isEqualTo("meets");
        assertThat(Run.of("lid", study).code()).isZero();
        Run alone = Run.of("lid", study, "--set", "candidates=[{kind: sealed, fill: {name: water}}]");
        assertThat(alone.code()).isEqualTo(3);
        assertThat(alone.out().replaceAll("\\s+", " ")).contains("a cover or fill that bears every state");
    }

    /** A number of one candidate moves that candidate alone. */
    @Test
    void theEnvelopeMayMoveACandidate() throws IOException {
        String accept = "accept: {rejection: 9 dB}\ncandidates: [open, " + ROOFED + "]\n";
        Map<String, Object> answer =
                json("lid", study(HAIR, OIL, accept, "envelope: {\"candidates[1].gap\": [0.7 mm, 0.8 mm, 1.6 mm]}\n"));
        List<Map<String, Object>> covers = Json.objects(answer.get("covers"));
        assertThat(covers.get(0).get("worst_least_rejection_db"))
                .isEqualTo(covers.get(0).get("least_rejection_db"));
        Map<String, Object> roofed = Json.object(covers.get(1).get("envelope"));
        List<Double> each = new ArrayList<>();
        for (String gap : List.of("0.7 mm", "0.8 mm", "1.6 mm")) {
            each.add((double) bandsLimit(
                    study(HAIR, OIL, accept), "rejection", "found", "cover=" + ROOFED.replace("0.8 mm", gap)));
        }
        double least = each.stream().mapToDouble(Double::doubleValue).min().orElseThrow();
        double most = each.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
        assertThat(most).isGreaterThan(least + 1e-3);
        assertThat((double) roofed.get("least_rejection_db")).isCloseTo(least, within(1e-9));
        assertThat((double) roofed.get("largest_least_rejection_db")).isCloseTo(most, within(1e-9));
        Map<String, Object> tooLow =
                json("lid", study(HAIR, OIL, accept, "envelope: {\"candidates[1].gap\": [0.6 mm, 0.8 mm]}\n"));
        assertThat(Json.objects(tooLow.get("covers")).get(1).get("misses").toString())
                .contains("touches the hair");
    }

    private static Map<String, Object> fill(Map<String, Object> answer, String name, String cover) {
        return Json.objects(answer.get("fills")).stream()
                .filter(row -> row.get("fill").equals(name) && row.get("cover").equals(cover))
                .findFirst()
                .orElseThrow();
    }

    private static final String FLOWS = """
            surroundings:
              draught: {kind: stream, mean-speed: 0.4 m/s, turbulence: 20 %, length-scale: 30 mm, fetch: 20 mm}
              duct: {kind: duct, width: 60 mm, height: 40 mm, mean-speed: 1.5 m/s}
              hum: {kind: tone, frequency: 210 Hz, speed: 2 mm/s}
              hall: {kind: sound, level: 100 dB, from: 100 Hz, to: 1 kHz}
            """;
    private static final String LIMITS =
            "accept: {rejection: 30 dB, error: 5 mm/s2, noise: 3 ug/rtHz, resonance: {at-least: 400 Hz}}\n";
    private static final String AIR = "medium: {name: air, temperature: 25 degC}\n";

    /** Every limit and every source of flow, as bands judges the same device in that fluid. */
    @Test
    void aFillIsJudgedAsBandsJudgesTheDeviceInIt() throws IOException {
        String study = study(HAIR, AIR, LIMITS, FLOWS);
        Map<String, Object> answer = json("fill", study, "--only", "helium,carbon dioxide,air,water");
        for (String name : List.of("helium", "carbon dioxide")) {
            for (String cover : List.of("open", "sealed")) {
                Map<String, Object> row = fill(answer, name, cover);
                Map<String, Object> bands = json(
                        "bands",
                        study,
                        "--set",
                        "medium={name: " + name + ", temperature: 25 degC}",
                        "--set",
                        "cover=" + cover);
                Map<String, Object> verdict = Json.object(bands.get("verdict"));
                assertThat(Json.objects(verdict.get("limits"))).hasSize(4);
                for (Map<String, Object> limit : Json.objects(verdict.get("limits"))) {
                    Map<String, Object> found = limit(row.get("limits"), (String) limit.get("limit"));
                    assertThat(found.get("decision")).isEqualTo(limit.get("decision"));
                    if (limit.get("found") instanceof Double value) {
                        assertThat((double) found.get("found")).isCloseTo(value, within(1e-9 * Math.abs(value)));
                    }
                }
                assertThat(row.get("decision")).isEqualTo(verdict.get("decision"));
                double rms = (double) Json.object(bands.get("error")).get("rms_m_s2");
                assertThat((double) row.get("error_rms_m_s2")).isCloseTo(rms, within(1e-9 * rms));
            }
        }
        assertThat(fill(answer, "helium", "open").get("misses").toString()).contains("misses by");
        assertThat((double) fill(answer, "water", "open").get("error_rms_m_s2"))
                .isGreaterThan(100.0
                        * (double) fill(answer, "air 50 % humidity", "open").get("error_rms_m_s2"));
    }

    /** The sound of a study in air keeps its pressure, so in a liquid its velocity falls with ρc; the level's own reference in a liquid is another. */
    @Test
    void soundKeepsItsPressureInALiquid() throws IOException {
        String sound =
                "surroundings: {hall: {kind: sound, level: 120 dB, from: 200 Hz, to: 400 Hz}}\naccept: {error: 1 m/s2}\n";
        Map<String, Object> answer = json("fill", study(HAIR, AIR, sound), "--only", "water");
        Map<String, Object> water = json(
                "bands",
                study(HAIR, "medium: {name: water, temperature: 25 degC}\n", sound.replace("120 dB", "146.0206 dB")));
        double rms = (double) Json.object(water.get("error")).get("rms_m_s2"); // 20 uPa over 1 uPa is 26.0206 dB
        assertThat((double) fill(answer, "water", "open").get("error_rms_m_s2")).isCloseTo(rms, within(1e-6 * rms));
        assertThat(rms).isPositive();
    }

    /** The same stream is within the law of drag in air, and beyond it in mercury; the rejection is judged all the same. */
    @Test
    void aStreamBeyondTheLawLeavesTheErrorUndecided() throws IOException {
        String stream = """
            surroundings: {gust: {kind: stream, mean-speed: 100 m/s, turbulence: 20 %, length-scale: 30 mm, fetch: 8 mm}}
            accept: {error: 1000 m/s2, resonance: {at-least: 1 Hz}}
            """;
        Map<String, Object> answer = json("fill", study(HAIR, AIR, stream, ENVELOPE), "--only", "mercury,air");
        Map<String, Object> row = fill(answer, "mercury", "open");
        assertThat(row.get("misses").toString())
                .contains("error is undecided: at its fastest the flow has a Reynolds number");
        assertThat(row.get("decision")).isEqualTo("undecided");
        assertThat(row.get("rejection_db")).isInstanceOf(Double.class);
        assertThat(row.get("worst_rejection_db")).isInstanceOf(Double.class);
        assertThat(fill(answer, "air 50 % humidity", "open").get("error_rms_m_s2"))
                .isInstanceOf(Double.class);
    }

    /** A gas closed in keeps its density however warm it gets; bare it thins. Both against bands on a study of that state. */
    @Test
    void aClosedCanKeepsTheDensityOfItsFill() throws IOException {
        String limits = "accept: {noise: 3 ug/rtHz}\n";
        String study = study(HAIR, AIR, limits, ENVELOPE);
        Map<String, Object> answer = json("fill", study, "--only", "sulfur hexafluoride");
        String alone = study(HAIR, AIR, limits);
        String fill = "{name: sulfur hexafluoride, temperature: 25 degC, pressure: 101.325 kPa}";
        assertWorstNoise(fill(answer, "sulfur hexafluoride", "sealed"), temperature -> (double) bandsLimit(
                alone,
                "noise",
                "found",
                "cover={kind: sealed, fill: " + fill + "}",
                "medium.temperature=" + temperature));
        assertWorstNoise(fill(answer, "sulfur hexafluoride", "open"), temperature -> (double) bandsLimit(
                alone, "noise", "found", "medium={name: sulfur hexafluoride, temperature: " + temperature + "}"));
    }

    private static void assertWorstNoise(Map<String, Object> row, java.util.function.Function<String, Double> noise) {
        double most = TEMPERATURES.stream().mapToDouble(noise::apply).max().orElseThrow();
        double least = TEMPERATURES.stream().mapToDouble(noise::apply).min().orElseThrow();
        assertThat(most).isGreaterThan(1.01 * least);
        Map<String, Object> worst =
                Json.object(Json.objects(Json.object(row.get("envelope")).get("worst"))
                        .get(0)
                        .get("limit"));
        assertThat((double) worst.get("found")).isCloseTo(most, within(1e-9 * most));
    }

    /** What the study itself stands in may freeze; a fluid that does not is judged in every state. */
    @Test
    void theStudysOwnMediumNeedNotBearTheStateOfAFill() throws IOException {
        String study = study(HAIR, """
            medium: {name: water, temperature: 25 degC}
            accept: {rejection: 1 dB}
            surroundings: {hum: {kind: tone, frequency: 210 Hz, speed: 2 mm/s}}
            """, ENVELOPE);
        Run run = Run.of("fill", study, "--only", "water,silicone oil 5 cSt");
        assertThat(run.code()).isZero();
        String text = run.out().replaceAll("\\s+", " ");
        assertThat(text)
                .contains("Decision: meets")
                .contains("2 of 4 meet every limit in every state. The first: silicone oil 5 cSt, sealed.")
                .contains("does not bear medium.temperature -15 degC: water");
        assertThat(run.out().lines().skip(1))
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
        assertThat(Run.of("fill", study, "--only", "water").code()).isEqualTo(3);
    }

    /** Pressure of a state reaches a bare gas, not a closed can; a further limit alone can decide. */
    @Test
    void noFillLeavesWithThreeAndNamesWhatItMisses() throws IOException {
        String study = study(HAIR, AIR, "accept: {resonance: {at-least: 2 kHz}}\n");
        Run run = Run.of("fill", study, "--only", "helium,argon");
        assertThat(run.code()).isEqualTo(3);
        assertThat(run.out().replaceAll("\\s+", " "))
                .contains("Decision: fails")
                .contains("No fill meets every limit.")
                .contains("resonance misses by ");
        assertThat(Run.of("fill", study, "--only", "helium,argon", "--set", "accept.resonance.at-least=1 Hz")
                        .code())
                .isZero();
        Run unasked = Run.of("fill", study(HAIR, AIR), "--only", "helium");
        assertThat(unasked.code()).isZero();
        assertThat(unasked.out()).doesNotContain("Decision").contains("Nothing speaks against");
    }
}
