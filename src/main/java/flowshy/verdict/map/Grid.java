package flowshy.verdict.map;

import flowshy.math.Figures;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;

/**
 * A number on a grid.
 *
 * @param across the side that runs along a line
 * @param down the side that runs from line to line
 * @param spots one a place, line after line
 */
public record Grid(Axis across, Axis down, List<Spot> spots) {
    /** @throws IllegalArgumentException if there is not one spot a place */
    public Grid {
        spots = List.copyOf(spots);
        if (spots.size() != across.count() * down.count()) {
            throw new IllegalArgumentException(
                    spots.size() + " spots on a grid of " + across.count() + " by " + down.count());
        }
    }

    /**
     * What is found at a place.
     *
     * @param i index across
     * @param j index down
     * @return the spot
     */
    public Spot at(int i, int j) {
        return spots.get(j * across.count() + i);
    }

    /**
     * The same with its sides exchanged.
     *
     * @return lines become columns
     */
    public Grid turned() {
        List<Spot> turned = new ArrayList<>(spots.size());
        for (int i = 0; i < across.count(); i++) {
            for (int j = 0; j < down.count(); j++) {
                turned.add(at(i, j));
            }
        }
        return new Grid(/* across= */ down, /* down= */ across, turned);
    }

    /**
     * The place of the least number, the first one if there are several.
     *
     * @return index into the spots, empty if no place has a number
     */
    public OptionalInt least() {
        int best = -1;
        for (int k = 0; k < spots.size(); k++) {
            if (spots.get(k).there()
                    && (best < 0 || spots.get(k).value() < spots.get(best).value())) {
                best = k;
            }
        }
        return best < 0 ? OptionalInt.empty() : OptionalInt.of(best);
    }

    /**
     * The place of the largest number, the first one if there are several.
     *
     * @return index into the spots, empty if no place has a number
     */
    public OptionalInt largest() {
        int best = -1;
        for (int k = 0; k < spots.size(); k++) {
            if (spots.get(k).there()
                    && (best < 0 || spots.get(k).value() > spots.get(best).value())) {
                best = k;
            }
        }
        return best < 0 ? OptionalInt.empty() : OptionalInt.of(best);
    }

    /**
     * How many places have a number that reaches a level.
     *
     * @param level least number that counts; minus infinity for any
     * @return count
     */
    public int reaching(double level) {
        int count = 0;
        for (Spot spot : spots) {
            if (spot.value() >= level) { // never so without a number
                count++;
            }
        }
        return count;
    }

    /**
     * Why places have no number, or one that counts little. What differs in its figures alone is one reason.
     *
     * @param first as said at the first place that has it
     * @param places how many have it
     * @param alike whether it is said in the same figures at all of them
     * @param numbered whether they have a number all the same, one that counts little
     */
    public record Reason(String first, int places, boolean alike, boolean numbered) {}

    private record Spoken(String words, boolean numbered) {}

    /**
     * Why places have no number, or one that counts little.
     *
     * @return the most frequent first, of equals that met first, line after line
     */
    public List<Reason> reasons() {
        Map<Spoken, Integer> said = new LinkedHashMap<>();
        for (Spot spot : spots) {
            if (!spot.reason().isEmpty()) {
                said.merge(new Spoken(spot.reason(), spot.there()), 1, Integer::sum);
            }
        }
        Map<Spoken, Reason> sorts = new LinkedHashMap<>();
        said.forEach((spoken, places) -> sorts.merge(
                new Spoken(Figures.blanked(spoken.words()), spoken.numbered()),
                new Reason(spoken.words(), places, true, spoken.numbered()),
                (one, other) -> new Reason(one.first(), one.places() + other.places(), false, one.numbered())));
        return sorts.values().stream()
                .sorted(Comparator.comparingInt((Reason reason) -> -reason.places()))
                .toList();
    }
}
