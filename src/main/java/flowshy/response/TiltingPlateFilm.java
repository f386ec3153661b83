package flowshy.response;

import flowshy.math.Caveat;
import flowshy.math.Figures;
import flowshy.math.Positive;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Film of the medium under a rectangular plate that tilts about its centre line, close over a fixed base.
 *
 * <p>Lubrication, h³/(12μ) ∇²p = x dθ/dt, p = 0 at the rim, small tilt, no compression. Damping c = (6μ l/h³) Σ (a/k)² [w −
 * (2/k) tanh(kw/2)] over n = 2, 4, 6 …, k = nπ/l, a = 2l/(nπ) (own series; the same problem as Langlois 1962, not compared with
 * his print). Summed with Σ n^-4 and Σ n^-5 in closed form, so that the rest falls off exponentially.
 *
 * <p>In a gas whose mean free path λ is known μ is replaced by μ/(1 + 9.638 Kn^1.159), Kn = λ/h: Veijola, Kuisma,
 * Lahdenperä &amp; Ryhänen 1995, Sens. Actuators A 48:239 (from memory), stated there within 5 % for every Kn.
 *
 * @param length l of the plate across the tilt axis [m]
 * @param width w of the plate along the tilt axis [m]
 * @param gap h under the level plate [m]
 */
public record TiltingPlateFilm(double length, double width, double gap) {
    /** ζ(5). */
    private static final double ZETA5 = 1.03692775514337;

    private static final double RAREFACTION = 9.638;
    private static final double RAREFACTION_POWER = 1.159;

    /** Gap over length above which the rim's own flow is no longer small (common practice, no source). */
    private static final double NARROW = 0.1;

    private static final double SMALL_SQUEEZE = 1.0;
    private static final double LARGE_SQUEEZE = 10.0;

    /** Half the gap over the Stokes layer, as a Womersley number, where inertia adds 2 % to the resistance. */
    private static final double THICK_LAYER = 2.0;

    /** @throws IllegalArgumentException if a dimension is not positive and finite */
    public TiltingPlateFilm {
        Positive.check("length [m]", length);
        Positive.check("width [m]", width);
        Positive.check("gap [m]", gap);
    }

    /**
     * Damping of the tilting plate.
     *
     * @param medium the medium in the gap; with its mean free path, if it has one, rarefaction is counted
     * @return c [N·m·s/rad]
     */
    public double damping(Medium medium) {
        return shape() * effectiveViscosity(medium) * FastMath.pow(length, 6) / (gap * gap * gap);
    }

    /**
     * Viscosity that the film feels.
     *
     * @param medium the medium in the gap
     * @return μ, in a gas with known mean free path less by rarefaction [Pa·s]
     */
    public double effectiveViscosity(Medium medium) {
        double knudsen = medium.meanFreePath().orElse(0.0) / gap;
        return medium.viscosity() / (1.0 + RAREFACTION * FastMath.pow(knudsen, RAREFACTION_POWER));
    }

    /**
     * Squeeze number 12μω(l/2)²/(p h²); a gas is compressed rather than pushed out where it is not small.
     *
     * @param medium the medium in the gap
     * @param omega angular frequency [rad/s]
     * @return σ [-]
     */
    public double squeezeNumber(Medium medium, double omega) {
        return 3.0 * effectiveViscosity(medium) * omega * length * length / (medium.pressure() * gap * gap);
    }

    /**
     * What must stand beside the damping.
     *
     * @param medium the medium in the gap
     * @param omega highest angular frequency at which the damping is used [rad/s]
     * @return the caveats, none if the film is thin, slow and open
     */
    public List<Caveat> caveats(Medium medium, double omega) {
        List<Caveat> caveats = new ArrayList<>();
        double narrow = gap / FastMath.min(length, width);
        if (narrow > NARROW) {
            caveats.add(weak(
                    "The film under the plate is %.2g of the plate's side thick; its law is for thin films.", narrow));
        }
        double squeeze = squeezeNumber(medium, omega);
        if (medium.phase() != Phase.LIQUID && squeeze > SMALL_SQUEEZE) {
            String text = "The squeeze number of the film is %.2g; above 1 the gas is compressed and damps less.";
            caveats.add(
                    squeeze > LARGE_SQUEEZE
                            ? new Caveat(
                                    Caveat.Subject.SUSPENSION, Caveat.Weight.OUT_OF_RANGE, Figures.say(text, squeeze))
                            : weak(text, squeeze));
        }
        double womersley = 0.5 * gap * FastMath.sqrt(omega / medium.kinematicViscosity());
        if (womersley > THICK_LAYER) {
            caveats.add(weak(
                    "Half the film is %.2g in Womersley's measure; above 2 inertia adds to the film's resistance.",
                    womersley));
        }
        return List.copyOf(caveats);
    }

    /** c h³/(μ l⁶). */
    private double shape() {
        double slender = width / length;
        double correction = 0.0;
        // 1 − tanh y = 2/(1 + e^{2y}), nothing beyond y = 20
        for (int n = 2; n * FastMath.PI * slender < 40.0; n += 2) {
            correction += 2.0 / ((1.0 + FastMath.exp(n * FastMath.PI * slender)) * FastMath.pow(n, 5));
        }
        return slender / 60.0 - 48.0 / FastMath.pow(FastMath.PI, 5) * (ZETA5 / 32.0 - correction);
    }

    private static Caveat weak(String text, double figure) {
        return new Caveat(Caveat.Subject.SUSPENSION, Caveat.Weight.WEAK, Figures.say(text, figure));
    }
}
