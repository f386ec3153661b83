package flowshy.report;

import flowshy.cylinder.excursion.Regime;
import flowshy.math.Figures;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.error.ErrorBudget.ThirdOctaveLevel;
import flowshy.verdict.error.SourceError;
import java.util.List;

/** The error budget as a part of an answer: text and JSON from one set of columns. */
public final class ErrorReport {
    private static final String NO_FLOW = "no flow acts in this band";
    private static final String NO_SUSPENSION = "no suspension is stated that holds the hair";
    private static final String NO_FULL_SCALE = "motion.full-scale is not stated";

    private ErrorReport() {}

    /**
     * What each source adds, column by column.
     *
     * @return columns in the order printed
     */
    public static List<Column<SourceError>> sources() {
        return List.of(
                new Column<>("rms_m_s2", "error", "m/s2 rms", 3, source -> Cell.of(source.rms(), "")),
                new Column<>("offset_m_s2", "offset", "m/s2", 3, source -> Cell.of(source.offset(), "")),
                new Column<>("share_percent", "share", "%", 3, source -> Cell.of(100.0 * source.share(), "")),
                new Column<>(
                        "worst_third_octave_hz", "most at", "Hz", 4, source -> Cell.of(source.worstBand(), NO_FLOW)),
                new Column<>(
                        "cut_off_hz",
                        "cut-off",
                        "Hz",
                        3,
                        source -> Cell.of(source.cutOff(), "only a stream that carries turbulence has one")));
    }

    /**
     * Signal against error by third-octave.
     *
     * @return columns in the order printed
     */
    public static List<Column<ThirdOctaveLevel>> levels() {
        return List.of(
                new Column<>("frequency_hz", "freq.", "Hz", 5, level -> Cell.of(level.middle(), "")),
                new Column<>("signal_m_s2", "motion", "m/s2 rms", 3, level -> Cell.of(level.signal(), "")),
                new Column<>("error_m_s2", "error", "m/s2 rms", 3, level -> Cell.of(level.error(), "")),
                new Column<>("ratio_db", "ratio", "dB", 4, level -> Cell.of(level.ratio(), NO_FLOW)));
    }

    /**
     * Prints the budget.
     *
     * @param page to print on
     * @param budget the figures
     * @param spectrum whether the motion's own spectrum is used; else a sine of its smallest in each third-octave
     */
    static void print(TextPage page, ErrorBudget budget, boolean spectrum) {
        page.heading("Error by the surroundings, over the band of use");
        page.namedTable(
                "source",
                budget.sources().stream()
                        .map(source -> source.name() + " (" + source.kind() + ")")
                        .toList(),
                sources(),
                budget.sources());
        for (SourceError source : budget.sources()) {
            page.note(source.name() + ":", place(source));
            for (SourceError.Assumed assumed : source.assumed()) {
                page.note(
                        source.name() + ":",
                        assumed.key() + " taken as " + Figures.of(assumed.value(), 3) + " in SI (" + assumed.source()
                                + "); half of it makes the error " + Figures.of(assumed.half(), 3) + ", twice "
                                + Figures.of(assumed.twice(), 3) + " m/s2.");
            }
        }
        page.row("all sources", Figures.of(budget.rms(), 4) + " m/s2 rms, as if uncorrelated");
        page.row(
                "offset",
                Figures.of(budget.offset(), 4) + " m/s2"
                        + (budget.offsetOfFullScale().isPresent()
                                ? ", "
                                        + Figures.of(
                                                100.0
                                                        * budget.offsetOfFullScale()
                                                                .getAsDouble(),
                                                3) + " % of full scale"
                                : "")
                        + (budget.staticTilt().isPresent()
                                ? ", a tilt of "
                                        + Figures.of(1e3 * budget.staticTilt().getAsDouble(), 3) + " mrad"
                                : ""));
        if (budget.noise().isPresent()) {
            double noise = budget.noise().getAsDouble();
            page.row(
                    "thermal and readout noise",
                    Figures.of(noise, 4) + " m/s2 rms: " + (noise > budget.rms() ? "noise" : "flow")
                            + " is the nearer limit");
        }
        page.row(
                "smallest readable motion",
                Figures.of(budget.smallestReadable(), 4)
                        + " m/s2 rms, where it equals noise and flow error together (common practice)");
        if (budget.dynamicRange().isPresent()) {
            page.row("dynamic range", Figures.of(budget.dynamicRange().getAsDouble(), 4) + " dB up to full scale");
        }
        if (budget.deflection().isPresent()) {
            double share = budget.deflection().getAsDouble();
            page.row(
                    "offset and 3 sigma",
                    Figures.of(100.0 * share, 3) + " % of full scale" + (share > 1.0 ? ": saturates" : ""));
        }
        if (!budget.bands().isEmpty()) {
            page.heading("Bands on the spectra");
            page.paragraph(
                    spectrum
                            ? "The motion's own spectrum against the error, third-octave by third-octave."
                            : "A sine of the smallest motion in each third-octave against the error there: no spectrum of the motion is"
                                    + " stated.");
            for (ReadingBand band : budget.bands()) {
                page.line(String.format(
                        "  %-10s %10s Hz to %10s Hz",
                        band.reads().word(), Figures.of(band.from(), 6), Figures.of(band.to(), 6)));
            }
            page.table(levels(), budget.thirdOctaves(), level -> false);
        }
    }

