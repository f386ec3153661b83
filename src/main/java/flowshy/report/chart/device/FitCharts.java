package flowshy.report.chart.device;

import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.Columns;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.Panel;
import flowshy.report.chart.paper.PlotSheet;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.TickText;
import flowshy.study.Study;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.fit.FitAnswer;
import flowshy.verdict.fit.Residual;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** The charts of a fit: those of {@code bands} for the fitted device with what was measured over them, and what is left. */
public final class FitCharts {
    private static final String NAME = "fit-residuals";
    private static final int HEIGHT = 250;

    /** Within this a residual is nothing to speak of, as common practice has it. */
    private static final double USUAL = 2.0;

    private FitCharts() {}

    /**
     * Every chart that the answer has numbers for.
     *
     * @param study what was asked
     * @param fitted the bands of the fitted device
     * @param answer the fit
     * @return in the order of a report
     */
    public static List<Chart> of(Study study, BandsAnswer fitted, FitAnswer answer) {
        List<Chart> charts = new ArrayList<>(BandsCharts.of(study, fitted, MeasuredOverlays.of(answer.after())));
        charts.add(residuals(study, answer));
        return charts;
    }

    /**
     * What the fit leaves, by frequency.
     *
     * @param study what was asked
     * @param answer the fit
     * @return the chart
     */
    public static Chart residuals(Study study, FitAnswer answer) {
        List<Residual> all = answer.residuals();
        Columns<Residual> columns = new Columns<>(all);
        columns.add("frequency_hz", "frequency", "Hz", Residual::frequency);
        List<Double> shares = columns.add("residual", "residual", "u", Residual::share);
        columns.add("phase", "1 for a phase, 0 for a size", "", r -> r.part() == Residual.Part.PHASE ? 1.0 : 0.0);
        columns.add("weight", "weight", "", Residual::weight);
        List<List<Double>> seen = List.of(
                shares.stream().map(share -> share + 0.4).toList(),
                shares.stream().map(share -> share - 0.4).toList(),
                List.of(-3.0, 3.0));
        Bounds ends = Bounds.even(seen, 1.0);
        double from = all.stream().mapToDouble(Residual::frequency).min().orElse(1.0);
        double to = all.stream().mapToDouble(Residual::frequency).max().orElse(10.0);
        Bounds axis = Bounds.about(from, to > from ? to : 2.0 * from);
        PlotSheet sheet = PlotSheet.decades(
                new Heading("What the fit leaves", study.title()), "frequency, Hz", axis.from(), axis.to(), HEIGHT);
        panel(sheet, all, ends, "sizes, in standard uncertainties; dashes at ±2", false);
        if (all.stream().anyMatch(r -> r.part() == Residual.Part.PHASE)) {
            panel(sheet, all, ends, "phases, in standard uncertainties; dashes at ±2", true);
        }
        return new DrawnChart(NAME, "What the fit leaves", description(answer), columns.table(), sheet);
    }

    private static void panel(PlotSheet sheet, List<Residual> all, Bounds ends, String heading, boolean phases) {
        Panel panel = Panel.even(heading, ends.from(), ends.to(), 1);
        List<String> names = all.stream().map(Residual::name).distinct().toList();
        for (int i = 0; i < names.size(); i++) {
            String name = names.get(i);
            List<Residual> own = all.stream()
                    .filter(r -> r.name().equals(name) && (r.part() == Residual.Part.PHASE) == phases)
                    .toList();
            if (!own.isEmpty()) {
                draw(panel, phases ? "" : name, i, own);
            }
        }
        panel.level(USUAL, "", Ink.LIMIT);
        panel.level(-USUAL, "", Ink.LIMIT);
        sheet.add(panel);
    }

    /** Dots and open marks in turn, so that two measurements can be told apart without colour. */
    private static void draw(Panel panel, String name, int index, List<Residual> own) {
        if (index % 2 == 0) {
            panel.dots(
                    name,
                    Ink.alike(index),
                    own.stream().map(Residual::frequency).toList(),
                    own.stream().map(Residual::share).toList());
        } else {
            panel.measured(
                    name,
                    Ink.alike(index),
                    own.stream()
                            .map(r -> List.of(r.frequency(), r.share(), r.share(), r.share()))
                            .toList());
        }
    }

    private static String description(FitAnswer answer) {
        long beyond = answer.residuals().stream()
                .filter(r -> Math.abs(r.share()) > USUAL)
                .count();
        double largest = answer.residuals().stream()
                .mapToDouble(r -> Math.abs(r.share()))
                .max()
                .orElse(0.0);
        return String.format(
                Locale.ROOT,
                "%d of %d measured numbers lie more than two standard uncertainties from the fit, the farthest %s.",
                beyond,
                answer.residuals().size(),
                TickText.of(largest, 3));
    }
}
