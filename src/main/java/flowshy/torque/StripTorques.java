package flowshy.torque;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.hair.Strip;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Torques on a hair of any profile by Gauss–Legendre strips, split at the profile's own break points and, near the wall, at
 * multiples of the Stokes layer. Converged to 1e-8 relative: a test doubles the points.
 */
public final class StripTorques implements TorqueModel {
    /** Splits in units of δ; above the last the flow is the free stream to 1e-17. */
    private static final double[] LAYER_SPLITS = {1.0, 3.0, 8.0, 20.0, 40.0};

    private static final int FEW_SEGMENTS = 8;

    private final Hair hair;
    private final Medium medium;
    private final StokesLayer layer;
    private final double pivotDepth;
    private final int points;

    StripTorques(Hair hair, Medium medium, double pivotDepth) {
        this(hair, medium, pivotDepth, hair.profile().breaks().size() <= FEW_SEGMENTS ? 20 : 10);
    }

    /**
     * Strips with a chosen number of points, to see how the integrals converge.
     *
     * @param hair the hair
     * @param medium what it stands in
     * @param pivotDepth h [m]
     * @param points quadrature points a segment
     */
    StripTorques(Hair hair, Medium medium, double pivotDepth, int points) {
        this.hair = hair;
        this.medium = medium;
        this.layer = new StokesLayer(medium.kinematicViscosity());
        this.pivotDepth = pivotDepth;
        this.points = points;
    }

    @Override
    public Torques at(double omega) {
        double delta = layer.thickness(omega);
        double rho = medium.density();
        Complex flow = Complex.ZERO;
        Complex open = Complex.ZERO;
        Complex turning = Complex.ZERO;
        double carried = 0.0;
        double radius = Double.NaN;
        Complex gamma = Complex.ZERO;
        for (Strip strip : Strip.along(hair.profile(), segments(delta), points)) {
            if (strip.radius() != radius) { // a straight part needs its law once
                radius = strip.radius();
                gamma = new OscillatingCylinder(radius, medium).hydrodynamicFunction(omega);
            }
            double arm = strip.height() + pivotDepth;
            double area = strip.weight() * FastMath.PI * radius * radius;
            Complex sheared = gamma.multiply(StokesLayer.share(strip.height() / delta));
            flow = flow.add(sheared.add(1.0).multiply(rho * area * arm));
            open = open.subtract(sheared.multiply(rho).add(hair.density()).multiply(area * arm));
            carried -= (hair.density() - rho) * area * arm;
            turning = turning.add(gamma.multiply(rho * area * arm * arm));
        }
        return new Torques(omega, flow, open, carried, turning);
    }

    @Override
    public Complex fluidInertia(Complex s) {
        Complex turning = Complex.ZERO;
        double radius = Double.NaN;
        Complex gamma = Complex.ZERO;
        for (Strip strip : Strip.along(hair.profile(), hair.profile().breaks(), points)) {
            if (strip.radius() != radius) {
                radius = strip.radius();
                gamma = new OscillatingCylinder(radius, medium).hydrodynamicFunction(s);
            }
            double arm = strip.height() + pivotDepth;
            turning = turning.add(
                    gamma.multiply(medium.density() * strip.weight() * FastMath.PI * radius * radius * arm * arm));
        }
        return turning;
    }

    private List<Double> segments(double delta) {
        Profile profile = hair.profile();
        List<Double> merged = new ArrayList<>();
        int next = 0;
        for (double z : profile.breaks()) {
            while (next < LAYER_SPLITS.length && LAYER_SPLITS[next] * delta < z) {
                double split = LAYER_SPLITS[next] * delta;
                double below = merged.get(merged.size() - 1);
                // a sliver beside a break of the profile adds points and no accuracy
                if (split - below > 0.05 * delta && z - split > 0.05 * delta) {
                    merged.add(split);
                }
                next++;
            }
            merged.add(z);
        }
        return merged;
    }
}
