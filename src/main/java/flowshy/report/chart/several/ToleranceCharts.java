package flowshy.report.chart.several;

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
import flowshy.verdict.tolerance.ToleranceAnswer;
import flowshy.verdict.tolerance.ToleranceAnswer.FanPoint;
import java.util.ArrayList;
import java.util.List;

/** Charts of a tolerance run. */
public final class ToleranceCharts {
    private static final String NAME = "rejection-spread";
    private static final int HEIGHT = 210;

    private ToleranceCharts() {}

    /**
     * The rejection of all devices as a fan over frequency, and of each quantity which tolerance matters most.
     *
     * @param study what was asked
     * @param answer what was found
     * @return no fan where no flow reaches the hair, no bars for a quantity whose indices were not worked out
     */
    public static List<Chart> of(Study study, ToleranceAnswer answer) {
        List<Chart> charts = new ArrayList<>();
        if (!answer.fan().isEmpty()) {
            charts.add(fan(study.title(), answer));
        }
        answer.figures()
                .forEach(spread -> VarianceChart.of(study.title(), spread).ifPresent(charts::add));
        return charts;
    }

    /**
     * Whether a chart is of a tolerance run.
     *
     * @param name of a chart
     * @return true for any of this class
     */
    public static boolean named(String name) {
        return name.equals(NAME) || name.startsWith(VarianceChart.STEM);
    }

    private static Chart fan(String study, ToleranceAnswer answer) {
        Columns<FanPoint> columns = new Columns<>(answer.fan());
        List<Double> frequency = columns.add("frequency_hz", "frequency", "Hz", FanPoint::frequency);
        List<List<Double>> lines = new ArrayList<>();
        for (int i = 0; i < ToleranceAnswer.PERCENTILES.size(); i++) {
            int k = i;
            String share = TickText.of(ToleranceAnswer.PERCENTILES.get(i), 3);
            lines.add(columns.add(
                    "p" + share.replace('.', '_') + "_db",
                    share + " % below",
                    "dB",
                    point -> point.percentiles().get(k).estimate()));
        }
        List<Double> nominal = columns.add("nominal_db", "nominal", "dB", FanPoint::nominal);
        double margin = answer.nominal().acceptance().margin();
        List<List<Double>> seen = new ArrayList<>(lines);
        seen.add(nominal);
        seen.add(List.of(margin));
        Bounds ends = Bounds.even(seen, 5.0);
        Panel panel = Panel.even("rejection, dB", ends.from(), ends.to(), 1)
                .line("95 in 100 devices between", Ink.SECOND, frequency, lines.get(0))
                .line("", Ink.SECOND, frequency, lines.get(4))
                .line("68 in 100 between", Ink.THIRD, frequency, lines.get(1))
                .line("", Ink.THIRD, frequency, lines.get(3))
                .line("half below", Ink.MOTION, frequency, lines.get(2))
                .line("nominal device", Ink.NOISE, frequency, nominal)
                .level(margin, "margin " + TickText.of(margin, 4) + " dB", Ink.LIMIT);
        double from = answer.fan().get(0).frequency();
        double to = answer.fan().get(answer.fan().size() - 1).frequency();
        Bounds axis = Bounds.about(from, to);
        PlotSheet sheet = PlotSheet.decades(
                new Heading("Spread of the rejection", study),
                "frequency, Hz; band of use " + TickText.hertz(from, 4) + " to " + TickText.hertz(to, 4),
                axis.from(),
                axis.to(),
                HEIGHT);
        return new DrawnChart(
                NAME, "Spread of the rejection over all devices", answer.sentence(), columns.table(), sheet.add(panel));
    }
}
