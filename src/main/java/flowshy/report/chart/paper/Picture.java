package flowshy.report.chart.paper;

import java.awt.Graphics2D;

/** Something that can be drawn on a sheet of its own, as often as wanted, each time the same. */
public interface Picture {
    /**
     * Width of the sheet.
     *
     * @return in points of 1/72 inch
     */
    int width();

    /**
     * Height of the sheet.
     *
     * @return in points of 1/72 inch
     */
    int height();

    /**
     * Draws.
     *
     * @param graphics with the origin at the upper left corner, one unit a point
     */
    void draw(Graphics2D graphics);
}
