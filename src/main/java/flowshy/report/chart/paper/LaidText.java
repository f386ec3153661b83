package flowshy.report.chart.paper;

import java.awt.geom.Rectangle2D;

/**
 * A text where it was laid out.
 *
 * @param text as drawn
 * @param left [units of the sheet]
 * @param top likewise
 * @param right likewise
 * @param bottom likewise
 * @param whole whether nothing of it is clipped
 */
public record LaidText(String text, double left, double top, double right, double bottom, boolean whole) {
    static LaidText of(String text, Rectangle2D bounds, boolean whole) {
        return new LaidText(text, bounds.getMinX(), bounds.getMinY(), bounds.getMaxX(), bounds.getMaxY(), whole);
    }

    /**
     * Whether two texts cover each other by more than a hair's breadth.
     *
     * @param other another text
     * @return true if they do
     */
    public boolean overlaps(LaidText other) {
        double slack = 0.5;
        return left + slack < other.right
                && other.left + slack < right
                && top + slack < other.bottom
                && other.top + slack < bottom;
    }
}
