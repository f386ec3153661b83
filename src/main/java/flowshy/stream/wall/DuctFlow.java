package flowshy.stream.wall;

import flowshy.math.Positive;
import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/**
 * Developed flow in a smooth duct, at the wall that the hair stands on.
 *
 * <p>Laminar below Re = 2300, turbulent above 4000 (textbook limits, from memory), Re on mean speed and hydraulic diameter; between,
 * both profiles are mixed by a smoothstep, since real ducts come and go there. Turbulent: friction by Prandtl's law on the hydraulic diameter
 * (within about 10 % for rectangles, common practice), Spalding's wall law up to the middle, which carries 4 to 5 % less than
 * the stated flow.
 *
 * @param section the cross-section
 * @param meanSpeed U, volume flow over area [m/s]
 * @param kinematicViscosity ν [m²/s]
 */
public record DuctFlow(DuctSection section, double meanSpeed, double kinematicViscosity) {
    /** Where the flow is neither laminar nor turbulent all the time. */
    public static final Range TRANSITION = new Range("Re", 2300.0, 4000.0);

    /** @throws IllegalArgumentException if a number is not positive and finite */
    public DuctFlow {
        Positive.check("mean speed [m/s]", meanSpeed);
        Positive.check("kinematic viscosity [m2/s]", kinematicViscosity);
    }

    /**
     * Reynolds number on mean speed and hydraulic diameter.
     *
     * @return Re [-]
     */
    public double reynolds() {
        return meanSpeed * section.hydraulicDiameter() / kinematicViscosity;
    }

    /**
     * Share of the turbulent profile in the mixture.
     *
     * @return γ, 0 laminar, 1 turbulent
     */
    public double intermittency() {
        double way = (reynolds() - TRANSITION.low()) / (TRANSITION.high() - TRANSITION.low());
        double inside = FastMath.max(0.0, FastMath.min(1.0, way));
        return inside * inside * (3.0 - 2.0 * inside);
    }

    /**
     * The turbulent wall; its friction velocity means nothing while the flow is laminar.
     *
     * @return wall with u_τ = U √(f/8)
     * @throws IllegalArgumentException if Re is outside the range of the friction law
     */
    public TurbulentWall wall() {
        double factor = PipeFriction.PRANDTL.factor(reynolds());
        return new TurbulentWall(meanSpeed * FastMath.sqrt(factor / 8.0), kinematicViscosity);
    }

    /**
     * Mean velocity along the duct.
     *
     * @param height z above the hair's wall, from zero to the depth [m]
     * @return u [m/s]
     */
    public double speedAt(double height) {
        double gamma = intermittency();
        double laminar = gamma < 1.0 ? meanSpeed * section.laminarShare(height) : 0.0;
        double nearer = FastMath.min(height, section.depth() - height);
        double turbulent = gamma > 0.0 ? wall().speedAt(nearer) : 0.0;
        return (1.0 - gamma) * laminar + gamma * turbulent;
    }

    /**
     * Velocity in the middle, the stream that the wall's layer lies under.
     *
     * @return [m/s]
     */
    public double coreSpeed() {
        return speedAt(0.5 * section.depth());
    }
}
