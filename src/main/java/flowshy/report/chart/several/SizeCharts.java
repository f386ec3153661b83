package flowshy.report.chart.several;

import flowshy.report.chart.Chart;
import flowshy.verdict.BandsAnswer;
import java.util.List;

/** The chart of {@code size}: the rejection of the device as it stands and as it was sized. */
public final class SizeCharts {
    private static final String TITLE = "Rejection before and after sizing";

    private SizeCharts() {}

    /**
     * Every chart of a sizing.
     *
     * @param study title of the study
     * @param base what is found of the device as it stands
     * @param numbers the numbers chosen, in words, e.g. "hair.diameter 76.5 um"
     * @param sized what is found of the device with them
     * @return in the order of a report
     */
    public static List<Chart> of(String study, BandsAnswer base, String numbers, BandsAnswer sized) {
        SideBySide sides = new SideBySide();
        sides.add(SideBySide.BASE, base);
        sides.add(numbers, sized);
        return List.of(sides.chart("size-rejection", TITLE, study));
    }
}
