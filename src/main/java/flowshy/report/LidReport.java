package flowshy.report;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.study.Study;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.DeviceFacts.Swing;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.lid.CoverRow;
import flowshy.verdict.lid.LidAnswer;
import flowshy.verdict.lid.LidQuestion;
import flowshy.verdict.lid.RequiredAttenuation;
import java.util.ArrayList;
import java.util.List;

/** The lid decision as text, JSON and CSV. */
public final class LidReport {
    private static final String NO_BOUND = "no flow enters: the rejection has no bound";
    private static final String NOTHING = "the hair is as dense as the fluid carried with it: it reads nothing";
    private static final String NO_SUSPENSION = "no suspension is stated that holds the hair";
    private static final String NO_SURROUNDINGS = "no surroundings are given";
    private static final String NO_MOTION = "the fluid carried along leaves no motion to read";

    private LidReport() {}

    /**
     * What each cover does, column by column.
     *
     * @return columns in the order of the file
     */
    public static List<Column<CoverRow>> columns() {
        return List.of(
                new Column<>("rejection_from_db", "from", "dB", 4, row -> Cell.of(edge(row, false), unbounded(row))),
                new Column<>("rejection_to_db", "to", "dB", 4, row -> Cell.of(edge(row, true), unbounded(row))),
                new Column<>(
                        "least_rejection_db",
                        "least",
                        "dB",
                        4,
                        row -> Cell.of(
                                row.answer()
                                        .least()
                                        .map(BandsAnswer.Extreme::rejection)
                                        .orElse(Double.NaN),
                                unbounded(row))),
                new Column<>(
                        "resonance_hz",
                        "reson.",
                        "Hz",
                        4,
                        row -> Cell.of(
                                row.answer()
                                        .facts()
                                        .medium()
                                        .map(Swing::resonance)
                                        .orElse(Double.NaN),
                                NO_SUSPENSION)),
                new Column<>(
                        "quality",
                        "Q",
                        "",
                        3,
                        row -> Cell.of(
                                row.answer()
                                        .facts()
                                        .medium()
                                        .map(s -> s.decay().quality())
                                        .orElse(Double.NaN),
                                NO_SUSPENSION)),
                new Column<>(
                        "error_rms_m_s2",
                        "error",
                        "m/s2",
                        3,
                        row -> Cell.of(
                                row.answer().error().map(ErrorBudget::rms).orElse(Double.NaN), NO_SURROUNDINGS)),
                new Column<>(
                        "offset_m_s2",
                        "offset",
                        "m/s2",
                        3,
                        row -> Cell.of(
                                row.answer().error().map(ErrorBudget::offset).orElse(Double.NaN), NO_SURROUNDINGS)),
                new Column<>(
                        "sensitivity_change_percent",
                        "sens.",
                        "%",
                        3,
                        row -> Cell.of(row.change().percent(), NO_MOTION)),
                new Column<>(
                        "sensitivity_change_db",
                        "sens.",
                        "dB",
                        3,
                        row -> Cell.of(row.change().level(), NO_MOTION)),
                new Column<>(
                        "thermal_noise_m_s2_per_rthz",
                        "noise",
                        "m/s2/rtHz",
                        3,
                        row -> Cell.of(row.reference().thermalNoise(), NO_SUSPENSION)));
    }

    private static String unbounded(CoverRow row) {
        return row.answer().bands().get(0).reads() == Reads.NOTHING ? NOTHING : NO_BOUND;
    }

    private static double edge(CoverRow row, boolean upper) {
        List<ReadingBand> bands = row.answer().bands();
        return upper ? bands.get(bands.size() - 1).rejectionTo() : bands.get(0).rejectionFrom();
    }

