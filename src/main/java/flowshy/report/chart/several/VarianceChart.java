package flowshy.report.chart.several;

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
import flowshy.verdict.tolerance.ToleranceAnswer.InputEffect;
import flowshy.verdict.tolerance.ToleranceAnswer.Spread;
import flowshy.verdict.tolerance.sampling.Interval;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** Which tolerance matters most: Sobol indices of one quantity as bars with their intervals, the largest on top. */
final class VarianceChart {
    /** Names begin so; the word of the quantity follows. */
    static final String STEM = "variance-";

    private static final int MOST = 14;

    /** Room for a figure beyond a bar, as share of the longest. */
    private static final double FIGURE = 0.2;

    private VarianceChart() {}

    /**
     * The chart of one quantity.
     *
     * @param study whose it is, as the user wrote it
     * @param spread the quantity over all devices
     * @return empty where its indices were not worked out
     */
    static Optional<Chart> of(String study, Spread spread) {
        List<InputEffect> known = spread.effects().stream()
                .filter(one -> Double.isFinite(one.effect().total().estimate())
                        && Double.isFinite(one.effect().first().estimate()))
                .toList();
        return known.isEmpty() ? Optional.empty() : Optional.of(drawn(study, spread, known));
    }

    private static Chart drawn(String study, Spread spread, List<InputEffect> known) {
        List<InputEffect> shown = known.subList(0, FastMath.min(MOST, known.size()));
        String title = "Share in the variance: " + spread.words();
        List<Row> rows = new ArrayList<>();
        List<List<Bar>> bars = new ArrayList<>();
        double least = 0.0;
        double largest = 0.0;
        for (InputEffect one : shown) {
            Interval total = one.effect().total();
            Interval first = one.effect().first();
            rows.add(new Row(
                    one.input(),
                    List.of(total.estimate(), total.low(), total.high(), first.estimate(), first.low(), first.high())));
            List<Bar> both = List.of(bar(Ink.FIRST, total.times(100.0)), bar(Ink.SECOND, first.times(100.0)));
            for (Bar bar : both) {
                least = FastMath.min(least, bar.low());
                largest = FastMath.max(largest, bar.high());
            }
            bars.add(both);
        }
        double room = 0.02 * largest;
        RowSheet sheet = new RowSheet(new Heading(title, study), 152)
                .even("per cent of the variance", least - room, (1.0 + FIGURE) * largest)
                .name(Ink.FIRST, "in all")
                .name(Ink.SECOND, "alone")
                .remark(
                        "In all: what would stay if every other number were known. Alone: what would go if this one were. The"
                                + " lines are intervals of 95 % confidence.");
        for (int i = 0; i < shown.size(); i++) {
            sheet.bars(shown.get(i).input(), bars.get(i));
        }
        if (known.size() > shown.size()) {
            sheet.remark("Smaller and left out: " + (known.size() - shown.size()) + ".");
        }
        return new DrawnChart(
                STEM + spread.name(), title, description(spread, shown), new ChartTable(heads(), rows), sheet);
    }

    private static Bar bar(Ink ink, Interval percent) {
        double value = percent.estimate();
        boolean spread = Double.isFinite(percent.low()) && Double.isFinite(percent.high());
        return new Bar(0, ink, value, spread ? percent.low() : value, spread ? percent.high() : value, tenths(value));
    }

    /** No interval is narrower. */
    private static String tenths(double percent) {
        return TickText.of(0.1 * FastMath.rint(10.0 * percent), 3) + " %";
    }

    private static List<Head> heads() {
        List<Head> heads = new ArrayList<>();
        for (String name : List.of("total", "first_order")) {
            String words = name.equals("total") ? "in all" : "alone";
            heads.add(new Head(name, words, ""));
            heads.add(new Head(name + "_low", words + ", from", ""));
            heads.add(new Head(name + "_high", words + ", to", ""));
        }
        return heads;
    }

    private static String description(Spread spread, List<InputEffect> shown) {
        StringBuilder text =
                new StringBuilder("Sobol indices of the " + spread.words() + " with intervals of 95 % confidence: ");
        for (InputEffect one : shown.subList(0, FastMath.min(3, shown.size()))) {
            text.append(one.input())
                    .append(' ')
                    .append(tenths(100.0 * one.effect().total().estimate()))
                    .append(" in all, ")
                    .append(tenths(100.0 * one.effect().first().estimate()))
                    .append(" alone; ");
        }
        return text.toString().replaceFirst("; $", ".");
    }
}
