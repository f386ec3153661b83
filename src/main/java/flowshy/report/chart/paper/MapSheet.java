package flowshy.report.chart.paper;

import flowshy.report.chart.paper.PlotSheet.Heading;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.AxisSpace;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;

/**
 * A sheet with one pair of axes and coloured blocks between them, lines of equal value over these, a scale of colours beside, a key and
 * remarks below. A block without a number is hatched, one that counts little is dotted over its colour.
 */
public final class MapSheet implements Picture {
    private static final int WIDTH = 460;
    private static final int MARGIN = 10;
    private static final int LEFT = 58;
    /** Room beside the panel, at least; figures of many digits take more. */
    private static final int RIGHT = 74;

    private static final int PANEL = 290;
    private static final int AXIS = 26;
    private static final int ROW = 15;
    private static final int BAR = 14;
    private static final double HATCH = 6.0;
    private static final double ASIDE = 12.0;

    /** What names the side down and the scale stands clear of the figure at the upper end. */
    private static final double ABOVE = 12.0;

    /** Figures below stand clear of the one at the lower end beside. */
    private static final double BELOW = 6.0;

    private static final Color LINE = new Color(0x222222);
    private static final Color HATCHED = new Color(0x707070);
    private static final Color EMPTY = new Color(0xF4F4F4);

    private final Heading heading;
    private final Side across;
    private final Side down;
    private final List<Block> blocks = new ArrayList<>();
    private final List<Block> missing = new ArrayList<>();
    private final List<Block> weak = new ArrayList<>();
    private final List<Line> lines = new ArrayList<>();
    private final List<Step> scale = new ArrayList<>();
    private final List<Entry> key = new ArrayList<>();
    private final List<String> remarks = new ArrayList<>();
    private String scaleHeading = "";
    private double[] own = {};

    /**
     * One side.
     *
     * @param heading quantity and unit
     * @param from lower end, in the unit shown
     * @param to upper end
     * @param logarithmic how it is divided
     */
    public record Side(String heading, double from, double to, boolean logarithmic) {}

    /**
     * A rectangle of places.
     *
     * @param left on the side across
     * @param right likewise
     * @param low on the side down
     * @param high likewise
     */
    public record Box(double left, double right, double low, double high) {}

    record Block(Box box, Color colour) {}

    record Line(String words, boolean decisive, List<double[]> points) {}

    record Step(Color colour, String above) {}

    /** A line of the key. */
    private record Entry(Kind kind, String words) {}

    private enum Kind {
        OWN,
        DECISIVE,
        PLAIN,
        MISSING,
        WEAK
    }

    /**
     * An empty sheet.
     *
     * @param heading over it
     * @param across side that runs across
     * @param down side that runs down; its larger values stand on top
     */
    public MapSheet(Heading heading, Side across, Side down) {
        this.heading = heading;
        this.across = across;
        this.down = down;
    }

    /** Fills a rectangle. */
    public void block(Box box, int rgb) {
        blocks.add(new Block(box, new Color(rgb)));
    }

    /** Hatches a rectangle: there is no number. */
    public void missing(Box box) {
        missing.add(new Block(box, EMPTY));
    }

    /** Dots a rectangle: a model has ended there. */
    public void weak(Box box) {
        weak.add(new Block(box, EMPTY));
    }

    /**
     * Draws a line of equal value.
     *
     * @param words at the line, empty for none
     * @param decisive whether it is drawn heavy
     * @param points each across and down, in order; a closed line repeats its first
     */
    public void line(String words, boolean decisive, List<List<Double>> points) {
        lines.add(new Line(
                words,
                decisive,
                points.stream()
                        .map(point -> new double[] {point.get(0), point.get(1)})
                        .toList()));
    }

    /** Marks the place of the study itself. */
    public void own(double x, double y, String words) {
        own = new double[] {x, y};
        key.add(new Entry(Kind.OWN, words));
    }

    /**
     * Adds a step to the scale of colours, from below.
     *
     * @param rgb its colour
     * @param above number at its upper end, empty at the last
     */
    public void step(int rgb, String above) {
        scale.add(new Step(new Color(rgb), above));
    }

    /** Names the scale. */
    public void scaleHeading(String words) {
        scaleHeading = words;
    }

    /** Explains the heavy lines. */
    public void keyDecisive(String words) {
        key.add(new Entry(Kind.DECISIVE, words));
    }

    /** Explains the thin lines. */
    public void keyPlain(String words) {
        key.add(new Entry(Kind.PLAIN, words));
    }

    /** Explains what is hatched. */
    public void keyMissing(String words) {
        key.add(new Entry(Kind.MISSING, words));
    }

