package flowshy.torque;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Hair;
import flowshy.hair.Strip;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import flowshy.stream.WallShare;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.torque.strips.StripMesh;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Torques on a hair of any profile by Gauss–Legendre strips, split at the profile's own break points and, near the wall, at
 * multiples of the Stokes layer. Converged to 1e-8 relative, real and imaginary part each: a test doubles the points.
 */
public final class StripTorques implements TorqueModel {
    private final Hair hair;
    private final Medium medium;
    private final StokesLayer layer;
    private final WallShare profile;
    private final Confinement confinement;
    private final double pivotDepth;
    private final StripMesh mesh;

    StripTorques(Hair hair, Medium medium, double pivotDepth) {
        this(hair, medium, pivotDepth, Covers.OPEN, 1);
    }

    /**
     * Strips with more points, to see how the integrals converge.
     *
     * @param hair the hair
     * @param medium what it stands in
     * @param pivotDepth h [m]
     * @param cover shapes the flow over the wall
     * @param refinement factor on the number of points, 1 in use
     */
    StripTorques(Hair hair, Medium medium, double pivotDepth, Cover cover, int refinement) {
        this.hair = hair;
        this.medium = medium;
        this.layer = new StokesLayer(medium.kinematicViscosity());
        this.profile = cover.profile(medium);
        this.confinement = new Confinement(cover.cavityRadius(), medium);
        this.pivotDepth = pivotDepth;
        this.mesh = new StripMesh(hair.profile(), refinement);
    }

    @Override
    public Torques at(double omega) {
        double delta = layer.thickness(omega);
        double rho = medium.density();
        double solid = hair.density();
        double flow = 0.0;
        double flowImaginary = 0.0;
        double open = 0.0;
        double openImaginary = 0.0;
        double carried = 0.0;
        double turning = 0.0;
        double turningImaginary = 0.0;
        double radius = Double.NaN;
        Complex gamma = Complex.ZERO;
        Complex confined = Complex.ZERO;
        for (Strip strip : mesh.strips(delta, profile)) {
            if (strip.radius() != radius) { // a straight part needs its law once
                radius = strip.radius();
                gamma = new OscillatingCylinder(radius, medium).hydrodynamicFunction(omega);
                confined = confinement.function(radius, omega, gamma);
            }
            double arm = strip.height() + pivotDepth;
            double moment = strip.weight() * FastMath.PI * radius * radius * arm;
            Complex share = profile.share(strip.height(), omega);
            // Γ s in parts: the library's product guards against infinities and takes longer than all the rest
            double sheared = gamma.getReal() * share.getReal() - gamma.getImaginary() * share.getImaginary();
            double shearedImaginary = gamma.getReal() * share.getImaginary() + gamma.getImaginary() * share.getReal();
            flow += rho * (1.0 + sheared) * moment;
            flowImaginary += rho * shearedImaginary * moment;
            open -= (solid + rho * sheared) * moment;
            openImaginary -= rho * shearedImaginary * moment;
            carried -= (solid - rho) * moment;
            turning += rho * confined.getReal() * moment * arm;
            turningImaginary += rho * confined.getImaginary() * moment * arm;
        }
        return new Torques(
                omega,
                new Complex(flow, flowImaginary),
                new Complex(open, openImaginary),
                carried,
                new Complex(turning, turningImaginary));
    }

    @Override
    public Complex fluidInertia(Complex s) {
        Complex turning = Complex.ZERO;
        double radius = Double.NaN;
        Complex gamma = Complex.ZERO;
        for (Strip strip : mesh.strips()) {
            if (strip.radius() != radius) {
                radius = strip.radius();
                gamma = confinement.function(radius, s);
            }
            double arm = strip.height() + pivotDepth;
            turning = turning.add(
                    gamma.multiply(medium.density() * strip.weight() * FastMath.PI * radius * radius * arm * arm));
        }
        return turning;
    }
}
