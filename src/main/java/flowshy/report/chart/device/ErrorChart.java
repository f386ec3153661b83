package flowshy.report.chart.device;

import flowshy.report.chart.Bounds;
import flowshy.report.chart.Chart;
import flowshy.report.chart.Columns;
import flowshy.report.chart.DrawnChart;
import flowshy.report.chart.paper.Ink;
import flowshy.report.chart.paper.Panel;
import flowshy.report.chart.paper.PlotSheet;
import flowshy.report.chart.paper.PlotSheet.Heading;
import flowshy.report.chart.paper.TickText;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.error.ErrorBudget;
import flowshy.verdict.error.ErrorBudget.DensityPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/** What the surroundings and the noise look like as acceleration, by frequency, and how their rms adds up over the band. */
final class ErrorChart {
    private static final String TITLE = "Error budget: what is read though the base is still";
    private static final int HEIGHT = 340;
    private static final double MOST_DECADES = 7.0;

    private ErrorChart() {}

    /** Empty where no surroundings are stated. */
    static Optional<Chart> of(String study, BandsAnswer answer) {
        return answer.error().map(budget -> drawn(study, answer, budget));
    }

    private static Chart drawn(String study, BandsAnswer answer, ErrorBudget budget) {
        Columns<DensityPoint> columns = new Columns<>(budget.points());
        List<Double> frequency = columns.add("frequency_hz", "frequency", "Hz", DensityPoint::frequency);
        List<List<Double>> sources = new ArrayList<>();
        for (int i = 0; i < budget.sources().size(); i++) {
            int source = i;
            sources.add(columns.add(
                    "source_" + (i + 1) + "_m_s2_per_rthz",
                    budget.sources().get(i).name(),
                    "m/s²/√Hz",
                    point -> FastMath.sqrt(point.sources().get(source))));
        }
        List<Double> noise =
                columns.add("noise_m_s2_per_rthz", "noise", "m/s²/√Hz", point -> FastMath.sqrt(point.noise()));
        List<Double> running =
                columns.add("running_rms_m_s2", "all sources up to here", "m/s² rms", DensityPoint::runningRms);
        List<Double> runningNoise =
                columns.add("running_noise_rms_m_s2", "noise up to here", "m/s² rms", DensityPoint::runningNoise);
        List<List<Double>> densities = new ArrayList<>(sources);
        densities.add(noise);
        Bounds ends = Bounds.decades(densities, MOST_DECADES);
        Panel above = Panel.decades("density as acceleration, m/s²/√Hz", ends.from(), ends.to(), 1);
        for (int i = 0; i < sources.size(); i++) {
            above.line(budget.sources().get(i).name(), Ink.alike(i), frequency, sources.get(i));
        }
        boolean noisy = budget.noise().isPresent();
        if (noisy) {
            above.line("noise of the device", Ink.NOISE, frequency, noise);
        }
        OptionalDouble limit = answer.acceptance().error();
        List<List<Double>> sums = new ArrayList<>(List.of(running, noisy ? runningNoise : List.of()));
        limit.ifPresent(value -> sums.add(List.of(value)));
        Bounds rms = Bounds.decades(sums, 5.0);
        Panel below = Panel.decades("rms from the lower end of the band up to here, m/s²", rms.from(), rms.to(), 1)
                .line("all sources together", Ink.FLOW, frequency, running);
        if (noisy) {
            below.line("noise of the device", Ink.NOISE, frequency, runningNoise);
        }
        limit.ifPresent(value -> below.level(value, "limit " + TickText.of(value, 4) + " m/s²", Ink.LIMIT));
        Bounds axis = Bounds.about(answer.band().from(), answer.band().to());
        PlotSheet sheet = PlotSheet.decades(new Heading(TITLE, study), "frequency, Hz", axis.from(), axis.to(), HEIGHT)
                .add(above)
                .add(below);
        List<String> without = new ArrayList<>();
        for (int i = 0; i < sources.size(); i++) {
            if (sources.get(i).stream().noneMatch(density -> density > 0.0)) {
                without.add(budget.sources().get(i).name());
            }
        }
        if (!without.isEmpty()) {
            sheet.remark("No density in this band: " + String.join(", ", without) + ".");
        }
        sheet.remark("A tone has no density: it shows as a step of the rms."
                + (budget.offset() == 0.0
                        ? ""
                        : " The offset of the mean streams, " + TickText.of(budget.offset(), 3)
                                + " m/s², is not in the rms."));
        return new DrawnChart("error-budget", TITLE, description(budget, limit), columns.table(), sheet);
    }

    private static String description(ErrorBudget budget, OptionalDouble limit) {
        StringBuilder text =
                new StringBuilder("Acceleration that would be read as much as the flow is, over the band of use: ");
        budget.sources()
                .forEach(source -> text.append(source.name())
                        .append(' ')
                        .append(TickText.of(source.rms(), 3))
                        .append(" m/s² rms, "));
        text.append("all together ").append(TickText.of(budget.rms(), 3)).append(" m/s² rms");
        budget.noise()
                .ifPresent(noise ->
                        text.append(", noise ").append(TickText.of(noise, 3)).append(" m/s² rms"));
        limit.ifPresent(
                value -> text.append(", limit ").append(TickText.of(value, 3)).append(" m/s² rms"));
        return text.append('.').toString();
    }
}
