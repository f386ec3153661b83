package flowshy.report;

import flowshy.math.Figures;
import flowshy.torque.finite.FiniteTorques;
import flowshy.torque.finite.ForceSlice;
import flowshy.verdict.force.ForceAlong;
import flowshy.verdict.force.ForceAlong.Part;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** Force along the hair as a part of an answer: text by tenths of the length, JSON and CSV slice by slice. */
public final class ForceReport {
    private static final String FLAT = "a flat face has a force, but none per length";

    private ForceReport() {}

    /** A slice with the frequency it belongs to. */
    private record Row(double frequency, ForceSlice slice) {}

    private static List<Column<Part>> printed() {
        List<Column<Part>> columns = new ArrayList<>();
        columns.add(new Column<>("from_m", "from", "um", 4, part -> Cell.of(1e6 * part.from(), "")));
        columns.add(new Column<>("to_m", "to", "um", 4, part -> Cell.of(1e6 * part.to(), "")));
        columns.add(new Column<>(
                "stream", "stream", "N/(m/s)", 4, part -> Cell.of(part.stream().norm(), "")));
        columns.add(new Column<>("phase", "phase", "deg", 3, part -> Cell.of(degrees(part.stream()), "")));
        columns.add(new Column<>(
                "strip",
                "strips",
                "N/(m/s)",
                4,
                part -> Cell.of(part.stripStream().norm(), "")));
        columns.add(new Column<>("stripPhase", "phase", "deg", 3, part -> Cell.of(degrees(part.stripStream()), FLAT)));
        columns.add(new Column<>(
                "ratio",
                "ratio",
                "",
                3,
                part -> Cell.of(part.stream().norm() / part.stripStream().norm(), FLAT)));
        columns.add(new Column<>(
                "rocking",
                "ratio",
                "rocking",
                3,
                part -> Cell.of(part.rocking().norm() / part.stripRocking().norm(), FLAT)));
        return columns;
    }

    private static List<Column<Row>> all() {
        List<Column<Row>> columns = new ArrayList<>();
        columns.add(new Column<>("frequency_hz", "", "", 5, row -> Cell.of(row.frequency(), "")));
        columns.add(new Column<>("from_m", "", "", 5, row -> Cell.of(row.slice().bottom(), "")));
        columns.add(new Column<>("to_m", "", "", 5, row -> Cell.of(row.slice().top(), "")));
        both(columns, "stream_force", "n_per_m_s", ForceSlice::stream);
        both(columns, "strip_stream_force", "n_per_m_s", ForceSlice::stripStream);
        both(columns, "rocking_force", "n_per_rad_s", ForceSlice::rocking);
        both(columns, "strip_rocking_force", "n_per_rad_s", ForceSlice::stripRocking);
        return columns;
    }

    /** Force of the slice, and per length where it has one; the phase is that of both. */
    private static void both(List<Column<Row>> columns, String name, String unit, Function<ForceSlice, Complex> force) {
        columns.add(new Column<>(
                name + "_" + unit,
                "",
                "",
                5,
                row -> Cell.of(force.apply(row.slice()).norm(), "")));
        columns.add(new Column<>(
                name + "_per_length_" + unit.replace("n_per_", "n_per_m_per_"),
                "",
                "",
                5,
                row -> Cell.of(force.apply(row.slice()).norm() / row.slice().length(), FLAT)));
        columns.add(new Column<>(name + "_phase_deg", "", "", 5, row -> phase(force.apply(row.slice()))));
    }

    private static Cell phase(Complex force) {
        return force.isZero() ? Cell.missing("there is no force") : Cell.of(degrees(force), "");
    }

    private static double degrees(Complex force) {
        return force.isZero() ? Double.NaN : FastMath.toDegrees(force.getArgument());
    }

    private static List<Row> rows(ForceAlong force) {
        return force.slices().stream()
                .map(slice -> new Row(force.frequency(), slice))
                .toList();
    }

