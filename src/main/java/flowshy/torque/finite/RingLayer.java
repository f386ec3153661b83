package flowshy.torque.finite;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleFunction;
import org.hipparchus.complex.Complex;

/**
 * Force densities on the rings of one body at one frequency, for any motion; viscosity 1, velocities and lengths in units of
 * the rings'.
 *
 * <p>The layer's density q makes the velocity −∫ G q, so that it is the traction outside less that inside. Inside, a stream that
 * is itself a flow of the medium leaves only its own traction, and q is the whole traction. Inside a rigid motion the medium
 * has no stress once the volume force iωρ w that holds it in that motion is added; then q is the traction outside.
 */
final class RingLayer {
    private final List<Ring> rings;
    private final double beta;
    private final LayerSystem system;
    private final SymmetricFactors factors;

    RingLayer(List<Ring> rings, FootSlot slot, double beta) {
        this.rings = List.copyOf(rings);
        this.beta = beta;
        this.system = LayerSystem.of(this.rings, slot, beta);
        this.factors = system.factors();
    }

    List<Ring> rings() {
        return rings;
    }

    /** Density of a stream along x that has the velocity at height z at the surface. */
    Complex[] inStream(DoubleFunction<Complex> velocity) {
        Complex[] right = zeros();
        for (int i = 0; i < rings.size(); i++) {
            Complex sum = Complex.ZERO;
            for (RingPiece piece : rings.get(i).pieces()) {
                sum = sum.add(PieceMean.of(piece, velocity).multiply(piece.area()));
            }
            right[3 * i] = sum;
        }
        return factors.solve(right);
    }

    /**
     * Density on a body that moves with v_x = slide + turn · z and v_z = −axial · x, the foot's part of the wall with it.
     *
     * @param slide velocity along x at z = 0
     * @param turn growth of it with the height
     * @param axial the same for a rigid turn, 0 for a sheared body, which needs an inside traction beside the density
     */
    Complex[] moving(double slide, double turn, double axial) {
        Complex[] right = zeros();
        Complex inertia = new Complex(0.0, beta);
        double[] factor = {turn, slide, axial, slide, axial};
        for (int column = 0; column < LayerSystem.COLUMNS; column++) {
            Complex[] values = system.column(column);
            Complex scale =
                    column < LayerSystem.FOOT_SLIDES ? inertia.multiply(factor[column]) : new Complex(factor[column]);
            for (int u = 0; u < right.length; u++) {
                right[u] = right[u].add(values[u].multiply(scale));
            }
        }
        double[] surface = motion(slide, turn, axial);
        for (int u = 0; u < right.length; u++) {
            right[u] = right[u].subtract(surface[u]);
        }
        return factors.solve(right);
    }

    /** Power of unit densities in a motion: ∫ v · density dS, one an unknown. */
    double[] motion(double slide, double turn, double axial) {
        double[] power = new double[3 * rings.size()];
        for (int i = 0; i < rings.size(); i++) {
            for (RingPiece piece : rings.get(i).pieces()) {
                power[3 * i] += piece.area() * (slide + turn * piece.middle());
                power[3 * i + 2] -= axial * piece.axialArm();
            }
        }
        return power;
    }

    static Complex dot(double[] power, Complex[] density) {
        Complex sum = Complex.ZERO;
        for (int u = 0; u < power.length; u++) {
            sum = sum.add(density[u].multiply(power[u]));
        }
        return sum;
    }

    private Complex[] zeros() {
        Complex[] values = new Complex[3 * rings.size()];
        Arrays.fill(values, Complex.ZERO);
        return values;
    }
}
