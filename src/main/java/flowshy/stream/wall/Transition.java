package flowshy.stream.wall;

import flowshy.math.Positive;
import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/**
 * Where the layer over a plate turns turbulent because the stream is, and how gradually.
 *
 * <p>Start: Re_θ = 163 + exp(6.91 − Tu[%]), Re_x = (Re_θ/0.664)² (Abu-Ghannam and Shaw 1980, zero pressure gradient, from memory).
 * Behind it the share of time that the layer is turbulent: γ = 1 − exp(−0.412 ((x−x_t)/λ)²), Re_λ = 5 Re_t^0.8, λ the distance from
 * γ = ¼ to ¾ (Dhawan and Narasimha 1958, from memory). So nothing steps when a stream passes transition.
 *
 * @param turbulence rms over mean speed of the stream [-]
 */
public record Transition(double turbulence) {
    /** Where the data lie; above, Re_θ rests at its lowest value 163 and the number is an estimate. */
    public static final Range TURBULENCE = new Range("turbulence [-]", 0.001, 0.1);

    /** @throws IllegalArgumentException if the turbulence is not positive and finite */
    public Transition {
        Positive.check("turbulence [-]", turbulence);
    }

    /**
     * Reynolds number on the momentum thickness where transition begins.
     *
     * @return Re_θ [-], between 163 and 1165
     */
    public double momentumReynolds() {
        return 163.0 + FastMath.exp(6.91 - 100.0 * turbulence);
    }

    /**
     * Reynolds number on the fetch where transition begins.
     *
     * @return Re_t [-]
     */
    public double reynolds() {
        double ratio = momentumReynolds() / 0.664;
        return ratio * ratio;
    }

    /**
     * Share of time that the layer is turbulent.
     *
     * @param reynolds Re_x at the hair [-]
     * @return γ, 0 up to transition, towards 1 behind it
     */
    public double intermittency(double reynolds) {
        double start = reynolds();
        if (reynolds <= start) {
            return 0.0;
        }
        double way = (reynolds - start) / (5.0 * FastMath.pow(start, 0.8));
        return -FastMath.expm1(-0.412 * way * way);
    }
}
