package flowshy.verdict.tolerance;

import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.math.Figures;
import flowshy.response.Device;
import flowshy.torque.finite.FiniteFactors;
import flowshy.torque.finite.LengthFactors;
import flowshy.torque.finite.RepairedStrips;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * The torque of flow in a run: strip theory at every point, times the factor for finite length of the nominal device, which is held; and how
 * uncertain that torque is.
 *
 * <p>Uncertainty, a standard deviation of the torque's logarithm, own estimates: of strip theory as much as the repair for finite length changes
 * it at that frequency; of a correction for finite length its own error, {@value #SOLVED} at least, for blunt posts {@value #SOLVED_BLUNT} (the
 * solution's distance from an independent finite-element one). The factor's own change with the tolerances is not in it.
 */
final class FlowModel {
    private static final double SOLVED = 0.005;
    private static final double SOLVED_BLUNT = 0.02;
    /** Length over diameter below which a hair counts as a blunt post. */
    private static final double BLUNT = 3.5;

    private final Complex[] factors;
    private final double[] uncertainty;
    private final LengthModel model;
    private final String source;

    private FlowModel(Complex[] factors, double[] uncertainty, LengthModel model, String source) {
        this.factors = factors;
        this.uncertainty = uncertainty;
        this.model = model;
        this.source = source;
    }

    static FlowModel of(Device nominal, List<Double> frequencies) {
        Hair hair = nominal.hair();
        Optional<LengthFactors> known = LengthFactors.of(hair, nominal.around(), nominal.pivotDepth());
        LengthFactors repaired = new RepairedStrips(hair.profile(), nominal.around(), nominal.pivotDepth());
        double least = hair.profile().length() < BLUNT * 2.0 * hair.profile().largestRadius() ? SOLVED_BLUNT : SOLVED;
        double[] omegas =
                frequencies.stream().mapToDouble(f -> 2.0 * FastMath.PI * f).toArray();
        if (omegas.length > 0) {
            known.ifPresent(factors -> factors.expect(omegas[0], omegas[omegas.length - 1]));
        }
        Complex[] factors = new Complex[omegas.length];
        double[] uncertainty = new double[omegas.length];
        for (int i = 0; i < omegas.length; i++) {
            FiniteFactors at = known.orElse(repaired).at(omegas[i]);
            double change = at.stream().subtract(1.0).norm();
            factors[i] = known.isPresent() ? at.stream() : Complex.ONE;
            uncertainty[i] = known.isEmpty() || !Double.isFinite(at.streamError())
                    ? change
                    : FastMath.max(least, at.streamError());
        }
        String source = known.isEmpty()
                ? "strip theory leaves out the finite length: as much as the repair for it changes the torque, own estimate"
                : "error of the correction for finite length, own estimate";
        return new FlowModel(factors, uncertainty, hair.lengthModel(), source);
    }

    /** The same with one uncertainty for all frequencies, as a study states it. */
    FlowModel stated(double relative) {
        double[] stated = new double[uncertainty.length];
        Arrays.fill(stated, relative);
        return new FlowModel(factors, stated, model, "the study");
    }

    /** Factor of the flow's torque at a frequency of the list. */
    Complex factor(int index) {
        return factors[index];
    }

    /** Relative standard uncertainty there. */
    double uncertainty(int index) {
        return uncertainty[index];
    }

    String source() {
        return source;
    }

    /** Smallest and largest over the frequencies, as words. */
    String size() {
        double least = 100.0 * Arrays.stream(uncertainty).min().orElse(0.0);
        double most = 100.0 * Arrays.stream(uncertainty).max().orElse(0.0);
        String low = Figures.of(least, 2);
        String high = Figures.of(most, 2);
        return low.equals(high) ? high + " %" : low + " % to " + high + " %";
    }

    /** What the torques rest on. */
    String words() {
        return model == LengthModel.STRIPS
                ? "strip theory (finite-length: off)"
                : "strip theory times the factor for finite length of the nominal device, held (finite-length: "
                        + model.word() + ", " + model.words() + ")";
    }
}