    /**
     * For a terminal.
     *
     * @param study base study
     * @param question what was asked
     * @param answer what was found
     * @return text
     */
    public static String text(Study study, LidQuestion question, LidAnswer answer) {
        TextPage page = new TextPage();
        page.line("Flowshy " + Version.number() + "   lid   " + study.origin().file());
        if (!study.title().isEmpty()) {
            page.line(study.title());
        }
        study.origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.heading("Decision: " + answer.verdict().decision().word());
        page.paragraph(answer.verdict().sentence());
        for (String remedy : answer.remedies()) {
            page.note("-", remedy);
        }
        page.heading("Bare");
        page.paragraph(answer.bare().verdict().sentence());
        page.heading("Attenuation a cover must give for a margin of "
                + Figures.of(question.acceptance().margin(), 4) + " dB");
        page.table(required(), answer.required(), point -> false);
        if (answer.requiredError().isPresent()) {
            page.paragraph(
                    "For the error limit: " + Figures.of(answer.requiredError().getAsDouble(), 4)
                            + " dB over the band, at the operating point of the bare hair.");
        }
        page.heading("Covers");
        page.paragraph((study.candidates().isEmpty() ? "No candidates are stated: usual covers are taken. " : "")
                + "from, to, least: rejection at the ends of the band and where it is least. error, offset: of the surroundings, as acceleration. sens.: sensitivity"
                + " against the"
                + " bare device, noise: thermal, both at " + Figures.of(answer.reference(), 4) + " Hz.");
        List<String> names = new ArrayList<>();
        for (CoverRow row : answer.covers()) {
            names.add(row.candidate().cover().words() + ", in "
                    + row.candidate().around().name());
        }
        page.namedTable(
                "cover",
                names,
                columns().stream()
                        .filter(column -> !column.name().endsWith("percent"))
                        .filter(column -> answer.bare().error().isPresent()
                                ? !column.name().matches("rejection_.*")
                                : !column.name().matches("error.*|offset.*"))
                        .toList(),
                answer.covers());
        for (int i = 0; i < names.size(); i++) {
            CoverRow row = answer.covers().get(i);
            page.line("");
            page.note(
                    names.get(i) + ":",
                    row.misses().isEmpty()
                            ? "meets every limit that can be judged."
                            : String.join("; ", row.misses()) + ".");
            row.warnings()
                    .forEach(warning -> page.note("  [warning]", warning.endsWith(".") ? warning : warning + "."));
        }
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    /**
     * The attenuation a cover must give, by frequency.
     *
     * @return two columns
     */
    public static List<Column<RequiredAttenuation>> required() {
        return List.of(
                new Column<>("frequency_hz", "freq.", "Hz", 5, point -> Cell.of(point.frequency(), "")),
                new Column<>(
                        "attenuation_db", "attenuation", "dB", 4, point -> Cell.of(point.attenuation(), NO_MOTION)));
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
    public static void write(JsonPage json, Study study, LidQuestion question, LidAnswer answer, List<Chart> charts) {
        json.object(() -> {
            StudyJson.write(json, study);
            json.number("margin_db", question.acceptance().margin());
            json.number("reference_hz", answer.reference());
            json.object("required", () -> {
                json.array(
                        "rejection",
                        answer.required(),
                        point -> required()
                                .forEach(column ->
                                        json.cell(column.name(), column.cell().apply(point))));
                json.cell("error_db", Cell.of(answer.requiredError(), NO_SURROUNDINGS));
            });
            json.array("covers", answer.covers(), row -> {
                json.text("cover", row.candidate().cover().kind());
                json.text("words", row.candidate().cover().words());
                json.text("medium", row.candidate().around().name());
                columns()
                        .forEach(
                                column -> json.cell(column.name(), column.cell().apply(row)));
                json.texts("misses", row.misses());
                json.texts("warnings", row.warnings());
                json.text("decision", row.answer().verdict().decision().word());
            });
            json.object("verdict", () -> {
                json.text("decision", answer.verdict().decision().word());
                json.text("sentence", answer.verdict().sentence());
                json.text(
                        "chosen",
                        answer.chosen()
                                .map(row -> row.candidate().cover().words())
                                .orElse(""));
                json.texts("remedies", answer.remedies());
            });
            ChartTables.write(json, charts);
        });
    }

    /**
     * The covers as CSV.
     *
     * @param answer what was found
     * @return text
     */
    public static String csv(LidAnswer answer) {
        List<String> head = new ArrayList<>(List.of("cover"));
        columns().forEach(column -> head.add(column.name()));
        List<List<String>> lines = new ArrayList<>();
        for (CoverRow row : answer.covers()) {
            List<String> line = new ArrayList<>(List.of(row.candidate().cover().words()));
            columns().forEach(column -> {
                Cell cell = column.cell().apply(row);
                line.add(cell.value().isPresent() ? Figures.full(cell.value().getAsDouble()) : "");
            });
            lines.add(line);
        }
        return TableCsv.ofTexts(head, lines);
    }
}
