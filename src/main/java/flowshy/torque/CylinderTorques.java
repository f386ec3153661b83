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
 * <p>With ℓ = z + h: ∫ ℓ dz = L²/2 + hL, ∫ s ℓ dz by {@link StokesLayer#lever}, ∫ ℓ² dz = ((L+h)³ − h³)/3. Own integration of design table 4, held to the strips by a test.
 */
public final class CylinderTorques implements TorqueModel {
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
        Complex sheared = gamma.multiply(StokesLayer.lever(length, pivotDepth, layer.thickness(omega)));
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
}
