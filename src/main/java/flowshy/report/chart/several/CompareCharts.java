package flowshy.report.chart.several;

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
import flowshy.verdict.BandsAnswer.Extreme;
import flowshy.verdict.compare.ComparedDevice;
import flowshy.verdict.curve.DeviceCurve;
import java.util.ArrayList;
import java.util.List;

/** The chart of {@code compare}: the rejection of every device by frequency. */
public final class CompareCharts {
    private static final String TITLE = "Rejection of devices side by side";

    private CompareCharts() {}

    /**
     * Every chart that the answer has numbers for.
     *
     * @param study title of the first study
     * @param devices what was found, each with the name it is called by
     * @return in the order of a report; empty if no device has a solution
     */
    public static List<Chart> of(String study, List<ComparedDevice> devices) {
        List<ComparedDevice> solved =
                devices.stream().filter(device -> device.answer().isPresent()).toList();
        return solved.isEmpty() ? List.of() : List.of(curves(study, solved));
    }

    private static Chart curves(String study, List<ComparedDevice> devices) {
        BandsAnswer first = devices.get(0).answer().orElseThrow();
        double margin = first.acceptance().margin();
        List<Row> rows = new ArrayList<>();
        List<List<Double>> frequencies = new ArrayList<>();
        List<List<Double>> rejections = new ArrayList<>();
        for (ComparedDevice device : devices) {
            List<Double> frequency = new ArrayList<>();
            List<Double> rejection = new ArrayList<>();
            DeviceCurve.of(device.answer().orElseThrow()).points().forEach(point -> {
                double at = point.response().frequency();
                double value = point.response().rejection();
                double drawn = Double.isFinite(value) ? value : Double.NaN;
                frequency.add(at);
                rejection.add(drawn);
                rows.add(new Row(name(device), List.of(at, drawn)));
            });
            frequencies.add(frequency);
            rejections.add(rejection);
        }
        List<List<Double>> seen = new ArrayList<>(rejections);
        seen.add(List.of(0.0, margin));
        Bounds ends = Bounds.even(seen, 5.0);
        Bounds axis = Bounds.about(first.band().from(), first.band().to());
        Panel panel = Panel.even("rejection, dB", ends.from(), ends.to(), 1);
        PlotSheet sheet = PlotSheet.decades(new Heading(TITLE, study), "frequency, Hz", axis.from(), axis.to(), 210);
        int inks = 0;
        for (int i = 0; i < devices.size(); i++) {
            if (rejections.get(i).stream().anyMatch(Double::isFinite)) {
                panel.line(name(devices.get(i)), Ink.alike(inks++), frequencies.get(i), rejections.get(i));
            } else {
                sheet.remark("No curve for " + name(devices.get(i)) + ": no flow enters, or it reads nothing.");
            }
        }
        panel.level(margin, "margin " + TickText.of(margin, 4) + " dB", Ink.LIMIT);
        return new DrawnChart(
                "compare-rejection",
                TITLE,
                description(devices),
                new ChartTable(
                        List.of(
                                new Head("frequency_hz", "frequency", "Hz"),
                                new Head("rejection_db", "rejection", "dB")),
                        rows),
                sheet.add(panel));
    }

    private static String name(ComparedDevice device) {
        return device.contender().changes().isEmpty()
                ? "as it stands"
                : device.contender().name();
    }

    private static String description(List<ComparedDevice> devices) {
        StringBuilder text = new StringBuilder();
        for (ComparedDevice device : devices) {
            text.append(name(device))
                    .append(": least rejection ")
                    .append(device.answer()
                            .flatMap(BandsAnswer::least)
                            .map(CompareCharts::words)
                            .orElse("without a bound or not defined"))
                    .append(". ");
        }
        return text.toString().strip();
    }

    private static String words(Extreme least) {
        return TickText.of(least.rejection(), 3) + " dB at " + TickText.hertz(least.frequency(), 3);
    }
}
