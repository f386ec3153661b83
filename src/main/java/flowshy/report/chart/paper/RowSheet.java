package flowshy.report.chart.paper;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.axis.ValueTick;
import org.jfree.chart.ui.RectangleEdge;

/** A sheet on which things stand one under another, each with a dot or bars on one or more scales, so that they can be compared. */
public final class RowSheet implements Picture {
    private static final int WIDTH = 460;
    private static final int MARGIN = 10;
    private static final int BETWEEN = 16;
    private static final int RIGHT = 18;
    private static final int ROW = 16;
    private static final int LINE = 13;
    private static final double DOT = 3.4;

    private final PlotSheet.Heading heading;
    private final int labelWidth;
    private final List<Scale> scales = new ArrayList<>();
    private final List<Row> rows = new ArrayList<>();
    private final Map<String, Ink> key = new LinkedHashMap<>();
    private final List<String> remarks = new ArrayList<>();

    /** One scale beside the labels. */
    private record Scale(String heading, ValueAxis axis, Optional<Limit> limit) {}

    private record Limit(double value, String words) {}

    /** One thing. */
    record Row(String label, List<Mark> marks, List<Bar> bars) {
        private long deepest() {
            return bars.stream()
                    .mapToLong(bar -> bars.stream()
                            .filter(other -> other.scale() == bar.scale())
                            .count())
                    .max()
                    .orElse(0);
        }
    }

    /**
     * What stands in a row under a scale.
     *
     * @param scale index of the scale
     * @param ink its colour and shape; the second of several alike is open
     * @param value on the scale, absent where there is none
     * @param words written in its place where there is no value, or beside it; may be empty
     */
    public record Mark(int scale, Ink ink, OptionalDouble value, String words) {}

    /**
     * An empty sheet.
     *
     * @param heading over it
     * @param labelWidth room for the names of things [points]
     */
    public RowSheet(PlotSheet.Heading heading, int labelWidth) {
        this.heading = heading;
        this.labelWidth = labelWidth;
    }

    /**
     * Adds a linear scale.
     *
     * @param name quantity and unit
     * @param from lower end
     * @param to upper end
     * @return this
     */
    public RowSheet even(String name, double from, double to) {
        scales.add(new Scale(name, new EvenAxis(from, to, false), Optional.empty()));
        return this;
    }

    /**
     * Adds a logarithmic scale.
     *
     * @param name quantity and unit
     * @param from lower end, positive
     * @param to upper end
     * @return this
     */
    public RowSheet decades(String name, double from, double to) {
        scales.add(new Scale(name, new DecadeAxis(from, to), Optional.empty()));
        return this;
    }

    /**
     * Draws a limit on the last scale.
     *
     * @param value on it
     * @param words in the key
     * @return this
     */
    public RowSheet limit(double value, String words) {
        Scale last = scales.remove(scales.size() - 1);
        scales.add(new Scale(last.heading(), last.axis(), Optional.of(new Limit(value, words))));
        return this;
    }

    /**
     * Adds a thing.
     *
     * @param label its name; wrapped where it is long
     * @param marks in any order
     * @return this
     */
    public RowSheet row(String label, List<Mark> marks) {
        rows.add(new Row(label, List.copyOf(marks), List.of()));
        return this;
    }

    /**
     * Adds a thing that is told by bars.
     *
     * @param label its name; wrapped where it is long
     * @param bars those of one scale from above to below
     * @return this
     */
    public RowSheet bars(String label, List<Bar> bars) {
        rows.add(new Row(label, List.of(), List.copyOf(bars)));
        return this;
    }

    /** What stands on the sheet, for tests. */
    List<Row> rows() {
        return List.copyOf(rows);
    }

    /**
     * Names an ink in the key.
     *
     * @param ink of marks
     * @param words what it stands for
     * @return this
     */
    public RowSheet name(Ink ink, String words) {
        key.put(words, ink);
        return this;
    }

    /**
     * Adds a remark under the key.
     *
     * @param text a sentence or two
     * @return this
     */
    public RowSheet remark(String text) {
        remarks.add(text);
        return this;
    }

    @Override
    public int width() {
        return WIDTH;
    }

    @Override
    public int height() {
        return bottom()
                + 22
                + (key.isEmpty() && !limited() ? 0 : 20)
                + 13 * remarkLines().size()
                + MARGIN;
    }

    private boolean limited() {
        return scales.stream().anyMatch(scale -> scale.limit().isPresent());
    }

    private List<String> remarkLines() {
        List<String> lines = new ArrayList<>();
        remarks.forEach(remark -> lines.addAll(Pen.wrapped(Typeface.SMALL, remark, WIDTH - 2.0 * MARGIN, 3)));
        return lines;
    }

