package flowshy.torque.finite;

import flowshy.hair.Hair;
import flowshy.medium.Medium;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;

/** Factors on strip theory for a hair of finite length in a medium, by any of the models that know them. */
public interface LengthFactors {
    /**
     * Factors at a frequency.
     *
     * @param omega angular frequency, positive [rad/s]
     * @return factors with their errors; an infinite error where the model's is not known
     */
    FiniteFactors at(double omega);

    /**
     * Says which frequencies will be asked for, so that they can be worked out together.
     *
     * @param lowest angular frequency, positive [rad/s]
     * @param highest above the lowest [rad/s]
     */
    default void expect(double lowest, double highest) {}

    /**
     * The same for a hair that is asked for a few frequencies alone.
     *
     * @return factors that are worked out at each frequency by itself, without a curve through others
     */
    default LengthFactors alone() {
        return this;
    }

    /**
     * Torque of a slow steady stream along the wall: a lower bound for the torque at any Reynolds number.
     *
     * @param velocity undisturbed velocity at height z [m] above the wall [m/s]
     * @return torque about the pivot [N·m]; zero, which is no bound, from a model that does not know it
     */
    default double creepingTorque(DoubleUnaryOperator velocity) {
        return 0.0;
    }

    /**
     * Angular frequency above which the factors are held at their last value.
     *
     * @return [rad/s]; infinite where there is none
     */
    default double heldAbove() {
        return Double.POSITIVE_INFINITY;
    }

    /**
     * The factors that a hair's model of its length asks for.
     *
     * @param hair the hair
     * @param medium what it stands in
     * @param pivotDepth h [m]
     * @return factors; empty for strip theory alone
     */
    static Optional<LengthFactors> of(Hair hair, Medium medium, double pivotDepth) {
        return switch (hair.lengthModel()) {
            case STRIPS -> Optional.empty();
            case ESTIMATE -> Optional.of(new RepairedStrips(hair.profile(), medium, pivotDepth));
            case AUTO -> Optional.of(solved(hair, medium, pivotDepth, Accuracy.ONE_PER_CENT));
            case FINITE -> Optional.of(solved(hair, medium, pivotDepth, Accuracy.FINE));
        };
    }

    private static LengthFactors solved(Hair hair, Medium medium, double pivotDepth, Accuracy accuracy) {
        double gap = hair.footGap().orElse(FiniteHair.defaultGap(hair.profile()));
        return new SolvedFactors(FactorGrid.of(hair.profile(), pivotDepth, gap, accuracy), medium);
    }
}
