package flowshy.verdict.design;

import flowshy.hair.LengthModel;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.Sensitivity.Slope;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * Which dimension or property moves the rejection most: what to tighten first.
 *
 * <p>Slopes are central differences in the logarithm of the number, at two steps, taken together after Richardson (1911): with D(h) = D + c
 * h² + O(h⁴), (4 D(h/2) − D(h))/3 is left with O(h⁴); the difference of the two counts as its error. The torques' code is not written for
 * automatic differentiation. Where a whole hair is solved its closed-form estimate takes its place: slopes hardly feel the difference, and
 * a solution on meshes that change with the shape has none.
 *
 * @param knobs what may change
 * @param frequencies at which the rejection is looked at [Hz]
 */
public record SensitivityQuestion(List<Knob> knobs, List<Double> frequencies) {
    /** Step of ln of the number: two per cent leaves an error below 1e-6 of the slope where laws are smooth. */
    private static final double STEP = 0.02;

    /** A slope below this is nothing that could be tightened [dB per cent or kelvin]. */
    private static final double NOTHING = 1e-7;

    /** Copies the lists. */
    public SensitivityQuestion {
        knobs = List.copyOf(knobs);
        frequencies = List.copyOf(frequencies);
    }

    /**
     * The slopes.
     *
     * @return those that move the rejection at all, the strongest first; a number that no device has a little beside it is left out
     */
    public List<Sensitivity> answer() {
        List<Sensitivity> found = new ArrayList<>();
        for (Knob knob : knobs) {
            sensitivity(knob).filter(one -> one.size() > NOTHING).ifPresent(found::add);
        }
        found.sort(Comparator.comparingDouble(Sensitivity::size).reversed());
        return found;
    }

    private Optional<Sensitivity> sensitivity(Knob knob) {
        double unit = knob.degrees() ? 1.0 / knob.value() : FastMath.log(1.01);
        try {
            Response[] around = new Response[4];
            double[] steps = {STEP, -STEP, 0.5 * STEP, -0.5 * STEP};
            for (int i = 0; i < steps.length; i++) {
                around[i] = response(knob.law().apply(knob.value() * FastMath.exp(steps[i])));
            }
            List<Slope> slopes = new ArrayList<>();
            for (double frequency : frequencies) {
                double coarse = (around[0].rejection(frequency) - around[1].rejection(frequency)) / (2.0 * STEP);
                double fine = (around[2].rejection(frequency) - around[3].rejection(frequency)) / STEP;
                double slope = (4.0 * fine - coarse) / 3.0;
                if (!Double.isFinite(slope)) {
                    return Optional.empty(); // no flow enters, or nothing is read
                }
                slopes.add(new Slope(frequency, unit * slope, unit * FastMath.abs(slope - fine)));
            }
            return Optional.of(new Sensitivity(knob.name(), knob.value(), knob.degrees(), slopes));
        } catch (NoDesignException e) {
            return Optional.empty();
        }
    }

    private static Response response(BandsQuestion question) {
        Device device = question.device();
        boolean solved = device.hair().lengthModel() != LengthModel.STRIPS;
        return new Response(solved ? device.with(device.hair().seenAs(LengthModel.ESTIMATE)) : device);
    }
}
