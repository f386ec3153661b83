package flowshy.verdict.error;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.cylinder.SteadyDrag;
import flowshy.cylinder.excursion.CombinedResistance;
import flowshy.cylinder.excursion.OperatingPoint;
import flowshy.cylinder.excursion.Regime;
import flowshy.math.Caveat;
import flowshy.response.Device;
import flowshy.stream.Source;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * What the surroundings make of one strip's force law, for a check by hand.
 *
 * @param frequency [Hz]
 * @param meanSpeed of all streams together at the strip [m/s]
 * @param deviation rms of all fluctuation at the strip [m/s]
 * @param steadyForce drag of the mean stream alone [N/m]
 * @param meanForce mean drag with the fluctuation, E[f] [N/m]
 * @param linear resistance of the oscillating law, −ωρπa² Im Γ [N·s/m²]
 * @param quasiSteady resistance of the steady law about the operating point, along [N·s/m²]
 * @param combined resistance in use [N·s/m²]
 * @param weight share of the steady law in it [-]
 * @param regime Re, Wo, KC, β, X and which law governs
 * @param caveats with the uncertainty of the law in use
 */
public record StripPoint(
        double frequency,
        double meanSpeed,
        double deviation,
        double steadyForce,
        double meanForce,
        double linear,
        double quasiSteady,
        double combined,
        double weight,
        Regime regime,
        List<Caveat> caveats) {
    /** Copies the list. */
    public StripPoint {
        caveats = List.copyOf(caveats);
    }

    /**
     * The law of a strip under the surroundings of a device.
     *
     * @param device with its cover
     * @param sources one or more
     * @param height of the strip above the wall [m]
     * @param frequency [Hz]
     * @return the law there
     */
    public static StripPoint of(Device device, List<Source> sources, double height, double frequency) {
        OperatingPoint point = new FlowLoad(device, sources).pointAt(height);
        OscillatingCylinder strip =
                new OscillatingCylinder(device.hair().profile().radius(height), device.around());
        CombinedResistance law = CombinedResistance.at(strip, point);
        double omega = 2.0 * FastMath.PI * frequency;
        double rate = omega * device.around().density() * FastMath.PI * strip.radius() * strip.radius();
        return new StripPoint(
                frequency,
                point.mean(),
                point.deviation(),
                new SteadyDrag(strip.radius(), device.around()).force(point.mean()),
                law.quasiSteady().offset(),
                -rate * strip.hydrodynamicFunction(omega).getImaginary(),
                law.quasiSteady().along(),
                law.resistance(omega),
                law.weight(omega),
                law.regime(omega),
                law.caveats(omega));
    }
}
