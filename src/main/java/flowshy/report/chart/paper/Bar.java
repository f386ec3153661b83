package flowshy.report.chart.paper;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.ui.RectangleEdge;

/**
 * A bar from zero in a row of a {@link RowSheet}, with what is known of its error as a line along it. Several of one scale stand one under
 * another.
 *
 * @param scale index of the scale
 * @param ink its colour; the second of several alike is open
 * @param value where it ends
 * @param low lower end of its interval, the value itself where none is drawn
 * @param high upper end of its interval, likewise
 * @param words written beyond it
 */
public record Bar(int scale, Ink ink, double value, double low, double high, String words) {
    /** Height of a row that each bar of a scale takes. */
    static final double PITCH = 12.0;

    private static final double THICK = 8.0;
    private static final double CAP = 2.5;
    private static final double ASIDE = 4.0;

    /** Draws the bar about a height of its area. */
    void draw(Graphics2D graphics, ValueAxis axis, Rectangle2D area, double middle) {
        double zero = x(axis, area, 0.0);
        double end = x(axis, area, value);
        fill(
                graphics,
                ink,
                new Rectangle2D.Double(Math.min(zero, end), middle - 0.5 * THICK, Math.abs(end - zero), THICK));
        if (high > low) {
            double left = x(axis, area, low);
            double right = x(axis, area, high);
            graphics.setPaint(Typeface.DARK);
            graphics.setStroke(new BasicStroke(1.1f));
            graphics.draw(new Line2D.Double(left, middle, right, middle));
            graphics.draw(new Line2D.Double(left, middle - CAP, left, middle + CAP));
            graphics.draw(new Line2D.Double(right, middle - CAP, right, middle + CAP));
        }
    }

    /** Writes its words on the other side of zero, where no bar is, or beyond the bar where there is no room. */
    void write(Pen pen, ValueAxis axis, Rectangle2D area, double middle) {
        double width = Pen.width(Typeface.SMALL, words);
        double zero = x(axis, area, 0.0);
        double right = Math.max(zero, x(axis, area, Math.max(value, high))) + ASIDE;
        double left = zero - ASIDE - width;
        double at = value < 0.0 || left < area.getMinX() ? right : left;
        pen.write(Typeface.SMALL, Typeface.DARK, words, at, middle + 3.5);
    }

    /** How bars of an ink look, for the bar itself and in the key: told apart without colour. */
    static void fill(Graphics2D graphics, Ink ink, Rectangle2D box) {
        boolean open = ink == Ink.SECOND;
        Color colour = ink.colour();
        Paint inside = open ? new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), 50) : colour;
        graphics.setPaint(inside);
        graphics.fill(box);
        graphics.setPaint(colour);
        graphics.setStroke(new BasicStroke(0.9f));
        graphics.draw(box);
    }

    private static double x(ValueAxis axis, Rectangle2D area, double at) {
        return axis.valueToJava2D(at, area, RectangleEdge.BOTTOM);
    }
}
