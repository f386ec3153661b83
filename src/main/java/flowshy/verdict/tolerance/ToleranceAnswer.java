package flowshy.verdict.tolerance;

import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Decision;
import flowshy.verdict.figure.FigureUnit;
import flowshy.verdict.tolerance.sampling.Effect;
import flowshy.verdict.tolerance.sampling.Interval;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * How sure a verdict is.
 *
 * @param nominal the answer for the nominal numbers
 * @param inputs every uncertain input, the study's first
 * @param left what is certain here though it need not be, one sentence each
 * @param model what the torques rest on
 * @param effort what was asked
 * @param devices devices tried
 * @param errorDevices devices whose error by the surroundings was worked out, zero if none
 * @param refused devices that cannot be made, and why, for example
 * @param fan rejection at each frequency; empty where no flow reaches the hair
 * @param figures least rejection and every other quantity that is limited, or was asked for
 * @param limits chance of each limit
 * @param yield share of all devices that meet every limit, empty if no limit is stated
 * @param required least yield, absent if none is asked
 * @param decision how it comes out
 * @param sentence the same in words
 */
public record ToleranceAnswer(
        BandsAnswer nominal,
        List<Uncertain> inputs,
        List<String> left,
        String model,
        Effort effort,
        int devices,
        int errorDevices,
        Refused refused,
        List<FanPoint> fan,
        List<Spread> figures,
        List<Chance> limits,
        Optional<Interval> yield,
        OptionalDouble required,
        Decision decision,
        String sentence) {
    /** Percentiles of every quantity [%]: one and two standard deviations of a normal law, and the median. */
    public static final List<Double> PERCENTILES = List.of(2.5, 16.0, 50.0, 84.0, 97.5);

    /** Copies the lists. */
    public ToleranceAnswer {
        inputs = List.copyOf(inputs);
        left = List.copyOf(left);
        fan = List.copyOf(fan);
        figures = List.copyOf(figures);
        limits = List.copyOf(limits);
    }

    /**
     * Devices that cannot be made.
     *
     * @param count how many of those tried
     * @param example one reason, empty if there is none
     */
    public record Refused(long count, String example) {}

    /**
     * Rejection at one frequency.
     *
     * @param frequency [Hz]
     * @param nominal of the nominal device [dB]
     * @param percentiles of {@link #PERCENTILES} [dB], same order
     */
    public record FanPoint(double frequency, double nominal, List<Interval> percentiles) {
        /** Copies the list. */
        public FanPoint {
            percentiles = List.copyOf(percentiles);
        }
    }

    /**
     * One quantity over all devices.
     *
     * @param name its word, e.g. {@code least-rejection}
     * @param words what it is
     * @param unit its unit
     * @param nominal of the nominal device, not a number where it has none
     * @param counted devices that have one
     * @param mean mean value
     * @param deviation standard deviation
     * @param percentiles of {@link #PERCENTILES}, same order
     * @param effects one an input, the largest total index first; empty where they were not worked out
     */
    public record Spread(
            String name,
            String words,
            FigureUnit unit,
            double nominal,
            long counted,
            Interval mean,
            Interval deviation,
            List<Interval> percentiles,
            List<InputEffect> effects) {
        /** Copies the lists. */
        public Spread {
            percentiles = List.copyOf(percentiles);
            effects = List.copyOf(effects);
        }
    }

    /**
     * What one input does to one quantity.
     *
     * @param input name of the input
     * @param effect its Sobol indices
     */
    public record InputEffect(String input, Effect effect) {}

    /**
     * Chance of a limit.
     *
     * @param name key under {@code accept}
     * @param sense at least or at most, in words
     * @param required the limit, SI
     * @param unit of the limit
     * @param asked false for the margin that is taken where no limit is stated
     * @param met share of all devices that meet it
     * @param devices devices tried
     */
    public record Chance(
            String name, String sense, double required, FigureUnit unit, boolean asked, Interval met, int devices) {}
}
