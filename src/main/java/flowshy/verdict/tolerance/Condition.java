package flowshy.verdict.tolerance;

import flowshy.verdict.Acceptance;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Sense;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * One limit that every device is held to.
 *
 * @param name key under {@code accept}
 * @param figure the quantity
 * @param sense at least or at most
 * @param value the limit, SI
 * @param asked false for the margin that is taken
 */
record Condition(String name, Figure figure, Sense sense, double value, boolean asked) {
    /** These need the surroundings, each time for as long as a thousand rejections. */
    private static final Set<Figure> COSTLY = EnumSet.of(
            Figure.ERROR,
            Figure.OFFSET,
            Figure.SMALLEST_READABLE,
            Figure.DYNAMIC_RANGE,
            Figure.STATIC_TILT,
            Figure.STREAM_TILT);

    static List<Condition> of(BandsQuestion question) {
        Acceptance acceptance = question.acceptance();
        List<Condition> all = new ArrayList<>();
        all.add(new Condition(
                "rejection",
                Figure.LEAST_REJECTION,
                Sense.AT_LEAST,
                acceptance.margin(),
                acceptance.rejection().isPresent()));
        OptionalDouble error = acceptance.error().isEmpty() ? question.motion().smallest() : acceptance.error();
        if (!question.sources().isEmpty() && error.isPresent()) {
            all.add(new Condition("error", Figure.ERROR, Sense.AT_MOST, error.getAsDouble(), true));
        }
        for (FigureLimit limit : acceptance.others()) {
            all.add(new Condition(limit.figure().word(), limit.figure(), limit.sense(), limit.value(), true));
        }
        return all;
    }

    static boolean costly(Figure figure, BandsQuestion question) {
        return !question.sources().isEmpty() && COSTLY.contains(figure);
    }

    boolean costly(BandsQuestion question) {
        return costly(figure, question);
    }

    /** Whether a value meets it; one without a bound does if the bound would. */
    boolean meets(double value) {
        return sense.keeps(value, this.value);
    }
}
