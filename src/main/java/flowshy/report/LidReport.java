package flowshy.report;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.study.Study;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.DeviceFacts.Swing;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import flowshy.verdict.envelope.Shortfalls;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.lid.CoverRow;
import flowshy.verdict.lid.LidAnswer;
import flowshy.verdict.lid.LidQuestion;
import flowshy.verdict.lid.RequiredAttenuation;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The lid decision as text, JSON and CSV. */
public final class LidReport {
    /** Begins the name of a column of the worst state. */
    private static final String WORST = "worst_";

    /** What a state does to a fill. */
    public static final String FILLED =
            "A can with a fill of its own stays as it was filled: a gas keeps its density, a liquid its"
                    + " pressure. A closed cover without a fill of its own holds what is outside.";

    private static final String NO_BOUND = "no flow enters: the rejection has no bound";
    private static final String NOTHING = "the hair is as dense as the fluid carried with it: it reads nothing";
    private static final String NO_SUSPENSION = "no suspension is stated that holds the hair";
    private static final String NO_SURROUNDINGS = "no surroundings are given";
    private static final String NO_MOTION = "the fluid carried along leaves no motion to read";

    private LidReport() {}

    /**
     * What each cover does, column by column.
     *
     * @param answer what was found
     * @return columns in the order of the file; those of the worst state only where there is an envelope
     */
    public static List<Column<CoverRow>> columns(LidAnswer answer) {
        return all().stream()
                .filter(column -> answer.worst().isPresent() || !column.name().startsWith(WORST))
                .toList();
    }

