package flowshy.report;

import flowshy.hair.LengthModel;
import flowshy.math.Figures;
import flowshy.study.StudySizing;
import flowshy.study.units.WrittenUnit;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.Limit;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.FigureUnit;
import flowshy.verdict.size.Agreement;
import flowshy.verdict.size.Round;
import flowshy.verdict.size.Sized;
import flowshy.verdict.size.Sized.End;
import flowshy.verdict.size.Sized.VariableSlopes;
import flowshy.verdict.size.Slope;
import flowshy.verdict.size.Variable;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** A sizing for a terminal. */
final class SizeText {
    private static final String NONE = "no place that was tried makes a device";

    private static final int ROUND_DIGITS = 6;

    private final StudySizing sizing;
    private final Sized sized;
    private final TextPage page = new TextPage();

    SizeText(StudySizing sizing) {
        this.sizing = sizing;
        this.sized = sizing.sized();
    }

    /** All of it. */
    String page() {
        page.line("Flowshy " + Version.number() + "   size   "
                + sizing.study().origin().file());
        if (!sizing.study().title().isEmpty()) {
            page.line(sizing.study().title());
        }
        sizing.study().origin().settings().forEach(setting -> page.line("with --set " + setting));
        asked();
        answer();
        if (sized.fits()) {
            sensitivity();
        }
        sizing.caveats().forEach(caveat -> page.note("[" + caveat.weight().words() + "]", caveat.text()));
        found();
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    private void asked() {
        page.heading("Size for the " + (sizing.words().maximize() ? "largest " : "least ")
                + sizing.figure().word());
        page.row(
                sizing.words().maximize() ? "maximize" : "minimize",
                sizing.figure().words());
        for (int i = 0; i < sizing.numbers().size(); i++) {
            Variable range = sized.problem().variables().get(i);
            page.row(
                    i == 0 ? "vary" : "",
                    range.name() + " from " + number(i, range.from()) + " to " + number(i, range.to())
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
        LengthModel model = model();
        page.row(
                "finite-length",
                model.word() + " (" + model.words() + ")"
                        + (sizing.estimated()
                                ? "; searched by the estimate, which is corrected until both agree"
                                : ""));
    }

    private LengthModel model() {
        return sizing.study().device().hair().lengthModel();
    }

    private static String limit(FigureLimit limit) {
        return limit.figure().word() + " " + limit.sense().words() + " " + shown(limit.figure(), limit.value(), 4);
    }

    private void answer() {
        page.heading(answered());
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
                            + number(i, sizing.numbers().get(i).base()) + ")"
                            + end(sized.ends().get(i)));
            if (!sized.edges().get(i).isEmpty()) {
                page.row(
                        "",
                        "just beside it there is no device: " + sized.edges().get(i));
            }
        }
        page.row(
                sizing.figure().word(),
                shown(sizing.figure(), sizing.trial().objective(), 5) + "   (the study: "
                        + (sizing.base().there()
                                ? shown(sizing.figure(), sizing.base().objective(), 5)
                                : "none")
                        + ")");
        for (int c = 0; c < sizing.limits().size(); c++) {
            page.row(sizing.limits().get(c).figure().word(), found(c));
        }
        for (Limit limit : sizing.undecided()) {
            page.note(
                    "[" + limit.decision().word() + "]",
                    "bands says so of the limit on " + limit.name() + " there"
                            + (limit.reason().isEmpty() ? "" : ": " + limit.reason()) + ".");
        }
        boolean free = sized.binding().isEmpty()
                && sized.ends().stream().allMatch(end -> end == End.INSIDE)
                && sized.edges().stream().allMatch(String::isEmpty);
        if (sized.fits() && free) {
            page.paragraph("No limit binds and no range ends there: the figure itself turns.");
        }
    }

    private String answered() {
        if (sizing.keeps()) {
            return "Answer: every limit is kept";
        }
        if (sized.fits()) {
            return "Answer: found, and bands does not call every limit met there";
        }
        return "Answer: " + (sized.trial().there() ? "nothing" : "no device") + " in these ranges keeps every limit";
    }

    private static String end(End end) {
        return switch (end) {
            case FROM -> ", the lower end of its range: the range binds";
            case TO -> ", the upper end of its range: the range binds";
            case INSIDE -> "";
        };
    }

    private String found(int c) {
        FigureLimit limit = sizing.limits().get(c);
        double found = sizing.trial().found().get(c);
        String text = limit.sense().words() + " " + shown(limit.figure(), limit.value(), 4) + ", found "
                + shown(limit.figure(), found, 5);
        if (!limit.sense().keeps(found, limit.value())) {
            return text + ": short by " + shown(limit.figure(), FastMath.abs(found - limit.value()), 3);
        }
        return text + (sized.binding().contains(c) ? ": binds" : "");
    }

    /** Prices of the limits, then what a per cent of each number does. */
    private void sensitivity() {
        page.heading("Sensitivity of the optimum");
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

    private String number(int index, double value) {
        return number(index, value, 4);
    }

    private String number(int index, double value, int digits) {
        WrittenUnit unit = sizing.units().get(index);
        return (Figures.of(unit.show(value), digits) + " " + unit.symbol()).strip();
    }

    private static String shown(Figure figure, double value, int digits) {
        return (Figures.of(figure.unit().show(value), digits) + " "
                        + figure.unit().shown())
                .strip();
    }

    private void found() {
        page.heading("How it was found");
        if (sizing.estimated()) {
            rounds();
        } else {
            page.paragraph("Tried " + sized.trials() + " choices, seed "
                    + sizing.words().seed() + ".");
        }
        if (!sized.trial().there()) {
            return;
        }
        page.paragraph((sized.fits() ? "The numbers are rounded to the side that keeps the limits. " : "")
                + "The same device in full: bands with");
        for (int i = 0; i < sizing.numbers().size(); i++) {
            page.line("    --set '" + sizing.numbers().get(i).path() + "=" + sizing.written(i) + "'");
        }
    }

    /** How estimate and solution came together. */
    private void rounds() {
        Agreement agreement = sizing.agreement();
        page.paragraph("Tried " + sized.trials() + " choices by the estimate, seed "
                + sizing.words().seed() + ". Where a search ended, the device was worked out with finite-length "
                + model().word() + ", as bands does it, and the estimate corrected there in value and slope: "
                + agreement.solutions() + " such devices.");
        for (int k = 0; k < agreement.rounds().size(); k++) {
            page.row("round " + (k + 1), round(agreement.rounds().get(k)));
        }
        if (agreement.rounds().isEmpty() || !sized.trial().there()) {
            return;
        }
        if (agreement.settled()) {
            page.paragraph(
                    sized.fits()
                            ? "Another round would gain nothing that counts."
                            : "Another round would come no nearer.");
        } else {
            page.note("[weak]", "The rounds ended before nothing was left to be gained: a better choice may be near.");
        }
    }

    private String round(Round round) {
        List<String> parts = new ArrayList<>();
        for (int i = 0; i < sizing.numbers().size(); i++) {
            parts.add(sizing.numbers().get(i).path() + " "
                    + number(i, round.values().get(i), ROUND_DIGITS));
        }
        if (!round.solved().there()) {
            parts.add(round.solved().reason());
            return String.join("; ", parts);
        }
        parts.add(compared(
                sizing.figure(), round.solved().objective(), round.expected().objective()));
        for (int c = 0; c < sizing.limits().size(); c++) {
            parts.add(compared(
                    sizing.limits().get(c).figure(),
                    round.solved().found().get(c),
                    round.expected().found().get(c)));
        }
        return String.join("; ", parts);
    }

    /** What was found, and what was expected where that reads otherwise. */
    private static String compared(Figure figure, double found, double expected) {
        String there = shown(figure, found, ROUND_DIGITS);
        String before = shown(figure, expected, ROUND_DIGITS);
        return figure.word() + " " + there + (there.equals(before) ? "" : " (expected " + before + ")");
    }
}
