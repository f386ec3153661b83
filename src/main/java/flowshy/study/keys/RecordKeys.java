package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.List;
import java.util.stream.Stream;

/** Keys that say what the columns of a measured file hold. */
final class RecordKeys {
    static final Key FILE = Key.required("file", Text.FILE, "file beside the study, columns of numbers");
    static final Key COLUMNS = Key.required(
            "columns",
            new TextList(new Text("name of a column", 40), "[f, S]"),
            "what the columns hold: f frequency or t time, with Hz, kHz, s, ms, us in brackets if need be; one other name"
                    + " for the values; '-' for a column to pass over");
    static final Key UNIT =
            Key.required("unit", new Text("unit of the values", 40), "unit of the values, nothing is guessed");
    static final Key SKIP = Key.of(
            "skip",
            Measure.of(Dimension.NUMBER, "0", "1000000"),
            Presence.taken("0", "the numbers start in the first line"),
            "lines at the top that hold no numbers");
    static final Key RATE = Key.optional(
            "rate",
            Measure.of(Dimension.FREQUENCY, "1 uHz", "1 GHz"),
            "samples per second of a record without a column of times");
    static final Key RESOLUTION = Key.optional(
            "resolution",
            Measure.of(Dimension.FREQUENCY, "1 uHz", "1 GHz"),
            "wanted distance of the lines of a record's density");

    private RecordKeys() {}

    static Key quantity(String... words) {
        return Key.required("quantity", Words.of(words), "in what form the values are");
    }

    /** The same where a table with a header may stand in place of a declaration. */
    static List<Key> declaration(String... quantities) {
        return Stream.of(COLUMNS, quantity(quantities), UNIT, SKIP, RATE, RESOLUTION)
                .map(key -> Key.optional(key.name(), key.value(), key.meaning()))
                .toList();
    }

    /** Keys of a file that runs over frequency. */
    static List<Key> spectrum() {
        return List.of(FILE, COLUMNS, quantity("density", "amplitude density", "band levels", "rms lines"), UNIT, SKIP);
    }

    /** Keys of a file that runs over time. */
    static List<Key> record() {
        return List.of(FILE, COLUMNS, UNIT, SKIP, RATE, RESOLUTION);
    }
}
