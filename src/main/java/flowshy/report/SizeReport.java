package flowshy.report;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.report.chart.several.SizeCharts;
import flowshy.study.NumberKey;
import flowshy.study.StudySizing;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.Limit;
import flowshy.verdict.figure.Sense;
import flowshy.verdict.size.Round;
import flowshy.verdict.size.Sized;
import flowshy.verdict.size.Sized.End;
import flowshy.verdict.size.Sized.VariableSlopes;
import flowshy.verdict.size.Slope;
import flowshy.verdict.size.Trial;
import flowshy.verdict.size.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** A sizing as text, JSON and CSV. */
public final class SizeReport {
    private SizeReport() {}

    /**
     * For a terminal.
     *
     * @param sizing the answer
     * @return text
     */
    public static String text(StudySizing sizing) {
        return new SizeText(sizing).page();
    }

    /**
     * As pictures: the rejection before and after.
     *
     * @param sizing the answer
     * @return empty where the numbers make no device
     */
    public static List<Chart> charts(StudySizing sizing) {
        String sized = sizing.numbers().size() == 1
                ? sizing.numbers().get(0).path() + " " + sizing.written(0).replaceFirst(" u", " µ")
                : "as sized";
        return sizing.answer()
                .map(answer -> SizeCharts.of(
                        sizing.study().title(), sizing.study().question().answer(), sized, answer))
                .orElse(List.of());
    }

    /**
     * As an object.
     *
     * @param json where to write
     * @param sizing the answer
     * @param charts drawn of it, their numbers are left out if there are none
     */
    public static void write(JsonPage json, StudySizing sizing, List<Chart> charts) {
        Sized sized = sizing.sized();
        Trial trial = sizing.trial();
        json.object(() -> {
            StudyJson.write(json, sizing.study());
            json.text("to", sizing.words().maximize() ? "maximize" : "minimize");
            json.text("figure", sizing.figure().word());
            json.bool("fits", sized.fits());
            json.bool("keeps", sizing.keeps());
            json.texts("undecided", sizing.undecided().stream().map(Limit::name).toList());
            json.text("hold", sizing.hold().word());
            json.text("finite_length", model(sizing));
            json.text("searched_by", sizing.search().word());
            json.cell(sizing.figure().column(), Cell.of(trial.objective(), reason(trial)));
            json.cell(
                    sizing.figure().column() + "_of_study",
                    Cell.of(sizing.base().objective(), reason(sizing.base())));
            json.array("numbers", indices(sizing.numbers().size()), i -> number(json, sizing, i));
            json.array("limits", indices(sizing.limits().size()), c -> limit(json, sizing, c));
            json.texts("not_judged", sizing.leftOut());
            CaveatJson.write(json, sizing.caveats());
            json.whole("trials", sized.trials());
            json.whole("solutions", sizing.agreement().solutions());
            json.bool("settled", sizing.agreement().settled());
            json.array("rounds", sizing.agreement().rounds(), round -> round(json, sizing, round));
            json.text("seed", Long.toString(sizing.words().seed()));
            ChartTables.write(json, charts);
        });
    }

    private static String reason(Trial trial) {
        return trial.there() ? "it has no finite value" : trial.reason();
    }

    private static String model(StudySizing sizing) {
        return sizing.study().device().hair().lengthModel().word();
    }

    private static void round(JsonPage json, StudySizing sizing, Round round) {
        for (int i = 0; i < sizing.numbers().size(); i++) {
            json.number(KeyNames.column(sizing.numbers().get(i)), round.values().get(i));
        }
        String figure = sizing.figure().column();
        json.cell(figure, Cell.of(round.solved().objective(), reason(round.solved())));
        json.cell(figure + "_expected", Cell.of(round.expected().objective(), reason(round.expected())));
        json.array("limits", indices(sizing.limits().size()), c -> {
            json.text("limit", sizing.limits().get(c).figure().word());
            json.cell("found", found(round.solved(), c));
            json.cell("expected", found(round.expected(), c));
        });
    }

    private static Cell found(Trial trial, int limit) {
        return trial.there() ? Cell.of(trial.found().get(limit), "it has no bound") : Cell.missing(trial.reason());
    }

