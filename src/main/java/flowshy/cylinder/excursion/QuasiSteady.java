package flowshy.cylinder.excursion;

import flowshy.cylinder.SteadyDrag;
import flowshy.math.GaussLegendre;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.util.FastMath;

/**
 * Steady drag f(v) averaged over a fluctuating velocity v = Ū + u: what a fluctuation meets that is slow enough for the flow to
 * follow.
 *
 * <p>Along the stream E[f u]/σ², the least-squares resistance: E[f′] for random flow (Stein's lemma), (2/(πû)) ∫₀^π f cos θ dθ
 * for a tone. Across it E[f/v], since drag follows the velocity vector. Own averages of textbook linearisation; for constant
 * C_d they give √(8/π) σ and 8û/(3π) times f/v².
 *
 * @param along resistance to fluctuation along the stream [N·s/m²]
 * @param across resistance to fluctuation across the stream [N·s/m²]
 * @param offset mean force per length along the stream [N/m]
 */
public record QuasiSteady(double along, double across, double offset) {
    private static final GaussLegendre RULE = GaussLegendre.of(8);

    /** A fluctuation below this share of the mean sees the slope of the drag; its curve would add the square of it. */
    private static final double SMALL = 1e-5;

    /**
     * The averages at one operating point.
     *
     * @param drag steady drag of the strip
     * @param point velocities at the strip
     * @return the averages; all 0 where nothing moves
     * @throws IllegalArgumentException if a velocity within 8 deviations of the mean leaves the drag law, Re above 2e5
     */
    public static QuasiSteady of(SteadyDrag drag, OperatingPoint point) {
        double mean = point.mean();
        if (point.deviation() <= SMALL * FastMath.abs(mean)) {
            return new QuasiSteady(drag.slope(mean), drag.resistance(mean), drag.force(mean));
        }
        return of(drag::force, point);
    }

    /** For any odd law of the velocity; the deviation is not 0. */
    static QuasiSteady of(DoubleUnaryOperator force, OperatingPoint point) {
        double mean = point.mean();
        double deviation = point.deviation();
        double[] breaks = point.fluctuation().breaks(mean, deviation);
        double along = 0.0;
        double across = 0.0;
        double offset = 0.0;
        for (int i = 1; i < breaks.length; i++) {
            double half = 0.5 * (breaks[i] - breaks[i - 1]);
            for (int k = 0; k < RULE.size(); k++) {
                double x = breaks[i - 1] + half * (1.0 + RULE.point(k));
                double weight = half * RULE.weight(k) * point.fluctuation().density(x);
                double v = point.fluctuation().velocity(x, mean, deviation);
                double f = v == 0.0 ? 0.0 : force.applyAsDouble(v);
                along += weight * f * (v - mean);
                across += v == 0.0 ? 0.0 : weight * f / v;
                offset += weight * f;
            }
        }
        return new QuasiSteady(along / (deviation * deviation), across, offset);
    }
}
