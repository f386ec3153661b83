package flowshy.report.chart.paper;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYErrorRenderer;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.xy.DefaultXYDataset;
import org.jfree.data.xy.XYDataset;
import org.jfree.data.xy.YIntervalSeries;
import org.jfree.data.xy.YIntervalSeriesCollection;

/** One pair of axes on a sheet with what is drawn between them. */
public final class Panel {
    private static final Stroke HAIRLINE = new BasicStroke(0.6f);
    private static final Color GRID = new Color(0xC9C9C9);
    private static final Color FINE_GRID = new Color(0xE4E4E4);
    private static final Color EDGE = new Color(0x6A6A6A);

    private final String heading;
    private final ValueAxis axis;
    private final int weight;
    private final List<Curve> curves = new ArrayList<>();
    private final List<Level> levels = new ArrayList<>();
    private final List<Area> areas = new ArrayList<>();
    private final List<Words> words = new ArrayList<>();

    /** Lines, dots or measured points of one name. */
    record Curve(String name, Ink ink, Style style, List<double[]> points) {}

    /** How points are drawn. */
    enum Style {
        /** joined */
        LINE,
        /** each for itself */
        DOTS,
        /** each with its uncertainty */
        MEASURED
    }

    /** A horizontal line. */
    record Level(double value, String words, Ink ink) {}

    /** Words at a place between the axes. */
    record Words(double x, double y, String text) {}

    /** A shaded range of the common axis. */
    record Area(double from, double to, Color shade) {}

    private Panel(String heading, ValueAxis axis, int weight) {
        this.heading = heading;
        this.axis = axis;
        this.weight = weight;
    }

    /**
     * A panel with a linear axis.
     *
     * @param heading quantity and unit
     * @param from lower end
     * @param to upper end
     * @param weight share of the sheet's height, whole number
     * @return empty panel
     */
    public static Panel even(String heading, double from, double to, int weight) {
        return new Panel(heading, new EvenAxis(from, to, false), weight);
    }

    /**
     * A panel with an axis of angles.
     *
     * @param heading quantity and unit
     * @param from lower end [deg]
     * @param to upper end [deg]
     * @param weight share of the sheet's height
     * @return empty panel
     */
    public static Panel degrees(String heading, double from, double to, int weight) {
        return new Panel(heading, new EvenAxis(from, to, true), weight);
    }

    /**
     * A panel with a logarithmic axis.
     *
     * @param heading quantity and unit
     * @param from lower end, positive
     * @param to upper end
     * @param weight share of the sheet's height
     * @return empty panel
     */
    public static Panel decades(String heading, double from, double to, int weight) {
        return new Panel(heading, new DecadeAxis(from, to), weight);
    }

    /**
     * Draws a line through points; it is broken where a number is missing.
     *
     * @param name in the key
     * @param ink how it is drawn
     * @param x common axis
     * @param y this panel's axis, one a point; NaN where there is none
     * @return this
     */
    public Panel line(String name, Ink ink, List<Double> x, List<Double> y) {
        return add(name, ink, Style.LINE, x, y);
    }

    /**
     * Draws a dot at each point.
     *
     * @param name in the key, empty to leave it out there
     * @param ink its colour
     * @param x common axis
     * @param y this panel's axis
     * @return this
     */
    public Panel dots(String name, Ink ink, List<Double> x, List<Double> y) {
        return add(name, ink, Style.DOTS, x, y);
    }

    /**
     * Draws measured points with their uncertainty.
     *
     * @param name in the key
     * @param ink its colour
     * @param points each x, y, least y, largest y
     * @return this
     */
    public Panel measured(String name, Ink ink, List<List<Double>> points) {
        List<double[]> copied = new ArrayList<>();
        for (List<Double> point : points) {
            copied.add(point.stream().mapToDouble(Double::doubleValue).toArray());
        }
        curves.add(new Curve(name, ink, Style.MEASURED, copied));
        return this;
    }