    private List<String> title() {
        return Pen.wrapped(Typeface.TITLE, heading.title(), WIDTH - 2.0 * MARGIN, 2);
    }

    private int top() {
        return MARGIN + 17 * title().size() + (PlainText.of(heading.study()).isEmpty() ? 0 : 14) + 24;
    }

    private List<String> label(Row row) {
        return Pen.wrapped(Typeface.SMALL, PlainText.of(row.label()), labelWidth - 6.0, 3);
    }

    private int tall(Row row) {
        int words = Math.max(ROW, LINE * label(row).size() + 4);
        return Math.max(words, (int) (Bar.PITCH * row.deepest()) + 5);
    }

    private int bottom() {
        return top() + rows.stream().mapToInt(this::tall).sum();
    }

    private Rectangle2D area(int scale) {
        double all = WIDTH - RIGHT - MARGIN - labelWidth - BETWEEN * (scales.size() - 1.0);
        double width = all / scales.size();
        return new Rectangle2D.Double(
                MARGIN + labelWidth + scale * (width + BETWEEN), top(), width, bottom() - (double) top());
    }

    @Override
    public void draw(Graphics2D graphics) {
        graphics.setPaint(Color.WHITE);
        graphics.fill(new Rectangle2D.Double(0, 0, WIDTH, height()));
        Pen pen = new Pen(graphics);
        double y = MARGIN + 12.0;
        for (String line : title()) {
            pen.write(Typeface.TITLE, Typeface.DARK, line, MARGIN, y);
            y += 17;
        }
        String study = Pen.fitting(Typeface.TEXT, PlainText.of(heading.study()), WIDTH - 2.0 * MARGIN);
        pen.write(Typeface.TEXT, Typeface.GREY, study, MARGIN, y);
        for (int i = 0; i < scales.size(); i++) {
            drawScale(graphics, pen, scales.get(i), area(i));
        }
        double row = top();
        for (Row thing : rows) {
            drawRow(graphics, pen, thing, row);
            drawBars(graphics, pen, thing, row);
            row += tall(thing);
        }
        drawKey(graphics, pen);
    }

    private static void drawScale(Graphics2D graphics, Pen pen, Scale scale, Rectangle2D area) {
        pen.write(
                Typeface.TEXT,
                Typeface.DARK,
                Pen.fitting(Typeface.TEXT, scale.heading(), area.getWidth() + RIGHT - 4),
                area.getMinX(),
                area.getMinY() - 8);
        graphics.setStroke(new BasicStroke(0.6f));
        for (Object each : scale.axis().refreshTicks(graphics, new AxisState(), area, RectangleEdge.BOTTOM)) {
            ValueTick tick = (ValueTick) each;
            double x = scale.axis().valueToJava2D(tick.getValue(), area, RectangleEdge.BOTTOM);
            graphics.setPaint(new Color(tick.getText().isEmpty() ? 0xE4E4E4 : 0xC9C9C9));
            graphics.draw(new Line2D.Double(x, area.getMinY(), x, area.getMaxY()));
            double width = Pen.width(Typeface.TEXT, tick.getText());
            pen.write(Typeface.TEXT, Typeface.DARK, tick.getText(), x - 0.5 * width, area.getMaxY() + 14);
        }
        graphics.setPaint(Ink.BOUNDARY.colour());
        graphics.draw(area);
        scale.limit().ifPresent(limit -> {
            double x = scale.axis().valueToJava2D(limit.value(), area, RectangleEdge.BOTTOM);
            graphics.setPaint(Ink.LIMIT.colour());
            graphics.setStroke(Ink.LIMIT.stroke());
            graphics.draw(new Line2D.Double(x, area.getMinY(), x, area.getMaxY()));
        });
    }

    private void drawRow(Graphics2D graphics, Pen pen, Row row, double top) {
        double line = top + 0.5 * (tall(row) - LINE * label(row).size()) + 10;
        for (String text : label(row)) {
            pen.write(Typeface.SMALL, Typeface.DARK, text, MARGIN, line);
            line += LINE;
        }
        double middle = top + 0.5 * tall(row);
        graphics.setPaint(new Color(0xE4E4E4));
        graphics.setStroke(new BasicStroke(0.6f));
        graphics.draw(new Line2D.Double(MARGIN, top, WIDTH - RIGHT, top));
        for (Mark mark : row.marks()) {
            Rectangle2D area = area(mark.scale());
            if (mark.value().isEmpty()) {
                String text = Pen.fitting(Typeface.SMALL, mark.words(), area.getWidth() - 6);
                clear(graphics, text, area.getMinX() + 3, middle + 4);
                pen.write(Typeface.SMALL, Typeface.GREY, text, area.getMinX() + 3, middle + 4);
                continue;
            }
            double x = scales.get(mark.scale())
                    .axis()
                    .valueToJava2D(mark.value().getAsDouble(), area, RectangleEdge.BOTTOM);
            draw(graphics, mark.ink(), x, middle);
            if (!mark.words().isEmpty()) {
                double width = Pen.width(Typeface.SMALL, mark.words());
                double at = x + DOT + 4 + width < area.getMaxX() ? x + DOT + 4 : x - DOT - 4 - width;
                clear(graphics, mark.words(), at, middle + 4);
                pen.write(Typeface.SMALL, Typeface.DARK, mark.words(), at, middle + 4);
            }
        }
    }

