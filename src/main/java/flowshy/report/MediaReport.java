package flowshy.report;

import flowshy.math.Caveat;
import flowshy.math.Figures;
import flowshy.math.Range;
import flowshy.medium.AcceptedParameter;
import flowshy.medium.Medium;
import flowshy.medium.MediumEntry;
import flowshy.medium.PropertySource;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/** What is known of media: the list, and one at a state. */
public final class MediaReport {
    private MediaReport() {}

    /**
     * The list for a terminal.
     *
     * @param entries in the order printed
     * @return text
     */
    public static String listText(List<MediumEntry> entries) {
        TextPage page = new TextPage();
        page.line("Media: range, what else they need, how surely density and viscosity are known");
        for (MediumEntry entry : entries) {
            page.line("");
            page.line("  " + entry.name()
                    + (entry.aliases().isEmpty() ? "" : "  (" + String.join(", ", entry.aliases()) + ")"));
            page.row("", entry.phase().name().toLowerCase(Locale.ROOT) + ", " + entry.about());
            page.row(
                    "",
                    Figures.of(entry.temperatures().low() - 273.15, 4) + " to "
                            + Figures.of(entry.temperatures().high() - 273.15, 4) + " degC, "
                            + Figures.of(entry.pressures().low() / 1000.0, 3) + " to "
                            + Figures.of(entry.pressures().high() / 1000.0, 6) + " kPa" + needs(entry));
            for (PropertySource source : entry.sources()) {
                if (source.property().equals("density") || source.property().equals("viscosity")) {
                    page.row("", source.property() + ": " + provenance(source));
                }
            }
        }
        return page.toString();
    }

    private static String needs(MediumEntry entry) {
        return entry.parameters().isEmpty()
                ? ""
                : "; needs "
                        + entry.parameters().stream().map(MediaReport::accepted).collect(Collectors.joining(", "));
    }

    private static String accepted(AcceptedParameter accepted) {
        Range range = accepted.range();
        return accepted.parameter().key() + " " + Figures.of(range.low(), 3) + " to " + Figures.of(range.high(), 3)
                + (accepted.parameter().unit().equals("-")
                        ? ""
                        : " " + accepted.parameter().unit());
    }

    private static String provenance(PropertySource source) {
        String uncertainty = source.uncertainty().isPresent()
                ? "u " + Figures.of(100.0 * source.uncertainty().getAsDouble(), 2) + " %, "
                : "";
        return uncertainty + source.reading().words() + ": " + source.source();
    }

    /**
     * The list as JSON.
     *
     * @param entries in order
     * @return text
     */
    public static String listJson(List<MediumEntry> entries) {
        JsonPage json = new JsonPage();
        json.object(() -> json.array("media", entries, entry -> {
            json.text("name", entry.name());
            json.texts("aliases", entry.aliases());
            json.text("about", entry.about());
            json.text("phase", entry.phase().name().toLowerCase(Locale.ROOT));
            json.number("temperature_from_k", entry.temperatures().low());
            json.number("temperature_to_k", entry.temperatures().high());
            json.number("pressure_from_pa", entry.pressures().low());
            json.number("pressure_to_pa", entry.pressures().high());
            json.texts(
                    "needs",
                    entry.parameters().stream().map(p -> p.parameter().key()).toList());
            json.array("sources", entry.sources(), source -> {
                json.text("property", source.property());
                json.text("source", source.source());
                json.text("reading", source.reading().words());
                json.cell("relative_uncertainty", Cell.of(source.uncertainty(), "not stated by the source"));
            });
        }));
        return json.finish();
    }

    /**
     * The list as CSV.
     *
     * @param entries in order
     * @return text
     */
    public static String listCsv(List<MediumEntry> entries) {
        return TableCsv.ofTexts(
                List.of(
                        "name",
                        "phase",
                        "temperature_from_k",
                        "temperature_to_k",
                        "pressure_from_pa",
                        "pressure_to_pa"),
                entries.stream()
                        .map(entry -> List.of(
                                entry.name(),
                                entry.phase().name().toLowerCase(Locale.ROOT),
                                Figures.full(entry.temperatures().low()),
                                Figures.full(entry.temperatures().high()),
                                Figures.full(entry.pressures().low()),
                                Figures.full(entry.pressures().high())))
                        .toList());
    }

    /**
     * One medium for a terminal.
     *
     * @param medium at a state
     * @return text
     */
    public static String text(Medium medium) {
        TextPage page = new TextPage();
        page.line(medium.name() + ", " + medium.phase().name().toLowerCase(Locale.ROOT));
        page.row("temperature", Figures.of(medium.temperature() - 273.15, 5) + " degC");
        page.row("pressure", Figures.of(medium.pressure() / 1000.0, 6) + " kPa");
        page.row("density", Figures.of(medium.density(), 6) + " kg/m3");
        page.row("viscosity", Figures.of(medium.viscosity(), 5) + " Pa.s");
        page.row("kinematic viscosity", Figures.of(medium.kinematicViscosity(), 5) + " m2/s");
        page.row(
                "sound speed",
                medium.soundSpeed().isPresent()
                        ? Figures.of(medium.soundSpeed().getAsDouble(), 5) + " m/s"
                        : "not known");
        page.row(
                "mean free path",
                medium.meanFreePath().isPresent()
                        ? Figures.of(medium.meanFreePath().getAsDouble(), 4) + " m"
                        : "none");
        page.heading("Sources");
        medium.sources().forEach(source -> page.row(source.property(), provenance(source)));
        for (Caveat caveat : medium.caveats()) {
            page.note("[" + caveat.weight().words() + "]", caveat.text());
        }
        return page.toString();
    }

    /**
     * One medium as JSON.
     *
     * @param medium at a state
     * @return text
     */
    public static String json(Medium medium) {
        JsonPage json = new JsonPage();
        json.object(() -> {
            new MediumJson(json).write(medium);
            CaveatJson.write(json, medium.caveats());
        });
        return json.finish();
    }

    /**
     * One medium as CSV.
     *
     * @param medium at a state
     * @return text
     */
    public static String csv(Medium medium) {
        return TableCsv.ofTexts(
                List.of(
                        "name",
                        "temperature_k",
                        "pressure_pa",
                        "density_kg_m3",
                        "viscosity_pa_s",
                        "sound_speed_m_s",
                        "mean_free_path_m"),
                List.of(List.of(
                        medium.name(),
                        Figures.full(medium.temperature()),
                        Figures.full(medium.pressure()),
                        Figures.full(medium.density()),
                        Figures.full(medium.viscosity()),
                        medium.soundSpeed().isPresent()
                                ? Figures.full(medium.soundSpeed().getAsDouble())
                                : "",
                        medium.meanFreePath().isPresent()
                                ? Figures.full(medium.meanFreePath().getAsDouble())
                                : "")));
    }
}
