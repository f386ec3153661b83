package flowshy.report.chart.device;

import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.Columns;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.Overlay;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.Panel;
import flowshy.report.chart.paper.PlotSheet;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.Shade;
import flowshy.report.chart.paper.TickText;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import flowshy.verdict.curve.CurvePoint;
import flowshy.verdict.curve.DeviceCurve;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** Rejection against frequency: bands shaded, margin, band of use, crossings written on it. */
final class RejectionChart {
    private static final String NAME = "rejection";
    private static final int HEIGHT = 210;

    private RejectionChart() {}

    static Chart of(String study, BandsAnswer answer, DeviceCurve curve, List<Overlay> overlays) {
        double margin = answer.acceptance().margin();
        Columns<CurvePoint> columns = new Columns<>(curve.points());
        List<Double> frequency = columns.add(
                "frequency_hz", "frequency", "Hz", point -> point.response().frequency());
        List<Double> rejection = columns.add(
                "rejection_db", "rejection", "dB", point -> point.response().rejection());
        List<List<Double>> seen = new ArrayList<>(List.of(rejection, List.of(1.1 * margin, 0.0)));
        overlays.forEach(overlay -> overlay.points().forEach(point -> seen.add(List.of(point.low(), point.high()))));
        if (rejection.stream().anyMatch(value -> value < 0.0)) {
            seen.add(List.of(-1.1 * margin));
        }
        Bounds ends = Bounds.even(seen, 5.0);
        Panel panel = Panel.even("rejection, dB", ends.from(), ends.to(), 1);
        for (ReadingBand band : answer.bands()) {
            panel.shade(band.from(), band.to(), shade(band.reads()));
        }
        panel.line("rejection, motion over flow", Ink.MOTION, frequency, rejection);
        panel.dots(
                "",
                Ink.MOTION,
                answer.points().stream().map(point -> point.frequency()).toList(),
                answer.points().stream().map(point -> point.rejection()).toList());
        panel.level(margin, "margin " + TickText.of(margin, 4) + " dB", Ink.LIMIT);
        if (ends.from() <= -margin) {
            panel.level(-margin, "margin " + TickText.of(-margin, 4) + " dB", Ink.LIMIT);
        }
        overlays.forEach(overlay -> panel.measured(overlay.name(), Ink.MEASURED, overlay.rows()));
        return new DrawnChart(
                NAME,
                "Rejection against frequency",
                description(answer),
                columns.table(),
                sheet(study, answer, overlays).add(panel));
    }

    private static PlotSheet sheet(String study, BandsAnswer answer, List<Overlay> overlays) {
        Bounds axis = Bounds.about(answer.band().from(), answer.band().to(), overlays);
        PlotSheet sheet = PlotSheet.decades(
                new Heading("Rejection against frequency", study),
                "frequency, Hz; band of use " + TickText.hertz(answer.band().from(), 4) + " to "
                        + TickText.hertz(answer.band().to(), 4),
                axis.from(),
                axis.to(),
                HEIGHT);
        for (ReadingBand band : answer.bands()) {
            sheet.word(
                    FastMath.sqrt(band.from() * band.to()),
                    "reads " + band.reads().word());
            sheet.mark(band.from(), TickText.hertz(band.from(), 4));
        }
        sheet.mark(answer.band().to(), TickText.hertz(answer.band().to(), 4));
        unbounded(answer).ifPresent(sheet::remark);
        if (answer.error().isEmpty()) {
            sheet.remark("At equal accelerations of base and fluid.");
        }
        return sheet;
    }

    private static Optional<String> unbounded(BandsAnswer answer) {
        if (answer.bands().get(0).reads() == Reads.NOTHING) {
            return Optional.of("The hair is as dense as the fluid carried along: nothing turns it, there is no curve.");
        }
        return answer.least().isEmpty()
                ? Optional.of(
                        "No flow reaches the hair under this cover: the rejection has no bound, there is no curve.")
                : Optional.empty();
    }

    private static String description(BandsAnswer answer) {
        StringBuilder text = new StringBuilder();
        for (ReadingBand band : answer.bands()) {
            text.append("Reads ")
                    .append(band.reads().word())
                    .append(" from ")
                    .append(TickText.hertz(band.from(), 4))
                    .append(" to ")
                    .append(TickText.hertz(band.to(), 4))
                    .append(". ");
        }
        answer.least()
                .ifPresent(least -> text.append("Least rejection ")
                        .append(TickText.of(least.rejection(), 4))
                        .append(" dB at ")
                        .append(TickText.hertz(least.frequency(), 4))
                        .append(", margin ")
                        .append(TickText.of(answer.acceptance().margin(), 4))
                        .append(" dB."));
        unbounded(answer).ifPresent(text::append);
        return text.toString().strip();
    }

    private static Shade shade(Reads reads) {
        return switch (reads) {
            case MOTION -> Shade.MOTION;
            case MIXED -> Shade.MIXED;
            case FLOW -> Shade.FLOW;
            case NOTHING -> Shade.NOTHING;
            case UNDECIDED -> Shade.UNDECIDED;
        };
    }
}