    /** Bars first, words over them; from zero, which has a line of its own. */
    private void drawBars(Graphics2D graphics, Pen pen, Row row, double top) {
        for (int i = 0; i < scales.size(); i++) {
            int scale = i;
            List<Bar> bars =
                    row.bars().stream().filter(bar -> bar.scale() == scale).toList();
            ValueAxis axis = scales.get(i).axis();
            Rectangle2D area = area(i);
            double middle = top + 0.5 * tall(row) - 0.5 * Bar.PITCH * (bars.size() - 1);
            for (Bar bar : bars) {
                bar.draw(graphics, axis, area, middle);
                bar.write(pen, axis, area, middle);
                middle += Bar.PITCH;
            }
            if (!bars.isEmpty()) {
                double zero = axis.valueToJava2D(0.0, area, RectangleEdge.BOTTOM);
                graphics.setPaint(Ink.BOUNDARY.colour());
                graphics.setStroke(new BasicStroke(0.9f));
                graphics.draw(new Line2D.Double(zero, top, zero, top + tall(row)));
            }
        }
    }

    /** A limit's line must not run through words. */
    private static void clear(Graphics2D graphics, String text, double x, double baseline) {
        Rectangle2D box = Pen.box(Typeface.SMALL, text, x, baseline);
        graphics.setPaint(Color.WHITE);
        graphics.fill(new Rectangle2D.Double(box.getX() - 1, box.getY() + 1, box.getWidth() + 2, box.getHeight() - 2));
    }

    /** Filled for the first of several alike, an open square for the second: told apart without colour. */
    private static void draw(Graphics2D graphics, Ink ink, double x, double y) {
        graphics.setPaint(ink.colour());
        if (ink == Ink.SECOND) {
            graphics.setStroke(new BasicStroke(1.4f));
            graphics.draw(new Rectangle2D.Double(x - DOT + 0.5, y - DOT + 0.5, 2 * DOT - 1, 2 * DOT - 1));
        } else if (ink == Ink.THIRD) {
            graphics.setStroke(new BasicStroke(1.4f));
            graphics.draw(new Line2D.Double(x - DOT, y - DOT, x + DOT, y + DOT));
            graphics.draw(new Line2D.Double(x - DOT, y + DOT, x + DOT, y - DOT));
        } else {
            graphics.fill(new Ellipse2D.Double(x - DOT, y - DOT, 2 * DOT, 2 * DOT));
        }
    }

    private void drawKey(Graphics2D graphics, Pen pen) {
        double x = MARGIN;
        double y = bottom() + 30.0;
        for (Map.Entry<String, Ink> entry : key.entrySet()) {
            if (rows.stream().anyMatch(row -> !row.bars().isEmpty())) {
                Bar.fill(graphics, entry.getValue(), new Rectangle2D.Double(x + 1, y - 8, 10, 8));
            } else {
                draw(graphics, entry.getValue(), x + 6, y - 4);
            }
            pen.write(Typeface.TEXT, Typeface.DARK, entry.getKey(), x + 15, y);
            x += 15 + Pen.width(Typeface.TEXT, entry.getKey()) + 12;
        }
        for (Scale scale : scales) {
            if (scale.limit().isPresent()) {
                graphics.setPaint(Ink.LIMIT.colour());
                graphics.setStroke(Ink.LIMIT.stroke());
                graphics.draw(new Line2D.Double(x, y - 4, x + 26, y - 4));
                String words = scale.limit().get().words();
                pen.write(Typeface.TEXT, Typeface.DARK, words, x + 31, y);
                x += 31 + Pen.width(Typeface.TEXT, words) + 12;
            }
        }
        y = bottom() + 22 + (key.isEmpty() && !limited() ? 0 : 20) + 10.0;
        for (String line : remarkLines()) {
            pen.write(Typeface.SMALL, Typeface.GREY, line, MARGIN, y);
            y += 13;
        }
    }
}