    private Panel add(String name, Ink ink, Style style, List<Double> x, List<Double> y) {
        if (x.size() != y.size()) {
            throw new IllegalArgumentException(name + ": " + x.size() + " abscissae, " + y.size() + " ordinates");
        }
        List<double[]> points = new ArrayList<>();
        for (int i = 0; i < x.size(); i++) {
            if (i > 0 && style == Style.LINE && turns(y.get(i - 1), y.get(i))) {
                points.add(new double[] {x.get(i), Double.NaN}); // an angle that leaves one side comes in at the other
            }
            boolean shown = Double.isFinite(y.get(i)) && (y.get(i) > 0.0 || !(axis instanceof DecadeAxis));
            points.add(new double[] {x.get(i), shown ? y.get(i) : Double.NaN});
        }
        curves.add(new Curve(name, ink, style, points));
        return this;
    }

    private boolean turns(double before, double after) {
        return axis instanceof EvenAxis even && even.degrees() && Math.abs(after - before) > 180.0;
    }

    /**
     * Draws a line across.
     *
     * @param value on this panel's axis
     * @param words written at it
     * @param ink how it is drawn
     * @return this
     */
    public Panel level(double value, String words, Ink ink) {
        levels.add(new Level(value, words, ink));
        return this;
    }

    /**
     * Shades a range of the common axis.
     *
     * @param from lower end
     * @param to upper end
     * @param shade what it means
     * @return this
     */
    public Panel shade(double from, double to, Shade shade) {
        areas.add(new Area(from, to, shade.colour()));
        return this;
    }

    /**
     * Writes words about a place.
     *
     * @param x common axis
     * @param y this panel's axis
     * @param text short
     * @return this
     */
    public Panel words(double x, double y, String text) {
        words.add(new Words(x, y, text));
        return this;
    }

    List<Words> words() {
        return words;
    }

    String heading() {
        return heading;
    }

    ValueAxis axis() {
        return axis;
    }

    int weight() {
        return weight;
    }

    List<Curve> curves() {
        return curves;
    }

    List<Level> levels() {
        return levels;
    }

    /** What every axis looks like. */
    static void dress(ValueAxis axis) {
        axis.setLabel(null);
        axis.setTickLabelFont(Typeface.TEXT);
        axis.setTickLabelPaint(Typeface.DARK);
        axis.setTickMarkPaint(EDGE);
        axis.setAxisLinePaint(EDGE);
        axis.setTickMarkOutsideLength(4.0f);
        axis.setMinorTickMarkOutsideLength(2.0f);
        axis.setTickLabelInsets(new RectangleInsets(1.0, 3.0, 1.0, 3.0));
    }

    XYPlot plot(List<Double> marks) {
        XYPlot plot = new XYPlot(null, null, axis, null);
        plot.setBackgroundPaint(Color.WHITE);
        plot.setOutlinePaint(EDGE);
        plot.setOutlineStroke(HAIRLINE);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        plot.setDomainGridlinePaint(GRID);
        plot.setRangeGridlinePaint(GRID);
        plot.setDomainGridlineStroke(HAIRLINE);
        plot.setRangeGridlineStroke(HAIRLINE);
        plot.setDomainMinorGridlinesVisible(true);
        plot.setDomainMinorGridlinePaint(FINE_GRID);
        plot.setDomainMinorGridlineStroke(HAIRLINE);
        for (Area area : areas) {
            IntervalMarker marker = new IntervalMarker(area.from(), area.to(), area.shade());
            marker.setAlpha(0.6f); // the grid shows through
            plot.addDomainMarker(marker, Layer.BACKGROUND);
        }
        for (double mark : marks) {
            plot.addDomainMarker(marker(mark, Ink.NOISE.colour(), new BasicStroke(0.9f)), Layer.BACKGROUND);
        }
        for (Level level : levels) {
            plot.addRangeMarker(
                    marker(level.value(), level.ink().colour(), level.ink().stroke()), Layer.BACKGROUND);
        }
        for (int i = 0; i < curves.size(); i++) {
            plot.setDataset(i, dataset(curves.get(i)));
            plot.setRenderer(i, renderer(curves.get(i)));
        }
        return plot;
    }

