package flowshy.stream.wall;

import flowshy.math.Positive;
import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/**
 * Steady laminar layer over a plate in a stream of constant speed.
 *
 * <p>u = U f′(η), η = z √(U/(νx)), f‴ + ½ f f″ = 0. Source: Blasius 1908; constants after Howarth 1938 (textbook digits). Sharp
 * leading edge, no pressure gradient; holds from a few hundred in Re_x, where the edge is forgotten, to transition.
 *
 * @param speed U of the free stream [m/s]
 * @param fetch x, distance from the leading edge to the hair [m]
 * @param kinematicViscosity ν [m²/s]
 */
public record BlasiusLayer(double speed, double fetch, double kinematicViscosity) {
    /** Re_x where the similar profile is good to a few per cent; the lower end is textbook practice, the upper the usual transition. */
    public static final Range REYNOLDS = new Range("Re_x", 500.0, 3.0e6);

    /** @throws IllegalArgumentException if a value is not positive and finite */
    public BlasiusLayer {
        Positive.check("speed [m/s]", speed);
        Positive.check("fetch [m]", fetch);
        Positive.check("kinematic viscosity [m2/s]", kinematicViscosity);
    }

    /**
     * Reynolds number on the fetch.
     *
     * @return Re_x = Ux/ν [-]
     */
    public double reynolds() {
        return speed * fetch / kinematicViscosity;
    }

    /**
     * Height in units of the layer.
     *
     * @param height z [m]
     * @return η = z √(U/(νx)) [-]
     */
    public double eta(double height) {
        return height * FastMath.sqrt(speed / (kinematicViscosity * fetch));
    }

    /**
     * Mean velocity along the wall.
     *
     * @param height z [m], zero or more
     * @return u [m/s]
     */
    public double speedAt(double height) {
        return speed * Blasius.slope(eta(height));
    }

    /**
     * Height at which the velocity has reached 99 % of the stream's.
     *
     * @return δ₉₉ = 4.91 x/√Re_x [m]
     */
    public double thickness() {
        double low = 0.0;
        double high = Blasius.END;
        while (high - low > 1e-12) {
            double middle = 0.5 * (low + high);
            if (Blasius.slope(middle) < 0.99) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low / eta(1.0);
    }

    /**
     * Displacement thickness ∫ (1 − u/U) dz.
     *
     * @return δ* = 1.7208 x/√Re_x [m]
     */
    public double displacementThickness() {
        return (Blasius.END - Blasius.f(Blasius.END)) / eta(1.0);
    }

    /**
     * Momentum thickness ∫ u/U (1 − u/U) dz.
     *
     * @return θ = 0.664 x/√Re_x [m]; 2 f″(0) by the momentum equation
     */
    public double momentumThickness() {
        return 2.0 * Blasius.wallCurvature() / eta(1.0);
    }

    /**
     * Shear stress at the wall over ½ρU².
     *
     * @return c_f = 0.664/√Re_x [-]
     */
    public double frictionCoefficient() {
        return 2.0 * Blasius.wallCurvature() / FastMath.sqrt(reynolds());
    }
}
