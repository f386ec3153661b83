package flowshy.stream.turbulence;

import org.hipparchus.util.FastMath;

/**
 * Spectrum of the turbulence that a wall layer makes itself, an estimate.
 *
 * <p>The streaks near a wall are about 1000 ν/u_τ long (Hutchins and Marusic 2007) and move at about 10 u_τ (Kim and Hussain 1993),
 * both from memory: f S has its peak at f = 0.01 u_τ²/ν. The shape is that of {@link TurbulenceSpectrum} with rms 2.7 u_τ, whose
 * peak lies there; with these values its smallest eddies are 1.8 ν/u_τ, as near a wall (1.5 to 2, channel simulations, from memory). No
 * measured spectrum stands behind it.
 */
public final class WallTurbulence {
    /** fS of the von Kármán form has its peak at fL/U = (3/(2C))^½. */
    private static final double PEAK = FastMath.sqrt(1.5 / VonKarmanSpectrum.C);

    private WallTurbulence() {}

    /**
     * Spectrum of the layer's own fluctuation at its peak rms.
     *
     * @param frictionVelocity u_τ [m/s]
     * @param kinematicViscosity ν [m²/s]
     * @return spectrum of rms 2.7 u_τ
     */
    public static TurbulenceSpectrum spectrum(double frictionVelocity, double kinematicViscosity) {
        double wallLength = kinematicViscosity / frictionVelocity;
        return new TurbulenceSpectrum(
                2.7 * frictionVelocity, PEAK * 1000.0 * wallLength, 10.0 * frictionVelocity, kinematicViscosity);
    }
}