    /** Explains what is dotted. */
    public void keyWeak(String words) {
        key.add(new Entry(Kind.WEAK, words));
    }

    /** A sentence below. */
    public void remark(String words) {
        remarks.add(words);
    }

    /** Blocks with a number, for tests. */
    List<Block> blocks() {
        return List.copyOf(blocks);
    }

    /** Blocks without a number, for tests. */
    List<Block> hatched() {
        return List.copyOf(missing);
    }

    /** Lines of equal value in the order drawn, for tests. */
    List<Line> lines() {
        return List.copyOf(lines);
    }

    /** Steps of the scale from below, for tests. */
    List<Step> scale() {
        return List.copyOf(scale);
    }

    @Override
    public int width() {
        return WIDTH;
    }

    @Override
    public int height() {
        return (int)
                FastMath.ceil(keyTop() + keyLines().size() * ROW + remarkLines().size() * 13.0 + 8.0);
    }

    private double right() {
        double widest = Pen.width(Typeface.TEXT, scaleHeading) - BAR - 5.0;
        for (Step step : scale) {
            widest = FastMath.max(widest, Pen.width(Typeface.SMALL, step.above()));
        }
        return FastMath.max(RIGHT, 14.0 + BAR + 5.0 + widest + 4.0);
    }

    private double top() {
        return MARGIN + 18.0 + (heading.study().isBlank() ? 0.0 : 16.0) + 24.0;
    }

    private double keyTop() {
        return top() + PANEL + AXIS + ROW + 10.0;
    }

    private List<Entry> keyLines() {
        List<Entry> all = new ArrayList<>();
        for (Entry entry : key) {
            List<String> wrapped =
                    Pen.wrapped(Typeface.TEXT, PlainText.of(entry.words()), WIDTH - 2.0 * MARGIN - 36.0, 3);
            for (int i = 0; i < wrapped.size(); i++) {
                all.add(new Entry(i == 0 ? entry.kind() : null, wrapped.get(i)));
            }
        }
        return all;
    }

    private List<String> remarkLines() {
        List<String> all = new ArrayList<>();
        remarks.forEach(
                remark -> all.addAll(Pen.wrapped(Typeface.SMALL, PlainText.of(remark), WIDTH - 2.0 * MARGIN, 3)));
        return all;
    }

    @Override
    public void draw(Graphics2D graphics) {
        graphics.setPaint(Color.WHITE);
        graphics.fill(new Rectangle2D.Double(0, 0, WIDTH, height()));
        Pen pen = new Pen(graphics);
        double room = WIDTH - 2.0 * MARGIN;
        pen.write(
                Typeface.TITLE,
                Typeface.DARK,
                Pen.fitting(Typeface.TITLE, PlainText.of(heading.title()), room),
                MARGIN,
                MARGIN + 13.0);
        if (!heading.study().isBlank()) {
            pen.write(
                    Typeface.TEXT,
                    Typeface.GREY,
                    Pen.fitting(Typeface.TEXT, PlainText.of(heading.study()), room),
                    MARGIN,
                    MARGIN + 30.0);
        }
        pen.write(
                Typeface.TEXT,
                Typeface.DARK,
                Pen.fitting(Typeface.TEXT, PlainText.of(down.heading()), WIDTH - right() - MARGIN - 4.0),
                MARGIN,
                top() - ABOVE);
        new Drawing(graphics, pen).draw();
        String below = Pen.fitting(Typeface.TEXT, PlainText.of(across.heading()), room);
        double middle = 0.5 * (LEFT + WIDTH - right());
        double left = FastMath.max(MARGIN, middle - 0.5 * Pen.width(Typeface.TEXT, below));
        pen.write(Typeface.TEXT, Typeface.DARK, below, left, top() + PANEL + AXIS + ROW - 3.0);
        drawScale(graphics, pen);
        drawKey(graphics, pen);
    }

    private void drawScale(Graphics2D graphics, Pen pen) {
        if (scale.isEmpty()) {
            return;
        }
        double x = WIDTH - right() + 14.0;
        pen.write(
                Typeface.TEXT,
                Typeface.DARK,
                Pen.fitting(Typeface.TEXT, scaleHeading, right() - 18.0),
                x,
                top() - ABOVE);
        double each = (double) PANEL / scale.size();
        double free = Double.POSITIVE_INFINITY;
        for (int i = 0; i < scale.size(); i++) {
            double y = top() + PANEL - (i + 1) * each;
            graphics.setPaint(scale.get(i).colour());
            graphics.fill(new Rectangle2D.Double(x, y, BAR, each));
            if (!scale.get(i).above().isEmpty() && free - y > 11.0) {
                pen.write(Typeface.SMALL, Typeface.DARK, scale.get(i).above(), x + BAR + 5.0, y + 3.5);
                free = y;
            }
        }
        graphics.setPaint(HATCHED);
        graphics.setStroke(new BasicStroke(0.6f));
        graphics.draw(new Rectangle2D.Double(x, top(), BAR, PANEL));
    }

