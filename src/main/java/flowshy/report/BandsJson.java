package flowshy.report;

import flowshy.report.chart.Chart;
import flowshy.response.Calibration;
import flowshy.response.Device;
import flowshy.response.ResponsePoint;
import flowshy.study.Study;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.DeviceFacts;
import flowshy.verdict.DeviceFacts.Swing;
import flowshy.verdict.Levers;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.force.ForceAlong;
import flowshy.verdict.measured.Compared;
import java.util.List;
import java.util.Optional;

/** The answer of {@code bands} as JSON. Names end in their unit; a number that is missing is null with its reason beside it. */
public final class BandsJson {
    private static final String NO_SUSPENSION = "no suspension is stated";
    private static final String FALLS = "the suspension does not hold the hair upright";

    private final JsonPage json;

    private BandsJson(JsonPage json) {
        this.json = json;
    }

    /**
     * One answer as an object.
     *
     * @param json where to write
     * @param study what was asked
     * @param answer what was found
     * @param why explanations of edges and failed limits, left out if empty, and what each number does to the rejection
     * @param measured what was measured, beside the model, left out if empty
     * @param forces along the hair, left out if empty
     * @param charts drawn of it, their numbers are left out if there are none
     */
    public static void write(
            JsonPage json,
            Study study,
            BandsAnswer answer,
            Why why,
            List<Compared> measured,
            List<ForceAlong> forces,
            List<Chart> charts) {
        BandsJson page = new BandsJson(json);
        json.object(() -> {
            StudyJson.write(json, study);
            json.object(
                    "medium", () -> new MediumJson(json).write(answer.device().around()));
            if (!answer.device().outside().equals(answer.device().around())) {
                json.object(
                        "medium_outside",
                        () -> new MediumJson(json).write(answer.device().outside()));
            }
            json.object("device", () -> page.device(study, answer));
            json.object("band", () -> {
                json.number("from_hz", answer.band().from());
                json.number("to_hz", answer.band().to());
                json.number("margin_db", answer.acceptance().margin());
            });
            json.array("bands", answer.bands(), page::band);
            page.extreme("least_rejection", answer.least());
            page.extreme("largest_rejection", answer.largest());
            List<Column<ResponsePoint>> columns = PointTable.all(answer.acceptance());
            json.array(
                    "points",
                    answer.points(),
                    point -> columns.forEach(
                            column -> json.cell(column.name(), column.cell().apply(point))));
            SensitivityReport.write(json, why.slopes());
            if (!why.levers().isEmpty()) {
                json.array("why", why.levers(), page::levers);
            }
            answer.error().ifPresent(budget -> ErrorReport.write(json, budget));
            if (!measured.isEmpty()) {
                MeasuredReport.write(json, "measured", measured);
            }
            if (!forces.isEmpty()) {
                ForceReport.write(json, forces);
            }
            CaveatJson.write(json, answer.caveats());
            answer.envelope().ifPresent(states -> EnvelopeReport.write(json, states));
            json.object("verdict", () -> page.verdict(answer));
            ChartTables.write(json, charts);
        });
    }

    private void device(Study study, BandsAnswer answer) {
        Device device = answer.device();
        DeviceFacts facts = answer.facts();
        String why = device.suspension().isEmpty() ? NO_SUSPENSION : FALLS;
        json.text("shape", device.hair().profile().shape());
        json.text("cover", device.cover().kind());
        json.number("length_m", device.hair().profile().length());
        json.number("largest_diameter_m", 2.0 * device.hair().profile().largestRadius());
        json.number("hair_density_kg_m3", device.hair().density());
        json.number("mass_kg", facts.mass());
        json.number("inertia_kg_m2", facts.inertia());
        json.number("inertial_torque_n_m_per_m_s2", facts.inertialTorque());
        json.number("womersley_least", facts.womersley().least());
        json.number("womersley_largest", facts.womersley().largest());
        json.number("stokes_layer_least_m", facts.layer().least());
        json.number("stokes_layer_largest_m", facts.layer().largest());
        json.number("knudsen", facts.knudsen());
        swing("", facts.medium(), why);
        swing("vacuum_", facts.vacuum(), why);
        json.bool(
                "overdamped",
                facts.medium().map(swing -> swing.decay().overdamped()).orElse(false));
        json.cell(
                "stiffness_n_m_per_rad",
                Cell.of(device.suspension().map(s -> s.stiffness()).orElse(Double.NaN), why));
        json.cell(
                "structural_damping_n_m_s_per_rad",
                Cell.of(device.suspension().map(s -> s.damping()).orElse(Double.NaN), why));
        device.suspension()
                .filter(held -> held.film().isPresent())
                .ifPresent(held ->
                        json.number("film_damping_n_m_s_per_rad", held.filmDamping(Optional.of(device.around()))));
        json.number("gravity_stiffness_n_m_per_rad", facts.gravityStiffness());
        json.number("static_tilt_rad", facts.staticTilt());
        json.cell("bending_frequency_hz", Cell.of(facts.bendingFrequency(), "hair.youngs-modulus is not stated"));
        study.calibration()
                .ifPresent(calibration -> json.object("calibration", () -> {
                    json.number("frequency_hz", calibration.frequency());
                    json.text("cover", calibration.cover().kind());
                    Calibration.Figures figures = calibration.figures(device);
                    json.number(
                            figures.angle() ? "sensitivity_rad_per_m_s2" : "torque_n_m_per_m_s2",
                            figures.sensitivity());
                    json.number("change_percent", figures.percent());
                    json.number("change_db", figures.level());
                }));
    }

    private void swing(String prefix, Optional<Swing> swing, String why) {
        json.cell(prefix + "resonance_hz", Cell.of(swing.map(Swing::resonance).orElse(Double.NaN), why));
        json.cell(
                prefix + "quality",
                Cell.of(
                        swing.map(s -> s.decay().quality()).orElse(Double.NaN),
                        swing.isPresent() ? "no damping" : why));
    }

    private void band(ReadingBand band) {
        String reason = "see the points: no bound, or nothing is read";
        json.number("from_hz", band.from());
        json.number("to_hz", band.to());
        json.text("reads", band.reads().word());
        json.cell("rejection_from_db", Cell.of(band.rejectionFrom(), reason));
        json.cell("rejection_to_db", Cell.of(band.rejectionTo(), reason));
    }

    private void extreme(String name, Optional<BandsAnswer.Extreme> extreme) {
        extreme.ifPresent(found -> json.object(name, () -> {
            json.number("frequency_hz", found.frequency());
            json.number("rejection_db", found.rejection());
        }));
    }

    private void levers(Levers levers) {
        json.number("frequency_hz", levers.frequency());
        json.number("rejection_db", levers.rejection());
        json.number("inertial_n_m_per_m_s2", levers.inertial());
        json.number("gradient_n_m_per_m_s2", levers.gradient());
        json.number("added_mass_n_m_per_m_s2", levers.addedMass());
        json.number("drag_n_m_per_m_s2", levers.drag());
        json.text("dominant", levers.dominant());
        json.array("levers", levers.levers(), lever -> {
            json.text("change", lever.what());
            json.number("gain_db", lever.gain());
            json.cell("edge_hz", Cell.of(lever.edge(), "the old value is not met within a factor of eight"));
        });
    }

    private void verdict(BandsAnswer answer) {
        json.text("decision", answer.verdict().decision().word());
        json.array("limits", answer.verdict().limits(), limit -> LimitJson.write(json, limit));
        json.text("sentence", answer.verdict().sentence());
    }
}
