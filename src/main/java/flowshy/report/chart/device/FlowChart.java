package flowshy.report.chart.device;

import flowshy.report.chart.Chart;
import flowshy.report.chart.Columns;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.Panel;
import flowshy.report.chart.paper.PlotSheet;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.TickText;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.error.FlowOverHair;
import flowshy.verdict.error.FlowOverHair.Level;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** How fast the fluid is over the wall, against the length of the hair: mean streams, and all fluctuation together. */
final class FlowChart {
    private static final String TITLE = "Flow over the hair";
    private static final int HEIGHT = 240;

    private FlowChart() {}

    static Chart of(String study, BandsAnswer answer, FlowOverHair flow) {
        Columns<Level> columns = new Columns<>(flow.levels());
        List<Double> height = columns.add("height_m", "height above the wall", "m", Level::height);
        List<Double> micrometres = height.stream().map(z -> 1e6 * z).toList();
        double length = 1e6 * answer.device().hair().profile().length();
        double top = micrometres.get(micrometres.size() - 1);
        Panel panel = Panel.even("height above the wall, µm", 0.0, FastMath.max(top, length) * 1.02, 1);
        List<List<Double>> speeds = new ArrayList<>();
        int drawn = 0;
        for (int i = 0; i < flow.sources().size(); i++) {
            int source = i;
            List<Double> mean = columns.add(
                    "source_" + (i + 1) + "_mean_m_s",
                    flow.sources().get(i) + ", mean",
                    "m/s",
                    level -> level.means().get(source));
            if (mean.stream().anyMatch(speed -> speed != 0.0)) {
                panel.line("mean of " + flow.sources().get(i), Ink.alike(drawn++), mean, micrometres);
                speeds.add(mean);
            }
        }
        List<Double> deviation = columns.add("fluctuation_m_s", "fluctuation, rms", "m/s", Level::deviation);
        panel.line("all fluctuation, rms", Ink.FLOW, deviation, micrometres);
        panel.level(length, "tip of the hair", Ink.BOUNDARY);
        speeds.add(deviation);
        double fastest = speeds.stream()
                .flatMap(List::stream)
                .mapToDouble(Double::doubleValue)
                .max()
                .orElse(0.0);
        PlotSheet sheet = PlotSheet.even(
                        new Heading(TITLE, study), "speed, m/s", 0.0, fastest > 0.0 ? 1.08 * fastest : 1.0, HEIGHT)
                .add(panel);
        if (answer.device().cover().closed()) {
            sheet.remark("Under this cover no flow reaches the hair.");
        }
        return new DrawnChart("flow-profile", TITLE, description(flow, length), columns.table(), sheet);
    }

    private static String description(FlowOverHair flow, double length) {
        Level tip = flow.levels().get(0);
        for (Level level : flow.levels()) {
            if (1e6 * level.height() <= length * 1.001) {
                tip = level;
            }
        }
        return "Speed of the fluid from the wall up. Near the tip, " + TickText.of(1e6 * tip.height(), 3)
                + " µm above the wall: mean " + TickText.of(tip.mean(), 3) + " m/s, fluctuation "
                + TickText.of(tip.deviation(), 3) + " m/s rms.";
    }
}
