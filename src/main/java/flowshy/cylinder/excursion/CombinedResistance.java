package flowshy.cylinder.excursion;

import flowshy.cylinder.DragCoefficient;
import flowshy.cylinder.OscillatingCylinder;
import flowshy.cylinder.SteadyDrag;
import flowshy.math.Caveat;
import flowshy.math.Figures;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Force on a strip between small excursions (Stokes) and large ones (steady drag), linearised about one operating point; every
 * source of flow is multiplied by it.
 *
 * <p>Resistance per length R = R_lin + w [max(R_lin, R_qs) − R_lin], reactance ωρπa² [(1−w)(1 + Re Γ) + 2w], w a smooth step in
 * ln X from X = 0.3 to 3, X = (max(|Ū|, û)/ω)/max(a, δ). R_lin = −ωρπa² Im Γ; R_qs from {@link QuasiSteady}. Own
 * interpolation between two laws, exact at both ends; no measurement was found that tells its error between them.
 *
 * @param cylinder the strip as a small oscillation sees it
 * @param point velocities at the strip
 * @param quasiSteady averages of the steady drag there
 */
public record CombinedResistance(OscillatingCylinder cylinder, OperatingPoint point, QuasiSteady quasiSteady) {
    private static final double SLIP_END = 0.1;

    /**
     * The law of a strip at an operating point.
     *
     * @param cylinder the strip
     * @param point velocities at the strip
     * @return the law
     * @throws IllegalArgumentException if the velocities leave the drag law, Re above 2e5
     */
    public static CombinedResistance at(OscillatingCylinder cylinder, OperatingPoint point) {
        SteadyDrag drag = new SteadyDrag(cylinder.radius(), cylinder.medium());
        return new CombinedResistance(cylinder, point, QuasiSteady.of(drag, point));
    }

    /**
     * Γ as fluctuation along the stream feels it; put in place of the linear Γ it gives the resistance and the reactance:
     * (1−w) Re Γ + w − iR/(ωρπa²).
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return effective Γ [-]
     * @throws IllegalArgumentException if ω is not positive and finite
     */
    public Complex hydrodynamicFunction(double omega) {
        return combined(omega, quasiSteady.along());
    }

    /**
     * Γ as fluctuation across the stream feels it.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return effective Γ [-]
     * @throws IllegalArgumentException if ω is not positive and finite
     */
    public Complex acrossHydrodynamicFunction(double omega) {
        return combined(omega, quasiSteady.across());
    }

    /**
     * Resistance to fluctuation along the stream.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return R [N·s/m²], per length
     * @throws IllegalArgumentException if ω is not positive and finite
     */
    public double resistance(double omega) {
        return -hydrodynamicFunction(omega).getImaginary() * displacedMassRate(omega);
    }

    /**
     * Share w of the steady drag.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return w, 0 to 1 [-]
     */
    public double weight(double omega) {
        double x = excursionRatio(omega);
        if (x <= Regime.MIXED.low()) {
            return 0.0;
        }
        if (x >= Regime.MIXED.high()) {
            return 1.0;
        }
        double t = FastMath.log(x / Regime.MIXED.low()) / FastMath.log(Regime.MIXED.high() / Regime.MIXED.low());
        return t * t * (3.0 - 2.0 * t);
    }

    /**
     * Where the strip stands at a frequency.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return its numbers and the law that governs
     */
    public Regime regime(double omega) {
        double radius = cylinder.radius();
        double reynolds = point.carrying() * 2.0 * radius / cylinder.medium().kinematicViscosity();
        double x = excursionRatio(omega);
        Regime.Kind kind;
        if (!DragCoefficient.REYNOLDS.contains(reynolds) || cylinder.knudsen() > SLIP_END) {
            kind = Regime.Kind.OUT_OF_RANGE;
        } else if (Regime.MIXED.contains(x)) {
            kind = Regime.Kind.MIXED;
        } else {
            kind = x < Regime.MIXED.low() ? Regime.Kind.LINEAR : Regime.Kind.QUASI_STEADY;
        }
        double kc = FastMath.PI * point.amplitude() / (omega * radius);
        return new Regime(reynolds, cylinder.womersley(omega), kc, x, kind);
    }

    /**
     * What must stand beside the force at a frequency.
     *
     * @param omega angular frequency ω &gt; 0 [rad/s]
     * @return the caveats, none in the linear regime of an attached flow
     */
    public List<Caveat> caveats(double omega) {
        Regime regime = regime(omega);
        List<Caveat> caveats = new ArrayList<>();
        switch (regime.kind()) {
            case OUT_OF_RANGE ->
                caveats.add(new Caveat(
                        Caveat.Subject.FLOW,
                        Caveat.Weight.OUT_OF_RANGE,
                        Figures.say(
                                "Re %.3g, mean free path over radius %.3g: drag ends at Re 100000, slip at 0.1.",
                                regime.reynolds(), cylinder.knudsen())));
            case MIXED ->
                caveats.add(weak(
                        "The flow carries the medium %.2g of radius or boundary layer; between 0.3 and 3 the force is"
                                + " interpolated between two laws.",
                        regime.excursionRatio()));
            case QUASI_STEADY ->
                caveats.add(weak(
                        "The flow carries the medium %.2g of radius or boundary layer; the force is that of steady drag at"
                                + " one operating point.",
                        regime.excursionRatio()));
            case LINEAR -> {}
        }
        if (regime.unstable() && weight(omega) < 1.0) {
            caveats.add(weak(
                    "Keulegan-Carpenter number %.2g, above which vortices leave the hair: the drag is higher than given.",
                    regime.keuleganCarpenter()));
        }
        return List.copyOf(caveats);
    }

    private static Caveat weak(String text, double figure) {
        return new Caveat(Caveat.Subject.FLOW, Caveat.Weight.WEAK, Figures.say(text, figure));
    }

    private Complex combined(double omega, double quasiSteadyResistance) {
        Complex gamma = cylinder.hydrodynamicFunction(omega);
        double weight = weight(omega);
        double linear = -gamma.getImaginary();
        double steady = FastMath.max(linear, quasiSteadyResistance / displacedMassRate(omega));
        return new Complex((1.0 - weight) * gamma.getReal() + weight, -(linear + weight * (steady - linear)));
    }

    private double excursionRatio(double omega) {
        double layer = cylinder.medium().stokesLayer(omega);
        return point.carrying() / (omega * FastMath.max(cylinder.radius(), layer));
    }

    /** ωρπa² [N·s/m²]. */
    private double displacedMassRate(double omega) {
        double radius = cylinder.radius();
        return omega * cylinder.medium().density() * FastMath.PI * radius * radius;
    }
}