    private static void number(JsonPage json, StudySizing sizing, int i) {
        NumberKey key = sizing.numbers().get(i);
        Variable range = sizing.sized().problem().variables().get(i);
        String column = KeyNames.column(key);
        json.text("key", key.path());
        json.text("written", sizing.written(i));
        json.number(column, sizing.values().get(i));
        json.number(column + "_of_study", key.base());
        json.number(column + "_from", range.from());
        json.number(column + "_to", range.to());
        json.bool("range_taken", sizing.taken().get(i));
        json.text(
                "range_end",
                switch (sizing.sized().ends().get(i)) {
                    case FROM -> "lower";
                    case TO -> "upper";
                    case INSIDE -> "none";
                });
        if (!sizing.sized().edges().get(i).isEmpty()) {
            json.text("no_device_beside", sizing.sized().edges().get(i));
        }
        if (!sizing.sized().slopes().isEmpty()) {
            VariableSlopes slopes = sizing.sized().slopes().get(i);
            slope(json, sizing.figure().column() + "_per_" + column, slopes.objective());
            for (int c = 0; c < sizing.limits().size(); c++) {
                slope(
                        json,
                        "limit_" + sizing.limits().get(c).figure().column() + "_per_" + column,
                        slopes.found().get(c));
            }
        }
    }

    private static void limit(JsonPage json, StudySizing sizing, int c) {
        FigureLimit limit = sizing.limits().get(c);
        Trial trial = sizing.trial();
        json.text("limit", limit.figure().word());
        json.text("sense", limit.sense().word());
        json.text("unit", limit.figure().unit().si());
        json.number("required", limit.value());
        json.cell("found", found(trial, c));
        if (sizing.estimated()) {
            json.cell("found_by_estimate", found(sizing.estimate(), c));
        }
        json.bool("keeps", trial.there() && limit.sense().keeps(trial.found().get(c), limit.value()));
        json.bool("binds", sizing.sized().binding().contains(c));
        if (sizing.sized().fits()) {
            slope(
                    json,
                    sizing.figure().column() + "_per_limit",
                    sizing.sized().prices().get(c));
        }
    }

    private static void slope(JsonPage json, String name, Slope slope) {
        OptionalDouble value = slope.value();
        json.cell(name, Cell.of(value, slope.remark()));
        if (value.isPresent() && !slope.remark().isEmpty()) {
            json.text(name + "_remark", slope.remark());
        }
    }

    private static List<Integer> indices(int count) {
        List<Integer> indices = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            indices.add(i);
        }
        return indices;
    }

    /**
     * As CSV: one row a number, the figure, and one row a limit.
     *
     * @param sizing the answer
     * @return text
     */
    public static String csv(StudySizing sizing) {
        List<List<String>> rows = new ArrayList<>();
        Trial trial = sizing.trial();
        for (int i = 0; i < sizing.numbers().size(); i++) {
            NumberKey key = sizing.numbers().get(i);
            Variable range = sizing.sized().problem().variables().get(i);
            rows.add(List.of(
                    "number",
                    key.path(),
                    key.dimension().siUnit(),
                    Figures.full(sizing.values().get(i)),
                    Figures.full(key.base()),
                    Figures.full(range.from()),
                    Figures.full(range.to()),
                    sizing.sized().ends().get(i) == End.INSIDE ? "no" : "yes"));
        }
        rows.add(List.of(
                "figure",
                sizing.figure().word(),
                sizing.figure().unit().si(),
                full(trial.objective()),
                full(sizing.base().objective()),
                "",
                "",
                ""));
        for (int c = 0; c < sizing.limits().size(); c++) {
            FigureLimit limit = sizing.limits().get(c);
            boolean least = limit.sense() == Sense.AT_LEAST;
            rows.add(List.of(
                    "limit",
                    limit.figure().word(),
                    limit.figure().unit().si(),
                    trial.there() ? full(trial.found().get(c)) : "",
                    sizing.base().there() ? full(sizing.base().found().get(c)) : "",
                    least ? Figures.full(limit.value()) : "",
                    least ? "" : Figures.full(limit.value()),
                    sizing.sized().binding().contains(c) ? "yes" : "no"));
        }
        return TableCsv.ofTexts(List.of("kind", "name", "unit", "value", "study", "from", "to", "binds"), rows);
    }

    private static String full(double value) {
        return Double.isFinite(value) ? Figures.full(value) : "";
    }
}