    private static List<Column<CoverRow>> all() {
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
                        WORST + "least_rejection_db",
                        "worst",
                        "dB",
                        4,
                        row -> Cell.of(row.lowest().map(AtState::value).orElse(Double.NaN), unbounded(row))),
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
                        WORST + "error_rms_m_s2",
                        "worst",
                        "m/s2",
                        3,
                        row -> Cell.of(row.largestError().map(AtState::value).orElse(Double.NaN), NO_SURROUNDINGS)),
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
        answer.worst().ifPresent(over -> {
            EnvelopeReport.states(page, over.bare());
            page.paragraph(FILLED);
        });
        page.heading("Bare");
        page.paragraph(bare(answer));
        page.heading("Attenuation a cover must give for a margin of "
                + Figures.of(question.acceptance().margin(), 4) + " dB");
        page.table(required(answer), points(answer), point -> false);
        answer.worst().ifPresent(over -> page.paragraph(worstAt(over)));
        if (answer.requiredError().isPresent()) {
            page.paragraph("For the error limit: "
                    + Figures.of(answer.requiredError().getAsDouble(), 4)
                    + " dB over the band, at the operating point of the bare hair"
                    + answer.worst()
                            .flatMap(LidAnswer.OverStates::error)
                            .map(most -> "; worst " + Figures.of(most.value(), 4) + " dB at " + most.words())
                            .orElse("")
                    + ".");
        }
        page.heading("Covers");
        page.paragraph((study.candidates().isEmpty() ? "No candidates are stated: usual covers are taken. " : "")
                + "from, to, least: rejection at the ends of the band and where it is least. error, offset: of the surroundings, as acceleration. sens.: sensitivity"
                + " against the"
                + " bare device, noise: thermal, both at " + Figures.of(answer.reference(), 4) + " Hz."
                + (answer.worst().isPresent()
                        ? " worst: least rejection, and largest error, of all states; the rest at the study's own state."
                        : ""));
        List<String> names = new ArrayList<>();
        for (CoverRow row : answer.covers()) {
            names.add(row.candidate().cover().words() + ", in "
                    + row.candidate().around().name());
        }
        page.namedTable(
                "cover",
                names,
                columns(answer).stream()
                        .filter(column -> !column.name().endsWith("percent"))
                        .filter(column -> answer.bare().error().isPresent()
                                ? !column.name().matches("rejection_.*")
                                : !column.name().matches(".*error.*|offset.*"))
                        .toList(),
                answer.covers());
        for (int i = 0; i < names.size(); i++) {
            CoverRow row = answer.covers().get(i);
            page.line("");
            page.note(
                    names.get(i) + ":",
                    (row.misses().isEmpty()
                                    ? "meets every limit that can be judged."
                                    : String.join("; ", row.misses()) + ".")
                            + overStates(row));
            row.warnings()
                    .forEach(warning -> page.note("  [warning]", warning.endsWith(".") ? warning : warning + "."));
        }
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    /**
     * The bare device in words.
     *
     * @param answer what was found
     * @return sentences, with an envelope its worst first
     */
    public static String bare(LidAnswer answer) {
        return Shortfalls.of(answer.bare(), answer.worst().map(LidAnswer.OverStates::bare))
                .verdict()
                .sentence();
    }

    /**
     * The worst of a cover over the envelope, and how it comes out at the study's own state.
     *
     * @param row one of the covers
     * @return sentences with a blank before them, empty without an envelope
     */
    public static String overStates(CoverRow row) {
        if (row.envelope().isEmpty()) {
            return "";
        }
        String rejection = row.lowest()
                .map(least -> " Least rejection of all states " + Figures.of(least.value(), 4) + " dB at "
                        + least.words() + ".")
                .orElse("");
        String error = row.largestError()
                .filter(most -> most.value() > 0.0)
                .map(most -> " Largest error " + Figures.of(most.value(), 3) + " m/s2 at " + most.words() + ".")
                .orElse("");
        return rejection + error + " At the study's own state: "
                + row.answer().verdict().decision().word() + ".";
    }

    /**
     * In which states the attenuation asked is largest, in words.
     *
     * @param over what the states ask
     * @return one clause a run of frequencies
     */
    public static String worstAt(LidAnswer.OverStates over) {
        List<String> runs = new ArrayList<>();
        List<AtState> points = over.required();
        int first = 0;
        while (first < points.size()) {
            AtState point = points.get(first);
            int last = first;
            while (last + 1 < points.size() && points.get(last + 1).state().equals(point.state())) {
                last++;
            }
            String from = Figures.of(point.frequency().orElseThrow(), 4);
            String to = Figures.of(points.get(last).frequency().orElseThrow(), 4);
            boolean asks = points.subList(first, last + 1).stream().anyMatch(one -> one.value() > 0.0);
            if (!asks) {
                first = last + 1;
                continue;
            }
            runs.add((first == last ? "at " + from : "from " + from + " to " + to) + " Hz it is " + point.words());
            first = last + 1;
        }
        return runs.isEmpty() ? "No state asks for any." : "The state that asks most: " + String.join("; ", runs) + ".";
    }

    /**
     * What a cover must give at one frequency.
     *
     * @param own at the study's own state
     * @param worst of all states, empty without an envelope
     */
    public record Demand(RequiredAttenuation own, Optional<AtState> worst) {}

    /**
     * The attenuation a cover must give, frequency by frequency.
     *
     * @param answer what was found
     * @return in its order
     */
    public static List<Demand> points(LidAnswer answer) {
        List<Demand> points = new ArrayList<>();
        for (int i = 0; i < answer.required().size(); i++) {
            int at = i;
            points.add(new Demand(
                    answer.required().get(i),
                    answer.worst().map(over -> over.required().get(at))));
        }
        return points;
    }

    /**
     * The columns of the attenuation a cover must give.
     *
     * @param answer what was found
     * @return two columns, with an envelope three
     */
    public static List<Column<Demand>> required(LidAnswer answer) {
        List<Column<Demand>> columns = new ArrayList<>(List.of(
                new Column<>(
                        "frequency_hz",
                        "freq.",
                        "Hz",
                        5,
                        point -> Cell.of(point.own().frequency(), "")),
                new Column<>(
                        "attenuation_db",
                        "attenuation",
                        "dB",
                        4,
                        point -> Cell.of(point.own().attenuation(), NO_MOTION))));
        if (answer.worst().isPresent()) {
            columns.add(new Column<>(
                    WORST + "attenuation_db",
                    "worst",
                    "dB",
                    4,
                    point -> Cell.of(point.worst().orElseThrow().value(), NO_MOTION)));
        }
        return columns;
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
                json.array("rejection", points(answer), point -> {
                    required(answer)
                            .forEach(column ->
                                    json.cell(column.name(), column.cell().apply(point)));
                    point.worst().ifPresent(most -> json.text("worst_state", most.state()));
                });
                json.cell("error_db", Cell.of(answer.requiredError(), NO_SURROUNDINGS));
                answer.worst().flatMap(LidAnswer.OverStates::error).ifPresent(most -> {
                    json.cell("worst_error_db", Cell.of(most.value(), NO_MOTION));
                    json.text("worst_error_state", most.state());
                });
            });
            answer.worst().ifPresent(over -> EnvelopeReport.write(json, over.bare()));
            json.array("covers", answer.covers(), row -> {
                json.text("cover", row.candidate().cover().kind());
                json.text("words", row.candidate().cover().words());
                json.text("medium", row.candidate().around().name());
                columns(answer)
                        .forEach(
                                column -> json.cell(column.name(), column.cell().apply(row)));
                json.texts("misses", row.misses());
                json.texts("warnings", row.warnings());
                json.text("decision", row.verdict().decision().word());
                row.envelope().ifPresent(found -> {
                    json.text("own_decision", row.answer().verdict().decision().word());
                    EnvelopeReport.write(json, found);
                });
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
        columns(answer).forEach(column -> head.add(column.name()));
        if (answer.worst().isPresent()) {
            head.addAll(List.of("worst_least_rejection_state", "worst_error_state", "decision"));
        }
        List<List<String>> lines = new ArrayList<>();
        for (CoverRow row : answer.covers()) {
            List<String> line = new ArrayList<>(List.of(row.candidate().cover().words()));
            columns(answer).forEach(column -> {
                Cell cell = column.cell().apply(row);
                line.add(cell.value().isPresent() ? Figures.full(cell.value().getAsDouble()) : "");
            });
            if (answer.worst().isPresent()) {
                line.add(row.lowest().map(AtState::state).orElse(""));
                line.add(row.largestError().map(AtState::state).orElse(""));
                line.add(row.verdict().decision().word());
            }
            lines.add(line);
        }
        return TableCsv.ofTexts(head, lines);
    }
}
