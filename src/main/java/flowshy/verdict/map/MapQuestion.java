package flowshy.verdict.map;

import flowshy.math.Caveat;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.error.StreamTooFastException;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A figure over two numbers of a study, one of which may be the frequency.
 *
 * @param space the devices, by those of the two numbers that are not the frequency, the one across first
 * @param figure what is mapped
 * @param frequency at which what depends on it is evaluated [Hz], absent for the study's frequency of comparison; of no effect where a
 *     side of the map is the frequency
 */
public record MapQuestion(DesignSpace space, Figure figure, OptionalDouble frequency) {
    private static final String ENDED = "a model has ended: the number is no more than a trend";

    /**
     * Fills the map.
     *
     * @param across one side
     * @param down the other
     * @param run on how many threads
     * @return figure by place
     * @throws IllegalArgumentException if the sides are not those of the space
     */
    public Grid answer(Axis across, Axis down, GridRun run) {
        List<String> keys = space.keys();
        if (keys.equals(List.of(across.key(), down.key()))) {
            return run.fill(y -> x -> at(frequency, x, y), across, down);
        }
        if (keys.equals(List.of(down.key()))) {
            return run.fill(this::alongFrequency, across, down);
        }
        if (keys.equals(List.of(across.key()))) { // the same line by line, with the sides exchanged
            return run.fill(this::alongFrequency, down, across).turned();
        }
        throw new IllegalArgumentException("a map of " + across.key() + " and " + down.key() + " over " + keys);
    }

    /**
     * The figure at one place.
     *
     * @param hertz frequency at which what depends on it is evaluated [Hz], absent for the study's frequency of comparison
     * @param values one a key of the space, in SI
     * @return the number, or why there is none
     */
    public Spot at(OptionalDouble hertz, double... values) {
        BandsQuestion device;
        try {
            device = space.at(values);
        } catch (NoDesignException e) {
            return Spot.none(e.getMessage());
        }
        return spot(hertz.isPresent() ? new Evaluated(device, hertz.getAsDouble()) : new Evaluated(device));
    }

    private Surface.Line alongFrequency(double value) {
        BandsQuestion device;
        try {
            device = space.at(value);
        } catch (NoDesignException e) {
            Spot none = Spot.none(e.getMessage());
            return hertz -> none;
        }
        return hertz -> spot(new Evaluated(device, hertz));
    }

    /** The figure of one device; a number beyond the end of its model says so. */
    private Spot spot(Evaluated device) {
        Found found;
        try {
            found = figure.of(device);
        } catch (StreamTooFastException e) {
            return Spot.none(e.getMessage());
        }
        if (found.number().isEmpty()) {
            return Spot.none(found.reason());
        }
        return new Spot(found.value(), ended(device) ? ENDED : "");
    }

    private boolean ended(Evaluated device) {
        return switch (figure.subject()) {
            case REJECTION -> device.question().rejectionEnds();
            case ERROR ->
                device.error().stream()
                        .flatMap(budget -> budget.caveats().stream())
                        .anyMatch(caveat -> caveat.weight() == Caveat.Weight.OUT_OF_RANGE);
            default -> false;
        };
    }
}
