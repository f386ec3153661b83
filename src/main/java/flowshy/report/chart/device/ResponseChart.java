package flowshy.report.chart.device;

import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.Columns;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.Overlay;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.Panel;
import flowshy.report.chart.paper.PlotSheet;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.TickText;
import flowshy.response.ResponsePoint;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.DeviceFacts.Swing;
import flowshy.verdict.curve.CurvePoint;
import flowshy.verdict.curve.DeviceCurve;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** Response to motion and to flow, size and phase on one sheet, the resonance marked. */
final class ResponseChart {
    private static final String TITLE = "Response to motion and to flow";
    private static final int HEIGHT = 330;
    private static final double MOST_DECADES = 9.0;

    private ResponseChart() {}

    /** Empty without a suspension that holds the hair: then torques are known, movements are not. */
    static Optional<Chart> of(String study, BandsAnswer answer, DeviceCurve curve, List<Overlay> overlays) {
        if (curve.points().get(0).response().motion().isEmpty()) {
            return Optional.empty();
        }
        Columns<CurvePoint> columns = new Columns<>(curve.points());
        List<Double> frequency = columns.add(
                "frequency_hz", "frequency", "Hz", point -> point.response().frequency());
        List<Double> motion = columns.add(
                "motion_rad_per_m_s2",
                "motion",
                "rad/(m/s²)",
                point -> size(point.response().motion()));
        List<Double> motionPhase = columns.add(
                "motion_phase_deg",
                "phase of motion",
                "deg",
                point -> phase(point.response().motion()));
        List<Double> flow = columns.add(
                "flow_rad_per_m_s2",
                "flow",
                "rad/(m/s²)",
                point -> size(point.response().flow()));
        List<Double> flowPhase = columns.add(
                "flow_phase_deg",
                "phase of flow",
                "deg",
                point -> phase(point.response().flow()));
        List<List<Double>> seen = new ArrayList<>(List.of(motion, flow));
        overlays.stream()
                .filter(overlay -> overlay.of() == Overlay.Of.MOTION || overlay.of() == Overlay.Of.FLOW)
                .forEach(overlay -> overlay.points().forEach(point -> seen.add(List.of(point.low(), point.high()))));
        Bounds sizes = Bounds.decades(seen, MOST_DECADES);
        Panel above = Panel.decades("angle per acceleration, rad/(m/s²)", sizes.from(), sizes.to(), 3)
                .line("response to motion", Ink.MOTION, frequency, motion)
                .line("response to flow", Ink.FLOW, frequency, flow);
        Panel below = Panel.degrees("phase, degrees", -200.0, 200.0, 2)
                .line("response to motion", Ink.MOTION, frequency, motionPhase)
                .line("response to flow", Ink.FLOW, frequency, flowPhase);
        dots(above, answer, ResponseChart::size);
        dots(below, answer, ResponseChart::phase);
        for (Overlay overlay : overlays) {
            switch (overlay.of()) {
                case MOTION -> above.measured(overlay.name(), Ink.MEASURED, overlay.rows());
                case FLOW -> above.measured(overlay.name(), Ink.MEASURED_FLOW, overlay.rows());
                case MOTION_PHASE -> below.measured(overlay.name(), Ink.MEASURED, overlay.rows());
                case FLOW_PHASE -> below.measured(overlay.name(), Ink.MEASURED_FLOW, overlay.rows());
                case REJECTION -> {
                    // has a chart of its own
                }
            }
        }
        return Optional.of(new DrawnChart(
                "response",
                TITLE,
                description(answer),
                columns.table(),
                sheet(study, answer, overlays).add(above).add(below)));
    }

    private static PlotSheet sheet(String study, BandsAnswer answer, List<Overlay> overlays) {
        Bounds axis = Bounds.about(answer.band().from(), answer.band().to(), overlays);
        PlotSheet sheet = PlotSheet.decades(new Heading(TITLE, study), "frequency, Hz", axis.from(), axis.to(), HEIGHT);
        answer.facts().medium().ifPresent(swing -> {
            String words = words(swing);
            if (swing.resonance() >= axis.from() && swing.resonance() <= axis.to()) {
                sheet.mark(swing.resonance(), words);
            } else {
                sheet.remark("The " + words + " lies outside the band of use.");
            }
        });
        return sheet;
    }

    private static String words(Swing swing) {
        double quality = swing.decay().quality();
        return "resonance " + TickText.hertz(swing.resonance(), 4)
                + (swing.decay().overdamped()
                        ? ", overdamped"
                        : Double.isFinite(quality) ? ", Q " + TickText.of(quality, 3) : "");
    }

    private static String description(BandsAnswer answer) {
        ResponsePoint first = answer.points().get(0);
        ResponsePoint last = answer.points().get(answer.points().size() - 1);
        return "Angle per acceleration of the base and of the fluid, and their phases. "
                + ends("Motion", first, last, ResponsePoint::motion) + ends("Flow", first, last, ResponsePoint::flow)
                + answer.facts()
                        .medium()
                        .map(swing -> "The " + words(swing) + ".")
                        .orElse("");
    }

    private static String ends(
            String what, ResponsePoint first, ResponsePoint last, Function<ResponsePoint, Optional<Complex>> response) {
        return what + ": " + TickText.of(response.apply(first).orElseThrow().norm(), 3) + " rad/(m/s²) at "
                + TickText.hertz(first.frequency(), 4) + ", "
                + TickText.of(response.apply(last).orElseThrow().norm(), 3) + " at "
                + TickText.hertz(last.frequency(), 4) + ". ";
    }

    private static void dots(Panel panel, BandsAnswer answer, Function<Optional<Complex>, Double> number) {
        List<Double> frequencies =
                answer.points().stream().map(ResponsePoint::frequency).toList();
        panel.dots(
                "",
                Ink.MOTION,
                frequencies,
                answer.points().stream()
                        .map(point -> number.apply(point.motion()))
                        .toList());
        panel.dots(
                "",
                Ink.FLOW,
                frequencies,
                answer.points().stream()
                        .map(point -> number.apply(point.flow()))
                        .toList());
    }

    private static double size(Optional<Complex> response) {
        return response.map(Complex::norm).orElse(Double.NaN);
    }

    private static double phase(Optional<Complex> response) {
        return response.filter(value -> !value.isZero())
                .map(value -> FastMath.toDegrees(value.getArgument()))
                .orElse(Double.NaN);
    }
}
