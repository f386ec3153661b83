package flowshy.study.keys;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import flowshy.stream.surroundings.NamedSurrounding;
import flowshy.stream.surroundings.NamedSurroundings;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.text.StudyText;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.verdict.figure.Figure;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The table against the reader that it drives. */
class KeysTest {
    private static Form read(String text) {
        Problems problems = new Problems();
        Form form = Keys.read(
                StudyText.of("s.yaml", text.getBytes(StandardCharsets.UTF_8)).root(), problems);
        problems.throwIfAny();
        return form;
    }

    private static List<String> problems(String text) {
        try {
            read(text);
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream().map(Problem::text).toList();
        }
    }

    /** A study whose keys under some groups are replaced. */
    private static String with(String more) {
        return Studies.SMALLEST + more;
    }

    @Test
    void everyBuiltKeyIsAcceptedSomewhere() {
        Set<String> written = new LinkedHashSet<>();
        for (String study : Studies.ALL) {
            Form form = read(study);
            form.fields().stream()
                    .filter(Field::given)
                    .forEach(f -> written.add(f.path()
                            .replaceAll("\\[.*", "")
                            .replaceAll("^(surroundings|measurements)\\.[^.]+", "$1.NAME")
                            .replaceAll("^(tolerances|envelope)\\..*", "$1")));
        }
        Set<String> sharedParts = Set.of("mass-fraction", "salinity", "grade");
        List<String> leaves = Keys.rows().stream()
                .filter(row -> row.built()
                        && !(row.value() instanceof Group
                                || row.value() instanceof GroupMap
                                || row.value() instanceof Overrides))
                .map(KeyRow::path)
                .toList();
        assertThat(leaves).hasSizeGreaterThan(100).doesNotHaveDuplicates();
        List<String> here = leaves.stream()
                .filter(path -> !path.contains(".in.") && !path.startsWith("cover.fill."))
                .filter(path -> !sharedParts.contains(path.substring(path.lastIndexOf('.') + 1)))
                .toList();
        assertThat(written).containsAll(here);
    }

