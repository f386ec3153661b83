package flowshy.report;

import flowshy.math.Figures;
import flowshy.medium.Medium;
import flowshy.report.chart.Chart;
import flowshy.study.Study;
import flowshy.verdict.Decision;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.fill.FillAnswer;
import flowshy.verdict.fill.FillQuestion;
import flowshy.verdict.fill.FillRow;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** Every fill, bare and sealed, as text, JSON and CSV. */
public final class FillReport {
    private static final String NO_BOUND = "no flow enters: the rejection has no bound";
    private static final String NOTHING = "the device reads nothing, or the fluid is refused at this state";
    private static final String NO_SUSPENSION = "no suspension is stated that holds the hair";
    private static final String NO_SURROUNDINGS =
            "no surroundings are given, or they cannot be worked out in this fluid";
    private static final String ERROR = "error_rms_m_s2";

    /** Begins the name of a column of the worst state. */
    private static final String WORST = "worst_";

    private static final String REFUSED = "the fluid is refused at this state";

    private FillReport() {}

    /** Error and offset only where there are flows, the worst state only where there is an envelope. */
    private static List<Column<FillRow>> columns(List<FillRow> rows) {
        boolean flows = rows.stream().anyMatch(row -> budget(row).isPresent());
        boolean states = rows.stream().anyMatch(FillReport::enveloped);
        return columns().stream()
                .filter(column -> flows
                        || !(column.name().endsWith(ERROR) || column.name().startsWith("offset")))
                .filter(column -> states || !column.name().startsWith(WORST))
                .toList();
    }

    private static boolean enveloped(FillRow row) {
        return row.judged().flatMap(FillRow.Judged::envelope).isPresent();
    }

    private static Optional<ErrorBudget> budget(FillRow row) {
        return row.judged().flatMap(judged -> judged.own().error());
    }

