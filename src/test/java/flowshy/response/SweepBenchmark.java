package flowshy.response;

import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.stream.cover.Covers;
import java.util.concurrent.TimeUnit;
import org.hipparchus.util.FastMath;
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
import org.openjdk.jmh.infra.Blackhole;

/** Time of a sweep of 2000 frequencies from 1 Hz to 10 kHz in air: every response, and the rejection alone. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 3, time = 1)
public class SweepBenchmark {
    private static final int POINTS = 2000;

    /** Closed form for the cylinder, strips for the club. */
    @Param({"cylinder", "club"})
    private String shape;

    private Response response;
    private double[] frequencies;

    /** Builds the device and spreads the frequencies. */
    @Setup
    public void spread() {
        Profile profile =
                shape.equals("club") ? new Club(9e-4, 2e-5, 4e-4, 1e-4, 6e-5, End.ROUND) : Devices.ROD.profile();
        response = new Response(Devices.device(
                Devices.hair(profile, 1180.0),
                Devices.suspension(4e-9, 3e-13, 0.0, 0.0, Attitude.UPRIGHT),
                Medium.of("air", 1.2, 1.82e-5),
                Covers.OPEN));
        frequencies = new double[POINTS];
        for (int i = 0; i < POINTS; i++) {
            frequencies[i] = FastMath.pow(10.0, 4.0 * i / POINTS);
        }
    }

    /**
     * Every response.
     *
     * @param sink keeps the result
     */
    @Benchmark
    public void points(Blackhole sink) {
        for (double frequency : frequencies) {
            sink.consume(response.at(frequency));
        }
    }

    /**
     * Rejection alone.
     *
     * @return its sum, so that nothing is left out
     */
    @Benchmark
    public double rejection() {
        double sum = 0.0;
        for (double frequency : frequencies) {
            sum += response.rejection(frequency);
        }
        return sum;
    }
}
