package flowshy.verdict.compare;

import static flowshy.math.Figures.say;

import flowshy.hair.LengthModel;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import java.util.OptionalDouble;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.util.FastMath;

/**
 * Scales a device until a quantity has a wanted value: outwards from the number as it stands in steps of five per cent, on both sides, to
 * the first change of sign, then by Brent's method in the logarithm of the number.
 */
final class Equalizer {
    private static final double STEP = 1.05;

    /** Steps to each side, a factor of seventeen thousand. */
    private static final int STEPS = 200;

    private static final double ACCURACY = 1e-14;

    /** Rounding alone: a quantity that changes by less does not depend on the number. */
    private static final double UNTOUCHED = 1e-12;

    /** How well the scaled device must meet the value when it is worked out anew. */
    private static final double MET = 1e-9;

    /** The same where the whole hair is solved: its meshes change with the shape, and what rests on them jumps a little. */
    private static final double MET_ON_MESHES = 1e-4;

    private final Figure figure;
    private final double target;
    private final Scaling scaling;
    private final double frequency;

    /** Smallest and largest value met, for the message. */
    private double least = Double.POSITIVE_INFINITY;

    private double most = Double.NEGATIVE_INFINITY;

    /** Of a quantity that depends on the frequency: at which [Hz]. */
    Equalizer(Figure figure, double target, Scaling scaling, double frequency) {
        this.figure = figure;
        this.target = target;
        this.scaling = scaling;
        this.frequency = frequency;
    }

    /** One side of the search. */
    private final class Side {
        private final double ratio;
        private double value = scaling.start();
        private double mismatch;
        private boolean open = true;

        Side(double ratio, double mismatch) {
            this.ratio = ratio;
            this.mismatch = mismatch;
        }

        /** Goes one step on; the bracket in which the sign changed, if it did. */
        boolean steps(double[] bracket) {
            double next = FastMath.min(scaling.most(), FastMath.max(scaling.least(), value * ratio));
            OptionalDouble there = next == value ? OptionalDouble.empty() : mismatch(next);
            open = there.isPresent();
            if (!open) {
                return false;
            }
            boolean changed = there.getAsDouble() * mismatch <= 0.0;
            bracket[0] = FastMath.min(value, next);
            bracket[1] = FastMath.max(value, next);
            value = next;
            mismatch = there.getAsDouble();
            return changed;
        }
    }

    /** Whether a quantity is the one wanted as it stands. */
    static boolean met(double now, double target) {
        return FastMath.abs(now / target - 1.0) < MET;
    }

    Scaled solve() {
        Found now = found(scaling.at(scaling.start()));
        if (now.number().isEmpty()) {
            throw new NoSolutionException("its " + figure.word() + " is not known: " + now.reason());
        }
        if (!(scaling.start() > 0.0 && now.value() > 0.0 && target > 0.0)) {
            throw new NoSolutionException(
                    scaling.words() + " and " + figure.word() + " must be above zero to be scaled");
        }
        double value = met(now.value(), target) ? scaling.start() : root(now.value());
        BandsQuestion question = scaling.at(value);
        double after = found(question).value();
        LengthModel model = question.device().hair().lengthModel();
        double met = model == LengthModel.AUTO || model == LengthModel.FINITE ? MET_ON_MESHES : MET;
        if (!(FastMath.abs(after / target - 1.0) <= met)) {
            throw new NoSolutionException(
                    say("at %s its %s jumps past the value wanted", scaling.written(value), figure.word()));
        }
        return new Scaled(
                figure, scaling.words(), scaling.change(value), value / scaling.start(), now.value(), after, question);
    }

    private Found found(BandsQuestion question) {
        return figure.of(new Evaluated(question, frequency));
    }

    private double root(double now) {
        double mismatch = noted(now);
        Side up = new Side(STEP, mismatch);
        Side down = new Side(1.0 / STEP, mismatch);
        double[] bracket = new double[2];
        for (int i = 0; i < STEPS && (up.open || down.open); i++) {
            if ((up.open && up.steps(bracket)) || (down.open && down.steps(bracket))) {
                return between(bracket[0], bracket[1]);
            }
        }
        if (up.value > down.value && most - least <= UNTOUCHED * most) {
            throw new NoSolutionException(say(
                    "%s does not change its %s, which is %.4g %s; %.4g is wanted",
                    scaling.words(),
                    figure.word(),
                    figure.unit().show(now),
                    figure.unit().shown(),
                    figure.unit().show(target)));
        }
        throw new NoSolutionException(say(
                "from %s to %s its %s goes from %.4g to %.4g %s; %.4g is wanted",
                scaling.written(down.value),
                scaling.written(up.value),
                figure.word(),
                figure.unit().show(least),
                figure.unit().show(most),
                figure.unit().shown(),
                figure.unit().show(target)));
    }

    private double between(double low, double high) {
        double root = new BracketingNthOrderBrentSolver(ACCURACY, 5)
                .solve(
                        200,
                        x -> mismatch(FastMath.exp(x))
                                .orElseThrow(() -> new NoSolutionException(
                                        "some values between make no device: " + scaling.words())),
                        FastMath.log(low),
                        FastMath.log(high));
        return FastMath.min(high, FastMath.max(low, FastMath.exp(root)));
    }

    /** ln of the quantity over the value wanted; absent where there is no device or no such quantity. */
    private OptionalDouble mismatch(double value) {
        try {
            OptionalDouble found = found(scaling.at(value)).number();
            return found.isPresent() && found.getAsDouble() > 0.0
                    ? OptionalDouble.of(noted(found.getAsDouble()))
                    : OptionalDouble.empty();
        } catch (NoDesignException e) {
            return OptionalDouble.empty();
        }
    }

    private double noted(double found) {
        least = FastMath.min(least, found);
        most = FastMath.max(most, found);
        return FastMath.log(found / target);
    }
}
