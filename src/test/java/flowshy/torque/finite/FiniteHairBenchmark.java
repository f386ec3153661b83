package flowshy.torque.finite;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
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

/**
 * Time of one frequency (both meshes; aim 0.3 s), of a study's grid from 1 Hz to 10 kHz (aim 3 s) and of the repaired strips, on
 * one core.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 2, time = 2)
@Measurement(iterations = 3, time = 2)
public class FiniteHairBenchmark {
    /** A slender cylinder, a club with a round end, a blunt post. */
    @Param({"cylinder", "club", "post"})
    private String shape;

    private FiniteHair hair;
    private RepairedStrips repaired;
    private double frequency = 20.0;

    /** Builds the hair. */
    @Setup
    public void build() {
        Profile profile = switch (shape) {
            case "cylinder" -> new Cylinder(800e-6, 40e-6);
            case "club" -> new Club(900e-6, 20e-6, 400e-6, 100e-6, 60e-6, Club.End.ROUND);
            default -> new Cylinder(300e-6, 75e-6);
        };
        Medium air = Medium.of("air", 1.204, 1.825e-5);
        hair = new FiniteHair(profile, air, 0.0);
        repaired = new RepairedStrips(profile, air, 0.0);
    }

    /** One frequency to one per cent; it moves, so that nothing is constant. */
    @Benchmark
    public FiniteTorques oneFrequency() {
        return hair.at(next(), Accuracy.ONE_PER_CENT);
    }

    /** One frequency on the finer meshes. */
    @Benchmark
    public FiniteTorques oneFrequencyFine() {
        return hair.at(next(), Accuracy.FINE);
    }

    /** The whole grid of a study, on one core after the other. */
    @Benchmark
    public FiniteFactors studyGrid() {
        return grid(Accuracy.ONE_PER_CENT);
    }

    /** The same on the finer meshes, twice as close. */
    @Benchmark
    public FiniteFactors studyGridFine() {
        return grid(Accuracy.FINE);
    }

    private FiniteFactors grid(Accuracy accuracy) {
        FactorGrid grid = new FactorGrid(hair, accuracy);
        FiniteFactors last = grid.at(2.0 * FastMath.PI);
        for (double decade = 10.0; decade < 2e4; decade *= 3.0) {
            last = grid.at(2.0 * FastMath.PI * decade);
        }
        return last;
    }

    /** The cheap repair. */
    @Benchmark
    public FiniteFactors repairedStrips() {
        return repaired.at(next());
    }

    private double next() {
        frequency = frequency > 2000.0 ? 20.0 : frequency * 1.1;
        return 2.0 * FastMath.PI * frequency;
    }
}
