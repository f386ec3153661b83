package flowshy.report;

import static flowshy.math.Figures.say;

import flowshy.math.Figures;
import flowshy.verdict.measured.BandDeviation;
import flowshy.verdict.measured.Compared;
import flowshy.verdict.measured.Deviation;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredPoint;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/** Measured responses beside the model as a part of an answer: text by third-octaves, JSON and CSV point by point. */
public final class MeasuredReport {
    private static final String NO_PHASE = "no phase was measured";
    private static final String NO_UNCERTAINTY = "no uncertainty is stated";

    private MeasuredReport() {}

    private static List<Column<BandDeviation>> bands() {
        return List.of(
                new Column<>("middle_hz", "band", "Hz", 4, band -> Cell.of(band.middle(), "")),
                new Column<>("points", "points", "", 3, band -> Cell.of(band.points(), "")),
                new Column<>("deviation_db", "off", "dB", 3, band -> Cell.of(band.level(), "")),
                new Column<>("allowed_db", "allowed", "dB", 3, band -> Cell.of(band.allowed(), NO_UNCERTAINTY)),
                new Column<>("deviation_deg", "off", "deg", 3, band -> Cell.of(degrees(band.phase()), NO_PHASE)),
                new Column<>(
                        "allowed_deg",
                        "allowed",
                        "deg",
                        3,
                        band -> Cell.of(
                                degrees(band.allowedPhase()), band.phase().isEmpty() ? NO_PHASE : NO_UNCERTAINTY)));
    }

    /**
     * The columns that fit a page and have something to say.
     *
     * @param response as compared
     * @return columns of its third-octaves, in the order printed
     */
    public static List<Column<BandDeviation>> printed(Compared response) {
        boolean phased = response.rmsPhase().isPresent();
        return bands().stream()
                .filter(column -> !column.name().equals("points"))
                .filter(column -> phased || !column.name().endsWith("_deg"))
                .toList();
    }

    /** Every point, for programs; amplitudes in SI, their unit is that of the response. */
    private static List<Column<Deviation>> points() {
        return List.of(
                new Column<>("frequency_hz", "freq.", "Hz", 5, point -> Cell.of(point.frequency(), "")),
                new Column<>("measured", "measured", "", 4, point -> Cell.of(point.measured(), "")),
                new Column<>("predicted", "model", "", 4, point -> Cell.of(point.predicted(), "")),
                new Column<>("deviation_db", "off", "dB", 3, point -> Cell.of(point.level(), "")),
                new Column<>("uncertainty_db", "u", "dB", 2, point -> Cell.of(point.uncertainty(), NO_UNCERTAINTY)),
                new Column<>(
                        "model_uncertainty_db", "u model", "dB", 2, point -> Cell.of(point.modelUncertainty(), "")),
                new Column<>(
                        "measured_phase_deg",
                        "phase",
                        "deg",
                        4,
                        point -> Cell.of(degrees(point.measuredPhase()), NO_PHASE)),
                new Column<>(
                        "predicted_phase_deg",
                        "model",
                        "deg",
                        4,
                        point -> Cell.of(degrees(point.predictedPhase()), "a rejection has no phase")),
                new Column<>("deviation_deg", "off", "deg", 3, point -> Cell.of(degrees(point.phase()), NO_PHASE)),
                new Column<>(
                        "uncertainty_deg",
                        "u",
                        "deg",
                        2,
                        point -> Cell.of(
                                degrees(point.phaseUncertainty()),
                                point.phase().isEmpty() ? NO_PHASE : NO_UNCERTAINTY)),
                new Column<>(
                        "model_uncertainty_deg",
                        "u model",
                        "deg",
                        2,
                        point -> Cell.of(FastMath.toDegrees(point.modelPhaseUncertainty()), "")));
    }

    private static OptionalDouble degrees(OptionalDouble radians) {
        return radians.isPresent() ? OptionalDouble.of(FastMath.toDegrees(radians.getAsDouble())) : radians;
    }

    /**
     * Prints every response.
     *
     * @param page to print on
     * @param heading of the part
     * @param responses as compared; nothing is printed if there are none
     */
    static void print(TextPage page, String heading, List<Compared> responses) {
        print(page, heading, responses, List.of());
    }

