package flowshy.report.chart.paper;

import java.awt.Color;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jfree.chart.plot.XYPlot;
import org.jfree.data.xy.XYDataset;

/** What the charting library was given to draw. */
public final class Datasets {
    private Datasets() {}

    /**
     * One series of a panel.
     *
     * @param name in the key, empty if it is not named there
     * @param x abscissae of the points that have a number
     * @param y ordinates, same order
     */
    public record Series(String name, List<Double> x, List<Double> y) {}

    /** Series of every panel of a picture, in order; none for a picture that is no plot. */
    public static List<Series> of(Picture picture) {
        List<Series> all = new ArrayList<>();
        if (picture instanceof PlotSheet sheet) {
            for (Panel panel : sheet.panels()) {
                XYPlot plot = panel.plot(List.of());
                for (int i = 0; i < plot.getDatasetCount(); i++) {
                    all.add(series(plot.getDataset(i)));
                }
            }
        }
        return all;
    }

    /**
     * One bar of a sheet of rows.
     *
     * @param label of its row
     * @param scale index of its scale
     * @param value where it ends
     * @param low lower end of its interval
     * @param high upper end of its interval
     */
    public record Drawn(String label, int scale, double value, double low, double high) {}

    /** Bars of a picture, row by row; none for a picture that has no bars. */
    public static List<Drawn> bars(Picture picture) {
        List<Drawn> all = new ArrayList<>();
        if (picture instanceof RowSheet sheet) {
            for (RowSheet.Row row : sheet.rows()) {
                for (Bar bar : row.bars()) {
                    all.add(new Drawn(row.label(), bar.scale(), bar.value(), bar.low(), bar.high()));
                }
            }
        }
        return all;
    }

    /**
     * A block of a map.
     *
     * @param colour of what it is filled with, empty where it is hatched
     */
    public record Block(double left, double right, double low, double high, Optional<Color> colour) {}

    /** Blocks of a map, those without a number last. */
    public static List<Block> blocks(Picture picture) {
        List<Block> all = new ArrayList<>();
        MapSheet map = (MapSheet) picture;
        map.blocks().forEach(block -> all.add(block(block.box(), Optional.of(block.colour()))));
        map.hatched().forEach(block -> all.add(block(block.box(), Optional.empty())));
        return all;
    }

    private static Block block(MapSheet.Box box, Optional<Color> colour) {
        return new Block(box.left(), box.right(), box.low(), box.high(), colour);
    }

    /** Colours of a map's scale from below, each with the number at its upper end; the last has none. */
    public static Map<Color, String> scale(Picture picture) {
        Map<Color, String> scale = new LinkedHashMap<>();
        ((MapSheet) picture).scale().forEach(step -> scale.put(step.colour(), step.above()));
        return scale;
    }

    /** Lines of equal value of a map, in the order drawn. */
    public static List<Series> lines(Picture picture) {
        return ((MapSheet) picture)
                .lines().stream()
                        .map(line -> new Series(
                                line.words(),
                                line.points().stream().map(point -> point[0]).toList(),
                                line.points().stream().map(point -> point[1]).toList()))
                        .toList();
    }

    private static Series series(XYDataset dataset) {
        if (dataset.getSeriesCount() != 1) {
            throw new AssertionError(dataset.getSeriesCount() + " series in one dataset");
        }
        List<Double> x = new ArrayList<>();
        List<Double> y = new ArrayList<>();
        for (int i = 0; i < dataset.getItemCount(0); i++) {
            if (Double.isFinite(dataset.getYValue(0, i))) {
                x.add(dataset.getXValue(0, i));
                y.add(dataset.getYValue(0, i));
            }
        }
        return new Series(dataset.getSeriesKey(0).toString(), x, y);
    }
}
