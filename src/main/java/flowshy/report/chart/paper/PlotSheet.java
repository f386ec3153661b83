package flowshy.report.chart.paper;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.AxisSpace;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;

/**
 * A sheet with one or more panels over a common axis: title, name of the study, words of the shaded ranges, notes at marks, panels, key,
 * remarks. Every text has its place before anything is drawn.
 */
public final class PlotSheet implements Picture {
    private static final int WIDTH = 460;
    private static final int LEFT = 54;
    private static final int RIGHT = 18;
    private static final int MARGIN = 10;

    /** Space between panels: the heading of the lower one stands there. */
    private static final int BETWEEN = 30;

    /** Labels and line of the common axis, and its heading under it. */
    private static final int COMMON_AXIS = 26;

    private static final int ROW = 14;
    private static final int ROOM = 10;
    private static final int SAMPLE = 30;

    private final Heading heading;
    private final ValueAxis common;
    private final String commonHeading;
    private final int panelHeight;
    private final List<Panel> panels = new ArrayList<>();
    private final List<Note> words = new ArrayList<>();
    private final List<Note> marks = new ArrayList<>();
    private final List<String> remarks = new ArrayList<>();

    /**
     * What stands over a sheet.
     *
     * @param title what is shown
     * @param study whose it is, as the user wrote it; may be empty
     */
    public record Heading(String title, String study) {}

    /** A text over the panels at a place of the common axis. */
    private record Note(double at, String text) {}

    private PlotSheet(Heading heading, ValueAxis common, String commonHeading, int panelHeight) {
        this.heading = heading;
        this.common = common;
        // clear of the lowest label of the other axis
        common.setTickLabelInsets(new RectangleInsets(5.0, 3.0, 1.0, 3.0));
        this.commonHeading = commonHeading;
        this.panelHeight = panelHeight;
    }

    /**
     * A sheet with a logarithmic common axis.
     *
     * @param heading over the sheet
     * @param axis quantity and unit of the common axis
     * @param from lower end, positive
     * @param to upper end
     * @param panelHeight of all panels together [points]
     * @return a sheet without panels
     */
    public static PlotSheet decades(Heading heading, String axis, double from, double to, int panelHeight) {
        return new PlotSheet(heading, new DecadeAxis(from, to), axis, panelHeight);
    }

    /**
     * A sheet with a linear common axis.
     *
     * @param heading over the sheet
     * @param axis quantity and unit of the common axis
     * @param from lower end
     * @param to upper end
     * @param panelHeight of all panels together [points]
     * @return a sheet without panels
     */
    public static PlotSheet even(Heading heading, String axis, double from, double to, int panelHeight) {
        return new PlotSheet(heading, new EvenAxis(from, to, false), axis, panelHeight);
    }

    /**
     * Adds a panel under those that are there.
     *
     * @param panel drawn over the common axis
     * @return this
     */
    public PlotSheet add(Panel panel) {
        panels.add(panel);
        return this;
    }

    /**
     * Writes a word over a range of the common axis.
     *
     * @param at its middle
     * @param word short
     * @return this
     */
    public PlotSheet word(double at, String word) {
        words.add(new Note(at, word));
        return this;
    }

    /**
     * Marks a place of the common axis by a line through all panels and a note over them.
     *
     * @param at the place
     * @param note short, with unit
     * @return this
     */
    public PlotSheet mark(double at, String note) {
        marks.add(new Note(at, note));
        return this;
    }

    /**
     * Adds a remark under the key.
     *
     * @param text a sentence or two
     * @return this
     */
    public PlotSheet remark(String text) {
        remarks.add(text);
        return this;
    }

    /**
     * The panels, for tests on what they hold.
     *
     * @return in order
     */
    List<Panel> panels() {
        return panels;
    }

    @Override
    public int width() {
        return WIDTH;
    }

    @Override
    public int height() {
        return new Layout().height();
    }

    @Override
    public void draw(Graphics2D graphics) {
        new Layout().draw(graphics);
    }