    /**
     * The same beside a fitted device.
     *
     * @param page to print on
     * @param heading of the part
     * @param responses as compared; nothing is printed if there are none
     * @param fitted names of those whose gain was fitted
     */
    static void print(TextPage page, String heading, List<Compared> responses, List<String> fitted) {
        if (responses.isEmpty()) {
            return;
        }
        page.heading(heading);
        for (Compared response : responses) {
            page.row(response.measured().name(), what(response));
            page.row(
                    "  gain", gain(response, fitted.contains(response.measured().name())));
            if (!response.points().isEmpty()) {
                page.row("  off by", deviation(response));
            }
            page.row("  agreement", response.agreement().sentence());
            page.table(printed(response), response.bands(), band -> !band.agrees());
            page.line("");
        }
        page.paragraph(
                "off: measured over model, mean of the third-octave; allowed: what the uncertainties of measurement and"
                        + " medium together explain. *: more than allowed.");
    }

    private static String what(Compared response) {
        List<MeasuredPoint> points = response.measured().points();
        return say(
                "response %s, %s points, %.4g Hz to %.4g Hz",
                response.measured().of() == Measurand.REJECTION
                        ? "to motion over that to flow (rejection)"
                        : "to " + response.measured().of().word() + " in "
                                + response.measured().reading().unit(),
                points.size(),
                points.get(0).frequency(),
                points.get(points.size() - 1).frequency());
    }

    private static String gain(Compared response, boolean fitted) {
        if (response.measured().of() == Measurand.REJECTION) {
            return "none: it cancels in the ratio";
        }
        String unit = response.measured().reading().volts() ? " V/rad" : " (angle over angle)";
        String value = Figures.of(FastMath.abs(response.gain()), 4) + unit;
        String sense = response.gain() < 0.0 ? ", sense turned round" : "";
        return response.freed()
                ? value + sense + ": one common factor taken out, nothing else is fitted"
                : value + sense + (fitted ? ", as fitted" : ", as given");
    }

    private static String deviation(Compared response) {
        Deviation worst = response.points().stream()
                .max(Comparator.comparingDouble(point -> FastMath.abs(point.level())))
                .orElseThrow();
        OptionalDouble phase = response.rmsPhase();
        return say("%.3g dB rms, most %.3g dB at %.4g Hz", response.rms(), worst.level(), worst.frequency())
                + (phase.isPresent() ? say("; phase %.3g deg rms", FastMath.toDegrees(phase.getAsDouble())) : "");
    }

    /**
     * Writes one array.
     *
     * @param json with an open object
     * @param name of the field
     * @param responses as compared
     */
    static void write(JsonPage json, String name, List<Compared> responses) {
        json.array(name, responses, response -> {
            json.text("name", response.measured().name());
            json.text("of", response.measured().of().word());
            json.text(
                    "amplitude_unit",
                    response.measured().of() == Measurand.REJECTION
                            ? "1"
                            : response.measured().reading().unit());
            json.number("gain", response.gain());
            json.bool("gain_taken_out", response.freed());
            json.number("rms_db", response.rms());
            json.cell("rms_deg", Cell.of(degrees(response.rmsPhase()), NO_PHASE));
            json.text("agreement", response.agreement().outcome().word());
            json.text("sentence", response.agreement().sentence());
            json.number("coverage_factor", response.coverage());
            json.array("differ", response.agreement().where(), where -> {
                json.number("from_hz", where.from());
                json.number("to_hz", where.to());
            });
            json.array("third_octaves", response.bands(), band -> {
                bands().forEach(column -> json.cell(column.name(), column.cell().apply(band)));
                json.bool("agrees", band.agrees());
            });
            json.array(
                    "points",
                    response.points(),
                    point -> points().forEach(column ->
                            json.cell(column.name(), column.cell().apply(point))));
        });
    }

    /**
     * The points of all responses as one table.
     *
     * @param responses as compared
     * @return text, empty if there are none
     */
    static String csv(List<Compared> responses) {
        if (responses.isEmpty()) {
            return "";
        }
        List<String> head = new ArrayList<>(List.of("measurement", "of", "amplitude_unit"));
        points().forEach(column -> head.add(column.name()));
        List<List<String>> rows = new ArrayList<>();
        for (Compared response : responses) {
            for (Deviation point : response.points()) {
                List<String> row = new ArrayList<>(List.of(
                        response.measured().name(),
                        response.measured().of().word(),
                        response.measured().of() == Measurand.REJECTION
                                ? "1"
                                : response.measured().reading().unit()));
                points().forEach(column -> {
                    Cell cell = column.cell().apply(point);
                    row.add(cell.value().isPresent() ? Figures.full(cell.value().getAsDouble()) : "");
                });
                rows.add(row);
            }
        }
        return TableCsv.ofTexts(head, rows);
    }
}
