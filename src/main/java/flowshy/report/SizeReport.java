package flowshy.report;

import flowshy.math.Figures;
import flowshy.study.NumberKey;
import flowshy.study.StudySizing;
import flowshy.study.units.WrittenUnit;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.FigureUnit;
import flowshy.verdict.figure.Sense;
import flowshy.verdict.size.Sized;
import flowshy.verdict.size.Sized.End;
import flowshy.verdict.size.Sized.VariableSlopes;
import flowshy.verdict.size.Slope;
import flowshy.verdict.size.Trial;
import flowshy.verdict.size.Variable;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/** A sizing as text, JSON and CSV. */
public final class SizeReport {
    private static final String NONE = "no place that was tried makes a device";

    private SizeReport() {}

    /**
     * For a terminal.
     *
     * @param sizing the answer
     * @return text
     */
    public static String text(StudySizing sizing) {
        TextPage page = new TextPage();
        page.line("Flowshy " + Version.number() + "   size   "
                + sizing.study().origin().file());
        if (!sizing.study().title().isEmpty()) {
            page.line(sizing.study().title());
        }
        sizing.study().origin().settings().forEach(setting -> page.line("with --set " + setting));
        asked(page, sizing);
        answer(page, sizing);
        if (sizing.sized().fits()) {
            sensitivity(page, sizing);
        }
        sizing.caveats().forEach(caveat -> page.note("[" + caveat.weight().words() + "]", caveat.text()));
        page.heading("How it was found");
        page.paragraph("Tried " + sizing.sized().trials() + " choices, seed "
                + sizing.words().seed()
                + ". The numbers are rounded to the side that keeps the limits. The same device in full: bands with");
        for (int i = 0; i < sizing.numbers().size(); i++) {
            page.line("    --set '" + sizing.numbers().get(i).path() + "=" + sizing.written(i) + "'");
        }
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    private static void asked(TextPage page, StudySizing sizing) {
        page.heading("Size for the " + (sizing.words().maximize() ? "largest " : "least ")
                + sizing.figure().word());
        page.row(
                sizing.words().maximize() ? "maximize" : "minimize",
                sizing.figure().words());
        for (int i = 0; i < sizing.numbers().size(); i++) {
            Variable range = sizing.sized().problem().variables().get(i);
            page.row(
                    i == 0 ? "vary" : "",
                    range.name() + " from " + number(sizing, i, range.from()) + " to " + number(sizing, i, range.to())
                            + (sizing.taken().get(i) ? " (taken; state one with --within)" : ""));
        }
        for (int c = 0; c < sizing.limits().size(); c++) {
            page.row(c == 0 ? "keep" : "", limit(sizing.limits().get(c)));
        }
        if (sizing.limits().isEmpty()) {
            page.row("keep", "nothing: the study states no limit under accept that can be judged");
        }
        sizing.leftOut().forEach(reason -> page.row("not judged", reason));
        if (sizing.study().device().suspension().isPresent()) {
            page.row("suspension", "its " + sizing.hold().word() + " is held");
        }
        page.row("finite-length", sizing.model().word() + " (" + sizing.model().words() + ")");
    }

    private static String limit(FigureLimit limit) {
        return limit.figure().word() + " " + limit.sense().words() + " " + shown(limit.figure(), limit.value(), 4);
    }

    private static void answer(TextPage page, StudySizing sizing) {
        Sized sized = sizing.sized();
        page.heading(answered(sizing));
        if (!sized.trial().there()) {
            page.paragraph(NONE + ". The last one tried: " + sized.trial().reason());
            return;
        }
        if (!sized.fits()) {
            page.paragraph("What comes nearest:");
        }
        for (int i = 0; i < sizing.numbers().size(); i++) {
            page.row(
                    sizing.numbers().get(i).path(),
                    sizing.written(i) + "   (the study: "
                            + number(sizing, i, sizing.numbers().get(i).base()) + ")"
                            + end(sized.ends().get(i)));
        }
        page.row(
                sizing.figure().word(),
                shown(sizing.figure(), sizing.trial().objective(), 5) + "   (the study: "
                        + (sizing.base().there()
                                ? shown(sizing.figure(), sizing.base().objective(), 5)
                                : "none")
                        + ")");
        for (int c = 0; c < sizing.limits().size(); c++) {
            page.row(sizing.limits().get(c).figure().word(), found(sizing, c));
        }
        solved(page, sizing);
        boolean free = sized.binding().isEmpty() && sized.ends().stream().allMatch(end -> end == End.INSIDE);
        if (sized.fits() && free) {
            page.paragraph("No limit binds and no range ends there: the figure itself turns.");
        }
    }

    private static String answered(StudySizing sizing) {
        if (!sizing.sized().fits()) {
            return "Answer: nothing in these ranges keeps every limit";
        }
        boolean estimated = sizing.model() != sizing.study().device().hair().lengthModel();
        return "Answer: every limit is kept" + (estimated ? ", by the estimate" : "");
    }

    /** The search went by an estimate: what the one device gives with the study's own model. */
    private static void solved(TextPage page, StudySizing sizing) {
        if (sizing.model() == sizing.study().device().hair().lengthModel()) {
            return;
        }
        if (!sizing.solved().there()) {
            page.note(
                    "[weak]",
                    "With the study's own finite-length there is no answer: "
                            + sizing.solved().reason());
            return;
        }
        List<String> parts = new ArrayList<>();
        boolean kept = true;
        for (int c = 0; c < sizing.limits().size(); c++) {
            FigureLimit limit = sizing.limits().get(c);
            double found = sizing.solved().found().get(c);
            kept &= limit.sense().keeps(found, limit.value());
            parts.add(limit.figure().word() + " " + shown(limit.figure(), found, 5));
        }
        parts.add(sizing.figure().word() + " "
                + shown(sizing.figure(), sizing.solved().objective(), 5));
        boolean missed = sizing.sized().fits() && !kept;
        page.note(
                missed ? "[weak]" : "[note]",
                "The search went by the estimate of finite length. With "
                        + sizing.study().device().hair().lengthModel().word() + ", as bands takes it: "
                        + String.join(", ", parts) + "."
                        + (missed
                                ? " A limit is missed by that: ask for a little more of it, or search with --set"
                                        + " finite-length=on, which takes much longer."
                                : ""));
    }

    private static String end(End end) {
        return switch (end) {
            case FROM -> ", the lower end of its range: the range binds";
            case TO -> ", the upper end of its range: the range binds";
            case INSIDE -> "";
        };
    }

    private static String found(StudySizing sizing, int c) {
        FigureLimit limit = sizing.limits().get(c);
        double found = sizing.trial().found().get(c);
        String text = limit.sense().words() + " " + shown(limit.figure(), limit.value(), 4) + ", found "
                + shown(limit.figure(), found, 5);
        if (!limit.sense().keeps(found, limit.value())) {
            return text + ": short by " + shown(limit.figure(), FastMath.abs(found - limit.value()), 3);
        }
        return text + (sizing.sized().binding().contains(c) ? ": binds" : "");
    }

    /** Prices of the limits, then what a per cent of each number does. */
    private static void sensitivity(TextPage page, StudySizing sizing) {
        page.heading("Sensitivity of the optimum");
        Sized sized = sizing.sized();
        for (int c = 0; c < sizing.limits().size(); c++) {
            FigureLimit limit = sizing.limits().get(c);
            Slope price = sized.prices().get(c);
            if (price.value().isPresent() && price.value().getAsDouble() != 0.0) {
                double step = step(limit);
                page.row(
                        limit.figure().word(),
                        "a limit " + shown(limit.figure(), step, 3) + " higher moves the optimum by "
                                + change(
                                        sizing.figure(),
                                        price.value().getAsDouble() * step,
                                        sizing.trial().objective())
                                + remark(price));
            } else if (price.value().isEmpty()) {
                page.row(limit.figure().word(), "not known: " + price.remark());
            }
        }
        for (int i = 0; i < sizing.numbers().size(); i++) {
            VariableSlopes slopes = sized.slopes().get(i);
            double value = sized.values().get(i);
            List<String> parts = new ArrayList<>();
            parts.add(part(
                    sizing.figure(), slopes.objective(), value, sized.trial().objective()));
            for (int c = 0; c < sizing.limits().size(); c++) {
                parts.add(part(
                        sizing.limits().get(c).figure(),
                        slopes.found().get(c),
                        value,
                        sized.trial().found().get(c)));
            }
            page.row(sizing.numbers().get(i).path(), "one per cent more: " + String.join("; ", parts));
        }
    }

    /** One decibel, or a hundredth of the limit. */
    private static double step(FigureLimit limit) {
        boolean level = limit.figure().unit() == FigureUnit.LEVEL;
        return level || limit.value() == 0.0 ? 1.0 : 0.01 * FastMath.abs(limit.value());
    }

    private static String part(Figure figure, Slope slope, double variable, double of) {
        return figure.word() + " "
                + (slope.value().isPresent()
                        ? change(figure, 0.01 * variable * slope.value().getAsDouble(), of) + remark(slope)
                        : "not known (" + slope.remark() + ")");
    }

    private static String remark(Slope slope) {
        return slope.remark().isEmpty() ? "" : " (" + slope.remark() + ")";
    }

    /** A change with its sign, levels in decibels and the rest in per cent of what it changes. */
    private static String change(Figure figure, double change, double of) {
        String sign = change < 0.0 ? "-" : "+";
        double size = FastMath.abs(change);
        return figure.unit() == FigureUnit.LEVEL || of == 0.0
                ? sign + shown(figure, size, 3)
                : sign + Figures.of(100.0 * size / FastMath.abs(of), 3) + " %";
    }

    private static String number(StudySizing sizing, int index, double value) {
        WrittenUnit unit = sizing.units().get(index);
        return (Figures.of(unit.show(value), 4) + " " + unit.symbol()).strip();
    }

    private static String shown(Figure figure, double value, int digits) {
        return (Figures.of(figure.unit().show(value), digits) + " "
                        + figure.unit().shown())
                .strip();
    }

    /**
     * As an object.
     *
     * @param json where to write
     * @param sizing the answer
     */
    public static void write(JsonPage json, StudySizing sizing) {
        Sized sized = sizing.sized();
        Trial trial = sizing.trial();
        json.object(() -> {
            StudyJson.write(json, sizing.study());
            json.text("to", sizing.words().maximize() ? "maximize" : "minimize");
            json.text("figure", sizing.figure().word());
            json.bool("fits", sized.fits());
            json.text("hold", sizing.hold().word());
            json.text("finite_length", sizing.model().word());
            json.cell(sizing.figure().column(), Cell.of(trial.objective(), reason(trial)));
            json.cell(
                    sizing.figure().column() + "_of_study",
                    Cell.of(sizing.base().objective(), reason(sizing.base())));
            json.object("as_bands_finds_it", () -> {
                json.text(
                        "finite_length",
                        sizing.study().device().hair().lengthModel().word());
                json.cell(sizing.figure().column(), Cell.of(sizing.solved().objective(), reason(sizing.solved())));
                json.numbers("limits", sizing.solved().found());
            });
            json.array("numbers", indices(sizing.numbers().size()), i -> number(json, sizing, i));
            json.array("limits", indices(sizing.limits().size()), c -> limit(json, sizing, c));
            json.texts("not_judged", sizing.leftOut());
            CaveatJson.write(json, sizing.caveats());
            json.whole("trials", sized.trials());
            json.text("seed", Long.toString(sizing.words().seed()));
        });
    }

    private static String reason(Trial trial) {
        return trial.there() ? "it has no finite value" : trial.reason();
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
        json.cell(
                "found",
                trial.there() ? Cell.of(trial.found().get(c), "it has no bound") : Cell.missing(trial.reason()));
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
