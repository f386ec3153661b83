package flowshy.report.chart.device;

import flowshy.report.chart.Chart;
import flowshy.report.chart.Overlay;
import flowshy.study.Study;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.curve.DeviceCurve;
import flowshy.verdict.error.FlowOverHair;
import flowshy.verdict.error.RegimePath;
import java.util.ArrayList;
import java.util.List;

/** The charts of an answer of {@code bands}. */
public final class BandsCharts {
    private BandsCharts() {}

    /**
     * Every chart that the answer has numbers for.
     *
     * @param study what was asked
     * @param answer what was found
     * @return in the order of a report
     */
    public static List<Chart> of(Study study, BandsAnswer answer) {
        return of(study, answer, List.of());
    }

    /**
     * Every chart, with measured points over those of rejection and response.
     *
     * @param study what was asked
     * @param answer what was found
     * @param overlays measured points, in the order of the key
     * @return in the order of a report
     */
    public static List<Chart> of(Study study, BandsAnswer answer, List<Overlay> overlays) {
        DeviceCurve curve = DeviceCurve.of(answer);
        List<Chart> charts = new ArrayList<>();
        charts.add(RejectionChart.of(
                study.title(),
                answer,
                curve,
                overlays.stream()
                        .filter(overlay -> overlay.of() == Overlay.Of.REJECTION)
                        .toList()));
        ResponseChart.of(study.title(), answer, curve, overlays).ifPresent(charts::add);
        charts.add(TorqueChart.of(study.title(), answer, curve));
        ErrorChart.of(study.title(), answer).ifPresent(charts::add);
        charts.add(DeviceChart.of(study.title(), answer));
        List<RegimePath> paths = RegimePath.of(answer.device(), answer.band(), study.surroundings());
        if (!paths.isEmpty()) {
            charts.add(RegimeChart.of(
                    study.title(), answer, paths, !study.surroundings().isEmpty()));
        }
        if (!study.surroundings().isEmpty()) {
            charts.add(FlowChart.of(study.title(), answer, FlowOverHair.of(answer.device(), study.surroundings())));
        }
        return charts;
    }
}