    private static ValueMarker marker(double value, Color colour, Stroke stroke) {
        ValueMarker marker = new ValueMarker(value, colour, stroke);
        marker.setAlpha(1.0f);
        return marker;
    }

    private static XYDataset dataset(Curve curve) {
        if (curve.style() == Style.MEASURED) {
            YIntervalSeries series = new YIntervalSeries(curve.name(), false, true);
            curve.points().forEach(point -> series.add(point[0], point[1], point[2], point[3]));
            YIntervalSeriesCollection all = new YIntervalSeriesCollection();
            all.addSeries(series);
            return all;
        }
        double[][] columns = new double[2][curve.points().size()];
        for (int i = 0; i < columns[0].length; i++) {
            columns[0][i] = curve.points().get(i)[0];
            columns[1][i] = curve.points().get(i)[1];
        }
        DefaultXYDataset all = new DefaultXYDataset();
        all.addSeries(curve.name(), columns);
        return all;
    }

    private static XYLineAndShapeRenderer renderer(Curve curve) {
        XYLineAndShapeRenderer renderer = curve.style() == Style.MEASURED
                ? errors(curve.ink())
                : new XYLineAndShapeRenderer(curve.style() == Style.LINE, curve.style() == Style.DOTS);
        renderer.setDrawSeriesLineAsPath(curve.style() == Style.LINE);
        renderer.setSeriesPaint(0, curve.ink().colour());
        renderer.setSeriesStroke(0, curve.ink().stroke());
        renderer.setSeriesShape(0, symbol(curve));
        return renderer;
    }

    private static XYErrorRenderer errors(Ink ink) {
        XYErrorRenderer renderer = new XYErrorRenderer();
        renderer.setDrawXError(false);
        renderer.setErrorPaint(ink.colour());
        renderer.setErrorStroke(new BasicStroke(0.9f));
        renderer.setCapLength(3.0);
        renderer.setDefaultShapesFilled(false);
        return renderer;
    }

    /** Symbol of a point: a dot for what was computed; open, a diamond or a square, for what was measured. */
    static Shape symbol(Curve curve) {
        if (curve.style() == Style.DOTS) {
            return new Ellipse2D.Double(-1.8, -1.8, 3.6, 3.6);
        }
        if (curve.ink() == Ink.MEASURED_FLOW) {
            return new Rectangle2D.Double(-2.6, -2.6, 5.2, 5.2);
        }
        Path2D diamond = new Path2D.Double();
        diamond.moveTo(0.0, -3.4);
        diamond.lineTo(3.4, 0.0);
        diamond.lineTo(0.0, 3.4);
        diamond.lineTo(-3.4, 0.0);
        diamond.closePath();
        return diamond;
    }

    /** Places that a curve covers on the sheet, close together where it is a line. */
    static List<double[]> pixels(Curve curve, ValueAxis x, ValueAxis y, Rectangle2D area) {
        List<double[]> all = new ArrayList<>();
        double[] before = null;
        for (double[] point : curve.points()) {
            if (!Double.isFinite(point[1])) {
                before = null;
                continue;
            }
            double[] here = {
                x.valueToJava2D(point[0], area, RectangleEdge.BOTTOM),
                y.valueToJava2D(point[1], area, RectangleEdge.LEFT)
            };
            if (before != null && curve.style() == Style.LINE) {
                int steps = (int) FastMath.min(200.0, FastMath.hypot(here[0] - before[0], here[1] - before[1]) / 2.0);
                for (int i = 1; i < steps; i++) {
                    double share = (double) i / steps;
                    all.add(new double[] {
                        before[0] + share * (here[0] - before[0]), before[1] + share * (here[1] - before[1])
                    });
                }
            }
            all.add(here);
            before = here;
        }
        return all;
    }
}
