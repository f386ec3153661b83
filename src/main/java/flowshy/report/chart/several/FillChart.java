package flowshy.report.chart.several;

import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.chart.ChartTable.Head;
import flowshy.report.chart.ChartTable.Row;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.RowSheet;
import flowshy.report.chart.paper.RowSheet.Mark;
import flowshy.report.chart.paper.TickText;
import flowshy.study.Study;
import flowshy.verdict.Acceptance;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import flowshy.verdict.fill.FillRow;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The chart of {@code fill}: every fluid, its rejection and its noise. */
public final class FillChart {
    private static final String TITLE = "Fills side by side";
    private static final int MOST = 60;

    private FillChart() {}

    /**
     * The chart.
     *
     * @param study what was asked
     * @param acceptance gives the margin
     * @param rows what was found, in their order
     * @return one chart, of the first sixty that are not excluded or, if all are, of the first sixty
     */
    public static List<Chart> of(Study study, Acceptance acceptance, List<FillRow> rows) {
        List<FillRow> fit =
                rows.stream().filter(row -> row.excluded().isEmpty()).toList();
        List<FillRow> all = fit.isEmpty() ? rows : fit;
        List<FillRow> shown = all.subList(0, Math.min(MOST, all.size()));
        boolean noisy = shown.stream().anyMatch(row -> row.thermalNoise().isPresent());
        boolean states = shown.stream()
                .anyMatch(row -> row.judged().flatMap(FillRow.Judged::envelope).isPresent());
        double margin = acceptance.margin();
        List<List<Double>> rejections = new ArrayList<>(List.of(List.of(0.0, margin)));
        List<List<Double>> noises = new ArrayList<>();
        List<Row> table = new ArrayList<>();
        for (FillRow row : shown) {
            rejections.add(List.of(row.rejection()));
            double noise = row.thermalNoise().orElse(Double.NaN);
            noises.add(List.of(noise));
            double rejection = Double.isFinite(row.rejection()) ? row.rejection() : Double.NaN;
            rejections.add(List.of(worst(row)));
            List<Double> figures = new ArrayList<>(noisy ? List.of(rejection, noise) : List.of(rejection));
            if (states) {
                figures.add(worst(row));
            }
            table.add(new Row(name(row), figures));
        }
        Bounds decibels = Bounds.even(rejections, 10.0);
        RowSheet sheet = new RowSheet(new Heading(TITLE, study.title()), 150)
                .even("least rejection, dB", decibels.from(), decibels.to() + 5.0)
                .limit(margin, "margin " + TickText.of(margin, 4) + " dB");
        if (noisy) {
            Bounds ends = Bounds.decades(noises, 6.0);
            sheet.decades("thermal noise, m/s²/√Hz", ends.from(), ends.to());
        }
        for (FillRow row : shown) {
            List<Mark> marks = new ArrayList<>();
            marks.add(
                    Double.isFinite(row.rejection())
                            ? new Mark(0, Ink.FIRST, OptionalDouble.of(row.rejection()), "")
                            : new Mark(
                                    0,
                                    Ink.FIRST,
                                    OptionalDouble.empty(),
                                    Double.isNaN(row.rejection()) ? "reads nothing" : "no flow enters"));
            if (Double.isFinite(worst(row))) {
                marks.add(new Mark(0, Ink.SECOND, OptionalDouble.of(worst(row)), ""));
            }
            if (row.thermalNoise().isPresent()) {
                marks.add(new Mark(1, Ink.FIRST, row.thermalNoise(), ""));
            }
            sheet.row(name(row), marks);
        }
        if (states) {
            sheet.name(Ink.FIRST, "own state").name(Ink.SECOND, "worst state");
        }
        int left = rows.size() - shown.size();
        if (left > 0) {
            sheet.remark(left + (left == 1 ? " fill is" : " fills are")
                    + " left out: excluded, or beyond the first sixty; see the table of the command.");
        }
        List<Head> heads = new ArrayList<>(List.of(new Head("rejection_db", "least rejection", "dB")));
        if (noisy) {
            heads.add(new Head("thermal_noise_m_s2_per_rthz", "thermal noise", "m/s²/√Hz"));
        }
        if (states) {
            heads.add(new Head("worst_rejection_db", "least rejection, worst state", "dB"));
        }
        return List.of(new DrawnChart("fills", TITLE, description(shown), new ChartTable(heads, table), sheet));
    }

    private static double worst(FillRow row) {
        return row.lowest().map(AtState::value).orElse(Double.NaN);
    }

    private static String name(FillRow row) {
        return row.fill() + ", " + row.cover().kind();
    }

    private static String description(List<FillRow> shown) {
        StringBuilder text = new StringBuilder("Least rejection and thermal noise of the device in " + shown.size()
                + " fills. The first of the list: ");
        shown.stream()
                .limit(3)
                .forEach(row -> text.append(name(row))
                        .append(' ')
                        .append(
                                Double.isFinite(row.rejection())
                                        ? TickText.of(row.rejection(), 3) + " dB"
                                        : Double.isNaN(row.rejection()) ? "reads nothing" : "without bound")
                        .append("; "));
        return text.toString().replaceFirst("; $", ".");
    }
}
