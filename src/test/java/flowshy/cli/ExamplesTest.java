package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every example, as a user runs it: the printed answer equals {@code expected.txt}, and the figures worked apart from the program
 * ({@code by-hand.csv}, made by {@code by-hand.py} beside it) agree. {@code -Dflowshy.rewrite=true} writes the expected outputs anew.
 */
class ExamplesTest {
    private static final boolean REWRITE = Boolean.getBoolean("flowshy.rewrite");

    static List<Path> examples() {
        try (Stream<Path> folders = Files.list(Path.of("examples"))) {
            return folders.filter(Files::isDirectory).sorted().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Test
    void thereAreExamples() {
        assertThat(examples()).hasSizeGreaterThanOrEqualTo(4);
    }

    @ParameterizedTest
    @MethodSource("examples")
    void printsWhatIsExpected(Path example) throws IOException {
        Run run = Run.of("bands", study(example), "--why");
        String printed = run.out() + "exit code " + run.code() + "\n";
        Path expected = example.resolve("expected.txt");
        if (REWRITE) {
            Files.writeString(expected, printed);
        }
        assertThat(run.err()).isEmpty();
        assertThat(printed).isEqualTo(Files.readString(expected));
    }

    static List<Path> lidExamples() {
        return examples().stream()
                .filter(example -> Files.exists(example.resolve("expected-lid.txt")))
                .toList();
    }

    @Test
    void thereAreLidExamples() {
        assertThat(lidExamples()).hasSizeGreaterThanOrEqualTo(4);
    }

    @ParameterizedTest
    @MethodSource("lidExamples")
    void decidesOnTheLidAsExpected(Path example) throws IOException {
        Run run = Run.of("lid", study(example));
        String printed = run.out() + "exit code " + run.code() + "\n";
        Path expected = example.resolve("expected-lid.txt");
        if (REWRITE) {
            Files.writeString(expected, printed);
        }
        assertThat(run.err()).isEmpty();
        assertThat(printed).isEqualTo(Files.readString(expected));
        assertThat(printed.lines()).allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    static List<Path> lidsWorkedApart() {
        return examples().stream()
                .filter(example -> Files.exists(example.resolve("by-hand-lid.csv")))
                .toList();
    }

    @Test
    void thereAreLidsWorkedApart() {
        assertThat(lidsWorkedApart()).isNotEmpty();
    }

    /** Covers in every state of the envelope, by strip theory, worked apart from the program ({@code by-hand-lid.csv}). */
    @ParameterizedTest
    @MethodSource("lidsWorkedApart")
    void coversInTheirWorstStateAgreeWithFiguresWorkedApart(Path example) throws IOException {
        List<String> lines = Files.readAllLines(example.resolve("by-hand-lid.csv"));
        assertThat(lines).hasSizeGreaterThanOrEqualTo(10);
        Map<String, Object> answer = answer(Run.of("lid", study(example), "--json", "--set", "finite-length=off"));
        for (String line : lines.subList(1, lines.size())) {
            String[] fields = line.split(",", -1);
            Map<String, Object> told = worst(answer, fields);
            if (fields[1].equals("decision")) {
                assertThat(told.get("decision")).as(line).isEqualTo(fields[3]);
                continue;
            }
            double value = Double.parseDouble(fields[3]);
            assertThat((double) told.get("value"))
                    .as("%s: %s", example, line)
                    .isFinite()
                    .isCloseTo(value, within(Math.abs(value) * Double.parseDouble(fields[4])));
            if (!fields[5].equals("own")) {
                assertThat(told.get("state")).as(line).isEqualTo(fields[5]);
            }
        }
    }

    /** Value, state and decision that the program tells for a line of what, quantity and frequency. */
    private static Map<String, Object> worst(Map<String, Object> answer, String... line) {
        if (line[0].equals("required")) {
            Map<String, Object> point = Json.objects(
                            Json.object(answer.get("required")).get("rejection"))
                    .stream()
                    .filter(one ->
                            Math.abs((double) one.get("frequency_hz") / Double.parseDouble(line[2]) - 1.0) < 1e-6)
                    .findFirst()
                    .orElseThrow();
            return Map.of("value", point.get(line[1]), "state", point.get("worst_state"));
        }
        Map<String, Object> cover = Json.objects(answer.get("covers")).stream()
                .filter(one -> one.get("cover").equals(line[0]))
                .findFirst()
                .orElseThrow();
        Map<String, Object> envelope = Json.object(cover.get("envelope"));
        if (line[1].equals("decision")) {
            return Map.of("decision", cover.get("decision"));
        }
        if (cover.containsKey(line[1])) {
            return Map.of("value", cover.get(line[1]), "state", envelope.getOrDefault("least_rejection_state", ""));
        }
        return Json.objects(envelope.get("worst")).stream()
                .filter(one -> Json.object(one.get("limit")).get("limit").equals(line[1]))
                .map(one -> Map.of("value", Json.object(one.get("limit")).get("found"), "state", one.get("state")))
                .findFirst()
                .orElseThrow();
    }

    static List<Path> toleranceExamples() {
        return examples().stream()
                .filter(example -> Files.exists(example.resolve("expected-tolerance.txt")))
                .toList();
    }

    @Test
    void thereAreToleranceExamples() {
        assertThat(toleranceExamples()).isNotEmpty();
    }

    @ParameterizedTest
    @MethodSource("toleranceExamples")
    void spreadsAsExpected(Path example) throws IOException {
        Run run = Run.of("tolerance", study(example), "--samples", "2048");
        String printed = run.out() + "exit code " + run.code() + "\n";
        Path expected = example.resolve("expected-tolerance.txt");
        if (REWRITE) {
            Files.writeString(expected, printed);
        }
        assertThat(printed).isEqualTo(Files.readString(expected));
        assertThat(printed.lines()).allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    static List<Path> compareExamples() {
        return examples().stream()
                .filter(example -> Files.exists(example.resolve("expected-compare.txt")))
                .toList();
    }

    @Test
    void thereAreCompareExamples() {
        assertThat(compareExamples()).isNotEmpty();
    }

    /** With the moments of inertia made equal: then every line of the answer has something to say. */
    @ParameterizedTest
    @MethodSource("compareExamples")
    void comparesAsExpected(Path example) throws IOException {
        Run run = Run.of("compare", study(example), "--equal", "inertia");
        String printed = run.out() + "exit code " + run.code() + "\n";
        Path expected = example.resolve("expected-compare.txt");
        if (REWRITE) {
            Files.writeString(expected, printed);
        }
        assertThat(run.err()).isEmpty();
        assertThat(printed).isEqualTo(Files.readString(expected));
    }

    /** Devices beside the base, worked apart from the program ({@code by-hand-compare.csv}). */
    @ParameterizedTest
    @MethodSource("compareExamples")
    void devicesBesideTheBaseAgreeWithFiguresWorkedApart(Path example) throws IOException {
        List<String> lines = Files.readAllLines(example.resolve("by-hand-compare.csv"));
        assertThat(lines).hasSizeGreaterThanOrEqualTo(4);
        Map<String, Object> plain = answer(Run.of("compare", study(example), "--json"));
        Map<String, Object> equal = answer(Run.of("compare", study(example), "--json", "--equal", "inertia"));
        for (String line : lines.subList(1, lines.size())) {
            String[] fields = line.split(",", -1);
            double value = Double.parseDouble(fields[2]);
            boolean ratio = fields[1].equals("ratio");
            Map<String, Object> device = Json.objects((ratio ? equal : plain).get("devices")).stream()
                    .filter(one -> one.get("name").equals(fields[0]))
                    .findFirst()
                    .orElseThrow();
            Map<String, Object> part = Json.object(device.get(ratio ? "scaled" : "figures"));
            assertThat((double) part.get(fields[1]))
                    .as("%s %s of %s", example, fields[1], fields[0])
                    .isFinite()
                    .isCloseTo(value, within(Math.abs(value) * Double.parseDouble(fields[3])));
        }
    }

    /** One example is mapped and sized as its heading says, another is sized. */
    @Test
    void mapsAndSizesAsExpected() throws IOException {
        Path example = Path.of("examples", "hoist-chain");
        expect(
                example.resolve("expected-map.txt"),
                Run.of(
                        "map",
                        study(example),
                        "--across",
                        "hair.diameter=30 um..150 um",
                        "--down",
                        "hair.length=300 um..1200 um"));
        expect(
                example.resolve("expected-size.txt"),
                Run.of("size", study(example), "--vary", "hair.diameter", "--to", "minimize", "mass"));
        Path solved = Path.of("examples", "workbench-air"); // the whole hair, not strip theory
        expect(
                solved.resolve("expected-size.txt"),
                Run.of("size", study(solved), "--vary", "hair.diameter", "--to", "minimize", "mass"));
    }

    private static void expect(Path expected, Run run) throws IOException {
        String printed = run.out() + "exit code " + run.code() + "\n";
        if (REWRITE) {
            Files.writeString(expected, printed);
        }
        assertThat(printed).isEqualTo(Files.readString(expected));
        assertThat(printed.lines()).allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    @ParameterizedTest
    @MethodSource("examples")
    void fitsEightyColumns(Path example) {
        assertThat(Run.of("bands", study(example), "--why").out().lines())
                .isNotEmpty()
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    /** Worked apart is strip theory; the correction for finite length has its own reference, and is reported as a difference. */
    @ParameterizedTest
    @MethodSource("examples")
    void agreesWithFiguresWorkedApart(Path example) throws IOException {
        List<String> lines = Files.readAllLines(example.resolve("by-hand.csv"));
        assertThat(lines).hasSizeGreaterThanOrEqualTo(3); // head and two figures
        for (String line : lines.subList(1, lines.size())) {
            String[] fields = line.split(",", -1);
            double value = Double.parseDouble(fields[2]);
            double tolerance = Double.parseDouble(fields[3]);
            assertThat(figure(example, "off", fields[0], fields[1]))
                    .as("%s %s at %s Hz", example, fields[0], fields[1])
                    .isFinite()
                    .isCloseTo(value, within(Math.abs(value) * tolerance));
            if (fields[0].equals("rejection_db")) {
                double difference = figure(example, "auto", "finite_length_db", fields[1]);
                assertThat(difference).as("%s at %s Hz", example, fields[1]).isBetween(-6.0, 0.3);
                assertThat(figure(example, "auto", fields[0], fields[1]) - difference)
                        .isCloseTo(value, within(Math.abs(value) * tolerance));
            }
        }
    }

    private static double figure(Path example, String lengthModel, String name, String frequency) {
        String set = "finite-length=" + lengthModel;
        if (frequency.isEmpty()) {
            Map<String, Object> answer = answer(Run.of("bands", study(example), "--json", "--set", set));
            return (double) Json.object(answer.get("device")).get(name);
        }
        Run run = Run.of("bands", study(example), "--json", "--set", set, "--frequencies", frequency + " Hz");
        return (double) Json.objects(answer(run).get("points")).get(0).get(name);
    }

    private static Map<String, Object> answer(Run run) {
        return Json.object(Json.parse(run.out()));
    }

    private static String study(Path example) {
        return example.resolve("study.yaml").toString();
    }
}
