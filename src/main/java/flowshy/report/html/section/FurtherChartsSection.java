package flowshy.report.html.section;

import flowshy.report.chart.Chart;
import flowshy.report.chart.several.ToleranceCharts;
import flowshy.report.html.Html;
import java.util.Map;

/** Where each chart stands; the ones that no section takes stand here, so that none is lost. */
final class FurtherChartsSection implements ReportSection {
    private static final String HERE = "charts";

    /** The section that a chart belongs to, by the chart's name. */
    private static final Map<String, String> HOMES = Map.ofEntries(
            Map.entry("rejection", "decision"),
            Map.entry("device", "device"),
            Map.entry("response", "response"),
            Map.entry("torques", "response"),
            Map.entry("error-budget", "error"),
            Map.entry("flow-profile", "error"),
            Map.entry("regime", "device"),
            Map.entry("sensitivities", "sensitivities"),
            Map.entry("fit-residuals", "fit"),
            Map.entry("covers", "covers"),
            Map.entry("covers-rejection", "covers"),
            Map.entry("attenuation", "covers"),
            Map.entry("compare-rejection", "variants"));

    @Override
    public String id() {
        return HERE;
    }

    @Override
    public String heading() {
        return "Further charts";
    }

    @Override
    public boolean asked(StudyReport report) {
        return report.charts().stream().anyMatch(chart -> home(chart).equals(HERE));
    }

    @Override
    public void write(Html html, StudyReport report) {
        new Words(html, report).charts(HERE);
    }

    static String home(Chart chart) {
        return ToleranceCharts.named(chart.name()) ? "tolerance" : HOMES.getOrDefault(chart.name(), HERE);
    }
}
