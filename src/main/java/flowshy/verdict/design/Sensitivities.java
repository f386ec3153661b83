package flowshy.verdict.design;

import flowshy.hair.LengthModel;
import java.util.List;

/**
 * What every dimension and property does to the rejection, the strongest first.
 *
 * @param model of the hair's length by which the differences are made
 * @param places frequencies looked at, rising; none where nothing was asked
 * @param numbers those that move the rejection at all, by falling size; their slopes stand in the order of the places
 */
public record Sensitivities(LengthModel model, List<Place> places, List<Sensitivity> numbers) {
    /** Nothing was asked. */
    public static final Sensitivities NONE = new Sensitivities(LengthModel.STRIPS, List.of(), List.of());

    /** Copies the lists. */
    public Sensitivities {
        places = List.copyOf(places);
        numbers = List.copyOf(numbers);
    }

    /**
     * A frequency looked at.
     *
     * @param frequency [Hz]
     * @param words where in the band that is, e.g. {@code middle of the band}
     */
    public record Place(double frequency, String words) {}

    /**
     * The largest error of any slope.
     *
     * @return [dB per cent or kelvin]; zero if there is no slope
     */
    public double error() {
        return numbers.stream()
                .flatMap(one -> one.slopes().stream())
                .mapToDouble(Sensitivity.Slope::error)
                .max()
                .orElse(0.0);
    }
}
