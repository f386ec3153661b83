package flowshy.cli;

import flowshy.math.Figures;
import flowshy.verdict.map.GridRun;
import java.io.PrintWriter;

/** Tells how far a run is: nothing at all where it is soon done. */
final class ProgressLine implements GridRun.Progress {
    private static final long SILENT_NS = 2_000_000_000L;
    private static final double TENTH = 0.1;

    private final PrintWriter err;
    private final boolean terminal;
    private final long start = System.nanoTime();
    private double next = TENTH;
    private boolean written;

    ProgressLine(PrintWriter err, boolean terminal) {
        this.err = err;
        this.terminal = terminal;
    }

    @Override
    public void at(double done, double left) {
        if (System.nanoTime() - start < SILENT_NS) {
            return;
        }
        if (terminal) {
            err.print("\r" + text(done, left) + "   ");
            err.flush();
            written = true;
        } else if (done >= next) {
            err.println(text(done, left));
            next = TENTH * (1.0 + Math.floor(done / TENTH + 1e-9));
        }
    }

    @Override
    public void end() {
        if (written) {
            err.print("\r" + " ".repeat(60) + "\r");
            err.flush();
        }
    }

    private static String text(double done, double left) {
        String share = Figures.of(100.0 * done, done < 0.1 ? 2 : 3) + " % done";
        if (!Double.isFinite(left)) {
            return share;
        }
        return share + ", about " + (left < 90.0 ? Figures.of(left, 2) + " s" : minutes(left)) + " left";
    }

    private static String minutes(double seconds) {
        return seconds < 5400.0 ? Figures.of(seconds / 60.0, 2) + " min" : Figures.of(seconds / 3600.0, 2) + " h";
    }
}
