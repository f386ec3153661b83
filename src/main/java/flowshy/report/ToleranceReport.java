package flowshy.report;

import static flowshy.math.Figures.say;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.study.Study;
import flowshy.verdict.figure.FigureUnit;
import flowshy.verdict.tolerance.ToleranceAnswer;
import flowshy.verdict.tolerance.ToleranceAnswer.Chance;
import flowshy.verdict.tolerance.ToleranceAnswer.FanPoint;
import flowshy.verdict.tolerance.ToleranceAnswer.InputEffect;
import flowshy.verdict.tolerance.ToleranceAnswer.Spread;
import flowshy.verdict.tolerance.Uncertain;
import flowshy.verdict.tolerance.sampling.Interval;
import java.util.ArrayList;
import java.util.List;

/** How sure a verdict is, as text, JSON and CSV. */
public final class ToleranceReport {
    private static final String NO_VALUE = "no device has a finite value";

    /** Rows of the fan that a terminal gets. */
    private static final int PRINTED = 15;

    private ToleranceReport() {}

    /** Percentiles as names: p2_5 and so on. */
    private static String name(double percentile) {
        return "p" + Figures.full(percentile).replace('.', '_');
    }

    private static List<Column<FanPoint>> fan(boolean intervals) {
        List<Column<FanPoint>> columns = new ArrayList<>();
        columns.add(new Column<>("frequency_hz", "freq.", "Hz", 5, point -> Cell.of(point.frequency(), "")));
        columns.add(new Column<>("nominal_db", "nominal", "dB", 4, point -> Cell.of(point.nominal(), NO_VALUE)));
        for (int i = 0; i < ToleranceAnswer.PERCENTILES.size(); i++) {
            int k = i;
            double p = ToleranceAnswer.PERCENTILES.get(i);
            columns.add(new Column<>(
                    name(p) + "_db",
                    Figures.full(p) + " %",
                    "dB",
                    4,
                    point -> Cell.of(point.percentiles().get(k).estimate(), NO_VALUE)));
            if (intervals) {
                columns.add(new Column<>(
                        name(p) + "_low_db",
                        "",
                        "dB",
                        4,
                        point -> Cell.of(point.percentiles().get(k).low(), NO_VALUE)));
                columns.add(new Column<>(
                        name(p) + "_high_db",
                        "",
                        "dB",
                        4,
                        point -> Cell.of(point.percentiles().get(k).high(), NO_VALUE)));
            }
        }
        return columns;
    }

