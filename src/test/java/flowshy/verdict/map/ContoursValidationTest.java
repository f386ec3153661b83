package flowshy.verdict.map;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.verdict.map.Contours.Line;
import flowshy.verdict.map.Contours.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleBinaryOperator;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Lines of equal value against fields whose lines are known in closed form. */
class ContoursValidationTest {
    private static Grid grid(DoubleBinaryOperator field, Axis across, Axis down) {
        return new GridRun(1, GridRun.Progress.NONE).fill(y -> x -> spot(field.applyAsDouble(x, y)), across, down);
    }

    private static Spot spot(double value) {
        return Double.isNaN(value) ? Spot.none("left out") : Spot.of(value);
    }

    private static Axis side(double from, double to, int count) {
        return new Axis("side", from, to, count, false);
    }

    private static double error(Line circle, double radius) {
        double worst = 0.0;
        for (Point point : circle.points()) {
            double error = FastMath.abs(FastMath.hypot(point.across(), point.down()) - radius);
            worst = FastMath.max(worst, error);
        }
        return worst;
    }

    /** Shoelace formula. */
    private static double area(Line line) {
        double twice = 0.0;
        for (int k = 0; k < line.points().size(); k++) {
            Point here = line.points().get(k);
            Point next = line.points().get((k + 1) % line.points().size());
            twice += here.across() * next.down() - next.across() * here.down();
        }
        return 0.5 * FastMath.abs(twice);
    }

    /**
     * x² + y² = r². Along an edge of length h a parabola of curvature 2 lies at most h²/4 off its chord, so a point at most h²/(8r) off the
     * circle, to first order; a chord of the circle of length √2 h takes another h²/(4r) off, which the area shows.
     */
    @Test
    void aCircleIsOneClosedLineToSecondOrder() {
        double radius = 0.7;
        double last = Double.NaN;
        for (int count : new int[] {21, 41, 81, 161}) {
            Grid grid = grid((x, y) -> x * x + y * y, side(-1.0, 1.03, count), side(-1.01, 1.0, count));
            List<Line> lines = Contours.of(grid, radius * radius);
            assertThat(lines).hasSize(1);
            assertThat(lines.get(0).closed()).isTrue();
            double step = 2.03 / (count - 1);
            double error = error(lines.get(0), radius);
            assertThat(error).isPositive().isLessThan(1.05 * step * step / (8.0 * radius));
            assertThat(area(lines.get(0)))
                    .isCloseTo(FastMath.PI * radius * radius, within(2.0 * FastMath.PI * 0.375 * step * step));
            if (Double.isFinite(last)) {
                assertThat(last / error).isBetween(3.0, 5.4); // halved steps: a quarter of the error
            }
            last = error;
        }
    }

    @Test
    void twoHillsGiveTwoLinesAndOneAboveTheirPass() {
        // Cassini's ovals: two for b < a, one round both for b > a
        DoubleBinaryOperator field = (x, y) -> FastMath.hypot(x - 0.5, y) * FastMath.hypot(x + 0.5, y);
        Grid grid = grid(field, side(-1.1, 1.1, 61), side(-0.81, 0.8, 50));
        assertThat(Contours.of(grid, 0.2)).hasSize(2).allMatch(Line::closed);
        assertThat(Contours.of(grid, 0.3)).hasSize(1).allMatch(Line::closed);
    }

    /**
     * (x − p)(y − q) = c is linear along every edge, so each point lies on the hyperbola to rounding; and each branch stays on its side of the
     * saddle, also where the branches pass through one and the same square.
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.004, -0.004, 0.0001, -0.0001, 0.03, -0.03, 0.2})
    void branchesOfAHyperbolaNeverMeet(double level) {
        double p = 0.06; // off the middle of its square: the mean of the corners is not the value at the saddle
        double q = -0.08;
        Grid grid = grid((x, y) -> (x - p) * (y - q), side(-1.05, 1.05, 8), side(-1.05, 1.05, 8));
        List<Line> lines = Contours.of(grid, level);
        assertThat(lines).hasSize(2).noneMatch(Line::closed);
        for (Line line : lines) {
            double across = FastMath.signum(line.points().get(0).across() - p);
            for (Point point : line.points()) {
                assertThat((point.across() - p) * (point.down() - q)).isCloseTo(level, within(1e-14));
                assertThat(FastMath.signum(point.across() - p)).isEqualTo(across);
            }
        }
    }

    @Test
    void aLevelThatIsTheValueOfCornersGivesOneLineAndNoSplit() {
        Grid grid = grid((x, y) -> x, side(-2.0, 2.0, 5), side(0.0, 1.0, 3));
        List<Line> lines = Contours.of(grid, 1.0);
        assertThat(lines).hasSize(1);
        assertThat(lines.get(0).points())
                .containsExactly(new Point(1.0, 0.0), new Point(1.0, 0.5), new Point(1.0, 1.0));
    }

    @Test
    void aTopThatTouchesTheLevelIsNoLine() {
        Grid grid = grid((x, y) -> -x * x - y * y, side(-1.0, 1.0, 5), side(-1.0, 1.0, 5));
        assertThat(Contours.of(grid, 0.0)).isEmpty();
        assertThat(Contours.of(grid, 1.0)).isEmpty();
        assertThat(Contours.of(grid, -5.0)).isEmpty();
    }

    /** Over logarithmic sides x y = c is a straight line of slope −1 in ln x and ln y; the values' own logarithm is linear there. */
    @Test
    void logarithmicSidesInterpolateInTheLogarithm() {
        Axis across = new Axis("x", 1.0, 100.0, 9, true);
        Axis down = new Axis("y", 0.1, 10.0, 7, true);
        Grid grid = grid((x, y) -> FastMath.log(x * y), across, down);
        List<Line> lines = Contours.of(grid, FastMath.log(7.0));
        assertThat(lines).hasSize(1);
        assertThat(lines.get(0).points())
                .hasSizeGreaterThan(8)
                .allSatisfy(point -> assertThat(point.across() * point.down()).isCloseTo(7.0, within(1e-9)));
    }

    @Test
    void linesEndWhereNumbersAreMissing() {
        Grid grid = grid((x, y) -> x > 0.55 ? Double.NaN : y, side(0.0, 1.0, 11), side(0.0, 1.0, 4));
        List<Line> lines = Contours.of(grid, 0.5);
        assertThat(lines).hasSize(1);
        List<Double> reached = new ArrayList<>();
        lines.get(0).points().forEach(point -> reached.add(point.across()));
        assertThat(reached).hasSize(6).allSatisfy(x -> assertThat(x).isLessThan(0.5001));
    }
}
