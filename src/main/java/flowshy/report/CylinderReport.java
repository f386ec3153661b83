package flowshy.report;

import flowshy.cylinder.LimitingForm;
import flowshy.math.Caveat;
import flowshy.math.Figures;
import flowshy.torque.StripFactors;
import flowshy.verdict.error.StripPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** Every factor of a strip's force, for a check by hand. */
public final class CylinderReport {
    private CylinderReport() {}

    private static List<Column<StripFactors>> columns(boolean limits) {
        List<Column<StripFactors>> columns = new ArrayList<>(List.of(
                number("frequency_hz", "frequency", "Hz", StripFactors::frequency),
                number("radius_m", "radius a", "m", StripFactors::radius),
                number("womersley", "Womersley number Wo", "", StripFactors::womersley),
                number("stokes_layer_m", "Stokes layer", "m", StripFactors::layer),
                number("gamma_real", "Re Gamma", "", f -> f.gamma().getReal()),
                number("gamma_imaginary", "Im Gamma", "", f -> f.gamma().getImaginary()),
                number("added_mass_kg_m", "added mass", "kg/m", StripFactors::addedMass),
                number("damping_n_s_m2", "damping", "N.s/m2", StripFactors::damping),
                number("share_real", "Re profile factor s", "", f -> f.share().getReal()),
                number(
                        "share_imaginary",
                        "Im profile factor s",
                        "",
                        f -> f.share().getImaginary()),
                number(
                        "moving_n_s_m2",
                        "force, strip moving",
                        "N.s/m2",
                        f -> f.forceMoving().norm()),
                number("moving_phase_deg", "its phase", "deg", f -> phase(f.forceMoving())),
                number(
                        "standing_n_s_m2",
                        "force, fluid moving",
                        "N.s/m2",
                        f -> f.forceStanding().norm()),
                number("standing_phase_deg", "its phase", "deg", f -> phase(f.forceStanding()))));
        if (limits) {
            for (LimitingForm form : LimitingForm.values()) {
                String stem = form == LimitingForm.THIN_HAIR ? "thin_hair" : "thin_layer";
                columns.add(number(
                        stem + "_gamma_real",
                        "Re Gamma, " + form.words(),
                        "",
                        f -> form.hydrodynamicFunction(f.womersley()).getReal()));
                columns.add(number(
                        stem + "_gamma_imaginary",
                        "Im Gamma, " + form.words(),
                        "",
                        f -> form.hydrodynamicFunction(f.womersley()).getImaginary()));
                columns.add(number(
                        stem + "_relative_error", "its relative error", "", f -> form.relativeError(f.womersley())));
            }
        }
        return columns;
    }

    private static Column<StripFactors> number(
            String name, String label, String unit, ToDoubleFunction<StripFactors> value) {
        return new Column<>(name, label, unit, 6, f -> Cell.of(value.applyAsDouble(f), "not defined here"));
    }

    private static double phase(Complex force) {
        return FastMath.toDegrees(force.getArgument());
    }

    private static List<Column<StripPoint>> surroundings() {
        return List.of(
                point("mean_speed_m_s", "mean speed", "m/s", StripPoint::meanSpeed),
                point("deviation_m_s", "fluctuation", "m/s rms", StripPoint::deviation),
                point("reynolds", "Reynolds number Re", "", p -> p.regime().reynolds()),
                point(
                        "keulegan_carpenter",
                        "Keulegan-Carpenter KC",
                        "",
                        p -> p.regime().keuleganCarpenter()),
                point("stokes_beta", "Stokes's beta", "", p -> p.regime().stokesBeta()),
                point(
                        "excursion_ratio",
                        "excursion ratio X",
                        "",
                        p -> p.regime().excursionRatio()),
                point("steady_force_n_m", "drag of the mean", "N/m", StripPoint::steadyForce),
                point("mean_force_n_m", "mean drag", "N/m", StripPoint::meanForce),
                point("linear_n_s_m2", "resistance, linear", "N.s/m2", StripPoint::linear),
                point("quasi_steady_n_s_m2", "resistance, steady", "N.s/m2", StripPoint::quasiSteady),
                point("weight", "share of the steady law", "", StripPoint::weight),
                point("combined_n_s_m2", "resistance in use", "N.s/m2", StripPoint::combined));
    }

    private static Column<StripPoint> point(
            String name, String label, String unit, ToDoubleFunction<StripPoint> value) {
        return new Column<>(name, label, unit, 6, p -> Cell.of(value.applyAsDouble(p), "not defined here"));
    }

    private static <T> void block(TextPage page, List<Column<T>> columns, T row) {
        for (Column<T> column : columns) {
            Cell cell = column.cell().apply(row);
            page.row(
                    column.label(),
                    cell.value().isPresent()
                            ? (Figures.of(cell.value().getAsDouble(), column.digits()) + " " + column.unit()).strip()
                            : cell.reason());
        }
    }

    /**
     * For a terminal, one block a frequency.
     *
     * @param head what was asked, one line
     * @param factors in order
     * @param points what the surroundings make of the law, same order; empty without surroundings
     * @param caveats of the strip
     * @param limits whether the thin and thick limits are set beside
     * @return text
     */
    public static String text(
            String head, List<StripFactors> factors, List<StripPoint> points, List<Caveat> caveats, boolean limits) {
        TextPage page = new TextPage();
        page.line(head);
        page.paragraph(
                "Forces per unit length and per unit velocity. Time factor exp(+i w t). Fluid moving: i w rho pi a^2"
                        + " (1 + Gamma s); strip moving: -i w rho pi a^2 Gamma.");
        for (int i = 0; i < factors.size(); i++) {
            page.line("");
            block(page, columns(limits), factors.get(i));
            if (!points.isEmpty()) {
                block(page, surroundings(), points.get(i));
                page.row("regime", points.get(i).regime().kind().words());
                points.get(i)
                        .caveats()
                        .forEach(caveat -> page.note("[" + caveat.weight().words() + "]", caveat.text()));
            }
        }
        caveats.forEach(caveat -> page.note("[" + caveat.weight().words() + "]", caveat.text()));
        return page.toString();
    }

    /**
     * As JSON.
     *
     * @param head what was asked
     * @param factors in order
     * @param points what the surroundings make of the law, same order; empty without surroundings
     * @param caveats of the strip
     * @param limits whether the limits are included
     * @return text
     */
    public static String json(
            String head, List<StripFactors> factors, List<StripPoint> points, List<Caveat> caveats, boolean limits) {
        JsonPage json = new JsonPage();
        json.object(() -> {
            json.text("strip", head);
            json.array(
                    "points",
                    factors,
                    strip -> columns(limits)
                            .forEach(column ->
                                    json.cell(column.name(), column.cell().apply(strip))));
            if (!points.isEmpty()) {
                json.array("surroundings", points, point -> {
                    json.number("frequency_hz", point.frequency());
                    surroundings()
                            .forEach(column ->
                                    json.cell(column.name(), column.cell().apply(point)));
                    json.text("regime", point.regime().kind().words());
                });
            }
            CaveatJson.write(json, caveats);
        });
        return json.finish();
    }

    /**
     * As CSV.
     *
     * @param factors in order
     * @param limits whether the limits are included
     * @return text
     */
    public static String csv(List<StripFactors> factors, boolean limits) {
        return TableCsv.of(factors, columns(limits));
    }
}
