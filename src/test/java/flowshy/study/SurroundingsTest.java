package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.StepDensity;
import flowshy.medium.Medium;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.sound.SoundLevel;
import flowshy.stream.sound.SoundWave;
import flowshy.stream.surroundings.Duct;
import flowshy.stream.surroundings.NamedSurrounding;
import flowshy.stream.surroundings.NamedSurroundings;
import flowshy.stream.surroundings.Sound;
import flowshy.stream.surroundings.Stream;
import flowshy.stream.surroundings.Tone;
import flowshy.stream.wall.DuctFlow;
import flowshy.stream.wall.DuctSection;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The flows around, from the study's words to sources, and what is not taken. */
class SurroundingsTest {
    private static final String HAIR = "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\n";
    private static final double THIRTY_DEGREES = Math.PI / 6.0;

    @TempDir
    private Path folder;

    private Study study(String medium, String sources, String... settings) {
        try {
            String text = HAIR + "medium: " + medium + "\nsurroundings: {" + sources + "}\n";
            return StudyReader.read(Files.writeString(folder.resolve("s.yaml"), text), List.of(settings));
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private Study study(String sources) {
        return study("nitrogen", sources);
    }

    private Source source(String keys) {
        Study study = study("this one: {" + keys + "}");
        assertThat(study.surroundings()).hasSize(1);
        assertThat(study.question().sources()).isEqualTo(study.surroundings());
        return study.surroundings().get(0);
    }

    private List<String> problems(String medium, String keys) {
        try {
            study(medium, "a: {" + keys + "}");
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream()
                    .map(Problem::text)
                    .map(text -> text.replace(folder + "/", ""))
                    .toList();
        }
    }

    private void write(String file, String text) {
        try {
            Files.writeString(folder.resolve(file), text);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private Medium nitrogen() {
        return study("x: {like: still room}").device().outside();
    }

    private static void same(Source found, Source expected) {
        assertThat(found).usingRecursiveComparison().isEqualTo(expected);
        assertThat(found).hasSameClassAs(expected);
    }

    @Test
    void everyKindArrivesWithItsNumbers() {
        Medium medium = nitrogen();
        same(
                source(
                        "kind: stream, mean-speed: 30 cm/s, turbulence: 35 %, length-scale: 60 mm, fetch: 8 mm, direction: 30 deg"),
                new Stream(
                        "this one",
                        THIRTY_DEGREES,
                        0.3,
                        Stated.given("turbulence", 0.35),
                        Stated.given("length-scale", 0.06),
                        Stated.given("fetch", 0.008),
                        medium));
        DuctSection rectangle = new DuctSection.Rectangular(0.2, 0.12);
        same(
                source("kind: duct, width: 200 mm, height: 120 mm, mean-speed: 2 m/s"),
                Duct.of(
                        "this one",
                        0.0,
                        new DuctFlow(rectangle, 2.0, medium.kinematicViscosity()),
                        Optional.empty(),
                        Optional.empty()));
        same(
                source("kind: duct, diameter: 50 mm, volume-flow: 6 L/min, turbulence: 4 %, length-scale: 7 mm"),
                Duct.of(
                        "this one",
                        0.0,
                        new DuctFlow(
                                new DuctSection.Round(0.05),
                                1e-4 / (0.25 * Math.PI * 0.05 * 0.05),
                                medium.kinematicViscosity()),
                        Optional.of(Stated.given("turbulence", 0.04)),
                        Optional.of(Stated.given("length-scale", 0.007))));
        same(
                source("kind: tone, frequency: 150 Hz, speed: 4 mm/s peak, direction: -30 deg"),
                new Tone("this one", -THIRTY_DEGREES, 150.0, 0.004 / Math.sqrt(2.0), medium));
        SoundWave plane = SoundWave.plane(medium.density(), medium.soundSpeed().orElseThrow());
        same(
                source("kind: sound, level: 82 dB, from: 100 Hz, to: 2 kHz"),
                new Sound("this one", 0.0, Sound.over(SoundLevel.IN_GAS, 82.0, 100.0, 2000.0), plane, medium));
    }

    /** Third-octaves by their rounded names; a small source near by moves more fluid than its level says. */
    @Test
    void soundByThirdOctavesFromASmallSource() {
        Medium medium = nitrogen();
        Source horn = source("kind: sound, levels: [[100 Hz, 71 dB], [125 Hz, 74 dB]], distance: 20 cm");
        SoundWave wave = new SoundWave(medium.density(), medium.soundSpeed().orElseThrow(), 0.2);
        StepDensity pressure = new StepDensity(
                List.of(
                        Sound.band(SoundLevel.IN_GAS, 71.0, 89.12509381337456, 112.20184543019634),
                        Sound.band(SoundLevel.IN_GAS, 74.0, 112.20184543019634, 141.25375446227545)),
                StepDensity.Inside.PINK);
        double expected = pressure.at(120.0) * Math.pow(wave.velocityPerPressure(120.0), 2.0);
        assertThat(horn.density(120.0) / expected).isCloseTo(1.0, within(1e-12));
        assertThat(horn.density(150.0)).isZero();
        assertThat(horn.kind()).isEqualTo(SourceKind.SOUND);
    }

    /** In a liquid a level counts over 1 µPa, in a gas over 20 µPa; which one is told. */
    @Test
    void theReferenceOfALevelFollowsTheMedium() {
        String pump = "pump: {kind: sound, level: 120 dB, from: 100 Hz, to: 200 Hz}";
        Study water = study("water", pump);
        Medium medium = water.device().outside();
        double meanSquare = water.surroundings().get(0).density(150.0) * 150.0 * Math.log(2.0);
        double speed = 1.0 / (medium.density() * medium.soundSpeed().orElseThrow());
        assertThat(Math.sqrt(meanSquare) / speed).isCloseTo(1.0, within(1e-12));
        assertThat(water.takenAs())
                .contains(new Study.TakenAs("surroundings.pump.level", "dB re 1 uPa", "usual for sound in a liquid"));
        assertThat(study("air", pump).takenAs())
                .contains(new Study.TakenAs("surroundings.pump.level", "dB re 20 uPa", "usual for sound in a gas"));
    }

    /** Only the mean speed is required of a stream; what else it is taken to be is listed with its source, and may be varied. */
    @Test
    void aBareStreamTakesTheDefaultsWithTheirSources() {
        Study study = study("draught: {kind: stream, mean-speed: 0.3 m/s}");
        List<Stated> assumed = study.surroundings().get(0).assumed();
        assertThat(assumed)
                .extracting(Stated::key, Stated::value, Stated::source)
                .containsExactly(List.of("turbulence", "length-scale", "fetch").stream()
                        .map(NamedSurroundings::ofBareStream)
                        .map(number -> tuple(number.key(), number.value(), number.source()))
                        .toArray(org.assertj.core.groups.Tuple[]::new));
        assertThat(study.takenAs())
                .extracting(Study.TakenAs::key, Study.TakenAs::value)
                .containsSubsequence(
                        tuple("cover", "open"),
                        tuple("surroundings.draught.turbulence", "40 %"),
                        tuple("surroundings.draught.length-scale", "0.1 m"),
                        tuple("surroundings.draught.fetch", "0.02 m"),
                        tuple("surroundings.draught.direction", "0 deg"),
                        tuple("finite-length", "auto"));
        Study stated = study("draught: {kind: stream, mean-speed: 0.3 m/s, turbulence: 40 %}");
        assertThat(stated.surroundings().get(0).assumed())
                .extracting(Stated::key)
                .containsExactly("length-scale", "fetch");
    }

    /** Every named set is a source by itself, with the numbers of its table. */
    @Test
    void everyNamedSetIsASource() {
        int checked = 0;
        for (NamedSurrounding named : NamedSurroundings.all()) {
            String medium = named.name().contains("water") ? "water" : "air";
            Study study = study(medium, "mine: {like: " + named.name() + "}");
            Source source = study.surroundings().get(0);
            assertThat(source.kind()).as(named.name()).isEqualTo(named.kind());
            for (NamedSurrounding.StartingValue number : named.numbers()) {
                String key = number.stated().key();
                assertThat(study.takenAs())
                        .as(named.name())
                        .anySatisfy(taken -> assertThat(taken.key() + " " + taken.why())
                                .isEqualTo("surroundings.mine." + key + " as " + named.name() + ": "
                                        + number.stated().source()));
                assertThat(study.understood()).extracting(Study.Understood::key).contains("surroundings.mine." + key);
                checked++;
            }
            named.number("turbulence")
                    .ifPresent(number ->
                            assertThat(source.assumed().get(0).value()).isCloseTo(number.value(), within(1e-14)));
        }
        assertThat(checked).isGreaterThan(30);
    }

    @Test
    void aWrittenKeyOverridesItsStartingValueAndOnlyThat() {
        Study study = study("window: {like: ventilated room, mean-speed: 0.7 m/s, fetch: 3 mm}");
        Source window = study.surroundings().get(0);
        assertThat(window.name()).isEqualTo("window");
        assertThat(window.meanSpeed()).isEqualTo(0.7);
        assertThat(window.assumed()).extracting(Stated::key).containsExactly("turbulence", "length-scale");
        assertThat(study.takenAs())
                .extracting(Study.TakenAs::key)
                .contains("surroundings.window.turbulence", "surroundings.window.kind")
                .doesNotContain("surroundings.window.mean-speed", "surroundings.window.fetch");
        assertThat(study.understood())
                .contains(
                        new Study.Understood("surroundings.window.like", "ventilated room", "ventilated room"),
                        new Study.Understood("surroundings.window.kind", "stream", "stream"),
                        new Study.Understood("surroundings.window.mean-speed", "0.7 m/s", "0.7 m/s"),
                        new Study.Understood("surroundings.window.length-scale", "0.2 m", "0.2 m"));
        // a flow in place of a speed pushes the starting speed out
        Source duct = study("d: {like: ventilation duct, volume-flow: 0.06 m3/s}")
                .surroundings()
                .get(0);
        Source asSpeed = study("d: {like: ventilation duct, mean-speed: 1 m/s}")
                .surroundings()
                .get(0);
        assertThat(duct.meanSpeed() / asSpeed.meanSpeed()).isCloseTo(1.0, within(1e-12));
    }

    @Test
    void sourcesKeepTheOrderAndTheNamesOfTheText() {
        Study study = study(
                "z: {like: still room}, fan tone: {kind: tone, frequency: 1 Hz, speed: 1 m/s}, A: {like: office noise}");
        assertThat(study.surroundings()).extracting(Source::name).containsExactly("z", "fan tone", "A");
        assertThat(study.takenAs().stream()
                        .map(Study.TakenAs::key)
                        .filter(key -> key.startsWith("surroundings."))
                        .map(key -> key.split("\\.", -1)[1])
                        .distinct()
                        .toList())
                .containsExactly("z", "fan tone", "A");
        assertThat(study("nitrogen", "z: {like: still room}").surroundings()).hasSize(1);
    }

    /** Settings reach into a source by its name, and may add one. */
    @Test
    void settingsReachIntoASource() {
        Study study = study(
                "nitrogen",
                "fan tone: {kind: tone, frequency: 150 Hz, speed: 4 mm/s}",
                "surroundings.fan tone.frequency=80 Hz",
                "surroundings.extra.like=open window",
                "surroundings.extra.mean-speed=1 m/s");
        assertThat(study.surroundings().get(0).lines()).containsExactly(new Line(80.0, 0.004));
        assertThat(study.surroundings().get(1).meanSpeed()).isEqualTo(1.0);
        Study other = study(
                "nitrogen",
                "a: {kind: stream, mean-speed: 1 m/s, fetch: 1 cm}",
                "surroundings.a.kind=duct",
                "surroundings.a.diameter=3 cm");
        assertThat(other.surroundings().get(0).kind()).isEqualTo(SourceKind.DUCT);
    }

    @Test
    void aMeasuredSpectrumIsAStreamOrAnOscillation() {
        write("a.csv", "probe 3\nrow\nf;S\n1;0.01\n10;0.001\n100;1e-5\n");
        String file = "kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: (m/s)2/Hz, skip: 3";
        Study study = study("logged: {" + file + "}, carried: {" + file + ", mean-speed: 0.5 m/s}");
        Source oscillation = study.surroundings().get(0);
        Source stream = study.surroundings().get(1);
        assertThat(oscillation.driven()).isTrue();
        assertThat(oscillation.meanSpeed()).isZero();
        assertThat(oscillation.density(10.0)).isCloseTo(0.001, within(1e-15));
        assertThat(stream.driven()).isFalse();
        assertThat(stream.meanSpeed()).isEqualTo(0.5);
        assertThat(stream.kind()).isEqualTo(SourceKind.SPECTRUM);
        assertThat(stream.assumed()).extracting(Stated::key).containsExactly("fetch");
        assertThat(study.takenAs())
                .extracting(Study.TakenAs::key)
                .contains("surroundings.carried.fetch")
                .doesNotContain("surroundings.logged.fetch");
        assertThat(study.origin().filesRead())
                .singleElement()
                .satisfies(read -> assertThat(read.file()).isEqualTo("a.csv"))
                .satisfies(read -> assertThat(read.sha256()).matches("[0-9a-f]{64}"));
        Study given = study("carried: {" + file + ", mean-speed: 0.5 m/s, fetch: 3 cm}");
        assertThat(given.surroundings().get(0).assumed()).isEmpty();
    }

    /** 1 Pa rms in one third-octave is 1/(ρc) of velocity. */
    @Test
    void measuredSoundPressureBecomesVelocity() {
        write("a.csv", "100 94\n125 0\n");
        Source sound =
                source("kind: spectrum, file: a.csv, columns: [f, L], quantity: band levels, unit: dB re 20 uPa");
        double perPressure =
                1.0 / (nitrogen().density() * nitrogen().soundSpeed().orElseThrow());
        double meanSquare = sound.density(100.0) * 100.0 * Math.log(Math.pow(10.0, 0.1));
        assertThat(Math.sqrt(meanSquare) / perPressure).isCloseTo(1.00237, within(1e-5));
        write("a.csv", "100 0.002\n150 0.001\n");
        Source lines = source("kind: spectrum, file: a.csv, columns: [f, u], quantity: rms lines, unit: m/s peak");
        assertThat(lines.lines().get(0).frequency()).isEqualTo(100.0);
        assertThat(lines.lines().get(0).deviation()).isCloseTo(0.002 / Math.sqrt(2.0), within(1e-17));
    }

    /** A record of an anemometer: its mean is the stream, Welch's method the fluctuation; both are told. */
    @Test
    void aTimeRecordBecomesAStream() {
        StringBuilder record = new StringBuilder("t,u\n");
        for (int i = 0; i < 2048; i++) {
            double u = 40.0 + 5.0 * Math.sin(2.0 * Math.PI * 12.5 * i / 100.0);
            record.append(String.format(Locale.ROOT, "%d,%.6f%n", 10 * i, u));
        }
        write("b.csv", record.toString());
        Study study =
                study("probe: {kind: record, file: b.csv, columns: ['t [ms]', u], unit: cm/s, skip: 1, fetch: 2 cm}");
        Source probe = study.surroundings().get(0);
        assertThat(probe.kind()).isEqualTo(SourceKind.RECORD);
        assertThat(probe.meanSpeed()).isCloseTo(0.4, within(1e-4));
        assertThat(study.takenAs())
                .extracting(Study.TakenAs::key, Study.TakenAs::why)
                .contains(
                        tuple("surroundings.probe.mean-speed", "mean of b.csv"),
                        tuple(
                                "surroundings.probe.resolution",
                                "Welch's method: Hann window, 50 % overlap, 15 averages of 256 samples, random error of a line 27 %"));
        Study other = study(
                "probe: {kind: record, file: b.csv, columns: ['-', u], unit: cm/s, skip: 1, rate: 100 Hz, mean-speed: 2 m/s}");
        assertThat(other.surroundings().get(0).meanSpeed()).isEqualTo(2.0);
    }

    @Test
    void faultsOfAMeasuredFileAreToldAtItsLines() {
        write("a.csv", "f,S\n1,0.01\n3,abc\n2,0.02\n");
        String file = "kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: (m/s)2/Hz, skip: 1";
        assertThat(problems("nitrogen", file))
                .containsExactly("a.csv:3:3: surroundings.a.file: 'abc' in column S; a number such as 0.25 or 2.5e-1");
        write("a.csv", "1,0.01\n3,0.02\n2,0.02\n");
        assertThat(problems("nitrogen", file.replace("skip: 1", "skip: 0")))
                .containsExactly(
                        "a.csv:3:1: surroundings.a.file: a frequency that does not rise; each frequency above the one before");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "kind: duct, diameter: 0.5 mm, mean-speed: 1 m/s | s.yaml:3:42: surroundings.a.diameter: a duct that the hair does not fit in; more than the hair's 0.6100 mm",
                "kind: duct, width: 9 mm, height: 0.61 mm, mean-speed: 1 m/s | s.yaml:3:53: surroundings.a.height: a duct that the hair does not fit in; more than the hair's 0.6100 mm",
                "kind: duct, diameter: 30 m, mean-speed: 300 m/s | s.yaml:3:60: surroundings.a.mean-speed: a Reynolds number of 5.97e+08 in the duct; less than 3.40e+07, where the law of its friction ends",
                "kind: duct, diameter: 1 cm, mean-speed: 1 cm/s, length-scale: 1 mm | s.yaml:3:82: surroundings.a.length-scale: a length scale of a laminar flow (Re = 6.63); turbulence beside it, if what the duct carries comes from upstream; else neither",
                "kind: stream, mean-speed: 100 m/s, fetch: 1 km | s.yaml:3:62: surroundings.a.fetch: a Reynolds number of 6.63e+09 on the fetch; less than 1.00e+09, where the wall law ends",
                "kind: sound, level: 80 dB, from: 2 kHz, to: 1 kHz | s.yaml:3:53: surroundings.a.from: a band from 2 kHz to 1 kHz is upside down; from lies below to",
                "kind: sound, levels: [[110 Hz, 3 dB], [125 Hz, 3 dB]] | s.yaml:3:43: surroundings.a.levels[0].frequency: 110 Hz is no mid-band frequency of a third-octave; the nearest is 100 Hz",
                "kind: sound, levels: [[125 Hz, 3 dB], [100 Hz, 3 dB]] | s.yaml:3:59: surroundings.a.levels[1].frequency: a third-octave that does not rise; each above the one before",
                "kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: m/s | UNIT",
                "kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: g2/Hz | s.yaml:3:91: surroundings.a.unit: an acceleration; a velocity or a sound pressure; motion stands under motion",
                "kind: spectrum, file: a.csv, columns: [f, S, X], quantity: density, unit: Pa2/Hz | COLUMNS",
                "kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: Pa2/Hz, mean-speed: 1 m/s | s.yaml:3:111: surroundings.a.mean-speed: given for a sound pressure; only for a velocity",
                "kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: (m/s)2/Hz, distance: 1 m | s.yaml:3:112: surroundings.a.distance: given for a velocity; only for a sound pressure",
                "kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: (m/s)2/Hz, fetch: 1 m | s.yaml:3:109: surroundings.a.fetch: given for an oscillation; only beside mean-speed",
                "kind: spectrum, file: a.csv, columns: [f, S], quantity: rms lines, unit: m/s, mean-speed: 1 m/s | s.yaml:3:110: surroundings.a.mean-speed: given for rms lines; a stream carries a density, or band levels",
                "kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: Pa2/Hz, skip: 1.5 | s.yaml:3:105: surroundings.a.skip: a share of a line; a whole number",
                "kind: spectrum, file: none.csv, columns: [f, S], quantity: density, unit: Pa2/Hz | s.yaml:3:42: surroundings.a.file: none.csv: no such file beside the study; name a text file",
            })
    void whatNoLawCoversIsRefusedAtItsKey(String keys, String problem) {
        write("a.csv", "1 2\n3 4\n");
        List<String> found = problems("nitrogen", keys);
        if (problem.equals("UNIT")) {
            assertThat(found)
                    .singleElement()
                    .asString()
                    .startsWith("s.yaml:3:91: surroundings.a.unit: 'm/s': says nothing of the bandwidth; (m/s)2/Hz, ");
        } else if (problem.equals("COLUMNS")) {
            assertThat(found)
                    .singleElement()
                    .asString()
                    .startsWith("s.yaml:3:58: surroundings.a.columns: 2 columns of values, one is needed; ");
        } else {
            assertThat(found).containsExactly(problem);
        }
    }

    @Test
    void soundNeedsASoundSpeed() {
        assertThat(problems(
                        "{density: 1.2 kg/m3, viscosity: 18 uPa.s}", "kind: sound, level: 80 dB, from: 1 Hz, to: 9 Hz"))
                .containsExactly(
                        "s.yaml:3:19: surroundings.a: the sound speed of medium of the study is not known; state medium.sound-speed");
        assertThat(study("{density: 1.2 kg/m3, viscosity: 18 uPa.s}", "a: {like: still room}")
                        .surroundings())
                .hasSize(1);
    }

    /** One bad source does not hide the faults of the next. */
    @Test
    void problemsOfEverySourceComeTogether() {
        List<String> found = new ArrayList<>();
        try {
            study("a: {kind: duct, diameter: 0.5 mm, mean-speed: 1 m/s}, b: {like: windy}, "
                    + "c: {kind: sound, level: 80 dB, from: 2 Hz, to: 1 Hz}, d: {like: still room}");
        } catch (StudyException e) {
            e.problems().forEach(problem -> found.add(problem.path()));
        }
        assertThat(found).containsExactly("surroundings.a.diameter", "surroundings.b.like", "surroundings.c.from");
    }
}
