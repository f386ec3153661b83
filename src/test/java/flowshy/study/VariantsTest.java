package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.response.Hold;
import flowshy.response.Oscillator;
import flowshy.response.Suspension;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Variants of a study: what they change, what they keep, and where their faults stand. */
class VariantsTest {
    private static final String BASE = """
            hair: {shape: cylinder, length: 730 um, diameter: 86 um, density: 1.31 g/cm3, youngs-modulus: 3 GPa}
            suspension:
              resonance: {frequency: 480 Hz, in: vacuum}
              quality: {value: 4, in: {name: air, temperature: 22 degC, pressure: 1 bar, humidity: 40 %}}
            medium: {name: air, temperature: 31 degC, pressure: 97 kPa, humidity: 30 %}
            """;

    @TempDir
    Path folder;

    private Family family(String variants, Optional<Hold> hold) throws IOException {
        Path file = Files.writeString(folder.resolve("s.yaml"), BASE + variants);
        return StudyReader.open(file, List.of()).family(hold);
    }

    private Study only(String variant) throws IOException {
        return family("variants: {x: {" + variant + "}}\n", Optional.empty())
                .variants()
                .get(0)
                .study()
                .orElseThrow();
    }

    @Test
    void anotherShapeKeepsLengthDensityAndModulus() throws IOException {
        Study club = only("hair: {shape: club, stalk-diameter: 50 um, stalk-length: 400 um, head-diameter: 110 um}");
        assertThat(club.device().hair().profile().shape()).isEqualTo("club");
        assertThat(club.device().hair().profile().length()).isEqualTo(730e-6);
        assertThat(club.device().hair().density()).isEqualTo(1310.0);
        assertThat(club.device().hair().youngsModulus()).hasValue(3e9);
    }

    @Test
    void anotherMediumKeepsTheStateAndDropsWhatOnlyTheOldOneHas() throws IOException {
        Study helium = only("medium: {name: helium}");
        assertThat(helium.device().outside().name()).isEqualTo("helium");
        assertThat(helium.device().outside().temperature()).isEqualTo(304.15);
        assertThat(helium.device().outside().pressure()).isEqualTo(97_000.0);
        Study damper = only("medium: {humidity: 90 %, name: air}");
        assertThat(damper.device().outside().name()).contains("90 %");
    }

    @Test
    void aCoverReplacesACover() throws IOException {
        Study can = only("cover: {kind: sealed, fill: {name: helium}}");
        assertThat(can.device().cover().kind()).isEqualTo("sealed");
        assertThat(can.device().around().name()).isEqualTo("helium");
        assertThat(can.device().outside().name()).startsWith("air");
    }

    /** Springs and structural damping are those of the base's hair, to the last bit, under any other hair and fluid. */
    @Test
    void whatWasMeasuredIsSolvedOnceOnTheBase() throws IOException {
        Family family = family("""
                variants:
                  heavy: {hair: {density: 2.6 g/cm3}}
                  thin: {hair: {diameter: 40 um}}
                  water: {medium: {name: water}}
                  deep: {suspension: {pivot-depth: 9 um}}
                """, Optional.empty());
        Suspension base = family.study().device().suspension().orElseThrow();
        assertThat(family.hold()).isEqualTo(Hold.STIFFNESS);
        assertThat(family.variants()).hasSize(4);
        for (Variant variant : family.variants()) {
            Suspension held =
                    variant.study().orElseThrow().device().suspension().orElseThrow();
            assertThat(held.stiffness()).as(variant.name()).isEqualTo(base.stiffness());
            assertThat(held.damping()).as(variant.name()).isEqualTo(base.damping());
        }
        assertThat(family.variants().get(3).study().orElseThrow().device().pivotDepth())
                .isEqualTo(9e-6);
    }

    /** A variant that is measured otherwise is solved on the base's hair: with the same hair, as a study of its own would be. */
    @Test
    void anotherMeasurementIsSolvedOnTheBasesHair() throws IOException {
        Family family = family("""
                variants:
                  stiff: {suspension: {resonance: {frequency: 700 Hz}}}
                  stiff and heavy: {suspension: {resonance: {frequency: 700 Hz}}, hair: {density: 2.6 g/cm3}}
                """, Optional.empty());
        Path own = Files.writeString(folder.resolve("own.yaml"), BASE.replace("480 Hz", "700 Hz"));
        Suspension alone =
                StudyReader.read(own, List.of()).device().suspension().orElseThrow();
        assertThat(alone.stiffness())
                .isNotEqualTo(family.study().device().suspension().orElseThrow().stiffness());
        for (Variant variant : family.variants()) {
            Suspension held =
                    variant.study().orElseThrow().device().suspension().orElseThrow();
            assertThat(held.stiffness()).as(variant.name()).isEqualTo(alone.stiffness());
            assertThat(held.damping()).as(variant.name()).isEqualTo(alone.damping());
        }
    }

