package flowshy.verdict.design;

import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.Sensitivities.Place;
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
 * automatic differentiation.
 *
 * <p>Where the whole hair is solved and its shape changes, so do the meshes, by whole rings: a small step would count their jumps. The
 * slope of the estimate in closed form is smooth; to it comes the difference of what solution and estimate do over a wide step, which is
 * small and almost straight. Half of what its two sides differ by, jumps included, joins the error.
 *
 * @param here the device as it stands; the model of its hair's length is that of the differences
 * @param knobs what may change of it
 * @param places frequencies at which the rejection is looked at
 */
public record SensitivityQuestion(Device here, List<Knob> knobs, List<Place> places) {
    /** Step of ln of the number: two per cent leaves an error below 1e-6 of the slope where laws are smooth. */
    private static final double STEP = 0.02;

    /** Step across meshes: their jumps of some 1e-4 of the torque are then below 1e-3 of the largest slope. */
    private static final double WIDE = 0.1;

    /** A slope below this is nothing that could be tightened [dB per cent or kelvin]. */
    private static final double NOTHING = 1e-7;

    /** Copies the lists. */
    public SensitivityQuestion {
        knobs = List.copyOf(knobs);
        places = List.copyOf(places);
    }

    /**
     * The slopes.
     *
     * @return those that move the rejection at all, the strongest first; a number that no device has a little beside it is left out
     */
    public Sensitivities answer() {
        LengthModel model = here.hair().lengthModel();
        boolean solved = model == LengthModel.AUTO || model == LengthModel.FINITE;
        List<Double> beyondHere = solved ? beyondEstimate(here) : List.of();
        List<Optional<Sensitivity>> all = knobs.parallelStream()
                .map(knob -> sensitivity(knob, solved, beyondHere))
                .toList();
        List<Sensitivity> found = new ArrayList<>();
        all.forEach(one -> one.filter(any -> any.size() > NOTHING).ifPresent(found::add));
        found.sort(Comparator.comparingDouble(Sensitivity::size).reversed());
        return new Sensitivities(model, places, found);
    }

    private Optional<Sensitivity> sensitivity(Knob knob, boolean solved, List<Double> beyondHere) {
        double unit = knob.degrees() ? 1.0 / knob.value() : FastMath.log(1.01);
        try {
            List<Slope> slopes = new ArrayList<>();
            for (Difference difference : differences(knob, solved, beyondHere)) {
                if (!Double.isFinite(difference.slope())) {
                    return Optional.empty(); // no flow enters, or nothing is read
                }
                double frequency = places.get(slopes.size()).frequency();
                slopes.add(new Slope(frequency, unit * difference.slope(), unit * difference.error()));
            }
            return Optional.of(new Sensitivity(knob.name(), knob.value(), knob.degrees(), slopes));
        } catch (NoDesignException e) {
            return Optional.empty();
        }
    }

    private List<Difference> differences(Knob knob, boolean solved, List<Double> beyondHere) {
        if (!solved || sameBody(device(knob, STEP), device(knob, -STEP))) {
            return smooth(knob, here.hair().lengthModel());
        }
        List<Difference> sums = new ArrayList<>();
        List<Difference> estimate = smooth(knob, LengthModel.ESTIMATE);
        List<Difference> beyond = beyondEstimate(knob, beyondHere);
        for (int i = 0; i < places.size(); i++) {
            sums.add(estimate.get(i).plus(beyond.get(i)));
        }
        return sums;
    }

    /** Of a rejection without jumps. */
    private List<Difference> smooth(Knob knob, LengthModel as) {
        List<Double> above = rejections(seen(device(knob, STEP), as));
        List<Double> below = rejections(seen(device(knob, -STEP), as));
        List<Double> nearAbove = rejections(seen(device(knob, 0.5 * STEP), as));
        List<Double> nearBelow = rejections(seen(device(knob, -0.5 * STEP), as));
        List<Difference> found = new ArrayList<>();
        for (int i = 0; i < places.size(); i++) {
            double coarse = (above.get(i) - below.get(i)) / (2.0 * STEP);
            double fine = (nearAbove.get(i) - nearBelow.get(i)) / STEP;
            double slope = (4.0 * fine - coarse) / 3.0;
            found.add(new Difference(slope, FastMath.abs(slope - fine)));
        }
        return found;
    }

    /** Of solution over estimate, across the wide step, unless there is no device so far away. */
    private List<Difference> beyondEstimate(Knob knob, List<Double> beyondHere) {
        try {
            return beyondEstimate(knob, WIDE, beyondHere);
        } catch (NoDesignException e) {
            return beyondEstimate(knob, STEP, beyondHere);
        }
    }

    private List<Difference> beyondEstimate(Knob knob, double step, List<Double> beyondHere) {
        List<Double> above = beyondEstimate(device(knob, step));
        List<Double> below = beyondEstimate(device(knob, -step));
        List<Difference> found = new ArrayList<>();
        for (int i = 0; i < places.size(); i++) {
            double up = (above.get(i) - beyondHere.get(i)) / step;
            double down = (beyondHere.get(i) - below.get(i)) / step;
            found.add(new Difference(0.5 * (up + down), 0.5 * FastMath.abs(up - down)));
        }
        return found;
    }

    private List<Double> beyondEstimate(Device device) {
        List<Double> whole = rejections(seen(device, here.hair().lengthModel()).alone());
        List<Double> estimate = rejections(seen(device, LengthModel.ESTIMATE));
        List<Double> beyond = new ArrayList<>();
        for (int i = 0; i < places.size(); i++) {
            beyond.add(whole.get(i) - estimate.get(i));
        }
        return beyond;
    }

    private static Response seen(Device device, LengthModel as) {
        return new Response(device.with(device.hair().seenAs(as)));
    }

    private List<Double> rejections(Response response) {
        return places.stream()
                .map(place -> response.rejection(place.frequency()))
                .toList();
    }

    private static Device device(Knob knob, double step) {
        BandsQuestion question = knob.law().apply(knob.value() * FastMath.exp(step));
        return question.device();
    }

    /** Whether the solution of one serves the other. */
    private static boolean sameBody(Device one, Device other) {
        Hair hair = one.hair();
        return hair.profile().equals(other.hair().profile())
                && hair.footGap().equals(other.hair().footGap())
                && one.pivotDepth() == other.pivotDepth();
    }

    /** Slope by the logarithm of a number, and its error. */
    private record Difference(double slope, double error) {
        Difference plus(Difference other) {
            return new Difference(slope + other.slope, error + other.error);
        }
    }
}
