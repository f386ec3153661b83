package flowshy.report.chart.several;

import flowshy.report.LidReport;
import flowshy.report.LidReport.Demand;
import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.chart.ChartTable.Head;
import flowshy.report.chart.ChartTable.Row;
import flowshy.report.chart.Columns;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.Panel;
import flowshy.report.chart.paper.PlotSheet;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.RowSheet;
import flowshy.report.chart.paper.RowSheet.Mark;
import flowshy.report.chart.paper.TickText;
import flowshy.study.Study;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsAnswer.Extreme;
import flowshy.verdict.Reads;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.lid.CoverRow;
import flowshy.verdict.lid.LidAnswer;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The charts of {@code lid}: covers side by side, their rejection by frequency, and what a cover must give. */
public final class CoverCharts {
    private static final String SIDE = "Covers side by side";
    private static final String CURVES = "Rejection under each cover";
    private static final String REQUIRED = "Attenuation a cover must give";

    private CoverCharts() {}

    /**
     * Every chart that the answer has numbers for.
     *
     * @param study what was asked
     * @param answer what was found
     * @return in the order of a report
     */
    public static List<Chart> of(Study study, LidAnswer answer) {
        List<Chart> charts = new ArrayList<>();
        charts.add(side(study.title(), answer));
        charts.add(curves(study.title(), answer));
        charts.add(required(study.title(), answer));
        return charts;
    }

    private static Chart side(String study, LidAnswer answer) {
        double margin = answer.bare().acceptance().margin();
        OptionalDouble limit = answer.bare().acceptance().error();
        boolean errors = answer.bare().error().isPresent();
        boolean states = answer.worst().isPresent();
        List<Row> rows = new ArrayList<>();
        List<List<Double>> rejections = new ArrayList<>(List.of(List.of(0.0, margin)));
        List<List<Double>> rms = new ArrayList<>();
        limit.ifPresent(value -> rms.add(List.of(value)));
        for (CoverRow row : answer.covers()) {
            double least = row.answer().least().map(Extreme::rejection).orElse(Double.NaN);
            double error = row.answer().error().map(ErrorBudget::rms).orElse(Double.NaN);
            List<Double> figures = new ArrayList<>(errors ? List.of(least, error) : List.of(least));
            rejections.add(List.of(least, lowest(row)));
            rms.add(List.of(error, largest(row)));
            if (states) {
                figures.addAll(errors ? List.of(lowest(row), largest(row)) : List.of(lowest(row)));
            }
            rows.add(new Row(words(row), figures));
        }
        Bounds decibels = Bounds.even(rejections, 10.0);
        RowSheet sheet = new RowSheet(new Heading(SIDE, study), errors ? 150 : 190)
                .even("least rejection, dB", decibels.from(), decibels.to() + 5.0)
                .limit(margin, "margin " + TickText.of(margin, 4) + " dB");
        if (errors) {
            Bounds ends = Bounds.decades(rms, 8.0);
            sheet.decades("error by flow, m/s² rms", ends.from(), ends.to());
            limit.ifPresent(value -> sheet.limit(value, "limit " + TickText.of(value, 3) + " m/s²"));
        }
        for (CoverRow row : answer.covers()) {
            List<Mark> marks = new ArrayList<>();
            marks.add(mark(0, row.answer().least().map(Extreme::rejection).orElse(Double.NaN), none(row), !states));
            if (errors) {
                marks.add(mark(
                        1, row.answer().error().map(ErrorBudget::rms).orElse(Double.NaN), "no flow enters", !states));
            }
            worst(marks, 0, lowest(row));
            worst(marks, 1, largest(row));
            sheet.row(words(row), marks);
        }
        if (states) {
            sheet.name(Ink.FIRST, "own state").name(Ink.SECOND, "worst state");
        }
        answer.chosen()
                .ifPresentOrElse(
                        chosen -> sheet.remark("The first that meets every limit: " + words(chosen) + "."),
                        () -> sheet.remark(answer.verdict().sentence()));
        List<Head> heads = new ArrayList<>(List.of(new Head("least_rejection_db", "least rejection", "dB")));
        if (errors) {
            heads.add(new Head("error_rms_m_s2", "error by flow", "m/s² rms"));
        }
        if (states) {
            heads.add(new Head("worst_least_rejection_db", "least rejection, worst state", "dB"));
        }
        if (states && errors) {
            heads.add(new Head("worst_error_rms_m_s2", "error by flow, worst state", "m/s² rms"));
        }
        return new DrawnChart("covers", SIDE, description(answer), new ChartTable(heads, rows), sheet);
    }

    private static double lowest(CoverRow row) {
        return row.lowest().map(AtState::value).orElse(Double.NaN);
    }

    private static double largest(CoverRow row) {
        return row.largestError().map(AtState::value).orElse(Double.NaN);
    }

