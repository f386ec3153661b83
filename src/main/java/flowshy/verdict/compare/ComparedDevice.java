package flowshy.verdict.compare;

import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;

/**
 * A device of a comparison, with all that is known of it.
 *
 * @param contender as it was given
 * @param question about it as it is compared, empty where it has no solution
 * @param answer bands and verdict, likewise
 * @param figures every named quantity, empty likewise
 * @param scaled what was done to make it equal, empty if nothing was asked or nothing could be done
 * @param reason why it has no solution, empty if it has
 */
public record ComparedDevice(
        Contender contender,
        Optional<BandsQuestion> question,
        Optional<BandsAnswer> answer,
        Map<Figure, Found> figures,
        Optional<Scaled> scaled,
        String reason) {
    /** Copies the map. */
    public ComparedDevice {
        Map<Figure, Found> copy = new EnumMap<>(Figure.class);
        copy.putAll(figures);
        figures = Collections.unmodifiableMap(copy);
    }
}
