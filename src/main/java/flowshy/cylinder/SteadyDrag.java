package flowshy.cylinder;

import flowshy.math.Caveat;
import flowshy.math.Figures;
import flowshy.math.Positive;
import flowshy.medium.Medium;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Force of a steady stream on a long circular cylinder across it, f = ½ρ d C_d(Re) |u|u ({@link DragCoefficient}).
 *
 * <p>Where the medium has a mean free path λ, slip of first order: the cylinder drags like one without slip of the smaller
 * radius a·exp(−l/(1+2l)), l = λ/a. For slow flow this is exact to every order of the logarithm, since a slipping cylinder
 * differs, seen from afar, only in that constant (own derivation; to leading order f = 4πμu/[ln(8/Re) + ½ − γ + l/(1+2l)]);
 * beyond Re = 1 it is an estimate. Valid for l below 0.1.
 *
 * @param radius a [m]
 * @param medium the medium of the stream
 */
public record SteadyDrag(double radius, Medium medium) {
    /** @throws IllegalArgumentException if the radius is not positive and finite */
    public SteadyDrag {
        Positive.check("radius [m]", radius);
    }

    /**
     * Reynolds number u d/ν, on the diameter.
     *
     * @param u speed of the stream [m/s], of either sign
     * @return Re ≥ 0 [-]
     */
    public double reynolds(double u) {
        return FastMath.abs(u) * 2.0 * radius / medium.kinematicViscosity();
    }

    /**
     * Force per unit length along the stream.
     *
     * @param u speed of the stream [m/s], of either sign
     * @return f [N/m], with the sign of u; 0 at 0
     * @throws IllegalArgumentException if Re is above 2e5 or u is not a number
     */
    public double force(double u) {
        if (u == 0.0) {
            return 0.0;
        }
        double thinning = thinning();
        double coefficient = DragCoefficient.of(reynolds(u) * thinning);
        return medium.density() * radius * thinning * coefficient * FastMath.abs(u) * u;
    }

    /**
     * Slope f′(u) of the force per unit length: the resistance to a small fluctuation along a stream u.
     *
     * @param u speed of the stream [m/s], of either sign
     * @return f′ [N·s/m²], positive; 0 at 0, where f/u and f′ vanish with the logarithm
     * @throws IllegalArgumentException if Re is above 2e5 or u is not a number
     */
    public double slope(double u) {
        if (u == 0.0) {
            return 0.0;
        }
        double thinning = thinning();
        DragCoefficient.Logarithm drag = DragCoefficient.logarithm(reynolds(u) * thinning);
        double coefficient = FastMath.exp(drag.value());
        return medium.density() * radius * thinning * coefficient * FastMath.abs(u) * (2.0 + drag.slope());
    }

    /**
     * Resistance f/u of the steady stream, which also resists a small fluctuation across it: drag follows the velocity.
     *
     * @param u speed of the stream [m/s], of either sign
     * @return f/u [N·s/m²], positive; 0 at 0
     * @throws IllegalArgumentException if Re is above 2e5 or u is not a number
     */
    public double resistance(double u) {
        return u == 0.0 ? 0.0 : force(u) / u;
    }

    /**
     * What slip leaves of the force.
     *
     * @param u speed of the stream [m/s], not 0
     * @return force with slip over force without [-], 1 if the medium has no mean free path
     * @throws IllegalArgumentException if Re is 0 or above 2e5
     */
    public double slipFactor(double u) {
        double thinning = thinning();
        double re = reynolds(u);
        return thinning * DragCoefficient.of(re * thinning) / DragCoefficient.of(re);
    }

    /**
     * What must stand beside the force at one speed.
     *
     * @param u speed of the stream [m/s], of either sign
     * @return at most one caveat
     */
    public List<Caveat> caveats(double u) {
        double re = reynolds(u);
        if (DragCoefficient.REYNOLDS.contains(re)) {
            return List.of();
        }
        return List.of(new Caveat(
                Caveat.Subject.FLOW,
                Caveat.Weight.OUT_OF_RANGE,
                Figures.say("The drag law ends at Re = 1e5; the stream has Re = %.3g.", re)));
    }

    private double thinning() {
        double l = medium.meanFreePath().orElse(0.0) / radius;
        return FastMath.exp(-l / (1.0 + 2.0 * l));
    }
}
