package flowshy.study;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A map as it is asked for.
 *
 * @param across side that runs across, {@code KEY=A..B}
 * @param down side that runs down, {@code KEY=A..B}
 * @param figure name of the figure, empty: rejection at a frequency if there is one, else the least over the band
 * @param at frequency at which the figure is asked for [Hz], absent: the study's own
 * @param steps how many values across and down
 * @param log which sides are spaced evenly in the logarithm, across and down
 */
public record MapWords(
        String across,
        String down,
        Optional<String> figure,
        OptionalDouble at,
        List<Integer> steps,
        List<Boolean> log) {
    /** Copies the lists. */
    public MapWords {
        steps = List.copyOf(steps);
        log = List.copyOf(log);
    }
}
