package flowshy.torque;

import flowshy.torque.finite.FiniteFactors;
import flowshy.torque.finite.LengthFactors;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Strip theory times factors for finite length: one on the torque of flow, one on the fluid's inertia. T_open = T_carried − T_flow
 * still holds, each from its own integral.
 *
 * @param strips strip theory
 * @param factors of the finite hair on an open wall
 * @param confined whether a cavity confines the fluid that the turning moves: then its inertia stays that of the confined strips
 */
record FactoredTorques(TorqueModel strips, LengthFactors factors, boolean confined) implements TorqueModel {
    @Override
    public Torques at(double omega) {
        Torques base = strips.at(omega);
        FiniteFactors factor = factors.at(omega);
        return new Torques(
                omega,
                base.flow().multiply(factor.stream()),
                base.open().subtract(base.carried()).multiply(factor.stream()).add(base.carried()),
                base.carried(),
                confined ? base.fluidInertia() : base.fluidInertia().multiply(factor.rocking()));
    }

    /** {@inheritDoc} The factor is that of the real frequency |s|: it changes by a few per cent a decade. */
    @Override
    public Complex fluidInertia(Complex s) {
        Complex inertia = strips.fluidInertia(s);
        return confined
                ? inertia
                : inertia.multiply(factors.at(FastMath.hypot(s.getReal(), s.getImaginary()))
                        .rocking());
    }

    @Override
    public void expect(double lowest, double highest) {
        factors.expect(lowest, highest);
    }

    @Override
    public TorqueModel alone() {
        return new FactoredTorques(strips, factors.alone(), confined);
    }

    @Override
    public Optional<Complex> streamFactor(double omega) {
        return Optional.of(factors.at(omega).stream());
    }
}
