package flowshy.verdict.map;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Lines of equal value through a grid: marching squares (Lorensen &amp; Cline 1987 in the plane), joined to polylines.
 *
 * <p>Along the edges of a square the value is taken as linear in the grid's own spacing. A square whose corners alternate is a saddle of
 * its bilinear interpolant; which corners belong together is decided by the value at the saddle point, (ac − bd)/(a + c − b − d) with a, c
 * and b, d opposite (Nielson &amp; Hamann 1991, "The asymptotic decider"). Squares with a corner without a number are left out, and the lines
 * end there.
 */
public final class Contours {
    private static final int NONE = -1;

    private final Grid grid;
    private final double level;
    private final int across;
    private final int upright;
    private final int[] one;
    private final int[] other;

    /** A corner counts as above where its value is the level itself: then no line splits at a corner. */
    private boolean above(int i, int j) {
        return grid.at(i, j).value() >= level;
    }

    private Contours(Grid grid, double level) {
        this.grid = grid;
        this.level = level;
        this.across = grid.across().count();
        this.upright = grid.down().count() * (across - 1);
        int edges = upright + (grid.down().count() - 1) * across;
        this.one = new int[edges];
        this.other = new int[edges];
        Arrays.fill(one, NONE);
        Arrays.fill(other, NONE);
    }

    /**
     * A line of equal value.
     *
     * @param points in order, each place once; of a closed line the first is not repeated
     * @param closed whether it returns to its beginning
     */
    public record Line(List<Point> points, boolean closed) {
        /** Copies the list. */
        public Line {
            points = List.copyOf(points);
        }
    }

    /**
     * A point of a line.
     *
     * @param across in SI, as the grid's side
     * @param down in SI
     */
    public record Point(double across, double down) {}

    /**
     * All lines at a level.
     *
     * @param grid with the values
     * @param level the value
     * @return open lines first, each in the order of the grid
     */
    public static List<Line> of(Grid grid, double level) {
        Contours contours = new Contours(grid, level);
        for (int j = 0; j < grid.down().count() - 1; j++) {
            for (int i = 0; i < grid.across().count() - 1; i++) {
                contours.square(i, j);
            }
        }
        return contours.lines();
    }

    /** Edge from (i, j) to (i + 1, j). */
    private int level(int i, int j) {
        return j * (across - 1) + i;
    }

    /** Edge from (i, j) to (i, j + 1). */
    private int upright(int i, int j) {
        return upright + j * across + i;
    }

    private void square(int i, int j) {
        double a = grid.at(i, j).value();
        double b = grid.at(i + 1, j).value();
        double c = grid.at(i + 1, j + 1).value();
        double d = grid.at(i, j + 1).value();
        if (Double.isNaN(a + b + c + d)) {
            return;
        }
        int ab = level(i, j);
        int dc = level(i, j + 1);
        int ad = upright(i, j);
        int bc = upright(i + 1, j);
        int above = (above(i, j) ? 1 : 0)
                + (above(i + 1, j) ? 2 : 0)
                + (above(i + 1, j + 1) ? 4 : 0)
                + (above(i, j + 1) ? 8 : 0);
        switch (above) {
            case 1, 14 -> join(ab, ad);
            case 2, 13 -> join(ab, bc);
            case 4, 11 -> join(bc, dc);
            case 7, 8 -> join(ad, dc);
            case 3, 12 -> join(ad, bc);
            case 6, 9 -> join(ab, dc);
            case 5, 10 -> {
                boolean high = (a * c - b * d) / (a + c - b - d) >= level;
                if (high == (above == 5)) { // a and c belong together: the lines cut off b and d
                    join(ab, bc);
                    join(ad, dc);
                } else {
                    join(ab, ad);
                    join(bc, dc);
                }
            }
            default -> {} // all corners on one side
        }
    }

    private void join(int edge, int next) {
        link(edge, next);
        link(next, edge);
    }

    private void link(int edge, int next) {
        if (one[edge] == NONE) {
            one[edge] = next;
        } else {
            other[edge] = next;
        }
    }

    private List<Line> lines() {
        List<Line> lines = new ArrayList<>();
        boolean[] done = new boolean[one.length];
        for (int edge = 0; edge < one.length; edge++) {
            if (one[edge] != NONE && other[edge] == NONE && !done[edge]) {
                add(lines, walk(edge, done), false);
            }
        }
        for (int edge = 0; edge < one.length; edge++) {
            if (one[edge] != NONE && !done[edge]) {
                add(lines, walk(edge, done), true);
            }
        }
        return lines;
    }

    private List<Point> walk(int start, boolean[] done) {
        List<Point> points = new ArrayList<>();
        int at = start;
        while (at != NONE) {
            done[at] = true;
            Point point = point(at);
            if (points.isEmpty()
                    || !points.get(points.size() - 1).equals(point)) { // a line through a corner meets two edges there
                points.add(point);
            }
            at = one[at] != NONE && !done[one[at]] ? one[at] : other[at] != NONE && !done[other[at]] ? other[at] : NONE;
        }
        return points;
    }

    private static void add(List<Line> lines, List<Point> points, boolean closed) {
        if (closed && points.size() > 1 && points.get(0).equals(points.get(points.size() - 1))) {
            points.remove(points.size() - 1);
        }
        if (points.size() > 1) { // the level touched at one corner is no line
            lines.add(new Line(points, closed));
        }
    }

    private Point point(int edge) {
        boolean standing = edge >= upright;
        int i = standing ? (edge - upright) % across : edge % (across - 1);
        int j = standing ? (edge - upright) / across : edge / (across - 1);
        double here = grid.at(i, j).value();
        double there = standing ? grid.at(i, j + 1).value() : grid.at(i + 1, j).value();
        double share = (level - here) / (there - here);
        return new Point(grid.across().at(standing ? i : i + share), grid.down().at(standing ? j + share : j));
    }
}
