package flowshy.verdict.figure;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.stream.cover.Covers;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
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

/** One named quantity of one device, everything made anew as a map does. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class FigureBenchmark {
    private static final Medium AIR = Medium.of("air", 1.2, 1.82e-5);
    private static final Band BAND = new Band(20.0, 500.0);
    private static final Suspension HELD =
            new Suspension(4e-9, 4e-13, 0.0, 0.0, Attitude.UPRIGHT, OptionalDouble.empty());

    /** The quantity. */
    @Param({"MASS", "REJECTION", "RESONANCE", "QUALITY", "LEAST_REJECTION"})
    public Figure figure;

    private double radius = 4.2e-5;

    /**
     * A hair a little thicker each time.
     *
     * @return the quantity
     */
    @Benchmark
    public double cylinder() {
        radius = radius > 6e-5 ? 4.2e-5 : radius * 1.000001;
        Device device = new Device(
                new Hair(new Cylinder(7.6e-4, radius), 1190.0, OptionalDouble.empty()),
                Optional.of(HELD),
                AIR,
                Covers.OPEN,
                AIR);
        return figure.of(new Evaluated(new BandsQuestion(device, BAND, Acceptance.NONE), 80.0))
                .value();
    }
}
