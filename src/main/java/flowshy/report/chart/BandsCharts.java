package flowshy.report.chart;

import flowshy.study.Study;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.curve.DeviceCurve;
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
        return charts;
    }
}
