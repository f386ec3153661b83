package flowshy.verdict.lid;

import static flowshy.math.Figures.say;

import flowshy.hair.Hair;
import flowshy.math.Figures;
import flowshy.response.Device;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import org.hipparchus.util.FastMath;

/** What would let a device meet its limits: a thicker hair, a denser hair, a narrower band; each computed. */
final class Remedies {
    /** A hair more than this many times as thick or dense is another design. */
    private static final double REACH = 8.0;

    /** Density of the densest metals [kg/m³], from memory. */
    private static final double DENSEST = 22500.0;

    /** Factors tried before the least one that does is narrowed down: not every limit comes nearer steadily. */
    private static final int STEPS = 8;

    private final BandsQuestion question;
    private final Device device;

    Remedies(BandsQuestion question) {
        this.question = question;
        this.device = question.device();
    }

    List<String> list() {
        if (answer(device).bands().get(0).reads() == Reads.NOTHING) {
            double twice = 2.0 * device.around().density();
            return List.of(say(
                    "a hair of another density than its fill: one of %.4g kg/m3 keeps half of its inertial torque",
                    twice));
        }
        List<String> remedies = new ArrayList<>();
        Hair hair = device.hair();
        OptionalDouble thicker = factor(this::thicker, device.room());
        remedies.add(
                thicker.isPresent()
                        ? say(
                                "all diameters times %.3g (largest %.4g um) keep every limit",
                                thicker.getAsDouble(),
                                2e6 * thicker.getAsDouble() * hair.profile().largestRadius())
                        : "no thicker hair of this shape and length keeps every limit");
        OptionalDouble denser = factor(this::denser, DENSEST / hair.density());
        remedies.add(
                denser.isPresent()
                        ? say(
                                "a hair %.3g times as dense (%.4g kg/m3) keeps every limit",
                                denser.getAsDouble(), denser.getAsDouble() * hair.density())
                        : say(
                                "no hair up to %.4g kg/m3 keeps every limit",
                                FastMath.min(DENSEST, REACH * hair.density())));
        remedies.add(narrower());
        return remedies;
    }

    private Device thicker(double by) {
        return device.with(device.hair().reshaped(device.hair().profile().thickened(by)));
    }

    private Device denser(double by) {
        return device.with(device.hair().ofDensity(by * device.hair().density()));
    }

    /** Least factor above one that does, in the hundredths that are printed: no question is asked more finely than it is answered. */
    private OptionalDouble factor(DoubleFunction<Device> changed, double room) {
        double most = FastMath.min(REACH, room * (1.0 - 1e-9)); // rounding must not take it over the edge
        int fails = 100;
        for (int i = 1; i <= STEPS && most > 1.0; i++) {
            int tried = (int) FastMath.floor(100.0 * FastMath.pow(most, (double) i / STEPS));
            if (tried > fails && meets(changed.apply(tried / 100.0))) {
                return OptionalDouble.of(least(changed, fails, tried) / 100.0);
            }
            fails = FastMath.max(fails, tried);
        }
        return OptionalDouble.empty();
    }

    private int least(DoubleFunction<Device> changed, int fails, int does) {
        int low = fails;
        int high = does;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (meets(changed.apply(middle / 100.0))) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    private static double down(double value, int digits) {
        return rounded(value, new MathContext(digits, RoundingMode.DOWN));
    }

    private static double up(double value, int digits) {
        return rounded(value, new MathContext(digits, RoundingMode.UP));
    }

    /** First as programs read it, so that 0.1 is not taken for a little more. */
    private static double rounded(double value, MathContext to) {
        return new BigDecimal(value)
                .round(new MathContext(Figures.FULL))
                .round(to)
                .doubleValue();
    }

    private boolean meets(Device changed) {
        return answer(changed).verdict().decision() == Decision.MEETS;
    }

    private BandsAnswer answer(Device changed) {
        return question.about(changed).answer(List.of(question.band().from()));
    }

    private String narrower() {
        ReadingBand widest = null;
        for (ReadingBand part : answer(device).bands()) {
            boolean wider = widest == null || part.to() / part.from() > widest.to() / widest.from();
            widest = part.reads() == Reads.MOTION && wider ? part : widest;
        }
        return widest == null
                ? "no part of the band keeps the margin"
                : say("a band from %.4g Hz to %.4g Hz keeps the margin", up(widest.from(), 4), down(widest.to(), 4));
    }
}
