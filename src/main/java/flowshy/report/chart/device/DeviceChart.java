package flowshy.report.chart.device;

import flowshy.hair.Profile;
import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartTable;
import flowshy.report.chart.ChartTable.Head;
import flowshy.report.chart.ChartTable.Row;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.ScaleSheet;
import flowshy.report.chart.paper.TickText;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.stream.cover.VentedCover;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.curve.Layers;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** The hair to scale on its wall, the viscous layer at three frequencies, and what stands over it. */
final class DeviceChart {
    private static final String TITLE = "The hair to scale, with the viscous layer about it";
    private static final int OUTLINE_STEPS = 24;

    /** A cover higher or wider than this many lengths of the hair is told in words. */
    private static final double FAR = 6.0;

    private DeviceChart() {}

    /** Inner height and width of a cover [m]; the width is that of the whole roof. */
    private record Room(double height, double width) {}

    static Chart of(String study, BandsAnswer answer) {
        Profile profile = answer.device().hair().profile();
        Cover cover = answer.device().cover();
        double length = profile.length();
        Layers layers = Layers.of(answer.device(), answer.band());
        Optional<Room> room = room(cover).filter(found -> found.height() < FAR * length);
        double tall = FastMath.max(
                room.map(found -> 1.12 * found.height()).orElse(1.2 * length),
                FastMath.min(2.0 * length, 1.1 * layers.all().get(0).thickness()));
        double wide = FastMath.max(
                2.4 * profile.largestRadius(),
                room.map(Room::width).filter(width -> width < FAR * length).orElse(0.0) * 1.08);
        ScaleSheet sheet = new ScaleSheet(new Heading(TITLE, study), outline(profile), tall, wide);
        List<Row> rows = new ArrayList<>();
        rows.add(new Row("length", List.of(Double.NaN, length)));
        rows.add(new Row("largest diameter", List.of(Double.NaN, 2.0 * profile.largestRadius())));
        for (Layers.Layer layer : layers.all()) {
            sheet.layer(layer.thickness(), layerWords(layer, tall));
            rows.add(new Row("viscous layer", List.of(layer.frequency(), layer.thickness())));
        }
        sheet.note(length, "tip, " + ScaleSheet.length(length));
        room(cover).ifPresent(found -> {
            rows.add(new Row("height under the cover", List.of(Double.NaN, found.height())));
            rows.add(new Row("width of the cover", List.of(Double.NaN, found.width())));
        });
        room.ifPresent(found -> cover(sheet, cover, found, tall));
        sheet.remark(remark(answer, room));
        return new DrawnChart(
                "device",
                TITLE,
                description(answer, layers),
                new ChartTable(
                        List.of(new Head("frequency_hz", "frequency", "Hz"), new Head("size_m", "size", "m")), rows),
                sheet);
    }

    private static String layerWords(Layers.Layer layer, double tall) {
        return "layer at " + TickText.hertz(layer.frequency(), 3) + ": " + ScaleSheet.length(layer.thickness())
                + (layer.thickness() > tall ? ", beyond the drawing" : "");
    }

    private static Optional<Room> room(Cover cover) {
        if (cover instanceof RoofedCover roof) {
            return Optional.of(new Room(roof.gap(), roof.length()));
        }
        if (cover instanceof SealedCover sealed) {
            return sealed.cavity().map(cavity -> new Room(cavity.height(), cavity.diameter()));
        }
        if (cover instanceof VentedCover vented) {
            double section = vented.cavitySection();
            return Optional.of(new Room(vented.cavityVolume() / section, FastMath.sqrt(section)));
        }
        return Optional.empty();
    }

    private static void cover(ScaleSheet sheet, Cover cover, Room room, double tall) {
        double half = 0.5 * room.width();
        double thick = 0.05 * tall;
        if (cover instanceof RoofedCover) {
            sheet.block(-half, half, room.height(), room.height() + thick);
            sheet.note(room.height() + thick, "roof, gap " + ScaleSheet.length(room.height()));
            return;
        }
        sheet.walls(half);
        sheet.block(-half - thick, -half, 0.0, room.height() + thick);
        sheet.block(half, half + thick, 0.0, room.height() + thick);
        if (cover instanceof VentedCover vented) {
            lidWithHoles(sheet, vented, room, thick);
        } else {
            sheet.block(-half, half, room.height(), room.height() + thick);
        }
        sheet.note(room.height() + thick, cover.kind() + " lid, " + ScaleSheet.length(room.height()) + " high inside");
    }

    /** Up to five of the holes, side by side to scale; in truth they lie over the lid. */
    private static void lidWithHoles(ScaleSheet sheet, VentedCover vented, Room room, double thick) {
        int shown = (int) FastMath.max(
                1,
                FastMath.min(
                        FastMath.min(5, vented.holes()), FastMath.floor(0.6 * room.width() / vented.holeDiameter())));
        double solid = FastMath.max(0.0, (room.width() - shown * vented.holeDiameter()) / (shown + 1));
        double x = -0.5 * room.width();
        for (int i = 0; i <= shown; i++) {
            sheet.block(x, x + solid, room.height(), room.height() + thick);
            x += solid + vented.holeDiameter();
        }
    }

    /** Height and radius, alternating; breaks of the profile are points. */
    private static List<Double> outline(Profile profile) {
        List<Double> outline = new ArrayList<>();
        List<Double> breaks = profile.breaks();
        for (int i = 1; i < breaks.size(); i++) {
            double from = breaks.get(i - 1);
            double to = breaks.get(i);
            for (int step = 0; step <= OUTLINE_STEPS; step++) {
                // closer to the upper end: a round tip is steep there; within the piece, so that a step keeps both
                // radii
                double share = FastMath.sin(0.5 * FastMath.PI * step / OUTLINE_STEPS);
                double inside = FastMath.min(1.0 - 1e-9, FastMath.max(1e-9, share));
                double z = from + inside * (to - from);
                outline.add(from + share * (to - from));
                outline.add(profile.radius(z));
            }
        }
        return outline;
    }

    private static String remark(BandsAnswer answer, Optional<Room> drawn) {
        Profile profile = answer.device().hair().profile();
        Cover cover = answer.device().cover();
        return profile.shape() + ", largest diameter " + ScaleSheet.length(2.0 * profile.largestRadius()) + "; in "
                + answer.device().around().name() + "; cover " + cover.words()
                + (drawn.isEmpty() && room(cover).isPresent() ? ", beyond the drawing" : "")
                + ". The layer is drawn about the hair and over its wall.";
    }

    private static String description(BandsAnswer answer, Layers layers) {
        StringBuilder text = new StringBuilder("A "
                + answer.device().hair().profile().shape() + " of "
                + ScaleSheet.length(answer.device().hair().profile().length()) + " length stands on a wall, cover "
                + answer.device().cover().words() + ". Viscous layer: ");
        for (Layers.Layer layer : layers.all()) {
            text.append(ScaleSheet.length(layer.thickness()))
                    .append(" at ")
                    .append(TickText.hertz(layer.frequency(), 3))
                    .append(", ");
        }
        return text.substring(0, text.length() - 2) + ".";
    }
}
