package flowshy.study;

import flowshy.response.Response;
import flowshy.verdict.design.DesignSpace;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Time of one point of a study with two numbers that vary: the device alone, and with its rejection at one frequency. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 3, time = 1)
public class VariedStudyBenchmark {
    /** Two diameters of a cylinder's study, or a dimension and the medium's state. */
    @Param({"hair.diameter hair.length", "hair.density hair.length", "hair.diameter medium.temperature"})
    private String keys;

    private DesignSpace space;
    private double[] base;
    private int turn;

    /**
     * Reads the study.
     *
     * @throws IOException if no temporary file can be written
     */
    @Setup
    public void read() throws IOException {
        Path file = Files.createTempFile("varied", ".yaml");
        Files.writeString(file, """
                hair: {length: 730 um, diameter: 61 um, density: 1.27 g/cm3}
                suspension: {resonance: 333 Hz, quality: {value: 3, in: air}}
                medium: {name: air, temperature: 21 degC}
                finite-length: off
                """, StandardCharsets.UTF_8);
        StudyReader reader = StudyReader.open(file, List.of());
        List<NumberKey> numbers = List.of(keys.split(" ")).stream()
                .map(path -> reader.numbers().key("", path))
                .toList();
        space = VariedStudy.of(reader, numbers);
        base = numbers.stream().mapToDouble(NumberKey::base).toArray();
        Files.delete(file);
    }

    /**
     * The device.
     *
     * @return the question about it
     */
    @Benchmark
    public Object device() {
        return space.at(next());
    }

    /**
     * Its rejection at 80 Hz.
     *
     * @return [dB]
     */
    @Benchmark
    public double rejection() {
        return new Response(space.at(next()).device()).rejection(80.0);
    }

    private double[] next() {
        turn = (turn + 1) % 1000;
        double[] values = base.clone();
        values[0] *= 1.0 + 1e-4 * turn;
        values[1] *= 1.0 + 1e-5 * turn;
        return values;
    }
}
