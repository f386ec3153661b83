package flowshy.study;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A sizing as it is asked for.
 *
 * @param vary paths of the numbers that may be chosen
 * @param within ranges, {@code KEY=A..B}, of some or all of them
 * @param maximize whether the figure is made largest; least, if not
 * @param figure name of the figure
 * @param at frequency at which figures that belong to one are asked for [Hz], absent: the study's own
 * @param seed of the search
 */
public record SizeWords(
        List<String> vary, List<String> within, boolean maximize, String figure, OptionalDouble at, long seed) {
    /** Copies the lists. */
    public SizeWords {
        vary = List.copyOf(vary);
        within = List.copyOf(within);
    }
}
