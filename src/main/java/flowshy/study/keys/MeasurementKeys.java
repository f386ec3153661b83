package flowshy.study.keys;

import flowshy.study.units.Dimension;
import java.util.List;

/** Keys of measured responses that are laid over the model: one group a file, under a name that the user gives. */
final class MeasurementKeys {
    private MeasurementKeys() {}

    static GroupMap map() {
        return new GroupMap(Group.of(
                "measurement",
                List.of(
                        Key.required(
                                "file",
                                Text.FILE,
                                "table with columns frequency, amplitude and, if measured, phase, uncertainty,"
                                        + " phase-uncertainty, units in its header"),
                        Key.required(
                                "of",
                                Words.of("motion", "flow", "rejection"),
                                "what was measured: response to motion, to flow, or the ratio of the two"),
                        Key.optional(
                                "columns",
                                new TextList(new Text("name of a column", 40), "[frequency, amplitude, phase]"),
                                "what the columns hold where the file does not say; '-' for a column to pass over"),
                        Key.optional(
                                "units",
                                new TextList(new Text("unit of a column", 40), "[Hz, mV/(m/s2), deg]"),
                                "their units, '-' where columns says so"),
                        Key.optional(
                                "skip",
                                RecordKeys.SKIP.value(),
                                "lines at the top that hold no numbers, beside columns"),
                        Key.of(
                                "gain",
                                new WordOr(
                                        "free",
                                        List.of(
                                                Measure.of(Dimension.READOUT_GAIN, "-1e12 V/rad", "1e12 V/rad"),
                                                Measure.of(Dimension.NUMBER, "-1e12", "1e12"))),
                                Presence.ifNeeded("free in volts, 1 for an angle", ""),
                                "gain of the readout, negative if it turns the sense round; free: one common factor is"
                                        + " taken out")),
                Rule.oneBeside("columns", "units"),
                Rule.oneBeside("units", "columns"),
                Rule.oneBeside("skip", "columns")));
    }
}
