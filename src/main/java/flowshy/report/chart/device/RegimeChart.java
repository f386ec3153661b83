package flowshy.report.chart.device;

import flowshy.cylinder.excursion.Regime;
import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.chart.ChartTable.Head;
import flowshy.report.chart.ChartTable.Row;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.Panel;
import flowshy.report.chart.paper.PlotSheet;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.TickText;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.error.RegimePath;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** Which law of force governs: excursion over diameter against Womersley number, and where this hair lives. */
final class RegimeChart {
    private static final String TITLE = "Which law of force governs, and where this hair lives";
    private static final int HEIGHT = 260;
    private static final int STEPS = 60;

    /** Womersley number from which the attached flow's instability was observed: β = 52, see {@link Regime#unstable}. */
    private static final double UNSTABLE_FROM = FastMath.sqrt(0.5 * FastMath.PI * 52.0);

    private RegimeChart() {}

    static Chart of(String study, BandsAnswer answer, List<RegimePath> paths, boolean stated) {
        List<Row> rows = new ArrayList<>();
        List<List<Double>> numbers = new ArrayList<>();
        List<List<Double>> excursions = new ArrayList<>();
        for (RegimePath path : paths) {
            String name = name(path, stated);
            for (RegimePath.Point point : path.points()) {
                rows.add(new Row(
                        name,
                        List.of(
                                point.frequency(),
                                point.regime().womersley(),
                                point.excursion(),
                                point.regime().reynolds(),
                                point.regime().excursionRatio())));
            }
            numbers.add(path.points().stream()
                    .map(point -> point.regime().womersley())
                    .toList());
            excursions.add(
                    path.points().stream().map(RegimePath.Point::excursion).toList());
        }
        Bounds x = wide(Bounds.decades(numbers, 12.0), 3.0);
        List<List<Double>> tall = new ArrayList<>(excursions);
        tall.add(List.of(0.1 * edge(0.3, x.to()), 5.0 * edge(3.0, FastMath.sqrt(x.from() * x.to()))));
        Bounds y = Bounds.decades(tall, 12.0);
        Panel panel = Panel.decades("excursion over diameter, 2π (speed/ω)/d, no unit", y.from(), y.to(), 1);
        for (int i = 0; i < paths.size(); i++) {
            panel.line(name(paths.get(i), stated), Ink.alike(i), numbers.get(i), excursions.get(i));
            panel.dots(
                    "",
                    Ink.alike(i),
                    numbers.get(i).subList(0, 1),
                    excursions.get(i).subList(0, 1));
        }
        List<Double> steps = steps(x);
        panel.line(
                "", Ink.BOUNDARY, steps, steps.stream().map(wo -> edge(0.3, wo)).toList());
        panel.line(
                "", Ink.BOUNDARY, steps, steps.stream().map(wo -> edge(3.0, wo)).toList());
        panel.line("", Ink.LIMIT, steps, steps.stream().map(RegimeChart::hall).toList());
        double middle = FastMath.sqrt(x.from() * x.to());
        panel.words(middle, FastMath.sqrt(y.from() * edge(0.3, middle)), "linear law");
        panel.words(middle, edge(0.95, middle), "between the two");
        panel.words(middle, FastMath.sqrt(y.to() * edge(3.0, middle)), "steady drag, instant by instant");
        if (x.to() > 2.0 * UNSTABLE_FROM) {
            panel.words(FastMath.sqrt(UNSTABLE_FROM * x.to()), 2.0 * hall(UNSTABLE_FROM), "vortices above the dashes");
        }
        PlotSheet sheet = PlotSheet.decades(
                        new Heading(TITLE, study),
                        "Womersley number on the radius, a √(ω/ν), no unit",
                        x.from(),
                        x.to(),
                        HEIGHT)
                .add(panel)
                .remark(
                        "The dot is the lower end of the band of use, "
                                + TickText.hertz(answer.band().from(), 4)
                                + ". "
                                + (stated
                                        ? "Speed: of mean and fluctuation the larger, all sources together; without a mean stream this is KC."
                                        : "No surroundings are stated: peak speeds for comparison, on the thickest part; this is KC."));
        return new DrawnChart(
                "regime",
                TITLE,
                description(paths, stated),
                new ChartTable(
                        List.of(
                                new Head("frequency_hz", "frequency", "Hz"),
                                new Head("womersley", "Womersley number", ""),
                                new Head("excursion_over_diameter", "excursion over diameter", ""),
                                new Head("reynolds", "Reynolds number", ""),
                                new Head("excursion_ratio", "excursion over radius or layer", "")),
                        rows),
                sheet);
    }

    private static String name(RegimePath path, boolean stated) {
        return stated
                ? TickText.of(1e6 * path.height(), 3) + " µm above the wall, " + TickText.of(path.speed(), 2) + " m/s"
                : TickText.of(1e3 * path.speed(), 2) + " mm/s";
    }

    /** Excursion over diameter at which the excursion ratio has a value: X = (speed/ω)/max(a, δ), δ/a = √2/Wo. */
    private static double edge(double ratio, double womersley) {
        return FastMath.PI * ratio * FastMath.max(1.0, FastMath.sqrt(2.0) / womersley);
    }

    private static double hall(double womersley) {
        return womersley < UNSTABLE_FROM
                ? Double.NaN
                : new Regime(0.0, womersley, 0.0, 0.0, Regime.Kind.LINEAR).hallThreshold();
    }

    private static List<Double> steps(Bounds x) {
        List<Double> steps = new ArrayList<>();
        for (int i = 0; i <= STEPS; i++) {
            steps.add(x.from() * FastMath.pow(x.to() / x.from(), (double) i / STEPS));
        }
        return steps;
    }

    private static Bounds wide(Bounds bounds, double factor) {
        return new Bounds(bounds.from() / factor, bounds.to() * factor);
    }

    private static String description(List<RegimePath> paths, boolean stated) {
        StringBuilder text = new StringBuilder();
        for (RegimePath path : paths) {
            RegimePath.Point low = path.points().get(0);
            RegimePath.Point high = path.points().get(path.points().size() - 1);
            text.append(name(path, stated))
                    .append(": ")
                    .append(low.regime().kind().words())
                    .append(" at ")
                    .append(TickText.hertz(low.frequency(), 4))
                    .append(", ")
                    .append(high.regime().kind().words())
                    .append(" at ")
                    .append(TickText.hertz(high.frequency(), 4))
                    .append(". ");
        }
        return text.toString().strip();
    }
}
