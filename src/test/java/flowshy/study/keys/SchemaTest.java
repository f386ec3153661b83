package flowshy.study.keys;

import static flowshy.study.keys.SchemaJudge.list;
import static flowshy.study.keys.SchemaJudge.map;
import static org.assertj.core.api.Assertions.assertThat;

import flowshy.study.Starter;
import flowshy.study.text.StudyText;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The schema against the table and the reader. */
class SchemaTest {
    private static final SchemaJudge JUDGE = new SchemaJudge(Schema.text());

    private static boolean accepts(String study) {
        return JUDGE.accepts(
                StudyText.of("s.yaml", study.getBytes(StandardCharsets.UTF_8)).root());
    }

    @Test
    void namesEveryBuiltKeyAndNoOther() {
        Set<String> named = new LinkedHashSet<>();
        collect(JUDGE.root(), "", named);
        List<String> built = Keys.rows().stream()
                .filter(row -> Keys.rows().stream()
                        .noneMatch(above -> !above.built() && row.path().startsWith(above.path() + ".")))
                .filter(KeyRow::built)
                .map(KeyRow::path)
                .toList();
        assertThat(built).hasSizeGreaterThan(120);
        assertThat(named).containsExactlyInAnyOrderElementsOf(built);
    }

    private void collect(Map<String, Object> schema, String path, Set<String> named) {
        for (String keyword : List.of("anyOf", "oneOf")) {
            if (schema.containsKey(keyword)) {
                list(schema.get(keyword)).forEach(s -> collect(map(s), path, named));
            }
        }
        if (schema.get("additionalProperties") instanceof Map<?, ?>) {
            collect(map(schema.get("additionalProperties")), path + ".NAME", named);
        }
        if (schema.containsKey("properties")) {
            map(schema.get("properties")).forEach((name, inner) -> {
                String below = path.isEmpty() ? name : path + "." + name;
                named.add(below);
                collect(map(inner), below, named);
            });
        }
    }

    @Test
    void acceptsEveryStudyThatTheReaderAccepts() {
        assertThat(Studies.ALL)
                .hasSizeGreaterThan(6)
                .allSatisfy(study -> assertThat(accepts(study)).as(study).isTrue());
    }

    @ParameterizedTest
    @CsvSource({"cylinder, open", "taper, sealed", "club, open", "profile, sealed"})
    void acceptsWhatTheStarterWrites(String shape, String cover) {
        assertThat(accepts(Starter.study(shape, cover))).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "medium: air",
                "hair: {length: 1 mm, diameter: 9 um, density: 1 g/cm3}",
                "medium: air\nhair: {length: 1 mm, diametre: 9 um, density: 1 g/cm3}",
                "medium: air\nhair: {length: 1 mm, diameter: 9, density: 1 g/cm3}",
                "medium: air\nhair: {length: '0,5 mm', diameter: 9 um, density: 1 g/cm3}",
                "medium: air\nhair: {length: [1 mm], diameter: 9 um, density: 1 g/cm3}",
                "medium: air\nhair: {shape: club, length: 1 mm, diameter: 9 um, density: 1 g/cm3}",
                "medium: air\nhair: {shape: stick, length: 1 mm, diameter: 9 um, density: 1 g/cm3}",
                "medium: air\nhair: {shape: profile, points: [[0 um, 9 um]], density: 1 g/cm3}",
                "medium: air\nhair: {shape: profile, points: [[0 um, 9 um], [1 um]], density: 1 g/cm3}",
                "medium: air\nhair: {shape: profile, file: a.csv, points: [[0 um, 9 um], [1 mm, 9 um]], density: 1 g/cm3}",
            })
    void refusesWhatAnEditorShouldUnderline(String study) {
        assertThat(accepts(study)).isFalse();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "cover: lid",
                "cover: {kind: open, fill: air}",
                "suspension: {stiffness: 1 N.m/rad, resonance: 3 Hz}",
                "suspension: {stiffness: 1 N.m/rad, quality: much}",
                "suspension: {stiffness: 1 N.m/rad, quality: {in: air}}",
                "suspension: {stiffness: 1 N.m/rad, ring-down: {frequency: 3 Hz}}",
                "suspension: {resonance: {frequency: 3 Hz, in: {name: air, density: 1 g/cm3}}}",
                "suspension: {resonance: {frequency: 3 Hz, in: {density: 1 g/cm3}}}",
                "suspension: {resonance: {frequency: 3 Hz, in: {name: air, second: helium}}}",
                "motion: {spectrum: [[3 Hz, 1 g2/Hz]]}",
                "surroundings: {}",
                "surroundings: {a.b: {like: still room}}",
                "surroundings: {a: {like: stil room}}",
                "surroundings: {a: {like: still room, kind: sound}}",
                "surroundings: {a: {like: still room, level: 3 dB}}",
                "surroundings: {a: {kind: stream}}",
                "surroundings: {a: {kind: duct, diameter: 3 mm}}",
                "surroundings: {a: {kind: duct, mean-speed: 3 mm/s, width: 3 mm}}",
                "surroundings: {a: {kind: sound, level: 80 dB, to: 3 kHz}}",
                "surroundings: {a: {kind: sound}}",
                "surroundings: {a: {kind: spectrum, file: a.csv, columns: f, quantity: density, unit: Pa2/Hz}}",
                "motion: {spectrum: {points: [[3 Hz, 1 g2/Hz], [4 Hz, 1 g2/Hz]], file: a.csv}}",
                "finite-length: maybe",
                "candidates: [open, lid]",
                "calibration: {cover: open}",
                "band: {from: 3 Hz, to: 5 Hz, by: 1 Hz}",
            })
    void refusesASmallestStudyWithAWrongLine(String line) {
        assertThat(accepts(Studies.SMALLEST)).isTrue();
        assertThat(accepts(Studies.SMALLEST + line)).isFalse();
    }
}
