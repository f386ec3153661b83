package flowshy.cylinder.excursion;

import java.util.stream.DoubleStream;
import org.hipparchus.util.FastMath;

/** How a velocity fluctuates about its mean, as far as averages over it need to know. */
public enum Fluctuation {
    /** Normally distributed, as turbulence and sums of many sources are; the variable is (v − Ū)/σ, cut at 8. */
    RANDOM {
        @Override
        double[] breaks(double mean, double deviation) {
            return around(-mean / deviation, -TAIL, TAIL, (int) (2.0 * TAIL));
        }

        @Override
        double velocity(double t, double mean, double deviation) {
            return mean + deviation * t;
        }

        @Override
        double density(double t) {
            return FastMath.exp(-0.5 * t * t) / FastMath.sqrt(2.0 * FastMath.PI);
        }
    },

    /** A single tone of amplitude √2 σ; the variable is the phase, from 0 to π. */
    SINUSOIDAL {
        @Override
        double[] breaks(double mean, double deviation) {
            double cosine = -mean / (FastMath.sqrt(2.0) * deviation);
            double still = FastMath.abs(cosine) < 1.0 ? FastMath.acos(cosine) : -1.0;
            return around(still, 0.0, FastMath.PI, 4);
        }

        @Override
        double velocity(double phase, double mean, double deviation) {
            return mean + FastMath.sqrt(2.0) * deviation * FastMath.cos(phase);
        }

        @Override
        double density(double phase) {
            return 1.0 / FastMath.PI;
        }
    };

    private static final double TAIL = 8.0;

    /** Ends of the pieces on which a smooth law of the velocity is smooth in the variable, rising. */
    abstract double[] breaks(double mean, double deviation);

    abstract double velocity(double variable, double mean, double deviation);

    abstract double density(double variable);

    /** Equal pieces, and shorter ones towards the place without flow, where drag has a logarithm. */
    private static double[] around(double still, double from, double to, int pieces) {
        DoubleStream equal =
                DoubleStream.iterate(0.0, i -> i <= pieces, i -> i + 1.0).map(i -> from + (to - from) * i / pieces);
        DoubleStream near = DoubleStream.of(-0.1, -1e-2, -1e-3, -1e-4, 0.0, 1e-4, 1e-3, 1e-2, 0.1)
                .map(offset -> still + offset);
        return DoubleStream.concat(equal, near)
                .filter(x -> x >= from && x <= to)
                .sorted()
                .toArray();
    }
}