    /**
     * For a terminal.
     *
     * @param study what was asked
     * @param answer what was found
     * @return text
     */
    public static String text(Study study, ToleranceAnswer answer) {
        TextPage page = new TextPage();
        page.line("Flowshy " + Version.number() + "   tolerance   "
                + study.origin().file());
        if (!study.title().isEmpty()) {
            page.line(study.title());
        }
        study.origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.heading("Decision: " + answer.decision().word());
        page.paragraph(answer.sentence());
        page.heading("Chance of each limit");
        answer.limits().forEach(chance -> page.row(chance.name(), chance(chance)));
        answer.yield()
                .ifPresent(yield -> page.row(
                        "yield",
                        share(yield) + " meet every limit"
                                + (answer.required().isPresent()
                                        ? ", required "
                                                + percent(answer.required().getAsDouble())
                                        : "")));
        page.heading("What is uncertain");
        for (Uncertain input : answer.inputs()) {
            page.row(input.name(), size(input));
        }
        answer.left().forEach(sentence -> page.note("-", sentence));
        for (Spread spread : answer.figures()) {
            spread(page, spread);
        }
        if (!answer.fan().isEmpty()) {
            page.heading("Rejection by frequency: so many devices in 100 lie below");
            page.table(fan(false), printed(answer.fan()), point -> false);
        }
        page.heading("How it was found");
        page.paragraph(how(answer));
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    /**
     * How it was found.
     *
     * @param answer what was found
     * @return sentences
     */
    public static String how(ToleranceAnswer answer) {
        StringBuilder text = new StringBuilder(say(
                "%s devices by randomised quasi-Monte Carlo (scrambled Sobol sequence, seed %s). Intervals are of 95 %% confidence."
                        + " Torques: %s.",
                answer.devices(), answer.effort().seed(), answer.model()));
        if (answer.errorDevices() > 0) {
            text.append(say(
                    " What the surroundings do was worked out for %s devices only; its intervals are wider, and no indices are given for"
                            + " it.",
                    answer.errorDevices()));
        }
        if (answer.refused().count() > 0) {
            text.append(say(
                    " %s devices cannot be made and count as failing every limit, for example: %s.",
                    answer.refused().count(), answer.refused().example()));
        }
        if (answer.fan().size() > 0) {
            text.append(say(
                    " The least rejection is that of %s frequencies over the band. Caveats of the nominal device (command bands) hold"
                            + " for all.",
                    answer.fan().size()));
        }
        return text.toString();
    }

    private static List<FanPoint> printed(List<FanPoint> fan) {
        List<FanPoint> rows = new ArrayList<>();
        for (int i = 0; i < PRINTED; i++) {
            rows.add(fan.get((fan.size() - 1) * i / (PRINTED - 1)));
        }
        return rows;
    }

    /**
     * The chance of a limit, in words.
     *
     * @param chance what was found
     * @return share with its interval, limit, number of devices
     */
    public static String chance(Chance chance) {
        String limit = chance.sense() + " " + value(chance.required(), chance.unit());
        return share(chance.met()) + " " + (chance.asked() ? "meet" : "would meet") + " " + limit
                + (chance.asked() ? "" : " (taken as the margin, no limit)") + ", of " + chance.devices() + " devices";
    }

    /**
     * How wide an input is spread, in words.
     *
     * @param input uncertain input
     * @return shape, size and source
     */
    public static String size(Uncertain input) {
        return input.shape().word() + " " + input.size() + " (" + input.source() + ")";
    }

    /**
     * What an input does, in words.
     *
     * @param one input with its indices
     * @return total and first-order share with their intervals
     */
    public static String effect(InputEffect one) {
        return share(one.effect().total()) + " in all, " + share(one.effect().first()) + " alone";
    }

    private static String share(Interval share) {
        return percent(share.estimate()) + " (" + percent(share.low()) + " to " + percent(share.high()) + ")";
    }

    private static String percent(double share) {
        return Figures.of(100.0 * share, 4) + " %";
    }

    private static String value(double value, FigureUnit unit) {
        return (Figures.of(unit.show(value), 4) + " " + unit.shown()).strip();
    }

    private static void spread(TextPage page, Spread spread) {
        page.heading(spread.words().substring(0, 1).toUpperCase(java.util.Locale.ROOT)
                + spread.words().substring(1));
        if (spread.counted() == 0) {
            page.paragraph(
                    Double.isInfinite(spread.nominal())
                            ? "Without a bound in every device."
                            : "No device has a value.");
            return;
        }
        page.row("nominal", value(spread.nominal(), spread.unit()));
        page.row("mean", about(spread.mean(), spread.unit()));
        page.row("standard deviation", about(spread.deviation(), spread.unit()));
        for (int i = 0; i < ToleranceAnswer.PERCENTILES.size(); i++) {
            page.row(
                    Figures.full(ToleranceAnswer.PERCENTILES.get(i)) + " % lie below",
                    about(spread.percentiles().get(i), spread.unit()));
        }
        if (!spread.effects().isEmpty()) {
            page.line("");
            page.namedTable(
                    "share of the variance",
                    spread.effects().stream().map(InputEffect::input).toList(),
                    effects(),
                    spread.effects());
        }
    }

    private static String about(Interval interval, FigureUnit unit) {
        return value(interval.estimate(), unit) + " +- " + Figures.of(unit.show(interval.half()), 2);
    }

    private static List<Column<InputEffect>> effects() {
        return List.of(
                new Column<>(
                        "total",
                        "total",
                        "",
                        3,
                        one -> Cell.of(one.effect().total().estimate(), NO_VALUE)),
                new Column<>(
                        "total_half_width",
                        "+-",
                        "",
                        2,
                        one -> Cell.of(one.effect().total().half(), NO_VALUE)),
                new Column<>(
                        "first_order",
                        "alone",
                        "",
                        3,
                        one -> Cell.of(one.effect().first().estimate(), NO_VALUE)),
                new Column<>(
                        "first_order_half_width",
                        "+-",
                        "",
                        2,
                        one -> Cell.of(one.effect().first().half(), NO_VALUE)));
    }

    /**
     * As an object.
     *
     * @param json where to write
     * @param study what was asked
     * @param answer what was found
     * @param charts drawn of it, in order; none if they were not asked for
     */
    public static void write(JsonPage json, Study study, ToleranceAnswer answer, List<Chart> charts) {
        json.object(() -> {
            StudyJson.write(json, study);
            json.object("run", () -> {
                json.whole("devices", answer.devices());
                json.whole("error_devices", answer.errorDevices());
                json.number("refused", (double) answer.refused().count());
                json.text("refused_example", answer.refused().example());
                json.text("seed", Long.toString(answer.effort().seed()));
                json.number("confidence", Interval.CONFIDENCE);
                json.text("torque_model", answer.model());
            });
            json.array("inputs", answer.inputs(), input -> {
                json.text("name", input.name());
                json.text("spread", input.shape().word());
                json.text("size", input.size());
                json.text("source", input.source());
            });
            json.texts("certain", answer.left());
            json.array("limits", answer.limits(), chance -> {
                json.text("limit", chance.name());
                json.text("sense", chance.sense());
                json.number("required", chance.required());
                json.text("unit", chance.unit().si());
                json.bool("asked", chance.asked());
                interval(json, "met", chance.met(), "");
                json.whole("devices", chance.devices());
            });
            json.array("figures", answer.figures(), spread -> write(json, spread));
            json.array(
                    "fan",
                    answer.fan(),
                    point -> fan(true)
                            .forEach(column ->
                                    json.cell(column.name(), column.cell().apply(point))));
            json.object("verdict", () -> {
                json.text("decision", answer.decision().word());
                json.text("nominal", answer.nominal().verdict().decision().word());
                answer.yield().ifPresent(yield -> interval(json, "yield", yield, ""));
                json.cell("required_yield", Cell.of(answer.required(), "no yield is required"));
                json.text("sentence", answer.sentence());
            });
            ChartTables.write(json, charts);
        });
    }

    private static void write(JsonPage json, Spread spread) {
        String unit = spread.unit().suffix();
        json.text("figure", spread.name());
        json.text("words", spread.words());
        json.number("counted", (double) spread.counted());
        json.cell(with("nominal", unit), Cell.of(spread.nominal(), NO_VALUE));
        interval(json, "mean", spread.mean(), unit);
        interval(json, "standard_deviation", spread.deviation(), unit);
        for (int i = 0; i < ToleranceAnswer.PERCENTILES.size(); i++) {
            interval(
                    json,
                    name(ToleranceAnswer.PERCENTILES.get(i)),
                    spread.percentiles().get(i),
                    unit);
        }
        json.array("effects", spread.effects(), one -> {
            json.text("input", one.input());
            interval(json, "total", one.effect().total(), "");
            interval(json, "first_order", one.effect().first(), "");
        });
    }

    private static String with(String name, String unit) {
        return unit.isEmpty() ? name : name + "_" + unit;
    }

    private static void interval(JsonPage json, String name, Interval interval, String unit) {
        json.cell(with(name, unit), Cell.of(interval.estimate(), NO_VALUE));
        json.cell(with(name + "_low", unit), Cell.of(interval.low(), NO_VALUE));
        json.cell(with(name + "_high", unit), Cell.of(interval.high(), NO_VALUE));
    }

    /**
     * The fan as CSV; where no flow enters, the figures in its place.
     *
     * @param answer what was found
     * @return text
     */
    public static String csv(ToleranceAnswer answer) {
        return TableCsv.of(answer.fan(), fan(true));
    }
}
