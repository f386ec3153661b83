package flowshy.report.html.section;

import flowshy.report.MeasuredReport;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.verdict.measured.Compared;
import flowshy.verdict.measured.Measurand;
import org.hipparchus.util.FastMath;

/** What was measured on the device, beside the model. */
final class MeasuredSection implements ReportSection {
    @Override
    public String id() {
        return "measured";
    }

    @Override
    public String heading() {
        return "Measured beside the model";
    }

    @Override
    public boolean asked(StudyReport report) {
        return !report.measured().isEmpty();
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        words.paragraph(
                "Measured over model, by third-octaves; allowed is what the uncertainties of measurement and medium together"
                        + " explain. Points over the charts reach two standard uncertainties to either side. "
                        + (report.fit().isPresent()
                                ? "The model is that of the fitted device."
                                : "Nothing is fitted but one common factor where the gain of the readout is not known."));
        for (Compared response : report.measured()) {
            html.tag("h3").holds(() -> html.user(response.measured().name()));
            html.tag("p").holds(() -> {
                words.sentence(
                        response.measured().of() == Measurand.REJECTION
                                ? "Response to motion over that to flow. "
                                : "Response to " + response.measured().of().word() + ". Gain of the readout "
                                        + (response.freed() ? "taken out" : "as stated or fitted") + ": ");
                if (response.measured().of() != Measurand.REJECTION) {
                    words.amount(
                            FastMath.abs(response.gain()),
                            response.measured().reading().volts() ? "V/rad" : "",
                            4);
                    html.text(response.gain() < 0.0 ? ", sense turned round. " : ". ");
                }
                words.sentence(response.agreement().sentence());
            });
            Tables.of(html, "Deviation by third-octaves", MeasuredReport.printed(response), response.bands())
                    .marked(band -> !band.agrees())
                    .write();
        }
    }
}
