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
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.curve.CurvePoint;
import flowshy.verdict.curve.DeviceCurve;
import flowshy.verdict.curve.TorqueParts;
import java.util.List;

/** What turns the hair, part by part, so that one sees why it reads what it reads. */
final class TorqueChart {
    private static final String TITLE = "What turns the hair: torques about the pivot";
    private static final String UNIT = "N·m/(m/s²)";
    private static final double MOST_DECADES = 8.0;

    private TorqueChart() {}

    static Chart of(String study, BandsAnswer answer, DeviceCurve curve) {
        Columns<CurvePoint> columns = new Columns<>(curve.points());
        List<Double> frequency = columns.add(
                "frequency_hz", "frequency", "Hz", point -> point.response().frequency());
        List<Double> motion = columns.add(
                "motion_n_m_per_m_s2",
                "moving base",
                UNIT,
                point -> point.parts().motion());
        List<Double> flow = columns.add(
                "flow_n_m_per_m_s2",
                "moving fluid",
                UNIT,
                point -> point.parts().flow());
        List<Double> inertial = columns.add(
                "inertial_n_m_per_m_s2",
                "hair's inertia less the fluid's",
                UNIT,
                point -> point.parts().inertial());
        List<Double> gradient = columns.add(
                "gradient_n_m_per_m_s2",
                "flow: pressure gradient",
                UNIT,
                point -> point.parts().gradient());
        List<Double> added = columns.add(
                "added_mass_n_m_per_m_s2",
                "flow: added mass",
                UNIT,
                point -> point.parts().addedMass());
        List<Double> damping = columns.add(
                "damping_n_m_per_m_s2",
                "flow: viscous damping",
                UNIT,
                point -> point.parts().damping());
        Bounds sizes = Bounds.decades(List.of(motion, flow, inertial, gradient, added, damping), MOST_DECADES);
        Bounds axis = Bounds.about(answer.band().from(), answer.band().to());
        Panel panel = Panel.decades("torque per acceleration, " + UNIT, sizes.from(), sizes.to(), 1)
                .line("moving base, all", Ink.MOTION, frequency, motion)
                .line("moving fluid, all", Ink.FLOW, frequency, flow)
                .line("hair's inertia less the fluid's", Ink.INERTIA, frequency, inertial)
                .line("flow: pressure gradient", Ink.GRADIENT, frequency, gradient)
                .line("flow: added mass", Ink.ADDED_MASS, frequency, added)
                .line("flow: viscous damping", Ink.DAMPING, frequency, damping);
        PlotSheet sheet = PlotSheet.decades(new Heading(TITLE, study), "frequency, Hz", axis.from(), axis.to(), 240)
                .add(panel);
        if (answer.device().cover().closed()) {
            sheet.remark(
                    "Under this cover no flow reaches the hair: its parts are zero and have no place on this axis.");
        }
        return new DrawnChart("torques", TITLE, description(curve), columns.table(), sheet);
    }

    private static String description(DeviceCurve curve) {
        CurvePoint first = curve.points().get(0);
        CurvePoint last = curve.points().get(curve.points().size() - 1);
        return "Torque about the pivot per acceleration of base or fluid, as size. " + at(first) + " " + at(last);
    }

    private static String at(CurvePoint point) {
        TorqueParts parts = point.parts();
        return "At " + TickText.hertz(point.response().frequency(), 4) + ": moving base "
                + TickText.of(parts.motion(), 3) + ", moving fluid " + TickText.of(parts.flow(), 3) + ", of the flow "
                + TickText.of(parts.gradient(), 3) + " by the pressure gradient, "
                + TickText.of(parts.addedMass(), 3) + " by added mass, " + TickText.of(parts.damping(), 3)
                + " by viscous damping, in " + UNIT + ".";
    }
}
