package flowshy.stream.wall;

import org.hipparchus.util.FastMath;

/**
 * Steady layer over a plate at the hair: laminar, turbulent, or between the two as the turbulence of the stream decides.
 *
 * <p>Blasius up to transition, Spalding's wall law with the friction of a plate turbulent from its edge above; behind the start of
 * transition the two are mixed by the share of time that the layer is turbulent ({@link Transition}).
 *
 * @param laminar the layer that would be there without transition; holds speed, fetch and viscosity
 * @param transition where the stream's turbulence turns it
 */
public record PlateFlow(BlasiusLayer laminar, Transition transition) {
    /**
     * A layer from its numbers.
     *
     * @param speed U of the free stream [m/s]
     * @param fetch x [m]
     * @param turbulence rms over mean speed [-]
     * @param kinematicViscosity ν [m²/s]
     * @return the layer
     */
    public static PlateFlow of(double speed, double fetch, double turbulence, double kinematicViscosity) {
        return new PlateFlow(new BlasiusLayer(speed, fetch, kinematicViscosity), new Transition(turbulence));
    }

    /**
     * Share of time that the layer is turbulent.
     *
     * @return γ, 0 to 1
     */
    public double intermittency() {
        return transition.intermittency(laminar.reynolds());
    }

    /**
     * The turbulent wall; asked only where some of the layer is turbulent.
     *
     * @return wall with u_τ = U √(c_f/2)
     * @throws IllegalArgumentException if Re_x is outside the range of the friction law
     */
    public TurbulentWall wall() {
        return new TurbulentWall(
                PlateFriction.LOGARITHMIC.frictionVelocity(laminar.speed(), laminar.reynolds()),
                laminar.kinematicViscosity());
    }

    /**
     * Mean velocity along the wall.
     *
     * @param height z [m], zero or more
     * @return u [m/s], never above the stream's
     */
    public double speedAt(double height) {
        double gamma = intermittency();
        double turbulent = gamma > 0.0 ? FastMath.min(wall().speedAt(height), laminar.speed()) : 0.0;
        return (1.0 - gamma) * laminar.speedAt(height) + gamma * turbulent;
    }

    /**
     * Thickness of the layer.
     *
     * @return δ₉₉ [m]; 4.91 x Re_x^−½ laminar, 0.37 x Re_x^−⅕ turbulent (Prandtl, textbook), mixed between
     */
    public double thickness() {
        double gamma = intermittency();
        double turbulent = 0.37 * laminar.fetch() * FastMath.pow(laminar.reynolds(), -0.2);
        return (1.0 - gamma) * laminar.thickness() + gamma * turbulent;
    }
}
