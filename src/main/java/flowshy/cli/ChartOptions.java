package flowshy.cli;

import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartFolder;
import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Option;

/** Where charts go. Nothing that draws is loaded unless they are asked for. */
final class ChartOptions {
    /** Stands for the files in a folder where a message must name something in it. */
    private static final String CHARTS = "*.svg";

    @Option(
            names = "--chart",
            paramLabel = "DIR",
            description =
                    "write charts into this folder: SVG, PNG and the table behind each as CSV; several studies get study-1,"
                            + " study-2, … in it")
    private Path folder;

    private final List<List<Chart>> charts = new ArrayList<>();

    /**
     * Whether charts are asked for.
     *
     * @return true if so
     */
    boolean asked() {
        return folder != null;
    }

    /**
     * Keeps the charts of one study.
     *
     * @param ofStudy in order
     */
    void add(List<Chart> ofStudy) {
        charts.add(ofStudy);
    }

    /**
     * Writes what was kept.
     *
     * @throws UserException if a folder cannot be written
     */
    void write() {
        for (int i = 0; asked() && i < charts.size(); i++) {
            Path target = charts.size() == 1 ? folder : folder.resolve("study-" + (i + 1));
            try {
                ChartFolder.write(target, charts.get(i));
            } catch (FileAlreadyExistsException e) {
                Path taken = Path.of(e.getFile());
                throw new UserException("cannot write " + taken + ": "
                        + (Files.isDirectory(taken) ? "it is a folder" : "it is a file, charts need a folder")
                        + "; nothing was left behind");
            } catch (IOException e) {
                throw new UserException(Failures.notWritten(target.resolve(CHARTS), e));
            }
        }
    }
}
