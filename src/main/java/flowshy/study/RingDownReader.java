package flowshy.study;

import flowshy.response.FreeSwing;
import flowshy.response.FreeSwingFit;
import flowshy.response.SuspensionException;
import flowshy.study.ColumnFile.Column;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.Swing;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The record of a free swing beside the study: columns time and signal, the signal in any unit. */
final class RingDownReader {
    private static final int MOST_ROWS = 200_000;
    private static final String KEY = "suspension.ring-down.file";

    private final Form form;
    private final Problems problems;
    private final FilesRead files;

    RingDownReader(Form form, Problems problems, FilesRead files) {
        this.form = form;
        this.problems = problems;
        this.files = files;
    }

    /** The swing in the record; empty if it has a problem. */
    Optional<FreeSwing> read() {
        List<Column> wanted =
                List.of(new Column("time", Optional.of(Dimension.TIME)), new Column("signal", Optional.empty()));
        List<Double> times = new ArrayList<>();
        List<Double> signal = new ArrayList<>();
        try {
            ColumnFile table = files.table(form, KEY, wanted, MOST_ROWS);
            for (int i = 0; i < table.rows().size(); i++) {
                double time = table.rows().get(i).get(0);
                if (i > 0 && !(time > times.get(i - 1))) {
                    problems.add(table.position(i, 0), KEY, "the time does not rise", "samples in the order of time");
                    return Optional.empty();
                }
                times.add(time);
                signal.add(table.rows().get(i).get(1));
            }
            return Optional.of(FreeSwingFit.of(times, signal));
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
        } catch (SuspensionException e) {
            problems.add(form.position(KEY), KEY, e.getMessage(), "");
        }
        return Optional.empty();
    }

    /** What the fit gives in place of written keys. */
    List<Form.Taken> taken(FreeSwing swing) {
        String file = form.word(KEY).orElseThrow();
        return List.of(
                taken("decay-time", Dimension.TIME, swing.decayTime(), swing.decayUncertainty(), file, swing),
                taken("frequency", Dimension.FREQUENCY, swing.frequency(), swing.frequencyUncertainty(), file, swing));
    }

    private static Form.Taken taken(
            String key, Dimension dimension, double value, double uncertainty, String file, FreeSwing swing) {
        String why = String.format(
                Locale.ROOT,
                "fitted to %s, standard uncertainty %.2g %%, %.2g %% rms left",
                file,
                100.0 * uncertainty / value,
                100.0 * swing.rest());
        return new Form.Taken("suspension.ring-down." + key, new Quantity(value, dimension, "", Swing.NONE).si(), why);
    }
}
