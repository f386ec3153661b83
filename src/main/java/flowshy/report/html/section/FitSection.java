package flowshy.report.html.section;

import flowshy.report.FitReport;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.verdict.fit.Derived;
import flowshy.verdict.fit.FitAnswer;
import flowshy.verdict.fit.Residual;

/** The device that explains what was measured: the figures of the page are those of this device. */
final class FitSection implements ReportSection {
    @Override
    public String id() {
        return "fit";
    }

    @Override
    public String heading() {
        return "Fitted device";
    }

    @Override
    public boolean asked(StudyReport report) {
        return report.fit().isPresent();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        FitAnswer fit = report.fit().orElseThrow();
        words.paragraph(
                "The figures of this page are those of the fitted device, not of the study as it stands. Estimator: "
                        + fit.robustness().words() + ".");
        Tables.of(html, "Fitted numbers, SI, with 95 % intervals", FitReport.estimates(), fit.estimates())
                .named(
                        "key",
                        (page, estimate) -> page.text(
                                estimate.freed().key() + " [" + estimate.freed().unit() + "]"))
                .write();
        words.charts(id());
        words.facts("What follows from them", () -> {
            for (Derived derived : fit.derived()) {
                words.fact(derived.name(), () -> {
                    words.amount(derived.value(), derived.unit(), 5);
                    html.text(" (standard uncertainty ");
                    words.amount(derived.uncertainty(), derived.unit(), 2);
                    html.text(")");
                });
            }
            words.fact("degrees of freedom", String.valueOf(fit.freedom()));
            fit.chiSquare().ifPresent(square -> words.fact("chi-square", square, "", 4));
            fit.chance().ifPresent(chance -> words.fact("p of the fit", chance, "", 2));
            fit.core().chance().ifPresent(chance -> words.fact("p without outliers", chance, "", 2));
            words.fact(
                    "outliers",
                    fit.outliers().isEmpty()
                            ? "none"
                            : String.valueOf(fit.outliers().size()));
        });
        if (!fit.outliers().isEmpty()) {
            html.tag("ul")
                    .holds(() -> fit.outliers()
                            .forEach(outlier -> html.tag("li").holds(() -> outlier(html, words, outlier))));
        }
        fit.warnings().forEach(words::paragraph);
    }

    private static void outlier(Html html, Words words, Residual outlier) {
        html.user(outlier.name());
        html.text(", " + outlier.part().word() + " at ");
        words.amount(outlier.frequency(), "Hz", 5);
        html.text(": off by ");
        words.amount(outlier.share(), "", 3);
        html.text(" standard uncertainties");
    }
}
