package flowshy.torque;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.torque.finite.LengthFactors;
import org.hipparchus.complex.Complex;

/** Torques on one hair in one medium, at any frequency. */
public interface TorqueModel {
    /**
     * Torques at a real frequency.
     *
     * @param omega angular frequency, positive [rad/s]
     * @return torques per unit acceleration and the fluid's inertia
     */
    Torques at(double omega);

    /**
     * Inertia of the fluid on the hair's own turning, at a complex frequency; needed for the decay of a free swing.
     *
     * @param s complex frequency, s = iω on the axis [1/s], imaginary part positive
     * @return ρ ∫ πa² Γ(s) ℓ² dz [kg·m²]
     */
    Complex fluidInertia(Complex s);

    /**
     * The model for a hair: closed form for a cylinder, strips for every other shape.
     *
     * @param hair the hair
     * @param medium what it stands in
     * @param pivotDepth h, depth of the pivot axis below the wall, zero or more [m]
     * @return the model
     */
    static TorqueModel of(Hair hair, Medium medium, double pivotDepth) {
        return of(hair, medium, pivotDepth, Covers.OPEN);
    }

    /**
     * The model for a hair under a cover, which shapes the flow over the wall.
     *
     * @param hair the hair
     * @param medium what it stands in
     * @param pivotDepth h [m]
     * @param cover what stands over it; its factor φ is left to the caller
     * @return the model; flow and open are those under the cover at φ = 1
     */
    static TorqueModel of(Hair hair, Medium medium, double pivotDepth, Cover cover) {
        TorqueModel strips = strips(hair, medium, pivotDepth, cover);
        // a cavity confines the fluid: the whole hair's solution has no wall but the one it stands on
        return hair.lengthModel() == LengthModel.STRIPS || cover.cavityRadius().isPresent()
                ? strips
                : new FactoredTorques(strips, LengthFactors.of(hair.profile(), medium, pivotDepth));
    }

    private static TorqueModel strips(Hair hair, Medium medium, double pivotDepth, Cover cover) {
        if (hair.profile() instanceof Cylinder cylinder && cover.profile(medium) instanceof StokesLayer) {
            return new CylinderTorques(
                    cylinder, hair.density(), medium, pivotDepth, new Confinement(cover.cavityRadius(), medium));
        }
        return new StripTorques(hair, medium, pivotDepth, cover, 1);
    }
}