    /**
     * Sections of a printed answer.
     *
     * @param page where to
     * @param forces one a frequency; nothing is printed if there are none
     */
    static void print(TextPage page, List<ForceAlong> forces) {
        for (ForceAlong force : forces) {
            page.heading("Force along the hair at " + Figures.of(force.frequency(), 5) + " Hz");
            if (force.found().isEmpty()) {
                page.paragraph(unsolved(force));
                continue;
            }
            FiniteTorques found = force.found().get();
            page.row("stream", missed(force.streamError(), found.stream().torqueError()));
            page.row("rocking", missed(force.rockingError(), found.rocking().torqueError()));
            page.row(
                    "torque of the stream",
                    Figures.of(found.stream().torque().norm(), 4) + " N.m per m/s, its centre at "
                            + Figures.of(
                                    1e6
                                            * found.stream().lateralTorque().norm()
                                            / found.stream().force().norm(),
                                    4)
                            + " um over the pivot");
            page.table(printed(), force.parts(), part -> part.from() == part.to());
            page.paragraph(
                    "Force on each tenth of the length in a stream of unit velocity past the bare, still hair, the whole hair"
                            + " beside strips; the last column is the same ratio for the turning hair. *: flat faces, which strip theory"
                            + " does not have.");
        }
    }

    private static String missed(Complex error, double own) {
        double size = 100.0 * (1.0 - error.add(1.0).norm());
        double turn = FastMath.toDegrees(error.add(1.0).getArgument());
        return "strip theory has " + Figures.of(FastMath.abs(size), 3) + " % " + (size >= 0.0 ? "less" : "more")
                + " torque than the whole hair and " + (turn >= 0.0 ? "leads" : "lags") + " it by "
                + Figures.of(FastMath.abs(turn), 2) + " deg; the solution's own error is " + Figures.of(100.0 * own, 2)
                + " %";
    }

    private static String unsolved(ForceAlong force) {
        return "Not solved: above " + Figures.of(force.highest(), 4)
                + " Hz the Stokes layer is thinner than 0.05 of the largest radius.";
    }

    /**
     * A field of a JSON answer.
     *
     * @param json where to
     * @param forces one a frequency
     */
    static void write(JsonPage json, List<ForceAlong> forces) {
        List<Column<Row>> columns = all().stream()
                .filter(column -> !column.name().equals("frequency_hz"))
                .toList();
        json.array("force", forces, force -> {
            json.number("frequency_hz", force.frequency());
            cell(
                    json,
                    force,
                    "stream_torque_n_m_per_m_s",
                    found -> found.stream().torque().norm());
            cell(json, force, "stream_factor", found -> found.streamFactor().norm());
            cell(json, force, "stream_factor_phase_deg", found -> degrees(found.streamFactor()));
            cell(
                    json,
                    force,
                    "rocking_torque_n_m_per_rad_s",
                    found -> found.rocking().torque().norm());
            cell(json, force, "rocking_factor", found -> found.rockingFactor().norm());
            cell(json, force, "rocking_factor_phase_deg", found -> degrees(found.rockingFactor()));
            cell(
                    json,
                    force,
                    "solution_error",
                    found -> FastMath.max(
                            found.stream().torqueError(), found.rocking().torqueError()));
            json.array(
                    "slices",
                    rows(force),
                    row -> columns.forEach(
                            column -> json.cell(column.name(), column.cell().apply(row))));
        });
    }

    private static void cell(JsonPage json, ForceAlong force, String name, Function<FiniteTorques, Double> value) {
        json.cell(
                name,
                force.found().map(found -> Cell.of(value.apply(found), "")).orElse(Cell.missing(unsolved(force))));
    }

    /**
     * Every slice as CSV.
     *
     * @param forces one a frequency
     * @return text
     */
    public static String csv(List<ForceAlong> forces) {
        return TableCsv.of(
                forces.stream().flatMap(force -> rows(force).stream()).collect(Collectors.toList()), all());
    }
}
