package flowshy.study;

import flowshy.study.NumberKeys.KeyRange;
import flowshy.study.keys.Keys;
import flowshy.study.keys.Measure;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.study.units.QuantityException;
import flowshy.study.units.WrittenUnit;

/**
 * A number of a study over a range, for the side of a map: one of its keys, or the frequency at which a figure is asked for.
 *
 * @param key the number; {@code frequency} is one too, with the study's frequency of comparison as its base
 * @param from lower end, SI
 * @param to upper end, SI
 * @param unit in which the lower end was written
 */
public record Side(NumberKey key, double from, double to, WrittenUnit unit) {
    /** The word for the frequency itself, which no study states. */
    public static final String FREQUENCY = "frequency";

    private static final String LIKE_A_BAND = "band.to";

    /**
     * Reads a side written as {@code hair.diameter=40 um..120 um} or {@code frequency=20 Hz..2 kHz}.
     *
     * @param option what to print as the place of a fault
     * @param text key path, equals sign, lower end, two points, upper end
     * @param numbers of the study
     * @param reference the study's frequency of comparison [Hz]
     * @return the side
     * @throws StudyException if the key, an end or their order is wrong
     */
    public static Side read(String option, String text, NumberKeys numbers, double reference) {
        int equals = text.indexOf('=');
        String path = equals < 0 ? "" : text.substring(0, equals).strip();
        if (!path.equals(FREQUENCY)) {
            KeyRange range = numbers.range(option, text);
            return new Side(range.key(), range.from(), range.to(), unit(range.key(), text));
        }
        NumberKey key = frequency(reference);
        int between = text.indexOf("..", equals);
        if (between < 0) {
            throw fault(option, Printable.of(text.strip()) + " is no KEY=A..B", "for example frequency=20 Hz..2 kHz");
        }
        String low = text.substring(equals + 1, between).strip();
        String high = text.substring(between + 2).strip();
        double from = end(option, key, low);
        double to = end(option, key, high);
        if (!(from < to)) {
            throw fault(
                    option,
                    NumberKeys.order(low, high, from, to),
                    "the lower end stands first, the upper end above it");
        }
        return new Side(key, from, to, unit(key, text));
    }

    private static NumberKey frequency(double reference) {
        Measure measure = Keys.measure(LIKE_A_BAND).orElseThrow().getValue();
        return NumberKey.of(FREQUENCY, measure, reference, WrittenUnit.of("1 Hz", measure.dimension()));
    }

    private static double end(String option, NumberKey key, String text) {
        try {
            return key.value(text.strip());
        } catch (QuantityException e) {
            throw new StudyException(new Problem(
                    Position.label(option + " " + FREQUENCY), FREQUENCY, e.found(), e.accepted(), e.nearest()));
        }
    }

    private static StudyException fault(String option, String found, String accepted) {
        return new StudyException(Problem.of(Position.label(option + " " + FREQUENCY), FREQUENCY, found, accepted));
    }

    private static WrittenUnit unit(NumberKey key, String text) {
        return WrittenUnit.of(text.substring(text.indexOf('=') + 1, text.indexOf("..")), key.dimension());
    }

    /**
     * Whether this is the frequency itself.
     *
     * @return false for a key of the study
     */
    public boolean frequency() {
        return key.path().equals(FREQUENCY);
    }
}
