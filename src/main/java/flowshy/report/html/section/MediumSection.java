package flowshy.report.html.section;

import flowshy.math.Caveat.Subject;
import flowshy.medium.Medium;
import flowshy.medium.PropertySource;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.report.html.Typography;
import java.util.EnumSet;
import java.util.Optional;

/** Gas or liquid with the source and uncertainty of every property. */
final class MediumSection implements ReportSection {
    private static final double ZERO_CELSIUS = 273.15;

    @Override
    public String id() {
        return "medium";
    }

    @Override
    public String heading() {
        return "Medium";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        Medium around = report.answer().device().around();
        Medium outside = report.answer().device().outside();
        boolean one = around.equals(outside);
        medium(html, words, around, one ? "Around the hair: " : "Under the cover, around the hair: ");
        if (!one) {
            medium(html, words, outside, "Outside the cover: ");
        }
        words.caveats(EnumSet.of(Subject.MEDIUM));
    }

    private static void medium(Html html, Words words, Medium medium, String where) {
        html.tag("h3").holds(() -> {
            html.text(where);
            html.user(medium.name());
        });
        words.facts("State", () -> {
            words.fact("temperature", medium.temperature() - ZERO_CELSIUS, "degC", 4);
            words.fact("pressure", medium.pressure(), "Pa", 6);
        });
        Tables.scrolled(
                html,
                "Properties and where they come from",
                () -> html.tag("table").with("class", "texts").holds(() -> {
                    html.tag("caption", "Properties and where they come from");
                    words.head("property", "value", "uncertainty", "known", "source");
                    html.tag("tbody").holds(() -> {
                        row(html, words, medium, "density", medium.density(), "kg/m3", 6);
                        row(html, words, medium, "viscosity", medium.viscosity(), "Pa.s", 5);
                        if (medium.soundSpeed().isPresent()) {
                            row(
                                    html,
                                    words,
                                    medium,
                                    "sound speed",
                                    medium.soundSpeed().getAsDouble(),
                                    "m/s",
                                    5);
                        }
                        derived(html, words, "kinematic viscosity", medium.kinematicViscosity(), "m2/s");
                        medium.meanFreePath().ifPresent(path -> derived(html, words, "mean free path", path, "m"));
                    });
                }));
    }

    private static void row(
            Html html, Words words, Medium medium, String property, double value, String unit, int digits) {
        Optional<PropertySource> source = medium.sources().stream()
                .filter(entry -> entry.property().equals(property))
                .findFirst();
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").holds(property);
            html.tag("td").holds(() -> words.amount(value, unit, digits));
            html.tag("td")
                    .holds(() -> source.map(PropertySource::uncertainty)
                            .filter(stated -> stated.isPresent())
                            .ifPresentOrElse(
                                    stated -> words.amount(100.0 * stated.getAsDouble(), "%", 2),
                                    () -> html.text("not stated")));
            html.tag("td").holds(source.map(entry -> entry.reading().words()).orElse("given in the study"));
            html.tag("td")
                    .holds(() -> html.user(
                            Typography.set(source.map(PropertySource::source).orElse(""))));
        });
    }

    private static void derived(Html html, Words words, String property, double value, String unit) {
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").holds(property);
            html.tag("td").holds(() -> words.amount(value, unit, 5));
            html.tag("td").holds("");
            html.tag("td").holds("derived");
            html.tag("td").holds("from the properties above");
        });
    }
}
