package flowshy.verdict.lid;

import static flowshy.math.Figures.say;

import flowshy.hair.Hair;
import flowshy.response.Device;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;

/** What would let a device keep its margin: a thicker hair, a denser hair, a narrower band; each computed. */
final class Remedies {
    /** A hair more than this many times as thick or dense is another design. */
    private static final double REACH = 8.0;

    private static final double ACCURACY = 1e-4;

    private final Device device;
    private final Band band;
    private final Acceptance acceptance;

    Remedies(Device device, Band band, Acceptance acceptance) {
        this.device = device;
        this.band = band;
        this.acceptance = acceptance;
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
                                "all diameters times %.3g (largest %.4g um) keep the margin",
                                thicker.getAsDouble(),
                                2e6 * thicker.getAsDouble() * hair.profile().largestRadius())
                        : "no thicker hair of this shape and length keeps the margin");
        OptionalDouble denser =
                factor(by -> device.with(new Hair(hair.profile(), by * hair.density(), hair.youngsModulus())), REACH);
        remedies.add(
                denser.isPresent()
                        ? say(
                                "a hair %.3g times as dense (%.4g kg/m3) keeps the margin",
                                denser.getAsDouble(), denser.getAsDouble() * hair.density())
                        : "no hair up to eight times as dense keeps the margin");
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

    /** Margin less the least rejection [dB]. */
    private double shortfall(Device changed) {
        BandsAnswer answer = new BandsQuestion(changed, band, acceptance).answer(List.of(band.from()));
        return acceptance.margin()
                - answer.least().map(BandsAnswer.Extreme::rejection).orElse(Double.POSITIVE_INFINITY);
    }

    private String narrower() {
        BandsAnswer answer = new BandsQuestion(device, band, acceptance).answer(List.of(band.from()));
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