    private void drawKey(Graphics2D graphics, Pen pen) {
        double y = keyTop();
        for (Entry entry : keyLines()) {
            Rectangle2D sample = new Rectangle2D.Double(MARGIN, y + 2.0, 28.0, 10.0);
            if (entry.kind() != null) {
                drawSample(graphics, entry.kind(), sample);
            }
            pen.write(Typeface.TEXT, Typeface.DARK, entry.words(), MARGIN + 36.0, y + 11.0);
            y += ROW;
        }
        for (String remark : remarkLines()) {
            pen.write(Typeface.SMALL, Typeface.GREY, remark, MARGIN, y + 11.0);
            y += 13.0;
        }
    }

    private static void drawSample(Graphics2D graphics, Kind kind, Rectangle2D sample) {
        switch (kind) {
            case OWN -> drawOwn(graphics, sample.getCenterX(), sample.getCenterY());
            case DECISIVE, PLAIN -> {
                graphics.setPaint(LINE);
                graphics.setStroke(stroke(kind == Kind.DECISIVE));
                graphics.draw(new Line2D.Double(
                        sample.getMinX(), sample.getCenterY(), sample.getMaxX(), sample.getCenterY()));
            }
            case MISSING -> {
                graphics.setPaint(EMPTY);
                graphics.fill(sample);
                hatch(graphics, sample);
            }
            case WEAK -> dot(graphics, sample);
        }
    }

