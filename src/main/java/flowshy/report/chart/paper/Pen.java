package flowshy.report.chart.paper;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** Writes lines of text at places, and knows beforehand how long they will be. */
final class Pen {
    /** Metrics that depend on no device: a text is as long on the screen as on paper. */
    static final FontRenderContext METRICS = new FontRenderContext(null, true, true);

    private static final String CUT = "…";

    private final Graphics2D graphics;

    Pen(Graphics2D graphics) {
        this.graphics = graphics;
    }

    static double width(Font font, String text) {
        return text.isEmpty() ? 0.0 : font.getStringBounds(text, METRICS).getWidth();
    }

    static double height(Font font) {
        return font.getLineMetrics("Ag", METRICS).getHeight();
    }

    /** Box of a text whose left end of the baseline is given. */
    static Rectangle2D box(Font font, String text, double x, double baseline) {
        double ascent =
                font.getLineMetrics(text.isEmpty() ? "A" : text, METRICS).getAscent();
        return new Rectangle2D.Double(x, baseline - ascent, width(font, text), height(font));
    }

    void write(Font font, Color colour, String text, double x, double baseline) {
        if (text.isEmpty()) {
            return;
        }
        graphics.setFont(font);
        graphics.setPaint(colour);
        graphics.drawString(text, (float) x, (float) baseline);
    }

    /** Pales what lies under words to come. */
    void clear(Rectangle2D box) {
        graphics.setPaint(new Color(255, 255, 255, 190));
        graphics.fill(box);
    }

    /** The beginning of a text that fits a width, with dots where it was cut; never half a character. */
    static String fitting(Font font, String text, double width) {
        if (width(font, text) <= width) {
            return text;
        }
        int end = text.length();
        while (end > 0) {
            end = text.offsetByCodePoints(end, -1);
            String shorter = text.substring(0, end).stripTrailing() + CUT;
            if (width(font, shorter) <= width) {
                return shorter;
            }
        }
        return CUT;
    }

    /** Lines that fit a width, broken at spaces; the last is cut where more than so many would be needed. */
    static List<String> wrapped(Font font, String text, double width, int most) {
        List<String> lines = new ArrayList<>();
        String rest = text.strip();
        while (!rest.isEmpty() && lines.size() < most - 1 && width(font, rest) > width) {
            int end = rest.length();
            while (end > 0 && width(font, rest.substring(0, end)) > width) {
                end = rest.lastIndexOf(' ', end - 1);
            }
            if (end <= 0) {
                break; // one long word: cut below
            }
            lines.add(rest.substring(0, end).stripTrailing());
            rest = rest.substring(end).strip();
        }
        if (!rest.isEmpty()) {
            lines.add(fitting(font, rest, width));
        }
        return lines;
    }
}
