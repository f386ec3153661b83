package flowshy.verdict.lid;

import static flowshy.math.Figures.say;

import flowshy.hair.Hair;
import flowshy.math.Figures;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.hipparchus.util.FastMath;

/** What would let a device meet its limits: a thicker hair, a denser hair, a narrower band; each computed. */
final class Remedies {
    /** A hair more than this many times as thick or dense is another design. */
    private static final double REACH = 8.0;

    /** Density of the densest metals [kg/m³], from memory. */
    private static final double DENSEST = 22500.0;

    /** Factors tried before the least one that does is narrowed down: not every limit comes nearer steadily. */
    private static final int STEPS = 8;

    private final List<BandsQuestion> states;
    private final Hair hair;

    /** What is printed behind every claim that holds in more than one state. */
    private final String scope;

    /**
     * Remedies for a device.
     *
     * @param states the question at the study's own state first, then at every state that the device must bear
     */
    Remedies(List<BandsQuestion> states) {
        this.states = List.copyOf(states);
        this.hair = states.get(0).device().hair();
        this.scope = states.size() == 1 ? "" : " in every state";
    }

    List<String> list() {
        Optional<Device> mute = states.stream()
                .map(BandsQuestion::device)
                .filter(device -> bands(device, states.get(0)).get(0).reads() == Reads.NOTHING)
                .findFirst();
        if (mute.isPresent()) {
            double twice = 2.0 * mute.get().around().density();
            return List.of(say(
                    "a hair of another density than its fill: one of %.4g kg/m3 keeps half of its inertial torque",
                    twice));
        }
        List<String> remedies = new ArrayList<>();
        double room = states.stream()
                .mapToDouble(state -> state.device().room())
                .min()
                .orElseThrow();
        OptionalDouble thicker = factor(Remedies::thicker, room);
        remedies.add(
                thicker.isPresent()
                        ? say(
                                "all diameters times %.3g (largest %.4g um) keep every limit%s",
                                thicker.getAsDouble(),
                                2e6 * thicker.getAsDouble() * hair.profile().largestRadius(),
                                scope)
                        : "no thicker hair of this shape and length keeps every limit" + scope);
        OptionalDouble denser = factor(Remedies::denser, DENSEST / hair.density());
        remedies.add(
                denser.isPresent()
                        ? say(
                                "a hair %.3g times as dense (%.4g kg/m3) keeps every limit%s",
                                denser.getAsDouble(), denser.getAsDouble() * hair.density(), scope)
                        : say(
                                "no hair up to %.4g kg/m3 keeps every limit%s",
                                FastMath.min(DENSEST, REACH * hair.density()), scope));
        remedies.add(narrower());
        return remedies;
    }

    /** A device changed by a factor. */
    private interface Change {
        Device of(Device device, double by);
    }

    private static Device thicker(Device device, double by) {
        return device.with(device.hair().reshaped(device.hair().profile().thickened(by)));
    }

    private static Device denser(Device device, double by) {
        return device.with(device.hair().ofDensity(by * device.hair().density()));
    }

    /**
     * Least factor above one that does in every state. Few states bind: it is sought in those that are known to, and then tried in the
     * others.
     */
    private OptionalDouble factor(Change change, double room) {
        double most = FastMath.min(REACH, room * (1.0 - 1e-9)); // rounding must not take it over the edge
        List<BandsQuestion> binding = new ArrayList<>();
        int least = 100;
        for (Optional<BandsQuestion> next = failing(change, least, binding);
                next.isPresent();
                next = failing(change, least, binding)) {
            binding.add(0, next.get());
            OptionalInt does = sought(change, most, binding);
            if (does.isEmpty()) {
                return OptionalDouble.empty();
            }
            least = does.getAsInt();
        }
        return OptionalDouble.of(least / 100.0);
    }

    private Optional<BandsQuestion> failing(Change change, int hundredths, List<BandsQuestion> known) {
        return states.stream()
                .filter(state -> !known.contains(state) && !meets(change, hundredths, List.of(state)))
                .findFirst();
    }

    /** In the hundredths that are printed: no question is asked more finely than it is answered. */
    private static OptionalInt sought(Change change, double most, List<BandsQuestion> binding) {
        int fails = 100;
        for (int i = 1; i <= STEPS && most > 1.0; i++) {
            int tried = (int) FastMath.floor(100.0 * FastMath.pow(most, (double) i / STEPS));
            if (tried > fails && meets(change, tried, binding)) {
                return OptionalInt.of(least(change, fails, tried, binding));
            }
            fails = FastMath.max(fails, tried);
        }
        return OptionalInt.empty();
    }

    private static int least(Change change, int fails, int does, List<BandsQuestion> binding) {
        int low = fails;
        int high = does;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (meets(change, middle, binding)) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    private static boolean meets(Change change, int hundredths, List<BandsQuestion> binding) {
        return binding.stream().allMatch(state -> {
            Device changed = hundredths == 100 ? state.device() : change.of(state.device(), hundredths / 100.0);
            return state.about(changed).judged().verdict().decision() == Decision.MEETS;
        });
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

    private static List<ReadingBand> bands(Device device, BandsQuestion question) {
        return question.about(device).reading(new Response(device)).bands();
    }

    private String narrower() {
        List<Band> keep = List.of(states.get(0).band());
        for (BandsQuestion state : states) {
            List<Band> both = new ArrayList<>();
            for (ReadingBand part : bands(state.device(), state)) {
                for (Band kept : keep) {
                    double from = FastMath.max(part.from(), kept.from());
                    double to = FastMath.min(part.to(), kept.to());
                    if (part.reads() == Reads.MOTION && from < to) {
                        both.add(new Band(from, to));
                    }
                }
            }
            keep = both;
        }
        return keep.stream()
                .max(Comparator.comparingDouble(band -> band.to() / band.from()))
                .map(band -> say(
                        "a band from %.4g Hz to %.4g Hz keeps the margin%s",
                        up(band.from(), 4), down(band.to(), 4), scope))
                .orElse("no part of the band keeps the margin" + scope);
    }
}
