package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredPoint;
import flowshy.verdict.measured.MeasuredResponse;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Measured responses beside the study: every unit, every column, every fault at its place. */
class MeasurementsTest {
    private static final String STUDY = "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\n"
            + "suspension: {stiffness: 4 nN.m/rad}\nmedium: nitrogen\nmeasurements: {run: {file: run.csv, ";

    @TempDir
    private Path folder;

    private Study read(String keys, String table) {
        return read(STUDY, keys, table);
    }

    private Study read(String study, String keys, String table) {
        try {
            Files.writeString(folder.resolve("run.csv"), table);
            Path file = Files.writeString(folder.resolve("s.yaml"), study + keys + "}}\n");
            return StudyReader.read(file, List.of());
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private List<String> problems(String keys, String table) {
        return problems(STUDY, keys, table);
    }

    private List<String> problems(String study, String keys, String table) {
        try {
            read(study, keys, table);
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream()
                    .map(Problem::text)
                    .map(text -> text.replace(folder + "/", ""))
                    .toList();
        }
    }

    private MeasuredResponse only(String keys, String table) {
        List<MeasuredResponse> responses = read(keys, table).measurements();
        assertThat(responses).hasSize(1);
        return responses.get(0);
    }

    /** 2 mV/(m/s2), 5 % of it, 30° behind, in every way of writing it. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "V/(m/s2) | 0.002 | deg | -30 | % | 5 | false",
                "mV/(m/s2) | 2 | rad | -0.5235987755982988 | mV/(m/s2) | 0.1 | false",
                "mV/g | 19.6133 | deg | 330 | dB | 0.43429448190325 | false",
                "dB re V/(m/s2) | -53.979400086720375 | deg | -30 | uV/(m/s2) | 100 | false",
                "dB re 1 mV/g | 25.851013424825 | deg | -30 | % | 5 | false",
                "V/(m/s) | 0.002 | deg | -30 | mV/(m/s) | 0.1 | true",
                "mV/(mm/s) | 0.002 | deg | -30 | ppm | 50000 | true",
            })
    void everyUnitGivesOneValue(
            String unit, String amplitude, String turn, String phase, String share, String uncertainty, boolean speed) {
        String row = amplitude + "; " + phase + "; " + uncertainty;
        MeasuredResponse response = only(
                "of: motion",
                "# a comment\nfrequency [kHz]; amplitude [" + unit + "]; phase [" + turn + "]; uncertainty [" + share
                        + "]\n0.1; " + row + "\n\n0.25; " + row + "\n");
        assertThat(response.of()).isEqualTo(Measurand.MOTION);
        assertThat(response.reading().volts()).isTrue();
        assertThat(response.reading().perSpeed()).isEqualTo(speed);
        assertThat(response.gain()).isEmpty();
        assertThat(response.points()).extracting(MeasuredPoint::frequency).containsExactly(100.0, 250.0);
        MeasuredPoint point = response.points().get(1);
        assertThat(point.amplitude()).isCloseTo(0.002, within(1e-11));
        assertThat(Math.sin(point.phase().getAsDouble())).isCloseTo(-0.5, within(1e-12));
        assertThat(point.uncertainty().getAsDouble()).isCloseTo(0.05, within(1e-9));
        assertThat(point.phaseUncertainty())
                .isEqualTo(point.uncertainty()); // of a phasor with noise alike in both parts
    }

    @Test
    void anAngleCountsAsItIsAndTheGainMayBeStated() {
        String angles =
                "frequency [Hz],amplitude [mrad/g],phase-uncertainty [deg],uncertainty [%]\n10,1,2,1\n20,1,2,1\n";
        Study study = read("of: flow", angles);
        MeasuredResponse angle = study.measurements().get(0);
        assertThat(angle.gain()).hasValue(1.0);
        assertThat(angle.points().get(0).amplitude()).isCloseTo(1e-3 / 9.80665, within(1e-15));
        assertThat(angle.points().get(0).phaseUncertainty().getAsDouble()).isCloseTo(Math.PI / 90.0, within(1e-12));
        assertThat(angle.points().get(0).phase()).isEmpty();
        assertThat(study.takenAs())
                .filteredOn(taken -> taken.key().equals("measurements.run.gain"))
                .extracting(Study.TakenAs::value)
                .containsExactly("1");
        assertThat(study.origin().filesRead()).extracting(Study.FileRead::file).containsExactly("run.csv");
        assertThat(only("of: flow, gain: free", angles).gain()).isEmpty();
        assertThat(only("of: flow, gain: -1", angles).gain()).hasValue(-1.0);
        String volts = "frequency [Hz],amplitude [V/(m/s2)]\n10,1\n20,1\n";
        assertThat(only("of: flow, gain: 5 mV/mrad", volts).gain()).hasValue(5.0);
        assertThat(only("of: flow, gain: -5 V/rad", volts).gain()).hasValue(-5.0);
        assertThat(only("of: flow", volts).gain()).isEmpty();
        assertThat(only("of: flow", volts).certain()).isFalse();
    }

    @Test
    void aRejectionIsARatioOrDecibels() {
        String bare = "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\nmedium: nitrogen\n"
                + "measurements: {run: {file: run.csv, ";
        MeasuredResponse level = read(
                        bare, "of: rejection", "frequency [Hz],rejection [dB],uncertainty [dB]\n10,20,1\n20,40,1\n")
                .measurements()
                .get(0);
        MeasuredResponse ratio = read(
                        bare, "of: rejection", "frequency [Hz],amplitude,uncertainty\n10,10,0.5\n20,100,5\n")
                .measurements()
                .get(0);
        assertThat(level.points().get(1).amplitude()).isCloseTo(100.0, within(1e-10));
        assertThat(ratio.points().get(1).amplitude()).isEqualTo(100.0);
        assertThat(ratio.points().get(1).uncertainty().getAsDouble()).isCloseTo(0.05, within(1e-15));
    }

    @Test
    void columnsMayBeDeclaredWhereTheFileDoesNotSay() {
        MeasuredResponse response = only(
                "of: motion, columns: ['-', phase, frequency, amplitude], units: ['-', deg, Hz, mV/g], skip: 2",
                "Run 7\nchannel\tlag\tf\tout\n1\t-10\t50\t3\n2\t-20\t60\t4\n");
        assertThat(response.points()).extracting(MeasuredPoint::frequency).containsExactly(50.0, 60.0);
        assertThat(response.points().get(1).phase().getAsDouble()).isCloseTo(Math.toRadians(-20.0), within(1e-15));
        assertThat(problems("of: motion, columns: [frequency, ampltude], units: [Hz, mV/g]", "10,1\n20,1\n"))
                .containsExactly(
                        "s.yaml:4:70: measurements.run.columns[1]: unknown column ampltude; known here: frequency, amplitude,"
                                + " motion, flow, rejection, phase, uncertainty, phase-uncertainty, -; did you mean amplitude?");
        assertThat(problems("of: motion, columns: [frequency, phase], units: [Hz, deg]", "10,1\n20,1\n"))
                .containsExactly(
                        "s.yaml:4:58: measurements.run.columns: no column amplitude; frequency and amplitude must be there");
        assertThat(problems("of: motion, columns: [frequency, amplitude], units: [Hz]", "10,1\n20,1\n"))
                .containsExactly(
                        "s.yaml:4:89: measurements.run.units: 1 units for 2 columns; one a column, '-' for one that is passed over");
        assertThat(problems("of: motion, columns: [frequency, amplitude], units: [s, mV/g]", "10,1\n20,1\n"))
                .singleElement()
                .asString()
                .startsWith("run.csv: 1 s is a time; a frequency is wanted here");
        assertThat(problems("of: motion, columns: [frequency, amplitude]", "10,1\n20,1\n"))
                .singleElement()
                .asString()
                .endsWith("measurements.run.units: missing; columns goes with it");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "10,1/20,/30,1 | run.csv:3:4: no amplitude in this row; one number a column",
                "10,1/20,NaN/30,1 | run.csv:3:4: NaN is not a finite number; a pure number is wanted here, such as 5 or 1.2e-3",
                "10,1/20,inf/30,1 | run.csv:3:4: inf is not a finite number; a pure number is wanted here, such as 5 or 1.2e-3",
                "10,1/20,x/30,1 | run.csv:3:4: x is not a number; a pure number is wanted here, such as 5 or 1.2e-3",
                "10,1/10,2/30,1 | run.csv:3:1: measurements.run.file: 10.0000 Hz again, as in line 2; each frequency once: average"
                        + " the rows, or leave one out",
                "10,1/30,2/20,1 | run.csv:4:1: measurements.run.file: 20.0000 Hz below 30.0000 Hz in the row before; rows by rising"
                        + " frequency",
                "10,1/20,-45/30,1 | run.csv:3:4: measurements.run.file: a negative amplitude, -45.00; amplitudes above zero; are"
                        + " amplitude and phase swapped? a turned sense belongs into the phase",
                "10,1/20,0/30,1 | run.csv:3:4: measurements.run.file: an amplitude of zero; leave out rows in which nothing was read",
                "0.5,10/0.7,20/0.2,30 | run.csv:1:1: measurements.run.file: the frequencies do not rise, but the amplitudes do; are"
                        + " the two columns swapped? rows by rising frequency",
                "1e-5,1/2e-5,1 | run.csv:2:1: measurements.run.file: 1.000e-05 Hz; a frequency of 0.001000 Hz to 1.000e+07 Hz; are"
                        + " the columns in the order of their headings?",
                "10,1 | run.csv:2:1: measurements.run.file: one row only; two frequencies or more",
            })
    void faultsOfTheNumbersAreToldAtTheirPlace(String rows, String said) {
        assertThat(problems("of: motion", "frequency [Hz],amplitude [V/(m/s2)]\n" + rows.replace("/", "\n")))
                .contains(said);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "frequency [Hz],amplitude [m/s2] | run.csv:1:16: measurements.run.file: unit m/s2; a response per acceleration or"
                        + " speed is wanted here: rad/(m/s2), mrad/g, V/(m/s2), mV/g and the like, per speed rad/(m/s), V/(m/s), or"
                        + " dB re one of them",
                "frequency [Hz],amplitude [dB] | run.csv:1:16: measurements.run.file: unit dB; decibels above what: dB re 1"
                        + " V/(m/s2), dB re 1 rad/(m/s) and the like",
                "frequency [Hz],amplitude | run.csv:1:16: measurements.run.file: no unit; a response per acceleration or speed is"
                        + " wanted here: rad/(m/s2), mrad/g, V/(m/s2), mV/g and the like, per speed rad/(m/s), V/(m/s), or dB re"
                        + " one of them",
                "frequency [rad/s],amplitude [V/g] | run.csv:1:1: 1 rad/s is a rate per second, not a frequency in cycles (1 Hz is"
                        + " 2π rad/s); a frequency is wanted here, with its unit: Hz, kHz, mHz, MHz, rpm",
                "frequency [Hz],amplitude [V/g],uncertainty [V] | run.csv:1:32: measurements.run.file: unit V; %, dB, or the unit"
                        + " of the amplitudes; one standard deviation",
                "frequency [Hz],amplitude [V/g],phase [%] | run.csv:1:32: 1 % is a share; an angle is wanted here, with its unit:"
                        + " deg, rad, mrad, urad",
                "freq [Hz],amplitude [V/g] | run.csv:1:1: no column frequency; the header names its columns with units, e.g."
                        + " frequency [Hz]",
                "frequency [Hz],level [V/g] | run.csv:1:1: no column amplitude; the header names its columns with units, e.g."
                        + " amplitude",
                "frequency [Hz],flow [V/g] | s.yaml:4:28: measurements.run.file: a column flow, but of: motion; one and the same",
                "frequency [Hz],flow [V/g],motion [V/g] | s.yaml:4:28: measurements.run.file: columns flow and motion; one of them;"
                        + " a file each for motion and flow",
            })
    void faultsOfTheHeaderAreToldAtTheirPlace(String header, String said) {
        assertThat(problems("of: motion", header + "\n10,1,1\n20,1,1\n")).containsExactly(said);
    }

    @Test
    void uncertaintiesMustBeOnes() {
        String head = "frequency [Hz],amplitude [V/g],uncertainty [%],phase [deg],phase-uncertainty [deg]\n";
        assertThat(problems("of: motion", head + "10,1,0,0,1\n20,1,150,0,1\n30,1,1,1e6,1\n40,1,1,0,-1\n"))
                .containsExactly(
                        "run.csv:2:6: measurements.run.file: an uncertainty of 0 % of the amplitude; one standard deviation, above"
                                + " zero and up to 100 % of the amplitude",
                        "run.csv:3:6: measurements.run.file: an uncertainty of 150.0 % of the amplitude; one standard deviation,"
                                + " above zero and up to 100 % of the amplitude",
                        "run.csv:4:8: measurements.run.file: a phase of 17450 rad; some turns at most",
                        "run.csv:5:10: measurements.run.file: an uncertainty of -0.01745 rad; one standard deviation, above zero"
                                + " and up to half a turn");
    }

    @Test
    void whatDoesNotGoTogetherIsRefused() {
        String volts = "frequency [Hz],amplitude [V/(m/s2)]\n10,1\n20,1\n";
        assertThat(problems("of: motion, gain: 2", volts))
                .containsExactly(
                        "s.yaml:4:55: measurements.run.gain: 2 for V/(m/s2); V/rad for a reading in volts, or free");
        assertThat(problems("of: motion, gain: 2 V/rad", "frequency [Hz],amplitude [rad/g]\n10,1\n20,1\n"))
                .containsExactly(
                        "s.yaml:4:55: measurements.run.gain: 2 V/rad for rad/(m/s2); a pure number for an angle, or free");
        assertThat(problems("of: motion, gain: 0 V/rad", volts))
                .containsExactly("s.yaml:4:55: measurements.run.gain: a gain of zero; not zero, or free");
        assertThat(problems("of: rejection, gain: free", "frequency [Hz],amplitude [dB]\n10,1\n20,1\n"))
                .containsExactly(
                        "s.yaml:4:58: measurements.run.gain: a gain of a rejection; no gain: it cancels in the ratio");
        assertThat(problems("of: rejection", "frequency [Hz],amplitude [dB],phase [deg]\n10,1,1\n20,1,1\n"))
                .containsExactly(
                        "run.csv:1:31: measurements.run.file: a phase of a rejection; no phase: rejection is a ratio of sizes");
        String bare = "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\nmedium: nitrogen\n"
                + "measurements: {run: {file: run.csv, ";
        assertThat(problems(bare, "of: flow", volts))
                .containsExactly(
                        "s.yaml:3:41: measurements.run.of: a response to flow of a device without a suspension; state suspension,"
                                + " or lay a rejection beside the model");
        assertThat(problems("of: lift", volts)).singleElement().asString().contains("unknown word lift");
    }
}
