package flowshy.verdict.measured;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/**
 * The rejection that a measured response to motion and one to flow give together: the readout cancels. Between the frequencies of the motion
 * it is interpolated, straight in the logarithms; beyond them there is none.
 */
final class MeasuredRejection {
    /** Longer names together would fill more than a line. */
    private static final int LONGEST = 60;

    private MeasuredRejection() {}

    /** From the first motion and the first flow that were read alike; empty if there are none, or they share fewer than two frequencies. */
    static Optional<MeasuredResponse> from(List<MeasuredResponse> responses) {
        for (MeasuredResponse motion : responses) {
            for (MeasuredResponse flow : responses) {
                if (motion.of() == Measurand.MOTION && flow.of() == Measurand.FLOW && alike(motion, flow)) {
                    Optional<MeasuredResponse> ratio = ratio(motion, flow);
                    if (ratio.isPresent()) {
                        return ratio;
                    }
                }
            }
        }
        return Optional.empty();
    }

    /** Gains both known, or both the common one. */
    private static boolean alike(MeasuredResponse motion, MeasuredResponse flow) {
        return motion.gain().isPresent() == flow.gain().isPresent()
                && (motion.gain().isPresent()
                        || motion.reading().volts() == flow.reading().volts());
    }

    private static Optional<MeasuredResponse> ratio(MeasuredResponse motion, MeasuredResponse flow) {
        double gains = motion.gain().isPresent()
                ? FastMath.abs(flow.gain().getAsDouble() / motion.gain().getAsDouble())
                : 1.0;
        List<MeasuredPoint> points = new ArrayList<>();
        for (MeasuredPoint point : flow.points()) {
            between(motion, point.frequency())
                    .ifPresent(there -> points.add(new MeasuredPoint(
                            point.frequency(),
                            gains * there.amplitude() / perAcceleration(flow, point),
                            OptionalDouble.empty(),
                            there.uncertainty().isPresent()
                                            && point.uncertainty().isPresent()
                                    ? OptionalDouble.of(FastMath.hypot(
                                            there.uncertainty().getAsDouble(),
                                            point.uncertainty().getAsDouble()))
                                    : OptionalDouble.empty(),
                            OptionalDouble.empty())));
        }
        String name = motion.name() + " over " + flow.name();
        return points.size() < 2
                ? Optional.empty()
                : Optional.of(new MeasuredResponse(
                        name.length() > LONGEST ? "motion over flow" : name,
                        Measurand.REJECTION,
                        Reading.RATIO,
                        OptionalDouble.empty(),
                        points));
    }

    private static double perAcceleration(MeasuredResponse response, MeasuredPoint point) {
        return response.reading().perSpeed()
                ? point.amplitude() / (2.0 * FastMath.PI * point.frequency())
                : point.amplitude();
    }

    /** The motion at a frequency, per acceleration. */
    private static Optional<MeasuredPoint> between(MeasuredResponse motion, double frequency) {
        List<MeasuredPoint> points = motion.points();
        for (int i = 1; i < points.size(); i++) {
            MeasuredPoint low = points.get(i - 1);
            MeasuredPoint high = points.get(i);
            if (frequency >= low.frequency() && frequency <= high.frequency()) {
                double share =
                        FastMath.log(frequency / low.frequency()) / FastMath.log(high.frequency() / low.frequency());
                double amplitude = FastMath.exp((1.0 - share) * FastMath.log(perAcceleration(motion, low))
                        + share * FastMath.log(perAcceleration(motion, high)));
                OptionalDouble uncertainty =
                        low.uncertainty().isPresent() && high.uncertainty().isPresent()
                                ? OptionalDouble.of(FastMath.hypot(
                                        (1.0 - share) * low.uncertainty().getAsDouble(),
                                        share * high.uncertainty().getAsDouble()))
                                : OptionalDouble.empty();
                return Optional.of(new MeasuredPoint(
                        frequency, amplitude, OptionalDouble.empty(), uncertainty, OptionalDouble.empty()));
            }
        }
        return Optional.empty();
    }
}
