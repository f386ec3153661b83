package flowshy.math;

import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Quotient K₁(pa)/K₀(qa) of modified Bessel functions at many lengths a, by the routes of {@link BesselK}; what p and q share with
 * every a is worked out once. Relative error about 2e-15 where |q − p| a stays small, and as many roundings more as that is large.
 */
public final class BesselQuotient {
    private final Complex above;
    private final Complex below;
    private final double largest;
    private final double aboveLog;
    private final double belowLog;
    private final double aboveAngle;
    private final double belowAngle;

    /**
     * Two rays in the right half plane.
     *
     * @param above p, of K₁, Re p ≥ 0, not 0, finite [1/m]
     * @param below q, of K₀, likewise [1/m]
     */
    public BesselQuotient(Complex above, Complex below) {
        this.above = above;
        this.below = below;
        double aboveModulus = above.norm();
        double belowModulus = below.norm();
        this.largest = BesselK.SERIES_BELOW / FastMath.max(aboveModulus, belowModulus);
        this.aboveLog = FastMath.log(0.5 * aboveModulus);
        this.belowLog = FastMath.log(0.5 * belowModulus);
        this.aboveAngle = above.getArgument();
        this.belowAngle = below.getArgument();
    }

    /**
     * The quotient.
     *
     * @param length a, positive [m]
     * @return K₁(pa)/K₀(qa), not scaled [-]; zero or infinite where the real parts lie some 700 apart
     * @throws IllegalArgumentException if an argument is 0, not finite or outside the closed right half plane
     */
    public Complex at(double length) {
        Complex first = above.multiply(length);
        Complex second = below.multiply(length);
        if (length > 0.0 && length <= largest) { // no scale that would cancel
            double log = FastMath.log(length);
            return quotient(
                    BesselK.series(first, aboveLog + log, aboveAngle).k1(),
                    BesselK.series(second, belowLog + log, belowAngle).k0());
        }
        return quotient(BesselK.scaledK1(first), BesselK.scaledK0(second))
                .multiply(second.subtract(first).exp());
    }

    /** Without the library's guards against overflow: both are of moderate size. */
    private static Complex quotient(Complex over, Complex under) {
        double share = 1.0 / (under.getReal() * under.getReal() + under.getImaginary() * under.getImaginary());
        return new Complex(
                share * (over.getReal() * under.getReal() + over.getImaginary() * under.getImaginary()),
                share * (over.getImaginary() * under.getReal() - over.getReal() * under.getImaginary()));
    }
}
