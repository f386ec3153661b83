package flowshy.report;

import flowshy.math.Figures;
import flowshy.study.Side;
import flowshy.study.StudyMap;
import flowshy.verdict.map.Axis;
import flowshy.verdict.map.Grid;
import flowshy.verdict.map.Levels;
import flowshy.verdict.map.Spot;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** A map drawn with letters, for a terminal: the larger value of the side that runs down stands on top, as on a chart. */
final class MapPicture {
    private static final int WIDEST = 61;
    private static final int HIGHEST = 21;
    private static final int LABEL = 12;
    private static final int STEPS = 10;

    private MapPicture() {}

    static List<String> lines(StudyMap map) {
        Grid grid = map.grid();
        int wide = FastMath.min(grid.across().count(), WIDEST);
        int high = FastMath.min(grid.down().count(), HIGHEST);
        int[] columns = picked(grid.across().count(), wide);
        int[] rows = picked(grid.down().count(), high);
        int ownColumn = nearest(map, map.across(), grid.across(), columns);
        int ownRow = nearest(map, map.down(), grid.down(), rows);
        List<String> lines = new ArrayList<>();
        for (int r = high - 1; r >= 0; r--) {
            StringBuilder line = new StringBuilder();
            for (int c = 0; c < wide; c++) {
                line.append(r == ownRow && c == ownColumn ? 'O' : mark(map, grid.at(columns[c], rows[r])));
            }
            boolean labelled = r == 0 || r == high - 1 || r == high / 2;
            lines.add(right(labelled ? MapReport.number(map.down(), grid.down().value(rows[r])) : "") + " |" + line);
        }
        lines.add(" ".repeat(LABEL) + " +" + "-".repeat(wide));
        lines.add(ends(map.across(), grid.across(), wide));
        lines.addAll(legend(map));
        return lines;
    }

    private static int[] picked(int count, int shown) {
        int[] picked = new int[shown];
        for (int k = 0; k < shown; k++) {
            picked[k] = (int) FastMath.round((double) k * (count - 1) / (shown - 1));
        }
        return picked;
    }

    private static int nearest(StudyMap map, Side side, Axis axis, int... picked) {
        if (map.own().isEmpty()) {
            return -1;
        }
        double place = axis.place(side.key().base());
        int best = 0;
        for (int k = 1; k < picked.length; k++) {
            best = FastMath.abs(picked[k] - place) < FastMath.abs(picked[best] - place) ? k : best;
        }
        return best;
    }

    private static char mark(StudyMap map, Spot spot) {
        if (!spot.there()) {
            return '/';
        }
        if (!spot.reason().isEmpty()) {
            return '?';
        }
        if (map.rejection()) {
            double margin = map.study().acceptance().margin();
            if (FastMath.abs(spot.value()) >= margin) {
                return spot.value() > 0.0 ? '#' : '=';
            }
            return spot.value() >= 0.0 ? '+' : '-';
        }
        return (char) ('0' + tenth(map.grid(), spot.value()));
    }

    /** Which tenth from least to largest, by the logarithm where that tells numbers apart. */
    private static int tenth(Grid grid, double value) {
        double least = least(grid);
        double largest = largest(grid);
        if (!(largest > least)) {
            return 0;
        }
        double share = Levels.logarithmic(least, largest)
                ? FastMath.log(value / least) / FastMath.log(largest / least)
                : (value - least) / (largest - least);
        return FastMath.min((int) (STEPS * share), STEPS - 1);
    }

    private static double least(Grid grid) {
        return grid.spots().get(grid.least().orElseThrow()).value();
    }

    private static double largest(Grid grid) {
        return grid.spots().get(grid.largest().orElseThrow()).value();
    }

    private static String ends(Side side, Axis axis, int wide) {
        String from = MapReport.number(side, axis.from());
        String to = MapReport.number(side, axis.to());
        int between = FastMath.max(1, wide - from.length() - to.length());
        return " ".repeat(LABEL + 2) + from + " ".repeat(between) + to;
    }

    private static String right(String text) {
        return " ".repeat(FastMath.max(0, LABEL - text.length())) + text;
    }

    private static List<String> legend(StudyMap map) {
        List<String> lines = new ArrayList<>();
        String indent = " ".repeat(LABEL + 2);
        if (map.rejection()) {
            String margin = Figures.of(map.study().acceptance().margin(), 4);
            lines.add(indent + "# motion, at or over " + margin + " dB    + 0 to " + margin + " dB");
            lines.add(indent + "= flow, at or under -" + margin + " dB    - under 0 dB");
        } else if (map.grid().least().isPresent()) {
            boolean log = Levels.logarithmic(least(map.grid()), largest(map.grid()));
            lines.add(indent + "0 to 9: tenths from " + MapReport.shown(map, least(map.grid()), 3));
            lines.add(indent + "to " + MapReport.shown(map, largest(map.grid()), 3) + (log ? ", logarithmic" : ""));
        }
        lines.add(indent + "/ no number    ? beyond the end of a model    O the study");
        return lines;
    }
}
