package flowshy.study;

import static flowshy.math.Figures.say;

import flowshy.study.ColumnFile.Column;
import flowshy.study.ColumnFile.Layout;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.text.TextFile;
import flowshy.study.units.Dimension;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredPoint;
import flowshy.verdict.measured.Reading;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/**
 * A measured frequency response in a file: columns frequency, amplitude (which may be called motion, flow or rejection after what was
 * measured) and, if they were measured, phase, uncertainty and phase-uncertainty.
 */
final class ResponseReader {
    private static final String FREQUENCY = "frequency";
    private static final String AMPLITUDE = "amplitude";
    private static final String PHASE = "phase";
    private static final String UNCERTAINTY = "uncertainty";
    private static final String PHASE_UNCERTAINTY = "phase-uncertainty";
    private static final int MOST_ROWS = 10_000;
    private static final double LEAST_FREQUENCY = 1e-3;
    private static final double MOST_FREQUENCY = 1e7;

    /** More decibels than this are no measurement. */
    private static final double MOST_LEVEL = 400.0;

    /** Turns beyond this are no phase [rad]. */
    private static final double MOST_PHASE = 200.0;

    private final String key;
    private final Position at;
    private final Problems problems;
    private final TextFile file;

    /** What a file holds. */
    record Content(Measurand of, Reading reading, List<MeasuredPoint> points) {}

    /**
     * A reader of one file.
     *
     * @param key that names it, empty for a file of the command line
     * @param at where that key stands
     * @param problems takes what is wrong
     * @param file its text
     */
    ResponseReader(String key, Position at, Problems problems, TextFile file) {
        this.key = key;
        this.at = at;
        this.problems = problems;
        this.file = file;
    }

    /**
     * Reads the file.
     *
     * @param layout what the columns hold, where the file does not say
     * @param stated what was measured, if that is known already
     * @return the points; empty if there is a problem
     */
    Optional<Content> read(Optional<Layout> layout, Optional<Measurand> stated) {
        List<String> names = layout.map(Layout::columns)
                .orElseGet(() -> List.copyOf(ColumnFile.heads(file).keySet()));
        List<String> amplitudes = names.stream()
                .filter(name -> name.equals(AMPLITUDE) || Measurand.of(name).isPresent())
                .toList();
        if (amplitudes.size() > 1) {
            return refuse(
                    place(),
                    "columns " + String.join(" and ", amplitudes),
                    "one of them; a file each for motion and flow");
        }
        String amplitude = amplitudes.isEmpty() ? AMPLITUDE : amplitudes.get(0);
        Optional<Measurand> named = Measurand.of(amplitude);
        if (named.isPresent() && stated.isPresent() && named.get() != stated.get()) {
            return refuse(
                    place(),
                    "a column " + amplitude + ", but of: " + stated.get().word(),
                    "one and the same");
        }
        Optional<Measurand> of = stated.or(() -> named);
        if (of.isEmpty() && !amplitudes.isEmpty()) {
            return refuse(
                    place(),
                    "it is not said what was measured",
                    "call the column motion, flow or rejection in place of amplitude");
        }
        List<Column> wanted = new ArrayList<>(List.of(
                new Column(FREQUENCY, Optional.of(Dimension.FREQUENCY)), new Column(amplitude, Optional.empty())));
        for (String further : List.of(PHASE, UNCERTAINTY, PHASE_UNCERTAINTY)) {
            if (names.contains(further)) {
                Optional<Dimension> angle =
                        further.equals(UNCERTAINTY) ? Optional.empty() : Optional.of(Dimension.ANGLE);
                wanted.add(new Column(further, angle));
            }
        }
        try {
            ColumnFile table = layout.isPresent()
                    ? ColumnFile.read(file, wanted, layout.get(), MOST_ROWS)
                    : ColumnFile.read(file, wanted, MOST_ROWS);
            return content(table, wanted.stream().map(Column::name).toList(), of.orElseThrow());
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
            return Optional.empty();
        }
    }

    private Optional<Content> content(ColumnFile table, List<String> names, Measurand of) {
        int before = problems.count();
        if (of == Measurand.REJECTION && names.contains(PHASE)) {
            return refuse(
                    table.head(names.indexOf(PHASE)),
                    "a phase of a rejection",
                    "no phase: rejection is a ratio of sizes");
        }
        Optional<ResponseUnit> unit = ResponseUnit.of(table.unit(1), of);
        if (unit.isEmpty()) {
            String accepted = of == Measurand.REJECTION
                    ? "dB, or no unit for a ratio"
                    : table.unit(1).equals("dB")
                            ? "decibels above what: dB re 1 V/(m/s2), dB re 1 rad/(m/s) and the like"
                            : "a response per acceleration or speed is wanted here: " + ResponseUnit.ACCEPTED;
            String found = table.unit(1).isEmpty() ? "no unit" : "unit " + Printable.of(table.unit(1));
            return refuse(table.head(1), found, accepted);
        }
        int uncertain = names.indexOf(UNCERTAINTY);
        Optional<ResponseUnit.Share> share =
                uncertain < 0 ? Optional.empty() : unit.get().share(table.unit(uncertain));
        if (uncertain >= 0 && share.isEmpty()) {
            String found = table.unit(uncertain).isEmpty() ? "no unit" : "unit " + Printable.of(table.unit(uncertain));
            return refuse(table.head(uncertain), found, "%, dB, or the unit of the amplitudes; one standard deviation");
        }
        if (!swapped(table)) {
            rising(table);
        }
        List<MeasuredPoint> points = new ArrayList<>();
        for (int i = 0; i < table.rows().size(); i++) {
            point(table, i, names, unit.get(), share).ifPresent(points::add);
        }
        if (problems.count() > before) {
            return Optional.empty();
        }
        if (points.size() < 2) {
            return refuse(table.position(0, 0), "one row only", "two frequencies or more");
        }
        return Optional.of(new Content(of, unit.get().reading(), points));
    }