    private static String place(SourceError source) {
        if (source.rms() == 0.0 && source.offset() == 0.0) {
            return "adds nothing.";
        }
        Regime regime = source.regime();
        return "torque arises about " + Figures.of(1e6 * source.height(), 3) + " um above the wall; there Re "
                + Figures.of(regime.reynolds(), 2) + ", Wo " + Figures.of(regime.womersley(), 2) + ", KC "
                + Figures.of(regime.keuleganCarpenter(), 2) + ", beta " + Figures.of(regime.stokesBeta(), 2) + ", X "
                + Figures.of(regime.excursionRatio(), 2) + ", regime "
                + regime.kind().words() + ".";
    }

    /**
     * Writes the field {@code error}.
     *
     * @param json with an open object
     * @param budget the figures
     */
    static void write(JsonPage json, ErrorBudget budget) {
        json.object("error", () -> {
            json.array("sources", budget.sources(), source -> source(json, source));
            json.number("rms_m_s2", budget.rms());
            json.number("offset_m_s2", budget.offset());
            json.cell("offset_of_full_scale", Cell.of(budget.offsetOfFullScale(), NO_FULL_SCALE));
            json.cell("static_tilt_rad", Cell.of(budget.staticTilt(), NO_SUSPENSION));
            json.cell("noise_rms_m_s2", Cell.of(budget.noise(), NO_SUSPENSION));
            json.number("smallest_readable_m_s2", budget.smallestReadable());
            json.cell("dynamic_range_db", Cell.of(budget.dynamicRange(), NO_FULL_SCALE));
            json.cell("deflection_of_full_scale", Cell.of(budget.deflection(), NO_FULL_SCALE));
            json.array(
                    "third_octaves",
                    budget.thirdOctaves(),
                    level -> levels().forEach(column ->
                            json.cell(column.name(), column.cell().apply(level))));
            json.array("bands", budget.bands(), band -> {
                json.number("from_hz", band.from());
                json.number("to_hz", band.to());
                json.text("reads", band.reads().word());
            });
        });
    }

    private static void source(JsonPage json, SourceError source) {
        json.text("name", source.name());
        json.text("kind", source.kind());
        sources().forEach(column -> json.cell(column.name(), column.cell().apply(source)));
        json.number("height_m", source.height());
        json.number("reynolds", source.regime().reynolds());
        json.number("womersley", source.regime().womersley());
        json.number("keulegan_carpenter", source.regime().keuleganCarpenter());
        json.number("excursion_ratio", source.regime().excursionRatio());
        json.text("regime", source.regime().kind().words());
        json.array("assumed", source.assumed(), assumed -> {
            json.text("key", assumed.key());
            json.number("value", assumed.value());
            json.text("source", assumed.source());
            json.number("rms_at_half_m_s2", assumed.half());
            json.number("rms_at_twice_m_s2", assumed.twice());
        });
    }
}
