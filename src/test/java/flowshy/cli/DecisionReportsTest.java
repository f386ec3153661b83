package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The lid and the fill decision in every form: one set of figures, no bare null, no line that a terminal breaks. */
class DecisionReportsTest {
    private static final String HAIR = "hair: {length: 700 um, diameter: 80 um, density: 998.2 kg/m3}\n";
    private static final String HELD =
            "suspension: {resonance: {frequency: 300 Hz, in: vacuum}, quality: {value: 4, in: vacuum}}\n";
    private static final String EVERY_COVER = "candidates: [open, {kind: roofed, gap: 1.2 mm, length: 5 mm},"
            + " {kind: vented, holes: 250, hole-diameter: 0.1234 mm, hole-depth: 0.2345 mm, sides: through, cavity-volume: 123.4"
            + " mm3, cavity-section: 12.34 mm2}, {kind: measured, file: attenuation measured on the bench in the spring.csv},"
            + " {kind: sealed, fill: {name: helium, pressure: 1 bar, temperature: 20 degC}, diameter: 3.333 mm, height: 2.222 mm}]\n";

    @TempDir
    static Path folder;

    static List<Arguments> decisions() {
        List<Arguments> all = new ArrayList<>();
        List<String> studies = new ArrayList<>();
        for (String example : List.of("workbench-air", "weather-mast", "wrong-fill")) {
            studies.add("examples/" + example + "/study.yaml");
        }
        studies.add(study("plain", "medium: air\n"));
        studies.add(study("covered", "medium: air\naccept: {rejection: 90 dB, error: 1 mm/s2}\n" + HELD + EVERY_COVER));
        studies.add(study("nothing", "medium: water\naccept: {rejection: 30 dB}\ncandidates: [sealed, open]\n" + HELD));
        studies.add(study(
                "rarefied",
                "medium: {name: dry air, pressure: 80 Pa}\naccept: {rejection: 30 dB}\ncandidates: [open]\n"));
        for (String study : studies) {
            all.add(Arguments.of("lid", study, List.of()));
            all.add(Arguments.of("fill", study, List.of("--only", "helium,water,silicone oil,mercury,ethanol")));
        }
        return all;
    }

    private static String study(String name, String text) {
        try {
            Files.writeString(
                    folder.resolve("attenuation measured on the bench in the spring.csv"),
                    "frequency [Hz],attenuation [dB]\n1,0\n10000,80\n");
            return Files.writeString(folder.resolve(name + ".yaml"), HAIR + text)
                    .toString();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Run run(String command, String study, List<String> words, String... more) {
        List<String> all = new ArrayList<>(List.of(command, study));
        all.addAll(words);
        all.addAll(List.of(more));
        Run run = Run.of(all.toArray(String[]::new));
        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isIn(0, 3);
        return run;
    }

    @ParameterizedTest
    @MethodSource("decisions")
    void everyMissingNumberHasItsReason(String command, String study, List<String> words) {
        Object answer = Json.parse(run(command, study, words, "--json").out());
        assertThat(Json.numbers(answer, study)).isGreaterThanOrEqualTo(8);
    }

    @ParameterizedTest
    @MethodSource("decisions")
    void fitsEightyColumns(String command, String study, List<String> words) {
        List<String> lines = run(command, study, words).out().lines().toList();
        assertThat(lines).hasSizeGreaterThan(20);
        // the first line names the file as it was asked for
        assertThat(lines.subList(1, lines.size()))
                .allSatisfy(line ->
                        assertThat(line.codePointCount(0, line.length())).isLessThanOrEqualTo(80));
    }

    @ParameterizedTest
    @MethodSource("decisions")
    void csvAgreesWithJsonOnEveryFigure(String command, String study, List<String> words) {
        Map<String, Object> answer =
                Json.object(Json.parse(run(command, study, words, "--json").out()));
        List<Map<String, Object>> rows = Json.objects(answer.get(command.equals("lid") ? "covers" : "fills"));
        List<String> lines = run(command, study, words, "--csv").out().lines().toList();
        assertThat(rows).isNotEmpty();
        assertThat(lines).hasSize(rows.size() + 1);
        List<String> names = fields(lines.get(0));
        int figures = 0;
        for (int i = 0; i < rows.size(); i++) {
            List<String> fields = fields(lines.get(i + 1));
            assertThat(fields).hasSameSizeAs(names);
            for (int column = 0; column < names.size(); column++) {
                Object value = rows.get(i).get(names.get(column));
                if (value instanceof Double number) {
                    assertThat(Double.parseDouble(fields.get(column))).isEqualTo(number);
                    figures++;
                } else if (rows.get(i).containsKey(names.get(column)) && value == null) {
                    assertThat(fields.get(column)).isEmpty();
                }
            }
        }
        assertThat(figures).isGreaterThanOrEqualTo(5);
    }

    @Test
    void aDeviceThatReadsNothingIsNotToldThatItsRejectionHasNoBound() {
        String study = study("nothing", "medium: water\ncandidates: [sealed, {kind: sealed, fill: {name: ethanol}}]\n");
        List<Map<String, Object>> covers = Json.objects(
                Json.object(Json.parse(Run.of("lid", study, "--json").out())).get("covers"));
        assertThat(covers.get(0).get("least_rejection_db_reason")).asString().contains("reads nothing");
        assertThat(covers.get(1).get("least_rejection_db_reason")).asString().contains("no bound");
    }

    /** Fields of a line of CSV; one in quotes may hold commas. */
    private static List<String> fields(String line) {
        List<String> fields = new ArrayList<>();
        StringBuilder field = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (c == '"') {
                quoted = !quoted;
            } else if (c == ',' && !quoted) {
                fields.add(field.toString());
                field.setLength(0);
            } else {
                field.append(c);
            }
        }
        fields.add(field.toString());
        return fields;
    }
}