    /** Frequencies out of order beside amplitudes that rise one by one: no response does that. */
    private boolean swapped(ColumnFile table) {
        if (table.rows().size() < 3 || rises(table, 0) || !rises(table, 1)) {
            return false;
        }
        refuse(
                table.head(0),
                "the frequencies do not rise, but the amplitudes do",
                "are the two columns swapped? rows by rising frequency");
        return true;
    }

    private static boolean rises(ColumnFile table, int column) {
        for (int i = 1; i < table.rows().size(); i++) {
            if (!(table.rows().get(i).get(column) > table.rows().get(i - 1).get(column))) {
                return false;
            }
        }
        return true;
    }

    private void rising(ColumnFile table) {
        for (int i = 0; i < table.rows().size(); i++) {
            double frequency = table.rows().get(i).get(0);
            double before = i == 0 ? 0.0 : table.rows().get(i - 1).get(0);
            if (!(frequency >= LEAST_FREQUENCY && frequency <= MOST_FREQUENCY)) {
                refuse(
                        table.position(i, 0),
                        say("%.4g Hz", frequency),
                        say(
                                "a frequency of %.4g Hz to %.4g Hz; are the columns in the order of their headings?",
                                LEAST_FREQUENCY, MOST_FREQUENCY));
            } else if (frequency == before) {
                refuse(
                        table.position(i, 0),
                        say(
                                "%.6g Hz again, as in line %s",
                                frequency, table.position(i - 1, 0).line()),
                        "each frequency once: average the rows, or leave one out");
            } else if (!(frequency > before)) {
                refuse(
                        table.position(i, 0),
                        say("%.6g Hz below %.6g Hz in the row before", frequency, before),
                        "rows by rising frequency");
            }
        }
    }

    private Optional<MeasuredPoint> point(
            ColumnFile table, int row, List<String> names, ResponseUnit unit, Optional<ResponseUnit.Share> share) {
        int before = problems.count();
        List<Double> cells = table.rows().get(row);
        double number = cells.get(1);
        if (unit.level() && !(FastMath.abs(number) <= MOST_LEVEL)) {
            refuse(table.position(row, 1), say("%.4g dB", number), say("%.3g dB to %.3g dB", -MOST_LEVEL, MOST_LEVEL));
        } else if (!unit.level() && number < 0.0) {
            refuse(
                    table.position(row, 1),
                    say("a negative amplitude, %.4g", number),
                    "amplitudes above zero; are amplitude and phase swapped? a turned sense belongs into the phase");
        } else if (!unit.level() && number == 0.0) {
            refuse(table.position(row, 1), "an amplitude of zero", "leave out rows in which nothing was read");
        }
        double amplitude = unit.amplitude(number);
        OptionalDouble phase = cell(cells, names, PHASE);
        if (phase.isPresent() && !(FastMath.abs(phase.getAsDouble()) <= MOST_PHASE)) {
            refuse(
                    table.position(row, names.indexOf(PHASE)),
                    say("a phase of %.4g rad", phase.getAsDouble()),
                    "some turns at most");
        }
        OptionalDouble stated = cell(cells, names, UNCERTAINTY);
        OptionalDouble uncertainty = stated.isPresent()
                ? OptionalDouble.of(share.orElseThrow().of(stated.getAsDouble(), amplitude))
                : OptionalDouble.empty();
        if (uncertainty.isPresent() && !(uncertainty.getAsDouble() > 0.0 && uncertainty.getAsDouble() <= 1.0)) {
            refuse(
                    table.position(row, names.indexOf(UNCERTAINTY)),
                    say("an uncertainty of %.4g %% of the amplitude", 100.0 * uncertainty.getAsDouble()),
                    "one standard deviation, above zero and up to 100 % of the amplitude");
        }
        OptionalDouble phaseStated = cell(cells, names, PHASE_UNCERTAINTY);
        if (phaseStated.isPresent() && !(phaseStated.getAsDouble() > 0.0 && phaseStated.getAsDouble() <= FastMath.PI)) {
            refuse(
                    table.position(row, names.indexOf(PHASE_UNCERTAINTY)),
                    say("an uncertainty of %.4g rad", phaseStated.getAsDouble()),
                    "one standard deviation, above zero and up to half a turn");
        }
        return problems.count() > before || !(amplitude > 0.0)
                ? Optional.empty()
                : Optional.of(new MeasuredPoint(
                        cells.get(0),
                        amplitude,
                        phase,
                        uncertainty,
                        phaseStated.isPresent()
                                ? phaseStated
                                : uncertainty)); // noise alike in both parts of the phasor
    }

    private static OptionalDouble cell(List<Double> cells, List<String> names, String name) {
        int at = names.indexOf(name);
        return at < 0 ? OptionalDouble.empty() : OptionalDouble.of(cells.get(at));
    }

    private Position place() {
        return key.isEmpty() ? Position.label(Printable.of(file.name())) : at;
    }

    private <T> Optional<T> refuse(Position where, String found, String accepted) {
        problems.add(where, key, found, accepted);
        return Optional.empty();
    }
}
