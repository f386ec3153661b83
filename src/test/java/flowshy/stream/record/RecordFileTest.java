package flowshy.stream.record;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Density;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalDouble;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** What the reader takes and what it refuses, with places. */
class RecordFileTest {
    private static final OptionalDouble NONE = OptionalDouble.empty();

    private static Declaration declare(String columns, String quantity, String unit, int skip) {
        return Declaration.of(List.of(columns.split(",")), quantity, unit, skip, NONE, NONE);
    }

    private static MeasuredSpectrum read(String text, String columns, String quantity, String unit) {
        return RecordFile.read("logged.txt", text, declare(columns, quantity, unit, 0));
    }

    private static List<RecordProblem> problems(String text, String columns, String quantity, String unit) {
        RecordException e = catchThrowableOfType(RecordException.class, () -> read(text, columns, quantity, unit));
        assertThat(e).as("a refusal of %s", text).isNotNull();
        return e.problems();
    }

    static MeasuredSpectrum anemometer() {
        try (InputStream in = RecordFileTest.class.getResourceAsStream("anemometer.txt")) {
            assertThat(in).isNotNull();
            String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            return RecordFile.read("anemometer.txt", text, declare("t [ms],u", "time record", "m/s", 2));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Test
    void fourSeparatorsGiveOneSpectrum() {
        double wanted = read("10\t1e-4\n20\t2e-4\n", "f,S", "density", "(m/s)2/Hz")
                .density()
                .orElseThrow()
                .at(20.0);
        assertThat(wanted).isEqualTo(2e-4);
        for (String between : List.of(";", ",", "  ", " ; ", ", ")) {
            String text = "# a remark\n\n 10" + between + "1e-4\n 20" + between + "2e-4 \n";
            Density density =
                    read(text, "f,S", "density", "(m/s)2/Hz").density().orElseThrow();
            assertThat(density.at(20.0)).as("'%s'", between).isEqualTo(wanted);
            assertThat(density.edges()).containsExactly(10.0, 20.0);
        }
    }

    @Test
    void headerLinesColumnsToPassOverAndKilohertz() {
        String text = "\uFEFFprobe 3\nf in kHz; gain; S\n0.1; 7; 4\n1; 7; 16\n";
        MeasuredSpectrum read = RecordFile.read("a.csv", text, declare("f [kHz],-,S", "density", "(mm/s)²/Hz", 2));
        assertThat(read.signal()).isEqualTo(Signal.VELOCITY);
        assertThat(read.density().orElseThrow().at(100.0)).isCloseTo(4e-6, within(1e-18));
        assertThat(read.density().orElseThrow().at(1000.0)).isCloseTo(16e-6, within(1e-18));
    }

    @Test
    void amplitudeDensityIsSquared() {
        Density density = read("5 2\n50 3\n", "f,a", "amplitude density", "mm/s/√Hz")
                .density()
                .orElseThrow();
        assertThat(density.at(5.0)).isCloseTo(4e-6, within(1e-18));
        assertThat(density.at(50.0)).isCloseTo(9e-6, within(1e-18));
    }

    @Test
    void motionInGravities() {
        MeasuredSpectrum motion = read("20 0.04\n2000 0.04\n", "f,G", "density", "g2/Hz");
        assertThat(motion.signal()).isEqualTo(Signal.ACCELERATION);
        assertThat(Math.sqrt(motion.meanSquare()) / 9.80665).isCloseTo(8.8994382, within(1e-7));
        assertThat(read("20 0.04\n2000 0.04\n", "f,G", "density", "(m/s2)2/Hz").meanSquare())
                .isCloseTo(79.2, within(1e-9));
    }

    /** 94 dB re 20 µPa in each of two third-octaves: 1.0047 Pa² each, spread over the band by equal ratios. */
    @Test
    void bandLevels() {
        MeasuredSpectrum sound = read("125 94\n160 94\n", "f,L", "band levels", "dB re 20 µPa");
        assertThat(sound.signal()).isEqualTo(Signal.PRESSURE);
        assertThat(sound.meanSquare()).isCloseTo(2.0 * 1.00237 * 1.00237, within(1e-4));
        assertThat(sound.density().orElseThrow().at(125.0))
                .isCloseTo(1.00237 * 1.00237 / (125.0 * Math.log(10.0) / 10.0), Percentage.withPercentage(0.01));
        assertThat(sound.notes()).anySatisfy(note -> assertThat(note).contains("third-octave"));
        MeasuredSpectrum octaves = read("63 0.002\n125 0.004\n", "f,u", "band levels", "m/s");
        assertThat(octaves.meanSquare()).isCloseTo(2e-5, within(1e-18));
        assertThat(octaves.density().orElseThrow().edges().get(0))
                .isCloseTo(63.0957 / Math.pow(10.0, 0.15), within(1e-3));
        assertThat(octaves.notes()).anySatisfy(note -> assertThat(note).contains("octave"));
    }

    @Test
    void linesKeepTheirRms() {
        MeasuredSpectrum lines = read("50 2\n100 0\n150 1\n", "f,u", "rms lines", "mm/s");
        assertThat(lines.lines()).hasSize(2);
        assertThat(lines.lines().get(1).frequency()).isEqualTo(150.0);
        assertThat(lines.lines().get(1).deviation()).isCloseTo(1e-3, within(1e-18));
        assertThat(lines.meanSquare()).isCloseTo(5e-6, within(1e-18));
        assertThat(read("50 2\n", "f,u", "rms lines", "mm/s peak")
                        .lines()
                        .get(0)
                        .deviation())
                .isCloseTo(2e-3 / Math.sqrt(2.0), within(1e-15));
    }

    /** 1500 samples of 0.35 m/s with a sine and noise; variance as its script prints it. */
    @Test
    void recordBecomesADensity() {
        MeasuredSpectrum record = anemometer();
        assertThat(record.mean()).isCloseTo(0.35, within(0.005));
        assertThat(record.averaging().orElseThrow().rate()).isCloseTo(200.0, within(1e-9));
        assertThat(record.averaging().orElseThrow().words())
                .isEqualTo("Hann window, 50 % overlap, 10 averages of 256 samples");
        assertThat(record.notes())
                .containsExactly(
                        "The density is Welch's: Hann window, 50 % overlap, 10 averages of 256 samples, lines 0.781 Hz"
                                + " apart, each known to 32 %.");
        assertThat(record.meanSquare()).isCloseTo(0.0023822, Percentage.withPercentage(2.0));
    }

    @Test
    void recordByRateAndResolution() {
        StringBuilder text = new StringBuilder();
        for (int n = 0; n < 400; n++) {
            text.append(Math.sin(0.3 * n)).append('\n');
        }
        Declaration fine = Declaration.of(
                List.of("u"), "time record", "cm/s", 0, OptionalDouble.of(1000.0), OptionalDouble.of(8.0));
        MeasuredSpectrum record = RecordFile.read("r.txt", text.toString(), fine);
        assertThat(record.averaging().orElseThrow().segment()).isEqualTo(128);
        assertThat(record.averaging().orElseThrow().resolution()).isCloseTo(7.8125, within(1e-12));
        assertThat(record.meanSquare()).isCloseTo(0.5e-4, Percentage.withPercentage(3.0));
        Declaration finer = Declaration.of(
                List.of("u"), "time record", "cm/s", 0, OptionalDouble.of(1000.0), OptionalDouble.of(1.0));
        assertThatThrownBy(() -> RecordFile.read("r.txt", text.toString(), finer))
                .isInstanceOf(DeclarationException.class)
                .hasMessageContaining("3.906 Hz or more");
    }

    @Test
    void rowAtZeroIsLeftOutAndTold() {
        MeasuredSpectrum read = read("0 5\n1 2\n2 2\n", "f,S", "density", "(m/s)2/Hz");
        assertThat(read.meanSquare()).isCloseTo(2.0, within(1e-12));
        assertThat(read.notes()).containsExactly("The row at 0 Hz was left out.");
    }

    @Test
    void everyFaultWithItsPlace() {
        List<RecordProblem> found = problems("10;1\n20;1,5\n30;abc\n40\n;3\n", "f,S", "density", "(m/s)2/Hz");
        assertThat(found.stream().map(RecordProblem::toString))
                .containsExactly(
                        "logged.txt:2:4: found '1,5' in column S; accepted: a number such as 0.25 or 2.5e-1, with a point, not a comma",
                        "logged.txt:3:4: found 'abc' in column S; accepted: a number such as 0.25 or 2.5e-1",
                        "logged.txt:4:1: found 1 cells parted by semicolons; accepted: 2 as declared (f, S); '-' passes a column over",
                        "logged.txt:5:1: found '' in column f; accepted: a number such as 0.25 or 2.5e-1");
    }

    @Test
    void refusesNumbersThatAreNone() {
        for (String cell : List.of("NaN", "Infinity", "1d", "0x1p3", "1e999", "--1", "1 2")) {
            assertThat(problems("10;1\n20;" + cell + "\n", "f,S", "density", "(m/s)2/Hz")
                            .get(0)
                            .line())
                    .as(cell)
                    .isEqualTo(2);
        }
    }

    @Test
    void refusesWhatIsNoSpectrum() {
        String unit = "(m/s)2/Hz";
        assertThat(problems("10 1\n10 2\n", "f,S", "density", unit).get(0).toString())
                .isEqualTo(
                        "logged.txt:2:1: found a frequency that does not rise; accepted: each frequency above the one before");
        assertThat(problems("10 1\n20 -2\n", "f,S", "density", unit).get(0).column())
                .isEqualTo(4);
        assertThat(problems("10 1\n", "f,S", "density", unit).get(0).found()).isEqualTo("1 rows");
        assertThat(problems("10 0\n20 0\n", "f,S", "density", unit).get(0).found())
                .isEqualTo("nothing but zeros");
        assertThat(problems("", "f,S", "density", unit).get(0).found()).isEqualTo("no line of numbers");
        assertThat(problems("-5 1\n20 1\n", "f,S", "density", unit).get(0).found())
                .contains("not above zero");
        assertThat(problems("100 1\n170 1\n", "f,L", "band levels", "dB re 1 m/s")
                        .get(0)
                        .found())
                .contains("1.700");
        assertThat(problems("100 1\n125 1\n140 1\n", "f,L", "band levels", "m/s")
                        .get(0)
                        .line())
                .isEqualTo(3);
    }

    @Test
    void refusesARecordOfUnequalSteps() {
        StringBuilder text = new StringBuilder();
        for (int n = 0; n < 100; n++) {
            text.append(n == 70 ? 0.0706 : 0.001 * n).append(' ').append(n % 7).append('\n');
        }
        RecordProblem found =
                problems(text.toString(), "t,u", "time record", "m/s").get(0);
        assertThat(found.line()).isEqualTo(71);
        assertThat(found.column()).isEqualTo(1);
        assertThat(found.accepted()).contains("equal steps");
        assertThat(problems("0 1\n1 2\n", "t,u", "time record", "m/s").get(0).found())
                .isEqualTo("2 samples");
        String constant = "3\n".repeat(100);
        Declaration byRate = Declaration.of(List.of("u"), "time record", "m/s", 0, OptionalDouble.of(10.0), NONE);
        assertThatThrownBy(() -> RecordFile.read("c.txt", constant, byRate)).hasMessageContaining("does not change");
    }

    /** Twenty faults and no more, however long the file. */
    @Test
    void stopsAfterTwentyFaults() {
        assertThat(problems("a b\n".repeat(1000), "f,S", "density", "(m/s)2/Hz"))
                .hasSize(20);
    }
}
