package flowshy.report;

import flowshy.math.Figures;
import flowshy.medium.Medium;
import flowshy.report.chart.Chart;
import flowshy.stream.cover.OpenCover;
import flowshy.study.Study;
import flowshy.verdict.fill.FillQuestion;
import flowshy.verdict.fill.FillRow;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.util.FastMath;

/** Every fill, bare and sealed, as text, JSON and CSV. */
public final class FillReport {
    private static final String NO_BOUND = "no flow enters: the rejection has no bound";
    private static final String NOTHING = "the device reads nothing, or the fluid is refused at this state";
    private static final String NO_SUSPENSION = "no suspension is stated that holds the hair";
    private static final String REFUSED = "the fluid is refused at this state";

    private FillReport() {}

    private static List<Column<FillRow>> columns() {
        return List.of(
                new Column<>(
                        "rejection_db",
                        "reject.",
                        "dB",
                        4,
                        row -> Cell.of(
                                row.rejection(), row.rejection() == Double.POSITIVE_INFINITY ? NO_BOUND : NOTHING)),
                new Column<>("at_hz", "at", "Hz", 4, row -> Cell.of(row.at(), "it belongs to no single frequency")),
                new Column<>("resonance_hz", "reson.", "Hz", 4, row -> Cell.of(row.resonance(), NO_SUSPENSION)),
                new Column<>("quality", "Q", "", 3, row -> Cell.of(row.quality(), NO_SUSPENSION)),
                new Column<>(
                        "sensitivity_change_db",
                        "sens.",
                        "dB",
                        3,
                        row -> Cell.of(20.0 * FastMath.log10(row.sensitivity()), NOTHING)),
                new Column<>(
                        "thermal_noise_m_s2_per_rthz",
                        "noise",
                        "m/s2/rtHz",
                        3,
                        row -> Cell.of(row.thermalNoise(), NO_SUSPENSION)),
                new Column<>(
                        "density_kg_m3",
                        "density",
                        "kg/m3",
                        4,
                        row -> Cell.of(row.medium().map(Medium::density).orElse(Double.NaN), REFUSED)),
                new Column<>(
                        "viscosity_pa_s",
                        "viscosity",
                        "Pa.s",
                        3,
                        row -> Cell.of(row.medium().map(Medium::viscosity).orElse(Double.NaN), REFUSED)));
    }

    /**
     * For a terminal.
     *
     * @param study base study
     * @param question what was asked
     * @param rows the answer
     * @return text
     */
    public static String text(Study study, FillQuestion question, List<FillRow> rows) {
        TextPage page = new TextPage();
        page.line("Flowshy " + Version.number() + "   fill   " + study.origin().file());
        if (!study.title().isEmpty()) {
            page.line(study.title());
        }
        study.origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.paragraph("The study's device in every fill at "
                + Figures.of(question.device().outside().temperature() - 273.15, 4) + " degC, "
                + Figures.of(question.device().outside().pressure() / 1000.0, 6)
                + " kPa. Bare: standing in the fluid. Sealed: the fluid is carried along, no flow enters. Other covers: standing in the fluid under them. Rejection: the least over "
                + Figures.of(question.band().from(), 4) + " Hz to "
                + Figures.of(question.band().to(), 4)
                + " Hz. Sensitivity against the study's own device and thermal noise, both at "
                + Figures.of(question.reference(), 4)
                + " Hz. Stiffness and structural damping are held. Strip theory throughout.");
        part(
                page,
                "Nothing speaks against",
                rows.stream().filter(row -> row.excluded().isEmpty()).toList());
        part(
                page,
                "Excluded",
                rows.stream()
                        .filter(row -> !row.excluded().isEmpty() && row.medium().isPresent())
                        .toList());
        List<FillRow> refused = rows.stream()
                .filter(row -> row.medium().isEmpty()
                        && row.cover().equals(question.covers().get(0)))
                .toList();
        if (!refused.isEmpty()) {
            page.heading("Refused at this state");
            refused.forEach(row -> page.row(row.fill(), String.join("; ", row.excluded())));
        }
        if (rows.stream().anyMatch(FillRow::fromMemory)) {
            page.line("");
            page.paragraph(
                    "m: density or viscosity is recalled from memory; confirm it before the choice rests on it.");
        }
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    private static void part(TextPage page, String head, List<FillRow> rows) {
        if (rows.isEmpty()) {
            return;
        }
        page.heading(head);
        List<String> names = new ArrayList<>();
        for (FillRow row : rows) {
            names.add(row.fill() + ", "
                    + (row.cover() instanceof OpenCover ? "bare" : row.cover().words())
                    + (row.fromMemory() ? " m" : ""));
        }
        List<Column<FillRow>> printed = columns().stream()
                .filter(column -> !column.name().startsWith("at_")
                        && !column.name().endsWith("_s")
                        && !column.name().startsWith("density"))
                .toList();
        page.namedTable("fill", names, printed, rows);
        Map<String, List<String>> reasons = new LinkedHashMap<>();
        for (int i = 0; i < rows.size(); i++) {
            for (String reason : rows.get(i).excluded()) {
                reasons.computeIfAbsent(reason, key -> new ArrayList<>()).add(names.get(i));
            }
        }
        reasons.forEach((reason, fluids) -> page.note(reason + ":", String.join("; ", fluids)));
    }

    /**
     * As an object.
     *
     * @param json where to write
     * @param study base study
     * @param question what was asked
     * @param rows the answer
     * @param charts drawn of it, their numbers are left out if there are none
     */
    public static void write(
            JsonPage json, Study study, FillQuestion question, List<FillRow> rows, List<Chart> charts) {
        json.object(() -> {
            StudyJson.write(json, study);
            json.number("temperature_k", question.device().outside().temperature());
            json.number("pressure_pa", question.device().outside().pressure());
            json.number("reference_hz", question.reference());
            json.array("fills", rows, row -> {
                json.text("fill", row.fill());
                json.text("cover", row.cover().kind());
                json.text("cover_words", row.cover().words());
                columns()
                        .forEach(
                                column -> json.cell(column.name(), column.cell().apply(row)));
                json.texts("excluded", row.excluded());
                json.bool("from_memory", row.fromMemory());
            });
            ChartTables.write(json, charts);
        });
    }

    /**
     * As CSV.
     *
     * @param rows the answer
     * @return text
     */
    public static String csv(List<FillRow> rows) {
        List<String> head = new ArrayList<>(List.of("fill", "cover"));
        columns().forEach(column -> head.add(column.name()));
        head.add("excluded");
        List<List<String>> lines = new ArrayList<>();
        for (FillRow row : rows) {
            List<String> line = new ArrayList<>(List.of(row.fill(), row.cover().words()));
            columns().forEach(column -> {
                Cell cell = column.cell().apply(row);
                line.add(cell.value().isPresent() ? Figures.full(cell.value().getAsDouble()) : "");
            });
            line.add(String.join("; ", row.excluded()));
            lines.add(line);
        }
        return TableCsv.ofTexts(head, lines);
    }
}
