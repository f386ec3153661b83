package flowshy.verdict.size;

import flowshy.math.Caveat.Subject;
import flowshy.verdict.Acceptance;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.error.StreamTooFastException;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.FigureUnit;
import flowshy.verdict.figure.Found;
import flowshy.verdict.figure.Sense;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import org.hipparchus.util.FastMath;

/**
 * The sizing of a device: a figure made least or largest within the limits of a study.
 *
 * @param space the devices by the numbers that may be chosen
 * @param figure what is made least or largest
 * @param maximize largest; least, if not
 * @param limits what must be kept
 * @param frequency at which what depends on it is evaluated [Hz], absent for the study's frequency of comparison
 */
public record SizeQuestion(
        DesignSpace space, Figure figure, boolean maximize, List<FigureLimit> limits, OptionalDouble frequency) {
    /** Twenty decibels off a limit are as far as a figure that is nothing or twice what is asked. */
    private static final double DECIBELS = 20.0;

    private static final String ENDED = "a model of the rejection has ended there";
    private static final String DRAG_ENDED = "a model of the error has ended there";

    /** Copies the list. */
    public SizeQuestion {
        limits = List.copyOf(limits);
    }

    /**
     * The limits that an acceptance states, as limits on named figures.
     *
     * @param question of the study, for its limits and the smallest motion to be read
     * @return in the order of a verdict
     */
    public static List<FigureLimit> limits(BandsQuestion question) {
        Acceptance acceptance = question.acceptance();
        List<FigureLimit> limits = new ArrayList<>();
        acceptance
                .rejection()
                .ifPresent(least -> limits.add(new FigureLimit(Figure.LEAST_REJECTION, Sense.AT_LEAST, least)));
        OptionalDouble error =
                acceptance.error().isEmpty() && !question.sources().isEmpty()
                        ? question.motion().smallest()
                        : acceptance.error();
        error.ifPresent(most -> limits.add(new FigureLimit(Figure.ERROR, Sense.AT_MOST, most)));
        limits.addAll(acceptance.others());
        return limits;
    }

    /**
     * The same question in another space.
     *
     * @param other of the same numbers
     * @return figure and limits kept
     */
    public SizeQuestion in(DesignSpace other) {
        return new SizeQuestion(other, figure, maximize, limits, frequency);
    }

    /**
     * The problem behind the question.
     *
     * @param variables ranges of the space's numbers, same order
     * @return to be solved
     */
    public SizingProblem problem(List<Variable> variables) {
        List<Constraint> constraints = new ArrayList<>();
        for (FigureLimit limit : limits) {
            double size = FastMath.abs(limit.value());
            boolean level = limit.figure().unit() == FigureUnit.LEVEL;
            constraints.add(new Constraint(
                    limit.figure().word(),
                    limit.sense() == Sense.AT_LEAST,
                    limit.value(),
                    level ? DECIBELS : size > 0.0 ? size : 1.0));
        }
        return new SizingProblem(variables, maximize, constraints, this::trial);
    }

    /**
     * Objective and limited figures of a choice.
     *
     * @param values one a number of the space, in SI
     * @return the figures, or why there is no device
     */
    public Trial trial(List<Double> values) {
        try {
            return trial(space.at(values.stream().mapToDouble(value -> value).toArray()));
        } catch (NoDesignException | StreamTooFastException e) {
            return Trial.none(e.getMessage());
        }
    }

    /**
     * Objective and limited figures of one device.
     *
     * @param question about it
     * @return the figures, or why one is missing
     * @throws StreamTooFastException if its surroundings are beyond the law of drag
     */
    public Trial trial(BandsQuestion question) {
        return trial(
                frequency.isPresent() ? new Evaluated(question, frequency.getAsDouble()) : new Evaluated(question));
    }

    private Trial trial(Evaluated device) {
        Found objective = figure.of(device);
        if (objective.number().isEmpty()) {
            return Trial.none(figure.word() + ": " + objective.reason());
        }
        Set<Subject> subjects = EnumSet.of(figure.subject());
        List<Double> found = new ArrayList<>();
        for (FigureLimit limit : limits) {
            Found limited = limit.figure().of(device);
            if (Double.isNaN(limited.value())) {
                return Trial.none(limit.figure().word() + ": " + limited.reason());
            }
            subjects.add(limit.figure().subject());
            found.add(limited.value());
        }
        if (subjects.contains(Subject.REJECTION) && device.question().rejectionEnds()) {
            return Trial.none(ENDED);
        }
        if (subjects.contains(Subject.ERROR) && device.error().stream().anyMatch(ErrorBudget::ended)) {
            return Trial.none(DRAG_ENDED);
        }
        return Trial.of(objective.value(), found);
    }
}