    @Test
    void theResonanceIsHeldOnRequest() throws IOException {
        String heavy = "variants: {heavy: {hair: {density: 2.6 g/cm3}}}\n";
        for (Family family : List.of(
                family(heavy, Optional.of(Hold.RESONANCE)), family("hold: resonance\n" + heavy, Optional.empty()))) {
            Study study = family.variants().get(0).study().orElseThrow();
            Suspension held = study.device().suspension().orElseThrow();
            double vacuum = new Oscillator(study.device().hair(), held, Optional.empty()).resonance() / (2.0 * Math.PI);
            assertThat(vacuum).isCloseTo(480.0, within(1e-9));
            assertThat(held.damping())
                    .isEqualTo(
                            family.study().device().suspension().orElseThrow().damping());
        }
        Family chosen = family("hold: resonance\n" + heavy, Optional.of(Hold.STIFFNESS));
        assertThat(chosen.variants()
                        .get(0)
                        .study()
                        .orElseThrow()
                        .device()
                        .suspension()
                        .orElseThrow()
                        .stiffness())
                .isEqualTo(chosen.study().device().suspension().orElseThrow().stiffness());
    }

    private List<String> problems(String variants) {
        try {
            family(variants, Optional.empty());
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream()
                    .map(Problem::text)
                    .map(text -> text.replace(folder + "/", "").replaceAll("; known here: [^;]*", ""))
                    .toList();
        } catch (IOException e) {
            throw new AssertionError(e);
        }
    }

    /** What a variant does not say but makes wrong is told at the nearest thing it says. */
    @Test
    void everyFaultIsToldInsideItsVariant() {
        assertThat(problems("""
                variants:
                  club: {hair: {shape: club, stalk-diameter: 52 um, diameter: 3 um}}
                  typo: {hair: {densty: 2 g/cm3}}
                  unit: {hair: {density: 2}}
                """))
                .containsExactly(
                        "s.yaml:7:16: variants.club.hair.stalk-length: missing; length of the stalk from the wall: length, 100 nm to 1 m",
                        "s.yaml:7:16: variants.club.hair.head-diameter: missing; diameter of the head: length, 10 nm to 1 m",
                        "s.yaml:7:53: variants.club.hair.diameter: belongs to shape: cylinder, not to club",
                        "s.yaml:8:17: variants.typo.hair.densty: unknown key; did you mean variants.typo.hair.density?",
                        "s.yaml:9:26: variants.unit.hair.density: 2 has no unit; a density is wanted here, with its unit: g/cm3, kg/m3,"
                                + " kg/L, g/L; did you mean 2 g/cm3?");
        List<String> built = problems("""
                variants:
                  short: {hair: {length: 70 um}}
                  roof: {cover: {kind: roofed, gap: 0.5 mm, length: 4 mm}}
                  strange: {medium: {name: unobtanium}}
                  high: {suspension: {quality: {value: 9000}}}
                """);
        assertThat(built).hasSize(4);
        assertThat(built.get(0)).startsWith("s.yaml:7:11: variants.short.hair.diameter: 86 um wide and 70 um long;");
        assertThat(built.get(1)).startsWith("s.yaml:8:37: variants.roof.cover.gap: ");
        assertThat(built.get(2)).startsWith("s.yaml:9:28: variants.strange.medium.name: ");
        assertThat(built.get(3)).startsWith("s.yaml:10:32: variants.high.suspension.quality: ");
    }

    @Test
    void namesAndPartsAreChecked() {
        assertThat(problems("""
                variants:
                  nested: {variants: {a: {medium: water}}}
                  empty: {}
                  word: water
                  "a.b": {medium: water}
                """)).hasSize(4).allMatch(text -> text.contains(": variants"));
        assertThat(problems("variants: water\n"))
                .singleElement()
                .asString()
                .startsWith("s.yaml:6:11: variants: water; names of your own are wanted here");
        assertThat(problems("variants: {}\n")).singleElement().asString().contains("0 names; one to 50 are read");
    }

    /** Every command tells of a mistyped key in a variant, not only the one that compares. */
    @Test
    void aStudyWithAFaultyVariantIsRefusedAsAWhole() throws IOException {
        Path file = Files.writeString(folder.resolve("t.yaml"), BASE + "variants: {x: {hair: {densty: 2 g/cm3}}}\n");
        assertThatThrownBy(() -> StudyReader.read(file, List.of()))
                .isInstanceOf(StudyException.class)
                .hasMessageContaining("variants.x.hair.densty");
    }
}
