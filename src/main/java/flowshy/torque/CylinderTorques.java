package flowshy.torque;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Cylinder;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Torques on a cylindrical hair in closed form.
 *
 * <p>With A = πa², x = kL and ℓ = z + h:
 * ∫ ℓ dz = L²/2 + hL, ∫ s ℓ dz = L² M₁(x) + hL M₀(x), ∫ ℓ² dz = ((L+h)³ − h³)/3,
 * M₀ = 1 − (1 − e^{−x})/x, M₁ = ½ − (1 − (1+x)e^{−x})/x². Own integration of design table 4, held to the strips by a test.
 */
public final class CylinderTorques implements TorqueModel {
    /** Below this |x| the closed forms lose digits to cancellation and the series has converged in 20 terms. */
    private static final double SERIES_BELOW = 1.0;

    private static final int TERMS = 20;

    private final OscillatingCylinder law;
    private final StokesLayer layer;
    private final Confinement confinement;
    private final double length;
    private final double pivotDepth;
    private final double hairWeight;
    private final double fluidWeight;
    private final double lever;
    private final double leverSquared;

    CylinderTorques(Cylinder cylinder, double hairDensity, Medium medium, double pivotDepth) {
        this(cylinder, hairDensity, medium, pivotDepth, new Confinement(OptionalDouble.empty(), medium));
    }

    CylinderTorques(Cylinder cylinder, double hairDensity, Medium medium, double pivotDepth, Confinement confinement) {
        this.confinement = confinement;
        this.law = new OscillatingCylinder(cylinder.radius(), medium);
        this.layer = new StokesLayer(medium.kinematicViscosity());
        this.length = cylinder.length();
        this.pivotDepth = pivotDepth;
        double area = FastMath.PI * cylinder.radius() * cylinder.radius();
        this.hairWeight = hairDensity * area;
        this.fluidWeight = medium.density() * area;
        this.lever = length * (0.5 * length + pivotDepth);
        double top = length + pivotDepth;
        this.leverSquared = (top * top * top - pivotDepth * pivotDepth * pivotDepth) / 3.0;
    }

    @Override
    public Torques at(double omega) {
        Complex gamma = law.hydrodynamicFunction(omega);
        Complex sheared = gamma.multiply(shearedLever(length / layer.thickness(omega)));
        return new Torques(
                omega,
                sheared.add(lever).multiply(fluidWeight),
                sheared.multiply(-fluidWeight).subtract(hairWeight * lever),
                -(hairWeight - fluidWeight) * lever,
                confinement.function(law.radius(), omega, gamma).multiply(fluidWeight * leverSquared));
    }

    @Override
    public Complex fluidInertia(Complex s) {
        return confinement.function(law.radius(), s).multiply(fluidWeight * leverSquared);
    }

    /** ∫ s ℓ dz for x = (1+i) y. */
    private Complex shearedLever(double y) {
        Complex first;
        Complex zeroth;
        if (y * FastMath.sqrt(2.0) < SERIES_BELOW) {
            first = series(y, true);
            zeroth = series(y, false);
        } else {
            Complex x = new Complex(y, y);
            double fall = FastMath.exp(-y);
            Complex e = new Complex(fall * FastMath.cos(y), -fall * FastMath.sin(y));
            Complex once = e.negate().add(1.0).divide(x);
            zeroth = once.negate().add(1.0);
            // (1 − (1+x)e)/x² = (once − e)/x
            first = once.subtract(e).divide(x).negate().add(0.5);
        }
        return first.multiply(length * length).add(zeroth.multiply(length * pivotDepth));
    }

    /** M₁ = −Σ_{n≥3} (−1)ⁿ x^{n−2}(n−1)/n!, M₀ = Σ_{n≥2} (−1)ⁿ x^{n−1}/n!. */
    private static Complex series(double y, boolean moment) {
        Complex minusX = new Complex(-y, -y);
        Complex power = Complex.ONE;
        Complex sum = Complex.ZERO;
        double factorial = moment ? 2.0 : 1.0;
        for (int k = 1; k <= TERMS; k++) {
            power = power.multiply(minusX);
            int n = moment ? k + 2 : k + 1;
            factorial *= n;
            sum = sum.add(power.multiply((moment ? -(n - 1) : -1) / factorial));
        }
        return sum;
    }
}
