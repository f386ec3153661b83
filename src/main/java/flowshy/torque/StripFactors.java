package flowshy.torque;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Every factor of the force on one strip, for a check by hand. Time factor e^{+iωt}.
 *
 * @param frequency [Hz]
 * @param radius of the strip [m]
 * @param womersley a√(ω/ν) [-]
 * @param layer Stokes layer δ [m]
 * @param gamma hydrodynamic function Γ [-]
 * @param addedMass ρπa² Re Γ [kg/m]
 * @param damping −ωρπa² Im Γ [N·s/m²]
 * @param share velocity at the strip over that of the free stream, 1 − e^{−kz} at a height over the wall, else 1 [-]
 * @param forceMoving force on the strip moving at unit velocity in fluid at rest, −iωρπa²Γ [N·s/m²]
 * @param forceStanding force on the strip at rest in a stream of unit velocity, iωρπa²(1 + Γ s) [N·s/m²]
 */
public record StripFactors(
        double frequency,
        double radius,
        double womersley,
        double layer,
        Complex gamma,
        double addedMass,
        double damping,
        Complex share,
        Complex forceMoving,
        Complex forceStanding) {
    /**
     * Factors of a strip.
     *
     * @param strip the cylinder that the strip is part of
     * @param height above the wall [m], absent for a strip in the free stream
     * @param frequency [Hz]
     * @return the factors
     */
    public static StripFactors of(OscillatingCylinder strip, OptionalDouble height, double frequency) {
        double omega = 2.0 * FastMath.PI * frequency;
        Medium medium = strip.medium();
        StokesLayer layer = new StokesLayer(medium.kinematicViscosity());
        Complex gamma = strip.hydrodynamicFunction(omega);
        double displaced = medium.density() * FastMath.PI * strip.radius() * strip.radius();
        Complex share = height.isPresent() ? layer.share(height.getAsDouble(), omega) : Complex.ONE;
        return new StripFactors(
                frequency,
                strip.radius(),
                strip.womersley(omega),
                layer.thickness(omega),
                gamma,
                displaced * gamma.getReal(),
                -omega * displaced * gamma.getImaginary(),
                share,
                strip.forcePerVelocity(omega),
                strip.streamForcePerVelocity(omega, share));
    }
}
