package flowshy.report.html.section;

import flowshy.math.Caveat.Subject;
import flowshy.report.Cell;
import flowshy.report.Column;
import flowshy.report.ErrorReport;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.error.SourceError;
import java.util.EnumSet;
import java.util.List;

/** What the surroundings add to the reading. */
final class ErrorSection implements ReportSection {
    @Override
    public String id() {
        return "error";
    }

    @Override
    public String heading() {
        return "Error budget";
    }

    @Override
    public boolean asked(StudyReport report) {
        return report.answer().error().isPresent();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        ErrorBudget budget = report.answer().error().orElseThrow();
        words.paragraph("Flow of the surroundings as equivalent acceleration, over the band of use.");
        words.charts(id());
        Tables.of(html, "Sources", ErrorReport.sources(), budget.sources())
                .named("source", ErrorSection::name)
                .write();
        Tables.of(html, "Where the torque of each source arises, and its regime there", regimes(), budget.sources())
                .named("source", (page, source) -> {
                    name(page, source);
                    page.text(", " + source.regime().kind().words());
                })
                .write();
        words.facts("All sources together", () -> sum(html, words, budget));
        words.caveats(EnumSet.of(Subject.ERROR));
        if (!budget.bands().isEmpty()) {
            spectra(html, words, report, budget);
        }
    }

    private static void name(Html html, SourceError source) {
        html.user(source.name());
        html.text(" (" + source.kind() + ")");
    }

    private static List<Column<SourceError>> regimes() {
        return List.of(
                new Column<>("height_m", "height", "m", 3, source -> Cell.of(source.height(), "it adds nothing")),
                new Column<>(
                        "Re", "Re", "", 2, source -> Cell.of(source.regime().reynolds(), "")),
                new Column<>(
                        "Wo", "Wo", "", 2, source -> Cell.of(source.regime().womersley(), "")),
                new Column<>(
                        "KC", "KC", "", 2, source -> Cell.of(source.regime().keuleganCarpenter(), "")),
                new Column<>(
                        "β", "beta", "", 2, source -> Cell.of(source.regime().stokesBeta(), "")),
                new Column<>("X", "X", "", 2, source -> Cell.of(source.regime().excursionRatio(), "")));
    }

    private static void sum(Html html, Words words, ErrorBudget budget) {
        words.fact("error, as if uncorrelated", budget.rms(), "m/s2 rms", 4);
        words.fact("offset by mean streams", () -> {
            words.amount(budget.offset(), "m/s2", 4);
            budget.offsetOfFullScale().ifPresent(share -> {
                html.text(", ");
                words.amount(100.0 * share, "%", 3);
                html.text(" of full scale");
            });
            budget.staticTilt().ifPresent(tilt -> {
                html.text(", a tilt of ");
                words.amount(tilt, "rad", 3);
            });
        });
        budget.noise()
                .ifPresent(noise -> words.fact("thermal and readout noise", () -> {
                    words.amount(noise, "m/s2 rms", 4);
                    html.text(noise > budget.rms() ? ": noise is the nearer limit" : ": flow is the nearer limit");
                }));
        words.fact("smallest readable motion", () -> {
            words.amount(budget.smallestReadable(), "m/s2 rms", 4);
            html.text(", where it equals noise and flow error together (common practice)");
        });
        budget.dynamicRange().ifPresent(range -> words.fact("dynamic range up to full scale", range, "dB", 4));
        budget.deflection()
                .ifPresent(share -> words.fact("offset and three standard deviations", () -> {
                    words.amount(100.0 * share, "%", 3);
                    html.text(share > 1.0 ? " of full scale: saturates" : " of full scale");
                }));
    }

    private static void spectra(Html html, Words words, StudyReport report, ErrorBudget budget) {
        html.tag("h3", "Bands on the spectra");
        words.paragraph(
                report.study().motion().spectrum().isPresent()
                        ? "The motion's own spectrum against the error, third-octave by third-octave."
                        : "A sine of the smallest motion in each third-octave against the error there: no spectrum of the motion is"
                                + " stated.");
        BandsSection.bands(html, words, "Bands on the spectra", budget.bands());
        Tables.of(html, "Signal and error by third-octave", ErrorReport.levels(), budget.thirdOctaves())
                .write();
    }
}
