package flowshy.study;

import flowshy.verdict.map.GridRun;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Whole maps of shipped studies, from the words to the grid. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 3, time = 2)
public class MapBenchmark {
    /** Threads. */
    @Param({"1", "2"})
    public int threads;

    /** Strip theory, or the default, which takes the estimate where the shape varies. */
    @Param({"off", "auto"})
    public String finiteLength;

    /**
     * 400 by 400 places of a cylinder at one frequency.
     *
     * @return the map
     */
    @Benchmark
    public StudyMap cylinderAtOneFrequency() {
        return map(
                "workbench-air",
                "hair.diameter=40 um..160 um",
                "rejection",
                400,
                List.of("finite-length=" + finiteLength));
    }

    /**
     * 50 by 50 places of a club, the least rejection over a band of some 50 frequencies: a sixteenth of 200 by 200.
     *
     * @return the map
     */
    @Benchmark
    public StudyMap clubOverItsBand() {
        return map(
                "weather-mast",
                "hair.stalk-diameter=30 um..60 um",
                "least-rejection",
                50,
                List.of("finite-length=" + finiteLength, "band.from=19 Hz"));
    }

    private StudyMap map(String example, String across, String figure, int steps, List<String> settings) {
        MapWords words = new MapWords(
                across,
                "hair.density=0.9 g/cm3..2.4 g/cm3",
                Optional.of(figure),
                OptionalDouble.empty(),
                List.of(steps, steps),
                List.of(false, false));
        StudyReader reader = StudyReader.open(Path.of("examples", example, "study.yaml"), settings);
        return StudyMap.of(reader, words, new GridRun(threads, GridRun.Progress.NONE));
    }
}
