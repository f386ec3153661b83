package flowshy.stream.cover;

import flowshy.math.BesselI;
import flowshy.medium.Medium;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Acoustic impedance of one round hole: pressure over volume flow, time factor e^{+iωt}.
 *
 * <p>Tube: Z = iωρt/(πr²) / (1 − 2 I₁(λ)/(λ I₀(λ))), λ = r√(iω/ν) (oscillating Poiseuille flow, Crandall 1926, from memory); in the
 * limit ω → 0 it is 8μt/(πr⁴), for ω → ∞ the inertia iωρt/(πr²). Ends: added length 8r/(3π) each, as of a flanged piston
 * (Rayleigh, from memory), and the resistance 3μ/r³ of both together (Sampson 1891, from memory). Holes do not interact.
 *
 * @param radius r [m]
 * @param depth t [m]
 * @param medium in the hole
 */
public record HoleImpedance(double radius, double depth, Medium medium) {
    /** @throws IllegalArgumentException if a dimension is not positive and finite */
    public HoleImpedance {
        if (!(radius > 0.0 && depth > 0.0) || Double.isInfinite(radius) || Double.isInfinite(depth)) {
            throw new IllegalArgumentException("radius " + radius + " m and depth " + depth + " m must be positive");
        }
    }

    /**
     * Impedance at a frequency.
     *
     * @param omega angular frequency, positive [rad/s]
     * @return Z [Pa·s/m³]
     */
    public Complex at(double omega) {
        Complex inertia = new Complex(0.0, omega * medium.density() / area());
        Complex ends = inertia.multiply(2.0 * endLength()).add(3.0 * medium.viscosity() / (radius * radius * radius));
        return tube(omega).add(ends);
    }

    /**
     * Impedance of the tube alone.
     *
     * @param omega angular frequency, positive [rad/s]
     * @return Z without its ends [Pa·s/m³]
     */
    public Complex tube(double omega) {
        double part = radius * FastMath.sqrt(0.5 * omega / medium.kinematicViscosity());
        Complex inertia = new Complex(0.0, omega * medium.density() * depth / area());
        if (part < SMALL) {
            // 1 − 2I₁/(λI₀) = λ²/8 − λ⁴/48 + …, cancelled by hand: Z → 8μt/(πr⁴) + (4/3) iωρt/(πr²)
            double poiseuille = 8.0 * medium.viscosity() * depth / (area() * radius * radius);
            return inertia.multiply(4.0 / 3.0).add(poiseuille);
        }
        Complex lambda = new Complex(part, part);
        BesselI bessel = BesselI.of(lambda);
        Complex stuck = bessel.i1().multiply(2.0).divide(lambda.multiply(bessel.i0()));
        return inertia.divide(stuck.negate().add(1.0));
    }

    /** Below this the next term of the expansion, λ⁴/1152 of the resistance, is under 1e-9. */
    private static final double SMALL = 0.02;

    /**
     * Resistance to a steady flow, ends included.
     *
     * @return 8μt/(πr⁴) + 3μ/r³ [Pa·s/m³]
     */
    public double steady() {
        return 8.0 * medium.viscosity() * depth / (area() * radius * radius)
                + 3.0 * medium.viscosity() / (radius * radius * radius);
    }

    /**
     * Length that one end adds to the moving mass.
     *
     * @return 8r/(3π) [m]
     */
    public double endLength() {
        return 8.0 * radius / (3.0 * FastMath.PI);
    }

    /**
     * Cross-section.
     *
     * @return πr² [m²]
     */
    public double area() {
        return FastMath.PI * radius * radius;
    }
}
