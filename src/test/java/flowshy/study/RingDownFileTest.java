package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.response.Device;
import flowshy.response.Oscillator;
import flowshy.response.Suspension;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.assertj.core.data.Percentage;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A record of a free swing beside the study. */
class RingDownFileTest {
    private static final String STUDY =
            "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\nmedium: nitrogen\n";

    @TempDir
    private Path folder;

    private Study read(String suspension, String table) {
        try {
            Files.writeString(folder.resolve("swing.csv"), table);
            Path file = Files.writeString(folder.resolve("s.yaml"), STUDY + "suspension: " + suspension + "\n");
            return StudyReader.read(file, List.of());
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private List<String> problems(String suspension, String table) {
        try {
            read(suspension, table);
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream().map(Problem::text).toList();
        }
    }

    /** 250 Hz dying out in 6 ms, in millivolts over milliseconds. */
    private static String swing(String header) {
        StringBuilder table = new StringBuilder(header + "\n");
        for (int i = 0; i < 400; i++) {
            double t = i * 5e-5;
            double x = 12.0 + 40.0 * Math.exp(-t / 6e-3) * Math.cos(2.0 * Math.PI * 250.0 * t);
            table.append(String.format(Locale.ROOT, "%.3f,%.9f%n", 1e3 * t, x));
        }
        return table.toString();
    }

    @Test
    void aRecordStandsForDecayTimeAndFrequency() {
        Suspension fitted = suspension(read("{ring-down: {file: swing.csv}}", swing("time [ms],signal [mV]")));
        Suspension stated = suspension(read("{ring-down: {decay-time: 6 ms, frequency: 250 Hz}}", ""));
        assertThat(fitted.stiffness()).isCloseTo(stated.stiffness(), Percentage.withPercentage(1e-5));
        assertThat(fitted.damping()).isCloseTo(stated.damping(), Percentage.withPercentage(1e-5));
        Study measured = read("{ring-down: {file: swing.csv, in: nitrogen}}", swing("time [ms],signal"));
        assertThat(suspension(measured).damping()).isLessThan(0.99 * stated.damping());
        assertThat(measured.origin().filesRead())
                .extracting(Study.FileRead::file)
                .containsExactly("swing.csv");
        assertThat(measured.takenAs())
                .filteredOn(taken -> taken.key().startsWith("suspension.ring-down."))
                .extracting(Study.TakenAs::key)
                .contains("suspension.ring-down.decay-time", "suspension.ring-down.frequency");
        assertThat(measured.takenAs())
                .filteredOn(taken -> taken.key().equals("suspension.ring-down.decay-time"))
                .singleElement()
                .satisfies(taken -> assertThat(taken.value()).isEqualTo("0.006 s"))
                .satisfies(taken -> assertThat(taken.why()).startsWith("fitted to swing.csv, standard uncertainty "));
    }

    private static Suspension suspension(Study study) {
        return study.device().suspension().orElseThrow();
    }

    /** The solved device, left alone in the medium of the record, swings as the record does. */
    @Test
    void theSolvedDeviceSwingsLikeTheRecord() {
        Device device = read("{ring-down: {file: swing.csv, in: nitrogen}}", swing("time [ms],signal"))
                .device();
        Complex root = new Oscillator(device.hair(), device.suspension().orElseThrow(), Optional.of(device.around()))
                .decay()
                .root()
                .orElseThrow();
        assertThat(-1.0 / root.getReal()).isCloseTo(6e-3, Percentage.withPercentage(1e-4));
        assertThat(root.getImaginary() / (2.0 * Math.PI)).isCloseTo(250.0, Percentage.withPercentage(1e-4));
    }

    @Test
    void faultsAreToldAtTheirPlace() {
        String file = "{ring-down: {file: swing.csv}}";
        assertThat(problems(file, "time [ms],signal\n0,1\n2,3\n1,4\n"))
                .containsExactly(
                        "swing.csv:4:1: suspension.ring-down.file: the time does not rise; samples in the order of time");
        assertThat(problems(file, "t [ms],signal\n0,1\n"))
                .containsExactly(
                        "swing.csv:1:1: no column time; the header names its columns with units, e.g. time [s]");
        assertThat(problems(file, "time [ms],signal\n0,1\n1,x\n"))
                .containsExactly("swing.csv:3:3: x is not a number; a pure number is wanted here, such as 5 or 1.2e-3");
        assertThat(problems(file, "time,signal\n0,1\n"))
                .singleElement()
                .asString()
                .startsWith("swing.csv:1:1: 1 has no unit");
        assertThat(problems(file, "time [ms],signal\n0,1\n1,2\n"))
                .containsExactly(
                        "s.yaml:3:32: suspension.ring-down.file: 2 samples are too few for a swing; 12 or more are needed"
                                .replace("s.yaml", folder.resolve("s.yaml").toString()));
        assertThat(problems("{stiffness: 1 nN.m/rad, ring-down: {file: none.csv}}", ""))
                .singleElement()
                .asString()
                .endsWith(
                        ":3:55: suspension.ring-down.file: none.csv: no such file beside the study; name a text file");
        assertThat(problems("{ring-down: {file: swing.csv, decay-time: 3 ms}}", swing("time [ms],signal")))
                .singleElement()
                .asString()
                .endsWith("suspension.ring-down.decay-time: stands beside file; keep one of the two");
    }
}
