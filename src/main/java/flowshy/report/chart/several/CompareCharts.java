package flowshy.report.chart.several;

import flowshy.report.chart.Chart;
import flowshy.verdict.compare.ComparedDevice;
import java.util.List;

/** The chart of {@code compare}: the rejection of every device by frequency. */
public final class CompareCharts {
    private static final String TITLE = "Rejection of devices side by side";

    private CompareCharts() {}

    /**
     * Every chart that the answer has numbers for.
     *
     * @param study title of the first study
     * @param devices what was found, each with the name it is called by
     * @return in the order of a report; empty if no device has a solution
     */
    public static List<Chart> of(String study, List<ComparedDevice> devices) {
        SideBySide sides = new SideBySide();
        for (ComparedDevice device : devices) {
            device.answer().ifPresent(answer -> sides.add(name(device), answer));
        }
        return sides.empty() ? List.of() : List.of(sides.chart("compare-rejection", TITLE, study));
    }

    private static String name(ComparedDevice device) {
        return device.contender().changes().isEmpty()
                ? SideBySide.BASE
                : device.contender().name();
    }
}