    /** Media are stated at six places by one group; each key of it must be read at each place. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "medium: %s",
                "cover: {kind: sealed, fill: %s}",
                "suspension: {resonance: {frequency: 1 Hz, in: %s}}",
                "suspension: {stiffness: 1 N.m/rad, damping: {value: 1 N.m.s/rad, in: %s}}",
                "suspension: {stiffness: 1 N.m/rad, quality: {value: 1, in: %s}}",
                "suspension: {stiffness: 1 N.m/rad, ring-down: {decay-time: 1 s, in: %s}}",
            })
    void everyKeyOfAMediumIsReadWhereverOneStands(String place) {
        String hair = "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\n";
        String above = hair + (place.startsWith("medium") ? "" : "medium: air\n");
        List<String> named = List.of(
                "temperature: 20 degC",
                "pressure: 1 bar",
                "humidity: 1 %",
                "mass-fraction: 3 %",
                "salinity: 35",
                "grade: 100 cSt",
                "second: helium, share: 4 %");
        for (String part : named) {
            assertThat(problems(above + place.formatted("{name: x, " + part + "}")))
                    .as(part)
                    .isEmpty();
        }
        List<String> given =
                List.of("viscosity: 1 mPa.s", "kinematic-viscosity: 1 cSt", "viscosity: 1 mPa.s, sound-speed: 1 km/s");
        for (String part : given) {
            assertThat(problems(above + place.formatted("{density: 1 g/cm3, " + part + "}")))
                    .as(part)
                    .isEmpty();
        }
    }

    @Test
    void theSmallestStudyTakesTheDefaultsOfTheTable() {
        Form form = read(Studies.SMALLEST);
        assertThat(form.taken())
                .extracting(Form.Taken::path, Form.Taken::value)
                .containsExactly(
                        tuple("hair.shape", "cylinder"),
                        tuple("hair.youngs-modulus", "none"),
                        tuple("hair.foot-gap", "a tenth of the foot's radius"),
                        tuple("suspension", "none"),
                        tuple("medium.temperature", "20 degC"),
                        tuple("medium.pressure", "101.325 kPa"),
                        tuple("cover", "open"),
                        tuple("band.from", "1 Hz"),
                        tuple("band.to", "10 kHz"),
                        tuple("accept.rejection", "20 dB"),
                        tuple("finite-length", "auto"));
        assertThat(form.taken()).allSatisfy(t -> assertThat(t.why()).isNotBlank());
        assertThat(form.si("medium.temperature")).isEqualTo(293.15);
        assertThat(form.si("medium.pressure")).isEqualTo(101325.0);
        assertThat(form.given("medium.temperature")).isFalse();
        assertThat(form.given("hair.length")).isTrue();
        assertThat(form.has("suspension")).isFalse();
        assertThat(form.word("cover.kind")).contains("open");
    }

    @Test
    void everyRowSaysWhatItMeans() {
        assertThat(Keys.rows()).hasSizeGreaterThan(120).allSatisfy(row -> {
            assertThat(row.meaning()).isNotBlank().doesNotContain("\n");
            assertThat(row.value().kind()).isNotBlank();
            assertThat(row.defaultWords()).isNotBlank();
        });
        KeyRow head = Keys.row("hair.head-diameter").orElseThrow();
        assertThat(head.words()).containsExactly("shape: club");
        assertThat(head.value().kind()).isEqualTo("length, 10 nm to 1 m");
        assertThat(Keys.row("hair.length").orElseThrow().words())
                .containsExactly("shape: cylinder", "shape: taper", "shape: club");
        assertThat(Keys.row("suspension.quality").orElseThrow().path()).isEqualTo("suspension.quality.value");
        assertThat(Keys.row("cover").orElseThrow().path()).isEqualTo("cover.kind");
        assertThat(Keys.row("nothing")).isEmpty();
    }

    /** A default or a bound that the reader itself would refuse could not be written into a study. */
    @Test
    void everyDefaultAndBoundIsReadableText() {
        int checked = 0;
        for (KeyRow row : Keys.rows()) {
            if (row.value() instanceof Measure measure) {
                assertThat(Quantity.read(measure.least(), measure.dimension()).value())
                        .as(row.path())
                        .isLessThan(Quantity.read(measure.most(), measure.dimension())
                                .value());
                checked++;
            }
        }
        assertThat(checked).isGreaterThan(70);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'diameter: 3 um' | 's.yaml:3:1: diameter: unknown key; known here: TOP; did you mean hair.diameter?'",
                "'mediun: x' | 's.yaml:3:1: mediun: unknown key; known here: TOP; did you mean medium?'",
                "'band: {form: 3 Hz}' | 's.yaml:3:8: band.form: unknown key; known here: from, to; did you mean band.from?'",
                "'band: {from: 3, to: 5 Hz}' | 's.yaml:3:14: band.from: 3 has no unit; a frequency is wanted here, with its unit: Hz, kHz, mHz, MHz, rpm; did you mean 3 Hz?'",
                "'band: {from: 3 s}' | 's.yaml:3:14: band.from: 3 s is a time; a frequency is wanted here, with its unit: Hz, kHz, mHz, MHz, rpm'",
                "'band: {from: 0 Hz}' | 's.yaml:3:14: band.from: 0 Hz; a frequency of 1 mHz to 10 MHz is wanted here'",
                "'band: {from: -3 Hz}' | 's.yaml:3:14: band.from: -3 Hz; a frequency of 1 mHz to 10 MHz is wanted here'",
                "'band: {from: .nan}' | 's.yaml:3:14: band.from: .nan is not a finite number; a frequency is wanted here, with its unit: Hz, kHz, mHz, MHz, rpm'",
                "'band: {from: Infinity Hz}' | 's.yaml:3:14: band.from: Infinity Hz is not a finite number; a frequency is wanted here, with its unit: Hz, kHz, mHz, MHz, rpm'",
                "'band: {from: {a: b}}' | 's.yaml:3:14: band.from: a group of keys; a frequency is wanted here, 1 mHz to 10 MHz'",
                "'band: {from: [3 Hz]}' | 's.yaml:3:14: band.from: a list; a frequency is wanted here, 1 mHz to 10 MHz'",
                "'band: {from: }' | 's.yaml:3:13: band.from: nothing stands here; a frequency is wanted here, 1 mHz to 10 MHz'",
                "'band: 3 Hz' | 's.yaml:3:7: band: 3 Hz; a group of keys is wanted here: from, to'",
                "'band:' | 's.yaml:3:6: band: nothing stands here; a group of keys is wanted here: from, to'",
                "'band: [3 Hz, 5 Hz]' | 's.yaml:3:7: band: a list; a group of keys is wanted here: from, to'",
                "'cover: lid' | 's.yaml:3:8: cover.kind: unknown word lid; one of open, roofed, vented, sealed, measured is wanted here'",
                "'cover: Sealed' | 's.yaml:3:8: cover.kind: unknown word Sealed; one of open, roofed, vented, sealed, measured is wanted here; did you mean sealed?'",
                "'cover: {fill: air}' | 's.yaml:3:8: cover.kind: missing; fill belongs to kind: sealed'",
                "'cover: {kind: open, fill: air}' | 's.yaml:3:21: cover.fill: belongs to kind: sealed, not to open; known here: kind'",
                "'cover: {}' | 's.yaml:3:8: cover.kind: missing; none, a roof, a lid with holes, a closed cavity, a measured one: open | roofed | vented | sealed | measured'",
                "'calibration: {cover: open}' | 's.yaml:3:14: calibration.frequency: missing; frequency of calibration: frequency, 1 mHz to 10 MHz'",
                "'motion: 0.2 m/s2' | 's.yaml:3:9: motion: 0.2 m/s2; a group of keys is wanted here: smallest, full-scale, spectrum'",
                "'motion: {smalest: 0.2 m/s2}' | 's.yaml:3:10: motion.smalest: unknown key; known here: smallest, full-scale, spectrum; did you mean motion.smallest?'",
                "'motion: {spectrum: [[20 Hz, 3 g2/Hz]]}' | 's.yaml:3:20: motion.spectrum.points: 1 pairs; two to 1000 are read'",
                "'motion: {spectrum: [[20 Hz, 3 g/Hz], [30 Hz, 0 g2/Hz]]}' | 's.yaml:3:29: motion.spectrum.points[0].density: 3 g/Hz is something else; an acceleration density is wanted here, with its unit: g2/Hz, (m/s2)2/Hz, mg2/Hz, (mm/s2)2/Hz'",
                "'motion: {spectrum: {}}' | 's.yaml:3:20: motion.spectrum: one of points, file is missing; state one of them'",
                "'surroundings: draught' | 's.yaml:3:15: surroundings: draught; names of your own are wanted here, each with a source behind it'",
                "'surroundings: {}' | 's.yaml:3:15: surroundings: 0 names; one to 50 are read'",
                "'surroundings: {a.b: {like: still room}}' | 's.yaml:3:16: surroundings: a name that no path can hold: a.b; a name has up to 40 characters, none of . [ ] ='",
                "'surroundings: {\"a\\u0007b\": {like: still room}}' | 's.yaml:3:16: surroundings: a control character in a name: a\uFFFDb; a name has up to 40 characters, none of . [ ] ='",
                "'surroundings: {\" \": {like: still room}}' | 's.yaml:3:16: surroundings: an empty name:  ; a name has up to 40 characters, none of . [ ] ='",
                "'surroundings: {a: {like: still room}, \"a \": {like: still room}}' | 's.yaml:3:39: surroundings: a repeated name: a ; a name has up to 40 characters, none of . [ ] ='",
                "'surroundings: {a: {like: stil room}}' | 's.yaml:3:26: surroundings.a.like: unknown word stil room; one of LIKES is wanted here; did you mean still room?'",
                "'surroundings: {a: {like: still room, kind: sound}}' | 's.yaml:3:26: surroundings.a.like: still room beside kind: sound; still room is of kind: stream'",
                "'surroundings: {a: {like: still room, level: 3 dB}}' | 's.yaml:3:38: surroundings.a.level: belongs to kind: sound, not to stream; known here: kind, mean-speed, turbulence, length-scale, fetch, like, direction'",
                "'surroundings: {a: {mean-speed: 3 m/s}}' | 's.yaml:3:19: surroundings.a.kind: missing; mean-speed belongs to kind: stream or duct or spectrum or record'",
                "'surroundings: {a: {direction: 3 deg}}' | 's.yaml:3:19: surroundings.a.kind: missing; a stream over the wall, the flow of a duct, an oscillation, sound, a measured spectrum, a time record: stream | duct | tone | sound | spectrum | record'",
                "'surroundings: {a: {kind: stream}}' | 's.yaml:3:19: surroundings.a.mean-speed: missing; mean speed far from the wall: speed, 1 um/s to 300 m/s'",
                "'surroundings: {a: {kind: stream, volume-flow: 3 m3/h}}' | 's.yaml:3:19: surroundings.a.mean-speed: missing; mean speed far from the wall: speed, 1 um/s to 300 m/s & s.yaml:3:34: surroundings.a.volume-flow: belongs to kind: duct, not to stream; known here: kind, mean-speed, turbulence, length-scale, fetch, like, direction'",
                "'surroundings: {a: {kind: duct, diameter: 3 mm}}' | 's.yaml:3:19: surroundings.a: one of mean-speed, volume-flow is missing; state one of them'",
                "'surroundings: {a: {kind: duct, mean-speed: 3 mm/s, width: 3 mm}}' | 's.yaml:3:19: surroundings.a.height: missing; width goes with it'",
                "'surroundings: {a: {kind: duct, mean-speed: 3 mm/s, height: 3 mm}}' | 's.yaml:3:19: surroundings.a.width: missing; height goes with it'",
                "'surroundings: {a: {kind: duct, mean-speed: 3 mm/s, diameter: 1 m, height: 3 mm}}' | 's.yaml:3:67: surroundings.a.height: stands beside diameter; keep one of the two'",
                "'surroundings: {a: {kind: sound, level: 80 dB, to: 3 kHz}}' | 's.yaml:3:19: surroundings.a.from: missing; level goes with it'",
                "'surroundings: {a: {kind: sound, from: 1 kHz, to: 3 kHz}}' | 's.yaml:3:19: surroundings.a.level: missing; from goes with it'",
                "'surroundings: {a: {kind: sound}}' | 's.yaml:3:19: surroundings.a: one of level, levels is missing; state one of them'",
                "'surroundings: {a: {kind: spectrum, file: a.csv, columns: f, quantity: density, unit: Pa2/Hz}}' | 's.yaml:3:58: surroundings.a.columns: f; a list is wanted here, such as [f, S]'",
                "'title: \"\"' | 's.yaml:3:8: title: nothing stands here; text is wanted here'",
                "'title: {a: b}' | 's.yaml:3:8: title: a group of keys; text is wanted here'",
                "'title: \"a\\ab\"' | 's.yaml:3:8: title: control character in the text; one line of plain text'",
                "'suspension: {stiffness: 1 N.m/rad, resonance: 3 Hz}' | 's.yaml:3:36: suspension.resonance: stands beside stiffness; keep one of the two'",
                "'suspension: {stiffness: 1 N.m/rad, quality: 3, damping: 1 N.m.s/rad}' | 's.yaml:3:36: suspension.quality: stands beside damping; keep one of the two'",
                "'suspension: {stiffness: 1 N.m/rad, quality: {in: air}}' | 's.yaml:3:45: suspension.quality.value: missing; quality factor: pure number, 0.01 to 1e8'",
                "'suspension: {stiffness: 1 N.m/rad, quality: 3 %}' | 's.yaml:3:45: suspension.quality.value: 3 % has a unit; a pure number is wanted here, without a unit'",
                "'suspension: {resonance: {frequency: 3 Hz, in: {name: vacuum, pressure: 1 Pa}}}' | 's.yaml:3:62: suspension.resonance.in.pressure: not wanted here; it has no meaning with name: vacuum'",
                "'suspension: {stiffness: 1 N.m/rad, film: {length: 90 um, width: 90 um}}' | 's.yaml:3:42: suspension.film.gap: missing; height of the gap under the level plate: length, 1 nm to 10 mm'",
                "'suspension: {stiffness: 1 N.m/rad, quality: {value: 3, cover: lid}}' | 's.yaml:3:63: suspension.quality.cover.kind: unknown word lid; one of open, sealed is wanted here'",
                "'suspension: {stiffness: 1 N.m/rad, quality: {value: 3, cover: {kind: sealed, height: 1 mm}}}' | 's.yaml:3:63: suspension.quality.cover.diameter: missing; height goes with it'",
                "'suspension: {stiffness: 1 N.m/rad, quality: {value: 3, cover: {kind: open, height: 1 mm}}}' | 's.yaml:3:76: suspension.quality.cover.height: belongs to kind: sealed, not to open; known here: kind'",
                "'suspension: {stiffness: 1 N.m/rad, ring-down: {frequency: 3 Hz}}' | 's.yaml:3:47: suspension.ring-down.decay-time: missing; frequency goes with it'",
            })
    void problemsOfOneLineAreToldExactly(String line, String problem) {
        String names =
                NamedSurroundings.all().stream().map(NamedSurrounding::name).collect(Collectors.joining(", "));
        assertThat(problems(with(line)))
                .containsExactly(problem.replace("LIKES", names)
                        .replace("TOP", topKeys())
                        .split(" & "));
    }

    private static String topKeys() {
        return Keys.rows().stream()
                .filter(row -> row.built() && !row.path().contains("."))
                .map(KeyRow::path)
                .collect(Collectors.joining(", "));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'hair: {length: 1 mm, diameter: 9 um, density: 1 g/cm3}' | 's.yaml:1:1: medium: missing; gas or liquid around the device: name, or a group of keys'",
                "'medium: air' | 's.yaml:1:1: hair: missing; the hair: group of keys'",
                "'hair:\nmedium: air' | 's.yaml:1:6: hair: nothing stands here; a group of keys is wanted here: shape, length, diameter, density, youngs-modulus, foot-gap'",
                "'medium: air\nhair: {shape: stick, density: 1 g/cm3, radius: 3 um}' | 's.yaml:2:15: hair.shape: unknown word stick; one of cylinder, taper, club, profile is wanted here'",
                "'medium: air\nhair: {length: 1 mm, stalk-diameter: 9 um, density: 1 g/cm3}' | 's.yaml:2:7: hair.shape: missing; stalk-diameter belongs to shape: club'",
                "'medium: air\nhair: {shape: taper, length: 1 mm, diameter: 9 um, base-diameter: 9 um, tip-diameter: 1 um, density: 1 g/cm3}' | 's.yaml:2:36: hair.diameter: belongs to shape: cylinder, not to taper; known here: shape, length, base-diameter, tip-diameter, density, youngs-modulus, foot-gap'",
                "'medium: air\nhair: {length: 1 mm, diametre: 9 um, density: 1 g/cm3}' | 's.yaml:2:22: hair.diametre: unknown key; known here: shape, length, diameter, density, youngs-modulus, foot-gap; did you mean hair.diameter?'",
                "'medium: air\nhair: {shape: profile, points: [[0 um, 9 um]], density: 1 g/cm3}' | 's.yaml:2:32: hair.points: 1 pairs; two to 1000 are read'",
                "'medium: air\nhair: {shape: profile, points: [[0 um, 9 um], [9 um]], density: 1 g/cm3}' | 's.yaml:2:47: hair.points[1]: a list; a pair [z, diameter] is wanted here'",
                "'medium: air\nhair: {shape: profile, points: [[0 um, 9 um], [9 um, 3]], density: 1 g/cm3}' | 's.yaml:2:54: hair.points[1].diameter: 3 has no unit; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil; did you mean 3 um?'",
                "'hair: {length: 1 mm, diameter: 9 um, density: 1 g/cm3}\nmedium: {temperature: 3 degC}' | 's.yaml:2:9: medium: one of name, file, density is missing; state one of them'",
                "'hair: {length: 1 mm, diameter: 9 um, density: 1 g/cm3}\nmedium: {name: air, density: 1 g/cm3, viscosity: 1 cP}' | 's.yaml:2:21: medium.density: stands beside name; keep one of the two'",
                "'hair: {length: 1 mm, diameter: 9 um, density: 1 g/cm3}\nmedium: {density: 1 g/cm3}' | 's.yaml:2:9: medium: one of viscosity, kinematic-viscosity is missing; state one of them'",
                "'hair: {length: 1 mm, diameter: 9 um, density: 1 g/cm3}\nmedium: {name: argon, share: 3 %}' | 's.yaml:2:9: medium.second: missing; share goes with it'",
            })
    void problemsOfWholeStudiesAreToldExactly(String text, String problem) {
        assertThat(problems(text)).containsExactly(problem);
    }

    @Test
    void aDecimalCommaInBracesIsExplained() {
        assertThat(problems(with("accept: {rejection: 0,5 dB}")))
                .containsExactly(
                        "s.yaml:3:21: accept.rejection: 0 has no unit; a level is wanted here, with its unit: dB; did you mean 0 dB?",
                        "s.yaml:3:23: accept.5 dB: unknown key; known here: rejection, error, "
                                + String.join(
                                        ", ",
                                        AcceptKeys.figures().stream()
                                                .map(Figure::word)
                                                .toList())
                                + "; a decimal comma splits a value in two: write a point");
    }

    @Test
    void allProblemsComeTogetherInTheOrderOfTheText() {
        List<String> found = problems("""
                hair: {shape: club, lenght: 1 mm, stalk-diameter: 95, head-diameter: -5 um, density: 1.2 Hz}
                medium: {name: air, presure: 1 bar}
                accept: {rejection: 20}
                """);
        assertThat(found.stream()
                        .map(p -> p.split(": ", -1)[0] + " " + p.split(": ", -1)[1])
                        .toList())
                .containsExactly(
                        "s.yaml:1:7 hair.stalk-length",
                        "s.yaml:1:21 hair.lenght",
                        "s.yaml:1:51 hair.stalk-diameter",
                        "s.yaml:1:70 hair.head-diameter",
                        "s.yaml:1:86 hair.density",
                        "s.yaml:2:21 medium.presure",
                        "s.yaml:3:21 accept.rejection");
    }

    @Test
    void amplitudesKeepTheirWordAndOtherQuantitiesRefuseIt() {
        Form form = read(with("accept: {error: 0.3 m/s2 peak}"));
        assertThat(form.si("accept.error")).isEqualTo(0.3 / Math.sqrt(2.0), within(1e-16));
        assertThat(form.field("accept.error").orElseThrow().written()).isEqualTo("0.3 m/s2 peak");
        assertThat(problems(with("band: {from: 3 Hz rms}")))
                .singleElement()
                .asString()
                .contains("rms or peak is not asked for here");
    }

    @Test
    void oneNumberCanBeReplacedWithoutReadingAgain() {
        Form form = read(Studies.SMALLEST);
        Form thicker = form.with("hair.diameter", 99e-6);
        assertThat(thicker.si("hair.diameter")).isEqualTo(99e-6);
        assertThat(thicker.word("hair.diameter")).contains("99 um");
        assertThat(form.si("hair.diameter")).isEqualTo(77e-6);
        Form warm = form.with("medium.temperature", 300.0);
        assertThat(warm.given("medium.temperature")).isTrue();
        assertThat(warm.taken()).extracting(Form.Taken::path).doesNotContain("medium.temperature");
        assertThatThrownBy(() -> form.with("hair.shape", 1.0)).isInstanceOf(IllegalStateException.class);
        assertThatThrownBy(() -> form.with("hair.head-diameter", 1.0)).isInstanceOf(IllegalStateException.class);
        assertThatThrownBy(() -> form.si("hair.shape")).isInstanceOf(IllegalStateException.class);
    }

    @Test
    void positionsFallBackToTheGroupAbove() {
        Form form = read(Studies.SMALLEST);
        assertThat(form.position("hair.diameter")).hasToString("s.yaml:1:34");
        assertThat(form.position("hair.shape")).hasToString("s.yaml:1:7");
        assertThat(form.position("medium.temperature")).hasToString("s.yaml:2:9");
        assertThat(form.position("hair.youngs-modulus")).hasToString("s.yaml:1:7");
        assertThat(form.position("suspension.quality.in.name")).hasToString("s.yaml:1:1");
    }

    @Test
    void theDimensionOfAKeyDecidesWhatMgMeans() {
        Form form = read(with("accept: {error: 3 mg}"));
        assertThat(form.si("accept.error")).isEqualTo(0.02941995);
        assertThat(form.field("accept.error")
                        .orElseThrow()
                        .quantity()
                        .orElseThrow()
                        .dimension())
                .isEqualTo(Dimension.ACCELERATION);
        assertThat(Keys.rows().stream().map(KeyRow::path).toList()).contains("accept.error");
    }

    @Test
    void everyKeyHasItsPlaceInTheListOfKeys() {
        List<String> listed = Keys.rows().stream().map(KeyRow::path).toList();
        assertThat(listed).hasSizeGreaterThan(100).doesNotHaveDuplicates();
        for (int i = 0; i < listed.size(); i++) {
            assertThat(Keys.place(listed.get(i))).as(listed.get(i)).isEqualTo(i);
        }
        assertThat(Keys.place("candidates[3].gap")).isEqualTo(listed.indexOf("candidates"));
        assertThat(Keys.place("hair.points[2].z")).isEqualTo(listed.indexOf("hair.points"));
        assertThat(Keys.place("nothing.of.the.kind")).isEqualTo(listed.size());
    }
}
