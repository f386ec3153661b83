package flowshy.report.chart.device;

import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.Columns;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.Panel;
import flowshy.report.chart.paper.PlotSheet;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.TickText;
import flowshy.torque.finite.ForceSlice;
import flowshy.verdict.force.ForceAlong;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** Force per length along the hair, the whole hair's beside that of strips: in a stream, and turning. */
public final class ForceChart {
    private static final int HEIGHT = 300;

    /** Height over that of the tip up to which the picture holds the whole curve. */
    private static final double BELOW_THE_SPIKE = 0.97;

    private ForceChart() {}

    /** One end of a slice, so that a curve runs in steps. */
    private record Step(double height, ForceSlice slice) {
        double perLength(Function<ForceSlice, Complex> force) {
            return force.apply(slice).norm() / slice.length();
        }
    }

    /**
     * One chart a frequency.
     *
     * @param study whose hair it is, as the user wrote it
     * @param forces what was found; a frequency that was not solved has no chart
     * @return in the same order
     */
    public static List<Chart> of(String study, List<ForceAlong> forces) {
        return forces.stream()
                .filter(force -> force.found().isPresent())
                .map(force -> of(study, force))
                .toList();
    }

    private static Chart of(String study, ForceAlong force) {
        List<Step> steps = new ArrayList<>();
        for (ForceSlice slice : force.slices()) {
            if (slice.length() > 0.0) {
                steps.add(new Step(slice.bottom(), slice));
                steps.add(new Step(slice.top(), slice));
            }
        }
        Columns<Step> columns = new Columns<>(steps);
        List<Double> height = columns.add("height_um", "height", "um", step -> 1e6 * step.height());
        List<Double> stream = columns.add(
                "stream_n_per_m_per_m_s",
                "stream, whole hair",
                "N/m per m/s",
                step -> step.perLength(ForceSlice::stream));
        List<Double> strips = columns.add(
                "strip_stream_n_per_m_per_m_s",
                "stream, strips",
                "N/m per m/s",
                step -> step.perLength(ForceSlice::stripStream));
        List<Double> rocking = columns.add(
                "rocking_n_per_m_per_rad_s",
                "rocking, whole hair",
                "N/m per rad/s",
                step -> step.perLength(ForceSlice::rocking));
        List<Double> stripRocking = columns.add(
                "strip_rocking_n_per_m_per_rad_s",
                "rocking, strips",
                "N/m per rad/s",
                step -> step.perLength(ForceSlice::stripRocking));
        String title = "Force along the hair at " + TickText.hertz(force.frequency(), 4);
        PlotSheet sheet = PlotSheet.even(
                        new Heading(title, study), "height over the wall, µm", 0.0, 1e6 * force.length(), HEIGHT)
                .add(panel(
                        "force per length in a stream, mN/m per m/s", height, scaled(stream, 1e3), scaled(strips, 1e3)))
                .add(panel(
                        "on the turning hair, µN/m per rad/s", height, scaled(rocking, 1e6), scaled(stripRocking, 1e6)))
                .remark(
                        "On a bare wall. The edge at the end carries a spike, which may leave the picture; a flat tip carries a"
                                + " force of its own that is not drawn.");
        return new DrawnChart(
                "force-along-hair-"
                        + TickText.hertz(force.frequency(), 4)
                                .toLowerCase(Locale.ROOT)
                                .replaceAll("[^a-z0-9]+", "-"),
                title,
                description(force),
                columns.table(),
                sheet);
    }

    private static Panel panel(String heading, List<Double> height, List<Double> whole, List<Double> strips) {
        double largest = strips.stream().mapToDouble(Double::doubleValue).max().orElse(1.0);
        double tip = height.get(height.size() - 1);
        for (int i = 0; i < whole.size(); i++) {
            if (height.get(i) <= BELOW_THE_SPIKE * tip) {
                largest = FastMath.max(largest, whole.get(i));
            }
        }
        double most = 1.1 * largest;
        Bounds ends = Bounds.even(List.of(List.of(0.0, most)), step(most));
        return Panel.even(heading, 0.0, ends.to(), 1)
                .line("whole hair", Ink.FIRST, height, whole)
                .line("strip theory", Ink.SECOND, height, strips);
    }

    /** A fifth of the range, rounded to 1, 2 or 5 times a power of ten. */
    private static double step(double range) {
        double decade = FastMath.pow(10.0, FastMath.floor(FastMath.log10(range / 5.0)));
        double share = range / 5.0 / decade;
        return decade * (share < 2.0 ? 1.0 : share < 5.0 ? 2.0 : 5.0);
    }

    private static List<Double> scaled(List<Double> values, double factor) {
        return values.stream().map(value -> factor * value).toList();
    }

    private static String description(ForceAlong force) {
        return "Force per length at " + TickText.hertz(force.frequency(), 4) + ". Strip theory misses "
                + TickText.of(100.0 * force.streamError().norm(), 2) + " % of the stream's torque and "
                + TickText.of(100.0 * force.rockingError().norm(), 2) + " % of the turning hair's, as complex numbers.";
    }
}
