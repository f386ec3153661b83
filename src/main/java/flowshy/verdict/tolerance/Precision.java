package flowshy.verdict.tolerance;

import flowshy.verdict.tolerance.sampling.Interval;
import flowshy.verdict.tolerance.sampling.Output;
import flowshy.verdict.tolerance.sampling.Sample;
import java.util.OptionalDouble;

/**
 * When a run may end: half widths of intervals of 95 % confidence. A run that looks again and again stops a little too early now and then, so
 * the intervals hold somewhat less often than stated.
 *
 * @param level of every percentile of the rejection [dB], absent if it may be any
 * @param share of every probability [-], absent if it may be any
 */
public record Precision(OptionalDouble level, OptionalDouble share) {
    /** Runs to its end. */
    public static final Precision ANY = new Precision(OptionalDouble.empty(), OptionalDouble.empty());

    /** Whether a sample is precise enough; never without a stated precision. */
    boolean reached(Sample sample, int levels) {
        if (level.isEmpty() && share.isEmpty()) {
            return false;
        }
        if (share.isPresent()) {
            for (Interval event : sample.events()) {
                if (!(event.half() <= share.getAsDouble())) {
                    return false;
                }
            }
        }
        if (level.isPresent()) {
            for (Output output : sample.outputs().subList(0, levels)) {
                for (double percentile : ToleranceAnswer.PERCENTILES) {
                    if (output.counted() > 0
                            && !(output.quantile(percentile / 100.0).half() <= level.getAsDouble())) {
                        return false;
                    }
                }
            }
        }
        return true;
    }
}