    /** Places of everything on the sheet. */
    private final class Layout {
        private final List<String> titleLines = Pen.wrapped(Typeface.TITLE, heading.title(), WIDTH - 2.0 * MARGIN, 2);
        private final String study = Pen.fitting(Typeface.TEXT, PlainText.of(heading.study()), WIDTH - 2.0 * MARGIN);
        private final List<Placed> notes = new ArrayList<>();
        private final List<Placed> key = new ArrayList<>();
        private final Map<String, Panel.Curve> named = new LinkedHashMap<>();
        private final List<String> remarkLines = new ArrayList<>();
        private final int rows;
        private final int keyRows;

        /** A text in a row, its left end. */
        private record Placed(String text, double x, int row) {}

        Layout() {
            int wordRows = place(words, 0);
            rows = place(marks, wordRows);
            for (Panel panel : panels) {
                for (Panel.Curve curve : panel.curves()) {
                    if (!curve.name().isEmpty()
                            && curve.points().stream().anyMatch(point -> Double.isFinite(point[1]))) {
                        named.putIfAbsent(curve.name(), curve);
                    }
                }
            }
            keyRows = placeKey();
            for (String remark : remarks) {
                remarkLines.addAll(Pen.wrapped(Typeface.SMALL, remark, WIDTH - 2.0 * MARGIN, 3));
            }
        }

        private int top() {
            return MARGIN + 17 * titleLines.size() + (study.isEmpty() ? 0 : ROW) + 5;
        }

        /** Upper edge of the first panel: under the rows of notes and its own heading. */
        private int panelTop() {
            return top() + 17 + rows * ROW + (rows == 0 ? 6 : 2);
        }

        private int panelBottom() {
            return panelTop() + panelHeight + BETWEEN * (panels.size() - 1);
        }

        int height() {
            return panelBottom()
                    + COMMON_AXIS
                    + ROW
                    + 8
                    + keyRows * 16
                    + (remarkLines.isEmpty() ? 0 : 4)
                    + remarkLines.size() * 13
                    + MARGIN;
        }

        private double x(double value) {
            return common.valueToJava2D(
                    value, new Rectangle2D.Double(LEFT, 0, WIDTH - LEFT - RIGHT, 1), RectangleEdge.BOTTOM);
        }

        /** Each over its place, moved aside within the sheet, in the first row with room; gives the number of rows used so far. */
        private int place(List<Note> all, int firstRow) {
            int used = firstRow;
            List<Note> sorted = new ArrayList<>(all);
            sorted.sort((a, b) -> Double.compare(a.at(), b.at()));
            List<Double> ends = new ArrayList<>();
            for (Note note : sorted) {
                double width = Pen.width(Typeface.TEXT, note.text());
                double x = Math.max(LEFT - 20.0, Math.min(WIDTH - 4.0 - width, x(note.at()) - 0.5 * width));
                int row = 0;
                while (row < ends.size() && ends.get(row) + 6.0 > x) {
                    row++;
                }
                if (row == ends.size()) {
                    ends.add(0.0);
                }
                ends.set(row, x + width);
                notes.add(new Placed(note.text(), x, firstRow + row));
                used = Math.max(used, firstRow + row + 1);
            }
            return used;
        }

        private int placeKey() {
            double x = MARGIN;
            int row = 0;
            for (String name : named.keySet()) {
                double width = SAMPLE + 5 + Pen.width(Typeface.TEXT, keyText(name)) + 14;
                if (x > MARGIN && x + width - 14 > WIDTH - MARGIN) {
                    x = MARGIN;
                    row++;
                }
                key.add(new Placed(name, x, row));
                x += width;
            }
            return named.isEmpty() ? 0 : row + 1;
        }

        private static String keyText(String name) {
            return Pen.fitting(Typeface.TEXT, name, WIDTH - 2.0 * MARGIN - SAMPLE - 5);
        }