    /** A dot of the worst state, where it has one. */
    private static void worst(List<Mark> marks, int scale, double value) {
        if (Double.isFinite(value) && (scale == 0 || value > 0.0)) {
            marks.add(new Mark(scale, Ink.SECOND, OptionalDouble.of(value), ""));
        }
    }

    /** A dot with its figure, where there is room for it, or why there is none. */
    private static Mark mark(int scale, double value, String none, boolean figure) {
        boolean drawn = Double.isFinite(value) && (scale == 0 || value > 0.0);
        return new Mark(
                scale,
                Ink.FIRST,
                drawn ? OptionalDouble.of(value) : OptionalDouble.empty(),
                drawn ? (figure ? TickText.of(value, 3) : "") : none);
    }

    private static String none(CoverRow row) {
        return row.answer().bands().get(0).reads() == Reads.NOTHING ? "reads nothing" : "no flow enters: no bound";
    }

    private static String words(CoverRow row) {
        return row.candidate().cover().words() + ", in "
                + row.candidate().around().name();
    }

    private static String description(LidAnswer answer) {
        StringBuilder text = new StringBuilder();
        for (CoverRow row : answer.covers()) {
            text.append(words(row))
                    .append(": least rejection ")
                    .append(row.answer()
                            .least()
                            .map(least -> TickText.of(least.rejection(), 3) + " dB")
                            .orElse(none(row)))
                    .append(row.answer()
                            .error()
                            .map(error -> ", error " + TickText.of(error.rms(), 3) + " m/s² rms")
                            .orElse(""))
                    .append(
                            Double.isFinite(lowest(row))
                                    ? ", at worst " + TickText.of(lowest(row), 3) + " dB in the envelope"
                                    : "")
                    .append(". ");
        }
        return text + answer.verdict().sentence();
    }

    private static Chart curves(String study, LidAnswer answer) {
        SideBySide sides = new SideBySide();
        for (CoverRow row : answer.covers()) {
            boolean nothing = row.answer().bands().get(0).reads() == Reads.NOTHING;
            sides.add(
                    words(row),
                    row.answer(),
                    nothing ? "it reads nothing." : "no flow enters, the rejection has no bound.");
        }
        List<String> remarks = answer.worst().isPresent() ? List.of("At the study's own state.") : List.of();
        return sides.chart("covers-rejection", CURVES, study, description(answer), remarks);
    }

    private static Chart required(String study, LidAnswer answer) {
        BandsAnswer bare = answer.bare();
        Columns<Demand> columns = new Columns<>(LidReport.points(answer));
        List<Double> frequency = columns.add(
                "frequency_hz", "frequency", "Hz", point -> point.own().frequency());
        List<Double> attenuation = columns.add(
                "attenuation_db", "attenuation", "dB", point -> point.own().attenuation());
        List<Double> worst = answer.worst().isEmpty()
                ? List.of()
                : columns.add(
                        "worst_attenuation_db",
                        "attenuation, worst state",
                        "dB",
                        point -> point.worst().orElseThrow().value());
        List<List<Double>> seen = new ArrayList<>(List.of(attenuation, worst, List.of(0.0)));
        answer.requiredError().ifPresent(value -> seen.add(List.of(value)));
        Bounds ends = Bounds.even(seen, 5.0);
        Bounds axis = Bounds.about(bare.band().from(), bare.band().to());
        String wanted = "for a margin of " + TickText.of(bare.acceptance().margin(), 4) + " dB";
        Panel panel = Panel.even("attenuation, dB", ends.from(), ends.to(), 1)
                .line(wanted, Ink.MOTION, frequency, attenuation)
                .dots("", Ink.MOTION, frequency, attenuation);
        if (!worst.isEmpty()) {
            panel.line("the same, worst of the envelope", Ink.SECOND, frequency, worst);
        }
        answer.requiredError()
                .ifPresent(
                        value -> panel.level(value, "for the error limit " + TickText.of(value, 4) + " dB", Ink.LIMIT));
        PlotSheet sheet = PlotSheet.decades(new Heading(REQUIRED, study), "frequency, Hz", axis.from(), axis.to(), 170)
                .add(panel);
        double most = attenuation.stream()
                .filter(Double::isFinite)
                .mapToDouble(Double::doubleValue)
                .max()
                .orElse(Double.NaN);
        if (attenuation.stream().anyMatch(value -> !Double.isFinite(value))) {
            sheet.remark("Where there is no point the fluid carried along leaves no motion to read.");
        }
        return new DrawnChart(
                "attenuation",
                REQUIRED,
                "Attenuation of the flow that keeps the margin of a bare device, by third-octaves"
                        + (Double.isFinite(most) ? "; at most " + TickText.of(most, 3) + " dB." : "."),
                columns.table(),
                sheet);
    }
}
