package flowshy.report.chart;

import flowshy.report.chart.paper.LaidText;
import java.util.List;

/** One picture of an answer, with its words and its numbers. Nothing is drawn before it is asked for. */
public interface Chart {
    /**
     * Stable name.
     *
     * @return lower-case ASCII words joined by hyphens, the stem of its files
     */
    String name();

    /**
     * What is shown.
     *
     * @return one line
     */
    String title();

    /**
     * What a reader who cannot see the picture should know.
     *
     * @return sentences with the main figures
     */
    String description();

    /**
     * The numbers drawn.
     *
     * @return the table behind the picture
     */
    ChartTable table();

    /**
     * The picture as an SVG document without a prolog, fit for a file or for a page: it has title, description and an opaque ground of its
     * own, no script, no reference to anything outside.
     *
     * @param idPrefix begins every id in it, so that several share a page; letters, digits, hyphens
     * @return text, UTF-8
     */
    String svg(String idPrefix);

    /**
     * The picture as PNG.
     *
     * @param dpi pixels an inch, stated in the file
     * @return the file's bytes
     */
    byte[] png(int dpi);

    /**
     * Every text of the picture where it was laid out, for tests.
     *
     * @return in the order drawn, units of the sheet
     */
    List<LaidText> texts();
}
