package flowshy.report;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.report.chart.several.MapChart;
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

/** A map as text, JSON and CSV. */
public final class MapReport {
    /** Reasons told one by one; more are counted together. */
    private static final int REASONS = 6;

    /** Lines of equal value written to JSON at this many round levels at most, beside those that decide. */
    private static final int LEVELS = 10;

    private MapReport() {}

    /**
     * For a terminal: a small picture, and what stands out.
     *
     * @param map the map
     * @return text
     */
    public static String text(StudyMap map) {
        TextPage page = new TextPage();
        page.line("Flowshy " + Version.number() + "   map   "
                + map.study().origin().file());
        if (!map.study().title().isEmpty()) {
            page.line(map.study().title());
        }
        map.study().origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.heading("Map of " + map.figure().word() + unit(map));
        page.row("figure", map.figure().words() + where(map));
        page.row("across", side(map.across(), map.grid().across()));
        page.row("down", side(map.down(), map.grid().down()));
        if (map.study().device().suspension().isPresent()) {
            page.row("suspension", "its " + map.hold().word() + " is held");
        }
        page.row("finite-length", model(map) + " (" + map.lengthModel().words() + ")");
        page.line("");
        MapPicture.lines(map).forEach(page::line);
        page.heading("What stands out");
        standsOut(page, map);
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    private static void standsOut(TextPage page, StudyMap map) {
        Grid grid = map.grid();
        page.row("the study itself", own(map));
        grid.least().ifPresent(k -> page.row("least", place(map, k)));
        grid.largest().ifPresent(k -> page.row("largest", place(map, k)));
        int all = grid.spots().size();
        int there = grid.reaching(Double.NEGATIVE_INFINITY);
        for (double level : map.decisive()) {
            int above = grid.reaching(level);
            boolean asked =
                    !map.rejection() || level == map.study().acceptance().margin();
            if (there > 0 && (asked || (above > 0 && above < there))) {
                boolean most = map.atMost(level);
                page.row(
                        (most ? "at most " : "at least ") + shown(map, level, 4),
                        share(most ? within(grid, level) : above, there) + " of the places with a number");
            }
        }
        if (there < all) {
            page.row("no number", share(all - there, all) + " of all places");
        }
        int told = 0;
        int rest = 0;
        for (Grid.Reason reason : grid.reasons()) {
            if (told < REASONS) {
                page.note("[" + share(reason.places(), all) + "]", (reason.alike() ? "" : "such as ") + reason.first());
                told++;
            } else {
                rest += reason.places();
            }
        }
        if (rest > 0) {
            page.note("[" + share(rest, all) + "]", "other reasons; --csv names that of each place");
        }
    }

    private static long within(Grid grid, double level) {
        return grid.spots().stream()
                .filter(spot -> spot.there() && spot.value() <= level)
                .count();
    }

    private static String own(StudyMap map) {
        return map.own()
                .map(spot -> (spot.there() ? shown(map, spot.value(), 4) : "no number: " + spot.reason()) + " at "
                        + value(map.across(), map.across().key().base()) + ", "
                        + value(map.down(), map.down().key().base()) + " (O)")
                .orElse("lies outside the map");
    }

    private static String place(StudyMap map, int k) {
        Grid grid = map.grid();
        return shown(map, grid.spots().get(k).value(), 4) + " at "
                + value(map.across(), grid.across().value(k % grid.across().count())) + ", "
                + value(map.down(), grid.down().value(k / grid.across().count()));
    }

    private static String share(long part, long all) {
        return Figures.of(100.0 * part / all, 3) + " %";
    }

    /** A figure with its unit, as people read it. */
    static String shown(StudyMap map, double value, int digits) {
        FigureUnit unit = map.figure().unit();
        return (Figures.of(unit.show(value), digits) + " " + unit.shown()).strip();
    }

    private static String value(Side side, double value) {
        return side.key().path() + " " + number(side, value);
    }

    /** A number of the study in the unit of its range. */
    static String number(Side side, double value) {
        return (Figures.of(side.unit().show(value), 4) + " " + side.unit().symbol()).strip();
    }

    private static String unit(StudyMap map) {
        String shown = map.figure().unit().shown();
        return shown.isEmpty() ? "" : " in " + shown;
    }

    private static String where(StudyMap map) {
        if (map.frequency().isPresent()) {
            return ": " + Figures.of(map.frequency().getAsDouble(), 5) + " Hz";
        }
        boolean side = map.across().frequency() || map.down().frequency();
        return side
                ? ": each of the map's own"
                : "; band of use " + Figures.of(map.study().band().from(), 4) + " to "
                        + Figures.of(map.study().band().to(), 4) + " Hz";
    }

    private static String side(Side side, Axis axis) {
        return side.key().path() + ", " + number(side, axis.from()) + " to " + number(side, axis.to()) + ", "
                + axis.count() + " values" + (axis.logarithmic() ? ", logarithmic" : "");
    }

    /** The word of the model that was used. */
    static String model(StudyMap map) {
        return map.lengthModel().word();
    }

    /**
     * As a picture.
     *
     * @param map the map
     * @return the chart
     */
    public static Chart chart(StudyMap map) {
        return MapChart.of(
                map,
                KeyNames.column(map.across().key()),
                KeyNames.column(map.down().key()));
    }

    /**
     * One row a place: the two numbers, the figure, why it is missing or weak, and which model of the hair's length stands behind it.
     *
     * @param map the map
     * @return text
     */
    public static String csv(StudyMap map) {
        Grid grid = map.grid();
        List<List<String>> rows = new ArrayList<>();
        String model = model(map);
        List<String> across = new ArrayList<>();
        for (int i = 0; i < grid.across().count(); i++) {
            across.add(Figures.full(grid.across().value(i)));
        }
        for (int j = 0; j < grid.down().count(); j++) {
            String down = Figures.full(grid.down().value(j));
            for (int i = 0; i < grid.across().count(); i++) {
                Spot spot = grid.at(i, j);
                rows.add(List.of(
                        across.get(i), down, spot.there() ? Figures.full(spot.value()) : "", model, spot.reason()));
            }
        }
        return TableCsv.ofTexts(
                List.of(
                        KeyNames.column(map.across().key()),
                        KeyNames.column(map.down().key()),
                        map.figure().column(),
                        "finite_length",
                        "reason"),
                rows);
    }

    /**
     * As an object.
     *
     * @param json where to write
     * @param map the map
     */
    public static void write(JsonPage json, StudyMap map) {
        Grid grid = map.grid();
        json.object(() -> {
            StudyJson.write(json, map.study());
            json.text("figure", map.figure().word());
            json.text("column", map.figure().column());
            json.text("words", map.figure().words());
            map.frequency().ifPresent(hertz -> json.number("frequency_hz", hertz));
            json.object("band", () -> {
                json.number("from_hz", map.study().band().from());
                json.number("to_hz", map.study().band().to());
            });
            json.text("hold", map.hold().word());
            json.text("finite_length", model(map));
            side(json, "across", map.across(), grid.across());
            side(json, "down", map.down(), grid.down());
            json.array("rows", indices(grid.down().count()), j -> row(json, map, j));
            List<Double> levels = new ArrayList<>(Levels.of(grid, LEVELS));
            levels.addAll(map.decisive());
            json.array("contours", levels.stream().distinct().sorted().toList(), level -> {
                json.number("level", level);
                json.bool("decisive", map.decisive().contains(level));
                json.array("lines", Contours.of(grid, level), line -> {
                    json.bool("closed", line.closed());
                    json.numbers(
                            "across",
                            line.points().stream().map(Contours.Point::across).toList());
                    json.numbers(
                            "down",
                            line.points().stream().map(Contours.Point::down).toList());
                });
            });
            map.own()
                    .ifPresent(spot -> json.object("own", () -> {
                        json.number(
                                KeyNames.column(map.across().key()),
                                map.across().key().base());
                        json.number(
                                KeyNames.column(map.down().key()),
                                map.down().key().base());
                        json.cell(map.figure().column(), Cell.of(spot.value(), spot.reason()));
                    }));
        });
    }

    private static List<Integer> indices(int count) {
        List<Integer> indices = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            indices.add(i);
        }
        return indices;
    }

    private static void side(JsonPage json, String name, Side side, Axis axis) {
        json.object(name, () -> {
            json.text("key", axis.key());
            json.text("column", KeyNames.column(side.key()));
            json.bool("logarithmic", axis.logarithmic());
            json.numbers(
                    "values", indices(axis.count()).stream().map(axis::value).toList());
        });
    }

    private static void row(JsonPage json, StudyMap map, int j) {
        Grid grid = map.grid();
        json.number(KeyNames.column(map.down().key()), grid.down().value(j));
        json.numbers(
                map.figure().column(),
                indices(grid.across().count()).stream()
                        .map(i -> grid.at(i, j).value())
                        .toList());
        json.array(
                map.figure().column() + "_reason",
                indices(grid.across().count()).stream()
                        .filter(i -> !grid.at(i, j).reason().isEmpty())
                        .toList(),
                i -> {
                    json.whole("index", i);
                    json.text("reason", grid.at(i, j).reason());
                });
    }
}
