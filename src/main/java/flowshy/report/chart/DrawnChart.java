package flowshy.report.chart;

import flowshy.report.chart.paper.LaidText;
import flowshy.report.chart.paper.Picture;
import flowshy.report.chart.paper.PngPaper;
import flowshy.report.chart.paper.SvgPaper;
import java.util.List;

/**
 * A chart with its picture.
 *
 * @param name stable name
 * @param title what is shown
 * @param description in words
 * @param table the numbers behind it
 * @param picture drawn when asked for
 */
public record DrawnChart(String name, String title, String description, ChartTable table, Picture picture)
        implements Chart {
    @Override
    public String svg(String idPrefix) {
        return SvgPaper.of(picture, idPrefix, title, description);
    }

    @Override
    public byte[] png(int dpi) {
        return PngPaper.of(picture, dpi);
    }

    @Override
    public List<LaidText> texts() {
        return SvgPaper.texts(picture);
    }
}
