package flowshy.report.chart.several;

import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.chart.ChartTable.Head;
import flowshy.report.chart.ChartTable.Row;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.MapSheet;
import flowshy.report.chart.paper.MapSheet.Box;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.TickText;
import flowshy.study.Side;
import flowshy.study.StudyMap;
import flowshy.verdict.figure.FigureUnit;
import flowshy.verdict.map.Axis;
import flowshy.verdict.map.Contours;
import flowshy.verdict.map.Grid;
import flowshy.verdict.map.Levels;
import flowshy.verdict.map.Spot;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.hipparchus.util.FastMath;

/** A figure over two numbers in colour, with lines of equal value: those that decide are heavy. */
public final class MapChart {
    private static final int STEPS = 12;

    /** Reasons written out; the table names that of each place. */
    private static final int REASONS = 3;

    private final StudyMap map;
    private final Grid grid;
    private final List<Double> levels;

    private MapChart(StudyMap map) {
        this.map = map;
        this.grid = map.grid();
        TreeSet<Double> all = new TreeSet<>(Levels.of(grid, STEPS));
        if (grid.least().isPresent()) {
            double least = grid.spots().get(grid.least().getAsInt()).value();
            double largest = grid.spots().get(grid.largest().getAsInt()).value();
            map.decisive().stream()
                    .filter(level -> level > least && level < largest)
                    .forEach(all::add);
        }
        this.levels = List.copyOf(all);
    }

    /**
     * The chart of a map.
     *
     * @param map with its numbers
     * @param across name of the column of the side that runs across, ends in its unit
     * @param down likewise
     * @return the chart; the table behind it holds every place
     */
    public static Chart of(StudyMap map, String across, String down) {
        MapChart chart = new MapChart(map);
        return new DrawnChart("map", chart.title(), chart.description(), chart.table(across, down), chart.sheet());
    }

    private String title() {
        return "Map of " + map.figure().word().replace('-', ' ');
    }

    private ChartTable table(String across, String down) {
        List<Head> heads = List.of(
                new Head(
                        across,
                        map.across().key().path(),
                        map.across().key().dimension().siUnit()),
                new Head(
                        down,
                        map.down().key().path(),
                        map.down().key().dimension().siUnit()),
                new Head(
                        map.figure().column(),
                        map.figure().words(),
                        map.figure().unit().si()));
        List<Row> rows = new ArrayList<>();
        for (int j = 0; j < grid.down().count(); j++) {
            for (int i = 0; i < grid.across().count(); i++) {
                Spot spot = grid.at(i, j);
                rows.add(new Row(
                        "finite-length " + model() + (spot.reason().isEmpty() ? "" : "; " + spot.reason()),
                        List.of(grid.across().value(i), grid.down().value(j), spot.value())));
            }
        }
        return new ChartTable(heads, rows);
    }

    private String model() {
        return map.lengthModel().word();
    }

    private String description() {
        StringBuilder text = new StringBuilder(map.figure().words());
        text.setCharAt(0, Character.toUpperCase(text.charAt(0)));
        text.append(" over ")
                .append(side(map.across()))
                .append(" and ")
                .append(side(map.down()))
                .append(". ");
        grid.least().ifPresent(k -> text.append("Least ").append(place(k)).append(". "));
        grid.largest().ifPresent(k -> text.append("Largest ").append(place(k)).append(". "));
        long none = grid.spots().stream().filter(spot -> !spot.there()).count();
        if (none > 0) {
            text.append(none).append(" of ").append(grid.spots().size()).append(" places have no number.");
        }
        return text.toString().strip();
    }

    private String place(int k) {
        return shown(grid.spots().get(k).value()) + " at "
                + value(map.across(), grid.across().value(k % grid.across().count())) + ", "
                + value(map.down(), grid.down().value(k / grid.across().count()));
    }

    private static String side(Side side) {
        return side.key().path() + " from " + number(side, side.from()) + " to " + number(side, side.to());
    }

    private static String value(Side side, double value) {
        return side.key().path() + " " + number(side, value);
    }

    private static String number(Side side, double value) {
        return (TickText.of(side.unit().show(value), 4) + " " + symbol(side)).strip();
    }

    private static String symbol(Side side) {
        return side.unit().symbol().replaceFirst("^u", "µ");
    }

    private String shown(double value) {
        FigureUnit unit = map.figure().unit();
        return (TickText.of(unit.show(value), 4) + " " + unit.shown()).strip();
    }

    private MapSheet sheet() {
        MapSheet sheet = new MapSheet(
                new Heading(title(), map.study().title()),
                axis(map.across(), grid.across()),
                axis(map.down(), grid.down()));
        for (int j = 0; j < grid.down().count(); j++) {
            row(sheet, j);
        }
        for (double level : levels) {
            boolean decisive = map.decisive().contains(level);
            Contours.of(grid, level).forEach(line -> sheet.line(words(line, level), decisive, points(line)));
        }
        scale(sheet);
        key(sheet);
        return sheet;
    }

    private static MapSheet.Side axis(Side side, Axis axis) {
        String symbol = symbol(side);
        return new MapSheet.Side(
                side.key().path() + (symbol.isEmpty() ? "" : ", " + symbol),
                side.unit().show(axis.from()),
                side.unit().show(axis.to()),
                axis.logarithmic());
    }

