package flowshy.cylinder;

import flowshy.math.BesselK;
import flowshy.medium.Medium;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.hipparchus.complex.Complex;
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

/** Time of one Γ, by polynomials on the ray and by the general routine. The argument moves, so that nothing is constant. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Fork(1)
@Warmup(iterations = 2, time = 1)
@Measurement(iterations = 3, time = 1)
public class HydrodynamicFunctionBenchmark {
    private static final int POINTS = 1024;

    /** Wo from 1e-4 to 1e-3 (series), 0.02 to 20 (polynomials), 40 to 1000 (asymptotic). */
    @Param({"1e-4", "0.02", "40"})
    private double from;

    private OscillatingCylinder cylinder;
    private OscillatingCylinder slipping;
    private double[] omega;
    private Complex[] lambda;
    private int next;

    /** Spreads the frequencies over the range. */
    @Setup
    public void spread() {
        cylinder = new OscillatingCylinder(1.0, Medium.of("unit", 1.0, 1.0));
        Medium plain = cylinder.medium();
        slipping = new OscillatingCylinder(
                1.0,
                new Medium(
                        "rarefied",
                        plain.phase(),
                        plain.temperature(),
                        plain.pressure(),
                        plain.density(),
                        plain.viscosity(),
                        OptionalDouble.empty(),
                        OptionalDouble.of(0.05),
                        plain.sources(),
                        plain.caveats()));
        omega = new double[POINTS];
        lambda = new Complex[POINTS];
        double ratio = from < 0.01 ? 10.0 : from < 1.0 ? 1000.0 : 25.0;
        for (int i = 0; i < POINTS; i++) {
            double wo = from * FastMath.pow(ratio, (double) i / POINTS);
            omega[i] = wo * wo;
            lambda[i] = new Complex(wo * FastMath.sqrt(0.5), wo * FastMath.sqrt(0.5));
        }
    }

    /** Γ without slip. */
    @Benchmark
    public Complex gamma() {
        next = (next + 1) & (POINTS - 1);
        return cylinder.hydrodynamicFunction(omega[next]);
    }

    /** Γ with slip. */
    @Benchmark
    public Complex gammaWithSlip() {
        next = (next + 1) & (POINTS - 1);
        return slipping.hydrodynamicFunction(omega[next]);
    }

    /** K₁/K₀ by the general complex routine. */
    @Benchmark
    public Complex generalRatio() {
        next = (next + 1) & (POINTS - 1);
        return BesselK.ratio(lambda[next]);
    }
}
