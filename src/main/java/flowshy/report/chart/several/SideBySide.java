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
import flowshy.verdict.curve.DeviceCurve;
import java.util.ArrayList;
import java.util.List;

/** Rejections of devices by frequency on one sheet, with the margin of the first. */
final class SideBySide {
    /** What the device of the study itself is called. */
    static final String BASE = "as it stands";

    private final List<String> names = new ArrayList<>();
    private final List<BandsAnswer> answers = new ArrayList<>();
    private final List<String> whyNone = new ArrayList<>();

    void add(String name, BandsAnswer answer) {
        add(name, answer, "no flow enters, or it reads nothing.");
    }

    /** A device, and why it has no curve if it has none. */
    void add(String name, BandsAnswer answer, String none) {
        names.add(name);
        answers.add(answer);
        whyNone.add(none);
    }

    boolean empty() {
        return answers.isEmpty();
    }

    /** The chart; one device or more must be there. */
    Chart chart(String file, String title, String study) {
        return chart(file, title, study, description(), List.of());
    }

    /** The same described otherwise, with remarks below. */
    Chart chart(String file, String title, String study, String description, List<String> remarks) {
        BandsAnswer first = answers.get(0);
        double margin = first.acceptance().margin();
        List<Row> rows = new ArrayList<>();
        List<List<Double>> frequencies = new ArrayList<>();
        List<List<Double>> rejections = new ArrayList<>();
        for (int i = 0; i < answers.size(); i++) {
            List<Double> frequency = new ArrayList<>();
            List<Double> rejection = new ArrayList<>();
            String name = names.get(i);
            DeviceCurve.of(answers.get(i)).points().forEach(point -> {
                double at = point.response().frequency();
                double value = point.response().rejection();
                double drawn = Double.isFinite(value) ? value : Double.NaN;
                frequency.add(at);
                rejection.add(drawn);
                rows.add(new Row(name, List.of(at, drawn)));
            });
            frequencies.add(frequency);
            rejections.add(rejection);
        }
        List<List<Double>> seen = new ArrayList<>(rejections);
        seen.add(List.of(0.0, margin));
        Bounds ends = Bounds.even(seen, 5.0);
        Bounds axis = Bounds.about(first.band().from(), first.band().to());
        Panel panel = Panel.even("rejection, dB", ends.from(), ends.to(), 1);
        PlotSheet sheet = PlotSheet.decades(new Heading(title, study), "frequency, Hz", axis.from(), axis.to(), 210);
        int inks = 0;
        for (int i = 0; i < answers.size(); i++) {
            if (rejections.get(i).stream().anyMatch(Double::isFinite)) {
                panel.line(names.get(i), Ink.alike(inks++), frequencies.get(i), rejections.get(i));
            } else {
                sheet.remark("No curve for " + names.get(i) + ": " + whyNone.get(i));
            }
        }
        remarks.forEach(sheet::remark);
        panel.level(margin, "margin " + TickText.of(margin, 4) + " dB", Ink.LIMIT);
        return new DrawnChart(
                file,
                title,
                description,
                new ChartTable(
                        List.of(
                                new Head("frequency_hz", "frequency", "Hz"),
                                new Head("rejection_db", "rejection", "dB")),
                        rows),
                sheet.add(panel));
    }

    private String description() {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < answers.size(); i++) {
            text.append(names.get(i))
                    .append(": least rejection ")
                    .append(answers.get(i).least().map(SideBySide::words).orElse("without a bound or not defined"))
                    .append(". ");
        }
        return text.toString().strip();
    }

    private static String words(Extreme least) {
        return TickText.of(least.rejection(), 3) + " dB at " + TickText.hertz(least.frequency(), 3);
    }
}
