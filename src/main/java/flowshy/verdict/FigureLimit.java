package flowshy.verdict;

import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Sense;

/**
 * A limit on a named quantity.
 *
 * @param figure the quantity
 * @param sense at least or at most
 * @param value in SI
 */
public record FigureLimit(Figure figure, Sense sense, double value) {
    /** @throws IllegalArgumentException if the limit has no sense or is no number */
    public FigureLimit {
        if (sense == Sense.NONE || !Double.isFinite(value)) {
            throw new IllegalArgumentException(
                    figure.word() + " needs a sense and a finite limit, had " + sense + ", " + value);
        }
    }
}
