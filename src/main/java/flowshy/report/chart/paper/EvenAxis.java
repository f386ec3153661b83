package flowshy.report.chart.paper;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.ValueTick;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/** Linear axis with round steps that leave room for their labels. */
final class EvenAxis extends NumberAxis {
    private static final double[] ROUND = {1.0, 2.0, 5.0};

    /** Steps that angles are read in. */
    private static final double[] ANGLES = {15.0, 30.0, 45.0, 90.0, 180.0};

    private final boolean degrees;

    /**
     * An axis.
     *
     * @param from lower end
     * @param to upper end
     * @param degrees whether steps are those of angles
     */
    EvenAxis(double from, double to, boolean degrees) {
        this.degrees = degrees;
        setAutoRangeIncludesZero(false);
        setRange(from, to);
        Panel.dress(this);
    }

    boolean degrees() {
        return degrees;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof EvenAxis axis && axis.degrees == degrees && super.equals(other);
    }

    @Override
    public int hashCode() {
        return super.hashCode();
    }

    @Override
    public List<ValueTick> refreshTicks(Graphics2D graphics, AxisState state, Rectangle2D area, RectangleEdge edge) {
        boolean horizontal = RectangleEdge.isTopOrBottom(edge);
        double length = horizontal ? area.getWidth() : area.getHeight();
        double room = horizontal
                ? 3.6 * getTickLabelFont().getSize2D()
                : 2.2 * getTickLabelFont().getSize2D();
        double step = step((getUpperBound() - getLowerBound()) / FastMath.max(1.0, FastMath.floor(length / room)));
        TextAnchor anchor = horizontal ? TextAnchor.TOP_CENTER : TextAnchor.CENTER_RIGHT;
        List<ValueTick> ticks = new ArrayList<>();
        long last = (long) FastMath.floor(getUpperBound() / step + 1e-9);
        for (long n = (long) FastMath.ceil(getLowerBound() / step - 1e-9); n <= last; n++) {
            double value = n * step;
            ticks.add(new NumberTick(value, TickText.of(value, 6), anchor, anchor, 0.0));
        }
        return ticks;
    }

    private double step(double least) {
        if (degrees) {
            for (double angle : ANGLES) {
                if (angle >= least) {
                    return angle;
                }
            }
        }
        double decade = FastMath.pow(10.0, FastMath.floor(FastMath.log10(least)));
        for (double round : ROUND) {
            if (round * decade >= least * (1.0 - 1e-9)) {
                return round * decade;
            }
        }
        return 10.0 * decade;
    }
}
