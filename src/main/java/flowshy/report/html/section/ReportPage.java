package flowshy.report.html.section;

import flowshy.report.Version;
import flowshy.report.html.Html;
import flowshy.report.html.Page;
import java.util.List;

/** The report as one self-contained page. */
public final class ReportPage {
    /** Every section in the order of the page; a later capability adds its own with one line here. */
    static final List<ReportSection> SECTIONS = List.of(
            new DecisionSection(),
            new AskedSection(),
            new DeviceSection(),
            new MediumSection(),
            new BandsSection(),
            new EnvelopeSection(),
            new ToleranceSection(),
            new ResponseSection(),
            new FitSection(),
            new MeasuredSection(),
            new WhySection(),
            new SensitivitySection(),
            new ErrorSection(),
            new LidSection(),
            new VariantsSection(),
            new FurtherChartsSection(),
            new DefaultsSection(),
            new MemorySection(),
            new LimitsSection(),
            new DocumentSection(),
            new ReproduceSection(),
            new CautionsSection());

    private ReportPage() {}

    /**
     * The page.
     *
     * @param report what it tells
     * @return HTML that is well-formed XML; the same bytes for the same study
     */
    public static String of(StudyReport report) {
        return Page.of(report.title(), html -> body(html, report));
    }

    private static void body(Html html, StudyReport report) {
        List<ReportSection> asked =
                SECTIONS.stream().filter(section -> section.asked(report)).toList();
        html.tag("header").holds(() -> {
            html.tag("p").with("class", "kind").holds("Flowshy " + Version.number() + " · report");
            html.tag("h1").holds(() -> html.user(report.title()));
        });
        html.tag("main").holds(() -> {
            section(html, report, asked.get(0));
            html.tag("nav")
                    .with("aria-label", "Contents")
                    .holds(() -> html.tag("ul")
                            .holds(() -> asked.stream()
                                    .skip(1)
                                    .forEach(section -> html.tag("li")
                                            .holds(() -> html.tag("a")
                                                    .with("href", "#" + section.id())
                                                    .holds(section.heading())))));
            asked.stream().skip(1).forEach(section -> section(html, report, section));
        });
    }

    private static void section(Html html, StudyReport report, ReportSection section) {
        html.tag("section")
                .with("id", section.id())
                .with("aria-labelledby", section.id() + "-heading")
                .holds(() -> {
                    html.tag("h2").with("id", section.id() + "-heading").holds(section.heading());
                    section.write(html, report);
                });
    }
}
