package flowshy.cli;

import flowshy.report.chart.Chart;
import flowshy.report.chart.ChartFolder;
import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import picocli.CommandLine.Option;

/** Where charts go. Nothing that draws is loaded unless they are asked for. */
final class ChartOptions {
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
            } catch (IOException e) {
                throw new UserException(
                        "cannot write charts into " + target + ": " + why(e) + "; nothing was left behind");
            }
        }
    }

    private static String why(IOException failure) {
        if (failure instanceof AccessDeniedException) {
            return "writing there is not allowed";
        }
        if (failure instanceof FileAlreadyExistsException taken) {
            return taken.getFile() + " is a " + (Files.isDirectory(Path.of(taken.getFile())) ? "folder" : "file");
        }
        return failure instanceof FileSystemException system && system.getReason() != null
                ? system.getReason().toLowerCase(Locale.ROOT)
                : String.valueOf(failure.getMessage());
    }
}
