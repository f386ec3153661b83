package flowshy.torque;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.torque.finite.LengthFactors;
import java.util.Optional;
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
     * Says which frequencies will be asked for, so that what they share can be worked out at once.
     *
     * @param lowest angular frequency, positive [rad/s]
     * @param highest above the lowest [rad/s]
     */
    default void expect(double lowest, double highest) {}

    /**
     * The same for a hair that is asked for a few frequencies alone.
     *
     * @return torques in which nothing is shared between frequencies
     */
    default TorqueModel alone() {
        return this;
    }

    /**
     * Torque of flow over that of strip theory.
     *
     * @param omega angular frequency, positive [rad/s]
     * @return factor for finite length [-], empty where strip theory stands alone
     */
    default Optional<Complex> streamFactor(double omega) {
        return Optional.empty();
    }

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
        TorqueModel strips = endless(hair, medium, pivotDepth, cover);
        boolean confined = cover.cavityRadius().isPresent();
        if (confined && cover.closed()) { // no flow reaches the hair, and its own is the cavity's
            return strips;
        }
        return LengthFactors.of(hair, medium, pivotDepth)
                .<TorqueModel>map(factors -> new FactoredTorques(strips, factors, confined))
                .orElse(strips);
    }

    private static TorqueModel endless(Hair hair, Medium medium, double pivotDepth, Cover cover) {
        if (hair.profile() instanceof Cylinder cylinder && cover.profile(medium) instanceof StokesLayer) {
            return new CylinderTorques(
                    cylinder, hair.density(), medium, pivotDepth, new Confinement(cover.cavityRadius(), medium));
        }
        return new StripTorques(hair, medium, pivotDepth, cover, 1);
    }
}