    private static BasicStroke stroke(boolean decisive) {
        return new BasicStroke(decisive ? 2.2f : 0.7f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
    }

    private static void drawOwn(Graphics2D graphics, double x, double y) {
        Shape ring = new Ellipse2D.Double(x - 4.5, y - 4.5, 9.0, 9.0);
        graphics.setPaint(Color.WHITE);
        graphics.fill(ring);
        graphics.setPaint(LINE);
        graphics.setStroke(new BasicStroke(1.6f));
        graphics.draw(ring);
        graphics.fill(new Ellipse2D.Double(x - 1.5, y - 1.5, 3.0, 3.0));
    }

    /** Lines from lower left to upper right over a rectangle, the same lattice everywhere so that neighbours join. */
    private static void hatch(Graphics2D graphics, Rectangle2D area) {
        graphics.setPaint(HATCHED);
        graphics.setStroke(new BasicStroke(0.7f));
        double first = FastMath.floor((area.getMinX() + area.getMinY()) / HATCH) * HATCH;
        for (double sum = first; sum <= area.getMaxX() + area.getMaxY(); sum += HATCH) {
            double left = FastMath.max(area.getMinX(), sum - area.getMaxY());
            double right = FastMath.min(area.getMaxX(), sum - area.getMinY());
            if (left < right) {
                graphics.draw(new Line2D.Double(left, sum - left, right, sum - right));
            }
        }
    }

    private static void dot(Graphics2D graphics, Rectangle2D area) {
        graphics.setPaint(LINE);
        for (double y = FastMath.ceil(area.getMinY() / HATCH) * HATCH; y < area.getMaxY(); y += HATCH) {
            for (double x = FastMath.ceil(area.getMinX() / HATCH) * HATCH; x < area.getMaxX(); x += HATCH) {
                graphics.fill(new Ellipse2D.Double(x - 0.8, y - 0.8, 1.6, 1.6));
            }
        }
    }

    /** One drawing of what lies between the axes. */
    private final class Drawing {
        private final Graphics2D graphics;
        private final Pen pen;
        private final ValueAxis horizontal = axis(across);
        private final ValueAxis upright = axis(down);
        private final Rectangle2D area;
        private final List<Rectangle2D> taken = new ArrayList<>();

        Drawing(Graphics2D graphics, Pen pen) {
            this.graphics = graphics;
            this.pen = pen;
            this.area = new Rectangle2D.Double(LEFT, top(), WIDTH - (double) LEFT - right(), PANEL);
        }

        void draw() {
            blocks.forEach(block -> fill(block));
            missing.forEach(block -> fill(block));
            missing.forEach(block -> hatch(graphics, rectangle(block.box())));
            weak.forEach(block -> dot(graphics, rectangle(block.box())));
            lines.stream().filter(line -> !line.decisive()).forEach(this::draw);
            lines.stream().filter(Line::decisive).forEach(this::draw);
            if (own.length > 0) {
                double x = x(own[0]);
                double y = y(own[1]);
                drawOwn(graphics, x, y);
                taken.add(new Rectangle2D.Double(x - 8.0, y - 8.0, 16.0, 16.0));
            }
            lines.stream().filter(Line::decisive).forEach(this::label);
            lines.stream().filter(line -> !line.decisive()).forEach(this::label);
            frame();
        }

        private static ValueAxis axis(Side side) {
            return side.logarithmic()
                    ? new DecadeAxis(side.from(), side.to())
                    : new EvenAxis(side.from(), side.to(), false);
        }

        private double x(double value) {
            return horizontal.valueToJava2D(value, area, RectangleEdge.BOTTOM);
        }

        private double y(double value) {
            return upright.valueToJava2D(value, area, RectangleEdge.LEFT);
        }

        private Rectangle2D rectangle(Box box) {
            double left = x(box.left());
            double high = y(box.high());
            return new Rectangle2D.Double(left, high, x(box.right()) - left, y(box.low()) - high);
        }

        private void fill(Block block) {
            Rectangle2D rectangle = rectangle(block.box());
            graphics.setPaint(block.colour());
            // a hair wider and higher: viewers leave light seams between neighbours otherwise
            graphics.fill(new Rectangle2D.Double(
                    rectangle.getX(),
                    rectangle.getY(),
                    FastMath.min(rectangle.getWidth() + 0.25, area.getMaxX() - rectangle.getX()),
                    FastMath.min(rectangle.getHeight() + 0.25, area.getMaxY() - rectangle.getY())));
        }

        private void draw(Line line) {
            Path2D path = new Path2D.Double();
            for (int i = 0; i < line.points().size(); i++) {
                double px = x(line.points().get(i)[0]);
                double py = y(line.points().get(i)[1]);
                if (i == 0) {
                    path.moveTo(px, py);
                } else {
                    path.lineTo(px, py);
                }
            }
            graphics.setPaint(LINE);
            graphics.setStroke(stroke(line.decisive()));
            graphics.draw(path);
        }

        /** The words of a line stand on it, at the first of some places where nothing else is written. */
        private void label(Line line) {
            if (line.words().isEmpty()) {
                return;
            }
            double width = Pen.width(Typeface.SMALL, line.words());
            for (double share : new double[] {0.5, 0.35, 0.65, 0.2, 0.8}) {
                double[] point = line.points().get((int) (share * (line.points().size() - 1)));
                double left = x(point[0]) - 0.5 * width;
                double baseline = y(point[1]) + 3.5;
                Rectangle2D text = Pen.box(Typeface.SMALL, line.words(), left, baseline);
                Rectangle2D box = new Rectangle2D.Double(
                        text.getX() - 2.0, text.getY() - 1.0, text.getWidth() + 4.0, text.getHeight() + 1.0);
                if (area.contains(box) && taken.stream().noneMatch(box::intersects)) {
                    taken.add(box);
                    graphics.setPaint(Color.WHITE);
                    graphics.fill(box);
                    pen.write(Typeface.SMALL, Typeface.DARK, line.words(), left, baseline);
                    return;
                }
            }
        }

        /** Axes and frame by the chart library, with nothing between. */
        private void frame() {
            horizontal.setTickLabelInsets(new RectangleInsets(BELOW, 4.0, 2.0, 4.0));
            XYPlot plot = new XYPlot(null, horizontal, upright, null);
            plot.setBackgroundPaint(null);
            plot.setDomainGridlinesVisible(false);
            plot.setRangeGridlinesVisible(false);
            plot.setOutlinePaint(HATCHED);
            plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
            plot.setInsets(
                    new RectangleInsets(ASIDE, 0.0, 0.0, ASIDE)); // labels at the ends of the axes reach out so far
            horizontal.setTickLabelInsets(
                    new RectangleInsets(5.0, 3.0, 1.0, 3.0)); // clear of the lowest label of the other axis
            AxisSpace below = new AxisSpace();
            below.setBottom(AXIS);
            plot.setFixedDomainAxisSpace(below);
            AxisSpace beside = new AxisSpace();
            beside.setLeft(LEFT);
            plot.setFixedRangeAxisSpace(beside);
            JFreeChart chart = new JFreeChart(null, null, plot, false);
            chart.setBackgroundPaint(null);
            chart.setPadding(RectangleInsets.ZERO_INSETS);
            chart.setTextAntiAlias(true);
            chart.draw(
                    graphics,
                    new Rectangle2D.Double(0.0, top() - ASIDE, area.getMaxX() + ASIDE, PANEL + AXIS + ASIDE),
                    null,
                    new ChartRenderingInfo());
        }
    }
}
