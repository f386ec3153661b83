package flowshy.report.chart.paper;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Area;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * A sheet with a body drawn to scale on a wall, what lies about it, what stands over it, and a bar of known length. Lengths are in metres,
 * x along the wall from the body's axis, z up from the wall.
 */
public final class ScaleSheet implements Picture {
    private static final int WIDTH = 460;
    private static final int MARGIN = 10;
    private static final int NOTES = 150;
    private static final int TALLEST = 250;
    private static final int LOWEST = 120;
    private static final int BELOW = 26;
    private static final Color SOLID = new Color(0x3A3A3A);
    private static final Color COVER = new Color(0x8C8C8C);

    /** From the thickest layer to the thinnest. */
    private static final int[] LAYERS = {0xE3EEF7, 0xC3DAEC, 0x9BC1DF};

    private final PlotSheet.Heading heading;
    private final double height;
    private final double least;
    private final Path2D body;
    private final List<Layer> layers = new ArrayList<>();
    private final List<Block> blocks = new ArrayList<>();
    private final List<Note> notes = new ArrayList<>();
    private final List<String> remarks = new ArrayList<>();

    private double inside;

    private record Layer(double thickness, String words) {}

    private record Block(double left, double right, double bottom, double top) {}

    private record Note(double z, String text) {}

    /**
     * A sheet.
     *
     * @param heading over it
     * @param outline z and r of the body from the wall to the tip, alternating [m]
     * @param height of the drawing above the wall [m]
     * @param width that must fit, on both sides of the axis together [m]
     */
    public ScaleSheet(PlotSheet.Heading heading, List<Double> outline, double height, double width) {
        this.heading = heading;
        this.height = height;
        this.least = width;
        this.inside = 10.0 * FastMath.max(height, width);
        this.body = new Path2D.Double();
        body.moveTo(0.0, outline.get(0));
        for (int i = 0; i < outline.size(); i += 2) {
            body.lineTo(outline.get(i + 1), outline.get(i));
        }
        for (int i = outline.size() - 2; i >= 0; i -= 2) {
            body.lineTo(-outline.get(i + 1), outline.get(i));
        }
        body.closePath();
    }

    /**
     * Draws everything nearer to body or wall than a distance; the largest first.
     *
     * @param thickness distance [m]
     * @param words beside it
     * @return this
     */
    public ScaleSheet layer(double thickness, String words) {
        layers.add(new Layer(thickness, words));
        return this;
    }

    /**
     * Says that what lies about the body ends at side walls.
     *
     * @param half distance of each from the axis [m]
     * @return this
     */
    public ScaleSheet walls(double half) {
        inside = half;
        return this;
    }

    /**
     * Draws a solid part.
     *
     * @param left x [m]
     * @param right x [m]
     * @param bottom z [m]
     * @param top z [m]
     * @return this
     */
    public ScaleSheet block(double left, double right, double bottom, double top) {
        blocks.add(new Block(left, right, bottom, top));
        return this;
    }

    /**
     * Writes beside a height.
     *
     * @param z [m]
     * @param text short
     * @return this
     */
    public ScaleSheet note(double z, String text) {
        notes.add(new Note(z, text));
        return this;
    }

    /**
     * Adds a remark under the drawing.
     *
     * @param text a sentence or two
     * @return this
     */
    public ScaleSheet remark(String text) {
        remarks.add(text);
        return this;
    }

    private List<String> title() {
        return Pen.wrapped(Typeface.TITLE, heading.title(), WIDTH - 2.0 * MARGIN, 2);
    }

    private List<String> remarkLines() {
        List<String> lines = new ArrayList<>();
        remarks.forEach(remark -> lines.addAll(Pen.wrapped(Typeface.SMALL, remark, WIDTH - 2.0 * MARGIN, 3)));
        return lines;
    }

    /** Of the frame: what the drawing fills at the scale that its width allows. */
    private int tall() {
        double scale = FastMath.min(TALLEST / height, (WIDTH - 2.0 * MARGIN - NOTES) / least);
        return (int) FastMath.max(LOWEST, FastMath.ceil(scale * height));
    }

    private int top() {
        return MARGIN + 17 * title().size() + (PlainText.of(heading.study()).isEmpty() ? 0 : 14) + 8;
    }

    @Override
    public int width() {
        return WIDTH;
    }

    @Override
    public int height() {
        return top() + tall() + BELOW + 6 + 13 * remarkLines().size() + MARGIN;
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
        pen.write(
                Typeface.TEXT,
                Typeface.GREY,
                Pen.fitting(Typeface.TEXT, PlainText.of(heading.study()), WIDTH - 2.0 * MARGIN),
                MARGIN,
                y);
        Rectangle2D frame = new Rectangle2D.Double(MARGIN, top(), WIDTH - 2.0 * MARGIN - NOTES, tall());
        double scale = FastMath.min(frame.getHeight() / height, frame.getWidth() / least);
        AffineTransform place = new AffineTransform(scale, 0, 0, -scale, frame.getCenterX(), frame.getMaxY());
        drawLayers(graphics, frame, place, scale);
        drawSolids(graphics, frame, place);
        drawBar(graphics, pen, frame, scale);
        drawNotes(graphics, pen, frame, place);
        y = top() + tall() + BELOW + 6 + 9.0;
        for (String line : remarkLines()) {
            pen.write(Typeface.SMALL, Typeface.GREY, line, MARGIN, y);
            y += 13;
        }
    }