        void draw(Graphics2D graphics) {
            graphics.setPaint(Color.WHITE);
            graphics.fill(new Rectangle2D.Double(0, 0, WIDTH, height()));
            List<Rectangle2D> areas = drawPanels(graphics);
            Pen pen = new Pen(graphics);
            double y = MARGIN + 12.0;
            for (String line : titleLines) {
                pen.write(Typeface.TITLE, Typeface.DARK, line, MARGIN, y);
                y += 17;
            }
            pen.write(Typeface.TEXT, Typeface.GREY, study, MARGIN, y);
            drawNotes(graphics, pen, areas);
            for (int i = 0; i < areas.size(); i++) {
                double baseline = i == 0 ? top() + 12 : areas.get(i).getMinY() - 10;
                pen.write(Typeface.TEXT, Typeface.DARK, panels.get(i).heading(), MARGIN, baseline);
                drawWords(pen, panels.get(i), areas.get(i));
            }
            double middle = 0.5 * (LEFT + WIDTH - RIGHT) - 0.5 * Pen.width(Typeface.TEXT, commonHeading);
            pen.write(Typeface.TEXT, Typeface.DARK, commonHeading, middle, panelBottom() + COMMON_AXIS + 11);
            drawKey(graphics, pen);
        }

        private List<Rectangle2D> drawPanels(Graphics2D graphics) {
            CombinedDomainXYPlot all = new CombinedDomainXYPlot(common);
            // room for the outer halves of the labels at the ends of the axes, which would be clipped
            all.setInsets(new RectangleInsets(ROOM, 0.0, 0.0, RIGHT));
            all.setAxisOffset(RectangleInsets.ZERO_INSETS);
            all.setGap(BETWEEN);
            List<Double> places =
                    new ArrayList<>(new TreeSet<>(marks.stream().map(Note::at).toList()));
            for (Panel panel : panels) {
                XYPlot plot = panel.plot(places);
                plot.setInsets(RectangleInsets.ZERO_INSETS);
                panel.axis().setFixedDimension(LEFT);
                all.add(plot, panel.weight());
            }
            AxisSpace below = new AxisSpace();
            below.setBottom(COMMON_AXIS);
            all.setFixedDomainAxisSpace(below);
            JFreeChart chart = new JFreeChart(null, null, all, false);
            chart.setBackgroundPaint(null);
            chart.setPadding(RectangleInsets.ZERO_INSETS);
            chart.setTextAntiAlias(true);
            ChartRenderingInfo info = new ChartRenderingInfo();
            chart.draw(
                    graphics,
                    new Rectangle2D.Double(
                            0, panelTop() - ROOM, WIDTH, panelBottom() - panelTop() + COMMON_AXIS + ROOM),
                    null,
                    info);
            PlotRenderingInfo plots = info.getPlotInfo();
            List<Rectangle2D> areas = new ArrayList<>();
            for (int i = 0; i < plots.getSubplotCount(); i++) {
                areas.add(plots.getSubplotInfo(i).getDataArea());
            }
            return areas;
        }

        private void drawNotes(Graphics2D graphics, Pen pen, List<Rectangle2D> areas) {
            double base = top() + 17;
            for (Placed note : notes) {
                pen.write(Typeface.TEXT, Typeface.DARK, note.text(), note.x(), base + 11 + note.row() * ROW);
            }
            graphics.setPaint(Ink.NOISE.colour());
            graphics.setStroke(new BasicStroke(0.9f));
            for (Note mark : marks) {
                double x = x(mark.at());
                graphics.draw(new Line2D.Double(
                        x, areas.get(0).getMinY() - 3, x, areas.get(0).getMinY()));
            }
        }

