package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Density;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.verdict.error.Motion;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What is stated of the motion, in the study or in a table beside it. */
class MotionTest {
    private static final double G2 = 9.80665 * 9.80665;

    @TempDir
    private Path folder;

    private Study study(String motion, String table) {
        try {
            Files.writeString(folder.resolve("floor.csv"), table);
            Path file = Files.writeString(
                    folder.resolve("s.yaml"),
                    "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\nmedium: nitrogen\nmotion: " + motion
                            + "\n");
            return StudyReader.read(file, List.of());
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private Motion read(String motion) {
        return study(motion, "").motion();
    }

    private List<String> problems(String motion, String table) {
        try {
            study(motion, table);
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream()
                    .map(Problem::text)
                    .map(text -> text.replace(folder + "/", ""))
                    .toList();
        }
    }

    @Test
    void smallestAndFullScaleAreRms() {
        Motion motion = read("{smallest: 0.1 m/s2 peak, full-scale: 6 m/s2}");
        assertThat(motion.smallest().orElseThrow()).isCloseTo(0.1 / Math.sqrt(2.0), within(1e-16));
        assertThat(motion).isEqualTo(new Motion(motion.smallest(), OptionalDouble.of(6.0), Optional.empty()));
        assertThat(read("{full-scale: 2 g}").fullScale()).hasValue(19.6133);
        assertThat(read("{full-scale: 2 g}").smallest()).isEmpty();
    }

    /** The rms of the trade's worked example: +3 dB/octave from 20 Hz to 0.04 g²/Hz at 80 Hz, flat to 350 Hz, −3 dB/octave to 2 kHz: 6.06 g. */
    @Test
    void breakPointsAreStraightOnDoublyLogarithmicPaper() {
        String points = "[[20 Hz, 0.01 g2/Hz], [80 Hz, 0.04 g2/Hz], [350 Hz, 0.04 g2/Hz], [2 kHz, 0.007 g2/Hz]]";
        Density spectrum = read("{spectrum: " + points + "}").spectrum().orElseThrow();
        assertThat(Math.sqrt(spectrum.meanSquare() / G2)).isCloseTo(6.0582, within(5e-4));
        assertThat(spectrum.at(80.0) / G2).isCloseTo(0.04, within(1e-15));
        assertThat(read("{spectrum: {points: " + points + "}}").spectrum()).contains(spectrum);
        Density metric = read("{spectrum: [[20 Hz, 3 (m/s2)2/Hz], [40 Hz, 1500000 (mm/s²)²/Hz]]}")
                .spectrum()
                .orElseThrow();
        assertThat(metric.at(20.0)).isEqualTo(3.0);
        assertThat(metric.at(40.0)).isCloseTo(1.5, within(1e-15));
    }

    @Test
    void aTableBesideTheStudyIsTheSame() {
        String table = "# floor of the test stand\nfrequency [kHz]; density [g2/Hz]\n0.02; 0.01\n0.08; 0.04\n";
        Study study = study("{spectrum: floor.csv, smallest: 3 mg}", table);
        assertThat(study.motion().spectrum())
                .isEqualTo(read("{spectrum: [[20 Hz, 0.01 g2/Hz], [80 Hz, 0.04 g2/Hz]]}")
                        .spectrum());
        assertThat(study.origin().filesRead()).extracting(Study.FileRead::file).containsExactly("floor.csv");
        assertThat(study("{spectrum: {file: floor.csv}}", table).motion().spectrum())
                .isEqualTo(study.motion().spectrum());
        assertThat(study.question().motion()).isEqualTo(study.motion());
    }

    /** Any columns of numbers, as they are declared: a density by rows, band levels, or a record that Welch's method turns into one. */
    @Test
    void declaredColumnsAreReadAsTheyAreDeclared() {
        String rows = "measured on the stand\n20;x;0.01\n80;x;0.04\n".replace("x", "1");
        Study density = study(
                "{spectrum: {file: floor.csv, columns: [f, '-', G], quantity: density, unit: g2/Hz, skip: 1}}", rows);
        Density curve = density.motion().spectrum().orElseThrow();
        assertThat(curve.at(20.0) / G2).isCloseTo(0.01, within(1e-16));
        // straight on log-log paper: twice the frequency, twice the density
        assertThat(curve.at(40.0) / G2).isCloseTo(0.02, within(1e-15));
        Density bands = study(
                        "{spectrum: {file: floor.csv, columns: [f, a], quantity: band levels, unit: m/s2}}",
                        "100 0.3\n125 0.4\n")
                .motion()
                .spectrum()
                .orElseThrow();
        assertThat(bands.meanSquare()).isCloseTo(0.25, within(1e-15));
        StringBuilder sine = new StringBuilder();
        for (int i = 0; i < 4096; i++) {
            sine.append(String.format(Locale.ROOT, "%.6f%n", 0.5 * Math.sin(2.0 * Math.PI * 50.0 * i / 1000.0)));
        }
        Study record = study(
                "{spectrum: {file: floor.csv, columns: [a], quantity: time record, unit: g, rate: 1 kHz, resolution: 2 Hz}}",
                sine.toString());
        // a sine of 0.5 g has a mean square of 0.125 g², under a window of whole periods or not
        assertThat(record.motion().spectrum().orElseThrow().meanSquare() / G2).isCloseTo(0.125, within(1e-4));
        assertThat(record.takenAs())
                .contains(
                        new Study.TakenAs(
                                "motion.spectrum.resolution",
                                "1.953 Hz",
                                "Welch's method: Hann window, 50 % overlap, 15 averages of 512 samples, random error of a line 27 %"));
    }

    @Test
    void declarationsThatSayTooLittleOrSomethingElseAreRefused() {
        assertThat(problems("{spectrum: {file: floor.csv, columns: [f, G], unit: g2/Hz}}", ""))
                .containsExactly("s.yaml:3:20: motion.spectrum.quantity: missing; columns goes with it");
        assertThat(problems("{spectrum: {file: floor.csv, skip: 2}}", ""))
                .containsExactly("s.yaml:3:20: motion.spectrum.columns: missing; skip goes with it");
        assertThat(problems(
                        "{spectrum: {file: floor.csv, columns: [f, G], quantity: density, unit: (m/s)2/Hz}}",
                        "1 2\n3 4\n"))
                .containsExactly(
                        "s.yaml:3:80: motion.spectrum.unit: (m/s)2/Hz is no unit of an acceleration; m/s2 or g, in the form that the quantity asks for");
        assertThat(problems(
                        "{spectrum: {file: floor.csv, columns: [f, G], quantity: density, unit: g/Hz}}", "1 2\n3 4\n"))
                .singleElement()
                .asString()
                .startsWith(
                        "s.yaml:3:80: motion.spectrum.unit: 'g/Hz': neither a density (a square per Hz) nor an amplitude density");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{} | s.yaml:3:9: motion: nothing is stated; one of smallest, full-scale, spectrum or more",
                "{smallest: 3 g, full-scale: 2 g} | s.yaml:3:37: motion.full-scale: a full scale of 2 g over a smallest motion of 3 g; smallest lies below full-scale",
                "{spectrum: [[20 Hz, 1 g2/Hz], [20 Hz, 2 g2/Hz]]} | s.yaml:3:40: motion.spectrum.points: a frequency that does not rise; break points by rising frequency",
                "{spectrum: [[20 Hz, 0 g2/Hz], [30 Hz, 0 g2/Hz]]} | s.yaml:3:20: motion.spectrum.points: a density of zero all over; a motion that moves",
                "{spectrum: none.csv} | s.yaml:3:20: motion.spectrum.file: none.csv: no such file beside the study; name a text file",
            })
    void whatIsNoMotionIsToldAtItsKey(String motion, String problem) {
        assertThat(problems(motion, "")).containsExactly(problem);
    }

    @Test
    void faultsOfTheTableAreToldAtItsLines() {
        assertThat(problems("{spectrum: floor.csv}", "frequency [Hz],density [g2/Hz]\n20,0.01\n10,-0.01\n"))
                .containsExactly(
                        "floor.csv:3:1: motion.spectrum.file: a frequency that does not rise; break points by rising frequency",
                        "floor.csv:3:4: motion.spectrum.file: a negative density; zero or more");
        assertThat(problems("{spectrum: floor.csv}", "frequency [Hz],density [g/Hz]\n20,0.01\n"))
                .singleElement()
                .asString()
                .startsWith("floor.csv:1:16: 1 g/Hz is something else; an acceleration density is wanted here");
        assertThat(problems("{spectrum: floor.csv}", "frequency [Hz],density [g2/Hz]\n20,0.01\n"))
                .containsExactly("s.yaml:3:20: motion.spectrum.file: one break point; two or more");
    }
}
