package flowshy.verdict.lid;

import static flowshy.math.Figures.say;

import flowshy.hair.Hair;
import flowshy.response.Device;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Limit;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.util.FastMath;

/** What would let a device keep its margin: a thicker hair, a denser hair, a narrower band; each computed. */
final class Remedies {
    /** A hair more than this many times as thick or dense is another design. */
    private static final double REACH = 8.0;

    private static final double ACCURACY = 1e-4;

    private final BandsQuestion question;
    private final Device device;

    Remedies(BandsQuestion question) {
        this.question = question;
        this.device = question.device();
    }

    List<String> list() {
        List<String> remedies = new ArrayList<>();
        Hair hair = device.hair();
        double thickest = 0.5 * hair.profile().length() / hair.profile().largestRadius();
        OptionalDouble thicker = factor(
                by -> device.with(hair.reshaped(hair.profile().thickened(by))), Math.min(REACH, 0.999 * thickest));
        remedies.add(
                thicker.isPresent()
                        ? say(
                                "all diameters times %.3g (largest %.4g um) keep every limit",
                                thicker.getAsDouble(),
                                2e6 * thicker.getAsDouble() * hair.profile().largestRadius())
                        : "no thicker hair of this shape and length keeps every limit");
        OptionalDouble denser = factor(by -> device.with(hair.ofDensity(by * hair.density())), REACH);
        remedies.add(
                denser.isPresent()
                        ? say(
                                "a hair %.3g times as dense (%.4g kg/m3) keeps every limit",
                                denser.getAsDouble(), denser.getAsDouble() * hair.density())
                        : "no hair up to eight times as dense keeps every limit");
        remedies.add(narrower());
        return remedies;
    }

    private OptionalDouble factor(DoubleFunction<Device> changed, double most) {
        if (!(most > 1.0) || !(shortfall(changed.apply(most)) <= 0.0)) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(new BracketingNthOrderBrentSolver(ACCURACY, 5)
                .solve(60, by -> shortfall(changed.apply(by)), 1.0, most));
    }

    /** Largest miss of the limits [dB]: margin less the least rejection, error over its limit. */
    private double shortfall(Device changed) {
        BandsAnswer answer =
                question.about(changed).answer(List.of(question.band().from()));
        double most = Double.NEGATIVE_INFINITY;
        for (Limit limit : answer.verdict().limits()) {
            if (limit.found().isPresent()) {
                double found = limit.found().getAsDouble();
                double miss = limit.name().equals("rejection")
                        ? limit.required() - found
                        : 20.0 * FastMath.log10(found / limit.required());
                most = FastMath.max(most, miss);
            }
        }
        return most;
    }

    private String narrower() {
        BandsAnswer answer = question.answer(List.of(question.band().from()));
        ReadingBand widest = null;
        for (ReadingBand part : answer.bands()) {
            boolean wider = widest == null || part.to() / part.from() > widest.to() / widest.from();
            widest = part.reads() == Reads.MOTION && wider ? part : widest;
        }
        return widest == null
                ? "no part of the band keeps the margin"
                : say("a band from %.4g Hz to %.4g Hz keeps the margin", widest.from(), widest.to());
    }
}
