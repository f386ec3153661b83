package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.hair.Taper;
import flowshy.math.Caveat;
import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.MediumParameter;
import flowshy.medium.MediumQuery;
import flowshy.response.Attitude;
import flowshy.response.Suspension;
import flowshy.response.SuspensionSolver;
import flowshy.response.SuspensionStatement;
import flowshy.response.SuspensionStatement.Damping;
import flowshy.response.SuspensionStatement.Dashpot;
import flowshy.response.SuspensionStatement.Quality;
import flowshy.response.SuspensionStatement.Resonance;
import flowshy.response.SuspensionStatement.RingDown;
import flowshy.response.SuspensionStatement.Spring;
import flowshy.response.SuspensionStatement.Stiffness;
import flowshy.response.TiltingPlateFilm;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.study.keys.Form;
import flowshy.study.keys.KeyRow;
import flowshy.study.keys.Keys;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** From text to the domain's records, and what does not go together. */
class StudyReaderTest {
    private static final String HAIR = "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\n";
    private static final Hair PLAIN =
            new Hair(new Cylinder(610e-6, 38.5e-6), 1300.0, OptionalDouble.empty(), LengthModel.AUTO);

    @TempDir
    private Path folder;

    private Study read(String text, String... settings) {
        try {
            return StudyReader.read(Files.writeString(folder.resolve("s.yaml"), text), List.of(settings));
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private List<String> problems(String text, String... settings) {
        try {
            read(text, settings);
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream()
                    .map(Problem::text)
                    .map(t -> t.replace(folder + File.separator, ""))
                    .toList();
        }
    }

    @Test
    void theSmallestStudyIsComplete() {
        Study study = read(HAIR + "medium: air\n");
        MediumQuery query = MediumQuery.of("air", 293.15, 101325.0).with(MediumParameter.HUMIDITY, 0.5);
        assertThat(study.title()).isEmpty();
        assertThat(study.device().hair()).isEqualTo(PLAIN);
        assertThat(study.device().suspension()).isEmpty();
        assertThat(study.device().outside()).isEqualTo(Media.at(query));
        assertThat(study.device().around()).isEqualTo(study.device().outside());
        assertThat(study.device().cover()).isEqualTo(Covers.OPEN);
        assertThat(study.band()).isEqualTo(new Band(1.0, 10_000.0));
        assertThat(study.acceptance().rejection()).isEmpty();
        assertThat(study.acceptance().margin()).isEqualTo(20.0);
        assertThat(study.calibration()).isEmpty();
        assertThat(study.takenAs())
                .extracting(Study.TakenAs::key, Study.TakenAs::value)
                .containsSubsequence(
                        tuple("medium.temperature", "20 degC"),
                        tuple("medium.pressure", "101.325 kPa"),
                        tuple("medium.humidity", "50 %"),
                        tuple("cover", "open"),
                        tuple("band.from", "1 Hz"));
        assertThat(study.understood())
                .contains(
                        new Study.Understood("hair.length", "610 um", "0.00061 m"),
                        new Study.Understood("medium.name", "air", "air"));
    }

    @Test
    void everyShapeArrivesWithItsDimensions() {
        Study taper = read(
                "hair: {shape: taper, length: 700 um, base-diameter: 90 um, tip-diameter: 40 um, density: 1 g/cm3}\nmedium: air\n");
        assertThat(taper.device().hair().profile()).isEqualTo(new Taper(700e-6, 45e-6, 20e-6));
        Study club = read(
                "hair: {shape: club, length: 900 um, stalk-diameter: 50 um, stalk-length: 400 um, shoulder-length: 60 um, "
                        + "head-diameter: 130 um, end: round, density: 1 g/cm3, youngs-modulus: 3 GPa}\nmedium: air\n");
        assertThat(club.device().hair())
                .isEqualTo(new Hair(
                        new Club(900e-6, 25e-6, 400e-6, 60e-6, 65e-6, Club.End.ROUND),
                        1000.0,
                        OptionalDouble.of(3e9),
                        LengthModel.AUTO));
        Study points = read(
                "hair: {shape: profile, points: [[0 um, 90 um], [300 um, 80 um], [0.6 mm, 0 um]], density: 1 g/cm3}\nmedium: air\n");
        assertThat(points.device().hair().profile().breaks()).containsExactly(0.0, 300e-6, 600e-6);
        assertThat(points.device().hair().profile().radius(300e-6)).isEqualTo(40e-6);
    }

    @Test
    void mediaArriveAtTheirState() {
        Study study = read(HAIR + "medium: {name: air, temperature: 30 degC, pressure: 90 kPa, humidity: 10 %}\n"
                + "cover: {kind: sealed, fill: {name: helium, pressure: 2 bar}}\n");
        Medium outside = Media.at(MediumQuery.of("air", 303.15, 90e3).with(MediumParameter.HUMIDITY, 0.1));
        assertThat(study.device().outside()).isEqualTo(outside);
        assertThat(study.device().around()).isEqualTo(Media.at(MediumQuery.of("helium", 303.15, 2e5)));
        assertThat(study.takenAs())
                .contains(new Study.TakenAs("cover.fill.temperature", "30 degC", "as medium.temperature"));
        Study same = read(HAIR + "medium: nitrogen\ncover: sealed\n");
        assertThat(same.device().around()).isEqualTo(same.device().outside());
        assertThat(same.device().cover()).isEqualTo(Covers.SEALED);
        Study mixed = read(HAIR + "medium: {name: nitrogen, second: helium, share: 20 %}\n");
        assertThat(mixed.device().outside())
                .isEqualTo(Media.at(MediumQuery.of("nitrogen", 293.15, 101325.0).with("helium", 0.2)));
        Study own = read(HAIR + "medium: {density: 0.8 g/cm3, kinematic-viscosity: 5 cSt, sound-speed: 1200 m/s}\n");
        assertThat(own.device().outside().viscosity()).isCloseTo(4e-3, within(1e-18));
        assertThat(own.device().outside().soundSpeed()).hasValue(1200.0);
        Study dynamic = read(HAIR + "medium: {density: 0.8 g/cm3, viscosity: 3 mPa.s, temperature: 40 degC}\n");
        assertThat(dynamic.device().outside().viscosity()).isEqualTo(3e-3);
        assertThat(dynamic.device().outside().temperature()).isEqualTo(313.15);
    }

    private Suspension suspension(String lines) {
        return read(HAIR + "medium: air\nsuspension: " + lines + "\n")
                .device()
                .suspension()
                .orElseThrow();
    }

    private static Suspension solved(Optional<Stiffness> stiffness, Damping damping) {
        return new SuspensionSolver(
                        PLAIN,
                        new SuspensionStatement(stiffness, damping, 0.0, 0.0, Attitude.UPRIGHT, OptionalDouble.empty()))
                .solve();
    }

    /** Each word of the length's model, and the gap at the foot, reach the hair. */
    @Test
    void theLengthsModelAndTheFootsGapArrive() {
        for (LengthModel model : LengthModel.values()) {
            assertThat(read(HAIR + "medium: air\nfinite-length: " + model.word() + "\n")
                            .device()
                            .hair()
                            .lengthModel())
                    .isEqualTo(model);
        }
        Hair hair = read(HAIR.replace("}", ", foot-gap: 3 um}") + "medium: air\n")
                .device()
                .hair();
        assertThat(hair.footGap()).hasValue(3e-6);
        assertThat(problems(HAIR + "medium: air\nfinite-length: maybe\n"))
                .containsExactly(
                        "s.yaml:3:16: finite-length: unknown word maybe; one of off, estimate, auto, on is wanted here");
    }

    /** Each way of stating stiffness and damping reaches the solver as its own statement. */
    @Test
    void everyWayOfStatingASuspensionArrives() {
        Medium nitrogen = Media.at(MediumQuery.of("nitrogen", 293.15, 101325.0));
        Dashpot none = new Dashpot(0.0, Optional.empty());
        Spring spring = new Spring(3e-9);
        assertThat(suspension("{stiffness: 3 nN.m/rad}")).isEqualTo(solved(Optional.of(spring), none));
        assertThat(suspension("{resonance: 300 Hz}"))
                .isEqualTo(solved(Optional.of(new Resonance(300.0, Optional.empty())), none));
        assertThat(suspension("{resonance: {frequency: 300 Hz, in: nitrogen}}"))
                .isEqualTo(solved(Optional.of(new Resonance(300.0, Optional.of(nitrogen))), none))
                .isNotEqualTo(suspension("{resonance: 300 Hz}"));
        assertThat(suspension("{stiffness: 3 nN.m/rad, damping: 2e-12 N.m.s/rad}"))
                .isEqualTo(solved(Optional.of(spring), new Dashpot(2e-12, Optional.empty())));
        assertThat(suspension("{stiffness: 3 nN.m/rad, damping: {value: 2e-11 N.m.s/rad, in: nitrogen}}"))
                .isEqualTo(solved(Optional.of(spring), new Dashpot(2e-11, Optional.of(nitrogen))));
        assertThat(suspension("{stiffness: 3 nN.m/rad, quality: 5}"))
                .isEqualTo(solved(Optional.of(spring), new Quality(5.0, Optional.empty())));
        assertThat(suspension("{stiffness: 3 nN.m/rad, quality: {value: 1.1, in: nitrogen}}"))
                .isEqualTo(solved(Optional.of(spring), new Quality(1.1, Optional.of(nitrogen))));
        assertThat(suspension("{stiffness: 3 nN.m/rad, ring-down: {decay-time: 9 ms}}"))
                .isEqualTo(solved(Optional.of(spring), new RingDown(OptionalDouble.empty(), 9e-3, Optional.empty())));
        assertThat(suspension("{ring-down: {decay-time: 9 ms, frequency: 250 Hz}}"))
                .isEqualTo(solved(Optional.empty(), new RingDown(OptionalDouble.of(250.0), 9e-3, Optional.empty())));
        SealedCover narrow = new SealedCover(Optional.of(new Cavity(0.4e-3, 1e-3)));
        String under = "cover: {kind: sealed, diameter: 0.4 mm, height: 1 mm}";
        assertThat(suspension("{stiffness: 3 nN.m/rad, quality: {value: 0.9, in: nitrogen, " + under + "}}"))
                .isEqualTo(solved(Optional.of(spring), new Quality(0.9, Optional.of(nitrogen), narrow)))
                .isNotEqualTo(
                        suspension("{stiffness: 3 nN.m/rad, quality: {value: 0.9, in: nitrogen, cover: sealed}}"));
        assertThat(suspension("{resonance: {frequency: 300 Hz, in: nitrogen, " + under + "}}"))
                .isEqualTo(solved(Optional.of(new Resonance(300.0, Optional.of(nitrogen), narrow)), none));
        assertThat(suspension(
                        "{stiffness: 3 nN.m/rad, damping: {value: 2e-11 N.m.s/rad, in: nitrogen, " + under + "}}"))
                .isEqualTo(solved(Optional.of(spring), new Dashpot(2e-11, Optional.of(nitrogen), narrow)));
        assertThat(suspension("{stiffness: 3 nN.m/rad, ring-down: {decay-time: 0.6 ms, in: nitrogen, " + under + "}}"))
                .isEqualTo(solved(
                        Optional.of(spring),
                        new RingDown(OptionalDouble.empty(), 6e-4, Optional.of(nitrogen), narrow)));
        TiltingPlateFilm film = new TiltingPlateFilm(120e-6, 80e-6, 9e-6);
        Suspension filmed = suspension(
                "{stiffness: 3 nN.m/rad, quality: {value: 0.9, in: nitrogen}, film: {length: 120 um, width: 80 um, gap: 9 um}}");
        assertThat(filmed.film()).contains(film);
        Suspension unfilmed = suspension("{stiffness: 3 nN.m/rad, quality: {value: 0.9, in: nitrogen}}");
        assertThat((unfilmed.damping() - filmed.damping()) / film.damping(nitrogen))
                .isCloseTo(1.0, within(1e-9));
        Suspension rest = suspension(
                "{stiffness: 3 nN.m/rad, plate-inertia: 4e-18 kg.m2, pivot-depth: 3 um, attitude: horizontal, readout-noise: 2 nrad/rtHz}");
        assertThat(rest)
                .isEqualTo(new Suspension(3e-9, 0.0, 4e-18, 3e-6, Attitude.HORIZONTAL, OptionalDouble.of(2e-9)));
        assertThat(suspension("{stiffness: 3 nN.m/rad, attitude: hanging}").attitude())
                .isEqualTo(Attitude.HANGING);
    }

    @Test
    void limitsCalibrationAndDocumentArrive() {
        Study study = read(
                HAIR + "medium: air\ncover: sealed\naccept: {rejection: 12 dB, error: 0.2 m/s2 peak}\n"
                        + "calibration: {frequency: 60 Hz}\ndocument: {revision: 2.10, project: p}\nband: {from: 5 Hz, to: 90 Hz}\ntitle: 'a: b'\n");
        assertThat(study.title()).isEqualTo("a: b");
        assertThat(study.acceptance().rejection()).hasValue(12.0);
        assertThat(study.acceptance().error().orElseThrow()).isCloseTo(0.2 / Math.sqrt(2.0), within(1e-16));
        assertThat(study.calibration().orElseThrow().frequency()).isEqualTo(60.0);
        assertThat(study.calibration().orElseThrow().cover()).isEqualTo(Covers.SEALED);
        assertThat(study.document()).containsExactly(Map.entry("project", "p"), Map.entry("revision", "2.10"));
        assertThat(study.band()).isEqualTo(new Band(5.0, 90.0));
    }

    /** A default that only some media need is taken wherever a medium stands, told at its own key. */
    @Test
    void aFillOfAirAmongTheCandidatesTakesTheUsualHumidity() {
        Study study = read(HAIR + "medium: nitrogen\ncandidates: [open, {kind: sealed, fill: air}]\n");
        assertThat(study.candidates().get(1).around())
                .isEqualTo(Media.at(MediumQuery.of("air", 293.15, 101325.0).with(MediumParameter.HUMIDITY, 0.5)));
        assertThat(study.takenAs())
                .extracting(Study.TakenAs::key, Study.TakenAs::value)
                .containsSubsequence(
                        tuple("cover", "open"),
                        tuple("candidates[1].fill.humidity", "50 %"),
                        tuple("band.from", "1 Hz"));
    }

    /** A calibration takes the study's own cover with its size, or none, or a cavity; no other cover is known. */
    @Test
    void calibrationUnderACoverWithDimensions() {
        String roofed =
                HAIR + "medium: air\ncover: {kind: roofed, gap: 1 mm, length: 5 mm}\ncalibration: {frequency: 60 Hz";
        assertThat(read(roofed + "}\n").calibration().orElseThrow().cover()).isEqualTo(new RoofedCover(1e-3, 5e-3));
        assertThat(read(roofed + ", cover: open}\n").calibration().orElseThrow().cover())
                .isEqualTo(Covers.OPEN);
        assertThat(read(roofed + ", cover: sealed}\n")
                        .calibration()
                        .orElseThrow()
                        .cover())
                .isEqualTo(Covers.SEALED);
        assertThat(problems(roofed + ", cover: vented}\n"))
                .containsExactly(
                        "s.yaml:4:40: calibration.cover: vented in calibration, but roofed in use; open, sealed, or the kind that stands under cover");
        Study sized = read(
                HAIR
                        + "medium: air\ncover: {kind: sealed, diameter: 2 mm, height: 1 mm}\ncalibration: {frequency: 60 Hz}\n");
        assertThat(sized.calibration().orElseThrow().cover())
                .isEqualTo(sized.device().cover());
    }

    /** The caveats of a film stand beside the answer: this one is as thick as a sixth of its plate. */
    @Test
    void whatAFilmAssumesReachesTheAnswer() {
        Study study = read(
                HAIR
                        + "medium: nitrogen\nsuspension: {stiffness: 3 nN.m/rad, film: {length: 120 um, width: 60 um, gap: 10 um}}\n");
        List<Caveat> caveats = new BandsQuestion(study.device(), study.band(), study.acceptance())
                .answer()
                .caveats();
        assertThat(caveats)
                .contains(new Caveat(
                        Caveat.Subject.SUSPENSION,
                        Caveat.Weight.WEAK,
                        "The film under the plate is 0.17 of the plate's side thick; its law is for thin films."));
    }

    @Test
    void settingsAreLaidOverAndRemembered() {
        Study study = read(HAIR + "medium: air\n", "hair.diameter=90 um", "medium=helium");
        assertThat(study.device().hair().profile()).isEqualTo(new Cylinder(610e-6, 45e-6));
        assertThat(study.device().outside().name()).isEqualTo("helium");
        assertThat(study.origin().settings()).containsExactly("hair.diameter=90 um", "medium=helium");
        assertThat(study.origin().file()).isEqualTo(folder.resolve("s.yaml").toString());
        assertThat(study.origin().sha256()).hasSize(64);
        assertThat(problems(HAIR + "medium: air\n", "nonsense", "hair.diameter=9 kg"))
                .containsExactly(
                        "--set nonsense: no KEY=VALUE; for example hair.diameter=90 um",
                        "--set hair.diameter: 9 kg is a mass; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil");
    }

    @Test
    void aChangedFormBuildsAnotherStudy() throws IOException {
        Path file = Files.writeString(folder.resolve("s.yaml"), HAIR + "medium: air\n");
        StudyReader reader = StudyReader.open(file, List.of());
        Form form = reader.form();
        Study thicker = reader.study(form.with("hair.diameter", 99e-6));
        assertThat(thicker.device().hair().profile()).isEqualTo(new Cylinder(610e-6, 49.5e-6));
        assertThat(thicker.device().outside()).isEqualTo(reader.study().device().outside());
        assertThatThrownBy(() -> reader.study(form.with("hair.diameter", 2e-3)))
                .isInstanceOf(StudyException.class)
                .hasMessageContaining("a hair is at least as long as wide");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{length: 80 um, diameter: 95 um, density: 1 g/cm3} | s.yaml:2:33: hair.diameter: 95 um wide and 80 um long; a hair is at least as long as wide: swap the two or lengthen it",
                "{shape: taper, length: 80 um, base-diameter: 95 um, tip-diameter: 3 um, density: 1 g/cm3} | s.yaml:2:52: hair.base-diameter: 95 um wide and 80 um long; a hair is at least as long as wide: swap the two or lengthen it",
                "{shape: club, length: 900 um, stalk-diameter: 95 um, stalk-length: 400 um, head-diameter: 60 um, density: 1 g/cm3} | s.yaml:2:97: hair.head-diameter: a head of 60 um on a stalk of 95 um; a club's head is at least as thick as its stalk: swap the two, or take shape: taper",
                "{shape: club, length: 900 um, stalk-diameter: 50 um, stalk-length: 1 mm, head-diameter: 60 um, density: 1 g/cm3} | s.yaml:2:74: hair.stalk-length: stalk and shoulder are together longer than the hair's 900 um; length is the total from wall to tip",
                "{shape: club, length: 900 um, stalk-diameter: 50 um, stalk-length: 800 um, shoulder-length: 80 um, head-diameter: 60 um, end: round, density: 1 g/cm3} | s.yaml:2:74: hair.stalk-length: stalk, shoulder and round end are together longer than the hair's 900 um; length is the total from wall to tip",
                "{shape: profile, density: 1 g/cm3} | s.yaml:2:7: hair.file: missing; a measured profile needs file (a table with columns z and diameter) or points (a list of pairs)",
                "{shape: profile, points: [[5 um, 9 um], [90 um, 9 um]], density: 1 g/cm3} | s.yaml:2:34: hair.points: the first height is not zero; z counts from the wall, 0 first",
                "{shape: profile, points: [[0 um, 9 um], [90 um, 9 um], [90 um, 8 um]], density: 1 g/cm3} | s.yaml:2:63: hair.points: the height does not rise; each z lies above the one before",
                "{shape: profile, points: [[0 um, 0 um], [90 um, 9 um]], density: 1 g/cm3} | s.yaml:2:40: hair.points: a diameter not above zero; only the tip may have diameter 0",
                "{shape: profile, points: [[0 um, 95 um], [90 um, 9 um]], density: 1 g/cm3} | s.yaml:2:40: hair.points: wider than the hair is long; a hair is at least as long as wide",
                "{shape: profile, file: none.csv, density: 1 g/cm3} | s.yaml:2:30: hair.file: none.csv: no such file beside the study; name a text file",
                "{shape: profile, file: ., density: 1 g/cm3} | s.yaml:2:30: hair.file: . is not a plain file; name a text file",
            })
    void whatIsNoHairIsRefusedWithTheWayOut(String hair, String problem) {
        assertThat(problems("medium: air\nhair: " + hair + "\n")).containsExactly(problem);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "medium: wter | s.yaml:2:9: medium.name: | did you mean water?",
                "medium: vacuum | s.yaml:2:9: medium.name: vacuum: without a medium there is no flow to read | give the gas and its pressure",
                "medium: {name: air, temperature: 900 degC} | s.yaml:2:34: medium.temperature: air covers | 900 °C was asked for",
                "medium: {name: helium, pressure: 500 bar} | s.yaml:2:34: medium.pressure: helium covers | 50000 kPa was asked for",
                "medium: {name: water, temperature: 120 degC} | s.yaml:2:36: medium.temperature: water boils | 120 °C",
                "medium: {name: water, temperature: -10 degC} | s.yaml:2:36: medium.temperature: | -10 °C",
                "medium: {name: helium, humidity: 20 %} | s.yaml:2:34: medium.humidity: | helium",
                "medium: {name: air, second: water, share: 2 %} | s.yaml:2:43: medium.share: | air",
            })
    void statesThatAMediumDoesNotHaveAreToldAtTheirKey(String medium, String start, String part) {
        List<String> found = problems(HAIR + medium + "\n");
        assertThat(found).hasSize(1);
        assertThat(found.get(0)).startsWith(start).contains(part);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "suspension: {quality: 5} | s.yaml:3:13: suspension: one of stiffness, resonance is missing; state one of them, or the frequency of the ring-down",
                "suspension: {ring-down: {decay-time: 5 ms}} | s.yaml:3:13: suspension: one of stiffness, resonance is missing; state one of them, or the frequency of the ring-down",
                "band: {from: 800 Hz, to: 20 Hz} | s.yaml:3:14: band.from: a band from 800 Hz to 20 Hz is upside down; from lies below to",
                "band: {to: 1 Hz} | s.yaml:3:12: band.to: a band from 1 Hz to 1 Hz is upside down; from lies below to",
                "suspension: {stiffness: 3 nN.m/rad, quality: {value: 5, in: vacum}} | s.yaml:3:61: suspension.quality.in.name: 'vacum' is not a known medium",
                "suspension: {stiffness: 3 nN.m/rad, quality: {value: 0.9, in: nitrogen, cover: {kind: sealed, diameter: 70 um, height: 1 mm}}} | s.yaml:3:87: suspension.quality.cover.kind: a cavity hardly wider than the hair; a cavity radius of 1.01 of the hair's or more, where the law of the confined cylinder holds",
                "cover: {kind: sealed, fill: vacuum} | s.yaml:3:29: cover.fill.name: vacuum: without a medium there is no flow to read; name a gas or liquid; for a package at low pressure give the gas and its pressure",
            })
    void whatDoesNotGoTogetherIsToldAtItsKey(String line, String problem) {
        assertThat(problems(HAIR + "medium: nitrogen\n" + line + "\n"))
                .singleElement()
                .asString()
                .startsWith(problem);
    }

    /** Design: a quality factor above what the fluid on the hair alone allows is an error. */
    @Test
    void whatTheFluidAloneForbidsIsToldAtTheSuspensionsKey() {
        assertThat(problems(HAIR
                        + "medium: nitrogen\nsuspension: {resonance: 300 Hz, quality: {value: 5000, in: nitrogen}}\n"))
                .singleElement()
                .asString()
                .startsWith("s.yaml:3:42: suspension.quality: a quality factor of 5000 in nitrogen is above what");
        assertThat(
                        problems(
                                HAIR
                                        + "medium: nitrogen\nsuspension: {stiffness: 3 nN.m/rad, damping: {value: 0 N.m.s/rad, in: nitrogen}}\n"))
                .singleElement()
                .asString()
                .startsWith("s.yaml:3:46: suspension.damping: ");
    }

    @Test
    void problemsOfEveryPartComeTogether() {
        assertThat(problems("""
                hair: {length: 80 um, diameter: 95 um, density: 1 g/cm3}
                medium: {name: water, temperature: 120 degC}
                suspension: {quality: 5}
                band: {from: 9 Hz, to: 2 Hz}
                titel: x
                """).stream()
                        .map(p -> p.substring(0, p.indexOf(": ")))
                        .toList())
                .containsExactly("s.yaml:1:33", "s.yaml:2:36", "s.yaml:3:13", "s.yaml:4:14", "s.yaml:5:1");
    }

    /** Every key set to every kind of value over two studies: a study or problems, never another exception. */
    @Test
    void noSettingBreaksTheReader() throws IOException {
        List<String> values = List.of(
                "1",
                "0 um",
                "-3 um",
                "1e308 m",
                "20 degC",
                "50 %",
                "1e-9 N.m/rad",
                "air",
                "sealed",
                "{name: helium}",
                "{value: 3, in: air}");
        Path small = Files.writeString(folder.resolve("a.yaml"), HAIR + "medium: air\n");
        Path large = Files.writeString(folder.resolve("b.yaml"), Starter.study("club", "sealed"));
        int accepted = 0;
        int refused = 0;
        int turn = 0;
        for (KeyRow row : Keys.rows()) {
            for (String value : values) {
                Path file = turn++ % 4 == 0 ? large : small;
                try {
                    assertThat(StudyReader.read(file, List.of(row.path() + "=" + value))
                                    .band())
                            .isNotNull();
                    accepted++;
                } catch (StudyException e) {
                    assertThat(e.problems()).as(row.path() + "=" + value).isNotEmpty();
                    refused++;
                }
            }
        }
        assertThat(accepted).isGreaterThan(80);
        assertThat(refused).isGreaterThan(1000);
    }

    @Test
    void latinOneIsToldWithItsByte() throws IOException {
        Path file = folder.resolve("latin.yaml");
        Files.write(file, (HAIR.replace("77 um", "77 µm") + "medium: air\n").getBytes(StandardCharsets.ISO_8859_1));
        assertThatThrownBy(() -> StudyReader.read(file, List.of()))
                .isInstanceOf(StudyException.class)
                .hasMessage(file + ":1:37: byte 37 (0xB5) is not UTF-8; save the file as UTF-8; 0xB5 is µ in Latin-1");
    }
}
