package flowshy.report.chart;

import flowshy.report.ChartTables;
import flowshy.report.WholeFile;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A folder of charts: each as SVG, PNG at 300 dpi and the table behind it as CSV. All files are written, or none. */
public final class ChartFolder {
    /** Of the PNG files: that of print. */
    public static final int DPI = 300;

    private ChartFolder() {}

    /**
     * Writes charts; files of the same names are replaced, others are left alone.
     *
     * @param folder made if it is not there
     * @param charts in any order, of different names
     * @throws IOException if a file cannot be written; nothing is left behind then
     */
    public static void write(Path folder, List<Chart> charts) throws IOException {
        Map<Path, byte[]> files = new LinkedHashMap<>();
        for (Chart chart : charts) {
            files.put(
                    folder.resolve(chart.name() + ".svg"),
                    ("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n" + chart.svg(chart.name() + "-"))
                            .getBytes(StandardCharsets.UTF_8));
            files.put(folder.resolve(chart.name() + ".png"), chart.png(DPI));
            files.put(
                    folder.resolve(chart.name() + ".csv"),
                    ChartTables.csv(chart.table()).getBytes(StandardCharsets.UTF_8));
        }
        WholeFile.writeAll(folder, files);
    }
}
