package flowshy.verdict.tolerance;

import flowshy.study.StudyReader;
import flowshy.verdict.tolerance.sampling.Progress;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** A whole run of a cylinder: 100 000 devices at 200 frequencies, indices included, on all cores. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.SECONDS)
@Warmup(iterations = 1)
@Measurement(iterations = 3)
@Fork(1)
public class ToleranceBenchmark {
    private ToleranceQuestion question;

    /** The workbench example with three spreads of its hair. */
    @Setup
    public void read() {
        List<String> settings = List.of(
                "tolerances.hair.diameter={sd: 3 %}",
                "tolerances.hair.length={within: 10 um}", "tolerances.hair.density={sd: 1 %}");
        question = new ToleranceQuestion(
                StudyReader.read(Path.of("examples/workbench-air/study.yaml"), settings)
                        .tolerances(),
                List.of());
    }

    /**
     * Runs.
     *
     * @return the answer
     */
    @Benchmark
    public ToleranceAnswer cylinder() {
        return question.answer(new Effort(100_000, Precision.ANY, 1), Progress.NONE);
    }
}
