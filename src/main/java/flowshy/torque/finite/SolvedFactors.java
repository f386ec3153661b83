package flowshy.torque.finite;

import flowshy.medium.Medium;
import java.util.function.DoubleUnaryOperator;

/**
 * Factors of the whole hair's solution in one medium, which the factors know only by ω/ν and slow torques by μ.
 *
 * @param grid solutions of the hair
 * @param medium the medium
 */
record SolvedFactors(FactorGrid grid, Medium medium) implements LengthFactors {
    @Override
    public FiniteFactors at(double omega) {
        return grid.at(omega / medium.kinematicViscosity());
    }

    @Override
    public void expect(double lowest, double highest) {
        grid.expect(lowest / medium.kinematicViscosity(), highest / medium.kinematicViscosity());
    }

    @Override
    public LengthFactors alone() {
        return omega -> grid.alone(omega / medium.kinematicViscosity());
    }

    @Override
    public double creepingTorque(DoubleUnaryOperator velocity) {
        return medium.viscosity() * grid.creepingTorque(velocity);
    }

    @Override
    public double heldAbove() {
        return grid.heldAbove() * medium.kinematicViscosity();
    }
}