    private static List<Column<FillRow>> columns() {
        return List.of(
                new Column<>(
                        "rejection_db",
                        "reject.",
                        "dB",
                        4,
                        row -> Cell.of(
                                row.rejection(), row.rejection() == Double.POSITIVE_INFINITY ? NO_BOUND : NOTHING)),
                new Column<>(
                        WORST + "rejection_db",
                        "worst",
                        "dB",
                        4,
                        row -> Cell.of(
                                row.lowest().map(AtState::value).orElse(Double.NaN),
                                row.rejection() == Double.POSITIVE_INFINITY ? NO_BOUND : NOTHING)),
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
                        ERROR,
                        "error",
                        "m/s2",
                        3,
                        row -> Cell.of(budget(row).map(ErrorBudget::rms).orElse(Double.NaN), NO_SURROUNDINGS)),
                new Column<>(
                        WORST + ERROR,
                        "worst",
                        "m/s2",
                        3,
                        row -> Cell.of(row.largestError().map(AtState::value).orElse(Double.NaN), NO_SURROUNDINGS)),
                new Column<>(
                        "offset_m_s2",
                        "offset",
                        "m/s2",
                        3,
                        row -> Cell.of(budget(row).map(ErrorBudget::offset).orElse(Double.NaN), NO_SURROUNDINGS)),
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
     * @param answer what was found
     * @return text
     */
    public static String text(Study study, FillQuestion question, FillAnswer answer) {
        List<FillRow> rows = answer.rows();
        boolean asked = answer.decision() != Decision.NOT_ASKED;
        TextPage page = new TextPage();
        page.line("Flowshy " + Version.number() + "   fill   " + study.origin().file());
        if (!study.title().isEmpty()) {
            page.line(study.title());
        }
        study.origin().settings().forEach(setting -> page.line("with --set " + setting));
        if (asked) {
            page.heading("Decision: " + answer.decision().word());
            page.paragraph(answer.sentence());
            page.line("");
        }
        page.paragraph("The study's device in every fill at "
                + Figures.of(question.base().device().outside().temperature() - 273.15, 4) + " degC, "
                + Figures.of(question.base().device().outside().pressure() / 1000.0, 6)
                + " kPa. Bare: standing in the fluid. Sealed: the fluid is carried along, no flow enters. Other covers: standing in the fluid under them. Rejection: the least over "
                + Figures.of(question.base().band().from(), 4) + " Hz to "
                + Figures.of(question.base().band().to(), 4)
                + " Hz. Sensitivity against the study's own device and thermal noise, both at "
                + Figures.of(question.base().reference(), 4)
                + " Hz. Stiffness and structural damping are held."
                + scope(question));
        question.base()
                .envelope()
                .ifPresent(all -> rows.stream()
                        .flatMap(row -> row.judged().stream())
                        .flatMap(judged -> judged.envelope().stream())
                        .findFirst()
                        .ifPresent(found -> EnvelopeReport.states(page, found)));
        part(
                page,
                asked ? "Meets every limit" : "Nothing speaks against",
                rows.stream().filter(FillRow::fit).toList());
        part(
                page,
                "Misses a limit",
                rows.stream()
                        .filter(row -> row.excluded().isEmpty() && !row.misses().isEmpty())
                        .toList());
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

    private static String scope(FillQuestion question) {
        String flows = question.base().sources().isEmpty()
                ? ""
                : " The surroundings flow in every fluid with the speeds of the study, sound with its pressure; error: theirs, as"
                        + " acceleration, rms over the band.";
        String states = question.base().envelope().isEmpty()
                ? ""
                : " Over the envelope a closed can keeps what was filled in at that state: a gas its density, a liquid its pressure;"
                        + " any other fluid has the temperature and pressure of each state. worst: least rejection, and largest"
                        + " error, of all states; the rest at the study's own state.";
        return flows + states;
    }

    private static void part(TextPage page, String head, List<FillRow> rows) {
        if (rows.isEmpty()) {
            return;
        }
        page.heading(head);
        List<String> names = new ArrayList<>();
        for (FillRow row : rows) {
            names.add(row.words() + (row.fromMemory() ? " m" : ""));
        }
        List<Column<FillRow>> printed = columns(rows).stream()
                .filter(column -> !column.name().startsWith("at_")
                        && !column.name().endsWith("_pa_s")
                        && !column.name().startsWith("offset")
                        && !column.name().startsWith("density"))
                .toList();
        page.namedTable("fill", names, printed, rows);
        Map<String, List<String>> states = new LinkedHashMap<>();
        for (int i = 0; i < rows.size(); i++) {
            FillRow row = rows.get(i);
            String name = names.get(i);
            if (row.excluded().isEmpty() && !row.misses().isEmpty()) {
                page.note(name + ":", String.join("; ", row.misses()) + ".");
            } else if (row.excluded().isEmpty()) {
                row.lowest()
                        .ifPresent(least -> states.computeIfAbsent(
                                        "Least rejection at " + least.words(), key -> new ArrayList<>())
                                .add(name));
                row.largestError()
                        .filter(most -> most.value() > 0.0)
                        .ifPresent(most -> states.computeIfAbsent(
                                        "Largest error at " + most.words(), key -> new ArrayList<>())
                                .add(name));
            }
        }
        states.forEach((state, fluids) -> page.note(state + ":", String.join("; ", fluids) + "."));
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
     * @param answer what was found
     * @param charts drawn of it, their numbers are left out if there are none
     */
    public static void write(JsonPage json, Study study, FillQuestion question, FillAnswer answer, List<Chart> charts) {
        List<FillRow> rows = answer.rows();
        json.object(() -> {
            StudyJson.write(json, study);
            json.number("temperature_k", question.base().device().outside().temperature());
            json.number("pressure_pa", question.base().device().outside().pressure());
            json.number("reference_hz", question.base().reference());
            json.array("fills", rows, row -> {
                json.text("fill", row.fill());
                json.text("cover", row.cover().kind());
                json.text("cover_words", row.cover().words());
                columns(rows)
                        .forEach(
                                column -> json.cell(column.name(), column.cell().apply(row)));
                json.texts("excluded", row.excluded());
                json.bool("from_memory", row.fromMemory());
                row.judged().ifPresent(judged -> {
                    json.text("decision", row.decision().word());
                    json.texts("misses", row.misses());
                    json.array("limits", judged.verdict().limits(), limit -> LimitJson.write(json, limit));
                    judged.envelope().ifPresent(found -> EnvelopeReport.write(json, found));
                });
            });
            json.object("verdict", () -> {
                json.text("decision", answer.decision().word());
                json.text("sentence", answer.sentence());
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
        columns(rows).forEach(column -> head.add(column.name()));
        head.addAll(List.of("excluded", "decision", "misses"));
        boolean states = rows.stream().anyMatch(FillReport::enveloped);
        if (states) {
            head.addAll(List.of("worst_rejection_state", "worst_error_state"));
        }
        List<List<String>> lines = new ArrayList<>();
        for (FillRow row : rows) {
            List<String> line = new ArrayList<>(List.of(row.fill(), row.cover().words()));
            columns(rows).forEach(column -> {
                Cell cell = column.cell().apply(row);
                line.add(cell.value().isPresent() ? Figures.full(cell.value().getAsDouble()) : "");
            });
            line.add(String.join("; ", row.excluded()));
            line.add(row.judged().isPresent() ? row.decision().word() : "");
            line.add(String.join("; ", row.misses()));
            if (states) {
                line.add(row.lowest().map(AtState::state).orElse(""));
                line.add(row.largestError().map(AtState::state).orElse(""));
            }
            lines.add(line);
        }
        return TableCsv.ofTexts(head, lines);
    }
}