    private void drawLayers(Graphics2D graphics, Rectangle2D frame, AffineTransform place, double scale) {
        Ink[] inks = {Ink.BOUNDARY, Ink.NOISE, Ink.LIMIT};
        for (int i = 0; i < layers.size(); i++) {
            double thickness = scale * layers.get(i).thickness();
            Shape placed = place.createTransformedShape(body);
            Area area = new Area(placed);
            // one stroke round the body is the layer about it
            area.add(new Area(new BasicStroke(
                            (float) (2.0 * FastMath.min(thickness, 4.0 * TALLEST)),
                            BasicStroke.CAP_ROUND,
                            BasicStroke.JOIN_ROUND)
                    .createStrokedShape(placed)));
            double wall = FastMath.min(thickness, frame.getHeight());
            area.add(new Area(new Rectangle2D.Double(frame.getMinX(), frame.getMaxY() - wall, frame.getWidth(), wall)));
            area.intersect(new Area(frame));
            area.intersect(new Area(
                    place.createTransformedShape(new Rectangle2D.Double(-inside, 0.0, 2.0 * inside, 2.0 * height))));
            graphics.setPaint(new Color(LAYERS[FastMath.min(i, LAYERS.length - 1)]));
            graphics.fill(area);
            graphics.setPaint(Ink.BOUNDARY.colour());
            graphics.setStroke(inks[FastMath.min(i, inks.length - 1)].stroke());
            graphics.draw(area);
        }
    }

    private void drawSolids(Graphics2D graphics, Rectangle2D frame, AffineTransform place) {
        graphics.setPaint(COVER);
        for (Block block : blocks) {
            Area area = new Area(place.createTransformedShape(new Rectangle2D.Double(
                    block.left(), block.bottom(), block.right() - block.left(), block.top() - block.bottom())));
            area.intersect(new Area(frame));
            graphics.fill(area);
        }
        graphics.setPaint(SOLID);
        graphics.fill(place.createTransformedShape(body));
        double wall = frame.getMaxY();
        graphics.setStroke(new BasicStroke(1.6f));
        graphics.draw(new Line2D.Double(frame.getMinX(), wall, frame.getMaxX(), wall));
        graphics.setStroke(new BasicStroke(0.7f));
        for (double x = frame.getMinX(); x + 6 <= frame.getMaxX() + 0.1; x += 6) {
            graphics.draw(new Line2D.Double(x, wall + 6, x + 6, wall));
        }
    }

    /** A bar of a round length, about a quarter of the frame. */
    private static void drawBar(Graphics2D graphics, Pen pen, Rectangle2D frame, double scale) {
        double most = 0.3 * frame.getWidth() / scale;
        double decade = FastMath.pow(10.0, FastMath.floor(FastMath.log10(most)));
        double length = decade * (most / decade >= 5.0 ? 5.0 : most / decade >= 2.0 ? 2.0 : 1.0);
        double y = frame.getMaxY() + 17;
        double end = frame.getMinX() + scale * length;
        graphics.setPaint(SOLID);
        graphics.setStroke(new BasicStroke(1.4f));
        graphics.draw(new Line2D.Double(frame.getMinX(), y, end, y));
        graphics.draw(new Line2D.Double(frame.getMinX(), y - 3, frame.getMinX(), y + 3));
        graphics.draw(new Line2D.Double(end, y - 3, end, y + 3));
        pen.write(Typeface.TEXT, Typeface.DARK, length(length), end + 6, y + 4);
    }

    /**
     * A length as a drawing states it.
     *
     * @param metres positive
     * @return micrometres below a millimetre, millimetres above
     */
    public static String length(double metres) {
        return metres < 0.9995e-3 ? TickText.of(1e6 * metres, 3) + " µm" : TickText.of(1e3 * metres, 3) + " mm";
    }

    private void drawNotes(Graphics2D graphics, Pen pen, Rectangle2D frame, AffineTransform place) {
        List<Note> all = new ArrayList<>(notes);
        layers.forEach(layer -> all.add(new Note(layer.thickness(), layer.words())));
        all.sort(Comparator.comparingDouble(Note::z).reversed());
        double x = frame.getMaxX() + 18;
        double room = WIDTH - MARGIN - x;
        double lowest = frame.getMaxY() + BELOW - 4;
        int lines = all.stream().mapToInt(note -> lines(note, room).size()).sum();
        double next = frame.getMinY() + 8;
        for (Note note : all) {
            List<String> text = lines(note, room);
            double at = place.transform(new Point2D.Double(0, note.z()), null).getY();
            double here = FastMath.max(frame.getMinY(), at);
            // no lower than leaves room for those that follow
            double baseline = FastMath.min(FastMath.max(next, here + 4), lowest - 13.0 * (lines - 1));
            graphics.setPaint(Ink.BOUNDARY.colour());
            graphics.setStroke(Ink.BOUNDARY.stroke());
            graphics.draw(new Line2D.Double(frame.getMaxX() + 1, here, x - 3, baseline - 4));
            for (String line : text) {
                pen.write(Typeface.SMALL, Typeface.DARK, line, x, baseline);
                baseline += 13;
            }
            lines -= text.size();
            next = baseline + 2;
        }
    }

    private static List<String> lines(Note note, double room) {
        return Pen.wrapped(Typeface.SMALL, note.text(), room, 3);
    }
}
