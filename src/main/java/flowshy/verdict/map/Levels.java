package flowshy.verdict.map;

import flowshy.math.Figures;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.hipparchus.util.FastMath;

/** Round values between the least and the largest of a grid, for lines of equal value and for the steps of a scale of colours. */
public final class Levels {
    /** More than this from least to largest, all positive, and the levels go by decades. */
    private static final double WIDE = 30.0;

    private static final double[] ROUND = {1.0, 2.0, 5.0, 10.0};

    private Levels() {}

    /**
     * Round values of a grid.
     *
     * @param grid with numbers
     * @param most how many at most, more than two
     * @return rising, strictly between least and largest; empty where there is nothing between
     */
    public static List<Double> of(Grid grid, int most) {
        if (grid.least().isEmpty()) {
            return List.of();
        }
        double least = grid.spots().get(grid.least().getAsInt()).value();
        double largest = grid.spots().get(grid.largest().getAsInt()).value();
        if (!(largest - least > 1e-9 * FastMath.max(FastMath.abs(least), FastMath.abs(largest)))) {
            return List.of();
        }
        List<Double> levels = logarithmic(least, largest) ? decades(least, largest, most) : even(least, largest, most);
        return levels.stream().filter(level -> level > least && level < largest).toList();
    }

    /**
     * Whether numbers are better told apart by their logarithm.
     *
     * @param least of them
     * @param largest of them
     * @return true if all are positive and spread wide
     */
    public static boolean logarithmic(double least, double largest) {
        return least > 0.0 && largest > WIDE * least;
    }

    private static List<Double> even(double least, double largest, int most) {
        double rough = (largest - least) / most;
        double decade = FastMath.pow(10.0, FastMath.floor(FastMath.log10(rough)));
        double step = 10.0 * decade;
        for (double round : ROUND) {
            if (round * decade >= rough * (1.0 - 1e-9)) {
                step = round * decade;
                break;
            }
        }
        List<Double> levels = new ArrayList<>();
        for (long n = (long) FastMath.ceil(least / step); n * step <= largest; n++) {
            levels.add(Double.parseDouble(Figures.full(n * step)));
        }
        return levels;
    }

    private static List<Double> decades(double least, double largest, int most) {
        int first = (int) FastMath.floor(FastMath.log10(least));
        int last = (int) FastMath.ceil(FastMath.log10(largest));
        for (int[] steps : new int[][] {{1, 2, 5}, {1, 3}, {1}}) {
            TreeSet<Double> levels = new TreeSet<>();
            for (int decade = first; decade <= last; decade++) {
                for (int step : steps) {
                    double level = Double.parseDouble(step + "e" + decade);
                    if (level > least && level < largest) {
                        levels.add(level);
                    }
                }
            }
            if (levels.size() <= most) {
                return List.copyOf(levels);
            }
        }
        int stride = 1 + (last - first) / most;
        List<Double> levels = new ArrayList<>();
        for (int decade = first; decade <= last; decade += stride) {
            levels.add(Double.parseDouble("1e" + decade));
        }
        return levels;
    }
}
