package flowshy.torque;

import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.MeasuredProfile;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.medium.Medium;
import java.util.List;
import java.util.OptionalDouble;
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

/** Time of the torques on one hair at one frequency, over 1 Hz to 10 kHz in air, so that the Stokes layer cuts all pieces. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 3, time = 1)
public class TorqueBenchmark {
    private static final int POINTS = 1024;

    /** Closed form for the cylinder, strips for the others. */
    @Param({"cylinder", "taper", "club", "profile"})
    private String shape;

    private TorqueModel model;
    private double[] omega;
    private int next;

    /** Builds the hair and spreads the frequencies. */
    @Setup
    public void spread() {
        Profile profile = switch (shape) {
            case "cylinder" -> new Cylinder(8e-4, 4e-5);
            case "taper" -> new Taper(7e-4, 4.5e-5, 0.0);
            case "club" -> new Club(9e-4, 2e-5, 4e-4, 1e-4, 6e-5, End.ROUND);
            default ->
                new MeasuredProfile(
                        List.of(0.0, 6e-5, 1.3e-4, 2.2e-4, 3e-4, 3.9e-4, 4.8e-4, 5.6e-4, 6.3e-4, 7e-4),
                        List.of(4.4e-5, 4.1e-5, 3.9e-5, 3.6e-5, 3.4e-5, 3e-5, 2.7e-5, 2.2e-5, 1.5e-5, 0.0));
        };
        Hair hair = new Hair(profile, 1180.0, OptionalDouble.empty());
        model = TorqueModel.of(hair, Medium.of("air", 1.2, 1.82e-5), 0.0);
        omega = new double[POINTS];
        for (int i = 0; i < POINTS; i++) {
            omega[i] = 2.0 * FastMath.PI * FastMath.pow(10.0, 4.0 * i / POINTS);
        }
    }

    /** All torques at one frequency. */
    @Benchmark
    public Torques at() {
        next = (next + 1) & (POINTS - 1);
        return model.at(omega[next]);
    }
}