    /** Neighbours of one step of the scale make one block. */
    private void row(MapSheet sheet, int j) {
        int count = grid.across().count();
        int start = 0;
        for (int i = 1; i <= count; i++) {
            if (i < count && kind(grid.at(i, j)) == kind(grid.at(start, j))) {
                continue;
            }
            Box box = new Box(
                    edge(map.across(), grid.across(), start - 0.5),
                    edge(map.across(), grid.across(), i - 0.5),
                    edge(map.down(), grid.down(), j - 0.5),
                    edge(map.down(), grid.down(), j + 0.5));
            Spot spot = grid.at(start, j);
            if (spot.there()) {
                sheet.block(box, colour(step(spot.value())));
            } else {
                sheet.missing(box);
            }
            if (spot.there() && !spot.reason().isEmpty()) {
                sheet.weak(box);
            }
            start = i;
        }
    }

    private int kind(Spot spot) {
        return spot.there() ? 2 * step(spot.value()) + (spot.reason().isEmpty() ? 0 : 1) : -1;
    }

    private static double edge(Side side, Axis axis, double place) {
        return side.unit().show(axis.at(FastMath.min(FastMath.max(place, 0.0), axis.count() - 1.0)));
    }

    /** How many levels lie at or under a value. */
    private int step(double value) {
        int step = 0;
        while (step < levels.size() && value >= levels.get(step)) {
            step++;
        }
        return step;
    }

    private List<List<Double>> points(Contours.Line line) {
        List<List<Double>> points = new ArrayList<>();
        line.points()
                .forEach(point -> points.add(List.of(
                        map.across().unit().show(point.across()),
                        map.down().unit().show(point.down()))));
        if (line.closed()) {
            points.add(points.get(0));
        }
        return points;
    }

    /** A line of a few points is too short for words. */
    private String words(Contours.Line line, double level) {
        return line.points().size() < 6 ? "" : TickText.of(map.figure().unit().show(level), 4);
    }

    private void scale(MapSheet sheet) {
        sheet.scaleHeading(map.figure().unit().shown());
        for (int step = 0; step <= levels.size(); step++) {
            sheet.step(
                    colour(step),
                    step < levels.size() ? TickText.of(map.figure().unit().show(levels.get(step)), 4) : "");
        }
    }

    private int colour(int step) {
        if (!map.rejection()) {
            return MapColours.rising(levels.isEmpty() ? 0.5 : (double) step / levels.size());
        }
        // the middle of the step, those at the ends as far out as their one level says; the margin is half way to full
        // colour
        double low = step == 0 ? (levels.isEmpty() ? 0.0 : levels.get(0) - 1.0) : levels.get(step - 1);
        double high = step == levels.size() ? low + 1.0 : levels.get(step);
        if (levels.isEmpty()) {
            low = grid.least().isPresent()
                    ? grid.spots().get(grid.least().getAsInt()).value()
                    : 0.0;
            high = low;
        }
        double full = FastMath.max(2.0 * map.study().acceptance().margin(), 1.0);
        for (double level : levels) {
            full = FastMath.max(full, FastMath.abs(level));
        }
        return MapColours.signed(0.5 * (low + high) / full);
    }

    private void key(MapSheet sheet) {
        map.own()
                .ifPresent(spot -> sheet.own(
                        map.across().unit().show(map.across().key().base()),
                        map.down().unit().show(map.down().key().base()),
                        "the study itself: " + (spot.there() ? shown(spot.value()) : "no number, " + spot.reason())));
        List<String> heavy = map.decisive().stream()
                .filter(levels::contains)
                .map(this::decisive)
                .toList();
        if (!heavy.isEmpty()) {
            sheet.keyDecisive(String.join("; ", heavy));
        }
        if (levels.size() > heavy.size()) {
            sheet.keyPlain("lines of equal value");
        }
        int missing = 0;
        boolean weak = false;
        for (Grid.Reason reason : grid.reasons()) {
            String words = (reason.alike() ? "" : "such as ") + reason.first();
            if (!reason.numbered()) {
                missing++;
                if (missing <= REASONS) {
                    sheet.keyMissing("no number: " + words);
                }
            } else {
                weak = true;
                sheet.keyWeak(words);
            }
        }
        if (missing > REASONS) {
            sheet.remark("No number for " + (missing - REASONS) + " other reasons too.");
        }
        sheet.remark((weak ? "Dotted: no more than a trend. " : "") + where() + "Finite length: " + model() + "."
                + (map.study().device().suspension().isPresent()
                        ? " Of the suspension its " + map.hold().word() + " is held."
                        : ""));
    }

    private String decisive(double level) {
        if (!map.rejection()) {
            return shown(level) + ": the limit";
        }
        return shown(level) + (level == 0.0 ? ": motion and flow read alike" : ": the margin");
    }

    private String where() {
        if (map.frequency().isPresent()) {
            return "At " + TickText.hertz(map.frequency().getAsDouble(), 5) + ". ";
        }
        return map.across().frequency() || map.down().frequency()
                ? ""
                : "Band of use " + TickText.hertz(map.study().band().from(), 4) + " to "
                        + TickText.hertz(map.study().band().to(), 4) + ". ";
    }
}
