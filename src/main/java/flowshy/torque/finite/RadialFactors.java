package flowshy.torque.finite;

import flowshy.math.BesselJ01;

/**
 * Hankel transforms of unit densities on a piece at one wavenumber: e_x (J₀), second harmonic (J₂), axial (J₁) on its surface,
 * e_x and x e_z on the disc inside. The thickness along z is left to {@link Wave}; a flat piece carries its disc's.
 */
final class RadialFactors {
    /** Surface densities: even, second harmonic, axial. Disc densities: even, even, axial. */
    static final int COUNT = 5;

    private final double[] pair = new double[2];
    private double radius = Double.NaN;
    private double kappa = Double.NaN;

    void of(RingPiece piece, double wavenumber, double[] out) {
        double r = piece.radius();
        bessel(r, wavenumber);
        double j0 = pair[0];
        double j1 = pair[1];
        double j2 = second(r);
        out[3] = r * j1 / wavenumber;
        out[4] = r * r * j2 / wavenumber;
        if (piece.upright()) {
            out[0] = piece.stretch() * r * j0;
            out[1] = piece.stretch() * r * j2;
            out[2] = piece.stretch() * r * j1;
            return;
        }
        out[3] *= piece.thickness();
        out[4] *= piece.thickness();
        out[0] = 0.0;
        out[1] = 0.0;
        out[2] = 0.0;
        primitives(piece.outer(), piece.stretch() / wavenumber, r, wavenumber, out);
        primitives(piece.inner(), -piece.stretch() / wavenumber, r, wavenumber, out);
    }

    /** ∫ r J₀ = r J₁/κ, ∫ r J₂ = −(r J₁ + 2 J₀/κ)/κ, ∫ r² J₁ = r² J₂/κ. */
    private void primitives(double r, double factor, double middle, double wavenumber, double[] out) {
        bessel(r, wavenumber);
        out[0] += factor * r * pair[1];
        out[1] -= factor * (r * pair[1] + 2.0 * pair[0] / wavenumber);
        out[2] += factor * r * r * second(r) / middle;
    }

    private void bessel(double r, double wavenumber) {
        if (r != radius || wavenumber != kappa) { // a straight hair asks for one radius many times
            radius = r;
            kappa = wavenumber;
            BesselJ01.at(wavenumber * r, pair);
        }
    }

    /** J₂ = 2 J₁/x − J₀, and its series near zero, where that cancels. */
    private double second(double r) {
        double x = kappa * r;
        if (x < 0.1) {
            double y = 0.25 * x * x;
            return y * (0.5 - y * (1.0 / 6.0 - y * (1.0 / 48.0 - y / 720.0)));
        }
        return 2.0 * pair[1] / x - pair[0];
    }
}