        /** Words within a panel stand where fewest points of curves are hidden and no other word is; where none is free they are left out. */
        private void drawWords(Pen pen, Panel panel, Rectangle2D area) {
            List<double[]> points = new ArrayList<>();
            panel.curves().forEach(curve -> points.addAll(Panel.pixels(curve, common, panel.axis(), area)));
            for (Note mark : marks) {
                for (double y = area.getMinY(); y < area.getMaxY(); y += 4.0) {
                    points.add(new double[] {x(mark.at()), y});
                }
            }
            List<Rectangle2D> taken = new ArrayList<>();
            for (Panel.Level level : panel.levels()) {
                if (level.words().isEmpty()) {
                    continue;
                }
                double y = panel.axis().valueToJava2D(level.value(), area, RectangleEdge.LEFT);
                double room = area.getWidth() - 8 - Pen.width(Typeface.TEXT, level.words());
                List<Rectangle2D> places = new ArrayList<>();
                for (double share : new double[] {1.0, 0.0, 0.75, 0.25, 0.5}) {
                    for (double baseline : new double[] {y - 4, y + 12}) {
                        places.add(Pen.box(Typeface.TEXT, level.words(), area.getMinX() + 4 + share * room, baseline));
                    }
                }
                write(pen, level.words(), places, new Surroundings(area, points, taken));
            }
            for (Panel.Words words : panel.words()) {
                double width = Pen.width(Typeface.TEXT, words.text());
                double x = common.valueToJava2D(words.x(), area, RectangleEdge.BOTTOM) - 0.5 * width;
                double y = panel.axis().valueToJava2D(words.y(), area, RectangleEdge.LEFT) + 4;
                double inside = Math.max(area.getMinX() + 3, Math.min(area.getMaxX() - 3 - width, x));
                List<Rectangle2D> places = new ArrayList<>();
                for (double up : new double[] {0, -14, 14, -28, 28}) {
                    for (double aside : new double[] {0, -20, 20, -50, 50}) {
                        places.add(Pen.box(Typeface.TEXT, words.text(), inside + aside, y + up));
                    }
                }
                write(pen, words.text(), places, new Surroundings(area, points, taken));
            }
        }

        /** What a word must keep clear of: the edge of its panel, points of curves, words already written. */
        private record Surroundings(Rectangle2D area, List<double[]> points, List<Rectangle2D> taken) {}

        private static void write(Pen pen, String text, List<Rectangle2D> places, Surroundings around) {
            Rectangle2D best = null;
            long least = Long.MAX_VALUE;
            for (Rectangle2D box : places) {
                if (around.area().contains(box) && around.taken().stream().noneMatch(box::intersects)) {
                    long hidden = around.points().stream()
                            .filter(point -> box.contains(point[0], point[1]))
                            .count();
                    if (hidden < least) {
                        least = hidden;
                        best = box;
                    }
                }
            }
            if (best != null) {
                around.taken().add(best);
                if (least > 0) {
                    pen.clear(best);
                }
                double ascent = Typeface.TEXT.getLineMetrics(text, Pen.METRICS).getAscent();
                pen.write(Typeface.TEXT, Typeface.DARK, text, best.getMinX(), best.getMinY() + ascent);
            }
        }

        private void drawKey(Graphics2D graphics, Pen pen) {
            double top = panelBottom() + COMMON_AXIS + ROW + 8;
            for (Placed entry : key) {
                Panel.Curve curve = named.get(entry.text());
                double middle = top + entry.row() * 16 + 7;
                graphics.setPaint(curve.ink().colour());
                if (curve.style() == Panel.Style.LINE) {
                    graphics.setStroke(curve.ink().stroke());
                    graphics.draw(new Line2D.Double(entry.x(), middle, entry.x() + SAMPLE, middle));
                } else {
                    graphics.setStroke(new BasicStroke(0.9f));
                    graphics.translate(entry.x() + 0.5 * SAMPLE, middle);
                    if (curve.style() == Panel.Style.DOTS) {
                        graphics.fill(Panel.symbol(curve));
                    } else {
                        graphics.draw(new Line2D.Double(0, -6, 0, 6));
                        graphics.draw(Panel.symbol(curve));
                    }
                    graphics.translate(-entry.x() - 0.5 * SAMPLE, -middle);
                }
                pen.write(Typeface.TEXT, Typeface.DARK, keyText(entry.text()), entry.x() + SAMPLE + 5, middle + 4);
            }
            double y = top + keyRows * 16 + (remarkLines.isEmpty() ? 0 : 4) + 9;
            for (String line : remarkLines) {
                pen.write(Typeface.SMALL, Typeface.GREY, line, MARGIN, y);
                y += 13;
            }
        }
    }
}
