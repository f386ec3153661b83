package flowshy.report;

import flowshy.response.ResponsePoint;
import flowshy.verdict.Acceptance;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** Columns of the response table: one list for terminal, CSV and JSON. */
public final class PointTable {
    private static final String NO_BOUND = "no flow reaches the hair under a sealed cover, the rejection has no bound";
    private static final String NEITHER = "neither motion nor flow turns the hair";
    private static final String NO_SUSPENSION = "no suspension is stated that holds the hair";
    private static final String NO_LIMIT = "no error limit is stated";
    private static final String ANY_SPEED = "no flow reaches the hair, any speed keeps the limit";
    private static final String NO_READOUT = "no readout noise is stated";
    private static final String NO_PHASE = "the response is zero";

    private static final String STRIPS = "strip theory is used";
    private static final String FINITE_LENGTH = "finite_length_db";

    private static final List<String> MOVEMENT =
            List.of("motion_rad_per_m_s2", "motion_phase_deg", "flow_rad_per_m_s2", "flow_phase_deg");

    private PointTable() {}

    /**
     * Every column, for programs.
     *
     * @param acceptance gives the error limit
     * @return columns in the order of the file
     */
    public static List<Column<ResponsePoint>> all(Acceptance acceptance) {
        List<Column<ResponsePoint>> columns = new ArrayList<>();
        columns.add(new Column<>("frequency_hz", "freq.", "Hz", 5, point -> Cell.of(point.frequency(), "")));
        columns.add(new Column<>("rejection_db", "reject.", "dB", 4, PointTable::rejection));
        columns.add(new Column<>(FINITE_LENGTH, "finite", "dB", 3, PointTable::finiteLength));
        columns.add(new Column<>(
                "motion_rad_per_m_s2",
                "motion",
                "rad/(m/s2)",
                4,
                point -> Cell.of(size(point.motion()), NO_SUSPENSION)));
        columns.add(new Column<>("motion_phase_deg", "phase", "deg", 4, point -> phase(point.motion())));
        columns.add(new Column<>(
                "flow_rad_per_m_s2", "flow", "rad/(m/s2)", 4, point -> Cell.of(size(point.flow()), NO_SUSPENSION)));
        columns.add(new Column<>("flow_phase_deg", "phase", "deg", 4, point -> phase(point.flow())));
        columns.add(new Column<>("womersley", "Wo", "", 3, point -> Cell.of(point.womersley(), "")));
        columns.add(new Column<>(
                "equivalent_m_s2_per_m_s", "equiv.", "m/s2/(m/s)", 4, point -> Cell.of(point.equivalent(), NEITHER)));
        columns.add(new Column<>("largest_speed_m_s", "speed", "m/s", 3, point -> largestSpeed(point, acceptance)));
        columns.add(new Column<>(
                "thermal_noise_m_s2_per_rthz",
                "thermal",
                "m/s2/rtHz",
                3,
                point -> Cell.of(point.thermalNoise(), NO_SUSPENSION)));
        columns.add(new Column<>(
                "readout_noise_m_s2_per_rthz",
                "readout",
                "m/s2/rtHz",
                3,
                point -> Cell.of(point.readoutNoise(), NO_READOUT)));
        return columns;
    }

    /**
     * The columns that fit a page and have something to say.
     *
     * @param acceptance gives the error limit
     * @param moving whether the responses are known
     * @param corrected whether strip theory is corrected for finite length; the Womersley number makes room
     * @return columns in the order printed
     */
    public static List<Column<ResponsePoint>> printed(Acceptance acceptance, boolean moving, boolean corrected) {
        return all(acceptance).stream()
                .filter(column -> !column.name().equals(corrected ? "womersley" : FINITE_LENGTH))
                .filter(column -> !column.name().contains("noise"))
                .filter(column -> moving || !MOVEMENT.contains(column.name()))
                .filter(column ->
                        acceptance.error().isPresent() || !column.name().startsWith("largest"))
                .toList();
    }

    private static Cell rejection(ResponsePoint point) {
        double rejection = point.rejection();
        return Cell.of(rejection, Double.isNaN(rejection) ? NEITHER : NO_BOUND);
    }

    private static Cell finiteLength(ResponsePoint point) {
        Cell rejection = rejection(point);
        return Cell.of(point.finiteLength(), rejection.reason().isEmpty() ? STRIPS : rejection.reason());
    }

    private static double size(Optional<Complex> response) {
        return response.map(Complex::norm).orElse(Double.NaN);
    }

    private static Cell phase(Optional<Complex> response) {
        if (response.isEmpty()) {
            return Cell.missing(NO_SUSPENSION);
        }
        Complex value = response.get();
        return value.isZero() ? Cell.missing(NO_PHASE) : Cell.of(FastMath.toDegrees(value.getArgument()), NO_PHASE);
    }

    private static Cell largestSpeed(ResponsePoint point, Acceptance acceptance) {
        OptionalDouble error = acceptance.error();
        if (error.isEmpty()) {
            return Cell.missing(NO_LIMIT);
        }
        return Cell.of(error.getAsDouble() / point.equivalent(), ANY_SPEED);
    }
}
