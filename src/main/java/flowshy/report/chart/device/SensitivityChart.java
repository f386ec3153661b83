package flowshy.report.chart.device;

import flowshy.report.SensitivityReport;
import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.chart.ChartTable.Head;
import flowshy.report.chart.ChartTable.Row;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Bar;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.RowSheet;
import flowshy.report.chart.paper.TickText;
import flowshy.verdict.design.Sensitivities;
import flowshy.verdict.design.Sensitivity;
import flowshy.verdict.design.Sensitivity.Slope;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.hipparchus.util.FastMath;

/** What to tighten first: what one per cent of each number does to the rejection, the strongest on top. */
public final class SensitivityChart {
    private static final String TITLE = "What to tighten first";

    private static final int MOST = 14;

    /** Share of the largest below which a bar could not be told from nothing. */
    private static final double SEEN = 1e-3;

    /** Labels that find room on one scale, and on each of two. */
    private static final int[] TICKS = {7, 3};

    /** Room for a figure, as share of the scale where there is but one. */
    private static final double FIGURE = 0.2;

    private SensitivityChart() {}

    /**
     * The chart.
     *
     * @param study whose it is, as the user wrote it
     * @param slopes what was found
     * @return one chart of the strongest; none if nothing moves the rejection
     */
    public static List<Chart> of(String study, Sensitivities slopes) {
        return slopes.numbers().isEmpty() ? List.of() : List.of(drawn(study, slopes));
    }

    private static Chart drawn(String study, Sensitivities slopes) {
        double least = SEEN * slopes.numbers().get(0).size();
        List<Sensitivity> shown = slopes.numbers().stream()
                .filter(one -> one.size() >= least)
                .limit(MOST)
                .toList();
        Bounds ends = ends(shown);
        RowSheet sheet = new RowSheet(new Heading(TITLE, study), 152);
        slopes.places()
                .forEach(place ->
                        sheet.even("at " + TickText.hertz(place.frequency(), 4) + ", dB", ends.from(), ends.to()));
        List<Row> rows = new ArrayList<>();
        for (Sensitivity one : shown) {
            List<Bar> bars = new ArrayList<>();
            for (Slope slope : one.slopes()) {
                double change = slope.change();
                bars.add(new Bar(bars.size(), Ink.FIRST, change, change, change, signed(change)));
                rows.add(new Row(SensitivityReport.name(one), List.of(slope.frequency(), change, slope.error())));
            }
            sheet.bars(SensitivityReport.name(one), bars);
        }
        sheet.remark(
                "Change of the rejection when a number grows by one per cent, a temperature by one kelvin; sorted by the larger.");
        sheet.remark(where(slopes));
        sheet.remark(SensitivityReport.by(slopes) + ".");
        int left = slopes.numbers().size() - shown.size();
        if (left > 0) {
            sheet.remark("Weaker and left out: " + left + ".");
        }
        return new DrawnChart(
                "sensitivities",
                TITLE,
                description(shown),
                new ChartTable(
                        List.of(
                                new Head("frequency_hz", "frequency", "Hz"),
                                new Head("change_db", "change of the rejection by 1 % or 1 K", "dB"),
                                new Head("error_db", "error of the difference", "dB")),
                        rows),
                sheet);
    }

    /** All scales alike, so that bars compare; room for a figure on the other side of zero, and for a label beside that of zero. */
    private static Bounds ends(List<Sensitivity> shown) {
        double least = 0.0;
        double largest = 0.0;
        for (Sensitivity one : shown) {
            for (Slope slope : one.slopes()) {
                least = FastMath.min(least, slope.change());
                largest = FastMath.max(largest, slope.change());
            }
        }
        double room = FIGURE * shown.get(0).slopes().size();
        double other = room / (1.0 - room);
        double from = 1.05 * FastMath.min(least, -other * largest);
        double to = 1.05 * FastMath.max(largest, -other * least);
        double tick = Bounds.round((to - from) / TICKS[shown.get(0).slopes().size() - 1], true);
        return to >= -from ? new Bounds(from, FastMath.max(to, tick)) : new Bounds(FastMath.min(from, -tick), to);
    }

    private static String where(Sensitivities slopes) {
        return slopes.places().stream()
                .map(place -> TickText.hertz(place.frequency(), 4) + ": " + place.words())
                .collect(Collectors.joining("; ", "", "."));
    }

    private static String signed(double change) {
        return (change > 0.0 ? "+" : "") + TickText.of(change, 2);
    }

    private static String description(List<Sensitivity> shown) {
        StringBuilder text = new StringBuilder("Bars, the strongest first: ");
        for (Sensitivity one : shown.subList(0, FastMath.min(3, shown.size()))) {
            text.append(one.slopes().stream()
                    .map(slope -> signed(slope.change()) + " dB at " + TickText.hertz(slope.frequency(), 4))
                    .collect(Collectors.joining(", ", SensitivityReport.name(one) + " ", "; ")));
        }
        return text.toString().replaceFirst("; $", ".");
    }
}
