package flowshy.report.chart.paper;

import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;
import org.hipparchus.util.FastMath;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.axis.ValueTick;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/** Logarithmic axis: decades labelled, 2 to 9 ticked; 2 and 5, then the rest, labelled too where few decades leave room. */
final class DecadeAxis extends LogAxis {
    /** Labels wanted: below it, finer steps are labelled if all of them fit. */
    private static final int ENOUGH = 4;

    /** Clear space between two labels, in widths of a digit. */
    private static final double GAP = 1.2;

    /** Finer steps, the first that are tried first. */
    private static final int[][] STEPS = {{2, 5}, {3, 7}, {4, 6, 8}, {9}};

    DecadeAxis(double from, double to) {
        setSmallestValue(FastMath.min(1e-100, from));
        setRange(from, to);
        setMinorTickMarksVisible(true);
        Panel.dress(this);
    }

    @Override
    public List<ValueTick> refreshTicks(Graphics2D graphics, AxisState state, Rectangle2D area, RectangleEdge edge) {
        boolean horizontal = RectangleEdge.isTopOrBottom(edge);
        Labels labels = new Labels(graphics.getFontRenderContext(), area, edge);
        int first = (int) FastMath.floor(FastMath.log10(getLowerBound()));
        int last = (int) FastMath.ceil(FastMath.log10(getUpperBound()));
        for (int stride = 1; !labels.tryAll(decades(first, last, stride)); stride++) {
            // a stride as long as the axis leaves one label, which always fits
        }
        for (int[] steps : STEPS) {
            if (labels.placed.size() < ENOUGH) {
                labels.tryAll(multiples(first, last, steps));
            }
        }
        TextAnchor anchor = horizontal ? TextAnchor.TOP_CENTER : TextAnchor.CENTER_RIGHT;
        List<ValueTick> ticks = new ArrayList<>();
        for (int decade = first; decade <= last; decade++) {
            for (int step = 1; step < 10; step++) {
                double value = value(step, decade);
                if (inside(value)) {
                    String text = labels.placed.containsKey(value) ? label(value) : "";
                    TickType type = step == 1 ? TickType.MAJOR : TickType.MINOR;
                    ticks.add(new NumberTick(type, value, text, anchor, anchor, 0.0));
                }
            }
        }
        return ticks;
    }

    private boolean inside(double value) {
        return value >= getLowerBound() * (1.0 - 1e-9) && value <= getUpperBound() * (1.0 + 1e-9);
    }

    private List<Double> decades(int first, int last, int stride) {
        List<Double> values = new ArrayList<>();
        for (int decade = first; decade <= last; decade++) {
            if (Math.floorMod(decade, stride) == 0 && inside(value(1, decade))) {
                values.add(value(1, decade));
            }
        }
        return values;
    }

    private List<Double> multiples(int first, int last, int... steps) {
        List<Double> values = new ArrayList<>();
        for (int decade = first; decade <= last; decade++) {
            for (int step : steps) {
                if (inside(value(step, decade))) {
                    values.add(value(step, decade));
                }
            }
        }
        return values;
    }

    /** The number that is written so: 3e-5 and not 3 times 1e-5. */
    private static double value(int step, int decade) {
        return Double.parseDouble(step + "e" + decade);
    }

    /** One way for a whole axis: plain numbers only if all of them are. */
    private String label(double value) {
        boolean plain = getLowerBound() >= 0.9e-3 && getUpperBound() <= 1.1e5;
        if (plain) {
            return TickText.of(value, 2);
        }
        int decade = (int) FastMath.floor(FastMath.log10(value) + 1e-9);
        long step = FastMath.round(value / FastMath.pow(10.0, decade));
        return (step == 1 ? "" : step + "·") + TickText.power(decade);
    }

    /** Labels placed so far, by the value they stand at. */
    private final class Labels {
        private final FontRenderContext metrics;
        private final Rectangle2D area;
        private final RectangleEdge edge;
        private final TreeMap<Double, double[]> placed = new TreeMap<>();

        Labels(FontRenderContext metrics, Rectangle2D area, RectangleEdge edge) {
            this.metrics = metrics;
            this.area = area;
            this.edge = edge;
        }

        /** Places all or none. */
        boolean tryAll(List<Double> values) {
            TreeMap<Double, double[]> all = new TreeMap<>(placed);
            values.forEach(value -> all.put(value, extent(value)));
            double before = Double.NEGATIVE_INFINITY;
            for (double[] span : RectangleEdge.isTopOrBottom(edge)
                    ? all.values()
                    : all.descendingMap().values()) {
                if (span[0] < before) {
                    return false;
                }
                before = span[1] + GAP * getTickLabelFont().getSize2D() / 2.0;
            }
            placed.putAll(all);
            return true;
        }

        private double[] extent(double value) {
            Rectangle2D bounds = getTickLabelFont().getStringBounds(label(value), metrics);
            double half = 0.5 * (RectangleEdge.isTopOrBottom(edge) ? bounds.getWidth() : 0.8 * bounds.getHeight());
            double middle = valueToJava2D(value, area, edge);
            return new double[] {middle - half, middle + half};
        }
    }
}
