package flowshy.report;

import flowshy.medium.Medium;
import flowshy.medium.PropertySource;
import java.util.Locale;

/** A medium at a state as JSON fields. */
final class MediumJson {
    private final JsonPage json;

    MediumJson(JsonPage json) {
        this.json = json;
    }

    /**
     * Writes the fields of a medium into the open object.
     *
     * @param medium at a state
     */
    void write(Medium medium) {
        json.text("name", medium.name());
        json.text("phase", medium.phase().name().toLowerCase(Locale.ROOT));
        json.number("temperature_k", medium.temperature());
        json.number("pressure_pa", medium.pressure());
        json.number("density_kg_m3", medium.density());
        json.number("viscosity_pa_s", medium.viscosity());
        json.number("kinematic_viscosity_m2_s", medium.kinematicViscosity());
        json.cell("sound_speed_m_s", Cell.of(medium.soundSpeed(), "not known for this medium"));
        json.cell("mean_free_path_m", Cell.of(medium.meanFreePath(), "a liquid, or the molar mass is not known"));
        json.array("sources", medium.sources(), this::source);
    }

    private void source(PropertySource source) {
        json.text("property", source.property());
        json.text("source", source.source());
        json.text("reading", source.reading().words());
        json.cell("relative_uncertainty", Cell.of(source.uncertainty(), "not stated by the source"));
    }
}
